/** What the window edits and remembers, without any of its nodes. */
package org.rolltrace.ui.session;
