package org.wardon.cooling;

/** A way of taking heat out of a chamber: one record a kind. */
public sealed interface Cooler permits Compressor {
    /**
     * Returns the kind as a plan names it.
     *
     * @return such as {@code compressor}
     */
    String kind();
}
