package sliprung.quantity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;

class QuantityTest {

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "690 V | VOLTAGE | 690",
        "6.6 kV | VOLTAGE | 6600",
        "690V | VOLTAGE | 690",
        "208 A | CURRENT | 208",
        "18 kA | CURRENT | 18000",
        "200 kW | POWER | 200000",
        "1.25 MW | POWER | 1250000",
        "75 hp | POWER | 55927.5",
        "2.5 s | TIME | 2.5",
        "60 ms | TIME | 0.06",
        "0 ms | TIME | 0",
        "30 min | TIME | 1800",
        "2 h | TIME | 7200",
        "50 Hz | FREQUENCY | 50",
        "1478 rpm | SPEED | 1478",
        "1478 1/min | SPEED | 1478",
        "1 478 rpm | SPEED | 1478",
        "1\u00a0478 rpm | SPEED | 1478",
        "0.28 ohm | RESISTANCE | 0.28",
        "12 mohm | RESISTANCE | 0.012",
        "12 mΩ | RESISTANCE | 0.012",
        "0.28 \u2126 | RESISTANCE | 0.28",
        "700 N·m | TORQUE | 700",
        "700 N.m | TORQUE | 700",
        "700 Nm | TORQUE | 700",
        "1.5 kN·m | TORQUE | 1500",
        "6 kg·m² | INERTIA | 6",
        "6 kg·m2 | INERTIA | 6",
        "6 kgm2 | INERTIA | 6",
        "6 kgm² | INERTIA | 6",
        "40 °C | TEMPERATURE | 40",
        "40 C | TEMPERATURE | 40",
        "-5 °C | TEMPERATURE | -5",
        "\u22125 °C | TEMPERATURE | -5",
        "385 K | TEMPERATURE_RISE | 385",
        "385 °C | TEMPERATURE_RISE | 385",
        "120 mm2 | AREA | 120",
        "120 mm² | AREA | 120",
        "10 % | SHARE | 0.1",
        "94.5 % | SHARE | 0.945",
        "-10% | SHARE | -0.1",
        "+10 % | SHARE | 0.1",
        "2.8 | NUMBER | 2.8",
        "1e3 A | CURRENT | 1000"
      })
  void a_quantity_is_read_in_the_unit_of_its_dimension(
      String text, Dimension dimension, double expected) {
    assertThat(Quantity.parse(text, dimension).value()).hasValue(expected);
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        // 1 lb = 0.45359237 kg, 1 ft = 0.3048 m, g = 9.80665 m/s²: definitions
        "60 lb·ft² | INERTIA | 2.528407",
        "60 lb.ft2 | INERTIA | 2.528407",
        "60 lb-ft2 | INERTIA | 2.528407",
        "100 lb·ft | TORQUE | 135.58179",
        "100 ft·lb | TORQUE | 135.58179",
        "100 ft-lb | TORQUE | 135.58179",
        "120 lb-in | TORQUE | 13.558179",
        // 1 circular mil is the area of a circle of 0.001 inch
        "500 kcmil | AREA | 253.35374",
        // 4/0 is 0.4600 inch across
        "4/0 AWG | AREA | 107.219",
        "1/0 AWG | AREA | 53.475",
        // AWG 36 is 0.005 inch across
        "36 AWG | AREA | 0.0126677",
        "104 °F | TEMPERATURE | 40",
        "104 F | TEMPERATURE | 40",
        "90 °F | TEMPERATURE_RISE | 50"
      })
  void customary_units_are_converted(String text, Dimension dimension, double expected) {
    assertThat(Quantity.parse(text, dimension).value().getAsDouble())
        .isCloseTo(expected, within(2e-5 * expected));
  }

  @Test
  void cycles_are_a_time_at_the_supply_frequency() {
    assertThat(Quantity.parse("30 cycles", Dimension.TIME, OptionalDouble.of(60.0)).value())
        .hasValue(0.5);
    assertThat(Quantity.parse("30 cycles", Dimension.TIME).mistake().get().found())
        .isEqualTo("'30 cycles', and no supply frequency");
    assertThat(Quantity.parse("30 cycles", Dimension.CURRENT).mistake().get().found())
        .isEqualTo("a time, '30 cycles'");
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      quoteCharacter = '"',
      value = {
        "690 A | VOLTAGE | a current, '690 A'",
        "690 | VOLTAGE | a number without a unit, '690'",
        "690 Vlt | VOLTAGE | the unknown unit 'Vlt' in '690 Vlt'",
        "abc | VOLTAGE | 'abc'",
        "V | VOLTAGE | 'V'",
        "2,5 s | TIME | '2,5 s'",
        "1,000 A | CURRENT | '1,000 A'",
        "200 kw | POWER | '200 kw'",
        "200 mW | POWER | '200 mW'",
        "1e999 A | CURRENT | '1e999 A', which is beyond any number",
        "NaN A | CURRENT | 'NaN A'",
        "0x10 A | CURRENT | the unknown unit 'x10 A' in '0x10 A'",
        "5 % | NUMBER | a share, '5 %'",
        "4/0 AWG | CURRENT | a conductor area, '4/0 AWG'",
        "12 34 A | CURRENT | the unknown unit '34 A' in '12 34 A'"
      })
  void a_mistake_says_what_was_found(String text, Dimension dimension, String found) {
    Quantity.Parsed parsed = Quantity.parse(text, dimension);

    assertThat(parsed.value()).isEmpty();
    assertThat(parsed.mistake().get().found()).isEqualTo(found);
    assertThat(parsed.mistake().get().expected()).isEqualTo(dimension.words());
    assertThat(parsed.mistake().get().hint()).isNotBlank();
  }

  @Test
  void capitals_count_and_the_hint_says_so() {
    assertThat(Quantity.parse("200 kw", Dimension.POWER).mistake().get().hint())
        .isEqualTo("capitals count in units: write 'kW'");
  }

  @Test
  void a_message_stays_one_short_line_without_control_characters() {
    String nasty = "1\u001b[31m\n\u202e" + "x".repeat(500);
    String found = Quantity.parse(nasty, Dimension.VOLTAGE).mistake().get().found();

    assertThat(found.length()).isLessThan(160);
    assertThat(found).doesNotContainPattern("\\p{C}");
  }

  @ParameterizedTest
  @EnumSource(Dimension.class)
  void the_examples_of_a_dimension_are_well_formed(Dimension dimension) {
    for (String example : dimension.examples()) {
      assertThat(Quantity.parse(example, dimension).value()).as(example).isPresent();
    }
  }
}
