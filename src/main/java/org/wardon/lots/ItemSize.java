package org.wardon.lots;

/**
 * Shape and size of an item.
 *
 * @param shape the simple body
 * @param radiusM radius or half thickness, m
 */
record ItemSize(Shape shape, double radiusM) {
    /** Length of a cylinder over its diameter where print gives none (assumption). */
    private static final double SLENDER = 4;

    /** Width of a leaf or plate, m (assumption). */
    private static final double PLATE_M = 0.1;

    /** The size that fills a volume. */
    static ItemSize ofVolume(Shape shape, double volumeM3) {
        return new ItemSize(
                shape,
                switch (shape) {
                    case SPHERE -> Math.cbrt(volumeM3 * 3 / (4 * Math.PI));
                    case CYLINDER -> Math.cbrt(volumeM3 / (2 * Math.PI * SLENDER));
                    case SLAB -> volumeM3 / (2 * PLATE_M * PLATE_M);
                });
    }

    /** The volume of a body of this size, m3. */
    double volumeM3() {
        return switch (shape) {
            case SPHERE -> 4 * Math.PI / 3 * Math.pow(radiusM, 3);
            case CYLINDER -> 2 * Math.PI * SLENDER * Math.pow(radiusM, 3);
            case SLAB -> 2 * radiusM * PLATE_M * PLATE_M;
        };
    }
}
