package org.rolltrace.ui.chart;

import java.util.List;
import org.rolltrace.core.quantity.Check;

/**
 * A drawing.
 *
 * @param width px
 * @param height px
 * @param marks in the order in which they are painted
 */
public record Sheet(double width, double height, List<Mark> marks) {

  public Sheet {
    Check.positive("sheet width, px,", width);
    Check.positive("sheet height, px,", height);
    marks = List.copyOf(marks);
  }
}
