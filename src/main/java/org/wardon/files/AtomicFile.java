package org.wardon.files;

import static java.nio.charset.StandardCharsets.UTF_8;

import java.io.BufferedWriter;
import java.io.IOException;
import java.io.OutputStreamWriter;
import java.io.Writer;
import java.nio.channels.Channels;
import java.nio.channels.FileChannel;
import java.nio.file.AccessDeniedException;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.nio.file.ReadOnlyFileSystemException;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.util.Locale;
import java.util.UUID;
import org.wardon.errors.Fault;

/**
 * Writes a text file whole or not at all: into a neighbour first, pushed to the disk, then moved
 * over the final name. A pipe or device is written to directly.
 */
public final class AtomicFile {
    private AtomicFile() {}

    /** What is written. */
    @FunctionalInterface
    public interface Body {
        /**
         * Writes the text.
         *
         * @param out where to, UTF-8
         * @throws IOException where it cannot be written
         */
        void write(Writer out) throws IOException;
    }

    /**
     * Writes a file.
     *
     * @param file its final name; what stood there before is replaced
     * @param body its text
     * @throws CannotWrite where it cannot be written; what stood there before then still stands
     */
    public static void write(Path file, Body body) {
        try {
            if (Files.isDirectory(file)) {
                throw isFolder(file);
            }
            if (Files.exists(file) && !Files.isRegularFile(file)) {
                straight(file, body);
            } else {
                aside(Files.exists(file) ? file.toRealPath() : file.toAbsolutePath(), body);
            }
        } catch (IOException | ReadOnlyFileSystemException e) {
            throw cannotWrite(file, e);
        }
    }

    /**
     * Tries whether a file can be written, before work that would be lost; leaves nothing behind.
     *
     * @param file its final name
     * @throws CannotWrite where it could not be written
     */
    public static void tryOut(Path file) {
        if (Files.exists(file) && !Files.isDirectory(file) && !Files.isRegularFile(file)) {
            return;
        }
        try {
            if (Files.isDirectory(file)) {
                throw isFolder(file);
            }
            Path real = Files.exists(file) ? file.toRealPath() : file.toAbsolutePath();
            Path aside = aside(real);
            Files.createFile(aside);
            Files.delete(aside);
        } catch (IOException | ReadOnlyFileSystemException e) {
            throw cannotWrite(file, e);
        }
    }

    /**
     * Makes a folder and those above it.
     *
     * @param folder the folder
     * @return the folder
     * @throws CannotWrite where it cannot be made
     */
    public static Path folder(Path folder) {
        try {
            return Files.createDirectories(folder);
        } catch (IOException | ReadOnlyFileSystemException e) {
            throw cannotWrite(folder, e);
        }
    }

    private static void straight(Path file, Body body) throws IOException {
        try (Writer out = Files.newBufferedWriter(file, UTF_8, StandardOpenOption.WRITE)) {
            body.write(out);
        }
    }

    private static void aside(Path file, Body body) throws IOException {
        Path aside = aside(file);
        // A stopped program takes its neighbour with it; a killed one leaves it under this name.
        aside.toFile().deleteOnExit();
        try {
            try (FileChannel channel =
                            FileChannel.open(
                                    aside,
                                    StandardOpenOption.CREATE_NEW,
                                    StandardOpenOption.WRITE);
                    Writer out =
                            new BufferedWriter(
                                    new OutputStreamWriter(
                                            Channels.newOutputStream(channel), UTF_8),
                                    1 << 16)) {
                body.write(out);
                out.flush();
                channel.force(true);
            }
            move(aside, file);
        } finally {
            Files.deleteIfExists(aside);
        }
    }

    private static Path aside(Path file) {
        return file.resolveSibling(".wardon-" + UUID.randomUUID() + ".part");
    }

    private static CannotWrite isFolder(Path file) {
        return new CannotWrite(
                new Fault(file.toString(), "", "it is a folder", "give the name of a file"),
                new FileAlreadyExistsException(file.toString()));
    }

    private static void move(Path aside, Path file) throws IOException {
        try {
            Files.move(aside, file, StandardCopyOption.ATOMIC_MOVE);
        } catch (AtomicMoveNotSupportedException e) {
            Files.move(aside, file, StandardCopyOption.REPLACE_EXISTING);
        }
    }

    private static CannotWrite cannotWrite(Path file, Exception e) {
        return new CannotWrite(
                new Fault(file.toString(), "", "cannot be written: " + happened(e), remedy(e)), e);
    }

    private static String happened(Exception e) {
        if (e instanceof AccessDeniedException) {
            return "no permission there";
        }
        if (e instanceof NoSuchFileException) {
            return "its folder does not exist";
        }
        if (e instanceof FileAlreadyExistsException) {
            return "a file stands where the folder should be";
        }
        if (e instanceof ReadOnlyFileSystemException || says(e, "read-only file system")) {
            return "the disk is read-only";
        }
        return full(e) ? "the disk is full" : String.valueOf(e.getMessage());
    }

    private static String remedy(Exception e) {
        if (e instanceof NoSuchFileException) {
            return "make the folder first, or give another";
        }
        return full(e)
                ? "free some space and run again; nothing was left under that name"
                : "give a folder you may write to";
    }

    private static boolean full(Exception e) {
        return says(e, "no space left") || says(e, "disk quota") || says(e, "file too large");
    }

    private static boolean says(Exception e, String words) {
        String message = e.getMessage();
        return message != null && message.toLowerCase(Locale.ROOT).contains(words);
    }
}
