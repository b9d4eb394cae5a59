package org.wardon.web.api.told;

/**
 * What a program carries from now on.
 *
 * @param bearer the word for {@code Authorization: Bearer}
 * @param silentMostHours it ends after being silent so long, h
 */
public record Entered(String bearer, double silentMostHours) {}
