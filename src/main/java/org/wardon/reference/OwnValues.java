package org.wardon.reference;

import java.nio.file.Path;
import java.sql.Connection;
import java.sql.PreparedStatement;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.util.ArrayList;
import java.util.List;

/** A keeper's own values, kept in {@code store.db}. Reading them creates no file. */
public final class OwnValues {
    private static final int SINCE_VERSION = 1;

    private final StoreFile store;

    /**
     * Looks into a folder.
     *
     * @param folder where {@code store.db} lies or will lie
     */
    public OwnValues(Path folder) {
        store = new StoreFile(folder);
    }

    /**
     * Returns all own values.
     *
     * @return by commodity and name
     * @throws org.wardon.errors.BadInput if the file cannot be read
     */
    public List<OwnValue> list() {
        return store.read(SINCE_VERSION, OwnValues::readAll, List.of());
    }

    private static List<OwnValue> readAll(Connection connection) throws SQLException {
        try (PreparedStatement select =
                        connection.prepareStatement(
                                "select * from own_value order by commodity_id, name");
                ResultSet row = select.executeQuery()) {
            List<OwnValue> values = new ArrayList<>();
            while (row.next()) {
                values.add(
                        new OwnValue(
                                row.getString("commodity_id"),
                                row.getString("name"),
                                row.getDouble("low"),
                                row.getDouble("high"),
                                row.getString("unit"),
                                row.getString("set_at")));
            }
            return values;
        }
    }

    /**
     * Sets a value; one of the same commodity and name is replaced.
     *
     * @param value the value, see {@link OwnValue#of}
     * @throws org.wardon.errors.BadInput if the file cannot be written
     */
    public void set(OwnValue value) {
        store.change(
                connection -> {
                    try (PreparedStatement insert =
                            connection.prepareStatement(
                                    "insert or replace into own_value values (?, ?, ?, ?, ?, ?)")) {
                        insert.setString(1, value.commodityId());
                        insert.setString(2, value.name());
                        insert.setDouble(3, value.low());
                        insert.setDouble(4, value.high());
                        insert.setString(5, value.unit());
                        insert.setString(6, value.setAt());
                        return insert.executeUpdate();
                    }
                });
    }

    /**
     * Deletes a value, so that print holds again.
     *
     * @param commodityId the commodity
     * @param name the fact
     * @return whether there was one
     * @throws org.wardon.errors.BadInput if the file cannot be written
     */
    public boolean delete(String commodityId, String name) {
        if (list().isEmpty()) {
            return false;
        }
        return store.change(
                connection -> {
                    try (PreparedStatement delete =
                            connection.prepareStatement(
                                    "delete from own_value where commodity_id = ? and name = ?")) {
                        delete.setString(1, commodityId);
                        delete.setString(2, name);
                        return delete.executeUpdate() > 0;
                    }
                });
    }
}
