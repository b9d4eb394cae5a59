package org.wardon.advice.receiving;

import com.sun.management.OperatingSystemMXBean;
import java.io.IOException;
import java.lang.management.ManagementFactory;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Locale;
import org.wardon.files.forecast.ReceiveAnswer;
import org.wardon.plan.StorePlan;
import org.wardon.produce.Ripeness;
import org.wardon.reference.ReferenceBook;

/** Times questions at the door; a plain main, so that the first answer is a first one. */
public final class ReceivingTimes {
    private static final int ANSWERS = 12;

    private ReceivingTimes() {}

    /**
     * Prints wall times of the first and the later answers.
     *
     * @param args none
     * @throws IOException where a plan cannot be written
     */
    public static void main(String[] args) throws IOException {
        Path folder = Files.createTempDirectory("receiving");
        try (ReferenceBook book = ReferenceBook.open()) {
            time("demo", book, Stores.demo(book));
            time("12 lots, 3 chambers", book, Stores.plan(folder, book, Stores.drawn(3, 12, 1)));
            time("60 lots, 6 chambers", book, Stores.plan(folder, book, Stores.drawn(6, 60, 1)));
        }
    }

    private static void time(String name, ReferenceBook book, StorePlan plan) {
        long start = System.nanoTime();
        Receiving receiving = Receiving.of(plan, book, Stores.WORDS);
        double prepared = since(start);
        StringBuilder later = new StringBuilder();
        StringBuilder cpu = new StringBuilder();
        String sentence = "";
        for (int i = 0; i < ANSWERS; i++) {
            long asked = System.nanoTime();
            double cpuAsked = processorS();
            NewLot lot =
                    NewLot.of("mango", 500 + 50 * i)
                            .seen(NewLot.Fruit.UNSEEN.at(29).ripened(Ripeness.GREEN).harvested(6))
                            .wished(NewLot.Wish.UNSAID.coming(plan.from().plusHours(62)));
            ReceiveAnswer answer = receiving.answer(lot);
            later.append(String.format(Locale.ROOT, " %.2f", since(asked)));
            cpu.append(String.format(Locale.ROOT, " %.2f", processorS() - cpuAsked));
            sentence = answer.sentence();
        }
        System.out.printf(
                Locale.ROOT,
                "%s: %d draws, prepared %.2f s, answers%s s, of processor%s s%n  %s%n",
                name,
                receiving.draws(),
                prepared,
                later,
                cpu,
                sentence);
    }

    private static double processorS() {
        return ((OperatingSystemMXBean) ManagementFactory.getOperatingSystemMXBean())
                        .getProcessCpuTime()
                / 1e9;
    }

    private static double since(long nanos) {
        return (System.nanoTime() - nanos) / 1e9;
    }
}
