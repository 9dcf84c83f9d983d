package org.rolltrace.ui.desk;

import atlantafx.base.theme.PrimerDark;
import atlantafx.base.theme.PrimerLight;
import java.nio.file.Path;
import java.time.ZoneId;
import java.time.format.DateTimeFormatter;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;
import javafx.beans.binding.Bindings;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.SimpleObjectProperty;
import javafx.geometry.Rectangle2D;
import javafx.scene.Node;
import javafx.scene.Scene;
import javafx.scene.control.Menu;
import javafx.scene.control.MenuBar;
import javafx.scene.control.MenuItem;
import javafx.scene.control.RadioMenuItem;
import javafx.scene.control.SeparatorMenuItem;
import javafx.scene.control.ToggleButton;
import javafx.scene.control.ToggleGroup;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyCombination;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.stage.Screen;
import javafx.stage.Stage;
import javafx.stage.WindowEvent;
import org.rolltrace.ui.build.BuildModel;
import org.rolltrace.ui.build.BuildView;
import org.rolltrace.ui.chart.Palette;
import org.rolltrace.ui.dialog.Dialogs;
import org.rolltrace.ui.manoeuvre.ManoeuvreModel;
import org.rolltrace.ui.manoeuvre.ManoeuvreView;
import org.rolltrace.ui.session.DeskSession;
import org.rolltrace.ui.session.Problem;
import org.rolltrace.ui.session.RecoveryStore;

/**
 * The window: menus, the rail of workplaces with one of them, and the questions about unsaved work.
 */
public final class DeskWindow {
  private static final double WIDTH = 1240;
  private static final double HEIGHT = 800;

  /** Where the space bar has no other meaning than to play and pause. */
  private static final Set<String> PLAYABLE = Set.of("stage", "lanes");

  /** A line through a roll: level, over, level again. */
  private static final String MANOEUVRE_SIGN = "M1 15 H5 C9 15 8 5 12 5 H19";

  /** A tapered wing from above, with its body. */
  private static final String BUILD_SIGN = "M0 9 L8 7 V3 H12 V7 L20 9 V12 H12 V17 H8 V12 H0 Z";

  private static final String UNDO = "Shortcut+Z";
  private static final String REDO = "Shortcut+Shift+Z";

  private final Stage stage;
  private final DeskSession session;
  private final RecoveryStore recovery;
  private final Dialogs dialogs;
  private final ManoeuvreModel model;
  private final SaveFolder saveFolder =
      new SaveFolder(
          Path.of(System.getProperty("user.home", ".")),
          () -> ShippedScenarios.folder(RecoveryStore.defaultFolder()));
  private final BorderPane root = new BorderPane();
  private final HBox top;
  private final MenuBar menus;
  private final Workplace manoeuvre;
  private final Workplace build;
  private final ObjectProperty<Palette> palette =
      new SimpleObjectProperty<>(this, "palette", Palette.LIGHT);

  /**
   * A window that is not shown yet.
   *
   * @param stage where it is shown
   * @param session what it shows
   * @param recovery where work is kept against a crash
   */
  public DeskWindow(Stage stage, DeskSession session, RecoveryStore recovery) {
    this.stage = stage;
    this.recovery = recovery;
    this.session = session;
    this.dialogs = new Dialogs(stage);
    this.model = new ManoeuvreModel(session);
    root.getStyleClass().add("desk");
    ManoeuvreView manoeuvreView = new ManoeuvreView(model, palette, dialogs::askTrace);
    BuildView buildView = new BuildView(new BuildModel(session, model.windowProperty()), palette);
    WorkplaceRail rail = new WorkplaceRail();
    manoeuvre =
        new Workplace(
            manoeuvreView,
            manoeuvreView.lookup("#stage"),
            manoeuvreView.actions(),
            rail.add(
                "workplace-manoeuvre", "Manoeuvre", "Ctrl+1", MANOEUVRE_SIGN, this::showManoeuvre));
    build =
        new Workplace(
            buildView,
            buildView.lookup("#drawing"),
            buildView.actions(),
            rail.add("workplace-build", "Build", "Ctrl+2", BUILD_SIGN, this::showBuild));
    rail.disableProperty().bind(model.hand().flyingProperty());
    menus = menus();
    HBox.setHgrow(menus, Priority.ALWAYS);
    top = new HBox();
    top.getStyleClass().add("top-row");
    root.setTop(top);
    root.setLeft(rail);
    show(manoeuvre);
    Rectangle2D screen = Screen.getPrimary().getVisualBounds();
    Scene scene =
        new Scene(root, Math.min(WIDTH, screen.getWidth()), Math.min(HEIGHT, screen.getHeight()));
    stage.setScene(scene);
    scene.addEventFilter(KeyEvent.KEY_PRESSED, this::spacePlays);
    scene.addEventFilter(KeyEvent.KEY_PRESSED, this::undoInFields);
    useDark(false);
    stage.setMinWidth(900);
    stage.setMinHeight(640);
    stage.setOnCloseRequest(this::closeAsked);
    stage
        .focusedProperty()
        .addListener(
            (property, before, now) -> {
              if (!now) {
                model.hand().letGo(); // keys that go up elsewhere are not heard of
              }
            });
    stage
        .titleProperty()
        .bind(
            Bindings.createStringBinding(
                this::windowTitle,
                session.titleProperty(),
                session.fileProperty(),
                session.dirtyProperty()));
    session
        .problemProperty()
        .addListener((property, before, now) -> Optional.ofNullable(now).ifPresent(this::tell));
  }

  /** A page of the window, with what has the keys first. */
  private record Workplace(Node page, Node first, Node actions, ToggleButton button) {}

  private void show(Workplace workplace) {
    if (root.getCenter() == workplace.page()) {
      return;
    }
    model.clock().pause();
    session.endGesture();
    top.getChildren().setAll(menus, workplace.actions());
    root.setCenter(workplace.page());
    workplace.button().setSelected(true);
    workplace.first().requestFocus();
  }

  /** Shows the workplace of the manoeuvre. */
  public void showManoeuvre() {
    show(manoeuvre);
  }

  /** Shows the workplace of the shape, unless a hand flies. */
  public void showBuild() {
    if (!model.hand().flyingProperty().get()) {
      show(build);
    }
  }

  private void flyByHand() {
    showManoeuvre();
    model.hand().begin();
  }

  private String windowTitle() {
    String title = session.titleProperty().get();
    Path file = session.fileProperty().get();
    return (title == null || title.isEmpty() ? "" : title + " \u2013 ")
        + (file == null ? "" : file.getFileName() + " \u2013 ")
        + "Rolltrace"
        + (session.dirtyProperty().get() ? " (unsaved)" : "");
  }

  /**
   * The state behind the workplace.
   *
   * @return the model
   */
  public ManoeuvreModel model() {
    return model;
  }

  /**
   * Shows the window.
   *
   * @param first the scenario to open, unless a crash left something to take up
   */
  public void show(Path first) {
    session.open(first);
    stage.show();
    offerRecovery();
  }

  private void offerRecovery() {
    for (RecoveryStore.Pending pending : recovery.pending()) {
      if (dialogs.askRecover(describe(pending))) {
        session.recover(pending);
        return;
      }
      recovery.forget(pending);
    }
  }

  private static String describe(RecoveryStore.Pending pending) {
    return pending.document().text("$.title").orElse("a scenario without a title")
        + pending.origin().map(origin -> "\n" + origin).orElse("")
        + "\n"
        + DateTimeFormatter.ofPattern("yyyy-MM-dd HH:mm", Locale.ROOT)
            .format(pending.time().atZone(ZoneId.systemDefault()));
  }

  private void tell(Problem problem) {
    dialogs.tell(problem.title(), problem.message());
    session.dismissProblem();
  }

  private MenuBar menus() {
    Menu shipped = new Menu("Shipped scenarios");
    shipped.setId("shipped");
    shipped.setOnShowing(event -> fill(shipped));
    shipped.getItems().add(new MenuItem("\u2026"));
    Menu file =
        new Menu(
            "File",
            null,
            item("Open\u2026", "Shortcut+O", this::open),
            shipped,
            new SeparatorMenuItem(),
            item("Save", "Shortcut+S", this::save),
            item("Save as\u2026", "Shortcut+Shift+S", this::saveAs),
            new SeparatorMenuItem(),
            item("Close", "Shortcut+W", this::close));
    MenuItem undo = item("Undo", UNDO, session::undo);
    undo.disableProperty().bind(session.canUndoProperty().not().or(model.hand().flyingProperty()));
    undo.textProperty().bind(Bindings.concat("Undo: ", session.undoWordProperty()));
    MenuItem redo = item("Redo", REDO, session::redo);
    redo.disableProperty().bind(session.canRedoProperty().not().or(model.hand().flyingProperty()));
    redo.textProperty().bind(Bindings.concat("Redo: ", session.redoWordProperty()));
    Menu edit = new Menu("Edit", null, undo, redo);
    MenuItem fly = item("Fly by hand", "Shortcut+F", this::flyByHand);
    fly.disableProperty().bind(model.hand().flyingProperty());
    MenuItem stop = item("End the flight", "Esc", model.hand()::stop);
    stop.disableProperty().bind(model.hand().flyingProperty().not());
    Menu flight = new Menu("Flight", null, fly, stop);
    RadioMenuItem light = new RadioMenuItem("Paper");
    RadioMenuItem dark = new RadioMenuItem("Slate");
    light.setId("theme-paper");
    dark.setId("theme-slate");
    ToggleGroup ground = new ToggleGroup();
    light.setToggleGroup(ground);
    dark.setToggleGroup(ground);
    light.setSelected(true);
    light.setOnAction(event -> useDark(false));
    dark.setOnAction(event -> useDark(true));
    MenuItem toBuild = item("Build", "Shortcut+2", this::showBuild);
    toBuild.disableProperty().bind(model.hand().flyingProperty());
    Menu view =
        new Menu(
            "View",
            null,
            item("Manoeuvre", "Shortcut+1", this::showManoeuvre),
            toBuild,
            new SeparatorMenuItem(),
            light,
            dark,
            new SeparatorMenuItem(),
            item("Whole manoeuvre", "Shortcut+0", model::resetView),
            item("As far as the inputs", "Shortcut+9", model::showInputs));
    return new MenuBar(file, edit, flight, view);
  }

  private static MenuItem item(String words, String keys, Runnable action) {
    MenuItem item = new MenuItem(words);
    item.setAccelerator(KeyCombination.keyCombination(keys));
    item.setOnAction(event -> action.run());
    return item;
  }

  private void fill(Menu shipped) {
    List<Path> files =
        ShippedScenarios.scenariosIn(ShippedScenarios.folder(RecoveryStore.defaultFolder()));
    shipped
        .getItems()
        .setAll(
            files.stream()
                .map(
                    file -> {
                      String name = file.getFileName().toString().replace(".json", "");
                      MenuItem item = new MenuItem(name.replace('-', ' '));
                      item.setId("shipped-" + name);
                      item.setOnAction(event -> openAfterAsking(file));
                      return item;
                    })
                .toList());
  }

  /**
   * Draws on paper or on slate.
   *
   * @param dark true for slate
   */
  public void useDark(boolean dark) {
    palette.set(dark ? Palette.SLATE : Palette.LIGHT);
    stage
        .getScene()
        .setUserAgentStylesheet(
            (dark ? new PrimerDark() : new PrimerLight()).getUserAgentStylesheet());
    // The colours hang on the root of every scene, so that lists and menus have them too.
    stage
        .getScene()
        .getStylesheets()
        .setAll(styles(dark ? "slate.css" : "paper.css"), styles("desk.css"));
  }

  private void spacePlays(KeyEvent event) {
    Node focused = stage.getScene().getFocusOwner();
    boolean free = focused == null || PLAYABLE.contains(String.valueOf(focused.getId()));
    boolean flying = model.hand().flyingProperty().get(); // then space begins the flight
    boolean seen = root.getCenter() == manoeuvre.page();
    if (event.getCode() == KeyCode.SPACE && seen && free && !flying) {
      model.clock().toggle();
      event.consume();
    }
  }

  /** A text field would undo its own typing and so make one more edit of it. */
  private void undoInFields(KeyEvent event) {
    boolean undoes = KeyCombination.keyCombination(UNDO).match(event);
    boolean redoes = KeyCombination.keyCombination(REDO).match(event);
    if (!undoes && !redoes) {
      return;
    }
    event.consume();
    if (model.hand().flyingProperty().get()) {
      return;
    }
    if (undoes) {
      session.undo();
    } else {
      session.redo();
    }
  }

  private static String styles(String file) {
    return DeskWindow.class.getResource(file).toExternalForm();
  }

  private void open() {
    dialogs.askOpen(folder()).ifPresent(this::openAfterAsking);
  }

  private void openAfterAsking(Path file) {
    if (mayLeave()) {
      session.open(file);
    }
  }

  private Path folder() {
    Path file = session.fileProperty().get();
    return file == null ? null : file.toAbsolutePath().getParent();
  }

  private boolean save() {
    model.hand().stop();
    return session.fileProperty().get() == null ? saveAs() : session.save();
  }

  private boolean saveAs() {
    model.hand().stop();
    Path file = session.fileProperty().get();
    String name = file == null ? "scenario.json" : file.getFileName().toString();
    Optional<Path> chosen = dialogs.askSaveAs(saveFolder.toBeginIn(file), name);
    chosen.ifPresent(saveFolder::remember);
    return chosen.map(session::saveAs).orElse(false);
  }

  /** Whether the present scenario may be left, after asking about unsaved changes. */
  private boolean mayLeave() {
    model.hand().stop(); // what was flown is work, too
    if (!session.dirtyProperty().get()) {
      return true;
    }
    return switch (dialogs.askUnsaved(session.titleProperty().get())) {
      case SAVE -> save();
      case DISCARD -> true;
      case STAY -> false;
    };
  }

  private void closeAsked(WindowEvent event) {
    if (mayLeave()) {
      session.close();
    } else {
      event.consume();
    }
  }

  private void close() {
    stage.fireEvent(new WindowEvent(stage, WindowEvent.WINDOW_CLOSE_REQUEST));
    if (!session.dirtyProperty().get()) {
      stage.close();
    }
  }
}
