package org.rolltrace.ui.manoeuvre;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.nio.file.Path;
import java.util.Random;
import java.util.stream.LongStream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.rolltrace.ui.chart.TimeWindow;
import org.rolltrace.ui.session.DeskSession;
import org.rolltrace.ui.session.OpenSession;

class ManoeuvreModelTest {
  /** Rounding of times of some 10 s. */
  private static final double ROUNDING = 1e-9;

  @TempDir Path recovery;
  private DeskSession session;
  private ManoeuvreModel model;

  @BeforeEach
  void openTenSeconds() {
    session = OpenSession.of("light-single-roll-entry", recovery);
    model = new ManoeuvreModel(session);
  }

  private TimeWindow window() {
    return model.windowProperty().get();
  }

  private void last(String duration) {
    session.edit("change duration", document -> document.with("$.duration", duration));
  }

  private double finalBank() {
    return session.resultProperty().get().measure("finalBank").orElseThrow().value().orElseThrow();
  }

  @Test
  void whatIsOpenedIsShownWholeAndCanBePlayed() {
    assertThat(window()).isEqualTo(new TimeWindow(0, 10));
    assertThat(model.clock().toProperty().get()).isEqualTo(10);

    model.clock().play();
    model.clock().advance(2.5);
    assertThat(model.clock().position()).isEqualTo(2.5);
  }

  @Test
  void anEmptySessionHasAView() {
    DeskSession empty =
        new DeskSession(
            new org.rolltrace.ui.task.SameThread(),
            new org.rolltrace.ui.session.RecoveryStore(recovery));
    ManoeuvreModel shown = new ManoeuvreModel(empty);
    shown.zoom(3, 0.5);
    shown.compareMirrored();
    assertThat(shown.windowProperty().get().length()).isEqualTo(5);
    assertThat(shown.shownInstant()).isEmpty();
  }

  @Test
  void aWholeViewStaysWholeWhenTheManoeuvreGetsLongerOrShorter() {
    last("14 s");
    assertThat(window()).isEqualTo(new TimeWindow(0, 14));
    assertThat(model.clock().toProperty().get()).isEqualTo(14);
    last("4 s");
    assertThat(window()).isEqualTo(new TimeWindow(0, 4));
  }

  @Test
  void aPartOfTheViewStaysWhereItIsAsFarAsThereIsAnythingToSee() {
    model.zoom(0, 0.4);
    model.pan(5);
    assertThat(window()).isEqualTo(new TimeWindow(5, 9));
    last("20 s");
    assertThat(window()).isEqualTo(new TimeWindow(5, 9));
    last("7 s");
    assertThat(window()).isEqualTo(new TimeWindow(3, 7));
    last("3 s");
    assertThat(window()).isEqualTo(new TimeWindow(0, 3));
  }

  @Test
  void aFaultKeepsTheView() {
    last("14 s");
    last("14");
    assertThat(session.faults()).isNotEmpty();
    assertThat(window()).isEqualTo(new TimeWindow(0, 14));
  }

  @Test
  void zoomingKeepsTheInstantInItsPlace() {
    model.zoom(4, 0.5);
    assertThat(window()).isEqualTo(new TimeWindow(2, 7));
    model.resetView();
    assertThat(window()).isEqualTo(new TimeWindow(0, 10));
  }

  private static LongStream seeds() {
    return LongStream.range(0, 20);
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void zoomAndPanStayWithinTheManoeuvre(long seed) {
    Random random = new Random(seed);
    for (int i = 0; i < 50; i++) {
      if (random.nextBoolean()) {
        model.zoom(10 * random.nextDouble(), Math.exp(3 * random.nextGaussian()));
      } else {
        model.pan(20 * random.nextGaussian());
      }
      assertThat(window().from()).isGreaterThanOrEqualTo(-ROUNDING);
      assertThat(window().to()).isLessThanOrEqualTo(10 + ROUNDING);
      assertThat(window().length()).isGreaterThanOrEqualTo(TimeWindow.SHORTEST - ROUNDING);
    }
  }

  @Test
  void theMouseComesBeforeTheReplay() {
    assertThat(model.shownInstant()).as("nothing is pointed at").isEmpty();
    model.clock().moveTo(3);
    assertThat(model.shownInstant()).hasValue(3);
    model.cursorProperty().set(7.5);
    assertThat(model.shownInstant()).hasValue(7.5);
    model.cursorProperty().set(Double.NaN);
    assertThat(model.shownInstant()).hasValue(3);
    model.clock().moveTo(0);
    assertThat(model.shownInstant()).isEmpty();
    model.clock().play();
    assertThat(model.shownInstant()).hasValue(0);
  }

  /** The equations of motion are odd: all inputs turned round turn the motion round. */
  @Test
  void leftAgainstRightKeepsTheCurvesOfNowAndTurnsTheInputsRound() {
    double right = finalBank();
    model.compareMirrored();

    assertThat(session.documentProperty().get().text("$.inputs[0].size")).contains("-0.2");
    assertThat(
            session.ghostProperty().get().measure("finalBank").orElseThrow().value().orElseThrow())
        .isEqualTo(right);
    // Both runs carry the same rounding; the integrator's tolerance is 1e-10 rad.
    assertThat(finalBank()).isCloseTo(-right, within(1e-8));

    session.undo();
    assertThat(finalBank()).isEqualTo(right);
  }
}
