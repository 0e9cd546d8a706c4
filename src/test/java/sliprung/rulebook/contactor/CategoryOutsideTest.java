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
import sliprung.protection.Edge;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Practice;
import sliprung.rulebook.Verdict;
import sliprung.starter.Contactor;

/** Contactor figures of the standards, and what everybody who builds such panels knows. */
@Tag("outside")
class CategoryOutsideTest {
  private static final Practice PRACTICE = Practice.named("iec");

  @TestFactory
  Stream<DynamicTest> making_breaking_and_power_factor_of_a_category() {
    return OutsideTable.read("contactor-categories")
        .tests(
            row -> {
              Category category =
                  new Category(row.text("category"), row.number("rated_amps"), PRACTICE);
              if (row.has("making_amps")) {
                assertThat(category.making() * category.ratedAmps())
                    .isCloseTo(row.number("making_amps"), within(1e-9));
                assertThat(category.breaking() * category.ratedAmps())
                    .isCloseTo(row.number("breaking_amps"), within(1e-9));
              }
              if (row.has("power_factor")) {
                assertThat(category.powerFactor()).isEqualTo(row.number("power_factor"));
              }
            });
  }

  /** IEC 60947-4-1 annex B, from memory: I_c 1000 A is tested at 750 A and 1250 A. */
  @Test
  void a_take_over_at_1000_A_is_tested_at_750_A_and_1250_A() {
    PowerLaws laws = new PowerLaws();
    for (Edge edge : Edge.values()) {
      laws.law("F2", edge, i -> 1e7 / (i * i)).law("F1", edge, i -> 1e13 / (i * i * i * i));
    }
    Finding finding =
        CrusherFacts.finding(
            new TheRelayTakesOverFromTheFuse(facts -> laws), CrusherFacts.bare(), "K1");

    assertThat(CrusherFacts.says(finding))
        .contains("cross at 1 000 A")
        .contains("relay alone to open at 750 A")
        .contains("fuse first at 1 250 A");
  }

  /** Geometry: one pole of a delta between three rings carries ring current over √3. */
  @Test
  void a_delta_pole_carries_86_603_A_of_150_A() {
    Contactor delta = CrusherFacts.starter().contactor("K12").orElseThrow();

    assertThat(PoleCurrent.inTheory(delta, 150)).isCloseTo(86.603, within(0.001));
  }

  /** Common practice: delta-connected rotor contactors are chosen by ring current over 1.4. */
  @Test
  void the_customary_1_4_keeps_about_a_quarter_in_hand_over_the_balanced_delta() {
    Contactor delta = CrusherFacts.starter().contactor("K12").orElseThrow();

    assertThat(PoleCurrent.forVerdict(delta, 150, PRACTICE) / PoleCurrent.inTheory(delta, 150))
        .isCloseTo(1.24, within(0.005));
  }

  /** Common practice: AC-2 is the category of the line contactor of a slip-ring motor. */
  @Test
  void ac_2_at_rated_current_starts_and_stops_a_slip_ring_motor() {
    Finding finding =
        CrusherFacts.finding(
            new TheLineContactorFitsItsDuty(),
            CrusherFacts.of("{AC-2: 315 A, AC-3: 315 A}", "{AC-2: 208 A}"),
            "K1");

    assertThat(finding.verdict()).isEqualTo(Verdict.CLEAR);
  }
}
