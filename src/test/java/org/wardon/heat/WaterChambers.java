package org.wardon.heat;

import java.time.LocalTime;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.wardon.air.Weather;
import org.wardon.cooling.Control;
import org.wardon.cooling.Setting;
import org.wardon.cooling.WaterFilm;
import org.wardon.cooling.WettedWall;
import org.wardon.enclosure.Beyond;
import org.wardon.enclosure.Box;
import org.wardon.enclosure.Enclosure;
import org.wardon.enclosure.Face;
import org.wardon.enclosure.FaceName;
import org.wardon.enclosure.Gains;
import org.wardon.enclosure.Layer;

/** Chambers with water on their faces, for tests. */
final class WaterChambers {
    static final Set<FaceName> WALLS =
            EnumSet.of(FaceName.NORTH, FaceName.EAST, FaceName.SOUTH, FaceName.WEST);
    static final List<LocalTime> TWICE = List.of(LocalTime.of(7, 0), LocalTime.of(17, 0));

    private static final Layer BRICK = new Layer("brick", 0.115, 0.9, 1_900, 1_000);
    private static final Layer WET_SAND = new Layer("sand", 0.075, 1.8, 1_900, 1_450);
    private static final Layer STRAW = new Layer("straw", 0.05, 0.07, 120, 1_600);

    private WaterChambers() {}

    /**
     * The double-walled chamber of brick and wet sand under a shade roof, 1.65 m x 1.15 m x 0.70 m.
     * Source: ECC-ANGR in the table of cooling sources; conductivities of wet materials from memory
     * of ISO 10456.
     */
    static Enclosure brickAndSand(Beyond walls) {
        List<Face> faces = new ArrayList<>();
        for (FaceName name : FaceName.values()) {
            boolean wall = WALLS.contains(name);
            List<Layer> layers = wall ? List.of(BRICK, WET_SAND, BRICK) : List.of(STRAW);
            Beyond beyond = wall ? walls : new Beyond.Shade();
            faces.add(
                    new Face(
                            name,
                            name == FaceName.FLOOR ? new Beyond.Ground() : beyond,
                            0,
                            0.6,
                            name == FaceName.FLOOR ? List.of(BRICK) : layers));
        }
        return new Enclosure(
                new Box(1.65, 1.15, 0.70), faces, 0, Optional.empty(), 10, 0, Gains.NONE, 0, false);
    }

    static WettedWall wetted(double kgPerDay) {
        return new WettedWall(WALLS, kgPerDay, 0.5, TWICE);
    }

    static WaterFilm film(boolean open, Control control, double flowKgS, double inletC) {
        return film(open, control, flowKgS, inletC, Optional.empty());
    }

    static WaterFilm film(
            boolean open,
            Control control,
            double flowKgS,
            double inletC,
            Optional<WaterFilm.Chiller> chiller) {
        return new WaterFilm(
                EnumSet.of(FaceName.NORTH, FaceName.EAST),
                flowKgS,
                List.of(inletC),
                chiller,
                60,
                open,
                10,
                control);
    }

    /** A dry summer: a plain day, hot and dry at three in the afternoon. */
    static Weather drySummer(int hours, double meanC, double rangeK, double dewPointPa) {
        double[] t = new double[hours];
        double[] rh = new double[hours];
        double[] sun = new double[hours];
        double[] wind = new double[hours];
        for (int h = 0; h < hours; h++) {
            t[h] = meanC + 0.5 * rangeK * Math.cos(2 * Math.PI * (h - 15) / 24);
            rh[h] = Math.min(100, 100 * dewPointPa / org.wardon.air.SaturatedAir.pressurePa(t[h]));
            sun[h] = Math.max(0, 850 * Math.cos(2 * Math.PI * (h % 24 - 12) / 24));
            wind[h] = Double.NaN;
        }
        return new Weather(t, rh, sun, wind);
    }

    static ChamberRun ofBrick(double kgPerDay, Weather weather, double days) {
        return Chambers.passive(brickAndSand(new Beyond.Shade()), weather, days)
                .withSetting(new Setting(25, 1, 90))
                .withCoolers(List.of(wetted(kgPerDay)));
    }

    static ChamberRun ofFilm(WaterFilm film, double days) {
        return Chambers.full(Control.MODULATING, 2, days)
                .withSetting(new Setting(13, 1, 90))
                .withCoolers(List.of(film));
    }
}
