/**
 * Which lot goes where, and who may share: the pages that seek a placing, tell it, and put it into
 * the plan.
 *
 * <p>Lives here: what is asked, views of the answer, the ruler of temperatures. What is best, what
 * it is worth and who may share is worked out in {@code advice}; nothing of that here.
 *
 * <p>May import: {@code web.pages}, {@code web.work}, {@code web.guard}, desk, shelf and {@code
 * plan}.
 */
@NullMarked
package org.wardon.web.placing;

import org.jspecify.annotations.NullMarked;
