package org.wardon.advice.forecast;

import java.util.Comparator;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.function.ToDoubleFunction;
import java.util.stream.IntStream;
import org.wardon.air.MoistAir;
import org.wardon.air.SaturatedAir;
import org.wardon.air.StandardAtmosphere;
import org.wardon.air.Timeline;
import org.wardon.cooling.Cooler;
import org.wardon.cooling.WaterFilm;
import org.wardon.enclosure.Box;
import org.wardon.enclosure.Leakage;
import org.wardon.enclosure.PeopleHeat;
import org.wardon.enclosure.section.Chest;
import org.wardon.enclosure.section.Cut;
import org.wardon.enclosure.section.Side;
import org.wardon.enclosure.section.Stack;
import org.wardon.enclosure.section.StillAir;
import org.wardon.enclosure.section.StillAirSection;
import org.wardon.heat.ChamberRun;
import org.wardon.heat.HeatLedger;
import org.wardon.heat.HeatModel;
import org.wardon.heat.HourAccount;
import org.wardon.heat.LotAmounts;
import org.wardon.heat.network.FaceReading;
import org.wardon.lots.Lot;
import org.wardon.lots.StackCooling;
import org.wardon.plan.ChamberPlan;
import org.wardon.produce.Caution;

/**
 * A chamber whose air no fan stirs, in the mean of some hours of its run: its faces, its lots as
 * one block, and the section through it.
 */
final class StillChamber {
    private final StoreModel model;
    private final ChamberPlan chamber;
    private final ChamberRun run;

    /** The run must be that of the chamber, lots carried in known. */
    StillChamber(StoreModel model, ChamberPlan chamber, ChamberRun run) {
        this.model = model;
        this.chamber = chamber;
        this.run = run;
    }

    /** By how many kelvin a lot came, and where it is. */
    record Came(String lot, double byK, double nowC) {}

    /**
     * What was seen.
     *
     * @param hours the hours it is the mean of, in order
     * @param lots lots that stand there at their end
     * @param section the section of their mean
     */
    record Seen(List<HourAccount> hours, List<HourAccount.OfLot> lots, StillAirSection section) {
        Seen {
            hours = List.copyOf(hours);
            lots = List.copyOf(lots);
        }

        HourAccount last() {
            return hours.get(hours.size() - 1);
        }

        double mean(ToDoubleFunction<HourAccount> value) {
            return StillChamber.mean(hours, value);
        }

        /** Mean of the lots by mass at the end, °C; NaN without any. */
        double lotsMeanC() {
            return meanC(lots);
        }

        /** The lot that came furthest since the first of the hours, or since it stood there. */
        Optional<Came> cameFurthest() {
            return lots.stream()
                    .map(this::came)
                    .max(Comparator.comparingDouble(came -> Math.abs(came.byK())));
        }

        private Came came(HourAccount.OfLot lot) {
            HourAccount.OfLot before =
                    hours.stream()
                            .flatMap(hour -> in(hour, lot.id()).stream())
                            .findFirst()
                            .orElse(lot);
            double nowC = meanC(List.of(lot));
            return new Came(lot.id(), nowC - meanC(List.of(before)), nowC);
        }

        private static double meanC(List<HourAccount.OfLot> lots) {
            double sum = 0;
            double mass = 0;
            for (HourAccount.OfLot lot : lots) {
                double mean =
                        lot.inside().shellsC().stream().mapToDouble(c -> c).average().orElseThrow();
                sum += lot.massKg() * mean;
                mass += lot.massKg();
            }
            return sum / mass;
        }
    }

    private static Optional<HourAccount.OfLot> in(HourAccount hour, String lot) {
        return hour.lots().stream()
                .filter(HourAccount.OfLot::there)
                .filter(one -> one.id().equals(lot))
                .findFirst();
    }

    private static double mean(List<HourAccount> hours, ToDoubleFunction<HourAccount> value) {
        return hours.stream().mapToDouble(value).average().orElseThrow();
    }

    /** What stirs the air of a chamber, as a plan names it; empty where it is still. */
    static Optional<String> stirredBy(ChamberPlan chamber) {
        if (chamber.enclosure().gains().fansW() > 0) {
            return Optional.of("fansW");
        }
        if (chamber.ethyleneScrub().isPresent()) {
            return Optional.of("ethyleneScrub");
        }
        return chamber.coolers().stream().filter(Cooler::stirsAir).map(Cooler::kind).findFirst();
    }

    /**
     * What a forecast tells of a chamber whose still air is further apart than its band is wide.
     */
    static Optional<Caution> wide(StoreOutcome outcome, ChamberPlan chamber) {
        if (stirredBy(chamber).isPresent()) {
            return Optional.empty();
        }
        StoreModel model = outcome.model();
        ChamberRun run = model.asPlanned(chamber, outcome.horizonS(), outcome.courses());
        double endS = warmestEndS(model, chamber, SectionAdvice.USUAL_HOURS);
        StillChamber still = new StillChamber(model, chamber, run);
        Seen seen = still.at(endS, SectionAdvice.USUAL_HOURS, Optional.empty());
        return new StillPlaces(model, chamber, seen).wide();
    }

    /**
     * End of the warmest span outdoors, s: of those at whose end a lot stands there, where there is
     * one, the last of those alike.
     */
    static double warmestEndS(StoreModel model, ChamberPlan chamber, int hours) {
        int last = (int) Math.floor(model.plan().durationS() / Timeline.HOUR_S);
        if (last == 0) {
            return model.plan().durationS();
        }
        int first = Math.min(hours, last);
        List<Visit> visits = model.visitsIn(chamber.id());
        return Timeline.HOUR_S
                * IntStream.rangeClosed(first, last)
                        .boxed()
                        .max(
                                Comparator.comparing((Integer hour) -> occupied(visits, hour))
                                        .thenComparing(hour -> outdoorC(model, first, hour))
                                        .thenComparing(Comparator.naturalOrder()))
                        .orElse(1);
    }

    private static double outdoorC(StoreModel model, int hours, int end) {
        return IntStream.rangeClosed(end - hours + 1, end)
                .mapToDouble(model.weather()::temperatureC)
                .average()
                .orElseThrow();
    }

    private static boolean occupied(List<Visit> visits, int hour) {
        double endS = hour * Timeline.HOUR_S;
        return visits.stream().anyMatch(visit -> visit.arrivesS() < endS && visit.leavesS() > endS);
    }

    /**
     * Looks at the mean of the hours that end at a time, fewer where the run is younger, along a
     * cut or along the one that shows most.
     */
    Seen at(double endS, int hours, Optional<Cut> asked) {
        double fromS = Math.max(0, endS - hours * Timeline.HOUR_S);
        List<HourAccount> accounts = HeatModel.accounts(run, fromS, endS);
        List<HourAccount.OfLot> lots =
                accounts.get(accounts.size() - 1).lots().stream()
                        .filter(HourAccount.OfLot::there)
                        .toList();
        Cut cut = asked.orElseGet(() -> widest(accounts));
        Chest chest =
                new Chest(
                        box(),
                        cut,
                        surfaces(accounts, cut),
                        stack(accounts, lots),
                        mean(accounts, this::airHeatW),
                        mean(accounts, hour -> hour.after().temperatureC()),
                        pressurePa());
        return new Seen(accounts, lots, StillAir.of(chest));
    }

    private Box box() {
        return chamber.enclosure().box();
    }

    private static Map<Side, Double> surfaces(List<HourAccount> hours, Cut cut) {
        Map<Side, Double> surfaces = new EnumMap<>(Side.class);
        for (Side side : Side.values()) {
            surfaces.put(
                    side,
                    mean(
                            hours,
                            hour ->
                                    Objects.requireNonNull(hour.faces().get(cut.face(side)))
                                            .innerC()));
        }
        return surfaces;
    }

    /** The cut whose four faces are furthest apart; of cuts alike, to a tenth, the shorter. */
    private Cut widest(List<HourAccount> hours) {
        return List.of(Cut.values()).stream()
                .max(
                        Comparator.comparingLong((Cut cut) -> tenthsApart(hours, cut))
                                .thenComparing(cut -> -cut.widthM(box())))
                .orElseThrow();
    }

    private static long tenthsApart(List<HourAccount> hours, Cut cut) {
        Map<Side, Double> surfaces = surfaces(hours, cut);
        double most = surfaces.values().stream().mapToDouble(c -> c).max().orElse(0);
        double least = surfaces.values().stream().mapToDouble(c -> c).min().orElse(0);
        return Math.round(10 * (most - least));
    }

    /** All lots as one block with the middle of the conductivity of bulk (assumption). */
    private Optional<Stack> stack(List<HourAccount> hours, List<HourAccount.OfLot> lots) {
        if (lots.isEmpty()) {
            return Optional.empty();
        }
        double volume = 0;
        double heat = 0;
        for (HourAccount.OfLot lot : lots) {
            Lot body = body(lot.id());
            double bulkM3Kg = 1 / body.item().densityKgM3() + body.packing().airM3PerKg();
            volume += lot.massKg() * bulkM3Kg;
            heat += warmthW(hours, lot.id());
        }
        StackCooling bulk = StackCooling.of(1);
        return Optional.of(new Stack(volume, bulk.diffusivityM2S() * bulk.capacityJm3K(), heat));
    }

    /** Breath of a lot less the warmth that its evaporating water takes, while it was there, W. */
    private static double warmthW(List<HourAccount> hours, String lot) {
        double joule = 0;
        double seconds = 0;
        for (HourAccount hour : hours) {
            Optional<HourAccount.OfLot> there = in(hour, lot);
            if (there.isPresent()) {
                double skinC = there.get().inside().skinC();
                double latent = MoistAir.vapourEnthalpyJkg(skinC) - MoistAir.WATER_J_KG_K * skinC;
                LotAmounts gave = there.get().gave();
                joule += gave.respirationJ() - latent * gave.evaporatedKg();
                seconds += hour.untilS() - hour.fromS();
            }
        }
        return joule / seconds;
    }

    private Lot body(String id) {
        return run.stays().stream()
                .map(stay -> stay.lot())
                .filter(lot -> lot.id().equals(id))
                .findFirst()
                .orElseThrow();
    }

    /**
     * Warmth into the air from neither faces nor lots, W: lamps, people, heater, bridges, leakage
     * and fresh air, less what ice took. Where the ice hangs nobody said: it takes evenly.
     */
    private double airHeatW(HourAccount account) {
        double span = account.untilS() - account.fromS();
        HeatLedger heat = account.heat();
        double inside =
                heat.lights() + heat.heater() + (1 - PeopleHeat.LATENT_SHARE) * heat.people();
        double bridges = account.faces().values().stream().mapToDouble(FaceReading::bridgeJ).sum();
        return (inside + bridges - iceJ(account)) / span + drawnInW(account);
    }

    private double drawnInW(HourAccount account) {
        double airC = account.after().temperatureC();
        double gas = MoistAir.DRY_AIR_GAS_J_KG_K * (airC + SaturatedAir.ZERO_C_IN_K);
        double kgS = Leakage.flowM3s(chamber.enclosure()) * pressurePa() / gas;
        return kgS * MoistAir.DRY_AIR_J_KG_K * (account.outdoorC() - airC);
    }

    private double pressurePa() {
        return StandardAtmosphere.pressurePa(model.plan().site().elevationM());
    }

    /** What coolers took from the air itself: all of it less what water took from faces. */
    private double iceJ(HourAccount account) {
        if (chamber.coolers().stream().allMatch(cooler -> cooler.ice().isEmpty())) {
            return 0;
        }
        double water = 0;
        for (Cooler cooler : chamber.coolers()) {
            if (cooler instanceof WaterFilm film) {
                water +=
                        film.wets().stream()
                                .map(account.faces()::get)
                                .mapToDouble(f -> f.fromBeyondJ() + f.bridgeJ() - f.toAirJ())
                                .sum();
            }
        }
        return account.heat().removed() - water;
    }
}
