package sliprung.rulebook.data;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import sliprung.fixture.CrusherFacts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Rule;
import sliprung.rulebook.Verdict;

class PlausibleTest {
  private static final Rule RULE = new TheInputsArePlausible();

  private static List<Finding> odd(String... replacements) {
    return CrusherFacts.findings(RULE, CrusherFacts.bare(replacements)).stream()
        .filter(f -> f.verdict() != Verdict.CLEAR)
        .toList();
  }

  @Test
  void a_sound_file_is_clear_and_says_how_many_checks_were_made() {
    Finding finding = CrusherFacts.finding(RULE, CrusherFacts.bare(), "inputs");

    assertThat(finding.verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(CrusherFacts.says(finding)).matches("\\d\\d checks were made; .*");
  }

  @Test
  void ratings_in_warmer_air_than_theirs_are_not_judged() {
    List<Finding> warm =
        odd("ambient: {motor: 40 °C, panel: 20 °C}", "ambient: {motor: 60 °C, panel: 55 °C}");

    assertThat(warm)
        .extracting(Finding::subject)
        .containsExactly("air at the motor", "air in the panel");
    assertThat(warm).allSatisfy(f -> assertThat(f.verdict()).isEqualTo(Verdict.NOT_JUDGED));
    assertThat(warm.get(0).missing()).containsExactly("ambient.motor");
  }

  @Test
  void wanted_margins_below_one_are_told() {
    String duty = "duty:\n";
    Finding finding =
        CrusherFacts.finding(
            RULE, CrusherFacts.bare(duty, "margins: {locked/step: 0.1}\n" + duty), "margins");

    assertThat(finding.verdict()).isEqualTo(Verdict.TIGHT);
    assertThat(CrusherFacts.says(finding)).contains("locked/step 0.10");
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      quoteCharacter = '"',
      textBlock =
          """
          speed: 1478 rpm                | speed: 1300 rpm                | motor.speed
          speed: 1478 rpm                | speed: 1499 rpm                | motor.speed
          power: 200 kW                  | power: 200 hp                  | motor.power
          rotor-current: 285 A           | rotor-current: 228 A           | motor.rotor-current
          efficiency: 94.5 %             | efficiency: 30 %               | motor.efficiency
          service-factor: 1.0            | service-factor: 1.5            | motor.service-factor
          breakdown-torque: 2.8          | breakdown-torque: 5.8          | motor.breakdown-torque
          hot: 14 s}                     | hot: 24 s}                     | motor.stall-limit
          {current: 600 A, time: 15 s}   | {current: 60 A, time: 15 s}    | resistors.sections[1].short-time
          cooling: 90 min                | cooling: 20 min                | motor.cooling
          heating: 30 min                | heating: 30 s                  | motor.heating
          inertia: 70 kg·m²              | inertia: 700 kg·m²             | load.inertia
          breakaway: 700 N·m             | breakaway: 7000 N·m            | load.breakaway
          100 %: 450 N·m}                | 100 %: 4500 N·m}               | load.torque
          resistance: 0.0930 ohm         | resistance: 0.9300 ohm         | resistors.sections[2]
          resistance: 0.1845 ohm         | resistance: 18.45 ohm          | resistors.sections
          {current: 600 A, time: 15 s}   | {current: 600 A, time: 0.5 s}  | resistors.sections[1].short-time
          {current: 600 A, time: 15 s}   | {current: 600 A, time: 15 min} | resistors.sections[1].short-time
          after: 6 s                     | after: 6 min                   | steps[1]
          rating: 250 A                  | rating: 200 A                  | protection.F1.rating
          dial: 208 A                    | dial: 100 A                    | protection.F2.dial
          dial: 208 A                    | dial: 420 A                    | protection.F2.dial
          time: 15 s, until              | time: 9 s, until               | protection.F5.time
          {AC-2: 315 A, AC-3: 315 A}     | {AC-2: 100 A, AC-3: 100 A}     | contactors.K1.ratings
          closing: 60 ms                 | closing: 60 s                  | contactors.K1.closing
          panel: 20 °C                   | panel: 120 °C                  | ambient.panel
          per-hour: 4                    | per-hour: 4000                 | duty.starts
          """)
  void one_wrong_input_is_a_breach_at_its_path(String old, String changed, String path) {
    List<Finding> odd = odd(old, changed);

    assertThat(odd).extracting(Finding::subject).contains(path);
    assertThat(odd).extracting(Finding::verdict).containsOnly(Verdict.BREACH);
    Finding finding = odd.stream().filter(f -> f.subject().equals(path)).findFirst().orElseThrow();
    assertThat(finding.says()).contains("usual is");
    assertThat(finding.mend()).isNotEmpty();
    assertThat(finding.margin().getAsDouble()).isBetween(0.0, 1.0);
  }

  @Test
  void plate_and_supply_that_differ_are_breaches() {
    assertThat(odd("supply:\n  voltage: 690 V", "supply:\n  voltage: 600 V"))
        .extracting(Finding::subject)
        .containsExactly("supply.voltage");
    assertThat(
            odd(
                "supply:\n  voltage: 690 V\n  frequency: 50 Hz",
                "supply:\n  voltage: 690 V\n  frequency: 60 Hz"))
        .extracting(Finding::subject)
        .containsExactly("supply.frequency");
  }

  @Test
  void a_fault_current_below_the_locked_current_is_a_breach() {
    assertThat(odd("min: 9 kA", "min: 900 A"))
        .extracting(Finding::subject)
        .containsExactly("supply.fault-current.min");
  }

  @Test
  void limits_hold_to_one_per_cent() {
    // slip 0.2 to 10 % of 1500 rpm
    assertThat(odd("speed: 1478 rpm", "speed: " + 1500 * (1 - 0.101) + " rpm"))
        .extracting(Finding::subject)
        .contains("motor.speed");
    assertThat(odd("speed: 1478 rpm", "speed: " + 1500 * (1 - 0.099) + " rpm"))
        .extracting(Finding::subject)
        .doesNotContain("motor.speed");
    // a sequence timer of the sum of the step timers
    assertThat(odd("time: 15 s, until", "time: 10.1 s, until")).isEmpty();
    assertThat(odd("time: 15 s, until", "time: 9.9 s, until")).hasSize(1);
    // dial half of rated current
    assertThat(odd("dial: 208 A", "dial: 103 A")).hasSize(1);
    assertThat(odd("dial: 208 A", "dial: 105 A")).isEmpty();
  }

  @Test
  void a_check_whose_input_is_missing_is_not_counted() {
    String all = CrusherFacts.says(CrusherFacts.finding(RULE, CrusherFacts.bare(), "inputs"));
    String fewer =
        CrusherFacts.says(
            CrusherFacts.finding(RULE, CrusherFacts.bare("  service-factor: 1.0\n", ""), "inputs"));

    assertThat(Integer.parseInt(fewer.split(" ")[0]))
        .isEqualTo(Integer.parseInt(all.split(" ")[0]) - 1);
  }

  @Test
  void bridged_sections_need_not_fall() {
    assertThat(
            odd(
                "cut-out: star-point",
                "cut-out: bridging",
                "resistance: 0.0930 ohm",
                "resistance: 0.1900 ohm"))
        .isEmpty();
  }

  @Test
  void levels_transformers_and_relays_are_checked_too() {
    String f2 = "F2: {kind: overload, class: 10, dial: 208 A, trips: K1}";
    String relay =
        "F2: {kind: inverse-time, curve: iec-very-inverse, pick-up: %s, time-multiplier: 0.25,"
            + " ct: %s, trips: K1}";

    assertThat(odd(f2, String.format(relay, "265 A", "300/5"))).isEmpty();
    assertThat(odd(f2, String.format(relay, "265 A", "3000/5")))
        .extracting(Finding::subject)
        .containsOnly("protection.F2.ct");
    assertThat(odd(f2, String.format(relay, "4.4 A", "300/5")))
        .extracting(Finding::subject)
        .contains("protection.F2.pick-up", "protection.F2.ct");
    assertThat(odd("after: 6 s", "stator-below: 3 A"))
        .extracting(Finding::subject)
        .containsExactly("steps[1]");
    assertThat(odd("after: 6 s", "rotor-frequency-below: 50 Hz"))
        .extracting(Finding::subject)
        .containsExactly("steps[1]");
    assertThat(odd(f2, f2 + "\n  F6: {kind: instantaneous, pick-up: 100 A, trips: Q1}"))
        .extracting(Finding::subject)
        .containsExactly("protection.F6.pick-up");
    assertThat(odd(f2, f2 + "\n  F6: {kind: standstill, time: 300 s, trips: K1}"))
        .extracting(Finding::subject)
        .containsExactly("protection.F6.time");
  }

  /** Data that contradict each other break nothing further on: what rests on them is not judged. */
  @Test
  void a_contradiction_leaves_what_rests_on_it_not_judged() {
    for (String[] edit :
        List.of(
            new String[] {"hot: 14 s}", "hot: 24 s}"},
            new String[] {"{current: 600 A, time: 15 s}", "{current: 60 A, time: 15 s}"},
            new String[] {"{current: 600 A, time: 15 s}", "{current: 130 A, time: 15 s}"})) {
      sliprung.review.Review review =
          sliprung.review.Reviewer.review(
              CrusherFacts.starter(edit), java.time.LocalDate.of(2026, 12, 1));

      assertThat(review.findings())
          .anyMatch(f -> f.rule().equals("data/plausible") && f.verdict() == Verdict.BREACH)
          .anyMatch(f -> f.rule().equals("held/exposure") && f.verdict() == Verdict.NOT_JUDGED);
      assertThat(review.exitStatus()).isNotZero();
    }
  }
}
