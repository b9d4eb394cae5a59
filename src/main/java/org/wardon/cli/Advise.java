package org.wardon.cli;

import java.nio.file.Path;
import java.util.concurrent.Callable;
import org.wardon.files.PlanReader;
import org.wardon.reference.ReferenceBook;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Parameters;

/** The main job: advice on a store plan. */
@Command(
        name = "advise",
        mixinStandardHelpOptions = true,
        description = {
            "Forecasts every chamber and lot of a store plan hour by hour and says what to do."
        })
final class Advise implements Callable<Integer> {
    @Mixin private Shared shared = new Shared();

    @Mixin private AdviceOutput output = new AdviceOutput();

    @Parameters(paramLabel = "PLAN", description = "Store plan, a JSON file; see 'wardon schema'.")
    private Path plan = Path.of("");

    @Override
    public Integer call() {
        try (ReferenceBook book = shared.book()) {
            output.advise(PlanReader.read(plan, shared.lookups(book)), book, shared);
        }
        return Exit.OK;
    }
}
