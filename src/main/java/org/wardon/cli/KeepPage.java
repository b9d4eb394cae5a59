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

    String of(KeepReport report) {
        KeepAnswer answer = report.answer();
        StringBuilder page = new StringBuilder();
        page.append(report.commodity().names().get(0))
                .append(": ")
                .append(words.range(answer.daysLeft()))
                .append(", ")
                .append(words.text("limit." + answer.limitedBy()))
                .append(".\n");
        page.append("Life used: ")
                .append(words.units().figure(answer.lifeUsedPct(), "pct"))
                .append(". The figure rests on ")
                .append(words.text("rests-on." + report.restsOn()))
                .append(".\n");
        if (answer.chillingRisk().probability() > 0) {
            page.append("Risk of visible chilling injury: ")
                    .append(words.units().figure(100 * answer.chillingRisk().probability(), "pct"))
                    .append(".\n");
        }
        page.append('\n');
        for (KeepAnswer.Mechanism mechanism : answer.mechanisms()) {
            Quantiles days = mechanism.daysLeft();
            page.append(
                    String.format(
                            "  %-12s %s%n",
                            words.text("mechanism." + mechanism.name()), words.range(days)));
        }
        page.append('\n');
        for (Reason reason : report.reasons()) {
            page.append("  - ")
                    .append(words.sentence(reason))
                    .append("  [")
                    .append(reason.sourceId())
                    .append("]\n");
        }
        return page.toString();
    }
}
