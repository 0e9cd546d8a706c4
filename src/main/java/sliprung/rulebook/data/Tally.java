package sliprung.rulebook.data;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.DoubleFunction;
import sliprung.quantity.Show;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.FindingBuilder;
import sliprung.rulebook.Practice;
import sliprung.rulebook.Rule;

/**
 * Counts checks of plausibility and keeps what is out of the ordinary. A check holds a value
 * against a usual range of the practice's figures {@code plausible.NAME.least} and {@code .most};
 * one end may be missing.
 */
final class Tally {
  private final Facts facts;
  private final Rule.Info info;
  private final List<Finding> odd = new ArrayList<>();
  private int checks;

  Tally(Facts facts, Rule.Info info) {
    this.facts = facts;
    this.info = info;
  }

  Facts facts() {
    return facts;
  }

  /** Findings about what is out of the ordinary, in the order of the checks. */
  List<Finding> odd() {
    return List.copyOf(odd);
  }

  /** Number of checks made. */
  int checks() {
    return checks;
  }

  /**
   * One check; none where the value is not there.
   *
   * @param name of the figures
   * @param path of the input
   * @param value found; not a number counts as out of the ordinary
   * @param what the value is, such as {@code The rated slip}
   * @param show prints it
   * @param hint what is usually behind it
   */
  void check(
      String name,
      String path,
      OptionalDouble value,
      String what,
      DoubleFunction<String> show,
      String hint) {
    if (value.isEmpty()) {
      return;
    }
    checks++;
    double found = value.getAsDouble();
    OptionalDouble least = bound(name, ".least");
    OptionalDouble most = bound(name, ".most");
    boolean tooLittle = least.isPresent() && !(found >= least.getAsDouble());
    boolean tooMuch = most.isPresent() && !(found <= most.getAsDouble());
    if (!tooLittle && !tooMuch) {
      return;
    }
    double limit = tooLittle ? least.getAsDouble() : most.getAsDouble();
    FindingBuilder builder = FindingBuilder.of(facts, info, path);
    if (Double.isFinite(found)) {
      builder.margin(share(tooLittle ? found / limit : limit / found)).figures(found, limit, "");
    } else {
      builder.margin(0.0);
    }
    odd.add(
        builder
            .says(
                what
                    + " is "
                    + (Double.isFinite(found) ? show.apply(found) : "no number")
                    + "; usual is "
                    + usual(least, most, show)
                    + ".")
            .mend(hint)
            .byMargin());
  }

  /** A share below 1; where signs or a limit of nothing give none, 0. */
  private static double share(double ratio) {
    return ratio >= 0.0 && ratio < 1.0 ? ratio : 0.0;
  }

  /** The same with a plain ratio. */
  void ratio(String name, String path, OptionalDouble value, String what, String hint) {
    check(name, path, value, what, v -> Show.three(v) + " times", hint);
  }

  private OptionalDouble bound(String name, String end) {
    return facts
        .practice()
        .find("plausible." + name + end)
        .map(Practice.Figure::value)
        .map(OptionalDouble::of)
        .orElse(OptionalDouble.empty());
  }

  private static String usual(
      OptionalDouble least, OptionalDouble most, DoubleFunction<String> show) {
    if (least.isPresent() && most.isPresent()) {
      return show.apply(least.getAsDouble()) + " to " + show.apply(most.getAsDouble());
    }
    return least.isPresent()
        ? show.apply(least.getAsDouble()) + " or more"
        : show.apply(most.orElseThrow()) + " or less";
  }

  /** One over another where both are there. */
  static OptionalDouble over(OptionalDouble value, OptionalDouble base) {
    return value.isPresent() && base.isPresent()
        ? OptionalDouble.of(value.getAsDouble() / base.getAsDouble())
        : OptionalDouble.empty();
  }

  /** One over another. */
  static OptionalDouble over(double value, double base) {
    return OptionalDouble.of(value / base);
  }

  /** One over another where it is there. */
  static OptionalDouble over(OptionalDouble value, double base) {
    return value.isPresent()
        ? OptionalDouble.of(value.getAsDouble() / base)
        : OptionalDouble.empty();
  }
}
