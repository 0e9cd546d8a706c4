package sliprung.sensitivity;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Locale;
import org.junit.jupiter.api.Test;
import sliprung.fixture.StarterText;
import sliprung.machine.NameplateIdentification;
import sliprung.machine.Source;
import sliprung.review.Reviewer;
import sliprung.rulebook.Finding;
import sliprung.runup.Conditions;
import sliprung.runup.Scenario;
import sliprung.runup.StartHistory;
import sliprung.runup.StartSimulator;
import sliprung.sensitivity.Narrowed.Span;
import sliprung.starter.Starter;

class StartReadingsTest {
  private static final StarterText DESCRIBED =
      StarterText.small().plus("evidence: {load.inertia: estimated}");

  /** What is really there: fifteen per cent more inertia than described. */
  private static final Starter REAL =
      StarterText.small().with("\n  inertia: 8 kg·m²", "\n  inertia: 9.2 kg·m²").starter();

  private static final Conditions THERE =
      new Conditions(new Source(400.0, 0.0), 1.0, 1.0, 1.0, 1.0);

  private static StartSimulator simulator() {
    return new StartSimulator(
        REAL, Reviewer.machine(REAL, NameplateIdentification.identify(REAL.motor()).get(0)));
  }

  private static double ampsBefore(StartHistory start, int stage) {
    var trace = start.stages().get(stage - 1).trace();
    return trace.statorAmps()[trace.last()];
  }

  private static StarterText read(String readings) {
    return DESCRIBED.plus("readings: {" + readings + "}");
  }

  private static StarterText readAsItIs() {
    StartHistory start = simulator().run(Scenario.PERMITTED, THERE);
    double running = simulator().runningPoint(THERE).orElseThrow().point().statorAmps();
    return read(
        String.format(
            Locale.ROOT,
            "run-up: %.4f s, running-current: %.4f A, current-before: {K11: %.4f A, K12: %.4f A},"
                + " clamp: 2 %%",
            start.runUpSeconds().orElseThrow(),
            running,
            ampsBefore(start, 1),
            ampsBefore(start, 2)));
  }

  private static Narrowed of(List<Narrowed> all, LoadValue value) {
    return all.stream().filter(n -> n.value() == value).findFirst().orElseThrow();
  }

  @Test
  void readings_of_a_known_start_leave_its_inertia_and_its_load() {
    List<Narrowed> all = StartReadings.of(readAsItIs().starter());

    Span inertia = of(all, LoadValue.INERTIA).left().orElseThrow();
    assertThat(of(all, LoadValue.INERTIA).before()).isEqualTo(new Span(0.75, 1.25));
    assertThat(1.15).isBetween(inertia.low(), inertia.high());
    assertThat(inertia.low()).isGreaterThan(1.0);
    assertThat(inertia.high()).isLessThan(1.25);
    assertThat(1.0)
        .isBetween(
            of(all, LoadValue.TORQUE).left().orElseThrow().low(),
            of(all, LoadValue.TORQUE).left().orElseThrow().high());
    Span running = of(all, LoadValue.RUNNING).left().orElseThrow();
    assertThat(1.0).isBetween(running.low(), running.high());
    assertThat(running.high() - running.low()).isLessThan(0.1);
  }

  @Test
  void sharper_readings_leave_less_and_never_the_true_value_out() {
    StarterText sharp = readAsItIs();
    StarterText blunt = sharp.with("clamp: 2 %}", "clamp: 6 %}");

    Span few = of(StartReadings.of(sharp.starter()), LoadValue.INERTIA).left().orElseThrow();
    Span many = of(StartReadings.of(blunt.starter()), LoadValue.INERTIA).left().orElseThrow();
    assertThat(many.low()).isLessThanOrEqualTo(few.low());
    assertThat(many.high()).isGreaterThanOrEqualTo(few.high());
    assertThat(many.high() - many.low()).isGreaterThan(few.high() - few.low());
  }

  @Test
  void what_they_leave_is_the_spread_of_what_to_measure_first() {
    StarterText text = readAsItIs();
    List<Narrowed> all = StartReadings.of(text.starter());
    UncertainInput inertia =
        UncertainInputs.of(text.starter(), all).stream()
            .filter(i -> i.path().equals("load.inertia"))
            .findFirst()
            .orElseThrow();

    Span left = of(all, LoadValue.INERTIA).left().orElseThrow();
    assertThat(new Span(inertia.low(), inertia.high())).isEqualTo(left);
    assertThat(MeasureFirst.of(text.review()).readings().get(0))
        .startsWith("The readings leave the load's inertia between ")
        .endsWith("\u00a0kg·m²; before 6 to 10.");
  }

  @Test
  void no_verdict_rests_on_them() {
    assertThat(readAsItIs().review().findings().stream().map(StartReadingsTest::answer).toList())
        .isEqualTo(DESCRIBED.review().findings().stream().map(StartReadingsTest::answer).toList());
  }

  private static String answer(Finding f) {
    return f.rule() + f.subject() + f.verdict() + f.margin() + f.says();
  }

  @Test
  void readings_that_nothing_explains_are_told_and_narrow_nothing() {
    StarterText slow = read("run-up: 40 s, running-current: 400 A");
    List<Narrowed> all = StartReadings.of(slow.starter());

    assertThat(all).hasSize(3).allSatisfy(n -> assertThat(n.left()).isEmpty());
    assertThat(StartReadings.says(slow.starter(), all))
        .hasSize(2)
        .anySatisfy(s -> assertThat(s).startsWith("No inertia and load within their spreads"))
        .anySatisfy(s -> assertThat(s).startsWith("No running torque"));
    assertThat(UncertainInputs.of(slow.starter(), all))
        .extracting(UncertainInput::low)
        .isEqualTo(UncertainInputs.of(slow.starter()).stream().map(UncertainInput::low).toList());
  }

  @Test
  void readings_that_contradict_one_another_are_told() {
    String asItIs = readAsItIs().yaml();
    String before = asItIs.substring(asItIs.indexOf("K11: ", asItIs.indexOf("readings:")));
    StarterText wrong =
        new StarterText(asItIs.replace(before.substring(0, before.indexOf(',')), "K11: 300 A"));

    assertThat(of(StartReadings.of(wrong.starter()), LoadValue.INERTIA).left()).isEmpty();
  }

  @Test
  void timers_may_have_been_anywhere_in_their_spread() {
    StarterText sharp = readAsItIs();
    StarterText spread = sharp.line("timer-spread:", "timer-spread: 5 %");

    Span few = of(StartReadings.of(sharp.starter()), LoadValue.INERTIA).left().orElseThrow();
    Span many = of(StartReadings.of(spread.starter()), LoadValue.INERTIA).left().orElseThrow();
    assertThat(many.low()).isLessThan(few.low());
    assertThat(many.high()).isGreaterThan(few.high());
  }

  @Test
  void a_load_that_differs_between_starts_leaves_more() {
    StarterText differs = readAsItIs().line("spread:", "spread: [-20 %, +20 %]");
    Narrowed torque = of(StartReadings.of(differs.starter()), LoadValue.TORQUE);

    assertThat(torque.before().low()).isLessThan(0.77);
    Narrowed running = of(StartReadings.of(differs.starter()), LoadValue.RUNNING);
    Span there = running.left().orElseThrow();
    assertThat(running.described())
        .hasValueSatisfying(
            d -> {
              assertThat(d.low()).isEqualTo(there.low() / 1.2);
              assertThat(d.high()).isEqualTo(there.high() / 0.8);
            });
    assertThat(
            of(StartReadings.of(differs.starter()), LoadValue.INERTIA).left().orElseThrow().high())
        .isGreaterThan(
            of(StartReadings.of(readAsItIs().starter()), LoadValue.INERTIA)
                .left()
                .orElseThrow()
                .high());
  }
}
