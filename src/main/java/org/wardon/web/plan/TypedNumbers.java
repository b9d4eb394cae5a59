package org.wardon.web.plan;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.advice.wording.Units;
import org.wardon.files.form.NumberText;
import org.wardon.web.pages.Figures;
import org.wardon.web.pages.Preferences;

/** Numbers of a plan in the units and with the decimal mark a person likes. */
final class TypedNumbers implements NumberText {
    private static final double PER_K = 1.8;

    /** Units of the plan that hold a mass, and what a person who weighs in lb reads. */
    private static final Map<String, Turned> OF_MASS =
            Map.of(
                    "kg", new Turned("lb", 1 / Units.KG_PER_LB),
                    "kg/h", new Turned("lb/h", 1 / Units.KG_PER_LB),
                    "kg/s", new Turned("lb/s", 1 / Units.KG_PER_LB),
                    "per kg", new Turned("per lb", Units.KG_PER_LB));

    /** A unit and what makes its number of the plan's. */
    private record Turned(String unit, double factor) {}

    private final Preferences preferences;
    private final Figures figures;

    TypedNumbers(Preferences preferences) {
        this.preferences = preferences;
        figures = new Figures(preferences);
    }

    private boolean turned(String unit) {
        return (preferences.fahrenheit() && (unit.equals("°C") || unit.equals("K")))
                || (preferences.pounds() && OF_MASS.containsKey(unit));
    }

    @Override
    public String shown(String written, String unit) {
        if (!turned(unit)) {
            return figures.text(written);
        }
        double value = Double.parseDouble(written);
        return switch (unit) {
            case "°C" -> figures.typedTemperature(value);
            case "K" -> figures.typed(PER_K * value);
            default -> figures.typedTurned(value, ofMass(unit).factor());
        };
    }

    private static Turned ofMass(String unit) {
        return Objects.requireNonNull(OF_MASS.get(unit), unit);
    }

    /**
     * A bound of what may be typed: of a mass in lb, or a price by it, three digits, so that it is
     * read easily, and no further than the plan's own bound reaches.
     *
     * @param value the bound in the plan's unit
     * @param unit the plan's unit
     * @param inward the way that stays within the bound
     */
    String bound(double value, String unit, RoundingMode inward) {
        String plain = BigDecimal.valueOf(value).stripTrailingZeros().toPlainString();
        if (!preferences.pounds() || !OF_MASS.containsKey(unit)) {
            return shown(plain, unit);
        }
        BigDecimal pounds = BigDecimal.valueOf(value * ofMass(unit).factor());
        BigDecimal few = pounds.round(new MathContext(3, inward));
        return figures.typed(few.doubleValue());
    }

    @Override
    public Optional<String> read(String typed, String unit) {
        OptionalDouble number = figures.number(typed);
        if (number.isEmpty()) {
            return Optional.empty();
        }
        if (!turned(unit)) {
            return Optional.of(new BigDecimal(plain(typed)).toPlainString());
        }
        double value =
                switch (unit) {
                    case "°C" -> figures.temperatureC(typed).orElseThrow();
                    case "K" -> number.getAsDouble() / PER_K;
                    default -> number.getAsDouble() / ofMass(unit).factor();
                };
        BigDecimal kept = BigDecimal.valueOf(value).round(Figures.KEPT).stripTrailingZeros();
        return Optional.of(kept.signum() == 0 ? "0" : kept.toPlainString());
    }

    /** As it was typed, with a point. */
    private String plain(String typed) {
        String bare = typed.strip().replaceAll("[ \u00a0\u202f]", "").replace('−', '-');
        return preferences.decimalComma() && bare.indexOf('.') < 0 ? bare.replace(',', '.') : bare;
    }

    /** The unit a person reads in place of the plan's. */
    String unit(String unit) {
        if (!turned(unit)) {
            return unit;
        }
        return OF_MASS.containsKey(unit) ? ofMass(unit).unit() : "°F";
    }
}
