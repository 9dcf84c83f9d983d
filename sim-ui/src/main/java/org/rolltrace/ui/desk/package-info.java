/** The window: application, wiring and style sheets. */
package org.rolltrace.ui.desk;
