package sliprung.starter;

/**
 * Air temperatures.
 *
 * @param motorCelsius around the motor, °C
 * @param panelCelsius around the relays, °C
 */
public record Ambient(double motorCelsius, double panelCelsius) {}
