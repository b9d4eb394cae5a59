package org.wardon.keeping.life;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.apache.commons.math3.distribution.NormalDistribution;
import org.wardon.keeping.Draw;
import org.wardon.keeping.KnownLife;
import org.wardon.keeping.RestsOn;
import org.wardon.keeping.experience.Belief;
import org.wardon.keeping.experience.LevelSpread;
import org.wardon.keeping.experience.Sighting;
import org.wardon.produce.Commodity;
import org.wardon.produce.rows.LifeCurveRow;

/**
 * Life of a commodity over temperature, with its range.
 *
 * <p>The level is the handbook's life in its own condition. A printed range of life beside a
 * printed range of temperature is read as one: the short life belongs to the warm end, the long one
 * to the cold end. Up to the highest temperature of the commodity's own published lives the rate
 * follows the fitted slope, beyond it the generic curve. The middle of the range is the handbook's;
 * its short end is the shortest life printed for that condition, its long end as far as sources
 * differ. What the keeper has seen moves the level within a draw's slope, so its shape stays as
 * published.
 */
public final class LifeCurve {
    /** Lives of one crop at one temperature differ between sources by this factor in the median. */
    private static final double BETWEEN_SOURCES = 1.4;

    /** Least share of a printed range that is left to lots once temperature has its part (ours). */
    private static final double LEAST_WIDTH = 0.5;

    private static final double LEAST_KJ_MOL = 15;
    private static final double LEAST_POWER = 0.2;
    private static final double ENOUGH_WEIGHT = 0.4;
    private static final int ENOUGH_TEMPERATURES = 3;

    /** One lot in ten lies beyond this many deviations. */
    private static final double TENTH = 1.2816;

    /** The short end, a little inside the tenth so that the tenth of a few dozen draws is on it. */
    private static final double SHORTEST = 1.2;

    /** Draws farther out are taken there: one in fifty (ours). */
    private static final double FARTHEST = 2.05;

    private static final NormalDistribution NORMAL = new NormalDistribution(null, 0, 1);

    private final LifeLevel level;
    private final OwnSlope slope;
    private final double exponent;
    private final Sources sources;
    private final List<Sighting> seen;

    /**
     * How sources differ in the handbook's own condition.
     *
     * @param deviation standard deviation of ln life of one source over another's
     * @param shortestDays shortest life another source gives there, days
     * @param longestDays longest, days
     */
    private record Sources(
            double deviation, OptionalDouble shortestDays, OptionalDouble longestDays) {
        /** Without a fit: 1.4 times in the median, which is a deviation of 0.5. */
        static final Sources USUAL =
                new Sources(0.5, OptionalDouble.empty(), OptionalDouble.empty());

        static Sources of(LifeCurveRow row) {
            return new Sources(row.betweenSources(), row.shortestDays(), row.longestDays());
        }
    }

    private LifeCurve(
            LifeLevel level, Optional<LifeCurveRow> row, double exponent, List<Sighting> seen) {
        this.level = level;
        this.slope = row.map(OwnSlope::of).orElse(OwnSlope.COMMON);
        this.sources = row.map(Sources::of).orElse(Sources.USUAL);
        this.exponent = exponent;
        this.seen = List.copyOf(seen);
    }

    private LifeCurve(LifeCurve same, List<Sighting> seen) {
        level = same.level;
        slope = same.slope;
        sources = same.sources;
        exponent = same.exponent;
        this.seen = List.copyOf(seen);
    }

    /**
     * Returns the curve of a commodity.
     *
     * @param commodity the commodity
     * @param known the keeper's own figure; where there is none, the own lives at a temperature
     *     among the commodity's facts count
     * @return the curve
     */
    public static LifeCurve of(Commodity commodity, Optional<KnownLife> known) {
        return of(commodity, known, List.of());
    }

    /**
     * Returns the curve of a commodity, its level moved by what the keeper has seen.
     *
     * @param commodity the commodity
     * @param known the keeper's own figure, as above
     * @param lots the keeper's own lots
     * @return the curve
     */
    public static LifeCurve of(
            Commodity commodity, Optional<KnownLife> known, List<Sighting> lots) {
        List<Sighting> seen = new ArrayList<>(lots);
        known.map(List::of).orElseGet(() -> own(commodity)).stream()
                .map(Sighting::of)
                .forEach(seen::add);
        return new LifeCurve(
                LifeLevel.of(commodity), OwnSlope.row(commodity), Rest.exponent(commodity), seen);
    }

    /**
     * Returns the curve a commodity has by another fit, for scoring.
     *
     * @param commodity the commodity
     * @param row the other fit
     * @return the curve
     */
    public static LifeCurve of(Commodity commodity, LifeCurveRow row) {
        return new LifeCurve(
                LifeLevel.of(commodity), Optional.of(row), Rest.exponent(commodity), List.of());
    }

    private static List<KnownLife> own(Commodity commodity) {
        return commodity.keeping().lives().stream()
                .filter(row -> row.lifeDays().own() && row.temperatureC().isPresent())
                .map(
                        row ->
                                KnownLife.between(
                                        row.lifeDays().lowest(),
                                        row.lifeDays().highest(),
                                        row.temperatureC().getAsDouble()))
                .toList();
    }

    /**
     * Returns the life the curve is anchored on.
     *
     * @return level with its source
     */
    public LifeLevel level() {
        return level;
    }

    /**
     * Returns the slope of the commodity's own lives.
     *
     * @return slope with its weight
     */
    public OwnSlope slope() {
        return slope;
    }

    /**
     * Returns what the curve rests on.
     *
     * @return strongest statement that holds for the whole curve
     */
    public RestsOn restsOn() {
        if (seen.stream().anyMatch(one -> one.kind() == Sighting.Kind.USUAL)) {
            return RestsOn.KNOWN_LIFE;
        }
        if (seen.stream().anyMatch(one -> one.kind() == Sighting.Kind.LOT)) {
            return RestsOn.OWN_LOTS;
        }
        if (level.restsOn() == RestsOn.CLASS) {
            return RestsOn.CLASS;
        }
        if (slope.ownWeight() >= ENOUGH_WEIGHT && slope.temperatures() >= ENOUGH_TEMPERATURES) {
            return RestsOn.OWN_CURVE;
        }
        return spansTemperatures() ? RestsOn.POOLED_SLOPE : RestsOn.HANDBOOK_LIFE;
    }

    /**
     * Returns the highest temperature at which somebody published a life of it.
     *
     * @return °C
     */
    public double highestPublishedC() {
        return Math.max(slope.highestC().orElse(level.atHighC()), level.atHighC());
    }

    /**
     * Returns whether lives at several temperatures are published, so that going beyond them is
     * extrapolation rather than the generic curve from the start.
     *
     * @return true if the slope has figures of its own
     */
    public boolean spansTemperatures() {
        return slope.highestC().isPresent();
    }

    /**
     * Returns the ageing of a draw.
     *
     * @param draw the draw
     * @return rate over temperature
     */
    public Ageing at(Draw draw) {
        Level printed = level(draw);
        double z = NORMAL.inverseCumulativeProbability(draw.lifeLevel());
        double within = Math.min(Math.max(z, -SHORTEST), FARTHEST);
        return printed.at(
                seen.isEmpty() ? within : believed(printed, draw).lot(within, printed.spread()));
    }

    private Belief believed(Level printed, Draw draw) {
        Ageing middle = printed.at(0);
        return Belief.after(
                seen.stream().map(one -> one.reading(middle, printed.spread(), draw)).toList());
    }

    /**
     * Returns the ageing as published, whatever the keeper has seen.
     *
     * @param draw the draw
     * @return rate over temperature in the middle of the published level
     */
    public Ageing published(Draw draw) {
        return level(draw).at(0);
    }

    /**
     * Returns the curve as if the keeper had seen nothing.
     *
     * @return the published curve
     */
    public LifeCurve withoutOwn() {
        return new LifeCurve(this, List.of());
    }

    /**
     * Returns what the keeper's figures and lots make of the published life.
     *
     * @return life in the middle run over the published one, 1 where there are none
     */
    public double factor() {
        double atC = level.atHighC();
        return at(Draw.MEDIAN).lifeDays(atC) / published(Draw.MEDIAN).lifeDays(atC);
    }

    /**
     * Returns how far lives lie from the middle of the published level.
     *
     * @param draw the draw
     * @return the published spread
     */
    public LevelSpread spread(Draw draw) {
        return level(draw).spread();
    }

    /**
     * Returns what the keeper has seen.
     *
     * @return figures and lots
     */
    public List<Sighting> seen() {
        return seen;
    }

    /** The published level along one slope. */
    private record Level(Ageing free, double atC, double lnMiddleDays, LevelSpread spread) {
        Ageing at(double z) {
            return free.anchored(lnMiddleDays + spread.lnRatio(z), atC);
        }
    }

    private Level level(Draw draw) {
        double z = NORMAL.inverseCumulativeProbability(draw.slope());
        double power = exponent * Math.max(LEAST_POWER, 1 + slope.betweenCrops() * z);
        double kilojoule = Math.max(LEAST_KJ_MOL, slope.kilojoulePerMol() + slope.deviation() * z);
        Ageing free = new Ageing(new GenericCurve(power), kilojoule, highestPublishedC(), 0);
        double low = Math.log(level.lowDays());
        double printed = Math.log(level.highDays()) - low;
        double fall = free.lnRate(level.atHighC()) - free.lnRate(level.atLowC());
        double half = 0.5 * Math.max(printed - fall, LEAST_WIDTH * printed);
        double middle = low + half;
        LevelSpread spread = new LevelSpread(shortSide(middle), longSide(middle, half));
        return new Level(free, level.atHighC(), middle, spread);
    }

    /**
     * The short side ends at the shortest life anybody printed for the condition: there nothing
     * ends a lot before its published life.
     */
    private double shortSide(double middle) {
        boolean single = level.highDays() <= level.lowDays();
        double printed = Math.log(single ? level.lowDays() / BETWEEN_SOURCES : level.lowDays());
        double least = Math.min(printed, Math.log(sources.shortestDays().orElse(level.lowDays())));
        return (middle - least) / SHORTEST;
    }

    /** The long side is as wide as sources differ, or as one of them says. */
    private double longSide(double middle, double half) {
        double printed =
                Math.max(half, Math.log(sources.longestDays().orElse(level.highDays())) - middle);
        return Math.max(sources.deviation(), printed / TENTH);
    }
}
