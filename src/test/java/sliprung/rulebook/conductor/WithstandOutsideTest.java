package sliprung.rulebook.conductor;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Locale;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.TestFactory;
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
}
