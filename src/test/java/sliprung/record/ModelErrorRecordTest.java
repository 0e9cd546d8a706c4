package sliprung.record;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.time.LocalDate;
import java.util.List;
import org.junit.jupiter.api.Test;
import sliprung.fixture.CrusherFacts;
import sliprung.review.Review;
import sliprung.review.Reviewer;

/** The model error and the peaks in the record of a whole review. */
class ModelErrorRecordTest {
  private static JsonNode record(String method) throws IOException {
    Review review =
        Reviewer.review(
            CrusherFacts.starter("method: steady", "method: " + method), LocalDate.of(2026, 12, 1));
    return new ObjectMapper().readTree(ReviewJson.text(review, List.of(), "test"));
  }

  @Test
  void both_methods_state_the_same_error_and_the_same_peaks() throws IOException {
    JsonNode steady = record("steady");
    JsonNode full = record("transient");

    assertThat(steady.get("model_error").get("asked").asText()).isEqualTo("steady");
    assertThat(full.get("model_error").get("used").asText()).isEqualTo("transient");
    for (String key :
        List.of("run_up", "stator_i2t", "rotor_i2t", "steady", "transient", "worst")) {
      assertThat(steady.get("model_error").get(key)).isEqualTo(full.get("model_error").get(key));
    }
    double error = steady.get("model_error").get("stator_i2t").asDouble();
    assertThat(error).isNotZero().isBetween(-0.05, 0.05);

    JsonNode ours = steady.get("starts").get(0);
    JsonNode theirs = full.get("starts").get(0);
    assertThat(ours.get("id").asText()).isEqualTo("cold");
    assertThat(ours.get("run_up_s").asDouble())
        .isEqualTo(steady.get("model_error").get("steady").get("run_up_s").asDouble());
    assertThat(theirs.get("run_up_s").asDouble())
        .isEqualTo(steady.get("model_error").get("transient").get("run_up_s").asDouble());
    for (int i = 0; i < 3; i++) {
      for (String key : List.of("stator_peak_a", "torque_peak_nm", "step")) {
        assertThat(ours.get("stages").get(i).get(key).isNumber()).isTrue();
        assertThat(ours.get("stages").get(i).get(key))
            .isEqualTo(theirs.get("stages").get(i).get(key));
      }
      // at line closing both begin at rest, so the steady figures are the same
      if (i == 0) {
        assertThat(ours.get("stages").get(i).get("stator_from_a"))
            .isEqualTo(theirs.get("stages").get(i).get("stator_from_a"));
      }
    }
  }

  @Test
  void every_nominal_fault_has_its_peaks() throws IOException {
    for (JsonNode start : record("steady").get("starts")) {
      // a jam while running closes nothing and has no closing peak
      if (start.get("corner").get("id").asText().equals("nominal")
          && !start.get("id").asText().startsWith("running-locked")) {
        for (JsonNode stage : start.get("stages")) {
          assertThat(stage.get("stator_peak_a").isNumber()).as(start.get("id").asText()).isTrue();
        }
      }
    }
  }
}
