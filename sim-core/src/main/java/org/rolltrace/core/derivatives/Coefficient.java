package org.rolltrace.core.derivatives;

import java.util.Arrays;
import java.util.Optional;

/** The names of the lateral-directional derivatives. */
public enum Coefficient {
  /** Side force with sideslip. */
  CY_BETA("CY_beta", Motion.SLIP),
  /** Side force with roll rate. */
  CY_P("CY_p", Motion.RATE),
  /** Side force with yaw rate. */
  CY_R("CY_r", Motion.RATE),
  /** Side force with aileron angle. */
  CY_DA("CY_da", Motion.AILERON),
  /** Side force with rudder angle. */
  CY_DR("CY_dr", Motion.RUDDER),
  /** Rolling moment with sideslip: the dihedral effect. */
  CL_BETA("Cl_beta", Motion.SLIP),
  /** Rolling moment with roll rate: the roll damping. */
  CL_P("Cl_p", Motion.RATE),
  /** Rolling moment with yaw rate. */
  CL_R("Cl_r", Motion.RATE),
  /** Rolling moment with aileron angle. */
  CL_DA("Cl_da", Motion.AILERON),
  /** Rolling moment with rudder angle. */
  CL_DR("Cl_dr", Motion.RUDDER),
  /** Yawing moment with sideslip: the weathercock stability. */
  CN_BETA("Cn_beta", Motion.SLIP),
  /** Yawing moment with roll rate. */
  CN_P("Cn_p", Motion.RATE),
  /** Yawing moment with yaw rate: the yaw damping. */
  CN_R("Cn_r", Motion.RATE),
  /** Yawing moment with aileron angle: adverse yaw when negative. */
  CN_DA("Cn_da", Motion.AILERON),
  /** Yawing moment with rudder angle. */
  CN_DR("Cn_dr", Motion.RUDDER);

  /** What a derivative is taken with respect to. */
  enum Motion {
    SLIP,
    RATE,
    AILERON,
    RUDDER
  }

  private final String symbol;
  private final Motion motion;

  Coefficient(String symbol, Motion motion) {
    this.symbol = symbol;
    this.motion = motion;
  }

  /**
   * The name in files and results, such as {@code Cl_beta}.
   *
   * @return the name
   */
  public String symbol() {
    return symbol;
  }

  /**
   * The name of the dimensional form, such as {@code L_beta}.
   *
   * @return the name; the package page says what each is
   */
  public String dimensionalSymbol() {
    return Character.toUpperCase(symbol.charAt(1)) + symbol.substring(2);
  }

  /**
   * The force or moment of which this is a derivative.
   *
   * @return Y, L or N
   */
  Load load() {
    return switch (symbol.charAt(1)) {
      case 'Y' -> Load.SIDE;
      case 'l' -> Load.ROLL;
      default -> Load.YAW;
    };
  }

  Motion motion() {
    return motion;
  }

  /** What a derivative is of. */
  enum Load {
    SIDE,
    ROLL,
    YAW
  }

  /**
   * Finds a derivative by its name in files.
   *
   * @param symbol the name, such as {@code Cl_beta}
   * @return the derivative, or empty when there is none of that name
   */
  public static Optional<Coefficient> ofSymbol(String symbol) {
    return Arrays.stream(values()).filter(c -> c.symbol.equals(symbol)).findFirst();
  }
}
