package org.rolltrace.ui.chart;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.OptionalDouble;
import org.rolltrace.core.run.RunResult;

/** Draws one wing trace. */
final class WingDrawing {
  private static final double EDGE = 8;

  /** The least distance from one wing to the next, px. */
  private static final double SPACING = 26;

  /** From one point of a helix to the next, px along the time axis. */
  private static final double RESOLUTION = 5;

  /** And at most so much bank, rad. */
  private static final double TURN = Math.toRadians(4);

  private static final int MOST_POINTS = 240;

  /** What is left of the strength at the far end of the past, and in the future. */
  private static final double FAINT = 0.25;

  private static final double RIGHT_SIDE = 1;
  private static final double LEFT_SIDE = -1;

  private final PlotArea area;
  private final OptionalDouble cursor;
  private final ObliqueView view;
  private final List<Mark> marks = new ArrayList<>();

  WingDrawing(PlotArea area, OptionalDouble cursor) {
    this.area = area;
    this.cursor = cursor;
    this.view = ObliqueView.filling(area.height(), EDGE);
  }

  List<Mark> marks() {
    return marks;
  }

  void addTitle(double span) {
    marks.add(
        new Mark.Label(
            0, TypeSize.NORMAL.pixels(), "Wing trace", Anchor.START, TypeSize.NORMAL, Ink.TEXT));
    marks.add(
        new Mark.Label(
            0,
            TypeSize.NORMAL.pixels() + 15,
            "span " + Ticks.figure(span, 1) + " m",
            Anchor.START,
            TypeSize.SMALL,
            Ink.QUIET));
  }

  void addPath() {
    marks.add(
        new Mark.Line(
            area.x(),
            view.middle(),
            area.x() + area.width(),
            view.middle(),
            Stroke.of(Ink.AXIS, 1)));
    // Where the tips are with wings level: against these a small bank shows, and its side.
    for (double side : new double[] {LEFT_SIDE, RIGHT_SIDE}) {
      double y = view.y(side, 0);
      double aside = view.aside(side, 0);
      marks.add(
          new Mark.Line(
              area.x() + aside,
              y,
              area.x() + area.width() + aside,
              y,
              new Stroke(Ink.AXIS, 1, Dash.DOTTED, 1)));
    }
  }

  void addGhost(RunResult ghost) {
    BankPath path = BankPath.of(ghost);
    double[] times = samples(path, instants(path));
    for (double side : new double[] {LEFT_SIDE, RIGHT_SIDE}) {
      Dash dash = side == RIGHT_SIDE ? Dash.DASHED : Dash.DOTTED;
      addHelix(path, times, 0, times.length - 1, side, new Stroke(ink(side), 1.2, dash, 0.55));
    }
    cursor.ifPresent(
        instant -> {
          if (isSeen(path, instant)) {
            double bank = path.at(instant);
            marks.add(half(instant, bank, LEFT_SIDE, new Stroke(Ink.WING, 1.4, Dash.DASHED, 0.6)));
            marks.add(half(instant, bank, RIGHT_SIDE, new Stroke(Ink.WING, 1.4, Dash.DASHED, 0.6)));
          }
        });
  }

  void addWings(RunResult result) {
    addWings(BankPath.of(result));
  }

  void addWings(BankPath path) {
    double[] instants = instants(path);
    if (instants.length < 2) {
      return;
    }
    double[] times = samples(path, instants);
    for (boolean near : new boolean[] {false, true}) {
      for (double side : new double[] {LEFT_SIDE, RIGHT_SIDE}) {
        addRibbon(path, instants, side, near);
        addEdges(path, times, side, near);
        addHalves(path, instants, side, near);
      }
    }
    cursor.ifPresent(
        instant -> {
          if (isSeen(path, instant)) {
            addStrongWing(instant, path.at(instant));
          }
        });
    addTipNames(path);
  }

  void addRearView(RunResult result, double instant) {
    double bank = BankPath.of(result).at(instant);
    double size = Math.min(area.x() - view.reach() - 20, area.height() - 84);
    if (size < 24) {
      return;
    }
    double middle = Math.max(view.middle(), 40 + 0.5 * size);
    marks.addAll(RearView.draw(bank, 0.5 * size, middle, size));
    double y = middle + 0.5 * size + 16;
    marks.add(
        new Mark.Label(
            0,
            y,
            "bank " + Ticks.figure(Math.toDegrees(bank), 1) + "°",
            Anchor.START,
            TypeSize.SMALL,
            Ink.TEXT));
    marks.add(
        new Mark.Label(
            0,
            y + 14,
            "at " + Ticks.figure(instant, 2) + " s",
            Anchor.START,
            TypeSize.SMALL,
            Ink.QUIET));
  }

  private static Ink ink(double side) {
    return side == RIGHT_SIDE ? Ink.RIGHT : Ink.LEFT;
  }

  private double from() {
    return Math.max(0, area.time().from());
  }

  private double to(BankPath path) {
    return Math.min(path.end(), area.time().to());
  }

  private boolean isSeen(BankPath path, double instant) {
    return instant >= from() && instant <= to(path);
  }

  /** The even instants, and the ends of what is seen. */
  private double[] instants(BankPath path) {
    double from = from();
    double to = to(path);
    if (!(to > from)) {
      return new double[0];
    }
    Ticks even = Ticks.of(from, to, Math.max(1, (to - from) * perSecond() / SPACING), false);
    double[] instants = new double[even.size() + 2];
    int size = 0;
    instants[size++] = from;
    for (int i = 0; i < even.size(); i++) {
      double instant = even.value(i);
      if (instant > from && instant < to) {
        instants[size++] = instant;
      }
    }
    instants[size++] = to;
    return Arrays.copyOf(instants, size);
  }

  private double perSecond() {
    return area.width() / area.time().length();
  }

  private double[] samples(BankPath path, double[] instants) {
    List<double[]> pieces = new ArrayList<>();
    int size = 0;
    for (int i = 0; i + 1 < instants.length; i++) {
      double[] piece = between(path, instants[i], instants[i + 1]);
      pieces.add(piece);
      size += piece.length;
    }
    double[] samples = new double[size];
    int next = 0;
    for (double[] piece : pieces) {
      System.arraycopy(piece, 0, samples, next, piece.length);
      next += piece.length;
    }
    return samples;
  }

  /** Instants close enough for a smooth helix, both ends included. */
  private double[] between(BankPath path, double from, double to) {
    double turn = Math.abs(path.at(to) - path.at(from));
    int steps =
        (int)
            Math.min(
                MOST_POINTS,
                1 + Math.ceil(Math.max((to - from) * perSecond() / RESOLUTION, turn / TURN)));
    double[] times = new double[steps + 1];
    for (int i = 0; i <= steps; i++) {
      times[i] = i == steps ? to : from + (to - from) * i / steps;
    }
    return times;
  }

  private double strength(double instant) {
    double now = cursor.orElse(area.time().to());
    return instant > now
        ? FAINT
        : 1 - (1 - FAINT) * Math.min(1, (now - instant) / area.time().length());
  }

  private double x(double instant, double station, double bank) {
    return area.xOf(instant) + view.aside(station, bank);
  }

  /** Pieces from wing to wing, so that their seams lie under the wings. */
  private void addRibbon(BankPath path, double[] instants, double side, boolean near) {
    for (int i = 0; i + 1 < instants.length; i++) {
      double middle = 0.5 * (instants[i] + instants[i + 1]);
      if (ObliqueView.isNear(side, path.at(middle)) != near) {
        continue;
      }
      double[] times = between(path, instants[i], instants[i + 1]);
      int count = times.length;
      double[] x = new double[2 * count];
      double[] y = new double[2 * count];
      for (int k = 0; k < count; k++) {
        double bank = path.at(times[k]);
        double inner = side * (0.94 - 0.14 * strength(times[k]));
        x[k] = x(times[k], side, bank);
        y[k] = view.y(side, bank);
        x[2 * count - 1 - k] = x(times[k], inner, bank);
        y[2 * count - 1 - k] = view.y(inner, bank);
      }
      marks.add(new Mark.Area(x, y, ink(side), 0.1 + 0.35 * strength(middle)));
    }
  }

  /** The line of a tip, in runs that lie in front or behind. */
  private void addEdges(BankPath path, double[] times, double side, boolean near) {
    Dash dash = side == RIGHT_SIDE ? Dash.SOLID : Dash.DASHED;
    Stroke stroke = new Stroke(ink(side), near ? 1.8 : 1.3, dash, near ? 1 : 0.75);
    int start = 0;
    for (int i = 1; i <= times.length; i++) {
      boolean before = ObliqueView.isNear(side, path.at(times[start]));
      if (i == times.length || ObliqueView.isNear(side, path.at(times[i])) != before) {
        if (before == near) {
          addHelix(path, times, start, Math.min(i, times.length - 1), side, stroke);
        }
        start = i;
      }
    }
  }

  private void addHelix(
      BankPath path, double[] times, int first, int last, double side, Stroke stroke) {
    if (last <= first) {
      return;
    }
    double[] x = new double[last - first + 1];
    double[] y = new double[x.length];
    for (int i = 0; i < x.length; i++) {
      double bank = path.at(times[first + i]);
      x[i] = x(times[first + i], side, bank);
      y[i] = view.y(side, bank);
    }
    marks.add(new Mark.Polyline(x, y, stroke));
  }

  private void addHalves(BankPath path, double[] instants, double side, boolean near) {
    for (double instant : instants) {
      double bank = path.at(instant);
      if (ObliqueView.isNear(side, bank) == near) {
        double strength = strength(instant);
        marks.add(
            half(
                instant,
                bank,
                side,
                new Stroke(Ink.WING, 0.8 + 0.7 * strength, Dash.SOLID, 0.15 + 0.65 * strength)));
        marks.add(tip(instant, bank, side, 1.6 + 0.9 * strength));
      }
    }
  }

  private void addStrongWing(double instant, double bank) {
    double nearSide = ObliqueView.isNear(RIGHT_SIDE, bank) ? RIGHT_SIDE : LEFT_SIDE;
    for (double side : new double[] {-nearSide, nearSide}) {
      marks.add(half(instant, bank, side, Stroke.of(Ink.CURSOR, 3)));
    }
    marks.add(tip(instant, bank, -nearSide, 4.5));
    marks.add(tip(instant, bank, nearSide, 4.5));
    marks.add(new Mark.Dot(area.xOf(instant), view.middle(), 3.5, Ink.CURSOR, true));
  }

  private Mark half(double instant, double bank, double side, Stroke stroke) {
    return new Mark.Line(
        area.xOf(instant), view.middle(), x(instant, side, bank), view.y(side, bank), stroke);
  }

  private Mark tip(double instant, double bank, double side, double radius) {
    return new Mark.Dot(
        x(instant, side, bank), view.y(side, bank), radius, ink(side), side == RIGHT_SIDE);
  }

  private void addTipNames(BankPath path) {
    double last = to(path);
    double bank = path.at(last);
    double[] sides =
        view.y(LEFT_SIDE, bank) < view.y(RIGHT_SIDE, bank)
            ? new double[] {LEFT_SIDE, RIGHT_SIDE}
            : new double[] {RIGHT_SIDE, LEFT_SIDE};
    double[] wanted = {view.y(sides[0], bank), view.y(sides[1], bank)};
    double[] placed = Spread.apart(wanted, new double[] {14, 14}, 0, area.height());
    double x = area.xOf(last) + view.reach() + 12;
    for (int i = 0; i < sides.length; i++) {
      double tipX = x(last, sides[i], bank);
      marks.add(
          new Mark.Line(
              tipX + 5,
              wanted[i],
              x - 4,
              placed[i],
              new Stroke(ink(sides[i]), 0.8, Dash.SOLID, 0.6)));
      marks.add(
          new Mark.Label(
              x,
              placed[i] + 4,
              sides[i] == RIGHT_SIDE ? "right tip" : "left tip",
              Anchor.START,
              TypeSize.SMALL,
              ink(sides[i])));
    }
  }
}
