package org.wardon.web.plan;

import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.regex.Pattern;
import org.wardon.errors.Fault;
import org.wardon.files.form.FormPlace;
import org.wardon.files.form.PlanChange;
import org.wardon.files.form.PlanForm;
import org.wardon.files.json.JsonPath;
import org.wardon.files.json.Shape;
import org.wardon.web.pages.PageWords;

/** Makes what a form shows of the places of a plan. It knows shapes, no names of any kind. */
final class EntryMaker {
    private static final Map<String, String> INPUT =
            Map.of("localDateTime", "datetime-local", "localDate", "date", "localTime", "time");
    private static final Map<String, Pattern> WHOLE =
            Map.of(
                    "datetime-local",
                            Pattern.compile("|\\d{4}-\\d\\d-\\d\\dT\\d\\d:\\d\\d(:\\d\\d)?"),
                    "date", Pattern.compile("|\\d{4}-\\d\\d-\\d\\d"),
                    "time", Pattern.compile("|\\d\\d:\\d\\d"));

    /** Names a keeper often gives; all others are folded away until they are. */
    private static final Set<String> OFTEN =
            Set.of(
                    "name",
                    "lots",
                    "buildUps",
                    "chamber",
                    "package",
                    "arrives",
                    "wantedDays",
                    "harvested",
                    "ripeness",
                    "door",
                    "cooling",
                    "layers",
                    "buildUp",
                    "beyond",
                    "humidityPct",
                    "capacityKg",
                    "material",
                    "withoutChamber");

    /** So many are not worth folding. */
    private static final int FEW = 2;

    private final PlanForm form;
    private final List<Fault> faults;
    private final FieldWords words;
    private final PageWords page;
    private final TypedNumbers numbers;
    private final PlanChange change;
    private final RowMaker rows;

    EntryMaker(
            PlanForm form,
            List<Fault> faults,
            FieldWords words,
            PageWords page,
            TypedNumbers numbers,
            RowMaker rows) {
        this.form = form;
        this.faults = List.copyOf(faults);
        this.words = words;
        this.page = page;
        this.numbers = numbers;
        this.rows = rows;
        change = new PlanChange(numbers);
    }

    /** What a page of a place shows. */
    List<EntryView> of(FormPlace place) {
        String key = PlanPlaces.key(form, place.path());
        List<EntryView> entries = new ArrayList<>(inside(place, key));
        for (String stranger : place.strangers()) {
            entries.add(stranger(place.path().then(new JsonPath.Member(stranger)), stranger));
        }
        return entries;
    }

    /** What a page of a long list shows: some of its items. */
    EntryView ofList(FormPlace place, List<Integer> items) {
        String key = PlanPlaces.key(form, place.path());
        List<EntryView.Step> add =
                place.shape() instanceof Shape.Listed list
                        ? rows.add(place, list, words.label(key))
                        : rows.addNamed(place, words.label(key));
        return rows(place, key, "", rows.items(place, items), add);
    }

    private List<EntryView> inside(FormPlace place, String key) {
        if (place.shape() instanceof Shape.Choice choice && place.taken().isPresent()) {
            Shape.Option taken = place.taken().get();
            if (taken.by() == Shape.By.KIND) {
                return inside(place.ofOption(taken), key);
            }
            return List.of(choice(place, choice, key, ""));
        }
        if (place.shape() instanceof Shape.Choice choice) {
            return List.of(choice(place, choice, key, ""));
        }
        return place.shape() instanceof Shape.Group group ? members(place, group, key) : List.of();
    }

    /** What is given, needed or often wanted comes first; the rest is folded away. */
    private List<EntryView> members(FormPlace place, Shape.Group group, String key) {
        List<EntryView> entries = new ArrayList<>();
        List<EntryView> folded = new ArrayList<>();
        for (FormPlace part : place.places()) {
            if (!(part.shape() instanceof Shape.Fixed)) {
                String below = key.isEmpty() ? part.name() : key + "." + part.name();
                EntryView entry = entry(part, below, hint(group, part.name()));
                (shown(part) ? entries : folded).add(entry);
            }
        }
        if (folded.size() > FEW) {
            String count = String.valueOf(folded.size());
            JsonPath more = place.path().then(new JsonPath.Member("more"));
            entries.add(box("more", more, page.say("edit.more", count), "", folded, List.of()));
        } else {
            entries.addAll(folded);
        }
        return entries;
    }

    private boolean shown(FormPlace part) {
        return part.given()
                || part.required()
                || OFTEN.contains(part.name())
                || !below(part.path()).isEmpty();
    }

    private static String hint(Shape.Group group, String name) {
        return group.members().stream()
                .filter(member -> member.name().equals(name))
                .map(Shape.Member::hint)
                .findFirst()
                .orElse("");
    }

    private EntryView entry(FormPlace place, String key, String hint) {
        Shape shape = place.shape();
        if (PlanPlaces.isPage(place.path())) {
            return rows(place, key, hint, List.of(rows.link(place, words.label(key))), List.of());
        }
        if (shape instanceof Shape.Choice choice) {
            return choice(place, choice, key, hint);
        }
        if (shape instanceof Shape.Group) {
            return group(place, key, hint);
        }
        if (shape instanceof Shape.Named && PlanPlaces.isLong(form, place.path())) {
            return rows(
                    place,
                    key,
                    hint,
                    List.of(rows.whole(place, words.label(key))),
                    rows.addNamed(place, words.label(key)));
        }
        if (shape instanceof Shape.Named) {
            return rows(
                    place, key, hint, rows.items(place), rows.addNamed(place, words.label(key)));
        }
        if (shape instanceof Shape.Listed list) {
            return listed(place, list, key, hint);
        }
        return leaf(place, shape, key, hint, "");
    }

    private EntryView listed(FormPlace place, Shape.Listed list, String key, String hint) {
        boolean large = list.of() instanceof Shape.Group || list.of() instanceof Shape.Choice;
        if (list.of() instanceof Shape.Words of) {
            return ticks(place, of, key, hint);
        }
        if (!large) {
            return leaf(place, list, key, hint, "");
        }
        JsonPath first = place.path().then(new JsonPath.Item(0));
        List<EntryView.Step> add = rows.add(place, list, words.label(key));
        if (PlanPlaces.isLong(form, place.path())) {
            return rows(place, key, hint, List.of(rows.whole(place, words.label(key))), add);
        }
        if (PlanPlaces.isPage(first)) {
            return rows(place, key, hint, rows.items(place), add);
        }
        List<EntryView> items = new ArrayList<>();
        for (FormPlace item : place.places()) {
            String one = "edit.one-" + place.name();
            String name =
                    (page.has(one) ? page.say(one) : words.label(key)) + " " + (items.size() + 1);
            items.add(
                    box(
                            "item",
                            item.path(),
                            name,
                            "",
                            inside(item, key),
                            rows.stepsOf(item.path(), name, items.size(), place.places().size())));
        }
        return box("list", place.path(), words.label(key), words.hint(key, hint), items, add);
    }

    private EntryView group(FormPlace place, String key, String hint) {
        String label = words.label(key);
        if (!place.given() && !place.required()) {
            return box(
                    "absent",
                    place.path(),
                    label,
                    words.hint(key, hint),
                    List.of(),
                    List.of(rows.give(place.path(), label)));
        }
        List<EntryView.Step> steps =
                place.required() ? List.of() : List.of(rows.drop(place.path(), label));
        return box("group", place.path(), label, words.hint(key, hint), inside(place, key), steps);
    }

    private EntryView stranger(JsonPath path, String name) {
        return box(
                "absent",
                path,
                page.say("edit.stranger", name),
                "",
                List.of(),
                List.of(rows.drop(path, name)));
    }

    private EntryView box(
            String kind,
            JsonPath path,
            String label,
            String hint,
            List<EntryView> entries,
            List<EntryView.Step> steps) {
        return new EntryView(
                kind,
                path.toString(),
                "",
                label,
                hint,
                "",
                "",
                "",
                fault(path),
                false,
                false,
                "",
                List.of(),
                entries,
                List.of(),
                steps);
    }

    private EntryView rows(
            FormPlace place,
            String key,
            String hint,
            List<EntryView.Row> items,
            List<EntryView.Step> steps) {
        return new EntryView(
                "rows",
                place.path().toString(),
                "",
                words.label(key),
                words.hint(key, hint),
                "",
                "",
                "",
                fault(place.path()),
                false,
                false,
                "",
                List.of(),
                List.of(),
                items,
                steps);
    }

    private EntryView choice(FormPlace place, Shape.Choice choice, String key, String hint) {
        String taken = place.taken().map(Shape.Option::word).orElse("");
        String name = "o:" + place.path();
        List<EntryView> options = new ArrayList<>();
        if (!place.required()) {
            options.add(
                    option(place.path(), name, "", page.say("edit.as-usual"), taken, List.of()));
        }
        for (Shape.Option option : choice.options()) {
            String below = option.by() == Shape.By.WORD ? "" : key + "." + option.word();
            String label =
                    words.has("label." + below) ? words.label(below) : words.word(option.word());
            boolean typed = option.by() == Shape.By.TYPE;
            List<EntryView> within = within(place.ofOption(option), option, typed ? key : below);
            options.add(option(place.path(), name, option.word(), label, taken, within));
        }
        return new EntryView(
                "choice",
                place.path().toString(),
                name,
                words.label(key),
                words.hint(key, hint),
                "",
                taken,
                "",
                fault(place.path()),
                place.required(),
                false,
                "",
                List.of(),
                options,
                List.of(),
                List.of());
    }

    private List<EntryView> within(FormPlace place, Shape.Option option, String key) {
        return switch (option.by()) {
            case WORD -> List.of();
            case KIND -> inside(place, key);
            case TYPE -> List.of(leaf(place, option.shape(), key, "", "|" + option.word()));
            case NAME ->
                    option.shape() instanceof Shape.Group
                            ? inside(place, key)
                            : List.of(leaf(place, option.shape(), key, option.hint(), ""));
        };
    }

    private EntryView option(
            JsonPath path,
            String name,
            String word,
            String label,
            String taken,
            List<EntryView> within) {
        return new EntryView(
                "option",
                path + "|" + word,
                name,
                label,
                "",
                "",
                word,
                "",
                "",
                false,
                word.equals(taken),
                "",
                List.of(),
                within,
                List.of(),
                List.of());
    }

    private EntryView ticks(FormPlace place, Shape.Words of, String key, String hint) {
        List<String> now = place.places().stream().map(FormPlace::written).toList();
        return new EntryView(
                "ticks",
                place.path().toString(),
                "s:" + place.path(),
                words.label(key),
                words.hint(key, hint),
                "",
                "",
                "",
                below(place.path()),
                place.required(),
                false,
                "",
                of.words().stream()
                        .map(w -> new EntryView.Pick(w, words.word(w), now.contains(w)))
                        .toList(),
                List.of(),
                List.of(),
                List.of());
    }

    private EntryView leaf(FormPlace place, Shape shape, String key, String hint, String suffix) {
        String value = change.shown(place);
        String unit = shape instanceof Shape.Figure figure ? numbers.unit(figure.unit()) : "";
        List<EntryView.Pick> picks = picks(shape, value, place.required());
        return new EntryView(
                kind(shape, value, picks),
                place.path().toString(),
                "v:" + place.path() + suffix,
                words.label(key),
                words.hint(key, hint),
                accepted(shape),
                value,
                unit,
                below(place.path()),
                place.required(),
                false,
                Suggestions.listFor(place.name()),
                picks,
                List.of(),
                List.of(),
                List.of());
    }

    private static String kind(Shape shape, String value, List<EntryView.Pick> picks) {
        if (!picks.isEmpty()) {
            return "select";
        }
        if (shape instanceof Shape.Figure) {
            return "decimal";
        }
        String input =
                shape instanceof Shape.Line line ? INPUT.getOrDefault(line.form(), "text") : "text";
        Pattern whole = WHOLE.get(input);
        // What such a field cannot show would be lost in it, so it is shown as text.
        return whole == null || whole.matcher(value).matches() ? input : "text";
    }

    private List<EntryView.Pick> picks(Shape shape, String value, boolean required) {
        List<EntryView.Pick> picks = new ArrayList<>();
        List<String> known = List.of();
        if (shape instanceof Shape.Words of) {
            known = of.words();
        } else if (shape instanceof Shape.YesNo) {
            known = List.of("true", "false");
        } else {
            return picks;
        }
        if (!required || value.isEmpty()) {
            picks.add(new EntryView.Pick("", page.say("edit.as-usual"), value.isEmpty()));
        }
        for (String word : known) {
            String name = shape instanceof Shape.YesNo ? yesNo(word) : words.word(word);
            picks.add(new EntryView.Pick(word, name, word.equals(value)));
        }
        if (!value.isEmpty() && !known.contains(value)) {
            picks.add(new EntryView.Pick(value, value, true));
        }
        return picks;
    }

    private String yesNo(String word) {
        return page.say(word.equals("true") ? "crop.yes" : "crop.no");
    }

    private String accepted(Shape shape) {
        if (shape instanceof Shape.Figure figure) {
            return page.say(
                            "edit.from-to",
                            numbers.bound(figure.low(), figure.unit(), RoundingMode.CEILING),
                            numbers.bound(figure.high(), figure.unit(), RoundingMode.FLOOR))
                    + usual(figure.usual(), figure);
        }
        if (shape instanceof Shape.Listed list && list.of() instanceof Shape.Figure figure) {
            return page.say(
                    "edit.numbers",
                    String.valueOf(list.least()),
                    numbers.unit(figure.unit()),
                    numbers.bound(figure.low(), figure.unit(), RoundingMode.CEILING),
                    numbers.bound(figure.high(), figure.unit(), RoundingMode.FLOOR));
        }
        return shape instanceof Shape.Listed ? page.say("edit.several") : "";
    }

    private String usual(OptionalDouble usual, Shape.Figure figure) {
        return usual.isPresent()
                ? "; " + page.say("edit.usual", shown(usual.getAsDouble(), figure))
                : "";
    }

    private String shown(double value, Shape.Figure figure) {
        String plain = java.math.BigDecimal.valueOf(value).stripTrailingZeros().toPlainString();
        return numbers.shown(plain, figure.unit());
    }

    private String fault(JsonPath path) {
        return told(faults.stream().filter(f -> f.path().equals(path.toString())).findFirst());
    }

    /** The fault of a place, or of an item of the list in it. */
    private String below(JsonPath path) {
        String items = path + "[";
        return told(
                faults.stream()
                        .filter(f -> f.path().equals(path.toString()) || f.path().startsWith(items))
                        .findFirst());
    }

    private static String told(Optional<Fault> fault) {
        return fault.map(f -> f.found() + "; " + f.accepted()).orElse("");
    }
}
