package org.wardon.keeping.experience;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Random;
import org.apache.commons.math3.analysis.UnivariateFunction;
import org.apache.commons.math3.analysis.integration.IterativeLegendreGaussIntegrator;
import org.apache.commons.math3.distribution.NormalDistribution;
import org.junit.jupiter.api.Test;

/** What own figures and lots leave of the published spread. */
class BeliefTest {
    private static final LevelSpread EVEN = new LevelSpread(0.4, 0.4);
    private static final NormalDistribution NORMAL = new NormalDistribution(null, 0, 1);
    private static final double LOTS = LevelSpread.BETWEEN_LOTS;

    private static Belief.Reading lot(double lnRatio) {
        double width = LOTS / 0.4;
        return new Belief.Reading(lnRatio / 0.4, width * width, false);
    }

    private static Belief.Reading atLeast(double lnRatio) {
        double width = LOTS / 0.4;
        return new Belief.Reading(lnRatio / 0.4, width * width, true);
    }

    @Test
    void nothingSeenLeavesPrint() {
        Belief nothing = Belief.after(List.of());
        for (double z : new double[] {-3, -1.2, 0, 0.7, 2.05}) {
            assertEquals(z, nothing.lot(z, EVEN), 1e-12);
            assertEquals(z, nothing.level(z), 1e-12);
        }
    }

    @Test
    void lotsMoveTheLevelAsTheNormalPairSays() {
        // Textbook: prior N(0, s²), figures N(level, t²) one after the other, in ln life.
        double mean = 0;
        double variance = 0.4 * 0.4;
        List<Belief.Reading> seen = new ArrayList<>();
        for (double ln : new double[] {-0.3, 0.1, -0.55, -0.2, 0.02}) {
            double gain = variance / (variance + LOTS * LOTS);
            mean += gain * (ln - mean);
            variance *= 1 - gain;
            seen.add(lot(ln));
            Belief belief = Belief.after(seen);
            assertEquals(mean, 0.4 * belief.level(0), 1e-12);
            assertEquals(Math.sqrt(variance), 0.4 * (belief.level(1) - belief.level(0)), 1e-12);
            double open = variance / (0.4 * 0.4);
            double next = Math.sqrt(variance + LOTS * LOTS * (1 - open));
            assertEquals(mean + 1.5 * next, 0.4 * belief.lot(1.5, EVEN), 1e-12);
        }
    }

    @Test
    void aBoundMovesTheLevelAsTheIntegralSays() {
        List<Belief.Reading> seen = List.of(lot(-0.1), atLeast(0.35), atLeast(0.2), atLeast(-1));
        UnivariateFunction density =
                u -> {
                    double p = NORMAL.density(u);
                    for (Belief.Reading one : seen) {
                        double away = (u - one.z()) / Math.sqrt(one.variance());
                        p *=
                                one.atLeast()
                                        ? NORMAL.cumulativeProbability(away)
                                        : NORMAL.density(away);
                    }
                    return p;
                };
        IterativeLegendreGaussIntegrator gauss =
                new IterativeLegendreGaussIntegrator(20, 1e-10, 1e-14);
        double all = gauss.integrate(1_000_000, density, -8, 8);
        Belief belief = Belief.after(seen);
        for (double z : new double[] {-1.2816, 0, 1, 2.05}) {
            double below = gauss.integrate(1_000_000, density, -8, belief.level(z)) / all;
            assertEquals(NORMAL.cumulativeProbability(z), below, 2e-4);
        }
    }

    @Test
    void theOrderDoesNotMatterAndMoreLotsNarrowTheLevelButNotTheNextLot() {
        Random random = new Random(7);
        List<Belief.Reading> seen = new ArrayList<>();
        double width = Double.POSITIVE_INFINITY;
        for (int n = 0; n < 40; n++) {
            double ln = -0.3 + LOTS * random.nextGaussian();
            seen.add(n % 4 == 3 ? atLeast(ln - 0.1) : lot(ln));
            Belief belief = Belief.after(seen);
            List<Belief.Reading> shuffled = new ArrayList<>(seen);
            Collections.shuffle(shuffled, random);
            for (double z : new double[] {-1, 0, 1}) {
                assertEquals(belief.lot(z, EVEN), Belief.after(shuffled).lot(z, EVEN), 1e-6);
            }
            double now = belief.level(1) - belief.level(-1);
            assertTrue(now < width, n + " lots: " + now + " after " + width);
            width = now;
            double lots = 0.4 * (belief.lot(1, EVEN) - belief.lot(-1, EVEN));
            assertTrue(lots >= 2 * LOTS, "the next lot " + lots);
            assertTrue(lots <= 0.8, "the next lot " + lots);
        }
        assertEquals(-0.3, 0.4 * Belief.after(seen).level(0), 0.1);
    }

    @Test
    void aLotSoldSoundWellBeforeItsTimeSaysNothing() {
        Belief belief = Belief.after(List.of(atLeast(Math.log(0.3)), atLeast(Math.log(0.3))));
        for (double z : new double[] {-1.2, 0, 2}) {
            assertEquals(1, Math.exp(0.4 * (belief.lot(z, EVEN) - z)), 0.01);
        }
    }

    @Test
    void aBoundFarBeyondAVeryCertainFigureDoesNotBreakIt() {
        Belief.Reading certain = new Belief.Reading(-1, 0, false);
        Belief belief = Belief.after(List.of(certain, atLeast(3)));
        assertEquals(-1, belief.level(0), 1e-3);
        Belief far = Belief.after(List.of(atLeast(5), atLeast(5.5)));
        assertTrue(far.level(0) > 10 && far.level(0) < 16, "level " + far.level(0));
    }

    @Test
    void lotsDifferAsTheFitSays() throws IOException {
        String measured =
                Files.readAllLines(Path.of("reference-tables/fits/life-pool.csv")).stream()
                        .filter(line -> line.startsWith("measured,"))
                        .findFirst()
                        .orElseThrow();
        double fitted = Double.parseDouble(measured.split(",", -1)[1]);
        assertEquals(fitted, LOTS, 0.01, "take the fit's figure over into LevelSpread");
    }
}
