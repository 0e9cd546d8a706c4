package sliprung.rulebook.contactor;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import sliprung.fixture.CrusherFacts;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Rule;
import sliprung.rulebook.Verdict;
import sliprung.starter.Contactor;
import sliprung.starter.Starter;

class RotorVoltageTest {
  private static final Rule RULE = new TheRotorVoltageFitsTheStepContactors();
  private static final String VOLTS = "rated-voltage: 690 V";

  private static Finding judge(String... replacements) {
    return CrusherFacts.finding(RULE, CrusherFacts.of(replacements), "K11");
  }

  private static double open() {
    return StepContactors.greatestRingVolts(CrusherFacts.of());
  }

  @Test
  void the_open_rings_have_about_the_plates_voltage_less_the_dip() {
    assertThat(open()).isBetween(415.0, 425.0);
    assertThat(judge().value()).hasValueCloseTo(open(), within(1e-9));
    assertThat(judge().verdict()).isEqualTo(Verdict.CLEAR);
  }

  @Test
  void one_per_cent_about_the_ring_voltage_turns_clear_to_tight() {
    assertThat(judge(VOLTS, "rated-voltage: " + open() * 1.01 + " V").verdict())
        .isEqualTo(Verdict.CLEAR);
    assertThat(judge(VOLTS, "rated-voltage: " + open() * 0.99 + " V").verdict())
        .isEqualTo(Verdict.TIGHT);
  }

  @Test
  void one_per_cent_about_half_of_it_turns_tight_to_a_breach() {
    assertThat(judge(VOLTS, "rated-voltage: " + open() / 2 * 1.01 + " V").verdict())
        .isEqualTo(Verdict.TIGHT);
    assertThat(judge(VOLTS, "rated-voltage: " + open() / 2 * 0.99 + " V").verdict())
        .isEqualTo(Verdict.BREACH);
  }

  @Test
  void plugging_doubles_it() {
    Finding plugged = judge("plugging: none", "plugging: {per-hour: 5, step: 1}");

    assertThat(plugged.value()).hasValueCloseTo(2 * open(), within(1e-9));
    assertThat(plugged.verdict()).isEqualTo(Verdict.TIGHT);
  }

  @Test
  void the_sections_voltage_at_closing_is_told() {
    Facts facts = CrusherFacts.of();
    var before = facts.starts().get(0).history().stages().get(0).trace();
    double volts = Math.sqrt(3) * before.ringAmps()[before.last()] * 0.1845;

    assertThat(CrusherFacts.says(CrusherFacts.finding(RULE, facts, "K11")))
        .contains("closes on " + sliprung.quantity.Show.three(volts) + " V across a pole");
  }

  @Test
  void a_pole_in_star_sees_the_phase_and_a_branch_of_a_delta_itself() {
    Starter star = CrusherFacts.starter();
    Contactor delta = star.contactor("K11").orElseThrow();
    Starter bank =
        CrusherFacts.starter(
            "connection: star", "connection: delta", "cut-out: star-point", "cut-out: bridging");
    Contactor poles = CrusherFacts.starter("poles: delta", "poles: star").contactor("K11").get();

    assertThat(TheRotorVoltageFitsTheStepContactors.poleVolts(star, delta, 100, 0.5))
        .isCloseTo(86.6, within(0.01));
    assertThat(TheRotorVoltageFitsTheStepContactors.poleVolts(star, poles, 100, 0.5)).isEqualTo(50);
    assertThat(TheRotorVoltageFitsTheStepContactors.poleVolts(bank, delta, 100, 0.5))
        .isCloseTo(28.87, within(0.01));
  }

  @Test
  void missing_inputs_are_named() {
    Finding finding = judge(VOLTS + ", ", "");

    assertThat(finding.missing()).containsExactly("contactors.K11.rated-voltage");
    assertThat(finding.verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(CrusherFacts.finding(RULE, CrusherFacts.bare(), "K11").verdict())
        .isEqualTo(Verdict.NOT_JUDGED);
  }

  @Test
  void without_step_contactors_it_is_not_applicable() {
    assertThat(RULE.judge(CrusherFacts.withContactors(c -> c.tag().equals("K1"))))
        .isInstanceOf(Rule.Answer.NotApplicable.class);
  }
}
