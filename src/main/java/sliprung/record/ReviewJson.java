package sliprung.record;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonGenerator;
import com.fasterxml.jackson.core.util.DefaultIndenter;
import com.fasterxml.jackson.core.util.DefaultPrettyPrinter;
import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import sliprung.machine.Identification;
import sliprung.machine.Machine;
import sliprung.machine.Source;
import sliprung.review.Review;
import sliprung.review.RunUpMethod;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Finding;
import sliprung.rulebook.resistor.Restart;
import sliprung.runup.RunUpFigures;
import sliprung.sensitivity.MeasureFirst;
import sliprung.starter.Motor;
import sliprung.tolerance.Corner;

/** Writes {@code review.json}, format 1: SI as the suffix of a key says, unrounded. */
public final class ReviewJson {
  private static final int FORMAT = 1;
  private static final double RPM = 30.0 / Math.PI;

  private ReviewJson() {}

  /**
   * The whole file.
   *
   * @param review what was found
   * @param inputs it was made from
   * @param program version of the program
   */
  public static String text(Review review, List<InputFile> inputs, String program) {
    return text(review, inputs, program, MeasureFirst.NONE);
  }

  /**
   * The whole file.
   *
   * @param review what was found
   * @param inputs it was made from
   * @param program version of the program
   * @param measureFirst which inputs to measure first
   */
  public static String text(
      Review review, List<InputFile> inputs, String program, MeasureFirst measureFirst) {
    StringWriter out = new StringWriter();
    DefaultIndenter lines = new DefaultIndenter("  ", "\n");
    DefaultPrettyPrinter printer = new DefaultPrettyPrinter();
    printer.indentObjectsWith(lines);
    printer.indentArraysWith(lines);
    try (JsonGenerator json = new JsonFactory().createGenerator(out)) {
      json.setPrettyPrinter(printer);
      JsonFields fields = new JsonFields(json);
      json.writeStartObject();
      json.writeNumberField("format", FORMAT);
      json.writeStringField("starter", review.starter().name());
      json.writeStringField(
          "practice", review.starter().practice().name().toLowerCase(Locale.ROOT));
      json.writeStringField("program", program);
      json.writeStringField("date", review.date().toString());
      inputs(json, inputs);
      motor(fields, review);
      if (review.method().isPresent()) {
        method(fields, review.method().get());
      }
      json.writeArrayFieldStart("starts");
      for (ComputedStart start : RecordedStarts.of(review)) {
        StartJson.write(fields, start);
      }
      json.writeEndArray();
      json.writeArrayFieldStart("restarts");
      for (Restart restart : review.restarts()) {
        restart(fields, restart);
      }
      json.writeEndArray();
      json.writeArrayFieldStart("findings");
      for (Finding finding : review.findings()) {
        finding(fields, finding);
      }
      json.writeEndArray();
      MeasureFirstJson.write(fields, measureFirst);
      json.writeEndObject();
    } catch (IOException impossible) {
      // a StringWriter does not fail
      throw new UncheckedIOException(impossible);
    }
    return out + "\n";
  }

  private static void inputs(JsonGenerator json, List<InputFile> inputs) throws IOException {
    json.writeArrayFieldStart("inputs");
    for (InputFile input : inputs) {
      json.writeStartObject();
      json.writeStringField("file", input.name());
      json.writeStringField("sha256", input.sha256());
      json.writeStringField("text", input.text());
      json.writeEndObject();
    }
    json.writeEndArray();
  }

  private static void motor(JsonFields fields, Review review) throws IOException {
    JsonGenerator json = fields.json();
    Machine machine = review.machine();
    Motor.CircuitData circuit = machine.circuit();
    Source rated = new Source(review.starter().motor().voltage(), 0.0);
    json.writeObjectFieldStart("motor");
    fields.number("r1_ohm", circuit.r1());
    fields.number("x1_ohm", circuit.x1());
    fields.number("xm_ohm", circuit.xm());
    fields.number("r2_ohm", circuit.r2());
    fields.number("x2_ohm", circuit.x2());
    fields.number("ratio", circuit.ratio());
    fields.number("synchronous_rpm", machine.synchronousSpeed() * RPM);
    fields.number("rated_torque_nm", review.starter().motor().ratedTorque());
    fields.number("breakdown_torque_nm", machine.breakdownTorque(rated));
    fields.number("breakdown_slip", machine.breakdownSlip(rated, 0.0));
    json.writeObjectFieldStart("residuals");
    for (Identification.Residual residual : review.identification().residuals()) {
      json.writeObjectFieldStart(residual.quantity());
      fields.number("plate", residual.plate());
      fields.number("computed", residual.computed());
      json.writeStringField("unit", residual.unit());
      fields.number("relative", residual.relative());
      fields.number("tolerance", residual.tolerance());
      json.writeEndObject();
    }
    json.writeEndObject();
    json.writeEndObject();
  }

  private static void method(JsonFields fields, RunUpMethod method) throws IOException {
    JsonGenerator json = fields.json();
    json.writeObjectFieldStart("model_error");
    json.writeStringField("asked", method.asked().word());
    json.writeStringField("used", method.used().word());
    fields.number("criterion", RunUpMethod.CRITERION);
    figures(fields, "steady", method.error().steady());
    figures(fields, "transient", method.error().withTransient());
    fields.number("run_up", method.error().runUp());
    fields.number("stator_i2t", method.error().statorSquare());
    fields.number("rotor_i2t", method.error().ringSquare());
    json.writeFieldName("worst_corner");
    StartJson.corner(fields, method.worstCorner());
    fields.number("worst", method.worst().greatest());
    json.writeStringField("says", method.says());
    json.writeEndObject();
  }

  private static void restart(JsonFields fields, Restart restart) throws IOException {
    JsonGenerator json = fields.json();
    json.writeStartObject();
    json.writeStringField("after", restart.after().word());
    fields.number("pause_s", restart.pastLimit() ? Double.NaN : restart.seconds());
    json.writeStringField("limited_by", restart.limitedBy());
    json.writeBooleanField("past_limit", restart.pastLimit());
    json.writeStringField("start", restart.start().id());
    json.writeFieldName("corner");
    StartJson.corner(fields, restart.start().corner());
    json.writeEndObject();
  }

  private static void figures(JsonFields fields, String name, RunUpFigures figures)
      throws IOException {
    fields.json().writeObjectFieldStart(name);
    fields.number("run_up_s", figures.runUpSeconds());
    fields.number("stator_i2t_a2s", figures.statorSquare());
    fields.number("rotor_i2t_a2s", figures.ringSquare());
    fields.json().writeEndObject();
  }

  private static void finding(JsonFields fields, Finding finding) throws IOException {
    JsonGenerator json = fields.json();
    json.writeStartObject();
    json.writeStringField("rule", finding.rule());
    json.writeStringField("verdict", finding.verdict().word());
    json.writeStringField("subject", finding.subject());
    fields.text("start", finding.start().map(ComputedStart::id));
    json.writeFieldName("corner");
    Optional<Corner> corner = finding.start().map(ComputedStart::corner);
    if (corner.isPresent()) {
      StartJson.corner(fields, corner.get());
    } else {
      json.writeNull();
    }
    fields.text("edge", finding.edge().map(e -> e.word()));
    fields.number("margin", finding.margin());
    fields.number("wanted", finding.wanted());
    fields.number("limit", finding.limit());
    fields.number("value", finding.value());
    json.writeStringField("unit", finding.unit());
    json.writeStringField("says", finding.says());
    json.writeStringField("mend", finding.mend());
    json.writeStringField("reference", finding.reference());
    json.writeArrayFieldStart("missing");
    for (String path : finding.missing()) {
      json.writeString(path);
    }
    json.writeEndArray();
    json.writeStringField("weakest_input", finding.weakestInput());
    fields.text("by", finding.by());
    fields.text("until", finding.until().map(Object::toString));
    json.writeEndObject();
  }
}
