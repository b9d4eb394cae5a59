package org.wardon.files;

import static java.util.stream.Collectors.joining;

import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;
import org.wardon.files.json.JsonEdit;
import org.wardon.files.json.JsonPath;
import org.wardon.plan.ChamberPlan;
import org.wardon.plan.LotPlan;
import org.wardon.plan.SettingChange;
import org.wardon.plan.StorePlan;
import org.wardon.produce.Conflict;

/**
 * Writes a plan with other settings and chambers of lots and what is accepted, all else of the
 * keeper's text untouched.
 */
public final class PlacedPlan {
    private PlacedPlan() {}

    /**
     * Writes the plan of a placing.
     *
     * @param from the keeper's plan
     * @param to where the other is written
     * @param asked the plan as it was read from there
     * @param placed the same with chambers and lots as proposed
     * @throws org.wardon.errors.BadInput where the plan cannot be read any more
     * @throws CannotWrite where the file cannot be written
     */
    public static void write(Path from, Path to, StorePlan asked, StorePlan placed) {
        String text = TextFile.read(from, from.toString(), PlanReader.LARGEST_MB);
        String changed = changed(text, asked, placed);
        AtomicFile.write(to, out -> out.write(changed));
    }

    /**
     * Returns the text of the plan of a placing.
     *
     * @param text the keeper's plan
     * @param asked the plan as it was read from it
     * @param placed the same with chambers and lots as proposed
     * @return the changed text
     * @throws org.wardon.errors.BadInput where the text is no plan
     */
    public static String changed(String text, StorePlan asked, StorePlan placed) {
        JsonEdit edit = JsonEdit.of(text);
        for (int i = 0; i < asked.chambers().size(); i++) {
            edit = chamber(edit, i, asked.chambers().get(i), placed.chambers().get(i));
        }
        for (int i = 0; i < asked.lots().size(); i++) {
            edit = lot(edit, i, asked.lots().get(i), placed.lots().get(i));
        }
        Set<Conflict> accepts = placed.wish().accepts();
        edit = accepts(edit, JsonPath.ROOT, asked.wish().accepts(), accepts);
        return edit.text();
    }

    private static JsonEdit accepts(
            JsonEdit edit, JsonPath owner, Set<Conflict> was, Set<Conflict> is) {
        String words =
                is.stream()
                        .sorted()
                        .map(one -> JsonEdit.quoted(one.word()))
                        .collect(joining(", ", "[", "]"));
        return was.equals(is) ? edit : edit.set(owner.then(new JsonPath.Member("accept")), words);
    }

    private static JsonEdit chamber(JsonEdit edit, int i, ChamberPlan was, ChamberPlan is) {
        Set<Conflict> accepts = is.use().accepts();
        JsonEdit changed = accepts(edit, path("chambers", i), was.use().accepts(), accepts);
        if (was.setting().temperatureC() != is.setting().temperatureC()) {
            String value = Inputs.plain(is.setting().temperatureC());
            changed = changed.set(path("chambers", i, "setting", "temperatureC"), value);
        }
        if (!was.use().changes().equals(is.use().changes())) {
            changed = changes(changed, path("chambers", i, "settingChanges"), is);
        }
        if (!was.starts().equals(is.starts())) {
            String value = Inputs.plain(is.starts().orElseThrow().temperatureC());
            changed =
                    changed.set(path("chambers", i, "starts"), "{\"temperatureC\": " + value + "}");
        }
        if (was.off() && !is.off()) {
            changed = changed.remove(path("chambers", i, "off"));
        }
        return !was.off() && is.off() ? changed.set(path("chambers", i, "off"), "true") : changed;
    }

    private static JsonEdit changes(JsonEdit edit, JsonPath path, ChamberPlan is) {
        List<SettingChange> later = is.use().changes();
        String each = later.stream().map(PlacedPlan::change).collect(joining(", ", "[", "]"));
        return later.isEmpty() ? edit.remove(path) : edit.set(path, each);
    }

    private static String change(SettingChange change) {
        String humidity =
                change.humidityPct().isPresent()
                        ? ", \"humidityPct\": " + Inputs.plain(change.humidityPct().getAsDouble())
                        : "";
        return String.format(
                Locale.ROOT,
                "{\"from\": %s, \"temperatureC\": %s%s}",
                JsonEdit.quoted(change.from().toString()),
                Inputs.plain(change.temperatureC()),
                humidity);
    }

    private static JsonEdit lot(JsonEdit edit, int i, LotPlan was, LotPlan is) {
        Optional<String> to = is.chamber();
        if (was.chamber().equals(to)) {
            return edit;
        }
        JsonPath path = path("lots", i, "chamber");
        return to.isPresent() ? edit.set(path, JsonEdit.quoted(to.get())) : edit.remove(path);
    }

    private static JsonPath path(String list, int index, String... names) {
        JsonPath path =
                JsonPath.ROOT.then(new JsonPath.Member(list)).then(new JsonPath.Item(index));
        for (String name : names) {
            path = path.then(new JsonPath.Member(name));
        }
        return path;
    }
}
