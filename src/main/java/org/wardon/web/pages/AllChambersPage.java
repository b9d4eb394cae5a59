package org.wardon.web.pages;

import java.util.List;
import java.util.Optional;
import org.wardon.advice.wording.Words;
import org.wardon.errors.Fault;
import org.wardon.logbook.KeptPlan;
import org.wardon.web.guard.Refusal;
import org.wardon.web.work.OpenPlan;
import org.wardon.web.work.Reading;
import org.wardon.web.work.Stand;
import org.wardon.web.work.Workbench;

/** All chambers of a plan: what each will do, what is in it, what to beware of. */
public final class AllChambersPage {
    /** A forecast that is nearly there is worth waiting for, ms. */
    private static final long PATIENCE_MS = 250;

    private final Workbench bench;
    private final Press press;

    /**
     * Makes the page.
     *
     * @param bench what it works with
     * @param press what prints it
     */
    public AllChambersPage(Workbench bench, Press press) {
        this.bench = bench;
        this.press = press;
    }

    /**
     * Sends people on to the plan they last looked at, else the last changed, else to all plans.
     *
     * @param call the request
     */
    public void home(Call call) {
        home(call, Room.CHAMBERS);
    }

    /**
     * Sends people on to a room of the plan they last looked at, else of the last changed, else to
     * all plans.
     *
     * @param call the request
     * @param room the room
     */
    public void home(Call call, Room room) {
        List<KeptPlan> plans = bench.plans().list();
        Optional<KeptPlan> last =
                call.session()
                        .flatMap(
                                session ->
                                        plans.stream()
                                                .filter(
                                                        plan ->
                                                                session.plan().orElse(0)
                                                                        == plan.id())
                                                .findFirst());
        call.goTo(
                last.or(() -> plans.stream().findFirst())
                        .map(plan -> room.path(plan.id()))
                        .orElse(Room.PLANS.path(0)));
    }

    /**
     * Shows the page.
     *
     * @param call the request
     */
    public void show(Call call) {
        OpenPlan open = opened(bench, call);
        Frame frame = press.frame(call, Room.CHAMBERS, Optional.of(open.kept()));
        if (open.reading() instanceof Reading.Faulty faulty) {
            press.print(call, "chambers", frame, faulty(open, faulty.faults()));
            return;
        }
        Reading.Good plan = (Reading.Good) open.reading();
        Stand stand = bench.forecast(open, plan, call.preferences().units(), PATIENCE_MS);
        if (stand instanceof Stand.Ready ready) {
            Words words = Words.english(call.preferences().units());
            AdviceViews views = new AdviceViews(ready.advice(), open, words, frame, bench.clock());
            press.print(call, "chambers", frame, views.allChambers());
        } else if (stand instanceof Stand.Running running) {
            press.print(call, "chambers", frame.thatWaits(), running(open, running));
        } else {
            press.print(call, "chambers", frame, stopped(open, stand));
        }
    }

    /**
     * Opens the plan a path names and notes that it is looked at.
     *
     * @param bench the bench
     * @param call the request
     * @return the plan
     * @throws Refusal where there is none of that number
     */
    public static OpenPlan opened(Workbench bench, Call call) {
        OpenPlan open =
                bench.open(call.number("plan")).orElseThrow(() -> new Refusal(404, "no-plan"));
        call.session().ifPresent(session -> session.lookAt(open.kept().id()));
        return open;
    }

    private AllChambersView faulty(OpenPlan open, List<Fault> faults) {
        return bare(open, Optional.empty(), Optional.empty(), faults);
    }

    private AllChambersView running(OpenPlan open, Stand.Running running) {
        return bare(
                open,
                Optional.of(ForecastRoutes.progress(open, running, press.words())),
                Optional.empty(),
                List.of());
    }

    private AllChambersView stopped(OpenPlan open, Stand stand) {
        PageWords words = press.words();
        String why =
                stand instanceof Stand.Stopped stopped
                        ? stopped.message().isBlank()
                                ? words.say("forecast.broken")
                                : words.say("forecast.stopped", stopped.message())
                        : words.say("forecast.cancelled");
        return bare(open, Optional.empty(), Optional.of(why), List.of());
    }

    private static AllChambersView bare(
            OpenPlan open,
            Optional<ProgressView> progress,
            Optional<String> stopped,
            List<Fault> faults) {
        return new AllChambersView(
                open.kept().name(),
                "",
                progress,
                stopped,
                faults,
                List.of(),
                0,
                Optional.empty(),
                List.of(),
                Optional.empty(),
                List.of(),
                new LotsView(List.of(), Optional.empty()),
                "",
                open.kept().id());
    }
}
