package org.wardon.air;

/** Hourly values in longer stretches, for runs that need no single hour. */
public final class Coarse {
    private Coarse() {}

    /**
     * Returns hourly values that run straight between the means around every n-th hour. Each mean
     * takes the n hours around its own, so that a whole number of stretches keeps its sum, but for
     * half a stretch at either end.
     *
     * @param hourly {@code [hour]}, any unit, linear between
     * @param stretchHours n, odd, at least 1; 1 returns the values as they are
     * @return {@code [hour]}, of the same length
     */
    public static double[] means(double[] hourly, int stretchHours) {
        int last = hourly.length - 1;
        int reach = stretchHours / 2;
        double[] coarse = new double[hourly.length];
        for (int from = 0; from <= last; from += stretchHours) {
            int to = Math.min(from + stretchHours, last);
            double start = meanAround(hourly, from, reach);
            double end = meanAround(hourly, to, reach);
            for (int h = from; h <= to; h++) {
                double share = to == from ? 0 : (double) (h - from) / (to - from);
                coarse[h] = start + share * (end - start);
            }
        }
        return coarse;
    }

    private static double meanAround(double[] hourly, int hour, int reach) {
        int first = Math.max(0, hour - reach);
        int last = Math.min(hourly.length - 1, hour + reach);
        double sum = 0;
        for (int h = first; h <= last; h++) {
            sum += hourly[h];
        }
        return sum / (last - first + 1);
    }
}
