package org.wardon.web.lists;

import java.util.Optional;
import java.util.function.Function;
import org.wardon.advice.wording.Words;
import org.wardon.web.pages.AdviceViews;
import org.wardon.web.pages.AllChambersPage;
import org.wardon.web.pages.Call;
import org.wardon.web.pages.ForecastRoutes;
import org.wardon.web.pages.Frame;
import org.wardon.web.pages.LinkView;
import org.wardon.web.pages.Paging;
import org.wardon.web.pages.Press;
import org.wardon.web.pages.Room;
import org.wardon.web.work.OpenPlan;
import org.wardon.web.work.Reading;
import org.wardon.web.work.Stand;
import org.wardon.web.work.Workbench;

/** What pages of long lists have in common: a forecast, or how far it is, and parts. */
final class ListDesk {
    private static final long PATIENCE_MS = 250;

    private final Workbench bench;
    private final Press press;

    ListDesk(Workbench bench, Press press) {
        this.bench = bench;
        this.press = press;
    }

    /** A request about a plan whose forecast is there. */
    record Asked(Call call, OpenPlan open, Reading.Good good, AdviceViews views, Frame frame) {
        String say(String key, String... with) {
            return frame.say(key, with);
        }

        String path() {
            return Room.CHAMBERS.path(open.kept().id());
        }

        Paging paging(int all, int most, String href) {
            return Paging.of(query(call, "from"), all, most, frame.words(), href);
        }

        LinkView back() {
            return new LinkView(path(), say("page.chamber-back"));
        }
    }

    String say(String key, String... with) {
        return press.words().say(key, with);
    }

    static String query(Call call, String name) {
        return Optional.ofNullable(call.http().queryParam(name)).orElse("").strip();
    }

    /**
     * Prints a list, or how far the forecast is; where there will be none, the page of all chambers
     * says why.
     */
    void show(Call call, String template, String title, Function<Asked, ?> view) {
        OpenPlan open = AllChambersPage.opened(bench, call);
        Frame frame = press.frame(call, Room.CHAMBERS, Optional.of(open.kept())).titled(title);
        if (!(open.reading() instanceof Reading.Good good)) {
            call.goTo(open.kept());
            return;
        }
        Stand stand = bench.forecast(open, good, call.preferences().units(), PATIENCE_MS);
        if (stand instanceof Stand.Ready ready) {
            AdviceViews views =
                    new AdviceViews(
                            ready.advice(),
                            open,
                            Words.english(call.preferences().units()),
                            frame,
                            bench.clock());
            Asked asked = new Asked(call, open, good, views, frame);
            press.print(call, template, frame, view.apply(asked));
        } else if (stand instanceof Stand.Running running) {
            press.print(
                    call,
                    "waiting",
                    frame.thatWaits(),
                    ForecastRoutes.progress(open, running, press.words()));
        } else {
            call.goTo(open.kept());
        }
    }
}
