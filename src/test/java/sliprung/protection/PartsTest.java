package sliprung.protection;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import sliprung.machine.Source;
import sliprung.runup.Scenario;
import sliprung.runup.Stage;
import sliprung.runup.StartHistory;
import sliprung.starter.Conductor;
import sliprung.starter.ResistorBank;
import sliprung.starter.ResistorBank.Section;
import sliprung.starter.ShortTime;

class PartsTest {
  private static final Plants FAN = Plants.fan500();
  private static final double TURNING = 70;

  private static PartResponse part(
      Plants plant, String name, StartHistory history, PartPreload preload, int starts) {
    return plant.evaluator().parts(history, preload, starts).stream()
        .filter(p -> p.part().equals(name))
        .findFirst()
        .orElseThrow();
  }

  private static PartResponse part(String name, StartHistory history) {
    return part(FAN, name, history, PartPreload.COLD, 1);
  }

  private static StartHistory constant(
      double seconds, List<Integer> sections, double stator, double ring, double speed) {
    return Histories.start().stage(seconds, sections, stator, ring, speed).held();
  }

  @Test
  void a_section_reaches_its_limit_after_its_short_time_rating_and_never_at_its_continuous_one() {
    List<Integer> all = List.of(1, 2, 3, 4);
    PartResponse shortTime = part("section-1", constant(60, all, 0, 360, TURNING));
    assertThat(shortTime.limitAtSeconds()).isCloseTo(20, within(1e-6));
    assertThat(shortTime.energyJoules().getAsDouble())
        .isCloseTo(3 * 0.36 * 360 * 360 * 60, within(1.0));
    assertThat(part("section-1", constant(1800, all, 0, 78.9, TURNING)).use()).isLessThan(1);
    assertThat(part("section-1", constant(1800, all, 0, 90, TURNING)).limitAtSeconds())
        .isLessThan(1800);
  }

  /**
   * Section 1 of fan-500: 79 A for good, 360 A for 20 s, so τ = −20/ln(1 − (79/360)²) = 405 s. At
   * 79.4 A it heads for 1.0102, and from cold gets to 1 after τ·ln(1.0102/0.0102) = 1 864 s.
   */
  @Test
  void a_limit_after_the_end_of_the_history_is_not_lost() {
    List<Integer> all = List.of(1, 2, 3, 4);
    double tau = -20.0 / Math.log(1.0 - Math.pow(79.0 / 360.0, 2));
    double level = Math.pow(79.4 / 79.0, 2);
    PartResponse creeping = part("section-1", constant(1800, all, 0, 79.4, TURNING));

    assertThat(creeping.use()).isLessThan(1);
    assertThat(creeping.limitAtSeconds())
        .isGreaterThan(1800)
        .isCloseTo(tau * Math.log(level / (level - 1.0)), within(1e-6));
    assertThat(part("section-1", constant(1800, all, 0, 79.0 * 0.999, TURNING)).limitAtSeconds())
        .isInfinite();
  }

  @Test
  void a_section_that_is_out_is_dead_and_cools() {
    StartHistory history =
        Histories.start()
            .stage(5, List.of(1, 2, 3, 4), 0, 300, TURNING)
            .stage(300, List.of(2, 3, 4), 0, 60, TURNING)
            .held();
    double tau =
        SectionElement.of(FAN.starter().resistors(), 1).orElseThrow().timeConstantSeconds();
    double level = Math.pow(300.0 / 79, 2) * (1 - Math.exp(-5 / tau));
    assertThat(part("section-1", history).use()).isCloseTo(level, within(1e-9));
    assertThat(FAN.evaluator().sectionLevelsAfter(history, PartPreload.COLD, 1).get(0))
        .isCloseTo(level * Math.exp(-300 / tau), within(1e-9));
  }

  @Test
  void section_levels_are_carried_into_the_next_start() {
    StartHistory start =
        Histories.start().stage(5, List.of(1, 2, 3, 4), 0, 200, TURNING).permitted();
    ProtectionEvaluator evaluator = FAN.evaluator();
    List<Double> after = evaluator.sectionLevelsAfter(start, PartPreload.COLD, 2);
    PartPreload warm = new PartPreload(0, 0, 0, after);
    assertThat(part(FAN, "section-2", start, warm, 1).use())
        .isCloseTo(part(FAN, "section-2", start, PartPreload.COLD, 3).use(), within(1e-9));
  }

  @Test
  void a_section_of_a_delta_bank_carries_ring_current_over_root_three() {
    Plants trolley = Plants.trolley480();
    StartHistory history = constant(60, List.of(1, 2, 3), 0, 122 * Math.sqrt(3), TURNING);
    PartResponse section = part(trolley, "section-1", history, PartPreload.COLD, 1);
    assertThat(section.limitAtSeconds()).isCloseTo(20, within(1e-6));
    assertThat(section.energyJoules().getAsDouble())
        .isCloseTo(3 * 1.15 * 122 * 122 * 60, within(1.0));
  }

  private static ResistorBank bank(boolean sameLimit, Section section) {
    return new ResistorBank(
        ResistorBank.Connection.STAR,
        ResistorBank.CutOut.STAR_POINT,
        List.of(section),
        sameLimit,
        0,
        0,
        0.1,
        0.2,
        1200);
  }

  private static Section section(
      OptionalDouble continuous,
      Optional<ShortTime> shortTime,
      OptionalDouble rise,
      OptionalDouble shortRise) {
    return new Section(0.1, continuous, shortTime, rise, shortRise);
  }

  @Test
  void sections_without_the_data_or_with_ratings_that_contradict_are_not_judged() {
    OptionalDouble none = OptionalDouble.empty();
    OptionalDouble hundred = OptionalDouble.of(100);
    Optional<ShortTime> fair = Optional.of(new ShortTime(450, 20));
    assertThat(SectionElement.missing(bank(true, section(none, fair, none, none)), 1))
        .hasValue("resistors.sections[1].continuous");
    assertThat(
            SectionElement.missing(bank(true, section(hundred, Optional.empty(), none, none)), 1))
        .hasValue("resistors.sections[1].short-time");
    assertThat(SectionElement.missing(bank(false, section(hundred, fair, none, none)), 1))
        .hasValue("resistors.same-limit");
    Optional<ShortTime> tooSmall = Optional.of(new ShortTime(101, 1));
    ResistorBank odd = bank(true, section(hundred, tooSmall, none, none));
    assertThat(SectionElement.missing(odd, 1)).hasValue("resistors.sections[1].short-time");
    assertThat(SectionElement.of(odd, 1)).isEmpty();
    assertThat(SectionElement.implied(odd, 1).orElseThrow().plausible()).isFalse();
    Optional<ShortTime> below = Optional.of(new ShortTime(90, 20));
    assertThat(
            SectionElement.implied(bank(true, section(hundred, below, none, none)), 1)
                .orElseThrow()
                .plausible())
        .isFalse();
  }

  @Test
  void different_rises_are_each_scaled_to_their_own_limit_and_the_lower_one_counts() {
    Optional<ShortTime> rating = Optional.of(new ShortTime(500, 20));
    SectionElement element =
        SectionElement.of(
                bank(
                    false,
                    section(
                        OptionalDouble.of(100),
                        rating,
                        OptionalDouble.of(375),
                        OptionalDouble.of(600))),
                1)
            .orElseThrow();
    double tau = element.timeConstantSeconds();
    assertThat(375 * 25 * (1 - Math.exp(-20 / tau))).isCloseTo(600, within(1e-6));
    assertThat(element.referenceAmps()).isEqualTo(100);
    SectionElement cooler =
        SectionElement.of(
                bank(
                    false,
                    section(
                        OptionalDouble.of(100),
                        rating,
                        OptionalDouble.of(400),
                        OptionalDouble.of(300))),
                1)
            .orElseThrow();
    assertThat(cooler.referenceAmps()).isCloseTo(100 * Math.sqrt(0.75), within(1e-9));
  }

  @Test
  void a_cold_rotor_stands_its_cold_stall_time_and_a_hot_one_its_hot_stall_time() {
    double shorted = FAN.machine().at(new Source(500, 0), 0, 1).ringAmps();
    StartHistory stalled = constant(60, List.of(), 900, shorted, 0);
    // the cooling it is granted in 20 s, with 90 min, is 0.2 %
    assertThat(part("rotor", stalled).limitAtSeconds()).isCloseTo(20, within(0.05));
    PartPreload hot = new PartPreload(185, 225, 0, List.of());
    assertThat(part(FAN, "rotor", stalled, hot, 1).limitAtSeconds()).isCloseTo(14, within(0.05));
    PartPreload rested = new PartPreload(185, 225, 5400, List.of());
    assertThat(part(FAN, "rotor", stalled, rested, 1).limitAtSeconds())
        .isCloseTo(20 - 6 * Math.exp(-1), within(0.05));
  }

  @Test
  void a_rotor_at_its_rated_current_settles_at_the_level_of_a_hot_start() {
    PartResponse running = part("rotor", constant(1e5, List.of(), 185, 225, 100));
    assertThat(running.use()).isCloseTo(0.3, within(1e-6));
  }

  @Test
  void a_stator_ends_at_its_service_factor() {
    assertThat(part("stator", constant(1e6, List.of(), 1.05 * 185, 0, TURNING)).use())
        .isLessThan(1);
    PartResponse over = part("stator", constant(1800, List.of(), 400, 0, TURNING));
    double reference = 1.05 * 185;
    assertThat(over.limitAtSeconds())
        .isCloseTo(1800 * Math.log(160000 / (160000 - reference * reference)), within(1e-6));
    PartPreload hot = new PartPreload(150, 0, 0, List.of());
    assertThat(part(FAN, "stator", constant(10, List.of(), 185, 0, TURNING), hot, 1).use())
        .isGreaterThan(0.59);
  }

  @Test
  void slip_rings_count_only_while_the_rotor_stands() {
    StartHistory history =
        Histories.start().stage(10, List.of(1), 0, 450, 0).stage(100, List.of(1), 0, 450, 1).held();
    assertThat(part("rings", history).use()).isCloseTo(10.0 / 15, within(1e-9));
    assertThat(part("rings", constant(60, List.of(1), 0, 450, 0)).limitAtSeconds())
        .isCloseTo(15, within(1e-9));
  }

  @Test
  void a_cable_counts_only_above_its_ampacity_and_needs_a_known_insulation() {
    Conductor cable = new Conductor(10, Conductor.Metal.COPPER, "xlpe", OptionalDouble.of(80));
    Meter meter =
        ConductorParts.part(
                "stator-conductor", "conductors.stator", Optional.of(cable), Channel.stator())
            .meter()
            .apply(PartPreload.COLD);
    meter.advance(Piece.constant(1e6, 80));
    assertThat(meter.level()).isZero();
    meter.advance(Piece.constant(2, 500));
    assertThat(meter.level()).isCloseTo(2 * 250000 / 2044900.0, within(1e-9));
    Conductor paper = new Conductor(10, Conductor.Metal.COPPER, "paper", OptionalDouble.of(80));
    assertThat(
            ConductorParts.part(
                    "stator-conductor", "conductors.stator", Optional.of(paper), Channel.stator())
                .missing())
        .hasValue("conductors.stator.insulation");
    assertThat(part("stator-conductor", constant(1, List.of(), 1, 1, 1)).missing())
        .hasValue("conductors.stator");
  }

  @Test
  void a_star_point_contactor_carries_until_a_later_one_has_taken_over() {
    StartHistory history =
        Histories.start()
            .stage(5, List.of(1, 2, 3, 4), 0, 1000, TURNING)
            .stage(4, List.of(2, 3, 4), 0, 1000, TURNING)
            .stage(3, List.of(4), 0, 1000, TURNING)
            .stage(2, List.of(), 0, 1000, TURNING)
            .held();
    double second = 1000.0 * 1000 / (1125.0 * 1125 * 10);
    assertThat(part("K11", history).use()).isCloseTo(4 * second, within(1e-9));
    assertThat(part("K12", history).use()).isZero();
    assertThat(part("K13", history).use()).isCloseTo(3 * second, within(1e-9));
    assertThat(part("K14", history).use()).isCloseTo(2 * second, within(1e-9));
  }

  @Test
  void a_bridging_contactor_in_delta_carries_ring_current_over_1_4_as_long_as_its_section_is_out() {
    StartHistory history =
        Histories.start()
            .stage(5, List.of(1, 2, 3), 0, 700, TURNING)
            .stage(4, List.of(2, 3), 0, 700, TURNING)
            .stage(3, List.of(3), 0, 700, TURNING)
            .held();
    Plants trolley = Plants.trolley480();
    double second = 500.0 * 500 / (380.0 * 380 * 10);
    assertThat(part(trolley, "K11", history, PartPreload.COLD, 1).use())
        .isCloseTo(7 * second, within(1e-9));
    assertThat(part(trolley, "K12", history, PartPreload.COLD, 1).use())
        .isCloseTo(3 * second, within(1e-9));
    assertThat(part(trolley, "K13", history, PartPreload.COLD, 1).use()).isZero();
  }

  @Test
  void a_line_contactor_proved_in_ac3_has_the_withstand_of_its_standard() {
    StartHistory history = constant(60, List.of(1), 8 * 222, 0, 0);
    assertThat(part("K1", history).limitAtSeconds()).isCloseTo(10, within(1e-9));
    assertThat(part("K1", constant(1800, List.of(1), 222, 0, 0)).use()).isZero();
    StartHistory medium = constant(60, List.of(1), 900, 0, 0);
    assertThat(part(Plants.crusher6600(), "K1", medium, PartPreload.COLD, 1).missing())
        .as("above 1000 V another standard holds")
        .hasValue("contactors.K1.short-time");
  }

  @Test
  void a_computed_locked_start_heats_the_rings_and_every_section_that_its_steps_leave_in() {
    StartHistory locked =
        FAN.simulator()
            .run(new Scenario(Scenario.Kind.LOCKED, 0, Scenario.LoadMode.START), FAN.nominal());
    assertThat(part("rings", locked).limitAtSeconds()).isBetween(5.0, 40.0);
    assertThat(part("rotor", locked).limitAtSeconds()).isBetween(14.0, 60.0);
    for (int n = 1; n <= 4; n++) {
      Stage stage = locked.stages().get(n - 1);
      double square = stage.trace().integralOfSquare(stage.trace().ringAmps());
      double before = 0;
      for (int k = 0; k < n - 1; k++) {
        Stage earlier = locked.stages().get(k);
        before += earlier.trace().integralOfSquare(earlier.trace().ringAmps());
      }
      double ohms = FAN.starter().resistors().sections().get(n - 1).ohms();
      assertThat(part("section-" + n, locked).energyJoules().getAsDouble())
          .isCloseTo(3 * ohms * (before + square), within(1e-4 * 3 * ohms * square));
    }
  }
}
