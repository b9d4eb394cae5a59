package org.wardon.cli;

import java.time.Instant;
import java.time.temporal.ChronoUnit;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.wardon.errors.BadInput;
import org.wardon.errors.Fault;
import org.wardon.reference.OwnValue;
import org.wardon.reference.OwnValues;
import picocli.CommandLine.Option;

/** Options that set or forget a keeper's own values of a commodity. */
final class OwnWords {
    private static final Pattern VALUE =
            Pattern.compile("([^=]+)=(-?\\d+(?:\\.\\d+)?)(?:\\.\\.(-?\\d+(?:\\.\\d+)?))?");

    @Option(
            names = "--own",
            paramLabel = "FACT=LOW[..HIGH]",
            description = {
                "Set a value of your own, such as --own storage-temperature=12..13 or --own"
                        + " life@10C=9; it wins over print and is shown as own."
            })
    private List<String> set = List.of();

    @Option(
            names = "--forget",
            paramLabel = "FACT",
            description = "Forget a value of your own, so that print holds again.")
    private List<String> forget = List.of();

    boolean asked() {
        return !set.isEmpty() || !forget.isEmpty();
    }

    /** Sets and forgets; nothing is changed where one of the words is wrong. */
    void change(OwnValues values, String commodityId) {
        List<Fault> faults = new ArrayList<>();
        List<OwnValue> own = new ArrayList<>();
        for (String word : set) {
            try {
                own.add(parsed(commodityId, word));
            } catch (BadInput bad) {
                faults.addAll(bad.faults());
            }
        }
        List<String> known =
                values.list().stream()
                        .filter(value -> value.commodityId().equals(commodityId))
                        .map(OwnValue::name)
                        .toList();
        for (String name : forget) {
            if (!known.contains(name)) {
                faults.add(
                        new Fault(
                                "--forget",
                                name,
                                "no own value of " + commodityId + " is called so",
                                known.isEmpty() ? "there is none" : "one of " + known));
            }
        }
        if (!faults.isEmpty()) {
            throw new BadInput(faults);
        }
        own.forEach(values::set);
        forget.forEach(name -> values.delete(commodityId, name));
    }

    private static OwnValue parsed(String commodityId, String word) {
        Matcher match = VALUE.matcher(word);
        if (!match.matches()) {
            throw new BadInput(
                    "--own",
                    "",
                    "'" + word + "' is no FACT=LOW[..HIGH]",
                    "accepted: such as storage-temperature=12..13");
        }
        double low = Double.parseDouble(match.group(2));
        String top = match.group(3);
        double high = top == null ? low : Double.parseDouble(top);
        String now = Instant.now().truncatedTo(ChronoUnit.SECONDS).toString();
        return OwnValue.of(commodityId, match.group(1), low, high, now);
    }
}
