package org.wardon.plan;

import java.util.regex.Pattern;
import org.wardon.errors.Require;

/** Ids of chambers, lots and build-ups: letters, digits, {@code -} and {@code _}, up to 40. */
final class Ids {
    private static final Pattern ID = Pattern.compile("[A-Za-z0-9_-]{1,40}");

    private Ids() {}

    static void check(String what, String id) {
        Require.that(
                ID.matcher(id).matches(),
                "id '" + id + "' of a " + what + " must be 1 to 40 letters, digits, '-' or '_'");
    }
}
