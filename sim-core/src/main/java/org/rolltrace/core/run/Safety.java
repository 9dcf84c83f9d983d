package org.rolltrace.core.run;

/** The words that stand beside every result. */
public final class Safety {
  /** What a result may be used for, and what it must give way to. */
  public static final String NOTICE =
      "Results are for planning and study. Roll tests can exceed the structural and control limits of"
          + " an aeroplane: flight must follow the flight manual, the applicable regulations and"
          + " licensed flight-test practice.";

  private Safety() {}
}
