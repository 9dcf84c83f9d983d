package org.rolltrace.core.flight;

/** Says which instants of a flight become samples, besides those at which something breaks. */
interface SampleClock {
  /** Comes to a step, or to the rest of one after an event, s. */
  void enter(double from, double to);

  /** When the next sample is due, s; beyond the step when there is none left in it. */
  double due();

  /** Goes on to the sample after the one that is due. */
  void advance();

  /** Goes on where an instant that breaks, s, has been recorded anyway. */
  void pass(double time);
}
