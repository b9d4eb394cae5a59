package org.wardon.checks;

import java.util.Map;
import java.util.TreeMap;
import java.util.function.ToDoubleFunction;
import org.wardon.air.DailyRadiation;
import org.wardon.air.SolAir;
import org.wardon.air.SunPosition;

/** How rows of the sun are answered. */
final class SunChecks {
    private SunChecks() {}

    static Map<String, ToDoubleFunction<CheckRow>> laws() {
        Map<String, ToDoubleFunction<CheckRow>> laws = new TreeMap<>();
        laws.put("duffie_zenith_", SunChecks::zenith);
        laws.put("duffie_azimuth_", SunChecks::azimuth);
        laws.put("duffie_declination_", r -> SunPosition.declinationDeg(r.d("n")));
        laws.put("kalogirou_altitude_", r -> 90 - zenith(r));
        laws.put(
                "kalogirou_daylength_",
                r -> SunPosition.daylengthH(r.d("latitude"), r.d("declination")));
        laws.put("masters_altitude_", r -> 90 - zenith(r));
        laws.put("masters_azimuth_", SunChecks::azimuth);
        laws.put("ncl_Ra_", SunChecks::extraterrestrial);
        laws.put("fao56_Ra_", SunChecks::extraterrestrial);
        laws.put("ncl_Rso_", r -> DailyRadiation.clearSkyMJ(r.d("Ra"), r.d("as"), r.d("bs")));
        laws.put("fao56_N_", r -> DailyRadiation.daylightH((int) r.d("J"), r.d("latitude")));
        laws.put(
                "sol_air_",
                r ->
                        SolAir.temperatureC(
                                r.d("T_out_C"),
                                r.d("absorptance"),
                                r.d("irradiance_W_m2"),
                                r.d("ho"),
                                r.d("longwave_K")));
        return laws;
    }

    private static double zenith(CheckRow r) {
        return SunPosition.zenithDeg(r.d("latitude"), r.d("declination"), r.d("solar_time_h"));
    }

    private static double azimuth(CheckRow r) {
        return SunPosition.azimuthDeg(r.d("latitude"), r.d("declination"), r.d("solar_time_h"));
    }

    private static double extraterrestrial(CheckRow r) {
        return DailyRadiation.extraterrestrialMJ((int) r.d("J"), r.d("latitude"));
    }
}
