package org.wardon.web.plan;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.advice.wording.Units;
import org.wardon.files.form.NumberText;
import org.wardon.web.pages.Figures;
import org.wardon.web.pages.Preferences;

/** Numbers of a plan in the units and with the decimal mark a person likes. */
final class TypedNumbers implements NumberText {
    private static final double PER_K = 1.8;
    private static final MathContext KEPT = new MathContext(9);

    private final Preferences preferences;
    private final Figures figures;

    TypedNumbers(Preferences preferences) {
        this.preferences = preferences;
        figures = new Figures(preferences);
    }

    private boolean turned(String unit) {
        return (preferences.fahrenheit() && (unit.equals("°C") || unit.equals("K")))
                || (preferences.pounds() && unit.equals("kg"));
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
            default -> figures.typedMass(value);
        };
    }

    /**
     * A bound of what may be typed: of a mass in lb three digits, so that it is read easily, and no
     * further than the plan's own bound reaches.
     *
     * @param value the bound in the plan's unit
     * @param unit the plan's unit
     * @param inward the way that stays within the bound
     */
    String bound(double value, String unit, RoundingMode inward) {
        String plain = BigDecimal.valueOf(value).stripTrailingZeros().toPlainString();
        if (!turned(unit) || !unit.equals("kg")) {
            return shown(plain, unit);
        }
        BigDecimal pounds = BigDecimal.valueOf(value / Units.KG_PER_LB);
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
                    default -> figures.massKg(typed).orElseThrow();
                };
        BigDecimal kept = BigDecimal.valueOf(value).round(KEPT).stripTrailingZeros();
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
        return unit.equals("kg") ? figures.massUnit() : "°F";
    }
}
