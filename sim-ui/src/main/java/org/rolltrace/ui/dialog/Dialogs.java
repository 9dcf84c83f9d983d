package org.rolltrace.ui.dialog;

import java.nio.file.Path;
import java.util.Optional;
import javafx.scene.control.Alert;
import javafx.scene.control.ButtonBar;
import javafx.scene.control.ButtonType;
import javafx.scene.layout.Region;
import javafx.stage.FileChooser;
import javafx.stage.Window;

/** The questions that the window asks. */
public final class Dialogs {
  /** What to do with changes that are not saved. */
  public enum Unsaved {
    /** Save them first. */
    SAVE,
    /** Let them go. */
    DISCARD,
    /** Stay. */
    STAY
  }

  private static final ButtonType SAVE = new ButtonType("Save", ButtonBar.ButtonData.YES);
  private static final ButtonType DISCARD = new ButtonType("Do not save", ButtonBar.ButtonData.NO);
  private static final ButtonType STAY =
      new ButtonType("Go back", ButtonBar.ButtonData.CANCEL_CLOSE);

  private final Window owner;

  /**
   * Dialogs above a window.
   *
   * @param owner the window
   */
  public Dialogs(Window owner) {
    this.owner = owner;
  }

  /**
   * Asks what to do with changes that are not saved.
   *
   * @param title of the scenario
   * @return the answer
   */
  public Unsaved askUnsaved(String title) {
    Alert alert =
        alert(
            Alert.AlertType.CONFIRMATION,
            "Unsaved changes",
            "\u201c" + title + "\u201d has changes that are not saved.",
            SAVE,
            DISCARD,
            STAY);
    Optional<ButtonType> answer = alert.showAndWait();
    if (answer.isEmpty() || answer.get() == STAY) {
      return Unsaved.STAY;
    }
    return answer.get() == SAVE ? Unsaved.SAVE : Unsaved.DISCARD;
  }

  /**
   * Asks whether to take up work that a crash left.
   *
   * @param what it was and when it was last changed
   * @return true to take it up
   */
  public boolean askRecover(String what) {
    ButtonType take = new ButtonType("Take it up", ButtonBar.ButtonData.YES);
    ButtonType leave = new ButtonType("Throw it away", ButtonBar.ButtonData.NO);
    return alert(
                Alert.AlertType.CONFIRMATION,
                "Work that was not saved",
                "The program ended before this was saved:\n" + what,
                take,
                leave)
            .showAndWait()
            .orElse(take)
        == take;
  }

  /**
   * Tells of something that went wrong.
   *
   * @param title what was tried
   * @param message what went wrong and the way out
   */
  public void tell(String title, String message) {
    alert(Alert.AlertType.ERROR, title, message, ButtonType.OK).showAndWait();
  }

  private Alert alert(Alert.AlertType type, String title, String message, ButtonType... buttons) {
    Alert alert = new Alert(type, message, buttons);
    alert.initOwner(owner);
    alert.setTitle(title);
    alert.setHeaderText(title);
    alert.getDialogPane().setMinHeight(Region.USE_PREF_SIZE);
    alert.getDialogPane().setPrefWidth(520);
    return alert;
  }

  /**
   * Asks for a scenario to open.
   *
   * @param folder where to begin
   * @return the file, or empty when none was chosen
   */
  public Optional<Path> askOpen(Path folder) {
    return Optional.ofNullable(chooser("Open a scenario", folder).showOpenDialog(owner))
        .map(java.io.File::toPath);
  }

  /**
   * Asks where to save.
   *
   * @param folder where to begin
   * @param name a first name
   * @return the file, or empty when none was chosen
   */
  public Optional<Path> askSaveAs(Path folder, String name) {
    FileChooser chooser = chooser("Save the scenario as", folder);
    chooser.setInitialFileName(name);
    return Optional.ofNullable(chooser.showSaveDialog(owner)).map(java.io.File::toPath);
  }

  /**
   * Asks for the file of a trace.
   *
   * @param folder where to begin
   * @return the file, or empty when none was chosen
   */
  public Optional<Path> askTrace(Path folder) {
    return Optional.ofNullable(
            chooser("Choose a recorded trace", folder, "Traces", "*.csv").showOpenDialog(owner))
        .map(java.io.File::toPath);
  }

  private static FileChooser chooser(String title, Path folder) {
    return chooser(title, folder, "Scenarios", "*.json");
  }

  private static FileChooser chooser(String title, Path folder, String what, String pattern) {
    FileChooser chooser = new FileChooser();
    chooser.setTitle(title);
    chooser.getExtensionFilters().add(new FileChooser.ExtensionFilter(what, pattern));
    if (folder != null && folder.toFile().isDirectory()) {
      chooser.setInitialDirectory(folder.toFile());
    }
    return chooser;
  }
}
