package org.wardon.heat;

import java.util.ArrayList;
import java.util.List;
import java.util.function.IntToDoubleFunction;
import java.util.stream.IntStream;
import org.wardon.air.MoistAir;
import org.wardon.air.SaturatedAir;
import org.wardon.air.StandardAtmosphere;
import org.wardon.air.Weather;
import org.wardon.air.WetBulb;
import org.wardon.cooling.Cooler;
import org.wardon.cooling.EvaporativePad;
import org.wardon.cooling.IceBank;
import org.wardon.cooling.NightAir;
import org.wardon.cooling.WaterFilm;
import org.wardon.cooling.WettedWall;
import org.wardon.enclosure.Beyond;
import org.wardon.enclosure.Face;
import org.wardon.enclosure.FaceName;

/** What no run may do, whatever was asked of it. */
final class RunLimits {
    /** The air's own error of a step, K; what is bounded exactly is met to within this. */
    private static final double STEP_K = 0.05;

    /** Field rule: air in wetted walls may be this much below the wet bulb, K. */
    private static final double WETTED_K = 1.5;

    /** In a shorter burst the mean of what came out is that of the first moments. */
    private static final double LONG_ENOUGH = 0.25;

    private final ChamberRun run;
    private final Course course;
    private final Hours hours;
    private final double pressurePa;
    private final List<String> breaches = new ArrayList<>();

    private RunLimits(ChamberRun run, Course course) {
        this.run = run;
        this.course = course;
        hours = course.hours();
        pressurePa = StandardAtmosphere.pressurePa(run.site().elevationM());
    }

    /** Returns what of the limits a run breaks, in words; empty where all is well. */
    static List<String> broken(ChamberRun run, Course course) {
        RunLimits limits = new RunLimits(run, course);
        limits.books();
        limits.rows();
        limits.lots();
        for (int i = 0; i < run.coolers().size(); i++) {
            limits.cooler(i, run.coolers().get(i));
        }
        limits.outdoorAirAlone();
        if (RandomRun.quiet(run)) {
            limits.noHeatFromNothing();
        }
        return limits.breaches;
    }

    private void check(boolean held, String what) {
        if (!held) {
            breaches.add(what);
        }
    }

    private void books() {
        check(course.balanceErrorPct() < 1e-6, "balance error " + course.balanceErrorPct() + " %");
        for (CoolerTotals cooler : course.coolers()) {
            check(cooler.waterKg() >= -1e-9, "water " + cooler);
            check(cooler.electricityJ() >= -1e-6, "electricity " + cooler);
            check(cooler.ranS() >= -1e-6 && cooler.ranS() <= 86_400 * (1 + 1e-4), "ran " + cooler);
        }
    }

    private void rows() {
        check(hours.size() == 24, hours.size() + " rows");
        for (int i = 0; i < hours.size(); i++) {
            double airC = hours.airC(i);
            check(Double.isFinite(airC), "air " + airC);
            check(
                    hours.airLowestC(i) <= airC && airC <= hours.airHighestC(i),
                    "mean air "
                            + airC
                            + " outside "
                            + hours.airLowestC(i)
                            + ".."
                            + hours.airHighestC(i));
            double rh = hours.humidityFraction(i); // mist takes a minute, a cold lot comes at once
            check(rh >= 0 && rh <= 2, "humidity " + rh + " in hour " + i);
            check(hours.humidityRatio(i) >= 0, "humidity ratio " + hours.humidityRatio(i));
            check(hours.co2Ppm(i) >= 419.9, "carbon dioxide " + hours.co2Ppm(i));
            check(hours.exchangeM3s(i) >= 0, "exchange " + hours.exchangeM3s(i));
            check(Double.isFinite(hours.coolingW(i)), "cooling " + hours.coolingW(i));
            check(hours.powerW(i) >= -1e-6, "power " + hours.powerW(i));
        }
    }

    private void lots() {
        for (LotCourse lot : course.lots()) {
            double most = lot.stay().lot().massKg();
            for (int i = 0; i < lot.size(); i++) {
                double kg = lot.massKg(i);
                check(kg > 0 && kg < 1.2 * most, "mass " + kg + " of " + most + " kg");
                check(lot.respirationW(i) >= 0, "respiration " + lot.respirationW(i));
                double low = Math.min(lot.surfaceC(i), lot.coreC(i));
                double high = Math.max(lot.surfaceC(i), lot.coreC(i));
                check(
                        Double.isFinite(lot.meanC(i)) && low > -60 && high < 80,
                        "lot between " + low + " and " + high + " °C");
            }
        }
    }

    private void cooler(int place, Cooler cooler) {
        if (cooler instanceof IceBank bank) {
            ice(place, bank);
        } else if (cooler instanceof WaterFilm film && film.pumpW() == 0) {
            waterComesOutBetweenInletAndTheWarmest(film);
        }
    }

    /** Ice melts its latent heat and stays between nothing and full. */
    private void ice(int place, IceBank bank) {
        CoolerTotals totals = course.coolers().get(place);
        IceLedger ice = totals.ice().orElseThrow();
        if (run.coolers().size() == 1) {
            meltsWhatItTook(totals.removedJ(), ice, bank);
        }
        // The solver may err by a thousandth of the bank.
        for (int i = 0; i < hours.size(); i++) {
            double kg = hours.iceKg(i);
            check(kg >= -1e-3 * bank.iceKg() && kg <= bank.iceKg() * (1 + 1e-3), "ice " + kg);
        }
    }

    /** What the air lost went into the bank but for what drained off it, as water or as frost. */
    private void meltsWhatItTook(double removedJ, IceLedger ice, IceBank bank) {
        double meltC = bank.material().meltC();
        double driedKg = -course.water().coolers();
        double asWater = removedJ - driedKg * 4_186 * meltC;
        double asFrost = removedJ - driedKg * (2_090 * meltC - 333_500);
        double unsure = Math.abs(driedKg * meltC * 50) + 1e-6 * Math.abs(removedJ) + 1;
        // Frost and water share within a kelvin of freezing.
        double low = (meltC <= -1 ? asFrost : asWater) - unsure;
        double high = (meltC < 0 ? asFrost : asWater) + unsure;
        double meltedJ = ice.meltedKg() * 1_000 * bank.material().latentKJkg();
        check(
                low <= meltedJ && meltedJ <= high,
                "melted " + meltedJ + " J, not " + low + ".." + high + ", of " + bank);
    }

    private void waterComesOutBetweenInletAndTheWarmest(WaterFilm film) {
        if (film.chiller().isPresent() || sunny()) {
            return;
        }
        double inletC = film.inletC().get(0);
        double low = Math.min(inletC, coldestAroundC());
        double high = Math.max(inletC, warmestAroundC());
        for (int i = 0; i < hours.size(); i++) {
            low = Math.min(low, hours.airLowestC(i));
            high = Math.max(high, hours.airHighestC(i));
            if (hours.atS(i) < changedOverS(film) || ran(film, i) < LONG_ENOUGH) {
                continue;
            }
            double outC = hours.waterOutC(i);
            check(
                    outC >= low - STEP_K && outC <= high + STEP_K,
                    "water of "
                            + inletC
                            + " °C comes out at "
                            + outC
                            + " between "
                            + low
                            + ".."
                            + high);
        }
    }

    private double ran(WaterFilm film, int i) {
        return hours.ran(run.coolers().indexOf(film), i);
    }

    /** The outlet is that of water at rest: a jacket that stood warm must have changed it first. */
    private double changedOverS(WaterFilm film) {
        double m3 = 0;
        for (FaceName name : film.wets()) {
            m3 += run.enclosure().box().areaM2(name) * film.gapMm() / 1_000;
        }
        return film.open() ? 0 : 4 * 1_000 * m3 / film.flowKgS();
    }

    /** Air of a chamber that nothing but outdoor air or water outside cools. */
    private void outdoorAirAlone() {
        boolean alone =
                run.coolers().stream()
                        .allMatch(
                                c ->
                                        c instanceof EvaporativePad
                                                || c instanceof NightAir
                                                || c instanceof WettedWall);
        if (!alone) {
            return;
        }
        boolean wetted = run.coolers().stream().anyMatch(WettedWall.class::isInstance);
        double low = lowestWetBulbC() - (wetted ? WETTED_K : 0) - skyK();
        for (int i = 0; i < hours.size(); i++) {
            check(
                    hours.airLowestC(i) >= low - STEP_K,
                    "air at " + hours.airLowestC(i) + " below " + low + " in hour " + i);
        }
        if (run.coolers().stream().allMatch(EvaporativePad.class::isInstance)) {
            padSupply();
        }
    }

    /** Supply of a pad is not below the wet bulb of that hour. */
    private void padSupply() {
        for (int i = 0; i < hours.size(); i++) {
            double supplyC = hours.supplyC(i);
            double wetC = Math.min(wetBulbC(i), wetBulbC(i + 1));
            check(
                    Double.isNaN(supplyC) || supplyC >= wetC - 0.01,
                    "pad blows " + supplyC + " below the wet bulb " + wetC);
        }
    }

    /** Nothing gives heat, so nothing gets warmer than the warmest that was there. */
    private void noHeatFromNothing() {
        double high = warmestAroundC() + STEP_K;
        for (int i = 0; i < hours.size(); i++) {
            check(
                    hours.airHighestC(i) <= high,
                    "air at " + hours.airHighestC(i) + ", warmest was " + high);
        }
        for (LotCourse lot : course.lots()) {
            for (int i = 0; i < lot.size(); i++) {
                check(
                        Math.max(lot.surfaceC(i), lot.coreC(i)) <= high,
                        "lot at " + lot.surfaceC(i) + ", warmest was " + high);
            }
        }
    }

    private boolean sunny() {
        return IntStream.range(0, 25).anyMatch(h -> run.weather().globalWm2(h) > 0);
    }

    /** A roof to the sky is colder than the air by at most this. */
    private double skyK() {
        boolean open =
                run.enclosure().faces().stream()
                        .anyMatch(f -> f.beyond() instanceof Beyond.Outdoors);
        return open ? 4 : 0;
    }

    private double outdoors(IntToDoubleFunction of, boolean warmest) {
        IntStream span = IntStream.range(0, 26);
        return warmest
                ? span.mapToDouble(of).max().orElseThrow()
                : span.mapToDouble(of).min().orElseThrow();
    }

    private double warmestAroundC() {
        double most = outdoors(run.weather()::temperatureC, true);
        for (double other : others()) {
            most = Math.max(most, other);
        }
        return most;
    }

    private double coldestAroundC() {
        double least = lowestWetBulbC();
        for (double other : others()) {
            least = Math.min(least, other);
        }
        return least;
    }

    /** Temperatures besides outdoors that a chamber starts with, borders on or is cooled by. */
    private List<Double> others() {
        List<Double> others = new ArrayList<>();
        run.start().temperatureC().ifPresent(others::add);
        if (run.start().temperatureC().isEmpty()) {
            others.add(run.setting().temperatureC());
        }
        run.stays().forEach(stay -> others.add(stay.pulpC()));
        for (Cooler cooler : run.coolers()) {
            if (cooler instanceof IceBank bank) {
                others.add(bank.material().meltC());
            } else if (cooler instanceof WaterFilm film) {
                others.addAll(film.inletC());
            }
        }
        for (Face face : run.enclosure().faces()) {
            if (face.beyond() instanceof Beyond.Space space) {
                others.add(space.temperatureC());
            }
        }
        return others;
    }

    private double wetBulbC(int h) {
        Weather weather = run.weather();
        double pa =
                weather.humidityPct(h) / 100 * SaturatedAir.overWaterPa(weather.temperatureC(h));
        return wetBulbC(weather.temperatureC(h), pa);
    }

    private double wetBulbC(double airC, double vapourPa) {
        return WetBulb.temperatureC(airC, MoistAir.humidityRatio(vapourPa, pressurePa), pressurePa);
    }

    /** Of the air outdoors and of the air at the start, and no lot or space colder than that. */
    private double lowestWetBulbC() {
        double least = outdoors(this::wetBulbC, false);
        if (run.start().temperatureC().isPresent()) {
            double airC = run.start().temperatureC().getAsDouble();
            double pct = run.start().humidityPct().orElse(100);
            least = Math.min(least, wetBulbC(airC, pct / 100 * SaturatedAir.pressurePa(airC)));
        }
        for (double other : others()) {
            least = Math.min(least, other);
        }
        return least;
    }
}
