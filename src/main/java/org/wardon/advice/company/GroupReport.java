package org.wardon.advice.company;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.files.forecast.Bounds;
import org.wardon.produce.Reason;

/**
 * Whether a group of lots may share, with what each of them bears, to be told in any words.
 *
 * @param verdict {@code good}, {@code tolerable} or {@code no}, of all together
 * @param workableC temperatures that work for all, °C; empty where none does
 * @param workablePct humidities that go with them, percent; empty where none does
 * @param members the lots, in the order asked
 * @param pairs pairs that something speaks against
 * @param dated what suits those who stand together, time by time; empty where all do
 * @param borne what accepted conflicts cost
 * @param notes what concerns single lots
 * @param compromise the nearest compromise; empty where there is no need of one, or none
 * @param takeOut the lot without which the others may share; empty where there is none
 */
public record GroupReport(
        String verdict,
        Optional<Bounds> workableC,
        Optional<Bounds> workablePct,
        List<Member> members,
        List<Pair> pairs,
        List<Reason> dated,
        List<Reason> borne,
        List<Reason> notes,
        Optional<Compromise> compromise,
        Optional<String> takeOut) {
    /** Copies the lists. */
    public GroupReport {
        members = List.copyOf(members);
        pairs = List.copyOf(pairs);
        dated = List.copyOf(dated);
        borne = List.copyOf(borne);
        notes = List.copyOf(notes);
    }

    /**
     * One lot.
     *
     * @param id its id
     * @param crop name of its crop
     * @param wholeDays stay and market leg, days
     * @param marketDays the market leg alone, days
     * @param stretches what temperatures do to it, from cold to warm
     * @param borneC temperatures it bears, °C; empty where none
     * @param bornePct humidities it bears, percent; empty where none
     * @param frostC temperature it must not come below for fear of freezing, °C
     * @param coldHarmsBelowC temperature below which cold injures it in its days, °C; empty where
     *     it freezes first
     */
    public record Member(
            String id,
            String crop,
            double wholeDays,
            double marketDays,
            List<Stretch> stretches,
            Optional<Bounds> borneC,
            Optional<Bounds> bornePct,
            double frostC,
            OptionalDouble coldHarmsBelowC) {
        /** Copies the list. */
        public Member {
            stretches = List.copyOf(stretches);
        }

        /**
         * Returns whether two lots bear the same, so that one line tells of both.
         *
         * @param other another lot
         * @return true if so
         */
        public boolean isLike(Member other) {
            return crop.equals(other.crop)
                    && wholeDays == other.wholeDays
                    && marketDays == other.marketDays
                    && stretches.equals(other.stretches)
                    && bornePct.equals(other.bornePct);
        }
    }

    /**
     * Temperatures side by side that do the same to a lot.
     *
     * @param lowC lowest, °C
     * @param highC highest, °C
     * @param what {@code freezes}, {@code chills}, {@code short}, {@code bears} or {@code lasts}
     */
    public record Stretch(double lowC, double highC, String what) {}

    /**
     * Two lots that something speaks against.
     *
     * @param a id of one
     * @param b id of the other
     * @param verdict {@code good}, {@code tolerable} or {@code no}
     * @param reasons why, worst first
     */
    public record Pair(String a, String b, String verdict, List<Reason> reasons) {
        /** Copies the list. */
        public Pair {
            reasons = List.copyOf(reasons);
        }
    }

    /**
     * The setting that costs lots least that have none in common.
     *
     * @param atC temperature, °C
     * @param humidityPct humidity, percent
     * @param daysLost what it costs whom, days by id; those who lose something only
     */
    public record Compromise(double atC, double humidityPct, Map<String, Double> daysLost) {
        /** Copies the map. */
        public Compromise {
            daysLost = Map.copyOf(daysLost);
        }
    }

    /**
     * Returns which way the others pull a lot.
     *
     * @param id a lot
     * @return {@code colder} where it wants it colder than another bears, {@code warmer} likewise,
     *     {@code both}, or blank
     */
    public String pulls(String id) {
        boolean colder = false;
        boolean warmer = false;
        for (Pair pair : pairs) {
            for (Reason reason : pair.reasons()) {
                if (reason.code().equals("temperature-gap")) {
                    colder |= reason.subjects().get(0).equals(id);
                    warmer |= reason.subjects().get(1).equals(id);
                }
            }
        }
        return colder && warmer ? "both" : colder ? "colder" : warmer ? "warmer" : "";
    }
}
