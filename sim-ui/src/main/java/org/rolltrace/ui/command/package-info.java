/**
 * The command line. Results go to standard output, progress, cautions and faults to standard error.
 *
 * <p>Exit codes: 0 done and every judged requirement met; 1 done, some requirement not met; 2 bad
 * arguments or input file; 3 the calculation failed, or a result could not be written.
 */
package org.rolltrace.ui.command;
