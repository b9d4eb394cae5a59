package org.wardon.web.chamber;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Function;
import org.wardon.advice.whatif.Changes;
import org.wardon.web.pages.FieldView;
import org.wardon.web.pages.Figures;
import org.wardon.web.pages.PageWords;

/** The fields of what could be changed in a chamber, read and shown in a person's units. */
public final class WhatIfForm {
    private static final double LEAST_C = -30;
    private static final double MOST_C = 45;
    private static final double SLIDE_K = 10;
    private static final double LEAST_PCT = 10;
    private static final double MOST_PCT = 1_000;
    private static final double MOST_OPENINGS = 2_000;

    private final double settingC;
    private final OptionalDouble openingsPerDay;
    private final Figures figures;
    private final PageWords words;
    private final Function<String, String> typed;
    private final List<Slide> slides = new ArrayList<>();
    private boolean faulty;
    private boolean changed;

    /**
     * A field that a script gives a slider.
     *
     * @param field the field
     * @param low least of the slider, in the person's unit
     * @param high most of it
     * @param step its step
     */
    public record Slide(FieldView field, String low, String high, String step) {}

    /** Reads what was typed; blank is as planned. */
    WhatIfForm(
            double settingC,
            OptionalDouble openingsPerDay,
            Figures figures,
            PageWords words,
            Function<String, String> typed) {
        this.settingC = settingC;
        this.openingsPerDay = openingsPerDay;
        this.figures = figures;
        this.words = words;
        this.typed = typed;
    }

    /** The changes; nothing where a field has a fault. */
    Optional<Changes> changes() {
        Changes changes = Changes.NOTHING;
        OptionalDouble setting = setting();
        OptionalDouble insulation = percent("insulation");
        OptionalDouble openings = door();
        OptionalDouble cooling = percent("cooling");
        OptionalDouble load = percent("load");
        if (faulty) {
            return Optional.empty();
        }
        if (setting.isPresent()) {
            changes = changes.setTo(setting.getAsDouble());
        }
        if (insulation.isPresent()) {
            changes =
                    changes.insulated(
                            new Changes.Insulation(insulation.getAsDouble(), Optional.empty()));
        }
        if (openings.isPresent()) {
            changes = changes.through(new Changes.DoorUse(openings, Optional.empty()));
        }
        if (cooling.isPresent()) {
            changes = changes.cooled(cooling.getAsDouble());
        }
        return Optional.of(load.isPresent() ? changes.loaded(load.getAsDouble()) : changes);
    }

    /** The fields, with what was typed and its faults; to be asked after the changes. */
    List<Slide> slides() {
        return List.copyOf(slides);
    }

    /** Whether anything was asked at all. */
    boolean asked() {
        return changed;
    }

    private OptionalDouble setting() {
        double planned = settingC;
        OptionalDouble given = figures.temperatureC(typed("setting"));
        double low = figures.shownTemperature(LEAST_C);
        double high = figures.shownTemperature(MOST_C);
        Held held = held("setting", given, new double[] {LEAST_C, MOST_C}, range(low, high));
        slides.add(
                slide(
                        "setting",
                        held,
                        figures.typedTemperature(planned),
                        figures.temperatureUnit(),
                        new double[] {
                            Math.round(figures.shownTemperature(planned - SLIDE_K)),
                            Math.round(figures.shownTemperature(planned + SLIDE_K)),
                            0.5
                        }));
        return differs(held.value(), planned);
    }

    private OptionalDouble percent(String name) {
        OptionalDouble given = figures.number(typed(name));
        double[] limits = {LEAST_PCT, MOST_PCT};
        Held held = held(name, given, limits, range(LEAST_PCT, MOST_PCT));
        slides.add(slide(name, held, "100", "%", new double[] {25, 300, 5}));
        OptionalDouble other = differs(held.value(), 100);
        return other.isPresent() ? OptionalDouble.of(other.getAsDouble() / 100) : other;
    }

    private OptionalDouble door() {
        if (openingsPerDay.isEmpty()) {
            return OptionalDouble.empty();
        }
        double planned = openingsPerDay.getAsDouble();
        OptionalDouble given = figures.number(typed("door"));
        double[] limits = {0, MOST_OPENINGS};
        Held held = held("door", given, limits, range(0, MOST_OPENINGS));
        double most = Math.max(40, 3 * planned);
        slides.add(slide("door", held, figures.typed(planned), "", new double[] {0, most, 1}));
        return differs(held.value(), planned);
    }

    private static OptionalDouble differs(OptionalDouble given, double planned) {
        boolean same = given.isEmpty() || Math.abs(given.getAsDouble() - planned) < 1e-9;
        return same ? OptionalDouble.empty() : given;
    }

    private String typed(String name) {
        String given = typed.apply(name);
        changed |= !given.isBlank();
        return given;
    }

    private String range(double low, double high) {
        return words.say("what.accepted", figures.typed(low), figures.typed(high));
    }

    /** What a field holds: nothing where it is blank or beyond its range. */
    private record Held(OptionalDouble value, String range, String fault) {}

    private Held held(String name, OptionalDouble given, double[] limits, String range) {
        boolean blank = typed(name).isBlank();
        boolean good =
                given.isPresent()
                        && given.getAsDouble() >= limits[0]
                        && given.getAsDouble() <= limits[1];
        faulty |= !blank && !good;
        return new Held(good ? given : OptionalDouble.empty(), range, blank || good ? "" : range);
    }

    private Slide slide(String name, Held held, String planned, String unit, double[] scale) {
        String given = typed(name);
        String usual = (planned + " " + unit).strip();
        FieldView field =
                FieldView.number(
                                name,
                                words.say("what." + name),
                                given.isBlank() ? planned : given,
                                unit)
                        .withHint(words.say("what.as-planned", usual, held.range()))
                        .withFault(held.fault());
        return new Slide(field, plain(scale[0]), plain(scale[1]), plain(scale[2]));
    }

    private static String plain(double value) {
        return java.math.BigDecimal.valueOf(value).stripTrailingZeros().toPlainString();
    }
}
