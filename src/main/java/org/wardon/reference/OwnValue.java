package org.wardon.reference;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.errors.BadInput;
import org.wardon.errors.Fault;
import org.wardon.errors.Limits;
import org.wardon.produce.Evidence;
import org.wardon.produce.Fact;
import org.wardon.produce.NamedFact;

/**
 * A keeper's own value for a fact of a commodity.
 *
 * @param commodityId the commodity
 * @param name the fact, such as {@code storage-temperature} or {@code respiration-heat@10C}
 * @param low lower bound in {@code unit}
 * @param high upper bound in {@code unit}, not below the lower
 * @param unit unit, which follows from the name
 * @param setAt when it was set, ISO 8601 in UTC
 */
public record OwnValue(
        String commodityId, String name, double low, double high, String unit, String setAt) {
    /** What stands for the source of an own value. */
    public static final String SOURCE = "own";

    /** Temperatures at which a fact can be told to hold, °C. */
    public static final Limits AT_C = new Limits(OwnName.COLDEST_C, OwnName.HOTTEST_C);

    /**
     * Returns what a fact accepts.
     *
     * @param word name of the fact, without a temperature
     * @return in the unit of that fact; absent for one that cannot be set
     */
    public static Optional<Limits> limits(String word) {
        return OwnName.limits(word);
    }

    /**
     * Returns a value for a fact, in the unit of that fact.
     *
     * @param commodityId the commodity, an id of the tables
     * @param name the fact
     * @param low lower bound
     * @param high upper bound
     * @param setAt when it was set, ISO 8601 in UTC
     * @return the value
     * @throws BadInput for a fact that cannot be set or a figure out of its range
     */
    public static OwnValue of(
            String commodityId, String name, double low, double high, String setAt) {
        String where = commodityId + " " + name;
        OwnName own =
                OwnName.of(name)
                        .orElseThrow(
                                () ->
                                        new BadInput(
                                                where,
                                                "",
                                                "no fact of this name can be set",
                                                "one of " + OwnName.accepted()));
        List<Fault> faults = new ArrayList<>();
        for (double value : low == high ? new double[] {low} : new double[] {low, high}) {
            if (!own.kind().accepts(value)) {
                faults.add(new Fault(where, "", String.valueOf(value), own.kind().accepted()));
            }
        }
        if (low > high) {
            faults.add(new Fault(where, "", low + " is above " + high, "give the lower first"));
        }
        if (!faults.isEmpty()) {
            throw new BadInput(faults);
        }
        return new OwnValue(commodityId, name, low, high, own.kind().unit(), setAt);
    }

    Fact fact() {
        return new Fact(
                OptionalDouble.of(low), OptionalDouble.of(high), unit, SOURCE, Evidence.OWN, true);
    }

    NamedFact named() {
        return new NamedFact(
                name,
                OptionalDouble.of(low),
                OptionalDouble.of(high),
                unit,
                "",
                SOURCE,
                Evidence.OWN,
                true,
                "set " + setAt,
                SOURCE);
    }
}
