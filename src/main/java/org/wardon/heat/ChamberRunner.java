package org.wardon.heat;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Objects;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import org.wardon.cooling.CoolerEffect;
import org.wardon.cooling.Defrost;
import org.wardon.enclosure.PeopleHeat;
import org.wardon.errors.Progress;
import org.wardon.errors.RunStopped;
import org.wardon.heat.network.ChamberNetwork;
import org.wardon.heat.network.CoolerPart;
import org.wardon.heat.network.LotPart;
import org.wardon.heat.network.Terms;
import org.wardon.heat.solver.Integrator;
import org.wardon.heat.solver.StepTooShort;
import org.wardon.lots.BurntSugar;

/** Takes one chamber through its run: edges, thermostats, hours, and the steps between them. */
final class ChamberRunner implements Integrator.StepListener {
    private static final double COLDEST_C = -60;
    private static final double WARMEST_C = 90;
    private static final double SHORTEST_STEP_S = 1e-5;

    /** Kinds of edges whose first steps are remembered apart: the schedule's, and two more. */
    private static final List<Edge.Kind> SCHEDULED = List.of(Edge.Kind.values());

    private static final int STARTED = SCHEDULED.size();

    private static final int RESTED = STARTED + 1;
    private static final int EDGES = STARTED + 2;

    /** Packages take this much more room than the produce in them (assumption). */
    private static final double PACKAGE_ROOM = 1.05;

    private static final double LEAST_FREE_SHARE = 0.05;

    private final ChamberRun run;
    private final ChamberNetwork network;
    private final Terms terms;
    private final Integrator integrator;
    private final double[] totals;
    private final SwitchedCoolers thermostats;
    private final Watering watering;
    private final Integrator.Trigger triggers;
    private final IceBanks ice;
    private final EnergyBudget budget;
    private final Optional<SolarRun> solar;
    private final Carbon carbon;
    private final HourRecorder hours;
    private final LotRecorder[] lots;
    private final List<Edge> edges;
    private final double usedS;
    private final Spans outages;
    private final Spans tripped;
    private final Spans wetFaces;
    private final Spans icing;
    private double[] y;
    private double now;
    private int hour;
    private final @Nullable LotState[] carried;
    private int nextEdge;
    private boolean powered = true;
    private boolean awaitsFirstOpening = true;
    private double co2AtFirstOpening;
    private long openings;
    private double lastExchanged;
    private double lastRespiration;
    private double lastPeople;
    private final Books books;
    private final Optional<UseByRow> useByRow;

    ChamberRunner(ChamberRun run, ChamberNetwork network, double[] start, Accuracy accuracy) {
        this.run = run;
        this.network = network;
        this.terms = network.terms();
        this.y = start;
        network.accuracy(accuracy.lotK(), accuracy.airK());
        network.settle(y);
        integrator =
                new Integrator(
                        network, accuracy.steps(), EDGES, accuracy.firstStepS(), SHORTEST_STEP_S);
        totals = integrator.totals();
        thermostats = new SwitchedCoolers(network);
        watering = new Watering(run, network, y);
        ice = new IceBanks(run, network, y);
        budget = new EnergyBudget(run, network);
        solar =
                run.extras()
                        .solar()
                        .filter(supply -> run.controlMode() != ControlMode.IDEAL)
                        .map(supply -> new SolarRun(supply, run, network, integrator));
        Integrator.Trigger dryOrWarm = new FirstOf(thermostats, watering);
        triggers = solar.isPresent() ? new FirstOf(dryOrWarm, solar.get()) : dryOrWarm;
        double pressure = RunCompiler.pressurePa(run);
        carbon = new Carbon(pressure);
        int rowHours = run.doorMode().rowHours();
        int rows = (RunCompiler.hours(run) + rowHours - 1) / rowHours + 2;
        hours = new HourRecorder(network, rows);
        lots = new LotRecorder[run.stays().size()];
        carried = new LotState[lots.length];
        for (int i = 0; i < lots.length; i++) {
            lots[i] = new LotRecorder(run.stays().get(i), network.lot(i), rows + 1, rowHours > 1);
            carried[i] = run.stays().get(i).berth().as().orElse(null);
            if (run.stays().get(i).berth().inBlast()) {
                network.inBlast(i);
            }
        }
        edges = Schedule.of(run);
        usedS = Schedule.useS(run);
        String id = run.chamberId();
        outages = new Spans(CourseEvent.Kind.OUTAGE, id);
        tripped = new Spans(CourseEvent.Kind.TRIPPED, id);
        wetFaces = new Spans(CourseEvent.Kind.WET_FACES, id);
        icing = new Spans(CourseEvent.Kind.ICES_UP, id);
        books = new Books(network, y, totals, lots);
        solar.ifPresent(any -> feed(0));
        useByRow =
                run.doorMode() == DoorMode.SKETCHED
                        ? Optional.of(new UseByRow(run))
                        : Optional.empty();
        enterRow();
    }

    private void enterRow() {
        if (useByRow.isPresent() && useByRow.get().enter(now, hourEndS(), network)) {
            integrator.restart(SCHEDULED.indexOf(Edge.Kind.USE_STARTS));
        }
    }

    /** Compiles a run; it stands at its start. */
    static ChamberRunner of(ChamberRun run, Accuracy accuracy, boolean plain) {
        ChamberNetwork network = RunCompiler.network(run, plain);
        double[] start = WarmUp.start(run, network, accuracy, plain);
        return new ChamberRunner(run, network, start, accuracy);
    }

    /** Runs to the end. */
    Course run(Progress progress) {
        goTo(run.durationS(), progress);
        return finish();
    }

    /** Goes on to a time of the run and stands there before anything that changes at it. */
    void goTo(double stopS, Progress progress) {
        while (now < stopS) {
            settle();
            double until = Math.min(stopS, Math.min(hourEndS(), nextEdgeS()));
            until = Math.min(until, thermostats.nextUnlock(now));
            until = Math.min(until, budget.nextCheck(now, totals));
            until = Math.min(until, nextSunS());
            now = advance(now, until);
            if (now >= hourEndS()) {
                progress.at("heat", now / run.durationS());
            }
        }
    }

    private double nextSunS() {
        return solar.isPresent() ? solar.get().nextLanding(now) : Double.POSITIVE_INFINITY;
    }

    /** Lets pass what changes at the time it stands at, and ends the hour where it is over. */
    private void settle() {
        passEdges(now);
        budget.check(now, totals);
        if (solar.isPresent() && solar.get().turns(now)) {
            feed(now);
        }
        if (now >= hourEndS()) {
            hour += run.doorMode().rowHours();
            network.hour(hour);
            network.settle(y);
            endHour(now);
            enterRow();
        }
    }

    private double hourEndS() {
        return Math.min((hour + run.doorMode().rowHours()) * 3600.0, run.durationS());
    }

    /** Closes the books at the end of the run, to which it must have gone. */
    Course finish() {
        settle();
        return course();
    }

    /** Goes on to a time, and from there to another, and tells what came in between. */
    HourAccount account(double fromS, double untilS) {
        goTo(fromS, Progress.SILENT);
        settle();
        Accountant accountant = new Accountant(run, network, totals, lots, books);
        accountant.open(now, y);
        goTo(untilS, Progress.SILENT);
        return accountant.close(now, y);
    }

    /** The same for each step of a span, the last perhaps shorter. */
    List<HourAccount> accounts(double fromS, double untilS, double stepS) {
        List<HourAccount> all = new ArrayList<>();
        goTo(fromS, Progress.SILENT);
        while (now < untilS) {
            all.add(account(now, Math.min(untilS, now + stepS)));
        }
        return all;
    }

    /** How a lot is now, to be carried to another chamber. */
    LotState carryOut(int lot) {
        return lots[lot].state(y, totals);
    }

    /** Tells how a lot will be when it is carried in. */
    void carryIn(int lot, LotState state) {
        carried[lot] = state;
    }

    private double nextEdgeS() {
        return nextEdge < edges.size() ? edges.get(nextEdge).atS() : Double.POSITIVE_INFINITY;
    }

    private double advance(double from, double until) {
        try {
            double t = integrator.advance(from, y, until, triggers, this);
            if (integrator.fired()) {
                watering.fire(t, y);
                integrator.restart(thermostats.fire(t, y) ? STARTED : RESTED);
            }
            return t;
        } catch (StepTooShort stuck) {
            throw new RunStopped(
                    stuck.time(),
                    run.chamberId(),
                    String.format(
                            Locale.ROOT,
                            "%s: no step is short enough; air %.2f °C",
                            network.partAt(stuck.node()),
                            network.airC(y)));
        }
    }

    @Override
    public void stepped(double from, double to, double[] state) {
        double airC = network.airC(state);
        if (!(airC > COLDEST_C && airC < WARMEST_C)) {
            stop(to, "air temperature", airC);
        }
        hours.stepped(from, to, state);
        solar.ifPresent(supply -> supply.stepped(to, totals));
        for (int i = 0; i < lots.length; i++) {
            if (!network.lot(i).there()) {
                continue;
            }
            lots[i].stepped(to, state, totals);
            if (!network.lot(i).within(COLDEST_C, WARMEST_C, state)) {
                String lot = "lot " + run.stays().get(i).lot().id();
                stop(to, lot, network.lot(i).warmestC(state));
            }
        }
        double exchanged = terms.exchanged(totals);
        double respiration = respirationJ();
        double people = terms.people(totals);
        carbon.step(
                to - from,
                ((respiration - lastRespiration) / BurntSugar.JOULE_PER_KG_CO2
                                + (people - lastPeople) * PeopleHeat.CO2_KG_PER_J)
                        / (to - from),
                network.cubicMetres((exchanged - lastExchanged) / (to - from)),
                airC,
                network.freeM3());
        lastExchanged = exchanged;
        lastRespiration = respiration;
        lastPeople = people;
        boolean tripping = false;
        for (int i = 0; i < network.coolerCount(); i++) {
            CoolerEffect effect = network.cooler(i).effect();
            tripping |= effect.tripped && network.cooler(i).powered();
        }
        tripped.is(to, tripping);
        ice.stepped(to, state);
    }

    /** Heat given off so far by lots while they were in the chamber. */
    private double respirationJ() {
        double sum = 0;
        for (int i = 0; i < lots.length; i++) {
            sum +=
                    lots[i].present()
                            ? network.lot(i).respirationJ(totals)
                            : lots[i].totals().respirationJ();
        }
        return sum;
    }

    private void stop(double t, String what, double valueC) {
        throw new RunStopped(
                t,
                run.chamberId(),
                String.format(
                        Locale.ROOT,
                        "%s would be %.1f °C; the model holds between %.0f and %.0f °C",
                        what,
                        valueC,
                        COLDEST_C,
                        WARMEST_C));
    }

    private void endHour(double t) {
        for (int i = 0; i < lots.length; i++) {
            lots[i].row(t, y, totals);
        }
        hours.ice(ice.leftKg(y));
        hours.row(t, y, totals, respirationJ(), carbon.ppm());
        solar.ifPresent(supply -> hours.supply(supply.panelJ(), supply.share()));
        wetFaces.is(t, network.faceWaterKg(y) > 0.1);
        icing.is(t, icesUp());
    }

    /** Air below 4 °C on a running coil without defrost. Source: common practice, no source. */
    private boolean icesUp() {
        for (int i = 0; i < network.coolerCount(); i++) {
            CoolerPart cooler = network.cooler(i);
            if (cooler.unit().defrost().isEmpty()
                    && network.airC(y) < 4
                    && cooler.effect().evaporatingC < 0) {
                return true;
            }
        }
        return false;
    }

    private void passEdges(double t) {
        while (nextEdge < edges.size() && edges.get(nextEdge).atS() <= t) {
            pass(edges.get(nextEdge), t);
            nextEdge++;
        }
    }

    private void pass(Edge edge, double t) {
        switch (edge.kind()) {
            case MIDNIGHT -> {
                awaitsFirstOpening = true;
                budget.midnight(totals, fed());
            }
            case USE_STARTS, USE_ENDS -> use(edge);
            case LIGHTS_ON, LIGHTS_OFF -> {
                network.light(edge.kind() == Edge.Kind.LIGHTS_ON ? 1 : 0);
                restart(edge);
            }
            case POWER_OFF -> power(t, false);
            case POWER_ON -> power(t, true);
            case DEFROST_STARTS, DEFROST_ENDS -> defrost(edge, t);
            case WALL_POURED -> {
                watering.pour(edge.index(), t, y);
                restart(edge);
            }
            case RECHARGE_STARTS, RECHARGE_ENDS -> {
                boolean starts = edge.kind() == Edge.Kind.RECHARGE_STARTS;
                network.cooler(edge.index()).recharge(starts);
                restart(edge);
            }
            case SETTING_CHANGES -> {
                network.set(run.settings().changes().get(edge.index()).to());
                restart(edge);
            }
            case DOOR_OPENS, DOOR_SHUTS -> door(edge);
            case ARRIVES -> arrive(edge, t);
            case LEAVES -> leave(edge, t);
            case FRESH_ENDS ->
                    network.lot(edge.index())
                            .breathe(run.stays().get(edge.index()).lot().respiration());
        }
    }

    private void restart(Edge edge) {
        integrator.restart(SCHEDULED.indexOf(edge.kind()));
    }

    private void use(Edge edge) {
        boolean starts = edge.kind() == Edge.Kind.USE_STARTS;
        double present = run.enclosure().gains().peopleHoursPerDay() * 3600 / usedS;
        network.people(starts ? present : 0);
        if (run.doorMode() != DoorMode.PULSES) {
            network.door(starts ? 1 : 0);
        }
        restart(edge);
    }

    private void power(double t, boolean on) {
        powered = on;
        outages.is(t, !on);
        feed(t);
    }

    /** Whether electricity reaches the chamber: no outage, and a battery that is not empty. */
    private boolean fed() {
        return powered && solar.map(SolarRun::on).orElse(true);
    }

    /** Gives or takes the electricity of all consumers; what ran comes to rest first. */
    private void feed(double t) {
        boolean on = fed();
        for (int i = 0; i < thermostats.count(); i++) {
            if (network.cooler(i).unit().needsPower()) {
                thermostats.rest(i, t);
            }
        }
        network.power(on);
        solar.ifPresent(supply -> supply.leaveOut());
        budget.apply();
        integrator.restart(on ? STARTED : RESTED);
    }

    private void defrost(Edge edge, double t) {
        boolean starts = edge.kind() == Edge.Kind.DEFROST_STARTS;
        int i = edge.index();
        Defrost defrost = network.cooler(i).unit().defrost().orElseThrow();
        if (starts) {
            thermostats.rest(i, t);
        }
        network.cooler(i).defrost(starts && fed(), defrost.heaterW());
        restart(edge);
    }

    private void door(Edge edge) {
        boolean opens = edge.kind() == Edge.Kind.DOOR_OPENS;
        network.door(opens ? 1 : 0);
        if (opens && edge.atS() >= 0) {
            openings++;
            if (awaitsFirstOpening) {
                co2AtFirstOpening = Math.max(co2AtFirstOpening, carbon.ppm());
                awaitsFirstOpening = false;
            }
        }
        restart(edge);
    }

    private void arrive(Edge edge, double t) {
        int i = edge.index();
        Stay stay = run.stays().get(i);
        LotPart lot = network.lot(i);
        boolean fresh = stay.freshUntilS() > t;
        lot.breathe(fresh ? stay.lot().respiration().fresh() : stay.lot().respiration());
        if (stay.berth().from().isPresent()) {
            LotState state = Objects.requireNonNull(carried[i], "it runs with where it came from");
            state.into(network, i, y);
            lots[i].carriedIn(t, y, totals, state.massKg());
        } else {
            network.arrive(i, stay.pulpC(), stay.surfaceWaterKg(), y);
            lots[i].arrives(t, y, totals);
        }
        changeVolume();
        restart(edge);
    }

    private void leave(Edge edge, double t) {
        int i = edge.index();
        lots[i].stepped(t, y, totals);
        lots[i].row(t, y, totals);
        lots[i].close(y, totals);
        if (run.stays().get(i).carriedOn()) {
            lots[i].carriedOff(t, y, totals);
        }
        lastRespiration = respirationJ();
        network.lot(i).give(false);
        changeVolume();
        restart(edge);
    }

    private void changeVolume() {
        double gross = run.enclosure().box().volumeM3();
        double free = gross;
        for (int i = 0; i < lots.length; i++) {
            if (lots[i].present()) {
                var lot = run.stays().get(i).lot();
                free -= PACKAGE_ROOM * lot.massKg() / lot.item().densityKgM3();
            }
        }
        free = Math.max(free, LEAST_FREE_SHARE * gross);
        carbon.mix(network.freeM3(), free);
        books.mixed(network.changeFreeVolume(free, y));
    }

    private Course course() {
        double end = run.durationS();
        List<CourseEvent> events = new ArrayList<>();
        for (LotRecorder lot : lots) {
            lot.close(y, totals);
            events.addAll(lot.wetSpans(end));
        }
        for (Spans spans :
                List.of(
                        outages,
                        tripped,
                        wetFaces,
                        icing,
                        watering.spans(),
                        budget.spans(),
                        ice.spans())) {
            events.addAll(spans.until(end));
        }
        solar.ifPresent(supply -> events.addAll(supply.spans(end)));
        events.sort(Comparator.comparingDouble(CourseEvent::fromS));
        return new Course(
                run.chamberId(),
                hours.hours(),
                java.util.Arrays.stream(lots).map(LotRecorder::course).toList(),
                events,
                counts(),
                coolers(),
                books.heat(y),
                books.water(y),
                watering.ledger(y, totals),
                books.layersError(y),
                solar.map(SolarRun::ledger),
                network.reasons());
    }

    private List<CoolerTotals> coolers() {
        List<CoolerTotals> all = new ArrayList<>();
        for (int i = 0; i < network.coolerCount(); i++) {
            Terms.OfCooler did = terms.cooler(i, totals);
            all.add(
                    new CoolerTotals(
                            network.cooler(i).unit().kind(),
                            did.ranS(),
                            did.removedJ(),
                            did.electricityJ(),
                            did.waterKg(),
                            ice.ledger(i, y, terms, totals)));
        }
        return all;
    }

    private Course.Counts counts() {
        return new Course.Counts(
                thermostats.switches(),
                openings,
                carbon.highestPpm(),
                co2AtFirstOpening,
                integrator.steps(),
                integrator.rejected());
    }
}
