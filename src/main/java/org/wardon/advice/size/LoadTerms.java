package org.wardon.advice.size;

import org.wardon.advice.size.DesignLoad.Kind;
import org.wardon.advice.size.DesignLoad.Term;
import org.wardon.enclosure.Leakage;
import org.wardon.enclosure.UValue;
import org.wardon.errors.Require;
import org.wardon.produce.Reason;
import org.wardon.produce.Reason.Argument;

/**
 * The terms of a design heat load, each by one formula.
 *
 * <p>Source of the formulas: ASHRAE Handbook - Refrigeration, chapter on refrigerated-facility
 * loads, and Dossat, Principles of Refrigeration, cooling-load chapter (from memory of both).
 */
public final class LoadTerms {
    private static final String HANDBOOK = "ASHRAE-R";
    private static final String STANDARD = "ISO6946";
    private static final String TABLE = "DOSSAT";
    private static final double HOUR_S = 3_600;
    private static final double DAY_H = 24;

    private LoadTerms() {}

    /**
     * Returns the heat through a face: U A (difference + sun allowance).
     *
     * @param face its name
     * @param wattsM2K transmittance, W/(m2 K)
     * @param areaM2 area, m2
     * @param differenceK air beyond less air of the room, K
     * @param sunK what sunshine adds to the difference, K, 0 or more
     * @return the term
     */
    public static Term transmission(
            String face, double wattsM2K, double areaM2, double differenceK, double sunK) {
        double watts = UValue.flowW(wattsM2K, areaM2, differenceK + sunK);
        return new Term(
                Kind.TRANSMISSION,
                watts,
                Reason.about(
                        "load-transmission",
                        face,
                        STANDARD,
                        one(wattsM2K),
                        one(areaM2),
                        Argument.of(differenceK, "K"),
                        Argument.of(sunK, "K"),
                        watts(watts)));
    }

    /**
     * Returns the heat of air that comes in: changes a day x volume x heat of a cubic metre.
     *
     * @param room its name
     * @param changesPerDay air changes a day
     * @param volumeM3 gross volume, m3
     * @param heatJm3 enthalpy a cubic metre of room air gains when outdoor air replaces it, J/m3
     * @return the term
     */
    public static Term airChange(
            String room, double changesPerDay, double volumeM3, double heatJm3) {
        double watts = Leakage.leakM3s(changesPerDay, volumeM3) * heatJm3;
        return new Term(
                Kind.AIR_CHANGE,
                watts,
                Reason.about(
                        "load-air-change",
                        room,
                        TABLE,
                        one(changesPerDay),
                        one(volumeM3),
                        one(heatJm3 / 1_000),
                        watts(watts)));
    }

    /**
     * Returns field heat: mass x specific heat x difference over the hours of its pull-down. A mass
     * pulled down in less than a day asks for more than its share of the day.
     *
     * @param lot its name
     * @param massKg produce that comes in, kg
     * @param specificHeatJkgK its specific heat, J/(kg K)
     * @param differenceK arrival less storage, K
     * @param hours hours of the pull-down, above 0
     * @return the term
     */
    public static Term product(
            String lot, double massKg, double specificHeatJkgK, double differenceK, double hours) {
        return product(lot, massKg, massKg * specificHeatJkgK * differenceK, hours);
    }

    /**
     * Returns field heat where print gives the heat of a kilogram.
     *
     * @param lot its name
     * @param massKg produce that comes in, kg
     * @param heatJ what it gives up in all, J
     * @param hours hours of the pull-down, above 0
     * @return the term
     */
    public static Term product(String lot, double massKg, double heatJ, double hours) {
        return over(Kind.PRODUCT, lot, massKg, heatJ, hours);
    }

    /**
     * Returns the heat of packages that come in with the produce: mass x specific heat x difference
     * over the hours of the pull-down.
     *
     * @param lot its name
     * @param massKg packages that come in, kg
     * @param specificHeatJkgK their specific heat, J/(kg K)
     * @param differenceK arrival less storage, K
     * @param hours hours of the pull-down, above 0
     * @return the term
     */
    public static Term packages(
            String lot, double massKg, double specificHeatJkgK, double differenceK, double hours) {
        return over(Kind.PACKAGES, lot, massKg, massKg * specificHeatJkgK * differenceK, hours);
    }

    private static Term over(Kind kind, String lot, double massKg, double heatJ, double hours) {
        Require.within("hours of the pull-down of " + lot, hours, 0.1, 1_000, "h", "");
        double watts = heatJ / (hours * HOUR_S);
        Argument mass = Argument.of(massKg, "kg");
        Argument heat = one(massKg > 0 ? heatJ / massKg / 1_000 : 0);
        Argument span = Argument.of(hours, "h");
        Reason formula =
                kind == Kind.PRODUCT
                        ? Reason.about(
                                "load-product", lot, HANDBOOK, mass, heat, span, watts(watts))
                        : Reason.about(
                                "load-packages", lot, HANDBOOK, mass, heat, span, watts(watts));
        return new Term(kind, watts, formula);
    }

    /**
     * Returns the heat of breathing.
     *
     * @param lot its name
     * @param massKg produce in the room, kg
     * @param wattsPerKg its breathing at its temperature, W/kg
     * @param sourceId where that is printed
     * @return the term
     */
    public static Term respiration(String lot, double massKg, double wattsPerKg, String sourceId) {
        double watts = massKg * wattsPerKg;
        return new Term(
                Kind.RESPIRATION,
                watts,
                Reason.about(
                        "load-respiration",
                        lot,
                        sourceId,
                        Argument.of(massKg, "kg"),
                        one(1_000 * wattsPerKg),
                        watts(watts)));
    }

    /**
     * Returns the heat of lights.
     *
     * @param room its name
     * @param burningW lights, W
     * @param hoursPerDay hours a day they burn, 0 to 24
     * @return the term
     */
    public static Term lights(String room, double burningW, double hoursPerDay) {
        double mean = burningW * hoursPerDay / DAY_H;
        return new Term(
                Kind.LIGHTS,
                mean,
                Reason.about(
                        "load-lights",
                        room,
                        HANDBOOK,
                        watts(burningW),
                        Argument.of(hoursPerDay, "h"),
                        watts(mean)));
    }

    /**
     * Returns the heat of people.
     *
     * @param room its name
     * @param personHoursPerDay person-hours a day inside
     * @param eachW heat of one person, W; {@code enclosure.PeopleHeat} gives it by temperature
     * @return the term
     */
    public static Term people(String room, double personHoursPerDay, double eachW) {
        double mean = personHoursPerDay * eachW / DAY_H;
        return new Term(
                Kind.PEOPLE,
                mean,
                Reason.about(
                        "load-people",
                        room,
                        HANDBOOK,
                        one(personHoursPerDay),
                        watts(eachW),
                        watts(mean)));
    }

    /**
     * Returns the heat of fans, all of whose power ends as heat in the room.
     *
     * @param room its name
     * @param runningW fans, W
     * @param hoursPerDay hours a day they run, 0 to 24
     * @return the term
     */
    public static Term fans(String room, double runningW, double hoursPerDay) {
        double mean = runningW * hoursPerDay / DAY_H;
        return new Term(
                Kind.FANS,
                mean,
                Reason.about(
                        "load-fans",
                        room,
                        HANDBOOK,
                        watts(runningW),
                        Argument.of(hoursPerDay, "h"),
                        watts(mean)));
    }

    /**
     * Returns the heat of defrosts that stays in the room; the rest leaves with the melt water.
     *
     * @param room its name
     * @param heaterW heaters, W
     * @param hoursPerDay hours a day they are on
     * @param stays share that stays in the room, 0 to 1
     * @return the term
     */
    public static Term defrost(String room, double heaterW, double hoursPerDay, double stays) {
        Require.within("share of the defrost that stays", stays, 0, 1, "", "");
        double mean = heaterW * hoursPerDay * stays / DAY_H;
        return new Term(
                Kind.DEFROST,
                mean,
                Reason.about(
                        "load-defrost",
                        room,
                        HANDBOOK,
                        watts(heaterW),
                        Argument.of(hoursPerDay, "h"),
                        Argument.of(100 * stays, "pct"),
                        watts(mean)));
    }

    private static Argument one(double value) {
        return Argument.of(value, "1");
    }

    private static Argument watts(double value) {
        return Argument.of(value, "W");
    }
}
