package org.wardon.heat;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.wardon.air.MoistAir;
import org.wardon.air.SaturatedAir;
import org.wardon.enclosure.Face;
import org.wardon.enclosure.FaceName;
import org.wardon.heat.network.ChamberNetwork;
import org.wardon.heat.network.FaceReading;
import org.wardon.heat.network.LotReading;

/** Reads a chamber at two times of its run and tells what came in between. */
final class Accountant {
    private final ChamberRun run;
    private final ChamberNetwork network;
    private final double[] totals;
    private final LotRecorder[] lots;
    private final Books books;
    private double fromS;
    private double mixedJ;
    private double mixedKg;
    private HourAccount.Air before = new HourAccount.Air(0, 0, 0, 0, 0);
    private HeatLedger heat = HeatLedger.NOTHING;
    private WaterLedger water = WaterLedger.NOTHING;
    private final List<FaceReading> faces = new ArrayList<>();
    private final List<LotAmounts> gave = new ArrayList<>();

    Accountant(
            ChamberRun run,
            ChamberNetwork network,
            double[] totals,
            LotRecorder[] lots,
            Books books) {
        this.run = run;
        this.network = network;
        this.totals = totals;
        this.lots = lots;
        this.books = books;
    }

    /** Reads what stands at the start of the span. */
    void open(double t, double[] y) {
        fromS = t;
        asked(t, y);
        before = air(y);
        mixedJ = network.terms().mixed(totals);
        mixedKg = network.terms().mixedAir(totals);
        heat = books.heat(y);
        water = books.water(y);
        for (int i = 0; i < run.enclosure().faces().size(); i++) {
            faces.add(network.terms().face(i, y, totals));
        }
        for (LotRecorder lot : lots) {
            gave.add(lot.amounts(y, totals));
        }
    }

    /** Reads what stands at its end. */
    HourAccount close(double t, double[] y) {
        asked(t, y);
        Map<FaceName, FaceReading> read = new EnumMap<>(FaceName.class);
        List<Face> built = run.enclosure().faces();
        for (int i = 0; i < built.size(); i++) {
            FaceReading now = network.terms().face(i, y, totals);
            read.put(built.get(i).name(), now.since(faces.get(i)));
        }
        List<HourAccount.OfLot> stood = new ArrayList<>();
        for (int i = 0; i < lots.length; i++) {
            LotAmounts here = lots[i].amounts(y, totals).since(gave.get(i));
            if (lots[i].present() || !here.equals(LotAmounts.NOTHING)) {
                stood.add(
                        new HourAccount.OfLot(
                                run.stays().get(i).lot().id(),
                                lots[i].present(),
                                atDoorEnd(i) ? network.air().doorEndC(y) : network.airC(y),
                                LotReading.of(network.lot(i), y),
                                here,
                                lots[i].massKg(y, totals)));
            }
        }
        return new HourAccount(
                run.chamberId(),
                fromS,
                t,
                before,
                air(y),
                network.outdoorC(),
                books.heat(y).since(heat),
                books.water(y).since(water),
                ends(y),
                read,
                stood);
    }

    private boolean atDoorEnd(int lot) {
        return run.stays().get(lot).berth().spot().atDoorEnd(run.enclosure());
    }

    private Optional<HourAccount.Ends> ends(double[] y) {
        if (!network.air().hasDoorEnd()) {
            return Optional.empty();
        }
        return Optional.of(
                new HourAccount.Ends(
                        network.airC(y),
                        network.air().doorEndC(y),
                        network.terms().mixed(totals) - mixedJ,
                        network.cubicMetres(network.terms().mixedAir(totals) - mixedKg)));
    }

    /** Asks for the rates, so that every part knows of this state. */
    private void asked(double t, double[] y) {
        network.rates(t, y, new double[y.length], new double[totals.length]);
    }

    private HourAccount.Air air(double[] y) {
        double enthalpy = network.air().heatJ(y) / network.airKg();
        double ratio = network.air().vapourKg(y) / network.airKg();
        double airC = MoistAir.temperatureC(enthalpy, ratio);
        double pressure = RunCompiler.pressurePa(run);
        double humidity =
                MoistAir.vapourPressurePa(ratio, pressure) / SaturatedAir.pressurePa(airC);
        return new HourAccount.Air(airC, humidity, ratio, network.airKg(), enthalpy);
    }
}
