package sliprung.protection;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import sliprung.config.CurveLibraryReader;
import sliprung.curve.AmBounds;
import sliprung.curve.CurveLibrary;
import sliprung.curve.FuseGates;
import sliprung.curve.GgBounds;
import sliprung.curve.TimeCurrentEdge;
import sliprung.curve.TripClass;

/** Every law of the built-in library gives edges that make sense. */
class LibraryEdgesTest {
  private static final CurveLibrary LIBRARY = CurveLibraryReader.builtIn();

  @Test
  void edges_of_every_gg_rating_keep_their_order_and_the_slow_one_falls() {
    assertThat(LIBRARY.gg()).isNotEmpty();
    for (FuseGates gates : LIBRARY.gg().values()) {
      TimeCurrentEdge fast = GgBounds.fast(gates, 1.0);
      TimeCurrentEdge warm = GgBounds.fast(gates, EdgeModels.PREHEATED);
      TimeCurrentEdge middle = GgBounds.middle(gates);
      TimeCurrentEdge slow = GgBounds.slow(gates);
      double before = Double.POSITIVE_INFINITY;
      for (double m = 0.5; m < 100; m *= 1.01) {
        double amps = m * gates.ratingAmps();
        String at = gates.ratingAmps() + " A fuse at " + amps + " A";
        assertThat(warm.seconds(amps)).as(at).isLessThanOrEqualTo(fast.seconds(amps));
        assertThat(fast.seconds(amps)).as(at).isLessThanOrEqualTo(middle.seconds(amps));
        assertThat(middle.seconds(amps)).as(at).isLessThanOrEqualTo(slow.seconds(amps));
        assertThat(slow.seconds(amps)).as(at).isLessThanOrEqualTo(before);
        before = slow.seconds(amps);
      }
    }
  }

  @Test
  void every_gate_holds_on_its_side() {
    for (FuseGates gates : LIBRARY.gg().values()) {
      TimeCurrentEdge fast = GgBounds.fast(gates, 1.0);
      TimeCurrentEdge slow = GgBounds.slow(gates);
      assertThat(fast.seconds(gates.notIn10sAmps())).isGreaterThan(9.999999);
      assertThat(fast.seconds(gates.notIn100msAmps())).isGreaterThan(0.0999999);
      assertThat(slow.seconds(gates.within5sAmps())).isLessThan(5.000001);
      assertThat(slow.seconds(gates.within100msAmps())).isLessThan(0.1000001);
      double least = Math.sqrt(gates.leastPreArcing() / 0.01);
      double greatest = Math.sqrt(gates.greatestPreArcing() / 0.01);
      assertThat(fast.seconds(1.0001 * Math.max(least, gates.notIn100msAmps())))
          .isLessThanOrEqualTo(0.01);
      assertThat(slow.seconds(greatest)).isLessThanOrEqualTo(0.0100001);
    }
  }

  @Test
  void back_up_fuses_keep_their_order() {
    TimeCurrentEdge fast = AmBounds.fast(LIBRARY.am(), 63, 1.0);
    TimeCurrentEdge slow = AmBounds.slow(LIBRARY.am(), 63);
    for (double amps = 20; amps < 5000; amps *= 1.01) {
      assertThat(fast.seconds(amps)).isLessThanOrEqualTo(slow.seconds(amps));
    }
  }

  @Test
  void relays_of_every_class_keep_their_order_at_every_multiple() {
    assertThat(LIBRARY.tripClasses()).isNotEmpty();
    for (TripClass tripClass : LIBRARY.tripClasses().values()) {
      OverloadRelays relays = new OverloadRelays(Devices.overload("F2", tripClass, 100), 20);
      double before = Double.POSITIVE_INFINITY;
      for (double amps = 106; amps < 2000; amps *= 1.02) {
        double slow = relays.slow().apply(0).advance(Piece.constant(1e7, amps));
        assertThat(slow).as(tripClass.name() + " at " + amps).isLessThanOrEqualTo(before);
        before = slow;
        if (relays.hasShortestTime()) {
          double fast = relays.fast().apply(0).advance(Piece.constant(1e7, amps));
          double middle = relays.middle().apply(0).advance(Piece.constant(1e7, amps));
          assertThat(fast).as(tripClass.name() + " at " + amps).isLessThanOrEqualTo(middle);
          assertThat(middle).as(tripClass.name() + " at " + amps).isLessThanOrEqualTo(slow);
        }
      }
    }
  }
}
