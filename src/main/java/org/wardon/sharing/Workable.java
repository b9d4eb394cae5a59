package org.wardon.sharing;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import org.wardon.keeping.Draw;
import org.wardon.keeping.KeepingModel;
import org.wardon.produce.Reason;
import org.wardon.produce.Reason.Argument;

/**
 * The workable settings of one lot: how good each temperature and humidity is for its wanted days
 * and market leg, by the keeping model, ethylene left aside.
 */
public final class Workable {
    private final Wish wish;
    private final KeepingModel model;
    private final List<Draw> draws;

    /** How far below its setting the thermostat lets the air come, K; 0 where that is not known. */
    private final double swingK;

    /** {@code [temperature][humidity]}, days. */
    private final double[][] tenth = new double[Settings.TEMPERATURES][Settings.HUMIDITIES];

    private final double[][] median = new double[Settings.TEMPERATURES][Settings.HUMIDITIES];

    /** {@code [temperature][humidity]}, share of draws that last stay and market leg. */
    private final double[][] sound = new double[Settings.TEMPERATURES][Settings.HUMIDITIES];

    /** {@code [temperature]}, share of draws injured by the end of the market leg. */
    private final double[] chilled = new double[Settings.TEMPERATURES];

    /** {@code [temperature][humidity]}. */
    private final Verdict[][] verdicts = new Verdict[Settings.TEMPERATURES][Settings.HUMIDITIES];

    private Workable(Wish wish, KeepingModel model, List<Draw> draws, double swingK) {
        this.wish = wish;
        this.draws = draws;
        this.model = model;
        this.swingK = swingK;
        fill();
        judge();
    }

    /**
     * Works out the settings of a lot.
     *
     * @param wish the lot and its days
     * @param draws the draws, 32 are usual
     * @return its workable settings
     */
    public static Workable of(Wish wish, List<Draw> draws) {
        return of(wish, KeepingModel.of(wish.lot()), draws);
    }

    /**
     * Works out the settings of a lot whose model is there already.
     *
     * @param wish the lot and its days
     * @param model the lot's model
     * @param draws the draws, 32 are usual
     * @return its workable settings
     */
    public static Workable of(Wish wish, KeepingModel model, List<Draw> draws) {
        return in(0, wish, model, draws);
    }

    /**
     * Works out the settings of a lot in a chamber whose thermostat is known.
     *
     * @param swingK how far below its setting the thermostat lets the air come, K, 0 or more
     * @param wish the lot and its days
     * @param model the lot's model
     * @param draws the draws, 32 are usual
     * @return its workable settings
     */
    public static Workable in(double swingK, Wish wish, KeepingModel model, List<Draw> draws) {
        return new Workable(wish, model, List.copyOf(draws), swingK);
    }

    private void fill() {
        List<DaysByDraw> drawn = draws.stream().map(d -> new DaysByDraw(model, wish, d)).toList();
        double[] days = new double[draws.size()];
        double[] anyHumidity = new double[draws.size()];
        for (int t = 0; t < Settings.TEMPERATURES; t++) {
            double temperatureC = Settings.temperatureC(t);
            int injured = 0;
            for (int d = 0; d < days.length; d++) {
                anyHumidity[d] = drawn.get(d).atAnyHumidity(temperatureC);
                injured += drawn.get(d).chilledAfter(temperatureC) < wish.wholeDays() ? 1 : 0;
            }
            chilled[t] = (double) injured / days.length;
            place(t, 0, anyHumidity);
            double untouchedTenth = tenth[t][0];
            double untouchedMedian = median[t][0];
            double untouchedSound = sound[t][0];
            for (int h = 0; h < Settings.HUMIDITIES; h++) {
                double humidity = Settings.humidityPct(h) / 100;
                boolean touched = false;
                for (int d = 0; d < days.length; d++) {
                    double least = anyHumidity[d];
                    days[d] =
                            least > 0
                                    ? Math.min(least, drawn.get(d).at(temperatureC, humidity))
                                    : 0;
                    touched |= days[d] < least;
                }
                if (touched) {
                    place(t, h, days);
                } else {
                    tenth[t][h] = untouchedTenth;
                    median[t][h] = untouchedMedian;
                    sound[t][h] = untouchedSound;
                }
            }
        }
    }

    private void place(int t, int h, double[] days) {
        double[] sorted = days.clone();
        Arrays.sort(sorted);
        tenth[t][h] = at(sorted, Limits.GOOD_SHARE);
        median[t][h] = at(sorted, Limits.TOLERABLE_SHARE);
        sound[t][h] = sound(sorted);
    }

    private double sound(double[] days) {
        int lasting = 0;
        for (double one : days) {
            lasting += one >= wish.wholeDays() ? 1 : 0;
        }
        return (double) lasting / days.length;
    }

    private void judge() {
        for (int t = 0; t < Settings.TEMPERATURES; t++) {
            for (int h = 0; h < Settings.HUMIDITIES; h++) {
                verdicts[t][h] = judged(t, h);
            }
        }
    }

    private Verdict judged(int t, int h) {
        if (!safe(t)) {
            return Verdict.NO;
        }
        if (tenth[t][h] >= wish.wholeDays() && chilled[t] < Limits.GOOD_CHILLING) {
            return Verdict.GOOD;
        }
        boolean nearly = handbookMedian() >= Limits.LEAST_OF_WANTED * wish.wholeDays();
        return nearly && bearable(t, h) ? Verdict.TOLERABLE : Verdict.NO;
    }

    /** Whether the lot keeps its days, or most of what it has in the handbook's own condition. */
    boolean bearable(int t, int h) {
        return safe(t) && median[t][h] >= Limits.neededDays(handbookMedian(), wish.wholeDays());
    }

    /** Clear of freezing and hardly chilled; the handbook's condition is never refused for cold. */
    private boolean safe(int t) {
        double allowed = Math.max(Limits.TOLERABLE_CHILLING, chilled[handbookTemperature()] + 1e-9);
        return clearOfFreezing(t) && chilled[t] < allowed;
    }

    private double handbookMedian() {
        int h = Settings.nearestHumidity(100 * model.handbookHumidityFraction());
        return median[handbookTemperature()][h];
    }

    private int handbookTemperature() {
        return Settings.nearestTemperature(model.handbookC());
    }

    private static double at(double[] sorted, double share) {
        double place = share * (sorted.length - 1);
        int below = (int) place;
        int above = Math.min(below + 1, sorted.length - 1);
        return sorted[below] + (place - below) * (sorted[above] - sorted[below]);
    }

    private boolean clearOfFreezing(int t) {
        return Settings.temperatureC(t) >= frostC();
    }

    /**
     * Returns the verdict on a setting.
     *
     * @param temperatureC temperature, °C; the nearest of the grid counts
     * @param humidityPct humidity at the produce, percent; the nearest of the grid counts
     * @return how good it is for this lot alone
     */
    public Verdict at(double temperatureC, double humidityPct) {
        return at(Settings.nearestTemperature(temperatureC), Settings.nearestHumidity(humidityPct));
    }

    Verdict at(int t, int h) {
        return verdicts[t][h];
    }

    /**
     * Returns whether the lot falls short of its days even in the handbook's own condition, so that
     * its company is not to blame.
     *
     * @return true if its median life there is shorter than stay and market leg
     */
    public boolean fallsShortAnyway() {
        return handbookMedian() < wish.wholeDays();
    }

    /**
     * Returns the days the lot lasts in a setting.
     *
     * @param temperatureC temperature, °C
     * @param humidityPct humidity at the produce, percent
     * @return tenth percentile, days
     */
    public double tenthDays(double temperatureC, double humidityPct) {
        return tenth[Settings.nearestTemperature(temperatureC)][
                Settings.nearestHumidity(humidityPct)];
    }

    /** Days it falls short, in the middle of its range, of what it wants and can reach at all. */
    double daysLost(int t, int h) {
        return Math.max(0, Math.min(wish.wholeDays(), handbookMedian()) - median[t][h]);
    }

    /**
     * Returns the share of draws that last stay and market leg in a setting.
     *
     * @param temperatureC temperature, °C
     * @param humidityPct humidity at the produce, percent
     * @return 0 to 1
     */
    public double soundShare(double temperatureC, double humidityPct) {
        return sound[Settings.nearestTemperature(temperatureC)][
                Settings.nearestHumidity(humidityPct)];
    }

    /**
     * Returns whether a temperature is clear of freezing and hardly chills.
     *
     * @param temperatureC temperature, °C
     * @return false where the lot must not stand
     */
    public boolean safe(double temperatureC) {
        return safe(Settings.nearestTemperature(temperatureC));
    }

    /**
     * Returns what every temperature does to the lot, from cold to warm.
     *
     * @return stretches of the temperatures looked at, half a degree apart
     */
    public List<Stretch> stretches() {
        List<Stretch> stretches = new ArrayList<>();
        int from = 0;
        for (int t = 1; t <= Settings.TEMPERATURES; t++) {
            if (t == Settings.TEMPERATURES || what(t) != what(from)) {
                double lowC = Settings.temperatureC(from);
                double highC = Settings.temperatureC(t - 1);
                stretches.add(new Stretch(lowC, highC, what(from)));
                from = t;
            }
        }
        return stretches;
    }

    private Stretch.What what(int t) {
        if (!clearOfFreezing(t)) {
            return Stretch.What.FREEZES;
        }
        if (!safe(t)) {
            return Stretch.What.CHILLS;
        }
        Stretch.What best = Stretch.What.SHORT;
        for (int h = 0; h < Settings.HUMIDITIES; h++) {
            if (verdicts[t][h] == Verdict.GOOD) {
                return Stretch.What.LASTS;
            }
            best = bearable(t, h) ? Stretch.What.BEARS : best;
        }
        return best;
    }

    /**
     * Returns the setting the lot must not be below for fear of freezing.
     *
     * @return its freezing point, the margin and the swing of the thermostat, °C
     */
    public double frostC() {
        return model.freezingC() + KeepingModel.FREEZING_MARGIN_K + swingK;
    }

    /** Why it is set no colder, where frost is what bounds it. */
    Reason frost() {
        Argument limit = Argument.of(frostC(), "C");
        Argument point = Argument.of(model.freezingC(), "C");
        Argument margin = Argument.of(KeepingModel.FREEZING_MARGIN_K, "K");
        return swingK > 0
                ? Reason.about(
                        "frost-and-swing",
                        id(),
                        Limits.FREEZING_SOURCE,
                        limit,
                        point,
                        margin,
                        Argument.of(swingK, "K"))
                : Reason.about("frost-margin", id(), Limits.FREEZING_SOURCE, limit, point, margin);
    }

    /**
     * Returns the humidities at which the lot bears some temperature.
     *
     * @return lowest and highest, percent; empty where it bears none
     */
    public Optional<SettingRange> bornePct() {
        Settings.Extent borne = new Settings.Extent();
        for (int t = 0; t < Settings.TEMPERATURES; t++) {
            for (int h = 0; h < Settings.HUMIDITIES; h++) {
                if (bearable(t, h)) {
                    borne.add(Settings.humidityPct(h));
                }
            }
        }
        return SettingRange.of(borne);
    }

    /**
     * Returns the temperatures the lot bears.
     *
     * @return lowest and highest, °C, perhaps with harm between; empty where it bears none
     */
    public Optional<SettingRange> borneC() {
        Settings.Extent borne = new Settings.Extent();
        for (Stretch stretch : stretches()) {
            if (stretch.what().compareTo(Stretch.What.BEARS) >= 0) {
                borne.add(stretch.lowC());
                borne.add(stretch.highC());
            }
        }
        return SettingRange.of(borne);
    }

    /**
     * Returns the lot and its days.
     *
     * @return the wish
     */
    public Wish wish() {
        return wish;
    }

    KeepingModel model() {
        return model;
    }

    List<Draw> draws() {
        return draws;
    }

    String id() {
        return wish.lot().id();
    }
}
