package org.wardon.keeping.life;

import java.util.Optional;
import org.apache.commons.math3.distribution.NormalDistribution;
import org.wardon.keeping.Draw;
import org.wardon.keeping.KnownLife;
import org.wardon.keeping.RestsOn;
import org.wardon.produce.Commodity;

/**
 * Life of a commodity over temperature, with its range.
 *
 * <p>The level is the handbook's life in its own condition. A printed range of life beside a
 * printed range of temperature is read as one: the short life belongs to the warm end, the long one
 * to the cold end. Between the temperatures of the commodity's own published lives the rate follows
 * their slope, elsewhere the generic curve.
 */
public final class LifeCurve {
    /** Lives of one crop at one temperature differ between sources by this factor in the median. */
    private static final double BETWEEN_SOURCES = 1.4;

    /** How well a keeper's own figure is known (assumption). */
    private static final double OF_OWN_FIGURE = 1.25;

    /** Least share of a printed range that is left to lots once temperature has its part (ours). */
    private static final double LEAST_WIDTH = 0.5;

    private static final double LEAST_KJ_MOL = 15;
    private static final double ENOUGH_WEIGHT = 0.4;
    private static final int ENOUGH_TEMPERATURES = 3;
    private static final NormalDistribution NORMAL = new NormalDistribution(null, 0, 1);

    private final LifeLevel level;
    private final OwnSlope slope;
    private final double exponent;
    private final Optional<KnownLife> known;

    private LifeCurve(LifeLevel level, OwnSlope slope, double exponent, Optional<KnownLife> known) {
        this.level = level;
        this.slope = slope;
        this.exponent = exponent;
        this.known = known;
    }

    /**
     * Returns the curve of a commodity.
     *
     * @param commodity the commodity
     * @param chillingFloorC lives below it are left to chilling, °C; minus infinity where it does
     *     not chill
     * @param known the keeper's own figure, which sets the level; where there is none, an own life
     *     at a temperature among the commodity's facts does
     * @return the curve
     */
    public static LifeCurve of(
            Commodity commodity, double chillingFloorC, Optional<KnownLife> known) {
        return new LifeCurve(
                LifeLevel.of(commodity),
                OwnSlope.of(commodity, chillingFloorC),
                Rest.exponent(commodity),
                known.or(() -> own(commodity)));
    }

    private static Optional<KnownLife> own(Commodity commodity) {
        return commodity.keeping().lives().stream()
                .filter(row -> row.lifeDays().own() && row.temperatureC().isPresent())
                .findFirst()
                .map(
                        row ->
                                new KnownLife(
                                        row.lifeDays().middle(), row.temperatureC().getAsDouble()));
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
        if (known.isPresent()) {
            return RestsOn.KNOWN_LIFE;
        }
        if (level.restsOn() == RestsOn.CLASS) {
            return RestsOn.CLASS;
        }
        if (slope.ownWeight() >= ENOUGH_WEIGHT && slope.temperatures() >= ENOUGH_TEMPERATURES) {
            return RestsOn.OWN_CURVE;
        }
        return slope.ownWeight() > 0 ? RestsOn.POOLED_SLOPE : RestsOn.HANDBOOK_LIFE;
    }

    /**
     * Returns the highest temperature at which somebody published a life of it.
     *
     * @return °C
     */
    public double highestPublishedC() {
        return slope.ownWeight() > 0
                ? Math.max(slope.highestC(), level.atHighC())
                : level.atHighC();
    }

    /**
     * Returns whether lives at several temperatures are published, so that going beyond them is
     * extrapolation rather than the generic curve from the start.
     *
     * @return true if the slope has figures of its own
     */
    public boolean spansTemperatures() {
        return slope.ownWeight() > 0;
    }

    /**
     * Returns the ageing of a draw.
     *
     * @param draw the draw
     * @return rate over temperature
     */
    public Ageing at(Draw draw) {
        GenericCurve generic = new GenericCurve(draw.slope(), exponent);
        double kilojoule =
                Math.max(
                        LEAST_KJ_MOL,
                        slope.kilojoulePerMol()
                                + slope.deviation()
                                        * NORMAL.inverseCumulativeProbability(draw.slope()));
        Ageing free = new Ageing(generic, slope, kilojoule, 0);
        return free.anchored(lnLifeAtAnchor(draw, free), anchorC());
    }

    private double anchorC() {
        return known.map(KnownLife::atC).orElse(level.atHighC());
    }

    private double lnLifeAtAnchor(Draw draw, Ageing free) {
        double q = draw.lifeLevel();
        if (known.isPresent()) {
            double width = 2 * Math.log(OF_OWN_FIGURE);
            return Math.log(known.get().days()) + (q - 0.5) * width;
        }
        double low = Math.log(level.lowDays());
        double high = Math.log(level.highDays());
        if (high - low < 1e-9) {
            return low + (2 * q - 1) * Math.log(BETWEEN_SOURCES);
        }
        double fall = free.lnRate(level.atHighC()) - free.lnRate(level.atLowC());
        return low + q * Math.max(high - low - fall, LEAST_WIDTH * (high - low));
    }
}
