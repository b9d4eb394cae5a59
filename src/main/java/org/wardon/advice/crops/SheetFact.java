package org.wardon.advice.crops;

import java.util.List;
import org.wardon.produce.NamedFact;
import org.wardon.produce.Source;

/**
 * A fact beside its sources.
 *
 * @param fact name, figure or word, evidence, whether it is the keeper's own
 * @param part what it is about
 * @param standing whether answers rest on it
 * @param sources whole citations, in the order the fact names them
 */
public record SheetFact(NamedFact fact, Part part, Standing standing, List<Source> sources) {
    /** What a fact is about, in the order they are shown. */
    public enum Part {
        /** The handbook's condition and classes. */
        CONDITION,
        /** Lives at a temperature and how they change with it. */
        LIFE,
        /** Injury by cold. */
        COLD,
        /** Heat of respiration. */
        BREATH,
        /** Ripening and ethylene. */
        RIPENING,
        /** Loss of water. */
        WATER,
        /** Everything else. */
        OTHER
    }

    /** Whether answers rest on a fact where several are printed of one thing. */
    public enum Standing {
        /** It is the one chosen. */
        CHOSEN,
        /** Another one of the same thing is chosen; it stays visible. */
        BESIDE,
        /** All of its kind count together, or it is shown to be read only. */
        AMONG_OTHERS
    }

    /** Copies the list. */
    public SheetFact {
        sources = List.copyOf(sources);
    }
}
