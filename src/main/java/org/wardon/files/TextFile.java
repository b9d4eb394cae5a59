package org.wardon.files;

import static java.nio.charset.StandardCharsets.UTF_8;

import java.io.IOException;
import java.io.InputStream;
import java.nio.ByteBuffer;
import java.nio.CharBuffer;
import java.nio.charset.CharsetDecoder;
import java.nio.charset.CoderResult;
import java.nio.charset.CodingErrorAction;
import java.nio.file.AccessDeniedException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.wardon.errors.BadInput;

/** Reads a text file whole, as UTF-8 and nothing else; a byte order mark is passed over. */
public final class TextFile {
    private static final int MEGABYTE = 1_000_000;

    private TextFile() {}

    /**
     * Returns the text of a file.
     *
     * @param file the file
     * @param shown its name in messages
     * @param megabytes largest size read
     * @return its text
     * @throws BadInput where it cannot be read, is too large or is no UTF-8
     */
    public static String read(Path file, String shown, int megabytes) {
        if (!Files.exists(file)) {
            throw new BadInput(
                    shown, "", "the file does not exist", "accepted: a file that can be read");
        }
        if (Files.isDirectory(file)) {
            throw new BadInput(shown, "", "it is a folder", "accepted: a file");
        }
        try (InputStream in = Files.newInputStream(file)) {
            byte[] bytes = in.readNBytes(megabytes * MEGABYTE + 1);
            if (bytes.length > megabytes * MEGABYTE) {
                throw new BadInput(
                        shown,
                        "",
                        "the file is larger than " + megabytes + " MB",
                        "accepted: up to " + megabytes + " MB");
            }
            return decoded(bytes, shown);
        } catch (AccessDeniedException e) {
            throw new BadInput(
                    shown,
                    "",
                    "there is no permission to read it",
                    "accepted: a file that can be read");
        } catch (IOException e) {
            throw new BadInput(
                    shown,
                    "",
                    "it cannot be read: " + e.getMessage(),
                    "accepted: a file that can be read");
        }
    }

    /**
     * Returns the text of bytes that came from elsewhere than a file.
     *
     * @param bytes the bytes
     * @param shown their name in messages
     * @return their text
     * @throws BadInput where they are no UTF-8
     */
    public static String decoded(byte[] bytes, String shown) {
        if (bytes.length > 1 && (bytes[0] & 0xFF) >= 0xFE && (bytes[1] & 0xFF) >= 0xFE) {
            throw new BadInput(
                    shown, "", "the text is UTF-16", "accepted: UTF-8; save the file as UTF-8");
        }
        CharsetDecoder decoder =
                UTF_8.newDecoder()
                        .onMalformedInput(CodingErrorAction.REPORT)
                        .onUnmappableCharacter(CodingErrorAction.REPORT);
        ByteBuffer in = ByteBuffer.wrap(bytes);
        CharBuffer out = CharBuffer.allocate(bytes.length + 1);
        CoderResult result = decoder.decode(in, out, true);
        String text = out.flip().toString();
        if (result.isError()) {
            throw new BadInput(
                    shown,
                    place(text),
                    String.format("the byte %02X is no UTF-8", bytes[in.position()]),
                    "accepted: UTF-8; save the file as UTF-8");
        }
        return text.startsWith("\uFEFF") ? text.substring(1) : text;
    }

    private static String place(String before) {
        int line = 1 + (int) before.chars().filter(c -> c == '\n').count();
        int column = before.length() - before.lastIndexOf('\n');
        return "line " + line + ", column " + column;
    }
}
