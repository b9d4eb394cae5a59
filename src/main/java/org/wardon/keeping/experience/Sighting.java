package org.wardon.keeping.experience;

import java.util.List;
import java.util.function.ToDoubleFunction;
import org.wardon.keeping.Draw;
import org.wardon.keeping.KnownLife;
import org.wardon.keeping.life.Ageing;
import org.wardon.produce.rows.OwnLot;

/**
 * One thing seen of the life in the keeper's own store.
 *
 * @param spells time at each temperature until the end
 * @param kind what the end says
 * @param share share of the published life that this end stands for, by draw: 1 for the whole life
 * @param deviation how well a figure is known, standard deviation of ln life; not used for lots
 */
public record Sighting(
        List<OwnLot.Spell> spells, Kind kind, ToDoubleFunction<Draw> share, double deviation) {
    /** What it says. */
    public enum Kind {
        /** How long lots usually keep. */
        USUAL,
        /** How long one lot kept. */
        LOT,
        /** How long one lot kept at least. */
        LOT_AT_LEAST
    }

    /** Copies the list. */
    public Sighting {
        spells = List.copyOf(spells);
    }

    /**
     * Returns a keeper's figure of how long lots usually keep.
     *
     * @param known the figure
     * @return the sighting
     */
    public static Sighting of(KnownLife known) {
        return new Sighting(
                List.of(new OwnLot.Spell(known.atC(), 24 * known.days())),
                Kind.USUAL,
                draw -> 1,
                known.deviation());
    }

    /**
     * Returns how long it kept over what is published for what it went through.
     *
     * @param published ageing in the middle of the published level
     * @param draw the draw
     * @return ln of a ratio
     */
    public double lnRatio(Ageing published, Draw draw) {
        double used = 0;
        for (OwnLot.Spell spell : spells) {
            used += published.perDay(spell.atC()) * spell.hours() / 24;
        }
        return Math.log(used / share.applyAsDouble(draw));
    }

    /**
     * Returns it as the belief reads it.
     *
     * @param published ageing in the middle of the published level
     * @param spread the published spread
     * @param draw the draw
     * @return place and variance
     */
    public Belief.Reading reading(Ageing published, LevelSpread spread, Draw draw) {
        double ln = lnRatio(published, draw);
        double off = kind == Kind.USUAL ? deviation : LevelSpread.BETWEEN_LOTS;
        double width = off / spread.side(ln);
        return new Belief.Reading(spread.z(ln), width * width, kind == Kind.LOT_AT_LEAST);
    }
}
