package org.wardon.reference;

/**
 * How many slips of the pen lie between two words: a letter left out, put in, changed, or two
 * neighbours swapped.
 *
 * <p>Source: Damerau 1964, the restricted form that edits no letter twice.
 */
final class EditDistance {
    private EditDistance() {}

    static int between(String one, String other) {
        int[][] cost = new int[one.length() + 1][other.length() + 1];
        for (int i = 0; i <= one.length(); i++) {
            cost[i][0] = i;
        }
        for (int j = 0; j <= other.length(); j++) {
            cost[0][j] = j;
        }
        for (int i = 1; i <= one.length(); i++) {
            for (int j = 1; j <= other.length(); j++) {
                int change = one.charAt(i - 1) == other.charAt(j - 1) ? 0 : 1;
                cost[i][j] =
                        Math.min(
                                cost[i - 1][j - 1] + change,
                                1 + Math.min(cost[i - 1][j], cost[i][j - 1]));
                if (i > 1
                        && j > 1
                        && one.charAt(i - 1) == other.charAt(j - 2)
                        && one.charAt(i - 2) == other.charAt(j - 1)) {
                    cost[i][j] = Math.min(cost[i][j], cost[i - 2][j - 2] + 1);
                }
            }
        }
        return cost[one.length()][other.length()];
    }
}
