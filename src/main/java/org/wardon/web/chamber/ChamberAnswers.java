package org.wardon.web.chamber;

import java.util.Optional;
import org.wardon.advice.forecast.StoreAdvice;
import org.wardon.advice.whatif.Changes;
import org.wardon.advice.wording.Units;
import org.wardon.files.forecast.HourlySeries;
import org.wardon.files.forecast.SectionAnswer;
import org.wardon.files.forecast.WhatIfAnswer;
import org.wardon.plan.StorePlan;
import org.wardon.web.pages.ChartData;
import org.wardon.web.pages.Figures;
import org.wardon.web.pages.PageWords;
import org.wardon.web.pages.Preferences;
import org.wardon.web.work.OpenPlan;

/** Answers on one chamber beyond the forecast, remembered for pages and programs alike, in °C. */
public final class ChamberAnswers {
    private static final Figures PLAIN = new Figures(Preferences.USUAL);

    private final ChamberDesk desk = new ChamberDesk();
    private final PageWords words;

    /**
     * Begins with nothing remembered.
     *
     * @param words words of the pages
     */
    public ChamberAnswers(PageWords words) {
        this.words = words;
    }

    ChamberDesk desk() {
        return desk;
    }

    private ChamberViews views(StoreAdvice advice, String chamber) {
        return new ChamberViews(advice, chamber, words, PLAIN);
    }

    /**
     * Tells a chart of a chamber.
     *
     * @param advice the forecast
     * @param chamber the chamber
     * @param curve which: {@code air}, {@code humidity}, {@code co2}, {@code ethylene} or {@code
     *     cooling}
     * @return its data, absent where there is none of that name
     */
    public Optional<ChartData> curve(StoreAdvice advice, String chamber, String curve) {
        return views(advice, chamber).data(curve);
    }

    /**
     * Tells core and surface of a lot.
     *
     * @param advice the forecast
     * @param chamber the chamber
     * @param lot the lot
     * @return its data, absent where the lot never stands there
     */
    public Optional<ChartData> lot(StoreAdvice advice, String chamber, String lot) {
        return views(advice, chamber).lot(lot);
    }

    /**
     * Tells what heats a chamber hour by hour.
     *
     * @param open the plan
     * @param advice its forecast
     * @param chamber the chamber
     * @return watts, a term a column
     */
    public SeriesTold heat(OpenPlan open, StoreAdvice advice, String chamber) {
        return SeriesTold.of(desk.heat(open, advice, chamber), advice.plan());
    }

    /**
     * Tells a chamber with something changed.
     *
     * @param open the plan
     * @param plan what reading it gave
     * @param chamber the chamber
     * @param changes what is changed
     * @return both, with the air of both
     */
    public WhatIfTold whatIf(OpenPlan open, StorePlan plan, String chamber, Changes changes) {
        WhatIfAnswer answer = desk.answer(open, plan, chamber, changes, Units.METRIC);
        HourlySeries before = desk.unchanged(open, plan, chamber, Units.METRIC);
        double planned = desk.settingC(open, plan, chamber);
        ChartData air =
                new Curves(plan, PLAIN, words)
                        .compared(answer.series(), before, changes.settingC().orElse(planned));
        return WhatIfTold.of(answer, air);
    }

    /**
     * Tells where it is warm and where cold in a chamber no fan stirs.
     *
     * @param open the plan
     * @param plan what reading it gave
     * @param chamber the chamber
     * @return the section, absent where a fan stirs the air
     */
    public Optional<SectionAnswer> section(OpenPlan open, StorePlan plan, String chamber) {
        return desk.section(open, plan, chamber, Units.METRIC);
    }
}
