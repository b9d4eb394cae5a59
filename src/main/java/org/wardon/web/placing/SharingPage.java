package org.wardon.web.placing;

import java.net.URLEncoder;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import org.wardon.advice.company.GroupReport;
import org.wardon.advice.company.GroupSharing;
import org.wardon.advice.company.SharingAdvice;
import org.wardon.advice.wording.Words;
import org.wardon.errors.BadInput;
import org.wardon.errors.Fault;
import org.wardon.plan.ChamberPlan;
import org.wardon.plan.Defaults;
import org.wardon.plan.LotPlan;
import org.wardon.plan.StorePlan;
import org.wardon.web.pages.AllChambersPage;
import org.wardon.web.pages.Call;
import org.wardon.web.pages.FieldView;
import org.wardon.web.pages.Frame;
import org.wardon.web.pages.Press;
import org.wardon.web.pages.Room;
import org.wardon.web.work.OpenPlan;
import org.wardon.web.work.Reading;
import org.wardon.web.work.Workbench;

/** Who may share: any lots of a plan, and crops beside them, on one ruler of temperatures. */
public final class SharingPage {
    /** What stands between crops; a comma between two digits belongs to a number. */
    private static final Pattern BETWEEN = Pattern.compile("[;\\n]|,(?!\\d)|(?<!\\d),");

    private static final double USUAL_DAYS = SharingAdvice.USUAL_DAYS;
    private static final int MOST_TYPED = 400;

    private final Workbench bench;
    private final Press press;

    /**
     * Makes the page.
     *
     * @param bench what it works with
     * @param press what prints it
     */
    public SharingPage(Workbench bench, Press press) {
        this.bench = bench;
        this.press = press;
    }

    static String path(long plan) {
        return "/plan/" + plan + "/sharing";
    }

    /**
     * Shows the page.
     *
     * @param call the request
     */
    public void show(Call call) {
        OpenPlan open = AllChambersPage.opened(bench, call);
        Frame frame =
                press.frame(call, Room.PLACING, Optional.of(open.kept()))
                        .titled(press.words().say("sharing.title"));
        if (!(open.reading() instanceof Reading.Good good)) {
            List<Fault> faults = ((Reading.Faulty) open.reading()).faults();
            press.print(
                    call,
                    "sharing",
                    frame,
                    new SharingView(
                            open.kept().id(),
                            faults,
                            List.of(),
                            List.of(),
                            List.of(),
                            Optional.empty()));
            return;
        }
        Asked asked = new Asked(call, good.plan(), frame);
        Optional<RulerView> ruler = asked.ruler(open);
        if (asked.isWrong()) {
            call.http().status(422);
        }
        press.print(
                call,
                "sharing",
                frame,
                new SharingView(
                        open.kept().id(),
                        List.of(),
                        asked.beside,
                        asked.groups(open.kept().id()),
                        asked.fields(),
                        ruler));
    }

    /** What was asked, and what is wrong with it. */
    private static final class Asked {
        private final Call call;
        private final StorePlan plan;
        private final Frame frame;
        private final List<String> lots;
        private final String crops;
        private final String days;

        /** What is wrong with the crops typed, a sentence a fault. */
        private final List<String> atCrops = new ArrayList<>();

        private String atDays = "";

        /** What is wrong beside the fields. */
        private final List<Fault> beside = new ArrayList<>();

        Asked(Call call, StorePlan plan, Frame frame) {
            this.call = call;
            this.plan = plan;
            this.frame = frame;
            lots = call.http().queryParams("lots").stream().distinct().toList();
            crops = typed("crops");
            days = typed("days");
        }

        private String typed(String name) {
            return Optional.ofNullable(call.http().queryParam(name)).orElse("").strip();
        }

        Optional<RulerView> ruler(OpenPlan open) {
            Map<String, Double> wanted = wanted();
            if (isWrong() || (lots.isEmpty() && wanted.isEmpty())) {
                return Optional.empty();
            }
            try {
                GroupReport group = GroupSharing.of(plan, open.book()).ask(lots, wanted);
                RulerViews views =
                        new RulerViews(
                                List.of(group),
                                Words.english(call.preferences().units()),
                                frame.words(),
                                frame.figures());
                return Optional.of(views.of(frame.say("sharing.ruler"), group, settingC()));
            } catch (BadInput e) {
                e.faults().forEach(fault -> tell(fault, wanted.keySet()));
                return Optional.empty();
            }
        }

        boolean isWrong() {
            return !atCrops.isEmpty() || !atDays.isEmpty() || !beside.isEmpty();
        }

        /** What is found of a crop belongs to its field, and nothing else does. */
        private void tell(Fault fault, Set<String> crops) {
            if (crops.contains(fault.file()) || lots.isEmpty()) {
                atCrops.add(fault.file() + ": " + fault.found() + "; " + fault.accepted() + ".");
            } else {
                beside.add(fault);
            }
        }

        /** The setting of the chamber where all that was ticked stands in one. */
        private OptionalDouble settingC() {
            List<Optional<String>> where =
                    plan.lots().stream()
                            .filter(lot -> lots.contains(lot.id()))
                            .map(LotPlan::chamber)
                            .distinct()
                            .toList();
            if (where.size() != 1 || where.get(0).isEmpty()) {
                return OptionalDouble.empty();
            }
            ChamberPlan chamber = plan.getChamber(where.get(0).get());
            return chamber.off() || chamber.coolers().isEmpty()
                    ? OptionalDouble.empty()
                    : OptionalDouble.of(chamber.settingC());
        }

        private Map<String, Double> wanted() {
            Map<String, Double> wanted = new LinkedHashMap<>();
            OptionalDouble all =
                    days.isEmpty() ? OptionalDouble.of(USUAL_DAYS) : call.figures().number(days);
            if (!inRange(all)) {
                atDays = frame.say("sharing.days-wrong", least(), most());
            }
            if (crops.length() > MOST_TYPED) {
                atCrops.add(frame.say("sharing.too-long", String.valueOf(MOST_TYPED)));
                return wanted;
            }
            for (String one : BETWEEN.split(crops, -1)) {
                String crop = one.strip();
                int equals = crop.indexOf('=');
                String name = equals < 0 ? crop : crop.substring(0, equals).strip();
                OptionalDouble own =
                        equals < 0 ? all : call.figures().number(crop.substring(equals + 1));
                if (equals >= 0 && !inRange(own)) {
                    String usual = call.figures().typed(USUAL_DAYS);
                    atCrops.add(frame.say("sharing.crop-days-wrong", name, least(), most(), usual));
                } else if (wanted.containsKey(name)) {
                    atCrops.add(frame.say("sharing.crop-twice", name));
                } else if (!name.isEmpty()) {
                    wanted.put(name, own.orElse(USUAL_DAYS));
                }
            }
            return wanted;
        }

        private static boolean inRange(OptionalDouble days) {
            return days.isPresent() && SharingAdvice.DAYS.hold(days.getAsDouble());
        }

        private String least() {
            return call.figures().typed(SharingAdvice.DAYS.low());
        }

        private String most() {
            return call.figures().typed(SharingAdvice.DAYS.high());
        }

        List<FieldView> fields() {
            return List.of(
                    FieldView.text("crops", frame.say("sharing.crops"), crops)
                            .withHint(frame.say("sharing.crops-hint"))
                            .withFault(String.join(" ", atCrops)),
                    FieldView.number(
                                    "days",
                                    frame.say("sharing.days"),
                                    days.isEmpty() ? call.figures().typed(USUAL_DAYS) : days,
                                    frame.say("sharing.days-unit"))
                            .withHint(frame.say("sharing.days-hint", least(), most(), market()))
                            .withFault(atDays));
        }

        private String market() {
            return frame.figures().figure(Defaults.MARKET_DAYS.value(), "day");
        }

        List<SharingView.Group> groups(long id) {
            Map<Optional<String>, List<LotPlan>> by =
                    plan.lots().stream()
                            .collect(
                                    Collectors.groupingBy(
                                            LotPlan::chamber,
                                            LinkedHashMap::new,
                                            Collectors.toList()));
            List<SharingView.Group> groups = new ArrayList<>();
            by.forEach((chamber, in) -> groups.add(group(id, chamber, in)));
            return groups;
        }

        private SharingView.Group group(long id, Optional<String> chamber, List<LotPlan> in) {
            String query =
                    in.stream()
                            .map(lot -> "lots=" + encoded(lot.id()))
                            .collect(Collectors.joining("&"));
            return new SharingView.Group(
                    chamber.map(one -> frame.say("sharing.in", one))
                            .orElse(frame.say("sharing.in-none")),
                    path(id) + "?" + query + "#ruler",
                    in.stream().map(this::pick).toList(),
                    in.stream().anyMatch(lot -> lots.contains(lot.id())));
        }

        private static String encoded(String text) {
            return URLEncoder.encode(text, StandardCharsets.UTF_8);
        }

        private PlacingView.Pick pick(LotPlan lot) {
            return new PlacingView.Pick(
                    lot.id(),
                    lot.id() + " " + lot.commodity().replace('-', ' '),
                    "",
                    lots.contains(lot.id()));
        }
    }
}
