package org.wardon.advice.forecast;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ConcurrentHashMap;
import java.util.stream.Stream;
import org.wardon.keeping.Draw;
import org.wardon.lots.Lot;
import org.wardon.lots.LotRange;
import org.wardon.lots.Shares;
import org.wardon.produce.Reason;
import org.wardon.reference.Variants;

/** The body of a lot in each draw, fitted once: it stands in chambers and without one alike. */
final class Bodies {
    private final LotRange range;
    private final List<Reason> chosen;
    private final Map<Integer, Lot> byDraw = new ConcurrentHashMap<>();

    Bodies(LotRange range, Optional<Variants.Chosen> variant) {
        this.range = range;
        chosen = variant.map(one -> List.of(one.told())).orElse(List.of());
    }

    Lot in(Draw draw) {
        return byDraw.computeIfAbsent(
                draw.number(),
                number ->
                        range.at(
                                        new Shares(
                                                draw.respiration(),
                                                draw.transpiration(),
                                                draw.packaging()))
                                .value());
    }

    /** The body in the middle of its ranges. */
    Lot middle() {
        return range.at(Shares.MIDDLE).value();
    }

    /** What the body rests on, and the variant that was chosen. */
    List<Reason> restsOn() {
        return Stream.concat(chosen.stream(), range.at(Shares.MIDDLE).restsOn().stream()).toList();
    }
}
