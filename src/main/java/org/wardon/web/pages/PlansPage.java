package org.wardon.web.pages;

import io.javalin.http.Context;
import java.time.Instant;
import java.time.LocalDateTime;
import java.time.ZoneId;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.wardon.errors.BadInput;
import org.wardon.errors.Fault;
import org.wardon.files.FolderPlan;
import org.wardon.files.TextFile;
import org.wardon.logbook.KeptPlan;
import org.wardon.logbook.PlanText;
import org.wardon.logbook.Saved;
import org.wardon.web.guard.Refusal;
import org.wardon.web.guard.Uploads;
import org.wardon.web.work.Imports;
import org.wardon.web.work.OpenPlan;
import org.wardon.web.work.Workbench;

/** All kept plans: opening, bringing, taking away; undo and redo. */
public final class PlansPage {
    private final Workbench bench;
    private final Press press;
    private final Imports imports;

    /**
     * Makes the page.
     *
     * @param bench what it works with
     * @param press what prints it
     */
    public PlansPage(Workbench bench, Press press) {
        this.bench = bench;
        this.press = press;
        this.imports = new Imports(bench);
    }

    /**
     * Shows all plans.
     *
     * @param call the request
     */
    public void show(Call call) {
        show(call, List.of());
    }

    private void show(Call call, List<Fault> faults) {
        ZoneId zone = bench.clock().getZone();
        PlansView view =
                new PlansView(
                        bench.plans().list().stream()
                                .map(plan -> row(call.figures(), zone, plan))
                                .toList(),
                        faults);
        press.print(call, "plans", press.frame(call, Room.PLANS, Optional.empty()), view);
    }

    private static PlansView.Row row(Figures figures, ZoneId zone, KeptPlan plan) {
        Instant at = plan.changedAt();
        return new PlansView.Row(
                plan.id(),
                plan.version(),
                plan.name(),
                plan.note(),
                figures.time(LocalDateTime.ofInstant(at, zone)));
    }

    /**
     * Brings the demo.
     *
     * @param call the request
     */
    public void demo(Call call) {
        call.goTo(imports.demo(press.words().say("note.demo")));
    }

    /**
     * Brings a plan and the files it names.
     *
     * @param call the request
     */
    public void bring(Call call) {
        try {
            Context http = call.http();
            Uploads.Brought plan =
                    Uploads.of(http, "plan", List.of(".json")).values().stream()
                            .findFirst()
                            .orElseThrow(PlansPage::noFile);
            String text = TextFile.decoded(plan.bytes(), plan.name());
            Map<String, Uploads.Brought> beside = Uploads.of(http, "files", List.of(".csv"));
            KeptPlan kept =
                    imports.brought(
                            plan.name(),
                            new PlanText(text, named(text, beside)),
                            press.words().say("note.brought", plan.name()));
            call.goTo(kept);
        } catch (BadInput e) {
            call.http().status(422);
            show(call, e.faults());
        }
    }

    private static BadInput noFile() {
        return new BadInput("plan", "", "no file is chosen", "accepted: a store plan, .json");
    }

    /** Files go by the name the plan gives; the one file a plan names may be called otherwise. */
    private static Map<String, String> named(String plan, Map<String, Uploads.Brought> beside) {
        List<String> names = FolderPlan.namedIn(plan);
        Map<String, String> files = new HashMap<>();
        beside.forEach(
                (name, file) -> {
                    String text = TextFile.decoded(file.bytes(), name);
                    boolean only = names.size() == 1 && beside.size() == 1;
                    files.put(only ? names.get(0) : name, text);
                });
        return files;
    }

    /**
     * Gives a plan away: JSON alone, or a ZIP where files belong to it.
     *
     * @param call the request
     */
    public void take(Call call) {
        OpenPlan open = AllChambersPage.opened(bench, call);
        PlanBundle bundle = PlanBundle.of(open);
        call.http()
                .contentType(bundle.mediaType())
                .header("Content-Disposition", bundle.disposition())
                .result(bundle.content());
    }

    /**
     * Goes back a version.
     *
     * @param call the request
     */
    public void undo(Call call) {
        OpenPlan open = AllChambersPage.opened(bench, call);
        done(bench.plans().undo(open.kept().id(), call.version()));
        call.goTo(open.kept());
    }

    /**
     * Goes on a version.
     *
     * @param call the request
     */
    public void redo(Call call) {
        OpenPlan open = AllChambersPage.opened(bench, call);
        done(bench.plans().redo(open.kept().id(), call.version()));
        call.goTo(open.kept());
    }

    /**
     * Strikes a plan out.
     *
     * @param call the request
     */
    public void delete(Call call) {
        OpenPlan open = AllChambersPage.opened(bench, call);
        done(bench.plans().delete(open.kept().id(), call.version()));
        call.goTo(Room.PLANS.path(0));
    }

    private static void done(Saved saved) {
        if (saved instanceof Saved.Outdated outdated) {
            throw new Refusal(
                    409,
                    "outdated",
                    String.valueOf(outdated.startedFrom()),
                    String.valueOf(outdated.version()),
                    outdated.note());
        }
        if (saved instanceof Saved.Nothing) {
            throw new Refusal(409, "nothing-to-do");
        }
    }
}
