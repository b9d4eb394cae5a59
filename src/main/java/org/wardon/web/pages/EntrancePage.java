package org.wardon.web.pages;

import org.wardon.web.guard.Guard;

/** Where the passcode is asked for. */
public final class EntrancePage {
    private final Guard guard;
    private final Press press;

    /**
     * Makes the page.
     *
     * @param guard what knows the passcode
     * @param press what prints it
     */
    public EntrancePage(Guard guard, Press press) {
        this.guard = guard;
        this.press = press;
    }

    /**
     * Asks for the passcode.
     *
     * @param call the request
     */
    public void show(Call call) {
        if (!guard.asksPasscode()) {
            call.goTo("/");
            return;
        }
        ask(call, "");
    }

    private void ask(Call call, String fault) {
        PageWords words = press.words();
        FieldView field =
                new FieldView(
                        "passcode",
                        words.say("entrance.passcode"),
                        "",
                        "",
                        words.say("entrance.hint"),
                        fault,
                        "password",
                        true);
        press.print(call, "entrance", press.frame(call, words.say("entrance.title")), field);
    }

    /**
     * Lets in who knows it.
     *
     * @param call the request
     */
    public void enter(Call call) {
        if (guard.enter(call.http(), call.field("passcode"))) {
            call.goTo("/");
        } else {
            call.http().status(401);
            ask(call, press.words().say("entrance.wrong"));
        }
    }

    /**
     * Ends the session.
     *
     * @param call the request
     */
    public void leave(Call call) {
        guard.leave(call.http());
        call.goTo(guard.asksPasscode() ? Guard.ENTRANCE : "/");
    }
}
