package org.wardon.keeping;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import org.wardon.errors.Require;
import org.wardon.keeping.ethylene.ChamberAir;
import org.wardon.lots.LotHistory;

/**
 * The ethylene of all chambers of a store and the ripening of their lots, worked out together in
 * one draw: each lot gives off at its own temperature and stage into the chamber where it stands,
 * doors and leakage carry it away, and a green fruit that begins to ripen gives off more from then
 * on, wherever it goes.
 */
public final class StoreEthylene {
    private final Map<String, ChamberEthylene> chambers = new HashMap<>();
    private final Map<String, LotHistory> histories = new HashMap<>();
    private final Map<String, Double> ripensS = new HashMap<>();

    private StoreEthylene() {}

    /**
     * Steps the chambers through a run.
     *
     * @param air exchange and free volume of each chamber over the run, by id; at the same times
     *     for chambers that a lot moves between
     * @param lots the lots, present from the start of their history until they leave
     * @param outdoorPpm ethylene of the air that comes in, µL/L
     * @param draw the draw
     * @return levels, completed histories and times at which ripening begins
     */
    public static StoreEthylene of(
            Map<String, ChamberAir> air, List<Giver> lots, double outdoorPpm, Draw draw) {
        StoreEthylene store = new StoreEthylene();
        Set<String> linked = new TreeSet<>();
        for (Giver giver : lots) {
            if (giver.places().size() > 1) {
                giver.places().forEach(place -> linked.add(place.chamber()));
            }
        }
        if (!linked.isEmpty()) {
            store.step(linked, air, lots, outdoorPpm, draw);
        }
        for (String id : air.keySet()) {
            if (!linked.contains(id)) {
                store.step(Set.of(id), air, lots, outdoorPpm, draw);
            }
        }
        return store;
    }

    /** Steps chambers that lots move between, or one by itself. */
    private void step(
            Set<String> ids,
            Map<String, ChamberAir> air,
            List<Giver> lots,
            double outdoorPpm,
            Draw draw) {
        Map<String, ChamberAir> among = new HashMap<>(air);
        among.keySet().retainAll(ids);
        List<Giver> here =
                lots.stream().filter(lot -> ids.contains(lot.places().get(0).chamber())).toList();
        Steps steps = new Steps(among, here, outdoorPpm, draw);
        for (int c = 0; c < steps.ids.size(); c++) {
            chambers.put(steps.ids.get(c), new ChamberEthylene(steps.timeS, steps.ppm[c]));
        }
        for (int i = 0; i < here.size(); i++) {
            String id = here.get(i).model().lot().id();
            histories.put(id, felt(here.get(i)));
            ripensS.put(id, steps.stepped.get(i).ripensS());
        }
    }

    private LotHistory felt(Giver giver) {
        LotHistory history = giver.history();
        double[] felt = new double[history.size()];
        for (int i = 0; i < felt.length; i++) {
            felt[i] = chamber(giver.standsIn(history.timeS(i))).ppmAt(history.timeS(i));
        }
        return history.withEthylene(felt);
    }

    /**
     * Returns the level in a chamber.
     *
     * @param id its id
     * @return its level over the run
     */
    public ChamberEthylene chamber(String id) {
        return Optional.ofNullable(chambers.get(id)).orElseThrow();
    }

    /**
     * Returns the levels of all chambers.
     *
     * @return by id
     */
    public Map<String, ChamberEthylene> chambers() {
        return Map.copyOf(chambers);
    }

    /**
     * Returns the histories of the lots with their ethylene.
     *
     * @return by id
     */
    public Map<String, LotHistory> histories() {
        return Map.copyOf(histories);
    }

    /**
     * Returns when a green lot began to ripen.
     *
     * @param lotId its id
     * @return s, infinite where it did not
     */
    public double ripensS(String lotId) {
        return Optional.ofNullable(ripensS.get(lotId)).orElseThrow();
    }

    /** The chambers side by side, a step at a time. */
    private static final class Steps {
        private final List<String> ids;
        private final List<ChamberAir> air;
        private final List<RipeningLot> stepped = new ArrayList<>();
        private final double[] timeS;
        private final double[][] ppm;
        private final double[] given;

        Steps(Map<String, ChamberAir> chambers, List<Giver> lots, double outdoorPpm, Draw draw) {
            ids = List.copyOf(chambers.keySet());
            air =
                    ids.stream()
                            .map(id -> Optional.ofNullable(chambers.get(id)).orElseThrow())
                            .toList();
            timeS = times();
            ppm = new double[ids.size()][timeS.length];
            given = new double[ids.size()];
            for (double[] level : ppm) {
                level[0] = outdoorPpm;
            }
            lots.forEach(giver -> stepped.add(new RipeningLot(giver, draw)));
            for (int i = 0; i + 1 < timeS.length; i++) {
                step(i, lots, outdoorPpm);
            }
        }

        private double[] times() {
            double[] times = new double[air.get(0).size()];
            for (int i = 0; i < times.length; i++) {
                times[i] = air.get(0).timeS(i);
            }
            for (ChamberAir other : air) {
                Require.that(
                        other.size() == times.length
                                && other.timeS(times.length - 1) == times[times.length - 1],
                        "chambers of one store are stepped at the same times");
            }
            return times;
        }

        private void step(int i, List<Giver> lots, double outdoorPpm) {
            double middleS = 0.5 * (timeS[i] + timeS[i + 1]);
            Arrays.fill(given, 0);
            for (int k = 0; k < lots.size(); k++) {
                int where = ids.indexOf(lots.get(k).standsIn(middleS));
                given[where] += stepped.get(k).microlitrePerHour(middleS);
            }
            for (int c = 0; c < given.length; c++) {
                ppm[c][i + 1] = air.get(c).after(i, ppm[c][i], given[c], outdoorPpm);
            }
            for (int k = 0; k < lots.size(); k++) {
                int where = ids.indexOf(lots.get(k).standsIn(middleS));
                stepped.get(k).feel(timeS[i], timeS[i + 1], ppm[where][i + 1]);
            }
        }
    }
}
