package sliprung.tolerance;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Random;
import org.junit.jupiter.api.Test;
import sliprung.fixture.StarterText;
import sliprung.machine.NameplateIdentification;
import sliprung.review.Reviewer;
import sliprung.runup.Conditions;
import sliprung.runup.Scenario;
import sliprung.runup.StartSimulator;
import sliprung.starter.Starter;

/** Brute force, on patterns and on random points, is the witness of what the search calls worst. */
class WorstPointsTest {
  private static final Starter TIMED = StarterText.crusher().starter();

  /** The crusher with every step closed by the stator current. */
  private static final Starter BY_CURRENT =
      StarterText.crusher()
          .with("K11, after: 4.2 s", "K11, stator-below: 240 A, at-least: 0.3 s")
          .with("K12, after: 2.4 s", "K12, stator-below: 240 A, at-least: 0.3 s")
          .with("K13, after: 1.4 s", "K13, stator-below: 240 A, at-least: 0.3 s")
          .with("K14, after: 0.9 s", "K14, stator-below: 240 A, at-least: 0.3 s")
          .with("K15, after: 0.7 s", "K15, stator-below: 240 A, at-least: 0.3 s")
          .starter();

  private static StartSimulator simulator(Starter starter) {
    return new StartSimulator(
        starter,
        Reviewer.machine(starter, NameplateIdentification.identify(starter.motor()).get(0)));
  }

  private static double[] at(Starter starter, Conditions conditions) {
    return Severity.of(starter, simulator(starter).run(Scenario.PERMITTED, conditions));
  }

  /** Worst of each measure over the corners and what the search adds to them. */
  private static double[] judged(Starter starter) {
    Map<Corner, Conditions> points = new LinkedHashMap<>(Corners.of(starter));
    points.putAll(WorstPoints.of(starter, simulator(starter)));
    return worst(starter, points.values());
  }

  private static double[] worst(Starter starter, Iterable<Conditions> points) {
    double[] worst = null;
    for (Conditions conditions : points) {
      double[] here = at(starter, conditions);
      worst = worst == null ? here : worst;
      for (int i = 0; i < here.length; i++) {
        worst[i] = Math.max(worst[i], here[i]);
      }
    }
    return worst;
  }

  @Test
  void every_mixed_pattern_of_a_few_steps_and_the_telling_ones_of_many() {
    assertThat(WorstPoints.patterns(1)).isEmpty();
    assertThat(WorstPoints.patterns(3)).hasSize(6).doesNotHaveDuplicates();
    assertThat(WorstPoints.patterns(8)).hasSize(26).doesNotHaveDuplicates();
    assertThat(WorstPoints.patterns(8))
        .allSatisfy(
            p -> assertThat(p).hasSize(8).contains(Corner.Timers.EARLY, Corner.Timers.LATE));
  }

  @Test
  void no_mixture_of_early_and_late_timers_is_worse_than_what_is_judged() {
    List<Conditions> all = new ArrayList<>();
    for (Corner corner : Corners.of(TIMED).keySet()) {
      for (List<Corner.Timers> pattern : WorstPoints.patterns(TIMED.steps().size())) {
        all.add(Corners.conditions(TIMED, corner.withSteps(pattern)));
      }
    }
    double[] brute = worst(TIMED, all);
    double[] corners = worst(TIMED, Corners.of(TIMED).values());
    double[] judged = judged(TIMED);
    boolean mixturesMatter = false;
    for (int i = 0; i < brute.length; i++) {
      assertThat(judged[i]).as("measure %d", i).isGreaterThan(brute[i] / (1 + 2.1e-3));
      mixturesMatter |= brute[i] > 1.002 * corners[i];
    }
    assertThat(mixturesMatter).isTrue();
  }

  @Test
  void no_random_point_within_the_spreads_is_worse_than_what_is_judged() {
    for (Starter starter : List.of(TIMED, BY_CURRENT)) {
      double[] judged = judged(starter);
      Random random = new Random(20261201);
      List<Conditions> points = new ArrayList<>();
      for (int n = 0; n < 1500; n++) {
        points.add(random(starter, random));
      }
      double[] found = worst(starter, points);
      for (int i = 0; i < found.length; i++) {
        assertThat(judged[i]).as("measure %d", i).isGreaterThan(found[i] / 1.004);
      }
    }
  }

  /** Half of the points lie on the edges of some spreads, where the worst ones mostly are. */
  private static Conditions random(Starter starter, Random random) {
    Corner corner =
        new Corner(
            between(random, 1 + starter.supply().bandLow(), 1 + starter.supply().bandHigh()),
            Corner.LoadSide.NOMINAL,
            Corner.Bank.NOMINAL,
            Corner.Timers.MIXED,
            List.of(),
            Optional.of(
                new Corner.Inside(
                    between(
                        random,
                        Corners.load(starter, Corner.LoadSide.LIGHT),
                        Corners.load(starter, Corner.LoadSide.HEAVY)),
                    between(
                        random,
                        Corners.bank(starter, Corner.Bank.LOW),
                        Corners.bank(starter, Corner.Bank.HOT)))));
    List<Conditions.StepFactors> own = new ArrayList<>();
    for (int k = 0; k < starter.steps().size(); k++) {
      double late = between(random, -1, 1);
      own.add(
          new Conditions.StepFactors(
              1 + late * starter.timerSpread(), 1 - late * starter.levelSpread()));
    }
    return Corners.conditions(starter, corner).withOwn(own);
  }

  private static double between(Random random, double low, double high) {
    double share = random.nextDouble();
    boolean edge = random.nextBoolean();
    return edge ? (share < 0.5 ? low : high) : low + share * (high - low);
  }

  @Test
  void a_starter_without_spread_has_nothing_but_its_nominal_point() {
    Starter small = StarterText.small().starter();
    assertThat(WorstPoints.of(small, simulator(small))).isEmpty();
  }

  @Test
  void the_words_of_a_mixed_point_name_every_step() {
    Corner corner =
        new Corner(0.9, Corner.LoadSide.HEAVY, Corner.Bank.LOW, Corner.Timers.LATE)
            .withSteps(List.of(Corner.Timers.EARLY, Corner.Timers.LATE, Corner.Timers.EARLY));
    assertThat(corner.words())
        .isEqualTo(
            "90 % volts, heavy load, cold bank, low tolerance, timer of step 2 late, of 1, 3"
                + " early");
    assertThat(corner.id()).isEqualTo("90v-heavy-low-ele");
    Conditions conditions = Corners.conditions(TIMED, corner);
    assertThat(conditions.timerFactor(1)).isEqualTo(0.95);
    assertThat(conditions.timerFactor(2)).isEqualTo(1.05);
    assertThat(conditions.levelFactor(2)).isEqualTo(0.9);
  }
}
