package org.wardon.advice.whatif;

import java.util.ArrayList;
import java.util.List;
import org.wardon.advice.forecast.ForecastAdvice;
import org.wardon.advice.wording.Words;
import org.wardon.errors.Progress;
import org.wardon.files.forecast.ChamberForecast;
import org.wardon.files.forecast.CompareAnswer;
import org.wardon.files.forecast.Forecast;
import org.wardon.plan.StorePlan;
import org.wardon.reference.ReferenceBook;

/** Runs plans in full and puts what comes of them side by side. */
public final class Comparison {
    private final ForecastAdvice advice;

    /**
     * Prepares for questions.
     *
     * @param book the reference book
     * @param words words of the forecasts
     */
    public Comparison(ReferenceBook book, Words words) {
        advice = new ForecastAdvice(book, words);
    }

    /**
     * A plan to be compared.
     *
     * @param name its name
     * @param plan the plan
     * @param changed what was changed in it
     */
    public record Named(String name, StorePlan plan, List<CompareAnswer.Changed> changed) {
        /** Copies the list. */
        public Named {
            changed = List.copyOf(changed);
        }

        /**
         * Returns the same with chambers for its lots.
         *
         * @param housed the plan with them
         * @return the plan to be compared
         */
        public Named in(StorePlan housed) {
            return new Named(name, housed, changed);
        }
    }

    /**
     * Compares.
     *
     * @param plans the plan as it is first
     * @param progress hears how far the work has come
     * @return what comes of each, in their order
     * @throws org.wardon.errors.RunStopped where a chamber meets a state that cannot be
     */
    public CompareAnswer of(List<Named> plans, Progress progress) {
        List<CompareAnswer.Variant> variants = new ArrayList<>();
        for (Named named : plans) {
            variants.add(variant(named, advice.advise(named.plan(), Progress.SILENT).forecast()));
            progress.at("variants", variants.size() / (double) plans.size());
        }
        return new CompareAnswer(variants);
    }

    private static CompareAnswer.Variant variant(Named named, Forecast forecast) {
        return new CompareAnswer.Variant(
                named.name(),
                named.changed(),
                forecast.value(),
                forecast.chambers().stream().mapToDouble(ChamberForecast::energyKWh).sum(),
                forecast.chambers().stream().map(Comparison::chamber).toList(),
                forecast.lots().stream()
                        .map(
                                lot ->
                                        new CompareAnswer.OfLot(
                                                lot.id(),
                                                lot.chamber(),
                                                lot.daysLeft(),
                                                lot.limitedBy(),
                                                lot.valueKept()))
                        .toList());
    }

    private static CompareAnswer.OfChamber chamber(ChamberForecast chamber) {
        return new CompareAnswer.OfChamber(
                chamber.id(),
                chamber.holds(),
                chamber.airC().mean(),
                chamber.energyKWh(),
                chamber.energyCost());
    }
}
