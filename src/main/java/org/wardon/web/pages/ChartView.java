package org.wardon.web.pages;

/**
 * A chart that a script draws from a data route, with the table behind it that everybody can read.
 *
 * @param title what it shows
 * @param source path of its data, see {@link ChartData}
 * @param lines which of its lines are drawn, blank between; all where none is named
 * @param table the same in numbers, perhaps by day
 * @param drawn the same as SVG, for paper and pages without script; blank where the table is enough
 */
public record ChartView(String title, String source, String lines, TableView table, String drawn) {}
