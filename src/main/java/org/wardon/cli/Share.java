package org.wardon.cli;

import java.io.PrintStream;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import org.wardon.advice.company.ShareReport;
import org.wardon.advice.company.SharingAdvice;
import org.wardon.advice.wording.Words;
import org.wardon.errors.BadInput;
import org.wardon.files.forecast.AnswerWriter;
import org.wardon.reference.ReferenceBook;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** Says who may share a chamber. */
@Command(
        name = "share",
        mixinStandardHelpOptions = true,
        description = {
            "Says which crops may share a chamber for the days they are wanted, at what setting,"
                    + " and why not."
        })
final class Share implements Callable<Integer> {
    @Mixin private Shared shared = new Shared();

    @Parameters(
            arity = "1..*",
            paramLabel = "COMMODITY[=DAYS]",
            description = "Ids or common names; =DAYS for days of its own, such as mango=10.")
    private List<String> crops = List.of();

    @Option(
            names = "--days",
            paramLabel = "N",
            description = "Days wanted of each (7); two market days follow.")
    private @Nullable Double days;

    @Option(names = "--json", description = "Answer in JSON.")
    private boolean json;

    @Override
    public Integer call() {
        PrintStream out = Terminal.ofProcess().out();
        Words words = shared.words();
        try (ReferenceBook book = shared.book()) {
            ShareReport report = new SharingAdvice(book, words).ask(wanted());
            out.print(json ? AnswerWriter.json(report.answer()) : new SharePage(words).of(report));
        }
        return Exit.OK;
    }

    private Map<String, Double> wanted() {
        double all = days == null ? SharingAdvice.USUAL_DAYS : days;
        Map<String, Double> wanted = new LinkedHashMap<>();
        for (String crop : crops) {
            int equals = crop.indexOf('=');
            String name = equals < 0 ? crop : crop.substring(0, equals);
            double own = equals < 0 ? all : number(crop, crop.substring(equals + 1));
            if (wanted.put(name, own) != null) {
                throw new BadInput(crop, "", "it is named twice", "name each crop once");
            }
        }
        return wanted;
    }

    private static double number(String crop, String text) {
        try {
            return Double.parseDouble(text);
        } catch (NumberFormatException e) {
            throw new BadInput(
                    crop, "", "'" + text + "' is no number of days", "accepted: such as mango=10");
        }
    }
}
