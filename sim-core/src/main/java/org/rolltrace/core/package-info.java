/** The computing part of Rolltrace: a scenario flown through the roll equation. */
package org.rolltrace.core;
