package org.wardon.cli;

import org.wardon.advice.outlook.KeepReport;
import org.wardon.advice.wording.Words;
import org.wardon.files.forecast.KeepAnswer;
import org.wardon.files.forecast.Quantiles;
import org.wardon.produce.Reason;

/** The answer of {@code keep} for a person. */
final class KeepPage {
    private final Words words;

    KeepPage(Words words) {
        this.words = words;
    }

    /**
     * Returns the page.
     *
     * @param report the answer
     * @param until when life used and chilling are told, such as "after 7 days"
     */
    String of(KeepReport report, String until) {
        KeepAnswer answer = report.answer();
        StringBuilder page = new StringBuilder();
        page.append(
                Paragraph.hanging(
                        "",
                        report.commodity().names().get(0)
                                + ": keeps "
                                + words.range(answer.daysLeft())
                                + (Words.isCapped(answer.daysLeft().p10())
                                        ? "."
                                        : ", " + words.text("limit." + answer.limitedBy()) + ".")));
        page.append(
                Paragraph.hanging(
                        "",
                        "Life used "
                                + until
                                + ": "
                                + (answer.lifeUsedPct() >= 100
                                        ? "all of it"
                                        : words.units().figure(answer.lifeUsedPct(), "pct"))
                                + ". The figure rests on "
                                + words.text("rests-on." + report.restsOn())
                                + "."));
        answer.hangsOn()
                .ifPresent(
                        most ->
                                page.append(
                                        Paragraph.hanging(
                                                "",
                                                words.text("range-hangs-on")
                                                        + " "
                                                        + words.text("hangs-on." + most.range())
                                                        + ".")));
        answer.ripeFrom().ifPresent(from -> page.append(Paragraph.hanging("", ripe(answer, from))));
        for (Reason reason : report.ripe()) {
            page.append(Paragraph.entry("", words.sentence(reason), reason.sourceId()));
        }
        if (answer.chillingRisk().probability() > 0) {
            page.append(
                    Paragraph.hanging(
                            "",
                            "Risk of visible chilling injury "
                                    + until
                                    + ": "
                                    + words.units()
                                            .figure(
                                                    100 * answer.chillingRisk().probability(),
                                                    "pct")
                                    + safe(answer)
                                    + "."));
        }
        page.append('\n');
        Table table = new Table("if this alone acted", "days left");
        for (KeepAnswer.Mechanism mechanism : answer.mechanisms()) {
            table.row(
                    words.text("mechanism." + mechanism.name()), words.span(mechanism.daysLeft()));
        }
        page.append(table.text()).append('\n');
        for (Reason reason : report.reasons()) {
            if (!reason.code().equals("life-rests-on")) {
                page.append(Paragraph.entry("  ", words.sentence(reason), reason.sourceId()));
            }
        }
        return page.toString();
    }

    private String ripe(KeepAnswer answer, Quantiles from) {
        String edible =
                answer.edibleLeft()
                        .map(until -> "; past eating after " + words.range(until))
                        .orElse("");
        if (Words.isCapped(from.p50())) {
            return "It does not ripen as it should" + edible + ".";
        }
        return (from.p90() == 0 ? "Ripe now" : "Ripe after " + words.range(from)) + edible + ".";
    }

    private String safe(KeepAnswer answer) {
        return answer.chillingRisk().safeDays().isPresent()
                ? "; safe for "
                        + words.units()
                                .figure(answer.chillingRisk().safeDays().getAsDouble(), "day")
                : "";
    }
}
