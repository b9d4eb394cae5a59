package org.wardon.web.plan;

import java.util.List;
import java.util.Optional;
import org.wardon.web.pages.TableView;

/**
 * One page of a plan that is being changed.
 *
 * @param plan number of the plan
 * @param version version the form starts from
 * @param path JSON path of what it shows
 * @param title its name
 * @param hint what it is
 * @param crumbs the way up
 * @param clash what stands otherwise by now; absent unless a save came too late
 * @param faults all faults of the plan, each with a link to its field
 * @param entries the form
 * @param suggestions ids its fields may name
 * @param face how the face conducts; absent for other places
 * @param weather whether a weather file can be brought here
 * @param files names of files kept with the plan
 */
public record PlanPartView(
        long plan,
        int version,
        String path,
        String title,
        String hint,
        List<Link> crumbs,
        Optional<Clash> clash,
        List<Link> faults,
        List<EntryView> entries,
        List<Suggestions.Named> suggestions,
        Optional<FaceView> face,
        boolean weather,
        List<String> files) {
    /**
     * A link.
     *
     * @param href where to
     * @param text what stands there
     */
    public record Link(String href, String text) {}

    /**
     * What two people changed.
     *
     * @param note what the other change was, in a line
     * @param table each field: yours, and what stands now
     */
    public record Clash(String note, TableView table) {}

    /**
     * How a face conducts.
     *
     * @param svg its section; blank where it has a fault
     * @param told its transmittance and lag, a line each
     * @param layers its layers and films
     */
    public record FaceView(String svg, List<String> told, Optional<TableView> layers) {}
}
