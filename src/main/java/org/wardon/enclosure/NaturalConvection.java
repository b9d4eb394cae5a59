package org.wardon.enclosure;

import org.wardon.errors.Require;

/**
 * Films of still air by natural convection, without radiation.
 *
 * <p>Source: vertical plate, Churchill and Chu 1975, valid at all Rayleigh numbers; level plates,
 * McAdams 1954 with area over perimeter as the length; both as printed by Incropera and others,
 * Fundamentals of Heat and Mass Transfer (from memory).
 */
public final class NaturalConvection {
    private NaturalConvection() {}

    /**
     * A gas at the mean of surface and air.
     *
     * @param conductivityWmK conductivity, W/(m K)
     * @param viscosityM2s kinematic viscosity, m2/s
     * @param diffusivityM2s thermal diffusivity, m2/s
     * @param expansionPerK expansion, 1/K
     */
    public record Gas(
            double conductivityWmK,
            double viscosityM2s,
            double diffusivityM2s,
            double expansionPerK) {
        /**
         * Returns dry air. Source: Sutherland's law with the constants of White, Viscous Fluid Flow
         * (from memory); specific heat 1006 J/(kg K).
         *
         * @param temperatureC mean of surface and air, °C
         * @param pressurePa air pressure, Pa
         * @return its properties
         */
        public static Gas air(double temperatureC, double pressurePa) {
            double t = temperatureC + 273.15;
            double mu = 1.716e-5 * Math.pow(t / 273, 1.5) * (273 + 111) / (t + 111);
            double k = 0.0241 * Math.pow(t / 273, 1.5) * (273 + 194) / (t + 194);
            double density = pressurePa / (287.042 * t);
            return new Gas(k, mu / density, k / (density * 1_006), 1 / t);
        }

        /**
         * Returns the Prandtl number.
         *
         * @return dimensionless
         */
        public double prandtl() {
            return viscosityM2s / diffusivityM2s;
        }
    }

    /**
     * Returns the Rayleigh number.
     *
     * @param differenceK surface against air, K, taken without its sign
     * @param lengthM height of a wall; area over perimeter of a level plate, m
     * @param gas the air
     * @param gravityMs2 gravity, m/s2
     * @return dimensionless
     */
    public static double rayleigh(double differenceK, double lengthM, Gas gas, double gravityMs2) {
        return gravityMs2
                * gas.expansionPerK
                * Math.abs(differenceK)
                * lengthM
                * lengthM
                * lengthM
                / (gas.viscosityM2s * gas.diffusivityM2s);
    }

    /**
     * Returns the Nusselt number of a wall.
     *
     * @param rayleigh Rayleigh number with the height, 0 or more
     * @param prandtl Prandtl number
     * @return dimensionless
     */
    public static double wallNusselt(double rayleigh, double prandtl) {
        Require.within("rayleigh", rayleigh, 0, 1e20, "", "");
        double p = Math.pow(1 + Math.pow(0.492 / prandtl, 9.0 / 16), 8.0 / 27);
        double root = 0.825 + 0.387 * Math.pow(rayleigh, 1.0 / 6) / p;
        return root * root;
    }

    /**
     * Returns the Nusselt number of a level plate the air leaves freely: a cold ceiling, a warm
     * floor.
     *
     * @param rayleigh Rayleigh number with area over perimeter; below 1e4 the branch for 1e4 to 1e7
     *     is carried on
     * @return dimensionless
     */
    public static double stirringNusselt(double rayleigh) {
        Require.within("rayleigh", rayleigh, 0, 1e20, "", "");
        return rayleigh < 1e7 ? 0.54 * Math.pow(rayleigh, 0.25) : 0.15 * Math.cbrt(rayleigh);
    }

    /**
     * Returns the Nusselt number of a level plate under or over which the air lies still: a cold
     * floor, a warm ceiling.
     *
     * @param rayleigh Rayleigh number with area over perimeter, carried on outside 1e5 to 1e10
     * @return dimensionless
     */
    public static double restingNusselt(double rayleigh) {
        Require.within("rayleigh", rayleigh, 0, 1e20, "", "");
        return 0.27 * Math.pow(rayleigh, 0.25);
    }

    /**
     * Returns the convective film on the inner side of a face.
     *
     * @param face the face
     * @param box inside measures
     * @param surfaceC its surface, °C
     * @param airC air of the chamber, °C
     * @param pressurePa air pressure, Pa
     * @return W/(m2 K)
     */
    public static double filmWm2K(
            FaceName face, Box box, double surfaceC, double airC, double pressurePa) {
        Gas gas = Gas.air(0.5 * (surfaceC + airC), pressurePa);
        boolean wall = face != FaceName.ROOF && face != FaceName.FLOOR;
        double length =
                wall ? box.heightM() : box.areaM2(face) / (2 * (box.lengthM() + box.widthM()));
        double ra = rayleigh(surfaceC - airC, length, gas, DoorExchange.GRAVITY_MS2);
        boolean stirring = surfaceC < airC == (face == FaceName.ROOF);
        double nusselt;
        if (wall) {
            nusselt = wallNusselt(ra, gas.prandtl());
        } else {
            nusselt = stirring ? stirringNusselt(ra) : restingNusselt(ra);
        }
        return nusselt * gas.conductivityWmK / length;
    }
}
