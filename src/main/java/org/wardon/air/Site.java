package org.wardon.air;

import java.time.ZoneId;
import org.wardon.errors.Require;

/**
 * Where a store stands.
 *
 * @param latitudeDeg latitude, degrees, north positive, -90 to 90
 * @param longitudeDeg longitude, degrees, east positive, -180 to 180
 * @param elevationM height above the sea, m, -430 to 5000
 * @param zone time zone of the plan's clock
 */
public record Site(double latitudeDeg, double longitudeDeg, double elevationM, ZoneId zone) {
    /** Checks the bounds. */
    public Site {
        Require.within("latitudeDeg", latitudeDeg, -90, 90, "°", "North is positive.");
        Require.within("longitudeDeg", longitudeDeg, -180, 180, "°", "East is positive.");
        Require.within("elevationM", elevationM, -430, 5000, "m", "Give metres above the sea.");
    }
}
