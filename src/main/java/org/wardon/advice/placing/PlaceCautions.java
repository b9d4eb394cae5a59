package org.wardon.advice.placing;

import java.util.ArrayList;
import java.util.List;
import org.wardon.advice.forecast.Tried;
import org.wardon.plan.ChamberPlan;
import org.wardon.produce.Reason;

/** Cautions that go with a placing. */
final class PlaceCautions {
    /** Carbon dioxide from which on a door is opened before anybody goes in, ppm. */
    private static final double DANGER_PPM = 14_000;

    private PlaceCautions() {}

    static List<Reason> of(Tried tried) {
        List<Reason> cautions = new ArrayList<>();
        for (ChamberPlan chamber : tried.plan().chambers()) {
            var course = tried.chambers().get(chamber.id());
            if (course != null && course.counts().co2HighestPpm() >= DANGER_PPM) {
                cautions.add(Reason.about("do-air-out", chamber.id(), "OSHA-1910"));
            }
        }
        cautions.add(new Reason("place-rest-by-advise", List.of(), List.of(), "common-practice"));
        return cautions;
    }
}
