package org.wardon.web.work;

import org.wardon.logbook.KeptPlan;
import org.wardon.logbook.PlanText;
import org.wardon.reference.ReferenceBook;

/**
 * A kept plan that somebody looks at.
 *
 * @param kept where it stands in the book
 * @param text its text and files
 * @param reading what reading it gave
 * @param book the reference book it was read with
 */
public record OpenPlan(KeptPlan kept, PlanText text, Reading reading, ReferenceBook book) {}
