package org.rolltrace.core.files;

import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.function.BiFunction;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.rolltrace.core.pilot.Control;
import org.rolltrace.core.pilot.HandRecord;
import org.rolltrace.core.scenario.Scenario;

/**
 * A scenario file as it is written, to be edited: what stands in it, right or wrong, in its order,
 * with its digits and units. Immutable.
 *
 * <p>Paths lead to values as they do in faults: {@code $.condition.trueAirspeed}, {@code
 * $.inputs[0].size}. Methods that take one throw {@link IllegalArgumentException} for text that is
 * no path, and {@link IndexOutOfBoundsException} for an index beyond the end of a list.
 *
 * <p>A document may carry traces that are in no file yet, such as those that were just flown by
 * hand; writing the document writes them beside it.
 *
 * <p>Two documents are equal when they would be written alike into the same file.
 */
public final class ScenarioDocument {
  private static final String AEROPLANE = "$.aeroplane";
  private static final String INPUTS = "$.inputs";

  private static final String HELD_SLIP = "$.heldSlip";

  private static final JsonPath.Step VARIANTS = new JsonPath.Step(Variants.KEY, -1);

  /** What a hand flies. */
  private static final List<String> HANDS = List.of(Control.STICK.word(), Control.PEDAL.word());

  /** A number, a blank and something that may be a unit. */
  private static final Pattern ANGLE =
      Pattern.compile("[+-]?(\\d+\\.?\\d*|\\.\\d+)([eE][+-]?\\d+)? .*");

  private static final Pattern NUMBER =
      Pattern.compile("-?(0|[1-9]\\d*)(\\.\\d+)?([eE][+-]?\\d+)?");

  private final Path file;
  private final JsonNode.Group root;
  private final String json;
  private final NamedAeroplane named;

  /** Texts of trace files that are in no file yet, by their names here. */
  private final Map<String, String> carried;

  /** The aeroplane that flies, as it was when it was last asked for; made again when not. */
  private volatile Flown flown;

  /** An aeroplane, and what the chosen variant makes of it. */
  private record Flown(JsonNode.Group base, JsonNode.Group merged) {}

  private ScenarioDocument(
      Path file, JsonNode.Group root, NamedAeroplane named, Map<String, String> carried) {
    this.file = file;
    this.root = root;
    this.json = JsonPrinter.print(root);
    this.named = named;
    this.carried = carried;
  }

  /**
   * What reading makes of a document.
   *
   * @param scenario the scenario; empty when there is a fault
   * @param faults all faults, at most 200, those of the document first, then those of the aeroplane
   *     file it names; lines are those of {@link ScenarioDocument#json}
   */
  public record Check(Optional<Scenario> scenario, List<FileFault> faults) {
    public Check {
      faults = List.copyOf(faults);
    }
  }

  /**
   * Opens a scenario file.
   *
   * @param file where it is
   * @return what stands in it; it may have faults
   * @throws FileFaultsException if it cannot be read as a JSON object
   */
  public static ScenarioDocument open(Path file) {
    return new ScenarioDocument(file, NamedAeroplane.read(file), new NamedAeroplane(), Map.of());
  }

  /**
   * A document that is in no file yet.
   *
   * @param json its text
   * @param directory from where the path of an aeroplane file counts
   * @return what stands in the text; it may have faults
   * @throws FileFaultsException if it cannot be read as a JSON object
   */
  public static ScenarioDocument ofText(String json, Path directory) {
    return ofText(json, directory.resolve("unsaved scenario"), new NamedAeroplane());
  }

  /**
   * A document that belongs to a file, whatever stands there now.
   *
   * @param json its text
   * @param file the file
   * @return what stands in the text; it may have faults
   * @throws FileFaultsException if it cannot be read as a JSON object
   */
  public static ScenarioDocument ofFileText(String json, Path file) {
    return ofText(json, file, new NamedAeroplane());
  }

  private static ScenarioDocument ofText(String json, Path file, NamedAeroplane named) {
    Faults faults = new Faults(file);
    Optional<JsonValue.ObjectValue> object =
        JsonTree.read(json.getBytes(StandardCharsets.UTF_8), faults);
    return new ScenarioDocument(
        file, JsonNode.group(object.orElseThrow(faults::toException)), named, Map.of());
  }

  private ScenarioDocument of(JsonNode newRoot) {
    return newRoot.equals(root)
        ? this
        : new ScenarioDocument(file, (JsonNode.Group) newRoot, named, carried);
  }

  private ScenarioDocument with(String path, JsonNode value) {
    return of(JsonNode.with(root, JsonPath.steps(path), value));
  }

  private Optional<JsonNode> find(String path) {
    return JsonNode.find(root, JsonPath.steps(path));
  }

  private Optional<JsonNode.Group> group(String path, boolean isList) {
    return find(path)
        .flatMap(
            node ->
                node instanceof JsonNode.Group group && group.isList() == isList
                    ? Optional.of(group)
                    : Optional.empty());
  }

  private static Optional<String> written(JsonNode node) {
    if (node instanceof JsonNode.Text text) {
      return Optional.of(text.text());
    }
    return node instanceof JsonNode.Bare bare ? Optional.of(bare.written()) : Optional.empty();
  }

  /**
   * A value as it stands in the document.
   *
   * @param path where
   * @return text without its quotation marks, a number with its digits; empty for an object, a
   *     list, and where there is nothing
   */
  public Optional<String> text(String path) {
    return find(path).flatMap(ScenarioDocument::written);
  }

  /**
   * The same with another text.
   *
   * @param path where; objects on the way are made when they are missing
   * @param text a quantity or words, as people write them; it is not judged here
   * @return the edited document
   */
  public ScenarioDocument with(String path, String text) {
    return with(path, new JsonNode.Text(text));
  }

  /**
   * The same with another number.
   *
   * @param path where; objects on the way are made when they are missing
   * @param digits the number; what JSON does not know as one is written as text, so that reading
   *     finds its fault
   * @return the edited document
   */
  public ScenarioDocument withNumber(String path, String digits) {
    return with(path, number(digits));
  }

  private static JsonNode number(String digits) {
    return NUMBER.matcher(digits).matches() ? new JsonNode.Bare(digits) : new JsonNode.Text(digits);
  }

  /**
   * The numbers of a list as they stand in the document.
   *
   * @param path where
   * @return them with a comma and a blank between; empty when there is no list
   */
  public Optional<String> numbers(String path) {
    return group(path, true)
        .map(
            list ->
                list.items().stream()
                    .map(item -> written(item.value()).orElse("?"))
                    .collect(Collectors.joining(", ")));
  }

  /**
   * The same with another list of numbers.
   *
   * @param path where; objects on the way are made when they are missing
   * @param numbers with commas, hyphens or blanks between; what JSON does not know as a number is
   *     written as text, so that reading finds its fault
   * @return the edited document
   */
  public ScenarioDocument withNumbers(String path, String numbers) {
    List<JsonNode.Item> items = new ArrayList<>();
    for (String digits : numbers.strip().split("\\s*[,\\s-]\\s*", -1)) {
      items.add(new JsonNode.Item("", number(digits), false));
    }
    return with(path, new JsonNode.Group(true, items, false));
  }

  /**
   * The same without a value.
   *
   * @param path where; it may lead nowhere
   * @return the edited document
   */
  public ScenarioDocument without(String path) {
    return of(JsonNode.without(root, JsonPath.steps(path)));
  }

  /**
   * How many inputs there are.
   *
   * @return 0 also when there is no list of them
   */
  public int inputCount() {
    return group(INPUTS, true).map(list -> list.items().size()).orElse(0);
  }

  private static String input(int index) {
    return INPUTS + "[" + index + "]";
  }

  private String existingInput(int index) {
    if (index < 0 || index >= inputCount()) {
      throw new IndexOutOfBoundsException(
          "input " + index + " of " + inputCount() + "; expected one from 0");
    }
    return input(index);
  }

  /**
   * The same with one more input, behind the others: half the travel to the right, or all of a
   * trace, with the usual time for the hand and lengths.
   *
   * @param control such as {@code stick}
   * @param shape such as {@code step}
   * @param startSeconds when it starts, s, from 0; written to the millisecond
   * @return the edited document
   * @throws IllegalArgumentException if there is no such shape, or the start is no time
   */
  public ScenarioDocument withInputAdded(String control, String shape, double startSeconds) {
    if (!(startSeconds >= 0 && startSeconds < Double.POSITIVE_INFINITY)) {
      throw new IllegalArgumentException(
          "the start is " + startSeconds + " s; expected a time of 0 s or later");
    }
    String at = input(inputCount());
    return with(at + ".control", control)
        .with(at + ".shape", shape)
        .with(at + ".start", seconds(startSeconds))
        .withNumber(at + ".size", format(shape).usualSize())
        .with(at + ".movement", "0.15 s")
        .withInputShape(inputCount(), shape);
  }

  private static String seconds(double time) {
    String digits = String.format(Locale.ROOT, "%.3f", time);
    return digits.replaceFirst("\\.?0+$", "") + " s";
  }

  /**
   * The same without an input.
   *
   * @param index which, from 0
   * @return the edited document
   */
  public ScenarioDocument withoutInput(int index) {
    return without(existingInput(index));
  }

  /**
   * The same with an input of another shape. What all shapes share stays; what only others have is
   * left out, and what only the new one has is as usual.
   *
   * @param index which input, from 0
   * @param shape such as {@code hold}
   * @return the edited document
   * @throws IllegalArgumentException if there is no such shape
   */
  public ScenarioDocument withInputShape(int index, String shape) {
    String at = existingInput(index);
    ShapeFormat format = format(shape);
    ScenarioDocument changed = this;
    for (String key : InputFormat.keysOfAnyShape().all()) {
      if (!format.keys().has(key)) {
        changed = changed.without(at + "." + key);
      }
    }
    changed = changed.with(at + ".shape", shape);
    if (format.keys().required().contains("start") && find(at + ".start").isEmpty()) {
      changed = changed.with(at + ".start", "0 s");
    }
    if (format.keys().required().contains("size") && find(at + ".size").isEmpty()) {
      changed = changed.withNumber(at + ".size", format.usualSize());
    }
    for (Map.Entry<String, String> usual : format.usual().entrySet()) {
      String path = at + "." + usual.getKey();
      if (changed.find(path).isEmpty()) {
        changed = changed.with(path, usual.getValue());
      }
    }
    return changed;
  }

  /**
   * The shapes that an input may have.
   *
   * @return their words, the plainest first
   */
  public static List<String> shapes() {
    return List.copyOf(InputFormat.words());
  }

  private static ShapeFormat format(String shape) {
    for (ShapeFormat format : InputFormat.SHAPES) {
      if (format.word().equals(shape)) {
        return format;
      }
    }
    throw new IllegalArgumentException(
        "the shape is " + Shown.text(shape) + "; expected one of " + InputFormat.words());
  }

  /**
   * The same with every input on stick and pedals and every held sideslip to the other side.
   *
   * @return the edited document; sizes that are no numbers and sideslips that are no angles stay
   */
  public ScenarioDocument mirrored() {
    ScenarioDocument changed = this;
    for (int i = 0; i < inputCount(); i++) {
      if (text(input(i) + ".control").equals(Optional.of(Control.POWER.word()))) {
        continue;
      }
      String size = input(i) + ".size";
      Optional<JsonNode> written = find(size);
      if (written.isPresent()
          && written.get() instanceof JsonNode.Bare number
          && NUMBER.matcher(number.written()).matches()) {
        changed = changed.withNumber(size, negated(number.written()));
      } else if (written.isEmpty() && text(input(i) + ".shape").equals(Optional.of("trace"))) {
        changed = changed.withNumber(size, "-1");
      }
    }
    for (int i = 0; i < heldSlipCount(); i++) {
      String sideslip = HELD_SLIP + "[" + i + "].sideslip";
      Optional<String> angle = text(sideslip);
      if (angle.isPresent() && ANGLE.matcher(angle.get()).matches()) {
        changed = changed.with(sideslip, negated(angle.get()));
      }
    }
    return changed;
  }

  /** A number, or one with a unit, of the other sign. */
  private static String negated(String digits) {
    String number = digits.indexOf(' ') < 0 ? digits : digits.substring(0, digits.indexOf(' '));
    if (Double.parseDouble(number) == 0) {
      return digits;
    }
    if (digits.startsWith("-")) {
      return digits.substring(1);
    }
    return "-" + (digits.startsWith("+") ? digits.substring(1) : digits);
  }

  /**
   * The same flown by hand: what the hand did in place of all inputs on stick and pedals, as traces
   * that the document carries until it is written, and its end as the duration. Inputs on other
   * controls stay.
   *
   * @param record what the hand did; it moves at least one control and lasts longer than 0 s
   * @param fileName what the file of the traces should be called, such as {@code by-hand.csv}; a
   *     number is added when there is such a file
   * @return the edited document
   * @throws IllegalArgumentException if nothing moves, or the record has no length
   */
  public ScenarioDocument flownByHand(HandRecord record, String fileName) {
    List<Control> moved = Stream.of(Control.STICK, Control.PEDAL).filter(record::moves).toList();
    if (moved.isEmpty() || !(record.end() > 0)) {
      throw new IllegalArgumentException(
          "the hand record has "
              + record
              + " and moves "
              + moved
              + "; expected one longer than 0 s that moves stick or pedals");
    }
    String name = freeName(fileName, Optional.empty());
    ScenarioDocument changed = this;
    for (int i = inputCount() - 1; i >= 0; i--) {
      Optional<String> control = text(input(i) + ".control");
      if (control.isEmpty() || HANDS.contains(control.get())) {
        changed = changed.withoutInput(i);
      }
    }
    for (Control control : moved) {
      String at = input(changed.inputCount());
      changed =
          changed
              .with(at + ".control", control.word())
              .with(at + ".shape", "trace")
              .with(at + "." + TraceFormat.FILE, name)
              .with(at + ".column", control.word());
    }
    Map<String, String> texts = new TreeMap<>(changed.carriedTraces());
    texts.put(name, TraceCsv.text(record.simplified()));
    return changed.with("$.duration", seconds(record.end())).carrying(texts);
  }

  /** A name beside the document that no other file and no other trace has. */
  private String freeName(String wanted, Optional<String> text) {
    int dot = wanted.lastIndexOf('.');
    String stem = dot > 0 ? wanted.substring(0, dot) : wanted;
    String ending = dot > 0 ? wanted.substring(dot) : "";
    String name = wanted;
    for (int i = 2; isTaken(name, text); i++) {
      name = stem + "-" + i + ending;
    }
    return name;
  }

  /** Whether a file has a name, and not the text that would be written into it. */
  private boolean isTaken(String name, Optional<String> text) {
    try {
      Path place = file.resolveSibling(name);
      if (text.isEmpty()) {
        return carried.containsKey(name) || Files.exists(place);
      }
      boolean isOfAnother = carried.containsKey(name) && !text.get().equals(carried.get(name));
      if (isOfAnother || !Files.exists(place)) {
        return isOfAnother;
      }
      return !Arrays.equals(TextFile.bytes(place), text.get().getBytes(StandardCharsets.UTF_8));
    } catch (UnusableFileException other) {
      return true;
    }
  }

  /** The same with names for the carried traces that no other file has. */
  ScenarioDocument withFreeTraceNames() {
    ScenarioDocument changed = this;
    Map<String, String> texts = new TreeMap<>();
    for (Map.Entry<String, String> trace : carriedTraces().entrySet()) {
      String name = freeName(trace.getKey(), Optional.of(trace.getValue()));
      texts.put(name, trace.getValue());
      for (int i = 0; i < inputCount(); i++) {
        if (traceName(i).equals(Optional.of(trace.getKey()))) {
          changed = changed.with(traceFile(i), name);
        }
      }
    }
    return changed.carrying(texts);
  }

  /**
   * The traces of this document that are in no file yet.
   *
   * @return the texts of CSV files by the names that inputs give them; none that no input names
   */
  public Map<String, String> carriedTraces() {
    Map<String, String> named = new TreeMap<>();
    for (int i = 0; i < inputCount(); i++) {
      traceName(i)
          .filter(carried::containsKey)
          .ifPresent(name -> named.put(name, carried.get(name)));
    }
    return named;
  }

  /**
   * The same with other traces that are in no file yet.
   *
   * @param traces the texts of CSV files by the names that inputs give them
   * @return the document
   */
  public ScenarioDocument carrying(Map<String, String> traces) {
    return traces.equals(carried)
        ? this
        : new ScenarioDocument(file, root, named, Map.copyOf(traces));
  }

  /**
   * How a file is called in this document.
   *
   * @param other a file
   * @return the path that leads there from the folder of this document
   */
  public String nameOf(Path other) {
    Path absolute = other.toAbsolutePath();
    return NamedAeroplane.seenFrom(file, absolute, String.valueOf(absolute.getFileName()));
  }

  /**
   * How many points of a sideslip held against time there are.
   *
   * @return 0 also when there is no list of them
   */
  public int heldSlipCount() {
    return group(HELD_SLIP, true).map(list -> list.items().size()).orElse(0);
  }

  /**
   * Whether the aeroplane stands in the scenario itself.
   *
   * @return false when a path leads to its file, and when there is none
   */
  public boolean aeroplaneIsInline() {
    return group(AEROPLANE, false).isPresent();
  }

  /**
   * The same with the aeroplane in it, copied from its file, so that it can be edited. The file
   * stays as it is.
   *
   * @return the edited document; this one when the aeroplane is in it already, or none is named
   * @throws FileFaultsException if the aeroplane file cannot be read as a JSON object
   */
  public ScenarioDocument withAeroplaneInline() {
    Optional<String> name = aeroplaneName();
    return name.isEmpty() ? this : with(AEROPLANE, named.object(file, name.get()));
  }

  private Optional<String> aeroplaneName() {
    return find(AEROPLANE)
        .flatMap(
            node ->
                node instanceof JsonNode.Text text ? Optional.of(text.text()) : Optional.empty());
  }

  private static String traceFile(int index) {
    return input(index) + "." + TraceFormat.FILE;
  }

  private Optional<String> traceName(int index) {
    return find(traceFile(index))
        .flatMap(
            node ->
                node instanceof JsonNode.Text text ? Optional.of(text.text()) : Optional.empty());
  }

  /**
   * A value of the aeroplane that flies, wherever it stands: that of the variant, if the scenario
   * picks one.
   *
   * @param path from the aeroplane on, such as {@code inertia.roll}
   * @return as {@link #text}; empty also when the aeroplane file cannot be read
   */
  public Optional<String> aeroplaneText(String path) {
    return aeroplaneNode(path).flatMap(ScenarioDocument::written);
  }

  /**
   * Whether the aeroplane that flies has something.
   *
   * @param path from the aeroplane on, such as {@code fin}
   * @return false also when the aeroplane file cannot be read
   */
  public boolean aeroplaneHas(String path) {
    return aeroplaneNode(path).isPresent();
  }

  /**
   * How many elements a list of the aeroplane that flies has.
   *
   * @param path from the aeroplane on, such as {@code wing.panels}
   * @return 0 also when there is no such list
   */
  public int aeroplaneCount(String path) {
    return aeroplaneNode(path)
        .map(node -> node instanceof JsonNode.Group group && group.isList() ? group : null)
        .map(list -> list.items().size())
        .orElse(0);
  }

  private Optional<JsonNode> aeroplaneNode(String path) {
    return aeroplane().flatMap(group -> JsonNode.find(merged(group), JsonPath.steps("$." + path)));
  }

  /** The base, wherever it stands. */
  private Optional<JsonNode.Group> aeroplane() {
    Optional<String> name = aeroplaneName();
    if (name.isEmpty()) {
      return group(AEROPLANE, false);
    }
    try {
      return Optional.of(named.object(file, name.get()));
    } catch (FileFaultsException e) {
      return Optional.empty(); // its faults are among those of the check
    }
  }

  // An equal aeroplane that is another object is rare, and then merged anew.
  @SuppressWarnings("ReferenceEquality")
  private JsonNode.Group merged(JsonNode.Group base) {
    Flown last = flown;
    if (last == null || last.base() != base) {
      Optional<JsonNode.Group> changes = variantOf(base).map(steps -> changes(base, steps));
      last = new Flown(base, changes.map(patch -> JsonNode.merged(base, patch)).orElse(base));
      flown = last;
    }
    return last.merged();
  }

  private static JsonNode.Group changes(JsonNode.Group base, List<JsonPath.Step> variant) {
    return (JsonNode.Group) JsonNode.find(base, variant).orElseThrow();
  }

  /** From an aeroplane to what the chosen variant changes; empty when none is, or there is none. */
  private Optional<List<JsonPath.Step>> variantOf(JsonNode.Group base) {
    return text("$.variant")
        .map(name -> List.of(VARIANTS, new JsonPath.Step(name, -1)))
        .filter(
            steps ->
                JsonNode.find(base, steps)
                    .filter(node -> node instanceof JsonNode.Group group && !group.isList())
                    .isPresent());
  }

  /**
   * The variants of the aeroplane, wherever it stands.
   *
   * @return their names, in their order; none when there are none, or the file cannot be read
   */
  public List<String> variants() {
    return aeroplane()
        .flatMap(base -> JsonNode.find(base, List.of(VARIANTS)))
        .map(
            node ->
                node instanceof JsonNode.Group all && !all.isList()
                    ? all.items().stream().map(JsonNode.Item::key).distinct().toList()
                    : List.<String>of())
        .orElse(List.of());
  }

  /**
   * The variant that the scenario picks.
   *
   * @return its name; empty when it picks none, or one that there is not
   */
  public Optional<String> variant() {
    return aeroplane().flatMap(this::variantOf).map(steps -> steps.get(1).key());
  }

  /**
   * The places at which a value of the aeroplane that flies may stand: of the base, and when a
   * variant flies, of what that changes.
   *
   * @param path from the aeroplane on, such as {@code inertia.roll}
   * @return paths as faults name them
   */
  public List<String> aeroplanePaths(String path) {
    String ofBase = AEROPLANE + "." + path;
    return variant()
        .map(
            name ->
                List.of(
                    ofBase, JsonValue.Place.memberPath(AEROPLANE + ".variants", name) + "." + path))
        .orElse(List.of(ofBase));
  }

  /**
   * The same with another text in the scenario's own copy of the aeroplane. While a variant flies,
   * the change is the variant's, and the base stays.
   *
   * @param path from the aeroplane on, such as {@code wing.panels[0].to}
   * @param text as in {@link #with(String, String)}
   * @return the edited document
   * @throws FileFaultsException if the aeroplane file cannot be read as a JSON object
   */
  public ScenarioDocument withAeroplane(String path, String text) {
    return withAeroplane(path, new JsonNode.Text(text));
  }

  /**
   * The same with another number in the scenario's own copy of the aeroplane, as {@link
   * #withAeroplane(String, String)} has a text.
   *
   * @param path from the aeroplane on, such as {@code ailerons.chordShare}
   * @param digits as in {@link #withNumber}
   * @return the edited document
   * @throws FileFaultsException if the aeroplane file cannot be read as a JSON object
   */
  public ScenarioDocument withAeroplaneNumber(String path, String digits) {
    return withAeroplane(path, number(digits));
  }

  private ScenarioDocument withAeroplane(String path, JsonNode value) {
    return reshaped(path, (from, steps) -> JsonNode.with(from, steps, value));
  }

  /**
   * The same without something in the scenario's own copy of the aeroplane. While a variant flies,
   * it is the variant that does without, and the base stays.
   *
   * @param path from the aeroplane on, such as {@code fin}; it may lead nowhere
   * @return the edited document
   * @throws FileFaultsException if the aeroplane file cannot be read as a JSON object
   */
  public ScenarioDocument withoutAeroplane(String path) {
    List<JsonPath.Step> steps = JsonPath.steps("$." + path);
    ScenarioDocument inside = withAeroplaneInline();
    boolean ofBase =
        inside
            .group(AEROPLANE, false)
            .filter(base -> inside.variantOf(base).isPresent())
            .flatMap(base -> JsonNode.find(base, steps))
            .isPresent();
    boolean inList = steps.stream().anyMatch(JsonPath.Step::isIndex);
    return ofBase && !inList
        ? inside.withAeroplane(path, new JsonNode.Bare("null"))
        : inside.reshaped(path, JsonNode::without);
  }

  private ScenarioDocument reshaped(
      String path, BiFunction<JsonNode, List<JsonPath.Step>, JsonNode> change) {
    ScenarioDocument inside = withAeroplaneInline();
    List<JsonPath.Step> steps = JsonPath.steps("$." + path);
    List<JsonPath.Step> at = new ArrayList<>(JsonPath.steps(AEROPLANE));
    JsonNode from = inside.root;
    Optional<JsonNode.Group> base = inside.group(AEROPLANE, false);
    Optional<List<JsonPath.Step>> variant = base.flatMap(inside::variantOf);
    if (variant.isPresent()) {
      at.addAll(variant.get());
      // A variant has a list as a whole or not at all.
      for (int i = 0; i < steps.size(); i++) {
        List<JsonPath.Step> list = steps.subList(0, i);
        if (steps.get(i).isIndex() && JsonNode.find(from, joined(at, list)).isEmpty()) {
          Optional<JsonNode> ofBase = JsonNode.find(base.get(), list);
          if (ofBase.isPresent()) {
            from = JsonNode.with(from, joined(at, list), ofBase.get());
          }
        }
      }
    }
    return inside.of(change.apply(from, joined(at, steps)));
  }

  private static List<JsonPath.Step> joined(List<JsonPath.Step> one, List<JsonPath.Step> other) {
    List<JsonPath.Step> steps = new ArrayList<>(one);
    steps.addAll(other);
    return steps;
  }

  /**
   * The same as it would stand in another file.
   *
   * @param newFile where
   * @return a document whose paths to aeroplane and trace files lead there from the new place;
   *     traces that it carries keep their names
   */
  public ScenarioDocument at(Path newFile) {
    if (newFile.equals(file)) {
      return this;
    }
    JsonNode moved = root;
    Optional<String> name = aeroplaneName();
    if (name.isPresent()) {
      String seen = NamedAeroplane.seenFrom(newFile, file, name.get());
      moved = JsonNode.with(root, JsonPath.steps(AEROPLANE), new JsonNode.Text(seen));
    }
    for (int i = 0; i < inputCount(); i++) {
      Optional<String> trace = traceName(i);
      if (trace.isPresent() && !carried.containsKey(trace.get())) {
        String seen = NamedAeroplane.seenFrom(newFile, file, trace.get());
        moved = JsonNode.with(moved, JsonPath.steps(traceFile(i)), new JsonNode.Text(seen));
      }
    }
    return new ScenarioDocument(newFile, (JsonNode.Group) moved, named, carried);
  }

  /**
   * The text of the file: two blanks for each level, short objects on one line, lines that somebody
   * chose kept.
   *
   * @return JSON
   */
  public String json() {
    return json;
  }

  /**
   * Reads the document, with the aeroplane file it names, as a file of this text would be.
   *
   * @return the scenario, or all faults
   */
  public Check check() {
    Faults faults = new Faults(file);
    byte[] bytes = json.getBytes(StandardCharsets.UTF_8);
    Optional<Scenario> scenario = ScenarioFile.read(bytes, faults, carried);
    if (bytes.length > TextFile.LARGEST) {
      faults.addForWholeFile(TextFile.tooLarge(bytes.length + " bytes").getMessage());
    }
    return new Check(faults.count() > 0 ? Optional.empty() : scenario, faults.sorted());
  }

  /**
   * Where a fault is, as seen from the document.
   *
   * @param fault one of this document
   * @return its path; below {@code $.aeroplane} when it is in the aeroplane file, that of the name
   *     of a trace file when it is in one
   */
  public String pathOf(FileFault fault) {
    if (fault.file().equals(file)) {
      return fault.jsonPath();
    }
    for (int i = 0; i < inputCount(); i++) {
      if (traceName(i).isPresent() && leadsTo(traceName(i).get(), fault.file())) {
        return traceFile(i);
      }
    }
    return AEROPLANE + fault.jsonPath().substring(1);
  }

  private boolean leadsTo(String name, Path named) {
    try {
      return file.resolveSibling(name).equals(named);
    } catch (InvalidPathException e) {
      return false;
    }
  }

  /**
   * From where the path of an aeroplane file counts.
   *
   * @return the absolute directory
   */
  public Path directory() {
    Path parent = file.toAbsolutePath().getParent();
    return parent == null ? file.toAbsolutePath() : parent;
  }

  @Override
  public boolean equals(Object other) {
    return other instanceof ScenarioDocument document
        && document.json.equals(json)
        && document.file.equals(file)
        && document.carried.equals(carried);
  }

  @Override
  public int hashCode() {
    return json.hashCode();
  }

  /**
   * The text.
   *
   * @return as {@link #json}
   */
  @Override
  public String toString() {
    return json;
  }
}
