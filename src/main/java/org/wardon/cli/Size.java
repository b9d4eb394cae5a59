package org.wardon.cli;

import java.util.OptionalDouble;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import org.wardon.advice.forecast.SizeAdvice;
import org.wardon.files.forecast.SizeAnswer;
import org.wardon.reference.ReferenceBook;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** Sums the design heat load of a chamber by hand. */
@Command(
        name = "size",
        mixinStandardHelpOptions = true,
        description = {
            "Sums the design heat load of a chamber line by line, as on paper: what cooling it asks"
                    + " for on the day of its largest intake."
        })
final class Size implements Callable<Integer> {
    @Mixin private Shared shared = new Shared();

    @Mixin private ChamberQuestion asked = new ChamberQuestion();

    @Option(
            names = "--outdoor-c",
            paramLabel = "C",
            description = "Outdoor air to design for; the plan's warmest hour unless given.")
    private @Nullable Double outdoorC;

    @Option(
            names = "--outdoor-humidity-pct",
            paramLabel = "PCT",
            description = "Its humidity; that of the plan's warmest hour unless given.")
    private @Nullable Double outdoorHumidityPct;

    @Option(
            names = "--pull-down-hours",
            paramLabel = "H",
            defaultValue = "24",
            description = "Hours in which what comes in is to be cold (${DEFAULT-VALUE}).")
    private double pullDownHours;

    @Option(
            names = "--margin-pct",
            paramLabel = "PCT",
            defaultValue = "10",
            description = "Margin on the sum (${DEFAULT-VALUE}).")
    private double marginPct;

    @Override
    public Integer call() {
        try (ReferenceBook book = shared.book()) {
            SizeAnswer answer =
                    new SizeAdvice(book, shared.words())
                            .ask(
                                    asked.plan(shared, book),
                                    new SizeAdvice.Question(
                                            asked.chamber(),
                                            given(outdoorC),
                                            given(outdoorHumidityPct),
                                            pullDownHours,
                                            marginPct));
            asked.tell(answer, () -> new SizePage(shared.words()).of(answer));
        }
        return Exit.OK;
    }

    private static OptionalDouble given(@Nullable Double value) {
        return value == null ? OptionalDouble.empty() : OptionalDouble.of(value);
    }
}
