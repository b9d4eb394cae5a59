package org.wardon.advice.forecast;

import java.util.List;
import java.util.Locale;
import java.util.Objects;
import java.util.Optional;
import org.wardon.air.MoistAir;
import org.wardon.air.StandardAtmosphere;
import org.wardon.air.Timeline;
import org.wardon.enclosure.FaceName;
import org.wardon.files.forecast.WhyAnswer;
import org.wardon.heat.HeatLedger;
import org.wardon.heat.HourAccount;
import org.wardon.heat.LotAmounts;
import org.wardon.heat.WaterLedger;
import org.wardon.heat.network.FaceReading;
import org.wardon.heat.network.LotReading;
import org.wardon.plan.ChamberPlan;

/** Turns the account of an hour into figures a person asks for. */
final class WhyFigures {
    private static final double MM_PER_M = 1_000;

    private final StoreModel model;
    private final ChamberPlan chamber;
    private final HourAccount account;
    private final double pressurePa;
    private final double spanS;

    WhyFigures(StoreModel model, ChamberPlan chamber, HourAccount account) {
        this.model = model;
        this.chamber = chamber;
        this.account = account;
        pressurePa = StandardAtmosphere.pressurePa(model.plan().site().elevationM());
        spanS = account.untilS() - account.fromS();
    }

    WhyAnswer answer(Optional<FaceName> face, Optional<String> lot) {
        HeatLedger heat = account.heat();
        WaterLedger water = account.water();
        Timeline timeline = model.plan().timeline();
        return new WhyAnswer(
                chamber.id(),
                timeline.localAt(account.fromS()),
                timeline.localAt(account.untilS()),
                model.settings(chamber).until(account.untilS()).temperatureC(),
                air(account.before()),
                air(account.after()),
                account.outdoorC(),
                heatW(heat),
                heat.sum() / spanS,
                heat.removed() / spanS,
                (heat.sum() - heat.removed()) / spanS,
                100 * heat.errorShare(),
                waterKgH(water),
                perHour(water.sum()),
                100 * water.errorShare(),
                account.ends().map(this::ends),
                face.map(this::face),
                lot.map(this::lot));
    }

    private WhyAnswer.Air air(HourAccount.Air air) {
        return new WhyAnswer.Air(
                air.temperatureC(),
                Math.min(100, 100 * air.humidityFraction()),
                dewPointC(air.humidityRatio()));
    }

    private WhyAnswer.Ends ends(HourAccount.Ends ends) {
        return new WhyAnswer.Ends(
                ends.coilEndC(), ends.doorEndC(), ends.heatJ() / spanS, perHour(ends.airM3()));
    }

    private double dewPointC(double ratio) {
        return MoistAir.dewPointC(ratio, pressurePa);
    }

    private double perHour(double kg) {
        return kg / spanS * Timeline.HOUR_S;
    }

    private WhyAnswer.HeatW heatW(HeatLedger heat) {
        return new WhyAnswer.HeatW(
                heat.walls() / spanS,
                heat.door() / spanS,
                heat.leakage() / spanS,
                heat.freshAir() / spanS,
                heat.fieldHeat() / spanS,
                heat.respiration() / spanS,
                heat.fans() / spanS,
                heat.lights() / spanS,
                heat.people() / spanS,
                heat.packages() / spanS,
                heat.defrost() / spanS,
                heat.humidifier() / spanS,
                heat.heater() / spanS,
                heat.pumps() / spanS,
                heat.air() / spanS);
    }

    private WhyAnswer.WaterKgH waterKgH(WaterLedger water) {
        return new WhyAnswer.WaterKgH(
                perHour(water.lots()),
                perHour(water.packages()),
                perHour(water.door()),
                perHour(water.leakage()),
                perHour(water.freshAir()),
                perHour(water.people()),
                perHour(water.humidifier()),
                perHour(water.faces()),
                perHour(water.coolers()),
                perHour(water.air()));
    }

    private WhyAnswer.OfFace face(FaceName name) {
        FaceReading face = Objects.requireNonNull(account.faces().get(name));
        List<WhyAnswer.Point> points =
                face.points().stream()
                        .map(
                                point ->
                                        new WhyAnswer.Point(
                                                MM_PER_M * point.depthM(),
                                                point.temperatureC(),
                                                point.layer()))
                        .toList();
        return new WhyAnswer.OfFace(
                name.name().toLowerCase(Locale.ROOT),
                face.beyondC(),
                face.outerC(),
                points,
                face.innerC(),
                account.after().temperatureC(),
                face.fromBeyondJ() / spanS,
                face.toAirJ() / spanS,
                face.bridgeJ() / spanS,
                perHour(face.vapourKg()),
                face.waterKg(),
                outdoorDewPointC(),
                dewPointC(account.after().humidityRatio()));
    }

    private double outdoorDewPointC() {
        int hour = (int) Math.round(account.untilS() / Timeline.HOUR_S);
        double ratio =
                MoistAir.humidityRatioAt(
                        model.weather().temperatureC(hour),
                        model.weather().humidityPct(hour) / 100,
                        pressurePa);
        return dewPointC(ratio);
    }

    private WhyAnswer.OfLot lot(String id) {
        HourAccount.OfLot lot =
                account.lots().stream()
                        .filter(one -> one.id().equals(id))
                        .reduce((first, last) -> last)
                        .orElseThrow();
        LotReading inside = lot.inside();
        LotAmounts gave = lot.gave();
        return new WhyAnswer.OfLot(
                id,
                lot.there(),
                inside.shellsC(),
                inside.skinC(),
                inside.packageC(),
                100 * Math.min(1, inside.packageHumidityFraction()),
                lot.airC(),
                gave.respirationJ() / spanS,
                gave.fleshJ() / spanS,
                gave.liquidJ() / spanS,
                gave.packageJ() / spanS,
                gave.toAirJ() / spanS,
                perHour(gave.evaporatedKg()),
                perHour(gave.toAirKg()),
                inside.freeWaterKg(),
                lot.massKg());
    }
}
