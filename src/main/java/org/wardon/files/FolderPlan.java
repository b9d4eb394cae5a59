package org.wardon.files;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.wardon.files.json.Faults;
import org.wardon.files.json.JsonText;
import org.wardon.files.json.Part;

/**
 * A plan as it lies in a folder, taken with the files it names and not yet judged.
 *
 * @param text its text
 * @param files the files beside it
 * @param named names of the files it names
 */
public record FolderPlan(String text, PlanFiles files, List<String> named) {
    private static final int LONGEST_NAME = 120;

    /** Copies the list. */
    public FolderPlan {
        named = List.copyOf(named);
    }

    /**
     * Takes a plan from its folder.
     *
     * @param file the plan
     * @return the plan
     * @throws org.wardon.errors.BadInput where the file cannot be read
     */
    public static FolderPlan read(Path file) {
        String text = TextFile.read(file, file.toString(), PlanReader.LARGEST_MB);
        return new FolderPlan(text, new FilesOfFolder(file), namedIn(text));
    }

    /**
     * Returns the files a plan names.
     *
     * @param text text of the plan
     * @return their names as the plan gives them; none where the text is no JSON
     */
    public static List<String> namedIn(String text) {
        return root(text).flatMap(plan -> plan.at("weather").at("csv").text()).stream().toList();
    }

    /**
     * Returns the name a plan gives itself.
     *
     * @param text text of the plan
     * @return its name, cut where nobody would read on; absent where it gives none
     */
    public static Optional<String> nameIn(String text) {
        return root(text)
                .flatMap(plan -> plan.at("name").text())
                .filter(name -> !name.isBlank())
                .map(FolderPlan::cut);
    }

    private static String cut(String name) {
        return name.length() <= LONGEST_NAME ? name : name.substring(0, LONGEST_NAME - 1) + "…";
    }

    private static Optional<Part> root(String text) {
        return JsonText.read(text, new Faults("")).map(Part::root);
    }
}
