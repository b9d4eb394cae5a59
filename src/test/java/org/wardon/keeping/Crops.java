package org.wardon.keeping;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.wardon.lots.ClassValues;
import org.wardon.produce.Commodity;
import org.wardon.produce.MixingGroup;
import org.wardon.reference.ReferenceBook;

/** The published commodities, read once, as lots in open packages. */
public final class Crops {
    private static final Map<String, Commodity> ALL = new LinkedHashMap<>();
    private static final List<MixingGroup> GROUPS;
    private static final ClassValues CLASSES;

    static {
        try (ReferenceBook book = ReferenceBook.open()) {
            for (Commodity one : book.all()) {
                ALL.put(one.id(), one);
            }
            GROUPS = List.copyOf(book.mixingGroups());
        }
        CLASSES = ClassValues.of(ALL.values());
    }

    private Crops() {}

    public static List<Commodity> list() {
        return new ArrayList<>(ALL.values());
    }

    public static List<MixingGroup> groups() {
        return GROUPS;
    }

    public static boolean has(String id) {
        return ALL.containsKey(id);
    }

    public static Commodity get(String id) {
        return Optional.ofNullable(ALL.get(id)).orElseThrow();
    }

    /** A cured, sound lot in an open package. */
    public static KeptLot lot(Commodity commodity) {
        return lot(commodity, LotAtDoor.SOUND.withCured(true));
    }

    public static KeptLot lot(Commodity commodity, LotAtDoor door) {
        return KeptLot.inOpenPackage(commodity.id(), commodity, door, CLASSES);
    }

    public static KeepingModel model(String id) {
        return KeepingModel.of(lot(get(id)));
    }

    public static KeepingModel model(String id, LotAtDoor door) {
        return KeepingModel.of(lot(get(id), door));
    }
}
