package org.rolltrace.core.pilot;

/**
 * One input on one control.
 *
 * @param control what is moved
 * @param shape how
 */
public record PilotInput(Control control, InputShape shape) {}
