package org.wardon.advice.company;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.wardon.advice.wording.Words;
import org.wardon.errors.BadInput;
import org.wardon.errors.Fault;
import org.wardon.errors.Limits;
import org.wardon.keeping.Draw;
import org.wardon.keeping.Draws;
import org.wardon.keeping.KeptLot;
import org.wardon.keeping.LotAtDoor;
import org.wardon.lots.ClassValues;
import org.wardon.produce.Commodity;
import org.wardon.produce.Conflict;
import org.wardon.reference.ReferenceBook;
import org.wardon.sharing.Circumstances;
import org.wardon.sharing.Sharing;
import org.wardon.sharing.Wish;

/** Answers who may share a chamber. */
public final class SharingAdvice {
    /** Days wanted unless others are asked for. */
    public static final double USUAL_DAYS = 7;

    /** Days that can be wanted. */
    public static final Limits DAYS = new Limits(0.1, 730);

    private static final int DRAWS = 32;
    private static final long SEED = 1;

    private final ReferenceBook book;
    private final Words words;
    private final ClassValues classes;
    private final List<Draw> draws = Draws.seeded(SEED, DRAWS);

    /**
     * Prepares for questions.
     *
     * @param book the reference book
     * @param words words for the reasons
     */
    public SharingAdvice(ReferenceBook book, Words words) {
        this.book = book;
        this.words = words;
        this.classes = ClassValues.of(book.all());
    }

    /**
     * Answers a question.
     *
     * @param days days wanted of each crop, by id or any common name, in the order asked
     * @return the verdict
     * @throws BadInput with every fault: an unknown name, a crop named twice, days out of range
     */
    public ShareReport ask(Map<String, Double> days) {
        return ask(days, Set.of());
    }

    /**
     * Answers a question of a keeper who accepts conflicts.
     *
     * @param days days wanted of each crop, by id or any common name, in the order asked
     * @param accepts conflicts that are accepted, and what they cost told
     * @return the verdict
     * @throws BadInput with every fault: an unknown name, a crop named twice, days out of range
     */
    public ShareReport ask(Map<String, Double> days, Set<Conflict> accepts) {
        Circumstances at = Circumstances.accepting(accepts);
        return new ShareTold(words).of(Sharing.of(wishes(days), draws, at));
    }

    /** The crops as lots that are to keep their days; throws every fault. */
    List<Wish> wishes(Map<String, Double> days) {
        List<Fault> faults = new ArrayList<>();
        List<Wish> wishes = new ArrayList<>();
        List<String> seen = new ArrayList<>();
        days.forEach((name, wanted) -> wish(name, wanted, seen, faults).ifPresent(wishes::add));
        if (!faults.isEmpty()) {
            throw new BadInput(faults);
        }
        return wishes;
    }

    private Optional<Wish> wish(String name, double wanted, List<String> seen, List<Fault> faults) {
        Optional<Commodity> commodity = Optional.empty();
        try {
            commodity = Optional.of(book.named(name));
        } catch (BadInput unknown) {
            faults.addAll(unknown.faults());
        }
        if (!DAYS.hold(wanted)) {
            faults.add(
                    new Fault(
                            name,
                            "",
                            wanted + " days are out of range",
                            "accepted: 0.1 to 730 days"));
            return Optional.empty();
        }
        if (commodity.isPresent() && seen.contains(commodity.get().id())) {
            faults.add(
                    new Fault(
                            name,
                            "",
                            commodity.get().id() + " is named twice",
                            "name each crop once"));
            return Optional.empty();
        }
        commodity.ifPresent(one -> seen.add(one.id()));
        return commodity.map(
                one ->
                        Wish.of(
                                KeptLot.inOpenPackage(one.id(), one, LotAtDoor.SOUND, classes),
                                wanted));
    }
}
