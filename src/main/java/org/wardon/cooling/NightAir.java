package org.wardon.cooling;

import java.util.Optional;
import org.wardon.errors.Require;

/**
 * A fan that blows outdoor air in while it is colder than the chamber, chamber air pushed out for
 * it. The fan sits in the inlet: all its heat goes into the supply air.
 *
 * @param airFlowM3s air the fan moves, outdoor state, m3/s
 * @param fanW its fan, W
 * @param differenceK outdoor air colder than the chamber's by at least this, K
 * @param lowestC no outdoor air colder than this, °C
 * @param lowestHumidityPct no outdoor air drier than this once it has come to the chamber's
 *     temperature, percent; 0 for no bound
 * @param highestHumidityPct none damper than this, likewise; 100 for no bound
 * @param control thermostat on and off, or a fan that follows the air within the band
 */
public record NightAir(
        double airFlowM3s,
        double fanW,
        double differenceK,
        double lowestC,
        double lowestHumidityPct,
        double highestHumidityPct,
        Control control)
        implements Cooler {
    /** Checks the bounds. */
    public NightAir {
        Require.within("airFlowM3s", airFlowM3s, 0.001, 500, "m3/s", "");
        Require.within("fanW", fanW, 0, 50_000, "W", "");
        Require.within("differenceK", differenceK, 0, 20, "K", "");
        Require.within("lowestC", lowestC, -30, 30, "°C", "");
        Require.within("lowestHumidityPct", lowestHumidityPct, 0, 100, "%", "");
        Require.within("highestHumidityPct", highestHumidityPct, 0, 100, "%", "");
        Require.that(
                lowestHumidityPct <= highestHumidityPct,
                "lowestHumidityPct is "
                        + lowestHumidityPct
                        + " %, above highestHumidityPct "
                        + highestHumidityPct
                        + " %; accepted: up to that");
    }

    @Override
    public String kind() {
        return "night-air";
    }

    @Override
    public NightAirLaw law(double pressurePa) {
        return new NightAirLaw(this, pressurePa);
    }

    @Override
    public Optional<Following> following() {
        return Optional.of(Following.ofFan(control));
    }

    /** More air; the power of the fan stays. */
    @Override
    public NightAir sized(double factor) {
        return copy(airFlowM3s * factor, control);
    }

    @Override
    public NightAir modulating() {
        return copy(airFlowM3s, Control.MODULATING);
    }

    private NightAir copy(double flowM3s, Control other) {
        return new NightAir(
                flowM3s, fanW, differenceK, lowestC, lowestHumidityPct, highestHumidityPct, other);
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
        return kinds.nightAir(this);
    }
}
