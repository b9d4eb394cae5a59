package org.wardon.web.api.route;

import io.javalin.http.HandlerType;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import java.util.regex.Pattern;

/**
 * One route of the interface.
 *
 * @param id its name, unlike any other; its words stand under it
 * @param tag what it belongs to
 * @param method HTTP method
 * @param path path with its names in braces
 * @param takes what it takes beside them
 * @param gives its good answers
 * @param refuses statuses of its own refusals, beside those every route has
 * @param work does it
 */
public record Operation(
        String id,
        String tag,
        HandlerType method,
        String path,
        Takes takes,
        List<Gives> gives,
        List<Integer> refuses,
        Function<Ask, Reply> work) {
    private static final Pattern NAME = Pattern.compile("\\{([a-z]+)}");

    /** Copies the lists. */
    public Operation {
        gives = List.copyOf(gives);
        refuses = List.copyOf(refuses);
    }

    /**
     * Begins an operation.
     *
     * @param method HTTP method
     * @param path its path
     * @param id its name
     * @param tag what it belongs to
     * @param work does it
     * @return an operation that takes and gives nothing yet
     */
    public static Operation of(
            HandlerType method, String path, String id, String tag, Function<Ask, Reply> work) {
        return new Operation(id, tag, method, path, Takes.NOTHING, List.of(), List.of(), work);
    }

    /**
     * Lets names stand in the address.
     *
     * @param schema name of their schema
     * @return the changed copy
     */
    public Operation asks(String schema) {
        return taking(new Takes(Optional.of(schema), takes.body(), takes.version()));
    }

    /**
     * Lets it take a body.
     *
     * @param schema name of its schema
     * @return the changed copy
     */
    public Operation takes(String schema) {
        return taking(new Takes(takes.query(), Optional.of(schema), takes.version()))
                .refuses(400, 413, 415);
    }

    /**
     * Lets it change a version of a plan.
     *
     * @return the changed copy
     */
    public Operation changesVersion() {
        return taking(new Takes(takes.query(), takes.body(), true)).refuses(409, 412, 428);
    }

    private Operation taking(Takes other) {
        return new Operation(id, tag, method, path, other, gives, refuses, work);
    }

    /**
     * Adds a good answer in JSON.
     *
     * @param status HTTP status
     * @param shape the record it is written from
     * @return the changed copy
     */
    public Operation gives(int status, Class<? extends Record> shape) {
        return giving(new Gives(status, Gives.JSON, Optional.of(shape)));
    }

    /**
     * Adds a good answer of another kind.
     *
     * @param status HTTP status
     * @param mediaType its kind; blank for nothing
     * @return the changed copy
     */
    public Operation givesPlain(int status, String mediaType) {
        return giving(new Gives(status, mediaType, Optional.empty()));
    }

    private Operation giving(Gives one) {
        List<Gives> all = new ArrayList<>(gives);
        all.add(one);
        return new Operation(id, tag, method, path, takes, all, refuses, work);
    }

    /**
     * Adds refusals.
     *
     * @param statuses HTTP statuses
     * @return the changed copy
     */
    public Operation refuses(Integer... statuses) {
        List<Integer> all = new ArrayList<>(refuses);
        for (Integer status : statuses) {
            if (!all.contains(status)) {
                all.add(status);
            }
        }
        return new Operation(id, tag, method, path, takes, gives, all, work);
    }

    /**
     * Returns the names in its path.
     *
     * @return in their order
     */
    public List<String> pathNames() {
        return NAME.matcher(path).results().map(found -> found.group(1)).toList();
    }

    /**
     * Returns whether it changes anything.
     *
     * @return true unless it only reads
     */
    public boolean changes() {
        return !method.equals(HandlerType.GET);
    }
}
