package org.rolltrace.core.derivatives;

import java.util.function.DoubleUnaryOperator;
import org.hipparchus.linear.Array2DRowRealMatrix;
import org.hipparchus.linear.ArrayRealVector;
import org.hipparchus.linear.CholeskyDecomposition;
import org.hipparchus.linear.DecompositionSolver;

/**
 * Prandtl's lifting line, solved for the sine series of the circulation.
 *
 * <p>With f(θ) = 4 b sin θ / (a c), a the slope of the sections at this Mach number, the equation α
 * sin θ = Σ Aₙ (n + f) sin nθ is multiplied by sin mθ and integrated over the half span (Galerkin),
 * so that an incidence which jumps at the end of an aileron is integrated exactly and does not
 * spoil the convergence: the matrix (π/4) n δₘₙ + ½(F₍ₘ₋ₙ₎ − F₍ₘ₊ₙ₎), F_k = ∫ f cos kθ dθ, is
 * symmetric and positive, and is factored once for all symmetric and once for all antisymmetric
 * causes (L. Prandtl 1918; H. Glauert, The Elements of Aerofoil and Airscrew Theory, 1926, ch. XI,
 * from memory). The quarter-chord line counts as straight and unswept.
 */
final class LiftingLine implements WingTheory {
  /** Terms of the series; half of them symmetric. */
  static final int TERMS = 120;

  private final Planform planform;
  private final int perSide;
  private final GaussRule rule;
  private final double[] stationsOfRule;
  private final double[][] sines;
  private final DecompositionSolver symmetric;
  private final DecompositionSolver antisymmetric;

  /**
   * The theory of one wing at one Mach number.
   *
   * @param planform the wing
   * @param mach of the flight, 0 or more and below 1; Prandtl-Glauert: a = a0/√(1 − M²)
   * @param terms how many of the series, even
   */
  LiftingLine(Planform planform, double mach, int terms) {
    this.planform = planform;
    this.perSide = terms / 2;
    double[] ends = new double[planform.stations().length];
    for (int i = 0; i < ends.length; i++) {
      ends[i] = planform.theta(planform.stations()[i]);
    }
    this.rule = GaussRule.over(ends, 16.0 / (2 * terms));
    this.stationsOfRule = new double[rule.size()];
    double[] f = new double[rule.size()];
    double compression = Math.sqrt(1 - mach * mach);
    for (int i = 0; i < f.length; i++) {
      double y = planform.halfSpan() * Math.cos(rule.point(i));
      stationsOfRule[i] = y;
      f[i] =
          4
              * planform.span()
              * Math.sin(rule.point(i))
              * compression
              / (planform.liftSlope().applyAsDouble(y) * planform.chord().applyAsDouble(y));
    }
    this.sines = sines(terms);
    double[] evenF = evenCosines(f, terms);
    this.symmetric = factored(evenF, 1);
    this.antisymmetric = factored(evenF, 2);
  }

  static LiftingLine of(Planform planform, double mach) {
    return new LiftingLine(planform, mach, TERMS);
  }

  /** sin nθ times the weight at each point of the rule. */
  private double[][] sines(int terms) {
    double[][] table = new double[terms + 1][rule.size()];
    for (int i = 0; i < rule.size(); i++) {
      double twoCos = 2 * Math.cos(rule.point(i));
      double before = 0;
      double now = Math.sin(rule.point(i)) * rule.weight(i);
      for (int n = 1; n <= terms; n++) {
        table[n][i] = now;
        double next = twoCos * now - before;
        before = now;
        now = next;
      }
    }
    return table;
  }

  /** F_k for k = 0, 2, 4 …; others do not occur between terms of one symmetry. */
  private double[] evenCosines(double[] f, int terms) {
    double[] sums = new double[terms + 1];
    for (int i = 0; i < f.length; i++) {
      double twoCos = 2 * Math.cos(2 * rule.point(i));
      double now = rule.weight(i) * f[i];
      double next = now * 0.5 * twoCos;
      for (int k = 0; k < sums.length; k++) {
        sums[k] += now;
        double after = twoCos * next - now;
        now = next;
        next = after;
      }
    }
    return sums;
  }

  private DecompositionSolver factored(double[] evenF, int first) {
    double[][] matrix = new double[perSide][perSide];
    for (int i = 0; i < perSide; i++) {
      int m = first + 2 * i;
      for (int j = 0; j <= i; j++) {
        int n = first + 2 * j;
        double entry = 0.5 * (evenF[(m - n) / 2] - evenF[(m + n) / 2]);
        matrix[i][j] = entry;
        matrix[j][i] = entry;
      }
      matrix[i][i] += 0.25 * Math.PI * m;
    }
    return new CholeskyDecomposition(new Array2DRowRealMatrix(matrix, false)).getSolver();
  }

  @Override
  public SpanLoading symmetric(DoubleUnaryOperator incidence) {
    return solve(incidence, symmetric, 1);
  }

  @Override
  public SpanLoading antisymmetric(DoubleUnaryOperator incidence) {
    return solve(incidence, antisymmetric, 2);
  }

  private SpanLoading solve(DoubleUnaryOperator incidence, DecompositionSolver solver, int first) {
    double[] onPoints = new double[rule.size()];
    for (int i = 0; i < onPoints.length; i++) {
      onPoints[i] = incidence.applyAsDouble(stationsOfRule[i]) * Math.sin(rule.point(i));
    }
    double[] right = new double[perSide];
    for (int j = 0; j < perSide; j++) {
      double[] sine = sines[first + 2 * j];
      double sum = 0;
      for (int i = 0; i < onPoints.length; i++) {
        sum += onPoints[i] * sine[i];
      }
      right[j] = sum;
    }
    double[] solution = solver.solve(new ArrayRealVector(right, false)).toArray();
    double[] series = new double[2 * perSide + 1];
    for (int j = 0; j < perSide; j++) {
      series[first + 2 * j] = solution[j];
    }
    return SpanLoading.of(planform.aspectRatio(), series);
  }
}
