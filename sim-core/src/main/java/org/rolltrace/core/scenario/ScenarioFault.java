package org.rolltrace.core.scenario;

/**
 * Something that does not fit together in a scenario.
 *
 * @param path where, as a path in the scenario file such as {@code $.inputs[0].control}
 * @param message what was found, what was expected, and the way out
 */
public record ScenarioFault(String path, String message) {}
