/**
 * A store plan as a form: what stands at each place and may stand there, and changes to its text by
 * what was typed.
 *
 * <p>Lives here: places of a plan, changes, the JSON text kept as it stands all around them.
 *
 * <p>May import: what {@code files} may.
 */
@NullMarked
package org.wardon.files.form;

import org.jspecify.annotations.NullMarked;
