package org.wardon.checks;

import java.util.Map;
import java.util.TreeMap;
import java.util.function.ToDoubleFunction;
import org.wardon.cooling.water.FallingFilm;
import org.wardon.enclosure.NaturalConvection;
import org.wardon.enclosure.NaturalConvection.Gas;
import org.wardon.enclosure.UValue;

/** How rows of natural convection and falling films are answered. */
final class ConvectionChecks {
    private ConvectionChecks() {}

    static Map<String, ToDoubleFunction<CheckRow>> laws() {
        Map<String, ToDoubleFunction<CheckRow>> laws = new TreeMap<>();
        laws.put("incropera_glass_door_Ra", r -> rayleigh(r, r.d("L_m")));
        laws.put(
                "incropera_glass_door_Nu",
                r -> NaturalConvection.wallNusselt(r.d("Ra"), r.d("Pr")));
        laws.put(
                "incropera_glass_door_q",
                r -> UValue.flowW(r.d("h"), r.d("height_m") * r.d("width_m"), r.d("dT_K")));
        laws.put("churchill_chu_Nu_", ConvectionChecks::wallNusselt);
        laws.put("churchill_chu_h_", r -> wallNusselt(r) * r.d("k") / r.d("L_m"));
        laws.put(
                "cold_ceiling_h",
                r -> {
                    double length = r.d("area_m2") / r.d("perimeter_m");
                    return NaturalConvection.stirringNusselt(rayleigh(r, length))
                            * r.d("k")
                            / length;
                });
        laws.put(
                "cold_floor_h",
                r -> {
                    double length = r.d("area_m2") / r.d("perimeter_m");
                    return NaturalConvection.restingNusselt(rayleigh(r, length))
                            * r.d("k")
                            / length;
                });
        laws.put(
                "bsl_film_rate",
                r -> film(r.d("rho"), r.d("nu_m2_s") * r.d("rho")).flowKgMs(r.d("delta_m"), 90));
        laws.put("bsl_film_Re", r -> film(1_000, r.d("mu")).reynolds(r.d("Gamma")));
        laws.put(
                "film_thickness_",
                r -> 1_000 * film(r).thicknessM(r.d("Gamma_kg_m_s"), r.d("slope_deg")));
        laws.put("film_Re_", r -> film(r).reynolds(r.d("Gamma_kg_m_s")));
        laws.put("film_velocity_", r -> film(r).velocityMs(r.d("Gamma_kg_m_s"), r.d("slope_deg")));
        laws.put("film_h_188_", r -> film(r).smoothWm2K(r.d("Gamma_kg_m_s"), r.d("slope_deg")));
        laws.put("film_chun_seban_", r -> film(r).wavyWm2K(r.d("Gamma_kg_m_s")));
        return laws;
    }

    private static double rayleigh(CheckRow r, double lengthM) {
        double k = r.has("k") ? r.d("k") : 0.025;
        Gas gas = new Gas(k, r.d("nu"), r.d("alpha"), r.d("beta"));
        return NaturalConvection.rayleigh(r.d("dT_K"), lengthM, gas, r.d("g"));
    }

    private static double wallNusselt(CheckRow r) {
        return NaturalConvection.wallNusselt(rayleigh(r, r.d("L_m")), r.d("Pr"));
    }

    private static FallingFilm film(CheckRow r) {
        return new FallingFilm(r.d("rho"), r.d("mu"), r.has("k") ? r.d("k") : 0.565);
    }

    private static FallingFilm film(double densityKgM3, double viscosityPas) {
        return new FallingFilm(densityKgM3, viscosityPas, 0.14);
    }
}
