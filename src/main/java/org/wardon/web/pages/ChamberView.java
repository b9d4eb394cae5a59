package org.wardon.web.pages;

import java.util.List;
import java.util.Optional;

/**
 * A chamber as it leads the page: its sentence first.
 *
 * @param id its id
 * @param holds whether it holds its setting
 * @param sentence whether it holds, and why not
 * @param besides what else speaks against it
 * @param strip its strip of days
 * @param facts what is in it, how full it is, what it may take in, each with its name
 * @param fill how full it is at the fullest, percent of what it takes
 * @param company a sentence on who shares it; absent where there is nothing to say
 * @param because why, shortly where there are very many reasons
 * @param lots its lots, first to leave first
 * @param chart its air hour by hour
 */
public record ChamberView(
        String id,
        boolean holds,
        String sentence,
        List<String> besides,
        StripView strip,
        List<FactView> facts,
        int fill,
        Optional<String> company,
        List<CautionView> because,
        LotsView lots,
        ChartView chart) {
    /** Copies the lists. */
    public ChamberView {
        besides = List.copyOf(besides);
        facts = List.copyOf(facts);
        because = List.copyOf(because);
    }
}
