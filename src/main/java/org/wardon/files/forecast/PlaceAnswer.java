package org.wardon.files.forecast;

import com.fasterxml.jackson.annotation.JsonInclude;
import java.time.LocalDateTime;
import java.util.List;
import java.util.OptionalDouble;

/**
 * The answer of {@code place}.
 *
 * @param placing version of the format, 1
 * @param chambers what goes where
 * @param unplaced lots for which no place was found
 * @param value value kept net of energy as the forecast of this placing tells it, currency
 * @param bound no placing can be worth more by what is known of the chambers, currency
 * @param gapPct how far the value is below the bound, percent of the bound
 * @param because why each lot stands where it stands, and what other chambers would cost it
 * @param wish what was sought
 * @param assumedValue the value as the search had assumed it, currency
 * @param presentValue the value of the plan's own arrangement, lots without a chamber left out,
 *     currency
 * @param proven whether the search was complete
 * @param told the gap in plain words
 * @param moves lots that stand elsewhere than the plan has them
 * @param changes what is dialled otherwise than in the plan
 * @param worth what one more chamber or one kelvin would be worth
 * @param notes what else is to be known, cautions among it
 */
public record PlaceAnswer(
        int placing,
        List<Placed> chambers,
        List<Unplaced> unplaced,
        double value,
        double bound,
        double gapPct,
        List<Choice> because,
        String wish,
        double assumedValue,
        double presentValue,
        boolean proven,
        String told,
        List<Change> moves,
        List<Change> changes,
        List<Worth> worth,
        List<Because> notes) {
    /** Version of the format. */
    public static final int VERSION = 1;

    /** Copies the lists. */
    public PlaceAnswer {
        chambers = List.copyOf(chambers);
        unplaced = List.copyOf(unplaced);
        because = List.copyOf(because);
        moves = List.copyOf(moves);
        changes = List.copyOf(changes);
        worth = List.copyOf(worth);
        notes = List.copyOf(notes);
    }

    /**
     * One chamber.
     *
     * @param id its id
     * @param setting what to dial in
     * @param off whether it is switched off
     * @param airC mean of its air in the forecast, °C
     * @param lots ids of its lots
     * @param text why it is set so
     */
    public record Placed(
            String id, Dial setting, boolean off, double airC, List<String> lots, String text) {
        /** Copies the list. */
        public Placed {
            lots = List.copyOf(lots);
        }
    }

    /**
     * What to dial in.
     *
     * @param temperatureC air temperature, °C
     * @param humidityPct humidity wished for, percent
     * @param later other settings from later times on
     */
    public record Dial(
            double temperatureC,
            double humidityPct,
            @JsonInclude(JsonInclude.Include.NON_EMPTY) List<Later> later) {
        /** Copies the list. */
        public Dial {
            later = List.copyOf(later);
        }
    }

    /**
     * What to dial in later.
     *
     * @param from local time from which on
     * @param temperatureC air temperature, °C
     */
    public record Later(LocalDateTime from, double temperatureC) {}

    /**
     * Something that is to be otherwise than in the plan.
     *
     * @param subject id of a lot or chamber
     * @param text the sentence
     */
    public record Change(String subject, String text) {}

    /**
     * What something would be worth by what is assumed.
     *
     * @param subject id of a chamber
     * @param what {@code one-more-chamber}, {@code kelvin-colder} or {@code kelvin-warmer}
     * @param value value gained, currency
     * @param text the sentence
     */
    public record Worth(String subject, String what, double value, String text) {}

    /**
     * A lot without a place.
     *
     * @param lot its id
     * @param text why
     */
    public record Unplaced(String lot, String text) {}

    /**
     * Why a lot stands where it stands.
     *
     * @param lot its id
     * @param chamber the chamber spoken of
     * @param here whether it stands there
     * @param costDays days it would lose there, where it does not stand; below 0 for a gain; null
     *     where it cannot stand there
     * @param costValue value it would lose there, likewise, currency
     * @param text the sentence
     */
    public record Choice(
            String lot,
            String chamber,
            boolean here,
            OptionalDouble costDays,
            OptionalDouble costValue,
            String text) {}
}
