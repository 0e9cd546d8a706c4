package sliprung.review;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Optional;
import org.junit.jupiter.api.Test;
import sliprung.protection.DeviceResponse;
import sliprung.protection.Edge;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Exposure;

class ReviewTablesTest {
  private static final Review REVIEW = CrusherReview.plain();

  @Test
  void should_list_every_device_with_what_it_opens() {
    TripMatrix matrix = TripMatrix.of(REVIEW);
    assertThat(matrix.rows()).hasSameSizeAs(REVIEW.starter().protection());
    for (TripMatrix.Row row : matrix.rows()) {
      assertThat(row.opens()).isEqualTo(row.device().trips());
    }
  }

  @Test
  void should_find_no_operation_above_the_greatest_current_unless_cleared_before() {
    var facts = ReviewFacts.of(REVIEW);
    for (TripMatrix.Row row : TripMatrix.of(REVIEW).rows()) {
      double greatest = row.greatest().map(TripMatrix.Opening::amps).orElse(0.0);
      for (ComputedStart start : REVIEW.starts()) {
        for (DeviceResponse d : start.devices()) {
          boolean mine = d.device().equals(row.device().tag()) && d.operates();
          boolean opens = row.isFuse() || row.opens().isPresent();
          if (mine && opens) {
            double at = d.operatesAtSeconds();
            boolean cleared =
                Exposure.of(facts, start, java.util.List.of(d.device())).clearedAtSeconds() < at;
            assertThat(cleared || Exposure.statorAmpsAt(start.history(), at) <= greatest).isTrue();
          }
        }
      }
    }
  }

  @Test
  void should_never_call_a_fault_seen_that_some_start_leaves_uncleared_or_late() {
    var facts = ReviewFacts.of(REVIEW);
    BlindSpots spots = BlindSpots.of(REVIEW);
    assertThat(spots.rows()).isNotEmpty();
    for (BlindSpots.Row row : spots.rows()) {
      assertThat(row.cells()).hasSameSizeAs(spots.devices());
      for (int i = 0; i < row.cells().size(); i++) {
        if (row.cells().get(i).sight() != BlindSpots.Sight.SEES) {
          continue;
        }
        String tag = spots.devices().get(i);
        for (ComputedStart start : REVIEW.starts()) {
          if (start.scenario().isFault() && start.scenario().words().equals(row.fault())) {
            Optional<DeviceResponse> slow = start.device(tag, Edge.SLOW);
            assertThat(slow.orElseThrow().operates()).isTrue();
            assertThat(slow.get().clearsAtSeconds())
                .isLessThan(Exposure.of(facts, start).limitAtSeconds())
                .isLessThanOrEqualTo(row.cells().get(i).seconds());
          }
        }
      }
    }
  }

  @Test
  void should_read_ring_volts_frequency_and_current_that_fit_each_other() {
    StepReadings readings = StepReadings.of(REVIEW);
    assertThat(readings.normal()).hasSize(6);
    StepReadings.Reading first = readings.normal().get(0).begins();
    assertThat(first.speed()).isZero();
    assertThat(first.rotorHertz()).isCloseTo(50.0, within(1e-9));
    // star bank of 0.36 Ω a phase: U = √3 I R between two rings
    assertThat(first.ringVolts()).isCloseTo(Math.sqrt(3.0) * first.ringAmps() * 0.36, within(1e-6));
    StepReadings.Reading last = readings.normal().get(5).ends();
    assertThat(last.ringVolts()).isZero();
    assertThat(last.rotorHertz()).isLessThan(1.0);
  }

  @Test
  void should_tell_each_contactor_that_fails_by_where_the_motor_hangs() {
    StepReadings readings = StepReadings.of(REVIEW);
    var starting =
        readings.leftOut().stream()
            .filter(l -> !l.start().scenario().id().endsWith("running"))
            .toList();
    assertThat(starting)
        .extracting(StepReadings.LeftOut::contactor)
        .containsExactly("K11", "K12", "K13", "K14", "K15");
    for (int k = 1; k < starting.size(); k++) {
      assertThat(starting.get(k).read().speed()).isGreaterThan(starting.get(k - 1).read().speed());
      assertThat(starting.get(k).read().ringVolts())
          .isLessThan(starting.get(k - 1).read().ringVolts());
    }
    for (StepReadings.LeftOut row : readings.leftOut()) {
      row.clearing()
          .ifPresent(
              c -> assertThat(row.read().seconds()).isLessThanOrEqualTo(c.clearsAtSeconds()));
    }
  }
}
