package sliprung.rulebook.locked;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import sliprung.fixture.Judged;
import sliprung.fixture.StarterText;
import sliprung.machine.Machine;
import sliprung.machine.Source;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Verdict;
import sliprung.starter.Starter;
import sliprung.tolerance.Corner;

/** {@code locked/breakaway}. */
class BreakawayTest {
  private static final String RULE = "locked/breakaway";
  private static final StarterText SMALL = StarterText.small();

  private static StarterText breakaway(double torque) {
    return SMALL.line("breakaway:", StarterText.text("breakaway: %s N·m", torque));
  }

  @Test
  void the_torque_of_step_one_at_rest_is_the_limit() {
    Machine machine = SMALL.review().machine();
    double torque = machine.torque(new Source(400.0, 0.0), 0.85, 1.0);

    Judged.over(RULE, "step 1", BreakawayTest::breakaway)
        .turns(torque / 1.10, Verdict.CLEAR, Verdict.TIGHT)
        .turns(torque, Verdict.TIGHT, Verdict.BREACH);
    assertThat(SMALL.finding(RULE, "step 1").value().orElseThrow())
        .isCloseTo(torque, within(1e-9 * torque));
  }

  /** Least voltage behind the source, highest tolerance and hot, heavy load. */
  @Test
  void it_is_taken_at_low_volts_dip_heavy_load_and_a_hot_bank() {
    StarterText crusher = StarterText.crusher();
    Starter starter = crusher.starter();
    Finding finding = crusher.finding(RULE, "step 1");
    Corner corner = finding.start().orElseThrow().corner();
    assertThat(corner.supplyPu()).isEqualTo(0.9);
    assertThat(corner.load()).isEqualTo(Corner.LoadSide.HEAVY);
    assertThat(corner.bank()).isEqualTo(Corner.Bank.HOT);

    double ohms =
        starter.resistors().sections().stream().mapToDouble(s -> s.ohms()).sum() * 1.1 * 1.2;
    Source source = new Source(0.9 * 690.0, 690.0 / Math.sqrt(3.0) / 9000.0);
    double torque = crusher.review().machine().torque(source, ohms, 1.0);
    assertThat(finding.margin().orElseThrow()).isCloseTo(torque / (700.0 * 1.2), within(1e-9));
  }

  @Test
  void a_weak_source_takes_torque_away() {
    StarterText weak = SMALL.under("supply:", "  fault-current: {max: 10 kA, min: 3 kA}");

    assertThat(weak.finding(RULE, "step 1").value().orElseThrow())
        .isLessThan(0.99 * SMALL.finding(RULE, "step 1").value().orElseThrow());
  }

  /** 80 N·m at rest; what is not given is that. */
  @Test
  void without_a_breakaway_torque_the_torque_at_rest_is_needed() {
    assertThat(SMALL.without("breakaway:").finding(RULE, "step 1").limit().orElseThrow())
        .isEqualTo(80.0);
  }

  @Test
  void a_breakaway_torque_below_the_torque_at_rest_helps_nothing() {
    assertThat(breakaway(10.0).finding(RULE, "step 1").limit().orElseThrow()).isEqualTo(80.0);
  }

  @Test
  void a_load_without_torque_at_rest_is_no_subject() {
    StarterText fan = SMALL.without("breakaway:").line("torque: {0", "torque: {square: 250 N·m}");

    assertThat(fan.review().notApplicable()).anyMatch(n -> n.rule().equals(RULE));
  }
}
