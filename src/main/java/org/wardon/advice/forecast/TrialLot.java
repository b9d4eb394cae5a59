package org.wardon.advice.forecast;

import java.util.List;
import java.util.OptionalDouble;
import org.wardon.air.Timeline;
import org.wardon.keeping.KeepingModel;
import org.wardon.plan.LotPlan;
import org.wardon.sharing.Wish;

/** One lot of a store under question, and what is known of it. */
public final class TrialLot {
    private static final double LONGEST_DAYS = 730;
    private static final double SHORTEST_DAYS = 0.1;

    private final LotSheet sheet;

    TrialLot(LotSheet sheet) {
        this.sheet = sheet;
    }

    LotSheet sheet() {
        return sheet;
    }

    /**
     * Returns its id.
     *
     * @return id, unique in the plan
     */
    public String id() {
        return sheet.id();
    }

    /**
     * Returns the lot as planned.
     *
     * @return the plan of the lot
     */
    public LotPlan plan() {
        return sheet.plan();
    }

    /**
     * Returns how it keeps.
     *
     * @return the model
     */
    public KeepingModel model() {
        return sheet.model();
    }

    /**
     * Returns when it comes, or the start of the run where it is there already.
     *
     * @return s since the start of the run
     */
    public double hereFromS() {
        return sheet.clock().hereFromS();
    }

    /**
     * Returns whether it is in the store when the run starts.
     *
     * @return true where it came before, or just then
     */
    public boolean isIn() {
        return sheet.clock().arrivesS() <= 0;
    }

    /**
     * Returns when it leaves.
     *
     * @return s since the start of the run
     */
    public double leavesS() {
        return sheet.clock().leavesS();
    }

    /**
     * Returns the end of its market leg.
     *
     * @return s since the start of the run
     */
    public double soldS() {
        return sheet.soldS();
    }

    /**
     * Returns room its produce takes, without packages and ways.
     *
     * @return m3
     */
    public double produceM3() {
        return sheet.plan().massKg() / sheet.bodies().middle().item().densityKgM3();
    }

    /**
     * Returns the lot and the days it is to keep, as sharing asks for them.
     *
     * @return the wish
     */
    public Wish wish() {
        double days = (leavesS() - hereFromS()) / Timeline.DAY_S;
        return new Wish(
                sheet.kept(),
                Math.min(LONGEST_DAYS, Math.max(SHORTEST_DAYS, days)),
                sheet.marketDays(),
                OptionalDouble.empty());
    }

    /**
     * Where it stands for a time.
     *
     * @param chamber id of the chamber
     * @param fromS since when, s since the start of the run
     * @param toS until when, s
     */
    public record Where(String chamber, double fromS, double toS) {}

    /**
     * Returns where its plan puts it, chamber after chamber.
     *
     * @return in order of time; empty where it has no chamber yet
     */
    public List<Where> where() {
        return sheet.visits().stream()
                .filter(visit -> visit.leavesS() > 0)
                .map(visit -> new Where(visit.chamber(), visit.hereFromS(), visit.leavesS()))
                .toList();
    }
}
