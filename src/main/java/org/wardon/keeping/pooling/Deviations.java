package org.wardon.keeping.pooling;

/**
 * How much lives differ, as standard deviations.
 *
 * @param measured of the logarithm of a measured life about its trial's curve
 * @param estimated the same of a figure that its source calls an estimate
 * @param partKJMol of slopes between plant parts, kJ/mol
 * @param cropKJMol of slopes between crops of a part, kJ/mol
 * @param curveKJMol of slopes between variants of a crop, kJ/mol
 * @param source of the logarithm of life between sources on one kind of a crop at one temperature
 */
public record Deviations(
        double measured,
        double estimated,
        double partKJMol,
        double cropKJMol,
        double curveKJMol,
        double source) {
    /**
     * Where the search starts and what it is drawn to where figures are few. Slopes published for
     * fresh produce have their middle half in 55 to 81 kJ/mol: a deviation of 19, shared out among
     * part, crop and variant; sources differ 1.4 times in the median, which is a deviation of 0.36
     * each; left-out temperatures are met within about a quarter (our own collection).
     */
    public static final Deviations USUAL = new Deviations(0.15, 0.3, 8, 15, 8, 0.36);

    static Deviations ofLogarithms(double[] ln) {
        return new Deviations(
                Math.exp(ln[0]),
                Math.exp(ln[1]),
                Math.exp(ln[2]),
                Math.exp(ln[3]),
                Math.exp(ln[4]),
                Math.exp(ln[5]));
    }

    double[] logarithms() {
        double[] all = {measured, estimated, partKJMol, cropKJMol, curveKJMol, source};
        for (int i = 0; i < all.length; i++) {
            all[i] = Math.log(all[i]);
        }
        return all;
    }

    /**
     * Returns the deviation of the logarithm of one source's life from another's: each has its own
     * level and its own error.
     *
     * @return deviation of their difference
     */
    public double betweenTwoSources() {
        return Math.sqrt(2 * (source * source + measured * measured));
    }

    /**
     * Returns the deviation of slopes between crops as a share of the common slope.
     *
     * @return share
     */
    public double betweenCropsShare() {
        return Math.sqrt(partKJMol * partKJMol + cropKJMol * cropKJMol + curveKJMol * curveKJMol)
                / Likeness.COMMON_KJ_MOL;
    }
}
