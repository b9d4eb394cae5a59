package org.wardon.sharing.placing;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.SplittableRandom;
import java.util.stream.IntStream;
import org.wardon.keeping.Crops;
import org.wardon.keeping.Draw;
import org.wardon.keeping.Draws;
import org.wardon.lots.ClassValues;
import org.wardon.lots.RespirationLaw;
import org.wardon.lots.Respirations;
import org.wardon.produce.Commodity;
import org.wardon.sharing.PairConflict;
import org.wardon.sharing.Verdict;
import org.wardon.sharing.Wish;
import org.wardon.sharing.Workable;

/**
 * Seeded stores to be filled, of real commodities: what lots are worth at a setting, the heat they
 * give and whom they harm come from the printed tables by the same code that judges sharing; mass,
 * price, arrival and stay are drawn, and chambers sized so that mass or cooling run short.
 */
final class Instances {
    static final int DAYS = 14;
    private static final double[] TEMPERATURES_C = {0.5, 2, 4, 6, 8, 10, 12, 13.5, 15, 18};
    private static final double[] HUMIDITIES_PCT = {65, 90};
    private static final List<Draw> DRAWS = Draws.seeded(1, 32);
    private static final double ARRIVES_C = 28;
    private static final double HEAT_CAPACITY = 3_700;
    private static final double[] ALIKE_KG = {400, 1_000, 2_500};
    private static final double TOO_LARGE = 10_000;
    private static final double MOST_KG = 100_000;
    private static final ClassValues CLASSES = ClassValues.of(Crops.list());

    private final Map<String, Workable> workable = new HashMap<>();
    private final Map<String, PairConflict> conflicts = new HashMap<>();

    /** One drawn lot. */
    private record Drawn(LotToPlace lot, Workable workable, Commodity commodity, double price) {}

    /** A store of lots whose mass at its peak is the given share above or below what there is. */
    PlacingProblem draw(int lots, int chambers, double capacityShare, long seed) {
        return draw(lots, chambers, Mix.ofAllCrops(capacityShare), seed);
    }

    /** A store of lots as a mix says. */
    PlacingProblem draw(int lots, int chambers, Mix mix, long seed) {
        SplittableRandom random = new SplittableRandom(seed);
        double capacityShare = mix.capacityShare();
        List<Drawn> drawn = new ArrayList<>();
        List<Commodity> crops = mix.some(Crops.list(), random);
        while (drawn.size() < lots) {
            Commodity crop = crops.get(random.nextInt(crops.size()));
            drawn.add(lot(drawn.size(), crop, mix, random));
        }
        List<Drawn> fitting = drawn.stream().filter(l -> l.lot().massKg() < MOST_KG).toList();
        List<Climate> climates = new ArrayList<>();
        List<Double> temperatures = new ArrayList<>();
        for (double pct : HUMIDITIES_PCT) {
            for (double c : TEMPERATURES_C) {
                climates.add(climate(drawn, c, pct, mix.company()));
                temperatures.add(c);
            }
        }
        List<ChamberToFill> filled = new ArrayList<>();
        double[] size =
                mix.largest() <= 3
                        ? random.doubles(chambers, 0.5, 1.5).toArray()
                        : random.doubles(chambers, 0, 1)
                                .map(part -> Math.pow(mix.largest(), part))
                                .toArray();
        double all = Arrays.stream(size).sum();
        for (int c = 0; c < chambers; c++) {
            double mass = capacityShare * peak(fitting, l -> l.lot().massKg()) * size[c] / all;
            double volume = capacityShare * peak(fitting, l -> l.lot().volumeM3()) * size[c] / all;
            double heat = capacityShare * peakHeat(fitting, climates.get(3), drawn) * size[c] / all;
            double eer = random.nextDouble(2, 3.5);
            double wall = heat * random.nextDouble(0.2, 0.5);
            List<Offer> offers = new ArrayList<>();
            for (int o = 0; o < climates.size(); o++) {
                double weak = 0.65 + 0.025 * temperatures.get(o);
                double cost = wall / eer * (30 - temperatures.get(o)) / 25 * DAYS * 0.024 * 0.2;
                offers.add(
                        new Offer(
                                climates.get(o),
                                IntStream.range(0, DAYS)
                                        .mapToObj(d -> heat * weak * (1 + 0.1 * Math.sin(d)))
                                        .toList(),
                                cost,
                                0.024 * 0.2 / eer));
            }
            filled.add(new ChamberToFill("c" + (10 + c), mass, volume, offers, true));
        }
        return new PlacingProblem(DAYS, drawn.stream().map(Drawn::lot).toList(), filled);
    }

    private Drawn lot(int number, Commodity crop, Mix mix, SplittableRandom random) {
        double mass = Math.rint(Math.exp(random.nextDouble(Math.log(50), Math.log(5_000))));
        int first = random.nextInt(DAYS - 3);
        int stay = 3 + random.nextInt(7);
        double kgPerM3 = random.nextDouble(200, 300);
        double price = random.nextDouble(0.5, 6);
        if (mix.days() > 0) {
            first = first * mix.days() / (DAYS - 3) * 3;
        }
        if (mix.alike()) {
            mass = ALIKE_KG[number % ALIKE_KG.length];
            kgPerM3 = 250;
            int kind = Math.floorMod(crop.id().hashCode(), 60);
            stay = 4 + kind % 6;
            price = 1 + 0.1 * kind;
        }
        if (number % 100 < mix.tooLarge()) {
            mass *= TOO_LARGE;
        }
        return lot(number, crop, mass, mass / kgPerM3, first, stay, price);
    }

    private Drawn lot(
            int number,
            Commodity crop,
            double mass,
            double volume,
            int first,
            int longest,
            double price) {
        int stay = Math.min(longest, DAYS - first);
        LotToPlace lot =
                new LotToPlace(
                        "l" + (100 + number),
                        mass,
                        volume,
                        first,
                        first + stay - 1,
                        Optional.empty());
        Workable here =
                workable.computeIfAbsent(
                        crop.id() + stay,
                        key ->
                                Workable.of(
                                        new Wish(Crops.lot(crop), stay, 2, OptionalDouble.of(20)),
                                        DRAWS));
        return new Drawn(lot, here, crop, price);
    }

    private static double peak(List<Drawn> lots, java.util.function.ToDoubleFunction<Drawn> of) {
        double most = 0;
        for (int d = 0; d < DAYS; d++) {
            int day = d;
            most = Math.max(most, lots.stream().filter(l -> stands(l, day)).mapToDouble(of).sum());
        }
        return most;
    }

    private static boolean stands(Drawn lot, int day) {
        return lot.lot().firstDay() <= day && day <= lot.lot().lastDay();
    }

    private static double peakHeat(List<Drawn> lots, Climate climate, List<Drawn> all) {
        double most = 0;
        for (int d = 0; d < DAYS; d++) {
            double sum = 0;
            for (int l = 0; l < all.size(); l++) {
                sum += lots.contains(all.get(l)) ? climate.heatW(l, d) : 0;
            }
            most = Math.max(most, sum);
        }
        return most;
    }

    private Climate climate(List<Drawn> lots, double c, double pct, Mix.Harm harm) {
        int n = lots.size();
        double[] worth = new double[n];
        double[][] heat = new double[n][DAYS];
        double[][] loss = new double[n][n];
        for (int l = 0; l < n; l++) {
            Drawn one = lots.get(l);
            double sound = one.workable().soundShare(c, pct);
            boolean may = one.workable().safe(c) && sound > 0;
            worth[l] = may ? one.price() * one.lot().massKg() * sound : Climate.NEVER;
            heat(one, c, heat[l]);
            for (int o = 0; o < l; o++) {
                loss[l][o] = together(one, lots.get(o), c, harm);
                loss[o][l] = loss[l][o];
            }
        }
        return new Climate(c + " °C, " + pct + " %", worth, heat, loss);
    }

    private static void heat(Drawn one, double c, double[] heatW) {
        RespirationLaw law =
                Respirations.of(one.commodity(), org.wardon.produce.Ripeness.UNKNOWN, CLASSES, 0.5)
                        .value();
        for (int d = one.lot().firstDay(); d <= one.lot().lastDay(); d++) {
            double field = d == one.lot().firstDay() ? HEAT_CAPACITY * (ARRIVES_C - c) / 86_400 : 0;
            heatW[d] = one.lot().massKg() * (law.wattsPerKg(c) + field);
        }
    }

    private double together(Drawn a, Drawn b, double c, Mix.Harm harm) {
        if (!a.lot().meets(b.lot()) || harm == Mix.Harm.NONE) {
            return 0;
        }
        double smaller = Math.min(a.price() * a.lot().massKg(), b.price() * b.lot().massKg());
        if (harm == Mix.Harm.MANY) {
            int kind =
                    Math.floorMod(
                            31 * (a.commodity().id().hashCode() ^ b.commodity().id().hashCode()),
                            5);
            boolean one = a.commodity() == b.commodity() || kind == 4;
            return one ? 0 : kind < 2 ? Climate.APART : 0.05 * kind * smaller;
        }
        PairConflict conflict =
                conflicts.computeIfAbsent(
                        a.commodity().id()
                                + a.workable().wish().wantedDays()
                                + b.commodity().id()
                                + b.workable().wish().wantedDays()
                                + c,
                        key -> PairConflict.of(a.workable(), b.workable(), c, 7));
        if (conflict.verdict() == Verdict.NO) {
            return Climate.APART;
        }
        return conflict.verdict() == Verdict.GOOD ? 0 : 0.05 * smaller;
    }
}
