package org.wardon.enclosure;

/**
 * Temperature waves in a thick body.
 *
 * <p>Source: Moene and van Dam 2014, Transport in the Atmosphere-Vegetation-Soil Continuum, chapter
 * 2 (sinusoidal surface temperature), from memory.
 */
public final class GroundTemperature {
    private GroundTemperature() {}

    /**
     * Returns the depth at which a wave has fallen to 1/e.
     *
     * @param diffusivityM2s thermal diffusivity, m2/s
     * @param periodS period, s
     * @return m
     */
    public static double dampingDepthM(double diffusivityM2s, double periodS) {
        return Math.sqrt(diffusivityM2s * periodS / Math.PI);
    }

    /**
     * Returns the swing at a depth.
     *
     * @param surfaceAmplitudeK swing of the surface about its mean, K
     * @param depthM depth, m
     * @param diffusivityM2s thermal diffusivity, m2/s
     * @param periodS period, s
     * @return K
     */
    public static double amplitudeK(
            double surfaceAmplitudeK, double depthM, double diffusivityM2s, double periodS) {
        return surfaceAmplitudeK * Math.exp(-depthM / dampingDepthM(diffusivityM2s, periodS));
    }
}
