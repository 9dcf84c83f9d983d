package org.rolltrace.ui.manoeuvre;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.UnaryOperator;
import javafx.beans.property.IntegerProperty;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.SimpleIntegerProperty;
import javafx.scene.Cursor;
import javafx.scene.canvas.Canvas;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.input.MouseEvent;
import javafx.scene.layout.Region;
import org.rolltrace.core.files.ScenarioDocument;
import org.rolltrace.core.pilot.Control;
import org.rolltrace.core.run.RunResult;
import org.rolltrace.ui.chart.Anchor;
import org.rolltrace.ui.chart.Dash;
import org.rolltrace.ui.chart.Ink;
import org.rolltrace.ui.chart.Mark;
import org.rolltrace.ui.chart.Palette;
import org.rolltrace.ui.chart.StripChart;
import org.rolltrace.ui.chart.Stroke;
import org.rolltrace.ui.chart.TimeWindow;
import org.rolltrace.ui.chart.TypeSize;
import org.rolltrace.ui.control.CanvasPainter;

/**
 * What the hand did: stick and pedal lanes, and one of the power where it moves, with their inputs
 * as blocks to drag, stretch and resize.
 */
final class LanesPane extends Region {
  private static final double LANE = 40;
  private static final double GAP = 6;
  private static final double REACH = 6;

  /** How far apart the points of a smooth movement lie, px. */
  private static final double STEP = 0.5;

  /** Radius of a recorded point, px. */
  private static final double POINT = 1.8;

  /** Half the height of full travel. */
  private static final double FULL = 0.5 * LANE - 3;

  private final ManoeuvreModel model;
  private final ObjectProperty<Palette> palette;
  private final StagePane stage;
  private final Canvas canvas = new Canvas();
  private final IntegerProperty selected = new SimpleIntegerProperty(this, "selected", -1);
  private List<LaneBlock> blocks = List.of();
  private LaneBlock dragged;
  private LaneBlock.Part part;
  private double dragFrom;
  private double dragSize;

  LanesPane(ManoeuvreModel model, ObjectProperty<Palette> palette, StagePane stage) {
    this.model = model;
    this.palette = palette;
    this.stage = stage;
    setId("lanes");
    setFocusTraversable(true);
    setAccessibleText("Stick and pedal lanes");
    getChildren().add(canvas);
    setMinHeight(heightOf(lanes().size()));
    setPrefHeight(heightOf(lanes().size()));
    model.session().documentProperty().addListener((property, before, now) -> keepSelection());
    model.session().resultProperty().addListener((property, before, now) -> refresh());
    model.windowProperty().addListener((property, before, now) -> draw());
    palette.addListener((property, before, now) -> draw());
    selected.addListener((property, before, now) -> draw());
    addEventHandler(MouseEvent.MOUSE_MOVED, this::hover);
    addEventHandler(MouseEvent.MOUSE_PRESSED, this::press);
    addEventHandler(MouseEvent.MOUSE_DRAGGED, this::drag);
    addEventHandler(MouseEvent.MOUSE_RELEASED, event -> release());
    addEventHandler(MouseEvent.MOUSE_CLICKED, this::click);
    addEventHandler(KeyEvent.KEY_PRESSED, this::keyPressed);
    keepSelection();
    refresh();
  }

  /** The index of the selected input; −1 for none. */
  IntegerProperty selectedProperty() {
    return selected;
  }

  private void refresh() {
    RunResult result = model.session().resultProperty().get();
    List<LaneBlock> now =
        result == null ? List.of() : LaneBlock.of(result.scenario().programme().inputs());
    if (now.equals(blocks)) {
      return; // what is drawn is still so
    }
    blocks = now;
    setMinHeight(heightOf(lanes().size()));
    setPrefHeight(heightOf(lanes().size()));
    draw();
  }

  /** Stick and pedal always; the power only while there is an input on it. */
  private List<Control> lanes() {
    return blocks.stream().anyMatch(block -> block.control() == Control.POWER)
        ? List.of(Control.STICK, Control.PEDAL, Control.POWER)
        : List.of(Control.STICK, Control.PEDAL);
  }

  private static double heightOf(int lanes) {
    return lanes * (LANE + GAP) - GAP + 6;
  }

  private void keepSelection() {
    int count = inputCount();
    if (selected.get() >= count) {
      selected.set(count - 1);
    } else if (selected.get() < 0 && count > 0) {
      selected.set(0);
    }
  }

  /** How many inputs there are, also of those that cannot be flown and so have no block. */
  private int inputCount() {
    ScenarioDocument document = model.session().documentProperty().get();
    return document == null ? 0 : document.inputCount();
  }

  @Override
  protected void layoutChildren() {
    canvas.setWidth(getWidth());
    canvas.setHeight(getHeight());
    draw();
  }

  private double plotWidth() {
    return getWidth() - StagePane.AXIS_FROM - StripChart.RIGHT;
  }

  double xOf(double time) {
    TimeWindow window = model.windowProperty().get();
    return StagePane.AXIS_FROM + (time - window.from()) / window.length() * plotWidth();
  }

  private double timeAt(double x) {
    TimeWindow window = model.windowProperty().get();
    return window.from() + (x - StagePane.AXIS_FROM) / plotWidth() * window.length();
  }

  private static double middle(Control control) {
    int above =
        switch (control) {
          case STICK -> 0;
          case PEDAL -> 1;
          case POWER -> 2;
        };
    return 2 + 0.5 * LANE + above * (LANE + GAP);
  }

  static double yOf(Control control, double position) {
    return middle(control) - position * FULL;
  }

  private void draw() {
    GraphicsContext context = canvas.getGraphicsContext2D();
    context.setFill(CanvasPainter.colour(palette.get(), Ink.GROUND, 1));
    context.fillRect(0, 0, getWidth(), getHeight());
    if (plotWidth() < 100) {
      return;
    }
    CanvasPainter painter = new CanvasPainter(context, palette.get());
    for (Control control : lanes()) {
      drawLane(painter, control);
    }
    List<Mark> marks = new ArrayList<>();
    for (LaneBlock block : blocks) {
      addBlock(marks, block);
    }
    painter.paint(
        new Mark.Clip(StagePane.AXIS_FROM, 0, plotWidth(), Math.max(1, getHeight()), marks));
  }

  private void drawLane(CanvasPainter painter, Control control) {
    double left = StagePane.AXIS_FROM;
    double right = getWidth() - StripChart.RIGHT;
    double y = middle(control);
    painter.paint(
        new Mark.Area(
            new double[] {left, right, right, left},
            new double[] {y - FULL, y - FULL, y + FULL, y + FULL},
            Ink.PANEL,
            1));
    painter.paint(new Mark.Line(left, y, right, y, Stroke.of(Ink.GRID, 1)));
    String word =
        switch (control) {
          case STICK -> "Stick";
          case PEDAL -> "Pedal";
          case POWER -> "Power";
        };
    painter.paint(new Mark.Label(10, y + 4, word, Anchor.START, TypeSize.NORMAL, Ink.TEXT));
    painter.paint(
        new Mark.Label(
            left - 8, y - FULL + 10, control.way(1), Anchor.END, TypeSize.SMALL, Ink.QUIET));
    painter.paint(
        new Mark.Label(
            left - 8, y + FULL - 2, control.way(-1), Anchor.END, TypeSize.SMALL, Ink.QUIET));
    if (blocks.stream().noneMatch(block -> block.control() == control)) {
      painter.paint(
          new Mark.Label(
              left + 8,
              y - 5,
              "double-click to add an input",
              Anchor.START,
              TypeSize.SMALL,
              Ink.QUIET));
    }
  }

  private void addBlock(List<Mark> marks, LaneBlock block) {
    TimeWindow window = model.windowProperty().get();
    List<double[]> corners = block.outline(window, STEP * window.length() / plotWidth());
    double end = block.shownEnd(Math.max(window.to(), block.shape().start()));
    double[] x = corners.stream().mapToDouble(corner -> xOf(corner[0])).toArray();
    double[] y = corners.stream().mapToDouble(corner -> yOf(block.control(), corner[1])).toArray();
    Ink ink = block.shape().size() < 0 ? Ink.LEFT : Ink.RIGHT;
    boolean chosen = block.index() == selected.get();
    marks.add(new Mark.Area(x, y, ink, chosen ? 0.38 : 0.2));
    marks.add(
        new Mark.Polyline(
            x,
            y,
            new Stroke(
                ink, chosen ? 2 : 1.2, block.shape().size() < 0 ? Dash.DASHED : Dash.SOLID, 1)));
    if (chosen) {
      double top = yOf(block.control(), block.shape().size());
      if (block.hasHand()) {
        double hand = xOf(block.shape().start() + block.shape().handTime());
        marks.add(new Mark.Dot(hand, top, 3.5, ink, true));
      }
      for (double[] point : block.recordedPoints(window)) {
        marks.add(new Mark.Dot(xOf(point[0]), yOf(block.control(), point[1]), POINT, ink, true));
      }
      if (block.canStretch()) {
        marks.add(new Mark.Dot(xOf(end), middle(block.control()), 3.5, ink, true));
      }
    }
  }

  private record Hit(LaneBlock block, LaneBlock.Part part) {}

  private Optional<Hit> hitAt(double x, double y) {
    if (blocks.size() != inputCount()) {
      return Optional.empty(); // these blocks are of other inputs
    }
    for (int i = blocks.size() - 1; i >= 0; i--) {
      LaneBlock block = blocks.get(i);
      double middle = middle(block.control());
      if (Math.abs(y - middle) > FULL + REACH) {
        continue;
      }
      double left = xOf(block.shape().start());
      double right = xOf(block.shownEnd(model.windowProperty().get().to()));
      if (x < left - REACH || x > right + REACH) {
        continue;
      }
      double top = yOf(block.control(), block.shape().size());
      double hand = xOf(block.shape().start() + block.shape().handTime());
      boolean chosen = block.index() == selected.get();
      if (chosen && block.hasHand() && Math.abs(x - hand) <= REACH && Math.abs(y - top) <= REACH) {
        return Optional.of(new Hit(block, LaneBlock.Part.HAND));
      }
      if (block.canStretch() && Math.abs(x - right) <= REACH) {
        return Optional.of(new Hit(block, LaneBlock.Part.END));
      }
      double inwards = block.shape().size() < 0 ? top - y : y - top;
      // A low block is to be moved, too: most of what is inside it is not its edge.
      double inside = Math.min(REACH, 0.4 * Math.abs(middle - top));
      if (inwards >= -REACH && inwards <= inside && x > left) {
        return Optional.of(new Hit(block, LaneBlock.Part.TOP));
      }
      return Optional.of(new Hit(block, LaneBlock.Part.BODY));
    }
    return Optional.empty();
  }

  private void hover(MouseEvent event) {
    setCursor(
        hitAt(event.getX(), event.getY())
            .map(
                hit ->
                    switch (hit.part()) {
                      case BODY -> Cursor.MOVE;
                      case TOP -> Cursor.V_RESIZE;
                      case END, HAND -> Cursor.H_RESIZE;
                    })
            .orElse(Cursor.DEFAULT));
  }

  private void press(MouseEvent event) {
    requestFocus();
    Optional<Hit> hit = hitAt(event.getX(), event.getY());
    dragged = hit.map(Hit::block).orElse(null);
    part = hit.map(Hit::part).orElse(null);
    dragFrom = timeAt(event.getX());
    if (dragged != null) {
      dragSize = dragged.shape().size() - (middle(dragged.control()) - event.getY()) / FULL;
      selected.set(dragged.index());
      stage.holdRanges(true);
    }
  }

  private void drag(MouseEvent event) {
    if (dragged == null) {
      return;
    }
    double time = timeAt(event.getX());
    LaneBlock block = dragged;
    UnaryOperator<ScenarioDocument> change =
        switch (part) {
          case BODY -> document -> block.moved(document, time - dragFrom);
          case TOP ->
              document ->
                  block.resized(
                      document, dragSize + (middle(block.control()) - event.getY()) / FULL);
          case END -> document -> block.stretched(document, time);
          case HAND -> document -> block.handUntil(document, time);
        };
    model.session().edit(word(), "drag-" + block.index() + part, change);
  }

  private String word() {
    return switch (part) {
      case BODY -> "move input";
      case TOP -> "resize input";
      case END -> "stretch input";
      case HAND -> "change the hand's movement";
    };
  }

  private void release() {
    if (dragged != null) {
      dragged = null;
      model.session().endGesture();
      stage.holdRanges(false);
    }
  }

  private void click(MouseEvent event) {
    if (event.getClickCount() == 2 && hitAt(event.getX(), event.getY()).isEmpty()) {
      addInput(laneAt(event.getY()), "hold", Math.max(0, timeAt(event.getX())));
    }
  }

  private Control laneAt(double y) {
    List<Control> lanes = lanes();
    return lanes.stream()
        .filter(control -> y < middle(control) + FULL + GAP / 2)
        .findFirst()
        .orElse(lanes.get(lanes.size() - 1));
  }

  void addInput(Control control, String shape, double start) {
    int count = inputCount();
    model
        .session()
        .edit(
            "add input",
            document ->
                document.withInputAdded(control.word(), shape, Math.rint(start * 100) / 100));
    selected.set(count);
  }

  void removeSelected() {
    int index = selected.get();
    if (index >= 0 && index < inputCount()) {
      model.session().edit("remove input", document -> document.withoutInput(index));
    }
  }

  private void keyPressed(KeyEvent event) {
    if (event.getCode() == KeyCode.DELETE || event.getCode() == KeyCode.BACK_SPACE) {
      removeSelected();
      event.consume();
    }
  }
}
