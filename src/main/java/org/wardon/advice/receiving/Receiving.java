package org.wardon.advice.receiving;

import java.util.ArrayList;
import java.util.List;
import org.wardon.advice.forecast.ChamberTrials;
import org.wardon.advice.forecast.OneMoreLot;
import org.wardon.advice.wording.Words;
import org.wardon.errors.BadInput;
import org.wardon.files.forecast.ReceiveAnswer;
import org.wardon.files.forecast.ReceiveAnswer.Choice;
import org.wardon.files.json.Nearest;
import org.wardon.plan.ChamberPlan;
import org.wardon.plan.LotPlan;
import org.wardon.plan.StorePlan;
import org.wardon.produce.Reason;
import org.wardon.reference.ReferenceBook;

/**
 * Answers where a lot goes that comes to the door. The store as it stands is worked out once; each
 * question then runs every chamber with the lot in it, and the lot in the shade, in the draws of a
 * forecast. May be asked by several threads at once; the book is to stay open.
 */
public final class Receiving {
    /** Draws of a small store, as many as a forecast takes. */
    private static final int MOST_DRAWS = 32;

    /** Least draws: the tenth and ninetieth percentile still lie inside. */
    private static final int LEAST_DRAWS = 8;

    /** Days of lots that run in all draws of an answer (a lot standing 10 days counts 10). */
    private static final double LOT_DAYS = 12_000;

    private final ReferenceBook book;
    private final Words words;
    private final ChamberTrials trials;
    private final int draws;

    private Receiving(StorePlan plan, ReferenceBook book, Words words) {
        this.book = book;
        this.words = words;
        draws = draws(plan);
        trials = ChamberTrials.of(plan, book, words, draws);
    }

    /**
     * Works out a store as it stands.
     *
     * @param plan the plan; lots without a chamber are placed as a forecast places them
     * @param book the reference book
     * @param words words for the answers
     * @return what answers questions about it
     * @throws org.wardon.errors.RunStopped where a chamber meets a state that cannot be
     */
    public static Receiving of(StorePlan plan, ReferenceBook book, Words words) {
        return new Receiving(plan, book, words);
    }

    /** Fewer draws for large stores, by the size of the store, so that answers repeat. */
    private static int draws(StorePlan plan) {
        double lots = plan.lots().size() + 2.0 * plan.chambers().size();
        double affordable = LOT_DAYS / (lots * Math.max(1, plan.days()));
        return (int) Math.max(LEAST_DRAWS, Math.min(MOST_DRAWS, 2 * Math.floor(affordable / 2)));
    }

    /**
     * Returns how many draws stand behind each answer.
     *
     * @return 8 to 32
     */
    public int draws() {
        return draws;
    }

    /**
     * Returns the plan, every lot placed.
     *
     * @return the plan
     */
    public StorePlan plan() {
        return trials.plan();
    }

    /**
     * Returns a chamber a person named.
     *
     * @param id what was named
     * @return its id
     * @throws BadInput where the plan has none of that id, with the nearest
     */
    public String chamber(String id) {
        List<String> there = trials.plan().chambers().stream().map(ChamberPlan::id).toList();
        if (!there.contains(id)) {
            throw new BadInput(
                    "--put",
                    "",
                    "is '" + id + "', no chamber of this plan",
                    Nearest.question(id, there) + "accepted: " + String.join(", ", there));
        }
        return id;
    }

    /**
     * Returns a lot as a plan takes it.
     *
     * @param told the lot
     * @param chamberId chamber it is to go into
     * @return the lot, of an id the plan has not
     * @throws BadInput with every fault of what was told
     */
    public LotPlan placed(NewLot told, String chamberId) {
        return known(told).lot().placedIn(chamber(chamberId));
    }

    private AtTheDoor.Known known(NewLot told) {
        return AtTheDoor.of(trials.plan(), book, told, trials::outdoorC);
    }

    /**
     * Answers a question nobody asked, about a lot such as the plan's first, so that the code is
     * compiled before the first answer somebody waits for. Does nothing for a plan without lots.
     *
     * @throws org.wardon.errors.RunStopped where a chamber meets a state that cannot be
     */
    public void practise() {
        List<LotPlan> there = trials.plan().lots();
        if (!there.isEmpty()) {
            LotPlan first = there.get(0);
            answer(NewLot.of(first.commodity(), first.massKg()));
        }
    }

    /**
     * Answers where a lot goes.
     *
     * @param told the lot
     * @return all choices, best first
     * @throws BadInput with every fault of what was told
     * @throws org.wardon.errors.RunStopped where a chamber meets a state that cannot be
     */
    public ReceiveAnswer answer(NewLot told) {
        AtTheDoor.Known known = known(told);
        OneMoreLot more = trials.with(known.lot());
        Question question = Question.of(trials.plan(), more);
        List<ChamberChoice> inside =
                trials.plan().chambers().parallelStream()
                        .map(chamber -> new ChamberChoice(question, trials.standing(chamber.id())))
                        .toList();
        List<Choice> choices = new ArrayList<>();
        inside.forEach(chamber -> choices.add(chamber.choice(words)));
        choices.addAll(new OutsideChoices(question).all());
        List<Choice> ranked = new Ranking(question, words).ranked(choices);
        List<Reason> notes = inside.get(0).notes();
        return new ReceiveAnswer(
                known.lot().id(),
                known.lot().commodity(),
                known.lot().massKg(),
                known.lot().arrives(),
                ranked.get(0).text(),
                ranked,
                known.assumed().stream()
                        .map(reason -> ChamberChoice.because(reason, words))
                        .toList(),
                notes.stream().map(reason -> ChamberChoice.because(reason, words)).toList(),
                draws);
    }
}
