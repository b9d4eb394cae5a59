package org.wardon.files;

import java.time.LocalDateTime;
import java.time.ZoneId;
import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;
import org.wardon.air.Site;
import org.wardon.air.YearWave;
import org.wardon.files.json.Part;
import org.wardon.plan.ChamberPlan;
import org.wardon.plan.Defaults;
import org.wardon.plan.EthyleneAround;
import org.wardon.plan.LotPlan;
import org.wardon.plan.PlaceWish;
import org.wardon.plan.Prices;
import org.wardon.plan.StorePlan;
import org.wardon.plan.WeatherSource;
import org.wardon.plan.WithoutChamber;
import org.wardon.produce.Conflict;

/** Turns a checked plan into records. */
final class PlanBinder {
    private final Part plan;
    private final Lookups lookups;
    private final Inputs inputs = new Inputs();

    PlanBinder(Part plan, Lookups lookups) {
        this.plan = plan;
        this.lookups = lookups;
    }

    StorePlan bind(WeatherSource weather, String fileName) {
        LocalDateTime from = inputs.time(plan, "from").orElseThrow();
        Site site = site(weather);
        ChamberBinder chamberBinder =
                new ChamberBinder(
                        plan.at("buildUps"),
                        lookups,
                        inputs,
                        new PowerBinder(site.latitudeDeg(), inputs));
        List<ChamberPlan> chambers =
                plan.at("chambers").items().stream().map(chamberBinder::bind).toList();
        LotBinder lotBinder = new LotBinder(from, inputs);
        List<LotPlan> lots = plan.at("lots").items().stream().map(lotBinder::bind).toList();
        Prices prices =
                new Prices(
                        plan.at("currency").text().orElse(""),
                        inputs.number(plan, "energyPricePerKWh", Defaults.ENERGY_PRICE_PER_KWH));
        EthyleneAround ethylene =
                new EthyleneAround(
                        inputs.number(plan, "outdoorEthylenePpm", Defaults.OUTDOOR_ETHYLENE_PPM),
                        inputs.number(plan, "marketEthylenePpm", Defaults.MARKET_ETHYLENE_PPM));
        return new StorePlan(
                plan.at("name").text().orElse(fileName),
                site,
                weather,
                from,
                inputs.number(plan, "days"),
                chambers,
                lots,
                without(),
                (long) inputs.numberElse(plan, "seed", Defaults.SEED),
                prices,
                ethylene,
                new PlaceWish(
                        plan.at("wish")
                                .text()
                                .map(word -> PlaceWish.Aim.valueOf(LotBinder.constant(word)))
                                .orElse(PlaceWish.Aim.MOST_VALUE),
                        plan.at("wishLots").items().stream()
                                .flatMap(id -> id.text().stream())
                                .toList(),
                        accepts(plan)),
                inputs.assumed());
    }

    /** Conflicts a chamber or the plan accepts. */
    static Set<Conflict> accepts(Part owner) {
        return owner.at("accept").items().stream()
                .flatMap(word -> word.text().stream())
                .map(word -> Conflict.valueOf(LotBinder.constant(word)))
                .collect(Collectors.toUnmodifiableSet());
    }

    private Site site(WeatherSource weather) {
        Part part = plan.at("site");
        Site site =
                new Site(
                        inputs.number(part, "latitudeDeg"),
                        inputs.number(part, "longitudeDeg"),
                        inputs.number(part, "elevationM", Defaults.ELEVATION_M),
                        ZoneId.of(inputs.text(part, "zone")));
        Part year = part.at("year");
        if (year.given()) {
            double usual = YearWave.usualWarmestDay(site.latitudeDeg());
            return site.withYear(
                    new YearWave(
                            inputs.number(year, "meanC"),
                            inputs.number(year, "swingK"),
                            inputs.number(year, "warmestDay", usual, "", Defaults.ASSUMPTION)));
        }
        return weather instanceof WeatherSource.Normals made
                ? site.withYear(made.normals().year())
                : site;
    }

    private WithoutChamber without() {
        Part without = plan.at("withoutChamber");
        if (!without.has("temperatureC")) {
            return new WithoutChamber.Shade();
        }
        return new WithoutChamber.Steady(
                inputs.number(without, "temperatureC"), inputs.number(without, "humidityPct"));
    }
}
