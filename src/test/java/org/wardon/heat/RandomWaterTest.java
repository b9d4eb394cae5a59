package org.wardon.heat;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.wardon.air.Weather;
import org.wardon.cooling.Control;
import org.wardon.cooling.Cooler;
import org.wardon.cooling.Setting;
import org.wardon.cooling.WaterFilm;
import org.wardon.cooling.WettedWall;
import org.wardon.enclosure.Beyond;
import org.wardon.enclosure.Box;
import org.wardon.enclosure.Enclosure;
import org.wardon.enclosure.FaceName;
import org.wardon.enclosure.Gains;
import org.wardon.enclosure.Layer;
import org.wardon.errors.Progress;

/** Seeded chambers of every build with water on their faces: they run, and their books close. */
class RandomWaterTest {
    private static final Layer SHEET = new Layer("steel", 0.0006, 50, 7_800, 500);
    private static final Layer STILL_AIR = new Layer("air", 0.05, 0.28, 0, 0);
    private static final Layer BRICK = new Layer("brick", 0.24, 0.8, 1_800, 900);
    private static final Layer FOAM = new Layer("foam", 0.1, 0.028, 35, 1_400);
    private static final List<List<Layer>> BUILDS =
            List.of(
                    List.of(SHEET),
                    List.of(STILL_AIR),
                    List.of(SHEET, STILL_AIR),
                    List.of(STILL_AIR, BRICK),
                    List.of(BRICK),
                    List.of(SHEET, FOAM, SHEET),
                    List.of(FOAM, STILL_AIR));

    private final SplittableRandom random = new SplittableRandom(2026);

    private <T> T one(List<T> of) {
        return of.get(random.nextInt(of.size()));
    }

    private Set<FaceName> some(List<FaceName> of) {
        List<FaceName> names = new ArrayList<>(of);
        while (names.size() > 1 && random.nextInt(3) > 0) {
            names.remove(random.nextInt(names.size()));
        }
        return EnumSet.copyOf(names);
    }

    private Cooler wetted() {
        return new WettedWall(
                some(List.copyOf(WaterChambers.WALLS)),
                one(List.of(0.0, 1.0, 30.0, 400.0)),
                random.nextDouble(0, 1),
                WaterChambers.TWICE);
    }

    private Cooler film() {
        boolean open = random.nextBoolean();
        double inletC = random.nextDouble(0.1, 30);
        Optional<WaterFilm.Chiller> chiller =
                random.nextBoolean()
                        ? Optional.empty()
                        : Optional.of(
                                new WaterFilm.Chiller(random.nextDouble(10, 4_000), 0.45, 6, 12));
        return new WaterFilm(
                some(open ? List.copyOf(WaterChambers.WALLS) : List.of(FaceName.values())),
                Math.exp(random.nextDouble(Math.log(1e-3), Math.log(50))),
                List.of(inletC),
                chiller,
                random.nextDouble(0, 300),
                open,
                random.nextDouble(1, 60),
                one(List.of(Control.values())));
    }

    private ChamberRun run(Cooler cooler) {
        double mean = random.nextDouble(5, 36);
        double range = random.nextDouble(0, 16);
        Weather weather = WaterChambers.drySummer(30, mean, range, random.nextDouble(300, 2_500));
        Beyond walls = random.nextBoolean() ? new Beyond.Shade() : new Beyond.Outdoors();
        Enclosure enclosure =
                new Enclosure(
                        new Box(
                                random.nextDouble(0.5, 8),
                                random.nextDouble(0.5, 6),
                                random.nextDouble(0.5, 4)),
                        Chambers.faces(walls, new Beyond.Ground(), one(BUILDS)),
                        random.nextDouble(0, 20),
                        Optional.empty(),
                        random.nextDouble(0, 40),
                        0,
                        Gains.NONE,
                        random.nextDouble(0, 50_000),
                        random.nextBoolean());
        return Chambers.passive(enclosure, weather, 1)
                .withSetting(new Setting(random.nextDouble(2, 25), 1, 90))
                .withCoolers(List.of(cooler));
    }

    @Test
    void booksCloseWhateverTheBuild() {
        for (int k = 0; k < 80; k++) {
            ChamberRun run = run(k % 2 == 0 ? wetted() : film());
            Course course = HeatModel.run(run, Progress.SILENT);
            assertTrue(
                    course.balanceErrorPct() < 0.1,
                    k + ": " + course.balanceErrorPct() + " % of " + run);
            assertTrue(course.waterUsedKg() >= -1e-9, k + ": " + course.coolers());
            assertTrue(course.counts().steps() < 60_000, k + ": " + course.counts() + run);
        }
    }
}
