package org.wardon.heat;

import java.util.List;
import org.wardon.air.Timeline;
import org.wardon.air.Weather;
import org.wardon.air.YearWave;
import org.wardon.cooling.FaceCooler;
import org.wardon.cooling.SettingCourse;
import org.wardon.enclosure.Surroundings;
import org.wardon.errors.Progress;
import org.wardon.heat.network.ChamberNetwork;

/**
 * The state a run starts with. A chamber held at its setting starts with faces at the steady
 * profile; one that follows the weather, without lots and with its coolers at rest but for walls
 * kept wet, after its first day came five times.
 */
final class WarmUp {
    private static final int DAYS = 5;
    private static final int DAY_H = 24;

    private WarmUp() {}

    static double[] start(
            ChamberRun run, ChamberNetwork network, Accuracy accuracy, boolean plain) {
        double[] y = network.start(RunCompiler.startC(run), RunCompiler.startRatio(run, network));
        if (!wanted(run)) {
            return y;
        }
        run.start().warmed().orElseGet(() -> warmed(run, accuracy, plain)).into(y);
        run.start().humidityPct().ifPresent(pct -> network.air().setHumidity(pct / 100, y));
        return y;
    }

    static Warmed warmed(ChamberRun run, Accuracy accuracy, boolean plain) {
        Surroundings around = RunCompiler.surroundings(run);
        ChamberRun before = firstDayRepeated(run, around);
        // Faces and soil are cut by where heat is expected to flow: as in the run it is for.
        Surroundings keeping = RunCompiler.surroundings(before).keeping(around.insideMeanC());
        ChamberNetwork empty = RunCompiler.network(before, keeping, plain);
        double[] warm =
                empty.start(RunCompiler.startC(before), RunCompiler.startRatio(before, empty));
        new ChamberRunner(before, empty, warm, accuracy).run(Progress.SILENT);
        return new Warmed(warm);
    }

    static boolean wanted(ChamberRun run) {
        return RunCompiler.startsOutdoors(run) && run.start().temperatureC().isEmpty();
    }

    private static ChamberRun firstDayRepeated(ChamberRun run, Surroundings around) {
        int hours = DAYS * DAY_H + 3;
        double[] temperature = new double[hours];
        double[] humidity = new double[hours];
        double[] sun = new double[hours];
        double[] wind = new double[hours];
        Weather weather = run.weather();
        for (int h = 0; h < hours; h++) {
            int hour = h % DAY_H;
            temperature[h] = weather.temperatureC(hour);
            humidity[h] = weather.humidityPct(hour);
            sun[h] = weather.globalWm2(hour);
            wind[h] = weather.windMs(hour);
        }
        return new ChamberRun(
                run.chamberId(),
                run.site().withYear(year(around)),
                new Timeline(run.timeline().from().minusDays(DAYS), run.site().zone()),
                new Weather(temperature, humidity, sun, wind),
                run.enclosure(),
                // Wetted walls are wet before the run too: they are what the weather makes of them.
                run.coolers().stream().filter(FaceCooler.class::isInstance).toList(),
                SettingCourse.steady(run.setting()),
                List.of(),
                List.of(),
                run.factors(),
                run.start(),
                DAYS * Timeline.DAY_S,
                run.doorMode(),
                run.controlMode(),
                run.extras().onGrid());
    }

    /** The year the ground of the run follows, which its first day alone would not tell. */
    private static YearWave year(Surroundings around) {
        return around.year().orElseGet(() -> new YearWave(around.meanOutdoorC(), 0, 1));
    }
}
