package org.wardon.files.json;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * A place in a JSON tree, there or not, that is read without complaint: what is absent or of the
 * wrong type is empty. Whether it ought to be there is the schema's matter.
 *
 * @param path where, such as {@code $.chambers[0].door}
 * @param json what stands there
 */
public record Part(String path, Optional<Json> json) {
    /**
     * Returns the root of a tree.
     *
     * @param json the tree
     * @return the root, path {@code $}
     */
    public static Part root(Json json) {
        return new Part("$", Optional.of(json));
    }

    /**
     * Returns a member.
     *
     * @param name its name
     * @return the place, there or not
     */
    public Part at(String name) {
        return new Part(
                Json.member(path, name), members().map(object -> object.members().get(name)));
    }

    /**
     * Returns the place a path leads to from here.
     *
     * @param way the path, from here
     * @return the place, there or not
     */
    public Part at(JsonPath way) {
        Part here = this;
        for (JsonPath.Step step : way.steps()) {
            here =
                    step instanceof JsonPath.Item item
                            ? here.item(item.index())
                            : here.at(((JsonPath.Member) step).name());
        }
        return here;
    }

    private Part item(int index) {
        List<Part> items = items();
        return index < items.size()
                ? items.get(index)
                : new Part(path + "[" + index + "]", Optional.empty());
    }

    /**
     * Returns whether anything stands there.
     *
     * @return true if so
     */
    public boolean given() {
        return json.isPresent();
    }

    /**
     * Returns whether a member is given.
     *
     * @param name its name
     * @return true if so
     */
    public boolean has(String name) {
        return at(name).given();
    }

    /**
     * Returns the items of a list.
     *
     * @return their places, none where it is no list
     */
    public List<Part> items() {
        List<Part> parts = new ArrayList<>();
        if (json.isPresent() && json.get() instanceof Json.Arr list) {
            for (Json item : list.items()) {
                parts.add(new Part(path + "[" + parts.size() + "]", Optional.of(item)));
            }
        }
        return parts;
    }

    /**
     * Returns the names of an object.
     *
     * @return in their order, none where it is no object
     */
    public List<String> names() {
        return members().map(object -> List.copyOf(object.members().keySet())).orElse(List.of());
    }

    /**
     * Returns a text.
     *
     * @return the text, empty where it is none
     */
    public Optional<String> text() {
        return json.filter(Json.Text.class::isInstance).map(text -> ((Json.Text) text).value());
    }

    /**
     * Returns a number.
     *
     * @return the number, empty where it is none or too large
     */
    public OptionalDouble number() {
        if (json.isPresent() && json.get() instanceof Json.Num num) {
            double value = num.value();
            return Double.isFinite(value) ? OptionalDouble.of(value) : OptionalDouble.empty();
        }
        return OptionalDouble.empty();
    }

    /**
     * Returns true or false.
     *
     * @return which, empty where it is neither
     */
    public Optional<Boolean> flag() {
        return json.filter(Json.Flag.class::isInstance).map(flag -> ((Json.Flag) flag).value());
    }

    private Optional<Json.Obj> members() {
        return json.filter(Json.Obj.class::isInstance).map(Json.Obj.class::cast);
    }
}
