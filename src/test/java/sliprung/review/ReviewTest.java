package sliprung.review;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import sliprung.fixture.Judged;
import sliprung.fixture.StarterText;
import sliprung.protection.DeviceResponse;
import sliprung.protection.Edge;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Finding;
import sliprung.rulebook.RuleBook;
import sliprung.rulebook.Verdict;
import sliprung.rulebook.catalogue.Catalogue;
import sliprung.starter.Device;

/** What holds for every review, whatever the starter. */
class ReviewTest {
  private static final StarterText SOUND = StarterText.sound();

  static Stream<StarterText> texts() {
    return Stream.of(
        StarterText.crusher(),
        SOUND,
        SOUND.with("sequence: chained", "sequence: cascaded"),
        StarterText.resource("reference-starters/trolley-480.yaml").nominalOnly());
  }

  @Test
  void a_sound_starter_ends_with_status_0() {
    assertThat(SOUND.review().findings()).noneMatch(f -> f.verdict() == Verdict.BREACH);
    assertThat(SOUND.review().mustJudgeMissing()).isEmpty();
    assertThat(SOUND.review().exitStatus()).isZero();
  }

  @Test
  void a_breach_ends_with_status_1_also_where_something_is_not_judged() {
    StarterText breach = SOUND.without("F5:");
    assertThat(breach.review().exitStatus()).isEqualTo(1);
    assertThat(breach.without("stall-limit:").review().exitStatus()).isEqualTo(1);
  }

  /** Each of these takes away what one rule must know. */
  @ParameterizedTest
  @CsvSource({
    "stall-limit:, held/exposure",
    "stall-limit:, locked/sequence",
    "stall-limit:, sequence/supervision",
    "same-limit:, resistor/start",
    "heating:, locked/sequence"
  })
  void a_must_judge_rule_that_is_not_judged_ends_with_status_4(String key, String rule) {
    StarterText text =
        key.equals("same-limit:") ? SOUND.line(key, "same-limit: false") : SOUND.without(key);
    Review review = text.review();

    assertThat(review.mustJudgeMissing()).contains(rule);
    assertThat(review.findings()).noneMatch(f -> f.verdict() == Verdict.BREACH);
    assertThat(review.exitStatus()).isEqualTo(4);
  }

  @ParameterizedTest
  @MethodSource("texts")
  void every_rule_is_answered_or_not_applicable_with_a_reason(StarterText text) {
    Review review = text.review();
    for (var rule : Catalogue.rules()) {
      String name = rule.info().name();
      boolean answered = review.findings().stream().anyMatch(f -> f.rule().equals(name));
      boolean reasoned =
          review.notApplicable().stream()
              .anyMatch(n -> n.rule().equals(name) && !n.because().isBlank());
      assertThat(answered ^ reasoned).as(name).isTrue();
    }
  }

  @ParameterizedTest
  @MethodSource("texts")
  void verdict_and_margin_never_contradict_each_other(StarterText text) {
    assertThat(text.review().findings()).anyMatch(f -> f.margin().isPresent());
    text.review().findings().forEach(Judged::agrees);
  }

  @ParameterizedTest
  @MethodSource("texts")
  void findings_come_worst_first_and_one_to_a_question(StarterText text) {
    List<Finding> findings = text.review().findings();

    assertThat(findings.stream().map(f -> f.verdict().ordinal())).isSorted();
    assertThat(findings.stream().map(f -> f.rule() + " " + f.subject())).doesNotHaveDuplicates();
    for (Verdict verdict : Verdict.values()) {
      assertThat(
              findings.stream()
                  .filter(f -> f.verdict() == verdict)
                  .map(RuleBook::relativeMargin)
                  .toList())
          .isSorted();
    }
  }

  /** Says, mend, reference, weakest input: a finding explains itself either way. */
  @ParameterizedTest
  @MethodSource("texts")
  void every_finding_explains_itself(StarterText text) {
    for (Finding f : text.review().findings()) {
      String which = f.rule() + " " + f.subject();
      assertThat(f.says()).as(which).isNotBlank().doesNotContain("NaN").doesNotContain("Optional");
      assertThat(f.reference()).as(which).isNotBlank();
      assertThat(f.weakestInput()).as(which).contains(": ");
      if (f.verdict() == Verdict.BREACH) {
        assertThat(f.mend()).as(which).isNotBlank();
      }
    }
  }

  @ParameterizedTest
  @MethodSource("texts")
  void ids_are_unique_and_the_promised_starts_are_there(StarterText text) {
    Review review = text.review();
    int steps = review.starter().sectionCount();

    assertThat(review.starts().stream().map(ComputedStart::id)).doesNotHaveDuplicates();
    for (int k = 1; k <= steps; k++) {
      assertThat(review.start("held-" + k)).isPresent();
      assertThat(review.start("held-" + k + "-running")).isPresent();
    }
    for (String id : List.of("cold", "hot", "locked", "locked-1", "rings-shorted")) {
      assertThat(review.start(id)).as(id).isPresent();
    }
  }

  @Test
  void ids_are_unique_over_a_narrow_band() {
    StarterText narrow = SOUND.with("band: [0 %, 0 %]", "band: [-0.4 %, +0.3 %]");

    assertThat(narrow.review().starts().stream().map(ComputedStart::id)).doesNotHaveDuplicates();
    assertThat(narrow.review().starts().size()).isGreaterThan(SOUND.review().starts().size());
  }

  @ParameterizedTest
  @MethodSource("texts")
  void every_start_lists_every_device_at_every_edge_it_has(StarterText text) {
    Review review = text.review();
    Map<String, List<Edge>> edges = new HashMap<>();
    for (ComputedStart start : review.starts()) {
      for (Device device : review.starter().protection()) {
        List<Edge> found =
            start.devices().stream()
                .filter(d -> d.device().equals(device.tag()))
                .map(DeviceResponse::edge)
                .toList();
        assertThat(found).doesNotHaveDuplicates().contains(Edge.FAST, Edge.SLOW);
        assertThat(edges.computeIfAbsent(device.tag(), t -> found)).isEqualTo(found);
      }
    }
  }

  /** Earlier devices are not later, and greater use is not later either. */
  @ParameterizedTest
  @MethodSource("texts")
  void the_fast_edge_is_never_behind_the_slow_one(StarterText text) {
    for (ComputedStart start : text.review().starts()) {
      for (Device device : text.review().starter().protection()) {
        DeviceResponse fast = start.device(device.tag(), Edge.FAST).orElseThrow();
        DeviceResponse slow = start.device(device.tag(), Edge.SLOW).orElseThrow();
        if (fast.notJudged().isEmpty() && slow.notJudged().isEmpty()) {
          assertThat(fast.operatesAtSeconds())
              .as(start.id() + " " + device.tag())
              .isLessThanOrEqualTo(slow.operatesAtSeconds());
          assertThat(fast.use()).isGreaterThanOrEqualTo(slow.use() * (1.0 - 1e-9));
        }
      }
    }
  }

  @Test
  void the_same_starter_gives_the_same_review() {
    Review again = Reviewer.review(SOUND.starter(), StarterText.DAY);

    assertThat(again.findings().stream().map(ReviewTest::line).toList())
        .isEqualTo(SOUND.review().findings().stream().map(ReviewTest::line).toList());
  }

  private static String line(Finding f) {
    return f.rule() + f.subject() + f.verdict() + f.margin() + f.value() + f.limit() + f.says();
  }

  @Test
  void a_margin_of_the_users_own_overrides_the_practices() {
    Finding ours = SOUND.finding("trip/start", "F5");
    Finding theirs = SOUND.plus("margins: {trip/start: 1.6}").finding("trip/start", "F5");

    assertThat(ours.verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(theirs.verdict()).isEqualTo(Verdict.TIGHT);
    assertThat(theirs.wanted().orElseThrow()).isCloseTo(1.6, within(1e-12));
    assertThat(theirs.margin().orElseThrow()).isEqualTo(ours.margin().orElseThrow());
  }

  /** A smaller one does not turn a breach. */
  @Test
  void a_margin_below_one_makes_no_breach_clear() {
    StarterText text =
        SOUND
            .line("F5:", "F5: {kind: sequence-timer, time: 6 s, until: last-step, trips: K1}")
            .plus("margins: {trip/start: 0.5}");

    assertThat(text.finding("trip/start", "F5").verdict()).isEqualTo(Verdict.BREACH);
  }

  @Test
  void the_weakest_input_is_named_with_its_grade() {
    StarterText text = SOUND.plus("evidence: {load.inertia: estimated, motor.power: measured}");

    assertThat(text.finding("trip/start", "F5").weakestInput()).contains("load.inertia: estimated");
    // the running point does not rest on the inertia
    assertThat(text.finding("trip/running", "F2").weakestInput()).doesNotContain("inertia");
  }

  @Test
  void a_default_is_the_weakest_input_where_nothing_weaker_is_told() {
    assertThat(SOUND.finding("locked/breakaway", "step 1").weakestInput())
        .matches("(resistors|supply)\\..*: default .*");
  }

  @Test
  void a_default_that_decided_is_a_finding_and_goes_when_it_is_given() {
    assertThat(SOUND.finding("data/assumed", "supply").says()).contains("fault-current.min");
    StarterText given = SOUND.under("supply:", "  fault-current: {max: 20 kA, min: 10 kA}");

    assertThat(given.review().findings())
        .noneMatch(f -> f.rule().equals("data/assumed") && f.subject().equals("supply"));
  }

  /** Without breakdown torque both ends of its usual range are run, and the worse answer stands. */
  @Test
  void an_open_breakdown_torque_is_run_at_both_ends() {
    StarterText plate =
        SOUND
            .without("circuit:")
            .without("breakdown-torque:")
            .with("starter: two-steps", "starter: open");
    Review review = plate.review();

    assertThat(review.starts().stream().map(ComputedStart::circuit).distinct().count())
        .isEqualTo(2);
    assertThat(review.starts().stream().map(ComputedStart::id)).doesNotHaveDuplicates();
    assertThat(review.findings().stream().map(f -> f.rule() + " " + f.subject()))
        .doesNotHaveDuplicates();
    assertThat(
            review.findings().stream()
                .flatMap(f -> f.start().stream())
                .map(ComputedStart::circuit)
                .distinct()
                .count())
        .isEqualTo(2);
  }
}
