package org.wardon.web.api.told;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.advice.company.GroupReport;
import org.wardon.files.forecast.Bounds;
import org.wardon.files.forecast.ShareAnswer;

/**
 * Whether lots of a plan, and crops beside them, may share, with what each of them bears.
 *
 * @param answer the verdict
 * @param lots who was asked about, in that order
 */
public record LotsSharing(ShareAnswer answer, List<OnRuler> lots) {
    /** Copies the list. */
    public LotsSharing {
        lots = List.copyOf(lots);
    }

    /**
     * One lot on the ruler of temperatures.
     *
     * @param id its id
     * @param crop name of its crop
     * @param wholeDays stay and market leg, days
     * @param stretches what temperatures do to it, from cold to warm
     * @param bearsC temperatures it bears, °C; absent where none
     * @param bearsHumidityPct humidities it bears, percent; absent where none
     * @param frostC temperature it must not come below for fear of freezing, °C
     * @param coldHarmsBelowC temperature below which cold injures it in its days, °C; absent where
     *     it freezes first
     */
    public record OnRuler(
            String id,
            String crop,
            double wholeDays,
            List<GroupReport.Stretch> stretches,
            Optional<Bounds> bearsC,
            Optional<Bounds> bearsHumidityPct,
            double frostC,
            OptionalDouble coldHarmsBelowC) {
        /** Copies the list. */
        public OnRuler {
            stretches = List.copyOf(stretches);
        }

        private static OnRuler of(GroupReport.Member member) {
            return new OnRuler(
                    member.id(),
                    member.crop(),
                    member.wholeDays(),
                    member.stretches(),
                    member.borneC(),
                    member.bornePct(),
                    member.frostC(),
                    member.coldHarmsBelowC());
        }
    }

    /**
     * Puts verdict and lots side by side.
     *
     * @param answer the verdict
     * @param group the lots
     * @return both
     */
    public static LotsSharing of(ShareAnswer answer, GroupReport group) {
        return new LotsSharing(answer, group.members().stream().map(OnRuler::of).toList());
    }
}
