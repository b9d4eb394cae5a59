package org.wardon.web.pages;

import org.wardon.web.guard.Guard;

/** How a person likes to read. */
public final class PreferencesPage {
    private static final int YEAR_S = 365 * 86_400;

    private final Press press;

    /**
     * Makes the page.
     *
     * @param press what prints it
     */
    public PreferencesPage(Press press) {
        this.press = press;
    }

    /**
     * Shows the choices.
     *
     * @param call the request
     */
    public void show(Call call) {
        Frame frame = press.frame(call, press.words().say("preferences.title"));
        press.print(call, "preferences", frame, call.preferences());
    }

    /**
     * Keeps the choices.
     *
     * @param call the request
     */
    public void keep(Call call) {
        Preferences chosen =
                new Preferences(
                        call.field("temperature").equals("f"),
                        call.field("mass").equals("lb"),
                        call.field("decimal").equals("comma"),
                        Preferences.Light.of(call.field("light")));
        Guard.setCookie(call.http(), Preferences.COOKIE, chosen.cookie(), YEAR_S);
        call.goTo("/");
    }
}
