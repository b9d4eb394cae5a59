package org.wardon.keeping.dormancy;

import java.util.Map;
import java.util.Optional;

/**
 * The humps that print supports, read from the table of sprouting. Ends of a line that no row gives
 * are marked.
 *
 * <ul>
 *   <li>onion: fastest 10 to 20 °C, retarded at 25 to 30 (BREWSTER2008); growth begins at 4 weeks
 *       there and 6 to 8 weeks is the storage time below 13 °C (YOO1987); none at 0 °C (the
 *       handbook's condition).
 *   <li>potato: none at 4 °C and below (CPRI-DORMANCY); best 15 to 18 °C (SPROUT-GROWTH-PR); rest
 *       of 40 to 140 days at 15 °C (AHDB-DORMANCY); stunted above 25, none at 35 (assumption). The
 *       early, processing and seed crops take the same hump.
 *   <li>yam: 70 to 225 days at 21 to 37 °C (YAM-PITS1985, RODRIGUEZ1981); four months later at 15
 *       to 17 (GONZALEZ1972); none at 12 °C, where it chills (YAM-TRANSPORT).
 *   <li>carrot: 30 to 90 days at 4.5 to 10 °C (AH66-1986), more with temperature (CARROT-PE1999);
 *       none at 0 °C (assumption).
 *   <li>ginger: sprouts at 25 °C ambient (GINGER-UPM2017), up to 90 days (OLUSOGA2016), the short
 *       end half of it (assumption); keeps at 12.5 °C (GINGER-FS3).
 * </ul>
 */
final class Humps {
    private static final double NEVER_TOO_HOT = Double.POSITIVE_INFINITY;

    private static final Hump POTATO = new Hump(4, 15, 18, 35, 40, 140, "AHDB-DORMANCY");

    private static final Map<String, Hump> BY_ID =
            Map.of(
                    "onion-dry",
                    new Hump(0, 10, 20, 30, 28, 56, "YOO1987"),
                    "potato-table",
                    POTATO,
                    "potato-early",
                    POTATO,
                    "potato-processing",
                    POTATO,
                    "potato-seed",
                    POTATO,
                    "yam",
                    new Hump(12, 21, 37, NEVER_TOO_HOT, 70, 225, "YAM-PITS1985"),
                    "carrot-topped",
                    new Hump(0, 10, 40, NEVER_TOO_HOT, 30, 90, "AH66-1986"),
                    "ginger",
                    new Hump(13, 25, 40, NEVER_TOO_HOT, 45, 90, "OLUSOGA2016"));

    private Humps() {}

    /**
     * Returns the hump of a commodity.
     *
     * @param commodityId its id
     * @return the hump; empty where no row supports a rate
     */
    static Optional<Hump> of(String commodityId) {
        return Optional.ofNullable(BY_ID.get(commodityId));
    }
}
