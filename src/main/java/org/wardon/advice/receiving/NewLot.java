package org.wardon.advice.receiving;

import java.time.LocalDateTime;
import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.errors.Limits;
import org.wardon.plan.Purpose;
import org.wardon.produce.Ripeness;

/**
 * A lot as a keeper tells it at the door. What is not told is assumed, and the answer says so.
 *
 * @param commodity id or any name
 * @param massKg net mass, kg
 * @param fruit what was seen and measured of it
 * @param wish when it comes and what it is to become
 */
public record NewLot(String commodity, double massKg, Fruit fruit, Wish wish) {
    /** Masses that are taken, kg, as a plan takes them. */
    public static final Limits MASS_KG = new Limits(0.1, 500_000);

    /** Temperatures of the flesh that are taken, °C, as a plan takes them. */
    public static final Limits PULP_C = new Limits(-5, 55);

    /** Prices that are taken, currency/kg, as a plan takes them. */
    public static final Limits PRICE_PER_KG = new Limits(0, 1e6);

    /**
     * What was seen and measured.
     *
     * @param temperatureC pulp, °C; absent: the outdoor air of the hour
     * @param ripeness how far it has ripened
     * @param harvestedHoursAgo hours since harvest; absent: drawn from 4 to 36
     * @param cured whether a bulb, root or tuber was cured
     * @param packed id of its package; absent: any package in a room with fans
     * @param variant id of its variant
     */
    public record Fruit(
            OptionalDouble temperatureC,
            Ripeness ripeness,
            OptionalDouble harvestedHoursAgo,
            Optional<Boolean> cured,
            Optional<String> packed,
            Optional<String> variant) {
        /** Nothing was seen. */
        public static final Fruit UNSEEN =
                new Fruit(
                        OptionalDouble.empty(),
                        Ripeness.UNKNOWN,
                        OptionalDouble.empty(),
                        Optional.empty(),
                        Optional.empty(),
                        Optional.empty());

        /**
         * Returns the same with its flesh measured.
         *
         * @param pulpC °C
         * @return the changed copy
         */
        public Fruit at(double pulpC) {
            return new Fruit(
                    OptionalDouble.of(pulpC), ripeness, harvestedHoursAgo, cured, packed, variant);
        }

        /**
         * Returns the same with its ripeness seen.
         *
         * @param seen how ripe
         * @return the changed copy
         */
        public Fruit ripened(Ripeness seen) {
            return new Fruit(temperatureC, seen, harvestedHoursAgo, cured, packed, variant);
        }

        /**
         * Returns the same with its harvest known.
         *
         * @param hoursAgo hours since harvest
         * @return the changed copy
         */
        public Fruit harvested(double hoursAgo) {
            return new Fruit(
                    temperatureC, ripeness, OptionalDouble.of(hoursAgo), cured, packed, variant);
        }
    }

    /**
     * When it comes and what it is to become.
     *
     * @param at local time; absent: the start of the plan
     * @param wantedDays days wanted in the store; absent: 7
     * @param marketDays days from leaving to the buyer; absent: 2
     * @param purpose what ripening fruit is kept for; absent: sent on green where it is green
     * @param pricePerKg value of a sound kilogram; absent: as the plan's lots of the crop, else as
     *     all its lots, else 1
     */
    public record Wish(
            Optional<LocalDateTime> at,
            OptionalDouble wantedDays,
            OptionalDouble marketDays,
            Optional<Purpose> purpose,
            OptionalDouble pricePerKg) {
        /** Nothing was said. */
        public static final Wish UNSAID =
                new Wish(
                        Optional.empty(),
                        OptionalDouble.empty(),
                        OptionalDouble.empty(),
                        Optional.empty(),
                        OptionalDouble.empty());

        /**
         * Returns the same at a time.
         *
         * @param time local time
         * @return the changed copy
         */
        public Wish coming(LocalDateTime time) {
            return new Wish(Optional.of(time), wantedDays, marketDays, purpose, pricePerKg);
        }

        /**
         * Returns the same with days wanted.
         *
         * @param days in the store
         * @return the changed copy
         */
        public Wish wanting(double days) {
            return new Wish(at, OptionalDouble.of(days), marketDays, purpose, pricePerKg);
        }

        /**
         * Returns the same with its way to the buyer known.
         *
         * @param days from leaving to the buyer
         * @return the changed copy
         */
        public Wish travelling(double days) {
            return new Wish(at, wantedDays, OptionalDouble.of(days), purpose, pricePerKg);
        }

        /**
         * Returns the same kept for a purpose.
         *
         * @param keptFor the purpose
         * @return the changed copy
         */
        public Wish keptFor(Purpose keptFor) {
            return new Wish(at, wantedDays, marketDays, Optional.of(keptFor), pricePerKg);
        }

        /**
         * Returns the same at a price.
         *
         * @param perKg currency/kg
         * @return the changed copy
         */
        public Wish worth(double perKg) {
            return new Wish(at, wantedDays, marketDays, purpose, OptionalDouble.of(perKg));
        }
    }

    /**
     * A lot of which crop and mass alone are known.
     *
     * @param commodity id or any name
     * @param massKg net mass, kg
     * @return the lot
     */
    public static NewLot of(String commodity, double massKg) {
        return new NewLot(commodity, massKg, Fruit.UNSEEN, Wish.UNSAID);
    }

    /**
     * Returns the lot with what was seen of it.
     *
     * @param seen what was seen
     * @return the changed copy
     */
    public NewLot seen(Fruit seen) {
        return new NewLot(commodity, massKg, seen, wish);
    }

    /**
     * Returns the lot with what is wished of it.
     *
     * @param wished what is wished
     * @return the changed copy
     */
    public NewLot wished(Wish wished) {
        return new NewLot(commodity, massKg, fruit, wished);
    }

    /**
     * Returns a heavier or lighter lot.
     *
     * @param kg net mass, kg
     * @return the changed copy
     */
    public NewLot weighing(double kg) {
        return new NewLot(commodity, kg, fruit, wish);
    }
}
