package org.wardon.web.pages;

import java.util.List;
import java.util.Optional;
import org.wardon.errors.Fault;

/**
 * All chambers of a plan.
 *
 * @param title name of the plan
 * @param span days it covers, in words
 * @param progress how far the forecast is; absent once it is there
 * @param stopped why there is none; absent where there is one
 * @param faults faults of the plan; empty where it can be run
 * @param cautions what to beware of, shortly where there is very much of it
 * @param cautionsInAll how many cautions, or kinds of them, there are, shown or not
 * @param moreCautions what else to beware of; absent where all is shown
 * @param actions what to do first
 * @param moreActions what else is to be done; absent where all is shown
 * @param chambers the chambers
 * @param waiting lots without a chamber
 * @param money what it is worth, in a sentence
 * @param plan number of the plan
 */
public record AllChambersView(
        String title,
        String span,
        Optional<ProgressView> progress,
        Optional<String> stopped,
        List<Fault> faults,
        List<CautionView> cautions,
        int cautionsInAll,
        Optional<MoreView> moreCautions,
        List<String> actions,
        Optional<MoreView> moreActions,
        List<ChamberView> chambers,
        LotsView waiting,
        String money,
        long plan) {
    /** Copies the lists. */
    public AllChambersView {
        faults = List.copyOf(faults);
        cautions = List.copyOf(cautions);
        actions = List.copyOf(actions);
        chambers = List.copyOf(chambers);
    }

    /**
     * Returns the cautions of a level.
     *
     * @param level {@code danger}, {@code caution} or {@code note}
     * @return in their order
     */
    public List<CautionView> of(String level) {
        return cautions.stream().filter(caution -> caution.level().equals(level)).toList();
    }
}
