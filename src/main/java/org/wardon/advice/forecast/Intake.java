package org.wardon.advice.forecast;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.air.Timeline;
import org.wardon.air.Weather;
import org.wardon.cooling.Setting;
import org.wardon.errors.Progress;
import org.wardon.heat.ChamberRun;
import org.wardon.heat.ControlMode;
import org.wardon.heat.Course;
import org.wardon.heat.DoorMode;
import org.wardon.heat.HeatModel;
import org.wardon.heat.Stay;
import org.wardon.keeping.Draw;
import org.wardon.lots.Lot;
import org.wardon.lots.LotHistory;
import org.wardon.plan.ChamberPlan;

/**
 * How much warm produce a chamber may take in a day.
 *
 * <p>Found by halving on the full model with averaged door, from the hottest day of the run on: the
 * lots that are there stand cold at the setting, a warm lot of the same kind and temperature as the
 * chamber's largest arrival comes in; the cold ones may rise 2 K, the warm one must come to
 * seven-eighths within 24 h, or within 4.5 half-cooling times of its package where those are
 * longer.
 */
final class Intake {
    private static final int HALVINGS = 7;
    private static final double ARRIVAL_HOUR = 15;
    private static final double LEAST_KG = 1;

    private final StoreOutcome outcome;
    private final ChamberPlan chamber;

    Intake(StoreOutcome outcome, ChamberPlan chamber) {
        this.outcome = outcome;
        this.chamber = chamber;
    }

    /** Largest intake a day, kg; empty where the chamber has no cooler or no lot to go by. */
    OptionalDouble kgPerDay() {
        Optional<LotSheet> like =
                outcome.model().sheetsIn(chamber.id()).stream()
                        .filter(s -> s.plan().temperatureC() > setting(s).temperatureC() + 2)
                        .max(Comparator.comparingDouble(s -> s.plan().massKg()));
        if (chamber.coolers().isEmpty() || like.isEmpty()) {
            return OptionalDouble.empty();
        }
        ChamberPlan then = chamber.withSetting(setting(like.get()));
        return OptionalDouble.of(new Intake(outcome, then).kgOf(like.get()));
    }

    private double kgOf(LotSheet like) {
        double room = chamber.capacityKg();
        if (fits(like, room)) {
            return room;
        }
        if (!fits(like, LEAST_KG)) {
            return 0;
        }
        double low = LEAST_KG;
        double high = room;
        for (int i = 0; i < HALVINGS; i++) {
            double middle = Math.sqrt(low * high);
            if (fits(like, middle)) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return low;
    }

    /** The setting in force when a lot comes. */
    private Setting setting(LotSheet sheet) {
        return outcome.model().settings(chamber).at(Math.max(0, sheet.clock().arrivesS()));
    }

    private boolean fits(LotSheet like, double massKg) {
        double allowedS =
                Timeline.HOUR_S
                        * Math.max(
                                Holding.SEVEN_EIGHTHS_LEAST_H,
                                Holding.SEVEN_EIGHTHS_PER_HALF
                                        * like.kind().halfCoolingHours().middle());
        double startS = hottestDayS();
        double arrives = ARRIVAL_HOUR * Timeline.HOUR_S;
        double durationS = arrives + allowedS;
        List<Stay> stays = residents();
        Stay warm = like.stay(Draw.MEDIAN);
        stays.add(
                new Stay(
                        withMass(warm.lot(), "intake", massKg),
                        arrives,
                        Double.POSITIVE_INFINITY,
                        warm.pulpC()));
        Course course = HeatModel.run(run(startS, durationS, stays), Progress.SILENT);
        double set = chamber.setting().temperatureC();
        LotHistory taken = course.lot("intake").history();
        double eighth = set + (warm.pulpC() - set) / 8;
        boolean cooled = taken.meanC(taken.size() - 1) <= eighth;
        return cooled && residentsStayCold(course, set);
    }

    private static boolean residentsStayCold(Course course, double setC) {
        return course.lots().stream()
                .filter(lot -> !lot.stay().lot().id().equals("intake"))
                .allMatch(
                        lot -> {
                            LotHistory h = lot.history();
                            for (int i = 0; i < h.size(); i++) {
                                if (h.meanC(i) > setC + Holding.RISE_MOST_K) {
                                    return false;
                                }
                            }
                            return true;
                        });
    }

    private List<Stay> residents() {
        List<Stay> stays = new ArrayList<>();
        for (LotSheet sheet : outcome.model().sheetsIn(chamber.id())) {
            stays.add(
                    new Stay(
                            sheet.stay(Draw.MEDIAN).lot(),
                            0,
                            Double.POSITIVE_INFINITY,
                            chamber.setting().temperatureC()));
        }
        return stays;
    }

    private ChamberRun run(double startS, double durationS, List<Stay> stays) {
        ChamberRun plan = outcome.model().asPlanned(chamber, outcome.horizonS(), outcome.courses());
        return plan.withWeather(from(outcome.model().weather(), startS, durationS))
                .withOutages(List.of())
                .withStays(stays)
                .withDurationS(durationS)
                .withDoorMode(DoorMode.SKETCHED)
                .withControlMode(ControlMode.MODULATING);
    }

    private double hottestDayS() {
        Weather weather = outcome.model().weather();
        int days = (int) Math.max(1, outcome.horizonS() / Timeline.DAY_S);
        int hottest = 0;
        double most = Double.NEGATIVE_INFINITY;
        for (int day = 0; day < days; day++) {
            double sum = 0;
            for (int h = 0; h < 24; h++) {
                sum += weather.temperatureC(24 * day + h);
            }
            if (sum > most) {
                most = sum;
                hottest = day;
            }
        }
        return hottest * Timeline.DAY_S;
    }

    /** Weather from a time on, its last value held. */
    private static Weather from(Weather weather, double startS, double durationS) {
        int first = (int) (startS / Timeline.HOUR_S);
        int n = (int) Math.ceil(durationS / Timeline.HOUR_S) + 1;
        double[] temperature = new double[n];
        double[] humidity = new double[n];
        double[] global = new double[n];
        double[] wind = new double[n];
        for (int h = 0; h < n; h++) {
            temperature[h] = weather.temperatureC(first + h);
            humidity[h] = weather.humidityPct(first + h);
            global[h] = weather.globalWm2(first + h);
            wind[h] = weather.windMs(first + h);
        }
        return new Weather(temperature, humidity, global, wind);
    }

    private static Lot withMass(Lot lot, String id, double massKg) {
        return new Lot(
                id, massKg, lot.item(), lot.packing(), lot.respiration(), lot.transpiration());
    }
}
