package org.wardon.web.plan;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.IntStream;
import org.wardon.advice.faces.FaceAdvice;
import org.wardon.advice.faces.FaceReport;
import org.wardon.errors.Fault;
import org.wardon.files.form.FormPlace;
import org.wardon.files.form.PlanForm;
import org.wardon.files.form.PlanStep;
import org.wardon.files.json.Json;
import org.wardon.files.json.JsonPath;
import org.wardon.files.json.Shape;
import org.wardon.web.pages.Figures;
import org.wardon.web.pages.PageWords;

/** Links to items of a plan that have pages of their own, and the buttons that change lists. */
final class RowMaker {
    private static final List<String> TOLD =
            List.of("commodity", "massKg", "chamber", "arrives", "beyond", "buildUp");

    private final long plan;
    private final PlanForm form;
    private final List<Fault> faults;
    private final FieldWords words;
    private final PageWords page;
    private final Figures figures;
    private final TypedNumbers numbers;
    private final Optional<FaceAdvice> faces;

    RowMaker(Made made, FieldWords words, PageWords page, Figures figures, TypedNumbers numbers) {
        plan = made.plan;
        form = made.form;
        faults = made.faults;
        faces = made.faces;
        this.words = words;
        this.page = page;
        this.figures = figures;
        this.numbers = numbers;
    }

    /** What rows are made of. */
    record Made(long plan, PlanForm form, List<Fault> faults, Optional<FaceAdvice> faces) {
        Made {
            faults = List.copyOf(faults);
        }
    }

    List<EntryView.Row> items(FormPlace list) {
        return items(list, IntStream.range(0, list.places().size()).boxed().toList());
    }

    /** Some items of a list, by their numbers. */
    List<EntryView.Row> items(FormPlace list, List<Integer> which) {
        List<EntryView.Row> rows = new ArrayList<>();
        List<FormPlace> items = list.places();
        for (int index : which) {
            FormPlace item = items.get(index);
            boolean named = list.shape() instanceof Shape.Named;
            String name = name(item, index);
            List<EntryView.Step> steps =
                    named
                            ? List.of(brief(PlanStep.Kind.REMOVE, item.path(), "edit.remove", name))
                            : stepsOf(item.path(), name, index, items.size());
            rows.add(row(item, name, steps));
        }
        return rows;
    }

    /** A link to the page of a long list, with how many are in it. */
    EntryView.Row whole(FormPlace list, String name) {
        String many = page.say("edit.so-many", String.valueOf(list.places().size()));
        return new EntryView.Row(
                PlanPlaces.href(plan, list.path()), name, many, faultsIn(list), List.of());
    }

    EntryView.Row link(FormPlace place, String name) {
        return row(place, name, List.of());
    }

    private EntryView.Row row(FormPlace item, String name, List<EntryView.Step> steps) {
        return new EntryView.Row(
                PlanPlaces.href(plan, item.path()), name, told(item), faultsIn(item), steps);
    }

    int faultsIn(FormPlace item) {
        String below = item.path().toString();
        return (int)
                faults.stream()
                        .filter(f -> f.path().equals(below) || inside(f.path(), below))
                        .count();
    }

    private static boolean inside(String path, String whole) {
        return path.startsWith(whole + ".") || path.startsWith(whole + "[");
    }

    private String name(FormPlace item, int index) {
        if (item.shape() instanceof Shape.Choice) {
            return item.taken()
                    .map(one -> words.label(PlanPlaces.key(form, item.path())))
                    .orElse(page.say("edit.item", String.valueOf(index + 1)));
        }
        String given =
                item.place("id").or(() -> item.place("face")).map(FormPlace::written).orElse("");
        if (!given.isEmpty()) {
            return item.place("id").isPresent() ? given : words.word(given);
        }
        return item.path().last().orElse(null) instanceof JsonPath.Member member
                ? member.name()
                : page.say("edit.item", String.valueOf(index + 1));
    }

    private String told(FormPlace item) {
        List<String> parts = new ArrayList<>();
        for (String name : TOLD) {
            item.place(name).filter(FormPlace::given).map(this::said).ifPresent(parts::add);
        }
        faces.flatMap(all -> all.of(item.path()))
                .map(FaceReport::upliftedWm2K)
                .ifPresent(u -> parts.add(page.say("edit.u", watts(u))));
        return String.join(", ", parts);
    }

    private String said(FormPlace place) {
        if (place.shape() instanceof Shape.Figure figure
                && place.json().get() instanceof Json.Num) {
            return numbers.shown(place.written(), figure.unit())
                    + " "
                    + numbers.unit(figure.unit());
        }
        Optional<Shape.Option> named =
                place.taken().filter(o -> o.by() == Shape.By.NAME || o.by() == Shape.By.KIND);
        if (named.isPresent()) {
            return words.label(PlanPlaces.key(form, place.path()) + "." + named.get().word());
        }
        boolean word = place.taken().filter(o -> o.by() == Shape.By.WORD).isPresent();
        return word || place.shape() instanceof Shape.Words
                ? words.word(place.written())
                : place.written().replaceFirst("(?<=^\\d{4}-\\d\\d-\\d\\d)T", " ");
    }

    String watts(double wattsM2K) {
        return figures.text(String.format(Locale.ROOT, "%.3f W/m2K", wattsM2K));
    }

    List<EntryView.Step> stepsOf(JsonPath path, String name, int index, int size) {
        List<EntryView.Step> steps = new ArrayList<>();
        if (index > 0) {
            steps.add(brief(PlanStep.Kind.UP, path, "edit.up", name));
        }
        if (index + 1 < size) {
            steps.add(brief(PlanStep.Kind.DOWN, path, "edit.down", name));
        }
        steps.add(brief(PlanStep.Kind.COPY, path, "edit.copy", name));
        steps.add(brief(PlanStep.Kind.REMOVE, path, "edit.remove", name));
        return steps;
    }

    EntryView.Step drop(JsonPath path, String name) {
        return step(PlanStep.Kind.REMOVE, path, "", "edit.remove", name);
    }

    EntryView.Step give(JsonPath path, String name) {
        return step(PlanStep.Kind.ADD, path, "", "edit.add", name);
    }

    /** A button that adds to a list: one a kind, whatever kinds there are. */
    List<EntryView.Step> add(FormPlace place, Shape.Listed list, String name) {
        if (!(list.of() instanceof Shape.Choice choice)) {
            return List.of(step(PlanStep.Kind.ADD, place.path(), "", "edit.add-to", name));
        }
        String key = PlanPlaces.key(form, place.path());
        return choice.options().stream()
                .map(
                        option ->
                                step(
                                        PlanStep.Kind.ADD,
                                        place.path(),
                                        option.word(),
                                        "edit.add",
                                        words.label(key + "." + option.word())))
                .toList();
    }

    List<EntryView.Step> addNamed(FormPlace place, String name) {
        EntryView.Step add = step(PlanStep.Kind.ADD, place.path(), "", "edit.add-to", name);
        return List.of(
                new EntryView.Step(add.value(), add.text(), add.spoken(), "id:" + place.path()));
    }

    /** A button in a row: the row's name is heard, not seen once more. */
    private EntryView.Step brief(PlanStep.Kind kind, JsonPath path, String key, String name) {
        return new EntryView.Step(
                kind + " " + path + " ", page.say(key + "-brief"), page.say(key, name), "");
    }

    private EntryView.Step step(
            PlanStep.Kind kind, JsonPath path, String word, String key, String name) {
        return new EntryView.Step(
                kind + " " + path + " " + word, page.say(key, name), page.say(key, name), "");
    }
}
