package org.wardon.web.pages;

import io.javalin.http.Context;
import java.util.Optional;
import java.util.regex.Pattern;
import org.wardon.logbook.KeptPlan;
import org.wardon.web.guard.Guard;
import org.wardon.web.guard.Refusal;
import org.wardon.web.guard.Session;

/** One request that has passed the guard, as handlers see it. */
public final class Call {
    private static final Pattern NUMBER = Pattern.compile("[1-9][0-9]{0,8}");

    private final Context http;
    private final Preferences preferences;

    /**
     * Takes a request.
     *
     * @param http the request
     */
    public Call(Context http) {
        this.http = http;
        this.preferences =
                Preferences.of(Optional.ofNullable(http.cookie(Preferences.COOKIE)).orElse(""));
    }

    /**
     * Returns the request itself.
     *
     * @return the request
     */
    public Context http() {
        return http;
    }

    /**
     * Returns what was asked, as it was sent.
     *
     * @return path and question, without the fragment, which browsers keep to themselves
     */
    public String address() {
        String question = Optional.ofNullable(http.queryString()).orElse("");
        return question.isEmpty() ? http.path() : http.path() + "?" + question;
    }

    /**
     * Returns the person's preferences.
     *
     * @return preferences
     */
    public Preferences preferences() {
        return preferences;
    }

    /**
     * Returns the figures as the person prefers them.
     *
     * @return figures
     */
    public Figures figures() {
        return new Figures(preferences);
    }

    /**
     * Returns the session.
     *
     * @return the session, absent where the guard refused before there was one
     */
    public Optional<Session> session() {
        return Guard.sessionOf(http);
    }

    /**
     * Returns the number in a path.
     *
     * @param name name of the part, such as {@code plan}
     * @return the number
     * @throws Refusal where it is none
     */
    public long number(String name) {
        String given = http.pathParam(name);
        if (!NUMBER.matcher(given).matches()) {
            throw new Refusal(404, "nothing-here");
        }
        return Long.parseLong(given);
    }

    /**
     * Returns a field of a form.
     *
     * @param name its name
     * @return what was typed, stripped; blank where nothing was
     */
    public String field(String name) {
        return Optional.ofNullable(http.formParam(name)).orElse("").strip();
    }

    /**
     * Returns the version a form was filled in from.
     *
     * @return its number
     * @throws Refusal where it is none
     */
    public int version() {
        String given = field("version");
        if (!NUMBER.matcher(given).matches()) {
            throw new Refusal(400, "no-version");
        }
        return Integer.parseInt(given);
    }

    /**
     * Sends the browser to another page, by a GET.
     *
     * @param path a path of ours
     */
    public void goTo(String path) {
        http.status(303).header("Location", path);
    }

    /**
     * Sends the browser to all chambers of a plan.
     *
     * @param plan the plan
     */
    public void goTo(KeptPlan plan) {
        goTo(Room.CHAMBERS.path(plan.id()));
    }
}
