package org.wardon.web.door;

import java.util.List;
import java.util.Optional;
import org.wardon.web.pages.FieldView;
import org.wardon.web.pages.RangeView;

/**
 * The page at the door.
 *
 * @param plan number of the plan
 * @param version version of the plan the answer was made from
 * @param troubles what cannot be answered, or was changed meanwhile
 * @param asked whether a question is asked
 * @param crops crops that may be meant, to be picked from
 * @param needed the three fields that are enough
 * @param more what may be told besides
 * @param ripeness stages to pick; none where the crop has none
 * @param packed packages to pick
 * @param waits whether the store is still being worked out
 * @param answer the answer; absent where nothing was asked
 * @param typed what was typed, to be sent again
 */
public record DoorView(
        long plan,
        int version,
        List<String> troubles,
        boolean asked,
        List<CropLink> crops,
        List<FieldView> needed,
        List<FieldView> more,
        List<Pick> ripeness,
        List<Pick> packed,
        boolean waits,
        Optional<Answer> answer,
        List<Typed> typed) {
    /** Copies the lists. */
    public DoorView {
        troubles = List.copyOf(troubles);
        crops = List.copyOf(crops);
        needed = List.copyOf(needed);
        more = List.copyOf(more);
        ripeness = List.copyOf(ripeness);
        packed = List.copyOf(packed);
        typed = List.copyOf(typed);
    }

    /**
     * A crop that may be meant.
     *
     * @param name its name and the name that was met
     * @param href the same question about it
     */
    public record CropLink(String name, String href) {}

    /**
     * One of several.
     *
     * @param word what is sent
     * @param name its name
     * @param drawn its picture as a path, 48 by 48; blank for none
     * @param taken whether it is picked
     */
    public record Pick(String word, String name, String drawn, boolean taken) {}

    /**
     * A field as it was typed.
     *
     * @param name of the field
     * @param value what was typed
     */
    public record Typed(String name, String value) {}

    /**
     * The answer.
     *
     * @param sentence what to do
     * @param choices all choices, best first
     * @param assumed what was taken as nobody said
     * @param notes what to know of the lot
     * @param cautions what to beware of
     * @param rests what the ranges rest on
     */
    public record Answer(
            String sentence,
            List<Choice> choices,
            List<Told> assumed,
            List<Told> notes,
            List<String> cautions,
            String rests) {
        /** Copies the lists. */
        public Answer {
            choices = List.copyOf(choices);
            assumed = List.copyOf(assumed);
            notes = List.copyOf(notes);
            cautions = List.copyOf(cautions);
        }
    }

    /**
     * A sentence and what it rests on.
     *
     * @param text the sentence
     * @param source id of its source
     */
    public record Told(String text, String source) {}

    /**
     * One thing that can be done.
     *
     * @param name what it is called
     * @param chamber id of the chamber; blank where there is none
     * @param verdict {@code good}, {@code tolerable} or {@code no}
     * @param verdictName the verdict in words
     * @param best whether it stands first
     * @param why one sentence of reason; blank for the best, whose sentence leads the page
     * @param days days left
     * @param limit what ends them
     * @param facts what happens in short sentences
     * @param reasons what speaks against it
     */
    public record Choice(
            String name,
            String chamber,
            String verdict,
            String verdictName,
            boolean best,
            String why,
            RangeView days,
            String limit,
            List<String> facts,
            List<Told> reasons) {
        /** Copies the lists. */
        public Choice {
            facts = List.copyOf(facts);
            reasons = List.copyOf(reasons);
        }
    }
}
