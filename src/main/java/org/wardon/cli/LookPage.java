package org.wardon.cli;

import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.wardon.advice.wording.FactWords;
import org.wardon.advice.wording.Units;
import org.wardon.produce.Commodity;
import org.wardon.produce.NamedFact;
import org.wardon.reference.ReferenceBook;
import org.wardon.reference.Variants;

/** What print says of a commodity, for a person. */
final class LookPage {
    private static final String NOTE_INDENT = "      ";

    private final ReferenceBook book;
    private final FactWords words;

    LookPage(ReferenceBook book, Units units) {
        this.book = book;
        words = new FactWords(units);
    }

    String of(Commodity commodity, List<NamedFact> facts) {
        StringBuilder page = new StringBuilder();
        page.append(
                Paragraph.hanging(
                        "", String.join(", ", commodity.names()) + " [" + commodity.id() + "]"));
        Map<String, String> variants = Variants.of(commodity);
        if (!variants.isEmpty()) {
            page.append(
                    Paragraph.hanging(
                            "",
                            "Variants with rows of their own (keep --variant): "
                                    + String.join(", ", variants.keySet())));
        }
        page.append('\n');
        Set<String> sources = new LinkedHashSet<>();
        for (NamedFact fact : facts) {
            page.append(entry(fact));
            sources.addAll(List.of(fact.sourceId().split(";", -1)));
        }
        page.append("\nSources\n");
        for (String id : sources) {
            page.append(Paragraph.hanging("  ", id + ": " + book.source(id).citation()));
        }
        return page.toString();
    }

    private String entry(NamedFact fact) {
        String told =
                words.name(fact.name())
                        + ": "
                        + words.value(fact)
                        + " ["
                        + (fact.own() ? "own" : fact.sourceId() + ", " + fact.evidence().word())
                        + "]";
        String note = words.note(fact);
        return Paragraph.hanging("  ", told)
                + (note.isBlank() ? "" : Paragraph.hanging(NOTE_INDENT, note));
    }
}
