package org.wardon.advice.company;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.wardon.advice.forecast.PriceTold;
import org.wardon.advice.wording.Words;
import org.wardon.air.Timeline;
import org.wardon.files.forecast.Because;
import org.wardon.files.forecast.Bounds;
import org.wardon.files.forecast.ShareAnswer;
import org.wardon.produce.Reason;
import org.wardon.sharing.PairVerdict;
import org.wardon.sharing.SettingRange;
import org.wardon.sharing.SharingAnswer;
import org.wardon.sharing.Spell;

/** Puts a verdict on sharing into its fixed names. */
final class ShareTold {
    private final Words words;
    private final Optional<Timeline> timeline;

    /** Where nobody comes or goes. */
    ShareTold(Words words) {
        this(words, Optional.empty());
    }

    /** Where lots come and go at times of a plan. */
    ShareTold(Words words, Optional<Timeline> timeline) {
        this.words = words;
        this.timeline = timeline;
    }

    ShareReport of(SharingAnswer found) {
        ShareAnswer answer =
                new ShareAnswer(
                        found.verdict().word(),
                        found.workableC().map(ShareTold::bounds),
                        found.workableHumidityPct().map(ShareTold::bounds),
                        found.pairs().stream().map(this::pair).toList(),
                        found.compromise()
                                .map(
                                        one ->
                                                new ShareAnswer.Compromise(
                                                        one.atC(),
                                                        one.humidityPct(),
                                                        one.daysLost())),
                        found.takeOut(),
                        timeline.stream()
                                .flatMap(at -> found.spells().stream().map(one -> spell(one, at)))
                                .toList(),
                        found.prices().stream().map(one -> PriceTold.of(one, words)).toList());
        List<Reason> notes = new ArrayList<>();
        timeline.ifPresent(at -> notes.addAll(Dated.told(found.spells(), at)));
        found.prices().forEach(one -> notes.add(one.told()));
        notes.addAll(found.reasons());
        return new ShareReport(answer, notes);
    }

    private static ShareAnswer.Spell spell(Spell one, Timeline at) {
        return new ShareAnswer.Spell(
                at.localAt(one.fromS()),
                at.localAt(one.toS()),
                one.ids(),
                one.verdict().word(),
                one.temperatureC().map(ShareTold::bounds),
                one.humidityPct().map(ShareTold::bounds));
    }

    static Bounds bounds(SettingRange range) {
        return new Bounds(range.low(), range.high());
    }

    private ShareAnswer.Pair pair(PairVerdict pair) {
        return new ShareAnswer.Pair(
                pair.a(),
                pair.b(),
                pair.verdict().word(),
                pair.reasons().stream().map(this::because).toList());
    }

    private Because because(Reason reason) {
        return new Because(
                reason.code(), reason.subjects(), words.sentence(reason), reason.sourceId());
    }
}
