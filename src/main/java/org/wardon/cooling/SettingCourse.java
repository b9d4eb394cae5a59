package org.wardon.cooling;

import java.util.List;
import java.util.stream.Stream;
import org.wardon.errors.Require;

/**
 * What the keeper dials in over a run: one setting, and others from later times on.
 *
 * @param first in force from the start
 * @param changes in order of time, no two at one time; none for one setting throughout
 */
public record SettingCourse(Setting first, List<Change> changes) {
    /**
     * Another setting.
     *
     * @param atS from when it is in force, s since the start of the run, above 0
     * @param to what is dialled in then
     */
    public record Change(double atS, Setting to) {
        /** Checks the time. */
        public Change {
            Require.that(atS > 0, "a setting changes after the start, found " + atS + " s");
        }
    }

    /** Copies the list and checks its order. */
    public SettingCourse {
        changes = List.copyOf(changes);
        for (int i = 1; i < changes.size(); i++) {
            Require.that(
                    changes.get(i).atS() > changes.get(i - 1).atS(),
                    "settings change in order of time, found one at "
                            + changes.get(i).atS()
                            + " s behind one at "
                            + changes.get(i - 1).atS()
                            + " s");
        }
    }

    /**
     * One setting throughout.
     *
     * @param setting in force from the start
     * @return the course
     */
    public static SettingCourse steady(Setting setting) {
        return new SettingCourse(setting, List.of());
    }

    /**
     * Returns the setting in force.
     *
     * @param atS time, s since the start of the run; at a change it is the new one
     * @return the setting
     */
    public Setting at(double atS) {
        Setting now = first;
        for (Change change : changes) {
            if (change.atS() > atS) {
                break;
            }
            now = change.to();
        }
        return now;
    }

    /**
     * Returns the setting that was in force until a time, as a mean of the hour before is judged.
     *
     * @param atS time, s since the start of the run; at a change it is the old one
     * @return the setting
     */
    public Setting until(double atS) {
        return at(Math.nextDown(atS));
    }

    /**
     * Returns when the setting in force at a time was dialled in.
     *
     * @param atS time, s since the start of the run
     * @return s; 0 for the first
     */
    public double sinceS(double atS) {
        return changes.stream().mapToDouble(Change::atS).filter(at -> at <= atS).max().orElse(0);
    }

    /**
     * Returns when the next setting is dialled in.
     *
     * @param atS time, s since the start of the run
     * @return s; infinite where none follows
     */
    public double nextS(double atS) {
        return changes.stream()
                .mapToDouble(Change::atS)
                .filter(at -> at > atS)
                .min()
                .orElse(Double.POSITIVE_INFINITY);
    }

    /**
     * Returns the settings in force at some time of a span, in order of time.
     *
     * @param fromS start, s since the start of the run
     * @param untilS end, s
     * @return at least one
     */
    public List<Setting> within(double fromS, double untilS) {
        Stream<Setting> later =
                changes.stream()
                        .filter(change -> change.atS() > fromS && change.atS() < untilS)
                        .map(Change::to);
        return Stream.concat(Stream.of(at(fromS)), later).toList();
    }

    /**
     * Returns the lowest temperature dialled in at some time of a span.
     *
     * @param fromS start, s since the start of the run
     * @param untilS end, s
     * @return °C
     */
    public double coldestC(double fromS, double untilS) {
        return within(fromS, untilS).stream()
                .mapToDouble(Setting::temperatureC)
                .min()
                .orElse(first.temperatureC());
    }

    /**
     * Returns the highest temperature dialled in at some time of a span.
     *
     * @param fromS start, s since the start of the run
     * @param untilS end, s
     * @return °C
     */
    public double warmestC(double fromS, double untilS) {
        return within(fromS, untilS).stream()
                .mapToDouble(Setting::temperatureC)
                .max()
                .orElse(first.temperatureC());
    }

    /**
     * Returns the mean of the temperature dialled in.
     *
     * @param durationS from the start to here, s, above 0
     * @return °C
     */
    public double meanC(double durationS) {
        double rest = 0;
        for (Change change : changes) {
            double before = until(change.atS()).temperatureC();
            rest += Math.max(durationS - change.atS(), 0) * (change.to().temperatureC() - before);
        }
        return first.temperatureC() + rest / durationS;
    }
}
