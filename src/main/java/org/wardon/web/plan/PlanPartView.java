package org.wardon.web.plan;

import java.util.List;
import java.util.Optional;
import org.wardon.web.pages.Paging;
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
 * @param faults faults of the plan, those of this page first, each with a link to its field
 * @param count how many faults the plan has
 * @param moreFaults where the others are to be found; absent where all are listed
 * @param part which part of a long list is shown; absent on other pages
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
        int count,
        Optional<Link> moreFaults,
        Optional<ListPart> part,
        List<EntryView> entries,
        List<Suggestions.Named> suggestions,
        Optional<FaceView> face,
        boolean weather,
        List<String> files) {
    /**
     * Which part of a long list is shown.
     *
     * @param told which of how many, in words
     * @param paging the parts
     * @param other a link to all of it or to those with faults; absent where there are none
     */
    public record ListPart(String told, Paging paging, Optional<Link> other) {}

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
