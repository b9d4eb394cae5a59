package org.wardon.sharing.placing;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.HashSet;
import java.util.List;
import java.util.Set;

/** Sums a placing from the problem itself: every limit on every day, and what it is worth. */
final class Checker {
    private static final double ROUNDING = 1e-6;

    private Checker() {}

    static void check(PlacingProblem problem, PlacingAnswer answer) {
        Placing placing = answer.placing();
        Set<Integer> seen = new HashSet<>(placing.unplaced());
        double value = 0;
        for (int c = 0; c < problem.chambers().size(); c++) {
            Placing.Filled filled = placing.chambers().get(c);
            for (int lot : filled.lots()) {
                assertTrue(seen.add(lot), "lot " + lot + " stands twice");
            }
            ChamberToFill chamber = problem.chambers().get(c);
            if (filled.offer() == Placing.RESTS) {
                assertTrue(filled.lots().isEmpty() && chamber.mayRest(), chamber.id());
            } else {
                value += value(problem, chamber, filled);
            }
        }
        assertEquals(problem.lots().size(), seen.size());
        assertEquals(value, placing.value(), ROUNDING * Math.max(1, value));
        assertTrue(answer.bound() >= value - ROUNDING * Math.max(1, value), answer.toString());
    }

    private static double value(
            PlacingProblem problem, ChamberToFill chamber, Placing.Filled filled) {
        Offer offer = chamber.offers().get(filled.offer());
        double value = -offer.cost();
        List<Integer> lots = filled.lots();
        for (int i = 0; i < lots.size(); i++) {
            LotToPlace lot = problem.lots().get(lots.get(i));
            assertTrue(lot.onlyIn().map(chamber.id()::equals).orElse(true), lot.id());
            value += problem.earns(lots.get(i), offer);
            for (int j = 0; j < i; j++) {
                boolean meet = lot.meets(problem.lots().get(lots.get(j)));
                value -= meet ? offer.climate().lossTogether(lots.get(i), lots.get(j)) : 0;
            }
        }
        for (int day = 0; day < problem.days(); day++) {
            limits(problem, chamber, offer, lots, day);
        }
        return value;
    }

    private static void limits(
            PlacingProblem problem,
            ChamberToFill chamber,
            Offer offer,
            List<Integer> lots,
            int day) {
        double mass = 0;
        double volume = 0;
        double heat = 0;
        for (int number : lots) {
            LotToPlace lot = problem.lots().get(number);
            if (lot.firstDay() <= day && day <= lot.lastDay()) {
                mass += lot.massKg();
                volume += lot.volumeM3();
                heat += offer.climate().heatW(number, day);
            }
        }
        assertTrue(mass <= chamber.massKg() * (1 + ROUNDING), chamber.id() + " mass " + day);
        assertTrue(volume <= chamber.volumeM3() * (1 + ROUNDING), chamber.id() + " room " + day);
        assertTrue(
                heat <= offer.coolingW().get(day) * (1 + ROUNDING), chamber.id() + " heat " + day);
    }
}
