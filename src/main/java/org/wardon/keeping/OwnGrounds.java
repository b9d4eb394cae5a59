package org.wardon.keeping;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import org.wardon.keeping.experience.LevelSpread;
import org.wardon.keeping.experience.Sighting;
import org.wardon.keeping.life.Ageing;
import org.wardon.keeping.life.LifeCurve;
import org.wardon.produce.Commodity;
import org.wardon.produce.Reason;
import org.wardon.produce.Reason.Argument;
import org.wardon.produce.rows.OwnLot;

/** What the keeper's own figures and lots did to the life of a commodity, in codes. */
final class OwnGrounds {
    private static final String OWN = "own";

    /** What lies farther from print than this many standard deviations asks for a look (ours). */
    private static final double FAR = 3;

    /** Lots named in one sentence. */
    private static final int MOST_NAMED = 5;

    /** Ends of the range that is told as what print allows. */
    private static final double SHORT_END = -1.2816;

    private static final double LONG_END = 2.05;

    private final Commodity commodity;
    private final LifeCurve curve;
    private final String id;
    private final Ageing published;
    private final LevelSpread spread;
    private final List<Reason> reasons = new ArrayList<>();

    private OwnGrounds(KeepingModel model) {
        commodity = model.lot().commodity();
        curve = model.curve();
        id = model.lot().id();
        published = curve.published(Draw.MEDIAN);
        spread = curve.spread(Draw.MEDIAN);
    }

    static List<Reason> of(KeepingModel model) {
        OwnGrounds own = new OwnGrounds(model);
        if (!own.curve.seen().isEmpty()) {
            own.figures();
            own.lots();
        }
        return own.reasons;
    }

    private void figures() {
        for (Sighting figure : curve.seen()) {
            if (figure.kind() != Sighting.Kind.USUAL) {
                continue;
            }
            OwnLot.Spell spell = figure.spells().get(0);
            say(
                    "own-figure",
                    Argument.of(spell.hours() / 24, "day"),
                    Argument.of(spell.atC(), "C"),
                    Argument.of(published.lifeDays(spell.atC()), "day"),
                    Argument.of(curve.at(Draw.MEDIAN).lifeDays(spell.atC()), "day"));
            double ln = figure.lnRatio(published, Draw.MEDIAN);
            if (Math.abs(spread.z(ln)) > FAR) {
                say("own-figure-far", Argument.of(Math.exp(ln), "1"), end(-1), end(1));
            }
        }
    }

    private void lots() {
        List<OwnLot> lots = OwnLots.counted(commodity);
        int ripe = commodity.keeping().ownLots().size() - lots.size();
        if (ripe > 0) {
            say("own-lots-ripe", Argument.of(ripe, "1"));
        }
        if (lots.isEmpty()) {
            return;
        }
        int aged = (int) lots.stream().filter(lot -> lot.ended().ageing()).count();
        say(
                lots.size() == 1 ? "own-lot-counts" : "own-lots-count",
                Argument.of(lots.size(), "1"),
                Argument.of(aged, "1"),
                Argument.of(100 * curve.factor(), "pct"));
        List<OwnLot> far = lots.stream().filter(this::far).toList();
        if (!far.isEmpty()) {
            List<Double> ratios = far.stream().map(this::ratio).sorted().toList();
            String numbers =
                    far.stream()
                            .limit(MOST_NAMED)
                            .map(lot -> String.valueOf(lot.number()))
                            .collect(Collectors.joining(", "));
            say(
                    far.size() == 1 ? "own-lot-far" : "own-lots-far",
                    Argument.text(numbers + (far.size() > MOST_NAMED ? " and others" : "")),
                    Argument.of(ratios.get(0), "1"),
                    Argument.of(ratios.get(far.size() - 1), "1"),
                    end(-1),
                    end(1));
        }
    }

    private double ratio(OwnLot lot) {
        return Math.exp(OwnLots.of(commodity, lot).lnRatio(published, Draw.MEDIAN));
    }

    private boolean far(OwnLot lot) {
        double z = spread.z(Math.log(ratio(lot)));
        return z > FAR || (z < -FAR && lot.ended().ageing());
    }

    private Argument end(int side) {
        return Argument.of(Math.exp(spread.lnRatio(side < 0 ? SHORT_END : LONG_END)), "1");
    }

    private void say(String code, Argument... arguments) {
        reasons.add(Reason.about(code, id, OWN, arguments));
    }
}
