package org.wardon.lots;

import java.util.List;
import java.util.function.DoubleFunction;
import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.wardon.produce.PackageKind;
import org.wardon.produce.Reason;

/**
 * Finds the conductances of a package so that the items in it, cut into shells, take its published
 * half-cooling time: sensible heat alone, no respiration, no evaporation, chamber air of one
 * temperature.
 *
 * <p>The film in the package is that of slow air ({@link AirFilm}), or wider where the produce
 * loses water through more surface than its simple body has, as leaves do; the path from package
 * air to chamber is fitted. Where even an open package is too slow with that film, the package is
 * taken as open and the film fitted, as in forced air or a shower. Where the item alone is slower
 * than the printed time, the item's time is kept and said.
 */
public final class PackageFit {
    /** Relative conductance from which produce counts as bare: the package adds next to nothing. */
    private static final double NEXT_TO_BARE = 0.995;

    /** An open path: this many times the conductance of the item's own flesh by its radius ... */
    private static final double OPEN_BIOT = 2000;

    /** ... but no more than this, W/(kg K); a lot would follow the chamber's air within seconds. */
    private static final double OPEN_W_KG_K = 1000;

    private static final double LEAST_W_KG_K = 1e-5;

    private static final int SECANTS = 20;
    private static final double EXACT = 1e-8;

    /** As much left as a share can be told from all of it. */
    private static final double ALL_LEFT = 1 - 1e-12;

    private PackageFit() {}

    /**
     * Returns the packing of an item.
     *
     * @param item the item
     * @param inside what the package holds beside the items
     * @param halfCoolingS half-cooling time of the mass average, s
     * @return the packing; the reason {@code item-slower-than-package} where the time cannot be met
     */
    static WithReasons<Packing> of(Item item, PackageInside inside, double halfCoolingS) {
        Shells shells = Shells.of(item);
        double open = openWPerKgK(item);
        double outside = item.areaM2PerKg() * AirFilm.heatWPerM2K(item);
        double film = Math.min(open, Math.max(outside, inside.leastFilmWPerKgK()));
        double left = leftAfter(halfCoolingS, item, shells, inside.packing(film, open));
        DoubleFunction<Packing> packing = g -> inside.packing(film, g);
        if (left > 0.5) {
            // Too slow with that film; an item too slow with any keeps its own time.
            left = leftAfter(halfCoolingS, item, shells, inside.packing(open, open));
            if (left >= 0.5) {
                return itemsOwnTime(item, inside, open, halfCoolingS);
            }
            packing = g -> inside.packing(g, open);
        }
        DoubleFunction<Packing> chosen = packing;
        double fitted =
                fit(
                        g -> leftAfter(halfCoolingS, item, shells, chosen.apply(g)),
                        new Open(open, left),
                        item.specificHeatJkgK() / halfCoolingS);
        return new WithReasons<>(chosen.apply(fitted), List.of(), false);
    }

    /** The widest conductance and the share left with it. */
    private record Open(double conductance, double left) {}

    private static WithReasons<Packing> itemsOwnTime(
            Item item, PackageInside inside, double open, double halfCoolingS) {
        Packing packing = inside.packing(open, open);
        Reason slow =
                Reason.about(
                        "item-slower-than-package",
                        inside.commodityId(),
                        inside.sourceId(),
                        Reason.Argument.of(halfCoolingS(item, packing) / 3600, "h"),
                        Reason.Argument.of(halfCoolingS / 3600, "h"));
        return new WithReasons<>(packing, List.of(slow), false);
    }

    /**
     * Returns the packing with another half-cooling time, all else the same.
     *
     * @param item the item
     * @param packing its packing
     * @param factor on the half-cooling time, above 0; a time quicker than the bare item's is not
     *     reached
     * @return the packing
     */
    public static Packing slowed(Item item, Packing packing, double factor) {
        double halfS = halfCoolingS(item, packing) * factor;
        return of(item, PackageInside.like(packing), halfS).value();
    }

    /**
     * Returns the half-cooling time of the mass average in chamber air of one temperature, without
     * respiration and evaporation.
     *
     * @param item the item
     * @param packing its packing
     * @return s
     */
    public static double halfCoolingS(Item item, Packing packing) {
        return new PackageCooling(item, Shells.of(item), packing).meanFallsToS(0.5);
    }

    /**
     * Returns the conductance for vapour of a package from the loss in it over the loss bare: bare
     * and package in series let through that share.
     *
     * @param bareKgPerKgSPa tissue to air without package, kg/(kg s Pa)
     * @param relative loss in the package over loss bare, above 0; from 0.995 on taken as 0.995
     * @return package air to chamber, kg/(kg s Pa)
     */
    public static double vapourKgPerKgSPa(double bareKgPerKgSPa, double relative) {
        double r = Math.min(NEXT_TO_BARE, relative);
        return bareKgPerKgSPa * r / (1 - r);
    }

    /** Chooses what the commodity's package holds and how its time is drawn. */
    static WithReasons<Packing> of(
            Item item, PackageInside inside, PackageKind kind, double share) {
        double hours = kind.halfCoolingHours().atLogShare(share);
        Reason time =
                Reason.about(
                        kind.broad() ? "package-time-broad" : "package-time",
                        kind.id(),
                        kind.halfCoolingHours().sourceId(),
                        Reason.Argument.of(hours, "h"));
        return new WithReasons<>(inside, List.of(time), false).and(of(item, inside, 3600 * hours));
    }

    private static double openWPerKgK(Item item) {
        double flesh = item.conductivityWmK() / item.radiusM() * item.areaM2PerKg();
        return Math.min(OPEN_W_KG_K, OPEN_BIOT * flesh);
    }

    /** Share of the starting difference left in the mean of the items. */
    private static double leftAfter(double timeS, Item item, Shells shells, Packing packing) {
        return new PackageCooling(item, shells, packing).mean(timeS);
    }

    /**
     * The conductance at which half is left; the better it conducts, the less is left. In a body of
     * one temperature the time is straight in the resistance, so that a secant in those two is
     * nearly there at its first step.
     */
    private static double fit(DoubleUnaryOperator left, Open widest, double slopeGuess) {
        double open = widest.conductance;
        double resistance = 1 / open;
        double miss = miss(widest.left);
        double next = within(resistance - miss / slopeGuess, open);
        for (int i = 0; i < SECANTS; i++) {
            double nextMiss = miss(left.applyAsDouble(1 / next));
            double slope = (nextMiss - miss) / (next - resistance);
            resistance = next;
            miss = nextMiss;
            next = within(resistance - miss / slope, open);
            if (Math.abs(next - resistance) <= EXACT * resistance) {
                return 1 / next;
            }
        }
        return searched(left, open);
    }

    private static double within(double resistance, double open) {
        return Math.min(1 / LEAST_W_KG_K, Math.max(1 / open, resistance));
    }

    /** Time constant over time, less what it is where half is left. */
    private static double miss(double left) {
        return -1 / Math.log(Math.min(left, ALL_LEFT)) - 1 / Math.log(2);
    }

    private static double searched(DoubleUnaryOperator left, double open) {
        double logarithm =
                new BrentSolver(1e-9, 1e-6)
                        .solve(
                                100,
                                lnG -> left.applyAsDouble(Math.exp(lnG)) - 0.5,
                                Math.log(LEAST_W_KG_K),
                                Math.log(open));
        return Math.exp(logarithm);
    }
}
