package org.wardon.advice.receiving;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.advice.Ranges;
import org.wardon.files.forecast.ChillingRisk;
import org.wardon.files.forecast.ReceiveAnswer;
import org.wardon.files.forecast.ReceiveAnswer.Choice;
import org.wardon.sharing.Verdict;

/**
 * What can be done without a chamber: keep the lot in the shade for as long as it is wanted, or
 * sell it now. Good where nine draws of ten are sound at the buyer's, tolerable where half are, as
 * in chambers.
 */
final class OutsideChoices {
    private static final double GOOD_SHARE = 0.9;
    private static final double TOLERABLE_SHARE = 0.5;

    private final Question question;

    OutsideChoices(Question question) {
        this.question = question;
    }

    List<Choice> all() {
        return List.of(
                choice(ReceiveAnswer.SHADE, question.lot().wantedDays() + question.marketDays()),
                choice(ReceiveAnswer.SELL_NOW, question.marketDays()));
    }

    private Choice choice(String kind, double days) {
        double sound = question.more().shareSoundOutside(days);
        double mass = question.more().massShareOutside(days);
        return new Choice(
                kind,
                Optional.empty(),
                verdict(sound).word(),
                "",
                List.of(),
                new ReceiveAnswer.Keeps(
                        Ranges.told(question.more().daysLeftOutside()),
                        question.more().limitedOutside(),
                        new ChillingRisk(
                                question.more().shareChilledOutside(days), OptionalDouble.empty()),
                        OptionalDouble.empty(),
                        OptionalDouble.empty()),
                ReceiveAnswer.Worth.of(question.fullValue() * mass * sound, 0, 0),
                Optional.empty());
    }

    private static Verdict verdict(double sound) {
        if (sound >= GOOD_SHARE) {
            return Verdict.GOOD;
        }
        return sound >= TOLERABLE_SHARE ? Verdict.TOLERABLE : Verdict.NO;
    }
}
