package org.wardon.heat;

import java.time.LocalTime;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.wardon.air.Timeline;
import org.wardon.cooling.Defrost;
import org.wardon.cooling.Outage;
import org.wardon.cooling.Recharge;
import org.wardon.cooling.SettingCourse;
import org.wardon.cooling.WettedWall;
import org.wardon.enclosure.Door;
import org.wardon.enclosure.Gains;

/** All edges of a run in order of time, from the midnight before its start. */
final class Schedule {
    /** Hours of use of a chamber without a door (assumption). */
    private static final LocalTime USE_FROM = LocalTime.of(7, 0);

    private static final LocalTime USE_TO = LocalTime.of(19, 0);

    private final ChamberRun run;
    private final List<Edge> edges = new ArrayList<>();

    private Schedule(ChamberRun run) {
        this.run = run;
    }

    static List<Edge> of(ChamberRun run) {
        Schedule schedule = new Schedule(run);
        double midnight = -run.timeline().secondOfDay(0);
        for (int day = 0; midnight < run.durationS(); day++, midnight += Timeline.DAY_S) {
            schedule.day(day, midnight);
            schedule.pourings(midnight);
            schedule.recharges(day, midnight);
        }
        schedule.settings();
        schedule.outages();
        schedule.stays();
        schedule.defrosts();
        schedule.edges.removeIf(edge -> edge.atS() >= run.durationS());
        schedule.edges.sort(Comparator.comparingDouble(Edge::atS).thenComparing(Edge::kind));
        return List.copyOf(schedule.edges);
    }

    private void add(double atS, Edge.Kind kind, int index) {
        edges.add(new Edge(atS, kind, index));
    }

    private void day(int day, double midnight) {
        boolean sketched = run.doorMode() == DoorMode.SKETCHED;
        boolean rationed =
                run.coolers().stream().anyMatch(cooler -> cooler.dailyEnergyKWh().isPresent());
        if (!sketched || rationed) {
            add(midnight, Edge.Kind.MIDNIGHT, 0);
        }
        if (sketched) {
            return;
        }
        double from = midnight + use(run).fromS();
        double to = midnight + use(run).toS();
        add(from, Edge.Kind.USE_STARTS, 0);
        add(to, Edge.Kind.USE_ENDS, 0);
        Hours lit = lights(run);
        if (lit.toS() > lit.fromS()) {
            add(midnight + lit.fromS(), Edge.Kind.LIGHTS_ON, 0);
            add(midnight + lit.toS(), Edge.Kind.LIGHTS_OFF, 0);
        }
        if (run.enclosure().door().isPresent() && run.doorMode() == DoorMode.PULSES) {
            openings(run.enclosure().door().get(), day, from, to);
        }
    }

    /** Hours of every day, s from midnight. */
    record Hours(double fromS, double toS) {}

    /** Hours of use. */
    static Hours use(ChamberRun run) {
        Optional<Door> door = run.enclosure().door();
        return new Hours(
                door.map(Door::from).orElse(USE_FROM).toSecondOfDay(),
                door.map(Door::to).orElse(USE_TO).toSecondOfDay());
    }

    /** Hours of light; longer than the hours of use, they burn on as long before as after. */
    static Hours lights(ChamberRun run) {
        Gains gains = run.enclosure().gains();
        Hours use = use(run);
        double lit = gains.lightsW() > 0 ? gains.lightsHoursPerDay() * Timeline.HOUR_S : 0;
        double first = lit > use.toS - use.fromS ? 0.5 * (use.fromS + use.toS - lit) : use.fromS;
        return new Hours(first, first + lit);
    }

    /** Hours of use a day, s. */
    static double useS(ChamberRun run) {
        return use(run).toS - use(run).fromS;
    }

    /** Openings spread evenly; a fraction of one adds up over the days. */
    private void openings(Door door, int day, double from, double to) {
        double perDay = door.openingsPerDay();
        int count = (int) (Math.floor(perDay * (day + 1) + 1e-9) - Math.floor(perDay * day + 1e-9));
        if (count == 0 || door.secondsOpen() <= 0) {
            return;
        }
        double spacing = (to - from) / count;
        double open = Math.min(door.secondsOpen(), spacing);
        for (int i = 0; i < count; i++) {
            double start = from + i * spacing + 0.5 * (spacing - open);
            add(start, Edge.Kind.DOOR_OPENS, 0);
            add(start + open, Edge.Kind.DOOR_SHUTS, 0);
        }
    }

    /** Water poured before the run begins is in the sand already. */
    private void pourings(double midnight) {
        for (int i = 0; i < run.coolers().size(); i++) {
            if (run.controlMode() != ControlMode.IDEAL
                    && run.coolers().get(i) instanceof WettedWall wall) {
                for (LocalTime hour : wall.pouredAt()) {
                    double at = midnight + hour.toSecondOfDay();
                    if (at >= 0) {
                        add(at, Edge.Kind.WALL_POURED, i);
                    }
                }
            }
        }
    }

    /** Hours of machines that make ice; at the start of the run it may be their hour already. */
    private void recharges(int day, double midnight) {
        for (int i = 0; i < run.coolers().size(); i++) {
            Optional<Recharge> machine = run.coolers().get(i).recharge();
            if (run.controlMode() == ControlMode.IDEAL || machine.isEmpty()) {
                continue;
            }
            double from = machine.get().from().toSecondOfDay();
            double to = machine.get().to().toSecondOfDay();
            if (day == 0 && to <= from) {
                add(midnight + from - Timeline.DAY_S, Edge.Kind.RECHARGE_STARTS, i);
            }
            add(midnight + from, Edge.Kind.RECHARGE_STARTS, i);
            add(midnight + to, Edge.Kind.RECHARGE_ENDS, i);
        }
    }

    private void settings() {
        List<SettingCourse.Change> changes = run.settings().changes();
        for (int i = 0; i < changes.size(); i++) {
            add(changes.get(i).atS(), Edge.Kind.SETTING_CHANGES, i);
        }
    }

    private void outages() {
        for (int i = 0; i < run.outages().size(); i++) {
            Outage outage = run.outages().get(i);
            add(outage.startS(), Edge.Kind.POWER_OFF, i);
            add(outage.endS(), Edge.Kind.POWER_ON, i);
        }
    }

    private void stays() {
        for (int i = 0; i < run.stays().size(); i++) {
            Stay stay = run.stays().get(i);
            add(Math.max(stay.arrivesS(), 0), Edge.Kind.ARRIVES, i);
            if (stay.freshUntilS() > Math.max(stay.arrivesS(), 0)) {
                add(stay.freshUntilS(), Edge.Kind.FRESH_ENDS, i);
            }
            if (Double.isFinite(stay.leavesS())) {
                add(stay.leavesS(), Edge.Kind.LEAVES, i);
            }
        }
    }

    private void defrosts() {
        for (int i = 0; i < run.coolers().size(); i++) {
            Optional<Defrost> timed = run.coolers().get(i).defrost();
            if (run.controlMode() == ControlMode.IDEAL || timed.isEmpty()) {
                continue;
            }
            Defrost defrost = timed.get();
            double every = defrost.everyHours() * Timeline.HOUR_S;
            for (double t = every; t < run.durationS(); t += every) {
                add(t, Edge.Kind.DEFROST_STARTS, i);
                add(t + defrost.minutes() * 60, Edge.Kind.DEFROST_ENDS, i);
            }
        }
    }
}
