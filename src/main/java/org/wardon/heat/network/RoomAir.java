package org.wardon.heat.network;

import org.wardon.air.MoistAir;

/** What a state says of all the air in a chamber, and of that at its door end. */
public final class RoomAir {
    private final AirEnd[] ends;
    private final double pressurePa;

    RoomAir(AirEnd[] ends, double pressurePa) {
        this.ends = ends;
        this.pressurePa = pressurePa;
    }

    /**
     * Returns whether the air is two, a coil end and a door end.
     *
     * @return false where it is one
     */
    public boolean hasDoorEnd() {
        return ends.length > 1;
    }

    /**
     * Returns the air temperature at the door end.
     *
     * @param y state
     * @return °C; that of all air where it is one
     */
    public double doorEndC(double[] y) {
        return airC(ends.length - 1, y);
    }

    double airC(int end, double[] y) {
        return MoistAir.temperatureC(y[ends[end].air.at], y[ends[end].air.at + 1]);
    }

    double ratio(int end, double[] y) {
        return y[ends[end].air.at + 1];
    }

    double humidityFraction(int end, double[] y) {
        double pa = MoistAir.vapourPressurePa(ratio(end, y), pressurePa);
        return pa / Saturation.pressurePa(airC(end, y));
    }

    /**
     * Returns the relative humidity at the door end.
     *
     * @param y state
     * @return 0 to 1, a little above where supersaturated; that of all air where it is one
     */
    public double doorEndHumidityFraction(double[] y) {
        return humidityFraction(ends.length - 1, y);
    }

    /**
     * Returns the enthalpy of all air.
     *
     * @param y state
     * @return J above dry air and liquid water at 0 °C
     */
    public double heatJ(double[] y) {
        double sum = 0;
        for (AirEnd end : ends) {
            sum += end.airKg * y[end.air.at];
        }
        return sum;
    }

    /**
     * Returns the vapour in all air.
     *
     * @param y state
     * @return kg
     */
    public double vapourKg(double[] y) {
        double sum = 0;
        for (AirEnd end : ends) {
            sum += end.airKg * y[end.air.at + 1];
        }
        return sum;
    }

    /** Sets both ends alike: °C and kg/kg. */
    void set(double airC, double ratio, double[] y) {
        for (AirEnd end : ends) {
            y[end.air.at] = MoistAir.enthalpyJkg(airC, ratio);
            y[end.air.at + 1] = ratio;
        }
    }

    /**
     * Sets the relative humidity; temperatures stay.
     *
     * @param fraction relative humidity, 0 to 1
     * @param y state, changed in place
     */
    public void setHumidity(double fraction, double[] y) {
        for (int e = 0; e < ends.length; e++) {
            double airC = airC(e, y);
            double ratio = MoistAir.humidityRatioAt(airC, fraction, pressurePa);
            y[ends[e].air.at] = MoistAir.enthalpyJkg(airC, ratio);
            y[ends[e].air.at + 1] = ratio;
        }
    }

    /** Mixes outdoor air in, a share of the air that is there then, into both ends alike. */
    void mixIn(double share, Outside.Place outdoors, double[] y) {
        for (AirEnd end : ends) {
            int i = end.air.at;
            y[i] += share * (outdoors.enthalpy() - y[i]);
            y[i + 1] += share * (outdoors.ratio - y[i + 1]);
        }
    }
}
