package org.wardon.reference;

import java.text.Normalizer;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import org.wardon.reference.NameMatch.How;

/** Finds a commodity by what people call it. */
final class Names {
    private static final int SUGGESTIONS = 4;

    private final Map<String, String> idOf = new LinkedHashMap<>();
    private final List<NameSearch.Known> known = new ArrayList<>();
    private final NameSearch search;

    Names(ReferenceDatabase database) {
        read(database, "select commodity_id as name, commodity_id from commodities");
        read(database, "select alias as name, commodity_id from aliases");
        read(database, "select common_name as name, commodity_id from commodities");
        readScientific(database);
        search = new NameSearch(known);
    }

    private void read(ReferenceDatabase database, String sql) {
        database.list(
                        sql + " order by line",
                        row -> List.of(row.text("name"), row.text("commodity_id")))
                .forEach(pair -> know(pair.get(0), pair.get(1)));
    }

    private void know(String name, String id) {
        if (idOf.putIfAbsent(plain(name), id) == null) {
            known.add(new NameSearch.Known(plain(name), name, id));
        }
    }

    /** A botanical name leads to a commodity only where no other shares it. */
    private void readScientific(ReferenceDatabase database) {
        Map<String, String> single = new HashMap<>();
        database.list(
                        "select scientific_name as name, commodity_id from commodities",
                        row -> List.of(row.text("name"), row.text("commodity_id")))
                .forEach(
                        pair -> {
                            for (String name : pair.get(0).split("; ", -1)) {
                                single.merge(plain(name), pair.get(1), (one, other) -> "");
                            }
                        });
        single.forEach(
                (name, id) -> {
                    if (!id.isEmpty()) {
                        know(name, id);
                    }
                });
    }

    /** Returns the id; case, blanks, hyphens and the plural do not matter. */
    Optional<String> find(String name) {
        String plain = plain(name);
        return singulars(plain).stream().filter(idOf::containsKey).findFirst().map(idOf::get);
    }

    /**
     * Returns the ids whose names come nearest to a name that is misspelt or too short, surest
     * first: of the misspelt ones those with the fewest slips.
     */
    List<String> nearest(String name) {
        List<NameMatch> found = search(name);
        List<NameMatch> sure =
                found.stream().filter(match -> match.how().compareTo(How.SLIP) < 0).toList();
        List<NameMatch> told = sure.isEmpty() ? fewestSlips(name, found) : sure;
        return told.stream().limit(SUGGESTIONS).map(NameMatch::id).toList();
    }

    private static List<NameMatch> fewestSlips(String name, List<NameMatch> found) {
        String plain = plain(name);
        List<NameMatch> slips = found.stream().filter(match -> match.how() == How.SLIP).toList();
        if (slips.isEmpty()) {
            return found;
        }
        int least = EditDistance.between(plain, plain(slips.get(0).name()));
        return slips.stream()
                .filter(match -> EditDistance.between(plain, plain(match.name())) == least)
                .toList();
    }

    /** Returns all commodities that a text may mean, surest first. */
    List<NameMatch> search(String text) {
        return search.find(singulars(plain(text)));
    }

    private static List<String> singulars(String plain) {
        return List.of(
                plain,
                cut(plain, "s", ""),
                cut(plain, "es", ""),
                cut(plain, "ies", "y"),
                cut(plain, "ves", "f"));
    }

    private static String cut(String word, String ending, String instead) {
        return word.endsWith(ending)
                ? word.substring(0, word.length() - ending.length()) + instead
                : word;
    }

    private static String plain(String name) {
        return Normalizer.normalize(name, Normalizer.Form.NFD)
                .replaceAll("\\p{M}", "")
                .strip()
                .toLowerCase(Locale.ROOT)
                .replace('’', '\'')
                .replaceAll("[-_,()\\s]+", " ")
                .strip();
    }
}
