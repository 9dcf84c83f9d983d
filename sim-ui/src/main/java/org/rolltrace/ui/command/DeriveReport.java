package org.rolltrace.ui.command;

import java.io.PrintWriter;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import org.rolltrace.core.aeroplane.Aeroplane;
import org.rolltrace.core.aeroplane.InertiaBasis;
import org.rolltrace.core.derivatives.Coefficient;
import org.rolltrace.core.derivatives.Estimate;
import org.rolltrace.core.derivatives.LateralDerivatives;
import org.rolltrace.core.derivatives.Origin;
import org.rolltrace.core.run.DerivativeReport;
import org.rolltrace.core.run.DerivedAeroplane;
import org.rolltrace.core.run.DerivedFigure;
import org.rolltrace.core.run.FigureChange;
import org.rolltrace.core.run.Safety;

/** The derivatives of an aeroplane and what its variants change, as text. */
final class DeriveReport extends TextReport {
  private static final int LABEL = 34;
  private static final int VALUE = 12;

  /** More variants than this stand in a further table. */
  private static final int SIDE_BY_SIDE = 2;

  private static final int VARIANT_LABEL = 34;
  private static final int COLUMN = 11;
  private static final int PERCENT = 10;

  private static final Set<DerivedFigure.Kind> OF_THE_AEROPLANE =
      Set.of(
          DerivedFigure.Kind.SPAN,
          DerivedFigure.Kind.WING_AREA,
          DerivedFigure.Kind.ASPECT_RATIO,
          DerivedFigure.Kind.MASS,
          DerivedFigure.Kind.ROLL_INERTIA,
          DerivedFigure.Kind.YAW_INERTIA,
          DerivedFigure.Kind.PRODUCT);

  private final DerivativeReport report;

  DeriveReport(DerivativeReport report) {
    this.report = report;
  }

  void print(PrintWriter out) {
    addAeroplane();
    addCondition();
    addDerivatives(report.base().data().derivatives());
    if (!report.methods().isEmpty()) {
      line("");
      line(
          "Known errors of the estimates; derive --methods says what each computes, and after whom");
      report
          .methods()
          .forEach(method -> wrapped(padded("  " + method.title(), 30), method.knownError()));
    }
    addFigures();
    addVariants();
    line("");
    wrapped("", Safety.NOTICE);
    printTo(out);
  }

  private void addAeroplane() {
    DerivedAeroplane base = report.base();
    Aeroplane aeroplane = base.data().aeroplane();
    line(aeroplane.name());
    wrapped(padded("  size and mass", 20), sizeAndMass(aeroplane));
    if (aeroplane.inertiaBasis() == InertiaBasis.GIVEN) {
      row("  inertia", "given");
    }
    wrapped(padded("  control travel", 20), travel(aeroplane));
    addSource(base.data().derivatives());
    row(
        "  shape",
        base.shape()
            .map(shape -> "known; wing by " + shape.theory().word().replace('-', ' '))
            .orElse("not known: nothing is estimated"));
  }

  private void addCondition() {
    report
        .condition()
        .condition()
        .ifPresent(
            condition -> {
              addAir(condition);
              row("  load factor", format("%.3f", condition.loadFactor()));
            });
    wrapped(padded("  condition", 20), report.condition().basis());
  }

  private void addDerivatives(LateralDerivatives derivatives) {
    line("");
    line("Derivatives, per rad and per pb/2V or rb/2V");
    line(format("  %-9s%10s  %-21s%10s  %s", "", "value", "origin", "estimate", "by"));
    for (Coefficient coefficient : Coefficient.values()) {
      Origin origin = derivatives.origin(coefficient);
      Optional<Estimate> estimate = derivatives.estimate(coefficient);
      String value = origin == Origin.ABSENT ? "-" : derivative(derivatives.value(coefficient));
      line(
          (format("  %-9s%10s  %-21s", coefficient.symbol(), value, origin.word())
                  + estimate
                      .filter(unused -> origin == Origin.SET)
                      .map(
                          one ->
                              format("%10s", derivative(one.value()))
                                  + beside(one.value(), derivatives.value(coefficient)))
                      .orElse(""))
              .stripTrailing());
      estimate.map(Estimate::terms).orElse(List.of()).forEach(this::addTerm);
    }
  }

  /** How far an estimate is from the value that wins over it. */
  private static String beside(double estimate, double value) {
    double relative = (estimate - value) / Math.abs(value);
    return Math.abs(relative) <= Double.MAX_VALUE ? "  " + percent(relative) : "";
  }

  private static String percent(double relative) {
    return format("%+.1f %%", 100 * relative);
  }

  private void addTerm(Estimate.Term term) {
    line(
        format(
                "%21s  %-21s%10s  %s",
                "", term.part(), derivative(term.value()), term.method().title())
            .stripTrailing());
    if (!term.extrapolated().isEmpty()) {
      wrapped(" ".repeat(56), "extrapolated: " + term.extrapolated());
    }
  }

  private void addFigures() {
    line("");
    line("What follows");
    Map<String, List<String>> missing = new LinkedHashMap<>();
    for (DerivedFigure figure : report.base().figures()) {
      if (OF_THE_AEROPLANE.contains(figure.kind())) {
        continue;
      }
      if (figure.value().isEmpty()) {
        missing
            .computeIfAbsent(figure.reason(), reason -> new ArrayList<>())
            .add(figure.kind().title());
        continue;
      }
      double si = figure.value().getAsDouble();
      String unit = shownUnit(figure.kind().label(), figure.kind().unit());
      String more =
          unit.equals(figure.kind().unit()) ? "" : number(si) + " " + figure.kind().unit();
      line(
          ("  "
                  + padded(figure.kind().title(), LABEL)
                  + format("%" + VALUE + "s %-8s", number(shown(si, unit)), plainUnit(unit))
                  + more)
              .stripTrailing());
    }
    missing.forEach(
        (reason, titles) ->
            wrapped("  not to be had: ", String.join(", ", titles) + " - " + reason));
  }

  /** Angles and roll rates in degrees; frequencies stay in rad/s. */
  private static String shownUnit(String name, String unit) {
    if (unit.equals("rad")) {
      return "deg";
    }
    return name.equals(DerivedFigure.Kind.FULL_ROLL_RATE.label()) ? "deg/s" : unit;
  }

  private static double shown(double si, String unit) {
    return unit.startsWith("deg") ? Math.toDegrees(si) : si;
  }

  private static String plainUnit(String unit) {
    return unit.equals("1") ? "" : unit;
  }

  private void addVariants() {
    List<DerivedAeroplane> variants = report.variants();
    if (variants.isEmpty()) {
      return;
    }
    line("");
    line("Variants beside the base");
    for (DerivedAeroplane variant : variants) {
      List<String> parts = variant.differsFrom(report.base());
      wrapped(
          padded("  " + variant.label() + ":", 20),
          (parts.isEmpty() ? "nothing that is looked at here differs" : String.join(", ", parts))
              + (report.changes(variant).isEmpty() && !parts.isEmpty()
                  ? "; no derivative and no figure changes"
                  : ""));
    }
    for (int from = 0; from < variants.size(); from += SIDE_BY_SIDE) {
      addTable(variants.subList(from, Math.min(variants.size(), from + SIDE_BY_SIDE)));
    }
  }

  private void addTable(List<DerivedAeroplane> some) {
    List<Map<String, FigureChange>> changes = new ArrayList<>();
    for (DerivedAeroplane variant : some) {
      Map<String, FigureChange> byName = new LinkedHashMap<>();
      report.changes(variant).forEach(change -> byName.put(change.name(), change));
      changes.add(byName);
    }
    Set<String> rows = new LinkedHashSet<>();
    for (DerivedFigure.Kind kind : DerivedFigure.Kind.values()) {
      rows.add(kind.label());
    }
    for (Coefficient coefficient : Coefficient.values()) {
      rows.add(coefficient.symbol());
    }
    rows.removeIf(name -> changes.stream().noneMatch(byName -> byName.containsKey(name)));
    if (rows.isEmpty()) {
      return;
    }
    line("");
    StringBuilder head = new StringBuilder(" ".repeat(VARIANT_LABEL + COLUMN - 4) + "base");
    for (DerivedAeroplane variant : some) {
      int room = 2 * COLUMN + PERCENT - 2;
      String label = variant.label();
      head.append(
          format(
              "  %" + room + "s",
              label.length() > room ? label.substring(0, room - 3) + "..." : label));
    }
    line(head.toString());
    rows.forEach(name -> line(tableRow(name, changes)));
  }

  private static String tableRow(String name, List<Map<String, FigureChange>> changes) {
    FigureChange any =
        changes.stream()
            .filter(byName -> byName.containsKey(name))
            .findFirst()
            .orElseThrow()
            .get(name);
    String unit = shownUnit(name, any.unit());
    String label = any.title() + (unit.equals("1") ? "" : ", " + unit);
    StringBuilder row = new StringBuilder("  " + padded(label, VARIANT_LABEL - 2));
    row.append(cell(any.base(), unit));
    for (Map<String, FigureChange> byName : changes) {
      FigureChange change = byName.get(name);
      if (change == null) {
        row.append(format("%" + COLUMN + "s%" + (COLUMN + PERCENT) + "s", "same", ""));
        continue;
      }
      row.append(cell(change.variant(), unit));
      OptionalDouble difference = change.difference();
      row.append(
          format(
              "%" + COLUMN + "s",
              difference.isPresent()
                  ? (difference.getAsDouble() > 0 ? "+" : "")
                      + number(shown(difference.getAsDouble(), unit))
                  : ""));
      OptionalDouble relative = change.relative();
      row.append(
          format("%" + PERCENT + "s", relative.isPresent() ? percent(relative.getAsDouble()) : ""));
    }
    return row.toString().stripTrailing();
  }

  private static String cell(OptionalDouble value, String unit) {
    return format(
        "%" + COLUMN + "s", value.isPresent() ? number(shown(value.getAsDouble(), unit)) : "-");
  }
}
