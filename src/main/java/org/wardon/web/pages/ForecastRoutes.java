package org.wardon.web.pages;

import org.wardon.web.guard.Refusal;
import org.wardon.web.work.OpenPlan;
import org.wardon.web.work.Stand;
import org.wardon.web.work.Workbench;

/** How far a forecast is, stopping it, beginning it again, and its air as data of a chart. */
public final class ForecastRoutes {
    private final Workbench bench;
    private final PageWords words;

    /**
     * Makes the routes.
     *
     * @param bench what they work with
     * @param words words of the pages
     */
    public ForecastRoutes(Workbench bench, PageWords words) {
        this.bench = bench;
        this.words = words;
    }

    /**
     * How far a forecast is, for a script.
     *
     * @param state {@code running} or {@code over}
     * @param stage what is being done, in words
     * @param percent done of all
     */
    public record Far(String state, String stage, int percent) {}

    /**
     * Returns how far a forecast is, for a page.
     *
     * @param open the plan
     * @param running how far it is
     * @param words words of the pages
     * @return the view
     */
    public static ProgressView progress(OpenPlan open, Stand.Running running, PageWords words) {
        String plan = "/plan/" + open.kept().id();
        return new ProgressView(
                words.say("stage." + running.stage()),
                percent(running),
                plan + "/progress",
                plan + "/forecast/cancel");
    }

    private static int percent(Stand.Running running) {
        return (int) Math.round(100 * running.fraction());
    }

    /**
     * Tells how far a forecast is.
     *
     * @param call the request
     */
    public void progress(Call call) {
        OpenPlan open = AllChambersPage.opened(bench, call);
        Stand stand = bench.stand(open).orElse(new Stand.Cancelled());
        call.http()
                .json(
                        stand instanceof Stand.Running running
                                ? new Far(
                                        "running",
                                        words.say("stage." + running.stage()),
                                        percent(running))
                                : new Far("over", "", 100));
    }

    /**
     * Stops a forecast.
     *
     * @param call the request
     */
    public void cancel(Call call) {
        OpenPlan open = AllChambersPage.opened(bench, call);
        bench.cancel(open);
        call.goTo(open.kept());
    }

    /**
     * Begins a stopped forecast again.
     *
     * @param call the request
     */
    public void again(Call call) {
        OpenPlan open = AllChambersPage.opened(bench, call);
        bench.again(open);
        call.goTo(open.kept());
    }

    /**
     * Tells the air of a chamber hour by hour.
     *
     * @param call the request
     */
    public void air(Call call) {
        OpenPlan open = AllChambersPage.opened(bench, call);
        String chamber = call.http().pathParam("chamber");
        Stand stand = bench.stand(open).orElse(new Stand.Cancelled());
        if (!(stand instanceof Stand.Ready ready)) {
            throw new Refusal(409, "no-forecast");
        }
        if (ready.advice().plan().chambers().stream().noneMatch(c -> c.id().equals(chamber))) {
            throw new Refusal(404, "nothing-here");
        }
        call.http().json(new AirTable(ready.advice().air(chamber), call.figures(), words).byHour());
    }
}
