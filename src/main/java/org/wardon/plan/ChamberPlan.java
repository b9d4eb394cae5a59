package org.wardon.plan;

import java.util.List;
import java.util.Optional;
import org.wardon.cooling.Cooler;
import org.wardon.cooling.Setting;
import org.wardon.enclosure.Enclosure;
import org.wardon.errors.Require;

/**
 * One chamber of a plan.
 *
 * @param id its id, unique in the plan
 * @param enclosure as built and used
 * @param coolers in the order they act; none for a passive chamber
 * @param setting what the keeper dials in
 * @param capacityKg most produce it takes, kg
 * @param outages single spans without power, in order, none overlapping
 * @param power hours without power every day, and what feeds it
 * @param humidifierKgH most water a humidifier adds, kg/h; 0 for none
 * @param heaterW a heater against cold nights, W; 0 for none
 * @param ethyleneScrub a scrubber of ethylene, where there is one
 * @param starts the air it starts with, where the plan says
 * @param corrections what a fit found
 */
public record ChamberPlan(
        String id,
        Enclosure enclosure,
        List<Cooler> coolers,
        Setting setting,
        double capacityKg,
        List<OutagePlan> outages,
        PowerPlan power,
        double humidifierKgH,
        double heaterW,
        Optional<EthyleneScrub> ethyleneScrub,
        Optional<StartAir> starts,
        Corrections corrections) {
    /** Copies the lists and checks the bounds. */
    public ChamberPlan {
        Ids.check("chamber", id);
        coolers = List.copyOf(coolers);
        outages = List.copyOf(outages);
        Require.within("capacityKg of " + id, capacityKg, 1, 1e7, "kg", "");
        Require.within("humidifierKgH of " + id, humidifierKgH, 0, 1_000, "kg/h", "");
        Require.within("heaterW of " + id, heaterW, 0, 1e6, "W", "");
        for (int i = 1; i < outages.size(); i++) {
            Require.that(
                    !outages.get(i).from().isBefore(outages.get(i - 1).to()),
                    "outages of " + id + " overlap at " + outages.get(i).from());
        }
    }

    /**
     * Returns a copy built, cooled or set otherwise.
     *
     * @param otherEnclosure as built and used
     * @param otherCoolers in the order they act
     * @param otherSetting what the keeper dials in
     * @return the copy
     */
    public ChamberPlan with(
            Enclosure otherEnclosure, List<Cooler> otherCoolers, Setting otherSetting) {
        return new ChamberPlan(
                id,
                otherEnclosure,
                otherCoolers,
                otherSetting,
                capacityKg,
                outages,
                power,
                humidifierKgH,
                heaterW,
                ethyleneScrub,
                starts,
                corrections);
    }
}
