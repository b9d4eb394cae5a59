package org.wardon.files.json;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.wardon.errors.Fault;

/**
 * A path as a person types it: {@code chambers[north].setting.temperatureC}. Items of a list are
 * named by their {@code id} or {@code face}, or by their place from 0; {@code $.} may stand before
 * it.
 */
public final class TypedPath {
    private static final Pattern STEP =
            Pattern.compile("(?:^|\\.)([A-Za-z_][A-Za-z0-9_-]*)|\\[([^\\[\\]]+)]");
    private static final List<String> KEYS = List.of("id", "face");

    private TypedPath() {}

    /**
     * Finds what is meant.
     *
     * @param root the plan
     * @param typed the path
     * @param faults hears of a path that is none, or names an item that is not there
     * @return the path; its last names need not be there yet
     */
    public static Optional<JsonPath> find(Json root, String typed, List<Fault> faults) {
        String text = typed.startsWith("$.") ? typed.substring(2) : typed;
        Matcher step = STEP.matcher(text);
        JsonPath path = JsonPath.ROOT;
        Part here = Part.root(root);
        int at = 0;
        while (at < text.length() && step.find(at) && step.start() == at) {
            if (step.group(1) != null) {
                path = path.then(new JsonPath.Member(step.group(1)));
                here = here.at(step.group(1));
            } else {
                Optional<Integer> index = index(here, step.group(2));
                if (index.isEmpty()) {
                    faults.add(missing(typed, here, step.group(2)));
                    return Optional.empty();
                }
                path = path.then(new JsonPath.Item(index.get()));
                here = here.items().get(index.get());
            }
            at = step.end();
        }
        if (at < text.length() || text.isEmpty()) {
            faults.add(
                    new Fault(
                            "--set",
                            typed,
                            "is no path",
                            "accepted: such as chambers[north].setting.temperatureC"));
            return Optional.empty();
        }
        return Optional.of(path);
    }

    private static Optional<Integer> index(Part list, String named) {
        List<Part> items = list.items();
        for (int i = 0; i < items.size(); i++) {
            if (names(items.get(i)).contains(named)) {
                return Optional.of(i);
            }
        }
        boolean number = named.matches("\\d{1,6}");
        return number && Integer.parseInt(named) < items.size()
                ? Optional.of(Integer.parseInt(named))
                : Optional.empty();
    }

    private static List<String> names(Part item) {
        return KEYS.stream().flatMap(key -> item.at(key).text().stream()).toList();
    }

    private static Fault missing(String typed, Part list, String named) {
        List<String> there = new ArrayList<>();
        list.items().forEach(item -> there.addAll(names(item)));
        String accepted =
                !there.isEmpty()
                        ? String.join(", ", there)
                        : list.items().isEmpty()
                                ? "no item, " + list.path() + " is no list or has none"
                                : "0 to " + (list.items().size() - 1);
        return new Fault(
                "--set",
                typed,
                "there is no '" + named + "' in " + list.path(),
                Nearest.question(named, there) + "accepted: " + accepted);
    }
}
