package sliprung.rulebook.conductor;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.assertj.core.api.Assertions.withinPercentage;

import java.util.Locale;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.TestFactory;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import sliprung.outside.OutsideTable;
import sliprung.rulebook.Practice;
import sliprung.starter.Conductor;

/** Cables in a short circuit. */
@Tag("outside")
class WithstandOutsideTest {
  private static final Practice PRACTICE = Practice.named("iec");

  @TestFactory
  Stream<DynamicTest> adiabatic_withstand() {
    return OutsideTable.read("conductor-short-circuit")
        .tests(
            row -> {
              Conductor cable =
                  new Conductor(
                      row.number("area_mm2"),
                      Conductor.Metal.valueOf(row.text("metal").toUpperCase(Locale.ROOT)),
                      row.text("insulation"),
                      OptionalDouble.empty());
              Withstand withstand = Withstand.of(PRACTICE, cable).orElseThrow();
              double found =
                  switch (row.text("quantity")) {
                    case "area" ->
                        Withstand.leastSquareMillimetres(withstand.k(), row.number("argument"));
                    case "amps" -> withstand.amps(row.number("argument"));
                    default -> withstand.k();
                  };
              assertThat(found).isCloseTo(row.number("expected"), within(row.number("tolerance")));
            });
  }

  /** Circular mils in a square millimetre. */
  private static final double CIRCULAR_MILS = 1973.525;

  /**
   * ICEA P-32-382 by way of a cable specification sheet (V): A√s in a circular mil from 90 °C to
   * 250 °C, 0.07195 of copper and 0.0470 of aluminium. It is another standard than IEC 60364-4-43,
   * with its own constants of the metals, and no practice holds it: the two agree within two per
   * cent.
   */
  @ParameterizedTest
  @CsvSource({"COPPER, 0.07195", "ALUMINIUM, 0.0470"})
  void the_american_constant_of_crosslinked_insulation_is_the_same_k(
      Conductor.Metal metal, double perCircularMil) {
    Conductor cable = new Conductor(95, metal, "XLPE", OptionalDouble.empty());

    assertThat(Withstand.of(PRACTICE, cable).orElseThrow().k())
        .isCloseTo(perCircularMil * CIRCULAR_MILS, withinPercentage(2.0));
  }
}
