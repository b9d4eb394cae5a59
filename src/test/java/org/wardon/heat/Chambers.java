package org.wardon.heat;

import java.time.LocalDateTime;
import java.time.LocalTime;
import java.time.ZoneId;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.SplittableRandom;
import org.wardon.air.Site;
import org.wardon.air.Timeline;
import org.wardon.air.Weather;
import org.wardon.cooling.Compressor;
import org.wardon.cooling.Control;
import org.wardon.cooling.Setting;
import org.wardon.enclosure.Beyond;
import org.wardon.enclosure.Box;
import org.wardon.enclosure.Door;
import org.wardon.enclosure.Enclosure;
import org.wardon.enclosure.Face;
import org.wardon.enclosure.FaceName;
import org.wardon.enclosure.Gains;
import org.wardon.enclosure.Layer;
import org.wardon.lots.Item;
import org.wardon.lots.Lot;
import org.wardon.lots.Packing;
import org.wardon.lots.RespirationLaw;
import org.wardon.lots.Shape;
import org.wardon.lots.TranspirationLaw;

/** Invented chambers and lots for tests of the heat model. */
public final class Chambers {
    static final ZoneId ZONE = ZoneId.of("UTC");
    static final Site SITE = new Site(12, -61.7, 20, ZONE);
    static final Timeline TIMELINE = new Timeline(LocalDateTime.of(2026, 3, 2, 0, 0), ZONE);
    static final Layer SHEET = new Layer("steel", 0.0005, 50, 7800, 500);
    static final Layer FOAM = new Layer("foam", 0.08, 0.024, 35, 1400);

    private Chambers() {}

    static List<Face> faces(Beyond walls, Beyond floor, List<Layer> layers) {
        List<Face> faces = new ArrayList<>();
        for (FaceName name : FaceName.values()) {
            Beyond beyond = name == FaceName.FLOOR ? floor : walls;
            double looks =
                    switch (name) {
                        case NORTH -> 0;
                        case EAST -> 90;
                        case SOUTH -> 180;
                        case WEST -> 270;
                        default -> 0;
                    };
            faces.add(new Face(name, beyond, looks, 0.6, layers));
        }
        return faces;
    }

    static Enclosure shut(List<Layer> layers) {
        return new Enclosure(
                new Box(4, 3, 2.5),
                faces(new Beyond.Shade(), new Beyond.Shade(), layers),
                0,
                Optional.empty(),
                0,
                0,
                Gains.NONE,
                0,
                false);
    }

    static Enclosure panelRoom(double openings) {
        Door door =
                new Door(
                        0.9,
                        2.0,
                        openings,
                        60,
                        LocalTime.of(7, 0),
                        LocalTime.of(19, 0),
                        0,
                        "none",
                        new Beyond.Outdoors());
        return new Enclosure(
                new Box(6, 5, 3),
                faces(new Beyond.Outdoors(), new Beyond.Ground(), List.of(SHEET, FOAM, SHEET)),
                10,
                Optional.of(door),
                2,
                0,
                new Gains(60, 2, 2, 0),
                50_000,
                false);
    }

    static Compressor unit(Control control) {
        return unit(control, 3);
    }

    static Compressor unit(Control control, double minMinutes) {
        return unit(control, minMinutes, OptionalDouble.empty());
    }

    static Compressor limited(Control control, double dailyKWh) {
        return unit(control, 3, OptionalDouble.of(dailyKWh));
    }

    private static Compressor unit(Control control, double minMinutes, OptionalDouble dailyKWh) {
        return new Compressor(
                12_000,
                4_800,
                5,
                35,
                350,
                false,
                2_000,
                2.0,
                control,
                minMinutes,
                minMinutes,
                3,
                -5,
                Optional.empty(),
                dailyKWh);
    }

    static Weather weather(int hours) {
        double[] t = new double[hours];
        double[] rh = new double[hours];
        double[] sun = new double[hours];
        double[] wind = new double[hours];
        for (int h = 0; h < hours; h++) {
            double day = Math.cos(2 * Math.PI * (h - 15) / 24);
            t[h] = 27 + 5 * day + 2 * Math.sin(2 * Math.PI * h / (24 * 7.3));
            rh[h] = 75 - 15 * day;
            sun[h] = Math.max(0, 850 * Math.cos(2 * Math.PI * (h % 24 - 12) / 24));
            wind[h] = Double.NaN;
        }
        return new Weather(t, rh, sun, wind);
    }

    static RespirationLaw breath(double wattsPerKgAtZero, double perK) {
        return new RespirationLaw() {
            @Override
            public double wattsPerKg(double temperatureC) {
                return wattsPerKgAtZero * Math.exp(perK * temperatureC);
            }

            @Override
            public double slopeWattsPerKgK(double temperatureC) {
                return perK * wattsPerKg(temperatureC);
            }
        };
    }

    static Lot lot(String id, double kg, double radiusM, double halfHours) {
        Item item = new Item(Shape.SPHERE, radiusM, 850, 3700, 0.5, 0.15);
        double chamber = 3700 * Math.log(2) / (halfHours * 3600);
        Packing packing = new Packing(8 * item.areaM2PerKg(), chamber, 1e-3, 100, 2e-10);
        TranspirationLaw water = new TranspirationLaw(6e-11, 0.98, 2e-9);
        return new Lot(id, kg, item, packing, breath(0.015, 0.09), water);
    }

    static List<Stay> load(int count, double kgInAll, double pulpC) {
        SplittableRandom random = new SplittableRandom(20240501L + count);
        List<Stay> stays = new ArrayList<>();
        for (int i = 0; i < count; i++) {
            double radius = 0.01 + 0.04 * random.nextDouble();
            double half = 3 + 9 * random.nextDouble();
            double pulp = pulpC + 6 * random.nextDouble();
            stays.add(
                    new Stay(
                            lot("L" + i, kgInAll / count, radius, half),
                            0,
                            Double.POSITIVE_INFINITY,
                            pulp));
        }
        return stays;
    }

    static ChamberRun passive(Enclosure enclosure, Weather weather, double days) {
        return ChamberRun.of(
                "north", SITE, TIMELINE, weather, enclosure, new Setting(12, 1, 90), days * 86_400);
    }

    /** Twelve lots in a panel room with door, sun, people and a compressor. */
    static ChamberRun full(Control control, int lots, double days) {
        int hours = (int) (days * 24) + 3;
        return passive(panelRoom(20), weather(hours), days)
                .withSetting(new Setting(4, 1, 90))
                .withCoolers(List.of(unit(control)))
                .withStays(load(lots, 6_000, 22));
    }
}
