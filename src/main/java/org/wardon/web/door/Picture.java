package org.wardon.web.door;

/** Packages a keeper picks by their picture: drawn in one line, 48 units wide and high. */
enum Picture {
    /** Nobody looked: any package in a room with fans. */
    ANY("room-cooling-any", "M8 16h32v24H8z M20 24a4 4 0 1 1 5 4c-1 .5-1 1-1 3 M24 35v.5"),
    /** Field crate with slots. */
    CRATE("open-crate", "M5 16h38l-3 24H8z M10 22h28 M11 28h26 M12 34h24 M16 16v24 M32 16v24"),
    /** Carton with holes. */
    VENTED(
            "vented-carton",
            "M6 18h36v22H6z M6 18l5-7h26l5 7 M12 27a2 2 0 1 0 4 0a2 2 0 1 0-4 0 M22 27a2 2 0 1 0 4"
                    + " 0a2 2 0 1 0-4 0 M32 27a2 2 0 1 0 4 0a2 2 0 1 0-4 0"),
    /** Carton with a lid, closed. */
    LIDDED("closed-carton", "M7 20h34v20H7z M4 12h40v8H4z M24 12v28"),
    /** Sack, tied. */
    SACK("sack", "M14 14c-8 8-8 22-5 27h30c3-5 3-19-5-27z M14 14l-3-6h26l-3 6 M14 14h20"),
    /** Basket with a handle. */
    BASKET(
            "basket",
            "M6 22h36l-5 18H11z M12 22c0-18 24-18 24 0 M9 28h30 M10 34h28 M18 22l2 18 M30 22l-2 18"),
    /** Bag with holes. */
    HOLED_BAG(
            "perforated-liner",
            "M12 10h24c-3 3-3 6 0 8v22H12V18c3-2 3-5 0-8z M18 25v1 M24 25v1 M30 25v1 M21 31v1 M27"
                    + " 31v1 M18 36v1 M30 36v1"),
    /** Bag, closed. */
    CLOSED_BAG("sealed-liner", "M12 10h24c-3 3-3 6 0 8v22H12V18c3-2 3-5 0-8z M12 18h24 M21 14h6"),
    /** Pallet of cartons, stacked tight. */
    PALLET(
            "pallet-pear-tray-tight-room",
            "M7 6h34v32H7z M7 17h34 M7 27h34 M18 6v32 M30 6v32 M4 38h40 M6 38v5h6v-5 M21 38v5h6v-5"
                    + " M36 38v5h6v-5"),
    /** Loose heap. */
    HEAP(
            "heap",
            "M3 40h42 M8 40c0-7 9-7 9 0 M17 40c0-7 9-7 9 0 M26 40c0-7 9-7 9 0 M12 34c0-7 9-7 9 0"
                    + " M21 34c0-7 9-7 9 0 M17 28c0-7 9-7 9 0 M35 40c0-6 7-6 7 0");

    private final String packageId;
    private final String drawn;

    Picture(String packageId, String drawn) {
        this.packageId = packageId;
        this.drawn = drawn;
    }

    String packageId() {
        return packageId;
    }

    String drawn() {
        return drawn;
    }
}
