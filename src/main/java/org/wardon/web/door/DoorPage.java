package org.wardon.web.door;

import java.net.URLEncoder;
import java.nio.charset.StandardCharsets;
import java.time.LocalDateTime;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import org.wardon.advice.crops.CropSearch;
import org.wardon.advice.receiving.NewLot;
import org.wardon.advice.receiving.Receiving;
import org.wardon.advice.wording.Words;
import org.wardon.errors.BadInput;
import org.wardon.errors.Fault;
import org.wardon.errors.RunStopped;
import org.wardon.files.LotIntoPlan;
import org.wardon.files.forecast.ReceiveAnswer;
import org.wardon.logbook.PlanText;
import org.wardon.logbook.Saved;
import org.wardon.plan.LotPlan;
import org.wardon.plan.StorePlan;
import org.wardon.produce.Commodity;
import org.wardon.reference.ReferenceBook;
import org.wardon.web.guard.Refusal;
import org.wardon.web.pages.AllChambersPage;
import org.wardon.web.pages.Call;
import org.wardon.web.pages.Frame;
import org.wardon.web.pages.Press;
import org.wardon.web.pages.Room;
import org.wardon.web.work.OpenPlan;
import org.wardon.web.work.Reading;
import org.wardon.web.work.Workbench;

/** A lot comes to the door: the form, the answer, and putting it into the plan. */
public final class DoorPage {
    private static final int MOST_SUGGESTED = 6;
    private static final long PATIENCE_MS = 600;

    private final Workbench bench;
    private final Press press;

    /**
     * Makes the page.
     *
     * @param bench what it works with
     * @param press what prints it
     */
    public DoorPage(Workbench bench, Press press) {
        this.bench = bench;
        this.press = press;
    }

    /** A crop that may be meant; blank where it was met by its own name. */
    private record Suggested(String id, String name, String by) {}

    private static List<CropSearch.Hit> hits(ReferenceBook book, String asked) {
        return new CropSearch(book).find(asked);
    }

    private static Suggested suggested(CropSearch.Hit hit) {
        String name = hit.commodity().names().get(0);
        return new Suggested(
                hit.commodity().id(), name, name.equalsIgnoreCase(hit.by()) ? "" : hit.by());
    }

    /**
     * Shows the form, and the answer where something is asked.
     *
     * @param call the request
     */
    public void show(Call call) {
        OpenPlan open = AllChambersPage.opened(bench, call);
        DoorForm form = form(call, name -> call.http().queryParam(name));
        Sheet sheet = new Sheet(call, open, form);
        if (!(open.reading() instanceof Reading.Good good)) {
            sheet.troubles.add(press.words().say("door.plan-faulty"));
            sheet.print();
            return;
        }
        sheet.stale(Optional.ofNullable(call.http().queryParam("stale")).orElse(""));
        sheet.ask(good);
        sheet.print();
    }

    private DoorForm form(Call call, java.util.function.Function<String, String> from) {
        return new DoorForm(
                name -> Optional.ofNullable(from.apply(name)).orElse("").strip(),
                press.words(),
                call.figures());
    }

    /**
     * Puts the lot into a chamber of the plan.
     *
     * @param call the request
     */
    public void put(Call call) {
        OpenPlan open = AllChambersPage.opened(bench, call);
        DoorForm form = form(call, call::field);
        int version = call.version();
        String again = Room.DOOR.path(open.kept().id()) + "?" + query(form, "");
        if (version != open.kept().version()) {
            call.goTo(again + "&stale=" + version);
            return;
        }
        if (!(open.reading() instanceof Reading.Good good)) {
            throw new Refusal(409, "plan-faulty");
        }
        Commodity crop = book(open).named(form.typed("crop"));
        Receiving receiving =
                bench.door(open, good, call.preferences().units(), 60_000)
                        .orElseThrow(() -> new Refusal(503, "not-ready"));
        LotPlan lot = receiving.placed(form.lot(crop, now(good.plan())), call.field("chamber"));
        String text = LotIntoPlan.addedTo(open.text().text(), open.kept().name(), lot);
        String note =
                press.words()
                        .say(
                                "door.note",
                                lot.id(),
                                crop.names().get(0),
                                call.figures().mass(lot.massKg()),
                                lot.chamber().orElseThrow());
        Saved saved =
                bench.plans()
                        .save(
                                open.kept().id(),
                                version,
                                open.kept().name(),
                                new PlanText(text, open.text().files()),
                                note);
        if (saved instanceof Saved.Kept) {
            call.goTo(open.kept());
        } else {
            call.goTo(again + "&stale=" + version);
        }
    }

    private static ReferenceBook book(OpenPlan open) {
        return open.book();
    }

    /** The hour it is, where the plan covers it. */
    private Optional<LocalDateTime> now(StorePlan plan) {
        LocalDateTime now = LocalDateTime.ofInstant(bench.clock().instant(), plan.site().zone());
        LocalDateTime end = plan.from().plusSeconds(Math.round(plan.durationS() - 3600));
        return now.isBefore(plan.from()) || now.isAfter(end)
                ? Optional.empty()
                : Optional.of(now.withSecond(0).withNano(0));
    }

    private static String query(DoorForm form, String crop) {
        return form.all().stream()
                .map(
                        one ->
                                one.name()
                                        + "="
                                        + URLEncoder.encode(
                                                one.name().equals("crop") && !crop.isEmpty()
                                                        ? crop
                                                        : one.value(),
                                                StandardCharsets.UTF_8))
                .collect(Collectors.joining("&"));
    }

    /** One page on its way. */
    private final class Sheet {
        private final Call call;
        private final OpenPlan open;
        private final DoorForm form;
        private final List<String> troubles = new ArrayList<>();
        private final List<Fault> faults = new ArrayList<>();
        private final List<DoorView.CropLink> crops = new ArrayList<>();
        private Optional<Commodity> crop = Optional.empty();
        private Optional<DoorView.Answer> answer = Optional.empty();
        private boolean waits;
        private String currency = "";

        Sheet(Call call, OpenPlan open, DoorForm form) {
            this.call = call;
            this.open = open;
            this.form = form;
        }

        void stale(String version) {
            if (!version.isBlank() && !version.equals(String.valueOf(open.kept().version()))) {
                troubles.add(press.words().say("door.stale", open.kept().note()));
            }
        }

        void ask(Reading.Good good) {
            currency = good.plan().prices().currency();
            try {
                Optional<Receiving> ready = prepared(good);
                if (!form.asked()) {
                    return;
                }
                crop = meant();
                if (crop.isEmpty()) {
                    return;
                }
                NewLot lot = form.lot(crop.get(), now(good.plan()));
                waits = ready.isEmpty();
                ready.ifPresent(receiving -> answered(receiving.answer(lot)));
            } catch (BadInput e) {
                faults.addAll(e.faults());
                call.http().status(422);
            } catch (RunStopped e) {
                troubles.add(press.words().say("forecast.stopped", String.valueOf(e.getMessage())));
            }
        }

        /** The work begins when the page opens, and is waited for only where it is asked for. */
        private Optional<Receiving> prepared(Reading.Good good) {
            return bench.door(
                    open, good, call.preferences().units(), form.asked() ? PATIENCE_MS : 0);
        }

        private void answered(ReceiveAnswer given) {
            answer =
                    Optional.of(
                            new DoorViews(
                                            given,
                                            Words.english(call.preferences().units()),
                                            press.words(),
                                            call.figures())
                                    .view());
        }

        /** The crop that was typed, or the one it must be; several are offered to be picked. */
        private Optional<Commodity> meant() {
            String asked = form.typed("crop");
            try {
                return Optional.of(open.book().named(asked));
            } catch (BadInput unknown) {
                List<CropSearch.Hit> hits = asked.isBlank() ? List.of() : hits(open.book(), asked);
                if (hits.size() == 1) {
                    String name = hits.get(0).commodity().names().get(0);
                    troubles.add(press.words().say("door.read-as", asked, name));
                    return Optional.of(hits.get(0).commodity());
                }
                String key =
                        asked.isBlank()
                                ? "door.no-crop"
                                : hits.isEmpty() ? "door.crop-unknown" : "door.which-crop";
                faults.add(
                        new Fault(
                                "--commodity",
                                "",
                                press.words().say(key, asked),
                                press.words().say("door.crop-mend")));
                call.http().status(422);
                hits.stream().limit(2 * MOST_SUGGESTED).forEach(hit -> crops.add(link(hit)));
                return Optional.empty();
            }
        }

        private DoorView.CropLink link(CropSearch.Hit hit) {
            Suggested one = suggested(hit);
            return new DoorView.CropLink(
                    one.by().isBlank() ? one.name() : one.name() + " (" + one.by() + ")",
                    Room.DOOR.path(open.kept().id()) + "?" + query(form, one.id()));
        }

        void print() {
            Frame frame = press.frame(call, Room.DOOR, Optional.of(open.kept()));
            troubles.addAll(form.beside(faults));
            boolean stages = crop.map(Commodity::climacteric).orElse(false);
            press.print(
                    call,
                    "door",
                    waits ? frame.thatWaits() : frame,
                    new DoorView(
                            open.kept().id(),
                            open.kept().version(),
                            troubles,
                            form.asked(),
                            crops,
                            form.needed(faults),
                            form.more(faults, currency),
                            form.ripeness(stages),
                            form.packed(),
                            waits,
                            answer,
                            sent()));
        }

        /** A crop read from a slip is sent on by its own id. */
        private List<DoorView.Typed> sent() {
            return form.all().stream()
                    .map(
                            one ->
                                    one.name().equals("crop") && crop.isPresent()
                                            ? new DoorView.Typed("crop", crop.get().id())
                                            : one)
                    .toList();
        }
    }
}
