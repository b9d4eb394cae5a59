package org.wardon.keeping.ethylene;

import java.util.Comparator;
import java.util.List;
import java.util.TreeMap;

/** Lowest and highest printed rates over temperature, straight in the logarithm. */
final class RateCurve {
    private final double[] atC;
    private final double[] lnLow;
    private final double[] lnHigh;

    /** Takes points of temperature, low and high; points of one temperature are joined. */
    RateCurve(List<double[]> points) {
        TreeMap<Double, double[]> joined = new TreeMap<>(Comparator.naturalOrder());
        for (double[] point : points) {
            joined.merge(
                    point[0],
                    new double[] {Math.log(point[1]), Math.log(point[2])},
                    (x, y) -> new double[] {Math.min(x[0], y[0]), Math.max(x[1], y[1])});
        }
        atC = joined.keySet().stream().mapToDouble(c -> c).toArray();
        lnLow = joined.values().stream().mapToDouble(ln -> ln[0]).toArray();
        lnHigh = joined.values().stream().mapToDouble(ln -> ln[1]).toArray();
    }

    double lnLow(double temperatureC, double steepnessPerK) {
        return at(lnLow, temperatureC, steepnessPerK);
    }

    double lnHigh(double temperatureC, double steepnessPerK) {
        return at(lnHigh, temperatureC, steepnessPerK);
    }

    private double at(double[] ln, double temperatureC, double steepnessPerK) {
        int last = atC.length - 1;
        double inside = Math.min(Math.max(temperatureC, atC[0]), atC[last]);
        int i = 0;
        while (i < last - 1 && atC[i + 1] < inside) {
            i++;
        }
        int next = Math.min(i + 1, last);
        double width = atC[next] - atC[i];
        double share = width == 0 ? 0 : (inside - atC[i]) / width;
        return ln[i] + share * (ln[next] - ln[i]) + steepnessPerK * (temperatureC - inside);
    }
}
