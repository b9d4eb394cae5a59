package org.wardon.advice.forecast;

import java.time.LocalDate;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import org.wardon.air.Timeline;
import org.wardon.files.forecast.RipeOn;
import org.wardon.keeping.Draw;
import org.wardon.keeping.Draws;
import org.wardon.keeping.RipeDay;
import org.wardon.keeping.RipeSetting;
import org.wardon.lots.LotHistory;
import org.wardon.produce.Caution;
import org.wardon.produce.Caution.Level;
import org.wardon.produce.Reason;

/**
 * Whether a lot of a plan is ripe on the day it is wanted ripe, at noon, leaving as planned; and
 * the steady temperature that would make it so, from its arrival on, in the humidity and ethylene
 * it met on the whole.
 */
final class RipeWanted {
    private static final double NOON_H = 12;

    private final LotSheet sheet;
    private final LocalDate day;
    private final double fromS;
    private final double atS;
    private final Optional<RipeDay> judged;

    private RipeWanted(LotSheet sheet, LocalDate day, StoreOutcome outcome) {
        this.sheet = sheet;
        this.day = day;
        Timeline timeline = outcome.model().plan().timeline();
        fromS = sheet.clock().hereFromS();
        atS = Math.max(fromS, timeline.secondsAt(day.atStartOfDay()) + NOON_H * Timeline.HOUR_S);
        judged =
                sheet.model().ripening().isEmpty() ? Optional.empty() : Optional.of(judge(outcome));
    }

    /** The question of a lot; empty where the plan does not ask or the lot is not in the run. */
    static Optional<RipeWanted> of(LotSheet sheet, StoreOutcome outcome) {
        return sheet.plan()
                .market()
                .ripeOn()
                .filter(day -> outcome.has(sheet.id()))
                .map(day -> new RipeWanted(sheet, day, outcome));
    }

    private RipeDay judge(StoreOutcome outcome) {
        List<Draw> draws = Draws.seeded(outcome.model().plan().seed(), StoreRun.DRAWS);
        LotHistory met = outcome.history(sheet.id());
        double humidity = mean(met, met::humidityFraction);
        double ppm = mean(met, met::ethylenePpm);
        double lastS = Math.max(atS, 2 * Timeline.DAY_S + fromS) - fromS;
        RipeSetting setting =
                RipeSetting.of(
                        sheet.model(),
                        draws,
                        atC -> LotHistory.constant(atC, humidity, ppm, lastS),
                        0,
                        inDays());
        return RipeDay.of(outcome.fates(sheet.id()).sold(), atS, fromS, setting);
    }

    private static double mean(LotHistory met, java.util.function.IntToDoubleFunction value) {
        double sum = 0;
        double span = 0;
        for (int i = 1; i < met.size(); i++) {
            double step = met.timeS(i) - met.timeS(i - 1);
            sum += step * 0.5 * (value.applyAsDouble(i) + value.applyAsDouble(i - 1));
            span += step;
        }
        return sum / span;
    }

    private double inDays() {
        return (atS - fromS) / Timeline.DAY_S;
    }

    /** The answer in figures; empty where nothing is known. */
    Optional<RipeOn> figures() {
        return judged.map(
                known ->
                        new RipeOn(
                                inDays(),
                                known.probability(),
                                known.overripe(),
                                known.setting()
                                        .filter(RipeSetting::found)
                                        .map(found -> OptionalDouble.of(found.atC()))
                                        .orElse(OptionalDouble.empty())));
    }

    /** The answer in sentences. */
    List<Caution> told() {
        if (judged.isEmpty()) {
            return List.of(new Caution(Level.CAUTION, RipeDay.untold(sheet.model())));
        }
        RipeDay known = judged.get();
        Level level = known.likely() ? Level.NOTE : Level.CAUTION;
        Reason share = known.onDay(sheet.model(), day);
        return Stream.concat(Stream.of(share), known.advice(sheet.model()).stream())
                .map(reason -> new Caution(level, reason))
                .toList();
    }
}
