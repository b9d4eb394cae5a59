package org.wardon.advice.placing;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import org.wardon.advice.Ranges;
import org.wardon.advice.company.GroupSharing;
import org.wardon.advice.forecast.StoreTrial;
import org.wardon.advice.forecast.TrialLot;
import org.wardon.advice.forecast.Tried;
import org.wardon.files.forecast.PlaceAnswer;
import org.wardon.heat.Course;
import org.wardon.plan.ChamberPlan;
import org.wardon.plan.LotPlan;

/** Tells an arrangement that was run in full chamber by chamber and lot by lot. */
final class Arranged {
    private final StoreTrial trial;
    private final GroupSharing sharing;

    Arranged(StoreTrial trial, GroupSharing sharing) {
        this.trial = trial;
        this.sharing = sharing;
    }

    Arrangement of(Tried tried) {
        List<Arrangement.There> chambers = new ArrayList<>();
        for (ChamberPlan chamber : tried.plan().chambers()) {
            trial.progress().at("trial", 0);
            chambers.add(there(chamber, tried));
        }
        Map<String, Arrangement.OfLot> lots = new HashMap<>();
        tried.lots().forEach((id, lot) -> lots.put(id, lot(lot)));
        return new Arrangement(chambers, lots, tried.kept(), tried.energyCost(), tried.energyKWh());
    }

    private static Arrangement.OfLot lot(Tried.OfLot lot) {
        return new Arrangement.OfLot(
                Ranges.told(lot.daysLeft()),
                lot.limitedBy().word(),
                lot.valueKept(),
                100 * lot.shareSound());
    }

    private Arrangement.There there(ChamberPlan chamber, Tried tried) {
        List<LotPlan> lots =
                tried.plan().lots().stream()
                        .filter(lot -> standsIn(lot, chamber.id()))
                        .filter(lot -> tried.lots().containsKey(lot.id()))
                        .toList();
        List<String> ids = lots.stream().map(LotPlan::id).toList();
        Course course = Objects.requireNonNull(tried.chambers().get(chamber.id()));
        return new Arrangement.There(
                chamber.id(),
                dial(chamber),
                chamber.off(),
                !chamber.coolers().isEmpty()
                        || chamber.heaterW() > 0
                        || chamber.humidifierKgH() > 0,
                DayMeans.whole(course.hours(), course.hours()::airC),
                DayMeans.whole(course.hours(), h -> 100 * course.hours().humidityFraction(h)),
                chamber.off() || ids.isEmpty()
                        ? List.of()
                        : Objects.requireNonNull(tried.notHeld().get(chamber.id())),
                ids,
                filled(chamber, ids),
                sharing.among(chamber, ids));
    }

    private static boolean standsIn(LotPlan lot, String chamber) {
        return lot.chamber().filter(chamber::equals).isPresent()
                || lot.moves().stream().anyMatch(move -> move.to().equals(chamber));
    }

    /** The fullest day, each lot counted for all days it is in the store. */
    private Arrangement.Filled filled(ChamberPlan chamber, List<String> ids) {
        List<TrialLot> lots = ids.stream().map(id -> trial.lot(id).orElseThrow()).toList();
        double mass = 0;
        double volume = 0;
        for (TrialLot at : lots) {
            double kg = 0;
            double m3 = 0;
            for (TrialLot lot : lots) {
                boolean there = lot.hereFromS() <= at.hereFromS() && at.hereFromS() < lot.leavesS();
                kg += there ? lot.plan().massKg() : 0;
                m3 += there ? Draft.packedM3(lot) : 0;
            }
            mass = Math.max(mass, kg);
            volume = Math.max(volume, m3);
        }
        return new Arrangement.Filled(mass, chamber.capacityKg(), volume, Draft.roomM3(chamber));
    }

    /** What is dialled in, and when. */
    static PlaceAnswer.Dial dial(ChamberPlan chamber) {
        return new PlaceAnswer.Dial(
                chamber.setting().temperatureC(),
                chamber.setting().humidityPct(),
                chamber.use().changes().stream()
                        .map(later -> new PlaceAnswer.Later(later.from(), later.temperatureC()))
                        .toList());
    }
}
