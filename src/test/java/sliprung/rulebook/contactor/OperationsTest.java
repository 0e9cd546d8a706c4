package sliprung.rulebook.contactor;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import sliprung.fixture.CrusherFacts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Rule;
import sliprung.rulebook.Verdict;

class OperationsTest {
  private static final Rule RULE = new EveryContactorIsRatedForItsOperations();
  private static final String END = "opening: 60 ms}";

  private static Finding judge(String tag, String... replacements) {
    return CrusherFacts.finding(RULE, CrusherFacts.bare(replacements), tag);
  }

  private static Finding declared(String tag, double cycles, String... more) {
    String[] all = new String[more.length + 2];
    all[0] = END;
    all[1] = "opening: 60 ms, intermittent-class: " + cycles + "}";
    System.arraycopy(more, 0, all, 2, more.length);
    return judge(tag, all);
  }

  @Test
  void one_per_cent_about_the_declared_cycles_turns_the_verdict() {
    assertThat(declared("K1", 4.04).verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(declared("K1", 3.96).verdict()).isEqualTo(Verdict.BREACH);
    assertThat(CrusherFacts.mend(declared("K1", 3.96))).contains("class 12");
  }

  @Test
  void inching_operates_the_line_and_the_contactors_before_its_step() {
    String[] second = {"inching: none", "inching: {per-hour: 60, step: 2}"};

    assertThat(declared("K1", 120, second).value()).hasValueCloseTo(64.0, within(0.0));
    assertThat(declared("K11", 120, second).value()).hasValueCloseTo(64.0, within(0.0));
    assertThat(declared("K12", 120, second).value()).hasValueCloseTo(4.0, within(0.0));
  }

  @Test
  void plugging_counts_too() {
    assertThat(declared("K1", 120, "plugging: none", "plugging: {per-hour: 10, step: 1}").value())
        .hasValueCloseTo(14.0, within(0.0));
  }

  @Test
  void without_a_declared_class_the_preferred_one_is_named() {
    Finding finding = judge("K1");

    assertThat(finding.verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(finding.missing()).containsExactly("contactors.K1.intermittent-class");
    assertThat(CrusherFacts.says(finding)).contains("asks class 12;");
  }

  @Test
  void without_the_starts_an_hour_nothing_is_judged() {
    assertThat(declared("K1", 120, ", per-hour: 4", "").missing())
        .containsExactly("duty.starts.per-hour");
  }

  @Test
  void without_contactors_it_is_not_applicable() {
    assertThat(RULE.judge(CrusherFacts.withContactors(c -> false)))
        .isInstanceOf(Rule.Answer.NotApplicable.class);
  }
}
