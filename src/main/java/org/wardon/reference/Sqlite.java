package org.wardon.reference;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.Connection;
import java.sql.SQLException;
import org.sqlite.SQLiteConfig;
import org.sqlite.util.LibraryLoaderUtil;

/**
 * Opens connections to SQLite.
 *
 * <p>Left alone, the driver unpacks its native library and compares the copy byte by byte, which is
 * a quarter of the time a short command takes, and a killed run leaves the copy behind. Here the
 * first connection unpacks it in one go and deletes the copy as soon as it is loaded; a loaded
 * library needs its file no longer, but for Windows, where the driver keeps its own way.
 */
final class Sqlite {
    /** Where the driver looks first; whoever starts the program may set it. */
    private static final String LIBRARY_FOLDER = "org.sqlite.lib.path";

    private Sqlite() {}

    static synchronized Connection connect(SQLiteConfig config, String url) throws SQLException {
        boolean windows = System.getProperty("os.name", "").startsWith("Windows");
        if (windows || System.getProperty(LIBRARY_FOLDER) != null) {
            return config.createConnection(url);
        }
        try (Unpacked library = unpack()) {
            System.setProperty(LIBRARY_FOLDER, library.folder().toString());
            return config.createConnection(url);
        } catch (IOException e) {
            // No room for a copy of ours: the driver tries other places, or says why not.
            return config.createConnection(url);
        }
    }

    private static Unpacked unpack() throws IOException {
        Unpacked library = new Unpacked(Files.createTempDirectory("wardon"));
        String shipped =
                LibraryLoaderUtil.getNativeLibResourcePath()
                        + "/"
                        + LibraryLoaderUtil.getNativeLibName();
        try (InputStream in = SQLiteConfig.class.getResourceAsStream(shipped)) {
            if (in != null) {
                Files.copy(in, library.file());
            }
        } catch (IOException e) {
            library.close();
            throw e;
        }
        return library;
    }

    /** A copy of the library, alone in a folder; closing deletes both. */
    private record Unpacked(Path folder) implements AutoCloseable {
        Path file() {
            return folder.resolve(LibraryLoaderUtil.getNativeLibName());
        }

        @Override
        public void close() throws IOException {
            Files.deleteIfExists(file());
            Files.deleteIfExists(folder);
        }
    }
}
