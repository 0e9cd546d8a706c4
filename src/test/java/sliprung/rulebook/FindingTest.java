package sliprung.rulebook;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class FindingTest {
  private static Finding finding(Verdict verdict, double margin) {
    return new Finding(
        "trip/start",
        verdict,
        "F2",
        Optional.empty(),
        Optional.empty(),
        OptionalDouble.of(margin),
        OptionalDouble.of(1.10),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        "",
        "",
        "",
        "",
        List.of(),
        "",
        Optional.empty(),
        Optional.empty());
  }

  @ParameterizedTest
  @ValueSource(doubles = {0.0, 0.99, 1.0, 1.0999, Double.NaN})
  void a_clear_verdict_below_the_wanted_margin_is_refused(double margin) {
    assertThatThrownBy(() -> finding(Verdict.CLEAR, margin))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("trip/start F2");
  }

  @ParameterizedTest
  @ValueSource(doubles = {1.10, 2.0, Double.POSITIVE_INFINITY})
  void a_clear_verdict_at_the_wanted_margin_stands(double margin) {
    assertThat(finding(Verdict.CLEAR, margin).verdict()).isEqualTo(Verdict.CLEAR);
  }

  @Test
  void the_worst_verdict_comes_first() {
    assertThat(Verdict.values())
        .containsExactly(
            Verdict.BREACH, Verdict.TIGHT, Verdict.NOT_JUDGED, Verdict.ACCEPTED, Verdict.CLEAR);
  }

  @Test
  void a_rule_may_not_answer_with_no_finding_at_all() {
    assertThatThrownBy(() -> new Rule.Answer.Findings(List.of()))
        .isInstanceOf(IllegalArgumentException.class);
    assertThat(Rule.Answer.of(List.of(), "why")).isEqualTo(new Rule.Answer.NotApplicable("why"));
  }
}
