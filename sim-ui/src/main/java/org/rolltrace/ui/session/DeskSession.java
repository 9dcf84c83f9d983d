package org.rolltrace.ui.session;

import java.io.UncheckedIOException;
import java.nio.file.Path;
import java.time.Duration;
import java.util.Optional;
import java.util.function.UnaryOperator;
import javafx.beans.property.ReadOnlyBooleanProperty;
import javafx.beans.property.ReadOnlyBooleanWrapper;
import javafx.beans.property.ReadOnlyIntegerProperty;
import javafx.beans.property.ReadOnlyIntegerWrapper;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.collections.FXCollections;
import javafx.collections.ObservableList;
import org.rolltrace.core.files.FileFault;
import org.rolltrace.core.files.FileFaultsException;
import org.rolltrace.core.files.ScenarioDocument;
import org.rolltrace.core.files.ScenarioFile;
import org.rolltrace.core.pilot.HandRecord;
import org.rolltrace.core.run.RunResult;
import org.rolltrace.ui.task.Runner;

/**
 * The open scenario: as it is written, what came of it, and what was done to it.
 *
 * <p>Every change of the document is checked and flown. While that goes on, and while the document
 * has faults, the last result stays. Nothing that people type or choose ends in an exception.
 */
public final class DeskSession {
  /** The least time from one writing of unsaved work to the next. */
  static final Duration BETWEEN_KEEPS = Duration.ofMillis(500);

  private final Runner runner;
  private final RecoveryStore recovery;
  private final EditHistory history = new EditHistory();

  private final ReadOnlyObjectWrapper<ScenarioDocument> document = new ReadOnlyObjectWrapper<>();
  private final ReadOnlyObjectWrapper<RunResult> result = new ReadOnlyObjectWrapper<>();
  private final ReadOnlyObjectWrapper<RunResult> ghost = new ReadOnlyObjectWrapper<>();
  private final ReadOnlyObjectWrapper<Path> file = new ReadOnlyObjectWrapper<>();
  private final ReadOnlyObjectWrapper<Problem> problem = new ReadOnlyObjectWrapper<>();
  private final ObservableList<FileFault> faults = FXCollections.observableArrayList();
  private final ObservableList<FileFault> shownFaults =
      FXCollections.unmodifiableObservableList(faults);
  private final ReadOnlyStringWrapper failure = new ReadOnlyStringWrapper("");
  private final ReadOnlyStringWrapper title = new ReadOnlyStringWrapper("");
  private final ReadOnlyStringWrapper undoWord = new ReadOnlyStringWrapper("");
  private final ReadOnlyStringWrapper redoWord = new ReadOnlyStringWrapper("");
  private final ReadOnlyStringWrapper recoveryProblem = new ReadOnlyStringWrapper("");
  private final ReadOnlyBooleanWrapper stale = new ReadOnlyBooleanWrapper();
  private final ReadOnlyBooleanWrapper dirty = new ReadOnlyBooleanWrapper();
  private final ReadOnlyBooleanWrapper canUndo = new ReadOnlyBooleanWrapper();
  private final ReadOnlyBooleanWrapper canRedo = new ReadOnlyBooleanWrapper();

  /** What stands in the file; empty when that is not known to be anything. */
  private Optional<ScenarioDocument> saved = Optional.empty();

  /** Counts what was opened, so that what came of another document is not shown with this one. */
  private final ReadOnlyIntegerWrapper opened = new ReadOnlyIntegerWrapper();

  private int shown;

  /** The last writing of unsaved work that was asked for, until nothing is unsaved any more. */
  private volatile Object keepAsked;

  /**
   * A session without a document.
   *
   * @param runner checks and flies, and writes unsaved work
   * @param recovery where unsaved work is kept
   */
  public DeskSession(Runner runner, RecoveryStore recovery) {
    this.runner = runner;
    this.recovery = recovery;
  }

  /**
   * The open document.
   *
   * @return null inside until one is opened
   */
  public ReadOnlyObjectProperty<ScenarioDocument> documentProperty() {
    return document.getReadOnlyProperty();
  }

  /**
   * The last result of the open document.
   *
   * @return null inside until there is one
   */
  public ReadOnlyObjectProperty<RunResult> resultProperty() {
    return result.getReadOnlyProperty();
  }

  /**
   * What is wrong in the document and in the aeroplane file it names.
   *
   * @return a list that follows, not to be changed
   */
  public ObservableList<FileFault> faults() {
    return shownFaults;
  }

  /**
   * Why there is no result although the document has no faults.
   *
   * @return a sentence, empty when there is a result
   */
  public ReadOnlyStringProperty failureProperty() {
    return failure.getReadOnlyProperty();
  }

  /**
   * Whether the result is of an older document, as the present one has faults or no answer.
   *
   * @return false while there is no result at all
   */
  public ReadOnlyBooleanProperty staleProperty() {
    return stale.getReadOnlyProperty();
  }

  /**
   * The result that was kept to compare with.
   *
   * @return null inside when there is none
   */
  public ReadOnlyObjectProperty<RunResult> ghostProperty() {
    return ghost.getReadOnlyProperty();
  }

  /**
   * The file of the document.
   *
   * @return absolute; null inside when it has none yet
   */
  public ReadOnlyObjectProperty<Path> fileProperty() {
    return file.getReadOnlyProperty();
  }

  /**
   * What the scenario is called.
   *
   * @return its title; the name of its file when that is blank
   */
  public ReadOnlyStringProperty titleProperty() {
    return title.getReadOnlyProperty();
  }

  /**
   * Whether there is something to be saved.
   *
   * @return false again when edits are undone
   */
  public ReadOnlyBooleanProperty dirtyProperty() {
    return dirty.getReadOnlyProperty();
  }

  /**
   * Whether there is an edit to be undone.
   *
   * @return the property
   */
  public ReadOnlyBooleanProperty canUndoProperty() {
    return canUndo.getReadOnlyProperty();
  }

  /**
   * Whether there is an edit to be done again.
   *
   * @return the property
   */
  public ReadOnlyBooleanProperty canRedoProperty() {
    return canRedo.getReadOnlyProperty();
  }

  /**
   * The word of the edit that would be undone.
   *
   * @return empty when there is none
   */
  public ReadOnlyStringProperty undoWordProperty() {
    return undoWord.getReadOnlyProperty();
  }

  /**
   * The word of the edit that would be done again.
   *
   * @return empty when there is none
   */
  public ReadOnlyStringProperty redoWordProperty() {
    return redoWord.getReadOnlyProperty();
  }

  /**
   * How many documents were opened: another number means another document, not an edit.
   *
   * @return the count
   */
  public ReadOnlyIntegerProperty openedProperty() {
    return opened.getReadOnlyProperty();
  }

  /**
   * What could not be opened, saved or done last.
   *
   * @return null inside when nothing, or {@linkplain #dismissProblem dismissed}
   */
  public ReadOnlyObjectProperty<Problem> problemProperty() {
    return problem.getReadOnlyProperty();
  }

  /**
   * Why unsaved work cannot be kept against a crash.
   *
   * @return a sentence, empty when it can
   */
  public ReadOnlyStringProperty recoveryProblemProperty() {
    return recoveryProblem.getReadOnlyProperty();
  }

  /**
   * Tells of something that could not be done.
   *
   * @param what could not be done, and the way out
   */
  public void tell(Problem what) {
    problem.set(what);
  }

  /** Takes note of the problem. */
  public void dismissProblem() {
    problem.set(null);
  }

  /**
   * Opens a file in place of the present document, whose unsaved edits are given up.
   *
   * @param newFile a scenario file, right or wrong
   * @return false when it cannot be opened; then all stays, and the problem says why
   */
  public boolean open(Path newFile) {
    Path absolute = newFile.toAbsolutePath();
    try {
      begin(absolute, ScenarioDocument.open(absolute));
      saved = Optional.of(document.get());
    } catch (FileFaultsException e) {
      problem.set(new Problem("Cannot open " + name(absolute), e.getMessage()));
      return false;
    }
    changed();
    return true;
  }

  /**
   * Begins with a document that is in no file, in place of the present one, whose unsaved edits are
   * given up.
   *
   * @param newDocument what to begin with; it counts as saved until it is edited
   */
  public void start(ScenarioDocument newDocument) {
    begin(null, newDocument);
    saved = Optional.of(newDocument);
    changed();
  }

  /**
   * Takes up what a crash left, in place of the present document, whose unsaved edits are given up.
   *
   * @param pending from the recovery store, which gives it up for this
   */
  public void recover(RecoveryStore.Pending pending) {
    begin(pending.origin().orElse(null), pending.document());
    saved = pending.origin().flatMap(DeskSession::asItStands);
    changed();
    if (keepNow() || !dirty.get()) {
      recovery.forget(pending);
    }
  }

  private static Optional<ScenarioDocument> asItStands(Path origin) {
    try {
      return Optional.of(ScenarioDocument.open(origin));
    } catch (FileFaultsException e) {
      return Optional.empty(); // then it is to be saved in any case
    }
  }

  private void begin(Path newFile, ScenarioDocument newDocument) {
    opened.set(opened.get() + 1);
    history.clear();
    problem.set(null);
    file.set(newFile);
    document.set(newDocument);
  }

  private static String name(Path path) {
    return String.valueOf(path.getFileName() == null ? path : path.getFileName());
  }

  /**
   * Edits the document, as one step to be undone.
   *
   * @param word what is done, for people
   * @param change makes the edited document; one that makes the same does nothing, one that meets
   *     an unreadable file leaves a problem
   */
  public void edit(String word, UnaryOperator<ScenarioDocument> change) {
    Optional<ScenarioDocument> edited = apply(word, change);
    if (edited.isPresent()) {
      history.add(word, document.get());
      become(edited.get());
    }
  }

  /**
   * Edits the document as part of a gesture: with those before it of the same word and key it is
   * one step to be undone, until {@link #endGesture} or another edit, undo or redo.
   *
   * @param word what is done, for people
   * @param mergeKey what it is done to
   * @param change makes the edited document
   */
  public void edit(String word, String mergeKey, UnaryOperator<ScenarioDocument> change) {
    Optional<ScenarioDocument> edited = apply(word, change);
    if (edited.isPresent()) {
      history.merge(word, mergeKey, document.get(), edited.get());
      become(edited.get());
    }
  }

  /**
   * Edits the document as part of a gesture, as {@link #edit(String, String, UnaryOperator)} does,
   * but always from the document with which the gesture began, so that what is rounded on the way
   * does not add up.
   *
   * @param word what is done, for people
   * @param mergeKey what it is done to
   * @param change makes the edited document of the one with which the gesture began
   */
  public void editFromStart(String word, String mergeKey, UnaryOperator<ScenarioDocument> change) {
    ScenarioDocument start = history.beginning(word, mergeKey).orElse(document.get());
    edit(word, mergeKey, present -> change.apply(start));
  }

  private Optional<ScenarioDocument> apply(String word, UnaryOperator<ScenarioDocument> change) {
    ScenarioDocument present = document.get();
    if (present == null) {
      return Optional.empty();
    }
    try {
      return Optional.of(change.apply(present)).filter(edited -> !edited.equals(present));
    } catch (FileFaultsException e) {
      problem.set(new Problem("Not done: " + word, e.getMessage()));
      return Optional.empty();
    }
  }

  private void become(ScenarioDocument newDocument) {
    document.set(newDocument);
    changed();
  }

  /** Ends a gesture: the next edit is a step of its own. */
  public void endGesture() {
    history.endGesture();
  }

  /** Puts all inputs to the other side. */
  public void mirror() {
    edit("Swap left and right", ScenarioDocument::mirrored);
  }

  /**
   * Puts what a hand flew in the place of all inputs on stick and pedals, as one edit. The trace is
   * kept with the document, and written beside the scenario when that is saved.
   *
   * @param record what the hand did; it moves something and lasts longer than 0 s
   */
  public void takeFlown(HandRecord record) {
    String stem = file.get() == null ? "scenario" : name(file.get()).replaceFirst("\\.json$", "");
    edit("fly by hand", document -> document.flownByHand(record, stem + "-by-hand.csv"));
  }

  /** Undoes the last edit, if there is one. */
  public void undo() {
    history.undo(document.get()).ifPresent(this::become);
  }

  /** Does the last undone edit again, if there is one. */
  public void redo() {
    history.redo(document.get()).ifPresent(this::become);
  }

  private void changed() {
    ScenarioDocument present = document.get();
    title.set(
        present
            .text("$.title")
            .filter(text -> !text.isBlank())
            .orElse(file.get() == null ? "Untitled" : name(file.get())));
    follow();
    int of = opened.get();
    runner.run(
        () -> Outcome.of(present),
        outcome -> show(of, outcome),
        thrown -> show(of, Outcome.broken(thrown)));
  }

  /** What depends on document, history and file. */
  private void follow() {
    canUndo.set(history.canUndo());
    canRedo.set(history.canRedo());
    undoWord.set(history.undoWord());
    redoWord.set(history.redoWord());
    dirty.set(saved.isEmpty() || !saved.get().equals(document.get()));
    if (dirty.get()) {
      keepSoon();
    } else {
      giveUpKept();
    }
  }

  private void show(int of, Outcome outcome) {
    if (of != opened.get()) {
      return;
    }
    boolean isFirst = shown != of;
    shown = of;
    if (!faults.equals(outcome.faults())) {
      faults.setAll(outcome.faults());
    }
    failure.set(outcome.failure());
    if (outcome.result().isPresent()) {
      result.set(outcome.result().get());
    } else if (isFirst) {
      result.set(null);
    }
    stale.set(result.get() != null && outcome.result().isEmpty());
  }

  private void keepSoon() {
    Object asked = new Object();
    keepAsked = asked;
    ScenarioDocument work = document.get();
    Optional<Path> origin = Optional.ofNullable(file.get());
    runner.spaced(
        BETWEEN_KEEPS,
        () -> {
          synchronized (recovery) {
            // What was saved or undone meanwhile must not come back.
            if (keepAsked == asked) {
              recovery.keep(origin, work);
            }
          }
          return "";
        },
        recoveryProblem::set,
        thrown -> recoveryProblem.set(notKept(thrown)));
  }

  private static String notKept(Throwable thrown) {
    return "Unsaved edits would be lost in a crash, so save often: "
        + (thrown instanceof UncheckedIOException ? thrown.getMessage() : thrown.toString());
  }

  private void giveUpKept() {
    keepAsked = null;
    recovery.discard();
    recoveryProblem.set("");
  }

  /**
   * Writes unsaved edits to the recovery store at once.
   *
   * @return false when they could not be written, or there are none
   */
  public boolean keepNow() {
    if (!dirty.get()) {
      return false;
    }
    keepAsked = null; // nothing older may come after
    try {
      recovery.keep(Optional.ofNullable(file.get()), document.get());
      recoveryProblem.set("");
      return true;
    } catch (UncheckedIOException e) {
      recoveryProblem.set(notKept(e));
      return false;
    }
  }

  /**
   * Saves into the file of the document.
   *
   * @return false when it has none or cannot be written; then the problem says what to do
   */
  public boolean save() {
    if (document.get() != null && file.get() == null) {
      problem.set(
          new Problem("Not saved yet", "The scenario has no file. Save it as a file of your own."));
      return false;
    }
    return saveAs(file.get());
  }

  /**
   * Saves into a file, which becomes that of the document. What was to be undone stays so.
   *
   * @param newFile one that stands there is replaced
   * @return false when it cannot be written; then all stays, and the problem says what to do
   */
  public boolean saveAs(Path newFile) {
    if (document.get() == null) {
      return false;
    }
    history.endGesture();
    Path absolute = newFile.toAbsolutePath();
    ScenarioDocument written;
    try {
      written = ScenarioFile.write(absolute, document.get());
    } catch (UncheckedIOException e) {
      problem.set(
          new Problem(
              "Cannot save " + name(absolute),
              e.getMessage() + ". Your edits are still here; nothing of the file has changed."));
      return false;
    }
    problem.set(null);
    saved = Optional.of(written);
    boolean hasMoved = !written.equals(document.get());
    if (hasMoved) {
      history.replaceAll(step -> step.at(absolute));
    }
    file.set(absolute);
    document.set(written);
    if (hasMoved) {
      changed();
    } else {
      follow();
    }
    return true;
  }

  /** Keeps the present result to compare with, in place of one kept before. */
  public void keepGhost() {
    if (result.get() != null) {
      ghost.set(result.get());
    }
  }

  /**
   * Flies another document than the present one and keeps its result to compare with. One that
   * cannot be flown leaves a problem, and what was kept before.
   *
   * @param what it is, for people
   * @param change makes the other document
   */
  public void keepGhostOf(String what, UnaryOperator<ScenarioDocument> change) {
    if (document.get() == null) {
      return;
    }
    Outcome outcome;
    try {
      outcome = Outcome.of(change.apply(document.get()));
    } catch (FileFaultsException e) {
      problem.set(new Problem("Not kept: " + what, e.getMessage()));
      return;
    }
    if (outcome.result().isPresent()) {
      ghost.set(outcome.result().get());
    } else {
      String reason =
          outcome.faults().isEmpty() ? outcome.failure() : outcome.faults().get(0).toString();
      problem.set(new Problem("Not kept: " + what, reason));
    }
  }

  /** Compares no longer. */
  public void dropGhost() {
    ghost.set(null);
  }

  /**
   * The first fault at a place of the document.
   *
   * @param path such as {@code $.condition}; below {@code $.aeroplane} also for its file
   * @return what is wrong there or below; empty when nothing is
   */
  public Optional<String> faultAt(String path) {
    for (FileFault fault : faults) {
      String at = document.get().pathOf(fault);
      if (at.equals(path) || at.startsWith(path + ".") || at.startsWith(path + "[")) {
        return Optional.of(fault.message());
      }
    }
    return Optional.empty();
  }

  /** Ends the session in good order: nothing is left to recover, and nothing is shown any more. */
  public void close() {
    opened.set(opened.get() + 1);
    giveUpKept();
  }
}
