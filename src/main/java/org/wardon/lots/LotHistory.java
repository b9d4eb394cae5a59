package org.wardon.lots;

import java.util.Arrays;
import java.util.Optional;
import org.wardon.errors.Require;

/**
 * What a lot went through: samples at rising times, linear between them. Written by the heat model,
 * by a reader of loggers and by a thought experiment alike; read by the keeping model, which knows
 * nothing else.
 */
public final class LotHistory {
    private final int size;
    private final double[] timeS;
    private final double[] meanC;
    private final double[] surfaceC;
    private final double[] coldestC;
    private final double[] humidity;

    /** Empty where there was none in any sample. */
    private final double[] ethylenePpm;

    private final boolean[] wet;
    private final Optional<double[]> massKg;

    /** Takes over what was collected; the arrays may be longer than the samples. */
    private LotHistory(Builder b) {
        size = b.size;
        timeS = b.timeS;
        meanC = b.meanC;
        surfaceC = b.surfaceC;
        coldestC = b.coldestC;
        humidity = b.humidity;
        ethylenePpm = b.ethylenePpm;
        wet = b.wet;
        massKg = b.massKnown ? Optional.of(b.massKg) : Optional.empty();
    }

    /** The same samples with other ethylene; what never changes is shared, not copied. */
    private LotHistory(LotHistory same, double[] ppm) {
        size = same.size;
        timeS = same.timeS;
        meanC = same.meanC;
        surfaceC = same.surfaceC;
        coldestC = same.coldestC;
        humidity = same.humidity;
        ethylenePpm = ppm;
        wet = same.wet;
        massKg = same.massKg;
    }

    /**
     * Returns the history of a lot held in one condition.
     *
     * @param temperatureC temperature of lot and air, °C
     * @param humidityFraction humidity of the air at the fruit, 0 to 1
     * @param ethylenePpm ethylene, µL/L
     * @param durationS how long, s, above 0
     * @return a history of two samples, without mass
     */
    public static LotHistory constant(
            double temperatureC, double humidityFraction, double ethylenePpm, double durationS) {
        Builder b = new Builder();
        for (double t : new double[] {0, durationS}) {
            b.add(
                    t,
                    temperatureC,
                    temperatureC,
                    temperatureC,
                    humidityFraction,
                    ethylenePpm,
                    false);
        }
        return b.build();
    }

    /**
     * Returns the number of samples.
     *
     * @return at least 2
     */
    public int size() {
        return size;
    }

    /**
     * Returns the time of a sample.
     *
     * @param i sample
     * @return s since the start of the run, rising
     */
    public double timeS(int i) {
        return timeS[i];
    }

    /**
     * Returns the mass-average temperature.
     *
     * @param i sample
     * @return °C
     */
    public double meanC(int i) {
        return meanC[i];
    }

    /**
     * Returns the temperature of the outermost shell.
     *
     * @param i sample
     * @return °C
     */
    public double surfaceC(int i) {
        return surfaceC[i];
    }

    /**
     * Returns the temperature of the coldest shell.
     *
     * @param i sample
     * @return °C
     */
    public double coldestC(int i) {
        return coldestC[i];
    }

    /**
     * Returns the relative humidity of the air at the fruit.
     *
     * @param i sample
     * @return 0 to 1
     */
    public double humidityFraction(int i) {
        return humidity[i];
    }

    /**
     * Returns the ethylene in the air.
     *
     * @param i sample
     * @return µL/L
     */
    public double ethylenePpm(int i) {
        return ethylenePpm.length == 0 ? 0 : ethylenePpm[i];
    }

    /**
     * Returns whether free water lies on the produce.
     *
     * @param i sample
     * @return true if wet
     */
    public boolean wet(int i) {
        return wet[i];
    }

    /**
     * Returns whether the mass was computed or weighed.
     *
     * @return true if {@link #massKg} may be called
     */
    public boolean knowsMass() {
        return massKg.isPresent();
    }

    /**
     * Returns the mass of the lot.
     *
     * @param i sample
     * @return kg
     * @throws java.util.NoSuchElementException where the mass is not known
     */
    public double massKg(int i) {
        return massKg.orElseThrow()[i];
    }

    /**
     * Returns a copy with other ethylene.
     *
     * @param ppm {@code [sample]}, µL/L
     * @return the copy
     */
    public LotHistory withEthylene(double[] ppm) {
        Require.that(ppm.length == size(), "one ethylene value a sample is needed");
        return new LotHistory(this, ppm.clone());
    }

    /**
     * Returns this history carried on by another.
     *
     * @param next what comes after; of it the samples behind the end of this one are taken
     * @return the joined history
     */
    public LotHistory then(LotHistory next) {
        Builder b = new Builder();
        copy(this, Double.NEGATIVE_INFINITY, Double.POSITIVE_INFINITY, b);
        copy(next, timeS[size() - 1], Double.POSITIVE_INFINITY, b);
        return b.build();
    }

    /**
     * Returns the part of this history within a span.
     *
     * @param fromS first time, s
     * @param untilS last time, s; at least two samples must stand between
     * @return the part
     */
    public LotHistory within(double fromS, double untilS) {
        Builder b = new Builder();
        copy(this, Math.nextDown(fromS), untilS, b);
        return b.build();
    }

    private static void copy(LotHistory h, double afterS, double untilS, Builder b) {
        for (int i = 0; i < h.size(); i++) {
            if (h.timeS[i] > afterS && h.timeS[i] <= untilS) {
                b.add(
                        h.timeS[i],
                        h.meanC[i],
                        h.surfaceC[i],
                        h.coldestC[i],
                        h.humidity[i],
                        h.ethylenePpm(i),
                        h.wet[i]);
                if (h.massKg.isPresent()) {
                    b.mass(h.massKg.get()[i]);
                }
            }
        }
    }

    /** Collects samples in order of time. */
    public static final class Builder {
        private double[] timeS;
        private double[] meanC;
        private double[] surfaceC;
        private double[] coldestC;
        private double[] humidity;
        private double[] ethylenePpm = {};
        private double[] massKg;
        private boolean[] wet;
        private boolean massKnown;
        private boolean built;
        private int size;

        /** Starts empty. */
        public Builder() {
            this(64);
        }

        /**
         * Starts empty with room.
         *
         * @param samples samples expected, at least 1; more are taken too
         */
        public Builder(int samples) {
            timeS = new double[samples];
            meanC = new double[samples];
            surfaceC = new double[samples];
            coldestC = new double[samples];
            humidity = new double[samples];
            massKg = new double[samples];
            wet = new boolean[samples];
        }

        /**
         * Adds a sample.
         *
         * @param atS s since the start of the run, above the last one
         * @param mean mass-average temperature, °C
         * @param surface outermost shell, °C
         * @param coldest coldest shell, °C
         * @param humidityFraction air at the fruit, 0 to 1
         * @param ethylene µL/L
         * @param isWet free water on the produce
         * @return this
         */
        public Builder add(
                double atS,
                double mean,
                double surface,
                double coldest,
                double humidityFraction,
                double ethylene,
                boolean isWet) {
            Require.that(!built, "a history that was built takes no more samples");
            if (size > 0 && !(atS > timeS[size - 1])) {
                throw new IllegalArgumentException("history times must rise, found " + atS + " s");
            }
            if (size == timeS.length) {
                grow();
            }
            timeS[size] = atS;
            meanC[size] = mean;
            surfaceC[size] = surface;
            coldestC[size] = coldest;
            humidity[size] = humidityFraction;
            gas(ethylene);
            wet[size] = isWet;
            size++;
            return this;
        }

        /**
         * Gives the mass of the sample added last. Give it for all samples or for none.
         *
         * @param kg mass of the lot, kg
         * @return this
         */
        public Builder mass(double kg) {
            Require.that(!built, "a history that was built takes no other masses");
            massKg[size - 1] = kg;
            massKnown = true;
            return this;
        }

        /**
         * Returns how many samples were added.
         *
         * @return 0 or more
         */
        public int size() {
            return size;
        }

        /**
         * Returns the history; this takes no more samples then.
         *
         * @return the history, of at least 2 samples
         */
        public LotHistory build() {
            Require.that(size >= 2, "a history needs at least 2 samples, found " + size);
            built = true;
            return new LotHistory(this);
        }

        /** Most histories are written without ethylene, which is worked out behind them. */
        private void gas(double ppm) {
            if (ppm != 0 && ethylenePpm.length == 0) {
                ethylenePpm = new double[timeS.length];
            }
            if (ethylenePpm.length > 0) {
                ethylenePpm[size] = ppm;
            }
        }

        private void grow() {
            int n = 2 * size;
            timeS = Arrays.copyOf(timeS, n);
            meanC = Arrays.copyOf(meanC, n);
            surfaceC = Arrays.copyOf(surfaceC, n);
            coldestC = Arrays.copyOf(coldestC, n);
            humidity = Arrays.copyOf(humidity, n);
            ethylenePpm = ethylenePpm.length == 0 ? ethylenePpm : Arrays.copyOf(ethylenePpm, n);
            massKg = Arrays.copyOf(massKg, n);
            wet = Arrays.copyOf(wet, n);
        }
    }
}
