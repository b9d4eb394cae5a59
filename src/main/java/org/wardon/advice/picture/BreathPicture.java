package org.wardon.advice.picture;

import java.util.List;
import java.util.function.UnaryOperator;
import org.wardon.advice.crops.BreathLine;
import org.wardon.advice.crops.CropSheet;
import org.wardon.advice.crops.CropSheets;
import org.wardon.advice.wording.Units;
import org.wardon.advice.wording.Words;
import org.wardon.produce.rows.RespirationRow;

/**
 * Heat of respiration over temperature on a logarithmic scale: the middle, the range, published
 * rates as points. Hollow points are printed too, but the range does not go through them.
 */
public final class BreathPicture {
    private static final double HIGH = 260;
    private static final List<Double> WATTS =
            List.of(1.0, 3.0, 10.0, 30.0, 100.0, 300.0, 1000.0, 3000.0);
    private static final double STEP = 3.4;

    private BreathPicture() {}

    /**
     * Draws it.
     *
     * @param sheet the crop
     * @param words words and units of the person
     * @param marks writes decimal marks as the person does
     * @return SVG that takes its colours from the page's style
     */
    public static String of(CropSheet sheet, Words words, UnaryOperator<String> marks) {
        Units units = words.units();
        List<BreathLine.At> at = sheet.breath().at();
        double least = at.stream().mapToDouble(BreathLine.At::low).min().orElseThrow() / 1.5;
        double most = at.stream().mapToDouble(BreathLine.At::high).max().orElseThrow() * 1.5;
        Plot plot = new Plot(HIGH, CropSheets.COLDEST_C, CropSheets.WARMEST_C, least, most, true);
        plot.grid(
                LifePicture.scale(units).boxed().toList(),
                c -> String.valueOf(Math.round(units.shown(c))),
                WATTS.stream().filter(w -> w > least && w < most).toList(),
                w -> marks.apply(Svg.number(w)));
        plot.band(at, BreathLine.At::temperatureC, BreathLine.At::low, BreathLine.At::high);
        plot.line(at, BreathLine.At::temperatureC, BreathLine.At::middle, "middle");
        sheet.breath().printed().stream()
                .filter(one -> one.row().wattsPerTonne().lowest() > least / STEP)
                .forEach(one -> point(plot, units, marks, one));
        plot.names(units.fahrenheit() ? "°F" : "°C", words.text("crop.axis-watts"));
        return plot.text(
                words.text("crop.breath-title").replace("{0}", sheet.commodity().names().get(0)));
    }

    private static void point(
            Plot plot, Units units, UnaryOperator<String> marks, BreathLine.Printed printed) {
        RespirationRow row = printed.row();
        double low = row.wattsPerTonne().lowest();
        double high = row.wattsPerTonne().highest();
        if (high > low) {
            plot.stem(row.temperatureC(), low, high);
        }
        boolean own = row.wattsPerTonne().own();
        plot.mark(
                own ? Plot.Mark.DIAMOND : Plot.Mark.ROUND,
                row.temperatureC(),
                Math.sqrt(low * high),
                own ? "own" : printed.taken() ? "full" : "hollow",
                marks.apply(units.temperature(row.temperatureC()))
                        + ", "
                        + Math.round(Math.sqrt(low * high))
                        + " W/t, "
                        + row.wattsPerTonne().sourceId());
    }
}
