package sliprung.protection;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import sliprung.fixture.CrusherFacts;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Facts;
import sliprung.runup.Scenario;
import sliprung.starter.Device;

/** Levels over time tell the same as the responses that sum them up. */
class LevelOverTimeTest {
  private static final String RELAYS =
      "  F2: {kind: overload, class: 10, dial: 208 A, trips: K1}\n"
          + "  F3: {kind: inverse-time, curve: iec-very-inverse, pick-up: 265 A, time-multiplier:"
          + " 0.25, ct: 300/5, trips: Q1}\n"
          + "  F4: {kind: instantaneous, pick-up: 2600 A, trips: Q1}\n"
          + "  F6: {kind: definite-time, pick-up: 300 A, time: 8 s, trips: K1}\n"
          + "  F7: {kind: standstill, time: 3 s, trips: K1}\n";
  private static final Facts FACTS =
      CrusherFacts.of("  F2: {kind: overload, class: 10, dial: 208 A, trips: K1}\n", RELAYS);
  private static final ProtectionEvaluator EVALUATOR =
      new ProtectionEvaluator(FACTS.starter(), FACTS.machine());

  private static ComputedStart cold() {
    return FACTS.permitted().filter(s -> s.id().equals("cold")).findFirst().orElseThrow();
  }

  private static ComputedStart locked() {
    return FACTS.faults(Scenario.Kind.LOCKED).findFirst().orElseThrow();
  }

  @Test
  void should_come_to_the_use_that_the_response_names() {
    for (ComputedStart start : List.of(cold(), locked())) {
      StartProtection over = EVALUATOR.over(start.history());
      for (DeviceResponse response : over.devices(DevicePreload.COLD, 1)) {
        double greatest =
            over.useOverTime(response.device(), response.edge(), DevicePreload.COLD, 1)
                .orElseThrow()
                .greatest();
        assertThat(greatest)
            .as(start.id() + " " + response.device() + " " + response.edge())
            .isCloseTo(response.use(), within(2e-3 * Math.max(1.0, response.use())));
      }
    }
  }

  @Test
  void should_cross_one_when_the_response_says_it_operates() {
    StartProtection over = EVALUATOR.over(locked().history());
    DeviceResponse response =
        over.devices(DevicePreload.COLD, 1).stream()
            .filter(d -> d.device().equals("F2") && d.edge() == Edge.SLOW)
            .findFirst()
            .orElseThrow();
    LevelOverTime use = over.useOverTime("F2", Edge.SLOW, DevicePreload.COLD, 1).orElseThrow();
    double before = 0.0;
    double after = Double.POSITIVE_INFINITY;
    for (int i = 0; i < use.seconds().length; i++) {
      if (use.levels()[i] < 1.0) {
        before = Math.max(before, use.seconds()[i]);
      } else {
        after = Math.min(after, use.seconds()[i]);
      }
    }
    assertThat(response.operatesAtSeconds()).isBetween(before, after);
  }

  @Test
  void should_fall_to_nothing_when_the_event_stops_a_sequence_timer() {
    StartProtection over = EVALUATOR.over(cold().history());
    LevelOverTime use = over.useOverTime("F5", Edge.MIDDLE, DevicePreload.COLD, 1).orElseThrow();
    double closing = cold().history().lastClosingSeconds().orElseThrow();
    assertThat(use.seconds()[1]).isEqualTo(closing);
    assertThat(use.levels()[1]).isCloseTo(closing / 15.0, within(1e-12));
    assertThat(use.levels()[3]).isZero();
  }

  @Test
  void should_carry_a_section_through_every_start_of_a_row() {
    StartProtection over = EVALUATOR.over(cold().history());
    LevelOverTime level = over.levelOverTime("section-1", PartPreload.COLD, 2).orElseThrow();
    double use =
        over.parts(PartPreload.COLD, 2).stream()
            .filter(p -> p.part().equals("section-1"))
            .findFirst()
            .orElseThrow()
            .use();
    assertThat(level.greatest()).isCloseTo(use, within(1e-3));
    double[] seconds = level.seconds();
    for (int i = 1; i < seconds.length; i++) {
      assertThat(seconds[i]).isGreaterThan(seconds[i - 1]);
    }
    assertThat(over.levelOverTime("stator-conductor", PartPreload.COLD, 1)).isEmpty();
  }

  @Test
  void should_tell_when_a_current_last_rose_to_the_pick_up() {
    StartProtection over = EVALUATOR.over(locked().history());
    assertThat(over.pickedUpSeconds("F3", Edge.SLOW, 5.0).orElseThrow()).isBetween(0.0, 5.0);
    // a rotor that stands is seen from line closing on
    assertThat(over.pickedUpSeconds("F7", Edge.SLOW, 3.0).orElseThrow()).isZero();
    // a timer has no pick-up
    assertThat(over.pickedUpSeconds("F5", Edge.SLOW, 3.0)).isEmpty();
    // running never holds the relay up
    assertThat(EVALUATOR.over(cold().history()).pickedUpSeconds("F3", Edge.SLOW, 1000.0)).isEmpty();
  }

  @Test
  void should_stand_a_constant_current_as_long_as_the_ratings_say() {
    Device f2 = FACTS.starter().device("F2").orElseThrow();
    assertThat(EVALUATOR.withstandSeconds("section-1", 600.0).orElseThrow())
        .isCloseTo(15.0, within(1e-9));
    assertThat(EVALUATOR.withstandSeconds("section-1", 129.0).orElseThrow()).isInfinite();
    assertThat(EVALUATOR.withstandSeconds("rings", 600.0)).isEmpty();
    assertThatThrownBy(() -> EVALUATOR.withstandSeconds(f2.tag(), 1.0))
        .isInstanceOf(IllegalArgumentException.class);
  }
}
