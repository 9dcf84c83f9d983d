/**
 * The values a run is made of: an aeroplane beside its derivatives, the condition it flies in, what
 * is assumed of the slip, how it starts and what the pilot does.
 */
package org.rolltrace.core.scenario;
