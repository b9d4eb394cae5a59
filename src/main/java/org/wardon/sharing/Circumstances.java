package org.wardon.sharing;

import java.util.OptionalDouble;
import java.util.Set;
import java.util.function.Function;
import org.wardon.air.Timeline;
import org.wardon.keeping.Draw;
import org.wardon.keeping.ethylene.Response;
import org.wardon.produce.Conflict;

/**
 * How lots would stand together, as far as it is known: when each is there, how much ethylene it
 * makes there, and what their keeper accepts.
 *
 * @param stays when a lot is there, by id
 * @param level ethylene of a lot in the chamber they share
 * @param accepted conflicts that are accepted, at a price that is told
 */
public record Circumstances(Function<String, Stay> stays, Level level, Set<Conflict> accepted) {
    /** Copies the set. */
    public Circumstances {
        accepted = Set.copyOf(accepted);
    }

    /**
     * Returns what is taken where nobody says: all there all the time, each giving its share of a
     * usual load's ethylene in a chamber of usual air exchange, nothing accepted.
     *
     * @return the circumstances
     */
    public static Circumstances usual() {
        return accepting(Set.of());
    }

    /**
     * Returns the usual circumstances with conflicts accepted.
     *
     * @param accepted what is accepted
     * @return the circumstances
     */
    public static Circumstances accepting(Set<Conflict> accepted) {
        return new Circumstances(id -> Stay.ALWAYS, (id, atC) -> OptionalDouble.empty(), accepted);
    }

    /**
     * A time in the chamber.
     *
     * @param fromS since when, s
     * @param toS until when, s
     */
    public record Stay(double fromS, double toS) {
        /** There for as long as it is wanted, whenever another comes. */
        public static final Stay ALWAYS =
                new Stay(Double.NEGATIVE_INFINITY, Double.POSITIVE_INFINITY);

        boolean meets(Stay other) {
            return fromS < other.toS && other.fromS < toS;
        }
    }

    /** Ethylene that lots make in a chamber that is known. */
    public interface Level {
        /**
         * Returns the level at rest that one lot makes by itself.
         *
         * @param id the lot
         * @param atC temperature of the air, °C
         * @return µL/L; empty where chamber or mass are not known
         */
        OptionalDouble ppm(String id, double atC);
    }

    Stay stay(Workable lot) {
        return stays.apply(lot.id());
    }

    boolean meet(Workable one, Workable other) {
        return stay(one).meets(stay(other));
    }

    /** Days both are there; as long as both are wanted where no times are known. */
    double daysTogether(Workable one, Workable other) {
        double wanted = Math.min(one.wish().wantedDays(), other.wish().wantedDays());
        double from = Math.max(stay(one).fromS, stay(other).fromS);
        double to = Math.min(stay(one).toS, stay(other).toS);
        return Math.max(0, Math.min(wanted, (to - from) / Timeline.DAY_S));
    }

    /** Level that one lot makes, µL/L; where it is not known, as its share of a usual load. */
    double ppm(Workable lot, int among, double atC) {
        OptionalDouble known = level.ppm(lot.id(), atC);
        return known.isPresent() ? known.getAsDouble() : usualPpm(lot, 1.0 / among, atC);
    }

    private static double usualPpm(Workable lot, double share, double atC) {
        double rate = lot.model().ethyleneMicrolitrePerKgHour(atC, Draw.MEDIAN);
        return Response.steadyPpm(share * Response.USUAL_KG_M3 * rate, Response.USUAL_AIR_CHANGES);
    }
}
