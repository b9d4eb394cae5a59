package org.wardon.cli;

import java.io.PrintStream;
import java.nio.file.Path;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import org.wardon.advice.outlook.KeepReport;
import org.wardon.advice.outlook.KeepRequest;
import org.wardon.advice.outlook.KeepingAdvice;
import org.wardon.advice.wording.Words;
import org.wardon.errors.BadInput;
import org.wardon.files.forecast.AnswerWriter;
import org.wardon.reference.ReferenceBook;
import picocli.CommandLine.ArgGroup;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** Says how long a lot keeps. */
@Command(
        name = "keep",
        mixinStandardHelpOptions = true,
        description = {
            "Says how many days one lot keeps, in one condition or along a logged history, what"
                    + " ends it and why."
        })
final class Keep implements Callable<Integer> {
    @Mixin private Shared shared = new Shared();

    @Parameters(paramLabel = "COMMODITY", description = "Its id or any common name.")
    private String name = "";

    @ArgGroup(multiplicity = "0..1")
    private @Nullable Where where;

    @Mixin private LooksWords looks = new LooksWords();

    @Mixin private OwnLotWords ownLots = new OwnLotWords();

    /** One condition, or a history. */
    static final class Where {
        @Option(
                names = "--at",
                paramLabel = "C",
                required = true,
                description = "Temperature of the lot, °C.")
        private double atC;

        @Option(
                names = "--history",
                paramLabel = "CSV",
                required = true,
                description = {
                    "Logged history: time,temperatureC[,humidityPct] or time,temperatureF, or as the"
                            + " logger wrote it."
                })
        private @Nullable Path history;
    }

    @Option(
            names = "--humidity",
            paramLabel = "PCT",
            description = "Humidity at the produce, percent (default: the handbook's).")
    private @Nullable Double humidityPct;

    @Option(
            names = "--days",
            paramLabel = "N",
            description = "With --at: days after which life used and chilling are told (7).")
    private @Nullable Double days;

    @Option(
            names = "--then",
            paramLabel = "C",
            description = "With --history: temperature it goes on at, °C.")
    private @Nullable Double thenC;

    @Option(
            names = "--used",
            paramLabel = "PCT",
            description = "Share of its life used before, percent.")
    private @Nullable Double usedPct;

    @Option(
            names = "--known-life",
            paramLabel = "DAYS@C",
            description = {
                "In my store it keeps so many days at so many °C, such as 9@10 or 8..10@10."
            })
    private @Nullable String knownLife;

    @Option(
            names = "--ethylene",
            paramLabel = "PPM",
            description = "With --at: ethylene in the air, ppm (default: clean outdoor air).")
    private @Nullable Double ethylenePpm;

    @Option(
            names = "--ripe-in",
            paramLabel = "DAYS",
            description = "Is it ripe, and not overripe, in so many days, and at what setting?")
    private @Nullable Double ripeInDays;

    @Option(names = "--json", description = "Answer in JSON.")
    private boolean json;

    @Override
    public Integer call() {
        PrintStream out = Terminal.ofProcess().out();
        Where asked = where;
        ownLots.check(asked != null && asked.history == null && days == null);
        if (ownLots.listed()) {
            out.print(ownLots.list(shared, name, json));
            return Exit.OK;
        }
        if (asked == null) {
            throw new BadInput(
                    "keep",
                    "",
                    "nothing says what the lot goes through",
                    "accepted: --at C or --history CSV; --outcomes to list lots of your own");
        }
        if (ownLots.remembered()) {
            out.print(ownLots.remember(shared, request(asked), json));
            return Exit.OK;
        }
        try (ReferenceBook book = shared.book()) {
            Words words = shared.words();
            KeepRequest request = request(asked);
            KeepReport report = new KeepingAdvice(book).ask(request);
            out.print(
                    json
                            ? AnswerWriter.json(report.answer())
                            : new KeepPage(words).of(report, until(request, words)));
        }
        return Exit.OK;
    }

    private static String until(KeepRequest request, Words words) {
        return request.condition() instanceof KeepRequest.Steady steady
                ? "after " + words.units().figure(steady.days(), "day")
                : "at the end of the history";
    }

    private KeepRequest request(Where where) {
        KeepRequest.Condition condition;
        if (where.history == null) {
            refuse("--then", thenC);
            double told = days == null ? KeepRequest.Steady.USUAL_DAYS : days;
            condition = new KeepRequest.Steady(where.atC, told);
        } else {
            refuse("--days", days);
            refuse("--ethylene", ethylenePpm);
            condition = new KeepRequest.Logged(where.history, number(thenC));
        }
        return new KeepRequest(
                name,
                condition,
                number(humidityPct),
                number(usedPct),
                Optional.ofNullable(knownLife),
                looks.ripeness(),
                looks.cured(),
                number(ethylenePpm),
                number(ripeInDays),
                looks.variant());
    }

    private static void refuse(String option, @Nullable Double value) {
        if (value != null) {
            throw new BadInput(
                    option,
                    "",
                    "it does not go with the other options given",
                    "accepted: --days and --ethylene with --at, --then with --history");
        }
    }

    private static OptionalDouble number(@Nullable Double value) {
        return value == null ? OptionalDouble.empty() : OptionalDouble.of(value);
    }
}
