package org.wardon.lots;

/**
 * Thermal properties of the components of food.
 *
 * <p>Source: Choi and Okos 1986, as printed in ASHRAE Handbook - Refrigeration 2006, chapter 9,
 * tables 1 and 2; each property is a + b T + c T squared with T in °C, -40 to 150 °C, water from 0
 * °C. The slope of fat's conductivity is -2.7604e-4; -2.7604e-3 and +2.7604e-3 are misprints met
 * elsewhere.
 */
public final class ChoiOkos {
    private ChoiOkos() {}

    /**
     * Returns the thermal conductivity.
     *
     * @param component the component
     * @param temperatureC temperature, °C
     * @return W/(m K)
     */
    public static double conductivityWmK(Component component, double temperatureC) {
        return switch (component) {
            case WATER -> quadratic(temperatureC, 0.57109, 1.7625e-3, -6.7036e-6);
            case PROTEIN -> quadratic(temperatureC, 0.17881, 1.1958e-3, -2.7178e-6);
            case FAT -> quadratic(temperatureC, 0.18071, -2.7604e-4, -1.7749e-7);
            case CARBOHYDRATE -> quadratic(temperatureC, 0.20141, 1.3874e-3, -4.3312e-6);
            case FIBRE -> quadratic(temperatureC, 0.18331, 1.2497e-3, -3.1683e-6);
            case ASH -> quadratic(temperatureC, 0.32962, 1.4011e-3, -2.9069e-6);
        };
    }

    /**
     * Returns the density.
     *
     * @param component the component
     * @param temperatureC temperature, °C
     * @return kg/m3
     */
    public static double densityKgM3(Component component, double temperatureC) {
        return switch (component) {
            case WATER -> quadratic(temperatureC, 997.18, 3.1439e-3, -3.7574e-3);
            case PROTEIN -> quadratic(temperatureC, 1329.9, -0.5184, 0);
            case FAT -> quadratic(temperatureC, 925.59, -0.41757, 0);
            case CARBOHYDRATE -> quadratic(temperatureC, 1599.1, -0.31046, 0);
            case FIBRE -> quadratic(temperatureC, 1311.5, -0.36589, 0);
            case ASH -> quadratic(temperatureC, 2423.8, -0.28063, 0);
        };
    }

    /**
     * Returns the specific heat.
     *
     * @param component the component
     * @param temperatureC temperature, °C; of water from 0
     * @return J/(kg K)
     */
    public static double specificHeatJkgK(Component component, double temperatureC) {
        return 1000
                * switch (component) {
                    case WATER -> quadratic(temperatureC, 4.1762, -9.0864e-5, 5.4731e-6);
                    case PROTEIN -> quadratic(temperatureC, 2.0082, 1.2089e-3, -1.3129e-6);
                    case FAT -> quadratic(temperatureC, 1.9842, 1.4733e-3, -4.8008e-6);
                    case CARBOHYDRATE -> quadratic(temperatureC, 1.5488, 1.9625e-3, -5.9399e-6);
                    case FIBRE -> quadratic(temperatureC, 1.8459, 1.8306e-3, -4.6509e-6);
                    case ASH -> quadratic(temperatureC, 1.0926, 1.8896e-3, -3.6817e-6);
                };
    }

    private static double quadratic(double temperatureC, double a, double b, double c) {
        return a + temperatureC * (b + temperatureC * c);
    }
}
