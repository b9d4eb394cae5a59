package org.wardon.heat.network;

import java.util.List;

/** The water in the sand of a chamber's wetted walls: poured in, used up, dry. */
public final class WettedWalls {
    private final List<WettedFace> faces;

    WettedWalls(List<WettedFace> faces) {
        this.faces = List.copyOf(faces);
    }

    /**
     * Pours water into the walls of a cooler, shared by area.
     *
     * @param cooler number of the cooler in the inputs
     * @param kg water in all, kg
     * @param y state, changed in place
     * @return what the sand could not hold and let run off, kg
     */
    public double pour(int cooler, double kg, double[] y) {
        double holds = 0;
        for (WettedFace face : faces) {
            holds += face.cooler() == cooler ? face.holdsKg() : 0;
        }
        double runsOff = 0;
        for (WettedFace face : faces) {
            if (face.cooler() == cooler && holds > 0) {
                runsOff += face.pour(kg * face.holdsKg() / holds, y);
            }
        }
        return runsOff;
    }

    /**
     * Returns how far the wall nearest to drying out is beyond it.
     *
     * @param y state
     * @return share of what its sand holds, below 0 before; negative infinity where none is wet
     */
    public double dryness(double[] y) {
        double most = Double.NEGATIVE_INFINITY;
        for (WettedFace face : faces) {
            most = face.wet() ? Math.max(most, face.dryness(y)) : most;
        }
        return most;
    }

    /**
     * Lets walls that have dried out be dry.
     *
     * @param y state
     */
    public void dry(double[] y) {
        for (WettedFace face : faces) {
            if (face.wet() && face.dryness(y) > 0) {
                face.dry();
            }
        }
    }

    /**
     * Returns whether a wall stands dry.
     *
     * @return false where there is none, or all are wet
     */
    public boolean anyDry() {
        return faces.stream().anyMatch(face -> !face.wet());
    }

    /**
     * Returns the water in the sand.
     *
     * @param y state
     * @return kg
     */
    public double sandKg(double[] y) {
        return faces.stream().mapToDouble(face -> face.sandKg(y)).sum();
    }

    /**
     * Returns the water that evaporated outside and from the damp share inside.
     *
     * @param totals integrals of the flows
     * @return kg
     */
    public double evaporatedKg(double[] totals) {
        return faces.stream().mapToDouble(face -> face.waterUsedKg(totals)).sum();
    }
}
