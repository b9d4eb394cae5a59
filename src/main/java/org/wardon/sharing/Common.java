package org.wardon.sharing;

import java.util.List;
import java.util.Optional;

/** The settings that several lots have in common, at the best verdict all of them reach. */
final class Common {
    private final Verdict verdict;
    private final Optional<SettingRange> temperatureC;
    private final Optional<SettingRange> humidityPct;
    private final double bestC;
    private final double bestPct;

    private Common(
            Verdict verdict,
            Optional<SettingRange> temperatureC,
            Optional<SettingRange> humidityPct,
            double bestC,
            double bestPct) {
        this.verdict = verdict;
        this.temperatureC = temperatureC;
        this.humidityPct = humidityPct;
        this.bestC = bestC;
        this.bestPct = bestPct;
    }

    static Common of(List<Workable> lots) {
        Verdict best = Verdict.NO;
        for (int t = 0; t < Settings.TEMPERATURES; t++) {
            for (int h = 0; h < Settings.HUMIDITIES; h++) {
                Verdict here = at(lots, t, h);
                best = here.compareTo(best) > 0 ? here : best;
            }
        }
        return best == Verdict.NO
                ? new Common(best, Optional.empty(), Optional.empty(), Double.NaN, Double.NaN)
                : reaching(lots, best);
    }

    private static Verdict at(List<Workable> lots, int t, int h) {
        Verdict worst = Verdict.GOOD;
        for (Workable lot : lots) {
            worst = worst.worse(lot.at(t, h));
        }
        return worst;
    }

    private static Common reaching(List<Workable> lots, Verdict wanted) {
        Settings.Extent temperatures = new Settings.Extent();
        Settings.Extent humidities = new Settings.Extent();
        double most = Double.NEGATIVE_INFINITY;
        double bestC = Double.NaN;
        double bestPct = Double.NaN;
        for (int t = 0; t < Settings.TEMPERATURES; t++) {
            for (int h = 0; h < Settings.HUMIDITIES; h++) {
                if (at(lots, t, h).compareTo(wanted) >= 0) {
                    double atC = Settings.temperatureC(t);
                    double atPct = Settings.humidityPct(h);
                    temperatures.add(atC);
                    humidities.add(atPct);
                    double spare = spare(lots, atC, atPct);
                    if (spare > most) {
                        most = spare;
                        bestC = atC;
                        bestPct = atPct;
                    }
                }
            }
        }
        return new Common(
                wanted, SettingRange.of(temperatures), SettingRange.of(humidities), bestC, bestPct);
    }

    /** The least that any lot has over what it needs, as a ratio. */
    private static double spare(List<Workable> lots, double atC, double atPct) {
        double least = Double.POSITIVE_INFINITY;
        for (Workable lot : lots) {
            least = Math.min(least, lot.tenthDays(atC, atPct) / lot.wish().wholeDays());
        }
        return least;
    }

    Verdict verdict() {
        return verdict;
    }

    Optional<SettingRange> temperatureC() {
        return temperatureC;
    }

    Optional<SettingRange> humidityPct() {
        return humidityPct;
    }

    /** Setting at which the neediest lot has most to spare, °C. */
    double bestC() {
        return bestC;
    }

    double bestPct() {
        return bestPct;
    }
}
