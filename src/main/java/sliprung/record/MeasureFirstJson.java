package sliprung.record;

import com.fasterxml.jackson.core.JsonGenerator;
import java.io.IOException;
import sliprung.sensitivity.MeasureFirst;
import sliprung.sensitivity.Sensitivity;
import sliprung.sensitivity.ThinMargin;

/** What to measure first, as JSON: every input that moves one of the margins, unrounded. */
final class MeasureFirstJson {
  private MeasureFirstJson() {}

  static void write(JsonFields fields, MeasureFirst first) throws IOException {
    JsonGenerator json = fields.json();
    json.writeArrayFieldStart("measure_first");
    for (ThinMargin thin : first.margins()) {
      json.writeStartObject();
      json.writeStringField("rule", thin.finding().rule());
      json.writeStringField("subject", thin.finding().subject());
      fields.number("margin", thin.finding().margin());
      fields.number("wanted", thin.finding().wanted());
      json.writeArrayFieldStart("inputs");
      for (Sensitivity input : thin.inputs()) {
        json.writeStartObject();
        json.writeStringField("input", input.input());
        json.writeStringField("words", input.words());
        json.writeStringField("evidence", input.grade().word());
        fields.number("low_factor", input.lowFactor());
        fields.number("high_factor", input.highFactor());
        fields.number("margin_at_low", input.low());
        fields.number("margin_at_high", input.high());
        json.writeEndObject();
      }
      json.writeEndArray();
      json.writeStringField("says", thin.says());
      json.writeEndObject();
    }
    json.writeEndArray();
    json.writeArrayFieldStart("readings");
    for (String says : first.readings()) {
      json.writeString(says);
    }
    json.writeEndArray();
  }
}
