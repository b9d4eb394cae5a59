package org.wardon.web.api;

import java.util.Optional;
import java.util.function.Function;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.wardon.advice.wording.Units;
import org.wardon.errors.Progress;
import org.wardon.errors.RunStopped;
import org.wardon.web.api.route.Ask;
import org.wardon.web.api.route.Reply;
import org.wardon.web.api.told.JobSheet;
import org.wardon.web.guard.Refusal;
import org.wardon.web.pages.PageWords;
import org.wardon.web.work.OpenPlan;
import org.wardon.web.work.Placings;
import org.wardon.web.work.Reading;
import org.wardon.web.work.Stand;
import org.wardon.web.work.Workbench;

/**
 * Long work: how far it is, stopping it, its result. A forecast and a store worked out for the door
 * have a job each by plan and version; pages and programs share them.
 */
final class JobsApi {
    private static final String JOBS = "/api/jobs/";
    private static final Pattern OF_PLAN =
            Pattern.compile("(forecast|door)-([1-9][0-9]{0,8})-([1-9][0-9]{0,8})");
    private static final long SHORT_MS = 250;

    private final Workbench bench;
    private final PageWords words;

    JobsApi(Workbench bench, PageWords words) {
        this.bench = bench;
        this.words = words;
    }

    /** A job and how far it is. */
    private record Known(String id, Stand stand, String result, Optional<OpenPlan> open) {}

    Reply read(Ask ask) {
        return Reply.of(sheet(known(ask.path("job"))));
    }

    private JobSheet sheet(Known job) {
        String url = JOBS + job.id();
        if (job.stand() instanceof Stand.Running running) {
            return new JobSheet(
                    job.id(),
                    "running",
                    words.say("stage." + running.stage()),
                    (int) Math.round(100 * running.fraction()),
                    "",
                    url,
                    Optional.empty());
        }
        if (job.stand() instanceof Stand.Stopped stopped) {
            return over(job, "stopped", stopped.message(), Optional.empty());
        }
        return job.stand() instanceof Stand.Cancelled
                ? over(job, "cancelled", "", Optional.empty())
                : over(job, "ready", "", Optional.of(job.result()));
    }

    private static JobSheet over(Known job, String state, String text, Optional<String> result) {
        return new JobSheet(job.id(), state, "", 100, text, JOBS + job.id(), result);
    }

    Reply cancel(Ask ask) {
        Known job = known(ask.path("job"));
        job.open().ifPresent(bench::cancel);
        if (job.open().isEmpty()) {
            bench.errands().cancel(job.id());
            bench.placings().cancel(job.id());
        }
        return Reply.of(sheet(job)).with(202);
    }

    Reply result(Ask ask) {
        Known job = known(ask.path("job"));
        if (job.stand() instanceof Stand.Answered answered) {
            return Reply.of(answered.answer());
        }
        if (job.stand() instanceof Stand.Placed placed) {
            return Reply.of(placed.report().answer());
        }
        if (job.stand() instanceof Stand.Ready) {
            return new Reply(303, "", new byte[0], java.util.Map.of("Location", job.result()));
        }
        throw notReady(job.stand());
    }

    private static Refusal notReady(Stand stand) {
        if (stand instanceof Stand.Stopped stopped) {
            return new Refusal(422, "stopped", stopped.message());
        }
        return stand instanceof Stand.Cancelled
                ? new Refusal(409, "cancelled")
                : new Refusal(409, "job-runs");
    }

    private static Known sought(String id, Placings.Sought sought) {
        return new Known(id, sought.stand(), JOBS + id + "/result", Optional.empty());
    }

    private Known known(String id) {
        Optional<Placings.Sought> sought = bench.placings().sought(id);
        if (sought.isPresent()) {
            return sought(id, sought.get());
        }
        Matcher ofPlan = OF_PLAN.matcher(id);
        if (!ofPlan.matches()) {
            Stand stand =
                    bench.errands().stand(id, 0).orElseThrow(() -> new Refusal(404, "no-job"));
            return new Known(id, stand, JOBS + id + "/result", Optional.empty());
        }
        OpenPlan open =
                bench.open(Long.parseLong(ofPlan.group(2)))
                        .filter(plan -> plan.kept().version() == Integer.parseInt(ofPlan.group(3)))
                        .orElseThrow(() -> new Refusal(404, "no-job"));
        return ofPlan.group(1).equals("door") ? door(id, open) : forecast(id, open);
    }

    private Known forecast(String id, OpenPlan open) {
        Stand stand = bench.stand(open).orElseThrow(() -> new Refusal(404, "no-job"));
        return new Known(
                id, stand, "/api/plans/" + open.kept().id() + "/forecast", Optional.of(open));
    }

    /** A store that cannot be worked out is over too: asking at the door tells what happened. */
    private Known door(String id, OpenPlan open) {
        String result = "/api/plans/" + open.kept().id() + "/door";
        if (!(open.reading() instanceof Reading.Good good)) {
            return new Known(id, new Stand.Cancelled(), result, Optional.empty());
        }
        try {
            boolean ready = bench.door(open, good, Units.METRIC, 0).isPresent();
            Stand stand = ready ? new Stand.Door() : new Stand.Running("door", 0);
            return new Known(id, stand, result, Optional.empty());
        } catch (RunStopped e) {
            return new Known(
                    id,
                    new Stand.Stopped(String.valueOf(e.getMessage())),
                    result,
                    Optional.empty());
        }
    }

    /** Where work goes on: the job to ask for it. */
    Reply accepted(String id) {
        JobSheet sheet = sheet(known(id));
        return Reply.of(sheet).with(202).with("Location", JOBS + id).with("Retry-After", "1");
    }

    /** Begins long work and waits a moment, as short work is over by then. */
    Reply begun(String kind, Object question, Function<Progress, Record> work) {
        String id =
                bench.errands()
                        .begin(kind, question, work)
                        .orElseThrow(() -> new Refusal(503, "too-busy"));
        bench.errands().stand(id, SHORT_MS);
        return accepted(id);
    }

    /** The placing of a job, which is ready. */
    Placings.Sought placed(Ask ask) {
        String id = ask.path("job");
        Placings.Sought sought =
                bench.placings().sought(id).orElseThrow(() -> new Refusal(404, "no-job"));
        if (!(sought.stand() instanceof Stand.Placed)) {
            throw notReady(sought.stand());
        }
        return sought;
    }

    static String forecastOf(OpenPlan open) {
        return "forecast-" + open.kept().id() + "-" + open.kept().version();
    }

    static String doorOf(OpenPlan open) {
        return "door-" + open.kept().id() + "-" + open.kept().version();
    }
}
