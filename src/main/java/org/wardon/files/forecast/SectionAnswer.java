package org.wardon.files.forecast;

import java.time.LocalDateTime;
import java.util.List;
import java.util.Optional;

/**
 * The answer of {@code section}: where it is warm and where cold in a chamber whose air no fan
 * stirs.
 *
 * @param chamber its id
 * @param at end of the hours it is the mean of
 * @param hours how many
 * @param across the way it is cut, {@code west-east} or {@code south-north}
 * @param widthM width of the section, m
 * @param heightM its height, m
 * @param faces its four edges: left, right, floor, roof
 * @param settingC what the chamber is set to, °C
 * @param outdoorC outdoor air, °C
 * @param oneAirC the one temperature the forecast has for its air, °C
 * @param meanC mean of the section, load included, °C
 * @param airMeanC mean of its air, °C
 * @param warmest warmest place
 * @param coldest coldest place
 * @param spreadK between them, K
 * @param airSpreadK between the warmest and the coldest place of the air, K
 * @param stack the load as it is taken; absent without one
 * @param spaces how the air of each space carries heat
 * @param leftOpenPct what the balance of the section leaves open, percent of the heat through it
 * @param field temperatures, evenly spaced
 * @param said the answer in sentences
 * @param warnings what to beware of
 */
public record SectionAnswer(
        String chamber,
        LocalDateTime at,
        double hours,
        String across,
        double widthM,
        double heightM,
        List<OfFace> faces,
        double settingC,
        double outdoorC,
        double oneAirC,
        double meanC,
        double airMeanC,
        Place warmest,
        Place coldest,
        double spreadK,
        double airSpreadK,
        Optional<OfStack> stack,
        List<OfSpace> spaces,
        double leftOpenPct,
        Field field,
        List<String> said,
        List<Forecast.Warning> warnings) {
    /** Copies the lists. */
    public SectionAnswer {
        faces = List.copyOf(faces);
        spaces = List.copyOf(spaces);
        said = List.copyOf(said);
        warnings = List.copyOf(warnings);
    }

    /**
     * A face at an edge of the section.
     *
     * @param side {@code left}, {@code right}, {@code floor} or {@code roof}
     * @param face its name
     * @param innerC its inner surface, °C
     */
    public record OfFace(String side, String face, double innerC) {}

    /**
     * A place in the section.
     *
     * @param xM from its left edge, m
     * @param yM above the floor, m
     * @param temperatureC there, °C
     * @param inStack whether it lies in the load
     * @param where the place in words
     */
    public record Place(double xM, double yM, double temperatureC, boolean inStack, String where) {}

    /**
     * The load as one block.
     *
     * @param lots ids of its lots
     * @param massKg their mass, kg
     * @param fromM its left side from the left edge, m
     * @param toM its right side from there, m
     * @param footM its foot above the floor, m
     * @param topM its top above the floor, m
     * @param heatW breath less what its evaporating water takes, W
     * @param meanC its mean, °C
     * @param warmestC its warmest place, °C
     * @param coldestC its coldest, °C
     * @param lotsMeanC mean of its lots in the forecast at their end, °C
     */
    public record OfStack(
            List<String> lots,
            double massKg,
            double fromM,
            double toM,
            double footM,
            double topM,
            double heatW,
            double meanC,
            double warmestC,
            double coldestC,
            double lotsMeanC) {
        /** Copies the list. */
        public OfStack {
            lots = List.copyOf(lots);
        }
    }

    /**
     * A space of air.
     *
     * @param space {@code left}, {@code right}, {@code below} or {@code open}
     * @param thicknessM the way the heat goes, m
     * @param differenceK between its sides, K
     * @param rayleigh Rayleigh number
     * @param nusselt Nusselt number
     * @param conductivityWmK conductivity it amounts to, W/(m K)
     */
    public record OfSpace(
            String space,
            double thicknessM,
            double differenceK,
            double rayleigh,
            double nusselt,
            double conductivityWmK) {}

    /**
     * Temperatures in rows from the roof to the floor, each from left to right, in the middles of
     * even cells.
     *
     * @param columns cells across
     * @param rows cells up
     * @param temperatureC rows of temperatures, °C
     */
    public record Field(int columns, int rows, List<List<Double>> temperatureC) {
        /** Copies the lists. */
        public Field {
            temperatureC = temperatureC.stream().map(List::copyOf).toList();
        }
    }
}
