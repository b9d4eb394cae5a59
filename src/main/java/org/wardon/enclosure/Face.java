package org.wardon.enclosure;

import java.util.List;
import org.wardon.errors.Require;

/**
 * One face of a chamber.
 *
 * @param name which face
 * @param beyond what lies behind it
 * @param azimuthDeg compass direction it looks to, degrees from north by east; not used level
 * @param tiltDeg 0 level and looking up, 90 upright; a floor looks down and hears of none
 * @param solarAbsorptance share of sunlight taken up outside, 0 to 1
 * @param layers from outside to inside, at least one
 */
public record Face(
        FaceName name,
        Beyond beyond,
        double azimuthDeg,
        double tiltDeg,
        double solarAbsorptance,
        List<Layer> layers) {
    /** Steepest roof, degrees. */
    public static final double STEEPEST_ROOF_DEG = 75;

    /** Most layers of a face that may have bridges. */
    public static final int MOST_BRIDGED = 8;

    /** Copies the layers and checks the bounds. */
    public Face {
        layers = List.copyOf(layers);
        Require.that(!layers.isEmpty(), "face " + name + " needs at least one layer");
        // Each bridged layer doubles the ways through the face that the combined method sums.
        long bridged = layers.stream().filter(l -> l.inPlace().bridge().isPresent()).count();
        Require.that(
                bridged <= MOST_BRIDGED,
                "face " + name + " has " + bridged + " bridged layers; at most " + MOST_BRIDGED);
        Require.within("solarAbsorptance of " + name, solarAbsorptance, 0, 1, "", "");
        Require.within("azimuthDeg of " + name, azimuthDeg, -360, 360, "°", "");
        double steepest = name == FaceName.ROOF ? STEEPEST_ROOF_DEG : uprightDeg(name);
        double flattest = name == FaceName.ROOF ? 0 : uprightDeg(name);
        Require.within("tiltDeg of " + name, tiltDeg, flattest, steepest, "°", "");
    }

    /**
     * A face as it usually stands: a level roof or floor, an upright wall.
     *
     * @param name which face
     * @param beyond what lies behind it
     * @param azimuthDeg compass direction it looks to, degrees from north by east
     * @param solarAbsorptance share of sunlight taken up outside, 0 to 1
     * @param layers from outside to inside
     */
    public Face(
            FaceName name,
            Beyond beyond,
            double azimuthDeg,
            double solarAbsorptance,
            List<Layer> layers) {
        this(name, beyond, azimuthDeg, uprightDeg(name), solarAbsorptance, layers);
    }

    private static double uprightDeg(FaceName name) {
        return name == FaceName.ROOF || name == FaceName.FLOOR ? 0 : 90;
    }

    /**
     * Returns the layers as they conduct where they stand: aged, damp, and with what goes through
     * them. A bridged layer takes the conductivity that gives the face the resistance of the
     * combined method of ISO 6946 ({@link BridgedElement}, films of a wall, 0.13 and 0.04 m2 K/W);
     * several share what is missing in proportion to their lower limits.
     *
     * @return from outside to inside, without bridges
     */
    public List<Layer> asBuilt() {
        boolean bridged = layers.stream().anyMatch(l -> l.inPlace().bridge().isPresent());
        if (!bridged) {
            return layers.stream().map(Layer::asBuilt).toList();
        }
        double inside = Films.insideM2KW(HeatFlow.LEVEL);
        double films = inside + Films.OUTSIDE_M2KW;
        BridgedElement element = BridgedElement.of(layers, inside, Films.OUTSIDE_M2KW);
        double even = 0;
        for (Layer layer : layers) {
            even += layer.inPlace().bridge().isPresent() ? 0 : layer.asBuilt().resistanceM2KW();
        }
        double left = element.combinedM2KW() - films - even;
        double lower = element.lowerM2KW() - films - even;
        return layers.stream().map(l -> evened(l, left / lower)).toList();
    }

    private static Layer evened(Layer layer, double stretch) {
        if (layer.inPlace().bridge().isEmpty()) {
            return layer.asBuilt();
        }
        Layer.Bridge bridge = layer.inPlace().bridge().get();
        double share = bridge.areaPct() / 100;
        double mean =
                share * bridge.conductivityWmK() + (1 - share) * layer.asBuilt().conductivityWmK();
        return layer.conducting(mean / stretch);
    }

    /**
     * Returns whether the face is level.
     *
     * @return true for roof and floor
     */
    public boolean level() {
        return name == FaceName.ROOF || name == FaceName.FLOOR;
    }
}
