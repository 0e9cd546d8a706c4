package sliprung.protection;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Optional;
import org.junit.jupiter.api.Test;
import sliprung.fixture.StarterText;
import sliprung.review.Review;
import sliprung.rulebook.ComputedStart;

/** Steps after 4 s and 2 s, each contactor closing in 50 ms, no spread. */
class StepProofTest {
  private static final Review REVIEW =
      StarterText.small().line("F5:", "F5: {kind: step-proof, time: 5 s, trips: K1}").review();

  private static DeviceResponse response(String start, Edge edge) {
    Optional<ComputedStart> found = REVIEW.start(start);
    return found.orElseThrow().device("F5", edge).orElseThrow();
  }

  @Test
  void a_good_start_uses_the_longest_wait() {
    DeviceResponse cold = response("cold", Edge.FAST);
    assertThat(cold.use()).isCloseTo(4.05 / 5.0, within(1e-9));
    assertThat(cold.stretchMargin().orElseThrow()).isCloseTo(5.0 / 4.05, within(1e-9));
    assertThat(cold.operates()).isFalse();
  }

  @Test
  void it_trips_its_time_after_the_closing_before_the_one_that_fails() {
    assertThat(response("held-1", Edge.SLOW).operatesAtSeconds()).isEqualTo(5.0);
    assertThat(response("held-2", Edge.SLOW).operatesAtSeconds())
        .isCloseTo(4.05 + 5.0, within(1e-9));
    assertThat(response("held-2", Edge.SLOW).clearsAtSeconds()).isCloseTo(9.10, within(1e-9));
  }

  @Test
  void steps_closed_by_time_satisfy_it_on_a_standing_rotor() {
    assertThat(response("locked", Edge.SLOW).operates()).isFalse();
    assertThat(response("locked-1", Edge.SLOW).operates()).isTrue();
  }

  @Test
  void it_is_blind_to_rings_that_are_shorted_already() {
    assertThat(response("rings-shorted", Edge.SLOW).operates()).isFalse();
  }

  @Test
  void every_held_step_is_seen_and_the_sequence_is_supervised() {
    assertThat(REVIEW.findings())
        .filteredOn(f -> f.rule().equals("held/blind") || f.rule().equals("sequence/supervision"))
        .isNotEmpty()
        .allMatch(f -> f.verdict() == sliprung.rulebook.Verdict.CLEAR);
  }

  @Test
  void a_start_whose_wait_comes_within_a_tenth_of_it_is_tight_and_beyond_it_a_breach() {
    StarterText small = StarterText.small();
    assertThat(trip(small, "4.46 s")).isEqualTo(sliprung.rulebook.Verdict.CLEAR);
    assertThat(trip(small, "4.44 s")).isEqualTo(sliprung.rulebook.Verdict.TIGHT);
    assertThat(trip(small, "4.06 s")).isEqualTo(sliprung.rulebook.Verdict.TIGHT);
    assertThat(trip(small, "4.04 s")).isEqualTo(sliprung.rulebook.Verdict.BREACH);
  }

  private static sliprung.rulebook.Verdict trip(StarterText small, String time) {
    return small
        .line("F5:", "F5: {kind: step-proof, time: " + time + ", trips: K1}")
        .finding("trip/start", "F5")
        .verdict();
  }
}
