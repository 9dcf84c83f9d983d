package org.rolltrace.core.files;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonGenerator;
import com.fasterxml.jackson.core.StreamWriteFeature;
import com.fasterxml.jackson.core.util.DefaultIndenter;
import com.fasterxml.jackson.core.util.DefaultPrettyPrinter;
import java.io.IOException;
import java.io.Writer;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.rolltrace.core.atmosphere.FlightCondition;
import org.rolltrace.core.derivatives.Coefficient;
import org.rolltrace.core.derivatives.Estimate;
import org.rolltrace.core.derivatives.LateralDerivatives;

/** What documents of results have in common. */
final class ResultParts {
  private final JsonGenerator json;

  ResultParts(JsonGenerator json) {
    this.json = json;
  }

  /** Writes what stands in a document. */
  @FunctionalInterface
  interface Document {
    void write(JsonGenerator json) throws IOException;
  }

  /** Writes a document in lines; flushes, and does not close. */
  static void writeDocument(Writer out, Document document) throws IOException {
    DefaultPrettyPrinter printer =
        new DefaultPrettyPrinter()
            .withObjectIndenter(new DefaultIndenter("  ", "\n"))
            .withArrayIndenter(new DefaultIndenter("  ", "\n"));
    JsonFactory factory =
        JsonFactory.builder().disable(StreamWriteFeature.AUTO_CLOSE_TARGET).build();
    try (JsonGenerator json = factory.createGenerator(out)) {
      json.setPrettyPrinter(printer);
      document.write(json);
    }
    out.append('\n');
    out.flush();
  }

  void number(String name, double value) throws IOException {
    if (!(Math.abs(value) <= Double.MAX_VALUE)) {
      throw new IllegalStateException(name + " is " + value + "; expected a finite number");
    }
    json.writeNumberField(name, value);
  }

  void number(String name, OptionalDouble value) throws IOException {
    if (value.isPresent()) {
      number(name, value.getAsDouble());
    }
  }

  void writeTexts(String name, List<String> texts) throws IOException {
    json.writeArrayFieldStart(name);
    for (String text : texts) {
      json.writeString(text);
    }
    json.writeEndArray();
  }

  /** Air, speeds, load factor and path, inside an object. */
  void writeAir(FlightCondition condition) throws IOException {
    number("pressureAltitude", condition.pressureAltitude());
    number("temperature", condition.temperature());
    number("pressure", condition.pressure());
    number("density", condition.density());
    number("speedOfSound", condition.speedOfSound());
    number("trueAirspeed", condition.trueAirspeed());
    number("equivalentAirspeed", condition.equivalentAirspeed());
    number("calibratedAirspeed", condition.calibratedAirspeed());
    number("mach", condition.mach());
    number("dynamicPressure", condition.dynamicPressure());
    number("loadFactor", condition.loadFactor());
    number("flightPathAngle", condition.flightPathAngle());
  }

  void writeDerivatives(LateralDerivatives derivatives) throws IOException {
    json.writeObjectFieldStart("derivatives");
    for (Coefficient coefficient : Coefficient.values()) {
      json.writeObjectFieldStart(coefficient.symbol());
      number("value", derivatives.value(coefficient));
      json.writeStringField("origin", derivatives.origin(coefficient).word());
      Optional<Estimate> estimate = derivatives.estimate(coefficient);
      if (estimate.isPresent()) {
        writeEstimate(estimate.get());
      }
      json.writeEndObject();
    }
    json.writeEndObject();
  }

  private void writeEstimate(Estimate estimate) throws IOException {
    number("estimate", estimate.value());
    json.writeArrayFieldStart("parts");
    for (Estimate.Term term : estimate.terms()) {
      json.writeStartObject();
      json.writeStringField("part", term.part());
      number("value", term.value());
      json.writeStringField("method", term.method().title());
      if (!term.extrapolated().isEmpty()) {
        json.writeStringField("extrapolated", term.extrapolated());
      }
      json.writeEndObject();
    }
    json.writeEndArray();
  }
}
