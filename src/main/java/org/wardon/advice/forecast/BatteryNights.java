package org.wardon.advice.forecast;

import java.time.LocalDateTime;
import java.time.temporal.ChronoUnit;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.wardon.air.Timeline;
import org.wardon.cooling.Outage;
import org.wardon.heat.Course;
import org.wardon.heat.CourseEvent;
import org.wardon.produce.Reason.Argument;

/** When the battery of a chamber ran out, and for how long. */
final class BatteryNights {
    private BatteryNights() {}

    private static Stream<CourseEvent> events(Course course) {
        return course.events().stream()
                .filter(event -> event.kind() == CourseEvent.Kind.BATTERY_EMPTY);
    }

    /** The first time it ran out. */
    static Optional<CourseEvent> first(Course course) {
        return events(course).findFirst();
    }

    /** Spans without power for any reason. */
    static List<Outage> with(List<Outage> outages, Course course) {
        List<Outage> all = new ArrayList<>(outages);
        events(course)
                .filter(event -> event.untilS() > event.fromS())
                .forEach(event -> all.add(new Outage(event.fromS(), event.untilS())));
        return Outage.joined(all);
    }

    /** Hours without power in all. */
    static double hours(Course course) {
        return events(course).mapToDouble(event -> event.untilS() - event.fromS()).sum()
                / Timeline.HOUR_S;
    }

    /** Local time at which a span begins, to the minute. */
    static LocalDateTime time(CourseEvent event, StoreOutcome outcome) {
        return time(event.fromS(), outcome);
    }

    private static LocalDateTime time(double seconds, StoreOutcome outcome) {
        return outcome.model().plan().timeline().localAt(seconds).truncatedTo(ChronoUnit.MINUTES);
    }

    /** The same in words. */
    static Argument at(CourseEvent event, StoreOutcome outcome) {
        return at(event.fromS(), outcome);
    }

    /** A time of the run in words, to the minute. */
    static Argument at(double seconds, StoreOutcome outcome) {
        LocalDateTime at = time(seconds, outcome);
        return Argument.text(at.toLocalDate() + " at " + at.toLocalTime());
    }
}
