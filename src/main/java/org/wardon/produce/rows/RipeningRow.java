package org.wardon.produce.rows;

import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.produce.Fact;

/**
 * Days that a leg of ripening takes at a temperature, or temperatures that bear on it.
 *
 * @param leg {@code whole} picked green to ripe by its own clock, {@code ripening} from its start
 *     to ripe, {@code ripe} from ripe to overripe, {@code advised} temperatures advised for
 *     ripening, {@code heat} from where ripening suffers to where it fails, {@code cold} from where
 *     it does not ripen to where it does by its days
 * @param lowC temperature of the fruit, lower end, °C
 * @param highC upper end, °C; empty where only the lower is printed
 * @param days days the leg takes; only high: at most; empty for the legs of temperature
 * @param treated whether it was treated with ethylene
 * @param sourceId source
 */
public record RipeningRow(
        String leg,
        double lowC,
        OptionalDouble highC,
        Optional<Fact> days,
        boolean treated,
        String sourceId) {
    /**
     * Returns the middle of its temperatures.
     *
     * @return °C
     */
    public double middleC() {
        return 0.5 * (lowC + highC.orElse(lowC));
    }
}
