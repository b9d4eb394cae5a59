package org.wardon.heat;

import org.wardon.air.MoistAir;
import org.wardon.errors.RunStopped;
import org.wardon.heat.network.LotInGivenAir;
import org.wardon.heat.solver.Integrator;
import org.wardon.heat.solver.StepTooShort;
import org.wardon.lots.RespirationLaw;

/** Takes one lot through air that is given. */
final class GivenAirRunner implements Integrator.StepListener, Integrator.Trigger {
    private static final double SHORTEST_STEP_S = 1e-5;
    private static final double LEAST_STRETCH_S = 1e-6;

    private final Stay stay;
    private final AirSeries air;
    private final double pressurePa;
    private final double endS;
    private final LotInGivenAir network;
    private final Integrator integrator;
    private final LotRecorder recorder;
    private final double rowS;

    GivenAirRunner(
            Stay stay, AirSeries air, double pressurePa, double endS, LotInGivenAir network) {
        this.stay = stay;
        this.air = air;
        this.pressurePa = pressurePa;
        this.endS = endS;
        this.network = network;
        Accuracy accuracy = air.rowHours() > 1 ? Accuracy.SKETCHED : Accuracy.EVEN;
        network.accuracy(accuracy.lotK(), accuracy.airK());
        rowS = 3600.0 * air.rowHours();
        integrator =
                new Integrator(
                        network, accuracy.steps(), 1, accuracy.firstStepS(), SHORTEST_STEP_S);
        int rows = (int) Math.ceil((endS - startS()) / rowS) + 3;
        recorder = new LotRecorder(stay, network.lot(), rows, air.rowHours() > 1);
    }

    private double startS() {
        return Math.max(stay.arrivesS(), 0);
    }

    LotCourse run() {
        double t = startS();
        double[] y = new double[network.tree().size()];
        boolean fresh = stay.freshUntilS() > t;
        network.lot().breathe(law(fresh));
        network.air(y, air.temperatureC(t), ratio(t), air.temperatureC(t), ratio(t), 1);
        network.arrive(stay.pulpC(), stay.surfaceWaterKg(), ratio(t), y);
        recorder.arrives(t, y, integrator.totals());
        int sample = 0;
        double nextRow = rowS * (Math.floor(t / rowS + 1e-9) + 1);
        while (t < endS - LEAST_STRETCH_S) {
            while (sample < air.size() && air.timeS(sample) <= t + LEAST_STRETCH_S) {
                sample++;
            }
            double knot = sample < air.size() ? air.timeS(sample) : endS;
            double until = Math.min(Math.min(knot, nextRow), endS);
            if (fresh && stay.freshUntilS() > t) {
                until = Math.min(until, stay.freshUntilS());
            }
            network.air(
                    y,
                    air.temperatureC(t),
                    ratio(t),
                    air.temperatureC(until),
                    ratio(until),
                    until - t);
            t = advance(t, y, until);
            if (fresh && t >= stay.freshUntilS()) {
                fresh = false;
                network.lot().breathe(law(false));
            }
            if (t >= nextRow || t >= endS - LEAST_STRETCH_S) {
                recorder.row(t, y, integrator.totals());
                nextRow += rowS;
            }
        }
        recorder.close(y, integrator.totals());
        return recorder.course();
    }

    private RespirationLaw law(boolean fresh) {
        RespirationLaw usual = stay.lot().respiration();
        return fresh ? usual.fresh() : usual;
    }

    private double ratio(double t) {
        return MoistAir.humidityRatioAt(
                air.temperatureC(t), Math.min(air.humidityFraction(t), 1), pressurePa);
    }

    private double advance(double t, double[] y, double until) {
        try {
            return integrator.advance(t, y, until, this, this);
        } catch (StepTooShort stuck) {
            throw new RunStopped(stuck.time(), stay.lot().id(), "the lot: no step is short enough");
        }
    }

    @Override
    public void stepped(double from, double to, double[] y) {
        double warm = network.lot().warmestC(y);
        if (!(warm > -60 && warm < 90)) {
            throw new RunStopped(to, stay.lot().id(), "the lot would be " + warm + " °C");
        }
        recorder.stepped(to, y, integrator.totals());
    }

    @Override
    public double value(double t, double[] y) {
        return -1;
    }

    @Override
    public double tolerance() {
        return 1;
    }
}
