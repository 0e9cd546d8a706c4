package sliprung.sensitivity;

import java.util.function.DoubleFunction;
import sliprung.starter.EvidenceGrade;
import sliprung.starter.Starter;

/**
 * An input that may be off by what its evidence leaves open.
 *
 * @param path in the file, such as {@code load.inertia}
 * @param words with their article, such as {@code the load's inertia}
 * @param grade how well it is known; a default that was filled in counts as estimated
 * @param low least factor on its value
 * @param high greatest factor on its value
 * @param starter the starter with that factor on the value
 */
record UncertainInput(
    String path,
    String words,
    EvidenceGrade grade,
    double low,
    double high,
    DoubleFunction<Starter> starter) {

  /** The starter with the input at the low end of its spread. */
  Starter atLow() {
    return starter.apply(low);
  }

  /** The starter with the input at the high end of its spread. */
  Starter atHigh() {
    return starter.apply(high);
  }
}
