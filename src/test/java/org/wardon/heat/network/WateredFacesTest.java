package org.wardon.heat.network;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.wardon.air.MoistAir;
import org.wardon.cooling.water.JacketGap;
import org.wardon.cooling.water.WaterSheet;
import org.wardon.enclosure.Layer;
import org.wardon.heat.laws.FaceWater;
import org.wardon.heat.laws.FreeWater;
import org.wardon.heat.laws.WetOutside;
import org.wardon.heat.solver.Tree;

/** Compiled faces under water and wetted outside against the readable laws at random states. */
class WateredFacesTest {
    private static final double P = 101_325;
    private static final double AREA = 9;
    private static final double OUTDOOR_RATIO = 0.009;
    private static final FilmedFace.Control ALWAYS =
            new FilmedFace.Control() {
                @Override
                public double share(double airC) {
                    return 1;
                }

                @Override
                public double shareByAirC(double airC) {
                    return 0;
                }
            };

    private final SplittableRandom random = new SplittableRandom(17);
    private final Tree tree = new Tree(2);
    private final AirState air = new AirState(P, AirState.ENTHALPY);
    private final Outside outside = new Outside();
    private final double[] flows = new double[20];
    private double[] y = new double[0];
    private double[] rates = new double[0];

    private static FaceChain.Build build() {
        Layer brick = new Layer("brick", 0.115, 0.8, 1_800, 900);
        return new FaceChain.Build(
                0, 0, AREA, new FaceGrid(List.of(brick), 0.13, 1), 1.1, 2.5, 1, true);
    }

    private void next(FacePart face) {
        double airC = random.nextDouble(5, 28);
        double ratio = random.nextDouble(0.3, 1) * MoistAir.saturatedHumidityRatio(airC, P);
        y = new double[tree.size()];
        y[0] = MoistAir.enthalpyJkg(airC, ratio);
        y[1] = ratio;
        for (int i = 2; i < y.length; i++) {
            y[i] = random.nextDouble(4, 35);
        }
        outside.outdoors.ratio = OUTDOOR_RATIO;
        face.beyond(random.nextDouble(20, 45), 0);
        air.set(y);
        rates = new double[y.length];
    }

    @Test
    void openFilmFollowsTheSheetOfWater() {
        OpenFilmFace face =
                new OpenFilmFace(
                        tree,
                        build(),
                        new FilmedFace.Water(0.2, 4, 2.5, Double.POSITIVE_INFINITY, 0),
                        P);
        face.drivenBy(ALWAYS);
        face.hour(6, 0);
        for (int k = 0; k < 1000; k++) {
            next(face);
            face.settle(air, y);
            face.rates(air, outside, y, rates, flows);
            WaterSheet sheet = face.film.sheet();
            double wallC = y[face.innermost];
            WaterSheet.Balance law = sheet.balance(6, wallC, air.airC, air.ratio, P);
            double heat = MoistAir.vapourEnthalpyJkg(law.meanC()) * law.vapourKgS();
            double scale = 1 + Math.abs(law.takenW());
            assertEquals(law.takenW(), flows[FilmedFace.TAKEN], 1e-9 * scale, "taken");
            assertEquals(law.vapourKgS(), flows[FacePart.VAPOUR], 1e-12, "vapour");
            assertEquals(heat - law.fromBeforeW() + bridge(face), rates[0], 1e-9 * scale, "air");
            assertEquals(
                    0.2 * MoistAir.WATER_J_KG_K * law.outletC(),
                    flows[FilmedFace.OUTLET],
                    1e-9 * scale,
                    "outlet");
            int last = face.grid.capacity.length - 1;
            double in = AREA * face.grid.between[last - 1] * (y[face.innermost - 1] - wallC);
            double expected = (in - law.fromWallW()) / (AREA * face.grid.capacity[last]);
            assertEquals(expected, rates[face.innermost], 1e-9 * (1 + Math.abs(expected)), "wall");
        }
    }

    private double bridge(FaceChain face) {
        return face.bridgeWK * (face.beyondC - air.airC);
    }

    @Test
    void jacketFollowsTheSheetOfWaterAndExchangesNoVapourByIt() {
        JacketFace face =
                new JacketFace(
                        tree,
                        build(),
                        new FilmedFace.Water(0.2, 4, 2.5, Double.POSITIVE_INFINITY, 0),
                        new JacketGap(0.01),
                        P);
        face.drivenBy(ALWAYS);
        face.hour(6, 0);
        for (int k = 0; k < 1000; k++) {
            next(face);
            face.settle(air, y);
            face.rates(air, outside, y, rates, flows);
            double sheetC = y[face.innermost + 1];
            WaterSheet.Balance law =
                    face.film.sheet().balance(6, y[face.innermost], sheetC, air.ratio, P);
            assertEquals(0, law.vapourKgS());
            double scale = 1 + Math.abs(law.takenW());
            assertEquals(law.takenW(), flows[FilmedFace.TAKEN], 1e-9 * scale, "taken");
            double film = AREA * face.grid.inner * (sheetC - air.airC);
            double vapour = flows[FacePart.VAPOUR] * MoistAir.vapourEnthalpyJkg(sheetC);
            assertEquals(film + vapour + bridge(face), rates[0], 1e-9 * scale, "air");
        }
    }

    @Test
    void theChillersLimitHoldsAndIsMetOnlyWhereItIsNeeded() {
        OpenFilmFace face =
                new OpenFilmFace(tree, build(), new FilmedFace.Water(0.2, 4, 2.5, 8_000, 0), P);
        face.drivenBy(ALWAYS);
        face.hour(6, 0.3);
        int limited = 0;
        for (int k = 0; k < 500; k++) {
            next(face);
            face.settle(air, y);
            face.rates(air, outside, y, rates, flows);
            double free =
                    face.film
                            .sheet()
                            .balance(6, y[face.innermost], air.airC, air.ratio, P)
                            .takenW();
            double taken = flows[FilmedFace.TAKEN];
            // Its corners are rounded within 2 %: half a percent is what that gives away.
            assertEquals(Math.min(Math.max(free, 0), 8_000), taken, 0.005 * 8_000 + 1e-6);
            assertEquals(0.3 * taken, flows[FilmedFace.CHILLER], 1e-9 * (1 + taken));
            limited += free > 8_200 ? 1 : 0;
        }
        assertTrue(limited > 50 && limited < 450, "limited " + limited);
    }

    @Test
    void wettedWallFollowsTheLewisRelationOutsideAndIn() {
        WettedFace face = new WettedFace(tree, build(), new WettedFace.Sand(30, 0.5, 5.5));
        face.farFilm(25);
        for (int k = 0; k < 1000; k++) {
            next(face);
            face.follow(y);
            assertTrue(face.wet());
            face.rates(air, outside, y, rates, flows);
            double outerC = y[face.outermost];
            double out =
                    AREA
                            * WetOutside.vapourKgM2S(
                                    19.5,
                                    MoistAir.saturatedHumidityRatio(outerC, P),
                                    OUTDOOR_RATIO);
            double flux = 25 * (face.beyondC - outerC) - out / AREA * WetOutside.latentJkg(outerC);
            double next = face.grid.between[0] * (outerC - y[face.outermost + 1]);
            double expected = (flux - next) / face.grid.capacity[0];
            assertEquals(expected, rates[face.outermost], 1e-9 * (1 + Math.abs(expected)));
            double wall = MoistAir.saturatedHumidityRatio(y[face.innermost], P);
            double water = y[face.innermost + 1];
            double wet = FreeWater.wetShare(water / (AREA * FreeWater.FULL_KG_M2));
            double in =
                    AREA
                            * FaceWater.vapourKgM2S(
                                    FaceWater.conductanceKgM2S(2.5),
                                    wall,
                                    air.ratio,
                                    0.5 + 0.5 * wet);
            assertEquals(in, rates[1], 1e-12 * (1e-3 + Math.abs(in)), "vapour inside");
            assertEquals(-out, rates[face.outermost - 1], 1e-15, "sand, outer side");
        }
    }
}
