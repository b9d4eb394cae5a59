package org.wardon.web.api;

import org.wardon.files.Schema;
import org.wardon.web.api.route.Ask;
import org.wardon.web.api.route.Reply;
import org.wardon.web.api.told.Entered;
import org.wardon.web.guard.Guard;
import org.wardon.web.guard.Refusal;
import org.wardon.web.guard.Sessions;

/** Getting in, and what there is to ask. */
final class EntryApi {
    private final Guard guard;

    EntryApi(Guard guard) {
        this.guard = guard;
    }

    Reply enter(Ask ask) {
        String passcode = ask.body().at("passcode").text().orElseThrow();
        return guard.enterProgram(ask.call().http(), passcode)
                .map(bearer -> Reply.of(new Entered(bearer, Sessions.SILENT_MOST.toHours())))
                .orElseThrow(() -> new Refusal(401, "wrong-passcode"));
    }

    Reply schema(Ask ask) {
        // Here its address is its name; a client cannot look for another part of a URN.
        String text = Schema.text().replaceFirst("\\s*\"\\$id\": \"[^\"]*\",", "");
        return Reply.text("application/schema+json", text);
    }
}
