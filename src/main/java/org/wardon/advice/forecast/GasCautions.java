package org.wardon.advice.forecast;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import org.wardon.air.Timeline;
import org.wardon.heat.Course;
import org.wardon.heat.Hours;
import org.wardon.keeping.StoreEthylene;
import org.wardon.plan.ChamberPlan;
import org.wardon.produce.Caution;
import org.wardon.produce.Caution.Level;
import org.wardon.produce.Fact;
import org.wardon.produce.Reason;
import org.wardon.produce.Reason.Argument;
import org.wardon.produce.rows.GasInjury;

/** What carbon dioxide and the oxygen it leaves do to people and to produce. */
final class GasCautions {
    private static final double CAUTION_PPM = CarbonDioxideLimits.CAUTION_PPM;

    /** Danger, ppm: the air is short of oxygen. */
    static final double DANGER_PPM = CarbonDioxideLimits.DANGER_PPM;

    private static final double EVACUATE_PPM = CarbonDioxideLimits.EVACUATE_PPM;

    /** Oxygen of clean air, percent; source: safety limits, id OSHA-1910. */
    private static final double AIR_O2_PCT = 20.9;

    private static final double PPM_PER_PCT = 10_000;

    /** Produce is hurt by a level that stands so long in all, h (assumption). */
    private static final double HARMS_AFTER_H = 24;

    private static final String COARSE_SOURCE = "KADER1989";

    private GasCautions() {}

    /** What a person must hear before going in. */
    static List<Caution> ofPeople(String chamberId, Course course) {
        double ppm = course.counts().co2HighestPpm();
        if (ppm < CAUTION_PPM) {
            return List.of();
        }
        Argument highest = Argument.of(ppm, "ppm");
        Argument opening = Argument.of(course.counts().co2AtFirstOpeningPpm(), "ppm");
        // A door that never opened met no level; 0 stands for none.
        boolean opens = course.counts().co2AtFirstOpeningPpm() > 0;
        List<Caution> told = new ArrayList<>();
        if (ppm >= EVACUATE_PPM) {
            told.add(
                    new Caution(
                            Level.DANGER,
                            Reason.about(
                                    opens ? "co2-evacuate" : "co2-evacuate-shut",
                                    chamberId,
                                    "ACGIH",
                                    highest,
                                    opening)));
            told.add(
                    new Caution(
                            Level.CAUTION,
                            Reason.about("co2-outside-model", chamberId, "assumption", highest)));
        } else if (ppm >= DANGER_PPM) {
            Argument oxygen = Argument.of(AIR_O2_PCT - ppm / PPM_PER_PCT, "pct");
            told.add(
                    new Caution(
                            Level.DANGER,
                            Reason.about(
                                    opens ? "co2-danger" : "co2-danger-shut",
                                    chamberId,
                                    "OSHA-1910",
                                    highest,
                                    opening,
                                    oxygen)));
        } else {
            told.add(
                    new Caution(
                            Level.CAUTION,
                            Reason.about(
                                    opens ? "co2-caution" : "co2-caution-shut",
                                    chamberId,
                                    "OSHA-1910",
                                    highest,
                                    opening)));
        }
        return told;
    }

    /** What the scrubbers of a store do. */
    static List<Caution> ofScrubbers(StoreOutcome outcome) {
        List<ChamberPlan> scrubbed =
                outcome.model().plan().chambers().stream()
                        .filter(chamber -> chamber.ethyleneScrub().isPresent())
                        .toList();
        if (scrubbed.isEmpty()) {
            return List.of();
        }
        StoreEthylene open = new Fates(outcome.model()).unscrubbed(outcome.courses());
        List<Caution> told = new ArrayList<>();
        for (ChamberPlan chamber : scrubbed) {
            double cleaned = chamber.ethyleneScrub().orElseThrow().cleanedM3s() * 3_600;
            told.add(
                    new Caution(
                            Level.NOTE,
                            Reason.about(
                                    "scrubs-ethylene",
                                    chamber.id(),
                                    "own",
                                    Argument.of(cleaned, "m3/h"),
                                    Argument.of(outcome.ethylene(chamber.id()).highestPpm(), "ppm"),
                                    Argument.of(open.chamber(chamber.id()).highestPpm(), "ppm"))));
        }
        return told;
    }

    /** What the air of its chamber does to a lot, by the limits printed for its crop. */
    static List<Caution> ofLot(LotSheet sheet, StoreOutcome outcome) {
        List<GasInjury> rows = sheet.commodity().company().gasInjuries();
        if (rows.isEmpty() || !outcome.has(sheet.id())) {
            return List.of();
        }
        List<Caution> told = new ArrayList<>();
        strictest(rows, GasInjury::co2InjuryPct, Comparator.naturalOrder())
                .ifPresent(
                        row -> {
                            double limit = row.co2InjuryPct().orElseThrow().middle();
                            double hours = hoursAbove(sheet, outcome, limit * PPM_PER_PCT);
                            if (hours >= HARMS_AFTER_H) {
                                told.add(caution("co2-injures", sheet, row, limit, hours));
                            }
                        });
        strictest(rows, GasInjury::o2LowPct, Comparator.reverseOrder())
                .ifPresent(
                        row -> {
                            double limit = row.o2LowPct().orElseThrow().middle();
                            double ppm = (AIR_O2_PCT - limit) * PPM_PER_PCT;
                            double hours = hoursAbove(sheet, outcome, ppm);
                            if (hours >= HARMS_AFTER_H) {
                                told.add(caution("low-oxygen-injures", sheet, row, limit, hours));
                            }
                        });
        return told;
    }

    private static Caution caution(
            String code, LotSheet sheet, GasInjury row, double limitPct, double hours) {
        return new Caution(
                Level.CAUTION,
                new Reason(
                        code,
                        List.of(sheet.id()),
                        List.of(
                                Argument.of(limitPct, "pct"),
                                Argument.of(hours, "h"),
                                Argument.text(row.effect())),
                        row.sourceId()));
    }

    /** The row that allows least; the coarse classes only where nobody else prints a figure. */
    private static Optional<GasInjury> strictest(
            List<GasInjury> rows,
            Function<GasInjury, Optional<Fact>> figure,
            Comparator<Double> order) {
        List<GasInjury> printed = rows.stream().filter(r -> figure.apply(r).isPresent()).toList();
        List<GasInjury> fine =
                printed.stream().filter(r -> !r.sourceId().equals(COARSE_SOURCE)).toList();
        return (fine.isEmpty() ? printed : fine)
                .stream()
                        .min(
                                Comparator.comparing(
                                        r -> figure.apply(r).orElseThrow().middle(), order));
    }

    /** Hours above a level in all chambers it stands in. */
    private static double hoursAbove(LotSheet sheet, StoreOutcome outcome, double ppm) {
        double sum = 0;
        for (Visit visit : sheet.visits()) {
            Hours hours = outcome.course(visit.chamber()).hours();
            double last = 0;
            for (int i = 0; i < hours.size(); i++) {
                double at = hours.atS(i);
                boolean here = at > visit.hereFromS() && at <= visit.leavesS();
                sum += here && hours.co2Ppm(i) > ppm ? at - last : 0;
                last = at;
            }
        }
        return sum / Timeline.HOUR_S;
    }
}
