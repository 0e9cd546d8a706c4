package sliprung.quantity;

import java.util.List;

/**
 * What a quantity measures, the unit its value is kept in, and how people are shown one.
 *
 * <p>Values are kept in SI units but for three that the trade never writes so: speeds in 1/min,
 * areas in mm², temperatures in °C.
 */
public enum Dimension {
  /** Volts. */
  VOLTAGE("V", "a voltage", "690 V", "6.6 kV"),
  /** Amperes. */
  CURRENT("A", "a current", "208 A", "18 kA"),
  /** Watts. */
  POWER("W", "a power", "200 kW", "75 hp"),
  /** Seconds. */
  TIME("s", "a time", "2.5 s", "60 ms"),
  /** Hertz. */
  FREQUENCY("Hz", "a frequency", "50 Hz", "18 Hz"),
  /** Revolutions per minute. */
  SPEED("rpm", "a speed", "1478 rpm", "592 rpm"),
  /** Ohms. */
  RESISTANCE("Ω", "a resistance", "0.28 ohm", "12 mohm"),
  /** Newton metres. */
  TORQUE("N·m", "a torque", "700 N·m", "500 lb·ft"),
  /** Kilogram square metres. */
  INERTIA("kg·m²", "an inertia", "6 kg·m²", "60 lb·ft²"),
  /** Degrees Celsius. */
  TEMPERATURE("°C", "a temperature", "40 °C", "104 °F"),
  /** Kelvins of difference. */
  TEMPERATURE_RISE("K", "a temperature rise", "385 K", "385 °C"),
  /** Square millimetres. */
  AREA("mm²", "a conductor area", "120 mm2", "4/0 AWG"),
  /** Per unit. */
  SHARE("", "a share", "10 %", "-10 %"),
  /** A number without a unit. */
  NUMBER("", "a number without a unit", "2.8", "1");

  private final String unit;
  private final String words;
  private final List<String> examples;

  Dimension(String unit, String words, String... examples) {
    this.unit = unit;
    this.words = words;
    this.examples = List.of(examples);
  }

  /** Symbol of the unit in which a value is kept; empty for a share, per unit, and a number. */
  public String unit() {
    return unit;
  }

  /** With its article: {@code a voltage}. */
  public String words() {
    return words;
  }

  /** Two well-formed examples. */
  public List<String> examples() {
    return examples;
  }
}
