package org.wardon.web.placing;

import java.util.Locale;

/**
 * Money of a plan as a person reads it.
 *
 * @param currency its name, blank where not said
 */
record Money(String currency) {
    String of(double value) {
        String text = String.format(Locale.ROOT, "%,.0f", value).replace(',', ' ');
        return (("-0".equals(text) ? "0" : text.replace('-', '−')) + " " + currency).strip();
    }

    /** With its sign, as differences are told. */
    String difference(double value) {
        String text = of(value);
        return Math.round(value) > 0 ? "+" + text : text;
    }

    boolean isNothing(double value) {
        return Math.round(value) == 0;
    }
}
