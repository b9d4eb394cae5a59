package org.wardon.files.json;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** Makes shapes of a schema, and finds them by path. */
public final class Shapes {
    private static final int MANY = 1_000_000;

    private Shapes() {}

    /**
     * Returns the shape of what a schema describes.
     *
     * @param schema the whole schema
     * @return its shape
     */
    public static Shape of(Json schema) {
        return of(Rule.of(schema, (Json.Obj) schema));
    }

    private static Shape of(Rule rule) {
        if (rule.has("oneOf")) {
            return choice(rule);
        }
        if (rule.has("const")) {
            Part constant = Part.root(rule.own()).at("const");
            return new Shape.Fixed(
                    constant.text()
                            .map(JsonEdit::quoted)
                            .orElseGet(() -> constant.json().orElseThrow().shown()));
        }
        return switch (rule.type()) {
            case "object" -> group(rule);
            case "array" ->
                    new Shape.Listed(
                            of(rule.child("items").orElseThrow()),
                            (int) bound(rule, "minItems", 0),
                            (int) bound(rule, "maxItems", MANY));
            case "boolean" -> new Shape.YesNo(Part.root(rule.own()).at("default").flag());
            case "string" -> text(rule);
            default -> figure(rule);
        };
    }

    private static double bound(Rule rule, String keyword, double otherwise) {
        return rule.has(keyword) ? rule.number(keyword) : otherwise;
    }

    private static Shape figure(Rule rule) {
        OptionalDouble usual = Part.root(rule.own()).at("default").number();
        return new Shape.Figure(
                rule.word("x-unit").orElse(""),
                rule.number("minimum"),
                rule.number("maximum"),
                rule.type().equals("integer"),
                usual);
    }

    private static Shape text(Rule rule) {
        Optional<String> usual = rule.word("default");
        return rule.has("enum")
                ? new Shape.Words(rule.words("enum"), usual)
                : new Shape.Line(
                        rule.word("x-form").orElse(""), (int) bound(rule, "maxLength", 0), usual);
    }

    private static Shape group(Rule rule) {
        Optional<Rule> free = rule.child("additionalProperties");
        if (free.isPresent()) {
            return new Shape.Named(of(free.get()));
        }
        if (rule.has("maxProperties") && rule.number("maxProperties") == 1) {
            return new Shape.Choice(byName(rule));
        }
        List<String> required = rule.words("required");
        List<Shape.Member> members = new ArrayList<>();
        for (String name : rule.propertyNames()) {
            Rule of = rule.property(name).orElseThrow();
            members.add(new Shape.Member(name, required.contains(name), of(of), hint(of)));
        }
        return new Shape.Group(members);
    }

    private static String hint(Rule rule) {
        return rule.word("description").orElse("");
    }

    private static List<Shape.Option> byName(Rule rule) {
        List<Shape.Option> options = new ArrayList<>();
        for (String name : rule.propertyNames()) {
            Rule of = rule.property(name).orElseThrow();
            options.add(new Shape.Option(name, Shape.By.NAME, of(of), hint(of)));
        }
        return options;
    }

    private static Shape choice(Rule rule) {
        List<Shape.Option> options = new ArrayList<>();
        for (Rule one : rule.alternatives()) {
            if (one.kind().isPresent()) {
                options.add(new Shape.Option(one.kind().get(), Shape.By.KIND, of(one), hint(one)));
            } else if (one.has("enum")) {
                for (String word : one.words("enum")) {
                    Shape fixed = new Shape.Fixed(JsonEdit.quoted(word));
                    options.add(new Shape.Option(word, Shape.By.WORD, fixed, ""));
                }
            } else if (one.type().equals("object")) {
                // A group beside words is told by its one name, whether or not it may have more.
                options.addAll(byName(one));
            } else {
                options.add(new Shape.Option(one.type(), Shape.By.TYPE, of(one), hint(one)));
            }
        }
        return new Shape.Choice(options);
    }

    /**
     * Returns which option of a choice a value has taken.
     *
     * @param choice the choice
     * @param json the value
     * @return the option, absent where it fits none
     */
    public static Optional<Shape.Option> taken(Shape.Choice choice, Json json) {
        return choice.options().stream().filter(option -> takes(option, json)).findFirst();
    }

    private static boolean takes(Shape.Option option, Json json) {
        return switch (option.by()) {
            case WORD -> json.equals(new Json.Text(option.word()));
            case NAME -> json instanceof Json.Obj o && o.members().containsKey(option.word());
            case KIND -> Part.root(json).at("kind").text().equals(Optional.of(option.word()));
            case TYPE -> fits(option.shape(), json);
        };
    }

    private static boolean fits(Shape shape, Json json) {
        return shape instanceof Shape.Figure
                ? json instanceof Json.Num
                : shape instanceof Shape.Listed
                        ? json instanceof Json.Arr
                        : shape instanceof Shape.Line && json instanceof Json.Text;
    }

    static Optional<Shape> at(Shape shape, JsonPath path, Json tree) {
        Optional<Shape> here = Optional.of(shape);
        Part part = Part.root(tree);
        for (JsonPath.Step step : path.steps()) {
            Part from = part;
            here = here.flatMap(one -> step(one, step, from));
            part = part.at(new JsonPath(List.of(step)));
        }
        return here;
    }

    private static Optional<Shape> step(Shape shape, JsonPath.Step step, Part part) {
        if (shape instanceof Shape.Choice choice) {
            if (step instanceof JsonPath.Member member) {
                Optional<Shape.Option> named =
                        choice.option(member.name()).filter(o -> o.by() == Shape.By.NAME);
                if (named.isPresent()) {
                    return named.map(Shape.Option::shape);
                }
            }
            return part.json()
                    .flatMap(json -> taken(choice, json))
                    .flatMap(option -> step(option.shape(), step, part));
        }
        if (step instanceof JsonPath.Item) {
            return shape instanceof Shape.Listed list ? Optional.of(list.of()) : Optional.empty();
        }
        if (shape instanceof Shape.Named named) {
            return Optional.of(named.of());
        }
        return shape instanceof Shape.Group group
                ? group.member(((JsonPath.Member) step).name())
                : Optional.empty();
    }

    static String blank(Shape shape) {
        if (shape instanceof Shape.Fixed fixed) {
            return fixed.json();
        }
        if (shape instanceof Shape.Listed) {
            return "[]";
        }
        if (shape instanceof Shape.Choice choice) {
            return choice.options().get(0).shape() instanceof Shape.Fixed fixed
                    ? fixed.json()
                    : "{}";
        }
        if (!(shape instanceof Shape.Group group)) {
            return "{}";
        }
        List<String> members = new ArrayList<>();
        for (Shape.Member member : group.members()) {
            boolean holds =
                    member.shape() instanceof Shape.Fixed
                            || member.shape() instanceof Shape.Group
                            || member.shape() instanceof Shape.Listed;
            if (member.required() && holds) {
                members.add(JsonEdit.quoted(member.name()) + ": " + blank(member.shape()));
            }
        }
        return "{" + String.join(", ", members) + "}";
    }

    /**
     * Returns what an option of a choice begins with.
     *
     * @param option the option
     * @return JSON text
     */
    public static String begun(Shape.Option option) {
        return switch (option.by()) {
            case WORD, KIND, TYPE -> blank(option.shape());
            case NAME -> {
                boolean holds = !(option.shape() instanceof Shape.Figure);
                boolean text = option.shape() instanceof Shape.Line;
                yield "{"
                        + JsonEdit.quoted(option.word())
                        + ": "
                        + (text ? "\"\"" : holds ? blank(option.shape()) : "null")
                        + "}";
            }
        };
    }
}
