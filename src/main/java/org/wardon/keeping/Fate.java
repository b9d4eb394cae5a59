package org.wardon.keeping;

import java.util.EnumMap;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import org.wardon.air.Timeline;

/**
 * What becomes of one lot along one history in one draw: for each mechanism the share of its limit
 * used, and when the first of them reaches the whole. Times are seconds as in the history; beyond
 * its end each mechanism goes on at its mean rate of the window given.
 */
public final class Fate {
    /** Days left are not told beyond this. */
    public static final double MOST_DAYS = 730;

    /** Ethylene is named as the limit where it takes at least this share of the time left. */
    private static final double NOTABLE = 0.1;

    private final Draw draw;
    private final double startS;
    private final Map<Mechanism, Track> tracks;
    private final Mechanism ageing;
    private final Optional<Track> green;
    private final Optional<Track> edible;
    private final Optional<RipeTimes> ripe;

    Fate(
            Draw draw,
            double startS,
            Map<Mechanism, Track> tracks,
            Mechanism ageing,
            Optional<Track> green,
            Optional<Track> edible,
            Optional<RipeTimes> ripe) {
        this.draw = draw;
        this.startS = startS;
        this.tracks = new EnumMap<>(tracks);
        this.ageing = ageing;
        this.green = green;
        this.edible = edible;
        this.ripe = ripe;
    }

    /**
     * Returns the fate without its course: it starts and ends as this one does, by each mechanism
     * and clock, and takes next to no memory. What was used between is lost.
     *
     * @return the copy
     */
    public Fate brief() {
        Map<Mechanism, Track> ends = new EnumMap<>(Mechanism.class);
        tracks.forEach((mechanism, track) -> ends.put(mechanism, track.brief()));
        return new Fate(
                draw,
                startS,
                ends,
                ageing,
                green.map(Track::brief),
                edible.map(Track::brief),
                ripe);
    }

    /**
     * Returns the draw.
     *
     * @return its number is 0 for the plain run
     */
    public Draw draw() {
        return draw;
    }

    /**
     * Returns the mechanisms that were judged.
     *
     * @return those that can end this lot
     */
    public Set<Mechanism> mechanisms() {
        return Set.copyOf(tracks.keySet());
    }

    /**
     * Returns when the first mechanism reaches its limit.
     *
     * @return s, infinite where none does
     */
    public double endS() {
        double first = Double.POSITIVE_INFINITY;
        for (Track track : tracks.values()) {
            first = Math.min(first, track.reachesS(1));
        }
        return first;
    }

    /**
     * Returns when one mechanism reaches its limit.
     *
     * @param mechanism the mechanism
     * @return s, infinite where it never does or was not judged
     */
    public double endS(Mechanism mechanism) {
        Track track = tracks.get(mechanism);
        return track == null ? Double.POSITIVE_INFINITY : track.reachesS(1);
    }

    /**
     * Returns the days left.
     *
     * @param fromS counted from here, s
     * @return days, 0 to {@link #MOST_DAYS}
     */
    public double daysLeft(double fromS) {
        return days(endS(), fromS);
    }

    /**
     * Returns the days left by one mechanism.
     *
     * @param mechanism the mechanism
     * @param fromS counted from here, s
     * @return days, 0 to {@link #MOST_DAYS}
     */
    public double daysLeft(Mechanism mechanism, double fromS) {
        return days(endS(mechanism), fromS);
    }

    /**
     * Returns the days until a green fruit can no longer be held from ripening.
     *
     * @param fromS counted from here, s
     * @return days, empty where the lot is no green fruit that ripens
     */
    public OptionalDouble greenDaysLeft(double fromS) {
        return green.map(track -> OptionalDouble.of(days(track.reachesS(1), fromS)))
                .orElse(OptionalDouble.empty());
    }

    /**
     * Returns the days until a ripening fruit is overripe.
     *
     * @param fromS counted from here, s
     * @return days, empty where the lot does not ripen or its ripeness is unknown
     */
    public OptionalDouble edibleDaysLeft(double fromS) {
        return edible.map(track -> OptionalDouble.of(days(track.reachesS(1), fromS)))
                .orElse(OptionalDouble.empty());
    }

    /**
     * Returns the days until a ripening fruit is ripe.
     *
     * @param fromS counted from here, s
     * @return days, 0 where it is ripe already, {@link #MOST_DAYS} where heat or cold keep it from
     *     ripening; empty where no times of ripening are printed or its ripeness is unknown
     */
    public OptionalDouble ripeDaysFrom(double fromS) {
        return ripe.map(times -> OptionalDouble.of(days(times.ripeS(), fromS)))
                .orElse(OptionalDouble.empty());
    }

    /**
     * Returns whether a ripening fruit is ripe at a time, and not overripe.
     *
     * @param atS time, s
     * @return true if ripe; false too where no times of ripening are printed
     */
    public boolean ripeAt(double atS) {
        return ripe.isPresent() && ripe.get().ripeAt(atS);
    }

    /**
     * Returns whether a ripening fruit is past eating at a time.
     *
     * @param atS time, s
     * @return true if overripe; false too where no times of ripening are printed
     */
    public boolean overripeAt(double atS) {
        return ripe.isPresent() && atS >= ripe.get().overripeS();
    }

    private static double days(double endS, double fromS) {
        return Math.min(MOST_DAYS, Math.max(0, (endS - fromS) / Timeline.DAY_S));
    }

    /**
     * Returns the mechanism that ends the lot.
     *
     * @return the first to reach its limit; ethylene only where it takes a tenth of the time or
     *     more
     */
    public Mechanism limitedBy() {
        double end = endS();
        Mechanism first = ageing;
        for (Map.Entry<Mechanism, Track> entry : tracks.entrySet()) {
            if (entry.getValue().reachesS(1) <= end) {
                first = entry.getKey();
                break;
            }
        }
        if (first == Mechanism.ETHYLENE) {
            double without = endS(ageing) - startS;
            return end - startS > (1 - NOTABLE) * without ? ageing : first;
        }
        return first;
    }

    /**
     * Returns the share of the lot's life used at a sample of the history, by the mechanism
     * furthest along.
     *
     * @param sample index in the history
     * @return 0 for fresh, 1 at the end, may pass 1
     */
    public double used(int sample) {
        double most = 0;
        for (Track track : tracks.values()) {
            most = Math.max(most, track.used(sample));
        }
        return most;
    }

    /**
     * Returns the share of the lot's life used at a time, by the mechanism furthest along.
     *
     * @param atS time, s; beyond the history it goes on
     * @return 0 for fresh, 1 at the end, may pass 1
     */
    public double usedAt(double atS) {
        double most = 0;
        for (Track track : tracks.values()) {
            most = Math.max(most, track.usedAt(atS));
        }
        return most;
    }

    /**
     * Returns the share of one limit used at a time.
     *
     * @param mechanism the mechanism
     * @param atS time, s
     * @return share, 0 where it was not judged
     */
    public double usedAt(Mechanism mechanism, double atS) {
        Track track = tracks.get(mechanism);
        return track == null ? 0 : track.usedAt(atS);
    }

    /**
     * Returns whether the lot is still sound at a time.
     *
     * @param atS time, s
     * @return true if no mechanism has passed its limit
     */
    public boolean soundAt(double atS) {
        return endS() > atS;
    }
}
