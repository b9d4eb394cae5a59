package org.wardon.files.json;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import tools.jackson.core.JacksonException;
import tools.jackson.core.JsonParser;
import tools.jackson.core.JsonToken;
import tools.jackson.core.ObjectReadContext;
import tools.jackson.core.StreamReadConstraints;
import tools.jackson.core.TokenStreamLocation;
import tools.jackson.core.exc.StreamConstraintsException;
import tools.jackson.core.exc.UnexpectedEndOfInputException;
import tools.jackson.core.json.JsonFactory;

/** Reads JSON text strictly: no comments, no trailing commas, no NaN, no name twice. */
public final class JsonText {
    private static final int DEEPEST = 40;
    private static final JsonFactory FACTORY =
            JsonFactory.builder()
                    .streamReadConstraints(
                            StreamReadConstraints.builder().maxNestingDepth(DEEPEST).build())
                    .build();

    private final String text;
    private final Faults faults;

    private JsonText(String text, Faults faults) {
        this.text = text;
        this.faults = faults;
    }

    /**
     * Reads a text.
     *
     * @param text the whole text
     * @param faults hears of the first place that is no JSON, and of names that stand twice
     * @return the tree, absent where the text is no JSON
     */
    public static Optional<Json> read(String text, Faults faults) {
        return new JsonText(text, faults).whole();
    }

    private Optional<Json> whole() {
        if (text.isBlank()) {
            faults.add("", "the file is empty", "accepted: a JSON object");
            return Optional.empty();
        }
        try (JsonParser parser = FACTORY.createParser(ObjectReadContext.empty(), text)) {
            Json json = value(parser, parser.nextToken(), "$");
            if (parser.nextToken() != null) {
                notJson(
                        parser.currentTokenLocation(),
                        new Trouble(
                                "something follows the end of the JSON",
                                "accepted: one JSON object in a file"));
                return Optional.empty();
            }
            return Optional.of(json);
        } catch (StreamConstraintsException e) {
            notJson(
                    e.getLocation(),
                    new Trouble(
                            "a number, a name or the nesting is far too long here",
                            "accepted: numbers of up to 1000 digits, brackets up to "
                                    + DEEPEST
                                    + " deep"));
        } catch (JacksonException e) {
            notJson(e.getLocation(), trouble(e));
        }
        return Optional.empty();
    }

    private Json value(JsonParser parser, JsonToken token, String path) {
        return switch (token) {
            case START_OBJECT -> object(parser, path);
            case START_ARRAY -> list(parser, path);
            case VALUE_STRING -> new Json.Text(parser.getString());
            case VALUE_NUMBER_INT, VALUE_NUMBER_FLOAT -> new Json.Num(parser.getString());
            case VALUE_TRUE -> new Json.Flag(true);
            case VALUE_FALSE -> new Json.Flag(false);
            default -> new Json.Null();
        };
    }

    private Json object(JsonParser parser, String path) {
        Map<String, Json> members = new LinkedHashMap<>();
        while (parser.nextToken() != JsonToken.END_OBJECT) {
            String name = parser.currentName();
            String where = Json.member(path, name);
            int line = parser.currentTokenLocation().getLineNr();
            Json value = value(parser, parser.nextToken(), where);
            if (members.putIfAbsent(name, value) != null) {
                faults.add(
                        where,
                        "the name stands a second time, on line " + line,
                        "accepted: each name once in an object");
            }
        }
        return new Json.Obj(members);
    }

    private Json list(JsonParser parser, String path) {
        List<Json> items = new ArrayList<>();
        for (JsonToken token = parser.nextToken();
                token != JsonToken.END_ARRAY;
                token = parser.nextToken()) {
            items.add(value(parser, token, path + "[" + items.size() + "]"));
        }
        return new Json.Arr(items);
    }

    private Trouble trouble(JacksonException e) {
        return e instanceof UnexpectedEndOfInputException
                ? Trouble.end()
                : Trouble.at(text, (int) Math.max(e.getLocation().getCharOffset(), 0));
    }

    private void notJson(@Nullable TokenStreamLocation where, Trouble trouble) {
        faults.add(
                where == null
                        ? "$"
                        : "line " + where.getLineNr() + ", column " + where.getColumnNr(),
                trouble.what(),
                trouble.accepted());
    }
}
