package org.wardon.advice.forecast;

import java.util.Map;
import org.wardon.heat.Course;
import org.wardon.heat.LotCourse;
import org.wardon.keeping.ChamberEthylene;
import org.wardon.lots.LotHistory;

/**
 * All that was computed of a store.
 *
 * @param model the store as it was run
 * @param horizonS end of the plan, s
 * @param courses chambers in full to the end of the horizon, by id
 * @param ethylene ethylene of the chambers in the plain run
 * @param histories lots in the plain run, by id, with their ethylene
 * @param fates fates of the lots, by id
 * @param cleaner what cleaner air is worth to the lots that ethylene costs days, by id
 */
record StoreOutcome(
        StoreModel model,
        double horizonS,
        Map<String, Course> courses,
        Map<String, ChamberEthylene> ethylene,
        Map<String, LotHistory> histories,
        Map<String, LotFates> fates,
        Map<String, CleanerAir.Worth> cleaner) {
    StoreOutcome {
        courses = Map.copyOf(courses);
        ethylene = Map.copyOf(ethylene);
        histories = Map.copyOf(histories);
        fates = Map.copyOf(fates);
        cleaner = Map.copyOf(cleaner);
    }

    /** Whether a lot is in the run. */
    boolean has(String lotId) {
        return fates.containsKey(lotId);
    }

    Course course(String chamberId) {
        return ById.get(courses, chamberId);
    }

    /** A lot over all chambers it stood in. */
    LotCourse lot(String lotId) {
        return ById.get(Legs.joined(courses.values()), lotId);
    }

    ChamberEthylene ethylene(String chamberId) {
        return ById.get(ethylene, chamberId);
    }

    LotHistory history(String lotId) {
        return ById.get(histories, lotId);
    }

    LotFates fates(String lotId) {
        return ById.get(fates, lotId);
    }
}
