package org.wardon.enclosure.section;

import java.util.Arrays;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.DoubleStream;
import org.wardon.enclosure.DoorExchange;
import org.wardon.enclosure.NaturalConvection;
import org.wardon.enclosure.NaturalConvection.Gas;
import org.wardon.enclosure.RadiantFilm;
import org.wardon.enclosure.section.Section.Span;
import org.wardon.enclosure.section.SpaceReading.Space;

/**
 * The section of a chamber that no fan stirs, at rest with its faces as they are and its door shut.
 *
 * <p>Rising and falling air is taken for a conductor: each space conducts its Nusselt number
 * ({@link AirSpace}) times still air, alike both ways, as ISO 10077-2:2017 takes closed spaces of
 * air (from memory). That number counts the layers of air at the sides too: half of the resistance
 * is taken to stand there and half in the air between (assumption). Beside and below the stack that
 * half stands at the face; in the open space above it the faces have their plate films ({@link
 * NaturalConvection}). Of wall against wall, each wall against the air and floor against roof the
 * strongest stirs the open space. Radiation goes past the air: the stack's sides see the walls, its
 * top the roof and the walls.
 *
 * <p>The walls before and behind the section are left out, as in the middle of a long chest.
 */
public final class StillAir {
    private static final int MOST_ROUNDS = 30;
    private static final double SETTLED_K = 0.01;

    /** Cells across a narrow space; so many times as many stand across the rest, and up. */
    private static final int GAP_CELLS = 4;

    private static final int WIDE = 7;
    private static final int HIGH = 6;

    private final Chest chest;
    private final Gas air;
    private final double[] widthsM;
    private final double[] heightsM;
    private final Span stackColumns;
    private final Span stackRows;
    private final Map<Space, SpaceReading> spaces = new EnumMap<>(Space.class);
    private double openC;
    private double stackC;

    private StillAir(Chest chest, int gapCells) {
        int wideCells = WIDE * gapCells;
        int highCells = HIGH * gapCells;
        this.chest = chest;
        double mean = chest.surfaceC().values().stream().mapToDouble(c -> c).average().orElse(0);
        air = Gas.air(0.5 * (mean + chest.airC()), chest.pressurePa());
        openC = chest.airC();
        stackC = chest.airC();
        double wide = chest.widthM();
        double high = chest.box().heightM();
        if (chest.stack().isEmpty()) {
            widthsM = even(wide, wideCells + 2 * gapCells);
            heightsM = even(high, highCells + 2 * gapCells);
            stackColumns = new Span(0, 1);
            stackRows = new Span(0, 1);
            return;
        }
        double gap = Stack.clearM(wide);
        double below = Stack.clearM(high);
        int low = (int) Math.round(highCells * chest.stackM() / (high - below));
        int stackCells = Math.max(gapCells, low);
        widthsM = joined(even(gap, gapCells), even(wide - 2 * gap, wideCells), even(gap, gapCells));
        heightsM =
                joined(
                        even(below, gapCells),
                        even(chest.stackM(), stackCells),
                        even(chest.openM(), Math.max(gapCells, highCells - low)));
        stackColumns = new Span(gapCells, gapCells + wideCells);
        stackRows = new Span(gapCells, gapCells + stackCells);
    }

    private static double[] even(double lengthM, int cells) {
        double[] sizes = new double[cells];
        Arrays.fill(sizes, lengthM / cells);
        return sizes;
    }

    private static double[] joined(double[]... parts) {
        return Arrays.stream(parts).flatMapToDouble(DoubleStream::of).toArray();
    }

    /**
     * Finds the section of a chamber.
     *
     * @param chest the chamber
     * @return the section at rest
     */
    public static StillAirSection of(Chest chest) {
        return of(chest, GAP_CELLS);
    }

    /** In cells as fine as asked for. */
    static StillAirSection of(Chest chest, int gapCells) {
        return new StillAir(chest, gapCells).settle();
    }

    /** The spaces conduct by the temperatures beside them: repeated until both agree. */
    private StillAirSection settle() {
        SectionField field = solve(Optional.empty());
        for (int round = 0; round < MOST_ROUNDS; round++) {
            SectionField next = solve(Optional.of(field));
            double apart = apartK(field, next);
            field = next;
            if (apart < SETTLED_K) {
                break;
            }
        }
        return new StillAirSection(
                chest, field, List.copyOf(spaces.values()), stackColumns, stackRows);
    }

    private double apartK(SectionField before, SectionField after) {
        double most = 0;
        for (int column = 0; column < widthsM.length; column++) {
            for (int row = 0; row < heightsM.length; row++) {
                double apart = before.temperatureC(column, row) - after.temperatureC(column, row);
                most = Math.max(most, Math.abs(apart));
            }
        }
        return most;
    }

    private SectionField solve(Optional<SectionField> before) {
        Section section = new Section(widthsM, heightsM);
        openC = before.map(field -> field.meanC(section.columns(), openRows())).orElse(openC);
        openSpace(section, before);
        if (chest.stack().isPresent()) {
            stack(section, chest.stack().get(), before);
        }
        return section.solve();
    }

    private Span openRows() {
        int first = chest.stack().isPresent() ? stackRows.to() : 0;
        return new Span(first, heightsM.length);
    }

    private double airHeatWm3() {
        return chest.airHeatW() / (chest.box().volumeM3() - chest.stackM3());
    }

    private void openSpace(Section section, Optional<SectionField> before) {
        double floorC =
                chest.stack().isEmpty()
                        ? chest.at(Side.FLOOR)
                        : sideC(before, stackColumns, row(stackRows.to() - 1));
        double conducts = 2 * remembered(strongest(floorC, chest.openM()));
        section.fill(section.columns(), section.rows(), conducts, airHeatWm3());
        for (Side side : Side.values()) {
            plate(section, side, side.upright() ? section.rows() : section.columns());
        }
    }

    /** A face with the film of a plate in the open air. */
    private void plate(Section section, Side side, Span along) {
        double film =
                NaturalConvection.filmWm2K(
                        chest.cut().face(side),
                        chest.box(),
                        chest.at(side),
                        openC,
                        chest.pressurePa());
        section.edge(side, along, chest.at(side), film > 0 ? 1 / film : Section.TIGHT);
    }

    /** What stirs the open space most: floor and roof, wall and wall, a wall and the air. */
    private SpaceReading strongest(double floorC, double highM) {
        double up = floorC - chest.at(Side.ROOF);
        double ra = rayleigh(up, highM);
        SpaceReading most = reading(Space.OPEN, highM, up, AirSpace.layerNusselt(ra, up > 0));
        double wide = chest.widthM();
        double across = chest.at(Side.LEFT) - chest.at(Side.RIGHT);
        most = larger(most, upright(Space.OPEN, across, wide, highM));
        for (Side side : List.of(Side.LEFT, Side.RIGHT)) {
            double toAir = chest.at(side) - openC;
            most = larger(most, upright(Space.OPEN, toAir, 0.5 * wide, highM));
        }
        return most;
    }

    private static SpaceReading larger(SpaceReading one, SpaceReading other) {
        return other.conductsWmK() > one.conductsWmK() ? other : one;
    }

    private double rayleigh(double differenceK, double thicknessM) {
        return NaturalConvection.rayleigh(differenceK, thicknessM, air, DoorExchange.GRAVITY_MS2);
    }

    private SpaceReading upright(Space space, double differenceK, double thickM, double highM) {
        double nusselt =
                AirSpace.cavityNusselt(
                        rayleigh(differenceK, thickM), highM / thickM, air.prandtl());
        return reading(space, thickM, differenceK, nusselt);
    }

    private SpaceReading reading(Space space, double thickM, double differenceK, double nusselt) {
        return new SpaceReading(
                space,
                thickM,
                Math.abs(differenceK),
                rayleigh(differenceK, thickM),
                nusselt,
                nusselt * air.conductivityWmK());
    }

    /** Half of the way from what it was, so that the rounds do not swing. */
    private double remembered(SpaceReading now) {
        SpaceReading before = spaces.get(now.space());
        double conducts =
                before == null
                        ? now.conductsWmK()
                        : 0.5 * (before.conductsWmK() + now.conductsWmK());
        spaces.put(
                now.space(),
                new SpaceReading(
                        now.space(),
                        now.thicknessM(),
                        now.differenceK(),
                        now.rayleigh(),
                        conducts / air.conductivityWmK(),
                        conducts));
        return conducts;
    }

    private static Span row(int row) {
        return new Span(row, row + 1);
    }

    private double sideC(Optional<SectionField> before, Span columns, Span rows) {
        return before.map(field -> field.meanC(columns, rows)).orElse(stackC);
    }

    private void stack(Section section, Stack stack, Optional<SectionField> before) {
        Span left = new Span(0, stackColumns.from());
        Span right = new Span(stackColumns.to(), widthsM.length);
        Span belowRows = new Span(0, stackRows.from());
        Span beside = new Span(0, stackRows.to());
        Span first = row(stackColumns.from());
        Span last = row(stackColumns.to() - 1);
        double gap = Stack.clearM(chest.widthM());
        double below = Stack.clearM(chest.box().heightM());
        double high = chest.stackM();
        double leftK = chest.at(Side.LEFT) - sideC(before, first, stackRows);
        double rightK = chest.at(Side.RIGHT) - sideC(before, last, stackRows);
        double floorK = chest.at(Side.FLOOR) - sideC(before, stackColumns, row(stackRows.from()));
        SpaceReading under =
                reading(
                        Space.BELOW,
                        below,
                        floorK,
                        AirSpace.layerNusselt(rayleigh(floorK, below), floorK > 0));
        narrow(section, Side.FLOOR, under, section.columns(), belowRows);
        narrow(section, Side.LEFT, upright(Space.LEFT, leftK, gap, high), left, beside);
        narrow(section, Side.RIGHT, upright(Space.RIGHT, rightK, gap, high), right, beside);
        section.fill(
                stackColumns, stackRows, stack.conductivityWmK(), stack.heatW() / chest.stackM3());
        double film = RadiantFilm.betweenWm2K(openC);
        double side = film / widthsM[stackColumns.from()];
        section.exchange(first, stackRows, side, chest.at(Side.LEFT));
        section.exchange(last, stackRows, side, chest.at(Side.RIGHT));
        double flat = film / heightsM[stackRows.from()];
        section.exchange(stackColumns, row(stackRows.from()), flat, chest.at(Side.FLOOR));
        section.exchange(stackColumns, row(stackRows.to() - 1), flat, topSeesC());
    }

    /** A narrow space before a face: half of its resistance at the face, the rest in its air. */
    private void narrow(Section section, Side side, SpaceReading space, Span columns, Span rows) {
        double conducts = remembered(space);
        section.fill(columns, rows, 2 * conducts, airHeatWm3());
        Span along = side.upright() ? rows : columns;
        section.edge(side, along, chest.at(side), space.thicknessM() / (2 * conducts));
    }

    /**
     * What the top of the stack sees: the roof, and the walls for the rest.
     *
     * <p>Source: Hottel's crossed strings for two strips, as in Incropera and others, table 13.1
     * (from memory).
     */
    private double topSeesC() {
        double across = chest.openM() / chest.widthM();
        double roof = Math.sqrt(1 + across * across) - across;
        double walls = 0.5 * (chest.at(Side.LEFT) + chest.at(Side.RIGHT));
        return roof * chest.at(Side.ROOF) + (1 - roof) * walls;
    }
}
