package sliprung.curve;

import java.util.Map;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;

/**
 * The laws and gates that a starter file may name.
 *
 * @param inverse inverse-time laws by name
 * @param tripClasses overload trip classes by name
 * @param gg gG fuse-links by rated current in amperes
 * @param am aM gates, as multiples of the rated current
 */
public record CurveLibrary(
    SortedMap<String, InverseLaw> inverse,
    SortedMap<String, TripClass> tripClasses,
    SortedMap<Double, FuseGates> gg,
    AmGates am) {

  /** Copies the maps. */
  public CurveLibrary {
    inverse = new TreeMap<>(inverse);
    tripClasses = new TreeMap<>(tripClasses);
    gg = new TreeMap<>(gg);
  }

  /** The law of that name. */
  public Optional<InverseLaw> inverseLaw(String name) {
    return Optional.ofNullable(inverse.get(name));
  }

  /** The trip class of that name. */
  public Optional<TripClass> tripClass(String name) {
    return Optional.ofNullable(tripClasses.get(name));
  }

  /** The gG gates of that rated current in amperes. */
  public Optional<FuseGates> ggGates(double ratingAmps) {
    return Optional.ofNullable(((Map<Double, FuseGates>) gg).get(ratingAmps));
  }
}
