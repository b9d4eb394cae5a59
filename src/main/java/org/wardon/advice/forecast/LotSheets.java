package org.wardon.advice.forecast;

import java.time.LocalDateTime;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.air.Timeline;
import org.wardon.air.Weather;
import org.wardon.keeping.Age;
import org.wardon.keeping.ColdSpell;
import org.wardon.keeping.KeepingModel;
import org.wardon.keeping.KeptLot;
import org.wardon.keeping.KnownLife;
import org.wardon.keeping.LotAtDoor;
import org.wardon.keeping.Purpose;
import org.wardon.lots.ClassValues;
import org.wardon.lots.LotRange;
import org.wardon.lots.Shares;
import org.wardon.lots.StackCooling;
import org.wardon.plan.AtDoor;
import org.wardon.plan.LotPlan;
import org.wardon.plan.PackagePlan;
import org.wardon.plan.StorePlan;
import org.wardon.produce.Commodity;
import org.wardon.produce.Evidence;
import org.wardon.produce.Fact;
import org.wardon.produce.PackageKind;
import org.wardon.reference.ReferenceBook;
import org.wardon.reference.Variants;

/** Makes the sheets of a plan's lots. */
final class LotSheets {
    /** Class of package whose vapour path a package of the keeper's own is taken to have. */
    private static final String OWN_LIKE = "room-cooling-any";

    /** Nobody leaves a harvest out in harder frost or heat than this, °C (assumption). */
    private static final double COLDEST_HELD_C = -1;

    private static final double WARMEST_HELD_C = 50;

    private final StorePlan plan;
    private final Weather weather;
    private final ReferenceBook book;
    private final ClassValues classes;
    private final Timeline timeline;

    LotSheets(StorePlan plan, Weather weather, ReferenceBook book) {
        this.plan = plan;
        this.weather = weather;
        this.book = book;
        this.classes = ClassValues.of(book.all());
        this.timeline = plan.timeline();
    }

    List<LotSheet> all() {
        return plan.lots().parallelStream().map(this::sheet).toList();
    }

    /** The sheet of a lot, whether the plan has it already or not. */
    LotSheet sheet(LotPlan lot) {
        Commodity crop = book.get(lot.commodity());
        Optional<Variants.Chosen> chosen = lot.variant().map(id -> Variants.choose(crop, id));
        Commodity commodity = chosen.map(Variants.Chosen::commodity).orElse(crop);
        PackageKind kind = kind(lot.packed());
        LotRange range =
                LotRange.of(
                        lot.id(), commodity, lot.massKg(), kind, lot.atDoor().ripeness(), classes);
        double vapour = range.at(Shares.MIDDLE).value().packing().vapourKgPerKgSPa();
        KeptLot kept =
                KeptLot.inOpenPackage(lot.id(), commodity, door(lot), classes).packedIn(vapour);
        KeepingModel model = KeepingModel.of(kept);
        LotRange breathing = model.uncured() ? range.uncured() : range;
        Bodies bodies = new Bodies(breathing, chosen);
        return new LotSheet(lot, commodity, kind, bodies, clock(lot), model);
    }

    private LotSheet.Clock clock(LotPlan lot) {
        double arrives = timeline.secondsAt(lot.arrives());
        double leaves = timeline.secondsAt(lot.leaves());
        double fresh =
                lot.atDoor()
                        .harvested()
                        .map(time -> timeline.secondsAt(time) + Timeline.DAY_S)
                        .orElse(Double.NEGATIVE_INFINITY);
        List<LotSheet.Clock.Moved> moves =
                lot.moves().stream()
                        .map(
                                move ->
                                        new LotSheet.Clock.Moved(
                                                timeline.secondsAt(move.at()), move.to()))
                        .toList();
        return new LotSheet.Clock(arrives, leaves, fresh, moves);
    }

    private PackageKind kind(PackagePlan packed) {
        if (packed instanceof PackagePlan.Named named) {
            return book.packageKind(named.id());
        }
        double hours =
                packed instanceof PackagePlan.HalfCooling own
                        ? own.hours()
                        : StackCooling.of(((PackagePlan.Stack) packed).halfThicknessM()).halfS()
                                / Timeline.HOUR_S;
        PackageKind like = book.packageKind(OWN_LIKE);
        return new PackageKind(
                "own",
                "as given in the plan",
                Fact.of(hours, "h", "own", Evidence.OWN),
                like.vapourConductance(),
                like.tareKgPerKg(),
                false);
    }

    private LotAtDoor door(LotPlan lot) {
        AtDoor at = lot.atDoor();
        List<ColdSpell> cold =
                at.chilledBefore().stream().map(c -> new ColdSpell(c.atC(), c.hours())).toList();
        return new LotAtDoor(
                at.ripeness(),
                at.usedPct().isPresent()
                        ? OptionalDouble.of(at.usedPct().getAsDouble() / 100)
                        : OptionalDouble.empty(),
                at.usedPct().isPresent() ? Optional.empty() : Optional.of(age(lot)),
                at.cured(),
                cold,
                lot.market().purpose().map(purpose -> Purpose.valueOf(purpose.name())),
                at.knownLife().map(life -> new KnownLife(life.days(), life.atC())));
    }

    private Age age(LotPlan lot) {
        AtDoor at = lot.atDoor();
        Mean shade = outdoorsBefore(lot.arrives(), at.harvested());
        double shadeC = Math.min(WARMEST_HELD_C, Math.max(COLDEST_HELD_C, shade.temperatureC()));
        double held = at.heldC().orElse(shadeC);
        return at.harvested()
                .map(
                        time ->
                                Age.known(
                                        java.time.Duration.between(time, lot.arrives()).toMinutes()
                                                / 60.0,
                                        held,
                                        shade.humidityFraction()))
                .orElseGet(() -> Age.unknown(held, shade.humidityFraction()));
    }

    private record Mean(double temperatureC, double humidityFraction) {}

    /** Outdoor shade between harvest and arrival; the first day where that lies before the run. */
    private Mean outdoorsBefore(LocalDateTime arrives, Optional<LocalDateTime> harvested) {
        double end = timeline.secondsAt(arrives);
        double start = harvested.map(timeline::secondsAt).orElse(end - Timeline.DAY_S);
        int first = (int) Math.max(0, Math.floor(start / Timeline.HOUR_S));
        int last = (int) Math.max(first + 1, Math.ceil(end / Timeline.HOUR_S));
        if (end <= 0) {
            first = 0;
            last = 24;
        }
        double sumC = 0;
        double sumPct = 0;
        for (int hour = first; hour < last; hour++) {
            sumC += weather.temperatureC(hour);
            sumPct += weather.humidityPct(hour);
        }
        int n = last - first;
        return new Mean(sumC / n, sumPct / n / 100);
    }
}
