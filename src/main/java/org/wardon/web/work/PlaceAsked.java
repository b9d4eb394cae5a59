package org.wardon.web.work;

import org.wardon.advice.placing.PlaceQuestion;
import org.wardon.plan.PlaceWish;

/**
 * What a placing is asked to seek.
 *
 * @param wish what comes first
 * @param question which lots may be moved
 */
public record PlaceAsked(PlaceWish wish, PlaceQuestion question) {}
