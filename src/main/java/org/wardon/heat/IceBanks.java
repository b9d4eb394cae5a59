package org.wardon.heat;

import java.util.Optional;
import org.wardon.cooling.IceBank;
import org.wardon.heat.network.ChamberNetwork;
import org.wardon.heat.network.Terms;

/** Notes when the ice of a chamber's banks is gone, and keeps its account. */
final class IceBanks {
    /** Ice counts as gone below this share of a full bank, and as there again above the other. */
    private static final double GONE = 0.01;

    private static final double BACK = 0.02;

    private final ChamberNetwork network;
    private final double[] startKg;
    private final boolean[] gone;
    private final Spans spans;

    IceBanks(ChamberRun run, ChamberNetwork network, double[] y) {
        this.network = network;
        int n = network.coolerCount();
        startKg = new double[n];
        gone = new boolean[n];
        spans = new Spans(CourseEvent.Kind.ICE_GONE, run.chamberId());
        for (int i = 0; i < n; i++) {
            startKg[i] = ice(i).isPresent() ? network.cooler(i).own(0, y) : 0;
        }
        stepped(0, y);
    }

    private Optional<IceBank> ice(int i) {
        return network.cooler(i).unit().ice();
    }

    /** The chamber is without ice when every bank in it is. */
    void stepped(double t, double[] y) {
        boolean any = false;
        boolean all = true;
        for (int i = 0; i < gone.length; i++) {
            if (ice(i).isPresent()) {
                double share = network.cooler(i).own(0, y) / ice(i).get().iceKg();
                gone[i] = share < (gone[i] ? BACK : GONE);
                any = true;
                all &= gone[i];
            }
        }
        spans.is(t, any && all);
    }

    /** All ice in the chamber, kg; NaN where it has no bank. */
    double leftKg(double[] y) {
        double sum = Double.NaN;
        for (int i = 0; i < gone.length; i++) {
            if (ice(i).isPresent()) {
                sum = (Double.isNaN(sum) ? 0 : sum) + Math.max(network.cooler(i).own(0, y), 0);
            }
        }
        return sum;
    }

    /** What one cooler did with its ice; empty where it holds none. */
    Optional<IceLedger> ledger(int i, double[] y, Terms terms, double[] totals) {
        return ice(i).map(
                        bank ->
                                new IceLedger(
                                        terms.melted(i, totals),
                                        terms.refrozen(i, totals),
                                        startKg[i],
                                        network.cooler(i).own(0, y),
                                        1_000 * bank.material().latentKJkg()));
    }

    Spans spans() {
        return spans;
    }
}
