package org.wardon.web.placing;

import java.util.List;
import java.util.Optional;
import org.wardon.errors.Fault;
import org.wardon.web.pages.FieldView;

/**
 * The page that shows any lots and crops on one ruler.
 *
 * @param plan number of the plan
 * @param faults faults of the plan; empty where it can be run
 * @param wrong what is wrong with what was asked
 * @param groups lots to be ticked, chamber by chamber
 * @param fields crops and their days
 * @param ruler the ruler; absent where nobody was named
 */
public record SharingView(
        long plan,
        List<Fault> faults,
        List<Fault> wrong,
        List<Group> groups,
        List<FieldView> fields,
        Optional<RulerView> ruler) {
    /** Copies the lists. */
    public SharingView {
        faults = List.copyOf(faults);
        wrong = List.copyOf(wrong);
        groups = List.copyOf(groups);
        fields = List.copyOf(fields);
    }

    /**
     * Lots of one chamber.
     *
     * @param name the chamber, or that they have none
     * @param href the ruler of all of them
     * @param lots the lots
     * @param open whether one of them is ticked
     */
    public record Group(String name, String href, List<PlacingView.Pick> lots, boolean open) {
        /** Copies the list. */
        public Group {
            lots = List.copyOf(lots);
        }
    }
}
