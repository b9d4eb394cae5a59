package org.wardon.web.crops;

import java.time.LocalDate;
import java.time.format.DateTimeParseException;
import java.time.temporal.ChronoUnit;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.jspecify.annotations.Nullable;
import org.wardon.advice.crops.CropSearch;
import org.wardon.advice.crops.CropSheet;
import org.wardon.advice.outlook.OwnLotRequest;
import org.wardon.advice.wording.Words;
import org.wardon.errors.BadInput;
import org.wardon.errors.Fault;
import org.wardon.produce.Commodity;
import org.wardon.produce.rows.OwnLot;
import org.wardon.reference.ReferenceBook;
import org.wardon.web.guard.Refusal;
import org.wardon.web.pages.Call;
import org.wardon.web.pages.Frame;
import org.wardon.web.pages.Press;
import org.wardon.web.pages.Room;
import org.wardon.web.work.Workbench;

/** Crops: finding one, what is known of it, own values and lots, how long a lot keeps. */
public final class CropsPage {
    private static final String ANCHOR_OWN = "#own";
    private static final String ANCHOR_LOTS = "#lots";

    private final Workbench bench;
    private final Press press;
    private @Nullable CropDesk desk;

    /**
     * Makes the pages.
     *
     * @param bench what they work with
     * @param press what prints them
     */
    public CropsPage(Workbench bench, Press press) {
        this.bench = bench;
        this.press = press;
    }

    private synchronized CropDesk desk() {
        ReferenceBook book = bench.book();
        CropDesk now = desk;
        if (now == null || now.book() != book) {
            now = CropDesk.of(book);
            desk = now;
        }
        return now;
    }

    /**
     * Lists crops, or those found.
     *
     * @param call the request
     */
    public void list(Call call) {
        String asked = Optional.ofNullable(call.http().queryParam("q")).orElse("").strip();
        CropSearch search = desk().search();
        List<CropListView.Group> groups = new ArrayList<>();
        if (asked.isEmpty()) {
            search.byPart().forEach((part, crops) -> groups.add(group(part, crops)));
        } else {
            List<CropListView.Entry> found = search.find(asked).stream().map(this::hit).toList();
            groups.add(new CropListView.Group("", found));
        }
        press.print(
                call,
                "crops",
                press.frame(call, Room.CROPS, Optional.empty()),
                new CropListView(asked, groups));
    }

    private CropListView.Group group(String part, List<Commodity> crops) {
        String key = "plant." + part;
        return new CropListView.Group(
                press.words().has(key) ? press.words().say(key) : part.replace('-', ' '),
                crops.stream()
                        .map(one -> new CropListView.Entry(one.id(), one.names().get(0), ""))
                        .toList());
    }

    private CropListView.Entry hit(CropSearch.Hit hit) {
        String name = hit.commodity().names().get(0);
        return new CropListView.Entry(
                hit.commodity().id(), name, name.equals(hit.by()) ? "" : hit.by());
    }

    /**
     * Shows a crop.
     *
     * @param call the request
     */
    public void show(Call call) {
        print(call, new Refused(List.of(), ""));
    }

    /** What was wrong with a form, and which. */
    private record Refused(List<Fault> faults, String form) {
        List<Fault> of(String other) {
            return form.equals(other) ? faults : List.of();
        }
    }

    private Commodity crop(Call call) {
        return desk().book()
                .find(call.http().pathParam("crop"))
                .orElseThrow(() -> new Refusal(404, "no-crop"));
    }

    private static String given(Call call, String name) {
        String query = Optional.ofNullable(call.http().queryParam(name)).orElse("");
        return query.isBlank() ? call.field(name) : query.strip();
    }

    private void print(Call call, Refused refused) {
        Commodity crop = crop(call);
        Optional<String> variant =
                Optional.of(given(call, "variant")).filter(word -> !word.isBlank());
        CropSheet sheet = desk().sheets().of(crop.id(), variant);
        Words words = Words.english(call.preferences().units());
        CropViews views = new CropViews(sheet, press.words(), words, call.figures());
        String title = crop.names().get(0);
        Frame frame = press.frame(call, Room.CROPS, Optional.empty()).titled(title);
        if (!refused.faults().isEmpty()) {
            call.http().status(422);
        }
        press.print(
                call,
                "crop",
                frame,
                new CropView(
                        crop.id(),
                        title,
                        String.join(", ", crop.names().subList(1, crop.names().size())),
                        variants(sheet, variant.orElse("")),
                        variant.orElse(""),
                        sheet.variant().map(words::sentence).orElse(""),
                        views.lead(),
                        views.life(),
                        views.printed(),
                        views.cold(),
                        views.breath(),
                        views.rates(),
                        views.ripening(),
                        views.facts(),
                        views.sources(),
                        new OwnForm(call, press.words()).view(views.own(), refused.of("own")),
                        lots(call, crop, words, refused.of("lot")),
                        keep(call, crop, words)));
    }

    private List<CropView.Pick> variants(CropSheet sheet, String taken) {
        List<CropView.Pick> picks = new ArrayList<>();
        if (!sheet.variants().isEmpty()) {
            picks.add(new CropView.Pick("", press.words().say("crop.as-a-whole"), taken.isEmpty()));
        }
        for (Map.Entry<String, String> one : sheet.variants().entrySet()) {
            picks.add(new CropView.Pick(one.getKey(), one.getValue(), one.getKey().equals(taken)));
        }
        return picks;
    }

    private CropView.KeepView keep(Call call, Commodity crop, Words words) {
        KeepForm form =
                new KeepForm(
                        KeepForm.ASKS,
                        crop,
                        name -> given(call, name),
                        press.words(),
                        call.figures());
        if (!form.asked()) {
            return form.unasked();
        }
        try {
            return form.answered(desk().keeping().ask(form.request(OptionalDouble.of(7))), words);
        } catch (BadInput e) {
            call.http().status(422);
            return form.refused(e.faults());
        }
    }

    private CropView.LotsView lots(Call call, Commodity crop, Words words, List<Fault> faults) {
        LotForm form = new LotForm(call, crop, press.words(), words);
        return form.view(desk().lots().list(crop.id(), bench.goneLots().list()), faults);
    }

    /**
     * Sets an own value.
     *
     * @param call the request
     */
    public void own(Call call) {
        Commodity crop = crop(call);
        try {
            OwnForm form = new OwnForm(call, press.words());
            String now = bench.clock().instant().truncatedTo(ChronoUnit.SECONDS).toString();
            bench.ownValues().set(form.value(crop.id(), now));
            call.goTo("/crops/" + crop.id() + ANCHOR_OWN);
        } catch (BadInput e) {
            print(call, new Refused(e.faults(), "own"));
        }
    }

    /**
     * Forgets an own value.
     *
     * @param call the request
     */
    public void forget(Call call) {
        Commodity crop = crop(call);
        bench.ownValues().delete(crop.id(), call.field("fact"));
        call.goTo("/crops/" + crop.id() + ANCHOR_OWN);
    }

    /**
     * Remembers a lot that is gone.
     *
     * @param call the request
     */
    public void lot(Call call) {
        Commodity crop = crop(call);
        try {
            KeepForm form = new KeepForm("lot-", crop, call::field, press.words(), call.figures());
            LocalDate today = LocalDate.now(bench.clock());
            OwnLotRequest request =
                    new OwnLotRequest(
                            form.request(OptionalDouble.empty()),
                            ended(call),
                            day(call),
                            today,
                            call.field("lot-name"),
                            call.field("lot-note"));
            bench.goneLots().add(desk().lots().gone(request));
            call.goTo("/crops/" + crop.id() + ANCHOR_LOTS);
        } catch (BadInput e) {
            print(call, new Refused(e.faults(), "lot"));
        }
    }

    private OwnLot.Ended ended(Call call) {
        for (OwnLot.Ended one : OwnLot.Ended.values()) {
            if (one.name().equalsIgnoreCase(call.field("lot-ended"))) {
                return one;
            }
        }
        throw new BadInput(
                "--ended",
                "",
                press.words().say("crop.missing"),
                "accepted: "
                        + String.join(
                                ", ",
                                List.of(OwnLot.Ended.values()).stream()
                                        .map(one -> one.name().toLowerCase(Locale.ROOT))
                                        .toList()));
    }

    private static Optional<LocalDate> day(Call call) {
        String typed = call.field("lot-on");
        if (typed.isBlank()) {
            return Optional.empty();
        }
        try {
            return Optional.of(LocalDate.parse(typed));
        } catch (DateTimeParseException e) {
            throw new BadInput(
                    "--on", "", "'" + typed + "' is no day", "accepted: a day such as 2026-03-02");
        }
    }

    /**
     * Forgets a lot that is gone.
     *
     * @param call the request
     */
    public void forgetLot(Call call) {
        Commodity crop = crop(call);
        String number = call.field("number");
        bench.goneLots().list().stream()
                .filter(lot -> lot.commodityId().equals(crop.id()))
                .filter(lot -> String.valueOf(lot.lot().number()).equals(number))
                .findFirst()
                .ifPresent(lot -> bench.goneLots().delete(lot.lot().number()));
        call.goTo("/crops/" + crop.id() + ANCHOR_LOTS);
    }
}
