package org.wardon.reference.fits;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.TreeSet;
import org.wardon.keeping.pooling.Deviations;
import org.wardon.keeping.pooling.LifePoint;
import org.wardon.keeping.pooling.LifePoint.Trial;
import org.wardon.produce.rows.LifeCurveRow;

/** The fits as the tables of {@code reference-tables/fits}; the same fits give the same bytes. */
final class LifeTables {
    private static final String COMPUTED = "computed";

    private final LifeRows used;
    private final LifeFits fits;
    private final Deviations deviations;

    LifeTables(LifeRows used, LifeFits fits, Deviations deviations) {
        this.used = used;
        this.fits = fits;
        this.deviations = deviations;
    }

    /** Contents by file name. */
    Map<String, String> files() {
        Map<String, String> files = new LinkedHashMap<>();
        files.put("life-curves.csv", curves());
        files.put("life-points.csv", points());
        files.put("life-pool.csv", pool());
        return files;
    }

    private String curves() {
        List<String> lines = new ArrayList<>();
        lines.add(
                "# fitted curves of life over temperature, one a crop (empty variant) and one a"
                        + " variant with lives of its own; made by reference.fits.FitLives from"
                        + " life-temperature, commodities, q10 and the tables of respiration");
        lines.add(
                "# ln life = level + slope (1/T - 1/T10)/R, slopes pooled over plant part, crop and"
                        + " variant; the level is the handbook's, the range that of sources");
        lines.add(
                "commodity_id,variant,slope_kJ_mol,slope_sd_kJ_mol,own_weight,temp_min_C,"
                        + "temp_max_C,temperatures,points,bounds,shortest_days,longest_days,"
                        + "rms_ln_residual,largest_ln_residual,source_sd_ln,crop_sd_share,"
                        + "source_id,evidence");
        for (Crop crop : used.crops()) {
            for (LifeCurveRow curve : fits.curves(crop)) {
                lines.add(curve(crop, curve));
            }
        }
        return text(lines);
    }

    private String curve(Crop crop, LifeCurveRow curve) {
        List<UsedRow> own = fits.of(crop, curve.variant());
        long exact = own.stream().filter(row -> row.known().exact()).count();
        OptionalDouble[] residuals = fits.residuals(crop, curve.variant());
        return String.join(
                ",",
                crop.id(),
                curve.variant(),
                number(curve.slopeKJMol()),
                number(curve.slopeDeviationKJMol()),
                number(curve.ownWeight()),
                number(curve.lowestC()),
                number(curve.highestC()),
                String.valueOf(curve.temperatures()),
                String.valueOf(exact),
                String.valueOf(own.size() - exact),
                number(curve.shortestDays()),
                number(curve.longestDays()),
                number(residuals[0]),
                number(residuals[1]),
                number(curve.betweenSources()),
                number(curve.betweenCrops()),
                String.join(";", curve.sourceIds()),
                COMPUTED);
    }

    private String points() {
        List<String> lines = new ArrayList<>();
        lines.add(
                "# what the fit of life-curves.csv makes of every printed row; not-used: bounded"
                        + " from above by something other than ageing");
        lines.add(
                "commodity_id,variant,from_table,from_line,use,temp_C,life_days,fitted_days,"
                        + "ln_residual,source_id,evidence");
        double[] fitted = fits.pooled().fittedLnDays();
        for (int i = 0; i < fitted.length; i++) {
            UsedRow row = fits.rows().get(i);
            LifePoint point = row.known();
            OptionalDouble off =
                    point.exact()
                            ? OptionalDouble.of(point.lnDays() - fitted[i])
                            : OptionalDouble.empty();
            lines.add(
                    String.join(
                            ",",
                            point.of().crop(),
                            row.variant(),
                            row.table(),
                            String.valueOf(row.line()),
                            row.use(),
                            number(point.temperatureC()),
                            number(Math.exp(point.lnDays())),
                            number(Math.exp(fitted[i])),
                            number(off),
                            point.of().source(),
                            COMPUTED));
        }
        return text(lines);
    }

    private String pool() {
        List<String> lines = new ArrayList<>();
        lines.add("# what the curves of life-curves.csv share");
        lines.add("name,value,sd,unit,meaning,evidence");
        lines.add(row("measured", deviations.measured(), "1", "sd of ln life where measured"));
        lines.add(row("estimated", deviations.estimated(), "1", "sd of ln life where estimated"));
        lines.add(row("source", deviations.source(), "1", "sd of ln life between sources"));
        lines.add(row("part", deviations.partKJMol(), "kJ/mol", "sd of slopes between parts"));
        lines.add(row("crop", deviations.cropKJMol(), "kJ/mol", "sd of slopes between crops"));
        lines.add(row("variant", deviations.curveKJMol(), "kJ/mol", "sd between variants"));
        lines.add(row("follows-breath", followsBreath(), "1", "slope of ageing a slope of breath"));
        lines.add(slope("slope-all", ""));
        for (String part :
                new TreeSet<>(used.crops().stream().map(Crop::part).distinct().toList())) {
            lines.add(slope("slope-" + part, part));
        }
        return text(lines);
    }

    /** How much steeper a crop ages that breathes more steeply by one kJ/mol. */
    private double followsBreath() {
        Trial usual = new Trial("none", "none", "none", "", 0, false);
        Trial steep = new Trial("none", "none", "none", "", 1, false);
        return fits.pooled().slopeKJMol(steep) - fits.pooled().slopeKJMol(usual);
    }

    private static String row(String name, double value, String unit, String meaning) {
        return String.join(",", name, number(value), "", unit, meaning, COMPUTED);
    }

    private String slope(String name, String part) {
        Trial kin = new Trial("none", "none", "none", part, 0, false);
        return String.join(
                ",",
                name,
                number(fits.pooled().slopeKJMol(kin)),
                number(fits.pooled().slopeDeviationKJMol(kin)),
                "kJ/mol",
                "slope of a crop without lives of its own",
                COMPUTED);
    }

    private static String text(List<String> lines) {
        return String.join("\n", lines) + "\n";
    }

    private static String number(OptionalDouble value) {
        return value.isPresent() ? number(value.getAsDouble()) : "";
    }

    /** Four digits at most, so that the last bits of a machine do not show. */
    static String number(double value) {
        if (Math.abs(value) < 5e-4) {
            return "0";
        }
        BigDecimal exact = new BigDecimal(value);
        BigDecimal rounded =
                Math.abs(value) < 1
                        ? exact.setScale(3, RoundingMode.HALF_EVEN)
                        : exact.round(new MathContext(4));
        return rounded.stripTrailingZeros().toPlainString();
    }
}
