package org.wardon.web.pages;

import java.util.List;

/**
 * A table, behind a chart or by itself.
 *
 * @param caption what it shows
 * @param head names of its columns
 * @param rows its cells
 */
public record TableView(String caption, List<String> head, List<List<String>> rows) {
    /** Copies the lists. */
    public TableView {
        head = List.copyOf(head);
        rows = rows.stream().map(List::copyOf).toList();
    }
}
