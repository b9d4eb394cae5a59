package org.wardon.web.guard;

import io.javalin.http.Context;
import java.util.Map;

/** Headers every answer carries. */
final class SafeHeaders {
    private static final Map<String, String> ALWAYS =
            Map.of(
                    "Content-Security-Policy",
                    "default-src 'none'; script-src 'self'; style-src 'self'; img-src 'self';"
                            + " connect-src 'self'; form-action 'self'; frame-ancestors 'none';"
                            + " base-uri 'none'",
                    "X-Content-Type-Options",
                    "nosniff",
                    "Referrer-Policy",
                    "same-origin",
                    "Cross-Origin-Opener-Policy",
                    "same-origin",
                    "Cross-Origin-Resource-Policy",
                    "same-origin",
                    "Permissions-Policy",
                    "camera=(), geolocation=(), microphone=()",
                    "X-Frame-Options",
                    "DENY",
                    "Cache-Control",
                    "no-store");

    private SafeHeaders() {}

    static void on(Context http) {
        ALWAYS.forEach(http::header);
    }
}
