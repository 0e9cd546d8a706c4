package sliprung.rulebook.trip;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import sliprung.fixture.CrusherFacts;
import sliprung.fixture.Judged;
import sliprung.fixture.StarterText;
import sliprung.protection.DeviceResponse;
import sliprung.protection.Edge;
import sliprung.protection.StartMargins;
import sliprung.quantity.Show;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Verdict;

/** {@code trip/start} on a start of 6.10 s, two steps, no spread. */
class PermittedStartTest {
  private static final String RULE = "trip/start";
  private static final StarterText SMALL = StarterText.small();

  private static StarterText timer(double seconds) {
    return SMALL.line(
        "F5:",
        StarterText.text(
            "F5: {kind: sequence-timer, time: %s s, until: last-step, trips: K1}", seconds));
  }

  private static StarterText inverse(double multiplier) {
    return SMALL.under(
        "F2:",
        StarterText.text(
            "  F3: {kind: inverse-time, curve: iec-very-inverse, pick-up: 120 A,"
                + " time-multiplier: %s, trips: Q1}",
            multiplier));
  }

  @Test
  void every_device_rides_through_and_says_by_how_much() {
    for (String device : List.of("F1", "F2", "F5")) {
      Finding finding = SMALL.finding(RULE, device);
      assertThat(finding.verdict()).isEqualTo(Verdict.CLEAR);
      assertThat(finding.margin().orElseThrow()).isGreaterThan(1.4);
      assertThat(finding.edge()).contains(Edge.FAST);
      assertThat(finding.start()).isPresent();
      assertThat(finding.start().orElseThrow().scenario().isFault()).isFalse();
    }
  }

  /** The last contactor closes 4 s + 50 ms + 2 s + 50 ms after the line contactor. */
  @Test
  void a_sequence_timer_is_held_against_its_stop_event() {
    Judged.over(RULE, "F5", PermittedStartTest::timer)
        .turns(6.10, Verdict.BREACH, Verdict.TIGHT)
        .turns(6.10 * 1.10, Verdict.TIGHT, Verdict.CLEAR);
  }

  /** Degree of operation goes with one over the time multiplier. */
  @Test
  void an_inverse_time_relay_trips_below_a_multiplier_that_its_use_foretells() {
    Finding at = inverse(0.3).finding(RULE, "F3");
    double limit = 0.3 * at.value().orElseThrow();

    Judged.over(RULE, "F3", PermittedStartTest::inverse)
        .turns(limit, Verdict.BREACH, Verdict.TIGHT);
    assertThat(at.value().orElseThrow()).isBetween(0.1, 1.5);
  }

  @Test
  void an_overload_that_trips_is_a_breach_that_names_the_second() {
    Judged relay =
        Judged.over(
            RULE,
            "F2",
            amps ->
                SMALL.line(
                    "F2:",
                    StarterText.text(
                        "F2: {kind: overload, class: 10, dial: %s A, trips: K1}", amps)));
    double limit = relay.limit(40.0, 104.0);

    relay.turns(limit, Verdict.BREACH, Verdict.TIGHT);
    Finding breach = relay.at(limit * 0.99);
    assertThat(breach.value().orElseThrow()).isGreaterThanOrEqualTo(1.0);
    DeviceResponse trips = breach.start().orElseThrow().device("F2", Edge.FAST).orElseThrow();
    assertThat(breach.says()).contains(Show.seconds(trips.operatesAtSeconds()));
  }

  /** A higher dial is further from tripping, and so is a higher class. */
  @Test
  void the_margin_grows_with_dial_and_class() {
    double before = 0.0;
    for (String relay :
        List.of("10, dial: 90 A", "10, dial: 104 A", "20, dial: 104 A", "30, dial: 104 A")) {
      double margin =
          SMALL
              .line("F2:", "F2: {kind: overload, class: " + relay + ", trips: K1}")
              .finding(RULE, "F2")
              .margin()
              .orElseThrow();
      assertThat(margin).isGreaterThan(before);
      before = margin;
    }
  }

  @ParameterizedTest
  @CsvSource({"10A, 1.40", "10, 1.40", "20, 1.15", "30, 1.10"})
  void a_class_alone_wants_more_the_less_it_pins(String tripClass, double wanted) {
    Finding finding =
        SMALL
            .line("F2:", "F2: {kind: overload, class: " + tripClass + ", dial: 104 A, trips: K1}")
            .finding(RULE, "F2");

    assertThat(finding.wanted().orElseThrow()).isCloseTo(wanted, within(1e-12));
  }

  @Test
  void a_class_alone_is_at_best_tight_under_its_own_margin() {
    Judged relay =
        Judged.over(
            RULE,
            "F2",
            amps ->
                SMALL.line(
                    "F2:",
                    StarterText.text(
                        "F2: {kind: overload, class: 10, dial: %s A, trips: K1}", amps)));
    double dial = relay.limit(40.0, 104.0);
    Finding finding = relay.at(dial);
    while (finding.margin().orElseThrow() < 1.15) {
      dial *= 1.005;
      finding = relay.at(dial);
    }

    assertThat(finding.margin().orElseThrow()).isLessThan(1.4);
    assertThat(finding.verdict()).isEqualTo(Verdict.TIGHT);
  }

  @Test
  void a_longer_series_is_nearer_to_a_trip_and_the_start_of_the_series_is_named() {
    Finding two = SMALL.finding(RULE, "F2");
    Finding three = SMALL.with("{cold: 2, hot: 1,", "{cold: 3, hot: 0,").finding(RULE, "F2");

    assertThat(three.margin().orElseThrow()).isLessThan(two.margin().orElseThrow());
    assertThat(three.start().orElseThrow().place()).isEqualTo(3);
    assertThat(three.start().orElseThrow().id()).isEqualTo("cold-3");
  }

  @Test
  void a_fuse_far_too_small_melts() {
    Finding finding = SMALL.with("rating: 160 A", "rating: 32 A").finding(RULE, "F1");

    assertThat(finding.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(finding.margin().orElseThrow()).isLessThan(0.7);
  }

  /** Neither of these classes has a shortest time: nothing says when the fastest relay trips. */
  @ParameterizedTest
  @ValueSource(strings = {"2", "3", "nema-20"})
  void a_class_without_a_shortest_time_is_not_judged_and_asks_for_the_curve(String tripClass) {
    StarterText text =
        SMALL.line("F2:", "F2: {kind: overload, class: " + tripClass + ", dial: 104 A, trips: K1}");
    Finding finding = text.finding(RULE, "F2");

    assertThat(finding.verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(finding.missing()).containsExactly("protection.F2.curve");
    assertThat(finding.margin()).isEmpty();
    assertThat(text.review().mustJudgeMissing()).contains(RULE);
  }

  /** An instantaneous element alone is asked by trip/closing-peak. */
  @Test
  void without_a_device_it_has_no_subject_and_the_review_is_not_clear() {
    StarterText text =
        SMALL
            .without("F1:")
            .without("F2:")
            .line("F5:", "F4: {kind: instantaneous, pick-up: 900 A, trips: Q1}");

    assertThat(text.review().notApplicable()).anyMatch(n -> n.rule().equals(RULE));
    assertThat(text.review().mustJudgeMissing()).contains(RULE);
    assertThat(text.review().exitStatus()).isNotZero();
  }

  private static DeviceResponse fuse(double currentMargin, Optional<String> bound) {
    return new DeviceResponse(
        "F1",
        Edge.FAST,
        1.0 / currentMargin,
        1.0 / currentMargin,
        currentMargin < 1.0 ? 3.0 : Double.POSITIVE_INFINITY,
        currentMargin < 1.0 ? 3.0 : Double.POSITIVE_INFINITY,
        Optional.of(StartMargins.known(currentMargin, 1.0)),
        bound,
        Optional.empty());
  }

  /** The facts of a starter with the fuse's answer replaced, cold starts and hot ones apart. */
  private static Facts answering(DeviceResponse cold, DeviceResponse hot) {
    Facts facts = CrusherFacts.of();
    return new Facts(
        facts.starter(),
        facts.practice(),
        facts.machine(),
        facts.identification(),
        facts.starts().stream()
            .map(
                s ->
                    new ComputedStart(
                        s.scenario(),
                        s.from(),
                        s.place(),
                        s.corner(),
                        s.history(),
                        List.of(s.from() == ComputedStart.From.COLD ? cold : hot),
                        s.parts()))
            .toList(),
        facts.running(),
        facts.fastPickUps(),
        facts.bands());
  }

  private static Finding judged(DeviceResponse cold, DeviceResponse hot) {
    return CrusherFacts.findings(
            new NoDeviceOperatesInAPermittedStart(), answeringFuseAlone(cold, hot))
        .get(0);
  }

  private static Facts answeringFuseAlone(DeviceResponse cold, DeviceResponse hot) {
    Facts facts = answering(cold, hot);
    return new Facts(
        facts
            .starter()
            .withProtection(
                facts.starter().protection().stream().filter(d -> d.tag().equals("F1")).toList()),
        facts.practice(),
        facts.machine(),
        facts.identification(),
        facts.starts(),
        facts.running(),
        facts.fastPickUps(),
        facts.bands());
  }

  @Test
  void a_certain_breach_stands_beside_a_thinner_margin_that_is_only_a_bound() {
    Optional<String> bound = Optional.of("Below its first gate this is a bound.");
    DeviceResponse thin = fuse(0.5, bound);

    Finding certain = judged(thin, fuse(0.9, Optional.empty()));
    assertThat(certain.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(certain.margin()).hasValue(0.9);
    assertThat(certain.start().orElseThrow().from()).isEqualTo(ComputedStart.From.HOT);

    Finding open = judged(thin, fuse(1.01, Optional.empty()));
    assertThat(open.verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(open.says()).contains("this is a bound");
  }

  @Test
  void a_certain_breach_stands_beside_a_start_that_is_not_judged() {
    DeviceResponse unknown = DeviceResponse.notJudged("F1", Edge.FAST, "no shortest time");

    assertThat(judged(unknown, fuse(0.9, Optional.empty())).verdict()).isEqualTo(Verdict.BREACH);
    assertThat(judged(unknown, fuse(1.9, Optional.empty())).verdict())
        .isEqualTo(Verdict.NOT_JUDGED);
  }
}
