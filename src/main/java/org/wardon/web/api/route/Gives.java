package org.wardon.web.api.route;

import java.util.Optional;

/**
 * One good answer of an operation.
 *
 * @param status HTTP status
 * @param mediaType what its content is; blank where there is none
 * @param shape the record it is written from; absent where it is no JSON of ours
 */
public record Gives(int status, String mediaType, Optional<Class<? extends Record>> shape) {
    /** JSON. */
    public static final String JSON = "application/json";
}
