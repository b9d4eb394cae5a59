package org.wardon.web.plan;

import java.net.URLEncoder;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Optional;
import java.util.regex.Pattern;
import org.wardon.files.form.FormPlace;
import org.wardon.files.form.PlanForm;
import org.wardon.files.json.JsonPath;
import org.wardon.files.json.Shape;

/** Which page of the editor a place is on, and what its words are kept under. */
final class PlanPlaces {
    private static final Pattern PAGE =
            Pattern.compile(
                    "\\$|\\$\\.weather|\\$\\.lots\\[\\d+]|\\$\\.buildUps(\\.[^.\\[]+|\\['[^']*'])"
                            + "|\\$\\.chambers\\[\\d+](\\.(faces|cooling)\\[\\d+])?");

    /** A list of more items with pages of their own has a page of its own too. */
    private static final int MOST_ROWS = 30;

    private PlanPlaces() {}

    /** The page a place is on: itself or the nearest whole that has one. */
    static JsonPath page(PlanForm form, JsonPath path) {
        JsonPath up = path;
        while (!isPage(up) && !isLong(form, up)) {
            up = up.up();
        }
        return up;
    }

    /** The page a fault is told on; the first where its path is none. */
    static JsonPath page(PlanForm form, String path) {
        return page(form, JsonPath.parse(path).orElse(JsonPath.ROOT));
    }

    /** Whether a list is too long to stand on the page of what it belongs to. */
    static boolean isLong(PlanForm form, JsonPath list) {
        List<FormPlace> items = form.at(list).map(FormPlace::places).orElse(List.of());
        return items.size() > MOST_ROWS && isPage(items.get(0).path());
    }

    /** Which part of a long list an item stands in. */
    static String href(long plan, JsonPath list, int item) {
        return href(plan, list) + "&from=" + (item + 1);
    }

    static boolean isPage(JsonPath path) {
        return PAGE.matcher(path.toString()).matches();
    }

    static String href(long plan, JsonPath page) {
        String root = "/plan/" + plan + "/edit";
        return page.steps().isEmpty()
                ? root
                : root + "?at=" + URLEncoder.encode(page.toString(), StandardCharsets.UTF_8);
    }

    /** Where the words of a place are kept: its names, ids and numbers left out, kinds put in. */
    static String key(PlanForm form, JsonPath path) {
        StringBuilder key = new StringBuilder();
        JsonPath here = JsonPath.ROOT;
        for (JsonPath.Step step : path.steps()) {
            Shape within = form.at(here).map(FormPlace::shape).orElse(new Shape.Fixed(""));
            here = here.then(step);
            if (step instanceof JsonPath.Member member && !(within instanceof Shape.Named)) {
                key.append(key.isEmpty() ? "" : ".").append(member.name());
            }
            kind(form, here).ifPresent(word -> key.append('.').append(word));
        }
        return key.toString();
    }

    private static Optional<String> kind(PlanForm form, JsonPath path) {
        return form.at(path)
                .flatMap(FormPlace::taken)
                .filter(option -> option.by() == Shape.By.KIND)
                .map(Shape.Option::word);
    }
}
