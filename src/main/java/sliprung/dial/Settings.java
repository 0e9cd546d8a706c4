package sliprung.dial;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import sliprung.starter.Starter;

/**
 * A starter with a value for each of its dials.
 *
 * @param starter as it is set today
 * @param dials of it
 * @param values of the dials, in their order
 */
record Settings(Starter starter, List<Dial> dials, List<Double> values) {

  /** Copies the lists. */
  Settings {
    dials = List.copyOf(dials);
    values = List.copyOf(values);
  }

  static Settings today(Starter starter, List<Dial> dials) {
    return new Settings(starter, dials, dials.stream().map(Dial::value).toList());
  }

  /** The starter so set. */
  Starter set() {
    Starter set = starter;
    for (int i = 0; i < dials.size(); i++) {
      set = dials.get(i).turned(set, values.get(i));
    }
    return set;
  }

  /** With one dial at another value. */
  Settings with(int dial, double value) {
    List<Double> other = new ArrayList<>(values);
    other.set(dial, value);
    return new Settings(starter, dials, other);
  }

  /** Each dial moved by a logarithm, within its range. */
  Settings moved(double[] logarithms) {
    List<Double> other = new ArrayList<>();
    for (int i = 0; i < values.size(); i++) {
      Dial dial = dials.get(i);
      other.add(
          Math.max(dial.low(), Math.min(dial.high(), values.get(i) * Math.exp(logarithms[i]))));
    }
    return new Settings(starter, dials, other);
  }

  /** Each dial at the nearest setting of its scale; one that has not moved stays as it is. */
  Settings onScale() {
    List<Double> other = new ArrayList<>();
    for (int i = 0; i < values.size(); i++) {
      Dial dial = dials.get(i);
      other.add(
          values.get(i) == dial.value() ? values.get(i) : (Double) dial.onScale(values.get(i)));
    }
    return new Settings(starter, dials, other);
  }

  /** How far each dial may still be moved down (negative) or up, as logarithms. */
  double[][] room(double most) {
    double[] down = new double[values.size()];
    double[] up = new double[values.size()];
    for (int i = 0; i < values.size(); i++) {
      double low = Math.max(dials.get(i).low(), 1e-6 * values.get(i));
      down[i] = Math.min(0.0, Math.max(-most, Math.log(low / values.get(i))));
      up[i] = Math.max(0.0, Math.min(most, Math.log(dials.get(i).high() / values.get(i))));
    }
    return new double[][] {down, up};
  }

  static double largest(double[] move) {
    return Arrays.stream(move).map(Math::abs).max().orElse(0.0);
  }
}
