package org.wardon.advice.forecast;

import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.stream.Collectors;
import org.wardon.air.Timeline;
import org.wardon.keeping.Fate;
import org.wardon.keeping.Mechanism;
import org.wardon.keeping.Outlook;
import org.wardon.keeping.Spread;
import org.wardon.lots.LotHistory;
import org.wardon.plan.LotPlan;
import org.wardon.produce.Fact;

/** What one more lot comes to in each chamber of a store, and without one. */
public final class OneMoreLot {
    private final Map<String, ChamberTrial> chambers;
    private final LotSheet sheet;
    private final List<Fate> outside;
    private final LotHistory shade;

    OneMoreLot(
            Map<String, ChamberTrial> chambers,
            LotSheet sheet,
            List<Fate> outside,
            LotHistory shade) {
        this.shade = shade;
        this.chambers = chambers;
        this.sheet = sheet;
        this.outside = List.copyOf(outside);
    }

    /**
     * Returns the lot.
     *
     * @return as it was asked about
     */
    public LotPlan lot() {
        return sheet.plan();
    }

    /**
     * Returns a chamber with the lot in it.
     *
     * @param chamberId its id
     * @return what was worked out
     */
    public ChamberTrial in(String chamberId) {
        return ById.get(chambers, chamberId);
    }

    /**
     * Returns whether the lot still has to be cured, or may have to.
     *
     * @return true where a cure is printed and nobody said it was done
     */
    public boolean uncured() {
        return sheet.model().uncured();
    }

    /**
     * Returns the temperature it would be cured at.
     *
     * @return lowest printed, °C; empty where none is printed
     */
    public OptionalDouble curedAtC() {
        return sheet.commodity().keeping().curing().stream()
                .flatMap(row -> row.temperatureC().stream())
                .mapToDouble(Fact::lowest)
                .min();
    }

    /**
     * Returns the days left without a chamber.
     *
     * @return over the draws, days from its arrival
     */
    public Spread daysLeftOutside() {
        double fromS = sheet.clock().hereFromS();
        return Spread.of(outside.stream().mapToDouble(fate -> fate.daysLeft(fromS)).toArray());
    }

    /**
     * Returns the mechanism that ends most draws without a chamber.
     *
     * @return its word
     */
    public String limitedOutside() {
        return outside.stream()
                .collect(Collectors.groupingBy(Fate::limitedBy, Collectors.counting()))
                .entrySet()
                .stream()
                .max(
                        Map.Entry.<Mechanism, Long>comparingByValue()
                                .thenComparing(Map.Entry.comparingByKey()))
                .orElseThrow()
                .getKey()
                .word();
    }

    /**
     * Returns the share of its mass the lot has without a chamber some days on.
     *
     * @param days from its arrival
     * @return 0 to 1, in the middle draw
     */
    public double massShareOutside(double days) {
        double atS = sheet.clock().hereFromS() + days * Timeline.DAY_S;
        double mass = shade.massKg(0);
        for (int i = 0; i < shade.size() && shade.timeS(i) <= atS; i++) {
            mass = shade.massKg(i);
        }
        return mass / shade.massKg(0);
    }

    /**
     * Returns the share of draws in which injury by cold shows without a chamber some days on.
     *
     * @param days from its arrival
     * @return 0 to 1
     */
    public double shareChilledOutside(double days) {
        double atS = sheet.clock().hereFromS() + days * Timeline.DAY_S;
        double chilled =
                outside.stream().filter(fate -> fate.endS(Mechanism.CHILLING) <= atS).count();
        return chilled / outside.size();
    }

    /**
     * Returns the share of draws in which the lot is sound without a chamber some days on.
     *
     * @param days from its arrival
     * @return 0 to 1
     */
    public double shareSoundOutside(double days) {
        return Outlook.shareSound(outside, sheet.clock().hereFromS() + days * Timeline.DAY_S);
    }
}
