package sliprung.rulebook.overload;

import java.util.Optional;
import sliprung.quantity.Show;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Practice;
import sliprung.starter.Device;
import sliprung.starter.Starter;

/**
 * The currents at which an overload relay trips in the end, at reference air: every compliant relay
 * at the greater, the most sensitive one at the lesser.
 *
 * @param dialAmps what is set
 * @param mostAmps every compliant relay has tripped in the end at this current, A
 * @param leastAmps none trips below this current, A
 * @param tag of the relay
 * @param means what the dial means; empty: another device that stands in for an overload relay
 */
record UltimateTrip(
    double dialAmps,
    double mostAmps,
    double leastAmps,
    String tag,
    Optional<Device.DialMeans> means) {

  /** Of one relay. */
  static UltimateTrip of(Device.Overload overload, Facts facts) {
    Practice practice = facts.practice();
    String kind = tripsLikeNema(overload, facts) ? "overload.nema-relay" : "overload.iec-relay";
    double trips = practice.figure(kind + ".trips-by").value();
    boolean warmPanel =
        facts.starter().ambient().panelCelsius()
            > practice.figure("overload.reference-celsius").value();
    double carries = practice.figure(kind + (warmPanel ? ".carries-warm" : ".carries")).value();
    boolean fullLoad = overload.dialMeans() == Device.DialMeans.FULL_LOAD;
    double most = fullLoad ? trips * overload.dialAmps() : overload.dialAmps();
    return new UltimateTrip(
        overload.dialAmps(),
        most,
        most * carries / trips,
        overload.tag(),
        Optional.of(overload.dialMeans()));
  }

  /** Under NFPA 70 a relay of a bare class may be made to either standard: the wider one counts. */
  private static boolean tripsLikeNema(Device.Overload overload, Facts facts) {
    return overload.tripClass().name().startsWith("nema")
        || facts.starter().practice() == Starter.Practice.NEC;
  }

  /** The dial that gives an ultimate trip of so many amperes. */
  double dialFor(double ultimateAmps) {
    return dialAmps * ultimateAmps / mostAmps;
  }

  /** {@code F2 is set to 208 A and trips in the end at 250 A, 1.20 times the rated 208 A.} */
  String sentence(double ratedAmps) {
    if (means.isEmpty()) {
      return "No overload relay is described; "
          + tag
          + " stands in for it and is sure to operate at "
          + Show.amps(mostAmps)
          + ", "
          + Show.ratio(mostAmps / ratedAmps)
          + " times the rated "
          + Show.amps(ratedAmps)
          + ".";
    }
    String set =
        means.get() == Device.DialMeans.FULL_LOAD
            ? tag
                + " is set to "
                + Show.amps(dialAmps)
                + " of full-load current and trips in the end at "
                + Show.amps(mostAmps)
            : tag + " is set to trip in the end at " + Show.amps(mostAmps);
    return set
        + ", "
        + Show.ratio(mostAmps / ratedAmps)
        + " times the rated "
        + Show.amps(ratedAmps)
        + ".";
  }
}
