/**
 * Lives of many crops pooled: how steeply each ages with temperature, learnt from all at once.
 *
 * <p>Lives here: the points, what makes two of them alike, the deviations between crops and
 * sources, and the pooled answer with its uncertainty. It runs when the tables are made, never in
 * an answer.
 *
 * <p>May import: {@code java}, Commons Math, {@code errors}.
 *
 * <p>Units: °C, days, kJ/mol; lives enter as natural logarithms.
 */
@NullMarked
package org.wardon.keeping.pooling;

import org.jspecify.annotations.NullMarked;
