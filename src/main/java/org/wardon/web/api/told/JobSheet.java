package org.wardon.web.api.told;

import java.util.Optional;

/**
 * Long work on its way.
 *
 * @param job its id
 * @param state {@code running}, {@code ready}, {@code stopped} or {@code cancelled}
 * @param stage what is being done, in words; blank when it is over
 * @param percent done of all
 * @param text what happened, where it was stopped; else blank
 * @param url where to ask how far it is, or to cancel it
 * @param result where its result is, once it is ready
 */
public record JobSheet(
        String job,
        String state,
        String stage,
        int percent,
        String text,
        String url,
        Optional<String> result) {}
