package org.wardon.cli;

import java.nio.file.Path;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import org.wardon.advice.PlanLookups;
import org.wardon.advice.wording.Units;
import org.wardon.advice.wording.Words;
import org.wardon.files.Lookups;
import org.wardon.reference.GoneLots;
import org.wardon.reference.OwnValues;
import org.wardon.reference.ReferenceBook;
import org.wardon.reference.StoreFolder;
import picocli.CommandLine.Option;

/** Options that every verb over the reference book takes. */
final class Shared {
    @Option(
            names = "--home",
            paramLabel = "DIR",
            description = {
                "Folder of the keeper's own values and lots (default: WARDON_HOME, else the user's data"
                        + " folder)."
            })
    private @Nullable Path home;

    @Option(names = "--fahrenheit", description = "Tell temperatures in °F.")
    private boolean fahrenheit;

    @Option(names = "--pounds", description = "Tell masses in lb.")
    private boolean pounds;

    /** Opens the book with the keeper's own values. */
    ReferenceBook book() {
        return ReferenceBook.open(ownValues(), goneLots().list());
    }

    /** The keeper's own values. */
    OwnValues ownValues() {
        return new OwnValues(folder());
    }

    /** The keeper's own lots that are gone. */
    GoneLots goneLots() {
        return new GoneLots(folder());
    }

    /** Folder of the keeper's own file. */
    Path folder() {
        return StoreFolder.of(
                Optional.ofNullable(home),
                System.getenv(),
                System.getProperty("os.name", ""),
                Path.of(System.getProperty("user.home", ".")));
    }

    /** What a plan may name. */
    Lookups lookups(ReferenceBook book) {
        return PlanLookups.of(book);
    }

    /** The words in the units asked for. */
    Words words() {
        return Words.english(new Units(fahrenheit, pounds));
    }
}
