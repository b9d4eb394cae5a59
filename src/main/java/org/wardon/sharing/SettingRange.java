package org.wardon.sharing;

import java.util.Optional;

/**
 * Lowest and highest of the settings that work.
 *
 * @param low lowest
 * @param high highest
 */
public record SettingRange(double low, double high) {
    /** How wide it is. */
    double widthK() {
        return high - low;
    }

    static Optional<SettingRange> of(Settings.Extent extent) {
        return extent.low().isPresent()
                ? Optional.of(
                        new SettingRange(extent.low().getAsDouble(), extent.high().getAsDouble()))
                : Optional.empty();
    }
}
