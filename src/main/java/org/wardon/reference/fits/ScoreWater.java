package org.wardon.reference.fits;

import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Locale;
import org.wardon.reference.ReferenceBook;
import org.wardon.reference.fits.WaterChecks.Checked;

/** Says how printed losses of water compare with the laws the program uses. */
public final class ScoreWater {
    private ScoreWater() {}

    /**
     * Prints every comparison and how many lie inside the range.
     *
     * @param args none
     */
    public static void main(String[] args) {
        PrintStream out = new PrintStream(System.out, true, StandardCharsets.UTF_8);
        try (ReferenceBook book = ReferenceBook.open()) {
            List<Checked> all = WaterChecks.list(book.all());
            List<Checked> others = all.stream().filter(one -> !one.itself()).toList();
            out.printf(
                    Locale.ROOT,
                    "%d printed losses, %d of them not the law's own; inside the range %d, within"
                            + " twice of its middle %d%n",
                    all.size(),
                    others.size(),
                    others.stream().filter(Checked::inside).count(),
                    others.stream().filter(one -> one.factor() <= 2).count());
            all.forEach(one -> line(out, one));
        }
    }

    private static void line(PrintStream out, Checked one) {
        out.printf(
                Locale.ROOT,
                "%s %s %s %s: printed %.3f, law %.3f to %.3f to %.3f%s%n",
                one.commodity().id(),
                one.row().variant(),
                one.row().loss().orElseThrow().sourceId(),
                one.row().loss().orElseThrow().unit(),
                one.printed(),
                one.low(),
                one.middle(),
                one.high(),
                one.itself() ? ", its own" : one.inside() ? "" : ", outside");
    }
}
