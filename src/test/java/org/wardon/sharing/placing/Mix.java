package org.wardon.sharing.placing;

import java.util.List;
import java.util.SplittableRandom;
import java.util.stream.IntStream;
import org.wardon.produce.Commodity;

/**
 * What a drawn store is like.
 *
 * @param capacityShare mass, room and cooling of all chambers for one of the lots' peak
 * @param crops how many crops there are, 0 for all
 * @param days how many days lots arrive on, 0 for any
 * @param alike whether lots of a crop are alike in mass, stay and price
 * @param company who harms whom
 * @param largest how many times the largest chamber is larger than the smallest at most
 * @param tooLarge how many of a hundred lots fit nowhere
 */
record Mix(
        double capacityShare,
        int crops,
        int days,
        boolean alike,
        Harm company,
        double largest,
        int tooLarge) {
    /** Who harms whom. */
    enum Harm {
        /** Nobody. */
        NONE,
        /** As print says. */
        PRINT,
        /** Two in five pairs of crops must not meet, another two in five lose by it. */
        MANY
    }

    static Mix ofAllCrops(double capacityShare) {
        return new Mix(capacityShare, 0, 0, false, Harm.PRINT, 3, 0);
    }

    Mix company(Harm harm) {
        return new Mix(capacityShare, crops, days, alike, harm, largest, tooLarge);
    }

    Mix few(int someCrops, int someDays, boolean likeLots) {
        return new Mix(capacityShare, someCrops, someDays, likeLots, company, largest, tooLarge);
    }

    Mix uneven(double times, int ofHundredTooLarge) {
        return new Mix(capacityShare, crops, days, alike, company, times, ofHundredTooLarge);
    }

    /** The mixes a search is tried on, each with capacity for this share of the peak. */
    static List<Mix> all(double share) {
        Mix plain = ofAllCrops(share);
        return List.of(
                plain,
                plain.few(8, 3, true),
                plain.few(0, 1, false),
                plain.few(4, 0, false),
                plain.few(20, 5, true).company(Harm.MANY),
                plain.company(Harm.NONE),
                plain.company(Harm.MANY),
                plain.uneven(40, 0),
                plain.uneven(3, 30));
    }

    List<Commodity> some(List<Commodity> all, SplittableRandom random) {
        return crops == 0
                ? all
                : IntStream.range(0, crops)
                        .mapToObj(i -> all.get(random.nextInt(all.size())))
                        .toList();
    }
}
