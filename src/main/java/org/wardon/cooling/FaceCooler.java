package org.wardon.cooling;

import java.util.Set;
import java.util.function.Function;
import org.wardon.enclosure.FaceName;

/** A cooler that acts on faces and through them on the air. */
public sealed interface FaceCooler extends Cooler permits WettedWall, WaterFilm {
    /**
     * Returns the faces it acts on.
     *
     * @return never empty
     */
    Set<FaceName> wets();

    @Override
    default boolean stirsAir() {
        return false;
    }

    /**
     * Gives the answer of its kind.
     *
     * @param outside for walls kept wet outside
     * @param inside for water over the inner side
     * @param <R> what is answered
     * @return the answer
     */
    <R> R onFaces(Function<WettedWall, R> outside, Function<WaterFilm, R> inside);
}
