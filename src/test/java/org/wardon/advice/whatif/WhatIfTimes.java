package org.wardon.advice.whatif;

import java.nio.file.Path;
import java.util.Locale;
import java.util.Optional;
import org.wardon.advice.PlanLookups;
import org.wardon.advice.wording.Units;
import org.wardon.advice.wording.Words;
import org.wardon.files.PlanReader;
import org.wardon.plan.ChamberPlan;
import org.wardon.plan.StorePlan;
import org.wardon.reference.ReferenceBook;

/** Times what sliders ask; a plain main. */
public final class WhatIfTimes {
    private static final int ANSWERS = 12;

    private WhatIfTimes() {}

    /**
     * Prints wall times of the first and the later answers.
     *
     * @param args none
     */
    public static void main(String[] args) {
        try (ReferenceBook book = ReferenceBook.open()) {
            StorePlan plan =
                    PlanReader.read(Path.of("demo-data/landing.json"), PlanLookups.of(book));
            for (ChamberPlan chamber : plan.chambers()) {
                long start = System.nanoTime();
                WhatIf whatIf = WhatIf.of(plan, book, Words.english(Units.METRIC), chamber.id());
                StringBuilder told =
                        new StringBuilder(
                                String.format(
                                        Locale.ROOT,
                                        "%s: prepared %.2f s; answers",
                                        chamber.id(),
                                        since(start)));
                for (int i = 0; i < ANSWERS; i++) {
                    long asked = System.nanoTime();
                    Changes changes =
                            switch (i % 3) {
                                case 0 -> Changes.NOTHING.setTo(5 + i);
                                case 1 -> Changes.NOTHING.loaded(1 + 0.1 * i);
                                default ->
                                        Changes.NOTHING.insulated(
                                                new Changes.Insulation(
                                                        1 + 0.1 * i, Optional.empty()));
                            };
                    whatIf.answer(changes);
                    told.append(String.format(Locale.ROOT, " %.2f", since(asked)));
                }
                System.out.println(told + " s");
            }
        }
    }

    private static double since(long nanos) {
        return (System.nanoTime() - nanos) / 1e9;
    }
}
