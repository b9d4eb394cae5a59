package org.wardon.advice.forecast;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import org.wardon.advice.wording.Words;
import org.wardon.air.Weather;
import org.wardon.errors.Progress;
import org.wardon.files.forecast.ChamberForecast;
import org.wardon.files.forecast.Forecast;
import org.wardon.files.forecast.LotForecast;
import org.wardon.heat.Course;
import org.wardon.plan.ChamberPlan;
import org.wardon.plan.StorePlan;
import org.wardon.produce.Caution;
import org.wardon.produce.Reason;
import org.wardon.reference.ReferenceBook;

/** Answers the main question: what to do with this load in this store in this weather. */
public final class ForecastAdvice {
    private final ReferenceBook book;
    private final Words words;

    /**
     * Prepares for questions.
     *
     * @param book the reference book
     * @param words words for the texts of the forecast
     */
    public ForecastAdvice(ReferenceBook book, Words words) {
        this.book = book;
        this.words = words;
    }

    /**
     * Advises on a plan.
     *
     * @param asked the plan
     * @param progress hears how far the work has come
     * @return the advice
     * @throws org.wardon.errors.RunStopped where a chamber meets a state that cannot be
     */
    public StoreAdvice advise(StorePlan asked, Progress progress) {
        return advise(asked, List.of(), progress);
    }

    /**
     * Advises on a plan some of whose lots were given chambers before.
     *
     * @param asked the plan
     * @param housed what was placed where
     * @param progress hears how far the work has come
     * @return the advice
     * @throws org.wardon.errors.RunStopped where a chamber meets a state that cannot be
     */
    public StoreAdvice advise(StorePlan asked, List<Caution> housed, Progress progress) {
        Prepared prepared = prepare(asked);
        StoreOutcome outcome = new StoreRun(prepared.model()).run(progress);
        progress.at("judging", 0);
        List<Caution> placed = Stream.concat(housed.stream(), prepared.placed().stream()).toList();
        StoreAdvice advice = together(outcome, placed);
        progress.at("judging", 1);
        return advice;
    }

    /**
     * Returns the same advice in the words of this desk, in other units perhaps; nothing is run
     * again.
     *
     * @param advice advice given before
     * @return the advice in these words
     */
    public StoreAdvice inTheseWords(StoreAdvice advice) {
        StoreOutcome outcome = advice.outcome();
        Forecast told = advice.forecast();
        Map<String, ChamberForecast> chambers = new LinkedHashMap<>();
        told.chambers().forEach(chamber -> chambers.put(chamber.id(), chamber));
        Forecast forecast =
                new Forecast(
                        Forecast.VERSION,
                        told.chambers(),
                        told.value(),
                        told.lots(),
                        new Company(outcome, words).verdicts(),
                        warnings(outcome, advice.placed()),
                        new Actions(outcome, chambers, words).all());
        return advice.told(forecast);
    }

    /**
     * A plan ready to be run, every lot placed.
     *
     * @param model the store
     * @param placed what was placed where
     * @param lots makes the sheets of its lots, and of lots that come to it
     */
    record Prepared(StoreModel model, List<Caution> placed, LotSheets lots) {
        Prepared {
            placed = List.copyOf(placed);
        }
    }

    Prepared prepare(StorePlan asked) {
        Weather weather =
                PlanWeather.prolonged(
                        asked.weatherSource().weather(),
                        asked.durationS(),
                        StoreRun.MOST_BEYOND_DAYS);
        LotSheets lots = new LotSheets(asked, weather, book);
        StoreModel open = new StoreModel(asked, weather, lots.all());
        SimplePlacing.Placed placed = new SimplePlacing(open).place();
        StoreModel model = placed.told().isEmpty() ? open : open.placed(placed.plan());
        return new Prepared(model, placed.told(), lots);
    }

    private StoreAdvice together(StoreOutcome outcome, List<Caution> placed) {
        List<Judged> judged =
                outcome.model().plan().chambers().parallelStream()
                        .map(chamber -> judged(chamber, outcome))
                        .toList();
        Map<String, ChamberForecast> chambers = new LinkedHashMap<>();
        Map<String, List<Reason>> whyNot = new LinkedHashMap<>();
        for (Judged chamber : judged) {
            chambers.put(chamber.forecast.id(), chamber.forecast);
            whyNot.put(chamber.forecast.id(), chamber.whyNot);
        }
        List<LotForecast> lots = lots(outcome);
        double kept = lots.stream().mapToDouble(LotForecast::valueKept).sum();
        double energy = chambers.values().stream().mapToDouble(ChamberForecast::energyCost).sum();
        Forecast forecast =
                new Forecast(
                        Forecast.VERSION,
                        List.copyOf(chambers.values()),
                        new Forecast.Value(kept, energy, kept - energy),
                        lots,
                        new Company(outcome, words).verdicts(),
                        warnings(outcome, placed),
                        new Actions(outcome, chambers, words).all());
        return new StoreAdvice(outcome, forecast, whyNot, placed);
    }

    /** A chamber's figures, and why it does not hold where it does not. */
    private record Judged(ChamberForecast forecast, List<Reason> whyNot) {}

    private static Judged judged(ChamberPlan chamber, StoreOutcome outcome) {
        Holding holding = Holding.of(chamber, outcome);
        Course ideal = outcome.model().ideal(chamber, outcome.horizonS(), outcome.courses());
        OptionalDouble intake = new Intake(outcome, chamber).kgPerDay();
        return new Judged(
                new ChamberFigures(chamber, outcome).forecast(holding, ideal, intake),
                holding.reasons());
    }

    private static List<LotForecast> lots(StoreOutcome outcome) {
        List<LotForecast> lots = new ArrayList<>();
        for (LotSheet sheet : outcome.model().sheets()) {
            if (outcome.has(sheet.id())) {
                ChamberPlan chamber = outcome.model().plan().getChamber(sheet.endsIn());
                lots.add(new LotFigures(sheet, chamber, outcome).forecast());
            }
        }
        return lots;
    }

    private List<Forecast.Warning> warnings(StoreOutcome outcome, List<Caution> placed) {
        return Stream.concat(placed.stream(), new Cautions(outcome).all().stream())
                .sorted(Comparator.comparing(Caution::level).reversed())
                .map(
                        caution ->
                                new Forecast.Warning(
                                        caution.reason().code(),
                                        caution.level().name().toLowerCase(Locale.ROOT),
                                        String.join(",", caution.reason().subjects()),
                                        words.sentence(caution.reason()),
                                        caution.reason().sourceId()))
                .toList();
    }
}
