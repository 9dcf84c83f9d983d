package org.rolltrace.core.derivatives;

/**
 * The circulation along the span as a sine series, and the loads that follow from it.
 *
 * <pre>
 * Γ(y) = 2 b V Σ Aₙ sin nθ,   y = (b/2) cos θ, θ = 0 at the right tip
 * CL = π A A₁,   Cl = −(π/4) A A₂,   downwash w = V Σ n Aₙ sin nθ / sin θ
 * </pre>
 *
 * <p>A is the aspect ratio. Signs as on the package page: more lift on the right rolls left.
 */
public final class SpanLoading {
  private final double aspectRatio;
  private final double[] series;

  private SpanLoading(double aspectRatio, double[] series) {
    this.aspectRatio = aspectRatio;
    this.series = series;
  }

  /** Takes over the array: {@code series[n]} is Aₙ, {@code series[0]} is not used. */
  static SpanLoading of(double aspectRatio, double[] series) {
    return new SpanLoading(aspectRatio, series);
  }

  /**
   * The loading of two causes together.
   *
   * @param factor what the other one is multiplied by
   * @param other of the same wing
   * @return this one plus factor times the other
   */
  SpanLoading plus(double factor, SpanLoading other) {
    double[] sum = new double[Math.max(series.length, other.series.length)];
    for (int n = 1; n < sum.length; n++) {
      sum[n] = coefficient(n) + factor * other.coefficient(n);
    }
    return new SpanLoading(aspectRatio, sum);
  }

  SpanLoading times(double factor) {
    return new SpanLoading(aspectRatio, new double[] {0}).plus(factor, this);
  }

  double coefficient(int n) {
    return n < series.length ? series[n] : 0;
  }

  int terms() {
    return series.length - 1;
  }

  /**
   * The lift coefficient.
   *
   * @return C_L, by the wing area
   */
  public double lift() {
    return Math.PI * aspectRatio * coefficient(1);
  }

  /**
   * The rolling-moment coefficient.
   *
   * @return C_l, by wing area and span; positive rolls right
   */
  public double rollingMoment() {
    return -0.25 * Math.PI * aspectRatio * coefficient(2);
  }

  /**
   * The lift of a station.
   *
   * @param eta 2y/b, from −1 at the left tip to 1 at the right tip
   * @return the lift per unit of span by q̄ and the mean chord S/b, c_l c / (S/b)
   */
  public double load(double eta) {
    double theta = Math.acos(Math.max(-1, Math.min(1, eta)));
    double sum = 0;
    for (int n = 1; n < series.length; n++) {
      sum += series[n] * Math.sin(n * theta);
    }
    return 4 * aspectRatio * sum;
  }

  /** The same at θ and without the check of its range. */
  double circulation(double theta) {
    double sum = 0;
    for (int n = 1; n < series.length; n++) {
      sum += series[n] * Math.sin(n * theta);
    }
    return sum;
  }

  /**
   * ∫ g h cos θ dθ over the span, g = Σ Aₙ sin nθ of this loading and h = Σ n Aₙ sin nθ of the
   * other: what the other's downwash makes of this one's lift in yaw.
   */
  double yawByDownwashOf(SpanLoading other) {
    double sum = 0;
    for (int n = 1; n <= terms(); n++) {
      sum +=
          coefficient(n)
              * ((n + 1) * other.coefficient(n + 1) + (n - 1) * other.coefficient(n - 1));
    }
    return 0.25 * Math.PI * sum;
  }

  double aspectRatio() {
    return aspectRatio;
  }
}
