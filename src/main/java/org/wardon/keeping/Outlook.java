package org.wardon.keeping;

import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.ToDoubleFunction;
import org.wardon.air.Timeline;
import org.wardon.produce.Reason;

/**
 * What is to be told of a lot: the plain run for single figures, the draws for ranges.
 *
 * @param daysLeft days left from the time asked, 0 to 730
 * @param lifeUsedPct share of life used at the end of the history, percent, may pass 100
 * @param limitedBy what ends it
 * @param chilling risk of injury by cold
 * @param mechanisms days left by each mechanism
 * @param greenLeft days until ripening can no longer be held; empty where it does not apply
 * @param edibleLeft days until overripe; empty where it does not apply
 * @param ripeFrom days until ripe; empty where no times of ripening are printed
 * @param hangsOn the range the days left hang on most; empty where none stands out
 * @param restsOn what the life rests on
 * @param reasons why, and what to know
 */
public record Outlook(
        Spread daysLeft,
        double lifeUsedPct,
        Mechanism limitedBy,
        ChillingRisk chilling,
        Map<Mechanism, Spread> mechanisms,
        Optional<Spread> greenLeft,
        Optional<Spread> edibleLeft,
        Optional<Spread> ripeFrom,
        Optional<HangsOn> hangsOn,
        RestsOn restsOn,
        List<Reason> reasons) {
    /** Copies map and list. */
    public Outlook {
        mechanisms = Map.copyOf(mechanisms);
        reasons = List.copyOf(reasons);
    }

    /**
     * Puts fates together.
     *
     * @param plain fate of the plain run
     * @param draws fates of the draws, at least one
     * @param fromS days left count from here, s
     * @param endS end of the history, s
     * @param leavesS end of stay and market leg, s, for the risk of chilling
     * @param basis what the life rests on and why
     * @return the outlook
     */
    public static Outlook of(
            Fate plain, List<Fate> draws, double fromS, double endS, double leavesS, Basis basis) {
        Map<Mechanism, Spread> each = new EnumMap<>(Mechanism.class);
        for (Mechanism mechanism : plain.mechanisms()) {
            each.put(mechanism, spread(draws, fate -> fate.daysLeft(mechanism, fromS)));
        }
        return new Outlook(
                daysLeft(draws, fromS),
                100 * plain.usedAt(endS),
                plain.limitedBy(),
                chilling(draws, fromS, leavesS),
                each,
                clock(plain.greenDaysLeft(fromS), draws, fate -> fate.greenDaysLeft(fromS)),
                clock(plain.edibleDaysLeft(fromS), draws, fate -> fate.edibleDaysLeft(fromS)),
                clock(plain.ripeDaysFrom(fromS), draws, fate -> fate.ripeDaysFrom(fromS)),
                HangsOn.of(
                        draws.stream().map(Fate::draw).toList(),
                        draws.stream().mapToDouble(fate -> fate.daysLeft(fromS)).toArray()),
                basis.restsOn(),
                basis.reasons());
    }

    private static ChillingRisk chilling(List<Fate> draws, double fromS, double leavesS) {
        double injured =
                draws.stream().filter(fate -> fate.endS(Mechanism.CHILLING) <= leavesS).count();
        return new ChillingRisk(injured / draws.size(), safeDays(draws, fromS));
    }

    /**
     * Returns the days left over the draws.
     *
     * @param draws fates of the draws, at least one
     * @param fromS days left count from here, s
     * @return days, 0 to 730
     */
    public static Spread daysLeft(List<Fate> draws, double fromS) {
        return spread(draws, fate -> fate.daysLeft(fromS));
    }

    /**
     * Returns the days until one lot in ten is injured by cold.
     *
     * @param draws fates of the draws, at least one
     * @param fromS days count from here, s
     * @return days; empty where there is no such injury
     */
    public static OptionalDouble safeDays(List<Fate> draws, double fromS) {
        double safe = spread(draws, fate -> fate.daysLeft(Mechanism.CHILLING, fromS)).p10();
        return safe < Fate.MOST_DAYS ? OptionalDouble.of(safe) : OptionalDouble.empty();
    }

    private static Optional<Spread> clock(
            OptionalDouble plain,
            List<Fate> draws,
            java.util.function.Function<Fate, OptionalDouble> read) {
        return plain.isEmpty()
                ? Optional.empty()
                : Optional.of(spread(draws, fate -> read.apply(fate).orElse(0)));
    }

    private static Spread spread(List<Fate> draws, ToDoubleFunction<Fate> read) {
        return Spread.of(draws.stream().mapToDouble(read).toArray());
    }

    /**
     * Returns the share of draws in which the lot is still sound.
     *
     * @param draws fates of the draws, of histories that run through the market leg
     * @param atS end of the market leg, s
     * @return 0 to 1
     */
    public static double shareSound(List<Fate> draws, double atS) {
        double sound = draws.stream().filter(fate -> fate.soundAt(atS)).count();
        return sound / draws.size();
    }

    /**
     * Returns the share of draws in which a fruit is ripe and not overripe.
     *
     * @param draws fates of the draws
     * @param atS time, s
     * @return 0 to 1
     */
    public static double shareRipe(List<Fate> draws, double atS) {
        double ripe = draws.stream().filter(fate -> fate.ripeAt(atS)).count();
        return ripe / draws.size();
    }

    /**
     * Returns when a lot must leave at the latest.
     *
     * @param draws fates of the draws, the lot staying where it is
     * @param arrivesS its arrival, s
     * @param marketDays days from leaving to the buyer
     * @return s: the p10 end less the market leg, never before the arrival
     */
    public static double leaveByS(List<Fate> draws, double arrivesS, double marketDays) {
        double cap = arrivesS + Fate.MOST_DAYS * Timeline.DAY_S;
        double end = spread(draws, fate -> Math.min(cap, fate.endS())).p10();
        return Math.max(arrivesS, end - marketDays * Timeline.DAY_S);
    }
}
