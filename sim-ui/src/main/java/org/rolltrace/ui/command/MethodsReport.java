package org.rolltrace.ui.command;

import java.io.PrintWriter;
import java.util.Collection;
import java.util.List;
import org.rolltrace.core.derivatives.EstimateMethod;

/** The methods of estimation: what each computes, after whom, and its known error. */
final class MethodsReport extends TextReport {
  private static final int INDENT = 18;

  void print(PrintWriter out) {
    line("Methods by which derivatives are estimated from the shape of an aeroplane");
    add(this, List.of(EstimateMethod.values()));
    printTo(out);
  }

  static void add(TextReport text, Collection<EstimateMethod> methods) {
    for (EstimateMethod method : methods) {
      text.line("  " + method.title());
      text.wrapped(padded("    computes", INDENT), method.what());
      text.wrapped(padded("    after", INDENT), method.source());
      text.wrapped(padded("    known error", INDENT), method.knownError());
    }
  }
}
