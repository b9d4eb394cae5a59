package org.wardon.reference;

import java.nio.file.Path;
import java.util.Map;
import java.util.Optional;

/** Where a keeper's own file lies. */
public final class StoreFolder {
    private StoreFolder() {}

    /**
     * Returns the folder: the one given, else {@code WARDON_HOME}, else the folder for a user's
     * data of the operating system. It is not created.
     *
     * @param given the folder named on the command line
     * @param environment environment variables
     * @param system name of the operating system, as in {@code os.name}
     * @param userHome home folder of the user
     * @return the folder
     */
    public static Path of(
            Optional<Path> given, Map<String, String> environment, String system, Path userHome) {
        if (given.isPresent()) {
            return given.get();
        }
        if (isSet(environment, "WARDON_HOME")) {
            return Path.of(environment.getOrDefault("WARDON_HOME", ""));
        }
        if (system.startsWith("Windows")) {
            return folder(environment, "LOCALAPPDATA", userHome.resolve("AppData/Local"));
        }
        if (system.startsWith("Mac")) {
            return userHome.resolve("Library/Application Support/wardon");
        }
        return folder(environment, "XDG_DATA_HOME", userHome.resolve(".local/share"));
    }

    private static Path folder(Map<String, String> environment, String name, Path otherwise) {
        Path data =
                isSet(environment, name) ? Path.of(environment.getOrDefault(name, "")) : otherwise;
        return data.resolve("wardon");
    }

    private static boolean isSet(Map<String, String> environment, String name) {
        return !environment.getOrDefault(name, "").isBlank();
    }
}
