package org.wardon.advice.receiving;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import org.wardon.advice.wording.Words;
import org.wardon.files.forecast.ReceiveAnswer;
import org.wardon.files.forecast.ReceiveAnswer.Choice;
import org.wardon.produce.Reason;
import org.wardon.produce.Reason.Argument;

/**
 * Which choice is best, and why not the others. First by verdict; among equals by what is earned,
 * to half a percent of the lot's full value; then by the days it keeps in the short case. Selling
 * now gives up the days that are wanted, so it stands behind whatever is not a plain no, and before
 * every no where the lot still reaches the buyer.
 */
final class Ranking {
    private static final double SAME_SHARE = 0.005;
    private static final String GOOD = "good";
    private static final String NO = "no";
    private static final String RULE = "assumption";

    private final Question question;
    private final Words words;

    Ranking(Question question, Words words) {
        this.question = question;
        this.words = words;
    }

    /** All choices with their sentences, best first. */
    List<Choice> ranked(List<Choice> choices) {
        List<Choice> ranked = new ArrayList<>(choices);
        double step = Math.max(SAME_SHARE * question.fullValue(), Double.MIN_NORMAL);
        ranked.sort(
                Comparator.comparingInt(Ranking::place)
                        .thenComparing(
                                choice -> Math.rint(choice.worth().net() / step),
                                Comparator.reverseOrder())
                        .thenComparing(choice -> !choice.kind().equals(ReceiveAnswer.SELL_NOW))
                        .thenComparing(
                                choice -> choice.keeps().daysLeft().p10(),
                                Comparator.reverseOrder())
                        .thenComparing(choice -> choice.chamber().orElse("")));
        Choice best = ranked.get(0);
        ranked.replaceAll(
                choice -> choice.equals(best) ? choice.because(why(best)) : whyNot(choice, best));
        return ranked;
    }

    private static int place(Choice choice) {
        boolean sale = choice.kind().equals(ReceiveAnswer.SELL_NOW);
        if (sale) {
            return choice.verdict().equals(NO) ? 3 : 2;
        }
        return choice.verdict().equals(GOOD) ? 0 : choice.verdict().equals(NO) ? 3 : 1;
    }

    private String why(Choice best) {
        String days = words.range(best.keeps().daysLeft());
        Argument mass = Argument.of(question.lot().massKg(), "kg");
        Argument wanted = Argument.of(question.lot().wantedDays(), "day");
        Argument market = Argument.of(question.marketDays(), "day");
        List<Argument> told = List.of(mass, Argument.text(days), wanted, market);
        String crop = question.lot().commodity();
        if (best.kind().equals(ReceiveAnswer.CHAMBER)) {
            List<String> subjects = List.of(crop, best.chamber().orElseThrow());
            return words.sentence(new Reason(into(best), subjects, told, RULE)) + others(best);
        }
        String code =
                best.kind().equals(ReceiveAnswer.SHADE)
                        ? "receive-shade"
                        : best.verdict().equals(NO) ? "receive-nowhere" : "receive-sale";
        return words.sentence(new Reason(code, List.of(crop), told, RULE));
    }

    private static String into(Choice best) {
        return switch (best.verdict()) {
            case "good" -> "receive-into";
            case "tolerable" -> "receive-into-tight";
            default -> "receive-into-short";
        };
    }

    /** What becomes of the others, the one that loses most by name. */
    private String others(Choice best) {
        List<ReceiveAnswer.OfLot> lots = best.inside().orElseThrow().lots();
        return lots.stream()
                .max(Comparator.comparingDouble(ReceiveAnswer.OfLot::daysLost))
                .map(
                        most ->
                                " "
                                        + words.sentence(
                                                most.daysLost() < 0.1
                                                        ? Reason.about(
                                                                "receive-others-well",
                                                                most.id(),
                                                                RULE)
                                                        : Reason.about(
                                                                "receive-others-lose",
                                                                most.id(),
                                                                RULE,
                                                                Argument.of(
                                                                        most.daysLost(), "day"))))
                .orElse("");
    }

    private Choice whyNot(Choice choice, Choice best) {
        if (choice.kind().equals(ReceiveAnswer.SELL_NOW) && !choice.verdict().equals(NO)) {
            return choice.because(
                    words.sentence(
                            Reason.about(
                                    "receive-sale-early",
                                    choice.kind(),
                                    RULE,
                                    Argument.of(question.lot().wantedDays(), "day"))));
        }
        boolean worse = place(choice) > place(best);
        if (worse && !choice.reasons().isEmpty()) {
            return choice.because(choice.reasons().get(0).text());
        }
        double less = best.worth().net() - choice.worth().net();
        Argument days = Argument.text(words.range(choice.keeps().daysLeft()));
        String code =
                less > SAME_SHARE * question.fullValue()
                        ? "receive-worth-less"
                        : "receive-no-better";
        return choice.because(
                words.sentence(
                        Reason.about(
                                code,
                                choice.chamber().orElse(choice.kind()),
                                RULE,
                                days,
                                Argument.text(money(less)))));
    }

    private String money(double value) {
        return (String.format(Locale.ROOT, "%,.0f", value).replace(',', ' ')
                        + " "
                        + question.plan().prices().currency())
                .strip();
    }
}
