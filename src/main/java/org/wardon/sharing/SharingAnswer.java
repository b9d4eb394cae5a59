package org.wardon.sharing;

import java.util.List;
import java.util.Optional;
import org.wardon.produce.Reason;

/**
 * Whether a group of lots may share, and at what setting.
 *
 * @param verdict whether they may, all together
 * @param workableC temperatures that work for all at the verdict's level; empty where none does
 * @param workableHumidityPct humidities that go with them, percent; empty where none does
 * @param pairs every pair
 * @param reasons what concerns single lots or the group
 */
public record SharingAnswer(
        Verdict verdict,
        Optional<SettingRange> workableC,
        Optional<SettingRange> workableHumidityPct,
        List<PairVerdict> pairs,
        List<Reason> reasons) {
    /** Copies the lists. */
    public SharingAnswer {
        pairs = List.copyOf(pairs);
        reasons = List.copyOf(reasons);
    }
}
