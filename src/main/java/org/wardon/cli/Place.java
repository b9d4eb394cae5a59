package org.wardon.cli;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import org.wardon.advice.company.Borne;
import org.wardon.advice.placing.PlaceAdvice;
import org.wardon.advice.placing.PlaceQuestion;
import org.wardon.advice.placing.PlaceReport;
import org.wardon.files.AtomicFile;
import org.wardon.files.PlacedPlan;
import org.wardon.files.PlanReader;
import org.wardon.files.forecast.AnswerWriter;
import org.wardon.plan.PlaceWish;
import org.wardon.plan.StorePlan;
import org.wardon.reference.ReferenceBook;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** Places the lots of a plan. */
@Command(
        name = "place",
        mixinStandardHelpOptions = true,
        description = {
            "Says which lot goes into which chamber and what to set, for the most value net of power"
                    + " unless something else is wished; why, and what elsewhere would cost.",
            "Lots that have a chamber stay in it unless --may-move lets them go."
        })
final class Place implements Callable<Integer> {
    @Mixin private Shared shared = new Shared();

    @Parameters(paramLabel = "PLAN", description = "Store plan, a JSON file; see 'wardon schema'.")
    private Path plan = Path.of("");

    @Option(
            names = "--json",
            paramLabel = "OUT",
            description = "Write the placing as JSON to this file; - for standard output.")
    private @Nullable Path json;

    @Option(
            names = "--wish",
            paramLabel = "WISH",
            converter = WishWord.class,
            description = {
                "What comes first: most-value, most-days (for --lots), fewest-chambers, or"
                        + " lots-in-stay (most value, lots that are in already staying). Default:"
                        + " the plan's wish, else most-value."
            })
    private PlaceWish.@Nullable Aim wish;

    @Option(
            names = "--lots",
            paramLabel = "ID",
            split = ",",
            description = "Lots whose days come first, with --wish most-days.")
    private List<String> lots = new ArrayList<>();

    @Option(
            names = "--may-move",
            paramLabel = "ID",
            split = ",",
            arity = "0..1",
            fallbackValue = ALL,
            description = "Lots that may leave the chamber the plan has them in; alone: all.")
    private List<String> mayMove = new ArrayList<>();

    @Option(
            names = "--accept",
            paramLabel = "CONFLICT",
            split = ",",
            description = {
                "Conflicts that are accepted beside those the plan accepts, and what they cost"
                        + " told: ethylene, odour, uncured; CHAMBER:ethylene in one chamber only."
            })
    private List<String> accept = new ArrayList<>();

    @Option(
            names = "--write",
            paramLabel = "PLAN2",
            description = "Write the plan with the settings and chambers proposed to this file.")
    private @Nullable Path write;

    /** What stands where --may-move names no lot. */
    static final String ALL = "*";

    @Override
    public Integer call() {
        Terminal terminal = Terminal.ofProcess();
        boolean toStdout = json != null && json.toString().equals("-");
        if (json != null && !toStdout) {
            AtomicFile.tryOut(json);
        }
        if (write != null) {
            AtomicFile.tryOut(write);
        }
        try (ReferenceBook book = shared.book()) {
            StorePlan read = PlanReader.read(plan, shared.lookups(book));
            StorePlan asked = wished(Borne.within("--accept", accept, read));
            boolean all = mayMove.contains(ALL);
            PlaceQuestion question = new PlaceQuestion(all, all ? Set.of() : Set.copyOf(mayMove));
            PlaceReport report =
                    new PlaceAdvice(book, shared.words())
                            .place(asked, question, terminal.progress());
            if (write != null) {
                PlacedPlan.write(plan, write, read, report.proposed());
            }
            tell(report, toStdout, terminal);
        }
        return Exit.OK;
    }

    private void tell(PlaceReport report, boolean toStdout, Terminal terminal) {
        if (toStdout) {
            terminal.out().print(AnswerWriter.json(report.answer()));
            return;
        }
        if (json != null) {
            AnswerWriter.write(json, report.answer());
        }
        terminal.out().print(new PlacePage(report, shared.words(), terminal).text());
    }

    private StorePlan wished(StorePlan read) {
        PlaceWish has = read.wish();
        return read.wishing(
                new PlaceWish(
                        wish == null ? has.aim() : wish,
                        lots.isEmpty() ? has.lots() : lots,
                        has.accepts()));
    }

    /** Reads a wish as plans write it. */
    static final class WishWord implements picocli.CommandLine.ITypeConverter<PlaceWish.Aim> {
        @Override
        public PlaceWish.Aim convert(String word) {
            for (PlaceWish.Aim aim : PlaceWish.Aim.values()) {
                if (aim.word().equals(word.toLowerCase(Locale.ROOT))) {
                    return aim;
                }
            }
            throw new picocli.CommandLine.TypeConversionException(
                    "is '"
                            + word
                            + "'; accepted: most-value, most-days, fewest-chambers, lots-in-stay");
        }
    }
}
