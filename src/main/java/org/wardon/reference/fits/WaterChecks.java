package org.wardon.reference.fits;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.wardon.air.SaturatedAir;
import org.wardon.air.Timeline;
import org.wardon.lots.ClassValues;
import org.wardon.lots.Item;
import org.wardon.lots.Items;
import org.wardon.lots.TranspirationLaw;
import org.wardon.lots.Transpirations;
import org.wardon.produce.Commodity;
import org.wardon.produce.Fact;
import org.wardon.produce.rows.MoistureLossRow;

/**
 * Printed losses of water against the laws the program uses: daily losses where temperature and
 * humidity are printed with them, and losses for each mbar of vapour pressure deficit.
 */
final class WaterChecks {
    private static final double PA_PER_MBAR = 100;

    /** The printed rates for each mbar hold there, °C. */
    private static final double DEFICIT_AT_C = 12.5;

    private static final double TENTH = 0.1;
    private static final double HUNDRED = 100;

    private WaterChecks() {}

    /**
     * One printed loss and what the law gives.
     *
     * @param commodity the commodity
     * @param row the printed row
     * @param printed the loss in the unit of its row
     * @param low tenth of the law's range
     * @param middle its middle
     * @param high nine tenths of it
     */
    record Checked(
            Commodity commodity,
            MoistureLossRow row,
            double printed,
            double low,
            double middle,
            double high) {
        boolean inside() {
            return low <= printed && printed <= high;
        }

        double factor() {
            return Math.max(middle / printed, printed / middle);
        }

        /** Whether the law was made from this very row, so that it says nothing. */
        boolean itself() {
            return factor() < 1 + 1e-9;
        }
    }

    static List<Checked> list(List<Commodity> commodities) {
        ClassValues classes = ClassValues.of(commodities);
        List<Checked> all = new ArrayList<>();
        for (Commodity commodity : commodities) {
            for (MoistureLossRow row : commodity.water().losses()) {
                OptionalDouble deficitPa = deficitPa(row);
                if (deficitPa.isPresent()) {
                    all.add(checked(commodity, row, deficitPa.getAsDouble(), classes));
                }
            }
        }
        return all;
    }

    /** Deficit the printed figure belongs to, Pa; empty where the humidity is not printed. */
    private static OptionalDouble deficitPa(MoistureLossRow row) {
        if (row.loss().isEmpty()) {
            return OptionalDouble.empty();
        }
        if (row.loss().get().unit().equals("pct_per_day_per_mbar")) {
            return OptionalDouble.of(PA_PER_MBAR);
        }
        return row.temperatureC().isPresent() && row.humidityPct().isPresent()
                ? OptionalDouble.of(
                        SaturatedAir.pressurePa(row.temperatureC().getAsDouble())
                                * (1 - row.humidityPct().getAsDouble() / HUNDRED))
                : OptionalDouble.empty();
    }

    private static Checked checked(
            Commodity commodity, MoistureLossRow row, double deficitPa, ClassValues classes) {
        Fact loss = row.loss().orElseThrow();
        double atC = row.temperatureC().orElse(DEFICIT_AT_C);
        Item item = Items.of(commodity, classes).value();
        double[] pct = new double[3];
        double[] shares = {TENTH, 0.5, 1 - TENTH};
        for (int i = 0; i < pct.length; i++) {
            TranspirationLaw law = Transpirations.of(commodity, item, classes, shares[i]).value();
            double saturated = SaturatedAir.pressurePa(atC);
            double lost = law.waterKgPerKgS(saturated, saturated - deficitPa);
            pct[i] = HUNDRED * lost * Timeline.DAY_S;
        }
        return new Checked(commodity, row, loss.middle(), pct[0], pct[1], pct[2]);
    }
}
