package org.wardon.advice.placing;

import java.util.List;
import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import org.wardon.advice.forecast.StoreTrial;
import org.wardon.produce.Conflict;
import org.wardon.sharing.PairConflict;
import org.wardon.sharing.Verdict;
import org.wardon.sharing.placing.Climate;

/**
 * What lots cost each other in one option: ethylene by the level they make in that chamber, smell
 * by the days they are together. Two lots whose keeper put them together and does not move them are
 * never torn apart; what they cost each other counts all the same.
 */
final class Companions {
    private final StoreTrial trial;
    private final Options options;
    private final Map<Long, Boolean> smells = new ConcurrentHashMap<>();

    Companions(StoreTrial trial, Options options) {
        this.trial = trial;
        this.options = options;
    }

    /** {@code [item][item]}, currency, {@link Climate#APART} where they must not be together. */
    double[][] losses(Option option, List<Task.Item> items) {
        int n = items.size();
        double[][] loss = new double[n][n];
        String chamber = option.chamber().id();
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < i; j++) {
                Task.Item one = items.get(i);
                Task.Item other = items.get(j);
                boolean may = Task.mayStand(one, chamber) && Task.mayStand(other, chamber);
                loss[i][j] = may ? loss(option, one, other) : 0;
                loss[j][i] = loss[i][j];
            }
        }
        return loss;
    }

    double loss(Option option, Task.Item one, Task.Item other) {
        if (!one.meets(other) || one.number() == other.number()) {
            return 0;
        }
        boolean stay = one.isFixed() && other.isFixed();
        if (!stay && (smell(option, one, other) || ethyleneParts(option, one, other))) {
            return Climate.APART;
        }
        return ethylene(option, one, other) + ethylene(option, other, one);
    }

    private boolean ethyleneParts(Option option, Task.Item one, Task.Item other) {
        return !options.accepts(option.chamber(), Conflict.ETHYLENE)
                && (refuses(option, one, other) || refuses(option, other, one));
    }

    private static boolean refuses(Option option, Task.Item taker, Task.Item giver) {
        return option.cell(taker.number()).refuses(option.cell(giver.number()));
    }

    private static double ethylene(Option option, Task.Item taker, Task.Item giver) {
        return option.cell(taker.number()).lossBy(option.cell(giver.number()));
    }

    private boolean smell(Option option, Task.Item one, Task.Item other) {
        if (options.accepts(option.chamber(), Conflict.ODOUR)) {
            return false;
        }
        long key = (long) one.number() * trial.lots().size() + other.number();
        return smells.computeIfAbsent(key, pair -> odour(one, other).verdict() == Verdict.NO);
    }

    static PairConflict odour(Task.Item one, Task.Item other) {
        double from = Math.max(one.lot().hereFromS(), other.lot().hereFromS());
        double to = Math.min(one.lot().leavesS(), other.lot().leavesS());
        double days = Math.max(0, to - from) / org.wardon.air.Timeline.DAY_S;
        return days > 0
                ? PairConflict.ofOdour(one.lot().wish(), other.lot().wish(), days)
                : new PairConflict(Verdict.GOOD, List.of());
    }
}
