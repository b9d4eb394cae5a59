package org.wardon.advice.forecast;

import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import org.wardon.files.forecast.Forecast;
import org.wardon.plan.StorePlan;
import org.wardon.produce.Caution;
import org.wardon.produce.Reason;

/** The advice on a store plan: the forecast, why chambers hold or do not, the series. */
public final class StoreAdvice {
    private final StoreOutcome outcome;
    private final Forecast forecast;
    private final Map<String, List<Reason>> whyNotHeld;

    private final List<Caution> placed;

    StoreAdvice(
            StoreOutcome outcome,
            Forecast forecast,
            Map<String, List<Reason>> whyNotHeld,
            List<Caution> placed) {
        this.outcome = outcome;
        this.forecast = forecast;
        this.whyNotHeld = Map.copyOf(whyNotHeld);
        this.placed = List.copyOf(placed);
    }

    /** The same advice, told in another forecast. */
    StoreAdvice told(Forecast otherwise) {
        return new StoreAdvice(outcome, otherwise, whyNotHeld, placed);
    }

    /** What was said on placing lots. */
    List<Caution> placed() {
        return placed;
    }

    StoreOutcome outcome() {
        return outcome;
    }

    /**
     * Returns the plan as it was run, every lot placed.
     *
     * @return the plan
     */
    public StorePlan plan() {
        return outcome.model().plan();
    }

    /**
     * Returns the forecast.
     *
     * @return in its fixed names
     */
    public Forecast forecast() {
        return forecast;
    }

    /**
     * Returns why a chamber does not hold.
     *
     * @param chamberId its id
     * @return reasons, empty where it holds
     */
    public List<Reason> whyNotHeld(String chamberId) {
        return whyNotHeld.getOrDefault(chamberId, List.of());
    }

    /**
     * Returns the temperature a chamber is set to at the start.
     *
     * @param chamberId its id
     * @return °C
     */
    public double settingC(String chamberId) {
        return outcome.model().settings(plan().getChamber(chamberId)).first().temperatureC();
    }

    /**
     * Returns the air of a chamber hour by hour, beside what it is set to.
     *
     * @param chamberId its id
     * @return its air to the end of the plan
     */
    public ChamberAir air(String chamberId) {
        return new ChamberAir(plan().getChamber(chamberId), outcome);
    }

    /**
     * Returns the view of a chamber, hour by hour.
     *
     * @param chamberId its id
     * @return what a page shows of it
     * @throws java.util.NoSuchElementException where the plan has none of that id
     */
    public ChamberView view(String chamberId) {
        return new ChamberView(outcome, chamberId);
    }

    /**
     * Writes the hourly series of chambers and lots.
     *
     * @param folder where to; it is made
     * @throws org.wardon.files.CannotWrite where a file cannot be written
     */
    public void writeSeries(Path folder) {
        new StoreSeries(outcome).write(folder);
    }
}
