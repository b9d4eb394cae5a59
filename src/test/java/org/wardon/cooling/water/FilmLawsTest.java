package org.wardon.cooling.water;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.SplittableRandom;
import org.apache.commons.math3.ode.FirstOrderDifferentialEquations;
import org.apache.commons.math3.ode.nonstiff.DormandPrince853Integrator;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.wardon.Source;
import org.wardon.air.MoistAir;
import org.wardon.cooling.water.FallingFilm.Regime;
import org.wardon.cooling.water.WaterSheet.Balance;

/** Films of water: properties, regimes, exchange along the way. */
class FilmLawsTest {
    private static final double P = 101_325;

    @Source("Incropera and others, Fundamentals of Heat and Mass Transfer, table A.6 (from memory)")
    @ParameterizedTest(name = "{0} °C: {1} kg/m3, {2} Pa s, {3} W/(m K), Pr {4}")
    @CsvSource({
        "6.85, 1000, 1422e-6, 0.582, 10.26",
        "16.85, 999, 1080e-6, 0.598, 7.56",
        "26.85, 997, 855e-6, 0.613, 5.83"
    })
    void waterIsAsPrinted(double c, double density, double viscosity, double k, double prandtl) {
        LiquidWater water = LiquidWater.at(c);
        assertEquals(density, water.densityKgM3(), 1e-3 * density, "printed to 1 kg/m3");
        assertEquals(viscosity, water.viscosityPas(), 0.025 * viscosity, "claim of Vogel's form");
        // The skeleton table behind the print is 2 % above the later reference of Ramires.
        assertEquals(k, water.conductivityWmK(), 0.02 * k);
        assertEquals(prandtl, water.prandtl(), 0.045 * prandtl);
    }

    @Source("WILKE1962 (from memory): the smooth law holds up to Re = 2460 Pr^-0.646")
    @ParameterizedTest
    @CsvSource({"2", "10", "20"})
    void wavyHeatingTakesOverWhereItsAuthorSays(double c) {
        LiquidWater water = LiquidWater.at(c);
        FallingFilm film = water.film();
        double re = 2_460 * Math.pow(water.prandtl(), -0.646);
        double flow = re * water.viscosityPas() / 4;
        // Constants of three digits: the crossing is met within 2 % of the coefficient.
        assertEquals(1, film.wavyHeatingWm2K(flow) / film.smoothWm2K(flow, 90), 0.02);
    }

    @Source("BSL (from memory): laminar to about 30, wavy to about 1700")
    @Test
    void regimesFollowTheReynoldsNumber() {
        FallingFilm film = LiquidWater.at(10).film();
        double perRe = film.viscosityPas() / 4;
        assertEquals(Regime.LAMINAR, film.regime(20 * perRe));
        assertEquals(Regime.WAVY, film.regime(400 * perRe));
        assertEquals(Regime.TURBULENT, film.regime(3_000 * perRe));
        assertEquals(film.smoothWm2K(20 * perRe, 90), film.wallWm2K(20 * perRe));
        assertEquals(film.wavyHeatingWm2K(900 * perRe), film.wallWm2K(900 * perRe));
        assertEquals(film.turbulentWm2K(5_000 * perRe), film.wallWm2K(5_000 * perRe));
    }

    @Source("Churchill and Chu 1975 on a wall of 2.5 m; table of cooling sources: 2 to 6 W/(m2 K)")
    @Test
    void airBeforeAColdWetWallConductsAsPrinted() {
        double ratio = MoistAir.humidityRatioAt(14, 0.9, P);
        double h = FilmAir.convectiveWm2K(2.5, 6, 14, ratio, P);
        assertTrue(h > 2 && h < 6, "found " + h);
        double alike = MoistAir.saturatedHumidityRatio(14, P);
        assertTrue(FilmAir.convectiveWm2K(2.5, 14, 14, alike, P) < 0.1 * h, "equal densities");
    }

    /** A film over a wall that conducts so much from its depth, its own resistance included. */
    private static WaterSheet sheet(
            double areaM2, double flow, double wall, double inlet, double air, double vapour) {
        double along = wall + 9 + WaterSheet.latentWm2K(vapour, inlet, air, P);
        return new WaterSheet(areaM2, flow, new WaterSheet.Sides(wall, 9, vapour, along));
    }

    private static final class Along implements FirstOrderDifferentialEquations {
        private final WaterSheet sheet;
        private final double wallC;
        private final double airC;
        private final double ratio;

        Along(WaterSheet sheet, double wallC, double airC, double ratio) {
            this.sheet = sheet;
            this.wallC = wallC;
            this.airC = airC;
            this.ratio = ratio;
        }

        @Override
        public int getDimension() {
            return 1;
        }

        @Override
        public void computeDerivatives(double way, double[] y, double[] slope) {
            double condenses =
                    sheet.sides().vapourKgM2S()
                            * (ratio - MoistAir.saturatedHumidityRatio(y[0], P));
            double flux =
                    sheet.sides().wallWm2K() * (wallC - y[0])
                            + sheet.sides().beforeWm2K() * (airC - y[0])
                            + condenses * WaterSheet.latentJkg(y[0]);
            slope[0] = sheet.areaM2() * flux / (sheet.flowKgS() * MoistAir.WATER_J_KG_K);
        }
    }

    /** An independent integrator along the way of the water; the exchange law is one formula. */
    @Test
    void outletAgreesWithIntegrationAlongTheWay() {
        SplittableRandom random = new SplittableRandom(5);
        double worst = 0;
        for (int k = 0; k < 200; k++) {
            double flow = Math.exp(random.nextDouble(Math.log(0.003), Math.log(1)));
            double inlet = random.nextDouble(1, 12);
            double air = inlet + random.nextDouble(4, 20);
            double surface = inlet + random.nextDouble(0.5, 12);
            double ratio = random.nextDouble(0.5, 1) * MoistAir.saturatedHumidityRatio(air, P);
            WaterSheet sheet = sheet(8, flow, random.nextDouble(0.3, 40), inlet, air, 0.0044);
            double[] y = {inlet};
            new DormandPrince853Integrator(1e-6, 1, 1e-10, 1e-10)
                    .integrate(new Along(sheet, surface, air, ratio), 0, y, 1, y);
            Balance balance = sheet.balance(inlet, surface, air, ratio, P);
            double reach = Math.max(surface, air) - inlet;
            worst = Math.max(worst, Math.abs(balance.outletC() - y[0]) / reach);
        }
        // Saturation is curved along the way while the law takes it at the mean temperature.
        assertTrue(worst < 0.03, "worst " + worst + " of the greatest rise");
    }

    @Test
    void outletLiesBetweenInletAndWhatItMeetsAndCarriesExactlyWhatItWasGiven() {
        SplittableRandom random = new SplittableRandom(11);
        for (int k = 0; k < 2_000; k++) {
            double flow = Math.exp(random.nextDouble(Math.log(1e-4), Math.log(50)));
            boolean open = random.nextBoolean();
            double inlet = random.nextDouble(0.5, 25);
            double wall = random.nextDouble(0, 35);
            double air = random.nextDouble(0, 35);
            double ratio = random.nextDouble(0.1, 1) * MoistAir.saturatedHumidityRatio(air, P);
            double vapour = open ? random.nextDouble(0.001, 0.008) : 0;
            double area = random.nextDouble(0.5, 40);
            double through = random.nextDouble(0.1, 4_000);
            WaterSheet sheet = sheet(area, flow, through, inlet, air, vapour);
            Balance b = sheet.balance(inlet, wall, air, ratio, P);
            double dew = open ? MoistAir.dewPointC(ratio, P) : wall;
            double low = Math.min(Math.min(inlet, wall), Math.min(air, dew));
            double high = Math.max(inlet, Math.max(wall, air));
            assertTrue(b.outletC() > low - 1e-9 && b.outletC() < high + 1e-9, b.toString());
            double carried = flow * MoistAir.WATER_J_KG_K * (b.outletC() - inlet);
            assertEquals(b.takenW(), carried, 1e-9 * (1 + Math.abs(carried)));
            assertTrue(open || b.vapourKgS() == 0, "a jacket exchanges no vapour");
        }
    }

    @Test
    void muchWaterLeavesAsItCameAndLittleLeavesAtRestWithItsNeighbours() {
        double ratio = MoistAir.humidityRatioAt(15, 0.8, P);
        Balance much = sheet(8, 1e4, 2_400, 3, 15, 0.004).balance(3, 12, 15, ratio, P);
        assertEquals(3, much.meanC(), 1e-2);
        assertEquals(3, much.outletC(), 1e-2);
        Balance little = sheet(8, 1e-6, 2_400, 3, 15, 0).balance(3, 12, 15, ratio, P);
        double rest = (2_400 * 12 + 9 * 15) / 2_409.0;
        assertEquals(rest, little.outletC(), 1e-3);
        assertEquals(1, sheet(8, 1e-6, 2_400, 3, 15, 0).effectiveness(), 1e-12);
    }
}
