package org.wardon.web.plan;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.wardon.advice.faces.FaceReport;
import org.wardon.advice.wording.Words;
import org.wardon.web.pages.Figures;
import org.wardon.web.pages.PageWords;
import org.wardon.web.pages.TableView;

/** Tells how a face conducts. */
final class FaceViews {
    private static final double AS_NEW = 1.0005;

    private final PageWords page;
    private final Figures figures;
    private final Words words;

    FaceViews(PageWords page, Figures figures, Words words) {
        this.page = page;
        this.figures = figures;
        this.words = words;
    }

    PlanPartView.FaceView of(Optional<FaceReport> found) {
        if (found.isEmpty()) {
            return new PlanPartView.FaceView(
                    "", List.of(page.say("face.not-whole")), Optional.empty());
        }
        FaceReport face = found.get();
        List<String> told = new ArrayList<>();
        told.add(
                face.upliftedWm2K() > face.wattsM2K()
                        ? page.say(
                                "face.u",
                                number(face.wattsM2K(), 3),
                                number(face.upliftedWm2K(), 3))
                        : page.say("face.u-alone", number(face.wattsM2K(), 3)));
        if (face.wattsM2K() > AS_NEW * face.asNewWm2K()) {
            told.add(page.say("face.as-new", number(face.asNewWm2K(), 3)));
        }
        told.add(
                page.say(
                        "face.lag",
                        figures.figure(face.lagHours(), "h"),
                        figures.figure(100 * face.decrement(), "pct"),
                        number(face.capacityKJm2K(), 0)));
        return new PlanPartView.FaceView(
                face.picture(words, figures::text), told, Optional.of(layers(face)));
    }

    private TableView layers(FaceReport face) {
        List<List<String>> rows = new ArrayList<>();
        if (face.outsideFilmM2KW() > 0) {
            rows.add(film("face.film-outside", face.outsideFilmM2KW()));
        }
        for (FaceReport.Line line : face.layers()) {
            rows.add(
                    List.of(
                            line.soil() ? page.say("face.below", line.material()) : line.material(),
                            number(line.thicknessMm(), 1) + " mm",
                            number(line.newWmK(), 4) + " W/mK",
                            number(line.nowWmK(), 4) + " W/mK",
                            worse(line),
                            number(line.resistanceM2KW(), 3) + " m2K/W"));
        }
        rows.add(film("face.film-inside", face.insideFilmM2KW()));
        return new TableView(
                page.say("face.layers", page.say("flow." + face.flow())),
                List.of(
                        page.say("face.layer"),
                        page.say("face.thick"),
                        page.say("face.new"),
                        page.say("face.now"),
                        page.say("face.why"),
                        page.say("face.resistance")),
                rows);
    }

    private List<String> film(String key, double resistance) {
        return List.of(page.say(key), "–", "–", "–", "–", number(resistance, 3) + " m2K/W");
    }

    private String worse(FaceReport.Line line) {
        List<String> parts = new ArrayList<>();
        if (line.worseFactor() > AS_NEW) {
            parts.add(page.say("face.worse", number(line.worseFactor(), 2)));
        }
        line.bridgePct()
                .ifPresent(pct -> parts.add(page.say("face.bridged", figures.figure(pct, "pct"))));
        return parts.isEmpty() ? "–" : String.join(", ", parts);
    }

    private String number(double value, int decimals) {
        String text = String.format(Locale.ROOT, "%." + decimals + "f", value);
        return figures.text(decimals > 0 ? text.replaceFirst("\\.?0+$", "") : text);
    }
}
