package org.wardon.advice;

import java.util.HashMap;
import java.util.Map;
import java.util.Set;
import org.wardon.files.Lookups;
import org.wardon.reference.ReferenceBook;
import org.wardon.reference.Variants;

/** What a store plan may name, from the reference book. */
public final class PlanLookups {
    private PlanLookups() {}

    /**
     * Returns the ids of a book.
     *
     * @param book the book
     * @return ids of commodities, their variants, packages, materials and door protections
     */
    public static Lookups of(ReferenceBook book) {
        Map<String, Double> protections = new HashMap<>();
        book.doorways()
                .forEach(
                        (id, doorway) ->
                                doorway.usual()
                                        .ifPresent(fact -> protections.put(id, fact.middle())));
        Map<String, Set<String>> variants = new HashMap<>();
        book.all().forEach(one -> variants.put(one.id(), Variants.of(one).keySet()));
        return new Lookups(
                Set.copyOf(book.list()),
                variants,
                book.packageKinds().keySet(),
                book.materials(),
                protections);
    }
}
