package sliprung.dial;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Map;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import sliprung.dial.Judgement.Question;
import sliprung.starter.DialScale;
import sliprung.starter.Starter;

/** Proposals against known functions of two dials. */
class ProposalSearchTest {

  private static double to(Proposal proposal, String path) {
    return proposal.changes().stream()
        .filter(c -> c.dial().path().equals(path))
        .mapToDouble(Proposal.Change::to)
        .findFirst()
        .orElse(2.0);
  }

  private static Proposal of(Synthetic rules, Starter starter) {
    return ProposalSearch.of(starter, rules::at);
  }

  @Test
  void should_lift_the_thinnest_margin_by_turning_both_dials_together() {
    // three margins that are equal, 1.5^(1/3) of each limit, at x = y: no dial alone gets there
    Synthetic rules =
        new Synthetic()
            .rule("product", (x, y) -> x * y / 8.0)
            .rule("x", (x, y) -> 4.0 / x)
            .rule("y", (x, y) -> 4.0 / y);

    Proposal proposal = of(rules, Synthetic.STARTER);

    double x = to(proposal, "steps.K11.after");
    double y = to(proposal, "steps.K12.after");
    double best = Math.cbrt(2.0);
    assertThat(Math.min(x * y / 8.0, Math.min(4.0 / x, 4.0 / y))).isCloseTo(best, within(0.006));
    assertThat(proposal.evaluations()).isLessThan(80);
    assertThat(proposal.moved()).contains(new Question("test/product", "it"));
  }

  @Test
  void should_set_what_the_real_dials_can_be_set_to() {
    DialScale coarse =
        new DialScale(OptionalDouble.of(0.5), OptionalDouble.of(6.0), OptionalDouble.of(0.5), 0.0);
    Starter stepped = withScales(Map.of("steps.K11.after", coarse, "steps.K12.after", coarse));
    Synthetic rules =
        new Synthetic()
            .rule("product", (x, y) -> x * y / 8.0)
            .rule("x", (x, y) -> 4.0 / x)
            .rule("y", (x, y) -> 4.0 / y);

    Proposal proposal = of(rules, stepped);

    double x = to(proposal, "steps.K11.after");
    double y = to(proposal, "steps.K12.after");
    assertThat(2.0 * x).isEqualTo(Math.rint(2.0 * x));
    assertThat(2.0 * y).isEqualTo(Math.rint(2.0 * y));
    assertThat(x * y).isGreaterThanOrEqualTo(8.0);
    assertThat(Math.max(x, y)).isLessThanOrEqualTo(4.0);
  }

  @Test
  void should_leave_alone_what_gains_nothing() {
    Synthetic rules = new Synthetic().rule("x", (x, y) -> 3.0 / x).rule("low", (x, y) -> x / 1.0);

    Proposal proposal = of(rules, Synthetic.STARTER);

    assertThat(to(proposal, "steps.K12.after")).isEqualTo(2.0);
    assertThat(to(proposal, "steps.K11.after")).isCloseTo(Math.sqrt(3.0), within(0.02));
  }

  @Test
  void should_let_settings_stand_that_it_cannot_better() {
    Synthetic rules =
        new Synthetic().rule("x", (x, y) -> 2.4 / x).rule("low", (x, y) -> x / (2.0 / 1.2));

    Proposal proposal = of(rules, Synthetic.STARTER);

    assertThat(proposal.changes()).isEmpty();
    assertThat(proposal.proposed()).isEqualTo(Synthetic.STARTER);
    assertThat(proposal.moved()).isEmpty();
  }

  @Test
  void should_never_trade_a_margin_for_a_verdict() {
    // a longer x thickens the thin margin but makes another rule blind
    Synthetic rules =
        new Synthetic()
            .rule("thin", (x, y) -> 0.52 * x)
            .rule("blind", (x, y) -> x > 2.2 ? Double.NaN : 2.0);

    Proposal proposal = of(rules, Synthetic.STARTER);

    assertThat(to(proposal, "steps.K11.after")).isBetween(2.0, 2.2);
    assertThat(proposal.after().answers().get(new Question("test/blind", "it")).isJudged())
        .isTrue();
  }

  @Test
  void should_say_what_breaks_within_the_error_of_a_dial() {
    DialScale inexact =
        new DialScale(OptionalDouble.of(0.5), OptionalDouble.of(8.0), OptionalDouble.empty(), 0.1);
    Synthetic narrow = new Synthetic().rule("x", (x, y) -> 2.4 / x).rule("low", (x, y) -> x / 1.7);

    Proposal proposal = of(narrow, withScales(Map.of("steps.K11.after", inexact)));

    assertThat(proposal.inexact())
        .contains(new Question("test/x", "it"), new Question("test/low", "it"));
  }

  private static Starter withScales(Map<String, DialScale> scales) {
    Starter s = Synthetic.STARTER;
    return new Starter(
        s.name(),
        s.practice(),
        s.supply(),
        s.motor(),
        s.load(),
        s.resistors(),
        s.steps(),
        s.sequence(),
        s.timerSpread(),
        s.levelSpread(),
        s.contactors(),
        s.breakers(),
        s.protection(),
        s.statorConductor(),
        s.rotorConductor(),
        s.duty(),
        s.limits(),
        s.margins(),
        s.fuseWear(),
        s.interlocks(),
        s.ambient(),
        s.evidence(),
        s.accepted(),
        s.assumptions(),
        s.notYetJudged(),
        s.method(),
        scales,
        s.distributions(),
        s.readings());
  }
}
