package org.wardon.web.pages;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

/** Every key the pages use has words, and all words are used. */
class PageWordsTest {
    private static final PageWords WORDS = PageWords.english();
    private static final Pattern SAID = Pattern.compile("say\\(\\s*\"([a-z0-9.-]+)\"");
    private static final Pattern REFUSED =
            Pattern.compile("new Refusal\\(\\s*[^,]+,\\s*\"([a-z-]+)\"");
    private static final Pattern HTTP = Pattern.compile("-> \"([a-z-]+)\";");

    /** Beginnings of keys that are put together at run time. */
    private static final Set<String> FAMILIES =
            Set.of(
                    "room.",
                    "api.",
                    "api-mend.",
                    "stage.",
                    "light.",
                    "plant.",
                    "part.",
                    "leg.",
                    "own.",
                    "ended.",
                    "ripeness.",
                    "keep.",
                    "own-",
                    "hint-own-",
                    "lot-",
                    "crop.",
                    "edit.",
                    "face.",
                    "flow.",
                    "door.",
                    "packed.",
                    "what.",
                    "curve.",
                    "heat.",
                    "limit.",
                    "profile.",
                    "section.from-",
                    "placing.",
                    "ruler.",
                    "sharing.");

    private static List<String> sources() throws IOException {
        List<String> texts = new ArrayList<>();
        for (String root : List.of("src/main/jte", "src/main/java/org/wardon/web")) {
            try (Stream<Path> files = Files.walk(Path.of(root))) {
                for (Path file : files.filter(Files::isRegularFile).toList()) {
                    texts.add(Files.readString(file));
                }
            }
        }
        return texts;
    }

    private static Set<String> used() throws IOException {
        Set<String> used = new TreeSet<>();
        for (String text : sources()) {
            SAID.matcher(text).results().forEach(said -> used.add(said.group(1)));
            for (Pattern refusal : List.of(REFUSED, HTTP)) {
                Matcher code = refusal.matcher(text);
                while (code.find()) {
                    used.add("refusal." + code.group(1));
                    used.add("refusal." + code.group(1) + ".mend");
                }
            }
        }
        used.removeIf(key -> key.endsWith(".") || key.endsWith("-"));
        return used;
    }

    @Test
    void everyKeyUsedHasWords() throws IOException {
        Set<String> missing = used();
        assertTrue(missing.size() > 80, "only " + missing.size() + " keys found");
        missing.removeAll(WORDS.keys());
        assertEquals(Set.of(), missing);
        for (Room room : Room.values()) {
            WORDS.say(room.key());
        }
        for (String stage :
                List.of(
                        "waiting",
                        "forecast",
                        "draws",
                        "judging",
                        "chambers",
                        "placing",
                        "telling")) {
            WORDS.say("stage." + stage);
        }
        for (Preferences.Light light : Preferences.Light.values()) {
            WORDS.say("light." + light.word());
        }
    }

    @Test
    void allWordsAreUsed() throws IOException {
        Set<String> idle = new TreeSet<>(WORDS.keys());
        idle.removeAll(used());
        idle.removeIf(key -> FAMILIES.stream().anyMatch(key::startsWith));
        assertEquals(Set.of(), idle);
    }
}
