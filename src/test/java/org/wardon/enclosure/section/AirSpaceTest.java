package org.wardon.enclosure.section;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.wardon.Source;

/** Nusselt numbers of enclosed air against other print of the same spaces. */
class AirSpaceTest {
    private static final double AIR = 0.71;

    @Source(
            "G. de Vahl Davis, Int. J. Num. Meth. Fluids 3 (1983) 249, bench mark of the square cavity"
                    + " of air: 1.118, 2.243, 4.519, 8.800; P. Le Quere, Computers and Fluids 20 (1991) 29:"
                    + " 16.523, 30.225 (from memory); the correlation is told to hold from 1e3 on")
    @ParameterizedTest
    @CsvSource({
        "1e4, 2.243, 0.09",
        "1e5, 4.519, 0.06",
        "1e6, 8.800, 0.06",
        "1e7, 16.523, 0.10",
        "1e8, 30.225, 0.17"
    })
    void aSquareCavityIsNearTheBenchMark(double rayleigh, double printed, double share) {
        assertEquals(printed, AirSpace.cavityNusselt(rayleigh, 1, AIR), share * printed);
    }

    @Source(
            "J. L. Wright, ASHRAE Trans. 102 (1996), as in ISO 15099: 0.0673838 Ra^(1/3) above 5e4,"
                    + " 0.028154 Ra^0.4134 from 1e4 (seen quoted); another fit to the same measurements")
    @ParameterizedTest
    @CsvSource({"1e4, 40", "3e4, 40", "1e5, 40", "1e6, 40"})
    void aTallCavityIsNearTheOtherCorrelation(double rayleigh, double aspect) {
        double other =
                rayleigh > 5e4
                        ? 0.0673838 * Math.cbrt(rayleigh)
                        : 0.028154 * Math.pow(rayleigh, 0.4134);
        assertEquals(other, AirSpace.cavityNusselt(rayleigh, aspect, AIR), 0.11 * other);
    }

    @Source(
            "S. Globe and D. Dropkin, J. Heat Transfer 81 (1959) 24: 0.069 Ra^(1/3) Pr^0.074, 3e5 to"
                    + " 7e9, as in Incropera and others, eq. 9.49 (seen quoted)")
    @ParameterizedTest
    @CsvSource({"1e6", "1e7", "1e8", "1e9"})
    void aLayerWarmBelowIsNearTheOtherCorrelation(double rayleigh) {
        double other = 0.069 * Math.cbrt(rayleigh) * Math.pow(AIR, 0.074);
        assertEquals(other, AirSpace.layerNusselt(rayleigh, true), 0.17 * other);
    }

    @Source(
            "Rayleigh number at which a layer between rigid plates begins to turn over, 1708 (H."
                    + " Jeffreys 1928, from memory)")
    @Test
    void aLayerTurnsOverFrom1708On() {
        assertEquals(1, AirSpace.layerNusselt(1_708, true), 1e-12);
        assertTrue(AirSpace.layerNusselt(1_800, true) > 1.05);
        assertEquals(1, AirSpace.layerNusselt(1e9, false), 0);
    }

    @Source(
            "D. E. Cormack, L. G. Leal, J. Imberger, J. Fluid Mech. 65 (1974) 209: 1 + (A Ra)^2/362880"
                    + " in a shallow cavity that hardly stirs (from memory)")
    @Test
    void aShallowCavityThatHardlyStirsIsAsInTheory() {
        double aspect = 1e-3;
        double ra = 3e5;
        double theory = 1 + aspect * ra * (aspect * ra) / 362_880;
        double onWidth = ra / (aspect * aspect * aspect);
        assertEquals(theory, AirSpace.cavityNusselt(onWidth, aspect, AIR), 0.05 * (theory - 1));
    }

    @ParameterizedTest
    @CsvSource({"0.2", "0.7", "1", "1.9", "3", "5", "12", "60"})
    void moreDifferenceNeverCarriesLess(double aspect) {
        double before = 1;
        for (double ra = 1; ra < 1e11; ra *= 1.5) {
            double now = AirSpace.cavityNusselt(ra, aspect, AIR);
            assertTrue(now >= before, aspect + " at " + ra);
            before = now;
        }
    }
}
