/** The entry point, which chooses the front end. */
package org.rolltrace.ui.launch;
