package org.rolltrace.core.files;

import com.fasterxml.jackson.core.JsonGenerator;
import java.io.IOException;
import java.io.Writer;
import java.util.Optional;
import java.util.OptionalDouble;
import org.rolltrace.core.atmosphere.FlightCondition;
import org.rolltrace.core.derivatives.EstimateMethod;
import org.rolltrace.core.run.ChosenCondition;
import org.rolltrace.core.run.DerivativeReport;
import org.rolltrace.core.run.DerivedAeroplane;
import org.rolltrace.core.run.DerivedFigure;
import org.rolltrace.core.run.FigureChange;
import org.rolltrace.core.run.Safety;

/**
 * Derivatives as JSON, format {@code rolltrace-derivatives/1}: SI units and radians, positive to
 * the right; no number that is not finite, a {@code reason} instead.
 */
public final class DerivativesJson {
  private final JsonGenerator json;
  private final ResultParts parts;
  private final DerivativeReport report;

  private DerivativesJson(JsonGenerator json, DerivativeReport report) {
    this.json = json;
    this.parts = new ResultParts(json);
    this.report = report;
  }

  /**
   * Writes a report.
   *
   * @param report what is written
   * @param producedBy the program and its version
   * @param out receives the text; is flushed, not closed
   * @throws IOException when {@code out} fails
   */
  public static void write(DerivativeReport report, String producedBy, Writer out)
      throws IOException {
    ResultParts.writeDocument(
        out, json -> new DerivativesJson(json, report).writeDocument(producedBy));
  }

  private void writeDocument(String producedBy) throws IOException {
    json.writeStartObject();
    json.writeStringField("format", "rolltrace-derivatives/1");
    json.writeStringField("producedBy", producedBy);
    json.writeStringField("notice", Safety.NOTICE);
    writeCondition(report.condition());
    json.writeFieldName("base");
    writeAeroplane(report.base(), "base");
    json.writeArrayFieldStart("variants");
    for (DerivedAeroplane variant : report.variants()) {
      writeAeroplane(variant, variant.variant());
    }
    json.writeEndArray();
    writeMethods();
    parts.writeTexts("cautions", report.cautions());
    json.writeEndObject();
  }

  private void writeCondition(ChosenCondition chosen) throws IOException {
    json.writeObjectFieldStart("condition");
    Optional<FlightCondition> condition = chosen.condition();
    if (condition.isPresent()) {
      json.writeStringField("basis", chosen.basis());
      parts.writeAir(condition.get());
    } else {
      json.writeStringField("reason", chosen.basis());
    }
    json.writeEndObject();
  }

  private void writeAeroplane(DerivedAeroplane derived, String name) throws IOException {
    json.writeStartObject();
    json.writeStringField("name", name);
    json.writeStringField("aeroplane", derived.data().aeroplane().name());
    json.writeStringField("inertiaBasis", derived.data().aeroplane().inertiaBasis().words());
    if (derived.data().derivatives().hasGiven()) {
      json.writeStringField("derivativesSource", derived.data().derivatives().source());
      json.writeStringField("derivativesConvention", derived.data().derivatives().convention());
    }
    if (derived.shape().isPresent()) {
      json.writeStringField("theory", derived.shape().get().theory().word());
      json.writeStringField("loadings", LoadingsCsv.fileName(report, derived));
    }
    json.writeObjectFieldStart("figures");
    for (DerivedFigure figure : derived.figures()) {
      writeFigure(figure);
    }
    json.writeEndObject();
    parts.writeDerivatives(derived.data().derivatives());
    if (!derived.variant().isEmpty()) {
      parts.writeTexts("differsIn", derived.differsFrom(report.base()));
      json.writeObjectFieldStart("changes");
      for (FigureChange change : report.changes(derived)) {
        writeChange(change);
      }
      json.writeEndObject();
    }
    parts.writeTexts("cautions", derived.cautions());
    json.writeEndObject();
  }

  private void writeFigure(DerivedFigure figure) throws IOException {
    json.writeObjectFieldStart(figure.kind().label());
    if (figure.value().isPresent()) {
      parts.number("value", figure.value());
      json.writeStringField("unit", figure.kind().unit());
      json.writeStringField("definition", figure.kind().definition());
    } else {
      json.writeStringField("reason", figure.reason());
    }
    json.writeEndObject();
  }

  private void writeChange(FigureChange change) throws IOException {
    json.writeObjectFieldStart(change.name());
    orReason("base", change.base());
    orReason("variant", change.variant());
    parts.number("difference", change.difference());
    parts.number("relative", change.relative());
    json.writeStringField("unit", change.unit());
    json.writeEndObject();
  }

  private void orReason(String name, OptionalDouble value) throws IOException {
    parts.number(name, value);
    if (value.isEmpty()) {
      json.writeStringField("reason", "the " + name + " has none");
    }
  }

  private void writeMethods() throws IOException {
    json.writeObjectFieldStart("methods");
    for (EstimateMethod method : report.methods()) {
      json.writeObjectFieldStart(method.title());
      json.writeStringField("what", method.what());
      json.writeStringField("source", method.source());
      json.writeStringField("knownError", method.knownError());
      json.writeEndObject();
    }
    json.writeEndObject();
  }
}
