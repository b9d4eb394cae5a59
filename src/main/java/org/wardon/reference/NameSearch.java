package org.wardon.reference;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.wardon.reference.NameMatch.How;

/**
 * Ranks the commodities that a text may mean: by how it meets one of their names, then by how far
 * off it is, then by how much of the name it covers.
 *
 * <p>Sources: Damerau 1964 for slips of the pen; Dice 1945 over runs of three letters for what only
 * sounds alike. How far off is still understood is ours.
 */
final class NameSearch {
    private static final int FEWEST_LETTERS = 3;
    private static final int SHORT_SLIPS = 2;
    private static final double ALIKE = 0.4;

    private final List<Known> known;

    NameSearch(List<Known> known) {
        this.known = List.copyOf(known);
    }

    /**
     * A name.
     *
     * @param plain as compared
     * @param name as written
     * @param id the commodity it leads to
     */
    record Known(String plain, String name, String id) {}

    private record Met(Known known, How how, double off) {
        private static final Comparator<Met> SUREST =
                Comparator.comparing(Met::how)
                        .thenComparingDouble(Met::off)
                        .thenComparingInt(Met::left)
                        .thenComparing(met -> met.known().id());

        /** What of a name that is begun is still to be typed. */
        int left() {
            return how == How.BEGINNING ? known.plain().length() : 0;
        }
    }

    /** Surest first, each commodity once. */
    List<NameMatch> find(List<String> singulars) {
        String text = singulars.get(0);
        List<Met> met = new ArrayList<>();
        if (!text.isEmpty()) {
            known.forEach(name -> met(name, singulars).ifPresent(met::add));
        }
        met.sort(Met.SUREST);
        List<NameMatch> found = new ArrayList<>();
        Set<String> ids = new HashSet<>();
        for (Met one : met) {
            if (ids.add(one.known().id())) {
                found.add(new NameMatch(one.known().id(), one.known().name(), one.how()));
            }
        }
        return found;
    }

    private static Optional<Met> met(Known known, List<String> singulars) {
        String text = singulars.get(0);
        String name = known.plain();
        if (singulars.contains(name)) {
            return Optional.of(new Met(known, How.NAME, 0));
        }
        if (singulars.stream().anyMatch(one -> (" " + name + " ").contains(" " + one + " "))) {
            return Optional.of(new Met(known, How.WORD, 0));
        }
        if (singulars.stream().anyMatch(name::startsWith)) {
            return Optional.of(new Met(known, How.BEGINNING, 0));
        }
        boolean parts =
                text.length() >= FEWEST_LETTERS
                        && Arrays.stream(text.split(" ", -1)).allMatch(name::contains);
        if (parts) {
            return Optional.of(new Met(known, How.PART, 0));
        }
        int slips = EditDistance.between(text, name);
        if (slips <= Math.max(SHORT_SLIPS, text.length() / 3) && slips < text.length()) {
            return Optional.of(new Met(known, How.SLIP, slips));
        }
        double alike = alike(text, name);
        return alike >= ALIKE
                ? Optional.of(new Met(known, How.ALIKE, 1 - alike))
                : Optional.empty();
    }

    /** Twice the runs of three letters they share over all they have. */
    private static double alike(String one, String other) {
        Map<String, Integer> runs = runs(one);
        int all = one.length() + other.length();
        int shared = 0;
        for (Map.Entry<String, Integer> run : runs(other).entrySet()) {
            shared += Math.min(run.getValue(), runs.getOrDefault(run.getKey(), 0));
        }
        return 2.0 * shared / all;
    }

    /**
     * Runs of three letters, the edges of the text counted as blanks; as many as it has letters.
     */
    private static Map<String, Integer> runs(String text) {
        String padded = " " + text + " ";
        Map<String, Integer> runs = new HashMap<>();
        for (int i = 0; i + FEWEST_LETTERS <= padded.length(); i++) {
            runs.merge(padded.substring(i, i + FEWEST_LETTERS), 1, Integer::sum);
        }
        return runs;
    }
}
