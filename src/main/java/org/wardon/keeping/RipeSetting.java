package org.wardon.keeping;

import java.util.List;
import java.util.function.DoubleFunction;
import org.wardon.lots.LotHistory;

/**
 * The steady temperature at which a lot is most likely just ripe at a time: half of the draws are
 * ripe then. It is looked for from the coldest that is safe for the lot up to where heat keeps it
 * from ripening well.
 *
 * @param found whether there is such a temperature
 * @param atC the temperature, °C; the end of the range that comes nearest where none does
 * @param sooner where none does: true if the lot is ripe sooner even in the coldest, false if later
 *     even in the best
 */
public record RipeSetting(boolean found, double atC, boolean sooner) {
    private static final double TO_K = 0.05;

    /**
     * Looks for the temperature.
     *
     * @param model the lot, whose ripening must be printed
     * @param draws the draws
     * @param held what it goes through, by the temperature it is kept at
     * @param fromS days are counted from here, s
     * @param days days after which it is wanted ripe
     * @return the temperature, or why there is none
     */
    public static RipeSetting of(
            KeepingModel model,
            List<Draw> draws,
            DoubleFunction<LotHistory> held,
            double fromS,
            double days) {
        double cold = Math.max(model.lowestSafeC(), model.freezingC());
        double warm = model.ripening().orElseThrow().suffersAboveC();
        DoubleFunction<Double> ripe = atC -> median(model, draws, held.apply(atC), fromS);
        if (ripe.apply(cold) < days) {
            return new RipeSetting(false, cold, true);
        }
        if (ripe.apply(warm) > days) {
            return new RipeSetting(false, warm, false);
        }
        while (warm - cold > TO_K) {
            double middle = 0.5 * (cold + warm);
            if (ripe.apply(middle) > days) {
                cold = middle;
            } else {
                warm = middle;
            }
        }
        return new RipeSetting(true, warm, false);
    }

    private static double median(
            KeepingModel model, List<Draw> draws, LotHistory history, double fromS) {
        double[] days =
                draws.stream()
                        .mapToDouble(
                                draw ->
                                        model.follow(history, draw)
                                                .ripeDaysFrom(fromS)
                                                .orElseThrow())
                        .toArray();
        return Spread.of(days).p50();
    }
}
