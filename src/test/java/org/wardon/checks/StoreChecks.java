package org.wardon.checks;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.Map;
import java.util.TreeMap;
import java.util.function.ToDoubleFunction;
import org.wardon.advice.size.DesignLoad;
import org.wardon.advice.size.LoadTerms;
import org.wardon.air.MoistAir;
import org.wardon.cooling.CarnotShare;
import org.wardon.cooling.Ice;
import org.wardon.enclosure.DoorExchange;
import org.wardon.enclosure.GasLevel;
import org.wardon.enclosure.Leakage;
import org.wardon.enclosure.LumpedChamber;
import org.wardon.enclosure.PeopleHeat;
import org.wardon.enclosure.TammExchange;
import org.wardon.enclosure.UValue;

/** How rows of doors, leakage, coolers, outages and gases are answered. */
final class StoreChecks {
    private static final double KILOCALORIE_J = 4_186.8;

    private StoreChecks() {}

    static Map<String, ToDoubleFunction<CheckRow>> laws() {
        Map<String, ToDoubleFunction<CheckRow>> laws = new TreeMap<>();
        laws.put("gosney_q_", r -> doorFlow(r) * (enthalpyOut(r) - enthalpyRoom(r)));
        laws.put("gosney_V_", r -> doorFlow(r) / density(r, "T_room_C", "RH_room"));
        laws.put(
                "pham_oliver_V",
                r ->
                        r.d("factor")
                                * TammExchange.flowM3s(
                                        density(r, "T_room_C", "RH_room"),
                                        density(r, "T_out_C", "RH_out"),
                                        r.d("A_m2") / r.d("H_m"),
                                        r.d("H_m")));
        laws.put(
                "doorway_time_factor",
                r ->
                        DoorExchange.timeFactor(
                                r.d("passages"),
                                r.d("seconds_per_passage"),
                                r.d("minutes_open"),
                                r.d("period_h")));
        laws.put(
                "doorway_average_load",
                r -> r.d("q_full_W") * r.d("Dt") * DoorExchange.share(r.d("Df"), r.d("E")));
        laws.put(
                "fao340_air",
                r ->
                        Leakage.leakM3s(r.d("changes_per_day"), r.d("volume_m3"))
                                * r.d("kcal_per_m3")
                                * KILOCALORIE_J);
        laws.put(
                "fao340_air_enthalpy",
                r ->
                        (enthalpyOut(r) - enthalpyRoom(r))
                                / MoistAir.specificVolumeM3kg(
                                        r.d("T_room_C"), humidity(r, "T_room_C", "RH_room"), P));
        laws.put(
                "fao340_product",
                r ->
                        LoadTerms.product(
                                        "fish",
                                        r.d("kg_per_day"),
                                        r.d("kg_per_day") * r.d("kcal_per_kg") * KILOCALORIE_J,
                                        24)
                                .meanW());
        laws.put("fao340_first_six", r -> firstSix(r).meanW());
        laws.put("person_", r -> PeopleHeat.watts(r.d("T_C")));
        laws.put("carnot_", r -> CarnotShare.cop(r.d("Te_C"), r.d("Tc_C"), 1));
        laws.put("cop_", r -> CarnotShare.cop(r.d("Te_C"), r.d("Tc_C"), r.d("eta2")));
        laws.put(
                "ice_hours",
                r -> Ice.lastsS(r.d("ice_kg"), r.d("L_kJ_kg") * 1e3, r.d("load_W")) / 3_600);
        laws.put(
                "ice_melt_box",
                r ->
                        Ice.meltsKgS(
                                        UValue.flowW(r.d("U"), r.d("area_m2"), r.d("dT_K")),
                                        r.d("L_kcal_kg") * KILOCALORIE_J)
                                * 86_400);
        laws.put(
                "ice_growth_",
                r ->
                        Ice.growsS(
                                        r.d("thickness_m"),
                                        r.d("dT_K"),
                                        r.d("k"),
                                        r.d("rho"),
                                        r.d("L_J_kg"))
                                / 3_600);
        laws.put("outage_T_", r -> lump(r).temperatureC(r.d("T0_C"), r.d("time_h") * 3_600));
        laws.put("outage_time_to_", r -> lump(r).timeToS(r.d("T0_C"), r.d("T_limit_C")) / 3_600);
        laws.put("co2_rate", StoreChecks::carbonDioxide);
        laws.put("co2_steady", r -> level(r).restsAtPpm());
        laws.put("co2_after_", r -> level(r).afterPpm(r.d("start_ppm"), r.d("time_h")));
        laws.put("co2_time_to_", r -> level(r).timeToH(r.d("start_ppm"), r.d("limit_ppm")));
        laws.put(
                "co2_ach_for_",
                r ->
                        GasLevel.airChangesToHold(
                                carbonDioxide(r), r.d("limit_ppm"), r.d("outdoor_ppm")));
        return laws;
    }

    private static final double P = 101_325;

    /**
     * The printed figures behind the six items, worked out as terms; the sum of the row is that of
     * the kilocalories printed for each.
     */
    private static DesignLoad firstSix(CheckRow r) {
        DesignLoad load = FishStore.firstSix();
        for (int i = 0; i < load.terms().size(); i++) {
            double printedW =
                    r.inputs().get("items_kcal_h").get(i).asDouble() * KILOCALORIE_J / 3_600;
            assertEquals(printedW, load.terms().get(i).meanW(), 0.002 * printedW, "item " + i);
        }
        return load;
    }

    private static double pressure(CheckRow r) {
        return r.has("elevation_m") ? MoistAirChecks.pressure(r) : P;
    }

    private static double humidity(CheckRow r, String temperature, String humidity) {
        return MoistAir.humidityRatioAt(r.d(temperature), r.d(humidity), pressure(r));
    }

    private static double density(CheckRow r, String temperature, String humidity) {
        return MoistAir.densityKgM3(
                r.d(temperature), humidity(r, temperature, humidity), pressure(r));
    }

    private static double enthalpyOut(CheckRow r) {
        return MoistAir.enthalpyJkg(r.d("T_out_C"), humidity(r, "T_out_C", "RH_out"));
    }

    private static double enthalpyRoom(CheckRow r) {
        return MoistAir.enthalpyJkg(r.d("T_room_C"), humidity(r, "T_room_C", "RH_room"));
    }

    private static double doorFlow(CheckRow r) {
        return DoorExchange.flowKgS(
                density(r, "T_room_C", "RH_room"),
                density(r, "T_out_C", "RH_out"),
                r.d("A_m2") / r.d("H_m"),
                r.d("H_m"));
    }

    private static LumpedChamber lump(CheckRow r) {
        return new LumpedChamber(r.d("UA_W_K"), r.d("C_J_K"), r.d("internal_W"), r.d("T_amb_C"));
    }

    private static double carbonDioxide(CheckRow r) {
        return GasLevel.carbonDioxidePpmH(
                r.d("mass_kg"),
                r.d("respiration_mg_kg_h"),
                r.d("free_volume_m3"),
                r.d("T_C"),
                r.d("p_Pa"));
    }

    private static GasLevel level(CheckRow r) {
        return new GasLevel(carbonDioxide(r), r.d("ach_per_h"), r.d("outdoor_ppm"));
    }
}
