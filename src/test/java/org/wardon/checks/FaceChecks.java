package org.wardon.checks;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.function.ToDoubleFunction;
import org.wardon.enclosure.Box;
import org.wardon.enclosure.BridgedElement;
import org.wardon.enclosure.FaceName;
import org.wardon.enclosure.Films;
import org.wardon.enclosure.GroundFloor;
import org.wardon.enclosure.GroundTemperature;
import org.wardon.enclosure.HeatFlow;
import org.wardon.enclosure.Layer;
import org.wardon.enclosure.PeriodicTransmittance;
import org.wardon.enclosure.SemiInfinite;
import org.wardon.enclosure.UValue;
import tools.jackson.databind.JsonNode;

/** How rows of walls, floors and ground are answered. */
final class FaceChecks {
    private static final double KWH_PER_DAY = 24 / 1_000.0;

    private FaceChecks() {}

    static Map<String, ToDoubleFunction<CheckRow>> laws() {
        Map<String, ToDoubleFunction<CheckRow>> laws = new TreeMap<>();
        laws.put("wall_sheet1_U", FaceChecks::uValue);
        laws.put("dossat_block_cork", FaceChecks::uValue);
        laws.put("iso6946_U_", FaceChecks::uValue);
        laws.put("thatch_roof_U", FaceChecks::upwardUValue);
        laws.put("wall_encfood_q", FaceChecks::encloseFood);
        laws.put("wall_sheet1_Q", r -> UValue.flowW(r.d("U"), r.d("area_m2"), r.d("dT_K")));
        laws.put("ceiling_sheet1_Q", r -> UValue.flowW(r.d("U"), r.d("area_m2"), r.d("dT_K")));
        laws.put("room_sheet2_walls_roof", r -> daily(r, "T_out_C", r.d("area_m2")));
        laws.put("room_sheet2_floor", r -> daily(r, "T_ground_C", r.d("area_m2")));
        laws.put("room_sheet2_total", FaceChecks::wholeRoom);
        laws.put("sheet3_north_wall", FaceChecks::inchWall);
        laws.put("fao340_leak", FaceChecks::kilocalorieWall);
        laws.put("fao340_area", FaceChecks::outerArea);
        laws.put("iso13786_", FaceChecks::periodic);
        laws.put("iso6946_bridged_U", r -> bridged().wattsM2K());
        laws.put("iso6946_bridged_RT_upper", r -> bridged().upperM2KW());
        laws.put("iso6946_bridged_RT_lower", r -> bridged().lowerM2KW());
        laws.put("iso13370_slab_", FaceChecks::slab);
        laws.put(
                "damping_depth_day_",
                r -> GroundTemperature.dampingDepthM(r.d("diffusivity_m2_s"), r.d("period_s")));
        laws.put(
                "ground_amp_",
                r ->
                        GroundTemperature.amplitudeK(
                                r.d("surface_amplitude_K"),
                                r.d("depth_m"),
                                r.d("diffusivity_m2_s"),
                                r.d("period_s")));
        laws.put(
                "semi_inf_",
                r ->
                        SemiInfinite.temperatureC(
                                r.d("T_initial_C"),
                                r.d("T_surface_C"),
                                r.d("lambda") / (r.d("rho") * r.d("c")),
                                r.d("depth_m"),
                                r.d("time_s")));
        return laws;
    }

    private static Layer solid(double thicknessM, double conductivity, double rho, double c) {
        return new Layer("check", thicknessM, conductivity, rho, c);
    }

    private static Layer resistance(double m2KW) {
        return new Layer("check", 0.1, 0.1 / m2KW, 0, 0);
    }

    private static List<Layer> layers(CheckRow r) {
        List<Layer> layers = new ArrayList<>();
        if (r.has("layers_R")) {
            r.inputs().get("layers_R").forEach(n -> layers.add(resistance(n.asDouble())));
        } else if (r.has("layers")) {
            for (JsonNode n : r.inputs().get("layers")) {
                layers.add(
                        n.get(0).isString()
                                ? resistance(n.get(1).asDouble())
                                : solid(n.get(0).asDouble(), n.get(1).asDouble(), 0, 0));
            }
        } else {
            for (JsonNode n : r.inputs().get("layers_inside_to_outside_d_lambda_rho_c")) {
                layers.add(
                        solid(
                                n.get(0).asDouble(),
                                n.get(1).asDouble(),
                                n.get(2).asDouble(),
                                n.get(3).asDouble()));
            }
        }
        return layers;
    }

    private static double uValue(CheckRow r) {
        return UValue.wattsM2K(layers(r), r.d("Rsi"), r.d("Rse"));
    }

    private static double upwardUValue(CheckRow r) {
        return UValue.wattsM2K(layers(r), Films.insideM2KW(HeatFlow.UP), Films.OUTSIDE_M2KW);
    }

    private static double encloseFood(CheckRow r) {
        return UValue.flowW(uValue(r), r.d("area_m2"), r.d("T_out_C") - r.d("T_in_C"));
    }

    private static double daily(CheckRow r, String outside, double areaM2) {
        return UValue.flowW(r.d("U"), areaM2, r.d(outside) - r.d("T_in_C")) * KWH_PER_DAY;
    }

    private static double wholeRoom(CheckRow r) {
        Box box = new Box(r.d("length_m"), r.d("width_m"), r.d("height_m"));
        double floor = box.areaM2(FaceName.FLOOR);
        double rest = surface(box) - floor;
        return daily(r, "T_out_C", rest) + daily(r, "T_ground_C", floor);
    }

    private static double surface(Box box) {
        double sum = 0;
        for (FaceName face : FaceName.values()) {
            sum += box.areaM2(face);
        }
        return sum;
    }

    private static double outerArea(CheckRow r) {
        double d = 2 * r.d("insulation_m");
        return surface(new Box(r.d("length_m") + d, r.d("width_m") + d, r.d("height_m") + d));
    }

    private static double inchWall(CheckRow r) {
        // 1 BTU in/(h ft2 F) = 0.1442279 W/(m K)
        Layer wall = solid(r.d("thickness_in") * 0.0254, r.d("k_BTU_in_h_ft2_F") * 0.1442279, 0, 0);
        double area = r.d("height_ft") * r.d("length_ft") * 0.3048 * 0.3048;
        return UValue.flowW(UValue.wattsM2K(List.of(wall), 0, 0), area, r.d("dT_F") / 1.8);
    }

    private static double kilocalorieWall(CheckRow r) {
        Layer wall = solid(r.d("thickness_m"), r.d("k_kcal_h_m_C") * 4_186.8 / 3_600, 0, 0);
        return UValue.flowW(UValue.wattsM2K(List.of(wall), 0, 0), r.d("area_m2"), r.d("dT_K"));
    }

    private static double periodic(CheckRow r) {
        PeriodicTransmittance answer =
                PeriodicTransmittance.of(layers(r), r.d("Rsi"), r.d("Rse"), r.d("period_s"));
        return switch (r.name().split("_")[1]) {
            case "Y12" -> answer.transmittanceWm2K();
            case "decrement" -> answer.decrement();
            case "shift" -> answer.shiftS() / 3_600;
            case "kappa1" -> answer.capacityJm2K();
            default -> throw new IllegalArgumentException(r.name());
        };
    }

    /** The element of row iso6946_bridged_U, which the two other rows point to. */
    private static BridgedElement bridged() {
        CheckRow r = find("iso6946_bridged_U");
        List<BridgedElement.BridgedLayer> layers = new ArrayList<>();
        for (JsonNode n : r.inputs().get("layers")) {
            double d = n.get("d").asDouble();
            if (n.has("lambda")) {
                layers.add(BridgedElement.BridgedLayer.even(d, n.get("lambda").asDouble()));
            } else {
                List<BridgedElement.Part> parts = new ArrayList<>();
                for (JsonNode part : n.get("fractions")) {
                    parts.add(
                            new BridgedElement.Part(
                                    part.get(0).asDouble(), part.get(1).asDouble()));
                }
                layers.add(new BridgedElement.BridgedLayer(d, parts));
            }
        }
        return new BridgedElement(layers, r.d("Rsi"), r.d("Rse"));
    }

    private static CheckRow find(String name) {
        try {
            return CheckRow.read("checks-enclosure.csv").stream()
                    .filter(r -> r.name().equals(name))
                    .findFirst()
                    .orElseThrow();
        } catch (java.io.IOException e) {
            throw new java.io.UncheckedIOException(e);
        }
    }

    private static double slab(CheckRow r) {
        GroundFloor floor =
                new GroundFloor(
                        r.d("area_m2"),
                        r.d("perimeter_m"),
                        r.d("wall_thickness_m"),
                        new GroundFloor.Soil(r.d("lambda_ground"), 2_000, 1_000));
        return floor.wattsM2K(r.d("Rf"), r.d("Rsi"));
    }
}
