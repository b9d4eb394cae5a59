package org.wardon.advice.crops;

import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Collectors;
import org.wardon.produce.Commodity;
import org.wardon.reference.NameMatch;
import org.wardon.reference.ReferenceBook;

/** Finds crops by what people type: any name, part of one, several words, misspelt or accented. */
public final class CropSearch {
    private final ReferenceBook book;

    /**
     * Prepares for searching.
     *
     * @param book the tables
     */
    public CropSearch(ReferenceBook book) {
        this.book = book;
    }

    /**
     * A crop found.
     *
     * @param commodity the crop
     * @param by the name that was met
     */
    public record Hit(Commodity commodity, String by) {}

    /**
     * Returns the crops that a text may mean.
     *
     * @param text what was typed
     * @return best first; all for a blank text, none where nothing comes near
     */
    public List<Hit> find(String text) {
        if (text.isBlank()) {
            return book.all().stream().map(one -> new Hit(one, one.names().get(0))).toList();
        }
        List<NameMatch> found = book.search(text);
        List<NameMatch> sure =
                found.stream()
                        .filter(match -> match.how().compareTo(NameMatch.How.SLIP) < 0)
                        .toList();
        return (sure.isEmpty() ? found : sure)
                .stream().map(match -> new Hit(book.get(match.id()), match.name())).toList();
    }

    /**
     * Returns all crops by the part of the plant they are.
     *
     * @return lists by part, both in alphabetical order
     */
    public Map<String, List<Commodity>> byPart() {
        return book.all().stream()
                .sorted(Comparator.comparing(one -> one.names().get(0).toLowerCase(Locale.ROOT)))
                .collect(
                        Collectors.groupingBy(
                                Commodity::plantPart, TreeMap::new, Collectors.toList()));
    }
}
