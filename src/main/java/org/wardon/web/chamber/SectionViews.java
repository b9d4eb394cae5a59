package org.wardon.web.chamber;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.wardon.files.forecast.SectionAnswer;
import org.wardon.web.pages.CautionView;
import org.wardon.web.pages.Figures;
import org.wardon.web.pages.PageWords;
import org.wardon.web.pages.TableView;

/** Turns the section of a chamber into a page: sentences, its picture and the numbers behind it. */
final class SectionViews {
    private static final int UP = 6;
    private static final int ACROSS = 5;

    /** What is written in a drawing; its coordinates keep their points. */
    private static final Pattern WRITTEN = Pattern.compile("(<text[^>]*>)([^<]*)");

    private final PageWords say;
    private final Figures figures;

    SectionViews(PageWords say, Figures figures) {
        this.say = say;
        this.figures = figures;
    }

    SectionSheet sheet(SectionAnswer answer, String path) {
        List<String> said = answer.said().stream().map(figures::text).toList();
        return new SectionSheet(
                path,
                say.say("section.title", answer.chamber()),
                path + "/section.svg",
                say.say("section.told", answer.chamber()),
                said,
                table(answer),
                answer.warnings().stream()
                        .map(
                                one ->
                                        new CautionView(
                                                one.level(),
                                                figures.text(one.text()),
                                                one.source(),
                                                Optional.empty()))
                        .toList());
    }

    private TableView table(SectionAnswer answer) {
        String left =
                answer.faces().stream()
                        .filter(face -> face.side().equals("left"))
                        .map(SectionAnswer.OfFace::face)
                        .findFirst()
                        .orElseThrow();
        List<String> head = new ArrayList<>(List.of(say.say("section.height")));
        for (int j = 0; j < ACROSS; j++) {
            head.add(figures.figure((j + 0.5) / ACROSS * answer.widthM(), "m"));
        }
        List<List<String>> rows = new ArrayList<>();
        for (int i = 0; i < UP; i++) {
            List<String> row = new ArrayList<>();
            row.add(figures.figure((1 - (i + 0.5) / UP) * answer.heightM(), "m"));
            for (int j = 0; j < ACROSS; j++) {
                row.add(place(answer, (j + 0.5) / ACROSS, (i + 0.5) / UP));
            }
            rows.add(row);
        }
        String caption = say.say("section.table", say.say("section.from-" + left));
        return new TableView(caption, head, rows);
    }

    /** The temperature at a share of the way across and down. */
    private String place(SectionAnswer answer, double across, double down) {
        SectionAnswer.Field field = answer.field();
        double temperatureC =
                field.temperatureC()
                        .get((int) (down * field.rows()))
                        .get((int) (across * field.columns()));
        double x = across * answer.widthM();
        double y = (1 - down) * answer.heightM();
        boolean load =
                answer.stack()
                        .filter(s -> x > s.fromM() && x < s.toM() && y > s.footM() && y < s.topM())
                        .isPresent();
        String told = figures.temperature(temperatureC);
        return load ? say.say("section.in-load", told) : told;
    }

    /** A drawing with its numbers as the person writes them. */
    static String written(String svg, Figures figures) {
        return WRITTEN.matcher(svg)
                .replaceAll(
                        found ->
                                Matcher.quoteReplacement(
                                        found.group(1) + figures.text(found.group(2))));
    }
}
