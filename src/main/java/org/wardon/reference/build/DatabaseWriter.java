package org.wardon.reference.build;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.sql.Connection;
import java.sql.DriverManager;
import java.sql.PreparedStatement;
import java.sql.SQLException;
import java.sql.Statement;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import org.sqlite.SQLiteConnection;

/**
 * Writes the tables into one SQLite file: a strict table a CSV, every row with its line, every cell
 * kept; a column of evidence stands twice, as its word and as its whole text.
 */
final class DatabaseWriter {
    private DatabaseWriter() {}

    /** Returns the bytes of the file; the same tables give the same bytes. */
    static byte[] write(List<Table> tables) throws SQLException, IOException {
        try (Connection connection = DriverManager.getConnection("jdbc:sqlite:")) {
            connection.setAutoCommit(false);
            try (Statement statement = connection.createStatement()) {
                statement.executeUpdate(
                        "create table table_note (table_name text not null, ord integer not null,"
                                + " text text not null) strict");
                for (Table table : tables) {
                    statement.executeUpdate(declaration(table));
                    insert(connection, table);
                    for (String index : indexes(table)) {
                        statement.executeUpdate(index);
                    }
                }
                addViews(statement);
            }
            connection.commit();
            return connection.unwrap(SQLiteConnection.class).serialize("main");
        }
    }

    /**
     * Adds the views and asks each for its rows, since SQLite looks into a view only when asked.
     */
    private static void addViews(Statement statement) throws SQLException, IOException {
        for (String view : views().split(";\\s*\\n", -1)) {
            if (!view.isBlank()) {
                statement.executeUpdate(view);
                String name = view.replaceAll("(?s)^.*?create view (\\w+) as.*$", "$1");
                statement.executeQuery("select count(*) from (select * from " + name + ")").close();
            }
        }
    }

    static String sqlName(Table table) {
        return table.name().replace('-', '_');
    }

    private static String declaration(Table table) {
        List<String> columns = new ArrayList<>(List.of("line integer primary key"));
        for (Column column : table.columns()) {
            columns.add('"' + column.name() + "\" " + sqlType(column));
            if (column.isEvidence()) {
                columns.add('"' + column.name() + "_text\" text");
            }
        }
        return "create table " + sqlName(table) + " (" + String.join(", ", columns) + ") strict";
    }

    private static String sqlType(Column column) {
        return switch (column.kind()) {
            case KEY -> "text not null unique";
            case NUMBER -> "real";
            default -> "text";
        };
    }

    private static List<String> indexes(Table table) {
        return table.columns().stream()
                .filter(
                        column ->
                                column.kind() == Column.Kind.COMMODITY
                                        || column.kind() == Column.Kind.KNOWN_COMMODITY)
                .map(
                        column ->
                                "create index "
                                        + sqlName(table)
                                        + "_by_"
                                        + column.name()
                                        + " on "
                                        + sqlName(table)
                                        + " (\""
                                        + column.name()
                                        + "\")")
                .toList();
    }

    private static void insert(Connection connection, Table table) throws SQLException {
        try (PreparedStatement note =
                connection.prepareStatement("insert into table_note values (?, ?, ?)")) {
            for (int i = 0; i < table.notes().size(); i++) {
                note.setString(1, table.name());
                note.setInt(2, i + 1);
                note.setString(3, table.notes().get(i));
                note.executeUpdate();
            }
        }
        String marks =
                table.columns().stream()
                        .map(column -> column.isEvidence() ? "?, ?" : "?")
                        .collect(Collectors.joining(", "));
        try (PreparedStatement insert =
                connection.prepareStatement(
                        "insert into " + sqlName(table) + " values (?, " + marks + ")")) {
            for (Table.Row row : table.rows()) {
                fill(insert, table, row);
                insert.executeUpdate();
            }
        }
    }

    private static void fill(PreparedStatement insert, Table table, Table.Row row)
            throws SQLException {
        int mark = 1;
        insert.setLong(mark++, row.line());
        for (int i = 0; i < table.columns().size(); i++) {
            Column column = table.columns().get(i);
            String cell = row.cells().get(i);
            if (column.isEvidence()) {
                insert.setString(mark++, word(column, cell));
            }
            if (cell.isEmpty()) {
                insert.setObject(mark++, null);
            } else if (column.kind() == Column.Kind.NUMBER) {
                insert.setDouble(mark++, Double.parseDouble(cell));
            } else {
                insert.setString(mark++, cell);
            }
        }
    }

    private static @org.jspecify.annotations.Nullable String word(Column column, String cell) {
        return (column.kind() == Column.Kind.EVIDENCE_PROSE
                        ? EvidenceWord.ofProse(cell)
                        : EvidenceWord.of(cell))
                .orElse(null);
    }

    private static String views() throws IOException {
        try (InputStream sql = DatabaseWriter.class.getResourceAsStream("views.sql")) {
            if (sql == null) {
                throw new IOException("views.sql is not among the resources");
            }
            return new String(sql.readAllBytes(), StandardCharsets.UTF_8);
        }
    }
}
