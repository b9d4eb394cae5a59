package org.wardon.web.pages;

import java.util.List;

/**
 * A strip of days: bars of the air from its lowest to its highest hour, inside and outside of what
 * counts as held, the setting dashed. Across it is measured in thousandths, down in px.
 *
 * @param inside path of the bars inside
 * @param outside path of the bars outside
 * @param barWide width of a bar
 * @param setting path of the setting, a dash for each
 * @param held path of what counts as held, a box for each setting
 * @param days names and borders of days
 * @param marks temperatures at the side
 * @param text the same in words
 * @param title what it shows
 */
public record StripView(
        String inside,
        String outside,
        String barWide,
        String setting,
        String held,
        List<Day> days,
        List<Mark> marks,
        String text,
        String title) {
    /** Height of the drawing without its days, px. */
    public static final int HEIGHT = 96;

    /** Copies the lists. */
    public StripView {
        days = List.copyOf(days);
        marks = List.copyOf(marks);
    }

    /**
     * A day.
     *
     * @param at where it begins, thousandths
     * @param percent the same, percent
     * @param name its name; blank where there is no room for it
     * @param tight whether the name has no room on a phone
     */
    public record Day(String at, String percent, String name, boolean tight) {}

    /**
     * A temperature at the side.
     *
     * @param y where, px
     * @param text with its unit
     */
    public record Mark(String y, String text) {}
}
