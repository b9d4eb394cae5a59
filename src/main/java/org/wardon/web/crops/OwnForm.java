package org.wardon.web.crops;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.errors.BadInput;
import org.wardon.errors.Fault;
import org.wardon.errors.Limits;
import org.wardon.reference.OwnValue;
import org.wardon.web.pages.Call;
import org.wardon.web.pages.FieldView;
import org.wardon.web.pages.Figures;
import org.wardon.web.pages.PageWords;

/** Own values of a crop, and the form that sets one. */
final class OwnForm {
    private static final List<String> NAMES =
            List.of(
                    "storage-temperature",
                    "storage-humidity",
                    "storage-life",
                    "life",
                    "highest-freezing-point",
                    "chilling-floor",
                    "permissible-loss",
                    "respiration-heat");
    private static final List<String> DEGREES =
            List.of("storage-temperature", "highest-freezing-point", "chilling-floor");
    private static final List<String> AT_TEMPERATURE = List.of("life", "respiration-heat");

    private static final String LOW = "own-low";
    private static final String HIGH = "own-high";
    private static final String AT = "own-at";
    private static final List<String> FIELDS = List.of(LOW, HIGH, AT);

    private final List<Fault> faults = new ArrayList<>();
    private final Call call;
    private final PageWords page;
    private final Figures figures;

    OwnForm(Call call, PageWords page) {
        this.call = call;
        this.page = page;
        figures = call.figures();
    }

    CropView.OwnView view(List<CropView.Line> values, List<Fault> faults) {
        String unit = figures.temperatureUnit();
        List<FieldView> fields =
                List.of(
                        field(LOW, "", faults).asNeeded(),
                        field(HIGH, "", faults),
                        field(AT, unit, faults));
        List<CropView.Pick> names = new ArrayList<>();
        for (String name : NAMES) {
            names.add(
                    new CropView.Pick(
                            name,
                            page.say("own." + name, unit),
                            name.equals(call.field("own-fact"))));
        }
        return new CropView.OwnView(
                values,
                names,
                fields,
                faults.stream()
                        .filter(fault -> !FIELDS.contains(fault.file()))
                        .map(OwnForm::told)
                        .toList());
    }

    private static String told(Fault fault) {
        return fault.found() + "; " + fault.accepted();
    }

    private FieldView field(String name, String unit, List<Fault> faults) {
        return FieldView.number(
                        name, page.say(name), faults.isEmpty() ? "" : call.field(name), unit)
                .withHint(page.say("hint-" + name))
                .withFault(
                        faults.stream()
                                .filter(fault -> fault.file().equals(name))
                                .findFirst()
                                .map(OwnForm::told)
                                .orElse(""));
    }

    /**
     * Returns the value that was typed.
     *
     * @throws BadInput with every fault, one a field
     */
    OwnValue value(String cropId, String now) {
        String name = call.field("own-fact");
        boolean degrees = DEGREES.contains(name);
        boolean atTemperature = AT_TEMPERATURE.contains(name);
        Optional<Limits> limits = OwnValue.limits(name);
        double low = number(LOW, degrees, limits);
        double high = call.field(HIGH).isBlank() ? low : number(HIGH, degrees, limits);
        double atC = atTemperature ? number(AT, true, Optional.of(OwnValue.AT_C)) : 0;
        if (!atTemperature && !call.field(AT).isBlank()) {
            faults.add(new Fault(AT, "", page.say("own-at.unused"), page.say("own-at.unused-do")));
        }
        if (faults.isEmpty() && low > high) {
            faults.add(new Fault(HIGH, "", page.say("own-high.below"), page.say("own-high.do")));
        }
        if (!faults.isEmpty()) {
            throw new BadInput(faults);
        }
        return OwnValue.of(
                cropId, atTemperature ? name + "@" + tenth(atC) + "C" : name, low, high, now);
    }

    private static String tenth(double temperatureC) {
        double atC = Math.rint(10 * temperatureC) / 10;
        return atC == Math.rint(atC) ? String.valueOf((long) atC) : String.valueOf(atC);
    }

    /** The number of a field; 0 where it has a fault, which is noted. */
    private double number(String field, boolean degrees, Optional<Limits> limits) {
        String typed = call.field(field);
        OptionalDouble read = degrees ? figures.temperatureC(typed) : figures.number(typed);
        if (read.isEmpty()) {
            String found =
                    typed.isBlank() ? page.say("crop.missing") : page.say("crop.no-number", typed);
            faults.add(new Fault(field, "", found, page.say("crop.give-number")));
        } else if (limits.isPresent() && !limits.get().hold(read.getAsDouble())) {
            faults.add(
                    new Fault(
                            field,
                            "",
                            page.say("crop.out-of-range", typed),
                            page.say(
                                    "crop.give-within",
                                    shown(limits.get().low(), degrees),
                                    shown(limits.get().high(), degrees))));
        }
        return read.orElse(0);
    }

    private String shown(double value, boolean degrees) {
        return degrees ? figures.typedTemperature(value) : figures.typed(value);
    }
}
