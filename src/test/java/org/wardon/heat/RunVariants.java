package org.wardon.heat;

import java.util.ArrayList;
import java.util.Collections;
import java.util.EnumSet;
import java.util.List;
import java.util.Set;
import org.wardon.cooling.Cooler;
import org.wardon.cooling.WaterFilm;
import org.wardon.cooling.WettedWall;
import org.wardon.enclosure.Enclosure;
import org.wardon.enclosure.Face;
import org.wardon.enclosure.FaceName;
import org.wardon.lots.Lot;

/** Runs that must come to the same as another, or to nearly the same. */
final class RunVariants {
    /** Twelve watts for a day: of less a share says nothing. */
    private static final double LEAST_J = 1e6;

    private RunVariants() {}

    /** The lots named in another order. */
    static ChamberRun reordered(ChamberRun run) {
        List<Stay> stays = new ArrayList<>(run.stays());
        Collections.reverse(stays);
        return run.withStays(stays);
    }

    /** North and south walls changed for each other, and the side of the sun with them. */
    static ChamberRun mirrored(ChamberRun run) {
        List<Face> faces = run.enclosure().faces().stream().map(RunVariants::mirrored).toList();
        Enclosure was = run.enclosure();
        Enclosure mirrored =
                new Enclosure(
                        was.box(),
                        faces,
                        was.thermalBridgePct(),
                        was.door(),
                        was.leakageAirChangesPerDay(),
                        was.freshAirM3PerHour(),
                        was.gains(),
                        was.structureCapacityJK(),
                        was.computedFilms());
        return run.withEnclosure(mirrored)
                .withCoolers(run.coolers().stream().map(RunVariants::mirrored).toList());
    }

    private static FaceName mirrored(FaceName name) {
        return switch (name) {
            case NORTH -> FaceName.SOUTH;
            case SOUTH -> FaceName.NORTH;
            default -> name;
        };
    }

    private static Face mirrored(Face face) {
        return new Face(
                mirrored(face.name()),
                face.beyond(),
                face.azimuthDeg(),
                face.solarAbsorptance(),
                face.layers());
    }

    private static Set<FaceName> mirrored(Set<FaceName> names) {
        Set<FaceName> others = EnumSet.noneOf(FaceName.class);
        names.forEach(name -> others.add(mirrored(name)));
        return others;
    }

    private static Cooler mirrored(Cooler cooler) {
        if (cooler instanceof WettedWall wall) {
            return new WettedWall(
                    mirrored(wall.wets()),
                    wall.waterKgPerDay(),
                    wall.innerDampFraction(),
                    wall.pouredAt());
        }
        if (cooler instanceof WaterFilm film) {
            return new WaterFilm(
                    mirrored(film.wets()),
                    film.flowKgS(),
                    film.inletC(),
                    film.chiller(),
                    film.pumpW(),
                    film.open(),
                    film.gapMm(),
                    film.control());
        }
        return cooler;
    }

    /** A thousandth more of one input: which of them goes round with {@code which}. */
    static ChamberRun nudged(ChamberRun run, long which) {
        double x = 1.001;
        Factors plain = Factors.PLAIN;
        return switch ((int) (which % 7)) {
            case 0 -> run.withFactors(new Factors(x, 1, 1, 1, 1, 1, 0));
            case 1 -> run.withFactors(new Factors(1, x, 1, 1, 1, 1, 0));
            case 2 -> run.withFactors(new Factors(1, 1, x, 1, 1, 1, 0));
            case 3 -> run.withFactors(new Factors(1, 1, 1, x, 1, 1, 0));
            case 4 -> run.withFactors(new Factors(1, 1, 1, 1, x, 1, 0));
            case 5 -> run.withFactors(new Factors(1, 1, 1, 1, 1, x, 0));
            default ->
                    run.withFactors(plain)
                            .withStays(run.stays().stream().map(s -> heavier(s, x)).toList());
        };
    }

    private static Stay heavier(Stay stay, double times) {
        Lot lot = stay.lot();
        Lot heavier =
                new Lot(
                        lot.id(),
                        lot.massKg() * times,
                        lot.item(),
                        lot.packing(),
                        lot.respiration(),
                        lot.transpiration());
        return new Stay(
                heavier,
                stay.arrivesS(),
                stay.leavesS(),
                stay.pulpC(),
                stay.freshUntilS(),
                stay.surfaceWaterKg());
    }

    /** How far two courses of the same lots and hours lie apart at most. */
    record Apart(double airK, double lotK, double massShare, double heatShare) {
        static Apart of(Course a, Course b) {
            double airK = 0;
            for (int i = 0; i < a.hours().size(); i++) {
                airK = Math.max(airK, Math.abs(a.hours().airC(i) - b.hours().airC(i)));
            }
            double lotK = 0;
            double mass = 0;
            for (LotCourse lot : a.lots()) {
                LotCourse other = b.lot(lot.stay().lot().id());
                double kg = lot.stay().lot().massKg() / other.stay().lot().massKg();
                for (int i = 0; i < lot.size(); i++) {
                    lotK = Math.max(lotK, Math.abs(lot.meanC(i) - other.meanC(i)));
                    mass = Math.max(mass, Math.abs(1 - kg * other.massKg(i) / lot.massKg(i)));
                }
            }
            double through = Math.max(a.heat().throughput(), LEAST_J);
            double heat = Math.abs(a.heat().removed() - b.heat().removed()) / through;
            return new Apart(airK, lotK, mass, heat);
        }

        boolean within(double mostAirK, double mostLotK, double mostShare) {
            return airK <= mostAirK
                    && lotK <= mostLotK
                    && massShare <= mostShare
                    && heatShare <= mostShare;
        }
    }
}
