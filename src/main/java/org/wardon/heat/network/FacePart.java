package org.wardon.heat.network;

/**
 * One face of a chamber as the network sees it. Its first {@link #COMMON} flows are those of every
 * face; one that is kept wet outside or under water inside has more behind them.
 */
interface FacePart extends Part {
    /** Flows of a face: heat to the air, W (film and bridge). */
    int HEAT = 0;

    /** Vapour to the air, kg/s. */
    int VAPOUR = 1;

    /** Enthalpy of that vapour, W. */
    int VAPOUR_ENTHALPY = 2;

    /** Heat from the far side into the layers, W. */
    int FROM_BEYOND = 3;

    /** Heat of evaporation drawn from the inner surface, W. */
    int LATENT = 4;

    /** Water running off, kg/s. */
    int RUNS_OFF = 5;

    /** Heat through the thermal bridge, part of HEAT, W. */
    int BRIDGE = 6;

    /** Flows every face has. */
    int COMMON = 7;

    /** Sets the far film, W/(m2 K); it may change from hour to hour. */
    void farFilm(double wattsM2K);

    /** Sets what lies beyond: sol-air or other temperature, °C, and its change, K/s. */
    void beyond(double temperatureC, double slopeKs);

    /** Writes the steady profile between the far side and air, and a dry surface. */
    void steadyProfile(double airC, double[] y);

    /** Heat in the layers above 0 °C, J. */
    double heatJ(double[] y);

    /** Its layers cut into nodes. */
    FaceGrid grid();

    /** Place of the outermost node of its layers in the state. */
    int outermost();

    /** What lies beyond now: sol-air or other temperature, °C. */
    double beyondC();

    /** Far film now, W/(m2 K). */
    double farFilmWm2K();

    double areaM2();

    int firstNode();

    int lastNode();

    double surfaceC(double[] y);

    /** Water lying free on the inner surface, kg. */
    double waterKg(double[] y);

    void tolerances(double airK, double[] tolerances);

    /** Place of a flow. */
    int flow(int kind);

    /** Number of the cooler that acts on it; -1 for none. */
    default int cooler() {
        return -1;
    }

    /** Heat a cooler took from the face and from the air before it, J. */
    default double takenJ(double[] totals) {
        return 0;
    }

    /** Water that evaporated and was paid for by a cooler, kg. */
    default double waterUsedKg(double[] totals) {
        return 0;
    }

    /** Electricity of what cools the face's water, J. */
    default double electricityJ(double[] totals) {
        return 0;
    }

    /** Water that ran over it, kg. */
    default double passedKg(double[] totals) {
        return 0;
    }

    /** Heat of that water leaving, above 0 °C, J. */
    default double outletJ(double[] totals) {
        return 0;
    }
}
