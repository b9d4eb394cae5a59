package org.wardon.sharing.placing;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Objects;
import java.util.stream.Stream;
import java.util.zip.CRC32;

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
                            Double.parseDouble(cells[1]),
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

    /** Few crops on two days, lots of a crop alike. */
    static Drawn alike(int seed) {
        Mix mix = Mix.ofAllCrops(0.97).few(2, 2, true);
        return new Drawn("alike-" + seed, INSTANCES.draw(20, 3, mix, seed), 20);
    }

    /** What it answered; the store must be the one it was asked about. */
    Oracle.Answer answer(Drawn drawn) {
        double[] row = Objects.requireNonNull(rows.get(drawn.name()), drawn.name() + AGAIN);
        assertEquals(drawn.seconds(), row[0], drawn.name() + AGAIN);
        assertEquals(digest(drawn.problem()), (long) row[1], drawn.name() + AGAIN);
        return new Oracle.Answer(row[2], row[3], row[2] == row[3]);
    }

    /** Of every number of a store to nine digits; what another machine's last digit is, is not. */
    private static long digest(PlacingProblem problem) {
        CRC32 digest = new CRC32();
        for (LotToPlace lot : problem.lots()) {
            add(digest, lot.massKg(), lot.volumeM3(), lot.firstDay(), lot.lastDay());
        }
        for (ChamberToFill chamber : problem.chambers()) {
            add(digest, chamber.massKg(), chamber.volumeM3());
            for (Offer offer : chamber.offers()) {
                add(digest, offer.cost(), offer.costPerWDay());
                offer.coolingW().forEach(watt -> add(digest, watt));
                add(digest, problem, offer.climate());
            }
        }
        return digest.getValue();
    }

    private static void add(CRC32 digest, PlacingProblem problem, Climate climate) {
        for (int l = 0; l < problem.lots().size(); l++) {
            add(digest, climate.worth(l));
            for (int d = 0; d < problem.days(); d++) {
                add(digest, climate.heatW(l, d));
            }
            for (int o = 0; o < problem.lots().size(); o++) {
                add(digest, climate.lossTogether(l, o));
            }
        }
    }

    private static void add(CRC32 digest, double... values) {
        for (double value : values) {
            String digits = String.format(Locale.ROOT, "%.8e;", value + 0.0);
            digest.update(digits.getBytes(StandardCharsets.US_ASCII));
        }
    }

    private static List<Drawn> all() {
        List<Drawn> all = new ArrayList<>();
        for (int seed = 1; seed <= 3; seed++) {
            all.add(large(seed));
        }
        for (int number = 0; number < Mix.all(1).size(); number++) {
            for (double share : new double[] {0.5, 0.97, 1.5}) {
                all.add(mixed(number, share));
            }
        }
        for (int seed = 1; seed <= 4; seed++) {
            all.add(alike(seed));
        }
        return all;
    }

    private static String asked(Drawn drawn) {
        Oracle.Answer answer = Oracle.ask(drawn.problem(), drawn.seconds());
        double value = answer.value() + 0.0;
        double bound = answer.proven() ? value : answer.bound();
        return String.format(
                Locale.ROOT,
                "%s,%.0f,%s,%s,%s",
                drawn.name(),
                drawn.seconds(),
                digest(drawn.problem()),
                value,
                bound);
    }

    /**
     * Asks the general solver and writes the file.
     *
     * @param args beginnings of the names of the stores to be asked about, the others keep their
     *     rows; none for all
     * @throws IOException where the file cannot be written
     */
    public static void main(String[] args) throws IOException {
        List<String> known = lines();
        List<String> lines = new ArrayList<>();
        lines.add("# CP-SAT of OR-Tools, two threads, the seconds in the row; written by");
        lines.add(
                "# org.wardon.sharing.placing.FrozenOracle of the tests. digest tells the store.");
        lines.add("store,seconds,digest,value,bound");
        for (Drawn drawn : all()) {
            boolean anew = args.length == 0 || Stream.of(args).anyMatch(drawn.name()::startsWith);
            if (anew) {
                lines.add(asked(drawn));
            } else {
                known.stream()
                        .filter(line -> line.startsWith(drawn.name() + ","))
                        .forEach(lines::add);
            }
        }
        Files.write(FILE, lines);
    }
}
