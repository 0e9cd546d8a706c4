package sliprung.record;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonGenerator;
import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.util.Collection;
import java.util.List;
import java.util.Optional;
import sliprung.dial.Dial;
import sliprung.dial.DialReport;
import sliprung.dial.Judgement.Question;
import sliprung.dial.Window;

/** The windows of all dials as JSON: SI, unrounded. */
public final class DialsJson {
  private DialsJson() {}

  /** The list of dials that {@code dials --json} prints. */
  public static String of(List<DialReport> reports) {
    StringWriter text = new StringWriter();
    try (JsonGenerator json = new JsonFactory().createGenerator(text)) {
      json.useDefaultPrettyPrinter();
      json.writeStartArray();
      for (DialReport report : reports) {
        dial(json, report);
      }
      json.writeEndArray();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    return text.toString();
  }

  private static void dial(JsonGenerator json, DialReport report) throws IOException {
    Dial dial = report.dial();
    json.writeStartObject();
    json.writeStringField("device", dial.device());
    json.writeStringField("dial", dial.setting());
    json.writeStringField("path", dial.path());
    json.writeNumberField("value", dial.value());
    json.writeStringField("unit", dial.dimension().unit());
    json.writeFieldName("searched");
    json.writeStartObject();
    json.writeNumberField("low", dial.low());
    json.writeNumberField("high", dial.high());
    json.writeBooleanField("declared", dial.scale().hasRange());
    json.writeEndObject();
    windows(json, "windows", report.windows());
    json.writeFieldName("recommended");
    number(json, report.recommended());
    text(json, "none_because", report.noneBecause());
    questions(json, "apart", report.apart());
    json.writeFieldName("best");
    number(json, report.best());
    questions(json, "left", report.left());
    windows(json, "no_further_breach", report.noFurther());
    json.writeFieldName("pair");
    if (report.pair().isPresent()) {
      DialReport.Pair pair = report.pair().get();
      json.writeStartObject();
      json.writeStringField("path", pair.other().path());
      json.writeNumberField("value", pair.value());
      json.writeFieldName("window");
      window(json, pair.window());
      json.writeEndObject();
    } else {
      json.writeNull();
    }
    json.writeNumberField("looked", report.looked());
    json.writeEndObject();
  }

  private static void windows(JsonGenerator json, String name, List<Window> windows)
      throws IOException {
    json.writeFieldName(name);
    json.writeStartArray();
    for (Window window : windows) {
      window(json, window);
    }
    json.writeEndArray();
  }

  private static void window(JsonGenerator json, Window window) throws IOException {
    json.writeStartObject();
    json.writeNumberField("low", window.low());
    json.writeNumberField("high", window.high());
    bound(json, "low", window.below());
    bound(json, "high", window.above());
    json.writeEndObject();
  }

  /** Null rule: nothing breaks up to the end of the range that was looked at. */
  private static void bound(JsonGenerator json, String side, Window.Bound bound)
      throws IOException {
    text(json, side + "_rule", bound.breaks().map(Question::rule).orElse(""));
    text(json, side + "_subject", bound.breaks().map(Question::subject).orElse(""));
    text(json, side + "_corner", bound.answer().map(a -> a.corner()).orElse(""));
    text(json, side + "_circumstances", bound.answer().map(a -> a.circumstances()).orElse(""));
  }

  private static void questions(JsonGenerator json, String name, Collection<Question> questions)
      throws IOException {
    json.writeFieldName(name);
    json.writeStartArray();
    for (Question question : questions) {
      json.writeStartObject();
      json.writeStringField("rule", question.rule());
      json.writeStringField("subject", question.subject());
      json.writeEndObject();
    }
    json.writeEndArray();
  }

  private static void number(JsonGenerator json, Optional<Double> value) throws IOException {
    if (value.isPresent()) {
      json.writeNumber(value.get());
    } else {
      json.writeNull();
    }
  }

  private static void text(JsonGenerator json, String name, String value) throws IOException {
    if (value.isEmpty()) {
      json.writeNullField(name);
    } else {
      json.writeStringField(name, value);
    }
  }
}
