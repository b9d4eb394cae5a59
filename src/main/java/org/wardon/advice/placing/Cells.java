package org.wardon.advice.placing;

/**
 * What lots come to in an option.
 *
 * @param alone in its air, which other chambers may make too
 * @param there in the chamber
 */
record Cells(Lazily<Cell.Alone> alone, Lazily<Cell> there) {}
