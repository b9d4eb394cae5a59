package org.wardon.advice.crops;

import java.text.Normalizer;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeMap;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.wardon.produce.Commodity;
import org.wardon.reference.ReferenceBook;

/** Finds crops by what people type: any name, part of one, several words, misspelt or accented. */
public final class CropSearch {
    private final ReferenceBook book;
    private final List<Entry> entries;

    /**
     * Prepares for searching.
     *
     * @param book the tables
     */
    public CropSearch(ReferenceBook book) {
        this.book = book;
        entries = book.all().stream().map(Entry::new).toList();
    }

    /**
     * A crop found.
     *
     * @param commodity the crop
     * @param by the name that was met
     */
    public record Hit(Commodity commodity, String by) {}

    private record Entry(Commodity commodity, List<String> names, List<String> plain) {
        Entry(Commodity commodity) {
            this(
                    commodity,
                    commodity.names(),
                    commodity.names().stream().map(CropSearch::plain).toList());
        }

        /** How well a text meets a name, 0 for the whole of it; empty where it does not. */
        Optional<Rank> rank(String text) {
            return IntStream.range(0, plain.size())
                    .mapToObj(i -> Rank.of(plain.get(i), i, text))
                    .flatMap(Optional::stream)
                    .min(Comparator.naturalOrder());
        }
    }

    private record Rank(int how, int name) implements Comparable<Rank> {
        static Optional<Rank> of(String name, int index, String text) {
            if (name.equals(text)) {
                return Optional.of(new Rank(0, index));
            }
            if (name.startsWith(text)) {
                return Optional.of(new Rank(1, index));
            }
            if ((" " + name).contains(" " + text)) {
                return Optional.of(new Rank(2, index));
            }
            boolean each = Arrays.stream(text.split(" ", -1)).allMatch(name::contains);
            return each ? Optional.of(new Rank(3, index)) : Optional.empty();
        }

        @Override
        public int compareTo(Rank other) {
            return how != other.how ? how - other.how : name - other.name;
        }
    }

    /**
     * Returns the crops that a text may mean.
     *
     * @param text what was typed
     * @return best first; all for a blank text, none where nothing comes near
     */
    public List<Hit> find(String text) {
        String plain = plain(text);
        if (plain.isEmpty()) {
            return entries.stream().map(e -> new Hit(e.commodity(), e.names().get(0))).toList();
        }
        Map<Rank, List<Hit>> ranked = new TreeMap<>();
        for (Entry entry : entries) {
            entry.rank(plain)
                    .ifPresent(
                            rank ->
                                    ranked.computeIfAbsent(rank, r -> new ArrayList<>())
                                            .add(
                                                    new Hit(
                                                            entry.commodity(),
                                                            entry.names().get(rank.name()))));
        }
        List<Hit> hits = ranked.values().stream().flatMap(List::stream).toList();
        return hits.isEmpty() ? misspelt(text) : hits;
    }

    private List<Hit> misspelt(String text) {
        Set<String> ids = new LinkedHashSet<>();
        book.find(text).ifPresent(found -> ids.add(found.id()));
        ids.addAll(book.nearest(text));
        return ids.stream()
                .map(book::get)
                .map(found -> new Hit(found, found.names().get(0)))
                .toList();
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

    private static String plain(String text) {
        return Normalizer.normalize(text, Normalizer.Form.NFD)
                .replaceAll("\\p{M}", "")
                .toLowerCase(Locale.ROOT)
                .replaceAll("[^\\p{L}\\p{N}]+", " ")
                .strip();
    }
}
