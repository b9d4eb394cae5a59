package org.wardon.web.chamber;

import java.util.Optional;
import org.wardon.advice.forecast.SectionAdvice;
import org.wardon.advice.forecast.StoreAdvice;
import org.wardon.advice.placing.OpenLots;
import org.wardon.advice.whatif.Changes;
import org.wardon.advice.whatif.WhatIf;
import org.wardon.advice.wording.Units;
import org.wardon.advice.wording.Words;
import org.wardon.errors.BadInput;
import org.wardon.errors.Progress;
import org.wardon.files.forecast.HourlySeries;
import org.wardon.files.forecast.SectionAnswer;
import org.wardon.files.forecast.WhatIfAnswer;
import org.wardon.logbook.KeptPlan;
import org.wardon.plan.StorePlan;
import org.wardon.reference.ReferenceBook;
import org.wardon.web.work.OpenPlan;

/** Works out what the page of a chamber shows beyond the forecast, and remembers it. */
final class ChamberDesk {
    private static final int STORES = 6;
    private static final int ANSWERS = 24;

    private final Remembered<Asked, WhatIf> trials = new Remembered<>(STORES);
    private final Remembered<AskedWith, WhatIfAnswer> answers = new Remembered<>(ANSWERS);
    private final Remembered<Asked, HourlySeries> heat = new Remembered<>(STORES);
    private final Remembered<Asked, Optional<SectionAnswer>> sections = new Remembered<>(STORES);

    /** A chamber of a plan in one version, told in these units. */
    private record Asked(KeptPlan plan, ReferenceBook book, String chamber, Units units) {}

    /** The same with something changed. */
    private record AskedWith(Asked asked, Changes changes) {}

    private static Asked asked(OpenPlan open, String chamber, Units units) {
        return new Asked(open.kept(), open.book(), chamber, units);
    }

    /** The chamber with something changed. */
    WhatIfAnswer answer(
            OpenPlan open, StorePlan plan, String chamber, Changes changes, Units units) {
        Asked asked = asked(open, chamber, units);
        return answers.of(new AskedWith(asked, changes), () -> trial(asked, plan).answer(changes));
    }

    /** The chamber as it stands, by the same quick way as its changes. */
    HourlySeries unchanged(OpenPlan open, StorePlan plan, String chamber, Units units) {
        return trial(asked(open, chamber, units), plan).unchanged();
    }

    /** What the chamber is set to as planned, °C. */
    double settingC(OpenPlan open, StorePlan plan, String chamber) {
        return trial(asked(open, chamber, Units.METRIC), plan).settingC();
    }

    private WhatIf trial(Asked asked, StorePlan plan) {
        return trials.of(
                asked,
                () ->
                        WhatIf.of(
                                housed(plan, asked.book()),
                                asked.book(),
                                Words.english(asked.units()),
                                asked.chamber()));
    }

    private static StorePlan housed(StorePlan plan, ReferenceBook book) {
        return OpenLots.house(plan, book, Progress.SILENT).plan();
    }

    /** What heats the chamber hour by hour. */
    HourlySeries heat(OpenPlan open, StoreAdvice advice, String chamber) {
        return heat.of(asked(open, chamber, Units.METRIC), () -> advice.view(chamber).heat());
    }

    /** The section of a chamber whose air no fan stirs; empty where one does. */
    Optional<SectionAnswer> section(OpenPlan open, StorePlan plan, String chamber, Units units) {
        return sections.of(
                asked(open, chamber, units),
                () -> section(open, plan, chamber, Words.english(units)));
    }

    private static Optional<SectionAnswer> section(
            OpenPlan open, StorePlan plan, String chamber, Words words) {
        try {
            return Optional.of(
                    new SectionAdvice(open.book(), words)
                            .ask(
                                    housed(plan, open.book()),
                                    new SectionAdvice.Question(
                                            chamber,
                                            Optional.empty(),
                                            SectionAdvice.USUAL_HOURS,
                                            Optional.empty())));
        } catch (BadInput stirred) {
            return Optional.empty();
        }
    }
}
