package org.wardon.cooling;

import java.util.Optional;
import org.wardon.errors.Require;

/**
 * Ice, or another material that melts, over which the chamber's air passes through a damper or by a
 * fan. Its melt stays at the melting point and freezes again where there is a machine for it.
 *
 * <p>A bank with a fan stands still without power; one without a fan goes on cooling, its damper
 * moved by the thermostat alone. The fan runs by the thermostat, whether there is ice or not, and
 * its heat goes into the chamber's air.
 *
 * @param iceKg ice when full, kg
 * @param startIceKg ice at the start, kg, no more
 * @param material what melts
 * @param uaWK conductance from the chamber's air to the melting surface, W/K
 * @param fanW its fan, W; 0 for a damper
 * @param recharge the machine that makes its ice again, where there is one
 * @param control thermostat open and shut, or a damper or fan that follows the air within the band
 */
public record IceBank(
        double iceKg,
        double startIceKg,
        Material material,
        double uaWK,
        double fanW,
        Optional<Recharge> recharge,
        Control control)
        implements Cooler {
    /** A warm evening draws more than 35 °C outdoors (assumption). */
    private static final double WARM = 1.5;

    /**
     * What melts.
     *
     * @param meltC melting point, °C
     * @param latentKJkg heat of melting, kJ/kg
     */
    public record Material(double meltC, double latentKJkg) {
        /** Water ice. Source of its heat: {@link org.wardon.air.MoistAir#MELTING_J_KG}. */
        public static final Material ICE = new Material(0, 333.5);

        /** Checks the bounds. */
        public Material {
            Require.within("meltC", meltC, -30, 30, "°C", "");
            Require.within("latentKJkg", latentKJkg, 50, 400, "kJ/kg", "");
        }
    }

    /** Checks the bounds. */
    public IceBank {
        Require.within("iceKg", iceKg, 0.1, 1_000_000, "kg", "");
        Require.within("startIceKg", startIceKg, 0, iceKg, "kg", "No more than iceKg.");
        Require.within("uaWK", uaWK, 0.1, 1_000_000, "W/K", "");
        Require.within("fanW", fanW, 0, 50_000, "W", "");
    }

    @Override
    public String kind() {
        return "ice-bank";
    }

    @Override
    public IceBankLaw law(double pressurePa) {
        return new IceBankLaw(this, pressurePa);
    }

    @Override
    public boolean stirsAir() {
        return fanW > 0;
    }

    @Override
    public Optional<Following> following() {
        return Optional.of(Following.ofFan(control));
    }

    /** More surface to the same ice. */
    @Override
    public IceBank sized(double factor) {
        return copy(uaWK * factor, control);
    }

    @Override
    public IceBank modulating() {
        return copy(uaWK, Control.MODULATING);
    }

    private IceBank copy(double conductance, Control other) {
        return new IceBank(iceKg, startIceKg, material, conductance, fanW, recharge, other);
    }

    @Override
    public boolean actsInRoom() {
        return true;
    }

    @Override
    public boolean startsAtSetting() {
        return true;
    }

    @Override
    public boolean holdsBand() {
        return true;
    }

    @Override
    public double mostElectricW() {
        return fanW + recharge.map(machine -> WARM * machine.powerW()).orElse(0.0);
    }

    @Override
    public boolean needsPower() {
        return fanW > 0;
    }

    @Override
    public Optional<IceBank> ice() {
        return Optional.of(this);
    }

    @Override
    public <R> R match(Kinds<R> kinds) {
        return kinds.iceBank(this);
    }
}
