package org.wardon.cooling.solar;

/**
 * A battery between panels and a chamber: what the panels give beyond the chamber's draw goes in
 * while there is room, what they lack comes out. Half of its losses, as a factor, fall on the way
 * in and half on the way out. All sums are kept, so that {@code panel + start = used + lost +
 * spilled + stored} can be checked.
 */
public final class Battery {
    private static final double JOULE_PER_KWH = 3.6e6;

    private final double capacityJ;
    private final double oneWay;
    private double storedJ;
    private double lowestJ;
    private double panelJ;
    private double usedJ;
    private double spilledJ;
    private double lostJ;

    /**
     * Stands at its start.
     *
     * @param cells the battery
     */
    public Battery(SolarSupply.Cells cells) {
        capacityJ = cells.kWh() * JOULE_PER_KWH;
        oneWay = Math.sqrt(cells.efficiency());
        storedJ = capacityJ * cells.startChargePct() / 100;
        lowestJ = storedJ;
    }

    /**
     * Passes a span in which the panels' power runs straight and the draw is even.
     *
     * @param seconds how long, s
     * @param fromW panels at its start, W
     * @param toW panels at its end, W
     * @param drawnW draw of the chamber, W
     */
    public void pass(double seconds, double fromW, double toW, double drawnW) {
        panelJ += 0.5 * (fromW + toW) * seconds;
        usedJ += drawnW * seconds;
        double first = fromW - drawnW;
        double last = toW - drawnW;
        if (first * last >= 0) {
            exchange(0.5 * (first + last) * seconds);
        } else {
            double turns = seconds * first / (first - last);
            exchange(0.5 * first * turns);
            exchange(0.5 * last * (seconds - turns));
        }
    }

    private void exchange(double surplusJ) {
        if (surplusJ >= 0) {
            double taken = Math.min(surplusJ, (capacityJ - storedJ) / oneWay);
            storedJ += oneWay * taken;
            lostJ += (1 - oneWay) * taken;
            spilledJ += surplusJ - taken;
        } else {
            storedJ += surplusJ / oneWay;
            lostJ -= surplusJ / oneWay * (1 - oneWay);
            lowestJ = Math.min(lowestJ, storedJ);
        }
    }

    /**
     * Returns the least that would be stored within a span, without passing it.
     *
     * @param seconds how long, s
     * @param fromW panels at its start, W
     * @param toW panels at its end, W
     * @param drawnW draw of the chamber, W
     * @return J, below 0 where there is not enough
     */
    public double leastJ(double seconds, double fromW, double toW, double drawnW) {
        double first = fromW - drawnW;
        double last = toW - drawnW;
        if (first >= 0 && last >= 0) {
            return storedJ;
        }
        if (first < 0 && last > 0) {
            double turns = seconds * first / (first - last);
            return storedJ + 0.5 * first * turns / oneWay;
        }
        if (first > 0) {
            double turns = seconds * first / (first - last);
            double full = Math.min(capacityJ, storedJ + oneWay * 0.5 * first * turns);
            return Math.min(storedJ, full + 0.5 * last * (seconds - turns) / oneWay);
        }
        return storedJ + 0.5 * (first + last) * seconds / oneWay;
    }

    /**
     * Returns how long the panels alone, nothing drawn, take to bring the charge to a share.
     *
     * @param share of the capacity, 0 to 1
     * @param fromW panels now, W
     * @param slopeWs their change, W/s
     * @param withinS looked for within this span, s
     * @return s; infinite where not within the span
     */
    public double secondsTo(double share, double fromW, double slopeWs, double withinS) {
        double lacksJ = (share * capacityJ - storedJ) / oneWay;
        double whole = fromW * withinS + 0.5 * slopeWs * withinS * withinS;
        if (lacksJ <= 0 || whole < lacksJ) {
            return lacksJ <= 0 ? 0 : Double.POSITIVE_INFINITY;
        }
        // The stable form of the root; the discriminant is not below 0, as the span reaches it.
        double root = Math.sqrt(Math.max(0, fromW * fromW + 2 * slopeWs * lacksJ));
        return 2 * lacksJ / (fromW + root);
    }

    /**
     * Returns what is stored.
     *
     * @return J; a hundredth of a watt-hour below 0 where it has just run out
     */
    public double storedJ() {
        return storedJ;
    }

    /**
     * Returns how full it is.
     *
     * @return 0 to 1
     */
    public double share() {
        return Math.max(0, storedJ / capacityJ);
    }

    /**
     * Returns how empty it has been.
     *
     * @return lowest share of the capacity, 0 to 1
     */
    public double lowestShare() {
        return Math.max(0, lowestJ / capacityJ);
    }

    /**
     * Returns what the panels could give so far.
     *
     * @return J
     */
    public double panelJ() {
        return panelJ;
    }

    /**
     * Returns what the chamber drew so far.
     *
     * @return J
     */
    public double usedJ() {
        return usedJ;
    }

    /**
     * Returns what the panels could give and nobody took.
     *
     * @return J
     */
    public double spilledJ() {
        return spilledJ;
    }

    /**
     * Returns what the battery lost on the way in and out.
     *
     * @return J
     */
    public double lostJ() {
        return lostJ;
    }
}
