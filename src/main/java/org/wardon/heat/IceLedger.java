package org.wardon.heat;

/**
 * Ice of one bank in a run. Heat is carried by the solver's stages, ice comes from start and end
 * states, so the balance can fail.
 *
 * @param meltedJ heat that melted ice, J
 * @param refrozenJ heat a machine took out of it, J
 * @param startKg ice at the start, kg
 * @param endKg ice at the end, kg
 * @param latentJkg heat of melting, J/kg
 */
public record IceLedger(
        double meltedJ, double refrozenJ, double startKg, double endKg, double latentJkg) {
    private static final double ROUNDED = 1e-6;

    /**
     * Returns the ice that melted.
     *
     * @return kg
     */
    public double meltedKg() {
        return meltedJ / latentJkg;
    }

    /**
     * Returns the ice that was made.
     *
     * @return kg
     */
    public double refrozenKg() {
        return refrozenJ / latentJkg;
    }

    /**
     * Returns the error of the balance.
     *
     * @return share of what melted and was made, or of a millionth of the ice where that is more: a
     *     smaller change is told by states of that size to a few digits only
     */
    public double errorShare() {
        double through = Math.max(meltedKg() + refrozenKg(), ROUNDED * Math.max(startKg, endKg));
        double gained = endKg - startKg;
        return through > 0 ? Math.abs(gained - refrozenKg() + meltedKg()) / through : 0;
    }
}
