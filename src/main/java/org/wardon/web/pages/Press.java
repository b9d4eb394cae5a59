package org.wardon.web.pages;

import gg.jte.ContentType;
import gg.jte.TemplateEngine;
import gg.jte.output.StringOutput;
import java.util.Map;
import java.util.Optional;
import org.wardon.logbook.KeptPlan;
import org.wardon.web.guard.Session;

/** Prints pages: a template, a frame around it, a view in it. */
public final class Press {
    private final TemplateEngine engine =
            TemplateEngine.createPrecompiled(
                    null, ContentType.Html, null, "org.wardon.web.template");
    private final PageWords words = PageWords.english();
    private final Assets assets = new Assets();
    private final boolean asksPasscode;

    /**
     * Sets up the press.
     *
     * @param asksPasscode whether people come in by a passcode and can leave
     */
    public Press(boolean asksPasscode) {
        this.asksPasscode = asksPasscode;
    }

    /**
     * Returns the words.
     *
     * @return words of the pages
     */
    public PageWords words() {
        return words;
    }

    /**
     * Returns style, script and charts.
     *
     * @return the files
     */
    public Assets assets() {
        return assets;
    }

    /**
     * Returns the frame of a page in a room.
     *
     * @param call the request
     * @param room the room
     * @param plan the open plan
     * @return the frame, titled as the room
     */
    public Frame frame(Call call, Room room, Optional<KeptPlan> plan) {
        return frame(call, words.say(room.key()), Optional.of(room), plan);
    }

    /**
     * Returns the frame of a page beside the rooms.
     *
     * @param call the request
     * @param title its title
     * @return the frame, without a plan
     */
    public Frame frame(Call call, String title) {
        return frame(call, title, Optional.empty(), Optional.empty());
    }

    private Frame frame(Call call, String title, Optional<Room> room, Optional<KeptPlan> plan) {
        return new Frame(
                title,
                room,
                plan,
                call.session().map(Session::token).orElse(""),
                call.preferences(),
                words,
                assets,
                call.address(),
                false,
                asksPasscode);
    }

    /**
     * Prints a page as the answer.
     *
     * @param call the request
     * @param template its template in {@code src/main/jte}, without its ending
     * @param frame the frame
     * @param view the record the template shows
     */
    public void print(Call call, String template, Frame frame, Object view) {
        StringOutput out = new StringOutput(16_384);
        engine.render(template + ".jte", Map.of("frame", frame, "view", view), out);
        call.http().contentType("text/html; charset=utf-8").result(out.toString());
    }
}
