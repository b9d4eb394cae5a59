package org.wardon.produce;

import java.util.List;
import java.util.Optional;
import org.wardon.errors.Require;
import org.wardon.produce.rows.AmbientLife;
import org.wardon.produce.rows.ChillingExposure;
import org.wardon.produce.rows.ChillingFloor;
import org.wardon.produce.rows.CompositionRow;
import org.wardon.produce.rows.CuringRow;
import org.wardon.produce.rows.EthyleneEffect;
import org.wardon.produce.rows.EthyleneRate;
import org.wardon.produce.rows.GasInjury;
import org.wardon.produce.rows.GeometryRow;
import org.wardon.produce.rows.LifeCurveRow;
import org.wardon.produce.rows.LifeRow;
import org.wardon.produce.rows.MoistureLimit;
import org.wardon.produce.rows.MoistureLossRow;
import org.wardon.produce.rows.OdourPair;
import org.wardon.produce.rows.OwnLot;
import org.wardon.produce.rows.Q10Row;
import org.wardon.produce.rows.RespirationPower;
import org.wardon.produce.rows.RespirationRow;
import org.wardon.produce.rows.RipeningRow;
import org.wardon.produce.rows.SproutingRow;
import org.wardon.produce.rows.TranspirationRow;

/**
 * A commodity with all that print says of it. The handbook's own condition stands in {@code needs};
 * everywhere else all printed rows are kept, the chosen one first (the rule of choice stands where
 * the tables are read).
 *
 * @param id id of the tables
 * @param names common name first, then what people call it, the scientific name last
 * @param plantPart {@code fruit}, {@code leafy}, {@code root} and the like
 * @param climacteric whether the fruit ripens by itself after harvest
 * @param needs the handbook's condition, life and classes
 * @param body what an item is made of
 * @param breath respiration and ethylene
 * @param water transpiration and permissible loss
 * @param keeping lives, chilling, sprouting, curing
 * @param company odours and gases it gives or suffers from
 */
public record Commodity(
        String id,
        List<String> names,
        String plantPart,
        boolean climacteric,
        Needs needs,
        Body body,
        Breath breath,
        Water water,
        Keeping keeping,
        Company company) {
    /** Copies the names. */
    public Commodity {
        Require.text("id", id);
        names = List.copyOf(names);
    }

    /**
     * The handbook's recommendation.
     *
     * @param temperatureC storage temperature, °C; empty where nobody printed one
     * @param humidityPct storage humidity, percent
     * @param lifeDays life in that condition, days
     * @param highestFreezingC highest freezing point, °C
     * @param ethyleneProduction class {@code very-low} to {@code very-high}, empty where not
     *     printed
     * @param ethyleneSensitivity class {@code low}, {@code moderate}, {@code high}, empty where not
     *     printed
     * @param note the note of the table
     */
    public record Needs(
            Optional<Fact> temperatureC,
            Optional<Fact> humidityPct,
            Optional<Fact> lifeDays,
            Optional<Fact> highestFreezingC,
            String ethyleneProduction,
            String ethyleneSensitivity,
            String note) {}

    /**
     * What an item is made of.
     *
     * @param compositions printed compositions, chosen first
     * @param geometries printed shapes, chosen first
     */
    public record Body(List<CompositionRow> compositions, List<GeometryRow> geometries) {
        /** Copies the lists. */
        public Body {
            compositions = List.copyOf(compositions);
            geometries = List.copyOf(geometries);
        }
    }

    /**
     * Respiration and ethylene.
     *
     * @param respiration printed rates; rows of the chosen table first, by temperature
     * @param powers published power laws
     * @param ethylene printed ethylene rates
     */
    public record Breath(
            List<RespirationRow> respiration,
            List<RespirationPower> powers,
            List<EthyleneRate> ethylene) {
        /** Copies the lists. */
        public Breath {
            respiration = List.copyOf(respiration);
            powers = List.copyOf(powers);
            ethylene = List.copyOf(ethylene);
        }
    }

    /**
     * Transpiration and permissible loss.
     *
     * @param transpiration printed coefficients
     * @param limits printed permissible losses, chosen first; a row for produce in general comes
     *     last
     * @param losses printed daily losses
     */
    public record Water(
            List<TranspirationRow> transpiration,
            List<MoistureLimit> limits,
            List<MoistureLossRow> losses) {
        /** Copies the lists. */
        public Water {
            transpiration = List.copyOf(transpiration);
            limits = List.copyOf(limits);
            losses = List.copyOf(losses);
        }
    }

    /**
     * Lives, chilling, sprouting, curing.
     *
     * @param lives printed lives
     * @param q10s printed Q10 of the commodity; those of the class come last
     * @param floors lowest safe temperatures, all sources
     * @param exposures chilling exposures
     * @param sprouting sprouting rows
     * @param curing curing rows
     * @param ambient lives at market temperature
     * @param curves fitted curves of life, that of the commodity as a whole first
     * @param ripening printed times of ripening
     * @param ownLots lots of the keeper's own that are gone
     */
    public record Keeping(
            List<LifeRow> lives,
            List<Q10Row> q10s,
            List<ChillingFloor> floors,
            List<ChillingExposure> exposures,
            List<SproutingRow> sprouting,
            List<CuringRow> curing,
            List<AmbientLife> ambient,
            List<LifeCurveRow> curves,
            List<RipeningRow> ripening,
            List<OwnLot> ownLots) {
        /** Copies the lists. */
        public Keeping {
            lives = List.copyOf(lives);
            q10s = List.copyOf(q10s);
            floors = List.copyOf(floors);
            exposures = List.copyOf(exposures);
            sprouting = List.copyOf(sprouting);
            curing = List.copyOf(curing);
            ambient = List.copyOf(ambient);
            curves = List.copyOf(curves);
            ripening = List.copyOf(ripening);
            ownLots = List.copyOf(ownLots);
        }
    }

    /**
     * What it does to others and others to it.
     *
     * @param ethyleneEffects harms by ethylene
     * @param odours pairs in which it gives or takes a smell
     * @param gasInjuries gas levels that injure it
     */
    public record Company(
            List<EthyleneEffect> ethyleneEffects,
            List<OdourPair> odours,
            List<GasInjury> gasInjuries) {
        /** Copies the lists. */
        public Company {
            ethyleneEffects = List.copyOf(ethyleneEffects);
            odours = List.copyOf(odours);
            gasInjuries = List.copyOf(gasInjuries);
        }
    }
}
