package org.wardon.heat.network;

import java.util.List;
import java.util.Map;
import java.util.Set;
import org.wardon.cooling.Cooler;
import org.wardon.cooling.Setting;
import org.wardon.enclosure.Enclosure;
import org.wardon.enclosure.Surroundings;
import org.wardon.lots.Lot;

/**
 * What a chamber is compiled from.
 *
 * @param enclosure the chamber
 * @param around what surrounds it, for all hours of the run
 * @param neighbourRatio humidity ratio of neighbours, {@code [hour]} by id, kg/kg
 * @param pressurePa air pressure, Pa
 * @param coolers in the order they act
 * @param control how they follow the thermostat
 * @param setting what the keeper dialled in, to begin with
 * @param lots all lots that will ever be in it
 * @param atDoorEnd numbers of the lots that stand in the door end; heard where the air is two
 * @param tuning factors
 * @param averagedDoor whether openings are averaged over the hours of use
 * @param rowHours hours from row to row; the outdoors run straight between means of as many
 * @param heaterW heater, W
 * @param humidifierKgS humidifier, kg/s
 * @param plain whether laws are asked directly instead of through local cubics
 * @param startsAtHour hour of the day at second 0, 0 to 24
 */
public record NetworkInputs(
        Enclosure enclosure,
        Surroundings around,
        Map<String, double[]> neighbourRatio,
        double pressurePa,
        List<Cooler> coolers,
        Control control,
        Setting setting,
        List<Lot> lots,
        Set<Integer> atDoorEnd,
        Tuning tuning,
        boolean averagedDoor,
        int rowHours,
        double heaterW,
        double humidifierKgS,
        boolean plain,
        double startsAtHour) {
    /** How coolers follow the thermostat. */
    public enum Control {
        /** As built. */
        AS_BUILT,
        /** All modulating. */
        MODULATING,
        /** One without a limit in their place. */
        IDEAL
    }
}
