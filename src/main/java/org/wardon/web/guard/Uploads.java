package org.wardon.web.guard;

import io.javalin.http.Context;
import io.javalin.http.UploadedFile;
import java.io.IOException;
import java.io.InputStream;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.function.Supplier;
import org.jspecify.annotations.Nullable;
import org.wardon.errors.BadInput;

/**
 * Files people bring: few, small, of the kinds known here. Their names are only ever compared with
 * names a plan gives, never with files of this machine.
 */
public final class Uploads {
    /** Most bytes of one request. */
    public static final int LARGEST_REQUEST = 24_000_000;

    /** Most bytes of one file. */
    public static final int LARGEST_FILE = 8_000_000;

    /** Most files of one request. */
    public static final int MOST_FILES = 8;

    /** Most bytes of a form without files: names and values become many small texts. */
    public static final int LARGEST_FORM = 500_000;

    private static final String FORM = "application/x-www-form-urlencoded";

    private static final int LONGEST_NAME = 100;

    private Uploads() {}

    /** Refuses what is too large before any of it is read; a form has to say how large it is. */
    static void checkSize(Context http) {
        boolean form =
                Optional.ofNullable(http.contentType())
                        .map(kind -> kind.toLowerCase(Locale.ROOT).startsWith(FORM))
                        .orElse(false);
        if (http.contentLength() > LARGEST_REQUEST
                || (form && http.contentLength() > LARGEST_FORM)) {
            throw new Refusal(413, "too-large");
        }
        if (form && http.header("Transfer-Encoding") != null) {
            throw new Refusal(411, "no-length");
        }
    }

    /**
     * A file as it came.
     *
     * @param name its name without folders
     * @param bytes its content
     */
    @SuppressWarnings("ArrayRecordComponent")
    public record Brought(String name, byte[] bytes) {}

    /**
     * Returns the files of a form.
     *
     * @param http the request
     * @param field name of the field
     * @param endings endings accepted, such as {@code .csv}
     * @return by name, in their order; a field left empty gives none
     * @throws BadInput where a file is too large, of another kind, or there are too many
     */
    public static Map<String, Brought> of(Context http, String field, List<String> endings) {
        List<UploadedFile> files =
                http.uploadedFiles(field).stream()
                        .filter(file -> !file.filename().isBlank() || file.size() > 0)
                        .toList();
        if (files.size() > MOST_FILES) {
            throw new BadInput(
                    field, "", files.size() + " files", "accepted: at most " + MOST_FILES);
        }
        Map<String, Brought> brought = new LinkedHashMap<>();
        for (UploadedFile file : files) {
            String name = plainName(file.filename());
            if (endings.stream().noneMatch(name.toLowerCase(Locale.ROOT)::endsWith)) {
                throw new BadInput(
                        name,
                        "",
                        "the file is of another kind",
                        "accepted: " + String.join(", ", endings));
            }
            if (brought.put(name, new Brought(name, bytes(file, name))) != null) {
                throw new BadInput(name, "", "the file is given twice", "accepted: once");
            }
        }
        return brought;
    }

    /**
     * Reads a form, whose parts the server counts and weighs as it takes them in.
     *
     * @throws Refusal where one is too large, or the form is none
     */
    static @Nullable String read(Supplier<@Nullable String> field) {
        try {
            return field.get();
        } catch (Exception e) {
            // What the server throws here is not declared: the reason stands at the bottom.
            for (Throwable cause = e; cause != null; cause = cause.getCause()) {
                if (cause instanceof IllegalStateException) {
                    throw new Refusal(413, "too-large");
                }
            }
            throw new Refusal(400, "not-understood");
        }
    }

    /** The last part of a name, without anything but letters that can be shown. */
    static String plainName(String given) {
        String last =
                given.substring(Math.max(given.lastIndexOf('/'), given.lastIndexOf('\\')) + 1);
        String plain = last.replaceAll("[\\p{Cntrl}<>\"'&]", "_").strip();
        String cut = plain.length() > LONGEST_NAME ? plain.substring(0, LONGEST_NAME) : plain;
        return cut.isEmpty() || cut.startsWith(".") ? "file" + cut : cut;
    }

    private static byte[] bytes(UploadedFile file, String name) {
        try (InputStream in = file.content()) {
            byte[] bytes = in.readNBytes(LARGEST_FILE + 1);
            if (bytes.length > LARGEST_FILE) {
                throw new BadInput(
                        name,
                        "",
                        "the file is larger than " + LARGEST_FILE / 1_000_000 + " MB",
                        "accepted: up to " + LARGEST_FILE / 1_000_000 + " MB");
            }
            return bytes;
        } catch (IOException e) {
            throw new BadInput(
                    name, "", "the file did not arrive whole", "send the form once more");
        }
    }
}
