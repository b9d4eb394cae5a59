package org.wardon.web.crops;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.wardon.errors.BadInput;
import org.wardon.errors.Fault;
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
        List<FieldView> fields = new ArrayList<>();
        fields.add(field("own-low", "", faults.isEmpty()).asNeeded());
        fields.add(field("own-high", "", faults.isEmpty()));
        fields.add(field("own-at", unit, faults.isEmpty()));
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
                faults.stream().map(f -> f.found() + "; " + f.accepted()).toList());
    }

    private FieldView field(String name, String unit, boolean fresh) {
        return FieldView.number(name, page.say(name), fresh ? "" : call.field(name), unit)
                .withHint(page.say("hint-" + name));
    }

    /**
     * Returns the value that was typed.
     *
     * @throws BadInput where it is none
     */
    OwnValue value(String cropId, String now) {
        String name = call.field("own-fact");
        boolean degrees = DEGREES.contains(name);
        double low = number("own-low", degrees);
        double high = call.field("own-high").isBlank() ? low : number("own-high", degrees);
        String whole = AT_TEMPERATURE.contains(name) ? name + "@" + at() + "C" : name;
        return OwnValue.of(cropId, whole, low, high, now);
    }

    private String at() {
        double atC = Math.rint(10 * number("own-at", true)) / 10;
        return atC == Math.rint(atC) ? String.valueOf((long) atC) : String.valueOf(atC);
    }

    private double number(String field, boolean degrees) {
        String typed = call.field(field);
        OptionalDouble read = degrees ? figures.temperatureC(typed) : figures.number(typed);
        return read.orElseThrow(
                () ->
                        new BadInput(
                                page.say(field),
                                "",
                                typed.isBlank()
                                        ? page.say("crop.missing-in", page.say(field))
                                        : page.say("crop.no-number", typed),
                                page.say("crop.give-number")));
    }
}
