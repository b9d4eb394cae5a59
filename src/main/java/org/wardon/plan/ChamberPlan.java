package org.wardon.plan;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.wardon.air.Timeline;
import org.wardon.cooling.Cooler;
import org.wardon.cooling.Setting;
import org.wardon.cooling.SettingCourse;
import org.wardon.enclosure.Enclosure;
import org.wardon.errors.Require;
import org.wardon.produce.Conflict;

/**
 * One chamber of a plan.
 *
 * @param id its id, unique in the plan
 * @param enclosure as built and used
 * @param coolers in the order they act; none for a passive chamber
 * @param setting what the keeper dials in, to begin with
 * @param capacityKg most produce it takes, kg
 * @param outages single spans without power, in order, none overlapping
 * @param power hours without power every day, and what feeds it
 * @param humidifierKgH most water a humidifier adds, kg/h; 0 for none
 * @param heaterW a heater against cold nights, W; 0 for none
 * @param ethyleneScrub a scrubber of ethylene, where there is one
 * @param starts the air it starts with, where the plan says
 * @param corrections what a fit found
 * @param use later settings, whether it is switched off, and which conflicts its keeper accepts
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
        Corrections corrections,
        ChamberUse use) {
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
                corrections,
                use);
    }

    /**
     * Returns the temperature that is dialled in to begin with.
     *
     * @return °C
     */
    public double settingC() {
        return setting.temperatureC();
    }

    /**
     * Returns the chamber at one other setting throughout.
     *
     * @param other taken instead
     * @return the changed copy
     */
    public ChamberPlan withSetting(Setting other) {
        return with(other, coolers, humidifierKgH, heaterW, use.changing(List.of()));
    }

    /**
     * Returns the chamber with other later settings.
     *
     * @param changes in order of time, none for one setting throughout
     * @return the changed copy
     */
    public ChamberPlan changing(List<SettingChange> changes) {
        return with(setting, coolers, humidifierKgH, heaterW, use.changing(changes));
    }

    /**
     * Returns what is dialled in over a run.
     *
     * @param timeline calendar of the run
     * @return the course; changes at or before its start are taken to have been made already
     */
    public SettingCourse settings(Timeline timeline) {
        Setting first = setting;
        Setting last = setting;
        List<SettingCourse.Change> later = new ArrayList<>();
        for (SettingChange change : use.changes()) {
            last = change.after(last);
            double atS = timeline.secondsAt(change.from());
            if (atS > 0) {
                later.add(new SettingCourse.Change(atS, last));
            } else {
                first = last;
            }
        }
        return new SettingCourse(first, later);
    }

    /**
     * Returns the chamber switched off: its coolers, humidifier and heater stand still.
     *
     * @return the changed copy; itself where it is off already
     */
    public ChamberPlan switchedOff() {
        if (use.off().isPresent()) {
            return this;
        }
        ChamberUse.Installed there = new ChamberUse.Installed(coolers, humidifierKgH, heaterW);
        return with(setting, List.of(), 0, 0, use.resting(Optional.of(there)));
    }

    /**
     * Returns the chamber with all it has switched on.
     *
     * @return the changed copy; itself where nothing is off
     */
    public ChamberPlan switchedOn() {
        return use.off()
                .map(
                        there ->
                                with(
                                        setting,
                                        there.coolers(),
                                        there.humidifierKgH(),
                                        there.heaterW(),
                                        use.resting(Optional.empty())))
                .orElse(this);
    }

    /**
     * Returns whether the chamber is switched off.
     *
     * @return true where its coolers stand still
     */
    public boolean off() {
        return use.off().isPresent();
    }

    private ChamberPlan with(
            Setting set, List<Cooler> cooled, double humidifier, double heater, ChamberUse used) {
        return new ChamberPlan(
                id,
                enclosure,
                cooled,
                set,
                capacityKg,
                outages,
                power,
                humidifier,
                heater,
                ethyleneScrub,
                starts,
                corrections,
                used);
    }

    /**
     * Returns the chamber of which its keeper accepts other conflicts.
     *
     * @param conflicts what is accepted in it
     * @return the changed copy
     */
    public ChamberPlan accepting(Set<Conflict> conflicts) {
        return with(setting, coolers, humidifierKgH, heaterW, use.accepting(conflicts));
    }

    /**
     * Returns a copy under another id.
     *
     * @param otherId its id
     * @return the copy
     */
    public ChamberPlan named(String otherId) {
        return new ChamberPlan(
                otherId,
                enclosure,
                coolers,
                setting,
                capacityKg,
                outages,
                power,
                humidifierKgH,
                heaterW,
                ethyleneScrub,
                starts,
                corrections,
                use);
    }

    /**
     * Returns the chamber starting in other air.
     *
     * @param air the air, absent for the usual start
     * @return the changed copy
     */
    public ChamberPlan starting(Optional<StartAir> air) {
        return new ChamberPlan(
                id,
                enclosure,
                coolers,
                setting,
                capacityKg,
                outages,
                power,
                humidifierKgH,
                heaterW,
                ethyleneScrub,
                air,
                corrections,
                use);
    }
}
