package org.rolltrace.ui.chart;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Random;
import java.util.stream.LongStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.rolltrace.core.history.Channel;
import org.rolltrace.core.pilot.Control;
import org.rolltrace.core.pilot.HoldInput;
import org.rolltrace.core.pilot.PilotInput;
import org.rolltrace.core.pilot.PilotProgramme;
import org.rolltrace.core.run.RunResult;
import org.rolltrace.core.run.ScenarioRun;
import org.rolltrace.core.scenario.Scenario;

/** What stands on the sheets, read off their marks. */
class DrawingsTest {
  private static final double WIDTH = 1000;

  static LongStream seeds() {
    return LongStream.range(0, 300);
  }

  static List<Path> shipped() {
    return Runs.shipped();
  }

  private static StripChart.Drawing strips(RunResult run, Optional<RunResult> ghost) {
    return StripChart.draw(
        RollStrips.of(run, ghost),
        RollStrips.window(run),
        WIDTH,
        600,
        StripChart.LEFT,
        StripChart.RIGHT);
  }

  private static Sheet trace(RunResult run, OptionalDouble cursor) {
    return WingTrace.draw(
        run,
        Optional.empty(),
        10,
        RollStrips.window(run),
        WIDTH,
        240,
        StripChart.LEFT,
        StripChart.RIGHT,
        cursor);
  }

  @ParameterizedTest
  @MethodSource("shipped")
  void everyShippedScenarioIsDrawnInPlaceAndWithoutCrowding(Path file) {
    RunResult run = Runs.of(file);
    Sheet page = StagePicture.draw(run, Optional.empty());
    assertThat(page.width()).isEqualTo(StagePicture.WIDTH);
    assertThat(page.height()).isEqualTo(StagePicture.HEIGHT);
    for (Mark mark : Runs.flat(page.marks())) {
      for (double coordinate : Runs.coordinates(mark)) {
        assertThat(coordinate).isBetween(-10.0, StagePicture.WIDTH + 10);
      }
    }
    assertThat(Runs.crowding(page)).isEmpty();
    assertThat(Runs.all(Mark.Label.class, page))
        .extracting(Mark.Label::text)
        .contains(run.scenario().title(), "Bank", "Roll rate", "deg/s", "bank", "right tip", "s")
        .noneMatch(text -> text.contains("NaN"));
  }

  @ParameterizedTest
  @MethodSource("shipped")
  void aGhostBesideItCrowdsNothing(Path file) {
    Sheet page = StagePicture.draw(Runs.of(file), Optional.of(Runs.step(-0.3)));
    assertThat(Runs.crowding(page)).isEmpty();
    assertThat(Runs.all(Mark.Label.class, page))
        .extracting(Mark.Label::text)
        .contains("bank, kept");
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void labelsNeverOverlap(long seed) {
    Random random = new Random(seed);
    double[] time = {0, 10};
    List<Strip> strips = new ArrayList<>();
    for (int i = 0; i < 4; i++) {
      List<Curve> curves = new ArrayList<>();
      for (int k = 1 + random.nextInt(4); k > 0; k--) {
        double end = random.nextInt(3) == 0 ? 0 : 40 * random.nextGaussian();
        curves.add(
            new Curve(
                "curve " + k, time, new double[] {0, end}, Stroke.of(Ink.values()[6 + k], 1)));
      }
      List<Marker> markers = new ArrayList<>();
      for (int k = random.nextInt(14); k > 0; k--) {
        double at = random.nextBoolean() ? 10 * random.nextDouble() : 0.2 * random.nextDouble();
        markers.add(new Marker(at, "word".repeat(1 + random.nextInt(3)) + k));
      }
      strips.add(new Strip("Bank, roll rate", i % 2 == 0 ? "deg" : "deg, deg/s", curves, markers));
    }
    double from = 3 * random.nextDouble();
    Sheet sheet =
        StripChart.draw(
                strips,
                new TimeWindow(from, from + 0.2 + 7 * random.nextDouble()),
                500 + 900 * random.nextDouble(),
                // 4 names of 13 px find room in a strip from about 60 px.
                4 * (60 + StripChart.WORDS + 80 * random.nextDouble()) + StripChart.FOOT,
                StripChart.LEFT,
                StripChart.RIGHT)
            .sheet();
    assertThat(Runs.crowding(sheet)).isEmpty();
  }

  @Test
  void longTitlesAndManyInputsAreBrokenAndCut() {
    Scenario plain = Runs.step(0.3).scenario();
    List<PilotInput> inputs = new ArrayList<>();
    for (int i = 0; i < 40; i++) {
      inputs.add(new PilotInput(Control.STICK, new HoldInput(0.2 * i, 0.1, 0.1, 0.1)));
    }
    RunResult run =
        ScenarioRun.execute(
            new Scenario(
                "A long title ".repeat(15),
                plain.data(),
                plain.condition(),
                plain.propeller(),
                plain.slip(),
                plain.start(),
                PilotProgramme.of(inputs),
                plain.duration(),
                plain.measures()));
    Sheet page = StagePicture.draw(run, Optional.empty());
    assertThat(Runs.crowding(page)).isEmpty();
    assertThat(Runs.all(Mark.Label.class, page))
        .extracting(Mark.Label::text)
        .anyMatch(text -> text.endsWith(" …"));
  }

  /** The least that the window is meant for. */
  @ParameterizedTest
  @MethodSource("shipped")
  void aSmallStageIsNotCrowded(Path file) {
    RunResult run = Runs.of(file);
    Sheet strips =
        StripChart.draw(
                RollStrips.of(run, Optional.empty()),
                RollStrips.window(run),
                640,
                340,
                StripChart.LEFT,
                StripChart.RIGHT)
            .sheet();
    assertThat(Runs.crowding(strips)).isEmpty();
    Sheet trace =
        WingTrace.draw(
            run,
            Optional.empty(),
            10,
            RollStrips.window(run),
            640,
            140,
            StripChart.LEFT,
            StripChart.RIGHT,
            OptionalDouble.of(1));
    assertThat(Runs.crowding(trace)).isEmpty();
  }

  @Test
  void anInstantStandsAtTheSamePlaceInStripsAndTrace() {
    RunResult run = Runs.step(0.3);
    PlotArea area = strips(run, Optional.empty()).areas().get(0);
    List<Mark.Dot> dots = Runs.all(Mark.Dot.class, trace(run, OptionalDouble.of(4)));
    assertThat(dots)
        .filteredOn(dot -> dot.ink() == Ink.CURSOR)
        .singleElement()
        .satisfies(dot -> assertThat(dot.x()).isCloseTo(area.xOf(4), within(1e-9)));
  }

  @Test
  void givenRangesAreKept() {
    RunResult run = Runs.step(0.3);
    List<Strip> strips = RollStrips.of(run, Optional.empty());
    List<ValueRange> ranges = strips.stream().map(strip -> new ValueRange(-500, 700)).toList();
    List<PlotArea> areas =
        StripChart.draw(strips, ranges, RollStrips.window(run), WIDTH, 600, 124, 96).areas();
    assertThat(areas).hasSize(5).allMatch(area -> area.low() == -500 && area.high() == 700);
  }

  @Test
  void mirroredRollsGiveMirroredStrips() {
    StripChart.Drawing right = strips(Runs.step(0.3), Optional.empty());
    StripChart.Drawing left = strips(Runs.step(-0.3), Optional.empty());
    List<Mark.Polyline> rightCurves = Runs.all(Mark.Polyline.class, right.sheet());
    List<Mark.Polyline> leftCurves = Runs.all(Mark.Polyline.class, left.sheet());
    assertThat(rightCurves).hasSize(8).hasSameSizeAs(leftCurves);
    // In the order of painting: one, one, and twice two of three strips.
    int[] strip = {0, 1, 2, 2, 3, 3, 4, 4};
    for (int i = 0; i < strip.length; i++) {
      PlotArea rightArea = right.areas().get(strip[i]);
      PlotArea leftArea = left.areas().get(strip[i]);
      assertThat(rightCurves.get(i).stroke().ink()).isEqualTo(Ink.RIGHT);
      assertThat(leftCurves.get(i).stroke().ink()).isEqualTo(Ink.LEFT);
      assertThat(leftCurves.get(i).stroke().dash()).isEqualTo(rightCurves.get(i).stroke().dash());
      double[] up = rightCurves.get(i).y();
      double[] down = leftCurves.get(i).y();
      assertThat(up).hasSameSizeAs(down);
      for (int k = 0; k < up.length; k++) {
        // The equations are odd to rounding; a px is far above it.
        assertThat(rightArea.yOf(0) - up[k]).isCloseTo(down[k] - leftArea.yOf(0), within(1e-6));
      }
    }
    assertThat(right.areas().get(0).high()).isEqualTo(-left.areas().get(0).low());
  }

  @Test
  void theTraceShowsTheBankAndMirrorsIt() {
    RunResult right = Runs.step(0.3);
    RunResult left = Runs.step(-0.3);
    double instant = 5;
    double bank = WingTrace.bankAt(right, instant);
    assertThat(WingTrace.bankAt(left, instant)).isCloseTo(-bank, within(1e-9));
    assertThat(bank)
        .isCloseTo(
            right.history().value(Channel.BANK, right.history().lastAt(instant)), within(1e-9));
    Mark.Dot low = tip(trace(right, OptionalDouble.of(instant)), Ink.RIGHT);
    Mark.Dot high = tip(trace(right, OptionalDouble.of(instant)), Ink.LEFT);
    Mark.Dot otherLow = tip(trace(left, OptionalDouble.of(instant)), Ink.LEFT);
    double middle = 120;
    assertThat(low.filled()).isTrue();
    assertThat(high.filled()).isFalse();
    assertThat(low.y()).isGreaterThan(middle);
    assertThat(high.y() - middle).isCloseTo(middle - low.y(), within(1e-9));
    // The mirror image has the tips to the other side in depth; heights above level are the same.
    ObliqueView view = ObliqueView.filling(240, 8);
    double depth = view.y(1, 0) - middle;
    assertThat(low.y() - middle - depth * Math.cos(bank))
        .isCloseTo(view.halfSpan() * Math.sin(bank), within(1e-9));
    assertThat(otherLow.y() - middle + depth * Math.cos(bank))
        .isCloseTo(view.halfSpan() * Math.sin(bank), within(1e-6));
  }

  private static Mark.Dot tip(Sheet sheet, Ink ink) {
    return Runs.all(Mark.Dot.class, sheet).stream()
        .filter(dot -> dot.ink() == ink && dot.radius() == 4.5)
        .findFirst()
        .orElseThrow();
  }

  @Test
  void theNearTipIsPaintedAfterTheFarOne() {
    // Wings level or nearly so: the right side is towards the reader.
    List<Mark.Polyline> lines =
        Runs.all(
            Mark.Polyline.class, trace(Runs.of("light-single-doublet"), OptionalDouble.empty()));
    assertThat(lines).extracting(line -> line.stroke().ink()).containsExactly(Ink.LEFT, Ink.RIGHT);
    assertThat(lines)
        .extracting(line -> line.stroke().dash())
        .containsExactly(Dash.DASHED, Dash.SOLID);
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void theRearViewIsMirroredWithTheBank(long seed) {
    double bank = 7 * new Random(seed).nextGaussian();
    List<Mark> right = RearView.draw(bank, 80);
    List<Mark> left = RearView.draw(-bank, 80);
    List<Mark.Dot> tips =
        right.stream().filter(Mark.Dot.class::isInstance).map(Mark.Dot.class::cast).toList();
    List<Mark.Dot> mirrored =
        left.stream().filter(Mark.Dot.class::isInstance).map(Mark.Dot.class::cast).toList();
    assertThat(tips).extracting(Mark.Dot::ink).containsExactly(Ink.RIGHT, Ink.LEFT);
    assertThat(80 - tips.get(0).x()).isCloseTo(mirrored.get(1).x(), within(1e-9));
    assertThat(tips.get(0).y()).isCloseTo(mirrored.get(1).y(), within(1e-9));
    // The right tip below the left one for a bank to the right.
    assertThat(Math.signum(tips.get(0).y() - tips.get(1).y()))
        .isEqualTo(Math.signum(Math.sin(bank)));
    for (Mark mark : right) {
      for (double coordinate : Runs.coordinates(mark)) {
        assertThat(coordinate).isBetween(-2.0, 82.0);
      }
    }
  }

  @Test
  void markersStandAtTheMeasures() {
    RunResult run = Runs.step(0.3);
    List<Strip> strips = RollStrips.of(run, Optional.empty());
    assertThat(strips.get(0).markers())
        .extracting(Marker::word)
        .containsExactly("30°", "45°", "60°", "90°");
    assertThat(strips.get(0).markers().get(0).time() - 1)
        .isCloseTo(run.measure("timeToBank30").orElseThrow().value().getAsDouble(), within(1e-9));
    assertThat(strips.get(1).markers()).extracting(Marker::word).containsExactly("63 %", "settled");
    // Of a hand that takes 0.15 s, from the middle of its movement.
    assertThat(strips.get(1).markers().get(0).time() - 1.075)
        .isCloseTo(
            run.measure("responseTimeConstant").orElseThrow().value().getAsDouble(), within(1e-9));
    assertThat(RollStrips.of(Runs.of("light-single-held-stick"), Optional.empty()).get(3).markers())
        .containsExactly(new Marker(4.5, "released"));
  }

  @Test
  void powerHasAStripWhereItChanges() {
    List<Strip> strips = RollStrips.of(Runs.of("tarnlark-power-step"), Optional.empty());
    assertThat(strips).hasSize(6);
    assertThat(strips.get(5).title()).isEqualTo("Power");
    double[] power = strips.get(5).curves().get(0).value();
    // from 20 kW of 75, and nearly all after eleven time constants
    assertThat(power[0]).isCloseTo(100 * 20.0 / 75, within(1e-9));
    assertThat(power[power.length - 1]).isCloseTo(100 * (20.0 / 75 + 0.73), within(0.01));
    assertThat(RollStrips.of(Runs.of("tarnlark-go-around"), Optional.empty())).hasSize(5);
  }

  @Test
  void theSideIsThatOfTheInputTheStartOrTheEnd() {
    assertThat(RollStrips.side(Runs.step(0.3))).isEqualTo(Ink.RIGHT);
    assertThat(RollStrips.side(Runs.step(-0.3))).isEqualTo(Ink.LEFT);
    assertThat(RollStrips.side(Runs.of("light-single-wing-drop"))).isEqualTo(Ink.RIGHT);
    assertThat(RollStrips.side(Runs.of("tarnlark-go-around"))).isEqualTo(Ink.LEFT);
  }

  @Test
  void aZoomedWindowShowsOnlyItself() {
    RunResult run = Runs.of("light-single-held-stick");
    TimeWindow window = new TimeWindow(0.5, 1.5);
    PlotArea area =
        StripChart.draw(RollStrips.of(run, Optional.empty()), window, WIDTH, 600, 124, 96)
            .areas()
            .get(0);
    assertThat(area.high()).isLessThan(10);
    Sheet trace =
        WingTrace.draw(
            run, Optional.of(run), 10, window, WIDTH, 240, 124, 96, OptionalDouble.of(200));
    for (Mark mark : Runs.flat(trace.marks())) {
      for (double coordinate : Runs.coordinates(mark)) {
        assertThat(coordinate).isBetween(0.0, WIDTH);
      }
    }
  }

  /** A frame at 60 Hz leaves 16 ms; a machine under tests is given three times that. */
  @Test
  void aLongHistoryIsDrawnWithinAFrame() {
    RunResult run = Runs.of("light-single-held-stick");
    assertThat(run.history().size()).isGreaterThan(33_000);
    List<Strip> strips = RollStrips.of(run, Optional.empty());
    long best = Long.MAX_VALUE;
    for (int i = 0; i < 20; i++) {
      long start = System.nanoTime();
      StripChart.draw(strips, RollStrips.window(run), WIDTH, 600, 124, 96);
      trace(run, OptionalDouble.of(3));
      best = Math.min(best, System.nanoTime() - start);
    }
    assertThat(best / 1e6).isLessThan(50);
  }
}
