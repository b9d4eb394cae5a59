/**
 * Which lot stands in which chamber at which setting, so that most is kept of all of them.
 *
 * <p>Lives here: the problem as pure numbers, the search for the best placing and the bound that
 * says how far from the best it can be at most. Nothing here knows a crop: what a lot is worth,
 * what heat it gives and whom it harms stand in the {@link org.wardon.sharing.placing.Climate} of
 * each setting.
 *
 * <p>The search: prices on lots split the store into chambers; of each chamber the best setting and
 * load at those prices is found exactly where it can be, and its sum bounds every placing from
 * above (Lagrangian relaxation, M. L. Fisher, Management Science 27, 1981, from memory). Placings
 * are repaired from those loads and polished chamber by chamber; what gap is left is closed by
 * branching. All limits are counts of steps, never seconds: equal problems give equal answers.
 *
 * <p>May import: {@code sharing}, {@code keeping} and what they may import.
 *
 * <p>Units: kg, m3, W, days counted from the start of the plan, currency of the plan.
 */
@NullMarked
package org.wardon.sharing.placing;

import org.jspecify.annotations.NullMarked;
