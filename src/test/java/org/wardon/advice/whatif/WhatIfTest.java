package org.wardon.advice.whatif;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Function;
import java.util.stream.Collectors;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.wardon.advice.PlanLookups;
import org.wardon.advice.forecast.ForecastAdvice;
import org.wardon.advice.wording.Units;
import org.wardon.advice.wording.Words;
import org.wardon.enclosure.Enclosure;
import org.wardon.errors.BadInput;
import org.wardon.errors.Fault;
import org.wardon.errors.Progress;
import org.wardon.files.PlanReader;
import org.wardon.files.forecast.Forecast;
import org.wardon.files.forecast.LotForecast;
import org.wardon.files.forecast.WhatIfAnswer;
import org.wardon.plan.StorePlan;
import org.wardon.reference.ReferenceBook;

/** The demo's cold chamber with something changed. */
class WhatIfTest {
    private static final ReferenceBook BOOK = ReferenceBook.open();
    private static final Words WORDS = Words.english(Units.METRIC);

    private static StorePlan plan;
    private static WhatIf cold;

    @BeforeAll
    static void prepare() {
        plan = PlanReader.read(Path.of("demo-data/landing.json"), PlanLookups.of(BOOK));
        cold = WhatIf.of(plan, BOOK, WORDS, "cold");
    }

    @AfterAll
    static void close() {
        BOOK.close();
    }

    private static double mean(List<Double> values) {
        return values.stream().mapToDouble(Double::doubleValue).average().orElseThrow();
    }

    private static double meanAirC(WhatIfAnswer answer) {
        return mean(answer.series().column("airC").orElseThrow());
    }

    private static Map<String, WhatIfAnswer.OfLot> lots(WhatIfAnswer answer) {
        return answer.lots().stream()
                .collect(Collectors.toMap(WhatIfAnswer.OfLot::id, Function.identity()));
    }

    @Test
    void nothingChangedIsThePlan() {
        WhatIfAnswer same = cold.answer(Changes.NOTHING);
        assertEquals(same.unchanged(), same.now());
        assertEquals(cold.unchanged(), same.series());
        same.lots().forEach(lot -> assertEquals(0, lot.daysGained().p50(), lot.id()));
        assertEquals(240, same.series().timeS().size());
        assertTrue(
                same.series()
                        .names()
                        .containsAll(
                                List.of(
                                        "airC",
                                        "humidityPct",
                                        "coolingW",
                                        "powerW",
                                        "co2Ppm",
                                        "ethylenePpm")));
    }

    @Test
    void eachChangeMovesWhatItShould() {
        WhatIfAnswer as = cold.answer(Changes.NOTHING);
        WhatIfAnswer shut =
                cold.answer(
                        Changes.NOTHING.through(
                                new Changes.DoorUse(OptionalDouble.of(4), Optional.empty())));
        WhatIfAnswer curtain =
                cold.answer(
                        Changes.NOTHING.through(
                                new Changes.DoorUse(
                                        OptionalDouble.empty(), Optional.of("strip-curtain"))));
        assertTrue(meanAirC(shut) < meanAirC(as) - 0.05, meanAirC(shut) + " " + meanAirC(as));
        assertTrue(meanAirC(curtain) < meanAirC(as) - 0.05, meanAirC(curtain) + "");
        WhatIfAnswer larger = cold.answer(Changes.NOTHING.cooled(1.5));
        assertTrue(meanAirC(larger) < meanAirC(as), meanAirC(larger) + "");
        WhatIfAnswer thicker =
                cold.answer(Changes.NOTHING.insulated(new Changes.Insulation(2, Optional.empty())));
        assertTrue(meanAirC(thicker) < meanAirC(as), meanAirC(thicker) + "");
        WhatIfAnswer roof =
                cold.answer(
                        Changes.NOTHING.insulated(new Changes.Insulation(2, Optional.of("roof"))));
        assertTrue(meanAirC(roof) < meanAirC(as), meanAirC(roof) + "");
        assertTrue(meanAirC(roof) > meanAirC(thicker), meanAirC(roof) + "");
        WhatIfAnswer heavier = cold.answer(Changes.NOTHING.loaded(2));
        assertTrue(meanAirC(heavier) > meanAirC(as), meanAirC(heavier) + "");
        assertTrue(heavier.now().valueKept() > as.now().valueKept());
        WhatIfAnswer aired = cold.answer(Changes.NOTHING.aired(60));
        assertTrue(
                mean(aired.series().column("co2Ppm").orElseThrow())
                        < mean(as.series().column("co2Ppm").orElseThrow()));
        assertTrue(meanAirC(aired) > meanAirC(as), meanAirC(aired) + "");
    }

    @Test
    void aWarmerSettingSavesEnergyAndCostsColdLotsDays() {
        double energy = Double.POSITIVE_INFINITY;
        double days = Double.POSITIVE_INFINITY;
        for (double atC : new double[] {2, 5, 8, 12}) {
            WhatIfAnswer answer = cold.answer(Changes.NOTHING.setTo(atC));
            assertTrue(answer.now().energyKWh() < energy, atC + " °C: " + answer.now());
            double carrots = lots(answer).get("CAR1").daysLeft().p50();
            assertTrue(carrots < days, atC + " °C: " + carrots);
            energy = answer.now().energyKWh();
            days = carrots;
        }
    }

    @Test
    void agreesWithTheForecastOfThePlanChanged() {
        StorePlan warmer =
                cold.plan()
                        .withChamber(
                                Rebuilt.of(
                                        plan.getChamber("cold"),
                                        Changes.NOTHING.setTo(6),
                                        Map.of()));
        Forecast full = new ForecastAdvice(BOOK, WORDS).advise(warmer, Progress.SILENT).forecast();
        WhatIfAnswer quick = cold.answer(Changes.NOTHING.setTo(6));
        for (LotForecast lot : full.lots()) {
            if (!lot.chamber().equals(Optional.of("cold"))) {
                continue;
            }
            // Sixteen of the forecast's thirty-two draws: the middle of the half lies near the
            // middle of all beside what the ranges leave open.
            WhatIfAnswer.OfLot told = lots(quick).get(lot.id());
            double width = lot.daysLeft().p90() - lot.daysLeft().p10();
            assertEquals(lot.daysLeft().p50(), told.daysLeft().p50(), 0.2 * width + 0.1, lot.id());
        }
        double energy = full.chambers().get(1).energyKWh();
        assertEquals("cold", full.chambers().get(1).id());
        assertEquals(energy, quick.now().energyKWh(), 0.05 * energy);
    }

    @Test
    void insulationIsTheLayersThatInsulate() {
        Enclosure built =
                Rebuilt.of(
                                plan.getChamber("cold"),
                                Changes.NOTHING.insulated(
                                        new Changes.Insulation(1.5, Optional.empty())),
                                Map.of())
                        .enclosure();
        built.faces()
                .forEach(
                        face -> {
                            double mm = 1_000 * face.layers().get(1).thicknessM();
                            double expected =
                                    switch (face.name()) {
                                        case WEST -> 80; // at the next chamber: left as it is
                                        case FLOOR -> 90;
                                        default -> 150;
                                    };
                            assertEquals(expected, mm, 1e-9, face.name().name());
                        });
    }

    @Test
    void tellsEveryFaultAtOnce() {
        Changes wrong =
                Changes.NOTHING
                        .setTo(99)
                        .cooled(0)
                        .loaded(20)
                        .aired(-1)
                        .insulated(new Changes.Insulation(0, Optional.of("rooff")))
                        .through(
                                new Changes.DoorUse(
                                        OptionalDouble.of(-2), Optional.of("strip-courtain")));
        BadInput refused = assertThrows(BadInput.class, () -> cold.answer(wrong));
        List<String> told =
                refused.faults().stream()
                        .map(Fault::sentence)
                        .map(text -> text.replaceAll("accepted: air-and.*", "accepted: ..."))
                        .toList();
        assertEquals(
                List.of(
                        "settingC: is 99; accepted: -30 to 45 °C",
                        "coolingFactor: is 0; accepted: 0.1 to 10",
                        "loadFactor: is 20; accepted: 0.1 to 10",
                        "freshAirM3PerHour: is -1; accepted: 0 to 10000 m3/h",
                        "openingsPerDay: is -2; accepted: 0 to 2000 a day",
                        "insulation.thicknessFactor: is 0; accepted: 0.1 to 10",
                        "insulation.face: is 'rooff', no face of a chamber; did you mean 'roof'?"
                                + " accepted: roof, floor, north, east, south, west",
                        "protection: is 'strip-courtain', no protection of a door in the tables;"
                                + " did you mean 'strip-curtain'? accepted: ..."),
                told);
        BadInput nowhere = assertThrows(BadInput.class, () -> WhatIf.of(plan, BOOK, WORDS, "colt"));
        assertEquals(
                "--chamber: is 'colt', no chamber of this plan; did you mean 'cold'? accepted:"
                        + " fruit, cold, shed",
                nowhere.faults().get(0).sentence());
    }
}
