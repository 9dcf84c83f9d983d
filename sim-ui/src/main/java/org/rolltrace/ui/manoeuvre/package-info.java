/**
 * The workplace where one manoeuvre is edited, seen and replayed. Views build nodes and bind;
 * models hold state and commands and know no node.
 */
package org.rolltrace.ui.manoeuvre;
