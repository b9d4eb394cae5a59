package org.wardon.enclosure;

import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.wardon.errors.Require;

/**
 * A chamber as built and used, without coolers and lots.
 *
 * @param box inside measures
 * @param faces all six faces
 * @param thermalBridgePct uplift of the heat flow through all faces, percent
 * @param door the door, where there is one
 * @param leakageAirChangesPerDay leakage with the door shut, gross volumes a day of chamber air
 * @param freshAirM3PerHour deliberate fresh air, m3 of chamber air an hour
 * @param gains heat given off inside
 * @param structureCapacityJK heat capacity of racks and structure, J/K
 * @param computedFilms whether inside films come from natural convection instead of ISO 6946
 * @param zones its air in two zones; absent where it is one
 */
public record Enclosure(
        Box box,
        List<Face> faces,
        double thermalBridgePct,
        Optional<Door> door,
        double leakageAirChangesPerDay,
        double freshAirM3PerHour,
        Gains gains,
        double structureCapacityJK,
        boolean computedFilms,
        Optional<AirZones> zones) {
    /**
     * A chamber whose air is one.
     *
     * @param box inside measures
     * @param faces all six faces
     * @param thermalBridgePct uplift of the heat flow through all faces, percent
     * @param door the door, where there is one
     * @param leakageAirChangesPerDay leakage with the door shut, gross volumes a day
     * @param freshAirM3PerHour deliberate fresh air, m3 of chamber air an hour
     * @param gains heat given off inside
     * @param structureCapacityJK heat capacity of racks and structure, J/K
     * @param computedFilms whether inside films come from natural convection
     */
    public Enclosure(
            Box box,
            List<Face> faces,
            double thermalBridgePct,
            Optional<Door> door,
            double leakageAirChangesPerDay,
            double freshAirM3PerHour,
            Gains gains,
            double structureCapacityJK,
            boolean computedFilms) {
        this(
                box,
                faces,
                thermalBridgePct,
                door,
                leakageAirChangesPerDay,
                freshAirM3PerHour,
                gains,
                structureCapacityJK,
                computedFilms,
                Optional.empty());
    }

    /**
     * Returns the same with its air in other zones.
     *
     * @param other two zones, or none for one air
     * @return the changed copy
     */
    public Enclosure withZones(Optional<AirZones> other) {
        return new Enclosure(
                box,
                faces,
                thermalBridgePct,
                door,
                leakageAirChangesPerDay,
                freshAirM3PerHour,
                gains,
                structureCapacityJK,
                computedFilms,
                other);
    }

    /** Copies the faces and checks the bounds. */
    public Enclosure {
        faces = List.copyOf(faces);
        Set<FaceName> seen = EnumSet.noneOf(FaceName.class);
        for (Face face : faces) {
            Require.that(seen.add(face.name()), "face " + face.name() + " is given twice");
        }
        Require.that(seen.size() == 6, "six faces are needed, found " + seen);
        Require.within("thermalBridgePct", thermalBridgePct, 0, 200, "%", "");
        Require.within("leakageAirChangesPerDay", leakageAirChangesPerDay, 0, 2_000, "1/day", "");
        Require.within("freshAirM3PerHour", freshAirM3PerHour, 0, 100_000, "m3/h", "");
        Require.within("structureCapacityJK", structureCapacityJK, 0, 1e10, "J/K", "");
    }
}
