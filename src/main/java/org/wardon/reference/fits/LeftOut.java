package org.wardon.reference.fits;

/**
 * A published life that was left out and what the rest says of it.
 *
 * @param row the row
 * @param interior whether its source tried both colder and warmer
 * @param chills whether the crop chills
 * @param lnFitted the pooled curve's answer, ln days
 * @param lnGeneric the handbook's generic curve anchored at the nearest temperature left, ln days
 * @param lnGenericCold the same anchored at the coldest temperature left, ln days
 */
record LeftOut(
        UsedRow row,
        boolean interior,
        boolean chills,
        double lnFitted,
        double lnGeneric,
        double lnGenericCold) {
    private double actual() {
        return row.known().lnDays();
    }

    /** Error of the pooled curve, share of the published life. */
    double fittedError() {
        return Math.abs(Math.expm1(lnFitted - actual()));
    }

    /** Error of the generic curve from the nearest temperature. */
    double genericError() {
        return Math.abs(Math.expm1(lnGeneric - actual()));
    }

    /** Error of the generic curve from the coldest temperature. */
    double genericColdError() {
        return Math.abs(Math.expm1(lnGenericCold - actual()));
    }
}
