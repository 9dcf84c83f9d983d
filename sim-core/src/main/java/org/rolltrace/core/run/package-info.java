/**
 * The main path: a scenario becomes a trimmed aeroplane, a time history, measures and cautions.
 *
 * <p>{@link org.rolltrace.core.run.ScenarioRun} reads like that line. Every front end goes through
 * it.
 *
 * <p>What an aeroplane is before it is flown, its derivatives with their origin, what follows from
 * them, and what its variants change, is a {@link org.rolltrace.core.run.DerivativeReport}.
 */
package org.rolltrace.core.run;
