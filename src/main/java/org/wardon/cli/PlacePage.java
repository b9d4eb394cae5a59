package org.wardon.cli;

import java.util.List;
import java.util.Locale;
import org.wardon.advice.placing.PlaceReport;
import org.wardon.advice.wording.Words;
import org.wardon.files.forecast.Because;
import org.wardon.files.forecast.PlaceAnswer;

/** The answer of {@code place} for a person. */
final class PlacePage {
    private final PlaceReport report;
    private final PlaceAnswer answer;
    private final Words words;
    private final Terminal terminal;
    private final StringBuilder page = new StringBuilder();

    PlacePage(PlaceReport report, Words words, Terminal terminal) {
        this.report = report;
        this.answer = report.answer();
        this.words = words;
        this.terminal = terminal;
    }

    String text() {
        String name = report.asked().name();
        page.append(
                Paragraph.hanging(
                        "", name + ": " + words.text("place-wish." + answer.wish()) + "."));
        steps();
        head("Chambers");
        answer.chambers().forEach(this::chamber);
        if (!answer.unplaced().isEmpty()) {
            head("Without a place");
            answer.unplaced().forEach(lot -> page.append(Paragraph.hanging("  - ", lot.text())));
        }
        head("Why, and what elsewhere would cost");
        answer.because().forEach(this::choice);
        worth();
        head("What it comes to");
        page.append(Paragraph.hanging("", money()));
        page.append(Paragraph.hanging("", answer.told()));
        page.append('\n');
        for (Because note : answer.notes()) {
            page.append(Paragraph.entry("  ", note.text(), note.source()));
        }
        page.append("\nWardon advises; local codes and licensed practice decide.\n");
        return page.toString();
    }

    private void head(String words) {
        page.append('\n').append(terminal.bold(words)).append("\n\n");
    }

    private void steps() {
        head("What to do");
        List<PlaceAnswer.Change> all =
                java.util.stream.Stream.concat(answer.changes().stream(), answer.moves().stream())
                        .toList();
        if (all.isEmpty()) {
            page.append("  Nothing: the plan as it stands is the best that was found.\n");
        }
        for (int i = 0; i < all.size(); i++) {
            String lead = String.format(Locale.ROOT, "  %2d. ", i + 1);
            page.append(Paragraph.hanging(lead, all.get(i).text()));
        }
    }

    private void chamber(PlaceAnswer.Placed chamber) {
        page.append(Paragraph.hanging("  ", chamber.text()));
        String lots = chamber.lots().isEmpty() ? "no lots" : String.join(", ", chamber.lots());
        page.append(Paragraph.hanging("    ", lots));
    }

    private void choice(PlaceAnswer.Choice choice) {
        page.append(Paragraph.hanging(choice.here() ? "  " : "    - ", choice.text()));
    }

    private void worth() {
        if (answer.worth().isEmpty()) {
            return;
        }
        head("What more would be worth");
        answer.worth().forEach(one -> page.append(Paragraph.hanging("  - ", one.text())));
    }

    private String money() {
        return "In the forecast of this placing sold produce less power comes to "
                + of(answer.value())
                + "; the plan as it stands comes to "
                + of(answer.presentValue())
                + ". While it was sought, "
                + of(answer.assumedValue())
                + " were assumed.";
    }

    private String of(double value) {
        return String.format(Locale.ROOT, "%,.0f %s", value, report.asked().prices().currency())
                .replace(',', ' ')
                .strip();
    }
}
