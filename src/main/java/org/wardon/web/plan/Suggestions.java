package org.wardon.web.plan;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.wardon.advice.faces.FaceAdvice;
import org.wardon.files.form.FormPlace;
import org.wardon.files.form.PlanForm;
import org.wardon.produce.Commodity;
import org.wardon.reference.ReferenceBook;

/** Ids a field may name: of the tables, of the plan's own chambers and build-ups. */
public final class Suggestions {
    private static final Map<String, String> LISTS =
            Map.of(
                    "material", "materials",
                    "commodity", "commodities",
                    "package", "packages",
                    "protection", "doorways",
                    "chamber", "chambers",
                    "to", "chambers",
                    "buildUp", "build-ups");

    private Suggestions() {}

    /** The list a field of that name is offered; blank for none. */
    static String listFor(String name) {
        return LISTS.getOrDefault(name, "");
    }

    /**
     * A list.
     *
     * @param id its id
     * @param words its words with what they mean
     */
    public record Named(String id, List<EntryView.Pick> words) {
        /** Copies the list. */
        public Named {
            words = List.copyOf(words);
        }
    }

    static Named of(String id, ReferenceBook book, PlanForm form) {
        List<EntryView.Pick> words = new ArrayList<>();
        switch (id) {
            case "materials" ->
                    FaceAdvice.materials(book).forEach((one, name) -> words.add(pick(one, name)));
            case "commodities" -> {
                for (Commodity one : book.all()) {
                    words.add(pick(one.id(), one.names().get(0)));
                }
            }
            case "packages" ->
                    book.packageKinds().keySet().forEach(one -> words.add(pick(one, "")));
            case "doorways" -> book.doorways().keySet().forEach(one -> words.add(pick(one, "")));
            case "chambers" -> ids(form, "chambers", words);
            default ->
                    form.root().place("buildUps").stream()
                            .flatMap(all -> all.places().stream())
                            .forEach(one -> words.add(pick(one.name(), "")));
        }
        words.sort(java.util.Comparator.comparing(EntryView.Pick::word));
        return new Named(id, words);
    }

    private static void ids(PlanForm form, String list, List<EntryView.Pick> words) {
        form.root().place(list).stream()
                .flatMap(all -> all.places().stream())
                .flatMap(one -> one.place("id").stream())
                .map(FormPlace::written)
                .forEach(id -> words.add(pick(id, "")));
    }

    private static EntryView.Pick pick(String word, String name) {
        return new EntryView.Pick(word, name, false);
    }
}
