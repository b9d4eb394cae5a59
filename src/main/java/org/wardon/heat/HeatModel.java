package org.wardon.heat;

import org.wardon.errors.Progress;
import org.wardon.heat.network.ChamberNetwork;

/** The heat and moisture model: runs a chamber, or a lot in given air. */
public final class HeatModel {
    private HeatModel() {}

    /**
     * Runs a chamber.
     *
     * @param run what to run
     * @param progress hears how far it has come, as stage {@code heat}
     * @return what happened
     * @throws org.wardon.errors.RunStopped where a state cannot be
     * @throws IllegalArgumentException where a part is not built or parts do not fit together
     */
    public static Course run(ChamberRun run, Progress progress) {
        return run(run, progress, Accuracy.USUAL, false);
    }

    static Course run(ChamberRun run, Progress progress, Accuracy accuracy, boolean plain) {
        ChamberNetwork network = RunCompiler.network(run, plain);
        double[] start =
                network.start(RunCompiler.startC(run), RunCompiler.startRatio(run, network));
        return new ChamberRunner(run, network, start, accuracy).run(progress);
    }
}
