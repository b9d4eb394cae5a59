package org.wardon.enclosure;

import java.util.List;
import org.wardon.errors.Require;

/**
 * Thermal transmittance of a face in steady state.
 *
 * <p>Source: ISO 6946:2017, 6.7 (from memory).
 */
public final class UValue {
    private UValue() {}

    /**
     * Returns the resistance of layers from surface to surface.
     *
     * @param layers at least one
     * @return m2 K/W
     */
    public static double resistanceM2KW(List<Layer> layers) {
        return layers.stream().mapToDouble(Layer::resistanceM2KW).sum();
    }

    /**
     * Returns the transmittance of layers with their films.
     *
     * @param layers in any order
     * @param insideFilmM2KW resistance of the inner surface, m2 K/W, 0 or more
     * @param outsideFilmM2KW resistance of the outer surface, m2 K/W, 0 or more
     * @return W/(m2 K)
     */
    public static double wattsM2K(
            List<Layer> layers, double insideFilmM2KW, double outsideFilmM2KW) {
        return ofResistance(resistanceM2KW(layers) + insideFilmM2KW + outsideFilmM2KW);
    }

    /**
     * Returns the transmittance of a whole resistance.
     *
     * @param totalM2KW resistance from air to air, m2 K/W, above 0
     * @return W/(m2 K)
     */
    public static double ofResistance(double totalM2KW) {
        Require.within("total resistance", totalM2KW, 1e-4, 1e3, "m2 K/W", "");
        return 1 / totalM2KW;
    }

    /**
     * Returns the steady heat flow.
     *
     * @param wattsM2K transmittance, W/(m2 K)
     * @param areaM2 area, m2
     * @param differenceK outside less inside, K
     * @return W into the chamber
     */
    public static double flowW(double wattsM2K, double areaM2, double differenceK) {
        return wattsM2K * areaM2 * differenceK;
    }
}
