package org.wardon.advice.placing;

import org.wardon.advice.wording.Words;
import org.wardon.files.forecast.PlaceAnswer;
import org.wardon.plan.StorePlan;

/** A placing, the plan it makes of the one asked about, and both arrangements as they come out. */
public final class PlaceReport {
    private final StorePlan asked;
    private final StorePlan proposed;
    private final Arrangement present;
    private final Arrangement then;
    private final Told told;
    private final Words words;

    PlaceReport(Plans plans, Arrangement present, Arrangement then, Told told, Words words) {
        asked = plans.asked;
        proposed = plans.proposed;
        this.present = present;
        this.then = then;
        this.told = told;
        this.words = words;
    }

    /** The plan before and after. */
    record Plans(StorePlan asked, StorePlan proposed) {}

    /**
     * Returns the plan asked about.
     *
     * @return the plan
     */
    public StorePlan asked() {
        return asked;
    }

    /**
     * Returns the same plan with chambers set and lots placed as proposed.
     *
     * @return the plan
     */
    public StorePlan proposed() {
        return proposed;
    }

    /**
     * Returns the plan's own arrangement, lots without a chamber left out.
     *
     * @return the arrangement
     */
    public Arrangement present() {
        return present;
    }

    /**
     * Returns the arrangement proposed.
     *
     * @return the arrangement
     */
    public Arrangement then() {
        return then;
    }

    /**
     * Returns what is told of the placing.
     *
     * @return in the words it was asked in
     */
    public PlaceAnswer answer() {
        return told.in(words);
    }

    /**
     * Returns what is told of the placing in other words; nothing is sought again.
     *
     * @param other words, in other units perhaps
     * @return the answer
     */
    public PlaceAnswer in(Words other) {
        return told.in(other);
    }
}
