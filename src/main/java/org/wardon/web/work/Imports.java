package org.wardon.web.work;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.HashMap;
import java.util.Map;
import java.util.Optional;
import org.wardon.files.FolderPlan;
import org.wardon.files.PlanFiles;
import org.wardon.logbook.KeptPlan;
import org.wardon.logbook.PlanText;
import org.wardon.logbook.Saved;

/** Plans that come in from elsewhere and are kept from then on. */
public final class Imports {
    private static final String DEMO = "/org/wardon/demo/";

    private final Workbench bench;

    /**
     * Brings plans to a bench.
     *
     * @param bench where they are kept
     */
    public Imports(Workbench bench) {
        this.bench = bench;
    }

    /**
     * Keeps the demo's plan.
     *
     * @param note what was done, in a line
     * @return the plan; a demo already there is not brought twice
     */
    public KeptPlan demo(String note) {
        PlanText text =
                new PlanText(
                        shipped("landing.json"), Map.of("weather.csv", shipped("weather.csv")));
        return bench.plans()
                .from("demo")
                .orElseGet(() -> bench.plans().add(nameOf(text, "Demo"), "demo", text, note));
    }

    private static String shipped(String name) {
        try (InputStream in = Imports.class.getResourceAsStream(DEMO + name)) {
            if (in == null) {
                throw new IllegalStateException(DEMO + name + " is not in the program");
            }
            return new String(in.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /**
     * Keeps a plan that was brought.
     *
     * @param fileName name of its file
     * @param text its text and files
     * @param note what was done, in a line
     * @return the plan, faults and all: they can be mended here
     */
    public KeptPlan brought(String fileName, PlanText text, String note) {
        return bench.plans().add(nameOf(text, fileName), "", text, note);
    }

    /**
     * Keeps the plan of a file on this machine. One that came from there before gets a new version
     * where its file has changed since.
     *
     * @param file the plan
     * @param note what was done, in a line
     * @return the plan
     * @throws org.wardon.errors.BadInput where the file cannot be read
     */
    public KeptPlan fromFile(Path file, String note) {
        PlanText text = read(file);
        String origin = file.toAbsolutePath().normalize().toString();
        String name = nameOf(text, String.valueOf(file.getFileName()));
        Optional<KeptPlan> before = bench.plans().from(origin);
        if (before.isEmpty()) {
            return bench.plans().add(name, origin, text, note);
        }
        KeptPlan kept = before.get();
        if (known(kept, text)) {
            return kept;
        }
        Saved saved = bench.plans().save(kept.id(), kept.version(), name, text, note);
        return saved instanceof Saved.Kept
                ? bench.plans().find(kept.id()).orElseThrow()
                : fromFile(file, note);
    }

    /** Whether the file was brought like this before; later changes made here then still count. */
    private boolean known(KeptPlan kept, PlanText text) {
        return bench.plans().history(kept.id()).stream()
                .anyMatch(
                        version ->
                                bench.plans()
                                        .text(kept.id(), version.number())
                                        .equals(Optional.of(text)));
    }

    private static PlanText read(Path file) {
        FolderPlan plan = FolderPlan.read(file);
        Map<String, String> files = new HashMap<>();
        for (String name : plan.named()) {
            if (plan.files().find(name) instanceof PlanFiles.Text found) {
                files.put(name, found.text());
            }
        }
        return new PlanText(plan.text(), files);
    }

    private static String nameOf(PlanText text, String otherwise) {
        return FolderPlan.nameIn(text.text()).orElse(otherwise.replaceFirst("\\.json$", ""));
    }
}
