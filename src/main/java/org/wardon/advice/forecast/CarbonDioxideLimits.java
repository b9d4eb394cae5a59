package org.wardon.advice.forecast;

import java.util.List;

/** Published limits of carbon dioxide for people, as cautions and charts use them. */
public final class CarbonDioxideLimits {
    /** Eight-hour limit, ppm; source: safety limits, id OSHA-1910. */
    static final double CAUTION_PPM = 5_000;

    /**
     * Danger, ppm: the oxygen burnt for it leaves 19.5 %, below which air counts as short of oxygen
     * (safety limits, id OSHA-1910).
     */
    static final double DANGER_PPM = 14_000;

    /** Fifteen-minute limit, ppm; source: safety limits, id ACGIH. */
    static final double EVACUATE_PPM = 30_000;

    /** All of them, the lowest first. */
    public static final List<Limit> ALL =
            List.of(
                    new Limit("eight-hours", CAUTION_PPM, "OSHA-1910"),
                    new Limit("short-of-oxygen", DANGER_PPM, "OSHA-1910"),
                    new Limit("fifteen-minutes", EVACUATE_PPM, "ACGIH"));

    private CarbonDioxideLimits() {}

    /**
     * A limit.
     *
     * @param id what it is
     * @param ppm ppm
     * @param sourceId where it is printed
     */
    public record Limit(String id, double ppm, String sourceId) {}
}
