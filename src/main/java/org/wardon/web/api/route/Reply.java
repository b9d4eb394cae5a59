package org.wardon.web.api.route;

import static java.nio.charset.StandardCharsets.UTF_8;

import java.util.Map;
import java.util.TreeMap;
import org.wardon.files.forecast.AnswerWriter;

/**
 * A good answer on its way.
 *
 * @param status HTTP status
 * @param mediaType what its content is; blank where there is none
 * @param content its content
 * @param headers headers of its own
 */
@SuppressWarnings("ArrayRecordComponent")
public record Reply(int status, String mediaType, byte[] content, Map<String, String> headers) {
    /** Copies the headers. */
    public Reply {
        headers = Map.copyOf(headers);
    }

    /**
     * Answers with a record, as the command line writes it.
     *
     * @param answer the record
     * @return the reply, 200
     */
    public static Reply of(Record answer) {
        return text(Gives.JSON, AnswerWriter.json(answer));
    }

    /**
     * Answers with a text.
     *
     * @param mediaType its kind
     * @param text the text
     * @return the reply, 200
     */
    public static Reply text(String mediaType, String text) {
        return bytes(mediaType, text.getBytes(UTF_8));
    }

    /**
     * Answers with bytes.
     *
     * @param mediaType their kind
     * @param content the bytes
     * @return the reply, 200
     */
    public static Reply bytes(String mediaType, byte[] content) {
        return new Reply(200, mediaType, content, Map.of());
    }

    /**
     * Answers that it is done.
     *
     * @return the reply, 204
     */
    public static Reply done() {
        return new Reply(204, "", new byte[0], Map.of());
    }

    /**
     * Returns the reply with another status.
     *
     * @param other HTTP status
     * @return the changed copy
     */
    public Reply with(int other) {
        return new Reply(other, mediaType, content, headers);
    }

    /**
     * Returns the reply with a header.
     *
     * @param name its name
     * @param value its value, made here and never by the person
     * @return the changed copy
     */
    public Reply with(String name, String value) {
        Map<String, String> more = new TreeMap<>(headers);
        more.put(name, value);
        return new Reply(status, mediaType, content, more);
    }

    /**
     * Returns the reply of a plan in a version.
     *
     * @param version its version
     * @return the changed copy, with its {@code ETag}
     */
    public Reply ofVersion(int version) {
        return with("ETag", "\"" + version + "\"");
    }
}
