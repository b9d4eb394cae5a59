package org.wardon.advice.forecast;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.function.DoublePredicate;
import org.wardon.air.Timeline;
import org.wardon.cooling.Cooler;
import org.wardon.cooling.Outage;
import org.wardon.heat.Course;
import org.wardon.heat.CourseEvent;
import org.wardon.heat.Hours;
import org.wardon.lots.LotHistory;
import org.wardon.plan.ChamberPlan;
import org.wardon.plan.DailyOutage;
import org.wardon.produce.Reason;
import org.wardon.produce.Reason.Argument;

/**
 * Whether a chamber holds its setting. Thresholds are our own rules and are told with the verdict:
 * after pull-down the hourly mean stays inside setting ± (band + 0.5 K) in 95 of 100 hours outside
 * outages and disturbed hours (where the weather decides, as without coolers, with pads, wet walls
 * and night air: at or below setting + band); every lot reaches seven-eighths cooling within max(24
 * h, 4.5 half-cooling times of its package); no lot already cold rises more than 2 K through an
 * arrival; no lot leaves its safe range. Outages left out are single ones: those of every day are
 * how the chamber is run, and count.
 *
 * @param holds the verdict
 * @param hoursOutside hours outside the band after pull-down, outages and disturbed hours left out
 * @param hoursDisturbed hours after later arrivals
 * @param pullDownHours hours from the first arrival until the air has been inside for three hours
 * @param reasons why not; empty where it holds
 */
record Holding(
        boolean holds,
        double hoursOutside,
        double hoursDisturbed,
        OptionalDouble pullDownHours,
        List<Reason> reasons) {
    static final double AIR_ALLOWANCE_K = 0.5;
    static final double SHARE_INSIDE = 0.95;
    static final double DISTURBED_HOURS = 12;
    static final double PULLED_DOWN_HOURS = 3;
    static final double SEVEN_EIGHTHS_LEAST_H = 24;
    static final double SEVEN_EIGHTHS_PER_HALF = 4.5;
    static final double RISE_MOST_K = 2;
    static final double RISK_MOST = 0.10;
    static final double FREEZING_MARGIN_K = 0.5;
    static final double SETTLE_HOURS = 6;

    private static final String RULE = "assumption";

    /** Reasons that no lack of power brings. */
    private static final Set<String> TOO_COLD = Set.of("near-freezing", "chilling-in-stay");

    Holding {
        reasons = List.copyOf(reasons);
    }

    /** Judges one chamber of an outcome. */
    static Holding of(ChamberPlan chamber, StoreOutcome outcome) {
        return new Judge(chamber, outcome).holding();
    }

    private static final class Judge {
        private final ChamberPlan chamber;
        private final StoreOutcome outcome;
        private final Course course;
        private final Hours hours;
        private final List<Visit> lots;
        private final List<Reason> reasons = new ArrayList<>();

        Judge(ChamberPlan chamber, StoreOutcome outcome) {
            this.chamber = chamber;
            this.outcome = outcome;
            course = outcome.course(chamber.id());
            hours = course.hours();
            lots =
                    outcome.model().visitsIn(chamber.id()).stream()
                            .filter(visit -> outcome.has(visit.id()))
                            .filter(visit -> visit.arrivesS() < outcome.horizonS())
                            .toList();
        }

        Holding holding() {
            double firstS = lots.stream().mapToDouble(Visit::hereFromS).min().orElse(0);
            OptionalDouble pulledDownS = pulledDownS(firstS);
            double outside = 0;
            double disturbed = 0;
            double counted = 0;
            for (int i = 0; i < hours.size() && hours.atS(i) <= outcome.horizonS(); i++) {
                double at = hours.atS(i);
                double span = i == 0 ? at : at - hours.atS(i - 1);
                if (pulledDownS.isEmpty() || at <= pulledDownS.getAsDouble() || inOutage(at)) {
                    continue;
                }
                if (disturbed(at, firstS)) {
                    disturbed += span / Timeline.HOUR_S;
                } else {
                    counted += span / Timeline.HOUR_S;
                    outside += inside(hours.airC(i)) ? 0 : span / Timeline.HOUR_S;
                }
            }
            judgeAir(pulledDownS, outside, counted);
            lots.forEach(this::judgeLot);
            judgeRises();
            judgeSupply();
            OptionalDouble pull =
                    pulledDownS.isPresent()
                            ? OptionalDouble.of(
                                    (pulledDownS.getAsDouble() - firstS) / Timeline.HOUR_S)
                            : OptionalDouble.empty();
            return new Holding(reasons.isEmpty(), outside, disturbed, pull, reasons);
        }

        private boolean inside(double airC) {
            double set = chamber.setting().temperatureC();
            double band = chamber.setting().bandK();
            return chamber.coolers().stream().anyMatch(Cooler::holdsBand)
                    ? Math.abs(airC - set) <= band + AIR_ALLOWANCE_K
                    : airC <= set + band;
        }

        /** When the air has been inside for three hours running: the start of those hours. */
        private OptionalDouble pulledDownS(double firstS) {
            double since = Double.NaN;
            for (int i = 0; i < hours.size() && hours.atS(i) <= outcome.horizonS(); i++) {
                if (hours.atS(i) <= firstS || !inside(hours.airC(i))) {
                    since = Double.NaN;
                    continue;
                }
                double start = Math.max(firstS, i == 0 ? 0 : hours.atS(i - 1));
                since = Double.isNaN(since) ? start : since;
                if (hours.atS(i) - since >= PULLED_DOWN_HOURS * Timeline.HOUR_S - 1) {
                    return OptionalDouble.of(since);
                }
            }
            return OptionalDouble.empty();
        }

        /** Hours without power that come back every day are how the chamber is run, and count. */
        private boolean inOutage(double atS) {
            for (Outage outage : outcome.model().singleOutages(chamber)) {
                if (atS > outage.startS() && atS - Timeline.HOUR_S < outage.endS()) {
                    return true;
                }
            }
            return false;
        }

        private boolean disturbed(double atS, double firstS) {
            return lots.stream()
                    .mapToDouble(Visit::arrivesS)
                    .anyMatch(
                            arrives ->
                                    arrives > firstS
                                            && atS > arrives
                                            && atS <= arrives + DISTURBED_HOURS * Timeline.HOUR_S);
        }

        private void judgeAir(OptionalDouble pulledDownS, double outside, double counted) {
            double set = chamber.setting().temperatureC();
            if (pulledDownS.isEmpty()) {
                say("never-pulled-down", Argument.of(set, "C"), Argument.of(meanAirC(), "C"));
            } else if (counted > 0 && outside > (1 - SHARE_INSIDE) * counted) {
                say(
                        "air-outside-band",
                        Argument.of(outside, "h"),
                        Argument.of(counted, "h"),
                        Argument.of(set, "C"));
            }
        }

        /** Where something is too warm and power was missing, that is the first thing to say. */
        private void judgeSupply() {
            Optional<CourseEvent> first = BatteryNights.first(course);
            boolean warm = reasons.stream().anyMatch(r -> !TOO_COLD.contains(r.code()));
            double daily = chamber.power().daily().stream().mapToDouble(DailyOutage::hours).sum();
            if (warm && daily > 0 && chamber.coolers().stream().anyMatch(Cooler::needsPower)) {
                reasons.add(
                        0,
                        Reason.about(
                                "no-power-daily",
                                chamber.id(),
                                RULE,
                                Argument.of(Math.min(daily, 24), "h")));
            }
            if (warm && first.isPresent()) {
                reasons.add(
                        0,
                        Reason.about(
                                "battery-runs-out",
                                chamber.id(),
                                RULE,
                                Argument.of(BatteryNights.hours(course), "h"),
                                BatteryNights.at(first.get(), outcome)));
            }
        }

        private double meanAirC() {
            double sum = 0;
            for (int i = 0; i < hours.size(); i++) {
                sum += hours.airC(i);
            }
            return sum / hours.size();
        }

        private void judgeLot(Visit visit) {
            LotHistory history = visit.within(outcome.history(visit.id()));
            Cooling cooling = Cooling.of(history, visit.sheet(), chamber, course);
            judgeCooling(visit, history, cooling);
            judgeSafety(visit, history, cooling);
        }

        private void judgeCooling(Visit visit, LotHistory history, Cooling cooling) {
            LotSheet sheet = visit.sheet();
            double allowed =
                    Math.max(
                            SEVEN_EIGHTHS_LEAST_H,
                            SEVEN_EIGHTHS_PER_HALF * sheet.kind().halfCoolingHours().middle());
            double here = Math.min(visit.leavesS(), outcome.horizonS()) - history.timeS(0);
            if (!cooling.wasWarm() || here < allowed * Timeline.HOUR_S) {
                return;
            }
            OptionalDouble took = cooling.sevenEighthsHours();
            if (took.isEmpty() || took.getAsDouble() > allowed) {
                sayOf(
                        "cools-too-slowly",
                        sheet,
                        Argument.of(took.orElse(here / Timeline.HOUR_S), "h"),
                        Argument.of(allowed, "h"));
            }
        }

        /** Rises of cold lots over the twelve hours after others came in. */
        private void judgeRises() {
            for (Deliveries.Rise rise : new Deliveries(outcome, chamber).rises()) {
                if (rise.riseK() > RISE_MOST_K) {
                    sayOf(
                            "warmed-by-arrival",
                            rise.cold().sheet(),
                            Argument.of(rise.riseK(), "K"),
                            Argument.text(String.join(", ", rise.comes())));
                }
            }
        }

        private void judgeSafety(Visit visit, LotHistory history, Cooling cooling) {
            LotSheet sheet = visit.sheet();
            double freezing = sheet.model().freezingC() + FREEZING_MARGIN_K;
            if (anyWithin(visit, history, 0, c -> c < freezing, false)) {
                sayOf("near-freezing", sheet, Argument.of(sheet.model().freezingC(), "C"));
            }
            double risk = LotRisk.chilling(outcome.fates(sheet.id()), sheet.soldS());
            if (risk >= RISK_MOST && (visit.only() || chills(visit, history))) {
                sayOf("chilling-in-stay", sheet, Argument.of(100 * risk, "pct"));
            }
            double most =
                    chamber.setting().temperatureC() + chamber.setting().bandK() + RISE_MOST_K;
            double settledS =
                    history.timeS(0)
                            + (cooling.sevenEighthsHours().orElse(0) + SETTLE_HOURS)
                                    * Timeline.HOUR_S;
            boolean cooled = !cooling.wasWarm() || cooling.sevenEighthsHours().isPresent();
            if (cooled && anyWithin(visit, history, settledS, c -> c > most, true)) {
                sayOf("lot-too-warm", sheet, Argument.of(most, "C"));
            }
        }

        /** Whether a lot that is moved is in its harmful cold here. */
        private boolean chills(Visit visit, LotHistory history) {
            double lowestC = visit.sheet().model().lowestSafeC();
            return anyWithin(visit, history, 0, c -> c < lowestC, false);
        }

        private boolean anyWithin(
                Visit visit,
                LotHistory history,
                double fromS,
                DoublePredicate wrong,
                boolean mean) {
            for (int i = 0; i < history.size(); i++) {
                double at = history.timeS(i);
                boolean here = at >= fromS && at <= Math.min(visit.leavesS(), outcome.horizonS());
                if (here
                        && !inOutage(at)
                        && wrong.test(mean ? history.meanC(i) : history.coldestC(i))) {
                    return true;
                }
            }
            return false;
        }

        private void say(String code, Argument... arguments) {
            reasons.add(Reason.about(code, chamber.id(), RULE, arguments));
        }

        private void sayOf(String code, LotSheet sheet, Argument... arguments) {
            reasons.add(
                    new Reason(code, List.of(sheet.id(), chamber.id()), List.of(arguments), RULE));
        }
    }
}
