package org.wardon.reference.build;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.SQLException;
import java.util.ArrayList;
import java.util.List;
import org.wardon.errors.BadInput;
import org.wardon.errors.Fault;

/** Builds the reference database from the folder of tables. */
public final class BuildReference {
    private BuildReference() {}

    /**
     * Reads and checks all tables and writes the database; the build calls it.
     *
     * @param args the folder of tables and the file to write
     * @throws IOException if a file cannot be read or written
     * @throws SQLException if the database refuses what the checks let pass
     */
    public static void main(String[] args) throws IOException, SQLException {
        Path file = Path.of(args[1]);
        byte[] database = build(Path.of(args[0]));
        Path folder = file.toAbsolutePath().getParent();
        if (folder != null) {
            Files.createDirectories(folder);
        }
        Files.write(file, database);
    }

    /**
     * Reads and checks all tables and returns the database.
     *
     * @param folder the folder of tables
     * @return the bytes of an SQLite file; the same tables give the same bytes
     * @throws BadInput with every fault of every table
     * @throws IOException if the views cannot be read
     * @throws SQLException if the database refuses what the checks let pass
     */
    public static byte[] build(Path folder) throws IOException, SQLException {
        List<Fault> faults = new ArrayList<>();
        List<Table> tables = new TableFiles(folder, faults).read();
        TableChecks checks = new TableChecks(tables, faults);
        tables.forEach(checks::check);
        if (!faults.isEmpty()) {
            throw new BadInput(faults);
        }
        return DatabaseWriter.write(tables);
    }
}
