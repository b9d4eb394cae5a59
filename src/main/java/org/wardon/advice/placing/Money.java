package org.wardon.advice.placing;

import java.util.Locale;
import org.wardon.produce.Reason.Argument;

/**
 * Money of a plan as a person reads it.
 *
 * @param currency its name, empty where not said
 */
record Money(String currency) {
    String of(double value) {
        String text = String.format(Locale.ROOT, "%,.0f", value).replace(',', ' ');
        return (("-0".equals(text) ? "0" : text) + " " + currency).strip();
    }

    Argument argument(double value) {
        return Argument.text(of(value));
    }
}
