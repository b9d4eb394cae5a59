package org.wardon.advice.outlook;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.DoubleFunction;
import java.util.function.Supplier;
import org.wardon.air.Timeline;
import org.wardon.errors.BadInput;
import org.wardon.files.forecast.RipeOn;
import org.wardon.keeping.Draw;
import org.wardon.keeping.Draws;
import org.wardon.keeping.Fate;
import org.wardon.keeping.HistoryLegs;
import org.wardon.keeping.KeepingModel;
import org.wardon.keeping.RipeDay;
import org.wardon.keeping.RipeSetting;
import org.wardon.lots.LotHistory;
import org.wardon.produce.Reason;

/** Is the lot ripe after so many days, and what temperature would make it so? */
final class RipeQuestion {
    /** Above this much ethylene somebody treats the lot, µL/L. */
    private static final double TREATED_PPM = 1;

    /** A steady condition is followed at least so long, days; ethylene takes one to act. */
    private static final double LEAST_DAYS = 2;

    private final KeepingModel model;
    private final double days;
    private final boolean treated;
    private final RipeDay judged;

    private RipeQuestion(KeepingModel model, double days, boolean treated, RipeDay judged) {
        this.model = model;
        this.days = days;
        this.treated = treated;
        this.judged = judged;
    }

    /**
     * Answers the question of a request.
     *
     * @param request the request
     * @param model its lot
     * @param followed what it goes through
     * @param fromS now, s
     * @param printed commodities that could be asked of
     * @return the answer; empty where nobody asked
     * @throws BadInput where it cannot be told when the lot ripens
     */
    static Optional<RipeQuestion> of(
            KeepRequest request,
            KeepingModel model,
            LotHistory followed,
            double fromS,
            Supplier<List<String>> printed) {
        if (request.ripeInDays().isEmpty()) {
            return Optional.empty();
        }
        if (model.ripening().isEmpty()) {
            throw untold(model, printed);
        }
        double days = request.ripeInDays().getAsDouble();
        double ppm = request.ethylenePpm().orElse(0);
        List<Draw> draws = Draws.seeded(KeepingAdvice.SEED, KeepingAdvice.DRAWS);
        List<Fate> fates = draws.stream().map(draw -> model.follow(followed, draw)).toList();
        RipeSetting setting =
                RipeSetting.of(model, draws, held(request, followed, fromS, days), fromS, days);
        RipeDay judged = RipeDay.of(fates, fromS + days * Timeline.DAY_S, fromS, setting);
        return Optional.of(new RipeQuestion(model, days, ppm > TREATED_PPM, judged));
    }

    private static BadInput untold(KeepingModel model, Supplier<List<String>> printed) {
        String id = model.lot().commodity().id();
        return model.lot().commodity().keeping().ripening().isEmpty()
                ? new BadInput(
                        "--ripe-in",
                        "",
                        "no days to ripe are printed for " + id,
                        "accepted for: " + String.join(", ", printed.get()))
                : new BadInput(
                        "--ripe-in",
                        "",
                        "nobody said how ripe the " + id + " is",
                        "accepted: --ripeness green, turning or ripe with it");
    }

    /** What the lot goes through if it is kept at a temperature from now on. */
    private static DoubleFunction<LotHistory> held(
            KeepRequest request, LotHistory followed, double fromS, double days) {
        int last = followed.size() - 1;
        double humidity = followed.humidityFraction(last);
        double ppm = followed.ethylenePpm(last);
        double length = Math.max(days, LEAST_DAYS);
        if (request.condition() instanceof KeepRequest.Steady) {
            return atC -> LotHistory.constant(atC, humidity, ppm, length * Timeline.DAY_S);
        }
        return atC -> HistoryLegs.then(followed, fromS, atC, humidity, ppm, length);
    }

    RipeOn figures() {
        OptionalDouble atC =
                judged.setting()
                        .filter(RipeSetting::found)
                        .map(found -> OptionalDouble.of(found.atC()))
                        .orElse(OptionalDouble.empty());
        return new RipeOn(days, judged.probability(), judged.overripe(), atC);
    }

    List<Reason> told() {
        List<Reason> told = new ArrayList<>();
        told.add(judged.inDays(model, days));
        told.addAll(judged.advice(model));
        Reason gas = RipeDay.treatment(model.lot().id());
        if (treated && !told.contains(gas)) {
            told.add(gas);
        }
        return told;
    }
}
