package org.wardon.web;

import io.javalin.config.RoutesConfig;
import io.javalin.http.Handler;
import io.javalin.http.HttpResponseException;
import java.util.function.Consumer;
import org.wardon.errors.BadInput;
import org.wardon.errors.RunStopped;
import org.wardon.web.api.Api;
import org.wardon.web.api.page.ApiPage;
import org.wardon.web.api.route.Unreadable;
import org.wardon.web.chamber.ChamberAnswers;
import org.wardon.web.chamber.ChamberPage;
import org.wardon.web.crops.CropsPage;
import org.wardon.web.door.DoorPage;
import org.wardon.web.guard.Guard;
import org.wardon.web.guard.Refusal;
import org.wardon.web.lists.ListPage;
import org.wardon.web.lists.LotsPage;
import org.wardon.web.pages.AllChambersPage;
import org.wardon.web.pages.Call;
import org.wardon.web.pages.EntrancePage;
import org.wardon.web.pages.ForecastRoutes;
import org.wardon.web.pages.PlansPage;
import org.wardon.web.pages.PreferencesPage;
import org.wardon.web.pages.Press;
import org.wardon.web.pages.Room;
import org.wardon.web.pages.StaticFiles;
import org.wardon.web.pages.Troubles;
import org.wardon.web.placing.PlacingPage;
import org.wardon.web.placing.SharingPage;
import org.wardon.web.plan.PlanEditor;
import org.wardon.web.work.Workbench;

/** Every route there is. Reading is GET and changes nothing a person keeps; changing is POST. */
final class Routes {
    private final RoutesConfig routes;
    private final Workbench bench;
    private final Press press;
    private final Guard guard;
    private final ChamberAnswers answers;

    Routes(RoutesConfig routes, Workbench bench, Press press, Guard guard) {
        this.routes = routes;
        this.bench = bench;
        this.press = press;
        this.guard = guard;
        this.answers = new ChamberAnswers(press.words());
    }

    void add() {
        routes.before(guard::check);
        frame();
        plans();
        forecast();
        door();
        placing();
        chamber();
        crops();
        editor();
        api();
        troubles();
    }

    private void frame() {
        StaticFiles files = new StaticFiles(press.assets());
        EntrancePage entrance = new EntrancePage(guard, press);
        PreferencesPage preferences = new PreferencesPage(press);
        routes.get("/static/{digest}/{name}", call(files::give));
        routes.get(Guard.ENTRANCE, call(entrance::show));
        routes.post(Guard.ENTRANCE, call(entrance::enter));
        routes.post("/leave", call(entrance::leave));
        routes.get("/preferences", call(preferences::show));
        routes.post("/preferences", call(preferences::keep));
    }

    private void plans() {
        PlansPage plans = new PlansPage(bench, press);
        routes.get("/plans", call(plans::show));
        routes.post("/plans/demo", call(plans::demo));
        routes.post("/plans/bring", call(plans::bring));
        routes.get("/plan/{plan}/take", call(plans::take));
        routes.post("/plan/{plan}/undo", call(plans::undo));
        routes.post("/plan/{plan}/redo", call(plans::redo));
        routes.post("/plan/{plan}/delete", call(plans::delete));
    }

    private void forecast() {
        AllChambersPage chambers = new AllChambersPage(bench, press);
        ForecastRoutes forecast = new ForecastRoutes(bench);
        ListPage lists = new ListPage(bench, press);
        routes.get("/", call(chambers::home));
        routes.get("/plan/{plan}", call(chambers::show));
        routes.get("/plan/{plan}/lots", call(new LotsPage(bench, press)::show));
        routes.get("/plan/{plan}/cautions", call(lists::cautions));
        routes.get("/plan/{plan}/notes", call(lists::notes));
        routes.get("/plan/{plan}/actions", call(lists::actions));
        routes.get("/plan/{plan}/chamber/{chamber}/company", call(lists::company));
        routes.post("/plan/{plan}/forecast/cancel", call(forecast::cancel));
        routes.post("/plan/{plan}/forecast/again", call(forecast::again));
    }

    private void door() {
        DoorPage door = new DoorPage(bench, press);
        AllChambersPage chambers = new AllChambersPage(bench, press);
        routes.get("/door", call(http -> chambers.home(http, Room.DOOR)));
        routes.get("/plan/{plan}/door", call(door::show));
        routes.post("/plan/{plan}/door/put", call(door::put));
    }

    private void placing() {
        PlacingPage placing = new PlacingPage(bench, press);
        SharingPage sharing = new SharingPage(bench, press);
        AllChambersPage chambers = new AllChambersPage(bench, press);
        String path = "/plan/{plan}/placing";
        routes.get("/placing", call(http -> chambers.home(http, Room.PLACING)));
        routes.get(path, call(placing::show));
        routes.post(path + "/cancel", call(placing::cancel));
        routes.post(path + "/again", call(placing::again));
        routes.post(path + "/take-over", call(placing::takeOver));
        routes.get("/plan/{plan}/sharing", call(sharing::show));
    }

    private void chamber() {
        ChamberPage chamber = new ChamberPage(bench, press, answers);
        String path = "/plan/{plan}/chamber/{chamber}";
        routes.get("/chambers/{chamber}", call(chamber::ofLastPlan));
        routes.get(path, call(chamber::show));
        routes.get(path + "/what-if", call(chamber::whatIf));
        routes.get(path + "/section", call(chamber::section));
        routes.get(path + "/section.svg", call(chamber::sectionPicture));
    }

    private void crops() {
        CropsPage crops = new CropsPage(bench, press);
        routes.get("/crops", call(crops::list));
        routes.get("/crops/{crop}", call(crops::show));
        routes.post("/crops/{crop}/own", call(crops::own));
        routes.post("/crops/{crop}/forget", call(crops::forget));
        routes.post("/crops/{crop}/lot", call(crops::lot));
        routes.post("/crops/{crop}/forget-lot", call(crops::forgetLot));
    }

    private void editor() {
        PlanEditor editor = new PlanEditor(bench, press);
        routes.post("/plans/new", call(editor::begin));
        routes.get("/plan/{plan}/edit", call(editor::show));
        routes.post("/plan/{plan}/edit", call(editor::change));
        routes.post("/plan/{plan}/edit/face", call(editor::face));
        routes.post("/plan/{plan}/edit/weather", call(editor::weather));
    }

    private void api() {
        Api api = new Api(bench, press.words(), guard, answers);
        api.addTo(routes);
        routes.get("/api", call(new ApiPage(press, api.document())::show));
    }

    private void troubles() {
        Troubles troubles = new Troubles(press, System.err);
        routes.exception(Refusal.class, troubles::refused);
        routes.exception(BadInput.class, troubles::badInput);
        routes.exception(RunStopped.class, troubles::stopped);
        routes.exception(
                Unreadable.class, (body, http) -> troubles.faulty(http, 400, body.faults()));
        routes.exception(HttpResponseException.class, troubles::http);
        routes.exception(Exception.class, troubles::own);
    }

    private static Handler call(Consumer<Call> page) {
        return http -> page.accept(new Call(http));
    }
}
