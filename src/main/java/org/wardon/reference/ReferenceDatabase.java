package org.wardon.reference;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.sql.Connection;
import java.sql.PreparedStatement;
import java.sql.ResultSet;
import java.sql.ResultSetMetaData;
import java.sql.SQLException;
import java.sql.Statement;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Function;
import org.sqlite.SQLiteConfig;
import org.sqlite.SQLiteConnection;

/**
 * The shipped database, held in memory and refusing every change: SQLite cannot open a file inside
 * a jar, and a copy on disk would have to be cleaned up.
 */
final class ReferenceDatabase implements AutoCloseable {
    private static final String FILE = "reference.db";

    private final Connection connection;
    private final Map<String, PreparedStatement> idle = new HashMap<>();

    private ReferenceDatabase(Connection connection) {
        this.connection = connection;
    }

    static ReferenceDatabase open() {
        byte[] bytes = shipped();
        try {
            Connection connection = Sqlite.connect(new SQLiteConfig(), "jdbc:sqlite:");
            connection.unwrap(SQLiteConnection.class).deserialize("main", bytes);
            try (Statement statement = connection.createStatement()) {
                statement.execute("pragma query_only = 1");
            }
            return new ReferenceDatabase(connection);
        } catch (SQLException e) {
            throw new IllegalStateException(FILE + " cannot be opened; build the program again", e);
        }
    }

    private static byte[] shipped() {
        try (InputStream in = ReferenceDatabase.class.getResourceAsStream(FILE)) {
            if (in == null) {
                throw new IllegalStateException(FILE + " is missing; build the program again");
            }
            return in.readAllBytes();
        } catch (IOException e) {
            throw new UncheckedIOException(FILE + " cannot be read", e);
        }
    }

    /** Returns one value a row, in the order of the query. */
    synchronized <T> List<T> list(String sql, Function<Row, T> reading, Object... arguments) {
        try {
            PreparedStatement statement = idle.remove(sql);
            if (statement == null) {
                statement = connection.prepareStatement(sql);
            }
            List<T> values = ask(statement, reading, arguments);
            PreparedStatement twin = idle.put(sql, statement);
            if (twin != null) {
                twin.close();
            }
            return values;
        } catch (SQLException e) {
            throw new IllegalStateException(FILE + " does not answer: " + sql, e);
        }
    }

    private static <T> List<T> ask(
            PreparedStatement statement, Function<Row, T> reading, Object... arguments)
            throws SQLException {
        for (int i = 0; i < arguments.length; i++) {
            statement.setObject(i + 1, arguments[i]);
        }
        List<T> values = new ArrayList<>();
        try (ResultSet results = statement.executeQuery()) {
            Row row = new Row(results, columns(results.getMetaData()));
            while (results.next()) {
                values.add(reading.apply(row));
            }
        }
        return values;
    }

    private static Map<String, Integer> columns(ResultSetMetaData answer) throws SQLException {
        Map<String, Integer> columns = new HashMap<>();
        for (int i = 1; i <= answer.getColumnCount(); i++) {
            columns.put(answer.getColumnLabel(i), i);
        }
        return columns;
    }

    @Override
    public synchronized void close() {
        try {
            connection.close();
        } catch (SQLException e) {
            throw new IllegalStateException(FILE + " cannot be closed", e);
        }
    }
}
