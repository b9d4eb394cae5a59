package org.wardon.web.api;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import org.wardon.errors.BadInput;
import org.wardon.errors.Fault;
import org.wardon.files.FolderPlan;
import org.wardon.files.json.Faults;
import org.wardon.files.json.JsonText;
import org.wardon.files.json.Part;
import org.wardon.logbook.KeptPlan;
import org.wardon.logbook.PlanText;
import org.wardon.logbook.Saved;
import org.wardon.web.api.route.Ask;
import org.wardon.web.api.route.Reply;
import org.wardon.web.api.route.Requests;
import org.wardon.web.api.told.Checked;
import org.wardon.web.api.told.History;
import org.wardon.web.api.told.PlanSheet;
import org.wardon.web.api.told.Plans;
import org.wardon.web.guard.Refusal;
import org.wardon.web.pages.PageWords;
import org.wardon.web.pages.PlanBundle;
import org.wardon.web.pages.Problem;
import org.wardon.web.work.Imports;
import org.wardon.web.work.OpenPlan;
import org.wardon.web.work.Reading;
import org.wardon.web.work.Workbench;
import tools.jackson.databind.util.RawValue;

/** Kept plans: read, kept, replaced, undone, struck out. */
final class PlansApi {
    private static final String PLANS = "/api/plans/";
    private static final int LONGEST_FILE_NAME = 100;

    private final Workbench bench;
    private final PageWords words;

    PlansApi(Workbench bench, PageWords words) {
        this.bench = bench;
        this.words = words;
    }

    Reply list(Ask ask) {
        return Reply.of(new Plans(bench.plans().list()));
    }

    Reply demo(Ask ask) {
        return kept(201, new Imports(bench).demo(words.say("note.demo")));
    }

    Reply keep(Ask ask) {
        PlanText text = new PlanText(ask.written("plan"), files(ask.body(), Map.of()));
        String name = name(ask.body(), text, words.say("api.unnamed"));
        refuseFaulty(ask.body(), name, text);
        KeptPlan kept =
                bench.plans().add(name, "", text, note(ask.body(), words.say("api.note-kept")));
        return kept(201, kept);
    }

    private static Reply kept(int status, KeptPlan kept) {
        return Reply.of(kept)
                .with(status)
                .with("Location", PLANS + kept.id())
                .ofVersion(kept.version());
    }

    private static String note(Part body, String otherwise) {
        return body.at("note").text().orElse(otherwise);
    }

    private static String name(Part body, PlanText text, String otherwise) {
        return body.at("name").text().or(() -> FolderPlan.nameIn(text.text())).orElse(otherwise);
    }

    /** Names of files are compared with those a plan gives, and never looked for anywhere. */
    private static Map<String, String> files(Part body, Map<String, String> otherwise) {
        Part given = body.at("files");
        if (!given.given()) {
            return otherwise;
        }
        Map<String, String> files = new HashMap<>();
        for (String name : given.names()) {
            boolean plain =
                    name.length() <= LONGEST_FILE_NAME
                            && name.matches("[A-Za-z0-9_][A-Za-z0-9_. -]*");
            if (!plain) {
                throw new BadInput(
                        Requests.BODY,
                        given.at(name).path(),
                        "the name of a file has characters that are not accepted",
                        "accepted: up to "
                                + LONGEST_FILE_NAME
                                + " letters, digits, '.', '-', '_' or blanks, no folder");
            }
            files.put(name, given.at(name).text().orElse(""));
        }
        return files;
    }

    private void refuseFaulty(Part body, String name, PlanText text) {
        if (body.at("evenFaulty").flag().orElse(false)) {
            return;
        }
        if (bench.reading(name, text) instanceof Reading.Faulty faulty) {
            throw new BadInput(inBody(name, faulty.faults()));
        }
    }

    /** Faults of the plan have their place in the body. */
    private static List<Fault> inBody(String name, List<Fault> faults) {
        return faults.stream()
                .map(
                        fault ->
                                fault.file().equals(name) && fault.path().startsWith("$")
                                        ? new Fault(
                                                Requests.BODY,
                                                "$.plan" + fault.path().substring(1),
                                                fault.found(),
                                                fault.accepted())
                                        : fault)
                .toList();
    }

    Reply check(Ask ask) {
        PlanText text = new PlanText(ask.written("plan"), files(ask.body(), Map.of()));
        String name = name(ask.body(), text, words.say("api.unnamed"));
        Reading reading = bench.reading(name, text);
        List<Fault> faults =
                reading instanceof Reading.Faulty faulty
                        ? inBody(name, faulty.faults())
                        : List.of();
        return Reply.of(
                new Checked(faults.isEmpty(), faults.stream().map(Problem.OneFault::of).toList()));
    }

    Reply read(Ask ask) {
        OpenPlan open = ask.plan();
        return Reply.of(sheet(open.kept(), open.text(), open.reading()))
                .ofVersion(open.kept().version());
    }

    private static PlanSheet sheet(KeptPlan kept, PlanText text, Reading reading) {
        List<Fault> faults = reading instanceof Reading.Faulty faulty ? faulty.faults() : List.of();
        return new PlanSheet(
                kept,
                faults.isEmpty(),
                faults.stream().map(Problem.OneFault::of).toList(),
                raw(text.text()),
                text.files());
    }

    private static @Nullable RawValue raw(String text) {
        Faults faults = new Faults("");
        boolean json = JsonText.read(text, faults).isPresent();
        return json ? new RawValue(text.strip()) : null;
    }

    Reply text(Ask ask) {
        OpenPlan open = ask.plan();
        return Reply.text("text/plain; charset=utf-8", open.text().text())
                .ofVersion(open.kept().version());
    }

    Reply export(Ask ask) {
        OpenPlan open = ask.plan();
        PlanBundle bundle = PlanBundle.of(open);
        return Reply.bytes(bundle.mediaType(), bundle.content())
                .with("Content-Disposition", bundle.disposition())
                .ofVersion(open.kept().version());
    }

    Reply replace(Ask ask) {
        OpenPlan open = ask.plan();
        int version = ask.version(open);
        PlanText text = new PlanText(ask.written("plan"), files(ask.body(), open.text().files()));
        String name = name(ask.body(), text, open.kept().name());
        refuseFaulty(ask.body(), name, text);
        return moved(
                open,
                bench.plans()
                        .save(
                                open.kept().id(),
                                version,
                                name,
                                text,
                                note(ask.body(), words.say("api.note-replaced"))));
    }

    /** What a change of a plan came to. */
    Reply moved(OpenPlan open, Saved saved) {
        if (saved instanceof Saved.Outdated outdated) {
            throw Ask.outdated(409, outdated);
        }
        if (saved instanceof Saved.Nothing) {
            throw new Refusal(409, "nothing-to-do");
        }
        return kept(200, bench.plans().find(open.kept().id()).orElseThrow());
    }

    Reply undo(Ask ask) {
        OpenPlan open = ask.plan();
        return moved(open, bench.plans().undo(open.kept().id(), ask.version(open)));
    }

    Reply redo(Ask ask) {
        OpenPlan open = ask.plan();
        return moved(open, bench.plans().redo(open.kept().id(), ask.version(open)));
    }

    Reply delete(Ask ask) {
        OpenPlan open = ask.plan();
        Saved saved = bench.plans().delete(open.kept().id(), ask.version(open));
        if (saved instanceof Saved.Outdated outdated) {
            throw Ask.outdated(409, outdated);
        }
        return Reply.done();
    }

    Reply history(Ask ask) {
        return Reply.of(new History(bench.plans().history(ask.plan().kept().id())));
    }

    Reply former(Ask ask) {
        KeptPlan kept = ask.plan().kept();
        int version = (int) ask.call().number("version");
        PlanText text =
                bench.plans()
                        .text(kept.id(), version)
                        .orElseThrow(() -> new Refusal(404, "no-former"));
        String note =
                bench.plans().history(kept.id()).stream()
                        .filter(one -> one.number() == version)
                        .map(one -> one.note())
                        .findFirst()
                        .orElse("");
        KeptPlan then =
                new KeptPlan(kept.id(), kept.name(), version, kept.changedAt(), note, false, false);
        return Reply.of(sheet(then, text, bench.reading(kept.name(), text))).ofVersion(version);
    }
}
