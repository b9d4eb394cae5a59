package org.wardon.files.form;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Predicate;
import java.util.stream.Collectors;
import org.wardon.files.json.Json;
import org.wardon.files.json.JsonEdit;
import org.wardon.files.json.JsonPath;
import org.wardon.files.json.Shape;
import org.wardon.files.json.Shapes;

/**
 * Changes a plan's text by what was typed into a form. What was left as it was shown is not
 * touched, so its writing stays; what was emptied is taken out, so that the default holds again;
 * what is no number where one belongs is kept as it was typed and becomes a fault at its place.
 */
public final class PlanChange {
    private final NumberText numbers;

    /**
     * Prepares.
     *
     * @param numbers how the person writes numbers
     */
    public PlanChange(NumberText numbers) {
        this.numbers = numbers;
    }

    /**
     * What was typed.
     *
     * @param values by path of a number, word or text; for a list of those, one text with blanks
     *     between its items
     * @param options by path of a choice: the word of the option taken, empty for none
     * @param sets by path of a list of words: those ticked
     */
    public record Typed(
            Map<String, String> values,
            Map<String, String> options,
            Map<String, List<String>> sets) {
        /** Copies the maps. */
        public Typed {
            values = Map.copyOf(values);
            options = Map.copyOf(options);
            sets = Map.copyOf(sets);
        }
    }

    /**
     * Applies what was typed.
     *
     * @param text the plan the form was made of
     * @param typed what was typed
     * @return the changed text, the same where nothing was changed
     * @throws org.wardon.errors.BadInput where the text is no JSON
     */
    public String apply(String text, Typed typed) {
        JsonEdit edit = JsonEdit.of(text);
        for (JsonPath path : ordered(typed.options().keySet())) {
            edit = choose(edit, path, typed.options().getOrDefault(path.toString(), ""));
        }
        for (JsonPath path : ordered(typed.sets().keySet())) {
            edit = tick(edit, path, typed.sets().getOrDefault(path.toString(), List.of()));
        }
        for (JsonPath path : ordered(typed.values().keySet())) {
            if (reached(edit, path, typed.options())) {
                edit = value(edit, path, typed.values().getOrDefault(path.toString(), ""));
            }
        }
        return edit.text();
    }

    /**
     * Returns what of it differs from what the form showed.
     *
     * @param text the plan the form was made of
     * @param typed what was typed
     * @return the rest left out
     */
    public Typed changed(String text, Typed typed) {
        PlanForm form = PlanForm.of(text);
        Map<String, String> values = new HashMap<>();
        typed.values()
                .forEach(
                        (path, value) -> {
                            if (!value.strip().equals(shownAt(form, path).strip())) {
                                values.put(path, value);
                            }
                        });
        Map<String, String> options = new HashMap<>();
        typed.options()
                .forEach(
                        (path, word) -> {
                            boolean beside = values.keySet().stream().anyMatch(inside(path));
                            if (!word.equals(optionAt(form, path)) || beside) {
                                options.put(path, word);
                            }
                        });
        return new Typed(values, options, typed.sets());
    }

    private static Predicate<String> inside(String path) {
        return other -> other.equals(path) || other.startsWith(path + ".");
    }

    private String shownAt(PlanForm form, String path) {
        return JsonPath.parse(path).flatMap(form::at).map(this::shown).orElse("");
    }

    private static String optionAt(PlanForm form, String path) {
        return JsonPath.parse(path)
                .flatMap(form::at)
                .flatMap(FormPlace::taken)
                .map(Shape.Option::word)
                .orElse("");
    }

    private static List<JsonPath> ordered(Iterable<String> paths) {
        List<JsonPath> found = new ArrayList<>();
        paths.forEach(path -> JsonPath.parse(path).ifPresent(found::add));
        found.sort(
                Comparator.<JsonPath>comparingInt(path -> path.steps().size())
                        .thenComparing(JsonPath::toString));
        return found;
    }

    /** Whether a place lies in the options that were taken, not in one beside them. */
    private static boolean reached(JsonEdit edit, JsonPath path, Map<String, String> options) {
        for (JsonPath up = path; !up.steps().isEmpty(); up = up.up()) {
            String option = options.get(up.up().toString());
            boolean member = up.last().orElse(null) instanceof JsonPath.Member;
            if (option != null && member && !within(edit, up, option)) {
                return false;
            }
        }
        return !"".equals(options.getOrDefault(path.toString(), "-"));
    }

    private static boolean within(JsonEdit edit, JsonPath place, String option) {
        if (option.isEmpty()) {
            return false;
        }
        String name = ((JsonPath.Member) place.last().orElseThrow()).name();
        return PlanForm.of(edit.text())
                .at(place.up())
                .map(FormPlace::shape)
                .filter(Shape.Choice.class::isInstance)
                .flatMap(choice -> ((Shape.Choice) choice).option(option))
                .map(taken -> holds(taken, name))
                .orElse(true);
    }

    private static boolean holds(Shape.Option option, String member) {
        return option.by() == Shape.By.KIND
                || (option.by() == Shape.By.NAME && option.word().equals(member));
    }

    private JsonEdit choose(JsonEdit edit, JsonPath path, String word) {
        Optional<FormPlace> place = PlanForm.of(edit.text()).at(path);
        if (place.isEmpty() || !(place.get().shape() instanceof Shape.Choice choice)) {
            return edit;
        }
        String now = place.get().taken().map(Shape.Option::word).orElse("");
        if (word.equals(now)) {
            return edit;
        }
        if (word.isEmpty()) {
            return edit.remove(path);
        }
        return choice.option(word).map(o -> edit.set(path, Shapes.begun(o))).orElse(edit);
    }

    private JsonEdit tick(JsonEdit edit, JsonPath path, List<String> words) {
        Optional<FormPlace> place = PlanForm.of(edit.text()).at(path);
        if (place.isEmpty()) {
            return edit;
        }
        List<String> now = place.get().places().stream().map(FormPlace::written).toList();
        if (now.size() == words.size() && now.containsAll(words)) {
            return edit;
        }
        String items = words.stream().map(JsonEdit::quoted).collect(Collectors.joining(", "));
        return edit.set(path, "[" + items + "]");
    }

    private JsonEdit value(JsonEdit edit, JsonPath path, String typed) {
        Optional<FormPlace> found = PlanForm.of(edit.text()).at(path);
        if (found.isEmpty()) {
            return edit;
        }
        FormPlace place = found.get();
        String text = typed.strip();
        if (text.equals(shown(place).strip())) {
            return edit;
        }
        if (text.isEmpty()) {
            return place.given() ? edit.remove(path) : edit;
        }
        JsonEdit set = edit.set(path, json(leaf(place), text));
        return ChamberNames.isName(path) ? ChamberNames.follow(set, place.written(), text) : set;
    }

    /** The shape a typed value fills: of a choice by type, that of the option taken. */
    private static Shape leaf(FormPlace place) {
        return place.taken().map(Shape.Option::shape).orElse(place.shape());
    }

    private String json(Shape shape, String typed) {
        if (shape instanceof Shape.Figure figure) {
            return numbers.read(typed, figure.unit()).orElseGet(() -> JsonEdit.quoted(typed));
        }
        if (shape instanceof Shape.Listed list) {
            return "["
                    + List.of(typed.split("[\\s;]+")).stream()
                            .map(item -> json(list.of(), item))
                            .collect(Collectors.joining(", "))
                    + "]";
        }
        boolean flag = shape instanceof Shape.YesNo;
        return flag && (typed.equals("true") || typed.equals("false"))
                ? typed
                : JsonEdit.quoted(typed);
    }

    /**
     * Returns what stands at a place as a form shows it.
     *
     * @param place the place
     * @return a number in the person's unit, a word, a text, or the items of a list of those
     */
    public String shown(FormPlace place) {
        Shape shape = leaf(place);
        if (shape instanceof Shape.Figure figure && place.json().orElse(null) instanceof Json.Num) {
            return numbers.shown(place.written(), figure.unit());
        }
        if (shape instanceof Shape.Listed list) {
            return new FormPlace(place.path(), place.name(), true, list, place.json())
                    .places().stream().map(this::shown).collect(Collectors.joining(" "));
        }
        return place.written();
    }
}
