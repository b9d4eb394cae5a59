package org.wardon.files;

import java.time.LocalDateTime;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.cooling.Control;
import org.wardon.files.json.Json;
import org.wardon.files.json.Part;
import org.wardon.plan.Assumed;
import org.wardon.plan.Default;

/** Takes values from a checked plan and notes each default it puts in. */
final class Inputs {
    private final Map<String, Assumed> assumed = new LinkedHashMap<>();

    List<Assumed> assumed() {
        return List.copyOf(assumed.values());
    }

    double number(Part owner, String name) {
        return owner.at(name).number().orElseThrow();
    }

    OptionalDouble maybe(Part owner, String name) {
        return owner.at(name).number();
    }

    /** Returns the number, or the default, which is then told. */
    double number(Part owner, String name, Default otherwise) {
        return number(owner, name, otherwise.value(), otherwise.unit(), otherwise.mark());
    }

    /** Returns the number, or one worked out, which is then told. */
    double number(Part owner, String name, double otherwise, String unit, String mark) {
        OptionalDouble given = owner.at(name).number();
        if (given.isPresent()) {
            return given.getAsDouble();
        }
        note(owner, name, plain(otherwise), unit, mark);
        return otherwise;
    }

    /** Returns the number, or what its absence plainly means, which needs no telling. */
    double numberElse(Part owner, String name, double otherwise) {
        return owner.at(name).number().orElse(otherwise);
    }

    String text(Part owner, String name) {
        return owner.at(name).text().orElseThrow();
    }

    /** Returns the text, or the default, which is then told. */
    String text(Part owner, String name, String otherwise, String mark) {
        Optional<String> given = owner.at(name).text();
        if (given.isEmpty()) {
            note(owner, name, otherwise, "", mark);
        }
        return given.orElse(otherwise);
    }

    boolean flag(Part owner, String name) {
        return owner.at(name).flag().orElse(false);
    }

    /** Returns how a cooler follows its thermostat: on and off, unless modulating is asked for. */
    Control control(Part cooler) {
        return cooler.at("control").text().equals(Optional.of("modulating"))
                ? Control.MODULATING
                : Control.ON_OFF;
    }

    Optional<LocalDateTime> time(Part owner, String name) {
        return owner.at(name).text().map(LocalDateTime::parse);
    }

    void note(Part owner, String name, String value, String unit, String mark) {
        String path = Json.member(owner.path(), name);
        assumed.putIfAbsent(path, new Assumed(path, value, unit, mark));
    }

    static String plain(double value) {
        double rounded = Math.rint(value * 1e4) / 1e4;
        return rounded == Math.rint(rounded)
                ? String.valueOf(Math.round(rounded))
                : String.valueOf(rounded);
    }
}
