package org.wardon.advice.forecast;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.ZoneId;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.wardon.Source;
import org.wardon.air.Site;
import org.wardon.heat.AirSeries;
import org.wardon.heat.Factors;
import org.wardon.heat.HeatModel;
import org.wardon.heat.Stay;
import org.wardon.lots.ClassValues;
import org.wardon.lots.Lot;
import org.wardon.lots.LotRange;
import org.wardon.lots.Shares;
import org.wardon.produce.Commodity;
import org.wardon.produce.PackageKind;
import org.wardon.reference.ReferenceBook;

/** What a package keeps of a lot's water in a run, as the tables say. */
class PackagesInRunTest {
    private static final double DAY_S = 86_400;

    private static ReferenceBook book;

    @BeforeAll
    static void open() {
        book = ReferenceBook.open();
    }

    @AfterAll
    static void close() {
        book.close();
    }

    /**
     * Water lost by apples in ten days at 2 °C and 85 %, kg of 300. Their skin is tight: no package
     * here holds back more vapour than the air that carries their heat lets through.
     */
    private static double lostKg(String packageId) {
        Commodity apple = book.get("apple");
        Lot lot =
                LotRange.of(
                                "A",
                                apple,
                                300,
                                book.packageKind(packageId),
                                org.wardon.produce.Ripeness.UNKNOWN,
                                ClassValues.of(book.all()))
                        .at(Shares.MIDDLE)
                        .value();
        return HeatModel.runInGivenAir(
                        new Stay(lot, 0, 30 * DAY_S, 2),
                        AirSeries.steady(2, 0.85),
                        new Site(12, -61, 10, ZoneId.of("UTC")),
                        Factors.PLAIN,
                        10 * DAY_S)
                .totals()
                .evaporatedKg();
    }

    private static double printed(String packageId) {
        PackageKind kind = book.packageKind(packageId);
        return Math.min(1, kind.vapourConductance().atLogShare(0.5));
    }

    @Source("package_vapour, ids LUFU2021 WANG-QI1997 NGCOBO2012; class values for a vented carton")
    @Test
    void aLinedCartonLosesLessThanAVentedOneByTheTablesFigures() {
        double vented = lostKg("vented-carton");
        double perforated = lostKg("perforated-liner");
        double sealed = lostKg("sealed-liner");
        assertTrue(perforated < vented && sealed < perforated);
        double byTable = printed("perforated-liner") / printed("vented-carton");
        // A package that holds back water lets the apples stand a little warmer: 4 and 6 %.
        assertEquals(byTable, perforated / vented, 0.08 * byTable);
        double bySealed = printed("sealed-liner") / printed("vented-carton");
        assertEquals(bySealed, sealed / vented, 0.08 * bySealed);
    }
}
