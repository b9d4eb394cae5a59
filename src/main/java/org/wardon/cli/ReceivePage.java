package org.wardon.cli;

import java.util.List;
import java.util.Locale;
import java.util.OptionalDouble;
import org.wardon.advice.wording.Words;
import org.wardon.files.forecast.Because;
import org.wardon.files.forecast.ReceiveAnswer;
import org.wardon.files.forecast.ReceiveAnswer.Choice;
import org.wardon.files.forecast.ReceiveAnswer.OfLot;

/** Where a lot goes, for a person: the sentence first. */
final class ReceivePage {
    /** Fewer days lost are not worth a line. */
    private static final double NOTICED_DAYS = 0.1;

    private final Words words;
    private final Terminal terminal;

    ReceivePage(Words words, Terminal terminal) {
        this.words = words;
        this.terminal = terminal;
    }

    String of(ReceiveAnswer answer) {
        StringBuilder page = new StringBuilder();
        page.append(terminal.bold(Paragraph.hanging("", answer.sentence()))).append('\n');
        page.append(table(answer)).append('\n');
        for (Choice choice : answer.choices()) {
            choice(choice, choice.equals(answer.choices().get(0)), page);
        }
        list("Taken, as nobody said", answer.assumed(), page);
        list("To know of the lot", answer.notes(), page);
        page.append(
                Paragraph.hanging(
                        "",
                        "Ranges over "
                                + answer.draws()
                                + " draws; neighbouring chambers as they are without the lot."
                                + " Keeping quality, not food safety. Nobody alone in a closed chamber; its door must open from"
                                + " inside."));
        return page.toString();
    }

    private String table(ReceiveAnswer answer) {
        Table table = new Table("", "verdict", "days left", "7/8 cold after", "air rises", "earns");
        for (Choice choice : answer.choices()) {
            table.row(
                    name(choice),
                    choice.verdict(),
                    words.span(choice.keeps().daysLeft()),
                    hours(choice.keeps().coolSevenEighthsHours()),
                    choice.inside()
                            .map(inside -> words.units().difference(inside.airRisesK()))
                            .orElse(""),
                    money(choice.worth().net()));
        }
        return table.text();
    }

    private static String name(Choice choice) {
        return switch (choice.kind()) {
            case ReceiveAnswer.CHAMBER -> choice.chamber().orElseThrow();
            case ReceiveAnswer.SHADE -> "in the shade";
            default -> "sold now";
        };
    }

    private String hours(OptionalDouble hours) {
        return hours.isPresent() ? words.units().figure(hours.getAsDouble(), "h") : "";
    }

    private static String money(double value) {
        return String.format(Locale.ROOT, "%,.0f", value).replace(',', ' ');
    }

    private void choice(Choice choice, boolean best, StringBuilder page) {
        String name = name(choice);
        if (!best) {
            page.append(Paragraph.hanging("", name + ": " + choice.text()));
        } else if (choice.inside().isPresent()) {
            page.append(Paragraph.hanging("", name + ":"));
        }
        for (Because reason : choice.reasons()) {
            if (!reason.text().equals(choice.text())) {
                page.append(Paragraph.entry("  ", reason.text(), reason.source()));
            }
        }
        choice.inside().ifPresent(inside -> inside(inside, page));
        page.append('\n');
    }

    private void inside(ReceiveAnswer.Inside inside, StringBuilder page) {
        String holds =
                inside.holds()
                        ? "It holds its setting with the lot"
                        : inside.heldBefore()
                                ? "With the lot it no longer holds its setting"
                                : "It does not hold its setting, with the lot or without";
        String rises =
                inside.airRisesUntil()
                        .map(
                                until ->
                                        "; its air rises by "
                                                + words.units().difference(inside.airRisesK())
                                                + ", until "
                                                + until.toString().replace('T', ' '))
                        .orElse("");
        String room =
                inside.freeKg() >= 0
                        ? "; " + words.units().mass(inside.freeKg()) + " more find room"
                        : "";
        page.append(Paragraph.hanging("  ", holds + rises + room + "."));
        List<OfLot> losing =
                inside.lots().stream().filter(lot -> lot.daysLost() >= NOTICED_DAYS).toList();
        for (OfLot lot : losing) {
            page.append(
                    Paragraph.hanging(
                            "  ",
                            lot.id()
                                    + " loses "
                                    + words.units().figure(lot.daysLost(), "day")
                                    + " and keeps "
                                    + words.range(lot.daysLeft())
                                    + "."));
        }
    }

    private static void list(String head, List<Because> entries, StringBuilder page) {
        if (entries.isEmpty()) {
            return;
        }
        page.append(head).append('\n');
        entries.forEach(entry -> page.append(Paragraph.entry("  ", entry.text(), entry.source())));
        page.append('\n');
    }
}
