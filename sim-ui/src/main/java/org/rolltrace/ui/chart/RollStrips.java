package org.rolltrace.ui.chart;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.rolltrace.core.flight.FlightEvent;
import org.rolltrace.core.history.Channel;
import org.rolltrace.core.history.TimeHistory;
import org.rolltrace.core.measures.Measure;
import org.rolltrace.core.motion.Disturbance;
import org.rolltrace.core.pilot.Control;
import org.rolltrace.core.pilot.InputShape;
import org.rolltrace.core.pilot.PilotInput;
import org.rolltrace.core.run.RunResult;
import org.rolltrace.core.scenario.Scenario;

/** The strips of a roll: bank, roll rate, sideslip with yaw rate, stick with pedal, surfaces. */
public final class RollStrips {
  /** Title of the strip of stick and pedal, which the lanes of the window show in its place. */
  public static final String HANDS = "Stick, pedal";

  private static final double WIDTH = 1.8;
  private static final double GHOST_WIDTH = 1.4;
  private static final double GHOST_OPACITY = 0.6;

  private RollStrips() {}

  /**
   * The strips of a run, with those of another one behind. A run takes the ink of the side it rolls
   * to; the second quantity of a strip is told by its dash, the other run by dash and tint.
   *
   * @param result the run
   * @param ghost the run it is compared with
   * @return bank; roll rate; sideslip and yaw rate; stick and pedal, in per cent of travel; aileron
   *     and rudder; and where the power changes, the power that the propellers get
   */
  public static List<Strip> of(RunResult result, Optional<RunResult> ghost) {
    Run run = Run.of(result, false);
    List<Run> runs = new ArrayList<>(List.of(run));
    ghost.ifPresent(other -> runs.add(Run.of(other, true)));
    List<Strip> strips = new ArrayList<>(always(result, runs));
    if (runs.stream().anyMatch(Run::changesPower)) {
      strips.add(
          new Strip("Power", "% of rated", curves(runs, Channel.POWER), leverMarkers(result)));
    }
    return strips;
  }

  private static List<Strip> always(RunResult result, List<Run> runs) {
    return List.of(
        new Strip("Bank", "deg", curves(runs, Channel.BANK), captures(result)),
        new Strip("Roll rate", "deg/s", curves(runs, Channel.ROLL_RATE), rateMarkers(result)),
        new Strip(
            "Sideslip, yaw rate",
            "deg, deg/s",
            curves(runs, Channel.SIDESLIP, Channel.YAW_RATE),
            List.of()),
        new Strip(
            HANDS,
            "% of travel",
            curves(runs, Channel.STICK, Channel.PEDAL),
            controlMarkers(result)),
        new Strip(
            "Aileron, rudder",
            "deg",
            curves(runs, Channel.AILERON, Channel.RUDDER),
            surfaceMarkers(result)));
  }

  /**
   * The time that a run covers.
   *
   * @param result the run
   * @return from 0 to its end
   */
  public static TimeWindow window(RunResult result) {
    return new TimeWindow(0, result.scenario().duration());
  }

  /**
   * The ink of the side that a run rolls to.
   *
   * @param result the run
   * @return {@link Ink#LEFT} or {@link Ink#RIGHT}, by its leading input; without one by how it
   *     starts, and else by where it ends
   */
  public static Ink side(RunResult result) {
    Scenario scenario = result.scenario();
    Disturbance start = scenario.start().disturbance();
    double input =
        scenario
            .programme()
            .leading(scenario.duration())
            .map(first -> first.shape().size())
            .orElse(0.0);
    double end = result.history().value(Channel.BANK, result.history().size() - 1);
    for (double side : new double[] {input, start.bank(), start.rollRate(), end}) {
      if (side != 0) {
        return side < 0 ? Ink.LEFT : Ink.RIGHT;
      }
    }
    return Ink.RIGHT;
  }

  private static List<Curve> curves(List<Run> runs, Channel... channels) {
    List<Curve> curves = new ArrayList<>();
    for (Run run : runs) {
      for (int i = 0; i < channels.length; i++) {
        if (run.moves(channels[i])) {
          curves.add(run.curve(channels[i], i > 0));
        }
      }
    }
    return curves;
  }

  private static List<Marker> captures(RunResult result) {
    List<Marker> markers = new ArrayList<>();
    for (FlightEvent event : result.events()) {
      if (event instanceof FlightEvent.BankCapture capture) {
        double degrees = Math.toDegrees(capture.change());
        boolean whole = Math.abs(degrees - Math.rint(degrees)) < 1e-9;
        markers.add(new Marker(capture.time(), Ticks.figure(degrees, whole ? 0 : 1) + "°"));
      }
    }
    return markers;
  }

  private static List<Marker> rateMarkers(RunResult result) {
    List<Marker> markers = new ArrayList<>();
    result
        .scenario()
        .programme()
        .leading(result.scenario().duration())
        .map(PilotInput::shape)
        .ifPresent(
            input -> {
              addAfter(markers, middleOf(input), value(result, "responseTimeConstant"), "63 %");
              addAfter(markers, input.start(), value(result, "settlingTime"), "settled");
            });
    markers.addAll(controlMarkers(result));
    return markers;
  }

  private static double middleOf(InputShape input) {
    return input.start() + 0.5 * input.handTime();
  }

  private static OptionalDouble value(RunResult result, String measure) {
    return result.measure(measure).map(Measure::value).orElse(OptionalDouble.empty());
  }

  private static void addAfter(
      List<Marker> markers, double start, OptionalDouble time, String word) {
    time.ifPresent(after -> markers.add(new Marker(start + after, word)));
  }

  private static List<Marker> controlMarkers(RunResult result) {
    return result.scenario().programme().firstCentring().stream()
        .mapToObj(time -> new Marker(time, "released"))
        .toList();
  }

  private static List<Marker> surfaceMarkers(RunResult result) {
    List<Marker> markers = new ArrayList<>();
    for (FlightEvent event : result.events()) {
      if (event instanceof FlightEvent.Stop stop
          && stop.reached()
          && stop.control() != Control.POWER) {
        markers.add(new Marker(stop.time(), surface(stop.control()) + " at stop"));
      } else if (event instanceof FlightEvent.RateLimit limit && limit.began()) {
        markers.add(new Marker(limit.time(), surface(limit.control()) + " at rate limit"));
      }
    }
    return markers;
  }

  private static List<Marker> leverMarkers(RunResult result) {
    List<Marker> markers = new ArrayList<>();
    for (FlightEvent event : result.events()) {
      if (event instanceof FlightEvent.Stop stop
          && stop.reached()
          && stop.control() == Control.POWER) {
        markers.add(new Marker(stop.time(), "lever at stop"));
      }
    }
    return markers;
  }

  private static String surface(Control control) {
    return switch (control) {
      case STICK -> "aileron";
      case PEDAL -> "rudder";
      case POWER -> "propeller";
    };
  }

  /** A run with what all its curves share. */
  private record Run(
      TimeHistory history, Scenario scenario, List<double[]> time, Ink side, boolean ghost) {
    static Run of(RunResult result, boolean ghost) {
      TimeHistory history = result.history();
      double[] time = new double[history.size()];
      for (int i = 0; i < time.length; i++) {
        time[i] = history.time(i);
      }
      return new Run(history, result.scenario(), List.of(time), RollStrips.side(result), ghost);
    }

    boolean changesPower() {
      return scenario.programme().power().largestPosition() > 0;
    }

    /** Whether the aeroplane has what the channel is about. */
    boolean moves(Channel channel) {
      return switch (channel) {
        case STICK, AILERON -> scenario.data().aeroplane().ailerons().isPresent();
        case PEDAL, RUDDER -> scenario.data().aeroplane().rudder().isPresent();
        default -> true;
      };
    }

    Curve curve(Channel channel, boolean second) {
      double[] value = history.values(channel);
      double factor = channel.unit().startsWith("rad") ? Math.toDegrees(1) : 100;
      for (int i = 0; i < value.length; i++) {
        value[i] *= factor;
      }
      return new Curve(
          ghost ? name(channel) + ", kept" : name(channel), time.get(0), value, stroke(second));
    }

    private Stroke stroke(boolean second) {
      return ghost
          ? new Stroke(side, GHOST_WIDTH, second ? Dash.DOTTED : Dash.DASHED, GHOST_OPACITY)
          : new Stroke(side, WIDTH, second ? Dash.DASH_DOT : Dash.SOLID, 1);
    }

    private static String name(Channel channel) {
      return switch (channel) {
        case BANK -> "bank";
        case ROLL_RATE -> "roll rate";
        case YAW_RATE -> "yaw rate";
        case SIDESLIP -> "sideslip";
        case STICK -> "stick";
        case PEDAL -> "pedal";
        case AILERON -> "aileron";
        case RUDDER -> "rudder";
        case ROLL_ACCELERATION -> "roll acceleration";
        case POWER -> "power";
        case PROPELLER_ROLL_MOMENT -> "propeller roll moment";
        case PROPELLER_YAW_MOMENT -> "propeller yaw moment";
      };
    }
  }
}
