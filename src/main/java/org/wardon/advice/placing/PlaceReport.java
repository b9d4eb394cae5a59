package org.wardon.advice.placing;

import org.wardon.files.forecast.PlaceAnswer;
import org.wardon.plan.StorePlan;

/**
 * A placing, and the plan it makes of the one asked about.
 *
 * @param asked the plan asked about
 * @param proposed the same with chambers set and lots placed as proposed
 * @param answer what is told of it
 */
public record PlaceReport(StorePlan asked, StorePlan proposed, PlaceAnswer answer) {}
