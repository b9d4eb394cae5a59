package org.wardon.advice.placing;

import java.util.List;
import org.wardon.errors.Fault;
import org.wardon.files.json.Nearest;

/** Lots that a question names. */
final class Named {
    private Named() {}

    static void lot(String option, String given, List<String> there, List<Fault> faults) {
        if (!there.contains(given)) {
            faults.add(
                    new Fault(
                            option,
                            "",
                            "is '" + given + "', no lot of this plan",
                            Nearest.question(given, there)
                                    + "accepted: "
                                    + String.join(", ", there)));
        }
    }
}
