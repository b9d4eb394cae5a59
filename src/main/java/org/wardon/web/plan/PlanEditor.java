package org.wardon.web.plan;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.wardon.advice.faces.FaceAdvice;
import org.wardon.advice.wording.Words;
import org.wardon.errors.Fault;
import org.wardon.files.FolderPlan;
import org.wardon.files.TextFile;
import org.wardon.files.form.FormPlace;
import org.wardon.files.form.PlanChange;
import org.wardon.files.form.PlanForm;
import org.wardon.files.form.PlanStep;
import org.wardon.files.json.JsonEdit;
import org.wardon.files.json.JsonPath;
import org.wardon.logbook.PlanText;
import org.wardon.logbook.Saved;
import org.wardon.web.guard.Refusal;
import org.wardon.web.guard.Uploads;
import org.wardon.web.pages.AllChambersPage;
import org.wardon.web.pages.Call;
import org.wardon.web.pages.Press;
import org.wardon.web.pages.Room;
import org.wardon.web.pages.TableView;
import org.wardon.web.work.OpenPlan;
import org.wardon.web.work.Reading;
import org.wardon.web.work.Workbench;

/** Changes a plan: forms made of its schema, one page a part of it. */
public final class PlanEditor {
    private static final String LOOK = "LOOK";

    private final Workbench bench;
    private final Press press;
    private final FieldWords words = new FieldWords();

    /**
     * Makes the pages.
     *
     * @param bench what they work with
     * @param press what prints them
     */
    public PlanEditor(Workbench bench, Press press) {
        this.bench = bench;
        this.press = press;
    }

    /** What a page is to show: a text that need not be kept yet. */
    private record Sheet(
            OpenPlan open, PlanText text, JsonPath page, Optional<PlanPartView.Clash> clash) {}

    /**
     * Shows a part of a plan.
     *
     * @param call the request
     */
    public void show(Call call) {
        OpenPlan open = AllChambersPage.opened(bench, call);
        JsonPath page =
                PlanPlaces.page(
                        PlanForm.of(open.text().text()),
                        Optional.ofNullable(call.http().queryParam("at")).orElse("$"));
        print(call, new Sheet(open, open.text(), page, Optional.empty()));
    }

    /**
     * Keeps what was typed, or takes a step.
     *
     * @param call the request
     */
    public void change(Call call) {
        OpenPlan open = AllChambersPage.opened(bench, call);
        int version = call.version();
        PlanText base =
                bench.plans()
                        .text(open.kept().id(), version)
                        .orElseThrow(() -> new Refusal(400, "no-version"));
        PlanChange change = new PlanChange(new TypedNumbers(call.preferences()));
        PlanChange.Typed typed = change.changed(base.text(), TypedForm.of(call.http()));
        JsonPath page = PlanPlaces.page(PlanForm.of(base.text()), call.field("at"));
        if (version != open.kept().version()) {
            clash(call, open, change, typed, page);
            return;
        }
        String text = change.apply(base.text(), typed);
        if (call.field("do").equals(LOOK)) {
            print(call, new Sheet(open, with(base, text), page, Optional.empty()));
            return;
        }
        Optional<PlanStep.Done> step = step(call, text);
        String done = step.map(PlanStep.Done::text).orElse(text);
        JsonPath next = step.map(PlanStep.Done::path).orElse(page);
        if (!done.equals(base.text())) {
            Saved saved = save(open, version, with(base, done), note(call, done, page));
            if (!(saved instanceof Saved.Kept)) {
                clash(call, AllChambersPage.opened(bench, call), change, typed, page);
                return;
            }
        }
        call.goTo(after(call, open.kept().id(), PlanForm.of(done), next));
    }

    /** Where a step leads: of a long list to the part in which it was taken. */
    private static String after(Call call, long plan, PlanForm form, JsonPath next) {
        JsonPath page = PlanPlaces.page(form, next);
        String anchor = "#" + EntryView.anchor(next.toString());
        int item =
                JsonPath.parse((call.field("do") + " ").split(" ", -1)[1])
                                        .flatMap(JsonPath::last)
                                        .orElse(null)
                                instanceof JsonPath.Item one
                        ? one.index()
                        : 0;
        return PlanPlaces.isLong(form, page)
                ? PlanPlaces.href(plan, page, item) + anchor
                : PlanPlaces.href(plan, page) + anchor;
    }

    private static PlanText with(PlanText base, String text) {
        return new PlanText(text, base.files());
    }

    private Saved save(OpenPlan open, int version, PlanText text, String note) {
        String name = FolderPlan.nameIn(text.text()).orElse(open.kept().name());
        return bench.plans().save(open.kept().id(), version, name, text, note);
    }

    private String note(Call call, String text, JsonPath page) {
        String part = title(PlanForm.of(text), page);
        return press.words().say(call.field("do").isBlank() ? "edit.note" : "edit.note-step", part);
    }

    private static Optional<PlanStep.Done> step(Call call, String text) {
        String[] words = call.field("do").split(" ", 3);
        Optional<JsonPath> path = JsonPath.parse(words.length > 1 ? words[1] : "");
        if (path.isEmpty()) {
            return Optional.empty();
        }
        for (PlanStep.Kind kind : PlanStep.Kind.values()) {
            if (kind.name().equals(words[0])) {
                String word = words.length > 2 ? words[2] : "";
                String id = call.field("id:" + path.get());
                return Optional.of(
                        PlanStep.take(text, kind, path.get(), word.isBlank() ? id : word));
            }
        }
        return Optional.empty();
    }

    /** Shows what was typed over what stands by now, and both where they differ. */
    private void clash(
            Call call, OpenPlan now, PlanChange change, PlanChange.Typed typed, JsonPath page) {
        String mine = change.apply(now.text().text(), typed);
        PlanForm theirs = PlanForm.of(now.text().text());
        PlanForm both = PlanForm.of(mine);
        Set<String> paths = new LinkedHashSet<>(typed.values().keySet());
        paths.addAll(typed.options().keySet());
        List<List<String>> rows = new ArrayList<>();
        for (String path : paths.stream().sorted().toList()) {
            JsonPath.parse(path)
                    .ifPresent(
                            at ->
                                    rows.add(
                                            List.of(
                                                    name(both, at),
                                                    shown(both, change, at),
                                                    shown(theirs, change, at))));
        }
        TableView table =
                new TableView(
                        press.words().say("edit.both"),
                        List.of(
                                press.words().say("edit.field"),
                                press.words().say("edit.yours"),
                                press.words().say("edit.now")),
                        rows);
        call.http().status(409);
        print(
                call,
                new Sheet(
                        now,
                        with(now.text(), mine),
                        page,
                        Optional.of(new PlanPartView.Clash(now.kept().note(), table))));
    }

    private String name(PlanForm form, JsonPath path) {
        return title(form, PlanPlaces.page(form, path))
                + ": "
                + words.label(PlanPlaces.key(form, path));
    }

    private String shown(PlanForm form, PlanChange change, JsonPath path) {
        String value = form.at(path).map(change::shown).orElse("");
        String option =
                form.at(path)
                        .flatMap(FormPlace::taken)
                        .map(one -> words.word(one.word()))
                        .orElse("");
        String told = value.isEmpty() ? option : value;
        return told.isEmpty() ? press.words().say("edit.as-usual") : told;
    }

    /**
     * Keeps a weather file with the plan and lets the plan name it.
     *
     * @param call the request
     */
    public void weather(Call call) {
        OpenPlan open = AllChambersPage.opened(bench, call);
        int version = call.version();
        Map<String, Uploads.Brought> files = Uploads.of(call.http(), "weather", List.of(".csv"));
        PlanText base =
                bench.plans()
                        .text(open.kept().id(), version)
                        .orElseThrow(() -> new Refusal(400, "no-version"));
        Map<String, String> kept = new HashMap<>(base.files());
        String text = base.text();
        for (Uploads.Brought file : files.values()) {
            kept.put(file.name(), TextFile.decoded(file.bytes(), file.name()));
            JsonPath weather = JsonPath.ROOT.then(new JsonPath.Member("weather"));
            String named = "{\"csv\": " + JsonEdit.quoted(file.name()) + "}";
            text = JsonEdit.of(text).set(weather, named).text();
        }
        Saved saved =
                save(
                        open,
                        version,
                        new PlanText(text, kept),
                        press.words().say("edit.note-weather"));
        if (saved instanceof Saved.Outdated outdated) {
            throw new Refusal(
                    409,
                    "outdated",
                    String.valueOf(outdated.startedFrom()),
                    String.valueOf(outdated.version()),
                    outdated.note());
        }
        call.goTo(
                PlanPlaces.href(
                        open.kept().id(), JsonPath.ROOT.then(new JsonPath.Member("weather"))));
    }

    /**
     * Begins a new plan.
     *
     * @param call the request
     */
    public void begin(Call call) {
        String today = java.time.LocalDate.now(bench.clock()).toString();
        String text =
                "{\n  \"storePlan\": 1,\n  \"site\": {},\n  \"weather\": {\"steady\": {}},\n"
                        + "  \"from\": \""
                        + today
                        + "T00:00\",\n  \"days\": 10,\n  \"chambers\": [],\n  \"lots\": []\n}\n";
        String name = press.words().say("edit.new-name");
        var kept =
                bench.plans()
                        .add(
                                name,
                                "",
                                new PlanText(text, Map.of()),
                                press.words().say("edit.note-new"));
        call.goTo(PlanPlaces.href(kept.id(), JsonPath.ROOT));
    }

    /**
     * Tells how the face of a form conducts as it is typed, as a piece of the page.
     *
     * @param call the request
     */
    public void face(Call call) {
        OpenPlan open = AllChambersPage.opened(bench, call);
        PlanText base =
                bench.plans()
                        .text(open.kept().id(), call.version())
                        .orElseThrow(() -> new Refusal(400, "no-version"));
        PlanChange change = new PlanChange(new TypedNumbers(call.preferences()));
        String text =
                change.apply(base.text(), change.changed(base.text(), TypedForm.of(call.http())));
        JsonPath page = PlanPlaces.page(PlanForm.of(base.text()), call.field("at"));
        press.print(
                call,
                "part/face",
                press.frame(call, Room.PLAN, Optional.of(open.kept())),
                faceView(call, text, page));
    }

    private PlanPartView.FaceView faceView(Call call, String text, JsonPath page) {
        Words sentences = Words.english(call.preferences().units());
        return new FaceViews(press.words(), call.figures(), sentences)
                .of(FaceAdvice.of(text, bench.book()).of(page));
    }

    private void print(Call call, Sheet sheet) {
        String text = sheet.text().text();
        PlanForm form = PlanForm.of(text);
        long plan = sheet.open().kept().id();
        FormPlace place = form.at(sheet.page()).orElseThrow(() -> new Refusal(404, "nothing-here"));
        List<Fault> faults = faults(sheet);
        TypedNumbers numbers = new TypedNumbers(call.preferences());
        boolean chamber = sheet.page().toString().startsWith("$.chambers");
        Optional<FaceAdvice> faces =
                chamber ? Optional.of(FaceAdvice.of(text, bench.book())) : Optional.empty();
        FieldWords shown = words.in(call.figures());
        RowMaker rows =
                new RowMaker(
                        new RowMaker.Made(plan, form, faults, faces),
                        shown,
                        press.words(),
                        call.figures(),
                        numbers);
        EntryMaker maker = new EntryMaker(form, faults, shown, press.words(), numbers, rows);
        Optional<LongList> list =
                PlanPlaces.isLong(form, sheet.page())
                        ? Optional.of(LongList.of(place, call, plan, rows, press.words()))
                        : Optional.empty();
        List<EntryView> entries =
                list.isPresent()
                        ? List.of(maker.ofList(place, list.get().items()))
                        : maker.of(place);
        FaultLinks told = new FaultLinks(form, plan, sheet.page(), faults, press.words());
        boolean face = isFace(sheet.page());
        press.print(
                call,
                "plan",
                press.frame(call, Room.PLAN, Optional.of(sheet.open().kept())),
                new PlanPartView(
                        plan,
                        sheet.open().kept().version(),
                        sheet.page().toString(),
                        title(form, sheet.page()),
                        hint(form, sheet.page()),
                        crumbs(form, plan, sheet.page()),
                        sheet.clash(),
                        told.listed().stream().map(fault -> link(form, plan, fault)).toList(),
                        faults.size(),
                        told.more(),
                        list.map(LongList::part),
                        entries,
                        suggestions(entries, form),
                        face ? Optional.of(faceView(call, text, sheet.page())) : Optional.empty(),
                        sheet.page().toString().equals("$.weather"),
                        List.copyOf(sheet.text().files().keySet())));
    }

    /** What is said of a list is not said of each of its items; what is said of a kind is. */
    private String hint(PlanForm form, JsonPath page) {
        boolean item = page.last().orElse(null) instanceof JsonPath.Item;
        boolean kind = form.at(page).flatMap(FormPlace::taken).isPresent();
        return item && !kind ? "" : words.hint(PlanPlaces.key(form, page), "");
    }

    private static boolean isFace(JsonPath page) {
        return page.toString().contains(".faces[") || page.toString().startsWith("$.buildUps");
    }

    private List<Fault> faults(Sheet sheet) {
        boolean kept = sheet.text().equals(sheet.open().text());
        Reading reading =
                kept
                        ? sheet.open().reading()
                        : bench.reading(sheet.open().kept().name(), sheet.text());
        return reading instanceof Reading.Faulty faulty ? faulty.faults() : List.of();
    }

    private PlanPartView.Link link(PlanForm form, long plan, Fault fault) {
        JsonPath page = PlanPlaces.page(form, fault.path());
        String field =
                JsonPath.parse(fault.path())
                        .map(path -> words.label(PlanPlaces.key(form, path)))
                        .orElse(fault.path());
        return new PlanPartView.Link(
                PlanPlaces.href(plan, page) + "#" + EntryView.anchor(fault.path()),
                title(form, page) + ", " + field + ": " + fault.found() + "; " + fault.accepted());
    }

    private String title(PlanForm form, JsonPath page) {
        if (page.steps().isEmpty()) {
            return press.words().say("edit.title");
        }
        Optional<FormPlace> place = form.at(page);
        String id =
                place.flatMap(one -> one.place("id"))
                        .map(FormPlace::written)
                        .or(
                                () ->
                                        place.flatMap(one -> one.place("face"))
                                                .map(one -> words.word(one.written())))
                        .orElse("");
        String key = PlanPlaces.key(form, page);
        boolean named =
                page.last().orElse(null) instanceof JsonPath.Member && key.equals("buildUps");
        if (PlanPlaces.isLong(form, page)) {
            return words.label(key);
        }
        String last = named ? ((JsonPath.Member) page.last().orElseThrow()).name() : id;
        String label =
                press.words().has("edit.one-" + key)
                        ? press.words().say("edit.one-" + key)
                        : words.label(key);
        return last.isEmpty() ? label : label + " " + last;
    }

    private List<PlanPartView.Link> crumbs(PlanForm form, long plan, JsonPath page) {
        List<PlanPartView.Link> crumbs = new ArrayList<>();
        JsonPath up = page;
        while (!up.steps().isEmpty()) {
            up = PlanPlaces.page(form, up.up());
            crumbs.add(0, new PlanPartView.Link(PlanPlaces.href(plan, up), title(form, up)));
        }
        return crumbs;
    }

    private List<Suggestions.Named> suggestions(List<EntryView> entries, PlanForm form) {
        Set<String> used = new LinkedHashSet<>();
        collect(entries, used);
        return used.stream().map(id -> Suggestions.of(id, bench.book(), form)).toList();
    }

    private static void collect(List<EntryView> entries, Set<String> used) {
        for (EntryView entry : entries) {
            if (!entry.list().isEmpty()) {
                used.add(entry.list());
            }
            collect(entry.entries(), used);
        }
    }
}
