package org.wardon.web.chamber;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.BiFunction;
import java.util.stream.Collectors;
import org.wardon.advice.forecast.StoreAdvice;
import org.wardon.advice.picture.SectionPicture;
import org.wardon.advice.whatif.Changes;
import org.wardon.advice.wording.Units;
import org.wardon.advice.wording.Words;
import org.wardon.errors.BadInput;
import org.wardon.errors.RunStopped;
import org.wardon.files.forecast.ChamberForecast;
import org.wardon.files.forecast.SectionAnswer;
import org.wardon.files.forecast.WhatIfAnswer;
import org.wardon.web.guard.Refusal;
import org.wardon.web.pages.AdviceViews;
import org.wardon.web.pages.AllChambersPage;
import org.wardon.web.pages.Call;
import org.wardon.web.pages.ForecastRoutes;
import org.wardon.web.pages.Frame;
import org.wardon.web.pages.Press;
import org.wardon.web.pages.Room;
import org.wardon.web.work.OpenPlan;
import org.wardon.web.work.Reading;
import org.wardon.web.work.Stand;
import org.wardon.web.work.Workbench;

/**
 * One chamber: hour by hour, what heats it, through a face, its lots, and with something changed.
 */
public final class ChamberPage {
    private static final long PATIENCE_MS = 250;

    private final Workbench bench;
    private final Press press;
    private final ChamberDesk desk;

    /**
     * Makes the page.
     *
     * @param bench what it works with
     * @param press what prints it
     * @param answers what remembers answers, for pages and programs alike
     */
    public ChamberPage(Workbench bench, Press press, ChamberAnswers answers) {
        this.bench = bench;
        this.press = press;
        this.desk = answers.desk();
    }

    /** A request about a chamber whose forecast is there. */
    private record Asked(Call call, OpenPlan open, StoreAdvice advice, String chamber) {
        Units units() {
            return call.preferences().units();
        }

        String path() {
            return ChamberPage.path(open, chamber);
        }

        /** Where scripts ask for the data of its charts. */
        String dataPath() {
            return "/api/plans/" + open.kept().id() + "/chambers/" + chamber;
        }

        /** The hour before or after by its button, else the hour typed. */
        String hour() {
            String next = query("hour");
            return next.isEmpty() ? query("at") : next;
        }

        String query(String name) {
            return Optional.ofNullable(call.http().queryParam(name)).orElse("").strip();
        }
    }

    private static String path(OpenPlan open, String chamber) {
        return Room.CHAMBERS.path(open.kept().id()) + "/chamber/" + chamber;
    }

    /**
     * Sends people on to a chamber of the plan they last looked at.
     *
     * @param call the request
     */
    public void ofLastPlan(Call call) {
        long plan =
                call.session()
                        .flatMap(session -> session.plan().stream().boxed().findFirst())
                        .orElseThrow(() -> new Refusal(404, "no-plan"));
        OpenPlan open = bench.open(plan).orElseThrow(() -> new Refusal(404, "no-plan"));
        call.goTo(path(open, call.http().pathParam("chamber")));
    }

    /**
     * Shows the page, or how far the forecast is.
     *
     * @param call the request
     */
    public void show(Call call) {
        whenReady(call, "chamber", this::sheet);
    }

    /** Where there will be no forecast, the page of all chambers says why. */
    private void whenReady(Call call, String template, BiFunction<Asked, Frame, ?> view) {
        OpenPlan open = AllChambersPage.opened(bench, call);
        String chamber = call.http().pathParam("chamber");
        if (!(open.reading() instanceof Reading.Good good)) {
            call.goTo(open.kept());
            return;
        }
        known(good, chamber);
        Frame frame = frame(call, open, chamber);
        Stand stand = bench.forecast(open, good, call.preferences().units(), PATIENCE_MS);
        if (stand instanceof Stand.Ready ready) {
            Asked asked = new Asked(call, open, ready.advice(), chamber);
            press.print(call, template, frame, view.apply(asked, frame));
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

    private static void known(Reading.Good good, String chamber) {
        if (good.plan().chambers().stream().noneMatch(one -> one.id().equals(chamber))) {
            throw new Refusal(404, "nothing-here");
        }
    }

    private Frame frame(Call call, OpenPlan open, String chamber) {
        return press.frame(call, Room.CHAMBERS, Optional.of(open.kept()))
                .titled(press.words().say("page.chamber", chamber));
    }

    private ChamberSheet sheet(Asked asked, Frame frame) {
        ChamberViews views = views(asked);
        WhatIfForm form = form(asked);
        Optional<Changes> changes = form.changes();
        Words words = Words.english(asked.units());
        ChamberForecast forecast =
                asked.advice().forecast().chambers().stream()
                        .filter(one -> one.id().equals(asked.chamber()))
                        .findFirst()
                        .orElseThrow();
        return new ChamberSheet(
                asked.path(),
                asked.chamber(),
                asked.open().kept().id(),
                new AdviceViews(asked.advice(), asked.open(), words, frame, bench.clock())
                        .chamber(forecast),
                form.slides(),
                form.asked() ? Optional.of(answer(asked, frame, changes)) : Optional.empty(),
                views.charts(asked.dataPath()),
                views.limits(),
                views.heat(desk.heat(asked.open(), asked.advice(), asked.chamber())),
                views.face(asked.query("face"), asked.hour()),
                views.lots(asked.dataPath(), asked.query("lot")),
                views.picks(asked.query("lot")),
                asked.advice().view(asked.chamber()).isStill()
                        ? Optional.of(asked.path() + "/section")
                        : Optional.empty(),
                !asked.advice().plan().getChamber(asked.chamber()).use().changes().isEmpty());
    }

    private ChamberViews views(Asked asked) {
        return new ChamberViews(
                asked.advice(), asked.chamber(), press.words(), asked.call().figures());
    }

    private WhatIfForm form(Asked asked) {
        return new WhatIfForm(
                asked.advice().settingC(asked.chamber()),
                asked.advice().view(asked.chamber()).openingsPerDay(),
                asked.call().figures(),
                press.words(),
                asked::query);
    }

    private WhatIfView answer(Asked asked, Frame frame, Optional<Changes> changes) {
        WhatIfViews views =
                new WhatIfViews(
                        frame, views(asked).curves(), asked.advice().plan().prices().currency());
        if (changes.isEmpty()) {
            return views.told(press.words().say("what.faulty"));
        }
        try {
            return views.view(
                    worked(asked, changes.get()),
                    asked.dataPath() + "/what-if" + again(changes.get()));
        } catch (BadInput bad) {
            return views.told(
                    bad.faults().stream().map(f -> f.sentence()).collect(Collectors.joining(" ")));
        } catch (RunStopped stopped) {
            return views.told(String.valueOf(stopped.getMessage()));
        }
    }

    private WhatIfAnswer worked(Asked asked, Changes changes) {
        return desk.answer(
                asked.open(), asked.advice().plan(), asked.chamber(), changes, asked.units());
    }

    /** The same question as programs ask it. */
    private static String again(Changes changes) {
        Map<String, OptionalDouble> given = new LinkedHashMap<>();
        given.put("settingC", changes.settingC());
        given.put("insulationFactor", thickness(changes));
        given.put("openingsPerDay", changes.door().openingsPerDay());
        given.put("coolingFactor", changes.coolingFactor());
        given.put("loadFactor", changes.loadFactor());
        return given.entrySet().stream()
                .filter(one -> one.getValue().isPresent())
                .map(one -> one.getKey() + "=" + one.getValue().getAsDouble())
                .collect(Collectors.joining("&", "?", ""));
    }

    private static OptionalDouble thickness(Changes changes) {
        return changes.insulation().stream()
                .mapToDouble(Changes.Insulation::thicknessFactor)
                .findFirst();
    }

    /**
     * Shows a chamber with something changed, as a part of the page, for a script.
     *
     * @param call the request
     */
    public void whatIf(Call call) {
        Asked asked = asked(call);
        Frame frame = frame(call, asked.open(), asked.chamber());
        press.print(call, "part/whatIf", frame, answer(asked, frame, form(asked).changes()));
    }

    /**
     * Shows where it is warm and where cold in a chamber no fan stirs, or how far the forecast is.
     *
     * @param call the request
     */
    public void section(Call call) {
        whenReady(call, "section", this::sectionSheet);
    }

    private SectionSheet sectionSheet(Asked asked, Frame frame) {
        return new SectionViews(press.words(), asked.call().figures())
                .sheet(sectionOf(asked), asked.path());
    }

    /**
     * Draws it.
     *
     * @param call the request
     */
    public void sectionPicture(Call call) {
        Asked asked = asked(call);
        String drawn = SectionPicture.of(sectionOf(asked), Words.english(asked.units()));
        call.http()
                .contentType("image/svg+xml; charset=utf-8")
                .result(SectionViews.written(drawn, call.figures()));
    }

    private SectionAnswer sectionOf(Asked asked) {
        return desk.section(asked.open(), asked.advice().plan(), asked.chamber(), asked.units())
                .orElseThrow(() -> new Refusal(404, "nothing-here"));
    }

    private Asked asked(Call call) {
        OpenPlan open = AllChambersPage.opened(bench, call);
        String chamber = call.http().pathParam("chamber");
        if (!(open.reading() instanceof Reading.Good good)) {
            throw new Refusal(409, "no-forecast");
        }
        known(good, chamber);
        Stand stand = bench.forecast(open, good, call.preferences().units(), PATIENCE_MS);
        if (!(stand instanceof Stand.Ready ready)) {
            throw new Refusal(409, "no-forecast");
        }
        return new Asked(call, open, ready.advice(), chamber);
    }
}
