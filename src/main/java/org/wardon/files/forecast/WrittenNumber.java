package org.wardon.files.forecast;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import org.wardon.errors.Require;

/** A number as answers and series write it: six significant digits, large ones two decimals. */
public final class WrittenNumber {
    private static final MathContext SIX_DIGITS = new MathContext(6, RoundingMode.HALF_EVEN);
    private static final double SIX_DIGITS_KEEP_CENTS_BELOW = 10_000;

    private WrittenNumber() {}

    /**
     * Returns a number as text.
     *
     * @param value a finite number
     * @return plain digits: six significant ones, or two decimals from 10 000 on
     * @throws IllegalArgumentException if it is not finite
     */
    public static String text(double value) {
        Require.that(
                Double.isFinite(value), "a number of an answer must be finite, found " + value);
        BigDecimal exact = BigDecimal.valueOf(value);
        BigDecimal rounded =
                Math.abs(value) < SIX_DIGITS_KEEP_CENTS_BELOW
                        ? exact.round(SIX_DIGITS)
                        : exact.setScale(2, RoundingMode.HALF_EVEN);
        if (rounded.signum() == 0) {
            return "0";
        }
        return rounded.stripTrailingZeros().toPlainString();
    }
}
