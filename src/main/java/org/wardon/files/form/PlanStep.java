package org.wardon.files.form;

import java.util.HashSet;
import java.util.Optional;
import java.util.Set;
import org.wardon.files.json.Json;
import org.wardon.files.json.JsonEdit;
import org.wardon.files.json.JsonPath;
import org.wardon.files.json.Part;
import org.wardon.files.json.Shape;
import org.wardon.files.json.Shapes;

/** Changes a plan's text by one press of a button: add, copy, move, take away. */
public final class PlanStep {
    private static final String ID = "id";
    private static final int MOST_NUMBERS = 10_000;

    private PlanStep() {}

    /** What a button does. */
    public enum Kind {
        /** Adds to a list, or gives a group that is not given. */
        ADD,
        /** Puts a copy of an item behind it. */
        COPY,
        /** Lets an item change places with the one before. */
        UP,
        /** Lets an item change places with the one behind. */
        DOWN,
        /** Takes an item or a group away. */
        REMOVE
    }

    /**
     * A text after a step, and the place to look at next.
     *
     * @param text the changed text
     * @param path the place
     */
    public record Done(String text, JsonPath path) {}

    /**
     * Takes a step.
     *
     * @param text the plan
     * @param kind what to do
     * @param path the item, the group, or for {@link Kind#ADD} the list
     * @param word with {@link Kind#ADD}, the option to begin with or the id of what is added; may
     *     be empty
     * @return the plan after it; the same where there was nothing to do
     * @throws org.wardon.errors.BadInput where the text is no JSON
     */
    public static Done take(String text, Kind kind, JsonPath path, String word) {
        JsonEdit edit = JsonEdit.of(text);
        if (kind == Kind.REMOVE) {
            return new Done(edit.remove(path).text(), path.up());
        }
        Optional<FormPlace> place = PlanForm.of(text).at(path);
        if (place.isEmpty()) {
            return new Done(text, path.up());
        }
        if (kind == Kind.ADD) {
            return add(edit, place.get(), word);
        }
        return path.last().orElse(null) instanceof JsonPath.Item item
                ? item(edit, kind, path.up(), item.index())
                : new Done(text, path);
    }

    private static Done item(JsonEdit edit, Kind kind, JsonPath list, int index) {
        int size = Part.root(tree(edit.text())).at(list).items().size();
        if (index >= size) {
            return new Done(edit.text(), list);
        }
        if (kind == Kind.COPY) {
            JsonPath copy = list.then(new JsonPath.Item(index + 1));
            return new Done(renamed(edit.copy(list, index), copy), copy);
        }
        int first = kind == Kind.UP ? index - 1 : index;
        return first < 0 || first + 1 >= size
                ? new Done(edit.text(), list)
                : new Done(edit.swap(list, first).text(), list);
    }

    private static Done add(JsonEdit edit, FormPlace place, String word) {
        if (place.shape() instanceof Shape.Listed list) {
            int size = place.places().size();
            JsonPath path = place.path().then(new JsonPath.Item(size));
            JsonEdit longer = edit.set(path, begun(list.of(), place.name(), word));
            return new Done(renamed(longer, path), path);
        }
        if (place.shape() instanceof Shape.Named named && !word.isBlank()) {
            JsonPath path = place.path().then(new JsonPath.Member(word.strip()));
            return edit.at(path).isPresent()
                    ? new Done(edit.text(), path)
                    : new Done(edit.set(path, named.of().blank()).text(), path);
        }
        return place.given()
                ? new Done(edit.text(), place.path())
                : new Done(edit.set(place.path(), place.shape().blank()).text(), place.path());
    }

    private static String begun(Shape item, String list, String word) {
        if (item instanceof Shape.Choice choice) {
            return choice.option(word).map(Shapes::begun).orElse("{}");
        }
        return Beginnings.of(list).orElseGet(item::blank);
    }

    /** Gives an item an id that no other of its list has. */
    private static String renamed(JsonEdit edit, JsonPath path) {
        Part item = Part.root(tree(edit.text())).at(path);
        Optional<String> id = item.at(ID).text();
        if (id.isEmpty()) {
            return edit.text();
        }
        Set<String> others = new HashSet<>();
        for (Part other : Part.root(tree(edit.text())).at(path.up()).items()) {
            if (!other.path().equals(path.toString())) {
                other.at(ID).text().ifPresent(others::add);
            }
        }
        String free = free(id.get(), others);
        return free.equals(id.get())
                ? edit.text()
                : edit.set(path.then(new JsonPath.Member(ID)), JsonEdit.quoted(free)).text();
    }

    private static String free(String id, Set<String> taken) {
        if (!taken.contains(id)) {
            return id;
        }
        String stem = id.replaceFirst("-\\d+$", "");
        for (int n = 2; n < MOST_NUMBERS; n++) {
            if (!taken.contains(stem + "-" + n)) {
                return stem + "-" + n;
            }
        }
        return id;
    }

    private static Json tree(String text) {
        return PlanForm.of(text).root().json().orElseThrow();
    }
}
