package org.wardon.web.api;

import java.time.LocalDateTime;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import org.wardon.advice.company.Borne;
import org.wardon.advice.company.GroupQuestion;
import org.wardon.advice.company.GroupSharing;
import org.wardon.advice.company.SharingAdvice;
import org.wardon.advice.faces.FaceAdvice;
import org.wardon.advice.forecast.SizeAdvice;
import org.wardon.advice.forecast.StoreAdvice;
import org.wardon.advice.placing.OpenLots;
import org.wardon.advice.wording.Units;
import org.wardon.advice.wording.Words;
import org.wardon.errors.BadInput;
import org.wardon.errors.Fault;
import org.wardon.errors.Progress;
import org.wardon.files.json.JsonPath;
import org.wardon.files.json.Part;
import org.wardon.plan.StorePlan;
import org.wardon.produce.Conflict;
import org.wardon.web.api.route.Ask;
import org.wardon.web.api.route.Reply;
import org.wardon.web.api.route.Requests;
import org.wardon.web.api.told.DaysLeft;
import org.wardon.web.api.told.FaceTold;
import org.wardon.web.api.told.LotsSharing;
import org.wardon.web.guard.Refusal;
import org.wardon.web.work.OpenPlan;
import org.wardon.web.work.Stand;
import org.wardon.web.work.Workbench;

/** Answers on a plan, the same records as the command line writes, in °C and kg. */
final class AnswersApi {
    private static final double USUAL_WAIT_S = 10;
    private static final Words WORDS = Words.english(Units.METRIC);

    private final Workbench bench;
    private final JobsApi jobs;

    AnswersApi(Workbench bench, JobsApi jobs) {
        this.bench = bench;
        this.jobs = jobs;
    }

    /** A forecast that is there, or where it is on its way. */
    private record Asked(OpenPlan open, Optional<StoreAdvice> advice) {}

    private Asked asked(Ask ask) {
        OpenPlan open = ask.plan();
        Stand stand = bench.forecast(open, Ask.good(open), Units.METRIC, ask.waitMs(USUAL_WAIT_S));
        if (stand instanceof Stand.Stopped stopped) {
            bench.again(open);
            throw new Refusal(422, "stopped", stopped.message());
        }
        if (stand instanceof Stand.Cancelled) {
            // Whoever asks for it wants it, whoever stopped it before.
            bench.again(open);
            return asked(ask);
        }
        return new Asked(
                open,
                stand instanceof Stand.Ready ready
                        ? Optional.of(ready.advice())
                        : Optional.empty());
    }

    Reply forecast(Ask ask) {
        Asked asked = asked(ask);
        return asked.advice()
                .map(advice -> Reply.of(advice.forecast()).ofVersion(asked.open().kept().version()))
                .orElseGet(() -> jobs.accepted(JobsApi.forecastOf(asked.open())));
    }

    Reply daysLeft(Ask ask) {
        Asked asked = asked(ask);
        return asked.advice()
                .map(advice -> Reply.of(DaysLeft.of(advice.forecast())))
                .orElseGet(() -> jobs.accepted(JobsApi.forecastOf(asked.open())));
    }

    /** The forecast of a plan, waited for. */
    StoreAdvice advice(Ask ask, OpenPlan open) {
        Stand stand = bench.forecast(open, Ask.good(open), Units.METRIC, 1_000 * 60);
        if (stand instanceof Stand.Ready ready) {
            return ready.advice();
        }
        bench.again(open);
        throw stand instanceof Stand.Stopped stopped
                ? new Refusal(422, "stopped", stopped.message())
                : new Refusal(503, "not-ready");
    }

    Reply size(Ask ask) {
        OpenPlan open = ask.plan();
        Part asked = ask.query();
        return Reply.of(
                new SizeAdvice(open.book(), WORDS)
                        .ask(
                                housed(open),
                                new SizeAdvice.Question(
                                        chamber(ask, open),
                                        asked.at("outdoorC").number(),
                                        asked.at("outdoorHumidityPct").number(),
                                        asked.at("pullDownHours").number().orElse(24),
                                        asked.at("marginPct").number().orElse(10))));
    }

    /** The plan with a chamber for every lot, as the command line takes it. */
    static StorePlan housed(OpenPlan open) {
        return OpenLots.house(Ask.good(open).plan(), open.book(), Progress.SILENT).plan();
    }

    /** The chamber of the path, which the plan has. */
    static String chamber(Ask ask, OpenPlan open) {
        String chamber = ask.path("chamber");
        if (Ask.good(open).plan().chambers().stream().noneMatch(one -> one.id().equals(chamber))) {
            throw new Refusal(404, "no-chamber");
        }
        return chamber;
    }

    Reply hour(Ask ask) {
        OpenPlan open = ask.plan();
        String chamber = chamber(ask, open);
        LocalDateTime until;
        try {
            until = LocalDateTime.parse(ask.path("at"));
        } catch (java.time.format.DateTimeParseException e) {
            throw new Refusal(404, "no-hour");
        }
        return Reply.of(
                advice(ask, open)
                        .view(chamber)
                        .hour(until, ask.query().at("face").text(), ask.query().at("lot").text()));
    }

    Reply face(Ask ask) {
        OpenPlan open = ask.plan();
        String typed = ask.query().at("at").text().orElseThrow();
        JsonPath path =
                JsonPath.parse(typed)
                        .orElseThrow(
                                () ->
                                        new BadInput(
                                                Requests.QUERY,
                                                "at",
                                                "is '" + typed + "', no path",
                                                "accepted: such as $.chambers[0].faces[2]"));
        return FaceAdvice.of(open.text().text(), open.book())
                .of(path)
                .map(report -> Reply.of(FaceTold.of(typed, report)))
                .orElseThrow(() -> new Refusal(404, "no-face"));
    }

    Reply share(Ask ask) {
        return Reply.of(
                new SharingAdvice(bench.book(), WORDS).ask(wanted(ask), accepts(ask)).answer());
    }

    /** Who of the lots of a plan may share, and what each bears. */
    Reply shareLots(Ask ask) {
        OpenPlan open = ask.plan();
        GroupSharing sharing = GroupSharing.of(Ask.good(open).plan(), open.book());
        List<String> lots = texts(ask.query().at("lot"));
        Map<String, Double> crops = wanted(ask);
        GroupQuestion question = new GroupQuestion(lots, crops, accepts(ask));
        try {
            return Reply.of(
                    LotsSharing.of(
                            sharing.tell(question, WORDS).answer(), sharing.ask(lots, crops)));
        } catch (BadInput e) {
            throw new BadInput(e.faults().stream().map(fault -> inQuestion(lots, fault)).toList());
        }
    }

    /** A fault under the name of a lot or crop is told under the name of the question. */
    private static Fault inQuestion(List<String> lots, Fault fault) {
        String name = lots.contains(fault.file()) ? "lot" : "crop";
        String found = "'" + fault.file() + "': " + fault.found();
        return new Fault(Requests.QUERY, name, found, fault.accepted());
    }

    private static Set<Conflict> accepts(Ask ask) {
        return Borne.named("--accept", texts(ask.query().at("accept")));
    }

    private static Map<String, Double> wanted(Ask ask) {
        Map<String, Double> wanted = new java.util.LinkedHashMap<>();
        OptionalDouble days = ask.query().at("days").number();
        for (Part crop : ask.query().at("crop").items()) {
            String typed = crop.text().orElse("");
            String name = typed.split("=", 2)[0].strip();
            double own = typed.contains("=") ? days(typed) : days.orElse(SharingAdvice.USUAL_DAYS);
            if (wanted.put(name, own) != null) {
                throw crop(typed, "it is named twice", "name each crop once");
            }
        }
        return wanted;
    }

    private static double days(String typed) {
        String days = typed.split("=", 2)[1];
        try {
            return Double.parseDouble(days);
        } catch (NumberFormatException e) {
            throw crop(typed, "'" + days + "' is no number of days", "accepted: such as mango=10");
        }
    }

    private static BadInput crop(String typed, String found, String accepted) {
        return new BadInput(Requests.QUERY, "crop", "'" + typed + "': " + found, accepted);
    }

    static List<String> texts(Part list) {
        return list.items().stream().map(item -> item.text().orElse("")).toList();
    }
}
