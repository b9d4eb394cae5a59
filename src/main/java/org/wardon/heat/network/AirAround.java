package org.wardon.heat.network;

import java.util.Optional;
import org.wardon.air.MoistAir;
import org.wardon.enclosure.Beyond;
import org.wardon.enclosure.Door;
import org.wardon.enclosure.DoorExchange;
import org.wardon.enclosure.OutsideBoundary;
import org.wardon.enclosure.Surroundings;

/** The air outdoors and beyond the door hour by hour, and the doorway to it. */
final class AirAround {
    private static final double[] NONE = {};

    private AirAround() {}

    /** What the air outdoors or beyond a door hangs on, but for the weather. */
    private record Key(Optional<Beyond> beyondDoor, double pressurePa, int rowHours) {}

    private static Key key(Optional<Beyond> beyondDoor, NetworkInputs inputs) {
        return new Key(beyondDoor, inputs.pressurePa(), inputs.rowHours());
    }

    /** Outdoor air. */
    static HourlyAir outdoors(NetworkInputs inputs) {
        return inputs.around()
                .known()
                .once(key(Optional.empty(), inputs), HourlyAir.class, () -> outdoorsAnew(inputs));
    }

    private static HourlyAir outdoorsAnew(NetworkInputs inputs) {
        Surroundings around = inputs.around();
        int n = around.hours() + 1;
        double[] airC = new double[n];
        double[] ratio = new double[n];
        for (int h = 0; h < n; h++) {
            airC[h] = around.weather().temperatureC(h);
            ratio[h] = around.weather().humidityRatio(h, inputs.pressurePa());
        }
        return new HourlyAir(airC, ratio, inputs.rowHours());
    }

    /** Air beyond the door, never above saturation; outdoor air where there is no door. */
    static HourlyAir beyondDoor(NetworkInputs inputs, HourlyAir outdoors) {
        Optional<Door> door = inputs.enclosure().door();
        if (door.isEmpty()) {
            return outdoors;
        }
        Beyond beyond = door.get().beyond();
        return beyond instanceof Beyond.Neighbour
                ? anew(beyond, inputs, outdoors)
                : inputs.around()
                        .known()
                        .once(
                                key(Optional.of(beyond), inputs),
                                HourlyAir.class,
                                () -> anew(beyond, inputs, outdoors));
    }

    private static HourlyAir anew(Beyond beyond, NetworkInputs inputs, HourlyAir outdoors) {
        int n = inputs.around().hours() + 1;
        double[] airC = new double[n];
        double[] ratio = new double[n];
        for (int h = 0; h < n; h++) {
            airC[h] = OutsideBoundary.airBeyondC(beyond, inputs.around(), h);
            double most = MoistAir.saturatedHumidityRatio(airC[h], inputs.pressurePa());
            double there =
                    beyond instanceof Beyond.Neighbour next
                            ? inputs.neighbourRatio().getOrDefault(next.chamberId(), NONE)[h]
                            : outdoors.ratio(h);
            ratio[h] = Math.min(there, most);
        }
        return new HourlyAir(airC, ratio, inputs.rowHours());
    }

    /** The doorway as numbers, its share of the full flow scaled by a factor. */
    static AirExchange.Doorway doorway(NetworkInputs inputs, double factor) {
        Optional<Door> door = inputs.enclosure().door();
        if (door.isEmpty()) {
            return AirExchange.Doorway.NONE;
        }
        Door d = door.get();
        double usedS = d.to().toSecondOfDay() - d.from().toSecondOfDay();
        double open = Math.min(d.secondsOpen(), usedS / Math.max(d.openingsPerDay(), 1));
        boolean averaged = inputs.averagedDoor() && open > 0;
        return new AirExchange.Doorway(
                d.widthM(),
                d.heightM(),
                factor * DoorExchange.share(DoorExchange.FLOW_FACTOR, d.effectiveness()),
                averaged ? open : 0,
                d.openingsPerDay() / usedS);
    }
}
