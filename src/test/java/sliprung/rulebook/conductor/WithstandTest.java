package sliprung.rulebook.conductor;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import sliprung.fixture.CrusherFacts;
import sliprung.protection.Edge;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Rule;
import sliprung.rulebook.Verdict;
import sliprung.rulebook.contactor.OperatingTimes;
import sliprung.starter.Device;

class WithstandTest {
  private static final String FUSE = "  F1: {kind: fuse, class: gG, rating: 250 A}\n";
  private static final String RELAY = "  F1: {kind: instantaneous, pick-up: 3000 A, trips: Q1}\n";

  private static Rule rule(double seconds) {
    return new TheCablesStandAShortCircuit(
        f ->
            new OperatingTimes() {
              @Override
              public OptionalDouble seconds(Device device, Edge edge, double amps) {
                return OptionalDouble.of(seconds);
              }

              @Override
              public OptionalDouble secondsFromHot(
                  Device device, Edge edge, double amps, double running) {
                return OptionalDouble.of(seconds);
              }

              @Override
              public Optional<String> unknown(Device device, Edge edge) {
                return Optional.empty();
              }
            });
  }

  private static Facts facts(double area, String insulation, String... more) {
    String[] all = new String[more.length + 2];
    all[0] = "duty:\n";
    all[1] =
        "conductors:\n  stator: {area: "
            + area
            + " mm2, metal: copper, insulation: "
            + insulation
            + ", ampacity: 280 A}\nduty:\n";
    System.arraycopy(more, 0, all, 2, more.length);
    return CrusherFacts.bare(all);
  }

  private static Finding fuse(double seconds, double area, String... more) {
    return CrusherFacts.finding(rule(seconds), facts(area, "XLPE", more), "stator cable");
  }

  @Test
  void behind_a_breaker_relay_and_opening_count_and_one_per_cent_turns_the_verdict() {
    // 10 ms of relay and 50 ms of breaker at 18 kA
    double area = Math.sqrt(18e3 * 18e3 * 0.060) / 143;

    Finding inside = fuse(0.010, area * Math.sqrt(1.01), FUSE, RELAY);
    assertThat(inside.verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(inside.value()).hasValueCloseTo(18e3 * 18e3 * 0.060, within(1.0));
    assertThat(fuse(0.010, area * Math.sqrt(0.99), FUSE, RELAY).verdict())
        .isEqualTo(Verdict.BREACH);
  }

  @Test
  void behind_a_fuse_the_arc_is_allowed_for() {
    double area = Math.sqrt(18e3 * 18e3 * 0.010) / 143;

    assertThat(fuse(0.010, area * Math.sqrt(5 * 1.01)).verdict()).isEqualTo(Verdict.CLEAR);
    Finding tight = fuse(0.010, area * Math.sqrt(5 * 0.99));
    assertThat(tight.verdict()).isEqualTo(Verdict.TIGHT);
    assertThat(CrusherFacts.says(tight)).contains("ends where its arc begins");
    assertThat(fuse(0.010, area * Math.sqrt(0.99)).verdict()).isEqualTo(Verdict.BREACH);
  }

  @Test
  void a_fuse_that_takes_long_needs_no_allowance() {
    double area = Math.sqrt(18e3 * 18e3 * 0.2) / 143;

    assertThat(fuse(0.2, area * Math.sqrt(1.01)).verdict()).isEqualTo(Verdict.CLEAR);
  }

  @Test
  void a_short_circuit_that_nothing_clears_is_a_breach() {
    assertThat(fuse(Double.POSITIVE_INFINITY, 120).verdict()).isEqualTo(Verdict.BREACH);
  }

  @Test
  void the_rotor_cable_stands_a_rotor_at_rest_until_it_is_cleared() {
    Facts facts =
        CrusherFacts.of(
            "duty:\n",
            "conductors:\n  rotor: {area: 150 mm2, metal: copper, insulation: XLPE,"
                + " ampacity: 340 A}\nduty:\n");
    Finding finding = CrusherFacts.finding(new TheCablesStandAShortCircuit(), facts, "rotor cable");

    assertThat(finding.start().orElseThrow().scenario().id()).isEqualTo("rings-shorted");
    double ring = finding.start().get().history().stages().get(0).trace().ringAmps()[0];
    assertThat(finding.limit()).hasValueCloseTo(Math.pow(143 * 150 / ring, 2), within(1e-3));
    assertThat(finding.margin().getAsDouble())
        .isCloseTo(finding.limit().getAsDouble() / finding.value().getAsDouble(), within(1e-9));
  }

  @Test
  void missing_inputs_are_named() {
    Finding finding =
        CrusherFacts.finding(
            rule(0.01),
            facts(120, "silicone", FUSE, "", "  fault-current: {max: 18 kA, min: 9 kA}\n", ""),
            "stator cable");

    assertThat(finding.verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(finding.missing())
        .containsExactly(
            "conductors.stator.insulation",
            "supply.fault-current",
            "supply.fault-current.min",
            "protection");
    assertThat(CrusherFacts.finding(rule(0.01), facts(120, "XLPE"), "rotor cable").missing())
        .containsExactly("conductors.rotor");
  }

  @Test
  void cables_that_are_not_described_are_not_judged() {
    Rule.Answer answer = rule(0.01).judge(CrusherFacts.bare());
    assertThat(((Rule.Answer.Findings) answer).findings())
        .hasSize(2)
        .allSatisfy(f -> assertThat(f.verdict()).isEqualTo(Verdict.NOT_JUDGED))
        .allSatisfy(f -> assertThat(f.missing()).isNotEmpty());
  }
}
