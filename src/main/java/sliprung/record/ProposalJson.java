package sliprung.record;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonGenerator;
import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import sliprung.dial.Judgement;
import sliprung.dial.Judgement.Answer;
import sliprung.dial.Judgement.Question;
import sliprung.dial.Proposal;

/** A proposal as JSON: SI, unrounded. */
public final class ProposalJson {
  private ProposalJson() {}

  /** What {@code propose --json} prints. */
  public static String of(Proposal proposal) {
    StringWriter text = new StringWriter();
    try (JsonGenerator json = new JsonFactory().createGenerator(text)) {
      json.useDefaultPrettyPrinter();
      json.writeStartObject();
      json.writeArrayFieldStart("settings");
      for (Proposal.Change change : proposal.changes()) {
        json.writeStartObject();
        json.writeStringField("device", change.dial().device());
        json.writeStringField("dial", change.dial().setting());
        json.writeStringField("path", change.dial().path());
        json.writeNumberField("value", change.dial().value());
        json.writeNumberField("proposed", change.to());
        json.writeStringField("unit", change.dial().dimension().unit());
        json.writeEndObject();
      }
      json.writeEndArray();
      json.writeArrayFieldStart("moved");
      for (Question question : proposal.moved()) {
        json.writeStartObject();
        json.writeStringField("rule", question.rule());
        json.writeStringField("subject", question.subject());
        answer(json, "before", proposal.before(), question);
        answer(json, "after", proposal.after(), question);
        json.writeEndObject();
      }
      json.writeEndArray();
      json.writeArrayFieldStart("breaks_within_dial_error");
      for (Question question : proposal.inexact()) {
        json.writeStartObject();
        json.writeStringField("rule", question.rule());
        json.writeStringField("subject", question.subject());
        json.writeEndObject();
      }
      json.writeEndArray();
      json.writeNumberField("judged", proposal.evaluations());
      json.writeEndObject();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    return text.toString();
  }

  private static void answer(
      JsonGenerator json, String name, Judgement judgement, Question question) throws IOException {
    Answer answer = judgement.answers().get(question);
    if (answer == null) {
      json.writeNullField(name);
      return;
    }
    json.writeObjectFieldStart(name);
    json.writeStringField("verdict", answer.verdict().word());
    number(json, "margin", answer.margin());
    number(json, "wanted", answer.wanted());
    json.writeEndObject();
  }

  private static void number(JsonGenerator json, String name, java.util.OptionalDouble value)
      throws IOException {
    if (value.isPresent() && Double.isFinite(value.getAsDouble())) {
      json.writeNumberField(name, value.getAsDouble());
    } else {
      json.writeNullField(name);
    }
  }
}
