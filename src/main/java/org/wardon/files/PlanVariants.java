package org.wardon.files;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import org.wardon.errors.BadInput;
import org.wardon.errors.Fault;
import org.wardon.files.forecast.CompareAnswer.Changed;
import org.wardon.files.json.Faults;
import org.wardon.files.json.Json;
import org.wardon.files.json.JsonEdit;
import org.wardon.files.json.JsonPath;
import org.wardon.files.json.JsonText;
import org.wardon.files.json.TypedPath;
import org.wardon.plan.StorePlan;

/** Reads a plan with some of its inputs changed. */
public final class PlanVariants {
    private final String text;
    private final Function<String, StorePlan> reader;

    /**
     * Takes a plan.
     *
     * @param file the plan
     * @param lookups the ids of the tables
     * @throws BadInput where it cannot be read
     */
    public PlanVariants(Path file, Lookups lookups) {
        text = TextFile.read(file, file.toString(), PlanReader.LARGEST_MB);
        reader = changed -> PlanReader.read(changed, file, lookups);
    }

    /**
     * Takes a plan that is kept elsewhere.
     *
     * @param text the plan
     * @param name its name in messages
     * @param files the files it may name
     * @param lookups what its names may mean
     */
    public PlanVariants(String text, String name, PlanFiles files, Lookups lookups) {
        this.text = text;
        reader = changed -> PlanReader.read(changed, name, files, lookups);
    }

    /**
     * A plan read with changes.
     *
     * @param plan the plan
     * @param changed what was changed in it
     */
    public record Variant(StorePlan plan, List<Changed> changed) {
        /** Copies the list. */
        public Variant {
            changed = List.copyOf(changed);
        }
    }

    /**
     * Reads the plan with changes.
     *
     * @param name name of the variant, for messages
     * @param sets changes as typed, {@code PATH=VALUE}, in their order; a value that is no JSON is
     *     a word
     * @return the plan, changed
     * @throws BadInput with every fault: paths that name nothing, and all that makes the changed
     *     plan no plan
     */
    public Variant with(String name, List<String> sets) {
        List<Fault> faults = new ArrayList<>();
        List<Changed> changed = new ArrayList<>();
        JsonEdit edit = JsonEdit.of(text);
        for (String set : sets) {
            edit = changed(edit, set, changed, faults);
        }
        if (!faults.isEmpty()) {
            throw new BadInput(faults);
        }
        try {
            return new Variant(reader.apply(edit.text()), changed);
        } catch (BadInput wrong) {
            throw new BadInput(
                    wrong.faults().stream()
                            .map(
                                    fault ->
                                            new Fault(
                                                    fault.file() + ", variant '" + name + "',",
                                                    fault.path(),
                                                    fault.found(),
                                                    fault.accepted()))
                            .toList());
        }
    }

    private static JsonEdit changed(
            JsonEdit edit, String set, List<Changed> changed, List<Fault> faults) {
        int equals = set.indexOf('=');
        if (equals < 1) {
            faults.add(
                    new Fault(
                            "--set",
                            "",
                            "is '" + set + "'",
                            "accepted: PATH=VALUE, such as"
                                    + " chambers[north].setting.temperatureC=10"));
            return edit;
        }
        String typed = set.substring(0, equals).strip();
        String value = json(set.substring(equals + 1).strip());
        Json root = JsonText.read(edit.text(), new Faults("")).orElseThrow();
        Optional<JsonPath> path = TypedPath.find(root, typed, faults);
        if (path.isEmpty()) {
            return edit;
        }
        try {
            JsonEdit after = edit.set(path.get(), value);
            changed.add(new Changed(path.get().toString(), edit.at(path.get()), value));
            return after;
        } catch (IllegalArgumentException noPlace) {
            faults.add(
                    new Fault(
                            "--set",
                            typed,
                            String.valueOf(noPlace.getMessage()),
                            "accepted: a name within an object, or an item of a list"));
            return edit;
        }
    }

    private static String json(String typed) {
        return JsonText.read(typed, new Faults("")).isPresent() ? typed : JsonEdit.quoted(typed);
    }
}
