package org.wardon.cooling;

/** A way of taking heat out of a chamber: one record a kind. */
public sealed interface Cooler permits Compressor {
    /**
     * Returns the kind as a plan names it.
     *
     * @return such as {@code compressor}
     */
    String kind();

    /**
     * Compiles the cooler for a site.
     *
     * @param pressurePa air pressure of the site, Pa
     * @return what it does to the air
     * @throws IllegalArgumentException where its parts cannot work together
     */
    CoolerLaw law(double pressurePa);
}
