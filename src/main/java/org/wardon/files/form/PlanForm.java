package org.wardon.files.form;

import java.util.Optional;
import org.wardon.files.Schema;
import org.wardon.files.json.Faults;
import org.wardon.files.json.Json;
import org.wardon.files.json.JsonPath;
import org.wardon.files.json.JsonText;
import org.wardon.files.json.Shape;

/** The places of a plan. */
public final class PlanForm {
    private static final Shape SHAPE = Schema.shape();

    private final FormPlace root;

    private PlanForm(FormPlace root) {
        this.root = root;
    }

    /**
     * Reads a plan for a form. What is wrong with it matters not, as long as it is JSON.
     *
     * @param text its text
     * @return the form
     * @throws org.wardon.errors.BadInput where it is no JSON
     */
    public static PlanForm of(String text) {
        Faults faults = new Faults("plan");
        Optional<Json> json = JsonText.read(text, faults);
        if (json.isEmpty()) {
            faults.refuseIfAny();
        }
        return new PlanForm(new FormPlace(JsonPath.ROOT, "", true, SHAPE, json));
    }

    /**
     * Returns the whole plan.
     *
     * @return its place
     */
    public FormPlace root() {
        return root;
    }

    /**
     * Returns a place.
     *
     * @param path its path
     * @return the place, absent where the schema knows none; nothing need stand there
     */
    public Optional<FormPlace> at(JsonPath path) {
        Optional<FormPlace> here = Optional.of(root);
        for (JsonPath.Step step : path.steps()) {
            here = here.flatMap(place -> down(place, step));
        }
        return here;
    }

    private static Optional<FormPlace> down(FormPlace place, JsonPath.Step step) {
        JsonPath wanted = place.path().then(step);
        Optional<FormPlace> there =
                place.places().stream().filter(one -> one.path().equals(wanted)).findFirst();
        if (there.isPresent() || !(place.shape() instanceof Shape.Choice choice)) {
            return there;
        }
        return step instanceof JsonPath.Member member
                ? choice.option(member.name())
                        .filter(option -> option.by() == Shape.By.NAME)
                        .map(place::ofOption)
                : Optional.empty();
    }
}
