package org.rolltrace.ui.manoeuvre;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.DoubleStream;
import org.rolltrace.core.files.ScenarioDocument;
import org.rolltrace.core.pilot.Control;
import org.rolltrace.core.pilot.DoubletInput;
import org.rolltrace.core.pilot.HoldInput;
import org.rolltrace.core.pilot.InputShape;
import org.rolltrace.core.pilot.Movement;
import org.rolltrace.core.pilot.MultistepInput;
import org.rolltrace.core.pilot.PilotInput;
import org.rolltrace.core.pilot.RampInput;
import org.rolltrace.core.pilot.SweepInput;
import org.rolltrace.core.pilot.TraceInput;
import org.rolltrace.ui.chart.TimeWindow;
import org.rolltrace.ui.control.Written;

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

  /** With more corners than this in view a movement is drawn by points instead. */
  private static final int MOST_CORNERS = 2000;

  /** More recorded points than this are not told apart. */
  private static final int MOST_POINTS = 120;

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
    double from = shape() instanceof TraceInput trace ? trace.shift() : shape().start();
    return document.with(path("start"), seconds(Math.max(0, from + byTime)));
  }

  /** The document with another size, fraction of travel. */
  ScenarioDocument resized(ScenarioDocument document, double size) {
    // The size of a trace in the file is a factor to what was recorded.
    double written =
        shape() instanceof TraceInput trace && trace.size() != 0
            ? size / trace.size() * trace.scale()
            : size;
    double kept = Math.max(-1, Math.min(1, Math.rint(written / TICK) * TICK));
    return document.withNumber(path("size"), Written.plain(kept, 2));
  }

  /** The document with the block's right edge at a time; what stays has no right edge to drag. */
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
    if (shape() instanceof MultistepInput multistep) {
      double unit = (toTime - shape().start() - shape().handTime()) / multistep.units();
      return document.with(path("unit"), seconds(Math.max(least, unit)));
    }
    if (shape() instanceof SweepInput) {
      double duration = toTime - shape().start();
      return document.with(path("duration"), seconds(Math.max(least, duration)));
    }
    return document;
  }

  /**
   * The points of a recorded movement that are in view, as far as they can be told apart.
   *
   * @param window what is looked at, s
   * @return time, s, and position of each; none when there are too many, or nothing was recorded
   */
  List<double[]> recordedPoints(TimeWindow window) {
    List<double[]> points = new ArrayList<>();
    if (shape() instanceof TraceInput recorded) {
      double[] times = recorded.trace().times();
      double[] positions = recorded.trace().positions();
      for (int i = 0; i < times.length && points.size() <= MOST_POINTS; i++) {
        double time = times[i] + recorded.shift();
        if (time >= window.from() && time <= window.to()) {
          points.add(new double[] {time, recorded.scale() * positions[i]});
        }
      }
    }
    return points.size() <= MOST_POINTS ? points : List.of();
  }

  boolean canStretch() {
    return shape().end() < Double.POSITIVE_INFINITY && !(shape() instanceof TraceInput);
  }

  /** Whether there is a first movement of the hand to be drawn out. */
  boolean hasHand() {
    return !(shape() instanceof TraceInput || shape() instanceof SweepInput);
  }

  /** The document with the first movement of the hand ending at a time. */
  ScenarioDocument handUntil(ScenarioDocument document, double toTime) {
    if (shape() instanceof RampInput) {
      double duration = Math.max(TICK, toTime - shape().start());
      return document.with(path("duration"), seconds(duration));
    }
    double longest = Double.MAX_VALUE;
    if (shape() instanceof HoldInput hold) {
      longest = hold.duration();
    } else if (shape() instanceof DoubletInput doublet) {
      longest = doublet.width();
    } else if (shape() instanceof MultistepInput multistep) {
      longest = multistep.unit();
    }
    double hand = Math.max(0, toTime - shape().start());
    double most = ticks(Math.floor(longest / TICK + ROUNDING));
    return document.with(path("movement"), seconds(Math.min(most, hand)));
  }

  /**
   * The outline of the block from its start to its end, jumps as two corners, a smooth movement by
   * points that lie {@code step} apart.
   *
   * @param window what is looked at, s; what lies outside is left out
   * @param step s
   * @return time, s, and position of each corner
   */
  List<double[]> outline(TimeWindow window, double step) {
    Movement movement = shape().movement();
    double from = Math.max(shape().start(), window.from());
    double end = Math.max(from, shownEnd(Math.max(window.to(), shape().start())));
    List<double[]> corners = new ArrayList<>();
    corners.add(new double[] {from, 0});
    corners.add(new double[] {from, movement.positionAt(from)});
    double[] breaks =
        DoubleStream.of(movement.breakpoints()).filter(at -> at > from && at <= end).toArray();
    if (shape() instanceof SweepInput || breaks.length > MOST_CORNERS) {
      for (int i = 1; from + i * step < end; i++) {
        corners.add(new double[] {from + i * step, movement.positionAt(from + i * step)});
      }
    } else {
      for (double at : breaks) {
        corners.add(new double[] {at, movement.positionAt(Math.nextDown(at))});
        corners.add(new double[] {at, movement.positionAt(at)});
      }
    }
    corners.add(new double[] {end, movement.positionAt(end)});
    corners.add(new double[] {end, 0});
    return corners;
  }
}
