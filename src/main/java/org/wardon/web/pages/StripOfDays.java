package org.wardon.web.pages;

import java.time.Duration;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.stream.IntStream;
import org.wardon.advice.forecast.ChamberAir;

/** Draws the strip of days of a chamber. */
final class StripOfDays {
    private static final int ACROSS = 1_000;
    private static final int MOST_BARS = 64;
    private static final int MOST_NAMES = 10;

    /** Days beside which a name with its month has room on a phone. */
    private static final int ROOM_FOR_NAMES = 6;

    private static final int[] HOURS_A_BAR = {1, 2, 3, 4, 6, 12, 24, 48, 96, 168, 336, 672};

    /** A bar is never thinner than this, px. */
    private static final double THINNEST = 2;

    /** Room above and below, as a share of what is shown. */
    private static final double ROOM = 0.08;

    private final ChamberAir air;
    private final Figures figures;
    private final PageWords words;
    private final double lowC;
    private final double highC;
    private final LocalDateTime from;
    private final double hours;

    StripOfDays(ChamberAir air, Figures figures, PageWords words) {
        this.air = air;
        this.figures = figures;
        this.words = words;
        double low = Double.POSITIVE_INFINITY;
        double high = Double.NEGATIVE_INFINITY;
        for (int i = 0; i < air.size(); i++) {
            double setC = air.settingC(i);
            low = Math.min(low, Math.min(setC - 1, Math.max(air.coldestC(i), setC - 5)));
            high = Math.max(high, Math.max(setC + 1, air.warmestC(i)));
            low = Math.min(low, air.airC(i));
            high = Math.max(high, air.airC(i));
        }
        lowC = low - ROOM * (high - low);
        highC = high + ROOM * (high - low);
        from = air.at(0);
        hours = Math.max(1, hoursTo(air.at(air.size() - 1)));
    }

    private double hoursTo(LocalDateTime at) {
        return Duration.between(from, at).toMinutes() / 60.0;
    }

    StripView view(String title) {
        StringBuilder inside = new StringBuilder();
        StringBuilder outside = new StringBuilder();
        int step = hoursABar();
        for (int first = 0; first < air.size(); first += step) {
            bar(first, Math.min(first + step, air.size()), inside, outside);
        }
        StringBuilder held = new StringBuilder();
        StringBuilder setting = new StringBuilder();
        steps(held, setting);
        return new StripView(
                inside.toString(),
                outside.toString(),
                px(barWide()),
                setting.toString(),
                held.toString(),
                days(),
                marks(),
                text(),
                title);
    }

    /** A box of what counts as held and a dash of the setting for each setting. */
    private void steps(StringBuilder held, StringBuilder setting) {
        int first = 0;
        for (int i = 1; i <= air.size(); i++) {
            if (i < air.size() && air.settingC(i) == air.settingC(first)) {
                continue;
            }
            double x = first == 0 ? 0 : ACROSS * hoursTo(air.at(first - 1)) / hours;
            double end = i == air.size() ? ACROSS : ACROSS * hoursTo(air.at(i - 1)) / hours;
            double top = y(Math.min(air.warmestC(first), highC));
            double bottom = y(Math.max(air.coldestC(first), lowC));
            held.append(
                    String.format(
                            Locale.ROOT, "M%.1f %.1fH%.1fV%.1fH%.1fz", x, top, end, bottom, x));
            double y = y(air.settingC(first));
            setting.append(String.format(Locale.ROOT, "M%.1f %.1fH%.1f", x, y, end));
            first = i;
        }
    }

    private int hoursABar() {
        for (int step : HOURS_A_BAR) {
            if (air.size() <= MOST_BARS * step) {
                return step;
            }
        }
        return 1 + air.size() / MOST_BARS;
    }

    private void bar(int first, int end, StringBuilder inside, StringBuilder outside) {
        double low = Double.POSITIVE_INFINITY;
        double high = Double.NEGATIVE_INFINITY;
        for (int i = first; i < end; i++) {
            low = Math.min(low, air.airC(i));
            high = Math.max(high, air.airC(i));
        }
        boolean out = IntStream.range(first, end).anyMatch(this::outside);
        double middle = ACROSS * hoursTo(air.at(first)) / hours + barWide() / 2;
        double top = y(high);
        double bottom = Math.max(top + THINNEST, y(low));
        (out ? outside : inside)
                .append(
                        String.format(
                                Locale.ROOT,
                                "M%.1f %.1fV%.1f",
                                Math.min(middle, ACROSS - barWide() / 2),
                                top,
                                bottom));
    }

    /** Bars are strokes: one number wide instead of four corners each. */
    private double barWide() {
        return 0.8 * ACROSS * hoursABar() / Math.max(air.size(), hoursABar());
    }

    private boolean outside(int row) {
        return air.airC(row) < air.coldestC(row) || air.airC(row) > air.warmestC(row);
    }

    private double y(double temperatureC) {
        return StripView.HEIGHT * (highC - temperatureC) / (highC - lowC);
    }

    private static String px(double value) {
        return String.format(Locale.ROOT, "%.1f", value);
    }

    private List<StripView.Day> days() {
        List<StripView.Day> days = new ArrayList<>();
        LocalDateTime end = air.at(air.size() - 1);
        int every = (int) Math.ceil(hours / 24 / MOST_NAMES);
        int n = 0;
        for (LocalDate day = from.toLocalDate();
                day.atStartOfDay().isBefore(end);
                day = day.plusDays(every)) {
            double at = Math.max(0, hoursTo(day.atStartOfDay()) / hours);
            days.add(
                    new StripView.Day(
                            px(ACROSS * at),
                            px(100 * at),
                            at > 0.95 ? "" : named(day, n),
                            isTight(day, n)));
            n++;
        }
        return days;
    }

    /** The month with the first name and where it changes. */
    private String named(LocalDate day, int n) {
        boolean newMonth = n == 0 || day.getDayOfMonth() <= 1;
        return newMonth ? figures.shortDay(day) : String.valueOf(day.getDayOfMonth());
    }

    /** Whether the month named before leaves a day's name no room on a phone. */
    private boolean isTight(LocalDate day, int n) {
        return (n == 1 && hours / 24 > ROOM_FOR_NAMES) || (day.getDayOfMonth() == 2 && n > 1);
    }

    private List<StripView.Mark> marks() {
        double low = Double.POSITIVE_INFINITY;
        double high = Double.NEGATIVE_INFINITY;
        for (int i = 0; i < air.size(); i++) {
            low = Math.min(low, air.airC(i));
            high = Math.max(high, air.airC(i));
        }
        List<StripView.Mark> marks = new ArrayList<>();
        double setC = air.settingC(air.size() - 1);
        marks.add(mark(setC));
        for (double at : new double[] {high, low}) {
            if (Math.abs(y(at) - y(setC)) > 14) {
                marks.add(mark(at));
            }
        }
        return marks;
    }

    private StripView.Mark mark(double temperatureC) {
        return new StripView.Mark(
                px(Math.min(Math.max(y(temperatureC) + 4, 10), StripView.HEIGHT)),
                figures.temperature(temperatureC));
    }

    private String set() {
        StringBuilder all = new StringBuilder(figures.temperature(air.settingC(0)));
        for (int i = 1; i < air.size(); i++) {
            if (air.settingC(i) != air.settingC(i - 1)) {
                all.append(", ").append(figures.temperature(air.settingC(i)));
            }
        }
        return all.toString();
    }

    private String text() {
        double low = Double.POSITIVE_INFINITY;
        double high = Double.NEGATIVE_INFINITY;
        int outside = 0;
        for (int i = 0; i < air.size(); i++) {
            low = Math.min(low, air.airC(i));
            high = Math.max(high, air.airC(i));
            outside += outside(i) ? 1 : 0;
        }
        return words.say(
                "strip.text",
                figures.time(from),
                figures.time(air.at(air.size() - 1)),
                figures.temperature(low),
                figures.temperature(high),
                set(),
                String.valueOf(outside),
                String.valueOf(air.size()));
    }
}
