package org.wardon.web.api;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import org.wardon.advice.PlanLookups;
import org.wardon.advice.placing.OpenLots;
import org.wardon.advice.placing.PlaceQuestion;
import org.wardon.advice.placing.PlaceReport;
import org.wardon.advice.whatif.Comparison;
import org.wardon.advice.wording.Units;
import org.wardon.advice.wording.Words;
import org.wardon.errors.BadInput;
import org.wardon.errors.Fault;
import org.wardon.errors.Progress;
import org.wardon.files.PlacedPlan;
import org.wardon.files.PlanFiles;
import org.wardon.files.PlanVariants;
import org.wardon.files.json.Nearest;
import org.wardon.files.json.Part;
import org.wardon.logbook.KeptPlan;
import org.wardon.logbook.PlanText;
import org.wardon.logbook.Saved;
import org.wardon.plan.LotPlan;
import org.wardon.plan.PlaceWish;
import org.wardon.plan.StorePlan;
import org.wardon.reference.ReferenceBook;
import org.wardon.web.api.route.Ask;
import org.wardon.web.api.route.Reply;
import org.wardon.web.api.route.Requests;
import org.wardon.web.guard.Refusal;
import org.wardon.web.pages.PageWords;
import org.wardon.web.work.OpenPlan;
import org.wardon.web.work.PlaceAsked;
import org.wardon.web.work.Placings;
import org.wardon.web.work.Reading;
import org.wardon.web.work.Stand;
import org.wardon.web.work.Workbench;

/** Long questions: placing all lots, comparing changed plans. Each gives a job. */
final class LongApi {
    private static final long SHORT_MS = 250;
    private static final Words WORDS = Words.english(Units.METRIC);

    private final Workbench bench;
    private final JobsApi jobs;
    private final PlansApi plans;
    private final PageWords words;

    LongApi(Workbench bench, JobsApi jobs, PlansApi plans, PageWords words) {
        this.bench = bench;
        this.jobs = jobs;
        this.plans = plans;
        this.words = words;
    }

    /** What was asked of a plan in a version, with what of one's own lay over print. */
    private record Asked(KeptPlan plan, ReferenceBook book, String question) {}

    Reply place(Ask ask) {
        OpenPlan open = ask.plan();
        Reading.Good good = Ask.good(open);
        PlaceAsked asked =
                new PlaceAsked(
                        wish(good.plan(), ask.body()),
                        new PlaceQuestion(
                                ask.body().at("allMayMove").flag().orElse(false),
                                Set.copyOf(lots(good.plan(), ask.body(), "mayMove"))));
        bench.placings().again(open, asked);
        bench.placings().of(open, good, asked, SHORT_MS);
        return jobs.accepted(bench.placings().id(open, asked));
    }

    private static PlaceWish wish(StorePlan plan, Part asked) {
        PlaceWish has = plan.wish();
        PlaceWish.Aim aim = has.aim();
        for (PlaceWish.Aim one : PlaceWish.Aim.values()) {
            aim = asked.at("wish").text().orElse("").equals(one.word()) ? one : aim;
        }
        List<String> lots = lots(plan, asked, "lots");
        if (aim == PlaceWish.Aim.MOST_DAYS && lots.isEmpty() && has.lots().isEmpty()) {
            throw new BadInput(
                    Requests.BODY,
                    "$.lots",
                    "is missing",
                    "accepted: the lots whose days come first");
        }
        return new PlaceWish(aim, lots.isEmpty() ? has.lots() : lots, has.accepts());
    }

    Reply keepPlacing(Ask ask) {
        Placings.Sought sought = jobs.placed(ask);
        PlaceReport report = ((Stand.Placed) sought.stand()).report();
        OpenPlan open = bench.open(sought.plan()).orElseThrow(() -> new Refusal(404, "no-plan"));
        if (open.kept().version() != sought.version()) {
            throw Ask.outdated(
                    409,
                    new Saved.Outdated(
                            sought.version(), open.kept().version(), open.kept().note()));
        }
        String text = PlacedPlan.changed(open.text().text(), report.asked(), report.proposed());
        String note =
                words.say(
                        "placing.note",
                        String.valueOf(report.answer().changes().size()),
                        String.valueOf(report.answer().moves().size()));
        return plans.moved(
                open,
                bench.plans()
                        .save(
                                open.kept().id(),
                                sought.version(),
                                open.kept().name(),
                                new PlanText(text, open.text().files()),
                                note));
    }

    /** Ids of lots, each of which the plan has. */
    private static List<String> lots(StorePlan plan, Part asked, String name) {
        List<String> there = plan.lots().stream().map(LotPlan::id).toList();
        List<Fault> faults = new ArrayList<>();
        for (Part item : asked.at(name).items()) {
            String id = item.text().orElse("");
            if (!there.contains(id)) {
                faults.add(
                        new Fault(
                                Requests.BODY,
                                item.path(),
                                "is '" + id + "', no lot of this plan",
                                Nearest.question(id, there)
                                        + "accepted: "
                                        + String.join(", ", there)));
            }
        }
        if (!faults.isEmpty()) {
            throw new BadInput(faults);
        }
        return AnswersApi.texts(asked.at(name));
    }

    Reply compare(Ask ask) {
        OpenPlan open = ask.plan();
        StorePlan plan = Ask.good(open).plan();
        PlanVariants variants =
                new PlanVariants(
                        open.text().text(),
                        open.kept().name(),
                        PlanFiles.attached(open.text().files()),
                        PlanLookups.of(open.book()));
        List<Comparison.Named> named = new ArrayList<>();
        named.add(new Comparison.Named(words.say("api.as-planned"), plan, List.of()));
        List<Fault> faults = new ArrayList<>();
        for (Part one : ask.body().at("variants").items()) {
            String name = one.at("name").text().orElseThrow();
            try {
                PlanVariants.Variant read = variants.with(name, AnswersApi.texts(one.at("set")));
                named.add(new Comparison.Named(name, read.plan(), read.changed()));
            } catch (BadInput wrong) {
                wrong.faults().forEach(fault -> faults.add(at(one.at("set"), name, fault)));
            }
        }
        if (!faults.isEmpty()) {
            throw new BadInput(faults);
        }
        return jobs.begun(
                "compare",
                new Asked(open.kept(), open.book(), "compare " + ask.bodyText().strip()),
                progress ->
                        new Comparison(open.book(), WORDS)
                                .of(housed(named, open.book()), progress));
    }

    private static List<Comparison.Named> housed(List<Comparison.Named> plans, ReferenceBook book) {
        return plans.stream()
                .map(one -> one.in(OpenLots.house(one.plan(), book, Progress.SILENT).plan()))
                .toList();
    }

    private static Fault at(Part set, String variant, Fault fault) {
        return fault.file().equals("--set")
                ? new Fault(
                        Requests.BODY,
                        set.path(),
                        (fault.path() + " " + fault.found()).strip(),
                        fault.accepted())
                : new Fault(
                        "variant '" + variant + "'", fault.path(), fault.found(), fault.accepted());
    }
}
