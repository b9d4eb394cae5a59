package org.wardon.keeping;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.wardon.keeping.ethylene.ChamberAir;
import org.wardon.lots.LotHistory;

/**
 * The ethylene of one chamber and the ripening of its lots, worked out together in one draw: each
 * lot gives off at its own temperature and stage, doors and leakage carry it away, and a green
 * fruit that begins to ripen gives off more from then on.
 */
public final class ChamberEthylene {
    /** Ethylene of clean outdoor air, µL/L (assumption). */
    public static final double OUTDOOR_PPM = 0.01;

    /** Ethylene of a market building, µL/L; source: id wills-2000, mean of wholesale markets. */
    public static final double MARKET_PPM = 0.06;

    private final double[] timeS;
    private final double[] ppm;
    private final double[] ripensS;
    private final List<LotHistory> histories;

    private ChamberEthylene(
            double[] timeS, double[] ppm, double[] ripensS, List<LotHistory> histories) {
        this.timeS = timeS;
        this.ppm = ppm;
        this.ripensS = ripensS;
        this.histories = List.copyOf(histories);
    }

    /**
     * Steps a chamber through a run.
     *
     * @param air exchange and free volume over the run
     * @param lots the lots, present from the start of their history until they leave
     * @param outdoorPpm ethylene of the air that comes in, µL/L
     * @param draw the draw
     * @return level, completed histories and times at which ripening begins
     */
    public static ChamberEthylene of(
            ChamberAir air, List<Giver> lots, double outdoorPpm, Draw draw) {
        List<RipeningLot> stepped = new ArrayList<>();
        for (Giver giver : lots) {
            stepped.add(new RipeningLot(giver, draw));
        }
        double[] timeS = new double[air.size()];
        double[] ppm = new double[air.size()];
        timeS[0] = air.timeS(0);
        ppm[0] = outdoorPpm;
        for (int i = 0; i + 1 < air.size(); i++) {
            timeS[i + 1] = air.timeS(i + 1);
            double middleS = 0.5 * (timeS[i] + timeS[i + 1]);
            double given = 0;
            for (RipeningLot lot : stepped) {
                given += lot.microlitrePerHour(middleS);
            }
            ppm[i + 1] = air.after(i, ppm[i], given, outdoorPpm);
            for (RipeningLot lot : stepped) {
                lot.feel(timeS[i], timeS[i + 1], ppm[i + 1]);
            }
        }
        return completed(timeS, ppm, lots, stepped);
    }

    private static ChamberEthylene completed(
            double[] timeS, double[] ppm, List<Giver> lots, List<RipeningLot> stepped) {
        List<LotHistory> histories = new ArrayList<>();
        for (Giver giver : lots) {
            LotHistory history = giver.history();
            double[] felt = new double[history.size()];
            for (int i = 0; i < felt.length; i++) {
                felt[i] = at(timeS, ppm, history.timeS(i));
            }
            histories.add(history.withEthylene(felt));
        }
        double[] ripens = stepped.stream().mapToDouble(RipeningLot::ripensS).toArray();
        return new ChamberEthylene(timeS, ppm, ripens, histories);
    }

    private static double at(double[] timeS, double[] ppm, double atS) {
        int i = Arrays.binarySearch(timeS, atS);
        if (i >= 0) {
            return ppm[i];
        }
        int right = -i - 1;
        if (right == 0 || right == timeS.length) {
            return ppm[Math.min(right, timeS.length - 1)];
        }
        double share = (atS - timeS[right - 1]) / (timeS[right] - timeS[right - 1]);
        return ppm[right - 1] + share * (ppm[right] - ppm[right - 1]);
    }

    /**
     * Returns the histories of the lots with their ethylene.
     *
     * @return in the order of the lots given
     */
    public List<LotHistory> histories() {
        return histories;
    }

    /**
     * Returns the highest level of the run.
     *
     * @return µL/L
     */
    public double highestPpm() {
        return Arrays.stream(ppm).max().orElseThrow();
    }

    /**
     * Returns the level at a time.
     *
     * @param atS time, s; held beyond the ends
     * @return µL/L
     */
    public double ppmAt(double atS) {
        return at(timeS, ppm, atS);
    }

    /**
     * Returns when a green lot began to ripen.
     *
     * @param lot place in the list given
     * @return s, infinite where it did not
     */
    public double ripensS(int lot) {
        return ripensS[lot];
    }
}
