package org.wardon.plan;

import java.time.LocalDateTime;
import java.util.OptionalDouble;
import org.wardon.cooling.Setting;
import org.wardon.errors.Require;

/**
 * A later setting of a chamber; band and stages stay as they are.
 *
 * @param from local time from which it is in force
 * @param temperatureC air temperature wanted, °C
 * @param humidityPct humidity wanted, percent; absent: as before
 */
public record SettingChange(LocalDateTime from, double temperatureC, OptionalDouble humidityPct) {
    /** Checks the bounds. */
    public SettingChange {
        Require.within("settingChanges.temperatureC", temperatureC, -30, 45, "°C", "");
        humidityPct.ifPresent(
                pct -> Require.within("settingChanges.humidityPct", pct, 0, 100, "%", ""));
    }

    /**
     * Returns what is dialled in then.
     *
     * @param before the setting it follows on
     * @return the setting
     */
    public Setting after(Setting before) {
        return new Setting(
                temperatureC,
                before.bandK(),
                humidityPct.orElse(before.humidityPct()),
                before.stageK());
    }
}
