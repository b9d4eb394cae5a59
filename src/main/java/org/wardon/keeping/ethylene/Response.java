package org.wardon.keeping.ethylene;

import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.keeping.Draw;
import org.wardon.produce.Commodity;
import org.wardon.produce.Ripeness;
import org.wardon.produce.rows.EthyleneEffect;

/**
 * What ethylene does to a commodity: shortens its life by a straight line in the logarithm of the
 * level, and starts ripening above a trigger.
 *
 * <p>Source of the line: id wills-1999, about 46 percent of the life at 0.1 µL/L a decade
 * (derived). The level of the trials, on which the published life rests, is drawn between 0.03 and
 * 0.1 µL/L; for a commodity that gives off more, it is what its own kind makes in a full chamber in
 * the handbook's condition, since the published life was found beside its own kind (assumption).
 */
public final class Response {
    /** Source of the relation of life to level. */
    public static final String SOURCE_ID = "wills-1999";

    /** Air changes a day by leakage and door where no chamber is known (assumption). */
    public static final double USUAL_AIR_CHANGES = 6;

    /** Produce a gross cubic metre, kg (common practice). */
    public static final double USUAL_KG_M3 = 150;

    /** Levels at and below it tell of life shortened by degrees, not of a disorder, µL/L. */
    private static final double DISORDERS_ABOVE_PPM = 0.1;

    private static final double PER_DECADE = 0.46;
    private static final double BASE_PPM = 0.1;
    private static final double LEAST = 0.05;
    private static final double MOST = 1.6;
    private static final double CLEAN_PPM = 0.03;
    private static final double FOUL_PPM = 0.1;
    private static final double LEAST_PPM = 1e-4;

    private final boolean sensitive;
    private final OptionalDouble triggerPpm;
    private final Giving giving;
    private final double handbookC;
    private final Commodity commodity;
    private final Ripeness ripeness;

    /**
     * Returns whether a row tells of a disorder, rather than of life shortened or ripening started,
     * which are reckoned with elsewhere.
     *
     * @param effect the row
     * @return true for a disorder from a printed level on
     */
    public static boolean isDisorder(EthyleneEffect effect) {
        return effect.thresholdPpm().isPresent()
                && effect.thresholdPpm().get().lowest() > DISORDERS_ABOVE_PPM
                && !effect.effect().contains("starts ripening");
    }

    private Response(
            boolean sensitive,
            OptionalDouble triggerPpm,
            Giving giving,
            double handbookC,
            Commodity commodity,
            Ripeness ripeness) {
        this.sensitive = sensitive;
        this.triggerPpm = triggerPpm;
        this.giving = giving;
        this.handbookC = handbookC;
        this.commodity = commodity;
        this.ripeness = ripeness;
    }

    /**
     * Returns the response of a commodity.
     *
     * @param commodity the commodity
     * @param ripeness how ripe the lot is
     * @return its response
     */
    public static Response of(Commodity commodity, Ripeness ripeness) {
        String rated = commodity.needs().ethyleneSensitivity();
        OptionalDouble trigger =
                commodity.company().ethyleneEffects().stream()
                        .filter(effect -> effect.effect().contains("starts ripening"))
                        .map(EthyleneEffect::thresholdPpm)
                        .flatMap(Optional::stream)
                        .mapToDouble(fact -> fact.lowest())
                        .min();
        return new Response(
                rated.equals("moderate") || rated.equals("high"),
                trigger,
                Giving.of(commodity),
                commodity.needs().temperatureC().map(fact -> fact.middle()).orElse(10.0),
                commodity,
                ripeness);
    }

    /**
     * Returns whether ethylene shortens its life.
     *
     * @return true for moderate and high sensitivity
     */
    public boolean sensitive() {
        return sensitive;
    }

    /**
     * Returns what the commodity gives off itself.
     *
     * @return its rates
     */
    public Giving giving() {
        return giving;
    }

    /**
     * Returns the level from which ripening starts in a draw.
     *
     * @param draw the draw
     * @return µL/L; empty where none is printed
     */
    public OptionalDouble triggerPpm(Draw draw) {
        return triggerPpm.isPresent()
                ? OptionalDouble.of(Math.max(triggerPpm.getAsDouble(), ownKindPpm(draw)))
                : triggerPpm;
    }

    /**
     * Returns the level its published life rests on, in a draw.
     *
     * @param draw the draw
     * @return µL/L
     */
    public double referencePpm(Draw draw) {
        double trials = CLEAN_PPM * Math.pow(FOUL_PPM / CLEAN_PPM, draw.ethyleneReference());
        return Math.max(trials, ownKindPpm(draw));
    }

    private double ownKindPpm(Draw draw) {
        double stage = Stage.giving(commodity, ripeness, draw);
        double rate = giving.microlitrePerKgHour(handbookC, stage, draw);
        return steadyPpm(USUAL_KG_M3 * rate, USUAL_AIR_CHANGES);
    }

    /**
     * Returns the level at rest in a chamber.
     *
     * @param microlitrePerM3Hour ethylene given off a gross cubic metre, µL/(m3 h)
     * @param airChangesPerDay air changes of the gross volume a day
     * @return µL/L above the outside air
     */
    public static double steadyPpm(double microlitrePerM3Hour, double airChangesPerDay) {
        double litresPerM3Hour = airChangesPerDay * 1000 / 24;
        return microlitrePerM3Hour / litresPerM3Hour;
    }

    /**
     * Returns the factor on life.
     *
     * @param ppm ethylene in the air, µL/L
     * @param referencePpm level the published life rests on, µL/L
     * @return 0 to 1; 1 where it is not sensitive or the air is cleaner
     */
    public double lifeFactor(double ppm, double referencePpm) {
        if (!sensitive || ppm <= referencePpm) {
            return 1;
        }
        return Math.min(1, relative(ppm) / relative(referencePpm));
    }

    private static double relative(double ppm) {
        double g = 1 - PER_DECADE * Math.log10(Math.max(ppm, LEAST_PPM) / BASE_PPM);
        return Math.max(LEAST, Math.min(MOST, g));
    }
}
