package org.wardon.sharing.placing;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Lots that are alike in all the search sees, and stores full of them. */
class LikenessTest {
    private static final double ROUNDING = 2e-7;
    private static final Instances INSTANCES = new Instances();
    private static final FrozenOracle FROZEN = new FrozenOracle();
    private static final int LOTS = 4;

    private static PlacingAnswer search(PlacingProblem problem) {
        PlacingAnswer answer = PlacingSearch.of(problem, Effort.of(problem));
        Checker.check(problem, answer);
        return answer;
    }

    /** Four lots in one chamber of one climate, all alike but for what is changed. */
    private static final class Four {
        final double[] worth = {10, 10, 10, 10};
        final double[][] heatW = new double[LOTS][2];
        final double[][] loss = new double[LOTS][LOTS];
        final List<LotToPlace> lots = new ArrayList<>();

        Four() {
            for (int l = 0; l < LOTS; l++) {
                lots.add(new LotToPlace("l" + l, 100, 1, 0, 1, Optional.empty()));
            }
        }

        int[] kinds() {
            Climate climate = new Climate("cool", worth, heatW, loss);
            Offer offer = new Offer(climate, List.of(50.0, 50.0), 1, 0);
            ChamberToFill chamber = new ChamberToFill("c", 1_000, 10, List.of(offer), true);
            return new Likeness(new Store(new PlacingProblem(2, lots, List.of(chamber)))).kind;
        }
    }

    @Test
    void lotsEqualInAllNumbersAreAlike() {
        assertArrayEquals(new int[] {0, 0, 0, 0}, new Four().kinds());
    }

    @Test
    void oneNumberThatDiffersMakesALotUnlike() {
        Four four = new Four();
        four.worth[2] = Math.nextUp(10.0);
        assertArrayEquals(new int[] {0, 0, 2, 0}, four.kinds());
        four = new Four();
        four.heatW[3][1] = 0.5;
        assertArrayEquals(new int[] {0, 0, 0, 3}, four.kinds());
        for (LotToPlace other :
                List.of(
                        new LotToPlace("l1", 101, 1, 0, 1, Optional.empty()),
                        new LotToPlace("l1", 100, 1.1, 0, 1, Optional.empty()),
                        new LotToPlace("l1", 100, 1, 1, 1, Optional.empty()),
                        new LotToPlace("l1", 100, 1, 0, 0, Optional.empty()),
                        new LotToPlace("l1", 100, 1, 0, 1, Optional.of("elsewhere")))) {
            four = new Four();
            four.lots.set(1, other);
            assertArrayEquals(new int[] {0, 1, 0, 0}, four.kinds(), other.toString());
        }
    }

    /** What two lose by each other is no difference between them; by a third one it is. */
    @Test
    void lotsThatLoseByTheSameOthersAreAlike() {
        Four four = new Four();
        four.loss[0][1] = 3;
        four.loss[1][0] = 3;
        assertArrayEquals(new int[] {0, 0, 2, 2}, four.kinds());
        four.loss[2][3] = Climate.APART;
        four.loss[3][2] = Climate.APART;
        assertArrayEquals(new int[] {0, 0, 2, 2}, four.kinds());
        four.loss[0][2] = 1;
        four.loss[2][0] = 1;
        assertArrayEquals(new int[] {0, 1, 2, 3}, four.kinds());
    }

    private static Mix small(int crops, Mix.Harm harm) {
        return Mix.ofAllCrops(0.7).few(crops, 1, true).company(harm);
    }

    @ParameterizedTest(name = "seed {0}")
    @ValueSource(ints = {1, 2, 3, 4, 5, 6, 7, 8})
    void fewLikeLotsArePlacedAsWellAsByTryingEverything(int seed) {
        for (Mix.Harm harm : Mix.Harm.values()) {
            for (int crops = 1; crops <= 3; crops++) {
                PlacingProblem problem = INSTANCES.draw(9, 3, small(crops, harm), seed);
                PlacingAnswer answer = search(problem);
                String of = seed + " " + harm + " " + crops;
                assertTrue(new Store(problem).likeness.any, of);
                double best = new EveryPlacing(problem).best();
                assertEquals(best, answer.placing().value(), ROUNDING * best, of);
                assertTrue(answer.bound() >= best * (1 - ROUNDING), of);
                assertTrue(answer.proven(), of);
            }
        }
    }

    @ParameterizedTest(name = "seed {0}")
    @ValueSource(ints = {1, 2, 3, 4})
    void provesWhatTheGeneralSolverProvesOfLikeLots(int seed) {
        FrozenOracle.Drawn drawn = FrozenOracle.alike(seed);
        PlacingAnswer ours = search(drawn.problem());
        Oracle.Answer theirs = FROZEN.answer(drawn);
        assertTrue(ours.proven(), ours.toString());
        assertTrue(theirs.value() <= ours.bound() + 0.1, theirs + " " + ours.bound());
        assertTrue(ours.placing().value() <= theirs.bound() + 0.1, theirs + " " + ours);
    }

    @ParameterizedTest(name = "seed {0}")
    @ValueSource(ints = {2, 3, 4})
    void namesGivenToLikeLotsChangeNothing(int seed) {
        PlacingProblem problem = FrozenOracle.alike(seed).problem();
        List<String> ids = new ArrayList<>(problem.lots().stream().map(LotToPlace::id).toList());
        Collections.shuffle(ids, new Random(seed));
        List<LotToPlace> renamed =
                IntStream.range(0, ids.size())
                        .mapToObj(l -> named(problem.lots().get(l), ids.get(l)))
                        .toList();
        PlacingAnswer plain = search(problem);
        PlacingAnswer other =
                search(new PlacingProblem(problem.days(), renamed, problem.chambers()));
        assertTrue(plain.proven() && other.proven(), plain + " " + other);
        double value = plain.placing().value();
        assertEquals(value, other.placing().value(), ROUNDING * value);
        assertEquals(plain, search(problem));
    }

    private static LotToPlace named(LotToPlace lot, String id) {
        return new LotToPlace(
                id, lot.massKg(), lot.volumeM3(), lot.firstDay(), lot.lastDay(), lot.onlyIn());
    }

    @Test
    void manyLotsOfFewKindsAreWithinOnePercentOfTheirBound() {
        Mix mix = Mix.ofAllCrops(0.97).few(8, 3, true);
        PlacingAnswer ours = search(INSTANCES.draw(200, 12, mix, 1));
        assertTrue(ours.gapPct() <= 1, ours.gapPct() + " %");
        assertTrue(ours.placing().value() > 0, ours.toString());
    }
}
