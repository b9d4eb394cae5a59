package org.wardon.files.json;

import java.util.List;
import java.util.Optional;
import org.wardon.errors.Require;

/**
 * Changes a JSON text at a path and leaves all other text as it stands: order, blanks, the way
 * numbers are written, names nobody knows. Each change gives a new text.
 */
public final class JsonEdit {
    private final String text;
    private final JsonSpans.Span root;

    private JsonEdit(String text) {
        this.text = text;
        root = JsonSpans.of(text);
    }

    /**
     * Takes a text.
     *
     * @param text JSON that {@link JsonText} reads
     * @return the text, ready to be changed
     * @throws org.wardon.errors.BadInput where it is no JSON
     */
    public static JsonEdit of(String text) {
        Faults faults = new Faults("JSON");
        boolean read = JsonText.read(text, faults).isPresent();
        faults.refuseIfAny();
        Require.that(read, "a JSON text");
        return new JsonEdit(text);
    }

    /**
     * Returns the text.
     *
     * @return as it stands now
     */
    public String text() {
        return text;
    }

    /**
     * Returns what stands at a path.
     *
     * @param path the path
     * @return its text, absent where nothing stands there
     */
    public Optional<String> at(JsonPath path) {
        return span(path).map(span -> text.substring(span.from(), span.to()));
    }

    private Optional<JsonSpans.Span> span(JsonPath path) {
        Optional<JsonSpans.Span> span = Optional.of(root);
        for (JsonPath.Step step : path.steps()) {
            span = span.flatMap(one -> one.step(step));
        }
        return span;
    }

    /**
     * Puts a value at a path. Objects that are missing on the way are made; a place behind the end
     * of a list adds to it.
     *
     * @param path the path
     * @param json text of the value
     * @return the changed text
     * @throws IllegalArgumentException where something on the way is neither object nor list
     */
    public JsonEdit set(JsonPath path, String json) {
        Optional<JsonSpans.Span> there = span(path);
        if (there.isPresent()) {
            return changed(there.get().from(), there.get().to(), json);
        }
        JsonPath up = path.up();
        JsonPath.Step last = path.last().orElseThrow();
        Optional<JsonSpans.Span> owner = span(up);
        if (owner.isEmpty()) {
            return set(up, last instanceof JsonPath.Item ? "[]" : "{}").set(path, json);
        }
        if (last instanceof JsonPath.Member member) {
            Require.that(owner.get().object(), up + " is no object");
            return put(
                    owner.get(), owner.get().parts().size(), quoted(member.name()) + ": " + json);
        }
        Require.that(owner.get().list(), up + " is no list");
        return put(owner.get(), owner.get().parts().size(), json);
    }

    /**
     * Puts an item into a list.
     *
     * @param list path of the list
     * @param index its place, from 0; those behind move on
     * @param json text of the item
     * @return the changed text
     * @throws IllegalArgumentException where there is no list or it is shorter
     */
    public JsonEdit insert(JsonPath list, int index, String json) {
        JsonSpans.Span owner = listAt(list);
        Require.within("place in " + list, index, 0, owner.parts().size(), "", "");
        return put(owner, index, json);
    }

    /**
     * Takes a member or an item away.
     *
     * @param path its path
     * @return the changed text, the same where nothing stood there
     */
    public JsonEdit remove(JsonPath path) {
        Optional<JsonSpans.Span> there = span(path);
        if (there.isEmpty() || path.steps().isEmpty()) {
            return this;
        }
        List<JsonSpans.Span> parts = span(path.up()).orElseThrow().parts();
        int index = parts.indexOf(there.get());
        if (parts.size() == 1) {
            return changed(there.get().nameFrom(), there.get().to(), "");
        }
        return index == 0
                ? changed(there.get().nameFrom(), parts.get(1).nameFrom(), "")
                : changed(parts.get(index - 1).to(), there.get().to(), "");
    }

    /**
     * Puts a copy of an item behind it.
     *
     * @param list path of the list
     * @param index place of the item
     * @return the changed text
     * @throws IllegalArgumentException where there is no such item
     */
    public JsonEdit copy(JsonPath list, int index) {
        JsonSpans.Span item = itemAt(list, index);
        return insert(list, index + 1, text.substring(item.from(), item.to()));
    }

    /**
     * Lets an item change places with the next one.
     *
     * @param list path of the list
     * @param index place of the first of the two
     * @return the changed text
     * @throws IllegalArgumentException where there are no such items
     */
    public JsonEdit swap(JsonPath list, int index) {
        JsonSpans.Span one = itemAt(list, index);
        JsonSpans.Span next = itemAt(list, index + 1);
        String between = text.substring(one.to(), next.from());
        return changed(
                one.from(),
                next.to(),
                text.substring(next.from(), next.to())
                        + between
                        + text.substring(one.from(), one.to()));
    }

    private JsonSpans.Span listAt(JsonPath path) {
        Optional<JsonSpans.Span> owner = span(path).filter(JsonSpans.Span::list);
        Require.that(owner.isPresent(), path + " is no list");
        return owner.orElseThrow();
    }

    private JsonSpans.Span itemAt(JsonPath list, int index) {
        List<JsonSpans.Span> items = listAt(list).parts();
        Require.within("place in " + list, index, 0, items.size() - 1, "", "");
        return items.get(index);
    }

    /** Puts a part among others, on a line of its own where they stand so. */
    private JsonEdit put(JsonSpans.Span owner, int index, String part) {
        List<JsonSpans.Span> parts = owner.parts();
        if (parts.isEmpty()) {
            return changed(owner.from() + 1, owner.to() - 1, part);
        }
        JsonSpans.Span beside = parts.get(Math.min(index, parts.size() - 1));
        String before = text.substring(owner.from(), beside.nameFrom());
        int line = before.lastIndexOf('\n');
        String gap = line >= 0 ? between(parts, before.substring(line)) : " ";
        if (index < parts.size()) {
            return changed(beside.nameFrom(), beside.nameFrom(), part + "," + gap);
        }
        return changed(beside.to(), beside.to(), "," + gap + part);
    }

    /** The blanks between two parts: a new line only where parts stand on lines of their own. */
    private String between(List<JsonSpans.Span> parts, String ownLine) {
        if (parts.size() == 1) {
            return ownLine.isBlank() ? ownLine : " ";
        }
        String gap = text.substring(parts.get(0).to(), parts.get(1).nameFrom());
        int line = gap.lastIndexOf('\n');
        return line >= 0 ? gap.substring(line) : " ";
    }

    private JsonEdit changed(int from, int to, String with) {
        return new JsonEdit(text.substring(0, from) + with + text.substring(to));
    }

    /**
     * Returns a text as JSON writes it.
     *
     * @param plain any text
     * @return in quotes
     */
    public static String quoted(String plain) {
        StringBuilder json = new StringBuilder("\"");
        for (int i = 0; i < plain.length(); i++) {
            char c = plain.charAt(i);
            if (c == '"' || c == '\\') {
                json.append('\\').append(c);
            } else if (c < ' ') {
                json.append(String.format("\\u%04x", (int) c));
            } else {
                json.append(c);
            }
        }
        return json.append('"').toString();
    }
}
