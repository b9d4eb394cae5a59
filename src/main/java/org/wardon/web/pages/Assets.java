package org.wardon.web.pages;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;

/**
 * Style, script, charts and the mark: read once, known by the digest of their content, so that a
 * browser may keep them for good. Nothing else can be asked for.
 */
public final class Assets {
    private static final String OWN = "/org/wardon/web/static/";
    private static final String CHARTS = "/META-INF/resources/webjars/uplot/1.6.30/dist/";
    private static final int DIGITS = 16;

    private final Map<String, Asset> byPath = new LinkedHashMap<>();
    private final Map<String, String> pathOf = new LinkedHashMap<>();

    /** A file that never changes. */
    static final class Asset {
        private final byte[] bytes;
        private final String type;

        Asset(byte[] bytes, String type) {
            this.bytes = bytes;
            this.type = type;
        }

        InputStream content() {
            return new ByteArrayInputStream(bytes);
        }

        String type() {
            return type;
        }
    }

    /** Reads all of them. */
    public Assets() {
        add("wardon.css", OWN + "wardon.css", "text/css; charset=utf-8");
        add("wardon.js", OWN + "wardon.js", "text/javascript; charset=utf-8");
        add("mark.svg", OWN + "mark.svg", "image/svg+xml");
        add("uplot.js", CHARTS + "uPlot.iife.min.js", "text/javascript; charset=utf-8");
        add("uplot.css", CHARTS + "uPlot.min.css", "text/css; charset=utf-8");
    }

    private void add(String name, String resource, String type) {
        byte[] bytes = bytes(resource);
        String path = "/static/" + digest(bytes) + "/" + name;
        byPath.put(path, new Asset(bytes, type));
        pathOf.put(name, path);
    }

    private static byte[] bytes(String resource) {
        try (InputStream in = Assets.class.getResourceAsStream(resource)) {
            if (in == null) {
                throw new IllegalStateException(resource + " is not in the program");
            }
            return in.readAllBytes();
        } catch (IOException e) {
            throw new UncheckedIOException(resource + " cannot be read", e);
        }
    }

    private static String digest(byte[] bytes) {
        try {
            byte[] digest = MessageDigest.getInstance("SHA-256").digest(bytes);
            return HexFormat.of().formatHex(digest).substring(0, DIGITS);
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException("every Java has SHA-256", e);
        }
    }

    /**
     * Returns where a file is.
     *
     * @param name its name, such as {@code wardon.css}
     * @return its path, which changes with its content
     */
    public String path(String name) {
        return Optional.ofNullable(pathOf.get(name))
                .orElseThrow(() -> new IllegalArgumentException("no file '" + name + "'"));
    }

    /** The file at exactly this path. */
    Optional<Asset> find(String path) {
        return Optional.ofNullable(byPath.get(path));
    }
}
