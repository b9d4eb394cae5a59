package org.wardon.web.chamber;

import java.util.List;
import java.util.Optional;
import org.wardon.web.pages.TableView;

/**
 * A chamber with something changed, ready to be shown.
 *
 * @param sentence whether it holds
 * @param because why not
 * @param lots days left of its lots, against the plan
 * @param money energy, cost and net, against the plan
 * @param chart path of the data of its air, the air as planned behind it
 * @param chartTitle what the chart shows
 */
public record WhatIfView(
        String sentence,
        List<String> because,
        Optional<TableView> lots,
        Optional<TableView> money,
        String chart,
        String chartTitle) {
    /** Copies the list. */
    public WhatIfView {
        because = List.copyOf(because);
    }
}
