package sliprung.record;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.Test;
import sliprung.review.CrusherReview;
import sliprung.review.Review;

/** Holds {@code review.json} against its published format 1. */
class ReviewJsonTest {
  private static final Review REVIEW = CrusherReview.plain();
  private static final List<InputFile> INPUTS =
      List.of(new InputFile("crusher.yaml", "00ff", "sliprung: 1\n"));
  private static final String TEXT = ReviewJson.text(REVIEW, INPUTS, "0.1.0");
  private static final JsonNode JSON = parsed(TEXT);

  @Test
  void should_have_the_published_keys_and_no_others() {
    assertThat(keys(JSON))
        .containsExactly(
            "format",
            "starter",
            "practice",
            "program",
            "date",
            "inputs",
            "motor",
            "starts",
            "restarts",
            "findings",
            "measure_first",
            "readings");
    assertThat(keys(JSON.get("inputs").get(0))).containsExactly("file", "sha256", "text");
    assertThat(keys(JSON.get("motor")))
        .containsExactly(
            "r1_ohm",
            "x1_ohm",
            "xm_ohm",
            "r2_ohm",
            "x2_ohm",
            "ratio",
            "synchronous_rpm",
            "rated_torque_nm",
            "breakdown_torque_nm",
            "breakdown_slip",
            "residuals");
    JsonNode start = JSON.get("starts").get(0);
    assertThat(keys(start))
        .containsExactly(
            "id",
            "kind",
            "from",
            "load",
            "corner",
            "supply_pu",
            "outcome",
            "last_closing_s",
            "run_up_s",
            "stages",
            "devices",
            "parts");
    assertThat(keys(start.get("stages").get(0)))
        .containsExactly(
            "step",
            "from_s",
            "to_s",
            "speed_from_rpm",
            "speed_to_rpm",
            "stator_from_a",
            "stator_to_a",
            "rotor_from_a",
            "rotor_to_a",
            "torque_from_nm",
            "torque_to_nm",
            "settled",
            "stator_peak_a",
            "torque_peak_nm");
    assertThat(keys(start.get("devices").get(0)))
        .containsExactly("device", "edge", "use", "use_at_run_up", "operates_at_s", "clears_at_s");
    assertThat(keys(start.get("parts").get(0)))
        .containsExactly("part", "use", "limit_at_s", "energy_kj");
    assertThat(keys(JSON.get("findings").get(0)))
        .containsExactly(
            "rule",
            "verdict",
            "subject",
            "start",
            "corner",
            "edge",
            "margin",
            "wanted",
            "limit",
            "value",
            "unit",
            "says",
            "mend",
            "reference",
            "missing",
            "weakest_input",
            "by",
            "until");
  }

  @Test
  void should_hold_every_start_that_the_format_promises() {
    Set<String> ids = new HashSet<>(JSON.get("starts").findValuesAsText("id"));
    assertThat(ids)
        .contains(
            "cold",
            "hot",
            "held-1",
            "held-5",
            "held-1-running",
            "held-5-running",
            "locked",
            "locked-1",
            "rings-shorted");
    REVIEW.findings().forEach(f -> f.start().ifPresent(s -> assertThat(ids).contains(s.id())));
  }

  @Test
  void should_give_every_start_an_id_of_its_own() {
    List<String> ids = new ArrayList<>();
    JSON.get("starts").forEach(s -> ids.add(s.get("id").asText()));
    assertThat(ids).doesNotHaveDuplicates();
  }

  @Test
  void should_write_what_never_comes_or_is_not_known_as_null() {
    JsonNode held = start("held-2");
    assertThat(held.get("run_up_s").isNull()).isTrue();
    JsonNode stages = held.get("stages");
    JsonNode last = stages.get(stages.size() - 1);
    assertThat(last.get("settled").asBoolean()).isTrue();
    assertThat(last.get("to_s").isNull()).isTrue();
    assertThat(last.get("stator_peak_a").isNull()).isTrue();
    JsonNode rings = held.get("parts").get(held.get("parts").size() - 1);
    assertThat(rings.get("part").asText()).isEqualTo("rings");
    assertThat(rings.get("use").isNull()).isTrue();
    assertThat(rings.get("limit_at_s").isNull()).isTrue();
    assertThat(TEXT).doesNotContain("NaN").doesNotContain("Infinity");
  }

  @Test
  void should_write_numbers_unrounded() {
    double use = REVIEW.start("cold").orElseThrow().devices().get(0).use();
    assertThat(start("cold").get("devices").get(0).get("use").asDouble()).isEqualTo(use);
  }

  @Test
  void should_write_verdicts_and_acceptances_in_words() {
    JsonNode accepted = null;
    for (JsonNode finding : JSON.get("findings")) {
      accepted = finding.get("verdict").asText().equals("accepted") ? finding : accepted;
    }
    assertThat(accepted).isNotNull();
    assertThat(accepted.get("by").asText()).isEqualTo("plant engineer");
    assertThat(accepted.get("until").asText()).isEqualTo("2027-06-30");
    assertThat(accepted.get("start").isNull()).isTrue();
    assertThat(accepted.get("corner").isNull()).isTrue();
  }

  @Test
  void should_write_the_same_bytes_twice() {
    assertThat(ReviewJson.text(CrusherReview.plain(), INPUTS, "0.1.0")).isEqualTo(TEXT);
  }

  @Test
  void should_keep_hostile_text_as_text() {
    String name = "a\"b\\c</script>\u0001";
    Review review = CrusherReview.of(name, "x", true);
    assertThat(parsed(ReviewJson.text(review, INPUTS, "0")).get("starter").asText())
        .isEqualTo(name);
  }

  private static JsonNode start(String id) {
    for (JsonNode start : JSON.get("starts")) {
      if (start.get("id").asText().equals(id)) {
        return start;
      }
    }
    throw new AssertionError(id);
  }

  private static List<String> keys(JsonNode node) {
    List<String> keys = new ArrayList<>();
    node.fieldNames().forEachRemaining(keys::add);
    return keys;
  }

  private static JsonNode parsed(String text) {
    try {
      return new ObjectMapper().readTree(text);
    } catch (java.io.IOException e) {
      throw new AssertionError(e);
    }
  }
}
