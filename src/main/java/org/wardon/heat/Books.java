package org.wardon.heat;

import org.wardon.heat.network.ChamberNetwork;
import org.wardon.heat.network.Terms;
import org.wardon.lots.BurntSugar;

/**
 * The accounts of a chamber's heat and water since the start of its run, at any time of it: terms
 * from the integrals the solver carried, stored heat and water from the states.
 */
final class Books {
    private final ChamberNetwork network;
    private final Terms terms;
    private final double[] totals;
    private final LotRecorder[] lots;
    private final double startLayersJ;
    private final double startStructureJ;
    private final double startAirJ;
    private final double startAirKg;
    private double mixedJ;
    private double mixedKg;

    Books(ChamberNetwork network, double[] y, double[] totals, LotRecorder[] lots) {
        this.network = network;
        this.terms = network.terms();
        this.totals = totals;
        this.lots = lots;
        startLayersJ = network.layersJ(y);
        startStructureJ = network.structureJ(y);
        startAirJ = network.air().heatJ(y);
        startAirKg = network.air().vapourKg(y);
    }

    /** Air drawn in or pushed out by lots that come and go, J and kg. */
    void mixed(double[] heatAndWater) {
        mixedJ += heatAndWater[0];
        mixedKg += heatAndWater[1];
    }

    HeatLedger heat(double[] y) {
        double packagesJ = startStructureJ - network.structureJ(y);
        double fieldHeat = 0;
        double respiration = 0;
        for (LotRecorder lot : lots) {
            LotAmounts gave = lot.amounts(y, totals);
            packagesJ += gave.packageJ();
            fieldHeat += gave.fleshJ() + gave.liquidJ();
            respiration += gave.respirationJ();
        }
        return new HeatLedger(
                terms.walls(totals),
                terms.door(totals) + mixedJ,
                terms.leakage(totals),
                terms.freshAir(totals),
                fieldHeat,
                respiration,
                terms.fans(totals),
                terms.lights(totals),
                terms.people(totals),
                packagesJ,
                terms.defrost(totals),
                terms.humidifier(totals),
                terms.heater(totals),
                terms.pumps(totals),
                startAirJ - network.air().heatJ(y),
                terms.removed(totals),
                terms.electricity(totals));
    }

    WaterLedger water(double[] y) {
        double evaporated = 0;
        double packagesKg = 0;
        double respiration = 0;
        for (LotRecorder lot : lots) {
            LotAmounts gave = lot.amounts(y, totals);
            evaporated += gave.evaporatedKg();
            packagesKg += gave.packageKg();
            respiration += gave.respirationJ();
        }
        return new WaterLedger(
                evaporated,
                packagesKg,
                terms.doorVapour(totals) + mixedKg,
                terms.leakageVapour(totals),
                terms.freshAirVapour(totals),
                terms.peopleVapour(totals),
                terms.humidifierWater(totals),
                terms.wallVapour(totals) - terms.mist(totals),
                -terms.removedVapour(totals),
                startAirKg - network.air().vapourKg(y),
                respiration / BurntSugar.JOULE_PER_KG_CO2 * BurntSugar.WATER_KG_PER_KG_CO2,
                terms.ranOff(totals) + terms.mist(totals));
    }

    /** Error of the heat balance of the layers, share of what entered them. */
    double layersError(double[] y) {
        double stored = network.layersJ(y) - startLayersJ;
        double entered = Math.abs(terms.fromBeyond(totals)) + Math.abs(stored);
        return entered > 0 ? Math.abs(terms.intoLayers(totals) - stored) / entered : 0;
    }
}
