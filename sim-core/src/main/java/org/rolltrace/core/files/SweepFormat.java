package org.rolltrace.core.files;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.rolltrace.core.pilot.InputShape;
import org.rolltrace.core.pilot.SweepInput;
import org.rolltrace.core.quantity.Dimension;

/** A sine from one frequency to another. */
final class SweepFormat implements ShapeFormat {
  private static final String FROM = "from";
  private static final String TO = "to";
  private static final String DURATION = "duration";
  private static final String LAW = "law";

  private static final Range FREQUENCY =
      Range.aboveZeroTo(SweepInput.HIGHEST, "a frequency above 0 and at most 20 Hz");

  static final List<String> LAWS =
      List.of(SweepInput.Law.LINEAR.word(), SweepInput.Law.LOGARITHMIC.word());

  @Override
  public String word() {
    return "sweep";
  }

  @Override
  public Keys keys() {
    return InputFormat.SMOOTH.named("shape \"sweep\"").required(FROM, TO, DURATION).optional(LAW);
  }

  @Override
  public Map<String, String> usual() {
    return Map.of(FROM, "0.2 Hz", TO, "2 Hz", DURATION, "20 s");
  }

  @Override
  public Optional<InputShape> read(ObjectCursor in, Common common) {
    double from = in.frequency(FROM, FREQUENCY);
    double to = in.frequency(TO, FREQUENCY);
    double duration = in.quantity(DURATION, Dimension.TIME, Range.ABOVE_ZERO);
    SweepInput.Law law =
        in.word(LAW, LAWS).flatMap(SweepInput.Law::ofWord).orElse(SweepInput.Law.LINEAR);
    return in.isSound()
        ? Optional.of(new SweepInput(common.start(), common.size(), from, to, duration, law))
        : Optional.empty();
  }
}
