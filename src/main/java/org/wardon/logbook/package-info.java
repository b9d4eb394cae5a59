/**
 * What a keeper keeps: plans with all their versions, in {@code store.db}.
 *
 * <p>Lives here: kept plans, their history, undo and redo, saves that two people cannot lose to
 * each other.
 *
 * <p>May import: {@code reference}, {@code files}, {@code plan} and everything below; not {@code
 * advice}.
 */
@NullMarked
package org.wardon.logbook;

import org.jspecify.annotations.NullMarked;
