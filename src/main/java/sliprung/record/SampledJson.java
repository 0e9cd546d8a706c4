package sliprung.record;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonGenerator;
import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import sliprung.sampling.Sampled;

/** What sampled starts came to, as JSON: SI, unrounded. */
public final class SampledJson {
  private SampledJson() {}

  /** The object that {@code sample --json} prints. */
  public static String of(Sampled sampled) {
    StringWriter text = new StringWriter();
    try (JsonGenerator json = new JsonFactory().createGenerator(text)) {
      json.useDefaultPrettyPrinter();
      json.writeStartObject();
      json.writeNumberField("starts", sampled.starts());
      json.writeNumberField("seed", sampled.seed());
      json.writeNumberField("not_run_up", sampled.notRunUp());
      json.writeArrayFieldStart("trips");
      for (Sampled.Trips trips : sampled.trips()) {
        json.writeStartObject();
        json.writeStringField("device", trips.device());
        json.writeStringField("relay", trips.relay());
        json.writeStringField("series", trips.series());
        if (trips.notJudged()) {
          json.writeNullField("count");
          json.writeNullField("low");
          json.writeNullField("high");
        } else {
          json.writeNumberField("count", trips.count());
          json.writeNumberField("low", trips.bounds().low());
          json.writeNumberField("high", trips.bounds().high());
        }
        json.writeEndObject();
      }
      json.writeEndArray();
      json.writeArrayFieldStart("quantities");
      for (Sampled.Quantity quantity : sampled.quantities()) {
        json.writeStartObject();
        json.writeStringField("name", quantity.name());
        json.writeStringField("unit", quantity.unit());
        for (int i = 0; i < Sampled.PERCENTS.size(); i++) {
          json.writeNumberField("p" + Sampled.PERCENTS.get(i), quantity.percentiles().get(i));
        }
        json.writeEndObject();
      }
      json.writeEndArray();
      json.writeEndObject();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    return text.toString();
  }
}
