package org.wardon.advice.placing;

import org.wardon.errors.Progress;

/**
 * The stages of a placing. Runs and searches within a stage tell how far they are themselves, which
 * is nothing to whoever waits; that they still go on is passed on, so that the work can be stopped
 * in the middle of a stage.
 */
final class Stages implements Progress {
    private final Progress outside;
    private volatile At now = new At("chambers", 0);

    private record At(String stage, double fraction) {}

    Stages(Progress outside) {
        this.outside = outside;
    }

    /** Begins a stage, or goes on in it. */
    void begin(String stage, double fraction) {
        now = new At(stage, fraction);
        outside.at(stage, fraction);
    }

    @Override
    public void at(String within, double fraction) {
        outside.at(now.stage, now.fraction);
    }
}
