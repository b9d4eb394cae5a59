package org.wardon.files.json;

import java.util.Collection;
import java.util.Comparator;
import java.util.Locale;
import java.util.Optional;

/**
 * The known name nearest to a misspelt one: fewest letters put in, left out, replaced or swapped
 * with a neighbour (Damerau 1964, restricted form), capitals and hyphens aside.
 */
public final class Nearest {
    private Nearest() {}

    /**
     * Returns the nearest known name.
     *
     * @param name the misspelt name
     * @param known names to choose from
     * @return the nearest, where at most a third of the letters are wrong; of equals the first by
     *     the alphabet
     */
    public static Optional<String> of(String name, Collection<String> known) {
        String plain = plain(name);
        int limit = Math.max(1, plain.length() / 3);
        return known.stream()
                .filter(other -> Math.abs(plain(other).length() - plain.length()) <= limit)
                .filter(other -> distance(plain, plain(other)) <= limit)
                .min(
                        Comparator.comparingInt((String other) -> distance(plain, plain(other)))
                                .thenComparing(Comparator.naturalOrder()));
    }

    /**
     * Returns the question to ask after a misspelt name.
     *
     * @param name the misspelt name
     * @param known names to choose from
     * @return such as {@code "did you mean 'mango'? "}, or an empty text
     */
    public static String question(String name, Collection<String> known) {
        return of(name, known).map(near -> "did you mean '" + near + "'? ").orElse("");
    }

    private static String plain(String name) {
        return name.toLowerCase(Locale.ROOT).replaceAll("[-_ ]", "");
    }

    private static int distance(String a, String b) {
        int[][] cost = new int[a.length() + 1][b.length() + 1];
        for (int i = 0; i <= a.length(); i++) {
            for (int j = 0; j <= b.length(); j++) {
                cost[i][j] = i == 0 || j == 0 ? i + j : cheapest(a, b, i, j, cost);
            }
        }
        return cost[a.length()][b.length()];
    }

    private static int cheapest(String a, String b, int i, int j, int[][] cost) {
        int replace = a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1;
        int best =
                Math.min(
                        cost[i - 1][j - 1] + replace, Math.min(cost[i - 1][j], cost[i][j - 1]) + 1);
        boolean swapped =
                i > 1
                        && j > 1
                        && a.charAt(i - 1) == b.charAt(j - 2)
                        && a.charAt(i - 2) == b.charAt(j - 1);
        return swapped ? Math.min(best, cost[i - 2][j - 2] + 1) : best;
    }
}
