package org.wardon.checks;

import java.util.Map;
import java.util.TreeMap;
import java.util.function.ToDoubleFunction;
import org.wardon.air.MoistAir;
import org.wardon.air.SaturatedAir;
import org.wardon.air.StandardAtmosphere;
import org.wardon.air.WetBulb;
import org.wardon.cooling.PadOutlet;

/** How rows of moist air and of pads are answered. */
final class MoistAirChecks {
    private MoistAirChecks() {}

    static Map<String, ToDoubleFunction<CheckRow>> laws() {
        Map<String, ToDoubleFunction<CheckRow>> laws = new TreeMap<>();
        laws.put("psat_", r -> SaturatedAir.pressurePa(r.d("T_C")));
        laws.put("patm_", r -> StandardAtmosphere.pressurePa(r.d("elevation_m")));
        for (String from : new String[] {"moist_", "ashrae_ex_", "ashrae_tab_", "sheet3_v_"}) {
            laws.put(from, MoistAirChecks::ofState);
        }
        laws.put("fao56_ex4_pv", r -> MoistAir.vapourPressurePa(humidityRatio(r), pressure(r)));
        laws.put("pad_", MoistAirChecks::ofPad);
        return laws;
    }

    static double pressure(CheckRow r) {
        return r.has("p_Pa") ? r.d("p_Pa") : StandardAtmosphere.pressurePa(r.d("elevation_m"));
    }

    private static double humidityRatio(CheckRow r) {
        return r.has("RH")
                ? MoistAir.humidityRatioAt(r.d("T_C"), r.d("RH"), pressure(r))
                : WetBulb.humidityRatio(r.d("T_C"), r.d("Twb_C"), pressure(r));
    }

    /** The property stands in the name, between underscores. */
    private static double ofState(CheckRow r) {
        double t = r.d("T_C");
        double p = pressure(r);
        double w = humidityRatio(r);
        String property =
                r.name().replaceFirst("^(moist|ashrae_ex|ashrae_tab|sheet3)_", "").split("_")[0];
        return switch (property) {
            case "W", "Ws" -> w;
            case "h", "hs" -> MoistAir.enthalpyJkg(t, w);
            case "v" -> MoistAir.specificVolumeM3kg(t, w, p);
            case "rho" -> MoistAir.densityKgM3(t, w, p);
            case "tdp" -> MoistAir.dewPointC(w, p);
            case "twb" -> WetBulb.temperatureC(t, w, p);
            case "vpd" -> SaturatedAir.pressurePa(t) - MoistAir.vapourPressurePa(w, p);
            case "RH" -> MoistAir.humidityFraction(t, w, p);
            default -> throw new IllegalArgumentException("no property " + property);
        };
    }

    private static double ofPad(CheckRow r) {
        double p = pressure(r);
        double w = MoistAir.humidityRatioAt(r.d("T1_C"), r.d("RH1"), p);
        PadOutlet out = PadOutlet.of(r.d("T1_C"), w, r.d("eps"), p);
        if (r.name().endsWith("_T2")) {
            return out.temperatureC();
        }
        return r.name().endsWith("_RH2")
                ? MoistAir.humidityFraction(out.temperatureC(), out.humidityRatio(), p)
                : out.waterKgKg() * r.d("m_air_kg_s") * 3_600;
    }
}
