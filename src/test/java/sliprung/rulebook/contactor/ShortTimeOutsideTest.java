package sliprung.rulebook.contactor;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;
import sliprung.fixture.CrusherFacts;
import sliprung.outside.OutsideTable;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Practice;
import sliprung.rulebook.Verdict;
import sliprung.starter.ShortTime;

/** Short-time currents, test currents and classes of contactors, and what panel builders know. */
@Tag("outside")
class ShortTimeOutsideTest {
  private static final Practice PRACTICE = Practice.named("iec");

  @TestFactory
  Stream<DynamicTest> figures_of_the_standards() {
    return OutsideTable.read("contactor-short-time")
        .tests(
            row ->
                assertThat(value(row))
                    .isCloseTo(row.number("expected"), within(row.number("tolerance"))));
  }

  private static double value(OutsideTable.Row row) {
    double amps = row.number("rated_amps");
    return switch (row.text("quantity")) {
      case "withstand" ->
          TenSecondWithstand.scaledAmps(
              new ShortTime(TenSecondWithstand.amps(amps, PRACTICE), 10), row.number("seconds"));
      case "r" -> TheCoordinationIsDeclared.testAmps(PRACTICE, amps).orElseThrow();
      default ->
          EveryContactorIsRatedForItsOperations.preferred(CrusherFacts.bare(), amps).orElseThrow();
    };
  }

  /** IEC 60947-4-1 9.3.5, from memory, on a whole review: 150 A in AC-3 carries 1200 A for 10 s. */
  @Test
  void the_part_of_a_line_contactor_has_the_same_withstand() {
    var facts = CrusherFacts.of("{AC-2: 315 A, AC-3: 315 A}", "{AC-3: 150 A}");
    var shorted =
        facts.starts().stream()
            .filter(s -> s.scenario().id().equals("rings-shorted"))
            .findFirst()
            .orElseThrow();
    double amps = shorted.history().stages().get(0).trace().statorAmps()[0];

    assertThat(shorted.part("K1").orElseThrow().limitAtSeconds())
        .isCloseTo(1200.0 * 1200.0 * 10.0 / (amps * amps), within(1e-6));
  }

  /** Common practice: two poles between three rings carry the whole ring current. */
  @Test
  void two_poles_carry_the_whole_ring_current() {
    var two = CrusherFacts.starter("poles: delta", "poles: two").contactor("K12").orElseThrow();

    assertThat(PoleCurrent.inTheory(two, 150)).isEqualTo(150);
    assertThat(PoleCurrent.forVerdict(two, 150, PRACTICE)).isEqualTo(150);
  }

  /** Common practice: at plugging the rings have twice the plate's rotor voltage. */
  @Test
  void plugging_brings_twice_the_plates_rotor_voltage() {
    Finding finding =
        CrusherFacts.finding(
            new TheRotorVoltageFitsTheStepContactors(),
            CrusherFacts.of("plugging: none", "plugging: {per-hour: 5, step: 1}"),
            "K11");

    assertThat(finding.value().getAsDouble()).isCloseTo(2 * 420, within(12.0));
  }

  /**
   * Common practice: near full speed the rotor has 1 to 3 Hz or less, and the stator goes first.
   */
  @Test
  void step_contactors_that_part_first_break_nearly_direct_current() {
    Finding finding =
        CrusherFacts.finding(
            new TheLineContactorOpensFirst(),
            CrusherFacts.of(
                "rotor-rating: 315 A, rated-voltage: 690 V, closing: 60 ms, opening: 60 ms",
                "rotor-rating: 315 A, rated-voltage: 690 V, closing: 60 ms, opening: 40 ms"),
            "K12");

    assertThat(finding.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(CrusherFacts.says(finding)).containsPattern("at 0\\.5\\d* Hz");
  }
}
