/**
 * What the workplaces of the window are built of: fields bound to values of the scenario, the
 * cautions, and the painter of drawings on a canvas.
 */
package org.rolltrace.ui.control;
