package org.wardon.advice.size;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.NamedCsvRecord;
import java.io.IOException;
import java.nio.file.Path;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.wardon.Source;
import org.wardon.advice.size.DesignLoad.Kind;
import org.wardon.advice.size.DesignLoad.Term;
import org.wardon.advice.wording.Units;
import org.wardon.advice.wording.Words;
import org.wardon.air.MoistAir;
import org.wardon.enclosure.FaceName;

/** Whole cold-room loads as published, line by line. */
class DesignLoadTest {
    private static final double BTU_H_W = 0.29307107;
    private static final double FT2_M2 = 0.09290304;
    private static final double F_K = 5.0 / 9;
    private static final double LB_KG = 0.45359237;

    /** Heat of the day of a room 6 x 5 x 4 m for apples at 1 °C, 30 °C outdoors. */
    private static DesignLoad applesAtOneDegree() {
        return new DesignLoad(
                List.of(
                        LoadTerms.transmission("walls and roof", 0.28, 118, 30 - 1, 0),
                        LoadTerms.transmission("floor", 0.28, 30, 10 - 1, 0),
                        LoadTerms.product("apples", 4_000, 3_650, 5 - 1, 24),
                        LoadTerms.respiration("apples", 20_000, 1_900 / 86_400.0, "own"),
                        LoadTerms.people("room", 2 * 4, 270),
                        LoadTerms.lights("room", 3 * 100, 4),
                        LoadTerms.fans("room", 3 * 200, 14),
                        LoadTerms.defrost("room", 1_200, 3 * 0.5, 0.3),
                        LoadTerms.airChange("room", 5, 120, 2_000 * (30 - 1))),
                20,
                14);
    }

    @Test
    @Source(
            "P. Evans, Cooling load calculation - cold room (2017), worked example; transmission seen,"
                    + " the other lines from memory of it")
    void everyLineOfAWorkedAppleRoom() {
        List<Term> terms = applesAtOneDegree().terms();
        // Printed with 113 m2 where its own six figures add to 118: printed 22, so we are 4.5 % up.
        assertEquals(22.996, terms.get(0).kilowattHoursPerDay(), 0.0005);
        assertEquals(22, terms.get(0).kilowattHoursPerDay() * 113 / 118, 0.05);
        assertEquals(1.8, terms.get(1).kilowattHoursPerDay(), 0.05);
        // Printed 16 and 10.5: whole and half kilowatt-hours of 16.2 and 10.56.
        assertEquals(16, terms.get(2).kilowattHoursPerDay(), 0.25);
        assertEquals(10.5, terms.get(3).kilowattHoursPerDay(), 0.06);
        assertEquals(2.16, terms.get(4).kilowattHoursPerDay(), 0.005);
        assertEquals(1.2, terms.get(5).kilowattHoursPerDay(), 0.005);
        assertEquals(8.4, terms.get(6).kilowattHoursPerDay(), 0.005);
        assertEquals(0.54, terms.get(7).kilowattHoursPerDay(), 0.005);
        assertEquals(9.67, terms.get(8).kilowattHoursPerDay(), 0.005);
    }

    @Test
    @Source("P. Evans, Cooling load calculation - cold room (2017), sum and capacity, from memory")
    void sumMarginAndCapacityOfTheAppleRoom() {
        DesignLoad load = applesAtOneDegree();
        // Printed 72.27, 86.7 and 6.2: ours stand 1.8 % up, by the missing 5 m2 (0.98 kWh) and by
        // the two product lines printed short (0.28 kWh).
        double missing = 0.28 * 5 * 29 * 24 / 1_000;
        double sum = load.meanW() * 24 / 1_000;
        assertEquals(72.27, sum - missing - 0.28, 0.1);
        assertEquals(sum * 1.2, load.kilowattHoursPerDay(), 1e-9);
        assertEquals(load.kilowattHoursPerDay() / 14 * 1_000, load.requiredW(), 1e-9);
        assertEquals(6.2, load.requiredW() / 1_000, 0.11);
    }

    @Test
    @Source("P. Evans, Cooling load calculation - cold room (2017): 2 kJ/(m3 K), from memory")
    void enthalpyOfTheAirIsAFifthAboveTheRoundFigureOfThePrint() {
        double room = MoistAir.humidityRatioAt(1, 0.95, 101_325);
        double out = MoistAir.humidityRatioAt(30, 0.5, 101_325);
        double heat =
                (MoistAir.enthalpyJkg(30, out) - MoistAir.enthalpyJkg(1, room))
                        / MoistAir.specificVolumeM3kg(1, room, 101_325);
        assertEquals(1.18, heat / (2_000 * 29), 0.03);
    }

    @Test
    @Source(
            "A worked sheet of a cold store for apples (300 bushels a day at 80 °F into 32 °F) after"
                    + " NC State AG-414-2, Design of room cooling facilities; seen whole")
    void everyLineOfAnAppleStoreInInchPoundUnits() {
        DesignLoad load =
                new DesignLoad(
                        List.of(
                                inchPound("walls", 1_288, 48, 16),
                                inchPound("ceiling", 529, 58, 20),
                                inchPound("floor", 529, 23, 11),
                                LoadTerms.product(
                                        "apples", 15_000 * LB_KG, 0.87 * 4_186.8, 48 * F_K, 24),
                                breathing(15_000, 0.179),
                                breathing(135_000, 0.018)),
                        10,
                        24);
        double[] printed = {3_864, 1_534.1, 1_106.09, 26_100, 2_685, 2_430};
        for (int i = 0; i < printed.length; i++) {
            double btu = load.terms().get(i).meanW() / BTU_H_W;
            assertEquals(printed[i], btu, 0.0002 * printed[i], "line " + i);
        }
        assertEquals(41_491.11, load.requiredW() / BTU_H_W, 4);
        assertEquals(6_504.19, load.meanW(Kind.TRANSMISSION) / BTU_H_W, 1);
    }

    private static Term inchPound(String face, double ft2, double differenceF, double rValue) {
        double wattsM2K = BTU_H_W / (FT2_M2 * F_K) / rValue;
        return LoadTerms.transmission(face, wattsM2K, ft2 * FT2_M2, differenceF * F_K, 0);
    }

    private static Term breathing(double pounds, double btuLbH) {
        return LoadTerms.respiration("apples", pounds * LB_KG, btuLbH * BTU_H_W / LB_KG, "own");
    }

    @Test
    void figuresOfTheTablesAreThoseOfTheReferenceTables() throws IOException {
        Map<String, Double> rows = new HashMap<>();
        try (CsvReader<NamedCsvRecord> csv =
                CsvReader.builder()
                        .ofNamedCsvRecord(Path.of("reference-tables/stores/internal-loads.csv"))) {
            for (NamedCsvRecord row : csv) {
                rows.put(row.getField("load_id"), Double.parseDouble(row.getField("value")));
            }
        }
        for (SunAllowance surface : SunAllowance.values()) {
            String id = "solar_" + surface.name().toLowerCase(java.util.Locale.ROOT);
            assertEquals(rows.get(id + "_ew"), surface.kelvin(FaceName.WEST, 12));
            assertEquals(rows.get(id + "_s"), surface.kelvin(FaceName.SOUTH, 12));
            assertEquals(rows.get(id + "_s"), surface.kelvin(FaceName.NORTH, -12));
            assertEquals(rows.get(id + "_roof"), surface.kelvin(FaceName.ROOF, 12));
            assertEquals(0, surface.kelvin(FaceName.NORTH, 12));
            assertEquals(0, surface.kelvin(FaceName.FLOOR, 12));
        }
        assertEquals(rows.get("airchange_5p7"), AirChanges.perDay(5.7));
        assertEquals(rows.get("airchange_28p3"), AirChanges.perDay(28.3), 1e-9);
        assertEquals(rows.get("airchange_283"), AirChanges.perDay(283), 1e-9);
        assertEquals(rows.get("airchange_1416"), AirChanges.perDay(5_000));
        assertEquals(rows.get("safety_factor"), DesignLoad.USUAL_SAFETY_PCT);
        assertEquals(rows.get("runtime_16"), DesignLoad.runningHours(false));
        assertEquals(rows.get("runtime_nhb"), DesignLoad.runningHours(true));
    }

    @Test
    void airChangesFallWithVolume() {
        double last = AirChanges.perDay(1);
        for (double volume = 2; volume < 2_000; volume *= 1.1) {
            assertTrue(AirChanges.perDay(volume) <= last);
            last = AirChanges.perDay(volume);
        }
    }

    @Test
    void eachTermTellsItsFormula() {
        Words words = Words.english(Units.METRIC);
        assertEquals(
                "walls and roof: 0.28 W/(m2 K) x 118 m2 x (29.0 K + 0.0 K for the sun) = 958 W",
                words.sentence(applesAtOneDegree().terms().get(0).formula()));
        assertEquals(
                "apples: field heat, 4 000 kg x 14.60 kJ/kg within 24 h = 676 W",
                words.sentence(applesAtOneDegree().terms().get(2).formula()));
    }

    @Test
    void whatCannotBeIsRefused() {
        assertEquals(
                "runningHoursPerDay is 25.0 h; accepted is 1.0 to 24.0 h. Give 16, 20 or your own.",
                assertThrows(
                                IllegalArgumentException.class,
                                () -> new DesignLoad(applesAtOneDegree().terms(), 10, 25))
                        .getMessage());
        assertEquals(
                "a design load needs at least one term",
                assertThrows(
                                IllegalArgumentException.class,
                                () -> new DesignLoad(List.of(), 10, 16))
                        .getMessage());
    }
}
