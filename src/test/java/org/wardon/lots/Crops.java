package org.wardon.lots;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.produce.Commodity;
import org.wardon.produce.Evidence;
import org.wardon.produce.Fact;
import org.wardon.produce.rows.CompositionRow;
import org.wardon.produce.rows.GeometryRow;
import org.wardon.produce.rows.RespirationPower;
import org.wardon.produce.rows.RespirationRow;
import org.wardon.produce.rows.TranspirationRow;

/** Small made-up commodities for tests; no figure in them is published. */
final class Crops {
    static final String INVENTED = "invented";

    private Crops() {}

    static Commodity of(
            String id,
            String plantPart,
            Commodity.Body body,
            Commodity.Breath breath,
            List<TranspirationRow> transpiration) {
        return new Commodity(
                id,
                List.of(id),
                plantPart,
                false,
                new Commodity.Needs(
                        Optional.empty(),
                        Optional.empty(),
                        Optional.empty(),
                        Optional.empty(),
                        "",
                        "",
                        ""),
                body,
                breath,
                new Commodity.Water(transpiration, List.of(), List.of()),
                new Commodity.Keeping(
                        List.of(), List.of(), List.of(), List.of(), List.of(), List.of(), List.of(),
                        List.of(), List.of(), List.of()),
                new Commodity.Company(List.of(), List.of(), List.of()));
    }

    /** A fruit with everything printed. */
    static Commodity apple() {
        return of(
                "apple",
                "fruit",
                body(composition(84), geometry("sphere", 38, 0.2, 840)),
                breath(row(0, "not-stated", 7, 12), row(10, "not-stated", 20, 60)),
                List.of(coefficient(42)));
    }

    /** A crop of which nothing is printed. */
    static Commodity unknown(String plantPart) {
        return of(
                "unknown",
                plantPart,
                new Commodity.Body(List.of(), List.of()),
                breath(),
                List.of());
    }

    static Commodity.Body body(CompositionRow composition, GeometryRow geometry) {
        return new Commodity.Body(List.of(composition), List.of(geometry));
    }

    static CompositionRow composition(double water) {
        return new CompositionRow(
                water,
                0.5,
                0.3,
                99 - water,
                OptionalDouble.of(2),
                0.2,
                OptionalDouble.empty(),
                INVENTED,
                Evidence.ASSUMPTION);
    }

    static GeometryRow geometry(String shape, double mm, double massKg, double density) {
        return new GeometryRow(
                shape,
                some(mm),
                OptionalDouble.empty(),
                some(massKg),
                some(density),
                OptionalDouble.empty(),
                INVENTED,
                "");
    }

    /** A value, or none for NaN. */
    private static OptionalDouble some(double value) {
        return Double.isNaN(value) ? OptionalDouble.empty() : OptionalDouble.of(value);
    }

    static Commodity.Breath breath(RespirationRow... rows) {
        return new Commodity.Breath(List.of(rows), List.of(), List.of());
    }

    static Commodity.Breath power(double f, double g) {
        return new Commodity.Breath(
                List.of(),
                List.of(new RespirationPower(f, g, INVENTED, Evidence.ASSUMPTION, "")),
                List.of());
    }

    static RespirationRow row(double c, String state, double low, double high) {
        return new RespirationRow(
                c, state, Fact.range(low, high, "W/t", INVENTED, Evidence.ASSUMPTION), "heat");
    }

    static TranspirationRow coefficient(double ng) {
        return new TranspirationRow(
                Optional.of(Fact.of(ng, "ng/(kg s Pa)", INVENTED, Evidence.ASSUMPTION)),
                Optional.empty(),
                OptionalDouble.empty(),
                OptionalDouble.of(0.98));
    }

    static TranspirationRow skin(double low, double mean, double high) {
        return new TranspirationRow(
                Optional.empty(),
                Optional.of(Fact.range(low, high, "ug/(s m2 Pa)", INVENTED, Evidence.ASSUMPTION)),
                OptionalDouble.of(mean),
                OptionalDouble.empty());
    }
}
