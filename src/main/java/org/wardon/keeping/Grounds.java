package org.wardon.keeping;

import java.util.ArrayList;
import java.util.List;
import org.wardon.air.Timeline;
import org.wardon.keeping.chilling.Chilling;
import org.wardon.keeping.dormancy.Dormancy;
import org.wardon.keeping.ethylene.Response;
import org.wardon.keeping.ripening.Ripening;
import org.wardon.lots.LotHistory;
import org.wardon.produce.Commodity;
import org.wardon.produce.Reason;
import org.wardon.produce.Reason.Argument;
import org.wardon.produce.rows.EthyleneEffect;
import org.wardon.produce.rows.RipeningRow;

/** What the answer of one lot along one history rests on, in codes. */
final class Grounds {
    private static final String ASSUMPTION = "assumption";
    private static final double BEYOND_K = 1;
    private static final double WET_LONG_H = 24;
    private static final double SWEETENS_BELOW_C = 4;
    private static final double HEAT_KILLS_C = 42;

    /** Heat or cold that lasts no longer is not told of ripening (assumption). */
    private static final double LONG_DAYS = 0.5;

    private static final double DAMP_FRACTION = 0.75;

    private final KeepingModel model;
    private final LotHistory history;
    private final String id;
    private final List<Reason> reasons = new ArrayList<>();

    Grounds(KeepingModel model, LotHistory history) {
        this.model = model;
        this.history = history;
        id = model.lot().id();
    }

    Basis basis() {
        RestsOn rests = restsOn();
        String source =
                rests == RestsOn.RIPENING_TIMES
                        ? model.ripening().orElseThrow().sourceId()
                        : model.curve().level().sourceId();
        say("life-rests-on", source, Argument.text(rests.word()));
        if (rests == RestsOn.EXTRAPOLATED) {
            say(
                    "life-extrapolated",
                    "ah66-2002-tab",
                    Argument.of(model.curve().highestPublishedC(), "C"));
        }
        reasons.addAll(OwnGrounds.of(model));
        door();
        model.chilling().ifPresent(this::chilling);
        model.ripening().ifPresent(this::ripening);
        dormancy();
        ethylene();
        weather();
        return new Basis(rests, reasons);
    }

    private RestsOn restsOn() {
        if (model.endsOverripe() && !model.span().twoClocks()) {
            return RestsOn.RIPENING_TIMES;
        }
        RestsOn rests = model.curve().restsOn();
        double limit = model.curve().highestPublishedC() + BEYOND_K;
        boolean spans = model.curve().spansTemperatures();
        if (rests == RestsOn.KNOWN_LIFE || rests == RestsOn.OWN_LOTS) {
            return rests;
        }
        return spans && days((i) -> history.meanC(i) > limit) > 0.5 * wholeDays()
                ? RestsOn.EXTRAPOLATED
                : rests;
    }

    private void door() {
        LotAtDoor door = model.lot().door();
        if (model.span().unknown()) {
            say("ripeness-unknown", ASSUMPTION);
        }
        if (model.span().pastGreen() && model.ripening().isEmpty()) {
            say("ripe-keeps-less", ASSUMPTION);
        }
        if (door.usedFraction().isEmpty() && door.age().map(Age::guessed).orElse(false)) {
            Age age = door.age().orElseThrow();
            say(
                    "age-unknown",
                    ASSUMPTION,
                    Argument.of(age.lowHours(), "h"),
                    Argument.of(age.highHours(), "h"));
        }
        if (model.uncured()) {
            String source = model.lot().commodity().keeping().curing().get(0).sourceId();
            say("cure-first", source);
        }
    }

    private void chilling(Chilling chilling) {
        say(
                chilling.zone().bandLowC().isPresent() ? "chilling-band" : "chilling-floor",
                chilling.zone().sourceId(),
                Argument.of(chilling.zone().topC(), "C"));
        if (chilling.zone().assumed()) {
            say("chilling-floor-assumed", ASSUMPTION);
        }
        if (!chilling.calibrated()) {
            say("chilling-dose-of-all-crops", ASSUMPTION);
        }
        if (chilling.showsAfterRewarming()) {
            say("chilling-shows-after-rewarming", chilling.zone().sourceId());
        }
        if (model.lot().commodity().id().equals("basil")) {
            say("chilling-hardening-not-counted", chilling.zone().sourceId());
        }
    }

    private void ripening(Ripening ripening) {
        say("ripens-as-printed", ripening.sourceId());
        ripening.heat()
                .filter(row -> days(i -> history.meanC(i) > row.lowC()) > LONG_DAYS)
                .ifPresent(row -> say("ripening-in-heat", row.sourceId(), at(row)));
        boolean ripe = ripening.at(Draw.MEDIAN).atDoor() >= 1;
        ripening.cold()
                .filter(row -> !ripe && days(i -> history.meanC(i) < row.lowC()) > LONG_DAYS)
                .ifPresent(row -> say("ripening-in-cold", row.sourceId(), at(row)));
    }

    private static Argument at(RipeningRow row) {
        return Argument.of(row.lowC(), "C");
    }

    private void dormancy() {
        Dormancy dormancy = model.dormancy();
        dormancy.hump().ifPresent(hump -> say("sprouting-range", hump.sourceId()));
        if (dormancy.rateUnknown()) {
            say(
                    "sprouting-rate-unknown",
                    model.lot().commodity().keeping().sprouting().get(0).sourceId());
        }
        double damp = days(i -> history.humidityFraction(i) > DAMP_FRACTION);
        if (dormancy.wantsDry() && damp > Dormancy.DAMP_FREE_DAYS) {
            say("too-damp", ASSUMPTION, Argument.of(damp, "day"));
        }
        boolean cold = days(i -> history.meanC(i) < SWEETENS_BELOW_C) > 0;
        if (cold && model.lot().commodity().id().startsWith("potato")) {
            say("cold-sweetening", "common-practice", Argument.of(SWEETENS_BELOW_C, "C"));
        }
    }

    private void ethylene() {
        double highest = 0;
        for (int i = 0; i < history.size(); i++) {
            highest = Math.max(highest, history.ethylenePpm(i));
        }
        Commodity commodity = model.lot().commodity();
        for (EthyleneEffect effect : commodity.company().ethyleneEffects()) {
            boolean above =
                    Response.isDisorder(effect) && highest > effect.thresholdPpm().get().lowest();
            if (above) {
                say(
                        "ethylene-harms",
                        effect.sourceId(),
                        Argument.of(effect.thresholdPpm().get().lowest(), "ppm"),
                        Argument.of(highest, "ppm"),
                        Argument.text(effect.effect()));
            }
        }
    }

    private void weather() {
        double wet = 24 * days(history::wet);
        if (wet > WET_LONG_H) {
            say("wet-long", "common-practice", Argument.of(wet, "h"));
        }
        if (days(i -> history.coldestC(i) < model.freezingC()) > 0) {
            say("freezes", freezingSource(), Argument.of(model.freezingC(), "C"));
        }
        if (days(i -> history.meanC(i) > HEAT_KILLS_C) > 0) {
            say("heat-killed", ASSUMPTION, Argument.of(HEAT_KILLS_C, "C"));
        }
    }

    private String freezingSource() {
        return model.lot()
                .commodity()
                .needs()
                .highestFreezingC()
                .map(fact -> fact.sourceId())
                .orElse(ASSUMPTION);
    }

    private double wholeDays() {
        return (history.timeS(history.size() - 1) - history.timeS(0)) / Timeline.DAY_S;
    }

    /** Days over which a state holds, each sample standing for half of the spans beside it. */
    private double days(java.util.function.IntPredicate holds) {
        double s = 0;
        for (int i = 0; i < history.size(); i++) {
            if (holds.test(i)) {
                double from = history.timeS(Math.max(0, i - 1));
                double to = history.timeS(Math.min(history.size() - 1, i + 1));
                s += 0.5 * (to - from);
            }
        }
        return s / Timeline.DAY_S;
    }

    private void say(String code, String sourceId, Argument... arguments) {
        reasons.add(Reason.about(code, id, sourceId, arguments));
    }
}
