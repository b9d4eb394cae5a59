package org.wardon.cli;

import java.util.concurrent.Callable;
import org.wardon.files.Schema;
import picocli.CommandLine.Command;

/** Prints the schema of a store plan. */
@Command(
        name = "schema",
        mixinStandardHelpOptions = true,
        description = "Prints the JSON Schema (2020-12) of a store plan.")
final class SchemaVerb implements Callable<Integer> {
    @Override
    public Integer call() {
        Terminal.ofProcess().out().print(Schema.text());
        return Exit.OK;
    }
}
