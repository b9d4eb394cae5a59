package org.wardon.files;

import java.util.Collection;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.wardon.files.json.Faults;
import org.wardon.files.json.Json;
import org.wardon.files.json.Nearest;
import org.wardon.files.json.Part;

/** Ids that stand twice or name nothing. */
final class IdRules {
    private static final int LISTED = 12;

    private final Faults faults;

    IdRules(Faults faults) {
        this.faults = faults;
    }

    /** Each id once. */
    void unique(List<Part> parts, String what) {
        Map<String, String> seen = new HashMap<>();
        for (Part part : parts) {
            Part id = part.at("id");
            if (id.text().isPresent()) {
                String first = seen.putIfAbsent(id.text().get(), part.path());
                if (first != null) {
                    faults.add(
                            id.path(),
                            "is " + Json.quoted(id.text().get()) + ", the id of " + first + " too",
                            "accepted: an id of its own for each " + what);
                }
            }
        }
    }

    /** A text must be the id of a chamber; not asked where the chambers' own ids are in doubt. */
    void chamber(Part part, Part plan) {
        List<Part> chambers = plan.at("chambers").items();
        List<String> known = chambers.stream().flatMap(c -> c.at("id").text().stream()).toList();
        if (!known.isEmpty() && known.size() == chambers.size()) {
            known(part, known, "chamber of this plan");
        }
    }

    /** A text must be one of the known ids. */
    void known(Part part, Collection<String> ids, String what) {
        if (part.text().isPresent()
                && !ids.contains(part.text().get())
                && !faults.at(part.path())) {
            String id = part.text().get();
            faults.add(
                    part.path(),
                    "is " + Json.quoted(id) + ", no " + what,
                    Nearest.question(id, ids) + "accepted: " + some(ids, what));
        }
    }

    private static String some(Collection<String> ids, String what) {
        if (ids.isEmpty()) {
            return "none, there is no " + what;
        }
        return ids.size() <= LISTED
                ? String.join(", ", ids.stream().sorted().toList())
                : "one of " + ids.size() + " ids, see the tables";
    }
}
