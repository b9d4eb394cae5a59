package org.wardon.reference;

import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;

/** Finds a commodity by what people call it. */
final class Names {
    private static final int SUGGESTIONS = 4;

    private final Map<String, String> idOf = new LinkedHashMap<>();

    Names(ReferenceDatabase database) {
        read(database, "select commodity_id as name, commodity_id from commodities");
        read(database, "select alias as name, commodity_id from aliases");
        read(database, "select common_name as name, commodity_id from commodities");
        readScientific(database);
    }

    private void read(ReferenceDatabase database, String sql) {
        database.list(
                        sql + " order by line",
                        row -> List.of(row.text("name"), row.text("commodity_id")))
                .forEach(pair -> idOf.putIfAbsent(plain(pair.get(0)), pair.get(1)));
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
                        idOf.putIfAbsent(name, id);
                    }
                });
    }

    /** Returns the id; case, blanks, hyphens and the plural do not matter. */
    Optional<String> find(String name) {
        String plain = plain(name);
        return singulars(plain).stream().filter(idOf::containsKey).findFirst().map(idOf::get);
    }

    /**
     * Returns the ids whose names come nearest to a name that is misspelt or too short, nearest
     * first; a whole word of a name, such as {@code pepper}, counts as one slip.
     */
    List<String> nearest(String name) {
        String plain = plain(name);
        int reach = Math.max(2, plain.length() / 3);
        Map<String, Integer> slipsTo = new HashMap<>();
        idOf.forEach(
                (known, id) -> {
                    int slips = hasWord(known, plain) ? 1 : EditDistance.between(plain, known);
                    if (slips <= reach) {
                        slipsTo.merge(id, slips, Math::min);
                    }
                });
        return slipsTo.entrySet().stream()
                .sorted(
                        Map.Entry.<String, Integer>comparingByValue()
                                .thenComparing(Map.Entry.comparingByKey()))
                .limit(SUGGESTIONS)
                .map(Map.Entry::getKey)
                .toList();
    }

    private static boolean hasWord(String known, String plain) {
        return singulars(plain).stream()
                .anyMatch(word -> (" " + known + " ").contains(" " + word + " "));
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
        return name.strip()
                .toLowerCase(Locale.ROOT)
                .replace('’', '\'')
                .replaceAll("[-_,()\\s]+", " ")
                .strip();
    }
}
