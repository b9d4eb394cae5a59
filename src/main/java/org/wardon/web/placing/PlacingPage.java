package org.wardon.web.placing;

import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import org.wardon.advice.placing.PlaceReport;
import org.wardon.advice.wording.Words;
import org.wardon.errors.Fault;
import org.wardon.files.PlacedPlan;
import org.wardon.logbook.PlanText;
import org.wardon.logbook.Saved;
import org.wardon.plan.StorePlan;
import org.wardon.web.guard.Refusal;
import org.wardon.web.pages.AllChambersPage;
import org.wardon.web.pages.Call;
import org.wardon.web.pages.Frame;
import org.wardon.web.pages.Press;
import org.wardon.web.pages.ProgressView;
import org.wardon.web.pages.Room;
import org.wardon.web.work.OpenPlan;
import org.wardon.web.work.PlaceAsked;
import org.wardon.web.work.Reading;
import org.wardon.web.work.Stand;
import org.wardon.web.work.Workbench;

/** Which lot goes where: asked, sought while one waits, told, and put into the plan. */
public final class PlacingPage {
    private static final long PATIENCE_MS = 250;

    private final Workbench bench;
    private final Press press;

    /**
     * Makes the page.
     *
     * @param bench what it works with
     * @param press what prints it
     */
    public PlacingPage(Workbench bench, Press press) {
        this.bench = bench;
        this.press = press;
    }

    /**
     * Shows the wishes, and the placing where one is asked for.
     *
     * @param call the request
     */
    public void show(Call call) {
        OpenPlan open = AllChambersPage.opened(bench, call);
        Sheet sheet = new Sheet(call, open);
        if (open.reading() instanceof Reading.Good good) {
            sheet.form(good.plan());
            sheet.seek(good);
        } else {
            sheet.faults = ((Reading.Faulty) open.reading()).faults();
        }
        sheet.print();
    }

    /** The wishes of an address, of a plan that can be run. */
    private PlacingForm form(Call call, StorePlan plan) {
        Function<String, List<String>> from = name -> call.http().queryParams(name);
        return new PlacingForm(plan, from, press.words());
    }

    private record Asked(OpenPlan open, PlacingForm form) {
        String path() {
            return Room.PLACING.path(open.kept().id()) + "?" + form.query();
        }
    }

    private Asked asked(Call call) {
        OpenPlan open = AllChambersPage.opened(bench, call);
        if (!(open.reading() instanceof Reading.Good good)) {
            throw new Refusal(409, "plan-faulty");
        }
        PlacingForm form = form(call, good.plan());
        if (!form.isAsked()) {
            throw new Refusal(400, "not-understood");
        }
        return new Asked(open, form);
    }

    private String stage(Stand.Running running) {
        return press.words().say("stage." + running.stage());
    }

    private static int percent(Stand.Running running) {
        return (int) Math.round(100 * running.fraction());
    }

    /**
     * Stops a placing.
     *
     * @param call the request
     */
    public void cancel(Call call) {
        Asked asked = asked(call);
        bench.placings().cancel(asked.open, asked.form.asked());
        call.goTo(asked.path());
    }

    /**
     * Begins a stopped placing again.
     *
     * @param call the request
     */
    public void again(Call call) {
        Asked asked = asked(call);
        bench.placings().again(asked.open, asked.form.asked());
        call.goTo(asked.path());
    }

    /**
     * Puts the placing into the plan, as a new version of it.
     *
     * @param call the request
     */
    public void takeOver(Call call) {
        Asked asked = asked(call);
        OpenPlan open = asked.open;
        int version = call.version();
        PlaceReport report = remembered(open.kept().id(), version, call);
        if (version != open.kept().version()) {
            clash(call, open, report);
            return;
        }
        String text = PlacedPlan.changed(open.text().text(), report.asked(), report.proposed());
        Saved saved =
                bench.plans()
                        .save(
                                open.kept().id(),
                                version,
                                open.kept().name(),
                                new PlanText(text, open.text().files()),
                                note(report));
        if (saved instanceof Saved.Kept) {
            call.goTo(open.kept());
        } else {
            clash(call, AllChambersPage.opened(bench, call), report);
        }
    }

    /** The placing of the version a form was filled in from, whose lots may be others by now. */
    private PlaceReport remembered(long plan, int version, Call call) {
        StorePlan then =
                bench.plans()
                        .text(plan, version)
                        .map(text -> bench.reading("", text))
                        .filter(Reading.Good.class::isInstance)
                        .map(reading -> ((Reading.Good) reading).plan())
                        .orElseThrow(() -> new Refusal(400, "no-version"));
        PlaceAsked asked = form(call, then).asked();
        return bench.placings()
                .found(plan, version, asked)
                .orElseThrow(() -> new Refusal(409, "no-placing"));
    }

    private String note(PlaceReport report) {
        var answer = report.answer();
        return press.words()
                .say(
                        "placing.note",
                        String.valueOf(answer.changes().size()),
                        String.valueOf(answer.moves().size()));
    }

    private void clash(Call call, OpenPlan open, PlaceReport report) {
        Sheet sheet = new Sheet(call, open);
        if (open.reading() instanceof Reading.Good good) {
            sheet.form(good.plan());
            sheet.clash =
                    Optional.of(
                            new PlacingView.Clash(
                                    open.kept().note(), sheet.views(report).clash(good.plan())));
        }
        call.http().status(409);
        sheet.print();
    }

    /** One page on its way. */
    private final class Sheet {
        private final Call call;
        private final OpenPlan open;
        private final Frame frame;
        private List<Fault> faults = List.of();
        private Optional<PlacingForm> form = Optional.empty();
        private Optional<PlacingView.First> first = Optional.empty();
        private Optional<ProgressView> progress = Optional.empty();
        private Optional<String> stopped = Optional.empty();
        private Optional<PlacingView.Clash> clash = Optional.empty();
        private Optional<PlacingView.Result> result = Optional.empty();

        Sheet(Call call, OpenPlan open) {
            this.call = call;
            this.open = open;
            frame = press.frame(call, Room.PLACING, Optional.of(open.kept()));
        }

        void form(StorePlan plan) {
            long id = open.kept().id();
            if (plan.lots().isEmpty()) {
                first =
                        Optional.of(
                                new PlacingView.First(
                                        frame.say("placing.no-lots"),
                                        List.of(
                                                link(Room.DOOR.path(id), "placing.to-door"),
                                                link(Room.PLAN.path(id), "placing.to-plan"))));
                return;
            }
            if (plan.chambers().size() == 1) {
                first =
                        Optional.of(
                                new PlacingView.First(
                                        frame.say(
                                                "placing.one-chamber", plan.chambers().get(0).id()),
                                        List.of(link(Room.PLAN.path(id), "placing.to-plan"))));
            }
            form = Optional.of(PlacingPage.this.form(call, plan));
        }

        private PlacingView.Link link(String href, String key) {
            return new PlacingView.Link(href, frame.say(key));
        }

        void seek(Reading.Good good) {
            if (form.isEmpty() || !form.get().isAsked()) {
                form.filter(one -> !one.fault().isEmpty())
                        .ifPresent(one -> call.http().status(422));
                return;
            }
            Stand stand = bench.placings().of(open, good, form.get().asked(), PATIENCE_MS);
            if (stand instanceof Stand.Placed placed) {
                result = Optional.of(views(placed.report()).result(form.get(), path(), page()));
            } else if (stand instanceof Stand.Running running) {
                progress = Optional.of(progress(running));
            } else {
                stopped = Optional.of(why(stand));
            }
        }

        PlacingViews views(PlaceReport report) {
            return new PlacingViews(report, open, Words.english(call.preferences().units()), frame);
        }

        private String path() {
            return Room.PLACING.path(open.kept().id()) + "?" + query();
        }

        private String query() {
            return form.filter(PlacingForm::isAsked).map(PlacingForm::query).orElse("");
        }

        private int page() {
            String given = Optional.ofNullable(call.http().queryParam("why")).orElse("");
            return given.matches("[1-9][0-9]{0,3}") ? Integer.parseInt(given) : 1;
        }

        private ProgressView progress(Stand.Running running) {
            String plan = Room.PLACING.path(open.kept().id());
            return new ProgressView(
                    stage(running),
                    percent(running),
                    "/api/jobs/" + bench.placings().id(open, form.orElseThrow().asked()),
                    plan + "/cancel?" + query());
        }

        private String why(Stand stand) {
            if (stand instanceof Stand.Stopped broken) {
                return broken.message().isBlank()
                        ? frame.say("placing.broken")
                        : frame.say("forecast.stopped", broken.message());
            }
            return frame.say("placing.cancelled");
        }

        private List<PlacingView.Link> before(StorePlan plan) {
            String now = query();
            return bench.placings().found(open).stream()
                    .map(asked -> PlacingForm.of(plan, asked, press.words()))
                    .filter(one -> !one.query().equals(now))
                    .map(
                            one ->
                                    new PlacingView.Link(
                                            Room.PLACING.path(open.kept().id()) + "?" + one.query(),
                                            one.told()))
                    .toList();
        }

        void print() {
            List<PlacingView.Link> before =
                    open.reading() instanceof Reading.Good good && progress.isEmpty()
                            ? before(good.plan())
                            : List.of();
            press.print(
                    call,
                    "placing",
                    progress.isPresent() ? frame.thatWaits() : frame,
                    new PlacingView(
                            open.kept().id(),
                            open.kept().version(),
                            query(),
                            faults,
                            first,
                            form.map(PlacingForm::view),
                            progress,
                            stopped,
                            clash,
                            result,
                            before));
        }
    }
}
