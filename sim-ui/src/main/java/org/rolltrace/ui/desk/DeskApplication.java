package org.rolltrace.ui.desk;

import java.nio.file.Path;
import java.util.List;
import javafx.application.Application;
import javafx.application.Platform;
import javafx.stage.Stage;
import org.rolltrace.ui.session.DeskSession;
import org.rolltrace.ui.session.RecoveryStore;
import org.rolltrace.ui.task.Background;

/** The window as an application. */
public final class DeskApplication extends Application {
  private Background runner;
  private DeskWindow window;

  /** Made by the window toolkit. */
  public DeskApplication() {}

  @Override
  public void start(Stage stage) {
    runner = new Background(Platform::runLater);
    Path state = RecoveryStore.defaultFolder();
    RecoveryStore recovery = new RecoveryStore(state.resolve("recovery"));
    window = new DeskWindow(stage, new DeskSession(runner, recovery), recovery);
    List<String> files = getParameters().getUnnamed();
    Path first = files.isEmpty() ? ShippedScenarios.first(state) : Path.of(files.get(0));
    window.show(first);
  }

  @Override
  public void stop() {
    runner.close();
  }
}
