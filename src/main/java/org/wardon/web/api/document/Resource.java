package org.wardon.web.api.document;

import static java.nio.charset.StandardCharsets.UTF_8;

import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.Reader;
import java.io.UncheckedIOException;
import java.util.Properties;

/** Texts that ship beside the interface. */
final class Resource {
    private static final String FOLDER = "/org/wardon/web/api/";

    private Resource() {}

    private static InputStream open(String name) {
        InputStream in = Resource.class.getResourceAsStream(FOLDER + name);
        if (in == null) {
            throw new IllegalStateException(FOLDER + name + " is not in the program");
        }
        return in;
    }

    static String text(String name) {
        try (InputStream in = open(name)) {
            return new String(in.readAllBytes(), UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    static Properties words(String name) {
        Properties words = new Properties();
        try (Reader in = new InputStreamReader(open(name), UTF_8)) {
            words.load(in);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        return words;
    }
}
