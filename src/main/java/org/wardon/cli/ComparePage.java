package org.wardon.cli;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import org.wardon.advice.wording.Words;
import org.wardon.files.forecast.CompareAnswer;
import org.wardon.files.forecast.CompareAnswer.Changed;
import org.wardon.files.forecast.CompareAnswer.OfChamber;
import org.wardon.files.forecast.CompareAnswer.OfLot;
import org.wardon.files.forecast.CompareAnswer.Variant;

/** Plans side by side, for a person: what earns most first. */
final class ComparePage {
    private final Words words;
    private final Terminal terminal;

    ComparePage(Words words, Terminal terminal) {
        this.words = words;
        this.terminal = terminal;
    }

    String of(CompareAnswer answer) {
        List<Variant> variants = answer.variants();
        StringBuilder page = new StringBuilder();
        page.append(terminal.bold(Paragraph.hanging("", sentence(variants)))).append('\n');
        page.append(sums(variants)).append('\n');
        page.append(chambers(variants)).append('\n');
        page.append(lots(variants)).append('\n');
        for (Variant variant : variants) {
            for (Changed changed : variant.changed()) {
                page.append(
                        Paragraph.hanging(
                                variant.name() + ": ",
                                changed.path()
                                        + " "
                                        + changed.from()
                                                .map(from -> "from " + from + " ")
                                                .orElse("")
                                        + "to "
                                        + changed.to()));
            }
        }
        return page.toString();
    }

    private static String sentence(List<Variant> variants) {
        Variant first = variants.get(0);
        Variant best =
                variants.stream()
                        .max(Comparator.comparingDouble(variant -> variant.value().net()))
                        .orElseThrow();
        double more = best.value().net() - first.value().net();
        return best.equals(first) || more < 0.5
                ? "Nothing compared earns more than the plan as it is: "
                        + money(first.value().net())
                        + " net of energy."
                : best.name()
                        + " earns most, "
                        + money(more)
                        + " more than the plan as it is, net of energy.";
    }

    private static String sums(List<Variant> variants) {
        Table table = new Table("", "holds", "value kept", "energy kWh", "cost", "net");
        for (Variant variant : variants) {
            long hold = variant.chambers().stream().filter(OfChamber::holds).count();
            table.row(
                    variant.name(),
                    hold + " of " + variant.chambers().size(),
                    money(variant.value().kept()),
                    money(variant.energyKWh()),
                    money(variant.value().energyCost()),
                    money(variant.value().net()));
        }
        return table.text();
    }

    private String chambers(List<Variant> variants) {
        Table table = new Table(heads("chamber", variants));
        Set<String> ids = new LinkedHashSet<>();
        variants.forEach(variant -> variant.chambers().forEach(one -> ids.add(one.id())));
        for (String id : ids) {
            List<String> cells = new ArrayList<>(List.of(id));
            for (Variant variant : variants) {
                cells.add(
                        variant.chambers().stream()
                                .filter(one -> one.id().equals(id))
                                .findFirst()
                                .map(
                                        one ->
                                                (one.holds() ? "holds, " : "does not hold, ")
                                                        + words.units().temperature(one.airC()))
                                .orElse("-"));
            }
            table.row(cells.toArray(String[]::new));
        }
        return table.text();
    }

    private String lots(List<Variant> variants) {
        Table table = new Table(heads("lot, days left", variants));
        Set<String> ids = new LinkedHashSet<>();
        variants.forEach(variant -> variant.lots().forEach(one -> ids.add(one.id())));
        for (String id : ids) {
            List<String> cells = new ArrayList<>(List.of(id));
            for (Variant variant : variants) {
                cells.add(
                        variant.lots().stream()
                                .filter(one -> one.id().equals(id))
                                .findFirst()
                                .map((OfLot one) -> words.span(one.daysLeft()))
                                .orElse("-"));
            }
            table.row(cells.toArray(String[]::new));
        }
        return table.text();
    }

    private static String[] heads(String first, List<Variant> variants) {
        List<String> heads = new ArrayList<>(List.of(first));
        variants.forEach(variant -> heads.add(variant.name()));
        return heads.toArray(String[]::new);
    }

    private static String money(double value) {
        return String.format(Locale.ROOT, "%,.0f", value).replace(',', ' ');
    }
}
