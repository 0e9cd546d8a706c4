package sliprung.rulebook.data;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import sliprung.fixture.CrusherFacts;
import sliprung.protection.DeviceResponse;
import sliprung.protection.Edge;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Rule;
import sliprung.rulebook.Verdict;

class ExtrapolatedTest {
  private static final Rule RULE = new EveryCurveReachesFarEnough();
  private static final String FUSE = "  F1: {kind: fuse, class: gG, rating: 250 A}\n";
  private static final String OUTSIDE = "outside the curve's points: current above the last point";

  private static DeviceResponse bound(Edge edge) {
    return new DeviceResponse(
        "F1",
        edge,
        1.2,
        1.2,
        9.0,
        9.0,
        Optional.empty(),
        Optional.of("below its first gate"),
        Optional.empty());
  }

  /** The facts with other device responses in the starts that fit. */
  private static Facts with(boolean inFaults, DeviceResponse response, String... replacements) {
    Facts facts = CrusherFacts.of(replacements);
    List<ComputedStart> starts =
        facts.starts().stream()
            .map(
                s ->
                    s.scenario().isFault() == inFaults
                        ? new ComputedStart(
                            s.scenario(),
                            s.from(),
                            s.place(),
                            s.corner(),
                            s.history(),
                            List.of(response),
                            s.parts())
                        : s)
            .toList();
    return new Facts(
        facts.starter(),
        facts.practice(),
        facts.machine(),
        facts.identification(),
        starts,
        facts.running(),
        facts.fastPickUps(),
        facts.bands());
  }

  private static Finding judge(Facts facts) {
    return CrusherFacts.finding(RULE, facts, "F1");
  }

  @Test
  void a_curve_that_reaches_far_enough_is_clear() {
    assertThat(judge(CrusherFacts.of()).verdict()).isEqualTo(Verdict.CLEAR);
  }

  @Test
  void a_current_outside_the_points_is_not_judged_and_names_the_start() {
    Finding finding = judge(with(true, DeviceResponse.notJudged("F1", Edge.SLOW, OUTSIDE)));

    assertThat(finding.verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(finding.missing()).containsExactly("protection.F1");
    assertThat(finding.start()).isPresent();
    assertThat(finding.says()).contains("current above the last point").contains("slow edge");
  }

  @Test
  void an_operation_by_a_bound_alone_is_not_judged_in_a_permitted_start() {
    assertThat(judge(with(false, bound(Edge.FAST))).verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(judge(with(true, bound(Edge.FAST))).verdict()).isEqualTo(Verdict.CLEAR);
  }

  @Test
  void the_middle_of_a_band_is_not_asked() {
    assertThat(judge(with(true, DeviceResponse.notJudged("F1", Edge.MIDDLE, OUTSIDE))).verdict())
        .isEqualTo(Verdict.CLEAR);
  }

  @Test
  void another_reason_for_not_judging_is_not_this_rules() {
    assertThat(
            judge(with(true, DeviceResponse.notJudged("F1", Edge.FAST, "no shortest time")))
                .verdict())
        .isEqualTo(Verdict.CLEAR);
  }

  @Test
  void without_points_or_gates_it_is_not_applicable() {
    assertThat(RULE.judge(CrusherFacts.of(FUSE, ""))).isInstanceOf(Rule.Answer.NotApplicable.class);
  }
}
