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
 * @param pairs every pair of lots that are there at one time
 * @param reasons what concerns single lots or the group
 * @param compromise the setting that costs least where none works for all; empty where one does, or
 *     where every setting freezes or chills one of them
 * @param takeOut id of the one lot without which the others, two at least, may share best; empty
 *     where all may share or taking out one does not help
 * @param spells the times in which different lots stand together; empty where there is only one
 * @param prices what accepted conflicts cost
 */
public record SharingAnswer(
        Verdict verdict,
        Optional<SettingRange> workableC,
        Optional<SettingRange> workableHumidityPct,
        List<PairVerdict> pairs,
        List<Reason> reasons,
        Optional<Compromise> compromise,
        Optional<String> takeOut,
        List<Spell> spells,
        List<Price> prices) {
    /** Copies the lists. */
    public SharingAnswer {
        pairs = List.copyOf(pairs);
        reasons = List.copyOf(reasons);
        spells = List.copyOf(spells);
        prices = List.copyOf(prices);
    }
}
