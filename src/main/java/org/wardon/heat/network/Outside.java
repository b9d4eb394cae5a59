package org.wardon.heat.network;

import org.wardon.air.MoistAir;

/** Outdoor air and the air beyond the door at one instant, with their change in time. */
final class Outside {
    /** Air at one place. */
    static final class Place {
        double airC;
        double ratio;
        double airSlope;
        double ratioSlope;

        double enthalpy() {
            return MoistAir.enthalpyJkg(airC, ratio);
        }

        double enthalpySlope() {
            return MoistAir.heatCapacityJkgK(ratio) * airSlope
                    + MoistAir.vapourEnthalpyJkg(airC) * ratioSlope;
        }
    }

    final Place outdoors = new Place();
    final Place beyondDoor = new Place();
}
