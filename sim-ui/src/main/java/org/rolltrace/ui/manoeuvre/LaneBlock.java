package org.rolltrace.ui.manoeuvre;

import java.util.ArrayList;
import java.util.List;
import org.rolltrace.core.files.ScenarioDocument;
import org.rolltrace.core.pilot.Control;
import org.rolltrace.core.pilot.DoubletInput;
import org.rolltrace.core.pilot.HoldInput;
import org.rolltrace.core.pilot.InputShape;
import org.rolltrace.core.pilot.PilotInput;

/**
 * An input as a block on its lane, and what dragging does to it. Times are kept to a hundredth of a
 * second and sizes to a hundredth of the travel, as a hand would type them.
 *
 * @param index of the input in the scenario
 * @param input the input as it is now
 */
record LaneBlock(int index, PilotInput input) {
  private static final double TICK = 0.01;

  /** What dividing a whole number of ticks by the tick may be off by. */
  private static final double ROUNDING = 1e-9;

  /** The part of a block that is dragged. */
  enum Part {
    /** The whole block, along the time axis. */
    BODY,
    /** The top edge, which sets the size. */
    TOP,
    /** The right edge, which sets how long it lasts. */
    END,
    /** The end of the first movement of the hand. */
    HAND
  }

  static List<LaneBlock> of(List<PilotInput> inputs) {
    List<LaneBlock> blocks = new ArrayList<>();
    for (int i = 0; i < inputs.size(); i++) {
      blocks.add(new LaneBlock(i, inputs.get(i)));
    }
    return blocks;
  }

  Control control() {
    return input.control();
  }

  InputShape shape() {
    return input.shape();
  }

  /** Where the block ends on a lane that shows times up to {@code last}. */
  double shownEnd(double last) {
    return Math.min(shape().end(), last);
  }

  String path(String key) {
    return "$.inputs[" + index + "]." + key;
  }

  private String seconds(double value) {
    return Written.seconds(ticks(Math.rint(value / TICK)));
  }

  private static double ticks(double count) {
    return count * TICK;
  }

  /** The document after the block has been dragged by some time. */
  ScenarioDocument moved(ScenarioDocument document, double byTime) {
    return document.with(path("start"), seconds(Math.max(0, shape().start() + byTime)));
  }

  /** The document with another size, fraction of travel. */
  ScenarioDocument resized(ScenarioDocument document, double size) {
    double kept = Math.max(-1, Math.min(1, Math.rint(size / TICK) * TICK));
    return document.withNumber(path("size"), Written.plain(kept, 2));
  }

  /** The document with the block's right edge at a time; a step has no right edge to drag. */
  ScenarioDocument stretched(ScenarioDocument document, double toTime) {
    double least = Math.max(TICK, ticks(Math.ceil(shape().handTime() / TICK - ROUNDING)));
    if (shape() instanceof HoldInput) {
      double duration = toTime - shape().start() - shape().handTime();
      return document.with(path("duration"), seconds(Math.max(least, duration)));
    }
    if (shape() instanceof DoubletInput) {
      double width = 0.5 * (toTime - shape().start() - shape().handTime());
      return document.with(path("width"), seconds(Math.max(least, width)));
    }
    return document;
  }

  boolean canStretch() {
    return shape().end() < Double.POSITIVE_INFINITY;
  }

  /** The document with the first movement of the hand ending at a time. */
  ScenarioDocument handUntil(ScenarioDocument document, double toTime) {
    double longest =
        shape() instanceof HoldInput hold
            ? hold.duration()
            : shape() instanceof DoubletInput doublet ? doublet.width() : Double.MAX_VALUE;
    double hand = Math.max(0, toTime - shape().start());
    double most = ticks(Math.floor(longest / TICK + ROUNDING));
    return document.with(path("movement"), seconds(Math.min(most, hand)));
  }
}
