package org.wardon.cli;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.function.DoubleFunction;
import org.wardon.advice.wording.Units;
import org.wardon.advice.wording.Words;
import org.wardon.files.forecast.WhyAnswer;

/** The answer of {@code why} for a person, with small profiles drawn in text. */
final class WhyPage {
    /** Places in a drawing from its coldest to its warmest, and the longest bar. */
    private static final int PLACES = 32;

    /** A term below this share of the largest is not worth a line. */
    private static final double LEAST_SHARE = 0.001;

    private static final double G_PER_KG = 1_000;

    private final Words words;
    private final Units units;
    private final StringBuilder page = new StringBuilder();

    WhyPage(Words words) {
        this.words = words;
        this.units = words.units();
    }

    String of(WhyAnswer answer) {
        head(answer);
        answer.ends().ifPresent(this::ends);
        heat(answer);
        water(answer);
        answer.face().ifPresent(this::face);
        answer.lot().ifPresent(this::lot);
        return page.toString();
    }

    private void head(WhyAnswer answer) {
        page.append(
                Paragraph.hanging(
                        "",
                        "Chamber "
                                + answer.chamber()
                                + ", "
                                + answer.from().toString().replace('T', ' ')
                                + " to "
                                + answer.until().toLocalTime()
                                + ": the air goes from "
                                + units.temperature(answer.before().airC())
                                + " to "
                                + units.temperature(answer.after().airC())
                                + ", humidity from "
                                + units.figure(answer.before().humidityPct(), "pct")
                                + " to "
                                + units.figure(answer.after().humidityPct(), "pct")
                                + "; it is set to "
                                + units.temperature(answer.settingC())
                                + ", outdoors are "
                                + units.temperature(answer.outdoorC())
                                + "."));
    }

    private void ends(WhyAnswer.Ends ends) {
        page.append(
                Paragraph.hanging(
                        "",
                        "Its coil end is at "
                                + units.temperature(ends.coilEndC())
                                + ", its door end at "
                                + units.temperature(ends.doorEndC())
                                + "; "
                                + units.figure(ends.exchangeM3H(), "m3/h")
                                + " of air go each way between them and carry "
                                + watts(ends.toCoilEndW())
                                + " to the coil end."));
    }

    private void heat(WhyAnswer answer) {
        WhyAnswer.HeatW heat = answer.heatW();
        Map<String, Double> terms = new LinkedHashMap<>();
        terms.put("heat-term.walls", heat.walls());
        terms.put("heat-term.door", heat.door());
        terms.put("heat-term.leakage", heat.leakage());
        terms.put("heat-term.freshAir", heat.freshAir());
        terms.put("heat-term.fieldHeat", heat.fieldHeat());
        terms.put("heat-term.respiration", heat.respiration());
        terms.put("heat-term.fans", heat.fans());
        terms.put("heat-term.lights", heat.lights());
        terms.put("heat-term.people", heat.people());
        terms.put("heat-term.packages", heat.packages());
        terms.put("heat-term.defrost", heat.defrost());
        terms.put("heat-term.humidifier", heat.humidifier());
        terms.put("heat-term.heater", heat.heater());
        terms.put("heat-term.pumps", heat.pumps());
        terms.put("heat-term.air", heat.air());
        title("why.heat");
        Table table = bars(terms, this::watts);
        table.row(words.text("why.sum"), watts(answer.heatSumW()), "");
        table.row(words.text("why.removed"), watts(answer.removedW()), "");
        table.row(
                words.text("why.unclosed"),
                watts(answer.heatErrorW()) + share(answer.heatErrorPct()),
                "");
        page.append(table.text());
    }

    private void water(WhyAnswer answer) {
        WhyAnswer.WaterKgH water = answer.waterKgH();
        Map<String, Double> terms = new LinkedHashMap<>();
        terms.put("water-term.lots", water.lots());
        terms.put("water-term.packages", water.packages());
        terms.put("water-term.door", water.door());
        terms.put("water-term.leakage", water.leakage());
        terms.put("water-term.freshAir", water.freshAir());
        terms.put("water-term.people", water.people());
        terms.put("water-term.humidifier", water.humidifier());
        terms.put("water-term.faces", water.faces());
        terms.put("water-term.coolers", water.coolers());
        terms.put("water-term.air", water.air());
        title("why.water");
        Table table = bars(terms, this::grams);
        table.row(
                words.text("why.unclosed"),
                grams(answer.waterSumKgH()) + share(answer.waterErrorPct()),
                "");
        page.append(table.text());
    }

    private void title(String key) {
        page.append('\n').append(words.text(key)).append('\n');
    }

    private String watts(double value) {
        return Math.abs(value) < 0.5 ? "0 W" : units.figure(value, "W");
    }

    private String grams(double kgH) {
        if (Math.abs(kgH) >= 1) {
            return String.format(Locale.ROOT, "%.2f kg/h", kgH);
        }
        double g = G_PER_KG * kgH;
        return Math.abs(g) < 0.05
                ? "0 g/h"
                : String.format(Locale.ROOT, Math.abs(g) < 10 ? "%.1f g/h" : "%.0f g/h", g);
    }

    private static String share(double pct) {
        return String.format(Locale.ROOT, " (%.4f %%)", pct);
    }

    /** Terms worth a line, each with a bar as long as its share of the largest. */
    private Table bars(Map<String, Double> terms, DoubleFunction<String> told) {
        double most = terms.values().stream().mapToDouble(Math::abs).max().orElse(0);
        Table table = new Table("", "", "");
        terms.forEach(
                (key, value) -> {
                    if (Math.abs(value) > LEAST_SHARE * most) {
                        long length = Math.max(1, Math.round(PLACES * Math.abs(value) / most));
                        String bar = (value < 0 ? "-" : "+").repeat((int) length);
                        table.row(words.text(key), told.apply(value), bar);
                    }
                });
        return table;
    }

    private void face(WhyAnswer.OfFace face) {
        page.append('\n')
                .append(
                        Paragraph.hanging(
                                "",
                                "Face "
                                        + face.face()
                                        + ": "
                                        + watts(face.fromBeyondW())
                                        + " go into its layers, "
                                        + watts(face.toAirW())
                                        + " come to the air, "
                                        + watts(face.bridgeW())
                                        + " of them through bridges. Dew falls on it below "
                                        + units.temperature(face.dewPointC())
                                        + " inside and "
                                        + units.temperature(face.outdoorDewPointC())
                                        + " outside; "
                                        + String.format(
                                                Locale.ROOT, "%.0f g", G_PER_KG * face.waterKg())
                                        + " of water lie on it."));
        Profile profile = new Profile();
        profile.add(words.text("why.beyond"), "", face.beyondC());
        profile.add(words.text("why.outer"), "", face.outerC());
        for (WhyAnswer.Point point : face.points()) {
            String depth = String.format(Locale.ROOT, "%.1f mm", point.depthMm());
            profile.add(layer(point), depth, point.temperatureC());
        }
        profile.add(words.text("why.inner"), "", face.innerC());
        profile.add(words.text("why.air"), "", face.airC());
        page.append(profile.text());
    }

    /** A layer whose figures stand in the plan has no name of a material. */
    private String layer(WhyAnswer.Point point) {
        return point.layer().equals("own") ? words.text("why.layer") : point.layer();
    }

    private void lot(WhyAnswer.OfLot lot) {
        page.append('\n')
                .append(
                        Paragraph.hanging(
                                "",
                                "Lot "
                                        + lot.id()
                                        + (lot.there() ? ": " : " (it has left): ")
                                        + watts(lot.respirationW())
                                        + " of breath, "
                                        + watts(lot.fleshW())
                                        + " out of its flesh, "
                                        + watts(lot.vapourW())
                                        + " with the water that evaporates and "
                                        + watts(lot.packageW())
                                        + " out of its package make "
                                        + watts(lot.toAirW())
                                        + " into the air. "
                                        + grams(lot.evaporatedKgH())
                                        + " leave its skin, "
                                        + grams(lot.toAirKgH())
                                        + " come to the air; the package is at "
                                        + units.figure(lot.packageHumidityPct(), "pct")
                                        + "."));
        Profile profile = new Profile();
        List<Double> shells = lot.shellsC();
        for (int i = 0; i < shells.size(); i++) {
            String key = i == 0 ? "why.core" : "why.shell";
            profile.add(words.text(key), String.valueOf(i + 1), shells.get(i));
        }
        profile.add(words.text("why.skin"), "", lot.skinC());
        profile.add(words.text("why.package"), "", lot.packageC());
        profile.add(words.text("why.air"), "", lot.airC());
        page.append(profile.text());
    }

    /** Temperatures along a way, each marked between the coldest and the warmest of them. */
    private final class Profile {
        private record Place(String name, String where, double temperatureC) {}

        private final List<Place> places = new ArrayList<>();

        void add(String name, String where, double temperatureC) {
            places.add(new Place(name, where, temperatureC));
        }

        String text() {
            double least = places.stream().mapToDouble(Place::temperatureC).min().orElse(0);
            double most = places.stream().mapToDouble(Place::temperatureC).max().orElse(0);
            double span = Math.max(most - least, 1e-9);
            Table table = new Table("", "", "", "");
            for (Place place : places) {
                long at = Math.round((PLACES - 1) * (place.temperatureC() - least) / span);
                table.row(
                        place.name(),
                        place.where(),
                        units.temperature(place.temperatureC()),
                        "|" + " ".repeat((int) at) + "o");
            }
            return table.text();
        }
    }
}
