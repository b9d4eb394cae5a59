package org.wardon.web.plan;

import java.util.List;

/**
 * A place of a plan as a form shows it.
 *
 * @param kind how: {@code text}, {@code decimal}, {@code date}, {@code time}, {@code
 *     datetime-local}, {@code select}, {@code ticks}, {@code choice}, {@code option}, {@code
 *     group}, {@code absent}, {@code list}, {@code item}, {@code rows}
 * @param path JSON path
 * @param name name of the field, with the path in it; blank where it has none
 * @param label what it asks
 * @param hint what it means, its default with its mark
 * @param accepted unit and range in words; blank for none
 * @param value what stands in it
 * @param unit unit after it; blank for none
 * @param fault what is wrong with it; blank for nothing
 * @param needed whether it must be given
 * @param taken of an option, whether it is the one taken
 * @param list id of a list of suggestions; blank for none
 * @param picks words to pick among
 * @param entries what is inside
 * @param rows links to pages of items
 * @param steps buttons
 */
public record EntryView(
        String kind,
        String path,
        String name,
        String label,
        String hint,
        String accepted,
        String value,
        String unit,
        String fault,
        boolean needed,
        boolean taken,
        String list,
        List<Pick> picks,
        List<EntryView> entries,
        List<Row> rows,
        List<Step> steps) {
    /** Copies the lists. */
    public EntryView {
        picks = List.copyOf(picks);
        entries = List.copyOf(entries);
        rows = List.copyOf(rows);
        steps = List.copyOf(steps);
    }

    /**
     * A word to pick.
     *
     * @param word the word
     * @param name its name
     * @param taken whether it is picked
     */
    public record Pick(String word, String name, boolean taken) {}

    /**
     * An item with a page of its own.
     *
     * @param href its page
     * @param name its name
     * @param told what is in it, in a line
     * @param faults how many faults are in it
     * @param steps buttons
     */
    public record Row(String href, String name, String told, int faults, List<Step> steps) {
        /** Copies the list. */
        public Row {
            steps = List.copyOf(steps);
        }
    }

    /**
     * A button.
     *
     * @param value what it does, with the path
     * @param text what stands on it
     * @param spoken what a screen reader says
     * @param ask name of a field beside it for an id; blank for none
     */
    public record Step(String value, String text, String spoken, String ask) {}

    /**
     * Returns the id of the field.
     *
     * @return letters, digits and hyphens
     */
    public String id() {
        return anchor(name.isBlank() ? path : name);
    }

    /**
     * Returns the id of a place.
     *
     * @param path its path, or the name of its field
     * @return letters, digits and hyphens
     */
    public static String anchor(String path) {
        return "p" + path.replaceFirst("^[vos]:", "").replaceAll("[^A-Za-z0-9]+", "-");
    }

    /**
     * Returns what describes it to a screen reader.
     *
     * @return ids; blank for none
     */
    public String describedBy() {
        return ((hint + accepted).isBlank() ? "" : id() + "-hint ")
                .concat(unit.isEmpty() ? "" : id() + "-unit ")
                .concat(fault.isEmpty() ? "" : id() + "-fault")
                .strip();
    }
}
