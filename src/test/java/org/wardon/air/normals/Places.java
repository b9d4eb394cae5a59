package org.wardon.air.normals;

import java.time.ZoneId;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.wardon.air.Site;
import org.wardon.reference.ClimateMonth;
import org.wardon.reference.ReferenceBook;

/** The places of the table of climate normals, each row with its source there. */
final class Places {
    private static final double MJ_PER_KWH = 3.6;

    private Places() {}

    /** A place and its normals. */
    record Place(String name, Site site, MonthlyNormals normals) {}

    static List<Place> all() {
        Map<String, List<ClimateMonth>> rows = new LinkedHashMap<>();
        try (ReferenceBook book = ReferenceBook.open()) {
            for (ClimateMonth month : book.climate()) {
                rows.computeIfAbsent(month.place(), any -> new ArrayList<>()).add(month);
            }
        }
        return rows.values().stream().map(Places::of).toList();
    }

    static Place named(String name) {
        return all().stream().filter(place -> place.name().equals(name)).findFirst().orElseThrow();
    }

    private static Place of(List<ClimateMonth> months) {
        ClimateMonth first = months.get(0);
        // Whole hours from Greenwich, as zones are; the solar day is then not quite the clock's.
        int hours = (int) Math.rint(first.longitudeDeg() / 15);
        Site site =
                new Site(
                        first.latitudeDeg(),
                        first.longitudeDeg(),
                        first.elevationM(),
                        ZoneId.of(String.format("UTC%+03d:00", hours)));
        return new Place(first.place(), site, normals(months));
    }

    private static MonthlyNormals normals(List<ClimateMonth> months) {
        return new MonthlyNormals(
                months.stream().map(ClimateMonth::dailyMaxC).toList(),
                months.stream().map(ClimateMonth::dailyMinC).toList(),
                // Two places have no humidity in print: any will do to hold it against.
                months.stream().map(m -> m.humidityPct().orElse(60)).toList(),
                months.get(0).globalMJm2Day().isEmpty()
                        ? Optional.empty()
                        : Optional.of(
                                months.stream()
                                        .map(m -> m.globalMJm2Day().orElseThrow() / MJ_PER_KWH)
                                        .toList()));
    }
}
