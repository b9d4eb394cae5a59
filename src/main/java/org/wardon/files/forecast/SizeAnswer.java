package org.wardon.files.forecast;

import java.time.LocalDate;
import java.util.List;
import java.util.OptionalDouble;

/**
 * The answer of {@code size}: the design heat load of one chamber, summed by hand on the day of its
 * largest intake, and the cooling it asks for.
 *
 * @param chamber id of the chamber
 * @param settingC what the chamber is set to, °C
 * @param outdoorC outdoor air it is designed for, °C
 * @param outdoorHumidityPct its relative humidity, percent
 * @param groundC deep ground, °C
 * @param day the day whose intake is largest
 * @param pullDownHours hours in which what comes in is to be cold, h
 * @param terms each heat that comes in or is given off inside
 * @param meanW their sum, mean of the day, W
 * @param marginPct margin on the sum, percent
 * @param kWhPerDay heat of the day with its margin, kWh
 * @param runningHoursPerDay hours a day the plant may be counted on, h
 * @param requiredW cooling the plant needs while it runs, W
 * @param installedW rated cooling of the chamber's compressors, W; none where it has none
 */
public record SizeAnswer(
        String chamber,
        double settingC,
        double outdoorC,
        double outdoorHumidityPct,
        double groundC,
        LocalDate day,
        double pullDownHours,
        List<Term> terms,
        double meanW,
        double marginPct,
        double kWhPerDay,
        double runningHoursPerDay,
        double requiredW,
        OptionalDouble installedW) {
    /**
     * One term of the sum.
     *
     * @param kind what it stands for, such as {@code transmission}
     * @param of the face, lot or chamber it belongs to
     * @param meanW mean of the day, W
     * @param formula its formula with its figures
     * @param source where the formula or the figure is printed
     */
    public record Term(String kind, String of, double meanW, String formula, String source) {}

    /** Copies the terms. */
    public SizeAnswer {
        terms = List.copyOf(terms);
    }
}
