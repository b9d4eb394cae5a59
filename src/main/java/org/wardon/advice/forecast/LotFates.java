package org.wardon.advice.forecast;

import java.util.List;
import org.wardon.keeping.Basis;
import org.wardon.keeping.Fate;
import org.wardon.keeping.Outlook;
import org.wardon.keeping.Spread;

/**
 * What becomes of one lot: staying in its chamber for good, leaving it for the market as planned,
 * and without a chamber. Lists hold one fate a draw, in the order of the draws.
 *
 * @param plain the plain run, staying
 * @param staying fates staying in the chamber
 * @param sold fates leaving as planned, market leg included
 * @param without fates without a chamber
 * @param basis what the life rests on and why
 */
record LotFates(Fate plain, List<Fate> staying, List<Fate> sold, List<Fate> without, Basis basis) {
    LotFates {
        staying = List.copyOf(staying);
        sold = List.copyOf(sold);
        without = List.copyOf(without);
    }

    /** What is told of the lot staying where it is. */
    Outlook outlook(double fromS, double horizonS, double soldS) {
        return Outlook.of(plain, staying, fromS, horizonS, soldS, basis);
    }

    Spread daysLeftWithout(double fromS) {
        return Spread.of(without.stream().mapToDouble(fate -> fate.daysLeft(fromS)).toArray());
    }

    /** Days gained draw by draw; below 0 where the chamber harms. */
    Spread daysGained(double fromS) {
        double[] gained = new double[staying.size()];
        for (int i = 0; i < gained.length; i++) {
            gained[i] = staying.get(i).daysLeft(fromS) - without.get(i).daysLeft(fromS);
        }
        return Spread.of(gained);
    }

    double shareSoundWhenSold(double soldS) {
        return Outlook.shareSound(sold, soldS);
    }

    double shareSoundWithout(double soldS) {
        return Outlook.shareSound(without, soldS);
    }
}
