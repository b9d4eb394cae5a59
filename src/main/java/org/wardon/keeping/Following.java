package org.wardon.keeping;

import java.util.EnumMap;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.air.Timeline;
import org.wardon.keeping.ethylene.Trigger;
import org.wardon.lots.LotHistory;

/** One lot followed along one history in one draw. */
final class Following {
    private final Paces paces;
    private final KeepingModel model;
    private final LotHistory history;
    private final Window beyond;
    private final Map<Mechanism, Track> tracks = new EnumMap<>(Mechanism.class);

    Following(Paces paces, LotHistory history, Window beyond) {
        this.paces = paces;
        this.history = history;
        this.beyond = beyond;
        model = paces.model();
    }

    Fate fate() {
        for (Mechanism mechanism : paces.mechanisms()) {
            tracks.put(mechanism, track(mechanism));
        }
        tracks.put(Mechanism.FREEZING, frozen());
        if (history.knowsMass()) {
            tracks.put(Mechanism.WATER_LOSS, weighed());
        }
        double startsS = model.span().twoClocks() ? startOfRipening() : Double.POSITIVE_INFINITY;
        Optional<RipeningCourse> course =
                paces.ripening()
                        .map(pace -> new RipeningCourse(paces, history, beyond, true, startsS));
        Optional<Track> edible = course.map(RipeningCourse::toOverripe);
        if (model.endsOverripe()) {
            overripe(edible.orElseThrow());
        }
        Optional<Track> green = Optional.empty();
        if (model.span().twoClocks()) {
            green = Optional.of(clock(paces.greenShare(), 1, startsS));
            edible =
                    edible.or(
                            () ->
                                    Optional.of(
                                            clock(
                                                    paces.wholeShare(),
                                                    1 / (1 + paces.ripeShare()),
                                                    startsS)));
            tracks.put(
                    Mechanism.ETHYLENE, model.span().shippedGreen() ? green.get() : edible.get());
        } else if (model.span().pastGreen() && edible.isEmpty()) {
            Track ageing = track(paces.clock());
            edible = Optional.of(tracks.getOrDefault(Mechanism.ETHYLENE, ageing));
        }
        return new Fate(
                paces.draw(),
                history.timeS(0),
                tracks,
                paces.clock(),
                green,
                edible,
                course.map(legs -> legs.times().unlessFrozen(frozen().reachesS(1))));
    }

    /** Ageing alone and with ethylene, of a lot that ends overripe. */
    private void overripe(Track withEthylene) {
        RipeningCourse alone =
                new RipeningCourse(paces, history, beyond, false, Double.POSITIVE_INFINITY);
        tracks.put(paces.clock(), alone.toOverripe());
        tracks.computeIfPresent(Mechanism.ETHYLENE, (mechanism, track) -> withEthylene);
    }

    private Track track(Mechanism mechanism) {
        Wear wear = paces.wear(mechanism).orElseThrow();
        return Track.of(history, wear, paces.start(mechanism), beyond);
    }

    /** A clock of ripening fruit, set on to a share when ethylene starts it. */
    private Track clock(double share, double onceRipening, double startsS) {
        Wear wear = paces.aged(share, true);
        return Track.of(history, wear, paces.usedAtDoor(wear), beyond)
                .jumpedTo(onceRipening, startsS);
    }

    private double startOfRipening() {
        OptionalDouble level = model.response().triggerPpm(paces.draw());
        if (level.isEmpty()) {
            return Double.POSITIVE_INFINITY;
        }
        Trigger trigger = new Trigger(level.getAsDouble(), model.lowestSafeC());
        for (int i = 0; i < history.size(); i++) {
            trigger.feel(history.timeS(i), history.meanC(i), history.ethylenePpm(i));
        }
        return trigger.startsS();
    }

    private Track frozen() {
        double[] timeS = new double[history.size()];
        double[] used = new double[history.size()];
        boolean ice = false;
        for (int i = 0; i < history.size(); i++) {
            timeS[i] = history.timeS(i);
            ice |= history.coldestC(i) < model.freezingC();
            used[i] = ice ? 1 : 0;
        }
        return Track.given(timeS, used, beyond);
    }

    private Track weighed() {
        double[] timeS = new double[history.size()];
        double[] used = new double[history.size()];
        timeS[0] = history.timeS(0);
        used[0] = paces.start(Mechanism.WATER_LOSS);
        for (int i = 1; i < history.size(); i++) {
            timeS[i] = history.timeS(i);
            double days = (timeS[i] - timeS[i - 1]) / Timeline.DAY_S;
            used[i] = used[i - 1] + (days > 0 ? days * dried(i, days) : 0);
        }
        return Track.given(timeS, used, beyond);
    }

    /** Share of the limit used a day over the step that ends at a place of the history. */
    private double dried(int i, double days) {
        double lost = (history.massKg(i - 1) - history.massKg(i)) / history.massKg(0);
        double skin = 0.5 * (history.surfaceC(i - 1) + history.surfaceC(i));
        double humidity = 0.5 * (history.humidityFraction(i - 1) + history.humidityFraction(i));
        return paces.water().perDay(lost / days, skin, humidity);
    }
}
