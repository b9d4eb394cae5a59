package org.wardon.advice.outlook;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.wardon.errors.BadInput;
import org.wardon.files.forecast.OwnLotsAnswer;
import org.wardon.files.forecast.Quantiles;
import org.wardon.keeping.Draws;
import org.wardon.keeping.KeepingModel;
import org.wardon.keeping.KeptLot;
import org.wardon.keeping.LotAtDoor;
import org.wardon.keeping.Spread;
import org.wardon.keeping.life.Ageing;
import org.wardon.lots.ClassValues;
import org.wardon.produce.Commodity;
import org.wardon.produce.Reason;
import org.wardon.produce.rows.OwnLot;
import org.wardon.reference.GoneLot;
import org.wardon.reference.ReferenceBook;
import org.wardon.reference.Variants;

/** What the keeper's own lots that are gone say of the life of a commodity. */
public final class OwnLotAdvice {
    private static final int LONGEST_TEXT = 200;
    private static final double MOST_USED_PCT = 99;

    private final ReferenceBook book;
    private final ClassValues classes;

    /**
     * Prepares for questions.
     *
     * @param book the reference book with the keeper's own lots
     */
    public OwnLotAdvice(ReferenceBook book) {
        this.book = book;
        this.classes = ClassValues.of(book.all());
    }

    /**
     * Returns a lot as it is to be remembered.
     *
     * @param request what it went through and how it ended
     * @return the lot, without a number
     * @throws BadInput with every fault
     */
    public GoneLot gone(OwnLotRequest request) {
        KeepingAdvice.Told told = new KeepingAdvice(book).told(request.went());
        LocalDate on = request.endedOn().or(() -> told.lastDay()).orElse(request.today());
        if (request.went().usedPct().orElse(0) > MOST_USED_PCT) {
            throw new BadInput(
                    "--used",
                    "",
                    "nothing of its life was left to see",
                    "accepted with --ended: 0 to 99 %");
        }
        text("--lot", request.name());
        text("--note", request.note());
        if (on.isAfter(request.today())) {
            throw new BadInput(
                    "--on",
                    "",
                    on + " is still to come",
                    "accepted: a day up to " + request.today());
        }
        OwnLot lot =
                new OwnLot(
                        0,
                        on,
                        request.ended(),
                        new OwnLot.Began(
                                request.went().variant().map(Variants::id).orElse(""),
                                request.went().ripeness(),
                                request.went().cured(),
                                request.went().usedPct().orElse(0) / 100),
                        Spells.of(told.history()));
        return new GoneLot(told.commodity().id(), request.name(), request.note(), lot);
    }

    private static void text(String option, String text) {
        if (text.length() > LONGEST_TEXT || text.chars().anyMatch(Character::isISOControl)) {
            throw new BadInput(
                    option,
                    "",
                    "it is " + text.length() + " characters long or has a line break in it",
                    "accepted: one line of up to " + LONGEST_TEXT + " characters");
        }
    }

    /**
     * Returns the keeper's own lots of a commodity.
     *
     * @param name its id or any common name
     * @param all the keeper's own lots
     * @return the lots and what they do to its life
     * @throws BadInput if nothing is called so
     */
    public OwnLotReport list(String name, List<GoneLot> all) {
        Commodity commodity = book.named(name);
        KeepingModel model =
                KeepingModel.of(
                        KeptLot.inOpenPackage(commodity.id(), commodity, LotAtDoor.SOUND, classes));
        List<OwnLotsAnswer.Lot> lots = new ArrayList<>();
        double atC = model.handbookC();
        for (GoneLot gone : all) {
            if (gone.commodityId().equals(commodity.id())) {
                lots.add(told(model, gone));
                atC = gone.lot().meanC();
            }
        }
        return new OwnLotReport(commodity, answer(model, atC, lots), reasons(model));
    }

    private static List<Reason> reasons(KeepingModel model) {
        return model.ownGrounds();
    }

    private static OwnLotsAnswer.Lot told(KeepingModel model, GoneLot gone) {
        OwnLot lot = gone.lot();
        return new OwnLotsAnswer.Lot(
                lot.number(),
                gone.name(),
                lot.began().variant(),
                lot.endedOn().toString(),
                lot.ended().name().toLowerCase(Locale.ROOT),
                lot.days(),
                lot.meanC(),
                100 * model.timesPublished(lot),
                gone.note());
    }

    private static OwnLotsAnswer answer(
            KeepingModel model, double atC, List<OwnLotsAnswer.Lot> lots) {
        return new OwnLotsAnswer(
                model.lot().commodity().id(),
                100 * model.life().factor(),
                atC,
                quantiles(model.life()::at, atC),
                quantiles(model.life().withoutOwn()::at, atC),
                lots);
    }

    private static Quantiles quantiles(
            java.util.function.Function<org.wardon.keeping.Draw, Ageing> life, double atC) {
        double[] days =
                Draws.seeded(KeepingAdvice.SEED, KeepingAdvice.DRAWS).stream()
                        .mapToDouble(draw -> life.apply(draw).lifeDays(atC))
                        .toArray();
        Spread spread = Spread.of(days);
        return new Quantiles(spread.p10(), spread.p50(), spread.p90());
    }
}
