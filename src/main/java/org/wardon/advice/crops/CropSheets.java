package org.wardon.advice.crops;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.DoubleStream;
import java.util.stream.IntStream;
import org.wardon.advice.Ranges;
import org.wardon.advice.outlook.KeepRequest;
import org.wardon.advice.outlook.KeepingAdvice;
import org.wardon.air.Timeline;
import org.wardon.keeping.ChamberEthylene;
import org.wardon.keeping.Draw;
import org.wardon.keeping.Draws;
import org.wardon.keeping.Fate;
import org.wardon.keeping.KeepingModel;
import org.wardon.keeping.KeptLot;
import org.wardon.keeping.LotAtDoor;
import org.wardon.keeping.Outlook;
import org.wardon.keeping.chilling.Zone;
import org.wardon.lots.ClassValues;
import org.wardon.lots.LotHistory;
import org.wardon.lots.RespirationCurve;
import org.wardon.lots.Respirations;
import org.wardon.lots.WithReasons;
import org.wardon.produce.Commodity;
import org.wardon.produce.Ripeness;
import org.wardon.produce.rows.RespirationRow;
import org.wardon.reference.ReferenceBook;
import org.wardon.reference.Variants;

/** Makes sheets of crops. May be used by several threads. */
public final class CropSheets {
    /** Coldest temperature of a sheet, °C. */
    public static final double COLDEST_C = -2;

    /** Warmest temperature of a sheet, °C. */
    public static final double WARMEST_C = 40;

    private static final double STEP_K = 1;

    private final ReferenceBook book;
    private final ClassValues classes;
    private final List<Draw> draws = Draws.seeded(KeepingAdvice.SEED, KeepingAdvice.DRAWS);

    /**
     * Prepares for sheets.
     *
     * @param book the tables, with the keeper's own values laid over them
     */
    public CropSheets(ReferenceBook book) {
        this.book = book;
        classes = ClassValues.of(book.all());
    }

    /**
     * Returns the sheet of a crop.
     *
     * @param name id or any common name
     * @param variant a variant of it; empty for the crop as a whole
     * @return the sheet
     * @throws org.wardon.errors.BadInput if nothing is called so
     */
    public CropSheet of(String name, Optional<String> variant) {
        Commodity crop = book.named(name);
        Optional<Variants.Chosen> chosen = variant.map(one -> Variants.choose(crop, one));
        Commodity commodity = chosen.map(Variants.Chosen::commodity).orElse(crop);
        Map<String, String> variants = Variants.of(crop);
        BreathLine breath = breath(commodity);
        return new CropSheet(
                commodity,
                variants,
                chosen.map(Variants.Chosen::told),
                new SheetFacts(book, commodity, breath).list(),
                life(commodity),
                cold(commodity),
                breath,
                commodity.keeping().ripening());
    }

    private static DoubleStream temperatures() {
        return DoubleStream.iterate(COLDEST_C, c -> c <= WARMEST_C, c -> c + STEP_K);
    }

    private LifeLine life(Commodity commodity) {
        KeepingModel model =
                KeepingModel.of(
                        KeptLot.inOpenPackage(commodity.id(), commodity, LotAtDoor.SOUND, classes));
        double humidity = KeepingAdvice.handbookHumidity(commodity);
        List<LifeLine.At> at = lifeAt(model, humidity);
        return new LifeLine(
                100 * humidity,
                model.freezingC(),
                at,
                SheetFacts.lives(commodity),
                model.life().restsOn().word());
    }

    /** As {@code keep} answers for a sound lot in each condition. */
    private List<LifeLine.At> lifeAt(KeepingModel model, double humidity) {
        double seconds = KeepRequest.Steady.USUAL_DAYS * Timeline.DAY_S;
        double[] at = temperatures().toArray();
        List<LotHistory> steady =
                Arrays.stream(at)
                        .mapToObj(
                                c ->
                                        LotHistory.constant(
                                                c, humidity, ChamberEthylene.OUTDOOR_PPM, seconds))
                        .toList();
        List<Fate> plain = model.follow(steady, Draw.MEDIAN);
        List<List<Fate>> drawn =
                draws.stream().parallel().map(draw -> model.follow(steady, draw)).toList();
        return IntStream.range(0, at.length)
                .mapToObj(
                        i ->
                                told(
                                        at[i],
                                        plain.get(i),
                                        drawn.stream().map(fates -> fates.get(i)).toList()))
                .toList();
    }

    private static LifeLine.At told(double atC, Fate plain, List<Fate> drawn) {
        return new LifeLine.At(
                atC,
                Ranges.told(Outlook.daysLeft(drawn, 0)),
                plain.limitedBy().word(),
                Outlook.safeDays(drawn, 0));
    }

    private static List<ColdZone> cold(Commodity commodity) {
        List<ColdZone> zones = new ArrayList<>();
        for (Ripeness ripeness : Ripeness.values()) {
            Zone.of(commodity, ripeness)
                    .map(
                            zone ->
                                    new ColdZone(
                                            ripeness,
                                            zone.topC(),
                                            zone.bandLowC(),
                                            zone.assumed(),
                                            zone.sourceId()))
                    .ifPresent(zones::add);
        }
        return zones;
    }

    private BreathLine breath(Commodity commodity) {
        WithReasons<RespirationCurve> middle =
                Respirations.of(commodity, Ripeness.UNKNOWN, classes, 0.5);
        RespirationCurve low = middle.value().withShare(0);
        RespirationCurve high = middle.value().withShare(1);
        List<BreathLine.At> at =
                temperatures()
                        .mapToObj(
                                c ->
                                        new BreathLine.At(
                                                c,
                                                perTonne(low, c),
                                                perTonne(middle.value(), c),
                                                perTonne(high, c)))
                        .toList();
        List<RespirationRow> taken = Respirations.taken(commodity, Ripeness.UNKNOWN);
        List<BreathLine.Printed> printed =
                commodity.breath().respiration().stream()
                        .map(row -> new BreathLine.Printed(row, taken.contains(row)))
                        .toList();
        return new BreathLine(at, printed, middle.restsOn());
    }

    private static double perTonne(RespirationCurve curve, double atC) {
        return 1000 * curve.wattsPerKg(atC);
    }
}
