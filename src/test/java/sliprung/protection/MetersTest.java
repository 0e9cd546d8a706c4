package sliprung.protection;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.function.Supplier;
import org.junit.jupiter.api.Test;

class MetersTest {

  @Test
  void one_long_piece_of_constant_current_tells_the_same_as_many_short_ones() {
    RotorWindingMeter.Winding winding = new RotorWindingMeter.Winding(225, 28e6, 0.3, 1800, 5400);
    List<Supplier<Meter>> meters =
        List.of(
            () -> new FirstOrderMeter(200, 900, 0.2),
            () -> new TwoBodyMeter(200, 3, 400, 0.2),
            () -> new AccumulatingMeter(i -> i > 210 ? i * i / 3e7 : 0, 0.1, 210),
            () -> new TimerMeter(220, 210, 400),
            () -> new RotorWindingMeter(winding, 0.2));
    for (Supplier<Meter> maker : meters) {
      Meter once = maker.get();
      double reached = once.advance(Piece.constant(900, 240));
      Meter often = maker.get();
      double at = 0;
      double reachedOften = Double.POSITIVE_INFINITY;
      for (int i = 0; i < 3000; i++) {
        reachedOften = Math.min(reachedOften, at + often.advance(Piece.constant(0.3, 240)));
        at += 0.3;
      }
      assertThat(often.level())
          .as(once.getClass().getSimpleName())
          .isCloseTo(once.level(), within(1e-9));
      if (Double.isInfinite(reached)) {
        assertThat(reachedOften).isInfinite();
      } else {
        assertThat(reachedOften).isCloseTo(reached, within(1e-6));
      }
    }
  }

  @Test
  void a_falling_current_in_coarse_pieces_is_close_to_the_same_current_in_fine_ones() {
    for (Supplier<Meter> maker :
        List.<Supplier<Meter>>of(
            () -> new FirstOrderMeter(200, 300, 0),
            () -> new TwoBodyMeter(200, 3, 300, 0),
            () -> new AccumulatingMeter(i -> i > 300 ? i * i / 3e7 : 0, 0, 300))) {
      Meter coarse = maker.get();
      feed(coarse, 40);
      Meter fine = maker.get();
      feed(fine, 4000);
      assertThat(coarse.level()).isCloseTo(fine.level(), within(2e-4 * fine.level()));
    }
  }

  private static void feed(Meter meter, int count) {
    double h = 20.0 / count;
    for (int i = 0; i < count; i++) {
      meter.advance(new Piece(h, decay(i * h), decay((i + 0.5) * h), decay((i + 1) * h), false));
    }
  }

  private static double decay(double t) {
    return 180 + 400 * Math.exp(-t / 6);
  }

  @Test
  void a_strip_overshoots_after_the_current_has_gone_and_its_hump_is_found() {
    TwoBodyMeter meter = new TwoBodyMeter(100, 10, 30, 0);
    meter.advance(Piece.constant(8, 260));
    double before = meter.level();
    double reached = meter.advance(Piece.constant(200, 0));

    TwoBodyMeter fine = new TwoBodyMeter(100, 10, 30, 0);
    fine.advance(Piece.constant(8, 260));
    double top = 0;
    double first = Double.POSITIVE_INFINITY;
    for (int i = 0; i < 200000; i++) {
      fine.advance(Piece.constant(1e-3, 0));
      top = Math.max(top, fine.level());
      if (fine.level() >= 1.0) {
        first = Math.min(first, (i + 1) * 1e-3);
      }
    }
    assertThat(before).isLessThan(1.0);
    assertThat(meter.peak()).isCloseTo(top, within(1e-6)).isGreaterThan(1.0);
    assertThat(reached).isCloseTo(first, within(2e-3));
    assertThat(meter.level()).isLessThan(0.1);
  }

  @Test
  void a_current_that_crosses_the_pick_up_within_a_piece_counts_from_the_crossing() {
    // 0 to 200 A in 10 s, pick-up 100 A: 5 s above it, of I² from 100² to 200²
    AccumulatingMeter meter = new AccumulatingMeter(i -> i > 100 ? i * i : 0, 0, 100);
    double reached = meter.advance(new Piece(10, 0, 100, 200, false));
    assertThat(meter.level()).isCloseTo((8e6 - 1e6) / 3 / 20, within(1e-6));
    assertThat(reached).isCloseTo(5.0 + 1.0 / 1e4, within(1e-6));
  }

  @Test
  void a_timer_runs_above_its_pick_up_and_falls_back_below_the_drop_off() {
    TimerMeter timer = new TimerMeter(100, 95, 5);
    assertThat(timer.advance(Piece.constant(4, 101))).isInfinite();
    assertThat(timer.level()).isCloseTo(0.8, within(1e-12));
    assertThat(timer.advance(Piece.constant(0.5, 97))).isInfinite();
    assertThat(timer.level()).isCloseTo(0.9, within(1e-12));
    assertThat(timer.advance(Piece.constant(1, 94))).isInfinite();
    assertThat(timer.level()).isZero();
    assertThat(timer.advance(Piece.constant(60, 97))).isInfinite();
    assertThat(timer.advance(Piece.constant(60, 100.01))).isCloseTo(5, within(1e-12));
    assertThat(timer.peak()).isCloseTo(12, within(1e-9));
  }

  @Test
  void a_threshold_acts_where_the_current_passes_it_and_not_just_below() {
    assertThat(new ThresholdMeter(100).advance(Piece.constant(9, 99.99))).isInfinite();
    assertThat(new ThresholdMeter(100).advance(Piece.constant(9, 100.0))).isZero();
    ThresholdMeter meter = new ThresholdMeter(100);
    assertThat(meter.advance(new Piece(10, 50, 100, 150, false))).isCloseTo(5, within(1e-9));
    assertThat(meter.peak()).isCloseTo(1.5, within(1e-12));
  }

  @Test
  void a_block_withholds_the_trip_and_the_slow_edge_measures_nothing_meanwhile() {
    BlockedMeter fast = new BlockedMeter(new TimerMeter(100, 100, 2), 500, true);
    assertThat(fast.advance(Piece.constant(10, 600))).isInfinite();
    assertThat(fast.peak()).isZero();
    assertThat(fast.advance(Piece.constant(10, 200))).isZero();

    BlockedMeter slow = new BlockedMeter(new TimerMeter(100, 100, 2), 500, false);
    assertThat(slow.advance(Piece.constant(10, 600))).isInfinite();
    assertThat(slow.advance(Piece.constant(10, 200))).isCloseTo(2, within(1e-12));
  }

  @Test
  void a_piece_is_cut_at_every_crossing_and_keeps_its_integral() {
    Piece piece = new Piece(2, 10, 30, 10, false);
    Piece[] parts = piece.cutAt(20, 25);
    assertThat(parts).hasSize(5);
    double sum = 0;
    double seconds = 0;
    for (Piece part : parts) {
      sum += part.integral(i -> i * i, 1);
      seconds += part.seconds();
      assertThat(part.clearOf(20, 25) || Math.min(part.first(), part.last()) <= part.middle())
          .isTrue();
    }
    assertThat(sum).isCloseTo(piece.integral(i -> i * i, 1), within(1e-9));
    assertThat(seconds).isCloseTo(2, within(1e-12));
  }

  @Test
  void pieces_join_only_where_one_quadratic_says_the_same() {
    Piece left = new Piece(0.1, decay(0), decay(0.05), decay(0.1), false);
    Piece right = new Piece(0.1, decay(0.1), decay(0.15), decay(0.2), false);
    Piece joined = left.joined(right);
    assertThat(joined).isNotNull();
    assertThat(joined.meanSquare() * 0.2)
        .isCloseTo(0.1 * (left.meanSquare() + right.meanSquare()), within(1e-3));
    assertThat(left.joined(Piece.constant(0.1, 300))).isNull();
    assertThat(left.joined(new Piece(0.1, decay(0.1), decay(0.15), decay(0.2), true))).isNull();
  }
}
