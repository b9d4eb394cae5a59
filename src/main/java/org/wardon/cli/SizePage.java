package org.wardon.cli;

import org.wardon.advice.wording.Units;
import org.wardon.advice.wording.Words;
import org.wardon.files.forecast.SizeAnswer;

/** The answer of {@code size} for a person: the sum as one would write it on paper. */
final class SizePage {
    private final Words words;
    private final Units units;
    private final StringBuilder page = new StringBuilder();

    SizePage(Words words) {
        this.words = words;
        this.units = words.units();
    }

    String of(SizeAnswer answer) {
        page.append(
                Paragraph.hanging(
                        "",
                        "Chamber "
                                + answer.chamber()
                                + " at "
                                + units.temperature(answer.settingC())
                                + ", outdoors "
                                + units.temperature(answer.outdoorC())
                                + " and "
                                + units.figure(answer.outdoorHumidityPct(), "pct")
                                + ", ground "
                                + units.temperature(answer.groundC())
                                + "; what comes in on "
                                + answer.day()
                                + " is to be cold within "
                                + units.figure(answer.pullDownHours(), "h")
                                + "."));
        page.append('\n');
        for (SizeAnswer.Term term : answer.terms()) {
            page.append(Paragraph.entry("  ", term.formula(), term.source()));
        }
        page.append('\n').append(sums(answer).text()).append('\n');
        answer.installedW()
                .ifPresent(
                        watts ->
                                page.append(
                                        Paragraph.hanging(
                                                "",
                                                words.text("size.installed")
                                                        + " "
                                                        + units.figure(watts, "W")
                                                        + ". "
                                                        + words.text("size.rated-elsewhere"))));
        page.append(Paragraph.hanging("", words.text("size.caution")));
        return page.toString();
    }

    private Table sums(SizeAnswer answer) {
        Table table = new Table(words.text("size.sum"), units.figure(answer.meanW(), "W"));
        table.row(
                words.text("size.day") + " " + units.figure(answer.marginPct(), "pct"),
                units.figure(answer.kWhPerDay(), "kWh"));
        table.row(words.text("size.hours"), units.figure(answer.runningHoursPerDay(), "h"));
        table.row(words.text("size.required"), units.figure(answer.requiredW(), "W"));
        return table;
    }
}
