package org.wardon.lots;

/** The simple body an item is taken for. */
public enum Shape {
    /** A long plate, cooled from both faces; leaves as well. */
    SLAB(1),
    /** A long cylinder, cooled from its side. */
    CYLINDER(2),
    /** A sphere. */
    SPHERE(3);

    private final int dimensions;

    Shape(int dimensions) {
        this.dimensions = dimensions;
    }

    /**
     * Returns the number of directions heat leaves by; surface over volume is this over the radius.
     *
     * @return 1 slab, 2 cylinder, 3 sphere
     */
    public int dimensions() {
        return dimensions;
    }
}
