package org.wardon.cli;

import java.time.LocalDate;
import java.time.ZoneId;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import org.wardon.advice.outlook.KeepRequest;
import org.wardon.advice.outlook.OwnLotAdvice;
import org.wardon.advice.outlook.OwnLotRequest;
import org.wardon.errors.BadInput;
import org.wardon.files.forecast.AnswerWriter;
import org.wardon.produce.rows.OwnLot;
import org.wardon.reference.GoneLot;
import org.wardon.reference.GoneLots;
import org.wardon.reference.ReferenceBook;
import picocli.CommandLine.Option;

/** Options that remember, list and forget a keeper's own lots. */
final class OwnLotWords {
    @Option(
            names = "--ended",
            paramLabel = "HOW",
            description = {
                "Remember this lot, which has ended: aged (its life), ripe (its green life), sold"
                        + " (still sound) or spoilt (by rot, cold or drought). With --at, --days say"
                        + " how long it was kept."
            })
    private OwnLot.@Nullable Ended ended;

    @Option(
            names = "--on",
            paramLabel = "DATE",
            description = "With --ended: the day it ended, such as 2026-03-02.")
    private @Nullable LocalDate on;

    @Option(names = "--lot", paramLabel = "NAME", description = "With --ended: its name.")
    private @Nullable String lot;

    @Option(names = "--note", paramLabel = "TEXT", description = "With --ended: a line beside it.")
    private @Nullable String note;

    @Option(names = "--outcomes", description = "List your own lots of it.")
    private boolean outcomes;

    @Option(
            names = "--forget-outcome",
            paramLabel = "N",
            description = "Forget your own lot of this number.")
    private @Nullable Long forget;

    /** Whether lots are listed or forgotten, so that no condition is asked about. */
    boolean listed() {
        return outcomes || forget != null;
    }

    /** Whether the lot asked about is to be remembered. */
    boolean remembered() {
        return ended != null;
    }

    /** Refuses words that go with others only. */
    void check(boolean daysMissing) {
        if (ended == null && (on != null || lot != null || note != null)) {
            throw new BadInput(
                    on != null ? "--on" : lot != null ? "--lot" : "--note",
                    "",
                    "it goes with --ended only",
                    "accepted: --ended aged, ripe, sold or spoilt beside it");
        }
        if (ended != null && listed()) {
            throw new BadInput(
                    "--ended",
                    "",
                    "it does not go with --outcomes or --forget-outcome",
                    "accepted: one of them at a time");
        }
        if (ended != null && daysMissing) {
            throw new BadInput(
                    "--ended",
                    "",
                    "nothing says how long the lot was kept",
                    "accepted: --days N beside --at C, or --history CSV");
        }
    }

    /** Lists or forgets. */
    String list(Shared shared, String name, boolean json) {
        GoneLots file = shared.goneLots();
        try (ReferenceBook book = shared.book()) {
            if (forget != null) {
                forget(file, book.named(name).id(), forget);
            }
        }
        return page(shared, name, json, Optional.empty());
    }

    private static void forget(GoneLots file, String commodityId, long number) {
        boolean known =
                file.list().stream()
                        .filter(one -> one.commodityId().equals(commodityId))
                        .anyMatch(one -> one.lot().number() == number);
        if (!known) {
            throw new BadInput(
                    "--forget-outcome",
                    "",
                    "no lot of " + commodityId + " has the number " + number,
                    "accepted: a number of 'keep " + commodityId + " --outcomes'");
        }
        file.delete(number);
    }

    /** Remembers the lot and tells what it changed. */
    String remember(Shared shared, KeepRequest went, boolean json) {
        GoneLot gone;
        try (ReferenceBook book = shared.book()) {
            gone =
                    new OwnLotAdvice(book)
                            .gone(
                                    new OwnLotRequest(
                                            went,
                                            java.util.Objects.requireNonNull(ended),
                                            Optional.ofNullable(on),
                                            LocalDate.now(ZoneId.systemDefault()),
                                            lot == null ? "" : lot,
                                            note == null ? "" : note));
        }
        long number = shared.goneLots().add(gone);
        return page(shared, went.commodity(), json, Optional.of(number));
    }

    private static String page(
            Shared shared, String name, boolean json, Optional<Long> remembered) {
        try (ReferenceBook book = shared.book()) {
            var report = new OwnLotAdvice(book).list(name, shared.goneLots().list());
            return json
                    ? AnswerWriter.json(report.answer())
                    : new OwnLotPage(shared.words()).of(report, remembered);
        }
    }
}
