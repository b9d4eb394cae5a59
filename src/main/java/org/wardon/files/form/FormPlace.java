package org.wardon.files.form;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.wardon.files.json.Json;
import org.wardon.files.json.JsonPath;
import org.wardon.files.json.Shape;
import org.wardon.files.json.Shapes;

/**
 * A place of a plan: what may stand there and what does.
 *
 * @param path where
 * @param name name of the member; that of the list for an item; empty for the root
 * @param required whether it must be given
 * @param shape what may stand there
 * @param json what does
 */
public record FormPlace(
        JsonPath path, String name, boolean required, Shape shape, Optional<Json> json) {
    /**
     * Returns whether anything stands there.
     *
     * @return true if so
     */
    public boolean given() {
        return json.isPresent();
    }

    /**
     * Returns the places of a group, of the taken option of a choice, of the items of a list, or of
     * the ids of names of the person's own.
     *
     * @return places in the order of the schema, or of the plan for items and ids
     */
    public List<FormPlace> places() {
        if (shape instanceof Shape.Group group) {
            return group.members().stream().map(this::member).toList();
        }
        if (shape instanceof Shape.Listed list) {
            return items(list);
        }
        if (shape instanceof Shape.Named named && json.orElse(null) instanceof Json.Obj object) {
            return object.members().entrySet().stream()
                    .map(
                            e ->
                                    new FormPlace(
                                            path.then(new JsonPath.Member(e.getKey())),
                                            e.getKey(),
                                            true,
                                            named.of(),
                                            Optional.of(e.getValue())))
                    .toList();
        }
        return taken().map(
                        option ->
                                option.by() == Shape.By.NAME
                                        ? List.of(ofOption(option))
                                        : ofOption(option).places())
                .orElse(List.of());
    }

    private List<FormPlace> items(Shape.Listed list) {
        List<FormPlace> items = new ArrayList<>();
        if (json.orElse(null) instanceof Json.Arr array) {
            for (Json item : array.items()) {
                JsonPath at = path.then(new JsonPath.Item(items.size()));
                items.add(new FormPlace(at, name, true, list.of(), Optional.of(item)));
            }
        }
        return items;
    }

    private FormPlace member(Shape.Member member) {
        return new FormPlace(
                path.then(new JsonPath.Member(member.name())),
                member.name(),
                member.required(),
                member.shape(),
                value(member.name()));
    }

    private Optional<Json> value(String member) {
        return json.filter(Json.Obj.class::isInstance)
                .map(object -> ((Json.Obj) object).members().get(member));
    }

    /**
     * Returns names of a group that the schema does not know.
     *
     * @return names as they stand in the plan
     */
    public List<String> strangers() {
        if (shape instanceof Shape.Group group && json.orElse(null) instanceof Json.Obj object) {
            return object.members().keySet().stream()
                    .filter(member -> group.member(member).isEmpty())
                    .toList();
        }
        return taken().filter(option -> option.by() == Shape.By.KIND)
                .map(this::ofOption)
                .map(FormPlace::strangers)
                .orElse(List.of());
    }

    /**
     * Returns a place of a group by its name.
     *
     * @param member the name
     * @return the place, absent where the group has no such name
     */
    public Optional<FormPlace> place(String member) {
        return places().stream().filter(one -> one.name().equals(member)).findFirst();
    }

    /**
     * Returns the option a choice has taken.
     *
     * @return the option, absent where nothing stands there, it fits none, or this is no choice
     */
    public Optional<Shape.Option> taken() {
        return shape instanceof Shape.Choice choice
                ? json.flatMap(value -> Shapes.taken(choice, value))
                : Optional.empty();
    }

    /**
     * Returns the place an option of this choice fills, as if it were taken.
     *
     * @param option one of its options
     * @return the place, with what stands there where it is the taken one
     */
    public FormPlace ofOption(Shape.Option option) {
        boolean now = taken().filter(option::equals).isPresent();
        if (option.by() == Shape.By.NAME) {
            return new FormPlace(
                    path.then(new JsonPath.Member(option.word())),
                    option.word(),
                    now,
                    option.shape(),
                    now ? value(option.word()) : Optional.empty());
        }
        return new FormPlace(path, name, required, option.shape(), now ? json : Optional.empty());
    }

    /**
     * Returns what stands there, as it was written.
     *
     * @return a number, a word, a text, {@code true}; empty where nothing or something larger does
     */
    public String written() {
        Json value = json.orElse(new Json.Null());
        if (value instanceof Json.Num num) {
            return num.written();
        }
        if (value instanceof Json.Text text) {
            return text.value();
        }
        return value instanceof Json.Flag flag ? String.valueOf(flag.value()) : "";
    }
}
