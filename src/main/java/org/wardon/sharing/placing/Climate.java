package org.wardon.sharing.placing;

import java.util.Arrays;
import org.wardon.errors.Require;

/**
 * What one course of settings makes of each lot: the same in every chamber that follows it. Lots
 * are numbered as the problem lists them.
 */
public final class Climate {
    /** Worth of a lot that must not stand in this climate. */
    public static final double NEVER = Double.NEGATIVE_INFINITY;

    /** Loss by company of two lots that must not stand together. */
    public static final double APART = Double.POSITIVE_INFINITY;

    private final String name;
    private final double[] worth;
    private final double[][] heatW;
    private final double[][] lossTogether;

    /**
     * Makes a climate.
     *
     * @param name what to call it in messages
     * @param worth {@code [lot]}, what is kept of the lot at the end of its market leg, currency;
     *     {@link #NEVER} where it must not stand here
     * @param heatW {@code [lot][day]}, heat the lot gives, mean of the day, W, 0 or more
     * @param lossTogether {@code [lot][lot]}, symmetric, what two lots lose by each other's
     *     company, currency, 0 or more; {@link #APART} where they must not stand together
     */
    public Climate(String name, double[] worth, double[][] heatW, double[][] lossTogether) {
        this.name = Require.text("name of a climate", name);
        Require.that(
                heatW.length == worth.length && lossTogether.length == worth.length,
                "climate " + name + " speaks of lots in different numbers");
        this.worth = worth.clone();
        this.heatW = copied(heatW);
        this.lossTogether = copied(lossTogether);
    }

    private static double[][] copied(double[][] rows) {
        return Arrays.stream(rows).map(double[]::clone).toArray(double[][]::new);
    }

    /**
     * Returns what to call it.
     *
     * @return the name
     */
    public String name() {
        return name;
    }

    /**
     * Returns how many lots it speaks of.
     *
     * @return count
     */
    public int lots() {
        return worth.length;
    }

    /**
     * Returns what is kept of a lot.
     *
     * @param lot its number
     * @return currency, {@link #NEVER} where it must not stand here
     */
    public double worth(int lot) {
        return worth[lot];
    }

    /**
     * Returns the heat of a lot.
     *
     * @param lot its number
     * @param day the day
     * @return mean of the day, W
     */
    public double heatW(int lot, int day) {
        return heatW[lot][day];
    }

    /**
     * Returns what two lots lose by each other's company.
     *
     * @param one number of one lot
     * @param other number of the other
     * @return currency, {@link #APART} where they must not stand together
     */
    public double lossTogether(int one, int other) {
        return lossTogether[one][other];
    }
}
