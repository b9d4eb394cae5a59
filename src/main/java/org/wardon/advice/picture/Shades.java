package org.wardon.advice.picture;

import java.util.Locale;

/** Colours from cold to warm: slate blue, paper, brick. Told apart without red and green too. */
final class Shades {
    private static final int[][] STOPS = {
        {46, 96, 140}, {131, 172, 196}, {238, 236, 225}, {224, 166, 112}, {176, 82, 48}
    };

    /** No eye tells more steps apart; neighbours alike are drawn as one. */
    private static final int STEPS = 60;

    private Shades() {}

    /** The colour of a share of the way from cold, 0, to warm, 1. */
    static String of(double share) {
        double step = Math.round(STEPS * Math.min(1, Math.max(0, share)));
        double place = step / STEPS * (STOPS.length - 1);
        int low = Math.min((int) place, STOPS.length - 2);
        double part = place - low;
        int[] mixed = new int[3];
        for (int i = 0; i < 3; i++) {
            double value = STOPS[low][i] + part * (STOPS[low + 1][i] - STOPS[low][i]);
            mixed[i] = (int) Math.round(value);
        }
        return String.format(Locale.ROOT, "#%02x%02x%02x", mixed[0], mixed[1], mixed[2]);
    }
}
