package org.wardon.web.placing;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.wardon.web.pages.TableView;

/**
 * Temperatures that lots bear, on a ruler. Places are percent of its length from the cold end.
 *
 * @param title what it shows
 * @param unit unit of its figures
 * @param ticks its marks
 * @param common where all of them agree; absent where nowhere
 * @param apart where the two lie apart that pull apart most; absent where none do
 * @param setting what is dialled in; absent where nothing is
 * @param rows a line a lot, or several lots alike
 * @param sentences what it comes to, in words
 * @param more sentences to be unfolded
 * @param table the same in figures
 */
public record RulerView(
        String title,
        String unit,
        List<Tick> ticks,
        Optional<Span> common,
        Optional<Span> apart,
        Optional<Mark> setting,
        List<Row> rows,
        List<PlacingView.Told> sentences,
        List<PlacingView.Told> more,
        TableView table) {
    /** Copies the lists. */
    public RulerView {
        ticks = List.copyOf(ticks);
        rows = List.copyOf(rows);
        sentences = List.copyOf(sentences);
        more = List.copyOf(more);
    }

    /**
     * Returns the ruler with one more sentence behind the first.
     *
     * @param told the sentence
     * @return the ruler
     */
    public RulerView withSecond(PlacingView.Told told) {
        List<PlacingView.Told> all = new ArrayList<>(sentences);
        all.add(Math.min(1, all.size()), told);
        return new RulerView(title, unit, ticks, common, apart, setting, rows, all, more, table);
    }

    /**
     * A mark of the scale.
     *
     * @param at where
     * @param text its figure; blank for a small one
     */
    public record Tick(String at, String text) {}

    /**
     * A mark with words.
     *
     * @param at where
     * @param text its words
     * @param late whether it lies in the warm half, so that its words stand before it
     */
    public record Mark(String at, String text, boolean late) {}

    /**
     * A part of the ruler.
     *
     * @param at where it begins
     * @param wide how wide it is
     * @param kind what it is: {@code lasts}, {@code bears}, {@code chills}, {@code freezes}; the
     *     words of the part where all agree, or of that where two lie apart
     */
    public record Span(String at, String wide, String kind) {}

    /**
     * Lots that bear the same.
     *
     * @param lots their ids
     * @param crop their crop
     * @param told the temperatures they bear
     * @param pulls which way they pull, in words; blank where they do not
     * @param spans what temperatures do to them
     */
    public record Row(String lots, String crop, String told, String pulls, List<Span> spans) {
        /** Copies the list. */
        public Row {
            spans = List.copyOf(spans);
        }
    }
}
