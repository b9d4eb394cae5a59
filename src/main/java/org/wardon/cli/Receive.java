package org.wardon.cli;

import java.nio.file.Path;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import org.wardon.advice.placing.OpenLots;
import org.wardon.advice.receiving.NewLot;
import org.wardon.advice.receiving.Receiving;
import org.wardon.errors.BadInput;
import org.wardon.errors.Progress;
import org.wardon.files.AtomicFile;
import org.wardon.files.Lookups;
import org.wardon.files.LotIntoPlan;
import org.wardon.files.PlanReader;
import org.wardon.files.TextFile;
import org.wardon.files.forecast.AnswerWriter;
import org.wardon.files.forecast.ReceiveAnswer;
import org.wardon.reference.ReferenceBook;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** Says where a lot goes that comes to the door. */
@Command(
        name = "receive",
        mixinStandardHelpOptions = true,
        description = {
            "Says where a lot goes that comes to the door: how long it keeps in each chamber, in the"
                    + " shade and if it is sold now, and what it does to the lots that stand there;"
                    + " puts it into the plan if asked."
        })
final class Receive implements Callable<Integer> {
    private static final String BEST = "best";

    @Mixin private Shared shared = new Shared();

    @Parameters(paramLabel = "PLAN", description = "Store plan, a JSON file; see 'wardon schema'.")
    private Path plan = Path.of("");

    @Mixin private NewLotWords newLot = new NewLotWords();

    @Option(
            names = "--json",
            paramLabel = "OUT",
            description = "Write the answer as JSON to this file; - for standard output.")
    private @Nullable Path json;

    @Option(
            names = "--put",
            paramLabel = "CHAMBER",
            description = "Put the lot into this chamber of the plan, or 'best'; with --write.")
    private @Nullable String put;

    @Option(
            names = "--write",
            paramLabel = "FILE",
            description = "With --put: write the plan with the lot here; all else stays as typed.")
    private @Nullable Path write;

    @Override
    public Integer call() {
        if ((put == null) != (write == null)) {
            throw new BadInput(
                    put == null ? "--write" : "--put",
                    "",
                    "stands alone",
                    "accepted: --put CHAMBER together with --write FILE");
        }
        try (ReferenceBook book = shared.book()) {
            answer(book);
        }
        return Exit.OK;
    }

    private void answer(ReferenceBook book) {
        Lookups lookups = shared.lookups(book);
        String text = TextFile.read(plan, plan.toString(), PlanReader.LARGEST_MB);
        NewLot lot = newLot.lot();
        Receiving receiving =
                Receiving.of(
                        OpenLots.house(PlanReader.read(text, plan, lookups), book, Progress.SILENT)
                                .plan(),
                        book,
                        shared.words());
        ReceiveAnswer answer = receiving.answer(lot);
        if (put != null && write != null) {
            String chamber = chamber(put, receiving, answer);
            String with =
                    LotIntoPlan.addedTo(text, plan.toString(), receiving.placed(lot, chamber));
            // What it names has to be found from where it is to stand.
            PlanReader.read(with, write, lookups);
            Path file = write;
            AtomicFile.write(file, out -> out.write(with));
        }
        tell(answer);
    }

    private void tell(ReceiveAnswer answer) {
        Terminal terminal = Terminal.ofProcess();
        if (json != null && json.toString().equals("-")) {
            terminal.out().print(AnswerWriter.json(answer));
            return;
        }
        if (json != null) {
            AnswerWriter.write(json, answer);
        }
        terminal.out().print(new ReceivePage(shared.words(), terminal).of(answer));
        if (put != null) {
            terminal.out().println("Written to " + write + " as " + answer.lot() + ".");
        }
    }

    private static String chamber(String put, Receiving receiving, ReceiveAnswer answer) {
        if (put.equals(BEST)) {
            return answer.choices()
                    .get(0)
                    .chamber()
                    .orElseThrow(
                            () ->
                                    new BadInput(
                                            "--put",
                                            "",
                                            "is 'best', but the best is no chamber: "
                                                    + answer.sentence(),
                                            "accepted: a chamber by its id, if you must"));
        }
        return receiving.chamber(put);
    }
}
