package org.wardon.advice.company;

import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.advice.forecast.StoreTrial;
import org.wardon.advice.forecast.TrialLot;
import org.wardon.cooling.Cooler;
import org.wardon.keeping.Draw;
import org.wardon.plan.ChamberPlan;
import org.wardon.sharing.Circumstances;

/**
 * Lots of a plan in a chamber of it: the ethylene each makes there by its mass, and what fresh air,
 * door, leakage and a scrubber carry out.
 */
final class Housed implements Circumstances.Level {
    private static final double LITRES = 1_000;

    private final StoreTrial trial;
    private final Optional<ChamberPlan> chamber;
    private double exchangeM3h;

    /** In no chamber in particular where that is absent. */
    Housed(StoreTrial trial, Optional<ChamberPlan> chamber) {
        this.trial = trial;
        this.chamber = chamber;
    }

    @Override
    public OptionalDouble ppm(String id, double atC) {
        Optional<TrialLot> lot = trial.lot(id);
        if (chamber.isEmpty() || lot.isEmpty()) {
            return OptionalDouble.empty();
        }
        double rate = lot.get().model().ethyleneMicrolitrePerKgHour(atC, Draw.MEDIAN);
        return OptionalDouble.of(
                rate * lot.get().plan().massKg() / (LITRES * exchangeM3h(chamber.get())));
    }

    /** Asked for only where there is a lot whose ethylene counts. */
    private double exchangeM3h(ChamberPlan in) {
        if (exchangeM3h == 0) {
            exchangeM3h = trial.exchangeM3h(in);
        }
        return exchangeM3h;
    }

    /** How far below its setting the thermostat lets the air come, K; 0 where nothing keeps one. */
    double swingK() {
        return chamber.filter(one -> one.coolers().stream().anyMatch(Cooler::holdsBand))
                .map(one -> one.setting().bandK())
                .orElse(0.0);
    }

    /** When a lot is there; whole its time in the store where it is not moved about. */
    Circumstances.Stay stay(String id) {
        Optional<TrialLot> lot = trial.lot(id);
        if (lot.isEmpty()) {
            return Circumstances.Stay.ALWAYS;
        }
        double from = Double.POSITIVE_INFINITY;
        double to = Double.NEGATIVE_INFINITY;
        if (lot.get().where().size() > 1) {
            for (TrialLot.Where at : lot.get().where()) {
                if (chamber.filter(in -> in.id().equals(at.chamber())).isPresent()) {
                    from = Math.min(from, at.fromS());
                    to = Math.max(to, at.toS());
                }
            }
        }
        return from < to
                ? new Circumstances.Stay(from, to)
                : new Circumstances.Stay(lot.get().hereFromS(), lot.get().leavesS());
    }
}
