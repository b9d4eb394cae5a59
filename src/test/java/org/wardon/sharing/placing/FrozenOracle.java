package org.wardon.sharing.placing;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Objects;

/**
 * What the general solver answered on the larger drawn stores, written down since it needs minutes.
 * Its {@code main} asks it anew and writes the file; a store that is no longer the one asked about
 * fails the test that wants it.
 */
final class FrozenOracle {
    private static final Path FILE =
            Path.of("src/test/resources/published/or-tools-9.15.6755-placing.csv");
    private static final Instances INSTANCES = new Instances();
    private static final String AGAIN =
            " is no longer the store the general solver was asked about: run"
                    + " org.wardon.sharing.placing.FrozenOracle on the test class path";

    private final Map<String, double[]> rows = new HashMap<>();

    /**
     * A drawn store, and how long the general solver may look at it.
     *
     * @param name stands in the file
     * @param problem the store
     * @param seconds time for the general solver
     */
    record Drawn(String name, PlacingProblem problem, double seconds) {}

    FrozenOracle() {
        for (String line : lines()) {
            if (!line.startsWith("#") && !line.startsWith("store,")) {
                String[] cells = line.split(",", -1);
                rows.put(
                        cells[0],
                        new double[] {
                            Double.parseDouble(cells[2]),
                            Double.parseDouble(cells[3]),
                            Double.parseDouble(cells[4])
                        });
            }
        }
    }

    private static List<String> lines() {
        try {
            return Files.readAllLines(FILE);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    static Drawn large(int seed) {
        return new Drawn("60x6-" + seed, INSTANCES.draw(60, 6, 0.97, seed), 10);
    }

    static Drawn mixed(int number, double share) {
        Mix mix = Mix.all(share).get(number);
        return new Drawn("mix-" + number + "-" + share, INSTANCES.draw(30, 4, mix, 10 + number), 3);
    }

    /** What it answered; the store must be the one it was asked about. */
    Oracle.Answer answer(Drawn drawn) {
        double[] row = Objects.requireNonNull(rows.get(drawn.name()), drawn.name() + AGAIN);
        double sum = sum(drawn.problem());
        assertEquals(row[0], sum, 1e-9 * Math.abs(sum), drawn.name() + AGAIN);
        return new Oracle.Answer(row[1], row[2], row[1] == row[2]);
    }

    /** One number that changes with every worth, heat, loss, limit and cost of a store. */
    private static double sum(PlacingProblem problem) {
        double sum = 0;
        double weight = 1;
        for (ChamberToFill chamber : problem.chambers()) {
            sum += chamber.massKg() + 7 * chamber.volumeM3();
            for (Offer offer : chamber.offers()) {
                weight = weight % 97 + 1;
                sum += weight * (sum(problem, offer.climate()) + finite(offer.cost()));
                sum += 1e3 * offer.costPerWDay();
                for (double watt : offer.coolingW()) {
                    sum += weight * watt;
                }
            }
        }
        return sum;
    }

    private static double sum(PlacingProblem problem, Climate climate) {
        double sum = 0;
        for (int l = 0; l < problem.lots().size(); l++) {
            LotToPlace lot = problem.lots().get(l);
            double own = finite(climate.worth(l)) + lot.massKg() + 3 * lot.volumeM3();
            for (int d = lot.firstDay(); d <= lot.lastDay(); d++) {
                own += (1 + d) * climate.heatW(l, d);
            }
            for (int o = 0; o < problem.lots().size(); o++) {
                own += (1 + o) * finite(climate.lossTogether(l, o));
            }
            sum += (1 + l) * own;
        }
        return sum;
    }

    /** What stands for never and for any number would drown all others. */
    private static double finite(double money) {
        return Math.abs(money) < 1e6 ? money : Math.signum(money);
    }

    /**
     * Asks the general solver about every store and writes the file.
     *
     * @param args none
     * @throws IOException where the file cannot be written
     */
    public static void main(String[] args) throws IOException {
        List<Drawn> all = new ArrayList<>();
        for (int seed = 1; seed <= 3; seed++) {
            all.add(large(seed));
        }
        for (int number = 0; number < Mix.all(1).size(); number++) {
            for (double share : new double[] {0.5, 0.97, 1.5}) {
                all.add(mixed(number, share));
            }
        }
        List<String> lines = new ArrayList<>();
        lines.add("# CP-SAT of OR-Tools, two threads, the seconds in the row; written by");
        lines.add("# org.wardon.sharing.placing.FrozenOracle of the tests. sum tells the store.");
        lines.add("store,seconds,sum,value,bound");
        for (Drawn drawn : all) {
            Oracle.Answer answer = Oracle.ask(drawn.problem(), drawn.seconds());
            double value = answer.value() + 0.0;
            double bound = answer.proven() ? value : answer.bound();
            lines.add(
                    String.format(
                            Locale.ROOT,
                            "%s,%.0f,%s,%s,%s",
                            drawn.name(),
                            drawn.seconds(),
                            sum(drawn.problem()),
                            value,
                            bound));
        }
        Files.write(FILE, lines);
    }
}
