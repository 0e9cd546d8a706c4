package sliprung.rulebook.conductor;

import java.util.Locale;
import java.util.Optional;
import sliprung.rulebook.Practice;
import sliprung.starter.Conductor;

/**
 * Adiabatic withstand of a cable, {@code I²t ≤ k²S²} (IEC 60364-4-43, 434.5.2).
 *
 * @param k A·√s/mm²
 * @param squareMillimetres area
 */
record Withstand(double k, double squareMillimetres) {

  /** Of a conductor; empty for an insulation without a figure. */
  static Optional<Withstand> of(Practice practice, Conductor conductor) {
    String metal = conductor.metal().name().toLowerCase(Locale.ROOT);
    String insulation = conductor.insulation().trim().toUpperCase(Locale.ROOT);
    boolean large =
        conductor.squareMillimetres() > practice.figure("conductor.large-above").value();
    String key = "k." + metal + "." + insulation;
    return (large ? practice.find(key + ".large") : Optional.<Practice.Figure>empty())
        .or(() -> practice.find(key))
        .map(f -> new Withstand(f.value(), conductor.squareMillimetres()));
  }

  /** A²s. */
  double jouleIntegral() {
    double root = k * squareMillimetres;
    return root * root;
  }

  /** Greatest current for a time, A; up to 5 s. */
  double amps(double seconds) {
    return k * squareMillimetres / Math.sqrt(seconds);
  }

  /** Least area for a let-through, mm². */
  static double leastSquareMillimetres(double k, double jouleIntegral) {
    return Math.sqrt(jouleIntegral) / k;
  }
}
