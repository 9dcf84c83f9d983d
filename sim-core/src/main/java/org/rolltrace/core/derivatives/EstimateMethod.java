package org.rolltrace.core.derivatives;

/**
 * The ways in which a part of a derivative is estimated: what is computed, after whom, and how far
 * off it is known to be. Sources are from memory where nothing else is said; the errors are what
 * comparisons of such estimates with tests usually find (common practice).
 */
public enum EstimateMethod {
  /** Wing by the lifting surface of one row. */
  LIFTING_SURFACE(
      "lifting surface",
      "strips with the flow followed at three quarters of the chord, 60 a side, Prandtl-Glauert",
      "J. Weissinger, NACA TM 1120, 1947",
      "damping within 1 % of the published lifting-surface value at aspect ratio 6; about 5 % of"
          + " tests on straight wings"),
  /** Wing by the lifting line. */
  LIFTING_LINE(
      "lifting line",
      "sine series of 120 terms, Prandtl-Glauert, sweep by (A + 4) cos Λ / (A + 4 cos Λ)",
      "L. Prandtl 1918; H. Glauert 1926; T.A. Toll and M.J. Queijo, NACA TN 1581, 1948",
      "damping 15 % too large at aspect ratio 6, more on shorter wings"),
  /** Aileron by either theory and the flap factor of thin sections. */
  AILERON(
      "flap factor",
      "the theory of the wing with the thin-aerofoil flap factor, less what a plain flap loses at"
          + " half the mean travel",
      "H. Glauert 1926; loss after B.W. McCormick, 2nd ed. 1995, ch. 3",
      "10 % by gap and section, more beyond 20 deg"),
  /** Yawing moment of the lift as it tilts and of its trailing vortices. */
  INDUCED_YAW(
      "tilt and trailing vortices",
      "−A ∫ [Γ0 (u − w1) − Γ1 w0] cos θ dθ of the loadings",
      "classical lifting-line theory; checked by the closed form of the elliptic wing",
      "20 % of itself; profile drag that changes with incidence is left out"),
  /** Yaw damping by profile drag. */
  PROFILE_DRAG(
      "profile drag",
      "−4 c_d ∫ c y² dy / (S b²)",
      "strip theory",
      "as well as the profile drag is known"),
  /** Rolling moment with sideslip by wing sweep. */
  SWEEP(
      "sweep",
      "−2 C_L tan Λ ȳ/b of strips across the flow, by A / (A + 4 cos Λ)",
      "simple sweep theory with the finite-span factor of T.A. Toll and M.J. Queijo, NACA TN 1581,"
          + " 1948",
      "25 % of itself; charts end at 60 deg"),
  /** Rolling moment with sideslip by the height of the wing on the body. */
  WING_HEIGHT(
      "wing on the body",
      "−1.2 √A (z_w/b) (2 d/b), z_w above the centre line",
      "R.D. Finck and D.E. Hoak, USAF Stability and Control Datcom, sec. 5.2.2.1",
      "20 % of itself"),
  /** Yawing moment of the body in sideslip. */
  BODY(
      "slender body",
      "−2 k volume / (S b), the volume as 0.6 of its box, k by fineness",
      "M.M. Munk, NACA Report 184, 1924",
      "30 % of itself"),
  /** Side force of the body in sideslip. */
  BODY_SIDE_FORCE(
      "body in sideslip",
      "−2 K (π/4) width height / S of a slender body, K = 1 + 0.85 h above its centre line and 1 +"
          + " 0.49 |h| below it, h = z_w/(d/2)",
      "R.D. Finck and D.E. Hoak, USAF Stability and Control Datcom, sec. 5.2.1.1",
      "25 % of itself"),
  /** Loads of the fin. */
  FIN(
      "fin",
      "slope of the fin with 1.55 times its own aspect ratio beside a body, sidewash and"
          + " dynamic pressure as 0.724 + 3.06 (S_v/S)/(1 + cos Λ) − 0.4 z_w/d + 0.009 A, z_w above the centre line",
      "R.D. Finck and D.E. Hoak, USAF Stability and Control Datcom, sec. 5.4.1",
      "10 to 15 %"),
  /** Rudder by the flap factor. */
  RUDDER(
      "rudder",
      "the slope of the fin with the thin-aerofoil flap factor, less what a plain flap loses at"
          + " half the travel",
      "H. Glauert 1926; loss after B.W. McCormick, 2nd ed. 1995, ch. 3",
      "15 %"),
  /** Roll damping of the tailplane. */
  TAILPLANE(
      "tailplane",
      "half the damping of an elliptic wing of its aspect ratio, by (S_h/S)(b_h/b)²",
      "common practice",
      "50 % of itself, which is small");

  private final String title;
  private final String what;
  private final String source;
  private final String knownError;

  EstimateMethod(String title, String what, String source, String knownError) {
    this.title = title;
    this.what = what;
    this.source = source;
    this.knownError = knownError;
  }

  /**
   * Its short name.
   *
   * @return such as "lifting surface"
   */
  public String title() {
    return title;
  }

  /**
   * What is computed.
   *
   * @return in words and symbols
   */
  public String what() {
    return what;
  }

  /**
   * After whom.
   *
   * @return author, title, year
   */
  public String source() {
    return source;
  }

  /**
   * How far off it is known to be.
   *
   * @return in words
   */
  public String knownError() {
    return knownError;
  }
}
