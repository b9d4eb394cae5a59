package org.wardon.sharing.placing;

import com.google.ortools.Loader;
import com.google.ortools.sat.BoolVar;
import com.google.ortools.sat.CpModel;
import com.google.ortools.sat.CpSolver;
import com.google.ortools.sat.CpSolverStatus;
import com.google.ortools.sat.LinearExpr;
import com.google.ortools.sat.LinearExprBuilder;
import com.google.ortools.sat.Literal;

/** The same problem put to a general solver (CP-SAT of OR-Tools). */
final class Oracle {
    /** Whole numbers to a unit of currency and to a limit. */
    private static final double FINE = 1_000;

    private static final double SHARE = 1e8;

    private final PlacingProblem problem;
    private final Store store;
    private final CpModel model = new CpModel();
    private final LinearExprBuilder worth = LinearExpr.newBuilder();
    private final LinearExprBuilder[] places;

    /**
     * What the general solver says.
     *
     * @param value of the best it found, 0 where it found none
     * @param bound nothing is worth more
     * @param proven whether they meet
     */
    record Answer(double value, double bound, boolean proven) {}

    private Oracle(PlacingProblem problem) {
        this.problem = problem;
        store = new Store(problem);
        places = new LinearExprBuilder[store.lots];
        for (int l = 0; l < store.lots; l++) {
            places[l] = LinearExpr.newBuilder();
        }
    }

    static Answer ask(PlacingProblem problem, double seconds) {
        Loader.loadNativeLibraries();
        return new Oracle(problem).solved(seconds);
    }

    private Answer solved(double seconds) {
        for (int c = 0; c < store.chambers; c++) {
            chamber(c);
        }
        for (LinearExprBuilder place : places) {
            model.addLessOrEqual(place.build(), 1);
        }
        model.maximize(worth.build());
        CpSolver solver = new CpSolver();
        solver.getParameters().setMaxTimeInSeconds(seconds).setNumWorkers(2);
        CpSolverStatus status = solver.solve(model);
        boolean any = status == CpSolverStatus.OPTIMAL || status == CpSolverStatus.FEASIBLE;
        return new Answer(
                any ? solver.objectiveValue() / FINE : 0,
                solver.bestObjectiveBound() / FINE,
                status == CpSolverStatus.OPTIMAL);
    }

    private void chamber(int c) {
        Literal[] set = new Literal[store.offers(c)];
        for (int o = 0; o < set.length; o++) {
            BoolVar here = model.newBoolVar("set" + c + "_" + o);
            set[o] = here;
            worth.addTerm(here, -Math.round(store.cost[c][o] * FINE));
            lots(c, o, here);
        }
        if (store.mayRest[c]) {
            model.addAtMostOne(set);
        } else {
            model.addExactlyOne(set);
        }
    }

    private void lots(int c, int o, BoolVar set) {
        BoolVar[] in = new BoolVar[store.lots];
        for (int l = 0; l < store.lots; l++) {
            if (store.earns[c][o][l] > 0) {
                in[l] = model.newBoolVar("in" + c + "_" + o + "_" + l);
                model.addImplication(in[l], set);
                places[l].add(in[l]);
                worth.addTerm(in[l], Math.round(store.earns[c][o][l] * FINE));
            }
        }
        for (int d = 0; d < problem.days(); d++) {
            int day = d;
            limit(in, set, d, l -> store.massShare[c][l]);
            limit(in, set, d, l -> store.volumeShare[c][l]);
            limit(in, set, d, l -> store.heatShare[c][o][l * store.days + day]);
        }
        for (int l = 0; l < store.lots; l++) {
            company(c, o, l, in);
        }
    }

    private void limit(
            BoolVar[] in, BoolVar set, int d, java.util.function.IntToDoubleFunction of) {
        LinearExprBuilder sum = LinearExpr.newBuilder();
        for (int l = 0; l < in.length; l++) {
            if (in[l] != null && store.first[l] <= d && d <= store.last[l]) {
                sum.addTerm(in[l], Math.round(of.applyAsDouble(l) * SHARE));
            }
        }
        sum.addTerm(set, -Math.round(SHARE));
        model.addLessOrEqual(sum.build(), 0);
    }

    private void company(int c, int o, int l, BoolVar[] in) {
        Company company = store.company[c][o];
        for (int k = 0; k < company.others[l].length; k++) {
            int other = company.others[l][k];
            if (other > l || in[l] == null || in[other] == null) {
                continue;
            }
            double loss = company.loss[l][k];
            if (loss == Climate.APART) {
                model.addBoolOr(new Literal[] {in[l].not(), in[other].not()});
            } else {
                BoolVar both = model.newBoolVar("both" + c + "_" + o + "_" + l + "_" + other);
                model.addBoolOr(new Literal[] {in[l].not(), in[other].not(), both});
                worth.addTerm(both, -Math.round(loss * FINE));
            }
        }
    }
}
