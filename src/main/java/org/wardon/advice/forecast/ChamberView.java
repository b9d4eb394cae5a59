package org.wardon.advice.forecast;

import java.time.LocalDateTime;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.enclosure.Door;
import org.wardon.errors.BadInput;
import org.wardon.errors.Fault;
import org.wardon.files.forecast.HourlySeries;
import org.wardon.files.forecast.WhyAnswer;
import org.wardon.heat.ChamberRun;
import org.wardon.heat.HeatModel;
import org.wardon.plan.ChamberPlan;

/**
 * One chamber of a forecast hour by hour, for charts. Series of air and lots are there; the heat
 * budget and an hour's faces are worked out anew when asked for, by running the chamber again as
 * the forecast ran it.
 */
public final class ChamberView {
    private final StoreOutcome outcome;
    private final ChamberPlan chamber;

    ChamberView(StoreOutcome outcome, String chamberId) {
        this.outcome = outcome;
        chamber = outcome.model().plan().getChamber(chamberId);
    }

    /**
     * Returns the chamber's air, gases, cooling and power.
     *
     * @return columns {@code airC airLowestC airHighestC humidityPct outdoorC coolingW powerW
     *     co2Ppm ethylenePpm}, and {@code doorEndC doorEndHumidityPct} where the air is two, with
     *     what else the chamber has
     */
    public HourlySeries air() {
        return new StoreSeries(outcome).chamber(chamber.id());
    }

    /**
     * Returns which lots stand there at some time.
     *
     * @return their ids
     */
    public List<String> lotIds() {
        return outcome.model().sheetsIn(chamber.id()).stream()
                .map(LotSheet::id)
                .filter(outcome::has)
                .distinct()
                .toList();
    }

    /**
     * Returns the lots that stand there at some time.
     *
     * @return columns {@code meanC surfaceC coreC respirationW massKg lifeUsedPct}; of a lot that
     *     is moved, all it goes through
     */
    public List<HourlySeries> lots() {
        return new StoreSeries(outcome).lots(new HashSet<>(lotIds())::contains);
    }

    /**
     * Returns a lot that stands there at some time, without the work of all others.
     *
     * @param id its id
     * @return as {@link #lots} gives it, absent where it never stands there
     */
    public Optional<HourlySeries> lot(String id) {
        return lotIds().contains(id)
                ? new StoreSeries(outcome).lots(id::equals).stream().findFirst()
                : Optional.empty();
    }

    /**
     * Returns what brought heat into the chamber and took it, hour by hour.
     *
     * @return columns by the names of the forecast's {@code loadKWh}, and {@code removed}; means of
     *     the hour, W; the terms of an hour add up to what was removed
     */
    public HourlySeries heat() {
        double untilS = outcome.horizonS();
        ChamberRun run = outcome.model().asInPlain(chamber, untilS);
        return StoreSeries.heat(chamber.id(), HeatModel.accounts(run, 0, untilS));
    }

    /**
     * Returns the chamber in one hour, with the temperatures through a face and a lot.
     *
     * @param until end of the hour, local time
     * @param face name of a face, where one is asked for
     * @param lotId a lot that stands there then, where one is asked for
     * @return heat and water term by term, the face from outside to inside, the lot from its middle
     *     to the air
     * @throws BadInput where there is no such hour, face or lot
     */
    public WhyAnswer hour(LocalDateTime until, Optional<String> face, Optional<String> lotId) {
        List<Fault> faults = new ArrayList<>();
        Optional<Double> endS = Asked.hourEnd(outcome.model().plan(), until.toString(), faults);
        face.ifPresent(name -> Asked.known("--face", name, faces(), "face of a chamber", faults));
        if (!faults.isEmpty()) {
            throw new BadInput(faults);
        }
        return WhyAdvice.told(
                outcome.model(),
                new WhyAdvice.Question(chamber.id(), until.toString(), face, lotId),
                endS.orElseThrow());
    }

    /**
     * Returns the faces that can be asked for.
     *
     * @return their names
     */
    public List<String> faces() {
        return chamber.enclosure().faces().stream()
                .map(one -> one.name().name().toLowerCase(Locale.ROOT))
                .toList();
    }

    /**
     * Returns whether no fan stirs the air, so that a section tells more than one temperature.
     *
     * @return true if so
     */
    public boolean isStill() {
        return StillChamber.stirredBy(chamber).isEmpty();
    }

    /**
     * Returns how often the door is planned to be opened.
     *
     * @return openings a day; empty where there is no door
     */
    public OptionalDouble openingsPerDay() {
        return chamber.enclosure().door().stream().mapToDouble(Door::openingsPerDay).findFirst();
    }
}
