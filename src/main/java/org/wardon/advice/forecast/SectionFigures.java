package org.wardon.advice.forecast;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.wardon.advice.wording.Words;
import org.wardon.air.Timeline;
import org.wardon.enclosure.section.Chest;
import org.wardon.enclosure.section.SectionField;
import org.wardon.enclosure.section.Side;
import org.wardon.enclosure.section.SpaceReading;
import org.wardon.enclosure.section.Spot;
import org.wardon.enclosure.section.StillAirSection;
import org.wardon.files.forecast.Forecast;
import org.wardon.files.forecast.SectionAnswer;
import org.wardon.heat.HourAccount;
import org.wardon.plan.ChamberPlan;
import org.wardon.produce.Caution;
import org.wardon.produce.Reason;
import org.wardon.produce.Reason.Argument;

/** Turns a section into figures and sentences. */
final class SectionFigures {
    /**
     * Odd, so that one stands in the middle, and so that nine columns of a page fall on middles.
     */
    private static final int COLUMNS = 45;

    private static final int FEWEST_ROWS = 9;
    private static final int MOST_ROWS = 63;

    private final StoreModel model;
    private final ChamberPlan chamber;
    private final Words words;

    SectionFigures(StoreModel model, ChamberPlan chamber, Words words) {
        this.model = model;
        this.chamber = chamber;
        this.words = words;
    }

    /** The name of a value as files and command line have it. */
    static String word(Enum<?> value) {
        return value.name().toLowerCase(Locale.ROOT).replace('_', '-');
    }

    SectionAnswer answer(StillChamber.Seen seen) {
        StillAirSection section = seen.section();
        Chest chest = section.chest();
        SectionField field = section.field();
        StillPlaces places = new StillPlaces(model, chamber, seen);
        return new SectionAnswer(
                chamber.id(),
                model.plan().timeline().localAt(seen.last().untilS()),
                (seen.last().untilS() - seen.hours().get(0).fromS()) / Timeline.HOUR_S,
                word(chest.cut()),
                field.widthM(),
                field.heightM(),
                faces(chest),
                model.settings(chamber).until(seen.last().untilS()).temperatureC(),
                seen.mean(HourAccount::outdoorC),
                chest.airC(),
                field.meanC(),
                section.airMeanC(),
                place(places, field.warmest()),
                place(places, field.coldest()),
                section.spreadK(),
                section.airSpreadK(),
                stack(seen),
                section.spaces().stream().map(SectionFigures::space).toList(),
                leftOpenPct(field),
                cells(field),
                said(seen, places),
                warnings(places));
    }

    private static List<SectionAnswer.OfFace> faces(Chest chest) {
        List<SectionAnswer.OfFace> faces = new ArrayList<>();
        for (Side side : Side.values()) {
            faces.add(
                    new SectionAnswer.OfFace(
                            word(side), word(chest.cut().face(side)), chest.at(side)));
        }
        return faces;
    }

    private SectionAnswer.Place place(StillPlaces places, Spot spot) {
        Reason where = places.where(spot);
        return new SectionAnswer.Place(
                spot.xM(),
                spot.yM(),
                spot.temperatureC(),
                places.inStack(spot),
                words.sentence(where));
    }

    private static SectionAnswer.OfSpace space(SpaceReading read) {
        return new SectionAnswer.OfSpace(
                word(read.space()),
                read.thicknessM(),
                read.differenceK(),
                read.rayleigh(),
                read.nusselt(),
                read.conductsWmK());
    }

    private static Optional<SectionAnswer.OfStack> stack(StillChamber.Seen seen) {
        StillAirSection section = seen.section();
        return section.outline()
                .map(
                        outline ->
                                new SectionAnswer.OfStack(
                                        seen.lots().stream().map(HourAccount.OfLot::id).toList(),
                                        massKg(seen),
                                        outline.fromM(),
                                        outline.toM(),
                                        outline.footM(),
                                        outline.topM(),
                                        section.chest().stack().orElseThrow().heatW(),
                                        section.field()
                                                .meanC(section.stackColumns(), section.stackRows()),
                                        section.warmestInStack().orElseThrow().temperatureC(),
                                        section.coldestInStack().orElseThrow().temperatureC(),
                                        seen.lotsMeanC()));
    }

    private static double massKg(StillChamber.Seen seen) {
        return seen.lots().stream().mapToDouble(HourAccount.OfLot::massKg).sum();
    }

    private static double leftOpenPct(SectionField field) {
        double sum = field.givenW() + field.exchangedW();
        double through = Math.abs(field.givenW()) + Math.abs(field.exchangedW());
        for (Side side : Side.values()) {
            sum += field.inW(side);
            through += Math.abs(field.inW(side));
        }
        return through > 0 ? 100 * Math.abs(sum) / through : 0;
    }

    private static SectionAnswer.Field cells(SectionField field) {
        int even = (int) Math.round(COLUMNS * field.heightM() / field.widthM());
        int rows = Math.min(MOST_ROWS, Math.max(FEWEST_ROWS, even));
        List<List<Double>> all = new ArrayList<>();
        for (int row = 0; row < rows; row++) {
            double y = field.heightM() * (1 - (row + 0.5) / rows);
            List<Double> one = new ArrayList<>();
            for (int column = 0; column < COLUMNS; column++) {
                one.add(field.atC(field.widthM() * (column + 0.5) / COLUMNS, y));
            }
            all.add(one);
        }
        return new SectionAnswer.Field(COLUMNS, rows, all);
    }

    private List<String> said(StillChamber.Seen seen, StillPlaces places) {
        List<Reason> reasons = new ArrayList<>();
        reasons.add(places.spread());
        reasons.add(places.againstOneAir());
        seen.section()
                .outline()
                .ifPresent(
                        outline ->
                                reasons.add(
                                        Reason.about(
                                                "section-stack",
                                                chamber.id(),
                                                "assumption",
                                                Argument.of(massKg(seen), "kg"),
                                                Argument.of(outline.toM() - outline.fromM(), "m"),
                                                Argument.of(outline.topM() - outline.footM(), "m"),
                                                places.coldestInStack(),
                                                places.warmestInStack(),
                                                Argument.of(seen.lotsMeanC(), "C"))));
        places.notAtRest().ifPresent(reasons::add);
        reasons.add(Reason.about("section-is-a-guess", chamber.id(), "assumption"));
        return reasons.stream().map(words::sentence).toList();
    }

    private List<Forecast.Warning> warnings(StillPlaces places) {
        return places.cautions().stream()
                .sorted(Comparator.comparing(Caution::level).reversed())
                .map(
                        caution ->
                                new Forecast.Warning(
                                        caution.reason().code(),
                                        word(caution.level()),
                                        String.join(",", caution.reason().subjects()),
                                        words.sentence(caution.reason()),
                                        caution.reason().sourceId()))
                .toList();
    }
}
