package org.wardon.reference;

import java.nio.file.Path;
import java.sql.Connection;
import java.sql.PreparedStatement;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.time.DateTimeException;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.Collectors;
import org.wardon.errors.BadInput;
import org.wardon.produce.Ripeness;
import org.wardon.produce.rows.OwnLot;

/** Lots of the keeper's own that are gone, in {@code store.db}. Reading them creates no file. */
public final class GoneLots {
    private static final int SINCE_VERSION = 2;

    private final StoreFile store;

    /**
     * Looks into a folder.
     *
     * @param folder where {@code store.db} lies or will lie
     */
    public GoneLots(Path folder) {
        store = new StoreFile(folder);
    }

    /**
     * Returns all lots.
     *
     * @return by number
     * @throws org.wardon.errors.BadInput if the file cannot be read
     */
    public List<GoneLot> list() {
        return store.read(SINCE_VERSION, GoneLots::readAll, List.of());
    }

    private static List<GoneLot> readAll(Connection connection) throws SQLException {
        try (PreparedStatement select =
                        connection.prepareStatement("select * from gone_lot order by number");
                ResultSet row = select.executeQuery()) {
            List<GoneLot> lots = new ArrayList<>();
            while (row.next()) {
                lots.add(readable(row));
            }
            return lots;
        }
    }

    private static GoneLot readable(ResultSet row) throws SQLException {
        try {
            return read(row);
        } catch (IllegalArgumentException | IndexOutOfBoundsException | DateTimeException e) {
            throw new BadInput(
                    "store.db",
                    "",
                    "lot " + row.getLong("number") + " cannot be read",
                    "accepted: as the program wrote it; restore it from a copy");
        }
    }

    private static GoneLot read(ResultSet row) throws SQLException {
        String cured = row.getString("cured");
        OwnLot.Began began =
                new OwnLot.Began(
                        row.getString("variant"),
                        Ripeness.valueOf(constant(row.getString("ripeness"))),
                        cured.isEmpty() ? Optional.empty() : Optional.of("yes".equals(cured)),
                        row.getDouble("used_pct") / 100);
        return new GoneLot(
                row.getString("commodity_id"),
                row.getString("name"),
                row.getString("note"),
                new OwnLot(
                        row.getLong("number"),
                        LocalDate.parse(row.getString("ended_on")),
                        OwnLot.Ended.valueOf(constant(row.getString("ended"))),
                        began,
                        spells(row.getString("spells"))));
    }

    /**
     * Keeps a lot.
     *
     * @param lot the lot; its number is given anew
     * @return its number
     * @throws org.wardon.errors.BadInput if the file cannot be written
     */
    public long add(GoneLot lot) {
        return store.change(
                connection -> {
                    try (PreparedStatement insert =
                            connection.prepareStatement(
                                    "insert into gone_lot (commodity_id, variant, name, ended_on,"
                                            + " ended, ripeness, cured, used_pct, spells, note)"
                                            + " values (?, ?, ?, ?, ?, ?, ?, ?, ?, ?)"
                                            + " returning number")) {
                        fill(insert, lot);
                        try (ResultSet number = insert.executeQuery()) {
                            return number.next() ? number.getLong(1) : 0L;
                        }
                    }
                });
    }

    private static void fill(PreparedStatement insert, GoneLot lot) throws SQLException {
        OwnLot.Began began = lot.lot().began();
        insert.setString(1, lot.commodityId());
        insert.setString(2, began.variant());
        insert.setString(3, lot.name());
        insert.setString(4, lot.lot().endedOn().toString());
        insert.setString(5, word(lot.lot().ended()));
        insert.setString(6, word(began.ripeness()));
        insert.setString(7, began.cured().map(cured -> cured ? "yes" : "no").orElse(""));
        insert.setDouble(8, 100 * began.usedFraction());
        insert.setString(9, text(lot.lot().spells()));
        insert.setString(10, lot.note());
    }

    /**
     * Forgets a lot.
     *
     * @param number its number
     * @return whether there was one
     * @throws org.wardon.errors.BadInput if the file cannot be written
     */
    public boolean delete(long number) {
        if (list().stream().noneMatch(lot -> lot.lot().number() == number)) {
            return false;
        }
        return store.change(
                connection -> {
                    try (PreparedStatement delete =
                            connection.prepareStatement("delete from gone_lot where number = ?")) {
                        delete.setLong(1, number);
                        return delete.executeUpdate() > 0;
                    }
                });
    }

    private static String text(List<OwnLot.Spell> spells) {
        return spells.stream()
                .map(spell -> spell.atC() + ":" + spell.hours())
                .collect(Collectors.joining(" "));
    }

    private static List<OwnLot.Spell> spells(String text) {
        return Arrays.stream(text.split(" ", -1))
                .map(
                        spell -> {
                            int colon = spell.indexOf(':');
                            return new OwnLot.Spell(
                                    Double.parseDouble(spell.substring(0, colon)),
                                    Double.parseDouble(spell.substring(colon + 1)));
                        })
                .toList();
    }

    private static String word(Enum<?> constant) {
        return constant.name().toLowerCase(Locale.ROOT);
    }

    private static String constant(String word) {
        return word.toUpperCase(Locale.ROOT);
    }
}
