package org.wardon.web.guard;

import java.io.IOException;
import java.nio.file.FileSystems;
import java.nio.file.Files;
import java.nio.file.LinkOption;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.attribute.PosixFilePermissions;
import java.security.SecureRandom;
import java.util.Optional;
import java.util.regex.Pattern;

/**
 * What programs outside the browser carry: a random secret in the keeper's folder that only its
 * owner can read. A file others could read, a link, or one that was changed is no secret any more
 * and is replaced; striking the file out and starting again makes a new one.
 */
public final class ApiSecret {
    /** Name of the file in the keeper's folder. */
    public static final String FILE = "api-secret";

    private static final Pattern WRITTEN = Pattern.compile("[A-Za-z0-9_-]{43}");
    private static final String OWNER_ONLY = "rw-------";
    private static final int LONGEST = 64;

    private final Path file;
    private final SecureRandom random = new SecureRandom();
    private volatile Optional<String> secret = Optional.empty();

    /**
     * Names the file; nothing is read or written before {@link #settle}.
     *
     * @param home the keeper's folder
     */
    public ApiSecret(Path home) {
        file = home.resolve(FILE);
    }

    /** Takes the secret that is there, or makes one. Where none can be kept nobody has any. */
    public void settle() {
        try {
            Optional<String> there = kept();
            secret = there.isPresent() ? there : Optional.of(made());
        } catch (IOException e) {
            secret = Optional.empty();
        }
    }

    /**
     * Returns where it stands.
     *
     * @return its file; absent where none could be kept
     */
    public Optional<Path> file() {
        return secret.map(any -> file);
    }

    /** Whether this is the secret. */
    boolean is(String given) {
        return secret.map(known -> Secret.same(known, given)).orElse(false);
    }

    private Optional<String> kept() throws IOException {
        if (!Files.isRegularFile(file, LinkOption.NOFOLLOW_LINKS) || Files.size(file) > LONGEST) {
            return Optional.empty();
        }
        boolean owned =
                !knowsPermissions()
                        || PosixFilePermissions.toString(
                                        Files.getPosixFilePermissions(
                                                file, LinkOption.NOFOLLOW_LINKS))
                                .equals(OWNER_ONLY);
        String text = owned ? Files.readString(file).strip() : "";
        return WRITTEN.matcher(text).matches() ? Optional.of(text) : Optional.empty();
    }

    private String made() throws IOException {
        String fresh = Secret.fresh(random);
        Path folder = file.toAbsolutePath().getParent();
        Files.createDirectories(folder);
        // Written aside and moved over, so that it never stands there half or open to others.
        Path aside = Files.createTempFile(folder, "." + FILE, "");
        try {
            if (knowsPermissions()) {
                Files.setPosixFilePermissions(aside, PosixFilePermissions.fromString(OWNER_ONLY));
            }
            Files.writeString(aside, fresh + "\n");
            Files.move(aside, file, StandardCopyOption.REPLACE_EXISTING);
        } finally {
            Files.deleteIfExists(aside);
        }
        return fresh;
    }

    private static boolean knowsPermissions() {
        return FileSystems.getDefault().supportedFileAttributeViews().contains("posix");
    }
}
