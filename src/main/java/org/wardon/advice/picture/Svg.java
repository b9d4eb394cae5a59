package org.wardon.advice.picture;

import java.util.Locale;

/** Elements of a picture, one a line, numbers short, texts made safe. */
final class Svg {
    private final StringBuilder lines = new StringBuilder();

    /** Adds an element; {@code %s} takes numbers as they are drawn and texts as they are. */
    Svg add(String form, Object... values) {
        Object[] drawn = new Object[values.length];
        for (int i = 0; i < values.length; i++) {
            drawn[i] = values[i] instanceof Double number ? number(number) : values[i];
        }
        lines.append(String.format(Locale.ROOT, form, drawn)).append('\n');
        return this;
    }

    /** Adds a text at a place; the anchor is {@code start}, {@code middle} or {@code end}. */
    Svg text(double x, double y, String anchor, String kind, String text) {
        return add(
                "<text x=\"%s\" y=\"%s\" text-anchor=\"%s\" class=\"%s\">%s</text>",
                x, y, anchor, kind, safe(text));
    }

    static String number(double value) {
        String text = String.format(Locale.ROOT, "%.2f", value);
        return text.replaceFirst("\\.?0+$", "");
    }

    static String safe(String text) {
        return text.replace("&", "&amp;").replace("<", "&lt;").replace(">", "&gt;");
    }

    String lines() {
        return lines.toString();
    }
}
