package org.wardon.heat;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.LongStream;
import org.junit.jupiter.api.Test;
import org.wardon.errors.Progress;

/**
 * Thousands of seeded chambers for a day: limits of physics that every one must keep, and changes
 * that must not matter or must matter little. {@code -Dwardon.randomRuns=10000} runs more; {@code
 * -Dwardon.randomFrom=137} starts at another seed.
 */
class RandomRunsTest {
    private static final int RUNS = Integer.getInteger("wardon.randomRuns", 2_000);
    private static final int FROM = Integer.getInteger("wardon.randomFrom", 0);
    private static final int TOLD = 40;

    /** Seeds that broke a limit once: they are run whatever else is. */
    private static final List<Long> ONCE_BROKEN =
            List.of(3_074L, 4_260L, 4_429L, 5_092L, 5_696L, 5_851L, 7_501L, 8_028L, 8_952L, 9_068L);

    private final List<String> broken = new ArrayList<>();

    @Test
    void everyRunKeepsTheLimitsOfPhysics() {
        LongStream.concat(
                        LongStream.range(FROM, FROM + RUNS),
                        ONCE_BROKEN.stream().mapToLong(seed -> seed))
                .forEach(this::tryOut);
        String told = String.join("\n", broken.subList(0, Math.min(TOLD, broken.size())));
        assertEquals("", told, broken.size() + " breaches, each behind its seed");
    }

    private void tryOut(long seed) {
        try {
            check(seed);
        } catch (RuntimeException stopped) {
            broken.add(seed + ": " + stopped);
        }
    }

    private void check(long seed) {
        ChamberRun run = RandomRun.of(seed);
        Course course = HeatModel.run(run, Progress.SILENT);
        List<String> limits = RunLimits.broken(run, course);
        if (!limits.isEmpty()) {
            broken.add(seed + ": " + limits.get(0) + " (" + limits.size() + ")");
        }
        switch ((int) (seed % 3)) {
            case 0 -> ordered(seed, run, course);
            case 1 -> mirrored(seed, run, course);
            default -> continuous(seed, run);
        }
    }

    /** Sums in another order differ by rounding, which a thermostat may make a switching of. */
    private void ordered(long seed, ChamberRun run, Course course) {
        if (run.stays().size() > 1) {
            same(seed, "reordered", course, RunVariants.reordered(run));
        }
    }

    private void mirrored(long seed, ChamberRun run, Course course) {
        same(seed, "mirrored", course, RunVariants.mirrored(run));
    }

    private void same(long seed, String what, Course course, ChamberRun other) {
        Course too = HeatModel.run(other, Progress.SILENT);
        RunVariants.Apart apart = RunVariants.Apart.of(course, too);
        if (!apart.within(0.02, 0.005, 2e-4)) {
            broken.add(seed + ": " + what + " " + apart);
        }
    }

    private void continuous(long seed, ChamberRun run) {
        ChamberRun smooth = run.withControlMode(ControlMode.MODULATING);
        Course plain = HeatModel.run(smooth, Progress.SILENT);
        Course nudged = HeatModel.run(RunVariants.nudged(smooth, seed / 3), Progress.SILENT);
        RunVariants.Apart apart = RunVariants.Apart.of(plain, nudged);
        if (!apart.within(0.1, 0.05, 5e-3)) {
            broken.add(seed + ": nudged " + seed / 3 % 7 + " " + apart);
        }
    }
}
