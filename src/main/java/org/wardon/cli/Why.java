package org.wardon.cli;

import java.util.Optional;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import org.wardon.advice.forecast.WhyAdvice;
import org.wardon.files.forecast.WhyAnswer;
import org.wardon.reference.ReferenceBook;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** Says what moved heat and water in a chamber in one hour. */
@Command(
        name = "why",
        mixinStandardHelpOptions = true,
        description = {
            "Says why a chamber is as it is at an hour of a plan: its heat and water term by term,"
                    + " a face from outside to inside, a lot from its middle to the air."
        })
final class Why implements Callable<Integer> {
    @Mixin private Shared shared = new Shared();

    @Mixin private ChamberQuestion asked = new ChamberQuestion();

    @Option(
            names = "--at",
            paramLabel = "TIME",
            required = true,
            description = "End of the hour, local time such as 2026-03-04T15:00.")
    private String at = "";

    @Option(
            names = "--face",
            paramLabel = "NAME",
            description = "Tell this face too: roof, floor, north, east, south, west.")
    private @Nullable String face;

    @Option(names = "--lot", paramLabel = "ID", description = "Tell this lot of the chamber too.")
    private @Nullable String lot;

    @Override
    public Integer call() {
        try (ReferenceBook book = shared.book()) {
            WhyAnswer answer =
                    new WhyAdvice(book, shared.words())
                            .ask(
                                    asked.plan(shared, book),
                                    new WhyAdvice.Question(
                                            asked.chamber(),
                                            at,
                                            Optional.ofNullable(face),
                                            Optional.ofNullable(lot)));
            asked.tell(answer, () -> new WhyPage(shared.words()).of(answer));
        }
        return Exit.OK;
    }
}
