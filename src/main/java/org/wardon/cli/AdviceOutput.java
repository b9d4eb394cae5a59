package org.wardon.cli;

import java.nio.file.Path;
import org.jspecify.annotations.Nullable;
import org.wardon.advice.forecast.ForecastAdvice;
import org.wardon.advice.forecast.StoreAdvice;
import org.wardon.advice.placing.OpenLots;
import org.wardon.files.AtomicFile;
import org.wardon.files.forecast.AnswerWriter;
import org.wardon.plan.StorePlan;
import org.wardon.reference.ReferenceBook;
import picocli.CommandLine.Option;

/** Where the advice goes. */
final class AdviceOutput {
    @Option(
            names = "--json",
            paramLabel = "OUT",
            description = "Write the forecast as JSON to this file; - for standard output.")
    private @Nullable Path json;

    @Option(
            names = "--series",
            paramLabel = "DIR",
            description = "Write hourly series of chambers and lots as CSV into this folder.")
    private @Nullable Path series;

    @Option(names = "--notes", description = "Print every note, defaults taken included.")
    private boolean notes;

    void advise(StorePlan plan, ReferenceBook book, Shared shared) {
        Terminal terminal = Terminal.ofProcess();
        boolean toStdout = json != null && json.toString().equals("-");
        if (json != null && !toStdout) {
            AtomicFile.tryOut(json);
        }
        if (series != null) {
            AtomicFile.folder(series);
        }
        OpenLots.Housed housed = OpenLots.house(plan, book, terminal.progress());
        StoreAdvice advice =
                new ForecastAdvice(book, shared.words())
                        .advise(housed.plan(), housed.told(), terminal.progress());
        if (series != null) {
            advice.writeSeries(series);
        }
        if (toStdout) {
            terminal.out().print(AnswerWriter.json(advice.forecast()));
            return;
        }
        if (json != null) {
            AnswerWriter.write(json, advice.forecast());
        }
        terminal.out().print(new AdvicePage(advice, shared.words(), terminal, notes).text());
    }
}
