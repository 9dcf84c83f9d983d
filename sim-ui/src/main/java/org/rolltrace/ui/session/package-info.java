/**
 * What the window edits and remembers, without any of its nodes.
 *
 * <p>{@link org.rolltrace.ui.session.DeskSession} holds the open scenario as it is written, its
 * history of edits, and the last result that came of it. Every change of the document is checked
 * and flown by a {@link org.rolltrace.ui.task.Runner}; what is wrong is state, never an exception:
 * faults of the text, failure of the calculation, a problem with a file. All of it belongs to one
 * thread, to which the runner hands over its results.
 *
 * <p>{@link org.rolltrace.ui.session.RecoveryStore} keeps unsaved work, with the traces that were
 * flown by hand, until it is saved, undone or given up. {@link
 * org.rolltrace.ui.session.ReplayClock} is where a replay stands.
 */
package org.rolltrace.ui.session;
