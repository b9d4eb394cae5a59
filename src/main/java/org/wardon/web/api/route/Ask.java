package org.wardon.web.api.route;

import io.javalin.http.Context;
import java.io.IOException;
import java.io.InputStream;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.wardon.errors.BadInput;
import org.wardon.errors.Fault;
import org.wardon.files.TextFile;
import org.wardon.files.json.Faults;
import org.wardon.files.json.Json;
import org.wardon.files.json.JsonEdit;
import org.wardon.files.json.JsonPath;
import org.wardon.files.json.JsonText;
import org.wardon.files.json.Part;
import org.wardon.logbook.Saved;
import org.wardon.web.guard.Refusal;
import org.wardon.web.guard.Uploads;
import org.wardon.web.pages.Call;
import org.wardon.web.work.OpenPlan;
import org.wardon.web.work.Reading;
import org.wardon.web.work.Workbench;

/** One question as its handler sees it: everything in it has been held against its schema. */
public final class Ask {
    private static final Pattern ETAG = Pattern.compile("(?:W/)?\"([1-9][0-9]{0,8})\"");

    private final Call call;
    private final Workbench bench;
    private final Part query;
    private final Part body;
    private final String bodyText;

    private Ask(Call call, Workbench bench, Part query, Part body, String bodyText) {
        this.call = call;
        this.bench = bench;
        this.query = query;
        this.body = body;
        this.bodyText = bodyText;
    }

    /**
     * Reads a request.
     *
     * @param call the request
     * @param operation what it asks
     * @param requests the schemas
     * @param bench what is worked with
     * @return the question
     * @throws BadInput where something in it does not fit its schema
     * @throws Refusal where it cannot be read at all
     */
    public static Ask of(Call call, Operation operation, Requests requests, Workbench bench) {
        Context http = call.http();
        Part query = query(http, operation.takes(), requests);
        if (operation.takes().body().isEmpty()) {
            return new Ask(call, bench, query, Part.root(new Json.Obj(Map.of())), "");
        }
        String text = text(http);
        return new Ask(call, bench, query, body(text, operation.takes(), requests), text);
    }

    private static Part query(Context http, Takes takes, Requests requests) {
        Faults faults = new Faults(Requests.QUERY);
        Map<String, List<String>> given = http.queryParamMap();
        if (takes.query().isEmpty()) {
            given.keySet()
                    .forEach(
                            name ->
                                    faults.add(
                                            Json.member("$", name),
                                            "is not a name known here",
                                            "accepted: no names"));
            refuse(faults);
            return Part.root(new Json.Obj(Map.of()));
        }
        Json tree = requests.typed(takes.query().get(), given);
        requests.check(takes.query().get(), tree, faults);
        refuse(faults);
        return Part.root(tree);
    }

    /** What stands in an address is no tree, so its names go without the tree's root. */
    private static void refuse(Faults faults) {
        if (!faults.list().isEmpty()) {
            throw new BadInput(
                    faults.list().stream()
                            .map(
                                    fault ->
                                            new Fault(
                                                    fault.file(),
                                                    fault.path().replaceFirst("^\\$\\.?", ""),
                                                    fault.found(),
                                                    fault.accepted()))
                            .toList());
        }
    }

    private static String text(Context http) {
        if (http.contentLength() > Uploads.LARGEST_REQUEST) {
            throw new Refusal(413, "too-large");
        }
        byte[] bytes;
        try (InputStream in = http.bodyInputStream()) {
            bytes = in.readNBytes(Uploads.LARGEST_REQUEST + 1);
        } catch (IOException e) {
            throw new Refusal(400, "not-understood");
        }
        if (bytes.length > Uploads.LARGEST_REQUEST) {
            throw new Refusal(413, "too-large");
        }
        String type = Optional.ofNullable(http.contentType()).orElse("");
        boolean json = type.split(";", 2)[0].strip().equalsIgnoreCase(Gives.JSON);
        if (!json && (bytes.length > 0 || !type.isBlank())) {
            throw new Refusal(415, "json-only");
        }
        try {
            return TextFile.decoded(bytes, Requests.BODY);
        } catch (BadInput e) {
            throw new Unreadable(e.faults());
        }
    }

    private static Part body(String text, Takes takes, Requests requests) {
        String schema = takes.body().orElseThrow();
        boolean mayBeEmpty = !requests.schema(schema).has("required");
        Faults unread = new Faults(Requests.BODY);
        Optional<Json> tree =
                text.isBlank() && mayBeEmpty
                        ? Optional.of(new Json.Obj(Map.of()))
                        : JsonText.read(text, unread);
        if (tree.isEmpty() || !unread.list().isEmpty()) {
            throw new Unreadable(unread.list());
        }
        Faults faults = new Faults(Requests.BODY);
        requests.check(schema, tree.get(), faults);
        faults.refuseIfAny();
        return Part.root(tree.get());
    }

    /**
     * Returns the request.
     *
     * @return the request itself
     */
    public Call call() {
        return call;
    }

    /**
     * Returns what stood in the address behind the question mark.
     *
     * @return an object that fits its schema
     */
    public Part query() {
        return query;
    }

    /**
     * Returns what was sent.
     *
     * @return an object that fits its schema
     */
    public Part body() {
        return body;
    }

    /**
     * Returns what was sent, letter by letter.
     *
     * @return the text
     */
    public String bodyText() {
        return bodyText;
    }

    /**
     * Returns a name of the path.
     *
     * @param name which
     * @return what stands there
     */
    public String path(String name) {
        return call.http().pathParam(name);
    }

    /**
     * Returns a number given for seconds to wait.
     *
     * @param usual taken where none is given, s
     * @return the time, ms
     */
    public long waitMs(double usual) {
        OptionalDouble given = query.at("waitS").number();
        return Math.round(1_000 * given.orElse(usual));
    }

    /**
     * Opens the plan of the path.
     *
     * @return the plan
     * @throws Refusal where there is none
     */
    public OpenPlan plan() {
        return bench.open(call.number("plan")).orElseThrow(() -> new Refusal(404, "no-plan"));
    }

    /**
     * Returns the plan that can be run.
     *
     * @param open the plan as it is kept
     * @return what reading it gave
     * @throws BadInput with its faults
     */
    public static Reading.Good good(OpenPlan open) {
        if (open.reading() instanceof Reading.Faulty faulty) {
            throw new BadInput(faulty.faults());
        }
        return (Reading.Good) open.reading();
    }

    /**
     * Returns the version a change starts from, which counts still.
     *
     * @param open the plan as it stands
     * @return its version
     * @throws Refusal where none is given, or another counts by now
     */
    public int version(OpenPlan open) {
        String match = Optional.ofNullable(call.http().header("If-Match")).orElse("").strip();
        if (!match.isEmpty()) {
            return startedFrom(open, match.equals("*") ? open.kept().version() : tag(match), 412);
        }
        OptionalDouble given = body.at("version").number();
        OptionalDouble asked = given.isPresent() ? given : query.at("version").number();
        return startedFrom(
                open, (int) asked.orElseThrow(() -> new Refusal(428, "version-needed")), 409);
    }

    private static int tag(String match) {
        Matcher tag = ETAG.matcher(match);
        // A tag of another kind stands for no version of ours: version 0 never counts.
        return tag.matches() ? Integer.parseInt(tag.group(1)) : 0;
    }

    private static int startedFrom(OpenPlan open, int version, int status) {
        if (version != open.kept().version()) {
            throw outdated(
                    status, new Saved.Outdated(version, open.kept().version(), open.kept().note()));
        }
        return version;
    }

    /**
     * Returns a refusal that names both versions.
     *
     * @param status HTTP status
     * @param outdated both versions
     * @return the refusal
     */
    public static Refusal outdated(int status, Saved.Outdated outdated) {
        return new Refusal(
                status,
                "outdated",
                String.valueOf(outdated.startedFrom()),
                String.valueOf(outdated.version()),
                outdated.note());
    }

    /**
     * Returns the part of the body that stands under a name, letter by letter.
     *
     * @param name the name
     * @return its text
     */
    public String written(String name) {
        return JsonEdit.of(bodyText)
                .at(JsonPath.ROOT.then(new JsonPath.Member(name)))
                .orElseThrow();
    }
}
