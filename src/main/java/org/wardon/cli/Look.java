package org.wardon.cli;

import java.io.PrintStream;
import java.util.List;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import org.wardon.errors.BadInput;
import org.wardon.files.forecast.AnswerWriter;
import org.wardon.files.forecast.LookAnswer;
import org.wardon.files.forecast.LookList;
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

    @Mixin private OwnWords own = new OwnWords();

    @Option(names = "--json", description = "Answer in JSON.")
    private boolean json;

    @Override
    public Integer call() {
        PrintStream out = Terminal.ofProcess().out();
        if (own.asked()) {
            change();
        }
        try (ReferenceBook book = shared.book()) {
            out.print(name == null ? list(book) : of(book, book.named(name)));
        }
        return Exit.OK;
    }

    private void change() {
        if (name == null) {
            throw new BadInput(
                    "look",
                    "",
                    "an own value needs its commodity",
                    "accepted: look COMMODITY --own ...");
        }
        try (ReferenceBook book = shared.book()) {
            own.change(shared.ownValues(), book.named(name).id());
        }
    }

    private String list(ReferenceBook book) {
        List<LookList.Entry> entries =
                book.all().stream().map(one -> new LookList.Entry(one.id(), one.names())).toList();
        if (json) {
            return AnswerWriter.json(new LookList(entries));
        }
        Table table = new Table("id", "name");
        entries.forEach(entry -> table.row(entry.commodity(), entry.names().get(0)));
        return table.text();
    }

    private String of(ReferenceBook book, Commodity commodity) {
        List<NamedFact> facts = book.facts(commodity.id());
        return json
                ? AnswerWriter.json(LookAnswer.of(commodity, facts))
                : new LookPage(book, shared.words().units()).of(commodity, facts);
    }
}
