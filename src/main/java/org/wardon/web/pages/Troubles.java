package org.wardon.web.pages;

import io.javalin.http.Context;
import io.javalin.http.HttpResponseException;
import java.io.PrintStream;
import java.util.List;
import org.wardon.errors.BadInput;
import org.wardon.errors.Fault;
import org.wardon.web.guard.Guard;
import org.wardon.web.guard.Refusal;

/** Every error as a page, or as JSON below {@code /api/}: what happened, what to do, no more. */
public final class Troubles {
    private static final String API = "/api/";

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
     * An error as JSON.
     *
     * @param happened what happened
     * @param mend what to do
     * @param faults faults of what was given, if any
     */
    public record Told(String happened, String mend, List<Fault> faults) {
        /** Copies the list. */
        public Told {
            faults = List.copyOf(faults);
        }
    }

    /**
     * Answers a request that was refused.
     *
     * @param refusal why
     * @param http the request
     */
    public void refused(Refusal refusal, Context http) {
        if (refusal.code().equals("passcode") && !http.path().startsWith(API)) {
            new Call(http).goTo(Guard.ENTRANCE);
            return;
        }
        String[] with = refusal.arguments().toArray(String[]::new);
        PageWords words = press.words();
        answer(
                http,
                refusal.status(),
                new TroubleView(
                        words.say("refusal." + refusal.code(), with),
                        words.say("refusal." + refusal.code() + ".mend", with),
                        List.of()));
    }

    /**
     * Answers bad input that no page has taken up.
     *
     * @param bad the faults
     * @param http the request
     */
    public void badInput(BadInput bad, Context http) {
        PageWords words = press.words();
        answer(
                http,
                422,
                new TroubleView(
                        words.say("trouble.input"), words.say("trouble.input.mend"), bad.faults()));
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
                500,
                new TroubleView(
                        words.say("trouble.own"), words.say("trouble.own.mend"), List.of()));
    }

    private void answer(Context http, int status, TroubleView view) {
        http.status(status);
        if (http.path().startsWith(API)) {
            http.json(new Told(view.happened(), view.mend(), view.faults()));
        } else {
            Call call = new Call(http);
            Frame frame = press.frame(call, press.words().say("trouble.title"));
            press.print(call, "trouble", frame, view);
        }
    }
}
