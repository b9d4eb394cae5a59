package org.wardon.web.api;

import java.time.LocalDate;
import java.time.temporal.ChronoUnit;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.wardon.advice.crops.CropSearch;
import org.wardon.advice.outlook.KeepRequest;
import org.wardon.advice.outlook.KeepingAdvice;
import org.wardon.advice.outlook.OwnLotAdvice;
import org.wardon.advice.outlook.OwnLotRequest;
import org.wardon.errors.BadInput;
import org.wardon.errors.Fault;
import org.wardon.files.forecast.LookAnswer;
import org.wardon.files.json.Part;
import org.wardon.produce.Commodity;
import org.wardon.produce.Source;
import org.wardon.produce.rows.OwnLot;
import org.wardon.reference.OwnValue;
import org.wardon.reference.ReferenceBook;
import org.wardon.web.api.route.Ask;
import org.wardon.web.api.route.Reply;
import org.wardon.web.api.route.Requests;
import org.wardon.web.api.told.Crops;
import org.wardon.web.api.told.OwnRanges;
import org.wardon.web.guard.Refusal;
import org.wardon.web.work.Workbench;

/** Crops with their facts and sources, values and lots of the keeper's own. */
final class CropsApi {
    private static final int MOST = 500;

    private final Workbench bench;

    CropsApi(Workbench bench) {
        this.bench = bench;
    }

    Reply list(Ask ask) {
        String like = ask.query().at("like").text().orElse("").strip();
        long most = Math.round(ask.query().at("most").number().orElse(MOST));
        return Reply.of(
                new Crops(
                        new CropSearch(bench.book())
                                .find(like).stream().limit(most).map(CropsApi::found).toList()));
    }

    private static Crops.Found found(CropSearch.Hit hit) {
        String name = hit.commodity().names().get(0);
        return new Crops.Found(
                hit.commodity().id(), name, name.equalsIgnoreCase(hit.by()) ? "" : hit.by());
    }

    private Commodity crop(Ask ask) {
        return bench.book().find(ask.path("crop")).orElseThrow(() -> new Refusal(404, "no-crop"));
    }

    Reply read(Ask ask) {
        Commodity crop = crop(ask);
        return Reply.of(LookAnswer.of(crop, bench.book().facts(crop.id())));
    }

    Reply source(Ask ask) {
        try {
            Source source = bench.book().source(ask.path("source"));
            return Reply.of(source);
        } catch (IllegalArgumentException e) {
            throw new Refusal(404, "no-source");
        }
    }

    Reply keep(Ask ask) {
        return Reply.of(
                new KeepingAdvice(bench.book())
                        .ask(request(crop(ask), ask.query(), ask.query().at("knownLife").text()))
                        .answer());
    }

    private static KeepRequest request(Commodity crop, Part asked, Optional<String> knownLife) {
        return new KeepRequest(
                crop.id(),
                new KeepRequest.Steady(
                        asked.at("atC").number().orElseThrow(),
                        asked.at("days").number().orElse(KeepRequest.Steady.USUAL_DAYS)),
                asked.at("humidityPct").number(),
                asked.at("usedPct").number(),
                knownLife,
                DoorApi.ripeness(asked),
                asked.at("cured").flag(),
                asked.at("ethylenePpm").number(),
                asked.at("ripeInDays").number(),
                asked.at("variant").text());
    }

    Reply ownValues(Ask ask) {
        String crop = crop(ask).id();
        return Reply.of(
                new OwnRanges(
                        bench.ownValues().list().stream()
                                .filter(value -> value.commodityId().equals(crop))
                                .map(CropsApi::told)
                                .toList()));
    }

    private static OwnRanges.Own told(OwnValue own) {
        return new OwnRanges.Own(
                own.commodityId(), own.name(), own.low(), own.high(), own.unit(), own.setAt());
    }

    private static final String FACT = "fact";

    Reply setOwn(Ask ask) {
        String crop = crop(ask).id();
        String fact = ask.path(FACT);
        double low = ask.body().at("low").number().orElseThrow();
        double high = ask.body().at("high").number().orElse(low);
        String now = bench.clock().instant().truncatedTo(ChronoUnit.SECONDS).toString();
        try {
            OwnValue own = OwnValue.of(crop, fact, low, high, now);
            bench.ownValues().set(own);
            return Reply.of(told(own));
        } catch (BadInput e) {
            String where = crop + " " + fact;
            throw new BadInput(e.faults().stream().map(fault -> inBody(where, fault)).toList());
        }
    }

    /** What is wrong with the figures stands in the body, what with the name in the path. */
    private static Fault inBody(String where, Fault fault) {
        boolean name = fault.found().startsWith("no fact");
        return fault.file().equals(where)
                ? new Fault(
                        name ? Requests.PATH : Requests.BODY,
                        name ? FACT : "$",
                        fault.found(),
                        fault.accepted())
                : fault;
    }

    Reply forgetOwn(Ask ask) {
        if (!bench.ownValues().delete(crop(ask).id(), ask.path(FACT))) {
            throw new Refusal(404, "no-own");
        }
        return Reply.done();
    }

    Reply lots(Ask ask) {
        return lots(crop(ask));
    }

    private Reply lots(Commodity crop) {
        ReferenceBook book = bench.book();
        return Reply.of(new OwnLotAdvice(book).list(crop.id(), bench.goneLots().list()).answer());
    }

    Reply remember(Ask ask) {
        Commodity crop = crop(ask);
        Part gone = ask.body();
        String ended = gone.at("ended").text().orElseThrow().toUpperCase(Locale.ROOT);
        OwnLotRequest request =
                new OwnLotRequest(
                        request(crop, gone, Optional.empty()),
                        OwnLot.Ended.valueOf(ended),
                        gone.at("on").text().map(LocalDate::parse),
                        LocalDate.now(bench.clock()),
                        gone.at("lot").text().orElse(""),
                        gone.at("note").text().orElse(""));
        bench.goneLots().add(new OwnLotAdvice(bench.book()).gone(request));
        return lots(crop).with(201);
    }

    Reply forgetLot(Ask ask) {
        Commodity crop = crop(ask);
        long number = ask.call().number("number");
        List<Long> known =
                bench.goneLots().list().stream()
                        .filter(lot -> lot.commodityId().equals(crop.id()))
                        .map(lot -> lot.lot().number())
                        .toList();
        if (!known.contains(number) || !bench.goneLots().delete(number)) {
            throw new Refusal(404, "no-own-lot");
        }
        return Reply.done();
    }
}
