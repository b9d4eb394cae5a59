package org.wardon.web.api.page;

import java.util.List;
import java.util.Optional;
import org.wardon.web.pages.TableView;

/**
 * The document to be read.
 *
 * @param description what the interface is
 * @param first a line that works at once
 * @param groups its operations
 */
public record ApiView(String description, String first, List<Group> groups) {
    /** Copies the list. */
    public ApiView {
        groups = List.copyOf(groups);
    }

    /**
     * Operations that belong together.
     *
     * @param name its name
     * @param description what it is
     * @param open whether all is told of them, or only what they do
     * @param operations its operations
     */
    public record Group(String name, String description, boolean open, List<Operation> operations) {
        /** Copies the list. */
        public Group {
            operations = List.copyOf(operations);
        }
    }

    /**
     * An operation.
     *
     * @param id its name
     * @param method HTTP method
     * @param path its path
     * @param summary what it does
     * @param fields what it takes; absent where it takes nothing
     * @param answers what it answers
     * @param curl a line that asks it
     * @param example a real answer; blank for none
     */
    public record Operation(
            String id,
            String method,
            String path,
            String summary,
            Optional<TableView> fields,
            TableView answers,
            String curl,
            String example) {}
}
