package org.rolltrace.core.flight;

import org.rolltrace.core.pilot.Control;

/** Something that happened at an instant of a manoeuvre. */
public sealed interface FlightEvent {

  /**
   * When it happened.
   *
   * @return s
   */
  double time();

  /**
   * The bank had changed by an angle for the first time, in the direction of the leading input.
   *
   * @param time s
   * @param change rad, above 0
   */
  record BankCapture(double time, double change) implements FlightEvent {}

  /**
   * A control met its stop, or left it.
   *
   * @param time s
   * @param control which one
   * @param reached true when it met the stop
   */
  record Stop(double time, Control control, boolean reached) implements FlightEvent {}

  /**
   * A surface began to move at its largest rate, or no longer had to.
   *
   * @param time s
   * @param control the control that moves the surface
   * @param began true when it began
   */
  record RateLimit(double time, Control control, boolean began) implements FlightEvent {}
}
