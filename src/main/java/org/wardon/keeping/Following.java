package org.wardon.keeping;

import java.util.EnumMap;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.keeping.chilling.Chilling;
import org.wardon.keeping.chilling.Injury;
import org.wardon.keeping.ethylene.Response;
import org.wardon.keeping.ethylene.Trigger;
import org.wardon.keeping.life.Ageing;
import org.wardon.lots.LotHistory;
import org.wardon.lots.TranspirationLaw;

/** One lot followed along one history in one draw. */
final class Following {
    private static final double OUTDOOR_PPM = 0.01;
    private static final double HOURS_A_DAY = 24;

    private final KeepingModel model;
    private final LotHistory history;
    private final Draw draw;
    private final Window beyond;
    private final LotAtDoor door;
    private final Ageing ageing;
    private final double share;
    private final Map<Mechanism, Track> tracks = new EnumMap<>(Mechanism.class);

    Following(KeepingModel model, LotHistory history, Draw draw, Window beyond) {
        this.model = model;
        this.history = history;
        this.draw = draw;
        this.beyond = beyond;
        door = model.lot().door();
        ageing = model.curve().at(draw);
        share = model.span().share(draw) * model.dormancy().lifeShare(door.cured(), draw);
    }

    Fate fate() {
        LifeSpan span = model.span();
        Mechanism clock = span.shippedGreen() ? Mechanism.RIPENING : Mechanism.SENESCENCE;
        double ripe = span.twoClocks() ? LifeSpan.ripeShare(draw) : 0;
        double life = span.twoClocks() && !span.shippedGreen() ? share * (1 + ripe) : share;
        tracks.put(clock, aged(life, this::withoutEthylene));
        Optional<Track> green = Optional.empty();
        Optional<Track> edible = Optional.empty();
        double startsS = startOfRipening();
        if (span.twoClocks()) {
            green = Optional.of(aged(share, this::withEthylene).jumpedTo(1, startsS));
            edible =
                    Optional.of(
                            aged(share * (1 + ripe), this::withEthylene)
                                    .jumpedTo(1 / (1 + ripe), startsS));
            tracks.put(Mechanism.ETHYLENE, span.shippedGreen() ? green.get() : edible.get());
        } else if (model.response().sensitive()) {
            tracks.put(Mechanism.ETHYLENE, aged(share, this::withEthylene));
        }
        if (span.pastGreen()) {
            green = Optional.empty();
            edible = Optional.of(tracks.getOrDefault(Mechanism.ETHYLENE, tracks.get(clock)));
        }
        others();
        return new Fate(draw.number(), history.timeS(0), tracks, clock, green, edible);
    }

    private Track aged(double life, Wear wear) {
        return track((mean, skin, humid, ppm) -> wear.perDay(mean, skin, humid, ppm) / life, true);
    }

    private double withoutEthylene(double meanC, double skinC, double humidity, double ppm) {
        return ageing.perDay(meanC);
    }

    private double withEthylene(double meanC, double skinC, double humidity, double ppm) {
        Response response = model.response();
        return ageing.perDay(meanC) / response.lifeFactor(ppm, response.referencePpm(draw));
    }

    private double startOfRipening() {
        OptionalDouble level = model.response().triggerPpm(draw);
        if (level.isEmpty() || !model.span().twoClocks()) {
            return Double.POSITIVE_INFINITY;
        }
        Trigger trigger = new Trigger(level.getAsDouble(), model.lowestSafeC());
        for (int i = 0; i < history.size(); i++) {
            trigger.feel(history.timeS(i), history.meanC(i), history.ethylenePpm(i));
        }
        return trigger.startsS();
    }

    private void others() {
        model.chilling().ifPresent(this::chill);
        tracks.put(Mechanism.FREEZING, frozen());
        lose();
        if (model.dormancy().hump().isPresent()) {
            tracks.put(
                    Mechanism.SPROUTING,
                    track((t, skin, h, ppm) -> model.dormancy().sproutingPerDay(t, draw), true));
        }
        if (model.dormancy().wantsDry()) {
            tracks.put(
                    Mechanism.DECAY,
                    track((t, skin, h, ppm) -> model.dormancy().dampPerDay(h), false));
        }
    }

    private void chill(Chilling chilling) {
        Injury injury = chilling.at(draw);
        double before = 0;
        for (ColdSpell spell : door.chilledBefore()) {
            before += injury.perDay(spell.atC(), spell.atC()) * spell.hours() / HOURS_A_DAY;
        }
        Wear wear = (mean, skin, humid, ppm) -> injury.perDay(mean, skin);
        tracks.put(Mechanism.CHILLING, Track.of(history, wear, before + aged(wear), beyond));
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

    private void lose() {
        Optional<TranspirationLaw> law =
                model.lot().transpiration().map(range -> range.apply(draw.transpiration()));
        double limit = model.water().fraction(model.lot().transpiration(), ageing, draw);
        double start =
                law.map(l -> aged((t, skin, h, ppm) -> WaterLimit.perDay(l, skin, h) / limit))
                        .orElse(0.0);
        if (history.knowsMass()) {
            tracks.put(Mechanism.WATER_LOSS, weighed(limit, start));
        } else if (law.isPresent()) {
            TranspirationLaw known = law.get();
            Wear wear = (t, skin, h, ppm) -> WaterLimit.perDay(known, skin, h) / limit;
            tracks.put(Mechanism.WATER_LOSS, Track.of(history, wear, start, beyond));
        }
    }

    private Track weighed(double limit, double start) {
        double[] timeS = new double[history.size()];
        double[] used = new double[history.size()];
        for (int i = 0; i < history.size(); i++) {
            timeS[i] = history.timeS(i);
            used[i] = start + (1 - history.massKg(i) / history.massKg(0)) / limit;
        }
        return Track.given(timeS, used, beyond);
    }

    /** A track that begins with what was used before arrival. */
    private Track track(Wear wear, boolean life) {
        double start =
                life && door.usedFraction().isPresent()
                        ? door.usedFraction().getAsDouble()
                        : aged(wear);
        return Track.of(history, wear, start, beyond);
    }

    /** Share used between harvest and arrival. */
    private double aged(Wear wear) {
        if (door.age().isEmpty() || door.usedFraction().isPresent()) {
            return 0;
        }
        Age age = door.age().get();
        double perDay =
                wear.perDay(age.heldC(), age.heldC(), age.heldHumidityFraction(), OUTDOOR_PPM);
        return perDay * age.hours(draw) / HOURS_A_DAY;
    }
}
