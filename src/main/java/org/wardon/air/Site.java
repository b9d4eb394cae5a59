package org.wardon.air;

import java.time.ZoneId;
import java.util.Optional;
import org.wardon.errors.Require;

/**
 * Where a store stands.
 *
 * @param latitudeDeg latitude, degrees, north positive, -90 to 90
 * @param longitudeDeg longitude, degrees, east positive, -180 to 180
 * @param elevationM height above the sea, m, -430 to 5000
 * @param zone time zone of the plan's clock
 * @param year course of the outdoor temperature over the year, where known
 */
public record Site(
        double latitudeDeg,
        double longitudeDeg,
        double elevationM,
        ZoneId zone,
        Optional<YearWave> year) {
    /** Checks the bounds. */
    public Site {
        Require.within("latitudeDeg", latitudeDeg, -90, 90, "°", "North is positive.");
        Require.within("longitudeDeg", longitudeDeg, -180, 180, "°", "East is positive.");
        Require.within("elevationM", elevationM, -430, 5000, "m", "Give metres above the sea.");
    }

    /**
     * A site of whose year nothing is known.
     *
     * @param latitudeDeg latitude, degrees
     * @param longitudeDeg longitude, degrees
     * @param elevationM height above the sea, m
     * @param zone time zone
     */
    public Site(double latitudeDeg, double longitudeDeg, double elevationM, ZoneId zone) {
        this(latitudeDeg, longitudeDeg, elevationM, zone, Optional.empty());
    }

    /**
     * Returns the site with the course of its year.
     *
     * @param wave the year
     * @return the changed copy
     */
    public Site withYear(YearWave wave) {
        return new Site(latitudeDeg, longitudeDeg, elevationM, zone, Optional.of(wave));
    }
}
