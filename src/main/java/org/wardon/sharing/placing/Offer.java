package org.wardon.sharing.placing;

import java.util.List;
import org.wardon.errors.Require;

/**
 * One climate a chamber can make.
 *
 * @param climate what it makes of the lots
 * @param coolingW {@code [day]}, heat of lots it can take in the mean of a day beside what comes in
 *     through walls and doors, W
 * @param cost energy of the chamber without lots over the whole horizon, and what its changes of
 *     setting cost, currency
 * @param costPerWDay energy of a watt of lots' heat for a day, currency
 */
public record Offer(Climate climate, List<Double> coolingW, double cost, double costPerWDay) {
    /** Copies the list and checks the bounds. */
    public Offer {
        coolingW = List.copyOf(coolingW);
        Require.within("cost of " + climate.name(), cost, 0, 1e12, "", "");
        Require.within("costPerWDay of " + climate.name(), costPerWDay, 0, 1e9, "", "");
    }
}
