package org.wardon.cli;

import java.io.PrintStream;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import org.wardon.files.forecast.AnswerWriter;
import org.wardon.files.forecast.LookAnswer;
import org.wardon.produce.Commodity;
import org.wardon.produce.NamedFact;
import org.wardon.reference.ReferenceBook;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** Shows what print says of a commodity. */
@Command(
        name = "look",
        mixinStandardHelpOptions = true,
        description = {
            "Shows all facts of a commodity with their sources; without a name, lists the"
                    + " commodities."
        })
final class Look implements Callable<Integer> {
    @Mixin private Shared shared = new Shared();

    @Parameters(
            arity = "0..1",
            paramLabel = "COMMODITY",
            description = "Its id or any common name, such as mango or lady's finger.")
    private @Nullable String name;

    @Option(names = "--json", description = "Answer in JSON.")
    private boolean json;

    @Override
    public Integer call() {
        PrintStream out = Terminal.ofProcess().out();
        try (ReferenceBook book = shared.book()) {
            if (name == null) {
                book.list()
                        .forEach(id -> out.printf("%-22s %s%n", id, book.get(id).names().get(0)));
            } else {
                show(book, book.named(name), out);
            }
        }
        return Exit.OK;
    }

    private void show(ReferenceBook book, Commodity commodity, PrintStream out) {
        List<NamedFact> facts = book.facts(commodity.id());
        if (json) {
            out.print(AnswerWriter.json(LookAnswer.of(commodity, facts)));
            return;
        }
        out.println(String.join(", ", commodity.names()) + "  [" + commodity.id() + "]");
        out.println();
        Set<String> sources = new LinkedHashSet<>();
        for (NamedFact fact : facts) {
            out.println(line(fact));
            sources.addAll(List.of(fact.sourceId().split(";", -1)));
        }
        out.println();
        out.println("Sources");
        for (String id : sources) {
            out.println("  " + id + ": " + book.source(id).citation());
        }
    }

    private static String line(NamedFact fact) {
        String range = range(fact.low(), fact.high());
        String value = range.isEmpty() ? fact.text() : range + " " + sign(fact.unit());
        String note = fact.note().isBlank() ? "" : "  (" + fact.note() + ")";
        return String.format(
                Locale.ROOT,
                "  %-34s %-22s %s, %s%s%s",
                fact.name(),
                value.strip(),
                fact.sourceId(),
                fact.evidence().word(),
                fact.own() ? " [own]" : "",
                note);
    }

    /** The unit as a person writes it. */
    private static String sign(String unit) {
        return switch (unit) {
            case "C" -> "°C";
            case "pct" -> "%";
            case "1" -> "";
            default -> unit;
        };
    }

    private static String range(OptionalDouble low, OptionalDouble high) {
        if (low.isEmpty() && high.isEmpty()) {
            return "";
        }
        if (low.isEmpty()) {
            return "up to " + plain(high.getAsDouble());
        }
        if (high.isEmpty()) {
            return "from " + plain(low.getAsDouble());
        }
        double a = low.getAsDouble();
        double b = high.getAsDouble();
        return a == b ? plain(a) : plain(a) + " to " + plain(b);
    }

    private static String plain(double value) {
        return AnswerWriter.text(value);
    }
}
