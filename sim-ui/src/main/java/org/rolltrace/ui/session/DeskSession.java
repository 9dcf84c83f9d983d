package org.rolltrace.ui.session;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.function.UnaryOperator;
import javafx.beans.property.ReadOnlyBooleanProperty;
import javafx.beans.property.ReadOnlyBooleanWrapper;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.collections.FXCollections;
import javafx.collections.ObservableList;
import org.rolltrace.core.files.FileFault;
import org.rolltrace.core.files.ScenarioDocument;
import org.rolltrace.core.files.ScenarioFile;
import org.rolltrace.core.run.RunResult;
import org.rolltrace.ui.task.Runner;

/** The open scenario. */
public final class DeskSession {
  private final Runner runner;
  private final RecoveryStore recovery;
  private final ReadOnlyObjectWrapper<ScenarioDocument> document = new ReadOnlyObjectWrapper<>();
  private final ReadOnlyObjectWrapper<RunResult> result = new ReadOnlyObjectWrapper<>();
  private final ReadOnlyObjectWrapper<RunResult> ghost = new ReadOnlyObjectWrapper<>();
  private final ReadOnlyObjectWrapper<Path> file = new ReadOnlyObjectWrapper<>();
  private final ReadOnlyObjectWrapper<Problem> problem = new ReadOnlyObjectWrapper<>();
  private final ObservableList<FileFault> faults = FXCollections.observableArrayList();
  private final ReadOnlyStringWrapper failure = new ReadOnlyStringWrapper("");
  private final ReadOnlyStringWrapper title = new ReadOnlyStringWrapper("");
  private final ReadOnlyStringWrapper undoWord = new ReadOnlyStringWrapper("");
  private final ReadOnlyStringWrapper redoWord = new ReadOnlyStringWrapper("");
  private final ReadOnlyStringWrapper recoveryProblem = new ReadOnlyStringWrapper("");
  private final ReadOnlyBooleanWrapper stale = new ReadOnlyBooleanWrapper();
  private final ReadOnlyBooleanWrapper dirty = new ReadOnlyBooleanWrapper();
  private final ReadOnlyBooleanWrapper canUndo = new ReadOnlyBooleanWrapper();
  private final ReadOnlyBooleanWrapper canRedo = new ReadOnlyBooleanWrapper();

  public DeskSession(Runner runner, RecoveryStore recovery) {
    this.runner = runner;
    this.recovery = recovery;
  }

  public ReadOnlyObjectProperty<ScenarioDocument> documentProperty() {
    return document.getReadOnlyProperty();
  }

  public ReadOnlyObjectProperty<RunResult> resultProperty() {
    return result.getReadOnlyProperty();
  }

  public ObservableList<FileFault> faults() {
    return FXCollections.unmodifiableObservableList(faults);
  }

  public ReadOnlyStringProperty failureProperty() {
    return failure.getReadOnlyProperty();
  }

  public ReadOnlyBooleanProperty staleProperty() {
    return stale.getReadOnlyProperty();
  }

  public ReadOnlyObjectProperty<RunResult> ghostProperty() {
    return ghost.getReadOnlyProperty();
  }

  public ReadOnlyObjectProperty<Path> fileProperty() {
    return file.getReadOnlyProperty();
  }

  public ReadOnlyStringProperty titleProperty() {
    return title.getReadOnlyProperty();
  }

  public ReadOnlyBooleanProperty dirtyProperty() {
    return dirty.getReadOnlyProperty();
  }

  public ReadOnlyBooleanProperty canUndoProperty() {
    return canUndo.getReadOnlyProperty();
  }

  public ReadOnlyBooleanProperty canRedoProperty() {
    return canRedo.getReadOnlyProperty();
  }

  public ReadOnlyStringProperty undoWordProperty() {
    return undoWord.getReadOnlyProperty();
  }

  public ReadOnlyStringProperty redoWordProperty() {
    return redoWord.getReadOnlyProperty();
  }

  public ReadOnlyObjectProperty<Problem> problemProperty() {
    return problem.getReadOnlyProperty();
  }

  public ReadOnlyStringProperty recoveryProblemProperty() {
    return recoveryProblem.getReadOnlyProperty();
  }

  public void dismissProblem() {
    problem.set(null);
  }

  public boolean open(Path newFile) {
    file.set(newFile);
    document.set(ScenarioDocument.open(newFile));
    return true;
  }

  public void recover(RecoveryStore.Pending pending) {
    document.set(pending.document());
    recovery.forget(pending);
  }

  public void edit(String word, UnaryOperator<ScenarioDocument> change) {
    document.set(change.apply(document.get()));
  }

  public void edit(String word, String mergeKey, UnaryOperator<ScenarioDocument> change) {
    edit(word, change);
  }

  public void endGesture() {}

  public void mirror() {
    edit("Swap left and right", ScenarioDocument::mirrored);
  }

  public void undo() {}

  public void redo() {}

  public boolean save() {
    return saveAs(file.get());
  }

  public boolean saveAs(Path newFile) {
    runner.run(() -> ScenarioFile.write(newFile, document.get()), document::set, thrown -> {});
    return true;
  }

  public void keepGhost() {
    ghost.set(result.get());
  }

  public void dropGhost() {
    ghost.set(null);
  }

  public Optional<String> faultAt(String path) {
    return Optional.empty();
  }

  public List<Difference> differences() {
    return List.of();
  }

  /** Writes unsaved work to the recovery store now. */
  public void keepNow() {}

  /** Ends the session in good order: nothing is left to recover. */
  public void close() {}
}
