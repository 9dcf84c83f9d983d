/**
 * The drawings that window and paper share. Nothing here knows a window toolkit: a drawing is a
 * {@link org.rolltrace.ui.chart.Sheet} of plain {@link org.rolltrace.ui.chart.Mark}s in px, x to
 * the right and y down, whose colours are roles ({@link org.rolltrace.ui.chart.Ink}). A painter
 * gives it a {@link org.rolltrace.ui.chart.Palette} and puts it on a surface: {@link
 * org.rolltrace.ui.chart.SvgPainter}, {@link org.rolltrace.ui.chart.PngPainter}, the window's own.
 *
 * <p>Two drawings share a time axis: {@link org.rolltrace.ui.chart.StripChart} has curves in strips
 * below each other, {@link org.rolltrace.ui.chart.WingTrace} the wing at even instants along the
 * path. Given the same width and margins, an instant stands at the same x in both.
 *
 * <p>About derivatives there are two pages: {@link org.rolltrace.ui.chart.ShapePicture} has the
 * aeroplane from above and from behind, to scale, {@link org.rolltrace.ui.chart.LoadingsPicture}
 * the loads along the span. The base is unbroken and dark, each variant has a colour and dash of
 * its own.
 *
 * <p>Blue is the right side and vermillion the left one throughout: of a roll, of a wing tip.
 */
package org.rolltrace.ui.chart;
