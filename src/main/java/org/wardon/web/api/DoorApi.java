package org.wardon.web.api;

import java.time.LocalDateTime;
import java.util.Locale;
import java.util.Optional;
import org.wardon.advice.receiving.NewLot;
import org.wardon.advice.receiving.Receiving;
import org.wardon.advice.wording.Units;
import org.wardon.files.LotIntoPlan;
import org.wardon.files.json.Part;
import org.wardon.logbook.PlanText;
import org.wardon.plan.LotPlan;
import org.wardon.plan.Purpose;
import org.wardon.produce.Ripeness;
import org.wardon.web.api.route.Ask;
import org.wardon.web.api.route.Reply;
import org.wardon.web.guard.Refusal;
import org.wardon.web.pages.PageWords;
import org.wardon.web.work.OpenPlan;
import org.wardon.web.work.Workbench;

/** A lot at the door: where it goes, and putting it there. */
final class DoorApi {
    private static final double USUAL_WAIT_S = 10;
    private static final long LONGEST_MS = 60_000;

    private final Workbench bench;
    private final JobsApi jobs;
    private final PlansApi plans;
    private final PageWords words;

    DoorApi(Workbench bench, JobsApi jobs, PlansApi plans, PageWords words) {
        this.bench = bench;
        this.jobs = jobs;
        this.plans = plans;
        this.words = words;
    }

    Reply ask(Ask ask) {
        OpenPlan open = ask.plan();
        Optional<Receiving> ready =
                bench.door(open, Ask.good(open), Units.METRIC, ask.waitMs(USUAL_WAIT_S));
        return ready.map(receiving -> Reply.of(receiving.answer(lot(ask.query()))))
                .orElseGet(() -> jobs.accepted(JobsApi.doorOf(open)));
    }

    Reply put(Ask ask) {
        OpenPlan open = ask.plan();
        int version = ask.version(open);
        Receiving receiving =
                bench.door(open, Ask.good(open), Units.METRIC, LONGEST_MS)
                        .orElseThrow(() -> new Refusal(503, "not-ready"));
        LotPlan lot =
                receiving.placed(lot(ask.body()), ask.body().at("chamber").text().orElseThrow());
        String text = LotIntoPlan.addedTo(open.text().text(), open.kept().name(), lot);
        String note =
                words.say(
                        "door.note",
                        lot.id(),
                        open.book().get(lot.commodity()).names().get(0),
                        Units.METRIC.figure(lot.massKg(), "kg"),
                        lot.chamber().orElseThrow());
        return plans.moved(
                        open,
                        bench.plans()
                                .save(
                                        open.kept().id(),
                                        version,
                                        open.kept().name(),
                                        new PlanText(text, open.text().files()),
                                        note))
                .with(201);
    }

    private static NewLot lot(Part asked) {
        return new NewLot(
                asked.at("commodity").text().orElseThrow(),
                asked.at("massKg").number().orElseThrow(),
                new NewLot.Fruit(
                        asked.at("temperatureC").number(),
                        ripeness(asked),
                        asked.at("harvestedHoursAgo").number(),
                        asked.at("cured").flag(),
                        asked.at("package").text(),
                        asked.at("variant").text()),
                new NewLot.Wish(
                        asked.at("at").text().map(LocalDateTime::parse),
                        asked.at("wantedDays").number(),
                        asked.at("marketDays").number(),
                        asked.at("purpose").text().map(DoorApi::purpose),
                        asked.at("pricePerKg").number()));
    }

    static Ripeness ripeness(Part asked) {
        return asked.at("ripeness")
                .text()
                .map(word -> Ripeness.valueOf(word.toUpperCase(Locale.ROOT)))
                .orElse(Ripeness.UNKNOWN);
    }

    private static Purpose purpose(String word) {
        return Purpose.valueOf(word.toUpperCase(Locale.ROOT).replace('-', '_'));
    }
}
