package sliprung.review;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import sliprung.fixture.StarterText;
import sliprung.starter.Starter;

class KnownStartsTest {
  private static final StarterText CRUSHER = StarterText.crusher();

  @Test
  void a_review_on_known_starts_finds_what_one_of_its_own_finds() {
    Starter today = CRUSHER.starter();
    KnownStarts known = new KnownStarts(today);
    Reviewer.review(today, StarterText.DAY, known);
    for (StarterText other :
        new StarterText[] {
          CRUSHER.with("time-multiplier: 0.25", "time-multiplier: 0.2"),
          CRUSHER.with("time: 13 s,", "time: 11 s,"),
          CRUSHER.with("K12, after: 2.4 s", "K12, after: 2.8 s")
        }) {
      Review onKnown = Reviewer.review(other.starter(), StarterText.DAY, known);
      Review alone = other.review();
      assertThat(onKnown.findings()).hasSameSizeAs(alone.findings());
      for (int i = 0; i < alone.findings().size(); i++) {
        assertThat(onKnown.findings().get(i).says()).isEqualTo(alone.findings().get(i).says());
        assertThat(onKnown.findings().get(i).margin()).isEqualTo(alone.findings().get(i).margin());
      }
    }
  }

  @Test
  void starts_serve_another_set_of_devices_and_no_other_starter() {
    KnownStarts known = new KnownStarts(CRUSHER.starter());
    assertThat(known.serve(CRUSHER.with("dial: 208 A", "dial: 200 A").starter())).isTrue();
    assertThat(known.serve(CRUSHER.with("K12, after: 2.4 s", "K12, after: 2.5 s").starter()))
        .isFalse();
    assertThat(known.serve(CRUSHER.with("inertia: 70 kg·m²", "inertia: 71 kg·m²").starter()))
        .isFalse();
  }
}
