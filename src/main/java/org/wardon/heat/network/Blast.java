package org.wardon.heat.network;

/**
 * The air that lots near the cooler meet: midway between the room's and that which leaves the
 * cooler, for the share of the time it blows. Air off a cooler holds no more vapour than at
 * saturation. How the blast itself answers to the room's air is left out of the solver's
 * derivatives; it is exact in the rates.
 *
 * <p>Source: the half is common practice, no source.
 */
final class Blast {
    private static final double SHARE = 0.5;

    private final CoolerPart[] coolers;
    private boolean wanted;

    Blast(CoolerPart[] coolers) {
        this.coolers = coolers;
    }

    /** Some lot stands in it. */
    void wanted() {
        wanted = true;
    }

    /** Tells the lots what the coolers, asked in this air before, do to it. */
    void follow(AirState air, LotBank lots) {
        if (!wanted) {
            return;
        }
        double chillK = 0;
        double dryPa = 0;
        for (CoolerPart cooler : coolers) {
            double chill = cooler.chillK(air.airC);
            if (Math.abs(chill) > Math.abs(chillK)) {
                double supplyPa = Saturation.pressurePa(cooler.effect().supplyC);
                chillK = chill;
                dryPa = cooler.blows() * Math.max(0, air.vapourPa - supplyPa);
            }
        }
        lots.blast(SHARE * chillK, SHARE * dryPa);
    }
}
