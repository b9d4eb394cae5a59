package org.wardon.keeping.ripening;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.wardon.keeping.Draw;
import org.wardon.keeping.ethylene.Stage;
import org.wardon.produce.Commodity;
import org.wardon.produce.Ripeness;
import org.wardon.produce.rows.RipeningRow;

/**
 * Ripening of a fruit for which print gives its times.
 *
 * <p>Above the warmest print the way to ripe takes no less (id arpaia-hass: beyond 20 °C warmth no
 * longer shortens it), while ripe fruit goes on spoiling faster. Ethylene starts ripening; once it
 * has started, more of it makes no difference, since the fruit gives its own (ours, kept simple).
 */
public final class Ripening {
    /** A turning lot has come so far, where nobody says how far (assumption). */
    private static final Span TURNING = new Span(0.1, 0.6);

    /** A lot called pink by its name is between turning, from where its rows count, and red. */
    private static final Span PINK = new Span(0, 0.5);

    private static final Span START = new Span(0, 0);
    private static final Span RIPE = new Span(1, 1);

    /** The green clock runs until ripening starts. */
    private static final Span WHOLE_CLOCK = new Span(1, 1);

    /** Two bounds between which a draw chooses. */
    record Span(double low, double high) {}

    private final List<RipeningRow> rows;
    private final LegDays toRipe;
    private final LegDays toOverripe;
    private final Warmth warmth;
    private final Span startsAtGreenShare;
    private final Span atDoor;

    private Ripening(List<RipeningRow> rows, Span atDoor) {
        this.rows = rows;
        this.atDoor = atDoor;
        toRipe = LegDays.of(leg("ripening"), false);
        toOverripe = LegDays.of(leg("ripe"), true);
        warmth = Warmth.of(rows);
        startsAtGreenShare = shares(leg("whole"), leg("ripening"));
    }

    /**
     * Returns the ripening of a commodity.
     *
     * @param commodity the commodity
     * @param ripeness how ripe the lot is
     * @return its ripening; empty where no times are printed, where it is ripe by its name, or
     *     where nobody said how ripe it is
     */
    public static Optional<Ripening> of(Commodity commodity, Ripeness ripeness) {
        List<RipeningRow> rows = commodity.keeping().ripening();
        boolean printed = has(rows, "ripening") && has(rows, "ripe");
        if (!printed) {
            return Optional.empty();
        }
        return atDoor(commodity, ripeness).map(span -> new Ripening(rows, span));
    }

    private static boolean has(List<RipeningRow> rows, String leg) {
        return rows.stream().anyMatch(row -> row.leg().equals(leg) && row.days().isPresent());
    }

    private static Optional<Span> atDoor(Commodity commodity, Ripeness told) {
        if (Stage.soldRipe(commodity)) {
            return Optional.of(told == Ripeness.RIPE ? RIPE : PINK);
        }
        return switch (Stage.judged(commodity, told)) {
            case GREEN -> Optional.of(START);
            case TURNING -> Optional.of(TURNING);
            case RIPE -> Optional.of(RIPE);
            case UNKNOWN -> Optional.empty();
        };
    }

    private List<RipeningRow> leg(String name) {
        return rows.stream()
                .filter(row -> row.leg().equals(name) && row.days().isPresent())
                .toList();
    }

    /**
     * Where both the whole way and that from the start on are printed at the same temperatures, the
     * lives of the crop are its days to ripe (see the notes of the lives), and ripening starts
     * after the share of them that is left over.
     */
    private static Span shares(List<RipeningRow> whole, List<RipeningRow> fromStart) {
        List<Double> shares = new ArrayList<>();
        for (RipeningRow all : whole) {
            for (RipeningRow later : fromStart) {
                boolean same =
                        all.sourceId().equals(later.sourceId()) && all.middleC() == later.middleC();
                if (same) {
                    double days = all.days().orElseThrow().middle();
                    shares.add(1 - later.days().orElseThrow().middle() / days);
                }
            }
        }
        return shares.isEmpty()
                ? WHOLE_CLOCK
                : new Span(
                        shares.stream().mapToDouble(s -> s).min().orElseThrow(),
                        shares.stream().mapToDouble(s -> s).max().orElseThrow());
    }

    /**
     * Returns how fast the lot ripens in a draw.
     *
     * @param draw the draw
     * @return its pace
     */
    public RipeningPace at(Draw draw) {
        return new RipeningPace(this, draw);
    }

    /**
     * Returns from where on heat keeps it from ripening well.
     *
     * @return °C, infinite where no limit is printed
     */
    public double suffersAboveC() {
        return warmth.suffersAboveC();
    }

    /**
     * Returns the temperatures advised for ripening.
     *
     * @return the printed row; empty where none is
     */
    public Optional<RipeningRow> advised() {
        return Warmth.first(rows, "advised");
    }

    /**
     * Returns the source of the days from the start to ripe.
     *
     * @return id of the first row
     */
    public String sourceId() {
        return leg("ripening").get(0).sourceId();
    }

    /**
     * Returns the row of the cold in which it does not ripen.
     *
     * @return the printed row; empty where none is
     */
    public Optional<RipeningRow> cold() {
        return Warmth.first(rows, "cold");
    }

    /**
     * Returns the row of the heat in which it does not ripen well.
     *
     * @return the printed row; empty where none is
     */
    public Optional<RipeningRow> heat() {
        return Warmth.first(rows, "heat");
    }

    LegDays toRipe() {
        return toRipe;
    }

    LegDays toOverripe() {
        return toOverripe;
    }

    Warmth warmth() {
        return warmth;
    }

    Span startsAtGreenShare() {
        return startsAtGreenShare;
    }

    Span atDoor() {
        return atDoor;
    }
}
