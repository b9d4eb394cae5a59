package org.wardon.sharing;

/**
 * How far the settings that two lots bear lie apart.
 *
 * @param kelvins distance between the ranges of temperature, K; 0 or less where they meet
 * @param colder id of the lot that wants it colder
 * @param colderHighC highest temperature it bears, °C
 * @param warmer id of the other
 * @param warmerLowC lowest temperature the other bears, °C
 * @param humidityPct distance between the humidities at the temperatures they share, percent
 */
record Gap(
        double kelvins,
        String colder,
        double colderHighC,
        String warmer,
        double warmerLowC,
        double humidityPct) {
    static Gap between(Workable a, Workable b) {
        boolean[] worksA = works(a);
        boolean[] worksB = works(b);
        Gap ab = gap(a, worksA, b, worksB);
        Gap ba = gap(b, worksB, a, worksA);
        return ab.kelvins > ba.kelvins ? ab : ba;
    }

    private static boolean[] works(Workable lot) {
        boolean[] works = new boolean[Settings.TEMPERATURES];
        for (int t = 0; t < works.length; t++) {
            for (int h = 0; h < Settings.HUMIDITIES; h++) {
                works[t] |= lot.bearable(t, h);
            }
        }
        return works;
    }

    private static Gap gap(Workable cold, boolean[] worksCold, Workable warm, boolean[] worksWarm) {
        double high = Double.NEGATIVE_INFINITY;
        double low = Double.POSITIVE_INFINITY;
        double split = Double.POSITIVE_INFINITY;
        for (int t = 0; t < worksCold.length; t++) {
            if (worksCold[t]) {
                high = Math.max(high, Settings.temperatureC(t));
            }
            if (worksWarm[t]) {
                low = Math.min(low, Settings.temperatureC(t));
            }
            if (worksCold[t] && worksWarm[t]) {
                split = Math.min(split, split(cold, warm, t));
            }
        }
        return new Gap(
                low - high,
                cold.wish().lot().id(),
                high,
                warm.wish().lot().id(),
                low,
                Double.isInfinite(split) ? 0 : split);
    }

    private static double split(Workable a, Workable b, int t) {
        double least = 100;
        for (int i = 0; i < Settings.HUMIDITIES; i++) {
            for (int j = 0; j < Settings.HUMIDITIES; j++) {
                if (a.bearable(t, i) && b.bearable(t, j)) {
                    least = Math.min(least, Settings.STEP_PCT * Math.abs(i - j));
                }
            }
        }
        return least;
    }
}
