package org.wardon.web.chamber;

import java.util.List;
import java.util.Optional;
import org.wardon.advice.wording.Words;
import org.wardon.files.forecast.Quantiles;
import org.wardon.files.forecast.WhatIfAnswer;
import org.wardon.web.pages.Figures;
import org.wardon.web.pages.Frame;
import org.wardon.web.pages.PageWords;
import org.wardon.web.pages.TableView;

/** Turns the answer to a change into what a page shows. */
final class WhatIfViews {
    private final PageWords say;
    private final Figures figures;
    private final Words words;
    private final Curves curves;
    private final String currency;

    WhatIfViews(Frame frame, Curves curves, String currency) {
        say = frame.words();
        figures = frame.figures();
        words = Words.english(frame.preferences().units());
        this.curves = curves;
        this.currency = currency;
    }

    /** The answer; its chart is drawn from the path. */
    WhatIfView view(WhatIfAnswer answer, String chart) {
        String held = answer.unchanged().holds() ? "what.held-before" : "what.failed-before";
        return new WhatIfView(
                say.say(answer.now().holds() ? "what.holds" : "what.fails") + " " + say.say(held),
                answer.whyNot().stream().map(one -> figures.text(one.text())).toList(),
                answer.lots().isEmpty() ? Optional.empty() : Optional.of(lots(answer)),
                Optional.of(money(answer)),
                chart,
                say.say("what.chart"));
    }

    /** What stands in place of an answer. */
    WhatIfView told(String sentence) {
        return new WhatIfView(sentence, List.of(), Optional.empty(), Optional.empty(), "", "");
    }

    private TableView lots(WhatIfAnswer answer) {
        return new TableView(
                say.say("what.lots"),
                List.of(
                        say.say("what.lot"),
                        say.say("what.changed"),
                        say.say("what.planned"),
                        say.say("what.difference")),
                answer.lots().stream().map(this::lot).toList());
    }

    private List<String> lot(WhatIfAnswer.OfLot lot) {
        return List.of(
                lot.id(),
                figures.text(words.range(lot.daysLeft())),
                figures.text(words.range(lot.daysLeftUnchanged())),
                gained(lot.daysGained()));
    }

    private String gained(Quantiles days) {
        String sign = days.p50() < 0 ? "−" : "+";
        return Math.abs(days.p50()) < 0.05
                ? figures.figure(0, "day")
                : sign + figures.figure(Math.abs(days.p50()), "day");
    }

    private TableView money(WhatIfAnswer answer) {
        WhatIfAnswer.Outcome now = answer.now();
        WhatIfAnswer.Outcome before = answer.unchanged();
        return new TableView(
                say.say("what.money"),
                List.of(
                        say.say("what.figure"),
                        say.say("what.changed"),
                        say.say("what.planned"),
                        say.say("what.difference")),
                List.of(
                        row("what.energy", now.energyKWh(), before.energyKWh(), "kWh"),
                        row("what.cost", now.energyCost(), before.energyCost(), currency),
                        row("what.kept", now.valueKept(), before.valueKept(), currency),
                        row("what.net", now.net(), before.net(), currency)));
    }

    private List<String> row(String key, double now, double before, String unit) {
        double more = now - before;
        String sign = more < 0 ? "−" : more > 0 ? "+" : "";
        return List.of(
                (say.say(key) + ", " + unit).replaceAll(", $", ""),
                curves.number(now),
                curves.number(before),
                sign + curves.number(Math.abs(more)));
    }
}
