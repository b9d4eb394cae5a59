package org.wardon.cli;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.wardon.advice.wording.Units;
import org.wardon.advice.wording.Words;
import org.wardon.files.forecast.Forecast;
import org.wardon.files.forecast.SectionAnswer;

/** The answer of {@code section} for a person, its temperatures set out as they lie. */
final class SectionPage {
    private static final int ACROSS = 9;
    private static final int FEWEST_UP = 5;
    private static final int MOST_UP = 9;

    private final Words words;
    private final Units units;
    private final StringBuilder page = new StringBuilder();

    SectionPage(Words words) {
        this.words = words;
        this.units = words.units();
    }

    String of(SectionAnswer answer, Optional<String> picture) {
        page.append(Paragraph.hanging("", answer.said().get(0)));
        field(answer);
        for (String sentence : answer.said().subList(1, answer.said().size())) {
            page.append('\n').append(Paragraph.hanging("", sentence));
        }
        spaces(answer);
        warnings(answer.warnings());
        picture.ifPresent(
                file ->
                        page.append('\n')
                                .append(words.text("section.picture").replace("{0}", file))
                                .append('\n'));
        return page.toString();
    }

    /** Numbers as they lie in the section, each face's own beside them. */
    private void field(SectionAnswer answer) {
        int up = (int) Math.round(1.0 * ACROSS * answer.heightM() / answer.widthM() / 1.6);
        int rows = Math.min(MOST_UP, Math.max(FEWEST_UP, up));
        page.append('\n')
                .append(
                        words.text("section.field")
                                .replace("{0}", units.fahrenheit() ? "°F" : "°C"))
                .append('\n');
        page.append(centred(face(answer, "roof")));
        String left = face(answer, "left");
        String right = face(answer, "right");
        for (int i = 0; i < rows; i++) {
            boolean middle = i == rows / 2;
            String line =
                    String.format(
                            Locale.ROOT,
                            "  %" + width(left) + "s |%s| %s",
                            middle ? left : "",
                            row(answer, i, rows),
                            middle ? right : "");
            page.append(line.stripTrailing()).append('\n');
        }
        page.append(centred(face(answer, "floor")));
    }

    private int width(String left) {
        return Math.max(left.length(), 1);
    }

    private String centred(String text) {
        int indent = Math.max(2, 2 + 8 + (ACROSS * 7 - text.length()) / 2);
        return " ".repeat(indent) + text + "\n";
    }

    private String face(SectionAnswer answer, String side) {
        SectionAnswer.OfFace face =
                answer.faces().stream()
                        .filter(one -> one.side().equals(side))
                        .findFirst()
                        .orElseThrow();
        return words.text("section.face." + face.face()) + " " + units.degrees(face.innerC());
    }

    private String row(SectionAnswer answer, int i, int rows) {
        StringBuilder line = new StringBuilder();
        SectionAnswer.Field field = answer.field();
        int row = (int) ((i + 0.5) * field.rows() / rows);
        for (int j = 0; j < ACROSS; j++) {
            int column = (int) ((j + 0.5) * field.columns() / ACROSS);
            String told = units.degrees(field.temperatureC().get(row).get(column));
            double x = (column + 0.5) * answer.widthM() / field.columns();
            double y = answer.heightM() * (1 - (row + 0.5) / field.rows());
            boolean load =
                    answer.stack()
                            .map(s -> x > s.fromM() && x < s.toM() && y > s.footM() && y < s.topM())
                            .orElse(false);
            line.append(String.format(Locale.ROOT, load ? "[%4s] " : " %4s  ", told));
        }
        return line.toString();
    }

    private void spaces(SectionAnswer answer) {
        page.append('\n').append(words.text("section.air")).append('\n');
        Table table = new Table("", "", "");
        for (SectionAnswer.OfSpace space : answer.spaces()) {
            table.row(
                    words.text("section.space." + space.space()),
                    units.figure(space.nusselt(), "1"),
                    units.difference(space.differenceK())
                            + " / "
                            + units.figure(space.thicknessM(), "m"));
        }
        page.append(table.text());
    }

    private void warnings(List<Forecast.Warning> warnings) {
        if (warnings.isEmpty()) {
            return;
        }
        page.append('\n').append(words.text("section.warnings")).append('\n');
        warnings.forEach(
                warning -> page.append(Paragraph.entry("", warning.text(), warning.source())));
    }
}
