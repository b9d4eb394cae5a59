package org.wardon.web.pages;

/**
 * Work on its way.
 *
 * @param stage what is being done, in words
 * @param percent done of all, 0 to 100
 * @param poll where a script asks how far it is
 * @param cancel where a form asks to stop it
 */
public record ProgressView(String stage, int percent, String poll, String cancel) {}
