package org.rolltrace.core.motion;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.hipparchus.complex.Complex;
import org.hipparchus.linear.EigenDecompositionNonSymmetric;
import org.hipparchus.linear.MatrixUtils;

/**
 * The natural motions of the linearised lateral equations.
 *
 * <p>Two of the four roots belong to the slip and yaw (the dutch roll), two to bank and roll rate
 * (roll mode and spiral). Which is which is decided by how much the states take part in each root:
 * the product of the components of its right and left eigenvectors, which for the root λ of A is
 * the minor of λI − A that leaves out the state, up to a common factor. Two roots of bank and roll
 * rate that form a pair are the coupled roll-spiral.
 *
 * @param roll the fast root of bank and roll rate; empty when coupled with the spiral
 * @param spiral the slow root of bank and roll rate; empty when coupled with the roll
 * @param rollSpiral the coupled pair; empty when roll and spiral are apart
 * @param dutchRoll the swing in slip and yaw; empty when the equations have none
 * @param aperiodicYaw the two roots of slip and yaw where these do not swing; else empty
 */
public record LateralModes(
    Optional<Mode.Aperiodic> roll,
    Optional<Mode.Aperiodic> spiral,
    Optional<Mode.Oscillatory> rollSpiral,
    Optional<Mode.Oscillatory> dutchRoll,
    List<Mode.Aperiodic> aperiodicYaw) {

  /** An imaginary part this small against the largest root is rounding. */
  private static final double ROUNDING = 1e-9;

  private record Root(Complex value, double yawShare) {}

  /**
   * The modes of equations with or without slip as a state.
   *
   * @param motion the equations
   * @return the modes; without slip as a state there is no dutch roll
   */
  public static LateralModes of(LateralMotion motion) {
    List<Root> roots = roots(motion.linearised());
    int ofYaw = roots.size() - 2;
    List<Root> byShare = pairsTogether(roots);
    List<Complex> yaw = byShare.subList(0, ofYaw).stream().map(Root::value).toList();
    List<Complex> bank = byShare.subList(ofYaw, roots.size()).stream().map(Root::value).toList();
    double scale = roots.stream().mapToDouble(root -> root.value().norm()).max().orElseThrow();

    Optional<Mode.Oscillatory> dutchRoll = pair(yaw, scale);
    Optional<Mode.Oscillatory> rollSpiral = pair(bank, scale);
    List<Mode.Aperiodic> slowFirst = rollSpiral.isPresent() ? List.of() : reals(bank);
    return new LateralModes(
        slowFirst.isEmpty() ? Optional.empty() : Optional.of(slowFirst.get(1)),
        slowFirst.isEmpty() ? Optional.empty() : Optional.of(slowFirst.get(0)),
        rollSpiral,
        dutchRoll,
        dutchRoll.isPresent() ? List.of() : reals(yaw));
  }

  private static List<Root> roots(double[][] a) {
    Complex[] values =
        new EigenDecompositionNonSymmetric(MatrixUtils.createRealMatrix(a)).getEigenvalues();
    List<Root> roots = new ArrayList<>();
    for (Complex value : values) {
      double sum = 0;
      double yaw = 0;
      for (int state = 0; state < a.length; state++) {
        double part = minorWithout(state, a, value).norm();
        sum += part;
        if (state >= LateralMotion.SIDESLIP) {
          yaw += part;
        }
      }
      roots.add(new Root(value, sum > 0 ? yaw / sum : 0.5));
    }
    return roots;
  }

  /**
   * The determinant of λI − A without one state's row and column: the characteristic polynomial of
   * what is left of A.
   */
  private static Complex minorWithout(int state, double[][] a, Complex root) {
    if (a.length == 2) {
      return root.subtract(a[1 - state][1 - state]);
    }
    int i = state == 0 ? 1 : 0;
    int j = state <= 1 ? 2 : 1;
    int k = state <= 2 ? 3 : 2;
    double trace = a[i][i] + a[j][j] + a[k][k];
    double pairs = minor(a, i, j, i, j) + minor(a, i, k, i, k) + minor(a, j, k, j, k);
    double determinant =
        a[i][i] * minor(a, j, k, j, k)
            - a[i][j] * minor(a, j, k, i, k)
            + a[i][k] * minor(a, j, k, i, j);
    return root.subtract(trace).multiply(root).add(pairs).multiply(root).subtract(determinant);
  }

  private static double minor(double[][] a, int row, int otherRow, int column, int otherColumn) {
    return a[row][column] * a[otherRow][otherColumn] - a[row][otherColumn] * a[otherRow][column];
  }

  /**
   * Orders roots by their share in yaw, largest first, keeping the two of a pair side by side and
   * in the same half: a lone pair between two real roots comes first, so that it is the dutch roll.
   */
  private static List<Root> pairsTogether(List<Root> roots) {
    List<Root> ordered =
        new ArrayList<>(
            roots.stream()
                .sorted(
                    Comparator.comparingDouble((Root root) -> -pairShare(root, roots))
                        .thenComparingDouble(root -> root.value().getRealPart())
                        .thenComparingDouble(root -> Math.abs(root.value().getImaginaryPart())))
                .toList());
    boolean pairAcrossTheHalves =
        ordered.size() == 4
            && ordered.get(0).value().getImaginaryPart() == 0
            && ordered.get(1).value().getImaginaryPart() != 0;
    if (pairAcrossTheHalves) {
      ordered.add(2, ordered.remove(0));
    }
    return ordered;
  }

  private static double pairShare(Root root, List<Root> roots) {
    return roots.stream()
        .filter(other -> other.value().equals(root.value().conjugate()))
        .mapToDouble(other -> 0.5 * (other.yawShare() + root.yawShare()))
        .findFirst()
        .orElse(root.yawShare());
  }

  private static Optional<Mode.Oscillatory> pair(List<Complex> roots, double scale) {
    return roots.stream()
        .filter(root -> root.getImaginaryPart() > ROUNDING * scale)
        .map(root -> new Mode.Oscillatory(root.getRealPart(), root.getImaginaryPart()))
        .findFirst();
  }

  private static List<Mode.Aperiodic> reals(List<Complex> roots) {
    return roots.stream()
        .map(root -> new Mode.Aperiodic(root.getRealPart()))
        .sorted(Comparator.comparingDouble(mode -> Math.abs(mode.root())))
        .toList();
  }
}
