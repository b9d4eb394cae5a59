package org.wardon.cooling;

import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.function.Function;
import org.wardon.enclosure.FaceName;
import org.wardon.errors.Require;

/**
 * Cold water over the inner side of faces: an open film that runs down walls, or a closed jacket.
 * The faces share the flow by their width, side by side. The water comes from a spring and runs
 * away, or from a chiller to which it returns; the pump's power warms it (assumption: all of it).
 *
 * @param wets faces, at least one; walls only where open
 * @param flowKgS water in all, kg/s; 0 for a plain chamber
 * @param inletC water at the inlet, °C: one value, or 24 by the hour of the day
 * @param chiller what cools the water again, where it returns; its water leaves it at inletC
 * @param pumpW electric power of the pump, W; 0 where it runs by gravity
 * @param open whether the film is open to the air
 * @param gapMm thickness of the water in a jacket, mm
 * @param control thermostat on and off, or in bursts as the air needs it
 */
public record WaterFilm(
        Set<FaceName> wets,
        double flowKgS,
        List<Double> inletC,
        Optional<Chiller> chiller,
        double pumpW,
        boolean open,
        double gapMm,
        Control control)
        implements FaceCooler {
    private static final int DAY_H = 24;
    private static final double NO_LIMIT_C = -40;

    /** Condensing stands above evaporating by no less, K (assumption: head pressure is held). */
    private static final double LEAST_LIFT_K = 15;

    /**
     * A machine that cools water.
     *
     * @param capacityW heat it can take, W
     * @param carnotFraction share of the Carnot figure it reaches, 0 to 1
     * @param evaporatingBelowK evaporating below the water it gives, K
     * @param condensingAboveK condensing above outdoors, K
     */
    public record Chiller(
            double capacityW,
            double carnotFraction,
            double evaporatingBelowK,
            double condensingAboveK) {
        /** Checks the bounds. */
        public Chiller {
            Require.within("chillerCapacityW", capacityW, 10, 1_000_000, "W", "");
            Require.within("chillerCarnotFraction", carnotFraction, 0.05, 1, "", "");
            Require.within("evaporatingBelowK", evaporatingBelowK, 0, 30, "K", "");
            Require.within("condensingAboveK", condensingAboveK, 0, 40, "K", "");
        }

        /**
         * Returns its electricity for each watt of heat taken, by {@link CarnotShare} at the water
         * it gives.
         *
         * @param waterC water it gives, °C
         * @param outdoorC outdoor air, °C
         * @return W/W
         */
        public double electricPerW(double waterC, double outdoorC) {
            double evaporatingC = waterC - evaporatingBelowK;
            double condensingC = Math.max(outdoorC + condensingAboveK, evaporatingC + LEAST_LIFT_K);
            return 1 / CarnotShare.cop(evaporatingC, condensingC, carnotFraction);
        }
    }

    /** Checks the bounds. */
    public WaterFilm {
        Require.that(!wets.isEmpty(), "wets is empty; name at least one face");
        wets = Set.copyOf(EnumSet.copyOf(wets));
        boolean level = wets.contains(FaceName.ROOF) || wets.contains(FaceName.FLOOR);
        Require.that(!(open && level), "wets is " + wets + "; an open film runs down walls only");
        Require.within("flowKgS", flowKgS, 0, 100, "kg/s", "");
        inletC = List.copyOf(inletC);
        Require.that(
                inletC.size() == 1 || inletC.size() == DAY_H,
                "inletC has " + inletC.size() + " values; give 1 or 24");
        inletC.forEach(c -> Require.within("inletC", c, 0.1, 40, "°C", "Water, not ice."));
        Require.within("pumpW", pumpW, 0, 50_000, "W", "");
        Require.within("gapMm", gapMm, 1, 200, "mm", "");
    }

    /**
     * Returns the water at the inlet in the mean of an hour.
     *
     * @param hourOfDay hour of the day its first minute lies in, 0 to 23
     * @return °C
     */
    public double inletC(int hourOfDay) {
        if (inletC.size() == 1) {
            return inletC.get(0);
        }
        return 0.5 * (inletC.get(hourOfDay) + inletC.get((hourOfDay + 1) % DAY_H));
    }

    /**
     * Returns the coldest water at the inlet.
     *
     * @return °C
     */
    public double coldestC() {
        return inletC.stream().mapToDouble(c -> c).min().orElseThrow();
    }

    /**
     * Returns the warmest water at the inlet.
     *
     * @return °C
     */
    public double warmestC() {
        return inletC.stream().mapToDouble(c -> c).max().orElseThrow();
    }

    @Override
    public String kind() {
        return "water-film";
    }

    @Override
    public <R> R onFaces(Function<WettedWall, R> outside, Function<WaterFilm, R> inside) {
        return inside.apply(this);
    }

    @Override
    public FaceLaw law(double pressurePa) {
        return new FaceLaw(pumpW);
    }

    @Override
    public Optional<Following> following() {
        return Optional.of(new Following(control, NO_LIMIT_C, 0, 0, 0));
    }

    /** Flow and chiller together; the pump's power stays. */
    @Override
    public WaterFilm sized(double factor) {
        return copy(
                flowKgS * factor,
                chiller.map(
                        c ->
                                new Chiller(
                                        c.capacityW * factor,
                                        c.carnotFraction,
                                        c.evaporatingBelowK,
                                        c.condensingAboveK)),
                control);
    }

    @Override
    public WaterFilm modulating() {
        return copy(flowKgS, chiller, Control.MODULATING);
    }

    private WaterFilm copy(double flow, Optional<Chiller> cools, Control other) {
        return new WaterFilm(wets, flow, inletC, cools, pumpW, open, gapMm, other);
    }

    @Override
    public boolean startsAtSetting() {
        return true;
    }

    @Override
    public boolean holdsBand() {
        return true;
    }

    @Override
    public double mostElectricW() {
        return pumpW + chiller.map(Chiller::capacityW).orElse(0.0);
    }

    /** Water that runs by gravity needs none. */
    @Override
    public boolean needsPower() {
        return pumpW > 0 || chiller.isPresent();
    }

    @Override
    public <R> R match(Kinds<R> kinds) {
        return kinds.waterFilm(this);
    }
}
