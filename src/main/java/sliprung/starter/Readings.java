package sliprung.starter;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.OptionalDouble;

/**
 * What a stopwatch and a clamp meter read in one start of the real starter.
 *
 * @param runUpSeconds from closing the line until the motor runs at full speed with every step
 *     closed
 * @param runningAmps stator current once it runs under its load, A RMS
 * @param ampsBefore stator current just before a step contactor closes, A RMS, by its tag
 * @param volts line to line while it started, V
 * @param clock accuracy of the stopwatch, per unit, and never better than {@link
 *     #LEAST_CLOCK_SECONDS}
 * @param clamp accuracy of the clamp meter, per unit
 */
public record Readings(
    OptionalDouble runUpSeconds,
    OptionalDouble runningAmps,
    Map<String, Double> ampsBefore,
    double volts,
    double clock,
    double clamp) {
  /** A hand on a stopwatch is no quicker, s (ours). */
  public static final double LEAST_CLOCK_SECONDS = 0.2;

  /** Accuracy of a stopwatch where the file is silent, per unit (ours). */
  public static final double USUAL_CLOCK = 0.02;

  /** Accuracy of a clamp meter on a current that does not rest, per unit (ours). */
  public static final double USUAL_CLAMP = 0.05;

  /** Copies the map. */
  public Readings {
    ampsBefore = Collections.unmodifiableMap(new LinkedHashMap<>(ampsBefore));
  }

  /** How far the run-up time may be off either way, s. */
  public double clockSeconds() {
    return Math.max(LEAST_CLOCK_SECONDS, clock * runUpSeconds.orElse(0.0));
  }
}
