package org.wardon.keeping;

import java.util.Collections;
import java.util.EnumMap;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.wardon.keeping.chilling.Chilling;
import org.wardon.keeping.chilling.Injury;
import org.wardon.keeping.dormancy.Dormancy;
import org.wardon.keeping.ethylene.Response;
import org.wardon.keeping.life.Ageing;
import org.wardon.keeping.ripening.RipeningPace;
import org.wardon.lots.TranspirationLaw;

/**
 * How fast each mechanism uses up one lot in one draw, in any state, and what was used before it
 * arrived.
 */
public final class Paces {
    private static final double HOURS_A_DAY = 24;
    private static final double AT_ONCE_PER_DAY = 1e9;

    private final KeepingModel model;
    private final Draw draw;
    private final LotAtDoor door;
    private final Ageing ageing;
    private final double referencePpm;
    private final WaterPace water;
    private final Mechanism clock;
    private final Optional<RipeningPace> ripening;
    private final Map<Mechanism, Wear> wears = new EnumMap<>(Mechanism.class);
    private final Map<Mechanism, Double> starts = new EnumMap<>(Mechanism.class);

    Paces(KeepingModel model, Draw draw) {
        this.model = model;
        this.draw = draw;
        door = model.lot().door();
        ageing = model.curve().at(draw);
        referencePpm = model.response().referencePpm(draw);
        ripening = model.ripening().map(printed -> printed.at(draw));
        water = model.water().pace(model.lot().transpiration(), ageing);
        clock = model.span().shippedGreen() ? Mechanism.RIPENING : Mechanism.SENESCENCE;
        age();
        model.chilling().ifPresent(this::chill);
        put(
                Mechanism.FREEZING,
                (mean, skin, humid, ppm) -> mean < model.freezingC() ? AT_ONCE_PER_DAY : 0);
        double packed = model.lot().packageKgPerKgSPa();
        model.lot()
                .transpiration()
                .ifPresent(range -> lose(range.apply(draw.transpiration()).behind(packed)));
        rest();
    }

    private void age() {
        putLife(clock, lived(false));
        if (model.span().twoClocks() || model.response().sensitive()) {
            putLife(Mechanism.ETHYLENE, lived(true));
        }
    }

    private Wear lived(boolean withEthylene) {
        if (model.endsOverripe()) {
            return throughRipe(ripening.orElseThrow(), withEthylene);
        }
        return aged(model.span().shippedGreen() ? greenShare() : wholeShare(), withEthylene);
    }

    /** Green, ripening and ripe in one condition: as long as the legs together. */
    private Wear throughRipe(RipeningPace pace, boolean withEthylene) {
        Wear green = greenClock(withEthylene);
        double greenLeg = model.span().twoClocks() ? pace.startsAtGreenShare() : 0;
        double toRipe = 1 - pace.atDoor();
        return (mean, skin, humid, ppm) -> {
            double greenDays = greenLeg > 0 ? greenLeg / green.perDay(mean, skin, humid, ppm) : 0;
            double days = toRipe / pace.softensPerDay(mean) + 1 / pace.spoilsPerDay(mean);
            return 1 / (greenDays + days);
        };
    }

    /** Ageing over a share of the published life. */
    Wear aged(double share, boolean withEthylene) {
        Response response = model.response();
        return withEthylene
                ? (mean, skin, humid, ppm) ->
                        ageing.perDay(mean) / (share * response.lifeFactor(ppm, referencePpm))
                : (mean, skin, humid, ppm) -> ageing.perDay(mean) / share;
    }

    /**
     * The clock by which ripening starts by itself. Ethylene hastens it up to the level that starts
     * ripening; what is above it acts through its own 24 hours, and where it is too cold for them
     * not at all.
     */
    Wear greenClock(boolean withEthylene) {
        Wear clock = aged(greenShare(), withEthylene);
        double most = model.response().triggerPpm(draw).orElse(Double.POSITIVE_INFINITY);
        return (mean, skin, humid, ppm) -> clock.perDay(mean, skin, humid, Math.min(ppm, most));
    }

    /** Share of the published life until a green fruit ripens, or of the only clock there is. */
    double greenShare() {
        return model.span().share(draw) * model.dormancy().lifeShare(door.cured(), draw);
    }

    /** Share of the published life until it is past eating. */
    double wholeShare() {
        return model.span().twoClocks() ? greenShare() * (1 + ripeShare()) : greenShare();
    }

    /** Life once ripe over life green; 0 where there are no two clocks. */
    double ripeShare() {
        return model.span().twoClocks() ? LifeSpan.ripeShare(draw) : 0;
    }

    private void chill(Chilling chilling) {
        Injury injury = chilling.at(draw);
        put(Mechanism.CHILLING, (mean, skin, humid, ppm) -> injury.perDay(mean, skin));
        double before = 0;
        for (ColdSpell spell : door.chilledBefore()) {
            before += injury.perDay(spell.atC(), spell.atC()) * spell.hours() / HOURS_A_DAY;
        }
        starts.merge(Mechanism.CHILLING, before, Double::sum);
    }

    private void lose(TranspirationLaw law) {
        put(
                Mechanism.WATER_LOSS,
                (mean, skin, humid, ppm) ->
                        water.perDay(WaterLimit.perDay(law, skin, humid), skin, humid));
    }

    private void rest() {
        Dormancy dormancy = model.dormancy();
        if (dormancy.hump().isPresent()) {
            putLife(
                    Mechanism.SPROUTING,
                    (mean, skin, humid, ppm) -> dormancy.sproutingPerDay(mean, draw));
        }
        if (dormancy.wantsDry()) {
            put(Mechanism.DECAY, (mean, skin, humid, ppm) -> dormancy.dampPerDay(humid));
        }
    }

    private void putLife(Mechanism mechanism, Wear wear) {
        put(mechanism, wear);
        door.usedFraction().ifPresent(used -> starts.put(mechanism, used));
    }

    private void put(Mechanism mechanism, Wear wear) {
        wears.put(mechanism, wear);
        starts.put(mechanism, beforeArrival(wear));
    }

    /** Share used when the history begins: as told, else since harvest. */
    double usedAtDoor(Wear wear) {
        return door.usedFraction().orElse(beforeArrival(wear));
    }

    /** Days between harvest and arrival; none where nobody asks. */
    double daysBeforeArrival() {
        return door.age().map(age -> age.hours(draw) / HOURS_A_DAY).orElse(0.0);
    }

    /** How the lot ripens; empty where no times are printed. */
    Optional<RipeningPace> ripening() {
        return ripening;
    }

    /** Share used between harvest and arrival. */
    double beforeArrival(Wear wear) {
        if (door.age().isEmpty() || door.usedFraction().isPresent()) {
            return 0;
        }
        Age age = door.age().get();
        double perDay =
                wear.perDay(
                        age.heldC(),
                        age.heldC(),
                        age.heldHumidityFraction(),
                        ChamberEthylene.OUTDOOR_PPM);
        return perDay * age.hours(draw) / HOURS_A_DAY;
    }

    /**
     * Returns the mechanisms at work.
     *
     * @return those that can end this lot; water loss only where the lot's law is known
     */
    public Set<Mechanism> mechanisms() {
        return Collections.unmodifiableSet(wears.keySet());
    }

    /**
     * Returns the share of a limit used before arrival.
     *
     * @param mechanism one of {@link #mechanisms()}
     * @return 0 for fresh
     */
    public double start(Mechanism mechanism) {
        return starts.getOrDefault(mechanism, 0.0);
    }

    /**
     * Returns the share of a limit used a day in a constant condition.
     *
     * @param mechanism one of {@link #mechanisms()}
     * @param temperatureC temperature of lot and air, °C
     * @param humidityFraction humidity at the produce, 0 to 1
     * @param ethylenePpm ethylene, µL/L
     * @return 1/day, not negative
     */
    public double perDay(
            Mechanism mechanism, double temperatureC, double humidityFraction, double ethylenePpm) {
        Wear wear = wears.get(mechanism);
        return wear == null
                ? 0
                : wear.perDay(temperatureC, temperatureC, humidityFraction, ethylenePpm);
    }

    /** The clock of ageing: ripening where the lot is to leave green, else senescence. */
    Mechanism clock() {
        return clock;
    }

    Optional<Wear> wear(Mechanism mechanism) {
        return Optional.ofNullable(wears.get(mechanism));
    }

    WaterPace water() {
        return water;
    }

    Draw draw() {
        return draw;
    }

    KeepingModel model() {
        return model;
    }
}
