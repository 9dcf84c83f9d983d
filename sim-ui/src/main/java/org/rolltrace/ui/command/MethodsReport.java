package org.rolltrace.ui.command;

import java.io.PrintWriter;
import org.rolltrace.core.derivatives.EstimateMethod;

/** The methods of estimation: what each computes, after whom, and its known error. */
final class MethodsReport extends TextReport {
  private static final int INDENT = 18;

  void print(PrintWriter out) {
    line("Methods by which derivatives are estimated from the shape of an aeroplane");
    for (EstimateMethod method : EstimateMethod.values()) {
      line("");
      line("  " + method.title());
      wrapped(padded("    computes", INDENT), method.what());
      wrapped(padded("    after", INDENT), method.source());
      wrapped(padded("    known error", INDENT), method.knownError());
    }
    printTo(out);
  }
}
