package org.wardon.heat;

import java.util.HashMap;
import java.util.HashSet;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import org.wardon.air.MoistAir;
import org.wardon.air.StandardAtmosphere;
import org.wardon.cooling.Cooler;
import org.wardon.enclosure.Enclosure;
import org.wardon.enclosure.Surroundings;
import org.wardon.errors.Require;
import org.wardon.heat.network.ChamberNetwork;
import org.wardon.heat.network.NetworkInputs;
import org.wardon.heat.network.Tuning;

/** Turns a run into the network of its chamber. */
final class RunCompiler {
    private RunCompiler() {}

    static double pressurePa(ChamberRun run) {
        return StandardAtmosphere.pressurePa(run.site().elevationM());
    }

    static int hours(ChamberRun run) {
        return (int) Math.ceil(run.durationS() / 3600 - 1e-9);
    }

    /** Whether it starts as the weather leaves it, not at its setting. */
    static boolean startsOutdoors(ChamberRun run) {
        return run.coolers().stream().noneMatch(Cooler::startsAtSetting)
                && run.controlMode() != ControlMode.IDEAL;
    }

    /**
     * What the inside stands at in the mean, for the direction of films and the mass of air, °C:
     * the setting in the mean, or outdoors where that is what it follows. Coolers that work with
     * outdoor air bring the chamber below outdoors at most down to the setting.
     */
    private static double insideMeanC(ChamberRun run, double outdoorMeanC) {
        double setC = run.settings().meanC(run.durationS());
        if (!startsOutdoors(run)) {
            return setC;
        }
        return run.coolers().isEmpty() ? outdoorMeanC : Math.min(setC, outdoorMeanC);
    }

    static ChamberNetwork network(ChamberRun run, boolean plain) {
        return network(run, surroundings(run), plain);
    }

    static ChamberNetwork network(ChamberRun run, Surroundings around, boolean plain) {
        checkControl(run);
        double pressure = pressurePa(run);
        return new ChamberNetwork(
                new NetworkInputs(
                        enclosure(run),
                        around,
                        neighbourRatios(run, pressure),
                        pressure,
                        run.coolers(),
                        control(run.controlMode()),
                        run.setting(),
                        run.stays().stream().map(Stay::lot).toList(),
                        atDoorEnd(run),
                        tuning(run.factors()),
                        run.doorMode() != DoorMode.PULSES,
                        run.doorMode().rowHours(),
                        run.extras().heaterW(),
                        run.extras().humidifierKgH() / 3600,
                        plain,
                        run.timeline().secondOfDay(0) / 3600));
    }

    /** As built; a load is counted in one air, whose ideal cooler reaches everywhere. */
    private static Enclosure enclosure(ChamberRun run) {
        return run.controlMode() == ControlMode.IDEAL
                ? run.enclosure().withZones(Optional.empty())
                : run.enclosure();
    }

    /** Numbers of the lots at the door end. */
    private static Set<Integer> atDoorEnd(ChamberRun run) {
        Set<Integer> found = new HashSet<>();
        for (int i = 0; i < run.stays().size(); i++) {
            if (run.stays().get(i).berth().spot().atDoorEnd(run.enclosure())) {
                found.add(i);
            }
        }
        return found;
    }

    static Tuning tuning(Factors f) {
        return new Tuning(
                f.wall(),
                f.exchange(),
                f.capacity(),
                f.respiration(),
                f.transpiration(),
                f.packageTime(),
                f.thermostatOffsetK());
    }

    private static void checkControl(ChamberRun run) {
        Require.that(
                run.doorMode() == DoorMode.PULSES || run.controlMode() != ControlMode.AS_BUILT,
                "an averaged door needs modulating or ideal control, found AS_BUILT");
        for (Stay stay : run.stays()) {
            Require.that(
                    stay.arrivesS() < run.durationS(),
                    "lot "
                            + stay.lot().id()
                            + " arrives at "
                            + stay.arrivesS()
                            + " s, after the run of "
                            + run.durationS()
                            + " s");
        }
    }

    private static NetworkInputs.Control control(ControlMode mode) {
        return switch (mode) {
            case AS_BUILT -> NetworkInputs.Control.AS_BUILT;
            case MODULATING -> NetworkInputs.Control.MODULATING;
            case IDEAL -> NetworkInputs.Control.IDEAL;
        };
    }

    static Surroundings surroundings(ChamberRun run) {
        int hours = hours(run) + 1;
        Map<String, Surroundings.HourlyAir> neighbours = new HashMap<>();
        run.extras()
                .neighbours()
                .forEach((id, air) -> neighbours.put(id, h -> air.temperatureC(h * 3600.0)));
        double mean = 0;
        for (int h = 0; h <= hours; h++) {
            mean += run.weather().temperatureC(h) / (hours + 1);
        }
        return outdoors(run, hours).keeping(insideMeanC(run, mean)).withNeighbours(neighbours);
    }

    /** Worked out anew where the run does not bring those of just its span and weather. */
    private static Surroundings outdoors(ChamberRun run, int hours) {
        return run.extras()
                .around()
                .filter(known -> known.hours() == hours)
                .filter(known -> known.weather().equals(run.weather()))
                .filter(known -> known.timeline().equals(run.timeline()))
                .filter(known -> known.site().equals(run.site()))
                .orElseGet(
                        () ->
                                Surroundings.of(
                                        run.site(),
                                        run.timeline(),
                                        run.weather(),
                                        hours,
                                        run.setting().temperatureC()));
    }

    private static Map<String, double[]> neighbourRatios(ChamberRun run, double pressurePa) {
        Map<String, double[]> ratios = new HashMap<>();
        int hours = hours(run) + 2;
        run.extras()
                .neighbours()
                .forEach(
                        (id, air) -> {
                            double[] ratio = new double[hours];
                            for (int h = 0; h < hours; h++) {
                                double t = h * 3600.0;
                                ratio[h] =
                                        MoistAir.humidityRatioAt(
                                                air.temperatureC(t),
                                                air.humidityFraction(t),
                                                pressurePa);
                            }
                            ratios.put(id, ratio);
                        });
        return ratios;
    }

    /** Temperature the run starts with, °C. */
    static double startC(ChamberRun run) {
        double usual =
                startsOutdoors(run) ? run.weather().temperatureC(0) : run.setting().temperatureC();
        return run.start().temperatureC().orElse(usual);
    }

    /** Humidity ratio the run starts with, kg/kg. */
    static double startRatio(ChamberRun run, ChamberNetwork network) {
        double pressure = pressurePa(run);
        double airC = startC(run);
        OptionalDouble given = run.start().humidityPct();
        if (given.isPresent()) {
            return MoistAir.humidityRatioAt(airC, given.getAsDouble() / 100, pressure);
        }
        double wanted =
                startsOutdoors(run)
                        ? network.outdoorRatio(0)
                        : MoistAir.humidityRatioAt(
                                airC, run.setting().humidityPct() / 100, pressure);
        return Math.min(wanted, MoistAir.saturatedHumidityRatio(airC, pressure));
    }
}
