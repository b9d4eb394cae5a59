package org.wardon.heat.network;

/** What lies outside a chamber at one instant of its run: outdoors, beyond the door, the faces. */
final class OutsideInTime {
    private static final double HOUR_S = 3_600;

    private final NetworkInputs inputs;
    private final HourlyAir outdoors;
    private final HourlyAir beyondDoor;
    private final Faces faces;
    private int hour;
    private double at = Double.NaN;

    /** As it is at the time last asked for; live. */
    final Outside now = new Outside();

    OutsideInTime(NetworkInputs inputs, Faces faces) {
        this.inputs = inputs;
        this.faces = faces;
        outdoors = AirAround.outdoors(inputs);
        beyondDoor = AirAround.beyondDoor(inputs, outdoors);
    }

    /** Enters an hour of the weather, and the stretch that starts with it. */
    void hour(int h) {
        hour = Math.min(h, inputs.around().hours() - 1);
        at = Double.NaN;
        faces.hour(hour);
    }

    /** Goes to a time within it, s since the start of the run. */
    void at(double t) {
        if (t == at) {
            return;
        }
        at = t;
        double into = t - hour * HOUR_S;
        outdoors.at(hour, into, now.outdoors);
        beyondDoor.at(hour, into, now.beyondDoor);
        faces.at(into / HOUR_S);
    }

    /** Humidity ratio outdoors in an hour of the run, kg/kg. */
    double outdoorRatio(int h) {
        return outdoors.ratio(h);
    }
}
