package org.wardon.web.chamber;

import java.util.List;
import java.util.Locale;
import org.wardon.files.forecast.HourlySeries;

/** The terms of the heat budget as they are drawn: few bands, each of terms that go together. */
enum HeatTerms {
    /** Through the faces. */
    WALLS("walls", "M0 6L6 0"),
    /** With air that comes in. */
    OUTSIDE_AIR("door leakage freshAir", "M1 3h2M4 0h1"),
    /** Field heat of lots. */
    FIELD_HEAT("fieldHeat", "M0 3h6"),
    /** Respiration of lots. */
    RESPIRATION("respiration", ""),
    /** Machines and people. */
    INSIDE("fans lights people defrost humidifier heater pumps", "M3 0v6"),
    /** What packages, structure and air give up; below nothing while they warm. */
    STORED("packages air", "M0 6L6 0M0 0L6 6");

    private final String terms;
    private final String hatching;

    /** Terms by their names in the forecast, a space between; the pattern's lines, 6 by 6. */
    HeatTerms(String terms, String hatching) {
        this.terms = terms;
        this.hatching = hatching;
    }

    /** Lines of its pattern, a path within 6 by 6. */
    String hatching() {
        return hatching;
    }

    /** Id of its pattern. */
    String id() {
        return "band-" + word();
    }

    private String word() {
        return name().toLowerCase(Locale.ROOT).replace('_', '-');
    }

    /** Key of its word. */
    String key() {
        return "heat." + word();
    }

    /** Mean power of the band from one row to another, W. */
    double meanW(HourlySeries heat, int from, int to) {
        double sum = 0;
        for (String term : List.of(terms.split(" "))) {
            List<Double> values = heat.column(term).orElse(List.of());
            for (int i = from; i < to && i < values.size(); i++) {
                sum += Double.isFinite(values.get(i)) ? values.get(i) : 0;
            }
        }
        return sum / (to - from);
    }
}
