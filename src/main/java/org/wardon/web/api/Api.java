package org.wardon.web.api;

import static io.javalin.http.HandlerType.DELETE;
import static io.javalin.http.HandlerType.GET;
import static io.javalin.http.HandlerType.POST;
import static io.javalin.http.HandlerType.PUT;

import io.javalin.config.RoutesConfig;
import io.javalin.http.Context;
import io.javalin.http.HandlerType;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Function;
import org.wardon.errors.BadInput;
import org.wardon.files.forecast.CompareAnswer;
import org.wardon.files.forecast.Forecast;
import org.wardon.files.forecast.KeepAnswer;
import org.wardon.files.forecast.LookAnswer;
import org.wardon.files.forecast.OwnLotsAnswer;
import org.wardon.files.forecast.PlaceAnswer;
import org.wardon.files.forecast.ReceiveAnswer;
import org.wardon.files.forecast.SectionAnswer;
import org.wardon.files.forecast.ShareAnswer;
import org.wardon.files.forecast.SizeAnswer;
import org.wardon.files.forecast.WhyAnswer;
import org.wardon.logbook.KeptPlan;
import org.wardon.produce.Source;
import org.wardon.web.api.document.OpenApi;
import org.wardon.web.api.route.Ask;
import org.wardon.web.api.route.Operation;
import org.wardon.web.api.route.Reply;
import org.wardon.web.api.route.Requests;
import org.wardon.web.api.told.Checked;
import org.wardon.web.api.told.Crops;
import org.wardon.web.api.told.DaysLeft;
import org.wardon.web.api.told.Entered;
import org.wardon.web.api.told.FaceTold;
import org.wardon.web.api.told.History;
import org.wardon.web.api.told.JobSheet;
import org.wardon.web.api.told.LotsSharing;
import org.wardon.web.api.told.OwnRanges;
import org.wardon.web.api.told.PlanSheet;
import org.wardon.web.api.told.Plans;
import org.wardon.web.chamber.ChamberAnswers;
import org.wardon.web.chamber.SeriesTold;
import org.wardon.web.chamber.WhatIfTold;
import org.wardon.web.guard.Guard;
import org.wardon.web.pages.Call;
import org.wardon.web.pages.ChartData;
import org.wardon.web.pages.PageWords;
import org.wardon.web.work.Workbench;

/**
 * The one table of all routes of the interface: the server and the document are both made of it.
 * Asking is GET and changes nothing anybody keeps; changing is POST, PUT or DELETE.
 */
public final class Api {
    private static final String PLANS = "/api/plans";
    private static final String PLAN = PLANS + "/{plan}";
    private static final String CHAMBER = PLAN + "/chambers/{chamber}";
    private static final String CROP = "/api/crops/{crop}";
    private static final String JOB = "/api/jobs/{job}";

    private final Workbench bench;
    private final Requests requests = new Requests();
    private final List<Operation> operations = new ArrayList<>();
    private final String document;

    /**
     * Makes the table.
     *
     * @param bench what it works with
     * @param words words of the pages, for notes of changes
     * @param guard lets programs in
     * @param chambers answers on chambers, remembered for pages too
     */
    public Api(Workbench bench, PageWords words, Guard guard, ChamberAnswers chambers) {
        this.bench = bench;
        JobsApi jobs = new JobsApi(bench, words);
        PlansApi plans = new PlansApi(bench, words);
        AnswersApi answers = new AnswersApi(bench, jobs);
        entry(new EntryApi(guard));
        plans(plans);
        answers(answers);
        door(new DoorApi(bench, jobs, plans, words));
        longWork(new LongApi(bench, jobs, plans, words), jobs);
        chambers(new ChamberApi(answers, chambers), answers);
        crops(new CropsApi(bench));
        own(new CropsApi(bench));
        document = OpenApi.of(operations);
    }

    /**
     * Returns the table.
     *
     * @return every operation
     */
    public List<Operation> operations() {
        return List.copyOf(operations);
    }

    /**
     * Returns the document.
     *
     * @return OpenAPI 3.1, as it is served
     */
    public String document() {
        return document;
    }

    /**
     * Adds every route to the server.
     *
     * @param routes the server's routes
     */
    public void addTo(RoutesConfig routes) {
        for (Operation operation : operations) {
            routes.addHttpHandler(
                    operation.method(), operation.path(), http -> answer(http, operation));
        }
    }

    private void answer(Context http, Operation operation) {
        try {
            Ask ask = Ask.of(new Call(http), operation, requests, bench);
            send(http, operation.work().apply(ask));
        } catch (BadInput bad) {
            throw new BadInput(
                    bad.faults().stream().map(one -> requests.named(operation, one)).toList());
        }
    }

    private static void send(Context http, Reply reply) {
        http.status(reply.status());
        reply.headers().forEach(http::header);
        if (!reply.mediaType().isEmpty()) {
            http.contentType(reply.mediaType()).result(reply.content());
        }
    }

    private void add(Operation operation) {
        operations.add(operation);
    }

    private static Operation get(String path, String id, String tag, Function<Ask, Reply> work) {
        return of(GET, path, id, tag, work);
    }

    private static Operation of(
            HandlerType method, String path, String id, String tag, Function<Ask, Reply> work) {
        Operation plain = Operation.of(method, path, id, tag, work);
        return path.contains("{") ? plain.refuses(404) : plain;
    }

    private void entry(EntryApi entry) {
        String tag = "entry";
        add(
                get(
                                "/api/openapi.json",
                                "readDocument",
                                tag,
                                ask -> Reply.text("application/json", document()))
                        .givesPlain(200, "application/json"));
        add(
                get("/api/schema", "readPlanSchema", tag, entry::schema)
                        .givesPlain(200, "application/schema+json"));
        add(
                of(POST, Guard.API_ENTRANCE, "enter", tag, entry::enter)
                        .takes("Passcode")
                        .gives(200, Entered.class)
                        .refuses(409, 429));
    }

    private void plans(PlansApi plans) {
        String tag = "plans";
        add(get(PLANS, "listPlans", tag, plans::list).gives(200, Plans.class));
        add(
                of(POST, PLANS, "keepPlan", tag, plans::keep)
                        .takes("KeepPlan")
                        .gives(201, KeptPlan.class));
        add(of(POST, PLANS + "/demo", "keepDemo", tag, plans::demo).gives(201, KeptPlan.class));
        add(
                of(POST, PLANS + "/check", "checkPlan", tag, plans::check)
                        .takes("CheckPlan")
                        .gives(200, Checked.class));
        add(get(PLAN, "readPlan", tag, plans::read).gives(200, PlanSheet.class));
        add(get(PLAN + "/text", "readPlanText", tag, plans::text).givesPlain(200, "text/plain"));
        add(
                get(PLAN + "/export", "exportPlan", tag, plans::export)
                        .givesPlain(200, "application/json")
                        .givesPlain(200, "application/zip"));
        add(
                of(PUT, PLAN, "replacePlan", tag, plans::replace)
                        .takes("ReplacePlan")
                        .changesVersion()
                        .gives(200, KeptPlan.class));
        add(
                of(DELETE, PLAN, "deletePlan", tag, plans::delete)
                        .asks("StartFrom")
                        .changesVersion()
                        .givesPlain(204, ""));
        versions(plans, tag);
    }

    private void versions(PlansApi plans, String tag) {
        add(get(PLAN + "/versions", "listVersions", tag, plans::history).gives(200, History.class));
        add(
                get(PLAN + "/versions/{version}", "readVersion", tag, plans::former)
                        .gives(200, PlanSheet.class));
        add(
                of(POST, PLAN + "/undo", "undo", tag, plans::undo)
                        .takes("StartFrom")
                        .changesVersion()
                        .gives(200, KeptPlan.class));
        add(
                of(POST, PLAN + "/redo", "redo", tag, plans::redo)
                        .takes("StartFrom")
                        .changesVersion()
                        .gives(200, KeptPlan.class));
    }

    private void answers(AnswersApi answers) {
        String tag = "answers";
        add(
                get(PLAN + "/forecast", "advise", tag, answers::forecast)
                        .asks("ForecastWait")
                        .gives(200, Forecast.class)
                        .gives(202, JobSheet.class));
        add(
                get(PLAN + "/days-left", "daysLeft", tag, answers::daysLeft)
                        .asks("ForecastWait")
                        .gives(200, DaysLeft.class)
                        .gives(202, JobSheet.class));
        add(
                get(PLAN + "/face", "tellFace", tag, answers::face)
                        .asks("FaceQuestion")
                        .gives(200, FaceTold.class));
        add(
                get(PLAN + "/share", "shareLots", tag, answers::shareLots)
                        .asks("ShareLotsQuestion")
                        .gives(200, LotsSharing.class));
        add(
                get("/api/share", "share", tag, answers::share)
                        .asks("ShareQuestion")
                        .gives(200, ShareAnswer.class));
    }

    private void door(DoorApi door) {
        String tag = "door";
        add(
                get(PLAN + "/door", "receive", tag, door::ask)
                        .asks("DoorQuestion")
                        .gives(200, ReceiveAnswer.class)
                        .gives(202, JobSheet.class));
        add(
                of(POST, PLAN + "/lots", "putLot", tag, door::put)
                        .takes("PutLot")
                        .changesVersion()
                        .gives(201, KeptPlan.class)
                        .refuses(503));
    }

    private void longWork(LongApi longWork, JobsApi jobs) {
        String tag = "long";
        add(
                of(POST, PLAN + "/place", "place", tag, longWork::place)
                        .takes("PlaceWish")
                        .gives(202, JobSheet.class)
                        .refuses(503));
        add(
                of(POST, PLAN + "/compare", "compare", tag, longWork::compare)
                        .takes("Variants")
                        .gives(202, JobSheet.class)
                        .refuses(503));
        add(
                of(POST, JOB + "/keep", "keepPlacing", tag, longWork::keepPlacing)
                        .gives(200, KeptPlan.class)
                        .refuses(409));
        add(get(JOB, "readJob", tag, jobs::read).gives(200, JobSheet.class));
        add(of(DELETE, JOB, "cancelJob", tag, jobs::cancel).gives(202, JobSheet.class));
        add(
                get(JOB + "/result", "readResult", tag, jobs::result)
                        .gives(200, PlaceAnswer.class)
                        .gives(200, CompareAnswer.class)
                        .givesPlain(303, "")
                        .refuses(409));
    }

    private void chambers(ChamberApi chambers, AnswersApi answers) {
        String tag = "chambers";
        add(
                get(CHAMBER + "/curves/{curve}", "readCurve", tag, chambers::curve)
                        .gives(200, ChartData.class)
                        .refuses(503));
        add(
                get(CHAMBER + "/lots/{lot}/curve", "readLotCurve", tag, chambers::lotCurve)
                        .gives(200, ChartData.class)
                        .refuses(503));
        add(
                get(CHAMBER + "/series", "readSeries", tag, chambers::series)
                        .gives(200, SeriesTold.class)
                        .refuses(503));
        add(
                get(CHAMBER + "/lots/{lot}/series", "readLotSeries", tag, chambers::lotSeries)
                        .gives(200, SeriesTold.class)
                        .refuses(503));
        add(
                get(CHAMBER + "/heat", "readHeat", tag, chambers::heat)
                        .gives(200, SeriesTold.class)
                        .refuses(503));
        add(
                get(CHAMBER + "/hours/{at}", "why", tag, answers::hour)
                        .asks("HourQuestion")
                        .gives(200, WhyAnswer.class)
                        .refuses(503));
        add(
                get(CHAMBER + "/what-if", "whatIf", tag, chambers::whatIf)
                        .asks("WhatIf")
                        .gives(200, WhatIfTold.class));
        add(
                get(CHAMBER + "/size", "size", tag, answers::size)
                        .asks("SizeQuestion")
                        .gives(200, SizeAnswer.class));
        add(
                get(CHAMBER + "/section", "section", tag, chambers::section)
                        .asks("SectionQuestion")
                        .gives(200, SectionAnswer.class));
    }

    private void crops(CropsApi crops) {
        String tag = "crops";
        add(
                get("/api/crops", "listCrops", tag, crops::list)
                        .asks("CropsQuestion")
                        .gives(200, Crops.class));
        add(get(CROP, "look", tag, crops::read).gives(200, LookAnswer.class));
        add(
                get(CROP + "/keep", "keep", tag, crops::keep)
                        .asks("KeepQuestion")
                        .gives(200, KeepAnswer.class));
        add(
                get("/api/sources/{source}", "readSource", tag, crops::source)
                        .gives(200, Source.class));
    }

    private void own(CropsApi crops) {
        String tag = "own";
        String value = CROP + "/own-values/{fact}";
        String lots = CROP + "/own-lots";
        add(
                get(CROP + "/own-values", "listOwnValues", tag, crops::ownValues)
                        .gives(200, OwnRanges.class));
        add(
                of(PUT, value, "setOwnValue", tag, crops::setOwn)
                        .takes("OwnRange")
                        .gives(200, OwnRanges.Own.class));
        add(of(DELETE, value, "forgetOwnValue", tag, crops::forgetOwn).givesPlain(204, ""));
        add(get(lots, "listOwnLots", tag, crops::lots).gives(200, OwnLotsAnswer.class));
        add(
                of(POST, lots, "rememberOwnLot", tag, crops::remember)
                        .takes("GoneLot")
                        .gives(201, OwnLotsAnswer.class));
        add(
                of(DELETE, lots + "/{number}", "forgetOwnLot", tag, crops::forgetLot)
                        .givesPlain(204, ""));
    }
}
