package org.wardon.heat;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.wardon.cooling.Cooler;
import org.wardon.enclosure.AirZones;
import org.wardon.enclosure.FaceName;
import org.wardon.errors.Progress;

/** Seeded chambers of any build, their air cut in two, against the limits of physics. */
class RandomTwoEndsTest {
    private static final int SEEDS = 1_500;

    private static ChamberRun cut(ChamberRun run, SplittableRandom random) {
        OptionalDouble exchange =
                random.nextBoolean()
                        ? OptionalDouble.empty()
                        : OptionalDouble.of(Math.exp(random.nextDouble(-7, 4)));
        FaceName end = random.nextBoolean() ? FaceName.EAST : FaceName.WEST;
        AirZones zones = new AirZones(end, random.nextDouble(0.1, 0.9), exchange);
        List<Stay> stays = new ArrayList<>();
        for (Stay stay : run.stays()) {
            Berth.Spot spot = Berth.Spot.values()[random.nextInt(3)];
            stays.add(
                    new Stay(
                            stay.lot(),
                            stay.arrivesS(),
                            stay.leavesS(),
                            stay.pulpC(),
                            stay.freshUntilS(),
                            stay.surfaceWaterKg(),
                            stay.berth().at(spot)));
        }
        return run.withStays(stays).withEnclosure(run.enclosure().withZones(Optional.of(zones)));
    }

    @Test
    void everyRunKeepsTheLimitsOfPhysics() {
        List<String> broken = new ArrayList<>();
        int ran = 0;
        for (long seed = 0; seed < SEEDS; seed++) {
            ChamberRun one = RandomRun.of(seed);
            if (!one.coolers().stream().allMatch(Cooler::actsInRoom)) {
                continue;
            }
            ran++;
            try {
                ChamberRun two = cut(one, new SplittableRandom(seed));
                Course course = HeatModel.run(two, Progress.SILENT);
                for (String limit : RunLimits.broken(two, course)) {
                    broken.add(seed + ": " + limit);
                }
            } catch (RuntimeException stopped) {
                broken.add(seed + ": " + stopped);
            }
        }
        assertTrue(ran > 100, "runs " + ran);
        assertEquals(List.of(), broken.subList(0, Math.min(20, broken.size())), "of " + ran);
    }
}
