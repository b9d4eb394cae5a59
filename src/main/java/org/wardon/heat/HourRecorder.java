package org.wardon.heat;

import java.util.EnumMap;
import java.util.Map;
import java.util.Objects;
import org.wardon.air.MoistAir;
import org.wardon.heat.network.ChamberNetwork;
import org.wardon.heat.network.Terms;

/** Writes down the chamber's hours. */
final class HourRecorder {
    /** Less water than this in a span has no temperature of its own, kg. */
    private static final double LEAST_WATER_KG = 1e-6;

    private final ChamberNetwork network;
    private final Terms terms;
    private final Map<Hours.Column, double[]> columns = new EnumMap<>(Hours.Column.class);
    private int size;
    private double lastS;
    private double lastAir;
    private double lastDoorEnd;
    private double lastRemoved;
    private double lastElectricity;
    private double lastExchanged;
    private double lastRespiration;
    private double lastWaterKg;
    private double lastOutletJ;
    private double lastUsedKg;
    private final double[][] ran;
    private final double[] lastRan;
    private double lastPanel;
    private double lowest = Double.POSITIVE_INFINITY;
    private double highest = Double.NEGATIVE_INFINITY;
    private double supply = Double.NaN;
    private double blownS;
    private double chilledKS;

    HourRecorder(ChamberNetwork network, int mostRows) {
        this.network = network;
        this.terms = network.terms();
        for (Hours.Column column : Hours.Column.values()) {
            columns.put(column, new double[mostRows]);
        }
        ran = new double[network.coolerCount()][mostRows];
        lastRan = new double[network.coolerCount()];
    }

    void stepped(double from, double to, double[] y) {
        double airC = network.airC(y);
        lowest = Math.min(lowest, airC);
        highest = Math.max(highest, airC);
        double blows = 0;
        double chillK = 0;
        for (int i = 0; i < network.coolerCount(); i++) {
            double leaves = network.cooler(i).effect().supplyC;
            if (Double.isNaN(supply) || leaves < supply) {
                supply = leaves;
            }
            blows = Math.max(blows, network.cooler(i).blows());
            chillK = Math.max(chillK, network.cooler(i).chillK(airC));
        }
        blownS += blows * (to - from);
        chilledKS += chillK * (to - from);
    }

    private void set(Hours.Column column, double value) {
        column(column)[size] = value;
    }

    /** Tells the ice there is for the next row, kg. */
    void ice(double leftKg) {
        set(Hours.Column.ICE_KG, leftKg);
    }

    /** Writes a row; {@code respirationJ} is what the lots present gave off since the start. */
    void row(double t, double[] y, double[] totals, double respirationJ, double co2Ppm) {
        double span = t - lastS;
        double airC = network.airC(y);
        set(Hours.Column.AT_S, t);
        double meanC = (terms.airC(totals) - lastAir) / span;
        set(Hours.Column.AIR_C, meanC);
        // Between the ends of steps the air may have been a little beyond them.
        set(Hours.Column.AIR_LOWEST_C, Math.min(Math.min(lowest, airC), meanC));
        set(Hours.Column.AIR_HIGHEST_C, Math.max(Math.max(highest, airC), meanC));
        set(Hours.Column.DOOR_END_C, (terms.doorEndC(totals) - lastDoorEnd) / span);
        set(
                Hours.Column.DOOR_END_HUMIDITY,
                network.air().hasDoorEnd() ? network.air().doorEndHumidityFraction(y) : Double.NaN);
        set(Hours.Column.HUMIDITY, network.humidityFraction(y));
        set(Hours.Column.OUTDOOR_C, network.outdoorC());
        set(Hours.Column.COOLING_W, (terms.removed(totals) - lastRemoved) / span);
        set(
                Hours.Column.POWER_W,
                nothingAtLeast(terms.electricity(totals) - lastElectricity) / span);
        set(Hours.Column.CO2_PPM, co2Ppm);
        set(
                Hours.Column.EXCHANGE_M3S,
                network.cubicMetres(
                        nothingAtLeast(terms.exchanged(totals) - lastExchanged) / span));
        set(Hours.Column.FREE_M3, network.freeM3());
        set(Hours.Column.SUPPLY_C, supply);
        set(Hours.Column.BLOWS, blownS / span);
        set(Hours.Column.CHILL_K, chilledKS / span);
        set(Hours.Column.HUMIDITY_RATIO, network.ratio(y));
        set(Hours.Column.RESPIRATION_W, (respirationJ - lastRespiration) / span);
        set(Hours.Column.WATER_OUT_C, waterOutC(totals));
        set(Hours.Column.WATER_USED_KG, terms.waterUsed(totals) - lastUsedKg);
        for (int k = 0; k < ran.length; k++) {
            double ranS = terms.ranS(k, totals);
            ran[k][size] = Math.min(nothingAtLeast(ranS - lastRan[k]) / span, 1);
            lastRan[k] = ranS;
        }
        size++;
        startSpan(t, totals, respirationJ);
        lowest = airC;
        highest = airC;
    }

    /** What fades out within the band is summed to the solver's error, to either side of 0. */
    private static double nothingAtLeast(double sum) {
        return Math.max(sum, 0);
    }

    private double waterOutC(double[] totals) {
        double kg = terms.facesWaterKg(totals) - lastWaterKg;
        double joule = terms.facesOutletJ(totals) - lastOutletJ;
        return kg > LEAST_WATER_KG ? joule / (kg * MoistAir.WATER_J_KG_K) : Double.NaN;
    }

    /** Adds panels and battery to the row written last. */
    void supply(double panelJ, double share) {
        int row = size - 1;
        double[] atS = column(Hours.Column.AT_S);
        double span = row == 0 ? atS[0] : atS[row] - atS[row - 1];
        column(Hours.Column.PANEL_W)[row] = (panelJ - lastPanel) / span;
        column(Hours.Column.BATTERY)[row] = share;
        lastPanel = panelJ;
    }

    private double[] column(Hours.Column column) {
        return Objects.requireNonNull(columns.get(column));
    }

    private void startSpan(double t, double[] totals, double respirationJ) {
        lastS = t;
        lastAir = terms.airC(totals);
        lastDoorEnd = terms.doorEndC(totals);
        lastRemoved = terms.removed(totals);
        lastElectricity = terms.electricity(totals);
        lastExchanged = terms.exchanged(totals);
        lastRespiration = respirationJ;
        lastWaterKg = terms.facesWaterKg(totals);
        lastOutletJ = terms.facesOutletJ(totals);
        lastUsedKg = terms.waterUsed(totals);
        supply = Double.NaN;
        blownS = 0;
        chilledKS = 0;
    }

    Hours hours() {
        return new Hours(columns, ran, size);
    }
}
