package org.wardon.enclosure.section;

import org.wardon.errors.Require;

/**
 * Nusselt numbers of enclosed air: how many times more heat it carries from one side to the other
 * by rising and falling than it would by conduction alone.
 *
 * <p>Sources beside each; all for air, Prandtl number about 0.7. Correlations of one shape stand
 * side by side, so the number jumps by up to a fifth where the shape passes from one to the next.
 */
public final class AirSpace {
    /** From this height over width on a space is a tall one. */
    private static final double TALL = 5;

    private AirSpace() {}

    /**
     * Returns the Nusselt number of a level layer.
     *
     * <p>Source: K. G. T. Hollands, T. E. Unny, G. D. Raithby, L. Konicek, J. Heat Transfer 98
     * (1976) 189: 1 + 1.44 [1 - 1708/Ra] + [(Ra/5830)^(1/3) - 1], brackets only where above 0 (seen
     * quoted). Warm above cold the air lies still: 1.
     *
     * @param rayleigh Rayleigh number of the difference across its thickness, 0 or more
     * @param warmBelow whether its lower side is the warmer
     * @return 1 or more
     */
    public static double layerNusselt(double rayleigh, boolean warmBelow) {
        Require.within("rayleigh", rayleigh, 0, 1e20, "", "");
        if (!warmBelow) {
            return 1;
        }
        double starts = Math.max(0, 1 - 1_708 / Math.max(rayleigh, 1));
        double stirs = Math.max(0, Math.cbrt(rayleigh / 5_830) - 1);
        return 1 + 1.44 * starts + stirs;
    }

    /**
     * Returns the Nusselt number of a space between two upright sides.
     *
     * <p>Sources: five times as high as wide and more, S. M. ElSherbiny, G. D. Raithby, K. G. T.
     * Hollands, J. Heat Transfer 104 (1982) 96 (seen quoted); as high as wide to there, I. Catton,
     * Proc. 6th Int. Heat Transfer Conf. 6 (1978) 13, as in Incropera and others, equations 9.50
     * and 9.51 (seen quoted); wider than high, A. Bejan and C. L. Tien, J. Heat Transfer 100 (1978)
     * 641, three regimes joined (from memory).
     *
     * @param rayleigh Rayleigh number of the difference across its width, 0 or more
     * @param highOverWide its height over its width
     * @param prandtl Prandtl number of the air
     * @return 1 or more, on the width
     */
    public static double cavityNusselt(double rayleigh, double highOverWide, double prandtl) {
        Require.within("rayleigh", rayleigh, 0, 1e20, "", "");
        Require.within("highOverWide", highOverWide, 1e-5, 1e5, "", "");
        if (rayleigh == 0) {
            return 1;
        }
        double nusselt;
        if (highOverWide >= TALL) {
            nusselt = tall(rayleigh, highOverWide);
        } else if (highOverWide >= 1) {
            nusselt = square(prandtl / (0.2 + prandtl) * rayleigh, highOverWide);
        } else {
            nusselt = shallow(rayleigh, highOverWide);
        }
        return Math.max(1, nusselt);
    }

    /** The largest of the turbulent, the passing and the laminar regime. */
    private static double tall(double ra, double highOverWide) {
        double turbulent = 0.0605 * Math.cbrt(ra);
        double part = 0.104 * Math.pow(ra, 0.293) / (1 + Math.pow(6_310 / ra, 1.36));
        double passing = Math.cbrt(1 + part * part * part);
        double laminar = 0.242 * Math.pow(ra / highOverWide, 0.272);
        return Math.max(turbulent, Math.max(passing, laminar));
    }

    private static double square(double ra, double highOverWide) {
        return highOverWide <= 2
                ? 0.18 * Math.pow(ra, 0.29)
                : 0.22 * Math.pow(ra, 0.28) * Math.pow(highOverWide, -0.25);
    }

    private static double shallow(double rayleighOnWidth, double highOverWide) {
        double ra = rayleighOnWidth * highOverWide * highOverWide * highOverWide;
        double weak = highOverWide * ra * (highOverWide * ra) / 362_880;
        double strong = 0.623 * Math.pow(ra, 0.2) / highOverWide;
        double n = -0.386;
        return 1 + Math.pow(Math.pow(weak, n) + Math.pow(strong, n), 1 / n);
    }
}
