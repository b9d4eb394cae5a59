package org.wardon.heat;

import java.util.ArrayList;
import java.util.List;

/** Collects spans in which something held. */
final class Spans {
    private final CourseEvent.Kind kind;
    private final String subject;
    private final List<CourseEvent> closed = new ArrayList<>();
    private double from = Double.NaN;

    Spans(CourseEvent.Kind kind, String subject) {
        this.kind = kind;
        this.subject = subject;
    }

    void is(double t, boolean holds) {
        if (holds && Double.isNaN(from)) {
            from = t;
        } else if (!holds && !Double.isNaN(from)) {
            closed.add(new CourseEvent(kind, subject, from, t));
            from = Double.NaN;
        }
    }

    List<CourseEvent> until(double end) {
        is(end, false);
        return closed;
    }
}
