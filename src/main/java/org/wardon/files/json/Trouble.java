package org.wardon.files.json;

/**
 * What is wrong where a text stops being JSON, in a person's words.
 *
 * @param what what stands there
 * @param accepted what is accepted
 */
record Trouble(String what, String accepted) {
    private static final String QUOTES = "accepted: double quotes around names and texts";

    static Trouble end() {
        return new Trouble(
                "the text ends before the JSON is complete",
                "accepted: a whole JSON object; was the file cut off?");
    }

    static Trouble at(String text, int offset) {
        if (offset >= text.length()) {
            return end();
        }
        String word = word(text, offset);
        if (word.endsWith("NaN") || word.endsWith("Infinity")) {
            return new Trouble(
                    word + " is no JSON number",
                    "accepted: finite numbers; leave the name out where nothing is known");
        }
        char here = text.charAt(offset);
        char before = before(text, offset);
        return switch (here) {
            case '\'' -> new Trouble("a single quote", QUOTES);
            case '/', '#' ->
                    new Trouble("a comment, or a stray '" + here + "'", "accepted: no comments");
            case '\n', '\r', '\t' -> new Trouble("a text that is not closed on its line", QUOTES);
            case '"' ->
                    new Trouble(
                            "a comma is missing before this", "accepted: a comma between values");
            case '}', ']' -> closing(here, before);
            case ',' ->
                    new Trouble(
                            "a comma with nothing before it", "accepted: a value between commas");
            default -> other(text, offset, word);
        };
    }

    private static Trouble closing(char here, char before) {
        return before == ','
                ? new Trouble(
                        "a comma before the closing '" + here + "'",
                        "accepted: commas between values only")
                : new Trouble(
                        "an unexpected '" + here + "'", "accepted: a value, or matching brackets");
    }

    private static Trouble other(String text, int offset, String word) {
        char here = text.charAt(offset);
        char before = before(text, offset);
        if (Character.isDigit(here) && before == ',') {
            return new Trouble(
                    "a number after a comma where a name should stand",
                    "accepted: a point as decimal mark, names in double quotes");
        }
        if (Character.isLetter(here) && Character.isDigit(before)) {
            return new Trouble(
                    "a number is followed by " + Json.quoted(word),
                    "accepted: the bare number; its unit stands in the name");
        }
        if (Character.isLetter(here)) {
            return new Trouble(
                    "the word " + Json.quoted(word) + " without quotes",
                    "accepted: double quotes around names and texts; true, false and null without");
        }
        if (Character.isDigit(here)) {
            return new Trouble(
                    "a number that begins with 0, or a comma is missing before it",
                    "accepted: numbers such as 0.5 or 12, with commas between values");
        }
        return new Trouble("an unexpected '" + here + "'", "accepted: JSON");
    }

    private static char before(String text, int offset) {
        int i = offset - 1;
        while (i >= 0 && Character.isWhitespace(text.charAt(i))) {
            i--;
        }
        return i < 0 ? ' ' : text.charAt(i);
    }

    private static String word(String text, int offset) {
        int from = offset;
        while (from > 0 && inWord(text.charAt(from - 1))) {
            from--;
        }
        if (from < offset && Character.isDigit(text.charAt(from))) {
            from = offset;
        }
        int to = offset;
        while (to < text.length() && inWord(text.charAt(to))) {
            to++;
        }
        return text.substring(from, to);
    }

    private static boolean inWord(char c) {
        return Character.isLetterOrDigit(c) || c == '-' || c == '_';
    }
}
