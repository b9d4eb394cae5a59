package org.wardon.files;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.time.LocalTime;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.wardon.air.Weather;
import org.wardon.air.YearWave;
import org.wardon.air.normals.NormalsWeather;
import org.wardon.cooling.Compressor;
import org.wardon.cooling.Control;
import org.wardon.cooling.Defrost;
import org.wardon.cooling.Setting;
import org.wardon.cooling.solar.SolarSupply;
import org.wardon.enclosure.Beyond;
import org.wardon.enclosure.Door;
import org.wardon.enclosure.Face;
import org.wardon.enclosure.FaceName;
import org.wardon.enclosure.Gains;
import org.wardon.enclosure.Layer;
import org.wardon.plan.Assumed;
import org.wardon.plan.AtDoor;
import org.wardon.plan.ChamberPlan;
import org.wardon.plan.Chilled;
import org.wardon.plan.Corrections;
import org.wardon.plan.DailyOutage;
import org.wardon.plan.EthyleneAround;
import org.wardon.plan.KnownLife;
import org.wardon.plan.LotPlan;
import org.wardon.plan.Market;
import org.wardon.plan.Move;
import org.wardon.plan.OutagePlan;
import org.wardon.plan.PackagePlan;
import org.wardon.plan.Place;
import org.wardon.plan.PowerPlan;
import org.wardon.plan.Prices;
import org.wardon.plan.Purpose;
import org.wardon.plan.StartAir;
import org.wardon.plan.StorePlan;
import org.wardon.plan.WeatherSource;
import org.wardon.plan.WithoutChamber;
import org.wardon.produce.Ripeness;

/** Good plans read without a fault, every value lands where it belongs, every default is told. */
class PlanReaderTest {
    private static final Path PLANS = Path.of("src/test/resources/plans");
    private static final StorePlan EXAMPLE =
            PlanReader.read(PLANS.resolve("example/plan.json"), TableLookups.read());
    private static final StorePlan MINIMAL =
            PlanReader.read(PLANS.resolve("minimal/plan.json"), TableLookups.read());

    @Test
    void valuesOfTheStore() {
        assertEquals("Three chambers at the ferry landing", EXAMPLE.name());
        assertEquals(20, EXAMPLE.site().elevationM());
        assertEquals("America/Grenada", EXAMPLE.site().zone().getId());
        assertEquals(Optional.of(new YearWave(27, 1.5, 240)), EXAMPLE.site().year());
        assertEquals(Optional.empty(), MINIMAL.site().year());
        assertEquals(LocalDateTime.parse("2026-03-02T00:00"), EXAMPLE.from());
        assertEquals(10, EXAMPLE.days());
        assertEquals(new WithoutChamber.Steady(30, 70), EXAMPLE.without());
        assertEquals(7, EXAMPLE.seed());
        assertEquals(new Prices("XCD", 0.9), EXAMPLE.prices());
        assertEquals(new EthyleneAround(0.02, 0.1), EXAMPLE.ethylene());
        WeatherSource.Csv weather =
                assertInstanceOf(WeatherSource.Csv.class, EXAMPLE.weatherSource());
        assertEquals(241, weather.weather().hours());
        assertEquals(List.of(), weather.filled());
        assertEquals(24.0, weather.weather().temperatureC(0));
    }

    @Test
    void valuesOfNormals() {
        StorePlan plan = PlanReader.read(PLANS.resolve("normals/plan.json"), TableLookups.read());
        WeatherSource.Normals made =
                assertInstanceOf(WeatherSource.Normals.class, plan.weatherSource());
        assertEquals(26.5, made.normals().dailyMaxC().get(1));
        assertEquals(18.1, made.normals().dailyMinC().get(11));
        assertEquals(64, made.normals().humidityPct().get(10));
        assertEquals(6.58, made.normals().globalKWhM2Day().orElseThrow().get(0));
        Weather again = NormalsWeather.of(made.normals(), plan.site(), plan.timeline(), 4, 6 * 24);
        assertEquals(6 * 24 + 1, made.weather().hours());
        assertEquals(Optional.of(made.normals().year()), plan.site().year());
        assertEquals(again.temperatureC(77), made.weather().temperatureC(77));
    }

    @Test
    void valuesOfAChamber() {
        ChamberPlan north = EXAMPLE.getChamber("north");
        assertEquals(new Setting(12, 1, 90), north.setting());
        assertEquals(3000, north.capacityKg());
        assertEquals(1, north.humidifierKgH());
        assertEquals(500, north.heaterW());
        assertEquals(
                List.of(
                        new OutagePlan(LocalDateTime.parse("2026-03-03T18:00"), 6),
                        new OutagePlan(LocalDateTime.parse("2026-03-05T18:00"), 2.5)),
                north.outages());
        assertEquals(
                new PowerPlan(
                        List.of(
                                new DailyOutage(
                                        LocalTime.of(22, 30),
                                        LocalTime.of(5, 0),
                                        Optional.of(LocalDate.parse("2026-03-04")),
                                        Optional.of(LocalDate.parse("2026-03-09")))),
                        Optional.empty()),
                north.power());
        assertEquals(
                new PowerPlan(
                        List.of(),
                        Optional.of(
                                new SolarSupply(
                                        800,
                                        15,
                                        180,
                                        0.75,
                                        new SolarSupply.Cells(4, 0.85, 60, 25),
                                        OptionalDouble.of(1500)))),
                EXAMPLE.getChamber("south").power());
        assertEquals(Optional.of(new StartAir(25, OptionalDouble.of(80))), north.starts());
        assertEquals(
                new Corrections(1.1, 0.9, 0.95, 0.4, Optional.of(LocalDate.parse("2026-02-01"))),
                north.corrections());
        assertEquals(
                List.of(
                        new Compressor(
                                3500,
                                1400,
                                10,
                                35,
                                150,
                                true,
                                600,
                                0.6,
                                Control.MODULATING,
                                4,
                                3,
                                3,
                                2,
                                Optional.of(new Defrost(8, 20, 800)),
                                OptionalDouble.of(30))),
                north.coolers());
    }

    private static Layer.InPlace asPrinted(double moistureCoefficient, double vapourResistance) {
        return new Layer.InPlace(
                1,
                new Layer.Damp(0, moistureCoefficient),
                Optional.empty(),
                OptionalDouble.of(vapourResistance));
    }

    @Test
    void whatBecameOfALayer() {
        Layer foam =
                EXAMPLE.getChamber("north").enclosure().faces().stream()
                        .filter(face -> face.name() == FaceName.FLOOR)
                        .findFirst()
                        .orElseThrow()
                        .layers()
                        .get(0);
        assertEquals(
                new Layer.InPlace(
                        1.2,
                        new Layer.Damp(2, 2.5),
                        Optional.of(new Layer.Bridge(0.13, 8)),
                        OptionalDouble.of(120)),
                foam.inPlace());
        assertEquals(1.2 * Math.exp(2.5 * 0.02), foam.inPlace().worseFactor(), 1e-12);
    }

    @Test
    void aSolarSupplyLeftOpenLooksToTheEquatorAndTellsItsDefaults() {
        StorePlan plan = PlanReader.read(PLANS.resolve("solar/plan.json"), TableLookups.read());
        assertEquals(
                Optional.of(
                        new SolarSupply(
                                2500,
                                34,
                                0,
                                0.8,
                                new SolarSupply.Cells(2, 0.9, 50, 20),
                                OptionalDouble.empty())),
                plan.getChamber("north").power().solar());
        List<String> told =
                plan.assumed().stream()
                        .map(PlanReaderTest::line)
                        .filter(line -> line.contains(".supply."))
                        .map(line -> line.replace("$.chambers[0].supply.solar.", ""))
                        .toList();
        assertEquals(
                List.of(
                        "tiltDeg 34 ° (common practice, no source)",
                        "azimuthDeg 0 ° (common practice, no source)",
                        "performanceRatio 0.8 1 (common practice, no source)",
                        "batteryEfficiency 0.9 1 (common practice, no source)",
                        "startChargePct 50 % (assumption)",
                        "restartChargePct 20 % (assumption)"),
                told);
    }

    @Test
    void dailyOutagesBecomeSpansOverMidnight() {
        DailyOutage nights =
                new DailyOutage(
                        LocalTime.of(18, 0),
                        LocalTime.of(6, 0),
                        Optional.empty(),
                        Optional.empty());
        LocalDateTime start = LocalDateTime.parse("2026-03-02T00:00");
        assertEquals(
                List.of(
                        new OutagePlan(LocalDateTime.parse("2026-03-01T18:00"), 12),
                        new OutagePlan(LocalDateTime.parse("2026-03-02T18:00"), 12),
                        new OutagePlan(LocalDateTime.parse("2026-03-03T18:00"), 12)),
                nights.within(start, start.plusDays(2)));
        DailyOutage once =
                new DailyOutage(
                        LocalTime.of(9, 0),
                        LocalTime.of(11, 15),
                        Optional.of(LocalDate.parse("2026-03-03")),
                        Optional.of(LocalDate.parse("2026-03-03")));
        assertEquals(
                List.of(new OutagePlan(LocalDateTime.parse("2026-03-03T09:00"), 2.25)),
                once.within(start, start.plusDays(9)));
    }

    @Test
    void valuesOfAnEnclosure() {
        var enclosure = EXAMPLE.getChamber("north").enclosure();
        assertTrue(enclosure.computedFilms());
        assertEquals(50_000, enclosure.structureCapacityJK());
        assertEquals(new Gains(60, 2, 2, 0), enclosure.gains());
        assertEquals(
                Optional.of(
                        new Door(
                                0.9,
                                2,
                                20,
                                60,
                                LocalTime.of(7, 0),
                                LocalTime.of(19, 0),
                                0.8,
                                "strip-curtain",
                                new Beyond.Shade())),
                enclosure.door());
        List<Beyond> beyond = enclosure.faces().stream().map(Face::beyond).toList();
        assertEquals(
                List.of(
                        new Beyond.Outdoors(),
                        new Beyond.Ground(),
                        new Beyond.Shade(),
                        new Beyond.Space(22),
                        new Beyond.Neighbour("south"),
                        new Beyond.SpaceAboveOutdoor(3)),
                beyond);
        assertEquals(12, enclosure.faces().get(0).tiltDeg());
        Face north = enclosure.faces().get(2);
        assertEquals(90, north.tiltDeg());
        assertEquals(10, north.azimuthDeg());
        assertEquals(0.5, north.solarAbsorptance());
        assertEquals(
                List.of(
                        new Layer("steel-sheet", 0.0005, 50, 7800, 450, asPrinted(0, 1e6)),
                        new Layer("pur-panel", 0.08, 0.027, 40, 1400, asPrinted(6, 60))),
                north.layers());
    }

    @Test
    void valuesOfALot() {
        LotPlan mango = EXAMPLE.lots().get(0);
        assertEquals(Optional.of("kensington"), mango.variant());
        assertEquals(new PackagePlan.Named("room-cooling-any"), mango.packed());
        assertEquals(LocalDateTime.parse("2026-03-09T15:00"), mango.leaves());
        assertEquals(Place.NEAR_COOLER, mango.place());
        assertEquals(
                List.of(new Move(LocalDateTime.parse("2026-03-05T08:00"), "south")), mango.moves());
        assertEquals(
                new AtDoor(
                        Optional.of(LocalDateTime.parse("2026-03-02T06:00")),
                        OptionalDouble.of(31),
                        OptionalDouble.of(5),
                        Ripeness.GREEN,
                        Optional.of(false),
                        List.of(new Chilled(8, 12)),
                        1,
                        Optional.of(new KnownLife(9, 10))),
                mango.atDoor());
        assertEquals(
                new Market(
                        3,
                        OptionalDouble.of(26),
                        Optional.of(Purpose.SELL_RIPE),
                        1.2,
                        Optional.of(LocalDate.parse("2026-03-09"))),
                mango.market());
        LotPlan okra = EXAMPLE.lots().get(1);
        assertEquals(new PackagePlan.HalfCooling(9), okra.packed());
        assertEquals(6.25, okra.wantedDays(), "days up to leaving");
        assertEquals(Optional.empty(), okra.chamber());
        assertEquals(new PackagePlan.Stack(0.6), EXAMPLE.lots().get(2).packed());
    }

    @Test
    void everyDefaultOfTheSmallestPlanIsToldWithItsMark() {
        List<String> told = MINIMAL.assumed().stream().map(PlanReaderTest::line).toList();
        assertEquals(
                List.of(
                        "$.site.elevationM 0 m (assumption)",
                        "$.chambers[0].faces[0].solarAbsorptance 0.6 1 (assumption)",
                        "$.buildUps.panel.layers[1].conductivityWmK 0.028 W/(m K) (common"
                                + " practice, no source)",
                        "$.chambers[0].faces[2].solarAbsorptance 0.6 1 (assumption)",
                        "$.chambers[0].faces[3].solarAbsorptance 0.6 1 (assumption)",
                        "$.chambers[0].faces[4].solarAbsorptance 0.6 1 (assumption)",
                        "$.chambers[0].faces[5].solarAbsorptance 0.6 1 (assumption)",
                        "$.chambers[0].thermalBridgePct 10 % (common practice, no source)",
                        "$.chambers[0].leakageAirChangesPerDay 2 1/day (common practice, no"
                                + " source)",
                        "$.chambers[0].structureCapacityJK 180000 J/K (assumption)",
                        "$.chambers[0].setting.bandK 1 K (assumption)",
                        "$.chambers[0].setting.humidityPct 90 % (assumption)",
                        "$.chambers[0].capacityKg 4500 kg (common practice, no source)",
                        "$.lots[0].arrives 2026-03-02T00:00  (assumption)",
                        "$.lots[0].wantedDays 7 day (assumption)",
                        "$.lots[0].package room-cooling-any  (assumption)",
                        "$.lots[0].marketDays 2 day (common practice, no source)",
                        "$.lots[0].pricePerKg 1 1/kg (assumption)",
                        "$.energyPricePerKWh 0 1/kWh (assumption)",
                        "$.outdoorEthylenePpm 0.01 ppm (assumption)",
                        "$.marketEthylenePpm 0.06 ppm (assumption)"),
                told);
        assertEquals("plan", MINIMAL.name(), "named after its file");
        assertEquals(10.0, EXAMPLE.getChamber("south").enclosure().leakageAirChangesPerDay());
    }

    private static String line(Assumed assumed) {
        return assumed.path()
                + " "
                + assumed.value()
                + " "
                + assumed.unit()
                + " ("
                + assumed.mark()
                + ")";
    }
}
