package org.wardon.web.pages;

import io.javalin.http.Context;
import io.javalin.http.HttpResponseException;
import java.io.PrintStream;
import java.util.List;
import java.util.Optional;
import org.wardon.errors.BadInput;
import org.wardon.errors.Fault;
import org.wardon.errors.RunStopped;
import org.wardon.files.forecast.AnswerWriter;
import org.wardon.web.guard.Guard;
import org.wardon.web.guard.Refusal;

/**
 * Every error as a page, or as {@code application/problem+json} below {@code /api/}: what happened,
 * what to do, no more.
 */
public final class Troubles {
    private final Press press;
    private final PrintStream log;

    /**
     * Makes the pages.
     *
     * @param press what prints them
     * @param log where faults of the program itself are told in full
     */
    public Troubles(Press press, PrintStream log) {
        this.press = press;
        this.log = log;
    }

    /**
     * Answers a request that was refused.
     *
     * @param refusal why
     * @param http the request
     */
    public void refused(Refusal refusal, Context http) {
        if (refusal.code().equals("passcode")) {
            new Call(http).goTo(Guard.ENTRANCE);
            return;
        }
        headers(refusal, http);
        String[] with = refusal.arguments().toArray(String[]::new);
        PageWords words = press.words();
        String ofProgram = "api-mend." + refusal.code();
        answer(
                http,
                new Answer(
                        refusal.status(),
                        refusal.code(),
                        words.say("refusal." + refusal.code(), with),
                        words.say(
                                isApi(http) && words.has(ofProgram)
                                        ? ofProgram
                                        : "refusal." + refusal.code() + ".mend",
                                with),
                        List.of(),
                        versions(refusal)));
    }

    private static void headers(Refusal refusal, Context http) {
        switch (refusal.status()) {
            case 401 -> http.header("WWW-Authenticate", "Bearer realm=\"wardon\"");
            case 429 ->
                    http.header(
                            "Retry-After",
                            String.valueOf(60 * Integer.parseInt(refusal.arguments().get(0))));
            case 503 -> http.header("Retry-After", "2");
            default -> {}
        }
    }

    private static Optional<Problem.Versions> versions(Refusal refusal) {
        List<String> with = refusal.arguments();
        return refusal.code().equals("outdated")
                ? Optional.of(
                        new Problem.Versions(
                                Integer.parseInt(with.get(0)),
                                Integer.parseInt(with.get(1)),
                                with.get(2)))
                : Optional.empty();
    }

    private static boolean isApi(Context http) {
        return http.path().startsWith(Guard.API);
    }

    /**
     * Answers bad input that no page has taken up.
     *
     * @param bad the faults
     * @param http the request
     */
    public void badInput(BadInput bad, Context http) {
        faulty(http, 422, bad.faults());
    }

    /**
     * Answers input that is wrong or cannot even be read.
     *
     * @param http the request
     * @param status HTTP status
     * @param faults what is wrong
     */
    public void faulty(Context http, int status, List<Fault> faults) {
        PageWords words = press.words();
        answer(
                http,
                new Answer(
                        status,
                        "input",
                        words.say("trouble.input"),
                        words.say("trouble.input.mend"),
                        faults,
                        Optional.empty()));
    }

    /**
     * Answers where a run met a state that cannot be.
     *
     * @param stopped when, where and which term
     * @param http the request
     */
    public void stopped(RunStopped stopped, Context http) {
        refused(new Refusal(422, "stopped", String.valueOf(stopped.getMessage())), http);
    }

    /**
     * Answers what the server itself refuses, such as a path it does not know.
     *
     * @param refused why
     * @param http the request
     */
    public void http(HttpResponseException refused, Context http) {
        String code =
                switch (refused.getStatus()) {
                    case 404 -> "nothing-here";
                    case 405 -> "method";
                    case 413 -> "too-large";
                    default -> "not-understood";
                };
        refused(new Refusal(refused.getStatus(), code), http);
    }

    /**
     * Answers after a fault of the program itself.
     *
     * @param fault what was thrown
     * @param http the request
     */
    public void own(Exception fault, Context http) {
        log.println("wardon: a fault of the program itself, please report it:");
        fault.printStackTrace(log);
        PageWords words = press.words();
        answer(
                http,
                new Answer(
                        500,
                        "own",
                        words.say("trouble.own"),
                        words.say("trouble.own.mend"),
                        List.of(),
                        Optional.empty()));
    }

    /** What is answered, as a page or as a problem. */
    private record Answer(
            int status,
            String code,
            String happened,
            String mend,
            List<Fault> faults,
            Optional<Problem.Versions> versions) {}

    private void answer(Context http, Answer answer) {
        http.status(answer.status());
        if (isApi(http)) {
            Problem problem =
                    new Problem(
                            "urn:wardon:trouble:" + answer.code(),
                            answer.happened(),
                            answer.status(),
                            answer.mend(),
                            answer.faults().stream().map(Problem.OneFault::of).toList(),
                            answer.versions());
            http.contentType(Problem.MEDIA_TYPE).result(AnswerWriter.json(problem));
        } else {
            Call call = new Call(http);
            Frame frame = press.frame(call, press.words().say("trouble.title"));
            press.print(
                    call,
                    "trouble",
                    frame,
                    new TroubleView(answer.happened(), answer.mend(), answer.faults()));
        }
    }
}
