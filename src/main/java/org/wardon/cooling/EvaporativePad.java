package org.wardon.cooling;

import java.util.Optional;
import org.wardon.errors.Require;

/**
 * Outdoor air drawn through a wet pad and blown into the chamber, chamber air pushed out for it.
 * The fan sits between pad and chamber: all its heat goes into the supply air.
 *
 * <p>It runs while its thermostat asks for cold, its supply, fan heat included, is at least half a
 * kelvin colder than the chamber's air, and the pad cannot freeze.
 *
 * @param effectiveness share of the way from the outdoor air to its wet bulb, 0.1 to 1
 * @param airFlowM3s air the fan moves, at the state in which it enters the chamber, m3/s
 * @param fanW its fan, W
 * @param bleedPct water let go so that salts do not build up, percent of what evaporates
 * @param control thermostat on and off, or a fan that follows the air within the band
 */
public record EvaporativePad(
        double effectiveness, double airFlowM3s, double fanW, double bleedPct, Control control)
        implements Cooler {
    /** Checks the bounds. */
    public EvaporativePad {
        Require.within("effectiveness", effectiveness, 0.1, 1, "", "A fraction of 1.");
        Require.within("airFlowM3s", airFlowM3s, 0.001, 500, "m3/s", "");
        Require.within("fanW", fanW, 0, 50_000, "W", "");
        Require.within("bleedPct", bleedPct, 0, 500, "%", "");
    }

    @Override
    public String kind() {
        return "evaporative-pad";
    }

    @Override
    public EvaporativePadLaw law(double pressurePa) {
        return new EvaporativePadLaw(this, pressurePa);
    }

    @Override
    public Optional<Following> following() {
        return Optional.of(Following.ofFan(control));
    }

    /** More air through a larger pad; the power of the fan stays. */
    @Override
    public EvaporativePad sized(double factor) {
        return new EvaporativePad(effectiveness, airFlowM3s * factor, fanW, bleedPct, control);
    }

    @Override
    public EvaporativePad modulating() {
        return new EvaporativePad(effectiveness, airFlowM3s, fanW, bleedPct, Control.MODULATING);
    }

    @Override
    public boolean startsAtSetting() {
        return false;
    }

    @Override
    public boolean holdsBand() {
        return false;
    }

    @Override
    public double mostElectricW() {
        return fanW;
    }

    @Override
    public <R> R match(Kinds<R> kinds) {
        return kinds.evaporativePad(this);
    }
}
