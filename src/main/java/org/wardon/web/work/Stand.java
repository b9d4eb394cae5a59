package org.wardon.web.work;

import org.wardon.advice.forecast.StoreAdvice;
import org.wardon.advice.placing.PlaceReport;

/** How far long work has come. */
public sealed interface Stand {
    /**
     * It is being worked out, or waits for others.
     *
     * @param stage what is being done, a code; {@code waiting} before it begins
     * @param fraction done of all, 0 to 1
     */
    record Running(String stage, double fraction) implements Stand {}

    /**
     * A forecast is there.
     *
     * @param advice the advice
     */
    record Ready(StoreAdvice advice) implements Stand {}

    /**
     * A placing is there.
     *
     * @param report the placing
     */
    record Placed(PlaceReport report) implements Stand {}

    /**
     * Another question is answered.
     *
     * @param answer its answer, as the command line writes it
     */
    record Answered(Record answer) implements Stand {}

    /** A store is worked out as it stands, so that the door can be answered. */
    record Door() implements Stand {}

    /**
     * It could not be worked out.
     *
     * @param message what happened, for people
     */
    record Stopped(String message) implements Stand {}

    /** Somebody asked to stop it. */
    record Cancelled() implements Stand {}
}
