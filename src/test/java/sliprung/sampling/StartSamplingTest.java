package sliprung.sampling;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.apache.commons.math3.random.Well19937c;
import org.apache.commons.math3.stat.descriptive.SummaryStatistics;
import org.junit.jupiter.api.Test;
import sliprung.fixture.StarterText;
import sliprung.machine.Machine;
import sliprung.machine.NameplateIdentification;
import sliprung.protection.Edge;
import sliprung.review.Reviewer;
import sliprung.rulebook.ComputedStart;
import sliprung.runup.Conditions;
import sliprung.runup.Scenario;
import sliprung.runup.StartSimulator;
import sliprung.starter.Distribution;
import sliprung.starter.Starter;
import sliprung.starter.Varying;
import sliprung.tolerance.Corner;

class StartSamplingTest {
  private static final StarterText CRUSHER = StarterText.crusher();

  private static List<Machine> machines(Starter starter) {
    return NameplateIdentification.identify(starter.motor()).stream()
        .map(i -> Reviewer.machine(starter, i))
        .toList();
  }

  private static Sampled sample(StarterText text, int starts, long seed) {
    Starter starter = text.starter();
    return StartSampling.of(starter, machines(starter), starts, seed);
  }

  private static Sampled.Quantity quantity(Sampled sampled, String name) {
    return sampled.quantities().stream()
        .filter(q -> q.name().equals(name))
        .findFirst()
        .orElseThrow();
  }

  @Test
  void the_same_seed_gives_the_same_figures_and_another_seed_others() {
    Sampled one = sample(CRUSHER, 300, 7);
    assertThat(sample(CRUSHER, 300, 7)).isEqualTo(one);
    assertThat(sample(CRUSHER, 300, 8)).isNotEqualTo(one);
  }

  @Test
  void without_any_spread_every_sample_is_the_nominal_start() {
    StarterText text = StarterText.small().under("starter:", "evidence: {load.inertia: measured}");
    Starter starter = text.starter();
    StartSimulator simulator = new StartSimulator(starter, machines(starter).get(0));
    Conditions nominal = sliprung.tolerance.Corners.conditions(starter, Corner.NOMINAL);
    double runUp = simulator.run(Scenario.PERMITTED, nominal).runUpSeconds().getAsDouble();
    Sampled.Quantity sampled = quantity(sample(text, 200, 1), "run-up time");
    // the inertia alone is open, by the 2 % of a measured one
    assertThat(sampled.percentiles().get(2)).isCloseTo(runUp, within(0.004 * runUp));
    assertThat(sampled.percentiles().get(4)).isLessThan(1.021 * runUp);
    assertThat(sampled.percentiles().get(0)).isGreaterThan(0.979 * runUp);
  }

  @Test
  void no_sampled_use_is_worse_than_the_worst_that_a_review_judges() {
    StarterText known = CRUSHER.with("load.inertia: estimated", "load.inertia: measured");
    Sampled sampled = sample(known, 1500, 3);
    for (String tag : List.of("F2", "F3", "F5")) {
      double judged =
          known.review().starts().stream()
              .filter(s -> !s.scenario().isFault() && s.from() == ComputedStart.From.HOT)
              .mapToDouble(s -> s.device(tag, Edge.FAST).orElseThrow().use())
              .max()
              .orElseThrow();
      // the inertia is open here, by 2 %, and not in a review
      assertThat(quantity(sampled, "use of " + tag + ", quickest of its kind, hot").percentiles())
          .allSatisfy(use -> assertThat(use).isLessThan(1.04 * judged));
    }
  }

  @Test
  void a_device_that_trips_in_every_start_is_counted_in_every_start() {
    Sampled sampled = sample(CRUSHER.with("time: 13 s,", "time: 5 s,"), 200, 1);
    assertThat(sampled.trips())
        .filteredOn(t -> t.device().equals("F5"))
        .hasSize(4)
        .allSatisfy(t -> assertThat(t.share()).isEqualTo(1.0));
    assertThat(sampled.trips())
        .filteredOn(t -> t.device().equals("F1"))
        .allSatisfy(t -> assertThat(t.count()).isZero());
  }

  @Test
  void a_start_that_does_not_run_up_is_counted_and_in_no_percentile() {
    Sampled sampled = sample(CRUSHER.with("breakaway: 700 N·m", "breakaway: 3100 N·m"), 200, 1);
    assertThat(sampled.notRunUp()).isBetween(1, 199);
    assertThat(quantity(sampled, "run-up time").percentiles()).doesNotContain(Double.NaN);
  }

  @Test
  void distributions_have_the_variance_of_their_name() {
    assertThat(variance(Distribution.UNIFORM)).isCloseTo(1 / 3.0, within(0.01));
    assertThat(variance(Distribution.TRIANGULAR)).isCloseTo(1 / 6.0, within(0.01));
    // a normal cut at two deviations keeps 0.774 of its variance, 0.25
    assertThat(variance(Distribution.NORMAL)).isCloseTo(0.25 * 0.7737, within(0.01));
  }

  private static double variance(Distribution distribution) {
    SummaryStatistics statistics = new SummaryStatistics();
    Well19937c random = new Well19937c(1);
    for (int n = 0; n < 20_000; n++) {
      statistics.addValue(Draw.position(distribution, random));
    }
    assertThat(statistics.getMean()).isCloseTo(0, within(0.02));
    assertThat(statistics.getMax()).isLessThanOrEqualTo(1);
    return statistics.getVariance();
  }

  @Test
  void distributions_are_read_from_the_file() {
    Starter starter =
        CRUSHER.plus("distributions: {voltage: normal, timers: triangular}").starter();
    assertThat(starter.distributions())
        .containsEntry(Varying.VOLTAGE, Distribution.NORMAL)
        .containsEntry(Varying.TIMERS, Distribution.TRIANGULAR)
        .hasSize(2);
    assertThat(CRUSHER.plus("distributions: {volts: normal}").reading().diagnostics()).hasSize(1);
    assertThat(CRUSHER.plus("distributions: {voltage: gauss}").reading().diagnostics()).hasSize(1);
  }

  @Test
  void a_narrower_distribution_narrows_the_run_up_time() {
    Sampled wide = sample(CRUSHER, 800, 1);
    Sampled narrow =
        sample(
            CRUSHER.plus(
                "distributions: {voltage: normal, load: normal, bank: normal, timers: normal,"
                    + " inertia: normal, heat: normal}"),
            800,
            1);
    assertThat(spread(narrow)).isLessThan(spread(wide));
  }

  private static double spread(Sampled sampled) {
    List<Double> percentiles = quantity(sampled, "run-up time").percentiles();
    return percentiles.get(4) - percentiles.get(0);
  }
}
