package sliprung.rulebook.data;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import sliprung.fixture.CrusherFacts;
import sliprung.machine.Identification;
import sliprung.machine.Identification.Residual;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Rule;
import sliprung.rulebook.Verdict;
import sliprung.starter.Motor.CircuitData;

class NameplateTest {
  private static final Rule RULE = new ThePlateAgreesWithTheCircuit();
  private static final CircuitData CIRCUIT =
      new CircuitData(0.030, 0.183, 4.795, 0.0298, 0.183, 1.568);

  private static Facts with(boolean given, double relative, String... replacements) {
    Residual fine = new Residual("power factor", 0.86, 0.86, "", 0.02);
    Residual other = new Residual("stator current", 208, 208 * (1 + relative), "A", 0.05);
    Identification identification =
        new Identification(CIRCUIT, given, List.of(fine, other), List.of("A note."));
    return CrusherFacts.identified(identification, replacements);
  }

  @Test
  void a_plate_that_the_circuit_explains_is_clear_and_names_the_widest_difference() {
    Finding finding = CrusherFacts.finding(RULE, with(false, 0.0495), "motor");

    assertThat(finding.verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(finding.margin()).hasValueCloseTo(3 * 0.05 / 0.0495, within(1e-9));
    assertThat(CrusherFacts.says(finding))
        .contains("All 2 figures")
        .contains("stator current 218 A against 208 A")
        .contains("A note.");
  }

  @Test
  void beyond_one_tolerance_it_is_tight_beyond_three_a_breach() {
    assertThat(CrusherFacts.finding(RULE, with(false, 0.0505), "stator current").verdict())
        .isEqualTo(Verdict.TIGHT);
    assertThat(CrusherFacts.finding(RULE, with(false, -0.1485), "stator current").verdict())
        .isEqualTo(Verdict.TIGHT);
    Finding breach = CrusherFacts.finding(RULE, with(true, -0.1515), "stator current");
    assertThat(breach.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(CrusherFacts.says(breach)).contains("208 A").contains("less").contains("given");
  }

  @Test
  void a_perfect_fit_has_no_margin_to_print() {
    assertThat(CrusherFacts.finding(RULE, with(false, 0.0), "motor").margin()).isEmpty();
  }

  @Test
  void missing_plate_figures_are_named_where_the_circuit_comes_from_the_plate() {
    List<Finding> findings =
        CrusherFacts.findings(RULE, with(false, 0.0, "  breakdown-torque: 2.8\n", ""));

    assertThat(findings)
        .filteredOn(f -> f.verdict() == Verdict.NOT_JUDGED)
        .extracting(f -> f.missing().get(0))
        .containsExactly("motor.breakdown-torque");
  }

  @Test
  void a_given_circuit_misses_nothing() {
    assertThat(
            CrusherFacts.findings(
                RULE,
                with(
                    true,
                    0.0,
                    "  breakdown-torque: 2.8\n",
                    "  circuit: {r1: 0.030 ohm, x1: 0.183 ohm, xm: 4.795 ohm, r2: 0.0298 ohm,"
                        + " x2: 0.183 ohm, ratio: 1.568}\n")))
        .hasSize(1);
  }

  @Test
  void nothing_to_compare_is_not_judged() {
    Facts facts = CrusherFacts.identified(new Identification(CIRCUIT, true, List.of(), List.of()));

    assertThat(CrusherFacts.finding(RULE, facts, "motor").verdict()).isEqualTo(Verdict.NOT_JUDGED);
  }
}
