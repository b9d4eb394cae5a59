package org.wardon.heat;

import java.util.EnumMap;
import java.util.Map;
import java.util.Objects;

/**
 * The chamber's series. Row i stands at {@link #atS}, an hour after the one before (the last may be
 * shorter). Where the air is two, that which is not said to be the door end's is the coil end's.
 * Air, cooling, power, exchange, load, running and water used are those of the span before; all
 * else is at the instant.
 */
public final class Hours {
    private final Map<Column, double[]> columns = new EnumMap<>(Column.class);
    private final double[][] ran;
    private final int rows;

    /** The columns, in order. */
    enum Column {
        AT_S,
        AIR_C,
        AIR_LOWEST_C,
        AIR_HIGHEST_C,
        DOOR_END_C,
        DOOR_END_HUMIDITY,
        HUMIDITY,
        OUTDOOR_C,
        COOLING_W,
        POWER_W,
        CO2_PPM,
        EXCHANGE_M3S,
        FREE_M3,
        SUPPLY_C,
        BLOWS,
        CHILL_K,
        HUMIDITY_RATIO,
        RESPIRATION_W,
        WATER_OUT_C,
        WATER_USED_KG,
        ICE_KG,
        PANEL_W,
        BATTERY
    }

    /** Takes over what was recorded; the arrays may have room behind the last row. */
    Hours(Map<Column, double[]> columns, double[][] ran, int rows) {
        this.rows = rows;
        this.ran = ran;
        this.columns.putAll(columns);
    }

    private double get(Column column, int i) {
        return Objects.requireNonNull(columns.get(column))[i];
    }

    /**
     * Returns the number of rows.
     *
     * @return at least 1
     */
    public int size() {
        return rows;
    }

    /**
     * Returns the time of a row.
     *
     * @param i row
     * @return s since the start of the run
     */
    public double atS(int i) {
        return get(Column.AT_S, i);
    }

    /**
     * Returns the mean air temperature of the span before.
     *
     * @param i row
     * @return °C
     */
    public double airC(int i) {
        return get(Column.AIR_C, i);
    }

    /**
     * Returns the mean air temperature at the door end in the span before.
     *
     * @param i row
     * @return °C; NaN where the air is one
     */
    public double doorEndC(int i) {
        return get(Column.DOOR_END_C, i);
    }

    /**
     * Returns the relative humidity at the door end at the instant.
     *
     * @param i row
     * @return 0 to 1; NaN where the air is one
     */
    public double doorEndHumidityFraction(int i) {
        return get(Column.DOOR_END_HUMIDITY, i);
    }

    /**
     * Returns the lowest air temperature of the span before.
     *
     * @param i row
     * @return °C
     */
    public double airLowestC(int i) {
        return get(Column.AIR_LOWEST_C, i);
    }

    /**
     * Returns the highest air temperature of the span before.
     *
     * @param i row
     * @return °C
     */
    public double airHighestC(int i) {
        return get(Column.AIR_HIGHEST_C, i);
    }

    /**
     * Returns the relative humidity at the instant.
     *
     * @param i row
     * @return 0 to 1
     */
    public double humidityFraction(int i) {
        return get(Column.HUMIDITY, i);
    }

    /**
     * Returns the outdoor air at the instant.
     *
     * @param i row
     * @return °C
     */
    public double outdoorC(int i) {
        return get(Column.OUTDOOR_C, i);
    }

    /**
     * Returns the mean heat taken by coolers in the span before.
     *
     * @param i row
     * @return W
     */
    public double coolingW(int i) {
        return get(Column.COOLING_W, i);
    }

    /**
     * Returns the mean electric power of the span before.
     *
     * @param i row
     * @return W
     */
    public double powerW(int i) {
        return get(Column.POWER_W, i);
    }

    /**
     * Returns carbon dioxide at the instant.
     *
     * @param i row
     * @return ppm by volume
     */
    public double co2Ppm(int i) {
        return get(Column.CO2_PPM, i);
    }

    /**
     * Returns the mean exchange of air in the span before: leakage, fresh air, door, fans.
     *
     * @param i row
     * @return m3 of chamber air/s
     */
    public double exchangeM3s(int i) {
        return get(Column.EXCHANGE_M3S, i);
    }

    /**
     * Returns the free volume at the instant: chamber less lots.
     *
     * @param i row
     * @return m3
     */
    public double freeM3(int i) {
        return get(Column.FREE_M3, i);
    }

    /**
     * Returns the coldest air that left a cooler in the span before.
     *
     * @param i row
     * @return °C; NaN where none ran
     */
    public double supplyC(int i) {
        return get(Column.SUPPLY_C, i);
    }

    /**
     * Returns the share of the span before in which air left a cooler.
     *
     * @param i row
     * @return 0 to 1
     */
    public double blows(int i) {
        return get(Column.BLOWS, i);
    }

    /**
     * Returns how much colder than the room the air was that left a cooler, as a mean over the span
     * before, rests included.
     *
     * @param i row
     * @return K, 0 or more
     */
    public double chillK(int i) {
        return get(Column.CHILL_K, i);
    }

    /**
     * Returns the humidity ratio at the instant.
     *
     * @param i row
     * @return kg/kg
     */
    public double humidityRatio(int i) {
        return get(Column.HUMIDITY_RATIO, i);
    }

    /**
     * Returns the mean heat of respiration of the lots present in the span before.
     *
     * @param i row
     * @return W
     */
    public double respirationW(int i) {
        return get(Column.RESPIRATION_W, i);
    }

    /**
     * Returns the mean temperature of the water that left the faces in the span before.
     *
     * @param i row
     * @return °C; NaN where no water ran
     */
    public double waterOutC(int i) {
        return get(Column.WATER_OUT_C, i);
    }

    /**
     * Returns the water coolers used up in the span before.
     *
     * @param i row
     * @return kg
     */
    public double waterUsedKg(int i) {
        return get(Column.WATER_USED_KG, i);
    }

    /**
     * Returns the share of the span before that a cooler ran.
     *
     * @param cooler number of the cooler in the run
     * @param i row
     * @return 0 to 1
     */
    public double ran(int cooler, int i) {
        return ran[cooler][i];
    }

    /**
     * Returns the ice in the chamber at the instant.
     *
     * @param i row
     * @return kg; NaN where there is no bank of ice
     */
    public double iceKg(int i) {
        return get(Column.ICE_KG, i);
    }

    /**
     * Returns what solar panels could give, mean of the span before.
     *
     * @param i row
     * @return W; 0 without a solar supply
     */
    public double panelW(int i) {
        return get(Column.PANEL_W, i);
    }

    /**
     * Returns the charge of the battery at the instant.
     *
     * @param i row
     * @return 0 to 1; 0 without a solar supply
     */
    public double batteryShare(int i) {
        return get(Column.BATTERY, i);
    }
}
