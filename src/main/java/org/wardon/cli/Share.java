package org.wardon.cli;

import java.io.PrintStream;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import org.wardon.advice.company.Borne;
import org.wardon.advice.company.GroupQuestion;
import org.wardon.advice.company.GroupSharing;
import org.wardon.advice.company.ShareReport;
import org.wardon.advice.company.SharingAdvice;
import org.wardon.advice.wording.Words;
import org.wardon.errors.BadInput;
import org.wardon.files.PlanReader;
import org.wardon.files.forecast.AnswerWriter;
import org.wardon.plan.ChamberPlan;
import org.wardon.plan.LotPlan;
import org.wardon.plan.StorePlan;
import org.wardon.produce.Conflict;
import org.wardon.reference.ReferenceBook;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** Says who may share a chamber. */
@Command(
        name = "share",
        mixinStandardHelpOptions = true,
        description = {
            "Says which crops may share a chamber for the days they are wanted, at what setting,"
                    + " and why not; with --plan, which lots of a plan, those that are there at"
                    + " one time."
        })
final class Share implements Callable<Integer> {
    @Mixin private Shared shared = new Shared();

    @Parameters(
            arity = "0..*",
            paramLabel = "COMMODITY[=DAYS]",
            description = {
                "Ids or common names; =DAYS for days of its own, such as mango=10. With --plan, ids"
                        + " of its lots, and crops beside them."
            })
    private List<String> crops = List.of();

    @Option(
            names = "--days",
            paramLabel = "N",
            description = "Days wanted of each (7); two market days follow.")
    private @Nullable Double days;

    @Option(
            names = "--accept",
            paramLabel = "CONFLICT",
            split = ",",
            description = {
                "Conflicts that are accepted, and what they cost told: ethylene, odour. With --plan"
                        + " beside those the plan accepts."
            })
    private List<String> accept = List.of();

    @Option(
            names = "--plan",
            paramLabel = "PLAN",
            description = "A store plan whose lots are asked about; they come and go as it says.")
    private @Nullable Path plan;

    @Option(
            names = "--chamber",
            paramLabel = "ID",
            description = "All lots of this chamber of the plan.")
    private @Nullable String chamber;

    @Option(names = "--json", description = "Answer in JSON.")
    private boolean json;

    @Override
    public Integer call() {
        PrintStream out = Terminal.ofProcess().out();
        Words words = shared.words();
        try (ReferenceBook book = shared.book()) {
            Set<Conflict> accepts = Borne.named("--accept", accept);
            ShareReport report =
                    plan == null
                            ? new SharingAdvice(book, words).ask(crops(), accepts)
                            : ofPlan(plan, accepts, book, words);
            out.print(json ? AnswerWriter.json(report.answer()) : new SharePage(words).of(report));
        }
        return Exit.OK;
    }

    private Map<String, Double> crops() {
        if (chamber != null) {
            throw new BadInput("--chamber", "", "names no plan", "accepted: beside --plan");
        }
        if (crops.isEmpty()) {
            throw new BadInput(
                    "share",
                    "",
                    "names nobody",
                    "name crops, or --plan with its lots or --chamber");
        }
        return wanted(crops);
    }

    private ShareReport ofPlan(Path file, Set<Conflict> accepts, ReferenceBook book, Words words) {
        StorePlan read = PlanReader.read(file, shared.lookups(book));
        List<String> ids = read.lots().stream().map(LotPlan::id).toList();
        Set<String> lots = new LinkedHashSet<>();
        if (chamber != null) {
            lots.addAll(lotsIn(chamber, read));
        }
        crops.stream().filter(ids::contains).forEach(lots::add);
        List<String> beside = crops.stream().filter(name -> !ids.contains(name)).toList();
        if (lots.isEmpty() && beside.isEmpty()) {
            throw new BadInput(
                    "share", "", "names nobody", "name lots of the plan, or give --chamber");
        }
        return GroupSharing.of(read, book)
                .tell(new GroupQuestion(List.copyOf(lots), wanted(beside), accepts), words);
    }

    private static List<String> lotsIn(String id, StorePlan plan) {
        List<String> there = plan.chambers().stream().map(ChamberPlan::id).toList();
        if (!there.contains(id)) {
            throw new BadInput(
                    "--chamber",
                    "",
                    "the plan has no chamber '" + id + "'",
                    "accepted: " + String.join(", ", there));
        }
        List<String> in =
                plan.lots().stream()
                        .filter(lot -> lot.chamber().filter(id::equals).isPresent())
                        .map(LotPlan::id)
                        .toList();
        if (in.isEmpty()) {
            throw new BadInput(
                    "--chamber", "", "no lot of the plan stands in " + id, "name another chamber");
        }
        return in;
    }

    private Map<String, Double> wanted(List<String> named) {
        double all = days == null ? SharingAdvice.USUAL_DAYS : days;
        Map<String, Double> wanted = new LinkedHashMap<>();
        for (String crop : named) {
            int equals = crop.indexOf('=');
            String name = equals < 0 ? crop : crop.substring(0, equals);
            double own = equals < 0 ? all : number(crop, crop.substring(equals + 1));
            if (wanted.put(name, own) != null) {
                throw new BadInput(crop, "", "it is named twice", "name each crop once");
            }
        }
        return wanted;
    }

    private static double number(String crop, String text) {
        try {
            return Double.parseDouble(text);
        } catch (NumberFormatException e) {
            throw new BadInput(
                    crop, "", "'" + text + "' is no number of days", "accepted: such as mango=10");
        }
    }
}
