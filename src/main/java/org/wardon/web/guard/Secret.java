package org.wardon.web.guard;

import static java.nio.charset.StandardCharsets.UTF_8;

import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.security.SecureRandom;
import java.util.Base64;

/** Random names nobody can guess, and comparing that takes the same time wherever texts differ. */
final class Secret {
    private static final int BYTES = 32;

    private Secret() {}

    static String fresh(SecureRandom random) {
        byte[] bytes = new byte[BYTES];
        random.nextBytes(bytes);
        return Base64.getUrlEncoder().withoutPadding().encodeToString(bytes);
    }

    /** Digests first, so that not even the length shows. */
    static boolean same(String a, String b) {
        return MessageDigest.isEqual(digest(a), digest(b));
    }

    private static byte[] digest(String text) {
        try {
            return MessageDigest.getInstance("SHA-256").digest(text.getBytes(UTF_8));
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException("every Java has SHA-256", e);
        }
    }
}
