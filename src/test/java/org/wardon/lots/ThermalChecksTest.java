package org.wardon.lots;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.fail;

import java.nio.file.Path;
import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;
import org.wardon.CheckRow;
import org.wardon.Source;
import org.wardon.air.SaturatedAir;
import org.wardon.enclosure.Leakage;
import org.wardon.enclosure.UValue;
import org.wardon.produce.Evidence;
import org.wardon.produce.Fact;
import org.wardon.produce.rows.CompositionRow;
import org.wardon.produce.rows.RespirationPower;
import tools.jackson.databind.JsonNode;

/**
 * Every row of checks-thermal.csv against the part that answers it, in the file's own tolerance.
 */
class ThermalChecksTest {
    private static final double DAY_S = 86_400;
    private static final double HOUR_S = 3_600;

    @Source("checks-thermal.csv; each row's source stands in the name of its test")
    @TestFactory
    Stream<DynamicTest> answersEveryRow() {
        return CheckRow.of("checks-thermal.csv").stream()
                .map(row -> row.answeredBy(ThermalChecksTest::answer));
    }

    @Test
    void runsAllRowsOfTheFile() {
        assertEquals(75, CheckRow.of("checks-thermal.csv").size());
    }

    private static double answer(CheckRow row) {
        String name = row.name();
        if (name.matches("(first|f-factor|j-centre).*")) {
            return ofSeries(row);
        }
        if (name.matches("(potato|apple-(centre|surface|heat|in)|quenched|lumped).*")) {
            return ofBody(row);
        }
        if (name.matches("(choi|specific|latent|apple).*")) {
            return ofTissue(row);
        }
        if (name.startsWith("respiration")) {
            return ofBreath(row);
        }
        if (name.startsWith("q10")) {
            return ofQ10(row);
        }
        if (name.matches("(transpiration|air-film).*")) {
            return ofWater(row);
        }
        return ofTheRest(row);
    }

    private static double ofSeries(CheckRow row) {
        Shape shape = Shape.valueOf(row.word("shape").toUpperCase(Locale.ROOT));
        double biot = Double.POSITIVE_INFINITY;
        for (String key : new String[] {"biot_h_r_over_k", "biot"}) {
            JsonNode given = row.inputs().get(key);
            if (given != null && given.isNumber()) {
                biot = given.asDouble();
            }
        }
        SeriesSolution series = SeriesSolution.of(shape, biot);
        if (row.name().startsWith("first-eigenvalue")) {
            return series.eigenvalue(1);
        }
        return row.name().startsWith("f-factor") ? series.fFactor() : series.coefficient(1);
    }

    private static double ofBody(CheckRow row) {
        Sphere sphere = Sphere.of(row);
        double span = row.in("initial_C") - sphere.mediumC;
        return switch (row.name()) {
            case "potato-surface-temperature-at-that-time" ->
                    sphere.mediumC + span * sphere.series.at(1, sphere.whenCentre(row));
            case "apple-centre-after-1-h" ->
                    sphere.mediumC + span * sphere.series.at(0, sphere.fourierAt(row));
            case "apple-surface-after-1-h" ->
                    sphere.mediumC + span * sphere.series.at(1, sphere.fourierAt(row));
            case "apple-heat-removed-in-1-h" ->
                    sphere.heatJ(row, span)
                            * (1 - sphere.series.mean(sphere.fourierAt(row)))
                            / 1000;
            case "lumped-sphere-time" ->
                    sphere.series.fourierWhenMean((row.in("target_C") - sphere.mediumC) / span)
                            * sphere.unitS;
            default -> sphere.whenCentre(row) * sphere.unitS;
        };
    }

    /** A published sphere: its series, and the seconds of one Fourier number. */
    private record Sphere(SeriesSolution series, double unitS, double mediumC, double radiusM) {
        static Sphere of(CheckRow row) {
            double radius =
                    row.inputs().has("radius_m") ? row.in("radius_m") : row.in("diameter_m") / 2;
            double alpha =
                    row.inputs().has("alpha_m2_s")
                            ? row.in("alpha_m2_s")
                            : row.in("k_W_mK") / (row.in("density_kg_m3") * row.in("cp_J_kgK"));
            double biot = row.in("h_W_m2K") * radius / row.in("k_W_mK");
            return new Sphere(
                    SeriesSolution.of(Shape.SPHERE, biot),
                    radius * radius / alpha,
                    row.in("medium_C"),
                    radius);
        }

        double whenCentre(CheckRow row) {
            return series.fourierWhenCentre(
                    (row.in("centre_target_C") - mediumC) / (row.in("initial_C") - mediumC));
        }

        double fourierAt(CheckRow row) {
            return row.in("time_s") / unitS;
        }

        double heatJ(CheckRow row, double span) {
            double mass = row.in("density_kg_m3") * 4 / 3 * Math.PI * Math.pow(radiusM, 3);
            return mass * row.in("cp_J_kgK") * span;
        }
    }

    private static double ofTissue(CheckRow row) {
        if (row.name().startsWith("choi-okos")) {
            return ofComponent(row);
        }
        if (row.name().startsWith("latent")) {
            double water = row.in("water_pct");
            return Composition.ofParts(water, 0, 0, 100 - water, 0, 0).latentHeatOfFusionJkg()
                    / 1000;
        }
        Composition made = composition(row.inputs().get("composition_pct"));
        double c = row.inputs().has("temp_C") ? row.in("temp_C") : 15;
        return switch (row.name()) {
            case "apple-air-free-density-20C" -> made.densityKgM3(c);
            case "apple-parallel-conductivity-20C" -> made.conductivityWmK(c);
            case "apple-conductivity-with-air-spaces" ->
                    made.conductivityWmK(c, row.in("measured_density_kg_m3"));
            default -> made.specificHeatJkgK(c) / 1000;
        };
    }

    private static Composition composition(JsonNode pct) {
        return Composition.of(
                new CompositionRow(
                        pct.get("water").asDouble(),
                        pct.get("protein").asDouble(),
                        pct.get("fat").asDouble(),
                        pct.get("carbohydrate_total").asDouble(),
                        java.util.OptionalDouble.of(pct.get("fibre").asDouble()),
                        pct.get("ash").asDouble(),
                        java.util.OptionalDouble.empty(),
                        "ASHRAE-R06-09",
                        Evidence.SEEN));
    }

    private static double ofComponent(CheckRow row) {
        Component component = Component.valueOf(row.word("component").toUpperCase(Locale.ROOT));
        double c = row.in("temp_C");
        return switch (row.word("property")) {
            case "thermal-conductivity" -> ChoiOkos.conductivityWmK(component, c);
            case "density" -> ChoiOkos.densityKgM3(component, c);
            case "specific-heat" -> ChoiOkos.specificHeatJkgK(component, c) / 1000;
            default -> fail("no property " + row.word("property"));
        };
    }

    private static double ofBreath(CheckRow row) {
        if (row.name().equals("respiration-unit-61-kcal")) {
            return 1000 * BurntSugar.wattsPerKg(row.in("co2_mg_kg_h"));
        }
        if (row.name().equals("respiration-heat-per-mg-co2-from-glucose")) {
            return BurntSugar.JOULE_PER_KG_CO2 * 1e-6;
        }
        RespirationPower law =
                new RespirationPower(row.in("f"), row.in("g"), row.sourceId(), Evidence.MEMORY, "");
        return row.name().startsWith("respiration-co2")
                ? RespirationPowerLaw.co2MgPerKgH(law, row.in("temp_C"))
                : 1000 * RespirationPowerLaw.wattsPerKg(law, row.in("temp_C"));
    }

    private static double ofQ10(CheckRow row) {
        return row.inputs().has("life_days_at_20C")
                ? HandbookQ10.lifeDays(row.in("life_days_at_20C"), 20, row.in("target_C"))
                : HandbookQ10.relativeRate(row.in("temp_C"));
    }

    private static double ofWater(CheckRow row) {
        if (row.name().startsWith("air-film")) {
            double reynolds =
                    row.in("air_m_s") * row.in("diameter_m") / row.in("kinematic_viscosity_m2_s");
            double schmidt = row.in("kinematic_viscosity_m2_s") / row.in("diffusivity_m2_s");
            return 1e9
                    * AirFilm.vapourKgPerSM2Pa(
                            AirFilm.sherwood(reynolds, schmidt),
                            row.in("diffusivity_m2_s"),
                            row.in("diameter_m"),
                            row.in("air_C") + SaturatedAir.ZERO_C_IN_K);
        }
        double airPa = row.in("relative_humidity") * SaturatedAir.overWaterPa(row.in("air_C"));
        if (row.inputs().has("ks_ug_s_m2_Pa")) {
            double both = Transpirations.inSeries(row.in("ks_ug_s_m2_Pa"), row.in("ka_ug_s_m2_Pa"));
            TranspirationLaw law =
                    new TranspirationLaw(both * 1e-9, row.in("vapour_pressure_lowering"), 1e-9);
            return 1e9 * law.waterKgPerKgS(SaturatedAir.overWaterPa(row.in("surface_C")), airPa);
        }
        TranspirationLaw law = new TranspirationLaw(row.in("k_ng_kg_s_Pa") * 1e-12, 1, 1e-9);
        return 100
                * DAY_S
                * law.waterKgPerKgS(SaturatedAir.overWaterPa(row.in("produce_C")), airPa);
    }

    private static double ofTheRest(CheckRow row) {
        return switch (row.name()) {
            case "seven-eighths-over-half-cooling" -> {
                CoolingTimes times = new CoolingTimes(1, row.in("lag_factor_j"));
                yield times.sevenEighthsS() / times.halfS();
            }
            case "pear-store-product-day-1" -> {
                double c = row.in("cp_kcal_kg_C") * row.in("kJ_per_kcal") * 1000;
                Item pear = new Item(Shape.SPHERE, 0.0355, 1000, c, 0.5, 0.2);
                yield pear.sensibleHeatJ(row.in("mass_kg"), row.in("from_C"), row.in("to_C"))
                        / 1000;
            }
            case "pear-store-transmission-day" ->
                    UValue.flowW(
                                    row.in("U_kJ_h_m2_C") * 1000 / HOUR_S,
                                    row.in("area_m2"),
                                    row.in("outside_C") - row.in("inside_C"))
                            * row.in("hours")
                            * HOUR_S
                            / 1000;
            case "pear-store-door-air-day" ->
                    Leakage.leakM3s(row.in("air_changes_per_day"), row.in("volume_m3"))
                            * DAY_S
                            * row.in("kJ_per_m3");
            case "cherry-self-heating-35F-5d" -> selfHeatingF(row);
            default -> {
                if (row.name().startsWith("half-cooling-from-coefficient")) {
                    yield new CoolingTimes(
                                            row.in("cooling_coefficient_per_h") / HOUR_S,
                                            row.in("lag_factor_j"))
                                    .halfS()
                            / HOUR_S;
                }
                yield fail("no part answers the row " + row.name());
            }
        };
    }

    /** Shut off from all exchange, the fruit keeps what it breathes: five-minute steps. */
    private static double selfHeatingF(CheckRow row) {
        Map<Double, Fact> rates = new TreeMap<>();
        CheckRow.rows(Path.of("reference-tables/crops/respiration-heat.csv")).stream()
                .filter(r -> r.getField(0).equals(row.word("commodity")))
                .forEach(
                        r ->
                                rates.put(
                                        Double.parseDouble(r.getField("temp_C")),
                                        Fact.range(
                                                Double.parseDouble(r.getField("W_per_tonne_low")),
                                                Double.parseDouble(r.getField("W_per_tonne_high")),
                                                "W/t",
                                                r.getField("source_id"),
                                                Evidence.MEMORY)));
        RespirationCurve curve = RespirationCurve.through(rates, 0.5);
        double c = (row.in("start_F") - 32) / 1.8;
        double startC = c;
        for (double t = 0; t < row.in("days") * DAY_S; t += 300) {
            c += 300 * curve.wattsPerKg(c) / row.in("cp_J_kgK");
        }
        return 1.8 * (c - startC);
    }
}
