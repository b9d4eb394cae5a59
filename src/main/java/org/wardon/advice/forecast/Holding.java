package org.wardon.advice.forecast;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.function.DoublePredicate;
import org.wardon.advice.forecast.Stretches.Stretch;
import org.wardon.air.Timeline;
import org.wardon.cooling.Cooler;
import org.wardon.cooling.Outage;
import org.wardon.cooling.SettingCourse;
import org.wardon.heat.Course;
import org.wardon.heat.CourseEvent;
import org.wardon.heat.Hours;
import org.wardon.keeping.KeepingModel;
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
 * how the chamber is run, and count. Where the setting changes, each hour is judged by the one in
 * force; after a change the air is being brought to the new setting until it has been inside for
 * three hours running, which a day is allowed for and is told, not held against the chamber. What
 * is switched off has no setting to hold: there only cold that harms counts.
 *
 * @param holds the verdict
 * @param hoursOutside hours outside the band after pull-down, outages and disturbed hours left out
 * @param hoursDisturbed hours after later arrivals
 * @param stretches the air from one setting to the next, from the first arrival on
 * @param reasons why not; empty where it holds
 */
record Holding(
        boolean holds,
        double hoursOutside,
        double hoursDisturbed,
        List<Stretches.Stretch> stretches,
        List<Reason> reasons) {
    static final double AIR_ALLOWANCE_K = 0.5;
    static final double SHARE_INSIDE = 0.95;
    static final double DISTURBED_HOURS = 12;
    static final double PULLED_DOWN_HOURS = 3;
    static final double SEVEN_EIGHTHS_LEAST_H = 24;
    static final double SEVEN_EIGHTHS_PER_HALF = 4.5;
    static final double RISE_MOST_K = 2;
    static final double RISK_MOST = 0.10;
    static final double SETTLE_HOURS = 6;

    private static final String RULE = "assumption";

    /** Reasons that no lack of power brings. */
    private static final Set<String> TOO_COLD = Set.of("near-freezing", "chilling-in-stay");

    Holding {
        stretches = List.copyOf(stretches);
        reasons = List.copyOf(reasons);
    }

    /** Hours from the first arrival until the air has been inside for three hours running. */
    OptionalDouble pullDownHours() {
        return stretches.get(0).hoursToReach();
    }

    /** What a lot may take to come to its chamber's setting, s. */
    static double coolsInS(LotSheet sheet) {
        double halves = SEVEN_EIGHTHS_PER_HALF * sheet.kind().halfCoolingHours().middle();
        return Math.max(SEVEN_EIGHTHS_LEAST_H, halves) * Timeline.HOUR_S;
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
        private final SettingCourse settings;
        private final Stretches air;
        private final List<Visit> lots;
        private final List<Reason> reasons = new ArrayList<>();

        Judge(ChamberPlan chamber, StoreOutcome outcome) {
            this.chamber = chamber;
            this.outcome = outcome;
            course = outcome.course(chamber.id());
            hours = course.hours();
            settings = outcome.model().settings(chamber);
            air = new Stretches(chamber, settings, hours, outcome.horizonS());
            lots =
                    outcome.model().visitsIn(chamber.id()).stream()
                            .filter(visit -> outcome.has(visit.id()))
                            .filter(visit -> visit.arrivesS() < outcome.horizonS())
                            .toList();
        }

        Holding holding() {
            double firstS = lots.stream().mapToDouble(Visit::hereFromS).min().orElse(0);
            List<Stretch> stretches = air.from(Math.min(firstS, outcome.horizonS()));
            double outside = 0;
            double disturbed = 0;
            double counted = 0;
            for (Stretch stretch : stretches) {
                for (int i = 0; i < hours.size() && hours.atS(i) <= stretch.untilS(); i++) {
                    double at = hours.atS(i);
                    double span = (i == 0 ? at : at - hours.atS(i - 1)) / Timeline.HOUR_S;
                    if (at <= stretch.fromS() || stretch.coming(at) || inOutage(at)) {
                        continue;
                    }
                    if (disturbed(at, firstS)) {
                        disturbed += span;
                    } else {
                        counted += span;
                        outside += air.inside(hours.airC(i), stretch.setting()) ? 0 : span;
                    }
                }
            }
            if (!chamber.off()) {
                stretches.forEach(this::judgeReached);
                judgeAir(outside, counted);
            }
            lots.forEach(this::judgeLot);
            judgeRises();
            judgeSupply();
            return new Holding(reasons.isEmpty(), outside, disturbed, stretches, reasons);
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

        /** A setting that follows on another has a day to be reached in. */
        private void judgeReached(Stretch stretch) {
            double setC = stretch.setting().temperatureC();
            boolean first = settings.sinceS(stretch.fromS()) <= 0;
            if (stretch.reachedS().isPresent()
                    || (!first && stretch.hours() < SEVEN_EIGHTHS_LEAST_H)) {
                return;
            }
            Argument set = Argument.of(setC, "C");
            if (first) {
                say(
                        "never-pulled-down",
                        set,
                        Argument.of(air.meanC(-1, settings.nextS(stretch.fromS())), "C"));
            } else {
                double lastDayS = Math.max(stretch.fromS(), stretch.untilS() - Timeline.DAY_S);
                say(
                        "setting-not-reached",
                        BatteryNights.at(stretch.fromS(), outcome),
                        set,
                        Argument.of(air.meanC(lastDayS, stretch.untilS()), "C"));
            }
        }

        private void judgeAir(double outside, double counted) {
            if (counted > 0 && outside > (1 - SHARE_INSIDE) * counted) {
                say(
                        settings.changes().isEmpty() ? "air-outside-band" : "air-outside-bands",
                        Argument.of(outside, "h"),
                        Argument.of(counted, "h"),
                        Argument.of(chamber.setting().temperatureC(), "C"));
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

        private void judgeLot(Visit visit) {
            LotHistory history = visit.within(outcome.history(visit.id()));
            Cooling cooling = Cooling.of(history, visit.sheet(), chamber, outcome);
            judgeCooling(visit, history, cooling);
            judgeSafety(visit, history, cooling);
        }

        private void judgeCooling(Visit visit, LotHistory history, Cooling cooling) {
            LotSheet sheet = visit.sheet();
            double allowed = coolsInS(sheet) / Timeline.HOUR_S;
            double here = Math.min(visit.leavesS(), outcome.horizonS()) - history.timeS(0);
            if (chamber.off() || !cooling.wasWarm() || here < allowed * Timeline.HOUR_S) {
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
                if (rise.riseK() > RISE_MOST_K && !setWarmer(rise)) {
                    sayOf(
                            "warmed-by-arrival",
                            rise.cold().sheet(),
                            Argument.of(rise.riseK(), "K"),
                            Argument.text(String.join(", ", rise.comes())));
                }
            }
        }

        /** Whether the keeper let the chamber warm in those hours. */
        private boolean setWarmer(Deliveries.Rise rise) {
            double untilS = rise.atS() + DISTURBED_HOURS * Timeline.HOUR_S;
            return settings.warmestC(rise.atS() - Timeline.HOUR_S, untilS)
                    > settings.until(rise.atS()).temperatureC();
        }

        private void judgeSafety(Visit visit, LotHistory history, Cooling cooling) {
            LotSheet sheet = visit.sheet();
            double freezing = sheet.model().freezingC() + KeepingModel.FREEZING_MARGIN_K;
            if (anyWithin(visit, history, c -> c < freezing)) {
                sayOf("near-freezing", sheet, Argument.of(sheet.model().freezingC(), "C"));
            }
            double risk = LotRisk.chilling(outcome.fates(sheet.id()), sheet.soldS());
            if (risk >= RISK_MOST && (visit.only() || chills(visit, history))) {
                sayOf("chilling-in-stay", sheet, Argument.of(100 * risk, "pct"));
            }
            double settledS =
                    history.timeS(0)
                            + (cooling.sevenEighthsHours().orElse(0) + SETTLE_HOURS)
                                    * Timeline.HOUR_S;
            boolean cooled = !cooling.wasWarm() || cooling.sevenEighthsHours().isPresent();
            if (!chamber.off() && cooled) {
                judgeWarmth(visit, history, settledS);
            }
        }

        /** After a change a lot has as long as a warm one to come to the new setting. */
        private void judgeWarmth(Visit visit, LotHistory history, double settledS) {
            double bandK = chamber.setting().bandK() + RISE_MOST_K;
            double allowedS = coolsInS(visit.sheet()) + SETTLE_HOURS * Timeline.HOUR_S;
            for (int i = 0; i < history.size(); i++) {
                double at = history.timeS(i);
                boolean here =
                        at >= settledS && at <= Math.min(visit.leavesS(), outcome.horizonS());
                double mostC = settings.warmestC(Math.max(0, at - allowedS), at) + bandK;
                if (here && !inOutage(at) && history.meanC(i) > mostC) {
                    sayOf("lot-too-warm", visit.sheet(), Argument.of(mostC, "C"));
                    return;
                }
            }
        }

        /** Whether a lot that is moved is in its harmful cold here. */
        private boolean chills(Visit visit, LotHistory history) {
            double lowestC = visit.sheet().model().lowestSafeC();
            return anyWithin(visit, history, c -> c < lowestC);
        }

        /** Whether the coldest place of a lot is so at some time here, outages apart. */
        private boolean anyWithin(Visit visit, LotHistory history, DoublePredicate wrong) {
            for (int i = 0; i < history.size(); i++) {
                double at = history.timeS(i);
                boolean here = at <= Math.min(visit.leavesS(), outcome.horizonS());
                if (here && !inOutage(at) && wrong.test(history.coldestC(i))) {
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
