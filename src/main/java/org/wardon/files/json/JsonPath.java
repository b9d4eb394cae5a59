package org.wardon.files.json;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * A path as messages write it, taken apart: {@code $.chambers[0].door.widthM}, {@code
 * $.buildUps['80-panel']}.
 *
 * @param steps from the root on
 */
public record JsonPath(List<Step> steps) {
    private static final Pattern STEP =
            Pattern.compile("\\.([A-Za-z_][A-Za-z0-9_-]*)|\\[(\\d{1,9})]|\\['([^']*)']");

    /** The root. */
    public static final JsonPath ROOT = new JsonPath(List.of());

    /** One step down. */
    public sealed interface Step {}

    /**
     * To a member.
     *
     * @param name its name
     */
    public record Member(String name) implements Step {}

    /**
     * To an item.
     *
     * @param index its place, from 0
     */
    public record Item(int index) implements Step {}

    /** Copies the list. */
    public JsonPath {
        steps = List.copyOf(steps);
    }

    /**
     * Takes a path apart.
     *
     * @param path such as {@code $.site.zone}
     * @return the path, absent where it is none
     */
    public static Optional<JsonPath> parse(String path) {
        if (!path.startsWith("$")) {
            return Optional.empty();
        }
        List<Step> steps = new ArrayList<>();
        Matcher step = STEP.matcher(path);
        int at = 1;
        while (at < path.length() && step.find(at) && step.start() == at) {
            steps.add(
                    step.group(2) != null
                            ? new Item(Integer.parseInt(step.group(2)))
                            : new Member(step.group(1) != null ? step.group(1) : step.group(3)));
            at = step.end();
        }
        return at == path.length() ? Optional.of(new JsonPath(steps)) : Optional.empty();
    }

    /**
     * Returns the path of the whole this is a part of.
     *
     * @return one step up; the root of the root
     */
    public JsonPath up() {
        return steps.isEmpty() ? this : new JsonPath(steps.subList(0, steps.size() - 1));
    }

    /**
     * Returns the last step.
     *
     * @return the step, absent for the root
     */
    public Optional<Step> last() {
        return steps.isEmpty() ? Optional.empty() : Optional.of(steps.get(steps.size() - 1));
    }

    /**
     * Returns a path one step further.
     *
     * @param step the step
     * @return the path
     */
    public JsonPath then(Step step) {
        List<Step> longer = new ArrayList<>(steps);
        longer.add(step);
        return new JsonPath(longer);
    }

    /**
     * Returns the path as messages write it.
     *
     * @return such as {@code $.site.zone}
     */
    @Override
    public String toString() {
        String path = "$";
        for (Step step : steps) {
            path =
                    step instanceof Item item
                            ? path + "[" + item.index() + "]"
                            : Json.member(path, ((Member) step).name());
        }
        return path;
    }
}
