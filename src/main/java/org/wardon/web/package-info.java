/**
 * The local pages: a small server on this machine.
 *
 * <p>Lives here: starting and stopping, and the one list of routes. Inner rooms: {@code guard} for
 * everything defensive, {@code work} for open plans and forecasts being computed, {@code pages} for
 * what people see, {@code api} for JSON.
 *
 * <p>May import: {@code errors}, {@code air}, {@code produce}, {@code plan}, {@code reference},
 * {@code files}, {@code advice} and {@code logbook}; Javalin, jte and Jackson.
 */
@NullMarked
package org.wardon.web;

import org.jspecify.annotations.NullMarked;
