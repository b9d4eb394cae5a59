package org.wardon.lots;

/**
 * A component of food and how it takes, holds and conducts heat.
 *
 * <p>Source: Choi and Okos 1986, as printed in ASHRAE Handbook - Refrigeration 2006, chapter 9,
 * tables 1 and 2; each property is a + b T + c T squared with T in °C, -40 to 150 °C. The slope of
 * fat's conductivity is -2.7604e-4; -2.7604e-3 and +2.7604e-3 are misprints met elsewhere.
 */
public enum Component {
    /** Liquid water; specific heat from 0 °C up. */
    WATER(
            new Quadratic(0.57109, 1.7625e-3, -6.7036e-6),
            new Quadratic(997.18, 3.1439e-3, -3.7574e-3),
            new Quadratic(4.1762, -9.0864e-5, 5.4731e-6)),
    /** Protein. */
    PROTEIN(
            new Quadratic(0.17881, 1.1958e-3, -2.7178e-6),
            new Quadratic(1329.9, -0.5184, 0),
            new Quadratic(2.0082, 1.2089e-3, -1.3129e-6)),
    /** Fat. */
    FAT(
            new Quadratic(0.18071, -2.7604e-4, -1.7749e-7),
            new Quadratic(925.59, -0.41757, 0),
            new Quadratic(1.9842, 1.4733e-3, -4.8008e-6)),
    /** Carbohydrate without fibre. */
    CARBOHYDRATE(
            new Quadratic(0.20141, 1.3874e-3, -4.3312e-6),
            new Quadratic(1599.1, -0.31046, 0),
            new Quadratic(1.5488, 1.9625e-3, -5.9399e-6)),
    /** Fibre. */
    FIBRE(
            new Quadratic(0.18331, 1.2497e-3, -3.1683e-6),
            new Quadratic(1311.5, -0.36589, 0),
            new Quadratic(1.8459, 1.8306e-3, -4.6509e-6)),
    /** Ash. */
    ASH(
            new Quadratic(0.32962, 1.4011e-3, -2.9069e-6),
            new Quadratic(2423.8, -0.28063, 0),
            new Quadratic(1.0926, 1.8896e-3, -3.6817e-6));

    private record Quadratic(double a, double b, double c) {
        double at(double temperatureC) {
            return a + temperatureC * (b + temperatureC * c);
        }
    }

    private final Quadratic conductivity;
    private final Quadratic density;
    private final Quadratic specificHeat;

    Component(Quadratic conductivity, Quadratic density, Quadratic specificHeat) {
        this.conductivity = conductivity;
        this.density = density;
        this.specificHeat = specificHeat;
    }

    /**
     * Returns the thermal conductivity.
     *
     * @param temperatureC temperature, °C, -40 to 150
     * @return W/(m K)
     */
    public double conductivityWmK(double temperatureC) {
        return conductivity.at(temperatureC);
    }

    /**
     * Returns the density.
     *
     * @param temperatureC temperature, °C, -40 to 150
     * @return kg/m3
     */
    public double densityKgM3(double temperatureC) {
        return density.at(temperatureC);
    }

    /**
     * Returns the specific heat.
     *
     * @param temperatureC temperature, °C, -40 to 150; of water from 0
     * @return J/(kg K)
     */
    public double specificHeatJkgK(double temperatureC) {
        return 1000 * specificHeat.at(temperatureC);
    }
}
