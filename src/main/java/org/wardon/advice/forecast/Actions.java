package org.wardon.advice.forecast;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.advice.wording.Words;
import org.wardon.air.Timeline;
import org.wardon.cooling.Cooler;
import org.wardon.enclosure.Door;
import org.wardon.files.forecast.ChamberForecast;
import org.wardon.files.forecast.Forecast.Action;
import org.wardon.heat.Course;
import org.wardon.heat.CourseEvent;
import org.wardon.heat.Hours;
import org.wardon.heat.IceLedger;
import org.wardon.keeping.Fate;
import org.wardon.keeping.Outlook;
import org.wardon.keeping.Spread;
import org.wardon.plan.ChamberPlan;
import org.wardon.produce.Reason;
import org.wardon.produce.Reason.Argument;

/** What to do first: what saves people, then what saves most. */
final class Actions {
    /** Moves that gain less than this share of a lot's price are not worth a person's time. */
    private static final double WORTH_MOVING = 0.05;

    /** A door counts as left open from here on, s an opening (assumption). */
    private static final double LEFT_OPEN_S = 120;

    /** Share of the heat that makes the door worth naming (assumption). */
    private static final double DOOR_SHARE = 0.15;

    /**
     * Bulbs root and mould above 75 to 80 % humidity (sprouting table, ids USDA-GARDEN and kin).
     */
    private static final double DRY_CROPS_BELOW_PCT = 80;

    private static final String OWN_RULE = "assumption";

    private final StoreOutcome outcome;
    private final Map<String, ChamberForecast> chambers;
    private final Words words;
    private final List<Candidate> found = new ArrayList<>();

    private record Candidate(
            int rank, Reason reason, OptionalDouble gainDays, OptionalDouble gainValue) {}

    Actions(StoreOutcome outcome, Map<String, ChamberForecast> chambers, Words words) {
        this.outcome = outcome;
        this.chambers = Map.copyOf(chambers);
        this.words = words;
    }

    List<Action> all() {
        outcome.model().plan().chambers().forEach(this::airOut);
        outcome.model().sheets().forEach(this::lot);
        outcome.model().plan().chambers().forEach(this::chamber);
        found.sort(
                Comparator.comparingInt(Candidate::rank)
                        .thenComparing(c -> -c.gainValue().orElse(0))
                        .thenComparing(c -> -c.gainDays().orElse(0)));
        List<Action> actions = new ArrayList<>();
        for (Candidate candidate : found) {
            actions.add(
                    new Action(
                            actions.size() + 1,
                            words.sentence(candidate.reason()),
                            candidate.reason().subjects().get(0),
                            candidate.gainDays(),
                            candidate.gainValue()));
        }
        return actions;
    }

    private void say(int rank, Reason reason) {
        found.add(new Candidate(rank, reason, OptionalDouble.empty(), OptionalDouble.empty()));
    }

    private void airOut(ChamberPlan chamber) {
        if (ById.get(chambers, chamber.id()).co2PpmMax() >= GasCautions.DANGER_PPM) {
            say(0, Reason.about("do-air-out", chamber.id(), OWN_RULE));
        }
    }

    private void lot(LotSheet sheet) {
        if (!outcome.has(sheet.id())) {
            return;
        }
        LotFates fates = outcome.fates(sheet.id());
        if (sheet.model().uncured()) {
            String source = sheet.commodity().keeping().curing().get(0).sourceId();
            say(1, Reason.about("do-cure-first", sheet.id(), source));
        }
        Optional<Candidate> move = move(sheet, fates);
        move.ifPresent(found::add);
        sell(sheet, fates, move.isPresent());
    }

    private Optional<Candidate> move(LotSheet sheet, LotFates fates) {
        if (sheet.visits().size() > 1) {
            return Optional.empty(); // The keeper moves it already.
        }
        String here = sheet.endsIn();
        double best = 0;
        Optional<Candidate> move = Optional.empty();
        double price = sheet.plan().market().pricePerKg() * sheet.plan().massKg();
        double soundHere = fates.shareSoundWhenSold(sheet.soldS());
        if (soundHere + WORTH_MOVING >= 1) {
            return Optional.empty();
        }
        for (ChamberPlan other : outcome.model().plan().chambers()) {
            if (other.id().equals(here) || harms(sheet, other)) {
                continue;
            }
            OtherChambers.There there =
                    new OtherChambers(outcome.model())
                            .of(
                                    sheet,
                                    outcome.course(other.id()),
                                    outcome.ethylene(other.id()),
                                    outcome.horizonS());
            double gain = there.shareSound() - soundHere;
            if (gain > best + WORTH_MOVING) {
                best = gain;
                move =
                        Optional.of(
                                new Candidate(
                                        2,
                                        new Reason(
                                                "do-move",
                                                List.of(sheet.id(), other.id(), here),
                                                List.of(
                                                        Argument.of(
                                                                100 * there.shareSound(), "pct"),
                                                        Argument.of(100 * soundHere, "pct")),
                                                OWN_RULE),
                                        OptionalDouble.of(
                                                days(there.sold(), sheet)
                                                        - days(fates.sold(), sheet)),
                                        price > 0
                                                ? OptionalDouble.of(
                                                        there.value(sheet) - valueHere(sheet))
                                                : OptionalDouble.empty()));
            }
        }
        return move;
    }

    /**
     * A chamber that would harm the lot in a way its price does not show: colder than it bears,
     * cold for one that is not cured, damp for one that is to stay dry.
     */
    private boolean harms(LotSheet sheet, ChamberPlan other) {
        ChamberForecast there = ById.get(chambers, other.id());
        boolean tooCold =
                there.airC().mean() < sheet.model().lowestSafeC() - other.setting().bandK();
        boolean uncuredIntoCold = sheet.model().uncured() && !other.coolers().isEmpty();
        boolean tooDamp =
                sheet.model().wantsDry() && there.humidityPct().mean() > DRY_CROPS_BELOW_PCT;
        return tooCold || uncuredIntoCold || tooDamp;
    }

    private double valueHere(LotSheet sheet) {
        ChamberPlan chamber = outcome.model().plan().getChamber(sheet.endsIn());
        return new LotFigures(sheet, chamber, outcome).valueKept();
    }

    private static double days(List<Fate> fates, LotSheet sheet) {
        double from = sheet.clock().hereFromS();
        return Spread.of(fates.stream().mapToDouble(fate -> fate.daysLeft(from)).toArray()).p50();
    }

    private void sell(LotSheet sheet, LotFates fates, boolean orMove) {
        double leaveBy =
                Outlook.leaveByS(fates.staying(), sheet.clock().arrivesS(), sheet.marketDays());
        if (leaveBy >= sheet.clock().leavesS()) {
            return;
        }
        double earlier = (sheet.clock().leavesS() - leaveBy) / Timeline.DAY_S;
        boolean now = leaveBy <= sheet.clock().hereFromS() + 0.5 * Timeline.DAY_S;
        String unmoved = now ? "do-sell-now-unmoved" : "do-sell-earlier-unmoved";
        String sold = now ? "do-sell-now" : "do-sell-earlier";
        say(
                now ? 3 : 4,
                Reason.about(
                        orMove ? unmoved : sold,
                        sheet.id(),
                        OWN_RULE,
                        Argument.of(earlier, "day"),
                        Argument.text(
                                outcome.model()
                                        .plan()
                                        .timeline()
                                        .localAt(leaveBy)
                                        .toLocalDate()
                                        .toString())));
    }

    private void chamber(ChamberPlan chamber) {
        ChamberForecast figures = ById.get(chambers, chamber.id());
        double load = figures.heatRemovedKWh();
        double share = load > 0 ? figures.loadKWh().door() / load : 0;
        Door door = chamber.enclosure().door().orElse(null);
        if (door != null && door.secondsOpen() >= LEFT_OPEN_S && share >= DOOR_SHARE) {
            say(
                    5,
                    Reason.about(
                            "do-shut-door",
                            chamber.id(),
                            OWN_RULE,
                            Argument.of(100 * share, "pct"),
                            Argument.of(door.secondsOpen() / 60, "1")));
        }
        addIce(chamber);
        if (weatherDecides(chamber)) {
            addCold(chamber, figures);
        } else if (!chamber.coolers().isEmpty()
                && figures.peakLoadW() > 1.05 * figures.removedPeakW()) {
            Argument peak = Argument.of(figures.peakLoadW(), "W");
            Argument removed = Argument.of(figures.removedPeakW(), "W");
            say(
                    6,
                    figures.intakeKgPerDay().isPresent()
                            ? Reason.about(
                                    "do-spread-intake",
                                    chamber.id(),
                                    OWN_RULE,
                                    peak,
                                    removed,
                                    Argument.of(figures.intakeKgPerDay().getAsDouble(), "kg"))
                            : Reason.about("do-precool", chamber.id(), OWN_RULE, peak, removed));
        }
    }

    /** Ice that ran out: at the pace it melted until then, for the hours that were without. */
    private void addIce(ChamberPlan chamber) {
        Course course = outcome.course(chamber.id());
        List<CourseEvent> gone =
                course.events().stream()
                        .filter(event -> event.kind() == CourseEvent.Kind.ICE_GONE)
                        .toList();
        if (gone.isEmpty() || gone.get(0).fromS() < Timeline.HOUR_S) {
            return;
        }
        double goneS = gone.stream().mapToDouble(event -> event.untilS() - event.fromS()).sum();
        Hours hours = course.hours();
        double days = hours.atS(hours.size() - 1) / Timeline.DAY_S;
        double kgADay = meltedKgPerS(course, gone.get(0).fromS()) * goneS / days;
        say(6, Reason.about("do-add-ice", chamber.id(), OWN_RULE, Argument.of(kgADay, "kg")));
    }

    /** Ice made again melts too, so what melted in all is shared out by the heat taken. */
    private static double meltedKgPerS(Course course, double untilS) {
        double meltedKg =
                course.coolers().stream()
                        .flatMap(cooler -> cooler.ice().stream())
                        .mapToDouble(IceLedger::meltedKg)
                        .sum();
        Hours hours = course.hours();
        double before = 0;
        double all = 0;
        for (int i = 0; i < hours.size(); i++) {
            all += hours.coolingW(i);
            before += hours.atS(i) <= untilS ? hours.coolingW(i) : 0;
        }
        return all > 0 ? meltedKg * before / all / untilS : 0;
    }

    private static boolean weatherDecides(ChamberPlan chamber) {
        return !chamber.coolers().isEmpty()
                && chamber.coolers().stream().noneMatch(Cooler::holdsBand);
    }

    /** Where the weather cannot give the setting, spreading the intake does not help. */
    private void addCold(ChamberPlan chamber, ChamberForecast figures) {
        double setC = outcome.model().settings(chamber).meanC(outcome.horizonS());
        if (figures.airC().mean() > setC + chamber.setting().bandK()) {
            say(
                    6,
                    Reason.about(
                            "do-add-cold",
                            chamber.id(),
                            OWN_RULE,
                            Argument.of(figures.airC().mean(), "C"),
                            Argument.of(setC, "C")));
        }
    }
}
