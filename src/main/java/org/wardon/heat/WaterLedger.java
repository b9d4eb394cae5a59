package org.wardon.heat;

/**
 * Water of a run, kg, positive into the chamber's air.
 *
 * @param lots left skins and free water of lots
 * @param packages what the air of packages gave up
 * @param door by openings, air pushed out and drawn in by lots coming and going included
 * @param leakage by leakage
 * @param freshAir by fresh air
 * @param people of people
 * @param humidifier of the humidifier
 * @param faces off the faces; below 0 where more condensed than dried
 * @param coolers brought by coolers; below 0 where they dried the air
 * @param air what the chamber's air gave up
 * @param formed water formed by respiration, which stays in the tissue; no part of the sum
 * @param ranOff water that ran off the faces or fell out as mist; no part of the sum
 */
public record WaterLedger(
        double lots,
        double packages,
        double door,
        double leakage,
        double freshAir,
        double people,
        double humidifier,
        double faces,
        double coolers,
        double air,
        double formed,
        double ranOff) {
    /** Below this what passed is rounding, kg. */
    private static final double LEAST_KG = 1e-6;

    static final WaterLedger NOTHING = new WaterLedger(0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0);

    /** What came in between. */
    WaterLedger since(WaterLedger before) {
        return new WaterLedger(
                lots - before.lots,
                packages - before.packages,
                door - before.door,
                leakage - before.leakage,
                freshAir - before.freshAir,
                people - before.people,
                humidifier - before.humidifier,
                faces - before.faces,
                coolers - before.coolers,
                air - before.air,
                formed - before.formed,
                ranOff - before.ranOff);
    }

    /**
     * Returns the sum of all terms, which must be nothing.
     *
     * @return kg
     */
    public double sum() {
        return lots
                + packages
                + door
                + leakage
                + freshAir
                + people
                + humidifier
                + faces
                + coolers
                + air;
    }

    /**
     * Returns the error of the balance.
     *
     * @return share of the throughput; 0 where less than a milligram passed
     */
    public double errorShare() {
        double all = 0;
        for (double term :
                new double[] {
                    lots, packages, door, leakage, freshAir, people, humidifier, faces, coolers, air
                }) {
            all += Math.abs(term);
        }
        return all > LEAST_KG ? Math.abs(sum()) / (0.5 * all) : 0;
    }
}
