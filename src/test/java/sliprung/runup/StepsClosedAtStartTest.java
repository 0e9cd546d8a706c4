package sliprung.runup;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import sliprung.fixture.CrusherFacts;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Facts;
import sliprung.runup.Scenario.Kind;
import sliprung.runup.Scenario.LoadMode;

/** Faults that begin with step contactors closed, and a rotor that jams while running. */
class StepsClosedAtStartTest {
  private static final String NO_INTERLOCK = "steps-open-before-line: true";
  private static final Facts OPEN = CrusherFacts.of(NO_INTERLOCK, "steps-open-before-line: false");
  private static final Facts PROVEN = CrusherFacts.of();

  private static ComputedStart one(Facts facts, Kind kind) {
    return facts.faults(kind).findFirst().orElseThrow();
  }

  @Test
  void should_start_without_the_sections_a_welded_contactor_cuts_out() {
    StartHistory welded = one(OPEN, Kind.WELDED).history();

    assertThat(welded.scenario()).isEqualTo(new Scenario(Kind.WELDED, 1, LoadMode.START));
    assertThat(welded.scenario().id()).isEqualTo("welded-1");
    assertThat(welded.stages().get(0).sectionsIn()).isEqualTo(List.of(2));
    assertThat(welded.stages().get(0).step()).isEqualTo(2);
    assertThat(welded.lastClosingSeconds()).hasValueCloseTo(10.12, within(1e-6));
  }

  @Test
  void should_start_on_the_last_circuit_with_the_last_contactor_of_a_star_point_bank_welded() {
    StartHistory shorted = one(OPEN, Kind.RINGS_SHORTED_START).history();
    double atRest = one(OPEN, Kind.RINGS_SHORTED).history().stages().get(0).trace().statorAmps()[0];

    assertThat(shorted.scenario().id()).isEqualTo("rings-shorted-start");
    assertThat(shorted.stages().get(0).sectionsIn()).isEmpty();
    assertThat(shorted.stages().get(0).trace().statorAmps()[0]).isEqualTo(atRest);
    // a timer that waits for the last contactor sees it closed from the beginning
    assertThat(shorted.lastClosingSeconds()).isEqualTo(OptionalDouble.of(0.0));
  }

  @Test
  void should_weld_the_last_contactor_of_a_bridging_bank_like_any_other() {
    Facts bridging =
        CrusherFacts.of(
            NO_INTERLOCK,
            "steps-open-before-line: false",
            "cut-out: star-point",
            "cut-out: bridging");

    assertThat(bridging.faults(Kind.RINGS_SHORTED_START)).isEmpty();
    StartHistory second =
        bridging
            .faults(Kind.WELDED)
            .filter(s -> s.scenario().step() == 2)
            .findFirst()
            .orElseThrow()
            .history();
    assertThat(second.stages().get(0).sectionsIn()).isEqualTo(List.of(1));
    assertThat(second.lastClosingSeconds()).isEqualTo(OptionalDouble.of(0.0));
  }

  @Test
  void should_reclose_a_running_motor_on_the_last_circuit_only_from_hot() {
    List<ComputedStart> reclosed = OPEN.faults(Kind.RECLOSED).toList();

    assertThat(reclosed).extracting(ComputedStart::id).containsExactly("reclosed-hot");
    assertThat(reclosed.get(0).history().stages()).hasSize(1);
    assertThat(reclosed.get(0).history().stages().get(0).sectionsIn()).isEmpty();
  }

  @Test
  void should_exclude_them_where_every_step_is_proven_open() {
    assertThat(PROVEN.faults(Kind.WELDED)).isEmpty();
    assertThat(PROVEN.faults(Kind.RINGS_SHORTED_START)).isEmpty();
    assertThat(PROVEN.faults(Kind.RECLOSED)).isEmpty();
  }

  @Test
  void should_jam_with_the_circuit_of_a_standing_rotor_with_rings_shorted() {
    ComputedStart jammed = one(PROVEN, Kind.RUNNING_LOCKED);
    Stage shorted = one(PROVEN, Kind.RINGS_SHORTED).history().stages().get(0);

    assertThat(jammed.id()).isEqualTo("running-locked-hot");
    assertThat(jammed.history().outcome()).isEqualTo(Outcome.LOCKED);
    assertThat(jammed.history().stages().get(0).trace().statorAmps())
        .isEqualTo(shorted.trace().statorAmps());
  }

  private static org.assertj.core.data.Offset<Double> within(double offset) {
    return org.assertj.core.data.Offset.offset(offset);
  }
}
