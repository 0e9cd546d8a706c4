package sliprung.record;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;
import sliprung.fixture.StarterText;
import sliprung.review.Review;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.resistor.Restart;
import sliprung.rulebook.resistor.Restarts;

class RestartPartTest {
  private static final Review REVIEW = StarterText.small().review();
  private static final ComputedStart START = REVIEW.starts().get(0);

  private static Restart after(double seconds, String by, boolean past) {
    return new Restart(Restart.After.TRIP, seconds, by, past, START);
  }

  private static Dossier dossier(Review review) {
    return new Dossier(review, List.of(), List.of(), List.of(), "0.1.0");
  }

  @Test
  void a_review_holds_the_four_and_each_agrees_with_its_finding() {
    assertThat(REVIEW.restarts())
        .extracting(Restart::after)
        .containsExactly(
            Restart.After.STOP, Restart.After.TRIP, Restart.After.HELD, Restart.After.LOCKED);
    for (Restart restart : REVIEW.restarts()) {
      String says =
          StarterText.small().finding("resistor/restart", restart.after().subject()).says();
      if (restart.pastLimit()) {
        assertThat(says).contains("past its limit");
      } else {
        assertThat(says)
            .contains(
                restart.seconds() > 0.0
                    ? "after " + RestartPart.pause(restart)
                    : RestartPart.pause(restart));
      }
    }
  }

  @Test
  void page_and_json_show_it() {
    String page = ReviewHtml.text(dossier(REVIEW));
    String json = ReviewJson.text(REVIEW, List.of(), "0.1.0");

    assertThat(page).contains("id=\"restart\"").contains("a held start");
    assertThat(json).contains("\"restarts\" : [").contains("\"after\" : \"trip\"");
  }

  @Test
  void without_what_a_pause_rests_on_there_is_no_table() {
    Review without = StarterText.small().without("cooling:").review();

    assertThat(without.restarts()).isEmpty();
    assertThat(ReviewHtml.text(dossier(without))).doesNotContain("id=\"restart\"");
    assertThat(ReviewJson.text(without, List.of(), "0.1.0")).contains("\"restarts\" : [ ]");
  }

  @Test
  void words_of_a_pause() {
    assertThat(RestartPart.pause(after(0.0, "", false))).isEqualTo("at once");
    assertThat(RestartPart.limitedBy(after(0.0, "", false))).isEqualTo("–");
    assertThat(RestartPart.limitedBy(after(9.0, "section-2", false))).isEqualTo("section 2");
    assertThat(RestartPart.limitedBy(after(9.0, "F2", false))).isEqualTo("F2");
    assertThat(RestartPart.pause(after(9.0, "rotor", true))).isEqualTo("inspect first");
    assertThat(RestartPart.limitedBy(after(9.0, "rotor", true)))
        .isEqualTo("the rotor winding, past its limit");
    assertThat(RestartPart.pause(after(Double.POSITIVE_INFINITY, "rotor", false)))
        .isEqualTo("no pause is enough");
  }

  @Test
  void of_two_circuits_the_later_restart_counts_and_what_is_past_its_limit_before_all() {
    Restart soon = after(10.0, "F2", false);
    Restart late = after(20.0, "section-1", false);
    Restart past = after(5.0, "rotor", true);

    assertThat(Restarts.latest(List.of(soon, late))).containsExactly(late);
    assertThat(Restarts.latest(List.of(late, past, soon))).containsExactly(past);
  }
}
