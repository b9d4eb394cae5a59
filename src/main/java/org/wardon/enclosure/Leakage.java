package org.wardon.enclosure;

/** Air that changes with the door shut. Both figures count the chamber's own air. */
public final class Leakage {
    private Leakage() {}

    /**
     * Returns the flow of leakage and fresh air.
     *
     * @param enclosure the chamber
     * @return m3 of chamber air/s, counted on the gross volume
     */
    public static double flowM3s(Enclosure enclosure) {
        return leakM3s(enclosure.leakageAirChangesPerDay(), enclosure.box().volumeM3())
                + enclosure.freshAirM3PerHour() / 3_600;
    }

    /**
     * Returns the flow of leakage.
     *
     * @param airChangesPerDay gross volumes a day
     * @param volumeM3 gross volume, m3
     * @return m3/s
     */
    public static double leakM3s(double airChangesPerDay, double volumeM3) {
        return airChangesPerDay * volumeM3 / 86_400;
    }
}
