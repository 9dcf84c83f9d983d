/**
 * The main path: a scenario becomes a trimmed aeroplane, a time history, measures and cautions.
 *
 * <p>{@link org.rolltrace.core.run.ScenarioRun} reads like that line. Every front end goes through
 * it.
 */
package org.rolltrace.core.run;
