package org.wardon.reference;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.Connection;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Statement;
import org.sqlite.SQLiteConfig;
import org.wardon.errors.BadInput;

/**
 * The keeper's {@code store.db}. Reading creates nothing; the first change creates the file and
 * brings it to the present version, step by step, by the numbered SQL beside this class.
 */
final class StoreFile {
    private static final int VERSION = 2;

    private final Path file;

    StoreFile(Path folder) {
        file = folder.resolve("store.db");
    }

    /** Work on an open file. */
    interface Work<T> {
        T on(Connection connection) throws SQLException;
    }

    /**
     * Reads the file if it is there and of a version that has what is looked for; else returns the
     * other value.
     */
    <T> T read(int sinceVersion, Work<T> work, T otherwise) {
        if (!Files.isRegularFile(file)) {
            return otherwise;
        }
        SQLiteConfig config = new SQLiteConfig();
        config.setReadOnly(true);
        return with(
                config,
                connection -> version(connection) < sinceVersion ? otherwise : work.on(connection));
    }

    /** Changes the file, which is created and brought to the present version first. */
    <T> T change(Work<T> work) {
        try {
            Files.createDirectories(file.toAbsolutePath().getParent());
        } catch (IOException e) {
            throw new BadInput(
                    file.toString(), "", "cannot be created: " + e, "a folder that can be written");
        }
        SQLiteConfig config = new SQLiteConfig();
        config.setBusyTimeout(5000);
        return with(
                config,
                connection -> {
                    migrate(connection);
                    return work.on(connection);
                });
    }

    private <T> T with(SQLiteConfig config, Work<T> work) {
        try (Connection connection = Sqlite.connect(config, "jdbc:sqlite:" + file)) {
            int version = version(connection);
            if (version > VERSION) {
                throw new BadInput(
                        file.toString(),
                        "",
                        "was written by a later version of the program (" + version + ")",
                        "version " + VERSION + " or lower; bring the program up to date");
            }
            return work.on(connection);
        } catch (SQLException e) {
            throw new BadInput(
                    file.toString(),
                    "",
                    "cannot be used: " + e.getMessage(),
                    "a store.db that can be read and written; restore it from a copy");
        }
    }

    private static int version(Connection connection) throws SQLException {
        try (Statement statement = connection.createStatement();
                ResultSet version = statement.executeQuery("pragma user_version")) {
            return version.next() ? version.getInt(1) : 0;
        }
    }

    private static void migrate(Connection connection) throws SQLException {
        for (int step = version(connection) + 1; step <= VERSION; step++) {
            connection.setAutoCommit(false);
            try (Statement statement = connection.createStatement()) {
                statement.executeUpdate(sql(step));
                statement.execute("pragma user_version = " + step);
            }
            connection.commit();
            connection.setAutoCommit(true);
        }
    }

    private static String sql(int step) {
        try (InputStream in = StoreFile.class.getResourceAsStream("store/" + step + ".sql")) {
            if (in == null) {
                throw new IllegalStateException("step " + step + " of store.db is missing");
            }
            return new String(in.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException("step " + step + " of store.db cannot be read", e);
        }
    }
}
