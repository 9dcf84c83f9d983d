package org.rolltrace.ui.session;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.Optional;
import java.util.function.UnaryOperator;
import org.rolltrace.core.files.ScenarioDocument;

/** What can be undone and done again. */
final class EditHistory {
  /** How many steps are remembered. */
  static final int LONGEST = 1000;

  private final Deque<Step> undone = new ArrayDeque<>();
  private final Deque<Step> done = new ArrayDeque<>();
  private Optional<String> gesture = Optional.empty();
  private boolean gestureHasStep;

  /** An edit, and the document on the other side of it. */
  private record Step(String word, ScenarioDocument document) {}

  void clear() {
    done.clear();
    undone.clear();
    endGesture();
  }

  void endGesture() {
    gesture = Optional.empty();
    gestureHasStep = false;
  }

  /** Remembers an edit by itself. */
  void add(String word, ScenarioDocument before) {
    endGesture();
    push(word, before);
  }

  /**
   * Remembers an edit that is one with those before it of the same gesture. One that leads back to
   * where the gesture began is forgotten with them.
   */
  void merge(String word, String key, ScenarioDocument before, ScenarioDocument after) {
    Optional<String> going = Optional.of(word + "\n" + key);
    if (!gesture.equals(going)) {
      endGesture();
      gesture = going;
    }
    if (!gestureHasStep) {
      push(word, before);
      gestureHasStep = true;
    } else if (done.getLast().document().equals(after)) {
      done.removeLast();
      gestureHasStep = false;
    }
    undone.clear();
  }

  /** The document with which a gesture began; empty when it is not going on or has led back. */
  Optional<ScenarioDocument> beginning(String word, String key) {
    return gesture.equals(Optional.of(word + "\n" + key)) && gestureHasStep
        ? Optional.of(done.getLast().document())
        : Optional.empty();
  }

  private void push(String word, ScenarioDocument before) {
    undone.clear();
    done.addLast(new Step(word, before));
    if (done.size() > LONGEST) {
      done.removeFirst();
    }
  }

  Optional<ScenarioDocument> undo(ScenarioDocument present) {
    return cross(done, undone, present);
  }

  Optional<ScenarioDocument> redo(ScenarioDocument present) {
    return cross(undone, done, present);
  }

  private Optional<ScenarioDocument> cross(
      Deque<Step> from, Deque<Step> to, ScenarioDocument present) {
    endGesture();
    if (from.isEmpty()) {
      return Optional.empty();
    }
    Step step = from.removeLast();
    to.addLast(new Step(step.word(), present));
    return Optional.of(step.document());
  }

  /** What would be undone; nothing when nothing can be. */
  String undoWord() {
    return done.isEmpty() ? "" : done.getLast().word();
  }

  /** What would be done again; nothing when nothing can be. */
  String redoWord() {
    return undone.isEmpty() ? "" : undone.getLast().word();
  }

  boolean canUndo() {
    return !done.isEmpty();
  }

  boolean canRedo() {
    return !undone.isEmpty();
  }

  /** Changes all documents that are remembered. */
  void replaceAll(UnaryOperator<ScenarioDocument> change) {
    for (Deque<Step> steps : List.of(done, undone)) {
      List<Step> changed = new ArrayList<>();
      for (Step step : steps) {
        changed.add(new Step(step.word(), change.apply(step.document())));
      }
      steps.clear();
      steps.addAll(changed);
    }
  }
}
