package org.wardon.plan;

import java.util.List;
import org.wardon.enclosure.FaceName;

/** Every value that stands in where a plan is silent, with what it rests on. */
public final class Defaults {
    /** Mark of a figure of the trade that nobody printed. */
    public static final String COMMON_PRACTICE = "common practice, no source";

    /** Mark of a figure that is ours. */
    public static final String ASSUMPTION = "assumption";

    /** Height above the sea. */
    public static final Default ELEVATION_M = new Default(0, "m", ASSUMPTION);

    /** Door openings. */
    public static final Default OPENINGS_PER_DAY = new Default(20, "1/day", COMMON_PRACTICE);

    /** How long the door stands open each time. */
    public static final Default SECONDS_OPEN = new Default(60, "s", COMMON_PRACTICE);

    /** First hour the door is used. */
    public static final String DOOR_FROM = "07:00";

    /** Last hour the door is used. */
    public static final String DOOR_TO = "19:00";

    /** A door with nothing before it. */
    public static final String DOOR_PROTECTION = "open-unprotected";

    /** Leakage of a chamber of sandwich panel or other insulated, closed build. */
    public static final Default LEAKAGE_PANEL = new Default(2, "1/day", COMMON_PRACTICE);

    /** Leakage of a chamber of masonry or earth. */
    public static final Default LEAKAGE_MASONRY = new Default(10, "1/day", COMMON_PRACTICE);

    /** Leakage of a chamber of straw, thatch, bamboo or other loose build. */
    public static final Default LEAKAGE_LOOSE = new Default(30, "1/day", COMMON_PRACTICE);

    /**
     * Heat capacity of racks, pallets and coil a square metre of floor: 15 kg of steel and 5 kg of
     * wood.
     */
    public static final Default STRUCTURE_J_M2K = new Default(15_000, "J/(m2 K)", ASSUMPTION);

    /** Uplift of the heat flow through all faces. */
    public static final Default THERMAL_BRIDGE_PCT = new Default(10, "%", COMMON_PRACTICE);

    /** Share of a chamber's length that is its door end, where its air is two. */
    public static final Default DOOR_END_SHARE = new Default(0.5, "", ASSUMPTION);

    /** End wall of the door end. */
    public static final String DOOR_END = "east";

    /** What the ends of a chamber change where no exchange is given. */
    public static final String ENDS_EXCHANGE =
            "half of what fans move; at rest by density, as through an opening of the whole section";

    /** Conductivity of the foam core of a panel some years old. */
    public static final Default AGED_PANEL_CONDUCTIVITY =
            new Default(0.028, "W/(m K)", COMMON_PRACTICE);

    /** Sunlight taken up by a face of which nothing is known. */
    public static final Default SOLAR_ABSORPTANCE = new Default(0.6, "1", ASSUMPTION);

    /** Produce a gross cubic metre. */
    public static final Default STOWAGE_KG_M3 = new Default(150, "kg/m3", COMMON_PRACTICE);

    /** Half width of the band of the thermostat. */
    public static final Default BAND_K = new Default(1, "K", ASSUMPTION);

    /** Humidity wished for. */
    public static final Default HUMIDITY_PCT = new Default(90, "%", ASSUMPTION);

    /** Air onto the coil at the rated point. */
    public static final Default RATED_AIR_C = new Default(10, "°C", ASSUMPTION);

    /** Air onto the condenser at the rated point. */
    public static final Default RATED_OUTDOOR_C = new Default(35, "°C", ASSUMPTION);

    /** Share of the Carnot efficiency a small unit reaches. */
    public static final Default CARNOT_FRACTION = new Default(0.45, "1", "CARNOT-PAGE");

    /** Condensing above the air onto an air-cooled condenser. */
    public static final Default CONDENSING_APPROACH_K =
            new Default(12, "K", "from memory of ASHRAE-R");

    /** Air onto the coil above evaporating, for 80 to 85 % humidity. */
    public static final Default EVAPORATING_TD_K = new Default(6, "K", "HOLDER");

    /** Fan of the air cooler as a share of the rated capacity. */
    public static final Default FAN_SHARE = new Default(0.04, "1", ASSUMPTION);

    /** How far the air cools through the coil at the rated point. */
    public static final Default AIR_DROP_K = new Default(5, "K", ASSUMPTION);

    /** Shortest run of a compressor. */
    public static final Default MIN_RUN_MINUTES = new Default(2, "min", COMMON_PRACTICE);

    /** Shortest rest of a compressor. */
    public static final Default MIN_REST_MINUTES = new Default(3, "min", COMMON_PRACTICE);

    /** Air onto the condenser above outdoors, open yard. */
    public static final Default CONDENSER_RISE_K = new Default(3, "K", COMMON_PRACTICE);

    /** Lowest temperature the control of a cold-room unit can be set to. */
    public static final Default LOWEST_C = new Default(-30, "°C", ASSUMPTION);

    /**
     * Saturation effectiveness of a pad.
     *
     * <p>Source: {@code cooling-sources.csv}, row saturation_effectiveness, 0.7 to 0.95.
     */
    public static final Default PAD_EFFECTIVENESS = new Default(0.8, "1", "WANG-CRC");

    /**
     * Outdoor air blown in for a tonne the chamber takes.
     *
     * <p>Source: {@code cooling-sources.csv}, row air_circulation_potato: air asked for a tonne
     * while loading and cooling down.
     */
    public static final Default AIR_M3_H_T = new Default(85, "m3/(h t)", "NHB2010");

    /** Power of a fan for each m3/s it blows in: 50 Pa with a fifth of the power in the air. */
    public static final Default FAN_W_PER_M3S = new Default(250, "W per m3/s", ASSUMPTION);

    /**
     * How much colder outdoor air must be than the chamber for a fan to run.
     *
     * <p>Source: {@code cooling-sources.csv}, row rule of night_ventilation, 1 to 3 K.
     */
    public static final Default DIFFERENCE_K = new Default(2, "K", "from memory of ASHRAE-F");

    /** Coldest outdoor air let in. */
    public static final Default LOWEST_INTAKE_C = new Default(0, "°C", ASSUMPTION);

    /** Share of the inner side of a wetted wall that is damp. */
    public static final Default INNER_DAMP_FRACTION = new Default(0.5, "1", ASSUMPTION);

    /** Hours at which the water of a wetted wall is poured, in equal parts. */
    public static final List<String> POURED_AT = List.of("07:00", "17:00");

    /** What those hours rest on: {@code cooling-sources.csv}, row watering, 1 to 3 times a day. */
    public static final String POURED_AT_MARK = "ECC-ENERGYPEDIA; assumption for the hours";

    /** Power of a pump for each kilogram a second: 8 m of head at an efficiency of 0.3. */
    public static final Default PUMP_W_PER_KG_S = new Default(260, "W s/kg", ASSUMPTION);

    /** Thickness of the water in a jacket. */
    public static final Default JACKET_GAP_MM = new Default(10, "mm", ASSUMPTION);

    /**
     * Melting point of ice.
     *
     * <p>Source: {@code cooling-sources.csv}, row latent_heat_ice.
     */
    public static final Default MELT_C = new Default(0, "°C", "ICE-NOTE");

    /** Heat of melting of ice: ASHRAE Handbook - Fundamentals, chapter 1, table 3. */
    public static final Default LATENT_KJ_KG =
            new Default(333.5, "kJ/kg", "from memory of ASHRAE-F");

    /** Hour from which ice is made again. */
    public static final String RECHARGE_FROM = "22:00";

    /** Hour until which ice is made again. */
    public static final String RECHARGE_TO = "06:00";

    /** Days a lot is wanted in the chamber. */
    public static final Default WANTED_DAYS = new Default(7, "day", ASSUMPTION);

    /** From leaving the store to the buyer. */
    public static final Default MARKET_DAYS = new Default(2, "day", COMMON_PRACTICE);

    /** A lot without a price counts its kilograms. */
    public static final Default PRICE_PER_KG = new Default(1, "1/kg", ASSUMPTION);

    /** Energy without a price costs nothing. */
    public static final Default ENERGY_PRICE_PER_KWH = new Default(0, "1/kWh", ASSUMPTION);

    /** Ethylene of outdoor air. */
    public static final Default OUTDOOR_ETHYLENE_PPM = new Default(0.01, "ppm", ASSUMPTION);

    /** Ethylene in a market building. */
    public static final Default MARKET_ETHYLENE_PPM = new Default(0.06, "ppm", ASSUMPTION);

    /** Share of the ethylene a scrubber takes at a pass. */
    public static final Default SCRUB_EFFICIENCY_PCT = new Default(80, "%", ASSUMPTION);

    /** The package of a lot whose package nobody gave: any package in a room with fans. */
    public static final String PACKAGE = "room-cooling-any";

    /** Number the draws start from. */
    public static final long SEED = 1;

    private static final List<String> LOOSE = List.of("straw", "thatch", "bamboo");
    private static final double INSULATES_BELOW_WMK = 0.06;
    private static final double ZERO_C_IN_K = 273.15;
    private static final double LEAST_INTAKE_M3S = 0.001;
    private static final double AIR_HEAT_J_M3K = 1.2 * 1006;

    private Defaults() {}

    /**
     * Returns whether a material makes a loose, leaky wall (assumption).
     *
     * @param materialId its id
     * @return true for straw, thatch and bamboo
     */
    public static boolean looseBuild(String materialId) {
        return LOOSE.stream().anyMatch(materialId::contains);
    }

    /**
     * Returns whether a layer makes its wall an insulated, closed one (assumption).
     *
     * @param conductivityWmK its conductivity, W/(m K)
     * @return true below 0.06
     */
    public static boolean insulates(double conductivityWmK) {
        return conductivityWmK < INSULATES_BELOW_WMK;
    }

    /**
     * Returns the compass direction a face looks to.
     *
     * @param face the face
     * @return degrees from north by east; 0 for roof and floor
     */
    public static double azimuthDeg(FaceName face) {
        return switch (face) {
            case ROOF, FLOOR, NORTH -> 0;
            case EAST -> 90;
            case SOUTH -> 180;
            case WEST -> 270;
        };
    }

    /**
     * Returns the tilt of a face.
     *
     * @param face the face
     * @return degrees from level: 0 for roof and floor, 90 for walls
     */
    public static double tiltDeg(FaceName face) {
        return face == FaceName.ROOF || face == FaceName.FLOOR ? 0 : 90;
    }

    /**
     * Returns the electric power of a compressor at its rated point: capacity over a share of the
     * Carnot coefficient of performance.
     *
     * <p>Source: {@code cooling-sources.csv}, rows cop_carnot_fraction, condensing_approach,
     * evap_td_mid_rh.
     *
     * @param ratedCapacityW total heat taken at the rated point, W
     * @param ratedAirC air onto the coil, °C
     * @param ratedOutdoorC air onto the condenser, °C
     * @return W, at most the capacity
     */
    public static double ratedPowerW(
            double ratedCapacityW, double ratedAirC, double ratedOutdoorC) {
        double evaporatingK = ratedAirC - EVAPORATING_TD_K.value() + ZERO_C_IN_K;
        double condensingK = ratedOutdoorC + CONDENSING_APPROACH_K.value() + ZERO_C_IN_K;
        double liftK = Math.max(condensingK - evaporatingK, 1);
        double cop = CARNOT_FRACTION.value() * evaporatingK / liftK;
        return ratedCapacityW / Math.max(cop, 1);
    }

    /**
     * Returns the conductance of a coil that moves the rated capacity at the usual difference
     * between air and evaporation.
     *
     * <p>Source: {@code cooling-sources.csv}, rows coil_capacity (from memory of ASHRAE
     * Refrigeration) and evap_td_mid_rh.
     *
     * @param ratedCapacityW total heat taken at the rated point, W
     * @return W/K
     */
    public static double coilUaWK(double ratedCapacityW) {
        return ratedCapacityW / EVAPORATING_TD_K.value();
    }

    /**
     * Returns the electric power of a machine that makes ice, at 35 °C outdoors: by the same share
     * of Carnot as a compressor, evaporating as far below the melting point as a coil below air.
     *
     * @param coldW heat it takes out of the ice, W
     * @param meltC melting point, °C
     * @return W
     */
    public static double rechargePowerW(double coldW, double meltC) {
        return ratedPowerW(coldW, meltC, RATED_OUTDOOR_C.value());
    }

    /**
     * Returns the outdoor air blown into a chamber by what it takes.
     *
     * @param capacityKg most produce it takes, kg
     * @return m3/s
     */
    public static double intakeM3s(double capacityKg) {
        return Math.max(AIR_M3_H_T.value() * capacityKg / 1_000 / 3_600, LEAST_INTAKE_M3S);
    }

    /**
     * Returns the air through the coil that takes the rated capacity with a drop of 5 K
     * (assumption).
     *
     * @param ratedCapacityW total heat taken at the rated point, W
     * @return m3/s
     */
    public static double airFlowM3s(double ratedCapacityW) {
        return ratedCapacityW / (AIR_HEAT_J_M3K * AIR_DROP_K.value());
    }
}
