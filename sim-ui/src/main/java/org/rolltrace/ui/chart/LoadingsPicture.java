package org.rolltrace.ui.chart;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.DoubleUnaryOperator;
import org.rolltrace.core.aeroplane.AileronPlace;
import org.rolltrace.core.aeroplane.Geometry;
import org.rolltrace.core.derivatives.SpanLoads;
import org.rolltrace.core.run.DerivativeReport;

/** How the loads of a wing and of its variants lie along the span, on one page. */
public final class LoadingsPicture {
  private static final double STRIP = 150;
  private static final double LEFT = 160;
  private static final double RIGHT = 150;
  private static final int STEPS = 400;

  /** Into how many steps a range is cut to find its round ends. */
  private static final double TICKS = 6;

  private LoadingsPicture() {}

  /**
   * Draws the page.
   *
   * @param report at least one shape of it is known
   * @return the drawing
   */
  public static Sheet draw(DerivativeReport report) {
    List<VariantStroke> drawn = VariantStroke.of(report);
    Map<SpanLoads.Cause, List<Curve>> curves = new LinkedHashMap<>();
    for (VariantStroke each : drawn) {
      SpanLoads loads = each.derived().shape().orElseThrow().loads();
      for (SpanLoads.Cause cause : loads.causes()) {
        List<Curve> some = curves.computeIfAbsent(cause, unused -> new ArrayList<>());
        Curve curve = curve(each, eta -> loads.at(cause, eta));
        if (some.isEmpty() || !Arrays.equals(curve.value(), some.get(0).value())) {
          some.add(curve);
        }
      }
    }
    List<Strip> strips = new ArrayList<>();
    for (SpanLoads.Cause cause : SpanLoads.Cause.values()) {
      List<Curve> some = curves.get(cause);
      if (some != null) {
        strips.add(
            new Strip(
                title(cause),
                unit(cause),
                some,
                cause == SpanLoads.Cause.AILERON ? ailerons(drawn.get(0)) : List.of()));
      }
    }
    Page page = new Page();
    page.addHead(report, "Loads along the span");
    StripChart.Drawing chart =
        StripChart.draw(
            strips,
            strips.stream().map(LoadingsPicture::range).toList(),
            new TimeWindow(-1, 1),
            new AxisTitle("Station", "2y/b"),
            Page.INSIDE,
            strips.size() * (STRIP + StripChart.WORDS) + StripChart.FOOT,
            LEFT,
            RIGHT);
    page.add(chart.sheet());
    page.addFoot(
        "Lift per unit of span by the dynamic pressure and the mean chord, c_l c/(S/b), for one unit"
            + " of its cause; steady at the lift coefficient of the condition; the right tip at 1. "
            + VariantStroke.remark(report));
    return page.sheet();
  }

  private static Curve curve(VariantStroke each, DoubleUnaryOperator load) {
    double[] eta = new double[STEPS + 1];
    double[] value = new double[STEPS + 1];
    for (int i = 0; i <= STEPS; i++) {
      eta[i] = Math.sin(Math.PI * (i - STEPS / 2) / STEPS);
      value[i] = load.applyAsDouble(eta[i]);
    }
    String name = VariantStroke.shortened(each.derived().label(), RIGHT - 12);
    return new Curve(name, eta, value, each.stroke());
  }

  private static String title(SpanLoads.Cause cause) {
    return switch (cause) {
      case STEADY -> "Steady load";
      case ROLLING -> "By rolling right";
      case YAWING -> "By yawing right";
      case SIDESLIP -> "By sideslip";
      case AILERON -> "By the ailerons";
    };
  }

  private static String unit(SpanLoads.Cause cause) {
    return "c_l c/(S/b)"
        + (cause.unit().equals("-") ? "" : ", " + cause.unit().replace("1/", "per "));
  }

  /** Where the ailerons of the first one drawn begin and end. */
  private static List<Marker> ailerons(VariantStroke first) {
    Geometry geometry = first.derived().data().aeroplane().geometry().orElseThrow();
    Optional<AileronPlace> place = geometry.ailerons();
    if (place.isEmpty()) {
      return List.of();
    }
    double half = geometry.wing().halfSpan();
    double from = place.get().from() / half;
    double to = Math.min(1, place.get().to() / half);
    return List.of(
        new Marker(-to, "aileron"),
        new Marker(-from, "to here"),
        new Marker(from, "aileron"),
        new Marker(to, "to here"));
  }

  /** With round ends, zero included; of the size of what is shown, however small. */
  private static ValueRange range(Strip strip) {
    double least = 0;
    double most = 0;
    for (Curve curve : strip.curves()) {
      for (double value : curve.value()) {
        least = Math.min(least, value);
        most = Math.max(most, value);
      }
    }
    if (!(most - least > 1e-9)) {
      return new ValueRange(-1, 1); // no dihedral
    }
    double step = Ticks.step((most - least) / TICKS, false);
    return new ValueRange(Math.floor(least / step) * step, Math.ceil(most / step) * step);
  }
}
