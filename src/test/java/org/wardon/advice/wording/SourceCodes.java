package org.wardon.advice.wording;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalInt;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;

/** The codes of reasons as they stand in the program text, with what each call gives them. */
final class SourceCodes {
    private static final Path MAIN = Path.of("src/main/java");
    private static final Pattern CALL =
            Pattern.compile("\\b(Reason\\.about|new Reason|reason|say|caution|about|with)\\(");
    private static final Pattern CODE = Pattern.compile("\"([a-z][a-z0-9]*(?:-[a-z0-9]+)*)\"");

    /**
     * One code in one call.
     *
     * @param file where
     * @param code the code
     * @param subjects how many subjects it is given, where the call tells
     * @param arguments how many arguments it is given, where the call tells
     */
    record Use(String file, String code, OptionalInt subjects, OptionalInt arguments) {}

    private SourceCodes() {}

    /** Every literal in the place of a code. */
    static List<Use> uses() {
        List<Use> uses = new ArrayList<>();
        texts().forEach(file -> uses(file, uses));
        return uses;
    }

    /** Every hyphenated word in quotes in files that make reasons. */
    static Set<String> hyphenated() {
        Set<String> words = new TreeSet<>();
        for (Path file : texts()) {
            Matcher word = CODE.matcher(text(file));
            while (text(file).contains("produce.Reason") && word.find()) {
                if (word.group(1).contains("-")) {
                    words.add(word.group(1));
                }
            }
        }
        return words;
    }

    /** Every word in quotes of the whole program. */
    static Set<String> quoted() {
        Set<String> words = new TreeSet<>();
        for (Path file : texts()) {
            Matcher word = CODE.matcher(text(file));
            while (word.find()) {
                words.add(word.group(1));
            }
        }
        return words;
    }

    private static void uses(Path file, List<Use> uses) {
        String text = text(file);
        Matcher call = CALL.matcher(text);
        while (call.find()) {
            List<String> given = given(text, call.end());
            int place = call.group(1).equals("caution") ? 1 : 0;
            if (given.size() <= place || given.get(place).contains("(")) {
                continue;
            }
            Matcher code = CODE.matcher(given.get(place));
            while (code.find()) {
                uses.add(use(file, call.group(1), code.group(1), given));
            }
        }
    }

    private static Use use(Path file, String call, String code, List<String> given) {
        String name = file.getFileName().toString();
        OptionalInt unknown = OptionalInt.empty();
        if (call.equals("Reason.about")) {
            boolean array = given.size() == 4 && !given.get(3).contains("(");
            return new Use(
                    name,
                    code,
                    OptionalInt.of(1),
                    array ? unknown : OptionalInt.of(given.size() - 3));
        }
        if (call.equals("new Reason")) {
            return new Use(name, code, listed(given.get(1)), listed(given.get(2)));
        }
        return new Use(name, code, unknown, unknown);
    }

    private static OptionalInt listed(String argument) {
        return argument.startsWith("List.of(")
                ? OptionalInt.of(given(argument, "List.of(".length()).size())
                : OptionalInt.empty();
    }

    /** The arguments of a call from behind its bracket, parted at commas outside brackets. */
    private static List<String> given(String text, int from) {
        List<String> parts = new ArrayList<>();
        StringBuilder part = new StringBuilder();
        int depth = 0;
        boolean quoted = false;
        for (int i = from; i < text.length(); i++) {
            char c = text.charAt(i);
            quoted ^= c == '"' && text.charAt(i - 1) != '\\';
            if (!quoted && c == ')' && depth == 0) {
                break;
            }
            if (!quoted) {
                depth += c == '(' ? 1 : c == ')' ? -1 : 0;
            }
            if (!quoted && c == ',' && depth == 0) {
                parts.add(part.toString().strip());
                part.setLength(0);
            } else {
                part.append(c);
            }
        }
        if (!part.toString().isBlank()) {
            parts.add(part.toString().strip());
        }
        return parts;
    }

    private static List<Path> texts() {
        try (Stream<Path> files = Files.walk(MAIN)) {
            return files.filter(file -> file.toString().endsWith(".java")).sorted().toList();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static String text(Path file) {
        try {
            return Files.readString(file);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
