package org.wardon.plan;

import org.wardon.errors.Require;

/** How a lot is packed: by a name of the tables, by a time, or by the size of its stack. */
public sealed interface PackagePlan {
    /**
     * A package of the tables.
     *
     * @param id its id
     */
    record Named(String id) implements PackagePlan {
        /** Refuses a blank id. */
        public Named {
            Require.text("package", id);
        }
    }

    /**
     * A package known by its half-cooling time.
     *
     * @param hours time for the sensible heat to fall to half, h
     */
    record HalfCooling(double hours) implements PackagePlan {
        /** Checks the bounds. */
        public HalfCooling {
            Require.within("package.halfCoolingHours", hours, 0.01, 500, "h", "");
        }
    }

    /**
     * A stack cooled from its sides.
     *
     * @param halfThicknessM from its side to its middle, m
     */
    record Stack(double halfThicknessM) implements PackagePlan {
        /** Checks the bounds. */
        public Stack {
            Require.within("package.stackHalfThicknessM", halfThicknessM, 0.02, 10, "m", "");
        }
    }
}
