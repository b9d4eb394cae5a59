package org.wardon.heat.network;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.function.IntUnaryOperator;
import org.wardon.cooling.FaceCooler;
import org.wardon.cooling.WaterFilm;
import org.wardon.cooling.WettedWall;
import org.wardon.cooling.water.JacketGap;
import org.wardon.enclosure.Beyond;
import org.wardon.enclosure.Box;
import org.wardon.enclosure.Enclosure;
import org.wardon.enclosure.Face;
import org.wardon.enclosure.FaceName;
import org.wardon.enclosure.Films;
import org.wardon.enclosure.Layer;
import org.wardon.enclosure.OutsideBoundary;
import org.wardon.errors.Require;
import org.wardon.heat.solver.Tree;

/** Makes each face plain, wetted outside or under water inside, as the coolers of the run ask. */
final class FaceParts {
    /** Mass for a wet surface whose layer has none: the surface must be a node of its own. */
    private static final Layer SKIN = new Layer("water", 0.0005, 0.6, 1_000, 4_186);

    private final Tree tree;
    private final IntUnaryOperator take;
    private final NetworkInputs inputs;

    FaceParts(Tree tree, IntUnaryOperator take, NetworkInputs inputs) {
        this.tree = tree;
        this.take = take;
        this.inputs = inputs;
    }

    /** A share of a face; no cooler acts on one that is shared. */
    FacePart of(Face face, double share, OutsideBoundary boundary) {
        Optional<Integer> cooler = coolerOf(face.name());
        if (cooler.isEmpty()) {
            int flowAt = take.applyAsInt(FacePart.COMMON);
            return FaceBranch.of(tree, flowAt, face, share, boundary, inputs);
        }
        int index = cooler.get();
        FaceCooler asked = (FaceCooler) CoolerParts.asked(inputs.coolers().get(index), inputs);
        return asked.onFaces(
                wall -> wetted(wall, index, face, boundary),
                film -> filmed(film, index, face, boundary));
    }

    /** Number of the cooler that acts on a face. */
    private Optional<Integer> coolerOf(FaceName name) {
        if (inputs.control() == NetworkInputs.Control.IDEAL) {
            return Optional.empty();
        }
        Optional<Integer> found = Optional.empty();
        for (int i = 0; i < inputs.coolers().size(); i++) {
            if (inputs.coolers().get(i) instanceof FaceCooler on && on.wets().contains(name)) {
                Require.that(found.isEmpty(), "face " + name + " is wetted by two coolers at once");
                boolean runs = on.onFaces(wall -> true, film -> film.flowKgS() > 0);
                found = runs ? Optional.of(i) : found;
            }
        }
        return found;
    }

    private WettedFace wetted(WettedWall wall, int index, Face face, OutsideBoundary boundary) {
        Require.that(
                !(face.beyond() instanceof Beyond.Ground)
                        && !(face.beyond() instanceof Beyond.Neighbour),
                "face " + face.name() + " cannot dry to " + face.beyond());
        FaceChain.Build build = build(WettedFace.FLOWS, index, face, boundary, true);
        double area = build.areaM2() / area(wall.wets());
        double radiant =
                face.beyond() instanceof Beyond.Outdoors || face.beyond() instanceof Beyond.Shade
                        ? Films.OUTDOOR_RADIATION_WM2K
                        : 1 / Films.insideM2KW(boundary.direction())
                                - FaceFilms.convectiveWm2K(boundary.direction());
        return new WettedFace(
                tree,
                build,
                new WettedFace.Sand(
                        wall.waterKgPerDay() * area, wall.innerDampFraction(), radiant));
    }

    private FilmedFace filmed(WaterFilm film, int index, Face face, OutsideBoundary boundary) {
        FaceChain.Build build = build(FilmedFace.FLOWS, index, face, boundary, false);
        double share = across(face.name()) / film.wets().stream().mapToDouble(this::across).sum();
        double pumpW = film.pumpW() * share;
        double limitW =
                film.chiller()
                        .map(c -> Math.max(c.capacityW() * share - pumpW, 0))
                        .orElse(Double.POSITIVE_INFINITY);
        FilmedFace.Water water =
                new FilmedFace.Water(
                        film.flowKgS() * share,
                        across(face.name()),
                        along(face.name()),
                        limitW,
                        pumpW);
        double pressure = inputs.pressurePa();
        return film.open()
                ? new OpenFilmFace(tree, build, water, pressure)
                : new JacketFace(tree, build, water, new JacketGap(film.gapMm() / 1_000), pressure);
    }

    private FaceChain.Build build(
            int flows, int cooler, Face face, OutsideBoundary boundary, boolean wetOutside) {
        Enclosure enclosure = inputs.enclosure();
        List<Layer> layers = new ArrayList<>(face.asBuilt());
        int wet = wetOutside ? 0 : layers.size() - 1;
        if (layers.get(wet).capacityJm2K() <= 0) {
            layers.add(wetOutside ? 0 : layers.size(), SKIN);
        }
        double wall = inputs.tuning().wall();
        FaceFilms.Film film = FaceFilms.inside(enclosure, face, boundary, inputs);
        FaceGrid grid = new FaceGrid(boundary.addedLayers(), layers, film.resistanceM2KW(), wall);
        double area = enclosure.box().areaM2(face.name());
        double steady = grid.steady(boundary.filmWm2K(0) * wall);
        return new FaceChain.Build(
                take.applyAsInt(flows),
                cooler,
                area,
                grid,
                enclosure.thermalBridgePct() / 100 * area * steady,
                film.convectiveWm2K(),
                wall,
                inputs.plain());
    }

    private double area(Set<FaceName> names) {
        return names.stream().mapToDouble(inputs.enclosure().box()::areaM2).sum();
    }

    /** Width the water of a face runs over side by side, m. */
    private double across(FaceName name) {
        Box box = inputs.enclosure().box();
        return switch (name) {
            case NORTH, SOUTH, ROOF, FLOOR -> box.lengthM();
            case EAST, WEST -> box.widthM();
        };
    }

    /** Way of the water, m. */
    private double along(FaceName name) {
        Box box = inputs.enclosure().box();
        return switch (name) {
            case ROOF, FLOOR -> box.widthM();
            case NORTH, SOUTH, EAST, WEST -> box.heightM();
        };
    }
}
