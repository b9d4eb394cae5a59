package org.wardon.cooling;

import java.util.Optional;
import java.util.OptionalDouble;

/**
 * A way of taking heat out of a chamber: one record a kind. What the model must know of a kind
 * stands here, so that no other room asks which kind it has; where each kind has its own answer
 * there is {@link #match}.
 *
 * <p>A new kind is a record in {@code permits} with its {@link CoolerLaw}, a method of {@link
 * Kinds}, a binder and a schema entry. A kind that acts on faces is a {@link FaceCooler} and does
 * nothing to the air but through them.
 */
public sealed interface Cooler permits Compressor, EvaporativePad, NightAir, IceBank, FaceCooler {
    /**
     * Returns the kind as a plan names it.
     *
     * @return such as {@code compressor}
     */
    String kind();

    /**
     * Compiles the cooler for a site.
     *
     * @param pressurePa air pressure of the site, Pa
     * @return what it does to the air
     * @throws IllegalArgumentException where its parts cannot work together
     */
    CoolerLaw law(double pressurePa);

    /**
     * Returns how it follows the thermostat.
     *
     * @return empty for one that always acts
     */
    Optional<Following> following();

    /**
     * Returns the same cooler with another capacity.
     *
     * @param factor on what it can take, 1 for none
     * @return the changed copy
     */
    Cooler sized(double factor);

    /**
     * Returns the same cooler with its thermostat following the air within the band.
     *
     * @return the changed copy; itself where it has no thermostat
     */
    Cooler modulating();

    /**
     * Returns whether a chamber with it starts at its setting, as one that has been cold before.
     *
     * @return false where the chamber starts at outdoors
     */
    boolean startsAtSetting();

    /**
     * Returns whether it is judged by keeping the band from both sides.
     *
     * @return false where the weather decides, and only too warm counts
     */
    boolean holdsBand();

    /**
     * Returns the most electricity it can draw, fan included.
     *
     * @return W
     */
    double mostElectricW();

    /**
     * Returns whether it stands in the room and acts on nothing but the room's air.
     *
     * @return false where it blows outdoor air in or acts on faces
     */
    default boolean actsInRoom() {
        return false;
    }

    /**
     * Returns the room's air its fan moves while it runs.
     *
     * @return m3/s; 0 where it is not known
     */
    default double circulatesM3s() {
        return 0;
    }

    /**
     * Returns whether it stands still without electricity.
     *
     * @return true for most
     */
    default boolean needsPower() {
        return true;
    }

    /**
     * Returns whether a fan of it stirs the chamber's air.
     *
     * @return false for one that leaves the air still
     */
    default boolean stirsAir() {
        return true;
    }

    /**
     * Returns its timed defrost.
     *
     * @return empty where there is none
     */
    default Optional<Defrost> defrost() {
        return Optional.empty();
    }

    /**
     * Returns the same cooler with its defrosts spread evenly over the time.
     *
     * @return the changed copy, without {@link #defrost}; itself where it has none
     */
    default Cooler withDefrostSpread() {
        return this;
    }

    /**
     * Returns the ice it works with, which is its first own state.
     *
     * @return empty where it works without
     */
    default Optional<IceBank> ice() {
        return Optional.empty();
    }

    /**
     * Returns the machine that makes its ice again.
     *
     * @return empty where there is none
     */
    default Optional<Recharge> recharge() {
        return Optional.empty();
    }

    /**
     * Returns the energy a day its supply can give.
     *
     * @return kWh; empty where there is no limit
     */
    default OptionalDouble dailyEnergyKWh() {
        return OptionalDouble.empty();
    }

    /**
     * Gives the answer of its kind; the compiler asks for every kind.
     *
     * @param kinds an answer a kind
     * @param <R> what is answered
     * @return the answer
     */
    <R> R match(Kinds<R> kinds);

    /**
     * One answer a kind.
     *
     * @param <R> what is answered
     */
    interface Kinds<R> {
        /**
         * Answers for a compressor.
         *
         * @param unit the unit
         * @return the answer
         */
        R compressor(Compressor unit);

        /**
         * Answers for walls kept wet outside.
         *
         * @param wall the walls
         * @return the answer
         */
        R wettedWall(WettedWall wall);

        /**
         * Answers for water over the inner side of faces.
         *
         * @param film the water
         * @return the answer
         */
        R waterFilm(WaterFilm film);

        /**
         * Answers for a pad.
         *
         * @param pad the pad
         * @return the answer
         */
        R evaporativePad(EvaporativePad pad);

        /**
         * Answers for night air.
         *
         * @param fan the fan
         * @return the answer
         */
        R nightAir(NightAir fan);

        /**
         * Answers for a bank of ice.
         *
         * @param bank the bank
         * @return the answer
         */
        R iceBank(IceBank bank);
    }
}
