package org.wardon.reference.fits;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Map;
import org.wardon.errors.BadInput;
import org.wardon.keeping.pooling.DeviationSearch;
import org.wardon.keeping.pooling.Deviations;
import org.wardon.reference.ReferenceBook;

/**
 * Fits the curves of life and writes them as tables: run it after a change of the lives, of the
 * respiration or of the chilling floors, then build again.
 */
public final class FitLives {
    private FitLives() {}

    /**
     * Writes the tables, and a picture a commodity where a folder for pictures is given.
     *
     * @param args the folder of tables, the folder to write to, optionally a folder for pictures
     * @throws IOException if a file cannot be written
     */
    public static void main(String[] args) throws IOException {
        if (args.length < 2 || args.length > 3) {
            throw new BadInput(
                    "command line",
                    "",
                    args.length + " words",
                    "the folder of tables, the folder to write to, and a folder for pictures");
        }
        Fitted fitted = fit(Path.of(args[0]));
        write(Path.of(args[1]), fitted.tables());
        if (args.length > 2) {
            write(Path.of(args[2]), new LifePictures(fitted.used(), fitted.fits()).files());
        }
    }

    /**
     * What a fit gives.
     *
     * @param used the rows it used
     * @param fits the curves
     * @param deviations how much lives differ
     * @param tables contents of the tables by file name
     */
    record Fitted(LifeRows used, LifeFits fits, Deviations deviations, Map<String, String> tables) {
        Fitted {
            tables = Map.copyOf(tables);
        }
    }

    static Fitted fit(Path tables) {
        try (ReferenceBook book = ReferenceBook.open()) {
            LifeRows used = new LifeRows(tables, book.all());
            Deviations deviations = DeviationSearch.of(used.points());
            LifeFits fits = new LifeFits(used.rows(), deviations);
            return new Fitted(
                    used, fits, deviations, new LifeTables(used, fits, deviations).files());
        }
    }

    private static void write(Path folder, Map<String, String> files) throws IOException {
        Files.createDirectories(folder);
        for (Map.Entry<String, String> file : files.entrySet()) {
            Files.writeString(folder.resolve(file.getKey()), file.getValue());
        }
    }
}
