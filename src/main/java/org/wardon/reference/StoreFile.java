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
public final class StoreFile {
    private static final int VERSION = 3;
    private static final int PATIENCE_MS = 5_000;

    private final Path file;

    /**
     * Looks into a folder.
     *
     * @param folder where {@code store.db} lies or will lie
     */
    public StoreFile(Path folder) {
        file = folder.resolve("store.db");
    }

    /**
     * Work on an open file.
     *
     * @param <T> what it returns
     */
    @FunctionalInterface
    public interface Work<T> {
        /**
         * Does the work.
         *
         * @param connection the open file
         * @return what was asked for
         * @throws SQLException where the file cannot be used
         */
        T on(Connection connection) throws SQLException;
    }

    /**
     * Reads the file if it is there and of a version that has what is looked for.
     *
     * @param <T> what is read
     * @param sinceVersion first version of the file that has it
     * @param work how it is read
     * @param otherwise returned where there is nothing to read
     * @return what was read
     * @throws BadInput if the file cannot be read
     */
    public <T> T read(int sinceVersion, Work<T> work, T otherwise) {
        if (!Files.isRegularFile(file)) {
            return otherwise;
        }
        SQLiteConfig config = new SQLiteConfig();
        config.setBusyTimeout(PATIENCE_MS);
        return with(
                config,
                connection -> {
                    // Opened for reading alone, the last to leave could not tidy up the WAL's
                    // files.
                    try (Statement statement = connection.createStatement()) {
                        statement.execute("pragma query_only = true");
                    }
                    return version(connection) < sinceVersion ? otherwise : work.on(connection);
                });
    }

    /**
     * Changes the file, which is created and brought to the present version first. Several programs
     * may do so at once: each waits for the others a while.
     *
     * @param <T> what is returned
     * @param work the change
     * @return what the change returns
     * @throws BadInput if the file cannot be written
     */
    public <T> T change(Work<T> work) {
        try {
            Files.createDirectories(file.toAbsolutePath().getParent());
        } catch (IOException e) {
            throw new BadInput(
                    file.toString(), "", "cannot be created: " + e, "a folder that can be written");
        }
        SQLiteConfig config = new SQLiteConfig();
        config.setBusyTimeout(PATIENCE_MS);
        // Readers of another process go on while one writes.
        config.setJournalMode(SQLiteConfig.JournalMode.WAL);
        // A transaction takes its place in the queue when it begins, not when it first writes.
        config.setTransactionMode(SQLiteConfig.TransactionMode.IMMEDIATE);
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
        if (version(connection) == VERSION) {
            return;
        }
        whole(
                connection,
                same -> {
                    // Asked again inside: another program may have been first.
                    for (int step = version(same) + 1; step <= VERSION; step++) {
                        try (Statement statement = same.createStatement()) {
                            statement.executeUpdate(sql(step));
                            statement.execute("pragma user_version = " + step);
                        }
                    }
                    return VERSION;
                });
    }

    /**
     * Does several changes together: all of them or none.
     *
     * @param <T> what is returned
     * @param connection the open file
     * @param work the changes
     * @return what they return
     * @throws SQLException where one of them fails; none is kept then
     */
    public static <T> T whole(Connection connection, Work<T> work) throws SQLException {
        connection.setAutoCommit(false);
        try {
            T done = work.on(connection);
            connection.commit();
            return done;
        } finally {
            // After a commit there is nothing left to roll back.
            connection.rollback();
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
