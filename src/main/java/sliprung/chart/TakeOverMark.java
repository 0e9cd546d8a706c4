package sliprung.chart;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import sliprung.protection.Bands;
import sliprung.protection.Edge;
import sliprung.starter.Device;
import sliprung.starter.Starter;

/**
 * Where a fuse takes over from an overload relay: the crossing of their middle curves.
 *
 * @param label both tags and the current
 * @param amps stator, RMS
 * @param seconds at it
 */
public record TakeOverMark(String label, double amps, double seconds) {
  private static final double LEAST_SHARE = 0.5;
  private static final double GREATEST_SHARE = 60.0;

  /** Of every pair of an overload relay and a fuse in the stator line whose middles cross. */
  static List<TakeOverMark> of(Starter starter) {
    Bands bands = new Bands(starter);
    List<TakeOverMark> marks = new ArrayList<>();
    double from = LEAST_SHARE * starter.motor().current();
    double to = GREATEST_SHARE * starter.motor().current();
    for (Device relay : starter.protection()) {
      for (Device fuse : starter.protection()) {
        boolean pair =
            relay instanceof Device.Overload
                && fuse instanceof Device.Fuse
                && relay.fitting().place() == Device.Place.STATOR
                && fuse.fitting().place() == Device.Place.STATOR;
        if (!pair) {
          continue;
        }
        OptionalDouble amps =
            bands.greatestFasterAmps(relay, Edge.MIDDLE, fuse, Edge.MIDDLE, from, to);
        if (amps.isPresent() && amps.getAsDouble() < to) {
          OptionalDouble seconds = bands.operatingSeconds(relay, Edge.MIDDLE, amps.getAsDouble());
          String label = fuse.tag() + " takes over from " + relay.tag();
          seconds.ifPresent(t -> marks.add(new TakeOverMark(label, amps.getAsDouble(), t)));
        }
      }
    }
    return marks;
  }
}
