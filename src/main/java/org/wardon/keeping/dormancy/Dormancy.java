package org.wardon.keeping.dormancy;

import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.keeping.Draw;
import org.wardon.produce.Commodity;
import org.wardon.produce.Fact;
import org.wardon.produce.rows.SproutingRow;

/** Sprouting, damp and curing of one commodity. */
public final class Dormancy {
    /** Humidity above which bulbs root and mould, from and to (field practice; table: 70 %). */
    private static final double DAMP_FROM = 0.75;

    private static final double DAMP_TO = 0.80;

    /** Days above it that do no harm. */
    public static final double DAMP_FREE_DAYS = 7;

    /** Days above it until the lot is lost: three further weeks (assumption). */
    private static final double DAMP_LOST_DAYS = 28;

    /** Least share of its life that an uncured lot keeps (assumption). */
    private static final double UNCURED_LEAST = 0.3;

    private static final double STEP_K = 0.5;

    private final Optional<Hump> hump;
    private final boolean sproutingPrinted;
    private final OptionalDouble dampLimit;
    private final boolean curable;
    private final double slowed;

    private Dormancy(
            Optional<Hump> hump,
            boolean sproutingPrinted,
            OptionalDouble dampLimit,
            boolean curable,
            double slowed) {
        this.hump = hump;
        this.sproutingPrinted = sproutingPrinted;
        this.dampLimit = dampLimit;
        this.curable = curable;
        this.slowed = slowed;
    }

    /**
     * Returns the dormancy of a commodity.
     *
     * @param commodity the commodity
     * @return its dormancy; nothing happens to produce that neither sprouts nor is cured
     */
    public static Dormancy of(Commodity commodity) {
        Optional<Hump> hump = Humps.of(commodity.id());
        OptionalDouble limit =
                commodity.keeping().sprouting().stream()
                        .map(SproutingRow::humidityLimitPct)
                        .filter(OptionalDouble::isPresent)
                        .mapToDouble(OptionalDouble::getAsDouble)
                        .min();
        return new Dormancy(
                hump,
                !commodity.keeping().sprouting().isEmpty(),
                limit,
                commodity.keeping().curing().stream()
                        .anyMatch(row -> row.temperatureC().isPresent()),
                hump.map(h -> slowed(h, commodity)).orElse(1.0));
    }

    /** The handbook's own condition must keep the published life. */
    private static double slowed(Hump hump, Commodity commodity) {
        if (commodity.needs().temperatureC().isEmpty() || commodity.needs().lifeDays().isEmpty()) {
            return 1;
        }
        Fact at = commodity.needs().temperatureC().get();
        double worst = hump.share(at.highest());
        for (double t = at.lowest(); t < at.highest(); t += STEP_K) {
            worst = Math.max(worst, hump.share(t));
        }
        double life = commodity.needs().lifeDays().get().lowest();
        return worst == 0 ? 1 : Math.min(1, hump.shortDays() / (life * worst));
    }

    /**
     * Returns the hump that print supports.
     *
     * @return empty where no row supports a rate
     */
    public Optional<Hump> hump() {
        return hump;
    }

    /**
     * Returns whether print speaks of sprouting but gives no rate.
     *
     * @return true where only a caution is possible
     */
    public boolean rateUnknown() {
        return sproutingPrinted && hump.isEmpty();
    }

    /**
     * Returns whether the crop is to stay dry.
     *
     * @return true for bulbs that root and mould in damp air
     */
    public boolean wantsDry() {
        return dampLimit.isPresent();
    }

    /**
     * Returns whether the crop is cured before storage.
     *
     * @return true where a curing condition is printed
     */
    public boolean curable() {
        return curable;
    }

    /**
     * Returns how fast a draw comes to sprouting.
     *
     * @param temperatureC temperature, °C
     * @param draw the draw
     * @return share of the rest used a day
     */
    public double sproutingPerDay(double temperatureC, Draw draw) {
        if (hump.isEmpty()) {
            return 0;
        }
        Hump h = hump.get();
        double days = h.shortDays() * Math.pow(h.longDays() / h.shortDays(), draw.dormancy());
        return slowed * h.share(temperatureC) / days;
    }

    /**
     * Returns how fast damp air spoils a crop that is to stay dry. The first quarter of the share,
     * seven days, does no harm that shows.
     *
     * @param humidityFraction humidity at the produce, 0 to 1
     * @return share used a day: 0 up to 75 %, full from 80 % on
     */
    public double dampPerDay(double humidityFraction) {
        if (dampLimit.isEmpty()) {
            return 0;
        }
        double over = (humidityFraction - DAMP_FROM) / (DAMP_TO - DAMP_FROM);
        return Math.max(0, Math.min(1, over)) / DAMP_LOST_DAYS;
    }

    /**
     * Returns the share of its life a lot keeps that was not, or may not have been, cured.
     *
     * @param cured whether it was; empty where nobody said
     * @param draw the draw
     * @return 0.3 to 1 (assumption); 1 for cured lots and crops that are not cured
     */
    public double lifeShare(Optional<Boolean> cured, Draw draw) {
        if (!curable || cured.orElse(false)) {
            return 1;
        }
        return UNCURED_LEAST + draw.curing() * (1 - UNCURED_LEAST);
    }
}
