package org.wardon.advice.forecast;

import java.time.LocalDateTime;
import java.time.temporal.ChronoUnit;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import org.wardon.air.MoistAir;
import org.wardon.air.SaturatedAir;
import org.wardon.air.StandardAtmosphere;
import org.wardon.air.Timeline;
import org.wardon.air.Weather;
import org.wardon.cooling.Compressor;
import org.wardon.cooling.Cooler;
import org.wardon.cooling.EvaporativePad;
import org.wardon.cooling.IceBank;
import org.wardon.cooling.NightAir;
import org.wardon.cooling.PadOutlet;
import org.wardon.cooling.SettingCourse;
import org.wardon.cooling.WaterFilm;
import org.wardon.cooling.WettedWall;
import org.wardon.heat.Course;
import org.wardon.heat.CourseEvent;
import org.wardon.heat.Hours;
import org.wardon.plan.ChamberPlan;
import org.wardon.produce.Caution;
import org.wardon.produce.Caution.Level;
import org.wardon.produce.Reason;
import org.wardon.produce.Reason.Argument;

/**
 * What this weather and this load make of coolers: {@code pad-gives-little}, {@code
 * night-air-rests}, {@code night-air-dry}, {@code wet-wall-gives-little}, {@code ice-gone}, {@code
 * unit-never-ran}.
 */
final class CoolersAtWork implements Cooler.Kinds<List<Caution>> {
    /**
     * What a well-kept pad takes off the incoming air, K; source: table of cooling sources,
     * air_cooling, 5.6 to 11.1 K.
     */
    private static final double WELL_KEPT_K = 5.6;

    /** A fan that runs less than this share of the time hardly does (assumption). */
    private static final double RESTS_BELOW = 0.02;

    /** Air this much drier than wished for is told, percent (assumption). */
    private static final double DRY_BY_PCT = 20;

    /**
     * Walls kept wet are for outdoor air below this humidity, percent; source: table of cooling
     * sources, suitability_rh. Taken at the hottest hour of the day (assumption).
     */
    private static final double WALLS_BELOW_PCT = 40;

    private static final int DAY_H = 24;

    private static final String OWN_RULE = "assumption";

    private static final String PRACTICE = "common-practice";

    private final ChamberPlan chamber;
    private final int place;
    private final SettingCourse settings;
    private final Course course;
    private final Timeline timeline;
    private final Hours hours;
    private final Weather weather;
    private final double pressurePa;

    private CoolersAtWork(StoreOutcome outcome, ChamberPlan chamber, int place) {
        this.chamber = chamber;
        this.place = place;
        this.settings = outcome.model().settings(chamber);
        this.course = outcome.course(chamber.id());
        this.timeline = outcome.model().plan().timeline();
        this.hours = course.hours();
        this.weather = outcome.model().weather();
        this.pressurePa = StandardAtmosphere.pressurePa(outcome.model().plan().site().elevationM());
    }

    static List<Caution> of(StoreOutcome outcome, ChamberPlan chamber) {
        List<Caution> all = new ArrayList<>();
        for (int i = 0; i < chamber.coolers().size(); i++) {
            Cooler cooler = chamber.coolers().get(i);
            all.addAll(cooler.match(new CoolersAtWork(outcome, chamber, i)));
        }
        return all;
    }

    /** A further compressor that never came on is a reserve. */
    @Override
    public List<Caution> compressor(Compressor unit) {
        long before =
                chamber.coolers().subList(0, place).stream()
                        .filter(Compressor.class::isInstance)
                        .count();
        boolean rested = IntStream.range(0, hours.size()).allMatch(i -> hours.ran(place, i) == 0);
        return before > 0 && rested
                ? List.of(
                        new Caution(
                                Level.NOTE,
                                Reason.about(
                                        "unit-never-ran",
                                        chamber.id(),
                                        PRACTICE,
                                        Argument.of(before + 1.0, "1"))))
                : List.of();
    }

    @Override
    public List<Caution> wettedWall(WettedWall wall) {
        double humidity = 0;
        double gain = 0;
        int days = 0;
        for (int from = 0; from + DAY_H <= hours.size(); from += DAY_H) {
            humidity += weather.humidityPct(hottest(from));
            days++;
        }
        for (int h = 0; h < hours.size(); h++) {
            gain += weather.temperatureC(h + 1) - hours.airC(h);
        }
        return days == 0 || humidity / days < WALLS_BELOW_PCT
                ? List.of()
                : List.of(
                        caution(
                                Reason.about(
                                        "wet-wall-gives-little",
                                        chamber.id(),
                                        "ECC-ENERGYPEDIA",
                                        Argument.of(humidity / days, "pct"),
                                        Argument.of(WALLS_BELOW_PCT, "pct"),
                                        Argument.of(gain / hours.size(), "K"))));
    }

    private int hottest(int from) {
        int hour = from;
        for (int h = from; h < from + DAY_H; h++) {
            hour = weather.temperatureC(h) > weather.temperatureC(hour) ? h : hour;
        }
        return hour;
    }

    @Override
    public List<Caution> waterFilm(WaterFilm film) {
        return List.of();
    }

    @Override
    public List<Caution> evaporativePad(EvaporativePad pad) {
        double sum = 0;
        for (int h = 0; h < hours.size(); h++) {
            double airC = weather.temperatureC(h);
            double most = MoistAir.saturatedHumidityRatio(airC, pressurePa);
            double ratio = Math.min(MoistAir.humidityRatio(vapourPa(h), pressurePa), most);
            sum += airC - PadOutlet.of(airC, ratio, pad.effectiveness(), pressurePa).temperatureC();
        }
        double meanK = sum / hours.size();
        return meanK >= WELL_KEPT_K
                ? List.of()
                : List.of(
                        caution(
                                Reason.about(
                                        "pad-gives-little",
                                        chamber.id(),
                                        "OSU-AEX127",
                                        Argument.of(meanK, "K"),
                                        Argument.of(WELL_KEPT_K, "K"))));
    }

    @Override
    public List<Caution> nightAir(NightAir fan) {
        double ran = 0;
        double humidity = 0;
        double wished = 0;
        for (int i = 0; i < hours.size(); i++) {
            double share = hours.ran(place, i);
            double inside = SaturatedAir.pressurePa(hours.airC(i));
            ran += share;
            wished += share * settings.until(hours.atS(i)).humidityPct();
            humidity += share * 100 * Math.min(vapourPa(i) / inside, 1);
        }
        if (ran < RESTS_BELOW * hours.size()) {
            return List.of(
                    caution(
                            Reason.about(
                                    "night-air-rests",
                                    chamber.id(),
                                    OWN_RULE,
                                    Argument.of(ran, "h"),
                                    Argument.of(hours.size(), "h"))));
        }
        double wishedPct = wished / ran;
        return humidity / ran >= wishedPct - DRY_BY_PCT
                ? List.of()
                : List.of(
                        caution(
                                Reason.about(
                                        "night-air-dry",
                                        chamber.id(),
                                        OWN_RULE,
                                        Argument.of(humidity / ran, "pct"),
                                        Argument.of(wishedPct, "pct"))));
    }

    @Override
    public List<Caution> iceBank(IceBank bank) {
        List<CourseEvent> gone =
                course.events().stream()
                        .filter(event -> event.kind() == CourseEvent.Kind.ICE_GONE)
                        .toList();
        if (gone.isEmpty()) {
            return List.of();
        }
        double goneS = gone.stream().mapToDouble(event -> event.untilS() - event.fromS()).sum();
        double days = hours.atS(hours.size() - 1) / Timeline.DAY_S;
        LocalDateTime first = timeline.localAt(gone.get(0).fromS()).truncatedTo(ChronoUnit.MINUTES);
        return List.of(
                caution(
                        Reason.about(
                                "ice-gone",
                                chamber.id(),
                                OWN_RULE,
                                Argument.text(first.toString().replace('T', ' ')),
                                Argument.of(goneS / Timeline.HOUR_S / days, "h"))));
    }

    /** Stations state humidity over water at all temperatures. */
    private double vapourPa(int h) {
        return weather.humidityPct(h) / 100 * SaturatedAir.overWaterPa(weather.temperatureC(h));
    }

    private static Caution caution(Reason reason) {
        return new Caution(Level.CAUTION, reason);
    }
}
