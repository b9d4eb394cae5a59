package org.wardon.reference.fits;

import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.function.Predicate;
import java.util.function.ToDoubleFunction;

/** Says how well the curves of life meet what they were not shown. */
public final class ScoreLives {
    private static final double HUNDRED = 100;

    private final FitLives.Fitted fitted;
    private final PrintStream out;

    private ScoreLives(FitLives.Fitted fitted, PrintStream out) {
        this.fitted = fitted;
        this.out = out;
    }

    /**
     * Prints the scores as the tables of DEVELOPERS.md, then every life a range missed.
     *
     * @param args the folder of tables
     */
    public static void main(String[] args) {
        PrintStream out = new PrintStream(System.out, true, StandardCharsets.UTF_8);
        new ScoreLives(FitLives.fit(Path.of(args[0])), out).print();
    }

    private void print() {
        List<LeftOut> left = new LeaveOneTemperature(fitted.used(), fitted.deviations()).list();
        out.println("| left out: a temperature | lives | pooled | generic, nearest | coldest |");
        out.println("| --- | --- | --- | --- | --- |");
        errors("interior temperatures", left, LeftOut::interior);
        errors("all", left, one -> true);
        errors("cool crops", left, one -> !one.chills());
        errors("chilling crops", left, LeftOut::chills);
        List<LeaveOneSource.Covered> covered =
                new LeaveOneSource(fitted.used(), fitted.deviations()).list();
        out.println();
        out.println("| left out: a source | lives | covered | p50/p10 | p90/p50 |");
        out.println("| --- | --- | --- | --- | --- |");
        ranges("all", covered, one -> true);
        ranges("exact lives", covered, one -> one.row().isLife());
        ranges("without repeats of the handbook", covered, one -> !one.repeats());
        ranges("bounds", covered, one -> !one.row().isLife());
        covered.stream().filter(one -> !one.agrees()).forEach(this::miss);
    }

    private void errors(String name, List<LeftOut> all, Predicate<LeftOut> which) {
        List<LeftOut> some = all.stream().filter(which).toList();
        out.printf(
                Locale.ROOT,
                "| %s | %d | %.1f %% | %.1f %% | %.1f %% |%n",
                name,
                some.size(),
                HUNDRED * median(some, LeftOut::fittedError),
                HUNDRED * median(some, LeftOut::genericError),
                HUNDRED * median(some, LeftOut::genericColdError));
    }

    static <T> double median(List<T> all, ToDoubleFunction<T> value) {
        return LeaveOneSource.median(all.stream().map(value::applyAsDouble).toList());
    }

    private void ranges(
            String name,
            List<LeaveOneSource.Covered> all,
            Predicate<LeaveOneSource.Covered> which) {
        List<LeaveOneSource.Covered> some = all.stream().filter(which).toList();
        long met = some.stream().filter(LeaveOneSource.Covered::agrees).count();
        out.printf(
                Locale.ROOT,
                "| %s | %d | %.0f %% | %.2f | %.2f |%n",
                name,
                some.size(),
                HUNDRED * met / some.size(),
                median(some, LeaveOneSource.Covered::widthDown),
                median(some, LeaveOneSource.Covered::widthUp));
    }

    private void miss(LeaveOneSource.Covered one) {
        out.printf(
                Locale.ROOT,
                "%s %s %.1f °C %s: printed %.1f d (%s), range %.1f %.1f %.1f%n",
                one.row().known().of().crop(),
                one.row().variant(),
                one.row().known().temperatureC(),
                one.row().known().of().source(),
                Math.exp(one.row().known().lnDays()),
                one.row().use(),
                one.p10(),
                one.p50(),
                one.p90());
    }
}
