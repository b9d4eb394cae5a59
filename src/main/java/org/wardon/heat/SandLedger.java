package org.wardon.heat;

/**
 * Water of wetted walls, kg.
 *
 * @param poured poured into the sand
 * @param evaporated from their outer sides and the damp share of the inner ones
 * @param ranOff what the sand could not hold
 * @param stored gained by the sand; below 0 where it lost
 */
public record SandLedger(double poured, double evaporated, double ranOff, double stored) {
    /**
     * Returns the error of the balance: poured = evaporated + ran off + stored.
     *
     * @return share of the water that passed; 0 where none did
     */
    public double errorShare() {
        double all = poured + evaporated + ranOff + Math.abs(stored);
        return all > 0 ? Math.abs(poured - evaporated - ranOff - stored) / (0.5 * all) : 0;
    }
}
