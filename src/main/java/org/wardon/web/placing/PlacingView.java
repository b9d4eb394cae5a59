package org.wardon.web.placing;

import java.util.List;
import java.util.Optional;
import org.wardon.errors.Fault;
import org.wardon.web.pages.ProgressView;
import org.wardon.web.pages.RangeView;
import org.wardon.web.pages.TableView;

/**
 * The page that seeks a placing.
 *
 * @param plan number of the plan
 * @param version its version
 * @param query what is sought, as it stands in the address; blank where nothing is
 * @param faults faults of the plan; empty where it can be run
 * @param first what to do first where there is nothing to place; absent where there is
 * @param form the wishes; absent where there is nothing to place
 * @param progress how far the work is; absent where none is done
 * @param stopped why there is no placing; absent where there is no reason to say
 * @param clash what the plan says by now against what was to be taken over; absent in peace
 * @param result the placing; absent where there is none
 * @param before placings that were found for the plan as it stands
 */
public record PlacingView(
        long plan,
        int version,
        String query,
        List<Fault> faults,
        Optional<First> first,
        Optional<Form> form,
        Optional<ProgressView> progress,
        Optional<String> stopped,
        Optional<Clash> clash,
        Optional<Result> result,
        List<Link> before) {
    /** Copies the lists. */
    public PlacingView {
        faults = List.copyOf(faults);
        before = List.copyOf(before);
    }

    /**
     * What to do first.
     *
     * @param text a sentence
     * @param links where to do it
     */
    public record First(String text, List<Link> links) {
        /** Copies the list. */
        public First {
            links = List.copyOf(links);
        }
    }

    /**
     * A way to another page.
     *
     * @param href where
     * @param text what is there
     */
    public record Link(String href, String text) {}

    /**
     * The wishes.
     *
     * @param aims what may come first
     * @param lots lots whose days may come first
     * @param moves which lots may be moved
     * @param fault what is wrong with them; blank where nothing is
     * @param days whether days of some lots come first
     * @param accepted conflicts the plan accepts, a sentence for all chambers or one
     */
    public record Form(
            List<Pick> aims,
            List<Pick> lots,
            List<Pick> moves,
            String fault,
            boolean days,
            List<String> accepted) {
        /** Copies the lists. */
        public Form {
            aims = List.copyOf(aims);
            accepted = List.copyOf(accepted);
            lots = List.copyOf(lots);
            moves = List.copyOf(moves);
        }
    }

    /**
     * Something to be chosen.
     *
     * @param word how it is sent
     * @param name how it is told
     * @param hint what it means; blank where nothing is to be said
     * @param taken whether it is chosen
     */
    public record Pick(String word, String name, String hint, boolean taken) {}

    /**
     * Both sides where somebody changed the plan meanwhile.
     *
     * @param note what was done to the plan
     * @param table what was to be taken over beside what stands by now
     */
    public record Clash(String note, TableView table) {}

    /**
     * A placing.
     *
     * @param lead what it comes to, in a sentence
     * @param sought what was sought
     * @param steps what to do
     * @param chambers present against proposed
     * @param unplaced lots without a place
     * @param many whether there are too many lots to show each twice
     * @param gain what it brings
     * @param bound how much better it could be at most, in a sentence
     * @param worth what more would be worth
     * @param rulers temperatures of the lots; empty where there are too many
     * @param rulerLinks rulers by chamber, each on a page of its own
     * @param why why each lot stands where it stands
     * @param notes what else is to be known
     * @param pages pages of the reasons
     */
    public record Result(
            String lead,
            String sought,
            List<Step> steps,
            List<Spread> chambers,
            List<Told> unplaced,
            boolean many,
            TableView gain,
            String bound,
            List<String> worth,
            List<Rulers> rulers,
            List<Link> rulerLinks,
            List<Why> why,
            List<Told> notes,
            Pages pages) {
        /** Copies the lists. */
        public Result {
            steps = List.copyOf(steps);
            chambers = List.copyOf(chambers);
            unplaced = List.copyOf(unplaced);
            worth = List.copyOf(worth);
            rulers = List.copyOf(rulers);
            rulerLinks = List.copyOf(rulerLinks);
            why = List.copyOf(why);
            notes = List.copyOf(notes);
        }
    }

    /**
     * A step of the walk.
     *
     * @param text what to do
     * @param about the lot it is about, in a few words; blank for a chamber
     */
    public record Step(String text, String about) {}

    /**
     * Pages of a long list.
     *
     * @param told which are shown
     * @param links the other pages, in order
     */
    public record Pages(String told, List<Link> links) {
        /** Copies the list. */
        public Pages {
            links = List.copyOf(links);
        }
    }

    /**
     * A sentence and where it comes from.
     *
     * @param text the sentence
     * @param source its source
     */
    public record Told(String text, String source) {}

    /**
     * One chamber, present against proposed.
     *
     * @param id its id
     * @param changed what is to be done to it, in words; blank where nothing is
     * @param now as the plan has it
     * @param then as proposed
     */
    public record Spread(String id, String changed, Side now, Side then) {}

    /**
     * A chamber in one arrangement.
     *
     * @param setting what is dialled in
     * @param air what its air comes to; blank where it is empty and off
     * @param holds whether it holds, in a sentence; blank where there is nothing to hold
     * @param fails whether it does not
     * @param mass how full it is by mass
     * @param room how full it is by volume
     * @param lots its lots
     * @param others ids of lots not shown, in a sentence; blank where all are
     */
    public record Side(
            String setting,
            String air,
            String holds,
            boolean fails,
            Fill mass,
            Fill room,
            List<Tag> lots,
            String others) {
        /** Copies the list. */
        public Side {
            lots = List.copyOf(lots);
        }
    }

    /**
     * How full something is.
     *
     * @param pct percent, at most 100 to be drawn
     * @param text in words
     */
    public record Fill(int pct, String text) {}

    /**
     * A lot on its tag.
     *
     * @param id its id
     * @param crop crop and mass
     * @param kind {@code stays}, {@code comes} or {@code goes}
     * @param way where it comes from or goes to; blank where it stays
     * @param days days left there
     * @param limit what ends it
     * @param before days it had before; blank on the side of the plan, or where it had none
     */
    public record Tag(
            String id,
            String crop,
            String kind,
            String way,
            RangeView days,
            String limit,
            String before) {}

    /**
     * The rulers of a chamber.
     *
     * @param id its id
     * @param rulers one where nothing changes, else the present one and the proposed one
     */
    public record Rulers(String id, List<RulerView> rulers) {
        /** Copies the list. */
        public Rulers {
            rulers = List.copyOf(rulers);
        }
    }

    /**
     * Why a lot stands where it stands.
     *
     * @param lot its id and crop
     * @param here why, in a sentence
     * @param elsewhere what other chambers would cost it
     */
    public record Why(String lot, String here, TableView elsewhere) {}
}
