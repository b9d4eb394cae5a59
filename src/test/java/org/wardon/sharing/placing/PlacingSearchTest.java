package org.wardon.sharing.placing;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

class PlacingSearchTest {
    private static final double ROUNDING = 2e-7;
    private static final Instances INSTANCES = new Instances();
    private static final FrozenOracle FROZEN = new FrozenOracle();

    private static PlacingAnswer search(PlacingProblem problem) {
        PlacingAnswer answer = PlacingSearch.of(problem, Effort.of(problem));
        Checker.check(problem, answer);
        return answer;
    }

    private static PlacingProblem small(int seed) {
        return INSTANCES.draw(20, 3, 0.97, seed);
    }

    /** The general solver may take its time; it is given enough to prove the same optimum. */
    @ParameterizedTest(name = "20 lots, 3 chambers, seed {0}")
    @ValueSource(ints = {1, 2, 3})
    void provesTheOptimumTheGeneralSolverProves(int seed) {
        PlacingProblem problem = small(seed);
        PlacingAnswer ours = search(problem);
        Oracle.Answer theirs = Oracle.ask(problem, 60);
        assertTrue(ours.proven() && theirs.proven(), ours + " " + theirs);
        assertEquals(theirs.value(), ours.placing().value(), 0.001 * problem.lots().size() + 0.1);
    }

    @ParameterizedTest(name = "60 lots, 6 chambers, seed {0}")
    @ValueSource(ints = {1, 2, 3})
    void isWithinOnePercentOfItsBoundAndTheBoundAboveTheGeneralSolver(int seed) {
        FrozenOracle.Drawn drawn = FrozenOracle.large(seed);
        PlacingAnswer ours = search(drawn.problem());
        assertTrue(ours.gapPct() <= 1, ours.gapPct() + " %");
        Oracle.Answer theirs = FROZEN.answer(drawn);
        assertTrue(theirs.value() <= ours.bound() + 1, theirs + " " + ours.bound());
        assertTrue(theirs.value() <= ours.placing().value() + 1, theirs + " " + ours);
    }

    /** Within three percent of the bound was asked for; what is found is closer. */
    @Test
    void twoHundredLotsInTwelveChambersAreWithinThreePercentOfTheirBound() {
        PlacingAnswer ours = search(INSTANCES.draw(200, 12, 0.97, 1));
        assertTrue(ours.gapPct() <= 3, ours.gapPct() + " %");
    }

    static IntStream mixes() {
        return IntStream.range(0, Mix.all(1).size());
    }

    @ParameterizedTest(name = "mix {0}")
    @MethodSource("mixes")
    void storesOfEveryMixAreFilledWithinOnePercentOfTheirBound(int number) {
        for (double share : new double[] {0.5, 0.97, 1.5}) {
            FrozenOracle.Drawn drawn = FrozenOracle.mixed(number, share);
            PlacingAnswer ours = search(drawn.problem());
            assertTrue(ours.gapPct() <= 1, drawn.name() + " " + ours.gapPct() + " %");
            Oracle.Answer theirs = FROZEN.answer(drawn);
            assertTrue(
                    theirs.value() <= ours.placing().value() * 1.0001 + 1,
                    drawn.name() + " " + theirs);
        }
    }

    @Test
    void aStoreWithoutChambersOrWithOneLotIsAnsweredToo() {
        PlacingProblem one = INSTANCES.draw(1, 3, 9, 1);
        PlacingAnswer ours = search(one);
        assertTrue(ours.proven() && ours.placing().unplaced().isEmpty(), ours.toString());
        PlacingAnswer nowhere = search(new PlacingProblem(one.days(), one.lots(), List.of()));
        assertTrue(nowhere.proven(), nowhere.toString());
        assertEquals(List.of(0), nowhere.placing().unplaced());
        assertEquals(0, nowhere.placing().value());
    }

    @Test
    void equalProblemsHaveEqualAnswers() {
        assertEquals(search(small(4)), search(small(4)));
        PlacingProblem problem = INSTANCES.draw(40, 4, 0.8, 9);
        assertEquals(search(problem), search(problem));
    }

    @ParameterizedTest(name = "seed {0}")
    @ValueSource(ints = {5, 6, 7, 8})
    void anotherChamberNeverLowersWhatIsKept(int seed) {
        PlacingProblem problem = small(seed);
        for (ChamberToFill without : problem.chambers()) {
            List<ChamberToFill> fewer = new ArrayList<>(problem.chambers());
            fewer.remove(without);
            PlacingProblem less = new PlacingProblem(problem.days(), problem.lots(), fewer);
            double value = search(problem).placing().value();
            assertTrue(search(less).placing().value() <= value * (1 + ROUNDING), without.id());
        }
    }

    @ParameterizedTest(name = "seed {0}")
    @ValueSource(ints = {5, 6, 7, 8})
    void lotsThatMayMeetNeverLowerWhatIsKept(int seed) {
        PlacingProblem problem = small(seed);
        double value = search(problem).placing().value();
        double free = search(withoutConflicts(problem)).placing().value();
        assertTrue(free >= value * (1 - ROUNDING), free + " < " + value);
    }

    private static PlacingProblem withoutConflicts(PlacingProblem problem) {
        List<ChamberToFill> chambers =
                problem.chambers().stream()
                        .map(
                                chamber ->
                                        new ChamberToFill(
                                                chamber.id(),
                                                chamber.massKg(),
                                                chamber.volumeM3(),
                                                chamber.offers().stream()
                                                        .map(o -> alone(problem, o))
                                                        .toList(),
                                                chamber.mayRest()))
                        .toList();
        return new PlacingProblem(problem.days(), problem.lots(), chambers);
    }

    private static Offer alone(PlacingProblem problem, Offer offer) {
        int lots = problem.lots().size();
        int[] order = IntStream.range(0, lots).toArray();
        Climate climate = renumbered(offer.climate(), order, problem.days(), false);
        return new Offer(climate, offer.coolingW(), offer.cost(), offer.costPerWDay());
    }

    private static Climate renumbered(Climate climate, int[] order, int days, boolean company) {
        int lots = order.length;
        double[] worth = Arrays.stream(order).mapToDouble(climate::worth).toArray();
        double[][] heat = new double[lots][days];
        double[][] loss = new double[lots][lots];
        for (int l = 0; l < lots; l++) {
            for (int d = 0; d < days; d++) {
                heat[l][d] = climate.heatW(order[l], d);
            }
            for (int o = 0; company && o < lots; o++) {
                loss[l][o] = climate.lossTogether(order[l], order[o]);
            }
        }
        return new Climate(climate.name(), worth, heat, loss);
    }

    @ParameterizedTest(name = "seed {0}")
    @ValueSource(ints = {5, 6, 7})
    void theOrderInWhichLotsAndChambersAreNamedChangesNothing(int seed) {
        PlacingProblem problem = small(seed);
        List<Integer> order = new ArrayList<>(IntStream.range(0, 20).boxed().toList());
        Collections.shuffle(order, new Random(seed));
        int[] numbers = order.stream().mapToInt(i -> i).toArray();
        List<LotToPlace> lots = order.stream().map(problem.lots()::get).toList();
        List<ChamberToFill> chambers = new ArrayList<>();
        for (ChamberToFill one : problem.chambers()) {
            List<Offer> offers =
                    one.offers().stream()
                            .map(
                                    o ->
                                            new Offer(
                                                    renumbered(
                                                            o.climate(),
                                                            numbers,
                                                            problem.days(),
                                                            true),
                                                    o.coolingW(),
                                                    o.cost(),
                                                    o.costPerWDay()))
                            .toList();
            chambers.add(
                    0, new ChamberToFill(one.id(), one.massKg(), one.volumeM3(), offers, true));
        }
        PlacingAnswer shuffled = search(new PlacingProblem(problem.days(), lots, chambers));
        PlacingAnswer plain = search(problem);
        assertEquals(plain.placing().value(), shuffled.placing().value(), 1e-6);
        assertEquals(plain.bound(), shuffled.bound(), 1e-2);
    }

    @Test
    void aLotStaysInTheOnlyChamberItMayStandIn() {
        PlacingProblem problem = small(2);
        int lot = search(problem).placing().chambers().get(0).lots().get(0);
        List<LotToPlace> lots = new ArrayList<>(problem.lots());
        LotToPlace one = lots.get(lot);
        String other = problem.chambers().get(1).id();
        lots.set(
                lot,
                new LotToPlace(
                        one.id(),
                        one.massKg(),
                        one.volumeM3(),
                        one.firstDay(),
                        one.lastDay(),
                        Optional.of(other)));
        PlacingAnswer bound = search(new PlacingProblem(problem.days(), lots, problem.chambers()));
        assertTrue(bound.placing().chamberOf(lot) != 0);
        assertTrue(bound.placing().value() <= search(problem).placing().value() * (1 + ROUNDING));
    }
}
