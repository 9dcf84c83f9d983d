/**
 * Where work is done: on the spot, or on threads beside the window. Whoever asks for it owns its
 * state on one thread and is handed the results there.
 */
package org.rolltrace.ui.task;
