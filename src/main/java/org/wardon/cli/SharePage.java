package org.wardon.cli;

import java.util.Locale;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.wardon.advice.company.ShareReport;
import org.wardon.advice.wording.Words;
import org.wardon.files.forecast.Because;
import org.wardon.files.forecast.Bounds;
import org.wardon.files.forecast.ShareAnswer;

/** The answer of {@code share} for a person. */
final class SharePage {
    private static final double LEAST_DAYS = 0.05;

    private final Words words;

    SharePage(Words words) {
        this.words = words;
    }

    String of(ShareReport report) {
        ShareAnswer answer = report.answer();
        StringBuilder page = new StringBuilder();
        page.append(
                Paragraph.hanging(
                        "", named(answer) + words.text("verdict." + answer.verdict()) + "."));
        page.append(Paragraph.hanging("", setting(answer)));
        answer.compromise().ifPresent(one -> page.append(Paragraph.hanging("", compromise(one))));
        answer.takeOut()
                .ifPresent(
                        id ->
                                page.append(
                                        Paragraph.hanging(
                                                "", "Without " + id + " the others may share.")));
        report.notes()
                .forEach(
                        note ->
                                page.append(
                                        Paragraph.entry(
                                                "  ", words.sentence(note), note.sourceId())));
        for (ShareAnswer.Pair pair : answer.pairs()) {
            page.append('\n');
            page.append(
                    Paragraph.hanging(
                            "",
                            pair.a()
                                    + " with "
                                    + pair.b()
                                    + ": "
                                    + words.text("verdict." + pair.verdict())
                                    + "."));
            for (Because reason : pair.reasons()) {
                page.append(Paragraph.entry("  ", reason.text(), reason.source()));
            }
        }
        return page.toString();
    }

    private static String named(ShareAnswer answer) {
        String all =
                answer.pairs().stream()
                        .flatMap(pair -> Stream.of(pair.a(), pair.b()))
                        .distinct()
                        .collect(Collectors.joining(", "));
        return all.isEmpty() ? "" : all + ": ";
    }

    private String compromise(ShareAnswer.Compromise one) {
        String lost =
                one.daysLost().entrySet().stream()
                        .filter(each -> each.getValue() >= LEAST_DAYS)
                        .map(
                                each ->
                                        String.format(
                                                Locale.ROOT,
                                                "%s %.1f days",
                                                each.getKey(),
                                                each.getValue()))
                        .collect(Collectors.joining(", "));
        return "The nearest compromise, "
                + words.units().temperature(one.atC())
                + String.format(Locale.ROOT, " and %d %% humidity", Math.round(one.humidityPct()))
                + (lost.isEmpty() ? "." : ", costs " + lost + ".");
    }

    private String setting(ShareAnswer answer) {
        if (answer.workableC().isEmpty()) {
            return answer.spells().isEmpty()
                    ? "No one setting suits them all for the days wanted."
                    : "No one setting suits them all; they are not all there at one time.";
        }
        Bounds bounds = answer.workableC().get();
        String low = words.units().temperature(bounds.low());
        String high = words.units().temperature(bounds.high());
        String temperature = low.equals(high) ? low : low + " to " + high;
        String humidity =
                answer.workableHumidityPct()
                        .map(
                                pct ->
                                        String.format(
                                                Locale.ROOT,
                                                " and %d to %d %% humidity",
                                                Math.round(pct.low()),
                                                Math.round(pct.high())))
                        .orElse("");
        return "By temperature and humidity alone they work at " + temperature + humidity + ".";
    }
}
