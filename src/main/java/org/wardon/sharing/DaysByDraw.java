package org.wardon.sharing;

import java.util.function.Predicate;
import org.wardon.keeping.Draw;
import org.wardon.keeping.Fate;
import org.wardon.keeping.KeepingModel;
import org.wardon.keeping.Mechanism;
import org.wardon.keeping.Paces;

/**
 * Days of one lot in one draw in a constant setting: by each mechanism, what is left of its limit
 * after arrival and market leg, at the pace of the setting.
 */
final class DaysByDraw {
    private static final double MARKET_HUMIDITY = 0.75;

    private final Paces paces;
    private final double marketDays;
    private final Left[] dry;
    private final Left[] ofHumidity;
    private final Left[] chilling;

    /** What a mechanism leaves for the chamber, share of its limit. */
    private record Left(Mechanism mechanism, double share) {}

    DaysByDraw(KeepingModel model, Wish wish, Draw draw) {
        paces = model.paces(draw);
        marketDays = wish.marketC().isPresent() ? wish.marketDays() : 0;
        dry = left(wish, m -> !asksForHumidity(m));
        ofHumidity = left(wish, DaysByDraw::asksForHumidity);
        chilling = left(wish, m -> m == Mechanism.CHILLING);
    }

    private static boolean asksForHumidity(Mechanism mechanism) {
        return mechanism == Mechanism.WATER_LOSS || mechanism == Mechanism.DECAY;
    }

    private Left[] left(Wish wish, Predicate<Mechanism> which) {
        return paces.mechanisms().stream()
                .filter(which)
                .map(mechanism -> new Left(mechanism, left(mechanism, wish)))
                .toArray(Left[]::new);
    }

    private double left(Mechanism mechanism, Wish wish) {
        double left = 1 - paces.start(mechanism);
        return wish.marketC().isPresent()
                ? left
                        - marketDays
                                * paces.perDay(
                                        mechanism, wish.marketC().getAsDouble(), MARKET_HUMIDITY, 0)
                : left;
    }

    /** Days by the mechanisms that do not ask for humidity. */
    double atAnyHumidity(double temperatureC) {
        return least(dry, temperatureC, 1);
    }

    /** Days until chilled. */
    double chilledAfter(double temperatureC) {
        return least(chilling, temperatureC, 1);
    }

    /** Days by the mechanisms that ask for humidity. */
    double at(double temperatureC, double humidityFraction) {
        return least(ofHumidity, temperatureC, humidityFraction);
    }

    /** Days in the chamber so that the market leg still fits, and the market leg. */
    private double least(Left[] among, double temperatureC, double humidityFraction) {
        double least = Fate.MOST_DAYS;
        for (Left left : among) {
            if (left.share <= 0) {
                return 0;
            }
            double perDay = paces.perDay(left.mechanism, temperatureC, humidityFraction, 0);
            if (perDay > 0) {
                least = Math.min(least, left.share / perDay + marketDays);
            }
        }
        return least;
    }
}
