/**
 * Strict JSON: text to a tree, a tree against the schema, every fault with its path.
 *
 * <p>Lives here: the tree, its reader, the check against our own schema in words a keeper
 * understands, the nearest known name.
 *
 * <p>May import: {@code java}, JSON, {@code errors}.
 */
@NullMarked
package org.wardon.files.json;

import org.jspecify.annotations.NullMarked;
