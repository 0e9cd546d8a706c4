package sliprung.rulebook.sequence;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import sliprung.fixture.Judged;
import sliprung.fixture.StarterText;
import sliprung.machine.Machine;
import sliprung.machine.Source;
import sliprung.quantity.Show;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Verdict;
import sliprung.runup.Outcome;
import sliprung.runup.Stage;

/** {@code sequence/pull-through} and {@code sequence/false-close}. */
class PullThroughTest {
  private static final String THROUGH = "sequence/pull-through";
  private static final String FALSE_CLOSE = "sequence/false-close";
  private static final StarterText SMALL = StarterText.small();

  private static StarterText level(String rule, double level, String unit) {
    return SMALL.with(
        "{contactor: K11, after: 4 s}",
        StarterText.text("{contactor: K11, " + rule + ": %s " + unit + "}", level));
  }

  private static StarterText constantLoad(double torque) {
    return SMALL
        .line("torque: {0", StarterText.text("torque: {constant: %s N·m}", torque))
        .line("breakaway:", StarterText.text("breakaway: %s N·m", torque));
  }

  private static double settledOnStepOne(java.util.function.ToDoubleFunction<Stage> what) {
    var stages = SMALL.review().start("held-1").orElseThrow().history().stages();
    return what.applyAsDouble(stages.get(stages.size() - 1));
  }

  @Test
  void a_start_that_runs_names_how_long_the_slowest_takes() {
    Finding finding = SMALL.finding(THROUGH, "start");

    assertThat(finding.verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(finding.value().orElseThrow()).isCloseTo(6.39, within(0.01));
  }

  /** Less than the breakdown torque, which is the same on every step, is not always enough. */
  @Test
  void a_constant_load_hangs_above_what_the_steps_pull_through() {
    Machine machine = SMALL.review().machine();
    Source source = new Source(400.0, 0.0);
    Judged load = Judged.over(THROUGH, "start", PullThroughTest::constantLoad);
    double limit = load.limit(1000.0, 300.0);

    assertThat(limit).isGreaterThan(400.0).isLessThan(machine.breakdownTorque(source));
    load.turns(limit, Verdict.CLEAR, Verdict.BREACH);
  }

  @Test
  void a_load_that_no_step_breaks_loose_is_a_breach_that_says_so() {
    double atRest = SMALL.review().machine().torque(new Source(400.0, 0.0), 0.25, 1.0);
    Finding stands = constantLoad(1.01 * atRest).finding(THROUGH, "start");

    assertThat(stands.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(stands.start().orElseThrow().history().outcome()).isEqualTo(Outcome.LOCKED);
    assertThat(stands.says()).contains(Show.rpm(0.0));
  }

  /** The load rises above what the shorted motor gives at speed. */
  @Test
  void a_load_that_rises_beyond_the_motor_ends_held_at_a_speed() {
    Machine machine = SMALL.review().machine();
    double breakdown = machine.breakdownTorque(new Source(400.0, 0.0));
    Judged rising =
        Judged.over(
            THROUGH,
            "start",
            torque ->
                SMALL.line(
                    "torque: {0",
                    StarterText.text(
                        "torque: {0 %%: 80 N·m, 60 %%: 80 N·m, 80 %%: %s N·m}", torque)));

    assertThat(rising.verdict(0.9 * breakdown)).isEqualTo(Verdict.CLEAR);
    Finding hangs = rising.at(1.1 * breakdown);
    assertThat(hangs.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(hangs.says()).contains("hangs on step 3").contains("rpm");
  }

  /** The level is met just above what the motor settles at; the start runs from there on. */
  @ParameterizedTest
  @CsvSource({"rotor-below", "stator-below", "rotor-frequency-below"})
  void a_level_is_held_against_what_the_motor_settles_at(String rule) {
    double settled =
        settledOnStepOne(
            s ->
                switch (rule) {
                  case "rotor-below" -> s.trace().ringAmps()[s.trace().last()];
                  case "stator-below" -> s.trace().statorAmps()[s.trace().last()];
                  default -> 50.0 - s.trace().speed()[s.trace().last()] / Math.PI;
                });
    String unit = rule.contains("frequency") ? "Hz" : "A";

    Judged.over(THROUGH, "step 1", x -> level(rule, x, unit))
        .turns(settled, Verdict.BREACH, Verdict.TIGHT)
        .turns(1.10 * settled, Verdict.TIGHT, Verdict.CLEAR);
    Judged.over(THROUGH, "start", x -> level(rule, x, unit))
        .turns(settled, Verdict.BREACH, Verdict.CLEAR);
    assertThat(level(rule, 0.99 * settled, unit).finding(THROUGH, "start").says())
        .contains("step contactor 1")
        .contains("never reached");
  }

  /** Low levels, light volts: what is met at nominal values is missed at a corner. */
  @Test
  void the_spread_of_the_level_counts() {
    double settled = settledOnStepOne(s -> s.trace().ringAmps()[s.trace().last()]);
    StarterText at = level("rotor-below", 1.2 * settled, "A");
    StarterText spread = at.with("level-spread: 0 %", "level-spread: 20 %");

    assertThat(at.finding(THROUGH, "start").verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(spread.finding(THROUGH, "start").verdict()).isEqualTo(Verdict.BREACH);
    assertThat(spread.finding(THROUGH, "step 1").margin().orElseThrow())
        .isCloseTo(1.2 * 0.8, within(1e-6));
  }

  @ParameterizedTest
  @CsvSource({"rotor-below", "stator-below"})
  void a_level_is_not_met_by_the_current_of_a_standing_rotor(String rule) {
    Stage stage = SMALL.review().start("locked-1").orElseThrow().history().stages().get(0);
    double standing =
        rule.startsWith("rotor") ? stage.trace().ringAmps()[0] : stage.trace().statorAmps()[0];

    Judged.over(FALSE_CLOSE, "step 1", x -> level(rule, x, "A"))
        .turns(standing / 1.10, Verdict.CLEAR, Verdict.TIGHT)
        .turns(standing, Verdict.TIGHT, Verdict.BREACH);
  }

  /** A step behind one that a standing rotor never leaves is asked all the same. */
  @Test
  void a_later_step_is_asked_with_the_circuit_it_would_have() {
    StarterText both =
        level("rotor-below", 70.0, "A")
            .with("{contactor: K12, after: 2 s}", "{contactor: K12, rotor-below: 70 A}");
    Finding second = both.finding(FALSE_CLOSE, "step 2");
    Stage standing = SMALL.review().start("locked-2").orElseThrow().history().stages().get(1);

    assertThat(second.value().orElseThrow())
        .isCloseTo(standing.trace().ringAmps()[0], within(1e-9));
    assertThat(both.review().start("locked").orElseThrow().history().stages()).hasSize(1);
  }

  @Test
  void high_levels_and_low_volts_decide() {
    StarterText spread =
        level("rotor-below", 70.0, "A")
            .with("level-spread: 0 %", "level-spread: 10 %")
            .with("band: [0 %, 0 %]", "band: [-10 %, +10 %]");
    Finding finding = spread.finding(FALSE_CLOSE, "step 1");

    assertThat(finding.limit().orElseThrow()).isCloseTo(77.0, within(1e-9));
    assertThat(finding.start().orElseThrow().corner().supplyPu()).isEqualTo(0.9);
  }

  @Test
  void times_and_frequencies_are_no_current_levels() {
    assertThat(SMALL.review().notApplicable()).anyMatch(n -> n.rule().equals(FALSE_CLOSE));
    assertThat(level("rotor-frequency-below", 20.0, "Hz").review().notApplicable())
        .anyMatch(n -> n.rule().equals(FALSE_CLOSE));
  }
}
