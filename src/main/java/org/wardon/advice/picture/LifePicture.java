package org.wardon.advice.picture;

import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.function.UnaryOperator;
import java.util.stream.DoubleStream;
import org.wardon.advice.crops.ColdZone;
import org.wardon.advice.crops.CropSheet;
import org.wardon.advice.crops.CropSheets;
import org.wardon.advice.crops.LifeLine;
import org.wardon.advice.wording.Units;
import org.wardon.advice.wording.Words;
import org.wardon.produce.Ripeness;
import org.wardon.produce.rows.LifeRow;

/**
 * Life over temperature on a logarithmic scale: the middle, the range, published lives as points,
 * the cold that injures hatched. A triangle that points up is at least so long, one that points
 * down at most; hollow points ended by something else than ageing; a diamond is the keeper's own.
 */
public final class LifePicture {
    private static final double HIGH = 300;
    private static final List<Double> DAYS = List.of(0.3, 1.0, 3.0, 10.0, 30.0, 100.0, 300.0);
    private static final double LEAST_DAYS = 0.3;
    private static final double MOST_DAYS = 730;
    private static final Set<String> AGEING = Set.of("senescence", "ripening", "not-stated");

    private final CropSheet sheet;
    private final Words words;
    private final Units units;
    private final UnaryOperator<String> marks;
    private final Plot plot;

    private LifePicture(CropSheet sheet, Words words, UnaryOperator<String> marks) {
        this.sheet = sheet;
        this.words = words;
        this.marks = marks;
        units = words.units();
        plot =
                new Plot(
                        HIGH,
                        CropSheets.COLDEST_C,
                        CropSheets.WARMEST_C,
                        LEAST_DAYS,
                        MOST_DAYS,
                        true);
    }

    /**
     * Draws it.
     *
     * @param sheet the crop
     * @param words words and units of the person
     * @param marks writes decimal marks as the person does
     * @return SVG that takes its colours from the page's style
     */
    public static String of(CropSheet sheet, Words words, UnaryOperator<String> marks) {
        return new LifePicture(sheet, words, marks).text();
    }

    private String text() {
        double freezingC = sheet.life().freezingC();
        cold().ifPresent(
                        zone ->
                                plot.zone(
                                        zone.bandLowC().orElse(freezingC),
                                        zone.safeFromC(),
                                        "cold"));
        plot.zone(CropSheets.COLDEST_C, freezingC, "frost");
        plot.grid(
                scale(units).boxed().toList(),
                c -> String.valueOf(Math.round(units.shown(c))),
                DAYS,
                days -> marks.apply(Svg.number(days)));
        List<LifeLine.At> at =
                sheet.life().at().stream().filter(one -> one.temperatureC() > freezingC).toList();
        plot.band(at, LifeLine.At::temperatureC, o -> o.days().p10(), o -> o.days().p90());
        plot.line(at, LifeLine.At::temperatureC, o -> o.days().p50(), "middle");
        cold().ifPresent(this::told);
        sheet.life().printed().forEach(this::point);
        plot.names(units.fahrenheit() ? "°F" : "°C", words.text("crop.axis-days"));
        return plot.text(words.text("crop.life-title").replace("{0}", name()));
    }

    private String name() {
        return sheet.commodity().names().get(0);
    }

    private Optional<ColdZone> cold() {
        return sheet.cold().stream()
                .filter(zone -> zone.ripeness() == Ripeness.UNKNOWN)
                .findFirst();
    }

    private void told(ColdZone zone) {
        plot.told(
                zone.safeFromC(),
                words.text("crop.cold-below")
                        .replace("{0}", marks.apply(units.temperature(zone.safeFromC()))));
    }

    private void point(LifeRow row) {
        double c = row.temperatureC().orElseThrow();
        double low = row.lifeDays().lowest();
        double high = row.lifeDays().highest();
        if (high > low) {
            plot.stem(c, low, high);
        }
        boolean own = row.lifeDays().own();
        Plot.Mark form =
                own
                        ? Plot.Mark.DIAMOND
                        : switch (row.bound()) {
                            case "at-least" -> Plot.Mark.UP;
                            case "at-most" -> Plot.Mark.DOWN;
                            default -> Plot.Mark.ROUND;
                        };
        String kind = own ? "own" : AGEING.contains(row.endedBy()) ? "full" : "hollow";
        plot.mark(
                form,
                c,
                Math.sqrt(low * high),
                kind,
                marks.apply(units.temperature(c))
                        + ", "
                        + marks.apply(units.figure(Math.sqrt(low * high), "day"))
                        + ", "
                        + row.lifeDays().sourceId());
    }

    /** Round temperatures of the unit in use, in °C. */
    static DoubleStream scale(Units units) {
        return units.fahrenheit()
                ? DoubleStream.of(30, 40, 50, 60, 70, 80, 90, 100).map(f -> (f - 32) / 1.8)
                : DoubleStream.of(0, 5, 10, 15, 20, 25, 30, 35, 40);
    }
}
