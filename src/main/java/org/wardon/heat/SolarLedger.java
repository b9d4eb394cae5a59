package org.wardon.heat;

/**
 * What panels and battery of a chamber did in a run, J.
 *
 * @param panelJ what the panels could give
 * @param usedJ what the chamber drew
 * @param spilledJ what found the battery full
 * @param lostJ what the battery lost
 * @param startJ charge at the start
 * @param endJ charge at the end
 * @param lowestShare lowest charge, share of what the battery holds
 * @param withoutS time without power because the battery was empty, s
 */
public record SolarLedger(
        double panelJ,
        double usedJ,
        double spilledJ,
        double lostJ,
        double startJ,
        double endJ,
        double lowestShare,
        double withoutS) {
    /**
     * Returns the error of the balance: panel and start against used, lost, spilled and end.
     *
     * @return share of what the panels gave and the start held; 0 where there was nothing
     */
    public double errorShare() {
        double in = panelJ + startJ;
        return in > 0 ? Math.abs(in - usedJ - lostJ - spilledJ - endJ) / in : 0;
    }
}
