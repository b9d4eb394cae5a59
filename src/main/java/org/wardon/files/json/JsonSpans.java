package org.wardon.files.json;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * Where each value of a JSON text stands in it. Takes texts that {@link JsonText} has read without
 * complaint and nothing else.
 */
final class JsonSpans {
    private final String text;
    private int at;

    private JsonSpans(String text) {
        this.text = text;
    }

    /**
     * A value in its text.
     *
     * @param from first character
     * @param to behind its last character
     * @param name name of the member it is, with its quotes gone; empty for an item or the root
     * @param nameFrom first character of the member, its name included; {@code from} else
     * @param kind the first character: an object, a list or something else
     * @param parts members or items
     */
    record Span(int from, int to, String name, int nameFrom, char kind, List<Span> parts) {
        boolean object() {
            return kind == '{';
        }

        boolean list() {
            return kind == '[';
        }

        Optional<Span> step(JsonPath.Step step) {
            if (step instanceof JsonPath.Item item) {
                return list() && item.index() < parts.size()
                        ? Optional.of(parts.get(item.index()))
                        : Optional.empty();
            }
            String wanted = ((JsonPath.Member) step).name();
            return object()
                    ? parts.stream().filter(part -> part.name.equals(wanted)).findFirst()
                    : Optional.empty();
        }
    }

    static Span of(String text) {
        JsonSpans reader = new JsonSpans(text);
        reader.blanks();
        return reader.value("", reader.at);
    }

    private Span value(String name, int nameFrom) {
        int from = at;
        char kind = text.charAt(at);
        List<Span> parts = new ArrayList<>();
        if (kind == '{' || kind == '[') {
            at++;
            blanks();
            while (text.charAt(at) != '}' && text.charAt(at) != ']') {
                parts.add(part(kind == '{'));
            }
            at++;
        } else if (kind == '"') {
            quoted();
        } else {
            plain();
        }
        return new Span(from, at, name, nameFrom, kind, parts);
    }

    private Span part(boolean member) {
        int from = at;
        String name = "";
        if (member) {
            name = quoted();
            blanks();
            at++;
            blanks();
        }
        Span part = value(name, from);
        blanks();
        if (text.charAt(at) == ',') {
            at++;
            blanks();
        }
        return part;
    }

    private String quoted() {
        StringBuilder read = new StringBuilder();
        at++;
        while (text.charAt(at) != '"') {
            if (text.charAt(at) == '\\') {
                read.append(escaped());
            } else {
                read.append(text.charAt(at));
                at++;
            }
        }
        at++;
        return read.toString();
    }

    private char escaped() {
        char kind = text.charAt(at + 1);
        at += 2;
        if (kind == 'u') {
            at += 4;
            return (char) Integer.parseInt(text.substring(at - 4, at), 16);
        }
        return switch (kind) {
            case 'b' -> '\b';
            case 'f' -> '\f';
            case 'n' -> '\n';
            case 'r' -> '\r';
            case 't' -> '\t';
            default -> kind;
        };
    }

    private void plain() {
        while (at < text.length() && ",]} \t\r\n".indexOf(text.charAt(at)) < 0) {
            at++;
        }
    }

    private void blanks() {
        while (at < text.length() && Character.isWhitespace(text.charAt(at))) {
            at++;
        }
    }
}
