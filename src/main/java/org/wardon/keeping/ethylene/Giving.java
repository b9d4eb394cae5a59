package org.wardon.keeping.ethylene;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.Set;
import org.wardon.keeping.Draw;
import org.wardon.produce.Commodity;
import org.wardon.produce.rows.EthyleneRate;

/**
 * Ethylene a commodity gives off. Between the temperatures of its rows the logarithm of the rate is
 * straight; beyond them Q10 is 2 to 3 (assumption). Rows that print an upper limit only reach a
 * decade down from it (assumption); a lower limit alone is taken as it stands. Without rows the
 * class at 20 °C counts.
 *
 * <p>Source of the classes: id kader-lists (very low under 0.1, low 0.1 to 1, moderate 1 to 10,
 * high 10 to 100, very high over 100 µL/(kg h) at 20 °C).
 */
public final class Giving {
    private static final double CLASS_AT_C = 20;
    private static final double DECADE = 10;
    private static final Map<String, double[]> CLASSES =
            Map.of(
                    "very-low", new double[] {0.01, 0.1},
                    "low", new double[] {0.1, 1},
                    "moderate", new double[] {1, 10},
                    "high", new double[] {10, 100},
                    "very-high", new double[] {100, 1000});

    private static final Set<String> RIPENING = Set.of("ripe", "turning");

    private final RateCurve before;
    private final RateCurve after;
    private final String sourceId;

    private Giving(RateCurve before, RateCurve after, String sourceId) {
        this.before = before;
        this.after = after;
        this.sourceId = sourceId;
    }

    /**
     * Returns what a commodity gives off. Rows of ripe or turning fruit hold once it ripens, all
     * others before; where one kind is missing the other holds throughout, but that a commodity
     * which is green fruit by its name has its class before. A row that prints only "more than"
     * speaks of ripening fruit: before that the class low is taken (assumption).
     *
     * @param commodity the commodity
     * @return its rates
     */
    public static Giving of(Commodity commodity) {
        List<double[]> early = new ArrayList<>();
        List<double[]> late = new ArrayList<>();
        String source = "kader-lists";
        for (EthyleneRate row : commodity.breath().ethylene()) {
            OptionalDouble at = row.temperatureC();
            if (at.isPresent()) {
                boolean ripening = RIPENING.contains(row.ripeness()) || moreThan(row);
                (ripening ? late : early).add(point(at.getAsDouble(), row));
                source = row.microlitrePerKgHour().sourceId();
            }
        }
        if (early.isEmpty() && commodity.breath().ethylene().stream().anyMatch(Giving::moreThan)) {
            early.add(classPoint("low"));
        }
        if (early.isEmpty() && (late.isEmpty() || Stage.soldGreen(commodity))) {
            early.add(classPoint(commodity.needs().ethyleneProduction()));
        }
        return new Giving(
                new RateCurve(early.isEmpty() ? late : early),
                new RateCurve(late.isEmpty() ? early : late),
                source);
    }

    private static boolean moreThan(EthyleneRate row) {
        return row.microlitrePerKgHour().high().isEmpty();
    }

    private static double[] classPoint(String name) {
        double[] bounds = CLASSES.getOrDefault(name, new double[] {0.01, 1});
        return new double[] {CLASS_AT_C, bounds[0], bounds[1]};
    }

    private static double[] point(double atC, EthyleneRate row) {
        double high = row.microlitrePerKgHour().highest();
        double low = row.microlitrePerKgHour().lowest();
        boolean lowPrinted = row.microlitrePerKgHour().low().isPresent();
        return new double[] {atC, lowPrinted ? low : high / DECADE, high};
    }

    /**
     * Returns the source of the rates.
     *
     * @return id
     */
    public String sourceId() {
        return sourceId;
    }

    /**
     * Returns the rate of a draw.
     *
     * @param temperatureC temperature of the produce, °C
     * @param stage 0 before ripening (lowest printed), 1 after (highest), between for produce that
     *     does not ripen
     * @param draw the draw, for the steepness beyond the printed temperatures
     * @return µL/(kg h)
     */
    public double microlitrePerKgHour(double temperatureC, double stage, Draw draw) {
        double steepness = Math.log(2 + draw.ethyleneGiven()) / DECADE;
        double low = before.lnLow(temperatureC, steepness);
        double high = after.lnHigh(temperatureC, steepness);
        return Math.exp(low + stage * (high - low));
    }
}
