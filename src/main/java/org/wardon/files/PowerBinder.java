package org.wardon.files;

import java.time.LocalDate;
import java.time.LocalTime;
import java.util.List;
import java.util.Optional;
import org.wardon.cooling.solar.SolarSupply;
import org.wardon.files.json.Part;
import org.wardon.plan.DailyOutage;
import org.wardon.plan.OutagePlan;
import org.wardon.plan.PowerPlan;
import org.wardon.plan.SolarDefaults;

/** Turns outages and supply of a checked chamber into records. */
final class PowerBinder {
    private final double latitudeDeg;
    private final Inputs inputs;

    PowerBinder(double latitudeDeg, Inputs inputs) {
        this.latitudeDeg = latitudeDeg;
        this.inputs = inputs;
    }

    /** Single outages of a chamber. */
    List<OutagePlan> single(Part chamber) {
        return chamber.at("outages").items().stream()
                .filter(outage -> !outage.has("daily"))
                .map(
                        outage ->
                                new OutagePlan(
                                        inputs.time(outage, "from").orElseThrow(),
                                        inputs.number(outage, "hours")))
                .toList();
    }

    PowerPlan power(Part chamber) {
        List<DailyOutage> daily =
                chamber.at("outages").items().stream()
                        .filter(outage -> outage.has("daily"))
                        .map(PowerBinder::daily)
                        .toList();
        Part solar = chamber.at("supply").at("solar");
        return new PowerPlan(daily, solar.given() ? Optional.of(solar(solar)) : Optional.empty());
    }

    private static DailyOutage daily(Part outage) {
        return new DailyOutage(
                clock(outage.at("daily").at("from")),
                clock(outage.at("daily").at("to")),
                outage.at("fromDate").text().map(LocalDate::parse),
                outage.at("toDate").text().map(LocalDate::parse));
    }

    private static LocalTime clock(Part part) {
        return LocalTime.parse(part.text().orElseThrow());
    }

    private SolarSupply solar(Part solar) {
        return new SolarSupply(
                inputs.number(solar, "panelWp"),
                inputs.number(solar, "tiltDeg", SolarDefaults.tiltDeg(latitudeDeg)),
                inputs.number(solar, "azimuthDeg", SolarDefaults.azimuthDeg(latitudeDeg)),
                inputs.number(solar, "performanceRatio", SolarDefaults.PERFORMANCE_RATIO),
                new SolarSupply.Cells(
                        inputs.number(solar, "batteryKWh"),
                        inputs.number(solar, "batteryEfficiency", SolarDefaults.BATTERY_EFFICIENCY),
                        inputs.number(solar, "startChargePct", SolarDefaults.START_CHARGE_PCT),
                        inputs.number(solar, "restartChargePct", SolarDefaults.RESTART_CHARGE_PCT)),
                inputs.maybe(solar, "inverterW"));
    }
}
