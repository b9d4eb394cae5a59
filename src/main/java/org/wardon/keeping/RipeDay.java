package org.wardon.keeping;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.wardon.keeping.ripening.Ripening;
import org.wardon.produce.Reason;
import org.wardon.produce.Reason.Argument;
import org.wardon.produce.rows.RipeningRow;

/**
 * Whether a lot is ripe on the day it is wanted ripe, and what steady temperature would make it so.
 *
 * @param probability share of draws in which it is ripe and not overripe, 0 to 1
 * @param overripe share of draws in which it is past eating, 0 to 1
 * @param setting the temperature; empty where it is ripe already
 */
public record RipeDay(double probability, double overripe, Optional<RipeSetting> setting) {
    private static final String ASSUMPTION = "assumption";

    /** Ethylene burns in air from here on, ppm; source: safety limits, id NIOSH-PG. */
    private static final double BURNS_PPM = 27_000;

    /**
     * Judges a lot.
     *
     * @param fates its fates in the draws
     * @param atS the day it is wanted ripe, s
     * @param fromS now, s
     * @param setting the temperature that would make it ripe then
     * @return the judgement
     */
    public static RipeDay of(List<Fate> fates, double atS, double fromS, RipeSetting setting) {
        long overripe = fates.stream().filter(fate -> fate.overripeAt(atS)).count();
        boolean ripeNow =
                fates.stream().allMatch(fate -> fate.ripeDaysFrom(fromS).orElseThrow() == 0);
        return new RipeDay(
                Outlook.shareRipe(fates, atS),
                (double) overripe / fates.size(),
                ripeNow ? Optional.empty() : Optional.of(setting));
    }

    /**
     * Returns whether it is more likely ripe then than not.
     *
     * @return true from one half on
     */
    public boolean likely() {
        return probability >= 0.5;
    }

    /**
     * Returns how likely it is ripe after so many days.
     *
     * @param model the lot
     * @param days the days
     * @return the sentence's code and figures
     */
    public Reason inDays(KeepingModel model, double days) {
        return Reason.about(
                "ripe-in-days",
                model.lot().id(),
                model.ripening().orElseThrow().sourceId(),
                Argument.of(days, "day"),
                pct(probability),
                pct(unripe()),
                pct(overripe));
    }

    /**
     * Returns how likely it is ripe on a day.
     *
     * @param model the lot
     * @param day the day
     * @return the sentence's code and figures
     */
    public Reason onDay(KeepingModel model, LocalDate day) {
        return Reason.about(
                "ripe-on-day",
                model.lot().id(),
                model.ripening().orElseThrow().sourceId(),
                Argument.text(day.toString()),
                pct(probability),
                pct(unripe()),
                pct(overripe));
    }

    private double unripe() {
        return Math.max(0, 1 - probability - overripe);
    }

    private static Argument pct(double share) {
        return Argument.of(100 * share, "pct");
    }

    /**
     * Returns what setting would make it ripe, and what to mind.
     *
     * @param model the lot
     * @return reasons, empty where it is ripe already
     */
    public List<Reason> advice(KeepingModel model) {
        List<Reason> told = new ArrayList<>();
        String id = model.lot().id();
        Ripening ripening = model.ripening().orElseThrow();
        if (setting.isEmpty()) {
            return told;
        }
        Argument at = Argument.of(setting.get().atC(), "C");
        if (setting.get().found()) {
            told.add(Reason.about("ripe-setting", id, ripening.sourceId(), at));
            ripening.advised()
                    .filter(row -> outside(row, setting.get().atC()))
                    .ifPresent(row -> told.add(poor(id, row)));
        } else if (setting.get().sooner()) {
            told.add(Reason.about("ripe-sooner-anyway", id, ripening.sourceId(), at));
        } else {
            told.add(Reason.about("ripe-not-by-then", id, ripening.sourceId(), at));
            told.add(treatment(id));
        }
        return told;
    }

    private static boolean outside(RipeningRow row, double atC) {
        return atC < row.lowC() || atC > row.highC().orElse(row.lowC());
    }

    private static Reason poor(String id, RipeningRow row) {
        return Reason.about(
                "ripe-setting-poor",
                id,
                row.sourceId(),
                Argument.of(row.lowC(), "C"),
                Argument.of(row.highC().orElse(row.lowC()), "C"));
    }

    /**
     * Returns what whoever uses ripening gas must know.
     *
     * @param id the lot
     * @return the caution
     */
    public static Reason treatment(String id) {
        return Reason.about("ripening-gas", id, "NIOSH-PG", Argument.of(BURNS_PPM, "ppm"));
    }

    /**
     * Returns why nothing can be said of a lot.
     *
     * @param model the lot, whose ripening is empty
     * @return what is missing: the ripeness, or print
     */
    public static Reason untold(KeepingModel model) {
        String id = model.lot().id();
        return model.lot().commodity().keeping().ripening().isEmpty()
                ? Reason.about("ripe-not-printed", id, ASSUMPTION)
                : Reason.about("ripe-tell-ripeness", id, ASSUMPTION);
    }
}
