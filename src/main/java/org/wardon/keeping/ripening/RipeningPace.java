package org.wardon.keeping.ripening;

import org.wardon.keeping.Draw;

/**
 * How fast a lot ripens in one draw. Heat and cold keep fruit from ripening as it should, but not
 * from going soft: it is past eating as early as it would be without them.
 */
public final class RipeningPace {
    private final Ripening ripening;
    private final Draw draw;

    RipeningPace(Ripening ripening, Draw draw) {
        this.ripening = ripening;
        this.draw = draw;
    }

    /**
     * Returns how fast it comes from the start of ripening to ripe.
     *
     * @param temperatureC temperature of the fruit, °C
     * @return share of the leg a day, 0 where cold or heat keep it from ripening
     */
    public double ripensPerDay(double temperatureC) {
        return ripening.warmth().left(temperatureC) * softensPerDay(temperatureC);
    }

    /**
     * Returns how fast it comes there but for cold and heat.
     *
     * @param temperatureC temperature of the fruit, °C
     * @return share of the leg a day, above 0
     */
    public double softensPerDay(double temperatureC) {
        return 1 / ripening.toRipe().days(temperatureC, draw.ripeningPace());
    }

    /**
     * Returns how fast it comes from ripe to overripe.
     *
     * @param temperatureC temperature of the fruit, °C
     * @return share of the leg a day, above 0
     */
    public double spoilsPerDay(double temperatureC) {
        return 1 / ripening.toOverripe().days(temperatureC, draw.ripening());
    }

    /**
     * Returns the share of the green clock after which ripening starts by itself.
     *
     * @return 0 to 1; 1 where the green clock runs to the start of ripening
     */
    public double startsAtGreenShare() {
        Ripening.Span span = ripening.startsAtGreenShare();
        return span.low() + freely() * (span.high() - span.low());
    }

    /**
     * Returns how far the lot has come on its way to ripe at the door.
     *
     * @return 0 where ripening is to start or just started, 1 for ripe
     */
    public double atDoor() {
        Ripening.Span span = ripening.atDoor();
        return span.low() + freely() * (span.high() - span.low());
    }

    /** Sum modulo 1 of two independent quantiles: even, and independent of each of them. */
    private double freely() {
        return (draw.ripening() + draw.ripeningPace()) % 1;
    }
}
