package sliprung.record;

import com.fasterxml.jackson.core.JsonGenerator;
import java.io.IOException;
import java.util.List;
import java.util.Locale;
import sliprung.protection.DeviceResponse;
import sliprung.protection.PartResponse;
import sliprung.rulebook.ComputedStart;
import sliprung.runup.ClosingPeak;
import sliprung.runup.Stage;
import sliprung.runup.StartHistory;
import sliprung.runup.Trace;
import sliprung.tolerance.Corner;

/** Writes one start of {@code review.json}. */
final class StartJson {
  private static final double RPM = 30.0 / Math.PI;

  private StartJson() {}

  static void write(JsonFields fields, ComputedStart start) throws IOException {
    JsonGenerator json = fields.json();
    StartHistory history = start.history();
    json.writeStartObject();
    json.writeStringField("id", start.id());
    json.writeStringField("kind", start.scenario().isFault() ? "fault" : "permitted");
    json.writeStringField("from", start.from().word());
    json.writeStringField("load", start.scenario().load().name().toLowerCase(Locale.ROOT));
    json.writeFieldName("corner");
    corner(fields, start.corner());
    fields.number("supply_pu", start.corner().supplyPu());
    json.writeStringField("outcome", history.outcome().word());
    fields.number("last_closing_s", history.lastClosingSeconds());
    fields.number("run_up_s", history.runUpSeconds());
    json.writeArrayFieldStart("stages");
    List<Stage> stages = history.stages();
    for (int i = 0; i < stages.size(); i++) {
      stage(fields, stages.get(i), i == stages.size() - 1);
    }
    json.writeEndArray();
    json.writeArrayFieldStart("devices");
    for (DeviceResponse device : start.devices()) {
      device(fields, device);
    }
    json.writeEndArray();
    json.writeArrayFieldStart("parts");
    for (PartResponse part : start.parts()) {
      json.writeStartObject();
      json.writeStringField("part", part.part());
      fields.number("use", part.use());
      fields.number("limit_at_s", part.limitAtSeconds());
      fields.number("energy_kj", part.energyJoules().orElse(Double.NaN) / 1e3);
      json.writeEndObject();
    }
    json.writeEndArray();
    json.writeEndObject();
  }

  static void corner(JsonFields fields, Corner corner) throws IOException {
    JsonGenerator json = fields.json();
    json.writeStartObject();
    json.writeStringField("id", corner.id());
    fields.number("supply_pu", corner.supplyPu());
    json.writeStringField("load", corner.load().name().toLowerCase(Locale.ROOT));
    json.writeStringField("bank", corner.bank().name().toLowerCase(Locale.ROOT));
    json.writeStringField("timers", corner.timers().name().toLowerCase(Locale.ROOT));
    if (!corner.steps().isEmpty()) {
      json.writeArrayFieldStart("steps");
      for (Corner.Timers side : corner.steps()) {
        json.writeString(side.name().toLowerCase(Locale.ROOT));
      }
      json.writeEndArray();
    }
    if (corner.inside().isPresent()) {
      fields.number("load_factor", corner.inside().get().loadFactor());
      fields.number("bank_factor", corner.inside().get().bankFactor());
    }
    json.writeEndObject();
  }

  private static void stage(JsonFields fields, Stage stage, boolean last) throws IOException {
    JsonGenerator json = fields.json();
    Trace trace = stage.trace();
    int end = trace.last();
    json.writeStartObject();
    json.writeNumberField("step", stage.step());
    fields.number("from_s", stage.fromSeconds());
    fields.number("to_s", last && stage.settled() ? Double.NaN : stage.toSeconds());
    fields.number("speed_from_rpm", trace.speed()[0] * RPM);
    fields.number("speed_to_rpm", trace.speed()[end] * RPM);
    fields.number("stator_from_a", stage.entry().statorAmps());
    fields.number("stator_to_a", trace.statorAmps()[end]);
    fields.number("rotor_from_a", stage.entry().ringAmps());
    fields.number("rotor_to_a", trace.ringAmps()[end]);
    fields.number("torque_from_nm", stage.entry().torque());
    fields.number("torque_to_nm", trace.torque()[end]);
    json.writeBooleanField("settled", stage.settled());
    fields.number("stator_peak_a", stage.peak().map(ClosingPeak::statorAmps).orElse(Double.NaN));
    fields.number("torque_peak_nm", stage.peak().map(ClosingPeak::torque).orElse(Double.NaN));
    json.writeEndObject();
  }

  private static void device(JsonFields fields, DeviceResponse device) throws IOException {
    JsonGenerator json = fields.json();
    boolean judged = device.notJudged().isEmpty();
    json.writeStartObject();
    json.writeStringField("device", device.device());
    json.writeStringField("edge", device.edge().word());
    fields.number("use", judged ? device.use() : Double.NaN);
    fields.number("use_at_run_up", judged ? device.useAtRunUp() : Double.NaN);
    fields.number("operates_at_s", judged ? device.operatesAtSeconds() : Double.NaN);
    fields.number("clears_at_s", judged ? device.clearsAtSeconds() : Double.NaN);
    json.writeEndObject();
  }
}
