package org.wardon.heat;

import java.util.Optional;
import org.wardon.errors.Require;
import org.wardon.lots.Lot;

/**
 * A lot in the chamber. After it leaves it goes on as a shadow: it feels the air and gives no heat,
 * vapour or gas. One that is carried to another chamber is written down there from then on.
 *
 * @param lot the lot
 * @param arrivesS arrival, s since the start of the run; at or before 0 it is there from the start
 * @param leavesS leaving, s since the start of the run, after arrival; infinite where it stays
 * @param pulpC temperature of the flesh at arrival, °C
 * @param freshUntilS until then it breathes at the high end of its range, s since the start of the
 *     run; negative infinity for never
 * @param surfaceWaterKg free water on it at arrival, kg
 * @param berth where it stands, from and to which chamber of the store it is carried
 */
public record Stay(
        Lot lot,
        double arrivesS,
        double leavesS,
        double pulpC,
        double freshUntilS,
        double surfaceWaterKg,
        Berth berth) {
    /** Checks the bounds. */
    public Stay {
        Require.that(
                leavesS > Math.max(arrivesS, 0),
                "lot " + lot.id() + " leaves at " + leavesS + " s, it arrives at " + arrivesS);
        Require.within(
                "pulpC of lot " + lot.id(), pulpC, -10, 60, "°C", "Measure it in the fruit.");
        Require.within(
                "surfaceWaterKg of lot " + lot.id(),
                surfaceWaterKg,
                0,
                0.2 * lot.massKg(),
                "kg",
                "");
    }

    /**
     * A lot that comes in by the door and leaves by it.
     *
     * @param lot the lot
     * @param arrivesS arrival, s since the start of the run
     * @param leavesS leaving, s since the start of the run
     * @param pulpC temperature of the flesh at arrival, °C
     * @param freshUntilS until then it breathes at the high end of its range, s
     * @param surfaceWaterKg free water on it at arrival, kg
     */
    public Stay(
            Lot lot,
            double arrivesS,
            double leavesS,
            double pulpC,
            double freshUntilS,
            double surfaceWaterKg) {
        this(lot, arrivesS, leavesS, pulpC, freshUntilS, surfaceWaterKg, Berth.DOOR);
    }

    /**
     * A lot that is dry and not fresh from the field.
     *
     * @param lot the lot
     * @param arrivesS arrival, s since the start of the run
     * @param leavesS leaving, s since the start of the run
     * @param pulpC temperature of the flesh at arrival, °C
     */
    public Stay(Lot lot, double arrivesS, double leavesS, double pulpC) {
        this(lot, arrivesS, leavesS, pulpC, Double.NEGATIVE_INFINITY, 0);
    }

    /**
     * Returns the stay of a lot of which is known how it is when it is carried in.
     *
     * @param state how it is then
     * @return the changed copy
     */
    public Stay carriedInAs(LotState state) {
        Berth known = new Berth(berth.from(), berth.to(), Optional.of(state), berth.spot());
        return new Stay(lot, arrivesS, leavesS, pulpC, freshUntilS, surfaceWaterKg, known);
    }

    /** Whether it is carried on to another chamber when it leaves. */
    boolean carriedOn() {
        return berth.to().isPresent();
    }
}
