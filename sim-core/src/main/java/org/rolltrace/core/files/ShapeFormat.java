package org.rolltrace.core.files;

import java.util.Map;
import java.util.Optional;
import org.rolltrace.core.pilot.InputShape;

/** How one shape of input is written. */
interface ShapeFormat {

  /** The word that stands for it. */
  String word();

  /** All its keys. */
  Keys keys();

  /** What its own keys say in a new input. */
  Map<String, String> usual();

  /** The size of a new input. */
  default String usualSize() {
    return "0.5";
  }

  /**
   * Makes the shape of its own keys and of what all shapes share.
   *
   * @param in the input; what is wrong is added to its faults
   * @param common start, size and movement, and what the scenario carries
   * @return the shape, or empty when something is wrong
   */
  Optional<InputShape> read(ObjectCursor in, Common common);

  /**
   * What all shapes share, s and fraction of travel; NaN where it was refused. Where a shape may do
   * without, start is 0 and size 1.
   *
   * @param carried texts of trace files, by their names, that are in no file yet
   */
  record Common(double start, double size, double movement, Map<String, String> carried) {}
}
