package org.wardon.cli;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.concurrent.Callable;
import org.wardon.advice.placing.OpenLots;
import org.wardon.advice.whatif.Comparison;
import org.wardon.errors.BadInput;
import org.wardon.errors.Fault;
import org.wardon.errors.Progress;
import org.wardon.files.Lookups;
import org.wardon.files.PlanReader;
import org.wardon.files.PlanVariants;
import org.wardon.files.forecast.AnswerWriter;
import org.wardon.files.forecast.CompareAnswer;
import org.wardon.reference.ReferenceBook;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** Puts a plan and changed ones side by side. */
@Command(
        name = "compare",
        mixinStandardHelpOptions = true,
        description = {
            "Runs a plan as it is and with inputs changed, each in full, and puts side by side what"
                    + " comes of them: holding, days left, value, energy and cost.",
            "Such as: compare plan.json --variant curtain --set"
                    + " chambers[north].door.protection=strip-curtain --variant warmer --set"
                    + " chambers[north].setting.temperatureC=12"
        })
final class Compare implements Callable<Integer> {
    private static final String AS_PLANNED = "as planned";
    private static final String CHANGED = "changed";

    @Spec private CommandSpec spec = CommandSpec.create();

    @Mixin private Shared shared = new Shared();

    @Parameters(paramLabel = "PLAN", description = "Store plan, a JSON file; see 'wardon schema'.")
    private Path plan = Path.of("");

    @Option(
            names = "--variant",
            paramLabel = "NAME",
            description = "Begins a variant: the --set behind it belong to it.")
    private List<String> variants = List.of();

    @Option(
            names = "--set",
            paramLabel = "PATH=VALUE",
            description = {
                "Changes an input: a JSON path in the plan, items of lists by their id or place, and"
                        + " its new value, JSON or a word."
            })
    private List<String> sets = List.of();

    @Option(
            names = "--with",
            paramLabel = "FILE",
            description = "Compares with this plan too, a file of its own.")
    private List<Path> others = List.of();

    @Option(names = "--json", description = "Answer in JSON.")
    private boolean json;

    @Override
    public Integer call() {
        Map<String, List<String>> asked = inOrder();
        if (sets.isEmpty() && others.isEmpty()) {
            throw new BadInput(
                    "--set",
                    "",
                    "nothing is changed",
                    "accepted: --set PATH=VALUE, or --with FILE");
        }
        Terminal terminal = Terminal.ofProcess();
        try (ReferenceBook book = shared.book()) {
            CompareAnswer answer =
                    new Comparison(book, shared.words())
                            .of(housed(asked, shared.lookups(book), book), terminal.progress());
            terminal.out()
                    .print(
                            json
                                    ? AnswerWriter.json(answer)
                                    : new ComparePage(shared.words(), terminal).of(answer));
        }
        return Exit.OK;
    }

    /** What each variant changes, in the order typed. */
    private Map<String, List<String>> inOrder() {
        Map<String, List<String>> asked = new LinkedHashMap<>();
        List<String> typed = spec.commandLine().getParseResult().originalArgs();
        String name = CHANGED;
        for (int i = 0; i < typed.size(); i++) {
            String word = typed.get(i);
            String next = i + 1 < typed.size() ? typed.get(i + 1) : "";
            if (word.equals("--variant") || word.startsWith("--variant=")) {
                name = word.equals("--variant") ? next : word.substring("--variant=".length());
                if (asked.putIfAbsent(name, new ArrayList<>()) != null
                        || variants.contains(AS_PLANNED)) {
                    throw new BadInput(
                            "--variant", "", "'" + name + "' stands twice", "name each once");
                }
            } else if (word.equals("--set") || word.startsWith("--set=")) {
                String set = word.equals("--set") ? next : word.substring("--set=".length());
                asked.computeIfAbsent(name, any -> new ArrayList<>()).add(set);
            }
        }
        return asked;
    }

    private List<Comparison.Named> housed(
            Map<String, List<String>> asked, Lookups lookups, ReferenceBook book) {
        return read(asked, lookups).stream()
                .map(one -> one.in(OpenLots.house(one.plan(), book, Progress.SILENT).plan()))
                .toList();
    }

    private List<Comparison.Named> read(Map<String, List<String>> asked, Lookups lookups) {
        List<Comparison.Named> plans = new ArrayList<>();
        List<Fault> faults = new ArrayList<>();
        plans.add(new Comparison.Named(AS_PLANNED, PlanReader.read(plan, lookups), List.of()));
        PlanVariants variant = new PlanVariants(plan, lookups);
        asked.forEach(
                (name, changes) -> {
                    try {
                        PlanVariants.Variant read = variant.with(name, changes);
                        plans.add(new Comparison.Named(name, read.plan(), read.changed()));
                    } catch (BadInput wrong) {
                        faults.addAll(wrong.faults());
                    }
                });
        for (Path other : others) {
            try {
                plans.add(
                        new Comparison.Named(
                                other.toString(), PlanReader.read(other, lookups), List.of()));
            } catch (BadInput wrong) {
                faults.addAll(wrong.faults());
            }
        }
        if (!faults.isEmpty()) {
            throw new BadInput(faults);
        }
        return plans;
    }
}
