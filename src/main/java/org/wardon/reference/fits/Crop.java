package org.wardon.reference.fits;

import java.util.Optional;
import org.wardon.keeping.chilling.Zone;
import org.wardon.keeping.life.LifeLevel;
import org.wardon.keeping.pooling.LifePoint;
import org.wardon.produce.Commodity;
import org.wardon.produce.Ripeness;

/**
 * A crop of the tables, known or waiting for its row among the commodities.
 *
 * @param id its id
 * @param part plant part, empty where nobody says
 * @param respirationKJMol slope of its breathing over that of the middle crop, kJ/mol
 * @param commodity the commodity; empty while it waits
 */
record Crop(String id, String part, double respirationKJMol, Optional<Commodity> commodity) {
    LifePoint.Trial trial(String variant, String source, boolean relative) {
        return new LifePoint.Trial(
                id, id + '|' + variant, source, part, respirationKJMol, relative);
    }

    /**
     * Whether fruit so ripe is chilled at a temperature: inside the printed zone, but not where the
     * handbook itself keeps it.
     */
    boolean chills(String ripeness, double temperatureC) {
        Ripeness judged = ripeness.equals("ripe") ? Ripeness.RIPE : Ripeness.GREEN;
        Zone zone = commodity.flatMap(known -> Zone.of(known, judged)).orElse(null);
        if (zone == null) {
            return false;
        }
        if (zone.bandLowC().isPresent()) {
            return temperatureC < zone.topC() && temperatureC > zone.bandLowC().getAsDouble();
        }
        double keptC = handbook().map(LifeLevel::atLowC).orElse(Double.POSITIVE_INFINITY);
        return temperatureC < Math.min(zone.topC(), keptC);
    }

    /** The handbook's life in its own condition; empty where nobody printed one. */
    Optional<LifeLevel> handbook() {
        return commodity
                .filter(known -> known.needs().lifeDays().isPresent())
                .filter(known -> known.needs().temperatureC().isPresent())
                .map(LifeLevel::of);
    }
}
