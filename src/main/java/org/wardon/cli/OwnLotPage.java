package org.wardon.cli;

import java.util.Optional;
import org.wardon.advice.outlook.OwnLotReport;
import org.wardon.advice.wording.Words;
import org.wardon.files.forecast.OwnLotsAnswer;
import org.wardon.produce.Reason;

/** The keeper's own lots for a person. */
final class OwnLotPage {
    private final Words words;

    OwnLotPage(Words words) {
        this.words = words;
    }

    /**
     * Returns the page.
     *
     * @param report the lots
     * @param remembered number of the lot just remembered
     */
    String of(OwnLotReport report, Optional<Long> remembered) {
        OwnLotsAnswer answer = report.answer();
        String name = report.commodity().names().get(0);
        StringBuilder page = new StringBuilder();
        remembered.ifPresent(
                number -> page.append(name + ": remembered as lot " + number + ".\n\n"));
        if (answer.lots().isEmpty()) {
            return page.append(name + ": no lots of your own are remembered.\n").toString();
        }
        Table table = new Table("lot", "ended", "how", "kept", "at", "of the published life", "");
        for (OwnLotsAnswer.Lot lot : answer.lots()) {
            table.row(
                    String.valueOf(lot.number()),
                    lot.endedOn(),
                    lot.ended(),
                    words.units().figure(lot.days(), "day"),
                    words.units().figure(lot.meanC(), "C"),
                    (atLeast(lot) ? "at least " : "")
                            + words.units().figure(lot.publishedPct(), "pct"),
                    String.join(" ", lot.lot(), lot.variant(), lot.note()).strip());
        }
        page.append(table.text()).append('\n');
        page.append(
                Paragraph.hanging(
                        "",
                        "At "
                                + words.units().figure(answer.atC(), "C")
                                + " a sound lot ages out in "
                                + words.range(answer.days())
                                + "; by print alone in "
                                + words.range(answer.publishedDays())
                                + "."));
        for (Reason reason : report.reasons()) {
            page.append(Paragraph.entry("  ", words.sentence(reason), reason.sourceId()));
        }
        return page.toString();
    }

    private static boolean atLeast(OwnLotsAnswer.Lot lot) {
        return lot.ended().equals("sold") || lot.ended().equals("spoilt");
    }
}
