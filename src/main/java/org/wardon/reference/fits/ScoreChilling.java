package org.wardon.reference.fits;

import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Locale;
import org.wardon.reference.ReferenceBook;
import org.wardon.reference.fits.LeaveOneExposure.Judged;

/** Says on which side published exposures to cold lie when each is left out, and lists misses. */
public final class ScoreChilling {
    private ScoreChilling() {}

    /**
     * Prints the score and every miss.
     *
     * @param args none
     */
    public static void main(String[] args) {
        PrintStream out = new PrintStream(System.out, true, StandardCharsets.UTF_8);
        try (ReferenceBook book = ReferenceBook.open()) {
            List<Judged> all = LeaveOneExposure.list(book.all());
            long right = all.stream().filter(Judged::right).count();
            long held = all.stream().filter(Judged::rightHeld).count();
            out.printf(
                    Locale.ROOT,
                    "%d exposures; right side %d (%.0f %%), with the handbook's condition held %d"
                            + " (%.0f %%)%n",
                    all.size(),
                    right,
                    100.0 * right / all.size(),
                    held,
                    100.0 * held / all.size());
            all.stream()
                    .filter(one -> !one.right() || !one.rightHeld())
                    .forEach(one -> miss(out, one));
        }
    }

    private static void miss(PrintStream out, Judged one) {
        out.printf(
                Locale.ROOT,
                "%s %s %s %.1f °C %s %.1f d %s %s: injured %.2f, held %.2f, zone below %.1f °C; %s%n",
                one.commodity().id(),
                one.row().ripeness(),
                one.row().variant(),
                one.row().temperatureC(),
                one.row().kind(),
                one.row().days().highest(),
                one.row().visible(),
                one.row().days().sourceId(),
                one.probability(),
                one.heldProbability(),
                one.topC(),
                WhyMissed.likely(one));
    }
}
