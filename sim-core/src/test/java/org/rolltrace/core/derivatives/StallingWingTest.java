package org.rolltrace.core.derivatives;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.rolltrace.core.aeroplane.Section;
import org.rolltrace.core.aeroplane.Wing;
import org.rolltrace.core.aeroplane.WingPanel;

class StallingWingTest {
  private static final double LARGEST = Section.THIN * 0.25;

  private static Wing rectangle(double aspectRatio, OptionalDouble stall, double fall) {
    Section section = new Section(Section.THIN, 0, stall, fall, 0.01);
    double half = 5;
    double chord = 2 * half / aspectRatio;
    return new Wing(List.of(new WingPanel(0, half, chord, chord, 0, 0, 0, section)), 0, 0);
  }

  private static WingEstimate estimate(Wing wing, double lift) {
    return WingEstimate.of(wing, Optional.empty(), WingEstimate.Theory.LIFTING_LINE, 0, lift);
  }

  private static StallingWing stalling(double aspectRatio, double lift) {
    Wing wing = rectangle(aspectRatio, OptionalDouble.of(0.25), 0.5);
    return StallingWing.of(wing, estimate(wing, lift), 1);
  }

  @Test
  void nothingIsLostBelowTheStall() {
    StallingWing wing = stalling(6, 0.4);
    assertThat(wing.lost(0.1, 0, 0, 0)).isZero();
    assertThat(wing.isStalled(0.1, 0, 0, 0)).isFalse();
  }

  @Test
  void bothSidesLoseAlike() {
    StallingWing wing = stalling(6, 1.4);
    for (double rate : new double[] {0.05, 0.1, 0.2, 0.4}) {
      assertThat(wing.lost(-rate, 0, 0, 0)).isCloseTo(-wing.lost(rate, 0, 0, 0), within(1e-13));
    }
    assertThat(wing.lost(0.2, 0, 0, 0)).isPositive(); // the right wing goes down and loses
  }

  /**
   * On a very long rectangle each strip has its own incidence, α + p̂ 2y/b, and the loss is an
   * integral by hand: with x = 2y/b, ½ · ½ a ∫ (1 + ½)(α + p̂ x − α_s) x dx from where the stall
   * begins to the tip.
   */
  @Test
  void aLongWingLosesWhatStripTheorySays() {
    Wing shape = rectangle(3000, OptionalDouble.of(0.25), 0.5);
    double lift = 0.8 * LARGEST;
    StallingWing wing = StallingWing.of(shape, estimate(shape, lift), 1);
    double incidence = 0.2;
    double rate = 0.08;
    double begins = (0.25 - incidence) / rate;
    double short_ = incidence - 0.25;
    double integral =
        1.5 * (short_ * (1 - begins * begins) / 2 + rate * (1 - Math.pow(begins, 3)) / 3);
    // Strips of finite width cut the beginning off, and 1/A of the span effect is left.
    assertThat(wing.lost(rate, 0, 0, 0))
        .isCloseTo(0.25 * Section.THIN * integral, within(0.06 * 0.25 * Section.THIN * integral));
  }

  /**
   * A wing near its stall, once rolling, goes on by itself (H. Glauert, The rotation of an aerofoil
   * about a fixed axis, ARC R and M 595, 1919, from memory: autorotation begins where the slope of
   * the lift curve becomes negative).
   */
  @Test
  void nearTheStallTheDampingIsLostAndFarFromItIsNot() {
    WingEstimate near = estimate(rectangle(7, OptionalDouble.of(0.25), 3), 0.95 * LARGEST);
    assertThat(losesItsDamping(near, 3)).isTrue();
    assertThat(losesItsDamping(near, 0.3)).isFalse(); // a gentle stall
    WingEstimate far = estimate(rectangle(7, OptionalDouble.of(0.25), 3), 0.3 * LARGEST);
    assertThat(losesItsDamping(far, 3)).isFalse();
  }

  private static boolean losesItsDamping(WingEstimate estimate, double fall) {
    StallingWing wing = StallingWing.of(rectangle(7, OptionalDouble.of(0.25), fall), estimate, 1);
    for (double rate = 0.01; rate < 0.2; rate += 0.01) {
      if (wing.lost(rate, 0, 0, 0) > -estimate.rollDamping() * rate) {
        return true;
      }
    }
    return false;
  }

  @Test
  void aWingOfUnknownStallIsKnownToBeSo() {
    assertThat(StallingWing.isKnownFor(rectangle(6, OptionalDouble.empty(), 1))).isFalse();
    assertThat(StallingWing.isKnownFor(rectangle(6, OptionalDouble.of(0.2), 1))).isTrue();
  }
}
