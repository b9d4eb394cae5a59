package org.wardon.cooling;

import org.wardon.air.MoistAir;

/**
 * Outdoor air on its way into a chamber, and what it does there: it mixes in, and as much dry air
 * of the chamber's state is pushed out. A scratch object of {@link CoolerEffect}, filled by the law
 * that owns it and kept while the outdoor air stays the same.
 */
final class Supply {
    /** Outdoor air it was last worked out for; never more vapour than air can hold. */
    double outdoorC = Double.NaN;

    double outdoorRatio = Double.NaN;

    /** Wet bulb of the outdoor air, °C. */
    double wetBulbC;

    /** Air before the fan, °C and kg/kg. */
    double airC;

    double ratio;

    /** Dry air, kg/s. */
    double flowKgS;

    /** Air as it enters the chamber, warmed by the fan, °C. */
    double enteringC;

    private double givenRatio = Double.NaN;

    /** Tells the outdoor air; returns whether it is the one worked out already. */
    boolean meets(CoolerInputs in, double pressurePa) {
        if (in.outdoorC == outdoorC && in.outdoorHumidityRatio == givenRatio) {
            return true;
        }
        outdoorC = in.outdoorC;
        givenRatio = in.outdoorHumidityRatio;
        // Between two hours of saturated air the line lies a little above saturation.
        outdoorRatio = Math.min(givenRatio, MoistAir.saturatedHumidityRatio(outdoorC, pressurePa));
        return false;
    }

    /** Works out the air behind the fan. */
    void warmedBy(double fanW) {
        enteringC = airC + fanW / (flowKgS * MoistAir.heatCapacityJkgK(ratio));
    }

    /** Fills what blowing it in does, by the running share that stands in {@code out}. */
    void blownIn(CoolerInputs in, double fanW, CoolerEffect out) {
        double perK = flowKgS * MoistAir.heatCapacityJkgK(ratio);
        double sensible = perK * (in.airC - airC);
        double vapour = flowKgS * (in.humidityRatio - ratio);
        out.sensibleW = out.ran * sensible;
        out.sensibleByAirC = out.ran * perK + out.ranByAirC * sensible;
        out.sensibleByRun = out.ranByRun * sensible;
        out.vapourKgS = out.ran * vapour;
        out.vapourByAirC = out.ranByAirC * vapour;
        out.vapourByHumidity = out.ran * flowKgS;
        out.vapourByRun = out.ranByRun * vapour;
        out.totalW = out.sensibleW + out.vapourKgS * MoistAir.vapourEnthalpyJkg(in.airC);
        out.exchangeKgS = out.ran * flowKgS;
        out.fanW = out.ran * fanW;
        out.supplyC = out.ran > 0 ? enteringC : Double.NaN;
    }
}
