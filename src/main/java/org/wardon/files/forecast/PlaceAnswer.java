package org.wardon.files.forecast;

import java.util.List;

/**
 * The answer of {@code place}.
 *
 * @param placing version of the format, 1
 * @param chambers what goes where
 * @param unplaced lots for which no place was found
 * @param value value kept net of energy, currency
 * @param bound no placing can be worth more, currency
 * @param gapPct how far the value is below the bound, percent of the bound
 * @param because why each lot stands where it stands
 */
public record PlaceAnswer(
        int placing,
        List<Placed> chambers,
        List<Unplaced> unplaced,
        double value,
        double bound,
        double gapPct,
        List<Choice> because) {
    /** Version of the format. */
    public static final int VERSION = 1;

    /** Copies the lists. */
    public PlaceAnswer {
        chambers = List.copyOf(chambers);
        unplaced = List.copyOf(unplaced);
        because = List.copyOf(because);
    }

    /**
     * One chamber.
     *
     * @param id its id
     * @param setting what to dial in
     * @param lots ids of its lots
     */
    public record Placed(String id, Dial setting, List<String> lots) {
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
     */
    public record Dial(double temperatureC, double humidityPct) {}

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
     * @param text the sentence
     */
    public record Choice(String lot, String chamber, String text) {}
}
