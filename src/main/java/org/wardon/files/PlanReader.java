package org.wardon.files;

import java.nio.file.Path;
import java.util.Optional;
import org.wardon.errors.BadInput;
import org.wardon.files.json.Faults;
import org.wardon.files.json.Json;
import org.wardon.files.json.JsonText;
import org.wardon.files.json.Part;
import org.wardon.files.json.SchemaCheck;
import org.wardon.plan.StorePlan;
import org.wardon.plan.WeatherSource;

/**
 * Reads a store plan strictly. Every fault is told at once, each mistake once: what is no JSON,
 * names and values the schema does not accept, ids that name nothing, times that cannot be, and the
 * faults of the weather file.
 */
public final class PlanReader {
    /** Largest plan read, MB. */
    public static final int LARGEST_MB = 20;

    private PlanReader() {}

    /**
     * Reads a plan and the weather it names.
     *
     * @param file the plan
     * @param lookups the ids of the tables
     * @return the plan, with every default put in and listed
     * @throws BadInput with every fault
     */
    public static StorePlan read(Path file, Lookups lookups) {
        return read(TextFile.read(file, file.toString(), LARGEST_MB), file, lookups);
    }

    /**
     * Reads the text of a plan and the weather it names.
     *
     * @param text the plan
     * @param file where it stands or is to stand, for files it names and for messages
     * @param lookups the ids of the tables
     * @return the plan, with every default put in and listed
     * @throws BadInput with every fault
     */
    public static StorePlan read(String text, Path file, Lookups lookups) {
        Given given = new Given(text, file.toString(), nameOf(file));
        return read(given, new FilesOfFolder(file), lookups);
    }

    /**
     * Reads a plan that is no file, with the files that belong to it.
     *
     * @param text text of the plan
     * @param name its name in messages, and for people where the plan gives none
     * @param files the files it may name
     * @param lookups the ids of the tables
     * @return the plan, with every default put in and listed
     * @throws BadInput with every fault
     */
    public static StorePlan read(String text, String name, PlanFiles files, Lookups lookups) {
        return read(new Given(text, name, name), files, lookups);
    }

    /** A plan's text, its name in messages and its name for people. */
    private record Given(String text, String shown, String name) {}

    private static StorePlan read(Given given, PlanFiles files, Lookups lookups) {
        Faults faults = new Faults(given.shown);
        Optional<Json> json = JsonText.read(given.text, faults);
        if (json.isPresent()) {
            new SchemaCheck(Schema.tree(), faults).check(json.get());
        }
        if (json.isEmpty() || !(json.get() instanceof Json.Obj)) {
            faults.refuseIfAny();
        }
        Part plan = Part.root(json.orElseThrow());
        Optional<WeatherSource> weather = PlanWeather.read(plan, files, faults);
        new ChamberRules(plan, lookups, faults).check();
        new LotRules(plan, lookups, faults).check();
        faults.refuseIfAny();
        return bound(plan, weather.orElseThrow(), lookups, given);
    }

    private static StorePlan bound(Part plan, WeatherSource weather, Lookups lookups, Given given) {
        try {
            return new PlanBinder(plan, lookups).bind(weather, given.name);
        } catch (IllegalArgumentException e) {
            // The records hold the schema's bounds too; what slips past it still ends as a fault.
            throw new BadInput(
                    given.shown, "$", String.valueOf(e.getMessage()), "accepted: see the schema");
        }
    }

    private static String nameOf(Path file) {
        return String.valueOf(file.getFileName()).replaceFirst("\\.[^.]*$", "");
    }
}
