package org.wardon.air.normals;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import org.wardon.air.DailyRadiation;

/**
 * Global radiation of each day on the level: the blended clearness of the normals, and how clear
 * the day is among those of its time of year. Where no normals of radiation are given, a month's
 * clearness is that of its mean daily range of temperature ({@link DailyRadiation#shareByRange}).
 */
final class DailySun {
    private static final double JOULE_PER_MJ = 1e6;
    private static final int MONTHS = MonthlyNormals.MONTHS;

    /** Below this a month's radiation says nothing of its clearness, kWh/(m2 day) (assumption). */
    private static final double DARK_KWH_M2 = 0.1;

    private final double latitudeDeg;
    private final MonthBlend clearness;
    private final Spells spells;

    DailySun(MonthlyNormals normals, double latitudeDeg, double elevationM, Spells spells) {
        this.latitudeDeg = latitudeDeg;
        this.spells = spells;
        clearness =
                MonthBlend.weighted(
                        months(normals, latitudeDeg, elevationM),
                        0,
                        MonthlyNormals.CLEAREST_MONTH,
                        day -> DailyRadiation.extraterrestrialMJ(day, latitudeDeg));
    }

    private static List<Double> months(
            MonthlyNormals normals, double latitudeDeg, double elevationM) {
        List<Double> known = new ArrayList<>();
        for (int m = 0; m < MONTHS; m++) {
            double above = MonthlyNormals.aboveTheAirKWhM2(m, latitudeDeg);
            double share =
                    normals.globalKWhM2Day().isPresent()
                            ? normals.globalKWhM2Day().get().get(m) / above
                            : DailyRadiation.shareByRange(normals.rangeK(m), elevationM);
            known.add(
                    above < DARK_KWH_M2
                            ? Double.NaN
                            : Math.min(share, MonthlyNormals.CLEAREST_MONTH));
        }
        return filled(known);
    }

    /** Dark months take the clearness of the nearest months with sun. */
    private static List<Double> filled(List<Double> known) {
        List<Double> filled = new ArrayList<>();
        for (int m = 0; m < MONTHS; m++) {
            double sum = 0;
            int n = 0;
            for (int apart = 0; apart < MONTHS && n == 0; apart++) {
                for (int side : new int[] {-apart, apart}) {
                    double other = known.get(Math.floorMod(m + side, MONTHS));
                    if (!Double.isNaN(other)) {
                        sum += other;
                        n++;
                    }
                }
            }
            filled.add(sum / Math.max(1, n));
        }
        return filled;
    }

    /** Radiation of a day, J/(m2 day). */
    double joulesM2(LocalDate day) {
        double share = ClearDays.clearness(clearness.at(day), spells.on(day).sun());
        return share * aboveMJ(day) * JOULE_PER_MJ;
    }

    private double aboveMJ(LocalDate day) {
        return DailyRadiation.extraterrestrialMJ(day.getDayOfYear(), latitudeDeg);
    }
}
