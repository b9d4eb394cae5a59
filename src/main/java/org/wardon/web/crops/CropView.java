package org.wardon.web.crops;

import java.util.List;
import java.util.Optional;
import org.wardon.web.pages.FieldView;
import org.wardon.web.pages.TableView;

/**
 * One crop.
 *
 * @param id its id
 * @param title its name
 * @param names what else people call it
 * @param variants variants that can be chosen: id and name, the chosen one first where there is one
 * @param variant the one shown; blank for the crop as a whole
 * @param variantTold what is the variant's own; blank for the crop as a whole
 * @param lead the handbook's condition in a line
 * @param life life over temperature
 * @param printed published lives
 * @param cold lowest safe temperatures
 * @param breath heat of respiration
 * @param rates published rates
 * @param ripening printed days of ripening; absent where there are none
 * @param facts facts by what they are about
 * @param sources the sources of the facts, whole
 * @param own own values
 * @param lots own lots that are gone
 * @param keep how long a lot keeps
 */
public record CropView(
        String id,
        String title,
        String names,
        List<Pick> variants,
        String variant,
        String variantTold,
        String lead,
        PictureView life,
        TableView printed,
        Optional<TableView> cold,
        PictureView breath,
        TableView rates,
        Optional<TableView> ripening,
        List<FactGroup> facts,
        List<Because> sources,
        OwnView own,
        LotsView lots,
        KeepView keep) {
    /**
     * A drawing with the table behind it.
     *
     * @param title what it shows
     * @param svg the drawing
     * @param told how to read it
     * @param table the same in numbers
     */
    public record PictureView(String title, String svg, String told, TableView table) {}

    /**
     * Something to pick.
     *
     * @param word its word
     * @param name its name
     * @param taken whether it is the one picked
     */
    public record Pick(String word, String name, boolean taken) {}

    /**
     * Facts about one thing.
     *
     * @param name what they are about
     * @param facts the facts
     */
    public record FactGroup(String name, List<Line> facts) {
        /** Copies the list. */
        public FactGroup {
            facts = List.copyOf(facts);
        }
    }

    /**
     * A fact.
     *
     * @param name what it is
     * @param value what it comes to
     * @param mark whether it is own, chosen, or stands beside the chosen one
     * @param note what belongs to it
     * @param sourceId where it is from, in a word; of an own value its stable name
     */
    public record Line(String name, String value, String mark, String note, String sourceId) {}

    /**
     * Own values, and a form for another one.
     *
     * @param values those set: name and what they come to
     * @param names names that can be set
     * @param fields the form
     * @param faults what was wrong with it
     */
    public record OwnView(
            List<Line> values, List<Pick> names, List<FieldView> fields, List<String> faults) {}

    /**
     * Own lots that are gone, and a form for another one.
     *
     * @param lots the lots
     * @param told what they do to the life
     * @param ends how a lot can have ended
     * @param fields the form
     * @param faults what was wrong with it
     */
    public record LotsView(
            List<LotLine> lots,
            List<String> told,
            List<Pick> ends,
            List<FieldView> fields,
            List<String> faults) {}

    /**
     * A lot that is gone.
     *
     * @param number its number
     * @param text what became of it
     */
    public record LotLine(long number, String text) {}

    /**
     * How long a lot keeps.
     *
     * @param fields the question
     * @param ripeness how ripe it may be
     * @param cured whether it may be cured; none where nobody cures it
     * @param answer the answer, a line each; none before anybody asked
     * @param table days left by each mechanism; absent before anybody asked
     * @param because reasons with their sources
     * @param faults what was wrong with the question
     */
    public record KeepView(
            List<FieldView> fields,
            List<Pick> ripeness,
            List<Pick> cured,
            List<String> answer,
            Optional<TableView> table,
            List<Because> because,
            List<String> faults) {}

    /**
     * A reason.
     *
     * @param text the sentence
     * @param sourceId where it is from
     */
    public record Because(String text, String sourceId) {}
}
