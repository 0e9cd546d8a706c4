package sliprung.record;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonGenerator;
import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.util.List;
import sliprung.dial.BankGrading.Graded;
import sliprung.dial.BankGrading.Shared;

/** A graded bank as JSON: SI, unrounded. */
public final class BankJson {
  private BankJson() {}

  /** What {@code propose --sections --json} prints. */
  public static String of(Graded graded) {
    StringWriter text = new StringWriter();
    try (JsonGenerator json = new JsonFactory().createGenerator(text)) {
      json.useDefaultPrettyPrinter();
      json.writeStartObject();
      json.writeNumberField("ratio", graded.ratio());
      shared(json, "today", graded.today());
      shared(json, "geometric", graded.geometric());
      if (graded.numeric().isPresent()) {
        shared(json, "numeric", graded.numeric().get());
      } else {
        json.writeNullField("numeric");
      }
      json.writeEndObject();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    return text.toString();
  }

  private static void shared(JsonGenerator json, String name, Shared shared) throws IOException {
    json.writeObjectFieldStart(name);
    numbers(json, "sections_ohm", shared.ohms());
    numbers(json, "closings_ring_a", shared.closingAmps());
    if (shared.spread().isPresent()) {
      json.writeNumberField("greatest_over_least", shared.spread().getAsDouble());
    } else {
      json.writeNullField("greatest_over_least");
    }
    json.writeEndObject();
  }

  private static void numbers(JsonGenerator json, String name, List<Double> numbers)
      throws IOException {
    json.writeArrayFieldStart(name);
    for (double number : numbers) {
      json.writeNumber(number);
    }
    json.writeEndArray();
  }
}
