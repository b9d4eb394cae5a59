package org.wardon.cli;

import java.nio.file.Path;
import java.util.OptionalDouble;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import org.wardon.advice.forecast.SizeAdvice;
import org.wardon.files.PlanReader;
import org.wardon.files.forecast.AnswerWriter;
import org.wardon.files.forecast.SizeAnswer;
import org.wardon.reference.ReferenceBook;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

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

    @Parameters(paramLabel = "PLAN", description = "Store plan, a JSON file; see 'wardon schema'.")
    private Path plan = Path.of("");

    @Option(
            names = "--chamber",
            paramLabel = "ID",
            required = true,
            description = "Chamber of the plan.")
    private String chamber = "";

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

    @Option(names = "--json", description = "Answer in JSON.")
    private boolean json;

    @Override
    public Integer call() {
        try (ReferenceBook book = shared.book()) {
            SizeAnswer answer =
                    new SizeAdvice(book, shared.words())
                            .ask(
                                    PlanReader.read(plan, shared.lookups(book)),
                                    new SizeAdvice.Question(
                                            chamber,
                                            given(outdoorC),
                                            given(outdoorHumidityPct),
                                            pullDownHours,
                                            marginPct));
            Terminal.ofProcess()
                    .out()
                    .print(
                            json
                                    ? AnswerWriter.json(answer)
                                    : new SizePage(shared.words()).of(answer));
        }
        return Exit.OK;
    }

    private static OptionalDouble given(@Nullable Double value) {
        return value == null ? OptionalDouble.empty() : OptionalDouble.of(value);
    }
}
