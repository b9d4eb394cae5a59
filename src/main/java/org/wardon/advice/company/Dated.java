package org.wardon.advice.company;

import java.time.LocalDateTime;
import java.time.temporal.ChronoUnit;
import java.util.List;
import org.wardon.air.Timeline;
import org.wardon.produce.Reason;
import org.wardon.produce.Reason.Argument;
import org.wardon.sharing.Spell;

/** Tells what suits those who stand together, time by time. */
final class Dated {
    private static final String RULE = "assumption";

    private Dated() {}

    static List<Reason> told(List<Spell> spells, Timeline timeline) {
        return spells.stream().map(spell -> told(spell, timeline)).toList();
    }

    private static Reason told(Spell spell, Timeline timeline) {
        String lots = String.join(", ", spell.ids());
        Argument from = at(timeline.localAt(spell.fromS()));
        Argument to = at(timeline.localAt(spell.toS()));
        if (spell.temperatureC().isEmpty() || spell.humidityPct().isEmpty()) {
            return Reason.about("spell-apart", lots, RULE, from, to);
        }
        return Reason.about(
                "spell-works",
                lots,
                RULE,
                from,
                to,
                Argument.of(spell.temperatureC().get().low(), "C"),
                Argument.of(spell.temperatureC().get().high(), "C"),
                Argument.of(spell.humidityPct().get().low(), "pct"),
                Argument.of(spell.humidityPct().get().high(), "pct"));
    }

    private static Argument at(LocalDateTime time) {
        LocalDateTime minute = time.truncatedTo(ChronoUnit.MINUTES);
        return Argument.text(minute.toLocalDate() + " " + minute.toLocalTime());
    }
}
