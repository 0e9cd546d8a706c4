package sliprung.record;

import com.fasterxml.jackson.core.JsonGenerator;
import java.io.IOException;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * Fields that may be null: JSON has no infinity and no "not a number", so what never comes and what
 * is not known are both null.
 *
 * @param json where they go
 */
record JsonFields(JsonGenerator json) {

  /** A number, or null where it is not finite. */
  void number(String name, double value) throws IOException {
    if (Double.isFinite(value)) {
      json.writeNumberField(name, value);
    } else {
      json.writeNullField(name);
    }
  }

  /** A number, or null where it is empty or not finite. */
  void number(String name, OptionalDouble value) throws IOException {
    number(name, value.orElse(Double.NaN));
  }

  /** A text, or null. */
  void text(String name, Optional<String> value) throws IOException {
    if (value.isPresent()) {
      json.writeStringField(name, value.get());
    } else {
      json.writeNullField(name);
    }
  }
}
