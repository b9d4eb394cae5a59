package org.wardon.advice.forecast;

import java.util.ArrayList;
import java.util.Collection;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.wardon.heat.Course;
import org.wardon.heat.LotCourse;

/** Joins what lots went through in the chambers they were carried to. */
final class Legs {
    private Legs() {}

    /** The course of every lot over all chambers it stood in, by id. */
    static Map<String, LotCourse> joined(Collection<Course> courses) {
        Map<String, List<LotCourse>> legs = new LinkedHashMap<>();
        for (Course course : courses) {
            for (LotCourse lot : course.lots()) {
                legs.computeIfAbsent(lot.stay().lot().id(), id -> new ArrayList<>()).add(lot);
            }
        }
        Map<String, LotCourse> lots = new LinkedHashMap<>();
        legs.forEach(
                (id, parts) -> {
                    parts.sort(Comparator.comparingDouble(leg -> leg.stay().arrivesS()));
                    lots.put(id, LotCourse.joined(parts));
                });
        return lots;
    }
}
