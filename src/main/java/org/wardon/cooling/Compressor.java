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
    /** How capacity follows the thermostat. */
    public enum Control {
        /** On above setting + band, off below setting - band. */
        ON_OFF,
        /** Capacity follows the air temperature within the band. */
        MODULATING
    }

    /**
     * A timed defrost.
     *
     * @param everyHours time between starts, h
     * @param minutes how long, min
     * @param heaterW heat given to the coil, W; 0 for defrost by air
     */
    public record Defrost(double everyHours, double minutes, double heaterW) {
        /** Checks the bounds. */
        public Defrost {
            Require.within("defrost.everyHours", everyHours, 1, 168, "h", "");
            Require.within("defrost.minutes", minutes, 1, 120, "min", "");
            Require.within("defrost.heaterW", heaterW, 0, 100_000, "W", "");
        }
    }

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
}
