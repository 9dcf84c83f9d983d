/** Questions and messages in windows of their own. */
package org.rolltrace.ui.dialog;
