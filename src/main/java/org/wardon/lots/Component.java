package org.wardon.lots;

/** A component of food; {@link ChoiOkos} says how each takes, holds and conducts heat. */
public enum Component {
    /** Liquid water. */
    WATER,
    /** Protein. */
    PROTEIN,
    /** Fat. */
    FAT,
    /** Carbohydrate without fibre. */
    CARBOHYDRATE,
    /** Fibre. */
    FIBRE,
    /** Ash. */
    ASH
}
