package org.wardon.advice.forecast;

import java.time.LocalDateTime;
import org.wardon.cooling.Cooler;
import org.wardon.cooling.SettingCourse;
import org.wardon.heat.Hours;
import org.wardon.plan.ChamberPlan;

/** The air of a chamber hour by hour, each a mean of the hour before, beside its setting. */
public final class ChamberAir {
    private final ChamberPlan chamber;
    private final StoreOutcome outcome;
    private final SettingCourse settings;
    private final Hours hours;

    ChamberAir(ChamberPlan chamber, StoreOutcome outcome) {
        this.chamber = chamber;
        this.outcome = outcome;
        this.settings = outcome.model().settings(chamber);
        this.hours = outcome.course(chamber.id()).hours();
    }

    /**
     * Returns how many hours there are.
     *
     * @return rows
     */
    public int size() {
        return hours.size();
    }

    /**
     * Returns when an hour ends.
     *
     * @param row from 0
     * @return local time
     */
    public LocalDateTime at(int row) {
        return outcome.model().plan().timeline().localAt(hours.atS(row));
    }

    /**
     * Returns the temperature of the air.
     *
     * @param row from 0
     * @return °C
     */
    public double airC(int row) {
        return hours.airC(row);
    }

    /**
     * Returns the temperature outdoors.
     *
     * @param row from 0
     * @return °C
     */
    public double outdoorC(int row) {
        return hours.outdoorC(row);
    }

    /**
     * Returns the relative humidity of the air.
     *
     * @param row from 0
     * @return percent, at most 100
     */
    public double humidityPct(int row) {
        return StoreSeries.humidityPct(hours, row);
    }

    /**
     * Returns the heat taken by the coolers.
     *
     * @param row from 0
     * @return W
     */
    public double coolingW(int row) {
        return hours.coolingW(row);
    }

    /**
     * Returns what the chamber is set to in an hour.
     *
     * @param row from 0
     * @return °C
     */
    public double settingC(int row) {
        return settings.until(hours.atS(row)).temperatureC();
    }

    /**
     * Returns whether it is set otherwise later.
     *
     * @return true where there is more than one setting
     */
    public boolean changes() {
        return settings.within(0, hours.atS(size() - 1)).size() > 1;
    }

    /**
     * Returns the warmest an hour may be to count as inside.
     *
     * @param row from 0
     * @return °C
     */
    public double warmestC(int row) {
        return settingC(row) + chamber.setting().bandK() + (held() ? Holding.AIR_ALLOWANCE_K : 0);
    }

    /**
     * Returns the coldest an hour may be to count as inside.
     *
     * @param row from 0
     * @return °C; minus infinity where the weather decides how cold it gets
     */
    public double coldestC(int row) {
        return held()
                ? settingC(row) - chamber.setting().bandK() - Holding.AIR_ALLOWANCE_K
                : Double.NEGATIVE_INFINITY;
    }

    private boolean held() {
        return chamber.coolers().stream().anyMatch(Cooler::holdsBand);
    }
}
