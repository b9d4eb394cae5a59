package org.wardon.advice.outlook;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.wardon.advice.Ranges;
import org.wardon.air.Timeline;
import org.wardon.errors.BadInput;
import org.wardon.errors.Fault;
import org.wardon.files.forecast.ChillingRisk;
import org.wardon.files.forecast.KeepAnswer;
import org.wardon.files.forecast.RipeOn;
import org.wardon.files.readings.HistoryCsv;
import org.wardon.files.readings.LoggedHistory;
import org.wardon.keeping.ChamberEthylene;
import org.wardon.keeping.Draw;
import org.wardon.keeping.Draws;
import org.wardon.keeping.HistoryLegs;
import org.wardon.keeping.KeepingModel;
import org.wardon.keeping.KeptLot;
import org.wardon.keeping.KnownLife;
import org.wardon.keeping.LotAtDoor;
import org.wardon.keeping.Outlook;
import org.wardon.keeping.Purpose;
import org.wardon.lots.ClassValues;
import org.wardon.lots.LotHistory;
import org.wardon.produce.Commodity;
import org.wardon.produce.Reason;
import org.wardon.reference.ReferenceBook;
import org.wardon.reference.Variants;

/** Answers how long a lot keeps. */
public final class KeepingAdvice {
    /** Draws that make a range. */
    public static final int DRAWS = 128;

    /** Seed of the draws: a question without a plan always gets the same. */
    public static final long SEED = 1;

    /** Humidity at the produce where neither print nor person gives one (assumption). */
    private static final double USUAL_HUMIDITY = 0.9;

    /** Days a history is carried on where it goes on at another temperature. */
    private static final double CARRIED_DAYS = 2;

    private static final Pattern DAYS_AT_C =
            Pattern.compile("(\\d+(?:\\.\\d+)?)(?:\\.\\.(\\d+(?:\\.\\d+)?))?@(-?\\d+(?:\\.\\d+)?)");

    private final ReferenceBook book;
    private final ClassValues classes;

    /**
     * Prepares for questions.
     *
     * @param book the reference book
     */
    public KeepingAdvice(ReferenceBook book) {
        this.book = book;
        this.classes = ClassValues.of(book.all());
    }

    /**
     * Answers a question.
     *
     * @param request the question
     * @return days left from now on (a history's end, or the start of one condition), life used and
     *     risk of chilling at the end of the days or of the history
     * @throws BadInput with every fault of the question
     */
    public KeepReport ask(KeepRequest request) {
        Told read = told(request);
        Commodity commodity = read.commodity();
        LotHistory told = read.history();
        double endS = told.timeS(told.size() - 1);
        LotHistory followed = carriedOn(request, told, endS);
        double fromS = request.condition() instanceof KeepRequest.Steady ? 0 : endS;
        KeepingModel model =
                KeepingModel.of(
                        KeptLot.inOpenPackage(commodity.id(), commodity, door(request), classes));
        Outlook outlook = model.outlook(followed, Draws.seeded(SEED, DRAWS), fromS, endS);
        List<Outlook> others =
                read.others().stream()
                        .map(one -> carriedOn(request, one, endS))
                        .map(one -> model.outlook(one, Draws.seeded(SEED, DRAWS), fromS, endS))
                        .toList();
        double usedPct = 100 * model.follow(followed, Draw.MEDIAN).usedAt(endS);
        Optional<RipeQuestion> ripe =
                RipeQuestion.of(request, model, followed, fromS, () -> ripening(book));
        return new KeepReport(
                commodity,
                GapRange.widened(
                        answer(commodity, outlook, usedPct, ripe.map(RipeQuestion::figures)),
                        others),
                outlook.restsOn().word(),
                Stream.concat(read.notes().stream(), outlook.reasons().stream()).toList(),
                ripe.map(RipeQuestion::told).orElse(List.of()));
    }

    /** Commodities with printed days to ripe. */
    private static List<String> ripening(ReferenceBook book) {
        return book.all().stream()
                .filter(one -> !one.keeping().ripening().isEmpty())
                .map(Commodity::id)
                .toList();
    }

    private static void check(KeepRequest request) {
        List<Fault> faults = new ArrayList<>();
        if (request.condition() instanceof KeepRequest.Steady steady) {
            within(faults, "--at", steady.atC(), -5, 50, "°C");
            within(faults, "--days", steady.days(), 0.05, 730, "days");
        } else if (request.condition() instanceof KeepRequest.Logged logged) {
            logged.thenC().ifPresent(c -> within(faults, "--then", c, -5, 50, "°C"));
        }
        request.ethylenePpm().ifPresent(ppm -> within(faults, "--ethylene", ppm, 0, 1000, "ppm"));
        request.ripeInDays().ifPresent(days -> within(faults, "--ripe-in", days, 0, 120, "days"));
        request.humidityPct().ifPresent(pct -> within(faults, "--humidity", pct, 0, 100, "%"));
        request.usedPct().ifPresent(pct -> within(faults, "--used", pct, 0, 100, "%"));
        request.knownLife().ifPresent(text -> checkLife(faults, text));
        if (!faults.isEmpty()) {
            throw new BadInput(faults);
        }
    }

    private static void checkLife(List<Fault> faults, String text) {
        Matcher match = DAYS_AT_C.matcher(text);
        if (!match.matches()) {
            faults.add(
                    new Fault(
                            "--known-life",
                            "",
                            "'" + text + "' is not DAYS@C",
                            "accepted: days, @ and °C, such as 9@10"));
            return;
        }
        within(faults, "--known-life days", Double.parseDouble(match.group(1)), 0.1, 730, "days");
        if (match.group(2) != null) {
            double low = Double.parseDouble(match.group(1));
            within(
                    faults,
                    "--known-life days",
                    Double.parseDouble(match.group(2)),
                    low,
                    730,
                    "days");
        }
        within(faults, "--known-life °C", Double.parseDouble(match.group(3)), -2, 40, "°C");
    }

    private static void within(
            List<Fault> faults, String option, double value, double low, double high, String unit) {
        if (!(value >= low && value <= high)) {
            faults.add(
                    new Fault(
                            option,
                            "",
                            value + " is out of range",
                            String.format(Locale.ROOT, "accepted: %s to %s %s", low, high, unit)));
        }
    }

    /**
     * What a lot went through.
     *
     * @param commodity what it is
     * @param history its history
     * @param lastDay the day of the last reading, where it was logged
     * @param others the same, as cold and as warm as it may have been in gaps of the readings
     * @param notes what was assumed in reading it
     */
    record Told(
            Commodity commodity,
            LotHistory history,
            Optional<LocalDate> lastDay,
            List<LotHistory> others,
            List<Reason> notes) {}

    /** Checks a question and reads what the lot goes through. */
    Told told(KeepRequest request) {
        check(request);
        Commodity crop = book.named(request.commodity());
        Optional<Variants.Chosen> chosen =
                request.variant().map(name -> Variants.choose(crop, name));
        Commodity commodity = chosen.map(Variants.Chosen::commodity).orElse(crop);
        List<Reason> notes = chosen.map(one -> List.of(one.told())).orElse(List.of());
        double humidity =
                request.humidityPct().isPresent()
                        ? request.humidityPct().getAsDouble() / 100
                        : handbookHumidity(commodity);
        if (request.condition() instanceof KeepRequest.Steady steady) {
            LotHistory steadily =
                    LotHistory.constant(
                            steady.atC(),
                            humidity,
                            request.ethylenePpm().orElse(ChamberEthylene.OUTDOOR_PPM),
                            steady.days() * Timeline.DAY_S);
            return new Told(commodity, steadily, Optional.empty(), List.of(), notes);
        }
        KeepRequest.Logged logged = (KeepRequest.Logged) request.condition();
        LoggedHistory read =
                HistoryCsv.read(
                        logged.csv(),
                        logged.csv().toString(),
                        humidity,
                        ChamberEthylene.OUTDOOR_PPM);
        LotHistory history = read.history();
        long seconds = (long) history.timeS(history.size() - 1);
        return new Told(
                commodity,
                history,
                Optional.of(read.from().plusSeconds(seconds).toLocalDate()),
                read.bounds().map(b -> List.of(b.colder(), b.warmer())).orElse(List.of()),
                Stream.concat(notes.stream(), read.notes().stream()).toList());
    }

    /**
     * Returns the humidity a lot is taken to be in where nobody says.
     *
     * @param commodity the commodity
     * @return the handbook's, else 0.9; 0 to 1
     */
    public static double handbookHumidity(Commodity commodity) {
        return commodity
                .needs()
                .humidityPct()
                .map(fact -> fact.middle() / 100)
                .orElse(USUAL_HUMIDITY);
    }

    private static LotHistory carriedOn(KeepRequest request, LotHistory told, double endS) {
        boolean gassed = request.ethylenePpm().isPresent();
        if (gassed && request.condition() instanceof KeepRequest.Steady steady) {
            // Ethylene takes a day to start ripening, however short the days that are told.
            double days = Math.max(steady.days(), CARRIED_DAYS);
            return LotHistory.constant(
                    steady.atC(),
                    told.humidityFraction(0),
                    told.ethylenePpm(0),
                    days * Timeline.DAY_S);
        }
        if (request.condition() instanceof KeepRequest.Logged logged
                && logged.thenC().isPresent()) {
            int last = told.size() - 1;
            return HistoryLegs.then(
                    told,
                    endS,
                    logged.thenC().getAsDouble(),
                    told.humidityFraction(last),
                    told.ethylenePpm(last),
                    CARRIED_DAYS);
        }
        return told;
    }

    private static LotAtDoor door(KeepRequest request) {
        LotAtDoor door = LotAtDoor.SOUND.withRipeness(request.ripeness());
        if (request.usedPct().isPresent()) {
            door = door.withUsed(request.usedPct().getAsDouble() / 100);
        }
        if (request.ripeInDays().isPresent()) {
            door = door.withPurpose(Purpose.SELL_RIPE);
        }
        if (request.cured().isPresent()) {
            door = door.withCured(request.cured().get());
        }
        if (request.knownLife().isPresent()) {
            Matcher match = DAYS_AT_C.matcher(request.knownLife().get());
            if (match.matches()) {
                double low = Double.parseDouble(match.group(1));
                double high = match.group(2) == null ? low : Double.parseDouble(match.group(2));
                double atC = Double.parseDouble(match.group(3));
                door = door.withKnownLife(KnownLife.between(low, high, atC));
            }
        }
        return door;
    }

    private static KeepAnswer answer(
            Commodity commodity, Outlook outlook, double usedPct, Optional<RipeOn> ripe) {
        List<KeepAnswer.Mechanism> mechanisms =
                outlook.mechanisms().entrySet().stream()
                        .sorted(Comparator.comparing(Map.Entry::getKey))
                        .map(
                                e ->
                                        new KeepAnswer.Mechanism(
                                                e.getKey().word(), Ranges.told(e.getValue())))
                        .toList();
        return new KeepAnswer(
                commodity.id(),
                Ranges.told(outlook.daysLeft()),
                outlook.hangsOn().map(Ranges::told),
                usedPct,
                outlook.limitedBy().word(),
                new ChillingRisk(outlook.chilling().probability(), outlook.chilling().safeDays()),
                mechanisms,
                outlook.ripeFrom().map(Ranges::told),
                outlook.edibleLeft().map(Ranges::told),
                ripe);
    }
}
