package org.wardon.sharing;

import java.util.List;
import java.util.Optional;

/**
 * A time in which the same lots stand together, and what suits them.
 *
 * @param fromS since when all of them are there, s
 * @param toS until when, s
 * @param ids the lots
 * @param verdict by temperature and humidity alone
 * @param temperatureC temperatures that work for all of them; empty where none does
 * @param humidityPct humidities that go with them
 */
public record Spell(
        double fromS,
        double toS,
        List<String> ids,
        Verdict verdict,
        Optional<SettingRange> temperatureC,
        Optional<SettingRange> humidityPct) {
    /** Copies the list. */
    public Spell {
        ids = List.copyOf(ids);
    }
}
