package org.wardon.files;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.wardon.errors.BadInput;
import org.wardon.files.forecast.WrittenNumber;
import org.wardon.files.json.Faults;
import org.wardon.files.json.Json;
import org.wardon.files.json.JsonEdit;
import org.wardon.files.json.JsonPath;
import org.wardon.files.json.JsonText;
import org.wardon.files.json.Part;
import org.wardon.plan.AtDoor;
import org.wardon.plan.LotPlan;
import org.wardon.plan.Market;
import org.wardon.plan.PackagePlan;
import org.wardon.plan.Place;
import org.wardon.produce.Ripeness;

/** Adds a lot to the text of a store plan and leaves all else in it as it was typed. */
public final class LotIntoPlan {
    private static final JsonPath LOTS = JsonPath.ROOT.then(new JsonPath.Member("lots"));

    private LotIntoPlan() {}

    /**
     * Adds a lot to a plan.
     *
     * @param text the plan
     * @param shown its name in messages
     * @param lot the lot, at the door: without moves
     * @return the plan with the lot behind its others, every other letter as it was
     * @throws BadInput where the text is no JSON object, its {@code lots} are no list, or a lot has
     *     that id already
     */
    public static String addedTo(String text, String shown, LotPlan lot) {
        Faults faults = new Faults(shown);
        Optional<Json> json = JsonText.read(text, faults);
        faults.refuseIfAny();
        Part plan = Part.root(json.orElseThrow());
        if (!(json.get() instanceof Json.Obj)) {
            throw new BadInput(shown, "$", "is no object", "accepted: a store plan");
        }
        Part lots = plan.at("lots");
        if (lots.given() && !(lots.json().orElseThrow() instanceof Json.Arr)) {
            throw new BadInput(shown, lots.path(), "is no list", "accepted: a list of lots");
        }
        for (Part other : lots.items()) {
            if (other.at("id").text().equals(Optional.of(lot.id()))) {
                throw new BadInput(
                        shown,
                        other.path() + ".id",
                        "is '" + lot.id() + "', the id of the new lot",
                        "accepted: each id once");
            }
        }
        JsonEdit edit = JsonEdit.of(text);
        JsonEdit with =
                lots.given()
                        ? edit.insert(LOTS, lots.items().size(), json(lot))
                        : edit.set(LOTS, "[" + json(lot) + "]");
        return with.text();
    }

    private static String json(LotPlan lot) {
        List<String> members = new ArrayList<>();
        members.add(word("id", lot.id()));
        members.add(word("commodity", lot.commodity()));
        lot.variant().ifPresent(variant -> members.add(word("variant", variant)));
        members.add(number("massKg", lot.massKg()));
        members.add("\"package\": " + packed(lot.packed()));
        members.add(word("arrives", lot.arrives().toString()));
        members.add(number("temperatureC", lot.temperatureC()));
        atDoor(lot.atDoor(), members);
        members.add(number("wantedDays", lot.wantedDays()));
        market(lot.market(), members);
        lot.chamber().ifPresent(chamber -> members.add(word("chamber", chamber)));
        if (lot.place() != Place.MIDDLE) {
            members.add(word("place", hyphened(lot.place())));
        }
        return "{" + String.join(", ", members) + "}";
    }

    private static void atDoor(AtDoor door, List<String> members) {
        door.harvested().ifPresent(time -> members.add(word("harvested", time.toString())));
        door.heldC().ifPresent(held -> members.add(number("heldC", held)));
        door.usedPct().ifPresent(used -> members.add(number("usedPct", used)));
        if (door.ripeness() != Ripeness.UNKNOWN) {
            members.add(word("ripeness", hyphened(door.ripeness())));
        }
        door.cured().ifPresent(cured -> members.add("\"cured\": " + cured));
    }

    private static void market(Market market, List<String> members) {
        members.add(number("marketDays", market.days()));
        market.temperatureC().ifPresent(warm -> members.add(number("marketC", warm)));
        market.purpose().ifPresent(purpose -> members.add(word("purpose", hyphened(purpose))));
        members.add(number("pricePerKg", market.pricePerKg()));
    }

    private static String packed(PackagePlan packed) {
        if (packed instanceof PackagePlan.HalfCooling time) {
            return "{" + number("halfCoolingHours", time.hours()) + "}";
        }
        if (packed instanceof PackagePlan.Stack stack) {
            return "{" + number("stackHalfThicknessM", stack.halfThicknessM()) + "}";
        }
        return "\"" + ((PackagePlan.Named) packed).id() + "\"";
    }

    private static String hyphened(Enum<?> value) {
        return value.name().toLowerCase(Locale.ROOT).replace('_', '-');
    }

    /** Ids, words and times of a lot hold nothing that has to be escaped. */
    private static String word(String name, String value) {
        return "\"" + name + "\": \"" + value + "\"";
    }

    private static String number(String name, double value) {
        return "\"" + name + "\": " + WrittenNumber.text(value);
    }
}
