package org.wardon.keeping.experience;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.apache.commons.math3.distribution.NormalDistribution;

/**
 * The level of a store where some lives are only known to be longer than a time: a normal belief
 * times the probability of each being longer, on even steps from its peak outwards. Its logarithm
 * is concave, so there is one peak and the steps end where nothing is left.
 */
final class LevelGrid {
    private static final double STEPS_A_DEVIATION = 16;
    private static final double NOTHING_LEFT = -32;
    private static final int HALVINGS = 60;

    /** Where the logarithm of the tail is taken from its series. */
    private static final double FAR = -20;

    private static final NormalDistribution NORMAL = new NormalDistribution(null, 0, 1);

    private final double mean;
    private final double deviation;
    private final List<Belief.Reading> bounds;

    /** What is believed of the level. */
    sealed interface Level {
        /** Level at a standard normal place z, below which the share p lies. */
        double quantile(double z, double p);

        double variance();
    }

    /**
     * A normal level.
     *
     * @param mean its mean
     * @param deviation its standard deviation
     */
    record Normal(double mean, double deviation) implements Level {
        @Override
        public double quantile(double z, double p) {
            return mean + deviation * z;
        }

        @Override
        public double variance() {
            return deviation * deviation;
        }
    }

    /**
     * One step.
     *
     * @param level level, standard deviations of the published spread
     * @param weight its probability
     */
    private record Node(double level, double weight) {}

    /**
     * A level on steps.
     *
     * @param nodes by rising level
     */
    private record Stepped(List<Node> nodes) implements Level {
        @Override
        public double quantile(double z, double p) {
            double below = 0;
            for (int i = 1; i < nodes.size(); i++) {
                double share = 0.5 * (nodes.get(i - 1).weight() + nodes.get(i).weight());
                if (below + share >= p) {
                    double step = nodes.get(i).level() - nodes.get(i - 1).level();
                    return nodes.get(i - 1).level() + step * (p - below) / share;
                }
                below += share;
            }
            return nodes.get(nodes.size() - 1).level();
        }

        @Override
        public double variance() {
            double first = nodes.stream().mapToDouble(n -> n.weight() * n.level()).sum();
            return nodes.stream()
                    .mapToDouble(n -> n.weight() * (n.level() - first) * (n.level() - first))
                    .sum();
        }
    }

    LevelGrid(double mean, double deviation, List<Belief.Reading> bounds) {
        this.mean = mean;
        this.deviation = deviation;
        this.bounds = bounds;
    }

    Level level() {
        double peak = peak();
        double step = deviation(peak) / STEPS_A_DEVIATION;
        double most = lnDensity(peak);
        List<Node> found = new ArrayList<>(List.of(new Node(peak, 1)));
        for (int side = -1; side <= 1; side += 2) {
            double ln = 0;
            for (int i = 1; ln > NOTHING_LEFT; i++) {
                double level = peak + side * i * step;
                ln = lnDensity(level) - most;
                found.add(new Node(level, Math.exp(ln)));
            }
        }
        double sum = found.stream().mapToDouble(Node::weight).sum();
        return new Stepped(
                found.stream()
                        .map(node -> new Node(node.level(), node.weight() / sum))
                        .sorted(Comparator.comparingDouble(Node::level))
                        .toList());
    }

    /** Where the density rises no more; every bound pulls it up from the mean. */
    private double peak() {
        double below = mean;
        double above = mean + deviation;
        while (rise(above) > 0) {
            above += above - below;
        }
        for (int i = 0; i < HALVINGS; i++) {
            double middle = 0.5 * (below + above);
            if (rise(middle) > 0) {
                below = middle;
            } else {
                above = middle;
            }
        }
        return 0.5 * (below + above);
    }

    private double rise(double level) {
        double rise = (mean - level) / (deviation * deviation);
        for (Belief.Reading bound : bounds) {
            double width = Math.sqrt(bound.variance());
            rise += hazard((level - bound.z()) / width) / width;
        }
        return rise;
    }

    /** Deviation of the normal curve that fits the peak. */
    private double deviation(double peak) {
        double precision = 1 / (deviation * deviation);
        for (Belief.Reading bound : bounds) {
            double x = (peak - bound.z()) / Math.sqrt(bound.variance());
            double hazard = hazard(x);
            precision += hazard * (hazard + x) / bound.variance();
        }
        return 1 / Math.sqrt(precision);
    }

    private double lnDensity(double level) {
        double away = (level - mean) / deviation;
        double ln = -0.5 * away * away;
        for (Belief.Reading bound : bounds) {
            ln += lnBelow((level - bound.z()) / Math.sqrt(bound.variance()));
        }
        return ln;
    }

    /** Density over probability below. */
    private static double hazard(double x) {
        return Math.exp(-0.5 * x * x - 0.5 * Math.log(2 * Math.PI) - lnBelow(x));
    }

    private static double lnBelow(double x) {
        double square = x * x;
        return x > FAR
                ? Math.log(NORMAL.cumulativeProbability(x))
                : -0.5 * square
                        - Math.log(-x * Math.sqrt(2 * Math.PI))
                        + Math.log1p(-1 / square + 3 / (square * square));
    }
}
