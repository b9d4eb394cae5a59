package org.wardon.reference;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ConcurrentHashMap;
import java.util.function.Function;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.wardon.enclosure.Doorway;
import org.wardon.enclosure.Material;
import org.wardon.errors.BadInput;
import org.wardon.produce.Commodity;
import org.wardon.produce.MixingGroup;
import org.wardon.produce.NamedFact;
import org.wardon.produce.PackageKind;
import org.wardon.produce.Source;
import org.wardon.produce.rows.EthyleneStorageRow;
import org.wardon.produce.rows.OwnLot;

/**
 * The published tables, read from the database shipped with the program and never changed, with a
 * keeper's own values laid over them. May be used by several threads.
 */
public final class ReferenceBook implements AutoCloseable {
    private final ReferenceDatabase database;
    private final Map<String, List<OwnValue>> own;
    private final Map<String, List<GoneLot>> gone;
    private final FactReader facts;
    private final GroupReader groups;
    private final Once<Names> names;
    private final Once<PackageReader> packages;
    private final Once<Sources> sources;
    private final Once<Map<String, Material>> materials;
    private final Once<Map<String, Doorway>> doorways;
    private final Once<List<Commodity>> all;
    private final Map<String, Commodity> read = new ConcurrentHashMap<>();

    private ReferenceBook(ReferenceDatabase database, List<OwnValue> own, List<GoneLot> gone) {
        this.database = database;
        this.own = own.stream().collect(Collectors.groupingBy(OwnValue::commodityId));
        this.gone = gone.stream().collect(Collectors.groupingBy(GoneLot::commodityId));
        facts = new FactReader(database);
        groups = new GroupReader(database);
        names = new Once<>(() -> new Names(database));
        packages = new Once<>(() -> new PackageReader(database));
        sources = new Once<>(() -> new Sources(database));
        StoreReader store = new StoreReader(database);
        materials = new Once<>(() -> byId(store.materials(), Material::id));
        doorways = new Once<>(() -> byId(store.doorways(), Doorway::id));
        all = new Once<>(() -> read(Selection.all(database)));
    }

    private static <T> Map<String, T> byId(List<T> values, Function<T, String> id) {
        return values.stream().collect(Collectors.toMap(id, Function.identity()));
    }

    /**
     * Opens the book as published.
     *
     * @return the book; close it when done
     */
    public static ReferenceBook open() {
        return new ReferenceBook(ReferenceDatabase.open(), List.of(), List.of());
    }

    /**
     * Opens the book with a keeper's own values laid over it.
     *
     * @param own the own values
     * @return the book; close it when done
     * @throws BadInput if the keeper's file cannot be read
     */
    public static ReferenceBook open(OwnValues own) {
        return open(own, List.of());
    }

    /**
     * Opens the book with a keeper's own values laid over it and their own lots beside.
     *
     * @param own the own values
     * @param gone lots of the keeper's own that are gone
     * @return the book; close it when done
     * @throws BadInput if the keeper's file cannot be read
     */
    public static ReferenceBook open(OwnValues own, List<GoneLot> gone) {
        return new ReferenceBook(ReferenceDatabase.open(), own.list(), gone);
    }

    /**
     * Returns the ids of all commodities.
     *
     * @return in the order of the table
     */
    public List<String> list() {
        return database.list(
                "select commodity_id from commodities order by line",
                row -> row.text("commodity_id"));
    }

    /**
     * Returns all commodities. Each table is read once, so this is far quicker than asking for one
     * after the other.
     *
     * @return in the order of the table, own values first
     */
    public List<Commodity> all() {
        return all.get();
    }

    /**
     * Returns a commodity by its id.
     *
     * @param id id of the tables
     * @return the commodity, own values first
     * @throws BadInput if there is no such id, with the nearest names
     */
    public Commodity get(String id) {
        return byId(id).orElseThrow(() -> unknown(id));
    }

    /**
     * Returns a commodity by whatever people call it.
     *
     * @param name an id, a common, local or botanical name; case and plural do not matter
     * @return the commodity, own values first; empty if nothing is called so
     */
    public Optional<Commodity> find(String name) {
        return names.get().find(name).flatMap(this::byId);
    }

    /**
     * Returns a commodity by whatever people call it, or refuses the name.
     *
     * @param name an id or a name
     * @return the commodity, own values first
     * @throws BadInput if nothing is called so, with the nearest names
     */
    public Commodity named(String name) {
        return find(name).orElseThrow(() -> unknown(name));
    }

    /**
     * Returns the commodities whose names come nearest to a misspelt one.
     *
     * @param name the misspelt name, or a word of several names such as {@code pepper}
     * @return up to four ids, nearest first; none if nothing comes near
     */
    public List<String> nearest(String name) {
        return names.get().nearest(name);
    }

    /**
     * Searches the names of all commodities: ids, common, other and botanical names; case, accents,
     * hyphens and the plural do not matter.
     *
     * @param text what was typed, whole, begun or misspelt
     * @return what it may mean with the name met and how, surest first; none for a blank text
     */
    public List<NameMatch> search(String text) {
        return names.get().search(text);
    }

    private Optional<Commodity> byId(String id) {
        Commodity known = read.get(id);
        if (known != null) {
            return Optional.of(known);
        }
        return read(Selection.one(database, id)).stream().findFirst();
    }

    private List<Commodity> read(Selection selection) {
        return CommodityReader.read(selection).stream().map(this::kept).toList();
    }

    /** One record a commodity, however it was asked for. */
    private Commodity kept(Commodity published) {
        return read.computeIfAbsent(
                published.id(),
                id -> OwnOverlay.beside(OwnOverlay.over(published, ownOf(id)), goneOf(id)));
    }

    private List<OwnValue> ownOf(String id) {
        return own.getOrDefault(id, List.of());
    }

    private List<OwnLot> goneOf(String id) {
        return gone.getOrDefault(id, List.of()).stream().map(GoneLot::lot).toList();
    }

    private BadInput unknown(String name) {
        List<String> near = nearest(name);
        String way = "'look' without a name lists all commodities";
        return new BadInput(
                name,
                "",
                "no commodity is called so",
                near.isEmpty() ? way : "perhaps " + String.join(", ", near) + "? " + way);
    }

    /**
     * Returns every fact of a commodity with its source, to be shown to a person.
     *
     * @param id id of the tables
     * @return own values first, then all printed ones, those they override included
     * @throws BadInput if there is no such id, with the nearest names
     */
    public List<NamedFact> facts(String id) {
        if (!list().contains(id)) {
            throw unknown(id);
        }
        return Stream.concat(
                        ownOf(id).stream().map(OwnValue::named), facts.ofCommodity(id).stream())
                .toList();
    }

    /**
     * Returns a source.
     *
     * @param id id beside a figure; also {@code own}, {@code common-practice} and {@code
     *     assumption}
     * @return the source
     * @throws IllegalArgumentException if there is none
     */
    public Source source(String id) {
        return sources.get().get(id);
    }

    /**
     * Returns the sources of a row that names several.
     *
     * @param ids ids joined by semicolons
     * @return the sources, in that order
     * @throws IllegalArgumentException if one of them is not known
     */
    public List<Source> sources(String ids) {
        return Stream.of(ids.split(";", -1)).map(this::source).toList();
    }

    /**
     * Returns the building materials.
     *
     * @return by id
     */
    public Map<String, Material> materials() {
        return Map.copyOf(materials.get());
    }

    /**
     * Returns a building material.
     *
     * @param id id of the tables
     * @return the material
     * @throws BadInput if there is no such id
     */
    public Material material(String id) {
        return known(materials.get(), id, "material");
    }

    /**
     * Returns what can protect a door.
     *
     * @return by id
     */
    public Map<String, Doorway> doorways() {
        return Map.copyOf(doorways.get());
    }

    /**
     * Returns the protection of a door.
     *
     * @param id id of the tables, such as {@code strip-curtain}
     * @return the doorway
     * @throws BadInput if there is no such id
     */
    public Doorway doorway(String id) {
        return known(doorways.get(), id, "door protection");
    }

    /**
     * Returns the packages that can hold a lot.
     *
     * @return by id; a class of package is one too, with the broad time of room cooling
     */
    public Map<String, PackageKind> packageKinds() {
        return Map.copyOf(packages.get().kinds());
    }

    /**
     * Returns a package.
     *
     * @param id id of the tables
     * @return the package
     * @throws BadInput if there is no such id, or if print gives no half-cooling time for it
     */
    public PackageKind packageKind(String id) {
        String described = packages.get().withoutTime().get(id);
        if (described != null) {
            throw new BadInput(
                    id,
                    "",
                    "no half-cooling time is published for this package (" + described + ")",
                    "a package with a time, such as room-cooling-any, or give the time");
        }
        return known(packages.get().kinds(), id, "package");
    }

    /**
     * Returns packages that print describes without a half-cooling time; they cannot hold a lot.
     *
     * @return descriptions by id
     */
    public Map<String, String> packagesWithoutTime() {
        return Map.copyOf(packages.get().withoutTime());
    }

    private static <T> T known(Map<String, T> values, String id, String what) {
        T value = values.get(id);
        if (value == null) {
            throw new BadInput(
                    id,
                    "",
                    "no " + what + " is called so",
                    "one of " + values.keySet().stream().sorted().toList());
        }
        return value;
    }

    /**
     * Returns the limits of gases, charges and wash water that keep people safe.
     *
     * @return all, by the names of the table
     */
    public List<NamedFact> safetyLimits() {
        return facts.safetyLimits();
    }

    /**
     * Returns the heat that people, lights and machines give.
     *
     * @return all, by the names of the table
     */
    public List<NamedFact> internalLoads() {
        return facts.internalLoads();
    }

    /**
     * Returns defaults of the trade without a published source.
     *
     * @return all, by the names of the table; to be shown as assumptions
     */
    public List<NamedFact> marketPractice() {
        return facts.marketPractice();
    }

    /**
     * Returns parameters of ways to cool.
     *
     * @return all, named {@code kind/parameter}; the formula stands in the note
     */
    public List<NamedFact> coolingSources() {
        return facts.coolingSources();
    }

    /**
     * Returns published groups of commodities that may share a room for a short time.
     *
     * @return all groups of all schemes
     */
    public List<MixingGroup> mixingGroups() {
        return groups.mixingGroups();
    }

    /**
     * Returns what ethylene did to stored produce, in the words of the sources.
     *
     * @return all rows
     */
    public List<EthyleneStorageRow> ethyleneStorage() {
        return groups.ethyleneStorage();
    }

    /**
     * Returns monthly means of the weather of places.
     *
     * @return all months of all places
     */
    public List<ClimateMonth> climate() {
        return groups.climate();
    }

    @Override
    public void close() {
        database.close();
    }
}
