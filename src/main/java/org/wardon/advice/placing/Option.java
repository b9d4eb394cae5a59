package org.wardon.advice.placing;

import java.util.List;
import org.wardon.cooling.Cooler;
import org.wardon.heat.AirSeries;
import org.wardon.plan.ChamberPlan;

/**
 * One way a chamber can be used: its setting, the air it then makes, what it can take and what it
 * costs, and what each lot comes to in it.
 *
 * @param chamber the chamber, switched on and set
 * @param riseK how much warmer than empty its lots may make it, K
 * @param air the air lots stand in
 * @param figures what the air is like and what it costs
 * @param takesW heat of lots it can take, {@code [day]}, mean of the day, W
 * @param cells what each lot comes to
 */
record Option(
        ChamberPlan chamber,
        double riseK,
        AirSeries air,
        Figures figures,
        List<Double> takesW,
        Cells cells) {
    /** Share of the band that air nobody keeps comes below its mean (assumption). */
    private static final double UNKEPT = 0.5;

    /** Copies the list. */
    Option {
        takesW = List.copyOf(takesW);
    }

    /**
     * What the air is like and what it costs.
     *
     * @param meanC mean of the air, °C
     * @param humidityPct its mean humidity with lots in it, percent
     * @param exchangeM3h air that carries ethylene out, a scrubber's clean air among it, m3/h
     * @param idleCost energy of the chamber without lots over the horizon, currency
     * @param costPerWDay energy of a watt of lots' heat for a day, currency
     * @param blastK how much colder it is in the blast of a cooler, K
     */
    record Figures(
            double meanC,
            double humidityPct,
            double exchangeM3h,
            double idleCost,
            double costPerWDay,
            double blastK) {}

    double settingC() {
        return chamber.setting().temperatureC();
    }

    /** How far the air comes below the setting: half the swing of the thermostat, K. */
    static double swingK(ChamberPlan set) {
        return set.coolers().stream().anyMatch(Cooler::holdsBand)
                ? set.setting().bandK()
                : UNKEPT * set.setting().bandK();
    }

    /** Whether its setting changes on the way. */
    boolean changes() {
        return !chamber.use().changes().isEmpty();
    }

    /** Whether it is set just as another is. */
    boolean setAs(ChamberPlan other) {
        return settingC() == other.setting().temperatureC()
                && chamber.use().changes().equals(other.use().changes());
    }

    Cell cell(int lot) {
        return cells.there().of(lot);
    }

    /** The same with other heat that it can take. */
    Option taking(List<Double> otherW) {
        return new Option(chamber, riseK, air, figures, otherW, cells);
    }

    /** The same, its lots standing in other air. */
    Option inAir(AirSeries other, Figures known, Cells there) {
        return new Option(chamber, riseK, other, known, takesW, there);
    }

    /** The same of a chamber that is its like. */
    Option named(String otherId) {
        return new Option(chamber.named(otherId), riseK, air, figures, takesW, cells);
    }
}
