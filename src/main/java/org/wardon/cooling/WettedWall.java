package org.wardon.cooling;

import java.time.LocalTime;
import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.function.Function;
import org.wardon.enclosure.FaceName;
import org.wardon.errors.Require;

/**
 * Walls kept wet outside by water poured into them, such as a double wall of brick with wet sand
 * between. The outer side is as wet as can be while the sand has water, and a share of the inner
 * side is damp and evaporates into the chamber; roof (the cover) and floor are not wet.
 *
 * <p>The sand holds one day's water, shared among the walls by area; what is poured beyond that
 * runs off. When all but a fiftieth of it has evaporated a wall is dry, a plain wall, until it is
 * poured again. The water is as warm as the surface it evaporates from: what it brings or takes as
 * sensible heat, 1 % of its latent heat in 5 K, is not counted, and its heat capacity is that of
 * the layers, to be given as wet ones.
 *
 * <p>Source: {@code cooling-sources.csv}, kind brick_wet_sand_chamber.
 *
 * @param wets walls, at least one
 * @param waterKgPerDay water poured a day, in all, kg
 * @param innerDampFraction share of the inner side that is damp, 0 to 1
 * @param pouredAt hours of the day, each with its equal share of the water
 */
public record WettedWall(
        Set<FaceName> wets,
        double waterKgPerDay,
        double innerDampFraction,
        List<LocalTime> pouredAt)
        implements FaceCooler {
    /** Checks the bounds. */
    public WettedWall {
        Require.that(!wets.isEmpty(), "wets is empty; name at least one wall");
        wets = Set.copyOf(EnumSet.copyOf(wets));
        Require.that(
                !wets.contains(FaceName.ROOF) && !wets.contains(FaceName.FLOOR),
                "wets is " + wets + "; cover and floor of a wetted wall are not wet");
        Require.within("waterKgPerDay", waterKgPerDay, 0, 100_000, "kg", "");
        Require.within("innerDampFraction", innerDampFraction, 0, 1, "", "");
        pouredAt = List.copyOf(pouredAt);
        Require.that(!pouredAt.isEmpty(), "pouredAt is empty; give at least one hour");
    }

    /**
     * Returns the water of one pouring on one wall.
     *
     * @param areaShare area of the wall over that of all walls wetted
     * @return kg
     */
    public double poursKg(double areaShare) {
        return waterKgPerDay * areaShare / pouredAt.size();
    }

    @Override
    public String kind() {
        return "wetted-wall";
    }

    @Override
    public <R> R onFaces(Function<WettedWall, R> outside, Function<WaterFilm, R> inside) {
        return outside.apply(this);
    }

    @Override
    public FaceLaw law(double pressurePa) {
        return new FaceLaw(0);
    }

    @Override
    public Optional<Following> following() {
        return Optional.empty();
    }

    @Override
    public WettedWall sized(double factor) {
        return this;
    }

    @Override
    public WettedWall modulating() {
        return this;
    }

    @Override
    public boolean startsAtSetting() {
        return false;
    }

    @Override
    public boolean holdsBand() {
        return false;
    }

    @Override
    public double mostElectricW() {
        return 0;
    }

    @Override
    public boolean needsPower() {
        return false;
    }

    @Override
    public <R> R match(Kinds<R> kinds) {
        return kinds.wettedWall(this);
    }
}
