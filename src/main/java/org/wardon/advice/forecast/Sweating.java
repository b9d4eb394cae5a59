package org.wardon.advice.forecast;

import java.time.temporal.ChronoUnit;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.wardon.air.MoistAir;
import org.wardon.air.StandardAtmosphere;
import org.wardon.air.Timeline;
import org.wardon.air.Weather;
import org.wardon.heat.AirSeries;
import org.wardon.heat.CourseEvent;
import org.wardon.heat.Factors;
import org.wardon.heat.HeatModel;
import org.wardon.heat.Stay;
import org.wardon.keeping.Draw;
import org.wardon.lots.LotHistory;
import org.wardon.produce.Caution;
import org.wardon.produce.Caution.Level;
import org.wardon.produce.Reason;
import org.wardon.produce.Reason.Argument;

/**
 * Where a lot's skin is below the dew point of its air and water gathers on it: once for the
 * chambers it stands in, once for the air it leaves into.
 */
final class Sweating {
    /** Shorter is not worth a word, h (assumption). */
    private static final double TOLD_FROM_H = 1;

    /** Longer brings rot, h; source: common practice, no source. */
    private static final double LONG_H = 24;

    /** How long a lot is watched after it has left, h. */
    private static final int WATCHED_H = 48;

    private static final String PRACTICE = "common-practice";

    private final LotSheet sheet;
    private final StoreOutcome outcome;

    Sweating(LotSheet sheet, StoreOutcome outcome) {
        this.sheet = sheet;
        this.outcome = outcome;
    }

    /** One caution for the chambers, one for leaving, each where it sweats. */
    List<Caution> all(Set<String> toldOnMoving) {
        List<Caution> told = new ArrayList<>();
        if (outcome.has(sheet.id())) {
            inChambers(toldOnMoving).ifPresent(told::add);
            onLeaving().ifPresent(told::add);
        }
        return told;
    }

    /** Whether free water lay on it when it came, so that not all of it is sweat. */
    static boolean cameWet(LotSheet sheet) {
        return sheet.plan().atDoor().surfaceWaterPct() > 0;
    }

    private record Span(String chamber, double fromS, double untilS) {
        double hours() {
            return (untilS - fromS) / Timeline.HOUR_S;
        }
    }

    private Optional<Caution> inChambers(Set<String> toldOnMoving) {
        double all = 0;
        Optional<Span> longest = Optional.empty();
        for (Visit visit : sheet.visits()) {
            for (Span span : spans(visit, toldOnMoving)) {
                all += span.hours();
                if (span.hours() > longest.map(Span::hours).orElse(0.0)) {
                    longest = Optional.of(span);
                }
            }
        }
        if (longest.isEmpty() || all < TOLD_FROM_H) {
            return Optional.empty();
        }
        List<String> subjects = List.of(sheet.id(), longest.get().chamber());
        List<Argument> told =
                List.of(
                        Argument.of(all, "h"),
                        Argument.of(longest.get().hours(), "h"),
                        time(longest.get().fromS()));
        return Optional.of(
                all > LONG_H
                        ? new Caution(
                                Level.CAUTION, new Reason("sweats-long", subjects, told, PRACTICE))
                        : new Caution(Level.NOTE, new Reason("sweats", subjects, told, PRACTICE)));
    }

    /** When it is wet in a chamber, but for what it brought along and what its moving told. */
    private List<Span> spans(Visit visit, Set<String> toldOnMoving) {
        if (visit.from().isPresent() && toldOnMoving.contains(visit.chamber())) {
            return List.of();
        }
        double from = visit.hereFromS();
        return outcome.course(visit.chamber()).events().stream()
                .filter(event -> event.kind() == CourseEvent.Kind.WET_LOT)
                .filter(event -> event.subject().equals(sheet.id()))
                .filter(event -> event.fromS() >= from - 1 && event.fromS() < visit.leavesS())
                .filter(event -> !cameWet(sheet) || event.fromS() > from + Timeline.HOUR_S)
                .map(event -> new Span(visit.chamber(), event.fromS(), until(event, visit)))
                .toList();
    }

    /** A lot that left goes on as a shadow, whose water is nobody's. */
    private static double until(CourseEvent event, Visit visit) {
        return Math.min(event.untilS(), visit.leavesS());
    }

    private Optional<Caution> onLeaving() {
        Optional<Leaving> planned = leaving(sheet.clock().leavesS());
        if (planned.isEmpty() || planned.get().wetH() < TOLD_FROM_H) {
            return Optional.empty();
        }
        Leaving then = planned.get();
        Optional<Leaving> cool =
                leaving(coolestS(sheet.clock().leavesS()))
                        .filter(other -> other.wetH() < then.wetH() - TOLD_FROM_H);
        Argument at = time(then.atS());
        Argument skin = Argument.of(then.skinC(), "C");
        Argument dew = Argument.of(then.dewC(), "C");
        Argument wet = Argument.of(then.wetH(), "h");
        Reason told =
                cool.isPresent()
                        ? Reason.about(
                                "will-sweat-less-when-cool",
                                sheet.id(),
                                PRACTICE,
                                at,
                                skin,
                                dew,
                                wet,
                                time(cool.get().atS()),
                                Argument.of(cool.get().wetH(), "h"))
                        : Reason.about(
                                then.stillWet() ? "will-stay-wet" : "will-sweat",
                                sheet.id(),
                                PRACTICE,
                                at,
                                skin,
                                dew,
                                wet);
        return Optional.of(new Caution(Level.CAUTION, told));
    }

    /** A leaving: its time, the skin and the dew point it meets, and how long it stays wet. */
    private record Leaving(double atS, double skinC, double dewC, double wetH) {
        /** Wet to the end of what is watched, less the row it comes out dry. */
        boolean stillWet() {
            return wetH >= WATCHED_H - 2;
        }
    }

    /**
     * What happens where it leaves at a time; absent where its skin is not below the dew point.
     * Past the end of the plan it is as at the same hour of the plan's last day.
     */
    private Optional<Leaving> leaving(double leavesS) {
        LotHistory history = outcome.history(sheet.id());
        double inPlan = leavesS;
        while (inPlan > outcome.horizonS()) {
            inPlan -= Timeline.DAY_S;
        }
        if (inPlan <= sheet.clock().hereFromS()) {
            return Optional.empty();
        }
        int sample = sample(history, inPlan);
        AirSeries air = airOnLeaving();
        double pressurePa =
                StandardAtmosphere.pressurePa(outcome.model().plan().site().elevationM());
        double dewC =
                MoistAir.dewPointC(
                        MoistAir.humidityRatioAt(
                                air.temperatureC(inPlan),
                                Math.min(1, air.humidityFraction(inPlan)),
                                pressurePa),
                        pressurePa);
        double skinC = history.surfaceC(sample);
        if (skinC >= dewC) {
            return Optional.of(new Leaving(leavesS, skinC, dewC, 0));
        }
        Stay out =
                new Stay(
                        sheet.stay(Draw.MEDIAN).lot(),
                        inPlan,
                        Double.POSITIVE_INFINITY,
                        history.meanC(sample),
                        Double.NEGATIVE_INFINITY,
                        0);
        double until = inPlan + WATCHED_H * Timeline.HOUR_S;
        LotHistory after =
                HeatModel.runInGivenAir(
                                out, air, outcome.model().plan().site(), Factors.PLAIN, until)
                        .history();
        return Optional.of(new Leaving(leavesS, skinC, dewC, wetHours(after)));
    }

    private static double wetHours(LotHistory after) {
        double wet = 0;
        for (int i = 1; i < after.size(); i++) {
            wet += after.wet(i) ? after.timeS(i) - after.timeS(i - 1) : 0;
        }
        return wet / Timeline.HOUR_S;
    }

    /** Air of the way to the buyer: at the temperature the plan gives it, as damp as outdoors. */
    private AirSeries airOnLeaving() {
        Weather weather = outcome.model().weather();
        AirSeries outdoors = AirSeries.outdoors(weather);
        if (sheet.plan().market().temperatureC().isEmpty()) {
            return outdoors;
        }
        double marketC = sheet.plan().market().temperatureC().getAsDouble();
        double pressurePa =
                StandardAtmosphere.pressurePa(outcome.model().plan().site().elevationM());
        int n = weather.hours();
        double[] time = new double[n];
        double[] temperature = new double[n];
        double[] humidity = new double[n];
        for (int h = 0; h < n; h++) {
            double ratio =
                    MoistAir.humidityRatioAt(
                            weather.temperatureC(h), weather.humidityPct(h) / 100, pressurePa);
            time[h] = h * Timeline.HOUR_S;
            temperature[h] = marketC;
            humidity[h] = Math.min(1, MoistAir.humidityFraction(marketC, ratio, pressurePa));
        }
        return new AirSeries(time, temperature, humidity);
    }

    /** The coolest hour within half a day of a time, s. */
    private double coolestS(double aroundS) {
        Weather weather = outcome.model().weather();
        double best = aroundS;
        double coolest = Double.POSITIVE_INFINITY;
        for (int h = -12; h <= 12; h++) {
            double atS = aroundS + h * Timeline.HOUR_S;
            int hour = (int) Math.round(atS / Timeline.HOUR_S);
            if (hour >= 0 && hour < weather.hours() && weather.temperatureC(hour) < coolest) {
                coolest = weather.temperatureC(hour);
                best = hour * Timeline.HOUR_S;
            }
        }
        return best;
    }

    private static int sample(LotHistory history, double atS) {
        int i = 0;
        while (i < history.size() - 1 && history.timeS(i) < atS) {
            i++;
        }
        return i;
    }

    private Argument time(double atS) {
        return Argument.text(
                outcome.model()
                        .plan()
                        .timeline()
                        .localAt(atS)
                        .truncatedTo(ChronoUnit.MINUTES)
                        .toString()
                        .replace('T', ' '));
    }
}
