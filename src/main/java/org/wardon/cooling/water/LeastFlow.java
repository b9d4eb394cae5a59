package org.wardon.cooling.water;

import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.wardon.air.MoistAir;
import org.wardon.enclosure.Films;
import org.wardon.enclosure.HeatFlow;
import org.wardon.enclosure.RadiantFilm;
import org.wardon.errors.Require;

/**
 * How much water a wall takes: the least flow of an open film that keeps its inner surface at a
 * temperature, at rest.
 */
public final class LeastFlow {
    private static final double LEAST_KG_S = 1e-5;
    private static final double MOST_KG_S = 1e3;
    private static final int STEPS = 160;
    private static final double LEWIS_TWO_THIRDS = 0.9;

    private LeastFlow() {}

    /**
     * A wall to be kept cold.
     *
     * @param heightM way of the water, m
     * @param widthM width under water, m
     * @param outerWm2K conductance from beyond to the inner surface, outer film and layers, W/(m2
     *     K)
     * @param beyondC temperature beyond, with sun, °C
     */
    public record Wall(double heightM, double widthM, double outerWm2K, double beyondC) {
        /** Checks the bounds. */
        public Wall {
            Require.within("heightM", heightM, 0.1, 30, "m", "");
            Require.within("widthM", widthM, 0.1, 200, "m", "");
            Require.within("outerWm2K", outerWm2K, 1e-4, 100, "W/(m2 K)", "");
            Require.within("beyondC", beyondC, -40, 90, "°C", "");
        }
    }

    /**
     * The air before it.
     *
     * @param airC °C
     * @param humidityRatio kg/kg
     * @param pressurePa Pa
     */
    public record Air(double airC, double humidityRatio, double pressurePa) {
        /** Checks the bounds. */
        public Air {
            Require.within("airC", airC, -30, 55, "°C", "");
            Require.within("humidityRatio", humidityRatio, 0, 0.1, "kg/kg", "");
            Require.within("pressurePa", pressurePa, 50_000, 110_000, "Pa", "");
        }
    }

    /** The answer: a flow, none needed, or none that does it. */
    public sealed interface Answer {
        /**
         * This much water does it.
         *
         * @param flowKgS least flow, kg/s
         * @param outletC water leaving, °C
         */
        record Flow(double flowKgS, double outletC) implements Answer {}

        /**
         * The wall is as cold without water.
         *
         * @param wallC its inner surface, °C
         */
        record NotNeeded(double wallC) implements Answer {}

        /**
         * No flow is enough: the water is too warm.
         *
         * @param coldestC coldest the wall gets, °C
         */
        record OutOfReach(double coldestC) implements Answer {}
    }

    /**
     * Returns the inner surface of the wall at rest.
     *
     * @param wall the wall
     * @param air the air before it
     * @param inletC water entering, °C
     * @param flowKgS water, kg/s, above 0
     * @return °C
     */
    public static double wallC(Wall wall, Air air, double inletC, double flowKgS) {
        WaterSheet sheet = sheet(wall, air, inletC, flowKgS);
        double area = wall.heightM * wall.widthM;
        return root(
                t ->
                        sheet.balance(inletC, t, air.airC, air.humidityRatio, air.pressurePa)
                                        .fromWallW()
                                - area * wall.outerWm2K * (wall.beyondC - t),
                Math.min(inletC, Math.min(air.airC, wall.beyondC)) - 25,
                Math.max(inletC, Math.max(air.airC, wall.beyondC)) + 1);
    }

    /**
     * Returns the least flow.
     *
     * @param wall the wall
     * @param air the air before it
     * @param inletC water entering, °C
     * @param wantedC inner surface wanted at most, °C
     * @return the flow, or why there is none
     */
    public static Answer of(Wall wall, Air air, double inletC, double wantedC) {
        double dry = dryWallC(wall, air);
        if (dry <= wantedC) {
            return new Answer.NotNeeded(dry);
        }
        DoubleUnaryOperator above =
                logFlow -> wallC(wall, air, inletC, Math.exp(logFlow)) - wantedC;
        double coldest = Double.POSITIVE_INFINITY;
        double step = Math.log(MOST_KG_S / LEAST_KG_S) / STEPS;
        // The thicker film of a larger flow can be worse by hundredths: the first crossing is it.
        for (int i = 0; i <= STEPS; i++) {
            double log = Math.log(LEAST_KG_S) + i * step;
            double miss = above.applyAsDouble(log);
            coldest = Math.min(coldest, miss + wantedC);
            if (miss <= 0) {
                double found = i == 0 ? log : root(above, log - step, log);
                double flow = Math.exp(found);
                return new Answer.Flow(
                        flow,
                        sheet(wall, air, inletC, flow)
                                .balance(
                                        inletC,
                                        wantedC,
                                        air.airC,
                                        air.humidityRatio,
                                        air.pressurePa)
                                .outletC());
            }
        }
        return new Answer.OutOfReach(coldest);
    }

    private static double dryWallC(Wall wall, Air air) {
        double film = 1 / Films.insideM2KW(HeatFlow.LEVEL);
        return (wall.outerWm2K * wall.beyondC + film * air.airC) / (wall.outerWm2K + film);
    }

    /** The film of a flow over the wall, its air side at the inlet's temperature. */
    static WaterSheet sheet(Wall wall, Air air, double inletC, double flowKgS) {
        double convective =
                FilmAir.convectiveWm2K(
                        wall.heightM, inletC, air.airC, air.humidityRatio, air.pressurePa);
        double film = LiquidWater.at(inletC).film().wallWm2K(flowKgS / wall.widthM);
        double before = convective + RadiantFilm.wattsM2K(0.5 * (inletC + air.airC));
        double vapour = convective / (MoistAir.DRY_AIR_J_KG_K * LEWIS_TWO_THIRDS);
        double along =
                1 / (1 / film + 1 / wall.outerWm2K)
                        + before
                        + WaterSheet.latentWm2K(vapour, inletC, air.airC, air.pressurePa);
        return new WaterSheet(
                wall.heightM * wall.widthM,
                flowKgS,
                new WaterSheet.Sides(film, before, vapour, along));
    }

    private static double root(DoubleUnaryOperator f, double low, double high) {
        return new BrentSolver(1e-11, 1e-11).solve(500, f::applyAsDouble, low, high);
    }
}
