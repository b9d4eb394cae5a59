package org.wardon.cooling;

import java.time.LocalTime;
import org.wardon.errors.Require;

/**
 * A machine that makes the ice of a bank again in given hours, its hot side outdoors.
 *
 * @param coldW heat it takes out of the bank, W
 * @param powerW its electric power at 35 °C outdoors, W; it follows the lift from there
 * @param from hour it starts
 * @param to hour it ends, the next day where not later than {@code from}
 */
public record Recharge(double coldW, double powerW, LocalTime from, LocalTime to) {
    /** Checks the bounds. */
    public Recharge {
        Require.within("rechargeW", coldW, 0, 1_000_000, "W", "");
        Require.within("rechargePowerW", powerW, 0, 1_000_000, "W", "");
    }
}
