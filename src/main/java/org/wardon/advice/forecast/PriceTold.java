package org.wardon.advice.forecast;

import org.wardon.advice.wording.Words;
import org.wardon.files.forecast.ShareAnswer;
import org.wardon.sharing.Price;

/** Puts what an accepted conflict costs into an answer. */
public final class PriceTold {
    private PriceTold() {}

    /**
     * Returns it with its sentence.
     *
     * @param price what is borne
     * @param words words and units of the person
     * @return as answers have it
     */
    public static ShareAnswer.Accepted of(Price price, Words words) {
        return new ShareAnswer.Accepted(
                price.conflict().word(),
                price.id(),
                price.from(),
                price.daysLost(),
                words.sentence(price.told()));
    }
}
