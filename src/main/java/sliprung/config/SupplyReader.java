package sliprung.config;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import sliprung.quantity.Dimension;
import sliprung.starter.Supply;

/** Reads {@code supply}. */
final class SupplyReader {
  private SupplyReader() {}

  static Supply read(Section root) {
    Section supply =
        root.requiredSection(
            "supply", "{voltage: 690 V, …}", "voltage", "frequency", "band", "fault-current");
    double frequency = supply.number("frequency", Dimension.FREQUENCY, Range.POSITIVE);
    root.reading().supplyFrequency(frequency);
    double voltage = supply.number("voltage", Dimension.VOLTAGE, Range.POSITIVE);
    double[] band = pair(supply, "band", 0.10, "±10 %");
    OptionalDouble greatest = OptionalDouble.empty();
    OptionalDouble least = OptionalDouble.empty();
    Section fault = supply.sectionOrDefaults("fault-current", "max", "min");
    greatest = fault.optionalNumber("max", Dimension.CURRENT, Range.POSITIVE);
    least = fault.optionalNumber("min", Dimension.CURRENT, Range.POSITIVE);
    if (!fault.has("min")) {
      fault.assume("min", "an ideal source");
    }
    if (greatest.isPresent() && least.isPresent() && least.getAsDouble() > greatest.getAsDouble()) {
      fault
          .optional("min")
          .get()
          .mistake(
              "expected a least fault current of no more than the greatest, "
                  + fault.optional("max").get().value().found()
                  + ", but found "
                  + fault.optional("min").get().value().found());
    }
    return new Supply(voltage, frequency, band[0], band[1], greatest, least);
  }

  /**
   * Two differences such as {@code [-10 %, +10 %]}, low before high.
   *
   * @param usual size of the default to either side
   */
  static double[] pair(Section section, String key, double usual, String words) {
    Optional<Field> field = section.optional(key);
    if (field.isEmpty()) {
      section.assume(key, words);
      return new double[] {-usual, usual};
    }
    String expected = "two differences such as [-10 %, +10 %]";
    double[] none = {Double.NaN, Double.NaN};
    Optional<List<Field>> entries = field.get().list(expected);
    if (entries.isEmpty()) {
      return none;
    }
    if (entries.get().size() != 2) {
      field.get().mistake("expected " + expected + " but found a list of " + entries.get().size());
      return none;
    }
    double low = entries.get().get(0).number(Dimension.SHARE, Range.DIFFERENCE);
    double high = entries.get().get(1).number(Dimension.SHARE, Range.DIFFERENCE);
    if (low > high) {
      field
          .get()
          .mistake(
              "expected the lower difference first but found "
                  + entries.get().get(0).value().found()
                  + " before "
                  + entries.get().get(1).value().found());
    }
    return new double[] {low, high};
  }
}
