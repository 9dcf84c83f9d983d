package org.rolltrace.ui.chart;

/** Which point of a text stands at the x of its label. */
public enum Anchor {
  /** The beginning: the text runs to the right. */
  START,
  /** The middle. */
  MIDDLE,
  /** The end: the text runs up to it. */
  END
}
