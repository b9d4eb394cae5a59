package org.wardon.heat;

/**
 * Heat of a run by term, J, positive into the chamber; enthalpies with their zero at dry air and
 * liquid water of 0 °C. The terms are carried by the solver's stages, stored heat comes from start
 * and end states, so the balance can fail.
 *
 * @param walls through faces and thermal bridges into the air
 * @param door by openings, air pushed out and drawn in by lots coming and going included
 * @param leakage by leakage
 * @param freshAir by fresh air
 * @param fieldHeat what the lots gave up, the liquid that left them as vapour included
 * @param respiration heat of respiration
 * @param fans fans
 * @param lights lights
 * @param people people, sensible and latent
 * @param packages what packages, their air and structure gave up
 * @param defrost heaters of defrosts
 * @param humidifier enthalpy of the water added
 * @param heater heater
 * @param pumps pumps
 * @param air what the chamber's air gave up
 * @param removed enthalpy taken from the air by all coolers
 * @param electricity electricity of coolers, fans, lights, heater, defrosts
 */
public record HeatLedger(
        double walls,
        double door,
        double leakage,
        double freshAir,
        double fieldHeat,
        double respiration,
        double fans,
        double lights,
        double people,
        double packages,
        double defrost,
        double humidifier,
        double heater,
        double pumps,
        double air,
        double removed,
        double electricity) {
    static final HeatLedger NOTHING =
            new HeatLedger(0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0);

    /** What came in between. */
    HeatLedger since(HeatLedger before) {
        return new HeatLedger(
                walls - before.walls,
                door - before.door,
                leakage - before.leakage,
                freshAir - before.freshAir,
                fieldHeat - before.fieldHeat,
                respiration - before.respiration,
                fans - before.fans,
                lights - before.lights,
                people - before.people,
                packages - before.packages,
                defrost - before.defrost,
                humidifier - before.humidifier,
                heater - before.heater,
                pumps - before.pumps,
                air - before.air,
                removed - before.removed,
                electricity - before.electricity);
    }

    /**
     * Returns the sum of all terms, which the coolers must have removed.
     *
     * @return J
     */
    public double sum() {
        return walls
                + door
                + leakage
                + freshAir
                + fieldHeat
                + respiration
                + fans
                + lights
                + people
                + packages
                + defrost
                + humidifier
                + heater
                + pumps
                + air;
    }

    /**
     * Returns the terms' throughput: half the sum of all magnitudes.
     *
     * @return J
     */
    public double throughput() {
        double all = 0;
        for (double term :
                new double[] {
                    walls,
                    door,
                    leakage,
                    freshAir,
                    fieldHeat,
                    respiration,
                    fans,
                    lights,
                    people,
                    packages,
                    defrost,
                    humidifier,
                    heater,
                    pumps,
                    air,
                    removed
                }) {
            all += Math.abs(term);
        }
        return 0.5 * all;
    }

    /**
     * Returns the error of the balance.
     *
     * @return share of the throughput; 0 where nothing passed
     */
    public double errorShare() {
        double through = throughput();
        return through > 0 ? Math.abs(sum() - removed) / through : 0;
    }
}
