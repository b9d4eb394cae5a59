package org.wardon.web.pages;

import org.wardon.web.work.OpenPlan;
import org.wardon.web.work.Stand;
import org.wardon.web.work.Workbench;

/** How far a forecast is, stopping it, beginning it again. */
public final class ForecastRoutes {
    private final Workbench bench;

    /**
     * Makes the routes.
     *
     * @param bench what they work with
     */
    public ForecastRoutes(Workbench bench) {
        this.bench = bench;
    }

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
                "/api/jobs/forecast-" + open.kept().id() + "-" + open.kept().version(),
                plan + "/forecast/cancel");
    }

    private static int percent(Stand.Running running) {
        return (int) Math.round(100 * running.fraction());
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
}
