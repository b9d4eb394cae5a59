package org.wardon.advice.outlook;

import java.util.List;
import org.wardon.files.forecast.KeepAnswer;
import org.wardon.files.forecast.Quantiles;
import org.wardon.keeping.Mechanism;
import org.wardon.keeping.Outlook;
import org.wardon.keeping.Spread;

/** Widens an answer to hold however cold or warm the lot was while nothing was read. */
final class GapRange {
    private GapRange() {}

    static KeepAnswer widened(KeepAnswer answer, List<Outlook> others) {
        if (others.isEmpty()) {
            return answer;
        }
        List<KeepAnswer.Mechanism> each =
                answer.mechanisms().stream()
                        .map(
                                one ->
                                        new KeepAnswer.Mechanism(
                                                one.name(),
                                                wide(one.daysLeft(), of(one.name(), others))))
                        .toList();
        return answer.with(wide(answer.daysLeft(), days(others)), each);
    }

    private static List<Spread> days(List<Outlook> others) {
        return others.stream().map(Outlook::daysLeft).toList();
    }

    private static List<Spread> of(String mechanism, List<Outlook> others) {
        return others.stream()
                .flatMap(
                        one ->
                                one.mechanisms().entrySet().stream()
                                        .filter(e -> e.getKey().word().equals(mechanism))
                                        .map(java.util.Map.Entry<Mechanism, Spread>::getValue))
                .toList();
    }

    private static Quantiles wide(Quantiles told, List<Spread> others) {
        double low = told.p10();
        double high = told.p90();
        for (Spread other : others) {
            low = Math.min(low, other.p10());
            high = Math.max(high, other.p90());
        }
        return new Quantiles(low, told.p50(), high);
    }
}
