/**
 * Places the lots of a store plan: what each chamber can make and take in this weather, what each
 * lot is worth there, the search for the best placing, and the full model's word on it.
 */
@NullMarked
package org.wardon.advice.placing;

import org.jspecify.annotations.NullMarked;
