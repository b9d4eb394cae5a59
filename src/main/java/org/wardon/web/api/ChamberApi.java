package org.wardon.web.api;

import java.util.Optional;
import org.wardon.advice.forecast.SectionAdvice;
import org.wardon.advice.forecast.StoreAdvice;
import org.wardon.advice.whatif.Changes;
import org.wardon.advice.wording.Units;
import org.wardon.advice.wording.Words;
import org.wardon.files.forecast.HourlySeries;
import org.wardon.files.forecast.SectionAnswer;
import org.wardon.files.json.Part;
import org.wardon.plan.StorePlan;
import org.wardon.web.api.route.Ask;
import org.wardon.web.api.route.Reply;
import org.wardon.web.chamber.ChamberAnswers;
import org.wardon.web.chamber.SeriesTold;
import org.wardon.web.guard.Refusal;
import org.wardon.web.work.OpenPlan;

/** One chamber hour by hour, and with something changed. */
final class ChamberApi {
    private final AnswersApi answers;
    private final ChamberAnswers chambers;

    ChamberApi(AnswersApi answers, ChamberAnswers chambers) {
        this.answers = answers;
        this.chambers = chambers;
    }

    Reply curve(Ask ask) {
        OpenPlan open = ask.plan();
        String chamber = AnswersApi.chamber(ask, open);
        StoreAdvice advice = answers.advice(ask, open);
        return Reply.of(
                chambers.curve(advice, chamber, ask.path("curve"))
                        .orElseThrow(() -> new Refusal(404, "no-curve")));
    }

    Reply lotCurve(Ask ask) {
        OpenPlan open = ask.plan();
        String chamber = AnswersApi.chamber(ask, open);
        StoreAdvice advice = answers.advice(ask, open);
        return Reply.of(
                chambers.lot(advice, chamber, ask.path("lot"))
                        .orElseThrow(() -> new Refusal(404, "no-lot")));
    }

    Reply series(Ask ask) {
        OpenPlan open = ask.plan();
        String chamber = AnswersApi.chamber(ask, open);
        StoreAdvice advice = answers.advice(ask, open);
        return Reply.of(SeriesTold.of(advice.view(chamber).air(), advice.plan()));
    }

    Reply lotSeries(Ask ask) {
        OpenPlan open = ask.plan();
        String chamber = AnswersApi.chamber(ask, open);
        StoreAdvice advice = answers.advice(ask, open);
        Optional<HourlySeries> lot = advice.view(chamber).lot(ask.path("lot"));
        return Reply.of(
                SeriesTold.of(lot.orElseThrow(() -> new Refusal(404, "no-lot")), advice.plan()));
    }

    Reply heat(Ask ask) {
        OpenPlan open = ask.plan();
        String chamber = AnswersApi.chamber(ask, open);
        return Reply.of(chambers.heat(open, answers.advice(ask, open), chamber));
    }

    Reply whatIf(Ask ask) {
        OpenPlan open = ask.plan();
        String chamber = AnswersApi.chamber(ask, open);
        return Reply.of(
                chambers.whatIf(open, Ask.good(open).plan(), chamber, changes(ask.query())));
    }

    private static Changes changes(Part asked) {
        Optional<Changes.Insulation> insulation =
                asked.at("insulationFactor").number().isPresent()
                        ? Optional.of(
                                new Changes.Insulation(
                                        asked.at("insulationFactor").number().getAsDouble(),
                                        asked.at("insulationFace").text()))
                        : Optional.empty();
        return new Changes(
                asked.at("settingC").number(),
                asked.at("coolingFactor").number(),
                asked.at("loadFactor").number(),
                asked.at("freshAirM3PerHour").number(),
                insulation,
                new Changes.DoorUse(
                        asked.at("openingsPerDay").number(), asked.at("protection").text()));
    }

    Reply section(Ask ask) {
        OpenPlan open = ask.plan();
        String chamber = AnswersApi.chamber(ask, open);
        StorePlan plan = Ask.good(open).plan();
        Part asked = ask.query();
        Optional<SectionAnswer> known =
                asked.names().isEmpty() ? chambers.section(open, plan, chamber) : Optional.empty();
        return Reply.of(known.orElseGet(() -> section(open, chamber, asked)));
    }

    private static SectionAnswer section(OpenPlan open, String chamber, Part asked) {
        return new SectionAdvice(open.book(), Words.english(Units.METRIC))
                .ask(
                        AnswersApi.housed(open),
                        new SectionAdvice.Question(
                                chamber,
                                asked.at("at").text(),
                                (int) asked.at("hours").number().orElse(SectionAdvice.USUAL_HOURS),
                                asked.at("across").text()));
    }
}
