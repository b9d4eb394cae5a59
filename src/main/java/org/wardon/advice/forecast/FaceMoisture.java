package org.wardon.advice.forecast;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import java.util.function.IntToDoubleFunction;
import org.wardon.air.MoistAir;
import org.wardon.air.SaturatedAir;
import org.wardon.air.StandardAtmosphere;
import org.wardon.air.Timeline;
import org.wardon.cooling.WettedWall;
import org.wardon.enclosure.Beyond;
import org.wardon.enclosure.Face;
import org.wardon.enclosure.Films;
import org.wardon.enclosure.InnerCondensation;
import org.wardon.enclosure.InnerCondensation.Answer;
import org.wardon.enclosure.InnerCondensation.Side;
import org.wardon.enclosure.Layer;
import org.wardon.enclosure.OutsideBoundary;
import org.wardon.enclosure.Surroundings;
import org.wardon.heat.Course;
import org.wardon.heat.HeatModel;
import org.wardon.heat.Hours;
import org.wardon.plan.ChamberPlan;
import org.wardon.produce.Caution;
import org.wardon.produce.Caution.Level;
import org.wardon.produce.Reason;
import org.wardon.produce.Reason.Argument;

/**
 * Whether water gathers inside the faces of a chamber, by the mean of each month of the run. Faces
 * on the ground are not judged: how damp their soil is nobody told. Nor are walls kept wet on
 * purpose.
 */
final class FaceMoisture {
    private static final int MONTH_H = 30 * 24;
    private static final String STANDARD = "ISO13788";

    private final ChamberPlan chamber;
    private final StoreOutcome outcome;
    private final double pressurePa;

    private FaceMoisture(ChamberPlan chamber, StoreOutcome outcome) {
        this.chamber = chamber;
        this.outcome = outcome;
        this.pressurePa = StandardAtmosphere.pressurePa(outcome.model().plan().site().elevationM());
    }

    /** Cautions of a chamber, and one note of what cannot be told. */
    static List<Caution> of(ChamberPlan chamber, StoreOutcome outcome) {
        return new FaceMoisture(chamber, outcome).all();
    }

    /** What is told of faces alike: the layer, its material, and the side the damp comes from. */
    private record Place(int layer, String material, boolean fromOutside) {}

    /** Faces with water in the same place, and the most of it. */
    private static final class Found {
        private final List<String> faces = new ArrayList<>();
        private double kgM2S;
    }

    private List<Caution> all() {
        Surroundings around =
                HeatModel.around(
                        outcome.model().asPlanned(chamber, outcome.horizonS(), outcome.courses()));
        Map<Place, Found> wet = new LinkedHashMap<>();
        Set<String> unknown = new TreeSet<>();
        for (Face face : chamber.enclosure().faces()) {
            if (!(face.beyond() instanceof Beyond.Ground) && !keptWet(face)) {
                judge(face, OutsideBoundary.of(chamber.enclosure(), face, around), wet, unknown);
            }
        }
        List<Caution> cautions = new ArrayList<>();
        wet.forEach((place, found) -> cautions.add(new Caution(Level.CAUTION, wet(place, found))));
        if (!unknown.isEmpty()) {
            Argument materials = Argument.text(String.join(", ", unknown));
            Reason open = Reason.about("wet-inside-unknown", chamber.id(), STANDARD, materials);
            cautions.add(new Caution(Level.NOTE, open));
        }
        return cautions;
    }

    /** A wetted wall has water inside on purpose. */
    private boolean keptWet(Face face) {
        return chamber.coolers().stream()
                .anyMatch(
                        cooler ->
                                cooler instanceof WettedWall wall
                                        && wall.wets().contains(face.name()));
    }

    private void judge(
            Face face, OutsideBoundary boundary, Map<Place, Found> wet, Set<String> unknown) {
        Optional<Answer.Wet> worst = Optional.empty();
        for (int from = 0; from < rows(); from += MONTH_H) {
            Answer answer = month(face, boundary, from, Math.min(from + MONTH_H, rows()));
            if (answer instanceof Answer.Unknown open) {
                unknown.add(face.layers().get(open.layer()).material());
            } else if (answer instanceof Answer.Wet now
                    && now.kgM2S() > worst.map(Answer.Wet::kgM2S).orElse(0.0)) {
                worst = Optional.of(now);
            }
        }
        worst.ifPresent(
                most -> {
                    String material = face.layers().get(most.layer()).material();
                    Place place = new Place(most.layer() + 1, material, most.fromOutside());
                    Found found = wet.computeIfAbsent(place, any -> new Found());
                    found.faces.add(face.name().name().toLowerCase(Locale.ROOT));
                    found.kgM2S = Math.max(found.kgM2S, most.kgM2S());
                });
    }

    private int rows() {
        return hours().size();
    }

    private Hours hours() {
        return outcome.course(chamber.id()).hours();
    }

    private Reason wet(Place place, Found found) {
        Argument[] told = {
            Argument.text(String.join(", ", found.faces)),
            Argument.of(place.layer(), "1"),
            Argument.text(place.material()),
            Argument.of(1_000 * found.kgM2S * MONTH_H * Timeline.HOUR_S, "g/m2"),
            Argument.text(place.fromOutside() ? "outer" : "inner")
        };
        return found.faces.size() == 1
                ? Reason.about("wet-inside-face", chamber.id(), STANDARD, told)
                : Reason.about("wet-inside-faces", chamber.id(), STANDARD, told);
    }

    /** Judges a month by its means; rows {@code from} to before {@code to}. */
    private Answer month(Face face, OutsideBoundary boundary, int from, int to) {
        List<Layer> layers = face.layers().stream().map(Layer::asBuilt).toList();
        double beyondC = mean(from, to, h -> boundary.temperatureC(hour(h, boundary)));
        double film = 1 / boundary.filmWm2K(0);
        Side outside = new Side(beyondC, beyondPa(face.beyond(), from, to), film);
        Hours hours = hours();
        double airC = mean(from, to, hours::airC);
        double vapourPa = vapourPa(hours, from, to);
        return InnerCondensation.of(
                layers, outside, new Side(airC, vapourPa, Films.insideM2KW(boundary.direction())));
    }

    private static int hour(int row, OutsideBoundary boundary) {
        return Math.min(row, boundary.hours());
    }

    private static double mean(int from, int to, IntToDoubleFunction value) {
        double sum = 0;
        for (int i = from; i < to; i++) {
            sum += value.applyAsDouble(i);
        }
        return sum / (to - from);
    }

    private double vapourPa(Hours hours, int from, int to) {
        return mean(from, to, i -> MoistAir.vapourPressurePa(hours.humidityRatio(i), pressurePa));
    }

    /** Vapour beyond: of the neighbour, or outdoors; a space holds no more than it can. */
    private double beyondPa(Beyond beyond, int from, int to) {
        if (beyond instanceof Beyond.Neighbour neighbour) {
            Course other = outcome.course(neighbour.chamberId());
            return vapourPa(other.hours(), from, Math.min(to, other.hours().size()));
        }
        double most =
                beyond instanceof Beyond.Space space
                        ? SaturatedAir.pressurePa(space.temperatureC())
                        : Double.POSITIVE_INFINITY;
        var weather = outcome.model().weather();
        double outdoors =
                mean(
                        from,
                        to,
                        h ->
                                weather.humidityPct(h)
                                        / 100
                                        * SaturatedAir.pressurePa(weather.temperatureC(h)));
        return Math.min(outdoors, most);
    }
}
