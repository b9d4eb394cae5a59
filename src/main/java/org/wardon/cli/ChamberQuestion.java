package org.wardon.cli;

import java.nio.file.Path;
import java.util.function.Supplier;
import org.wardon.advice.placing.OpenLots;
import org.wardon.errors.Progress;
import org.wardon.files.PlanReader;
import org.wardon.files.forecast.AnswerWriter;
import org.wardon.plan.StorePlan;
import org.wardon.reference.ReferenceBook;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** What every verb that asks about one chamber of a plan takes, and how it answers. */
final class ChamberQuestion {
    @Parameters(paramLabel = "PLAN", description = "Store plan, a JSON file; see 'wardon schema'.")
    private Path plan = Path.of("");

    @Option(
            names = "--chamber",
            paramLabel = "ID",
            required = true,
            description = "Chamber of the plan.")
    private String chamber = "";

    @Option(names = "--json", description = "Answer in JSON.")
    private boolean json;

    StorePlan plan(Shared shared, ReferenceBook book) {
        StorePlan read = PlanReader.read(plan, shared.lookups(book));
        return OpenLots.house(read, book, Progress.SILENT).plan();
    }

    String chamber() {
        return chamber;
    }

    void tell(Record answer, Supplier<String> page) {
        Terminal.ofProcess().out().print(json ? AnswerWriter.json(answer) : page.get());
    }
}
