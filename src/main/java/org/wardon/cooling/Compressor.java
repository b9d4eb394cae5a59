package org.wardon.cooling;

import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.errors.Require;

/**
 * A vapour-compression unit with an air cooler in the chamber.
 *
 * @param ratedCapacityW total heat taken at the rated point, W
 * @param ratedPowerW electric power of the compressor at the rated point, W
 * @param ratedAirC air onto the coil at the rated point, °C
 * @param ratedOutdoorC air onto the condenser at the rated point, °C
 * @param fanW fan of the air cooler, W
 * @param fanAlways whether the fan runs while the compressor rests
 * @param coilUaWK conductance of the coil, dry, W/K
 * @param airFlowM3s air through the coil, m3/s
 * @param control thermostat on and off, or capacity that follows the load
 * @param minRunMinutes shortest run, min
 * @param minRestMinutes shortest rest, min
 * @param condenserRiseK air onto the condenser above outdoors, K
 * @param lowestC lowest temperature the control of the unit can be set to, °C
 * @param defrost defrost, where there is one
 * @param dailyEnergyKWh energy a day that the supply can give, kWh
 */
public record Compressor(
        double ratedCapacityW,
        double ratedPowerW,
        double ratedAirC,
        double ratedOutdoorC,
        double fanW,
        boolean fanAlways,
        double coilUaWK,
        double airFlowM3s,
        Control control,
        double minRunMinutes,
        double minRestMinutes,
        double condenserRiseK,
        double lowestC,
        Optional<Defrost> defrost,
        OptionalDouble dailyEnergyKWh)
        implements Cooler {
    private static final double SECONDS = 60;

    /** Power over the rated one with the warmest air (assumption). */
    private static final double WARM_START = 1.5;

    /** Checks the bounds. */
    public Compressor {
        Require.within("ratedCapacityW", ratedCapacityW, 50, 1_000_000, "W", "");
        Require.within("ratedPowerW", ratedPowerW, 10, 1_000_000, "W", "");
        Require.within("ratedAirC", ratedAirC, -30, 35, "°C", "");
        Require.within("ratedOutdoorC", ratedOutdoorC, -10, 55, "°C", "");
        Require.within("fanW", fanW, 0, 50_000, "W", "");
        Require.within("coilUaWK", coilUaWK, 1, 1_000_000, "W/K", "");
        Require.within("airFlowM3s", airFlowM3s, 0.005, 500, "m3/s", "");
        Require.within("minRunMinutes", minRunMinutes, 0, 120, "min", "");
        Require.within("minRestMinutes", minRestMinutes, 0, 120, "min", "");
        Require.within("condenserRiseK", condenserRiseK, 0, 30, "K", "");
        Require.within("lowestC", lowestC, -40, 30, "°C", "");
        if (dailyEnergyKWh.isPresent()) {
            Require.within("dailyEnergyKWh", dailyEnergyKWh.getAsDouble(), 0, 100_000, "kWh", "");
        }
    }

    @Override
    public String kind() {
        return "compressor";
    }

    @Override
    public CompressorLaw law(double pressurePa) {
        return new CompressorLaw(this, pressurePa);
    }

    @Override
    public Optional<Following> following() {
        return Optional.of(
                new Following(
                        control,
                        lowestC,
                        SECONDS * minRunMinutes,
                        SECONDS * minRestMinutes,
                        fanAlways ? fanW : 0));
    }

    /** Capacity, coil and air flow together: the same unit, larger; power stays. */
    @Override
    public Compressor sized(double factor) {
        return copy(factor, control);
    }

    @Override
    public Compressor modulating() {
        return copy(1, Control.MODULATING);
    }

    private Compressor copy(double factor, Control other) {
        return new Compressor(
                ratedCapacityW * factor,
                ratedPowerW,
                ratedAirC,
                ratedOutdoorC,
                fanW,
                fanAlways,
                coilUaWK * factor,
                airFlowM3s * factor,
                other,
                minRunMinutes,
                minRestMinutes,
                condenserRiseK,
                lowestC,
                defrost,
                dailyEnergyKWh);
    }

    /** Its capacity and power less the share of time it rests; coil and fan stay. */
    @Override
    public Compressor withDefrostSpread() {
        double share = defrost.map(Defrost::share).orElse(0.0);
        return defrost.isEmpty()
                ? this
                : new Compressor(
                        ratedCapacityW * (1 - share),
                        ratedPowerW * (1 - share),
                        ratedAirC,
                        ratedOutdoorC,
                        fanW,
                        fanAlways,
                        coilUaWK,
                        airFlowM3s,
                        control,
                        minRunMinutes,
                        minRestMinutes,
                        condenserRiseK,
                        lowestC,
                        Optional.empty(),
                        dailyEnergyKWh);
    }

    @Override
    public boolean actsInRoom() {
        return true;
    }

    @Override
    public double circulatesM3s() {
        return airFlowM3s;
    }

    @Override
    public boolean startsAtSetting() {
        return true;
    }

    @Override
    public boolean holdsBand() {
        return true;
    }

    /** A warm start draws more than the rated point. */
    @Override
    public double mostElectricW() {
        return WARM_START * ratedPowerW + fanW;
    }

    @Override
    public <R> R match(Kinds<R> kinds) {
        return kinds.compressor(this);
    }
}
