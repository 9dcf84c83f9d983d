package org.rolltrace.core.files;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.rolltrace.core.pilot.Control;
import org.rolltrace.core.pilot.InputShape;
import org.rolltrace.core.pilot.PilotInput;
import org.rolltrace.core.quantity.Dimension;

/** One input of the pilot. A further shape is one more entry in {@link #SHAPES}. */
final class InputFormat {
  private static final String CONTROL = "control";
  private static final String SHAPE = "shape";
  private static final String START = "start";
  private static final String SIZE = "size";
  private static final String MOVEMENT = "movement";

  private static final Range FRACTION =
      Range.fromTo(-1, 1, "from -1 to 1, a fraction of the travel, right positive");

  private static final Keys ANY = Keys.of("an input").required(CONTROL, SHAPE);

  /** The keys of shapes that are one movement, without a hand that makes moves. */
  static final Keys SMOOTH = ANY.required(START, SIZE);

  /** The keys of shapes that are made of moves of the hand. */
  static final Keys COMMON = SMOOTH.optional(MOVEMENT);

  /** The keys of a recorded movement. */
  static final Keys RECORDED = ANY.optional(START, SIZE);

  static final List<ShapeFormat> SHAPES =
      List.of(
          new StepFormat(),
          new HoldFormat(),
          new DoubletFormat(),
          new MultistepFormat(),
          new RampFormat(),
          new SweepFormat(),
          new TraceFormat());

  private InputFormat() {}

  static Optional<PilotInput> read(
      JsonValue.ObjectValue object, Faults faults, Map<String, String> carried) {
    Optional<ShapeFormat> format = format(object);
    ObjectCursor in =
        format.isPresent()
            ? ObjectCursor.of(object, format.get().keys(), keysOfShapes(), faults)
            // Of an unknown shape the other keys cannot be judged: all are let pass.
            : ObjectCursor.of(object, keysOfAnyShape(), faults);
    if (format.isEmpty()) {
      in.word(SHAPE, words());
    }
    Optional<Control> control = control(in);
    ShapeFormat.Common common =
        new ShapeFormat.Common(
            in.quantity(START, Dimension.TIME, Range.ZERO_OR_MORE, 0),
            in.number(SIZE, FRACTION, 1),
            in.quantity(MOVEMENT, Dimension.TIME, Range.ZERO_OR_MORE, InputShape.DEFAULT_MOVEMENT),
            carried);
    if (format.isEmpty()) {
      return Optional.empty();
    }
    Optional<InputShape> shape = format.get().read(in, common);
    return shape.isPresent() && in.isSound()
        ? Optional.of(new PilotInput(control.orElseThrow(), shape.get()))
        : Optional.empty();
  }

  private static Optional<ShapeFormat> format(JsonValue.ObjectValue object) {
    JsonValue.Member member = object.members().get(SHAPE);
    if (member != null && member.value() instanceof JsonValue.Text text) {
      for (ShapeFormat format : SHAPES) {
        if (format.word().equals(text.text())) {
          return Optional.of(format);
        }
      }
    }
    return Optional.empty();
  }

  static List<String> words() {
    List<String> words = new ArrayList<>();
    for (ShapeFormat format : SHAPES) {
      words.add(format.word());
    }
    return words;
  }

  private static List<Keys> keysOfShapes() {
    List<Keys> all = new ArrayList<>();
    for (ShapeFormat format : SHAPES) {
      all.add(format.keys());
    }
    return all;
  }

  static Keys keysOfAnyShape() {
    Keys any = COMMON;
    for (Keys keys : keysOfShapes()) {
      for (String key : keys.all()) {
        any = any.has(key) ? any : any.optional(key);
      }
    }
    return any;
  }

  private static Optional<Control> control(ObjectCursor in) {
    List<String> words = new ArrayList<>();
    for (Control control : Control.values()) {
      words.add(control.word());
    }
    Optional<String> word = in.word(CONTROL, words);
    for (Control control : Control.values()) {
      if (word.isPresent() && control.word().equals(word.get())) {
        return Optional.of(control);
      }
    }
    return Optional.empty();
  }
}
