package org.wardon.cli;

import java.time.LocalDateTime;
import java.time.format.DateTimeParseException;
import java.util.Optional;
import java.util.OptionalDouble;
import org.jspecify.annotations.Nullable;
import org.wardon.advice.receiving.NewLot;
import org.wardon.errors.BadInput;
import org.wardon.plan.Purpose;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** What a keeper tells of a lot at the door. */
final class NewLotWords {
    /** What ripening fruit is kept for, as it is typed. */
    enum KeptFor {
        /** To be sent on unripe. */
        SHIP_GREEN(Purpose.SHIP_GREEN),
        /** To be sold ripe. */
        SELL_RIPE(Purpose.SELL_RIPE);

        private final Purpose purpose;

        KeptFor(Purpose purpose) {
            this.purpose = purpose;
        }

        @Override
        public String toString() {
            return this == SHIP_GREEN ? "ship-green" : "sell-ripe";
        }
    }

    @Mixin private LooksWords looks = new LooksWords();

    @Option(
            names = "--commodity",
            paramLabel = "NAME",
            required = true,
            description = "What it is: an id or any common name.")
    private String commodity = "";

    @Option(
            names = "--mass",
            paramLabel = "KG",
            required = true,
            description = "Net mass without packages, kg.")
    private double massKg;

    @Option(
            names = "--temperature",
            paramLabel = "C",
            description =
                    "Of its flesh, measured in the middle of a fruit, °C (default: the outdoor air of"
                            + " the hour).")
    private @Nullable Double temperatureC;

    @Option(
            names = "--purpose",
            paramLabel = "WHAT",
            description = "Of green fruit: ship-green (default) or sell-ripe.")
    private @Nullable KeptFor purpose;

    @Option(
            names = "--harvested",
            paramLabel = "HOURS",
            description = "Hours since harvest (default: 4 to 36 are drawn).")
    private @Nullable Double harvestedHoursAgo;

    @Option(
            names = "--package",
            paramLabel = "ID",
            description = "Its package, an id of the tables (default: room-cooling-any).")
    private @Nullable String packed;

    @Option(
            names = "--at",
            paramLabel = "TIME",
            description =
                    "When it comes, local time such as 2026-03-04T15:00 (default: the start of the"
                            + " plan).")
    private @Nullable String at;

    @Option(
            names = "--days",
            paramLabel = "N",
            description = "Days wanted in the store (default: 7).")
    private @Nullable Double wantedDays;

    @Option(
            names = "--market-days",
            paramLabel = "N",
            description = "Days from leaving to the buyer (default: 2).")
    private @Nullable Double marketDays;

    @Option(
            names = "--price",
            paramLabel = "MONEY",
            description =
                    "Value of a sound kilogram (default: as the plan's lots of this crop, else as all"
                            + " its lots).")
    private @Nullable Double pricePerKg;

    NewLot lot() {
        return new NewLot(
                commodity,
                massKg,
                new NewLot.Fruit(
                        given(temperatureC),
                        looks.ripeness(),
                        given(harvestedHoursAgo),
                        looks.cured(),
                        Optional.ofNullable(packed),
                        looks.variant()),
                new NewLot.Wish(
                        Optional.ofNullable(at).map(NewLotWords::time),
                        given(wantedDays),
                        given(marketDays),
                        Optional.ofNullable(purpose).map(kept -> kept.purpose),
                        given(pricePerKg)));
    }

    private static LocalDateTime time(String typed) {
        try {
            return LocalDateTime.parse(typed);
        } catch (DateTimeParseException e) {
            throw new BadInput(
                    "--at",
                    "",
                    "is '" + typed + "', no local time",
                    "accepted: such as 2026-03-04T15:00");
        }
    }

    private static OptionalDouble given(@Nullable Double value) {
        return value == null ? OptionalDouble.empty() : OptionalDouble.of(value);
    }
}
