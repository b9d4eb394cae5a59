package org.wardon.reference;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.produce.Commodity;
import org.wardon.produce.Fact;
import org.wardon.produce.rows.ChillingFloor;
import org.wardon.produce.rows.LifeRow;
import org.wardon.produce.rows.MoistureLimit;
import org.wardon.produce.rows.OwnLot;
import org.wardon.produce.rows.RespirationRow;

/** Lays a keeper's own values over a published commodity: own first, print behind. */
final class OwnOverlay {
    private static final String NOT_STATED = "not-stated";
    private static final String OWN = OwnValue.SOURCE;

    private OwnOverlay() {}

    static Commodity over(Commodity published, List<OwnValue> values) {
        Commodity commodity = published;
        for (OwnValue value : values) {
            Optional<OwnName> name = OwnName.of(value.name());
            if (name.isPresent()) {
                commodity = over(commodity, name.get(), value.fact());
            }
        }
        return commodity;
    }

    /** Lays a keeper's own lots beside what is printed. */
    static Commodity beside(Commodity published, List<OwnLot> lots) {
        if (lots.isEmpty()) {
            return published;
        }
        Commodity.Keeping of = published.keeping();
        Commodity.Keeping keeping =
                new Commodity.Keeping(
                        of.lives(),
                        of.q10s(),
                        of.floors(),
                        of.exposures(),
                        of.sprouting(),
                        of.curing(),
                        of.ambient(),
                        of.curves(),
                        of.ripening(),
                        lots);
        return keeping(published, keeping);
    }

    /** Returns the commodity with other rows of keeping. */
    static Commodity keeping(Commodity of, Commodity.Keeping keeping) {
        return with(of, of.needs(), of.breath(), of.water(), keeping);
    }

    private static Commodity over(Commodity of, OwnName name, Fact own) {
        return switch (name.kind()) {
            case STORAGE_TEMPERATURE, STORAGE_HUMIDITY, STORAGE_LIFE, FREEZING_POINT ->
                    with(
                            of,
                            needs(of.needs(), name.kind(), own),
                            of.breath(),
                            of.water(),
                            of.keeping());
            case LIFE ->
                    with(of, of.needs(), of.breath(), of.water(), lives(of.keeping(), name, own));
            case CHILLING_FLOOR ->
                    with(of, of.needs(), of.breath(), of.water(), floors(of.keeping(), own));
            case PERMISSIBLE_LOSS ->
                    with(of, of.needs(), of.breath(), limits(of.water(), own), of.keeping());
            case RESPIRATION_HEAT ->
                    with(of, of.needs(), heat(of.breath(), name, own), of.water(), of.keeping());
        };
    }

    private static Commodity with(
            Commodity of,
            Commodity.Needs needs,
            Commodity.Breath breath,
            Commodity.Water water,
            Commodity.Keeping keeping) {
        return new Commodity(
                of.id(),
                of.names(),
                of.plantPart(),
                of.climacteric(),
                needs,
                of.body(),
                breath,
                water,
                keeping,
                of.company());
    }

    private static Commodity.Needs needs(Commodity.Needs of, OwnName.Kind kind, Fact own) {
        Optional<Fact> set = Optional.of(own);
        return new Commodity.Needs(
                kind == OwnName.Kind.STORAGE_TEMPERATURE ? set : of.temperatureC(),
                kind == OwnName.Kind.STORAGE_HUMIDITY ? set : of.humidityPct(),
                kind == OwnName.Kind.STORAGE_LIFE ? set : of.lifeDays(),
                kind == OwnName.Kind.FREEZING_POINT ? set : of.highestFreezingC(),
                of.ethyleneProduction(),
                of.ethyleneSensitivity(),
                of.note());
    }

    private static Commodity.Keeping lives(Commodity.Keeping of, OwnName name, Fact own) {
        LifeRow life =
                new LifeRow(
                        "",
                        name.atC(),
                        "",
                        own,
                        OWN,
                        NOT_STATED,
                        "exact",
                        NOT_STATED,
                        NOT_STATED,
                        "");
        return keeping(of, first(life, of.lives()), of.floors());
    }

    private static Commodity.Keeping floors(Commodity.Keeping of, Fact own) {
        ChillingFloor floor =
                new ChillingFloor(
                        Optional.of(own),
                        true,
                        "",
                        NOT_STATED,
                        "",
                        NOT_STATED,
                        "floor",
                        OptionalDouble.empty(),
                        OWN);
        return keeping(of, of.lives(), first(floor, of.floors()));
    }

    private static Commodity.Keeping keeping(
            Commodity.Keeping of, List<LifeRow> lives, List<ChillingFloor> floors) {
        return new Commodity.Keeping(
                lives,
                of.q10s(),
                floors,
                of.exposures(),
                of.sprouting(),
                of.curing(),
                of.ambient(),
                of.curves(),
                of.ripening(),
                of.ownLots());
    }

    private static Commodity.Water limits(Commodity.Water of, Fact own) {
        return new Commodity.Water(
                of.transpiration(), first(new MoistureLimit(own, ""), of.limits()), of.losses());
    }

    private static Commodity.Breath heat(Commodity.Breath of, OwnName name, Fact own) {
        String state = of.respiration().isEmpty() ? NOT_STATED : of.respiration().get(0).state();
        RespirationRow row = new RespirationRow(name.atC().orElseThrow(), state, own, OWN);
        return new Commodity.Breath(first(row, of.respiration()), of.powers(), of.ethylene());
    }

    private static <T> List<T> first(T own, List<T> published) {
        List<T> all = new ArrayList<>(List.of(own));
        all.addAll(published);
        return all;
    }
}
