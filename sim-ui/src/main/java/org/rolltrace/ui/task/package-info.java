/** Where work is done: on the spot, or on a thread beside the window. */
package org.rolltrace.ui.task;
