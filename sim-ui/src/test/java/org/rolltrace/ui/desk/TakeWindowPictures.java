package org.rolltrace.ui.desk;

import javafx.application.Application;

/**
 * Starts {@link WindowPictures} from the class path, where an application class may not be first.
 */
public final class TakeWindowPictures {
  private TakeWindowPictures() {}

  /**
   * Takes the pictures.
   *
   * @param arguments the folder for them
   */
  public static void main(String[] arguments) {
    Application.launch(WindowPictures.class, arguments);
  }
}
