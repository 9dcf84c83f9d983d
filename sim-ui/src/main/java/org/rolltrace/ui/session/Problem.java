package org.rolltrace.ui.session;

/**
 * Something that could not be done.
 *
 * @param title what could not be done, a few words
 * @param message why, and the way out
 */
public record Problem(String title, String message) {}
