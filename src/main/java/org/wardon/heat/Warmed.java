package org.wardon.heat;

/**
 * Faces and air as the first day, come five times before, leaves them. Whoever runs a chamber many
 * times with other lots warms it once.
 */
public final class Warmed {
    private final double[] state;

    Warmed(double[] state) {
        this.state = state.clone();
    }

    /** Writes it over the start of a state: what was not there yet comes after. */
    void into(double[] y) {
        System.arraycopy(state, 0, y, 0, state.length);
    }
}
