package org.wardon.web.pages;

import java.util.List;
import org.wardon.errors.Fault;

/**
 * A field of a form with its label, hint and fault.
 *
 * @param name its name; its id too
 * @param label what it asks
 * @param value what stands in it
 * @param unit unit after it; blank for none
 * @param hint what is accepted, or an example; blank for none
 * @param fault what is wrong with it; blank for nothing
 * @param kind {@code text}, {@code decimal}, {@code password} or {@code datetime-local}
 * @param needed whether it must be filled in
 */
public record FieldView(
        String name,
        String label,
        String value,
        String unit,
        String hint,
        String fault,
        String kind,
        boolean needed) {
    /**
     * Returns a field for a text.
     *
     * @param name its name
     * @param label what it asks
     * @param value what stands in it
     * @return the field, not needed, without hint and fault
     */
    public static FieldView text(String name, String label, String value) {
        return new FieldView(name, label, value, "", "", "", "text", false);
    }

    /**
     * Returns a field for a number.
     *
     * @param name its name
     * @param label what it asks
     * @param value what stands in it, see {@link Figures#typed}
     * @param unit unit after it
     * @return the field, not needed, without hint and fault
     */
    public static FieldView number(String name, String label, String value, String unit) {
        return new FieldView(name, label, value, unit, "", "", "decimal", false);
    }

    /**
     * Returns the field for a time.
     *
     * @param name its name
     * @param label what it asks
     * @param value what stands in it, such as {@code 2026-03-02T15:00}
     * @return the field, not needed, without hint and fault
     */
    public static FieldView time(String name, String label, String value) {
        return new FieldView(name, label, value, "", "", "", "datetime-local", false);
    }

    /**
     * Returns the field with a hint.
     *
     * @param text the hint
     * @return the field
     */
    public FieldView withHint(String text) {
        return new FieldView(name, label, value, unit, text, fault, kind, needed);
    }

    /**
     * Returns the field as one that must be filled in.
     *
     * @return the field
     */
    public FieldView asNeeded() {
        return new FieldView(name, label, value, unit, hint, fault, kind, true);
    }

    /**
     * Returns the field with a fault.
     *
     * @param text what is wrong and what is accepted; blank for nothing
     * @return the field
     */
    public FieldView withFault(String text) {
        return new FieldView(name, label, value, unit, hint, text, kind, needed);
    }

    /**
     * Returns the field with the fault of a JSON path, if any stands there.
     *
     * @param faults all faults of the plan
     * @param path JSON path of what the field holds, such as {@code $.lots[2].massKg}
     * @return the field
     */
    public FieldView withFaultAt(String path, List<Fault> faults) {
        return faults.stream()
                .filter(fault -> fault.path().equals(path))
                .findFirst()
                .map(fault -> withFault(fault.found() + "; " + fault.accepted()))
                .orElse(this);
    }

    /**
     * Returns what describes the field to a screen reader.
     *
     * @return ids of hint and fault; blank for none
     */
    public String describedBy() {
        return (hint.isEmpty() ? "" : name + "-hint ")
                .concat(fault.isEmpty() ? "" : name + "-fault")
                .strip();
    }
}
