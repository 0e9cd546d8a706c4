package sliprung.starter;

import java.util.OptionalDouble;

/**
 * A circuit-breaker opened by relays.
 *
 * @param tag on the drawing
 * @param breakingAmps breaking capacity, RMS
 * @param openingSeconds order to the end of the arc
 */
public record Breaker(String tag, OptionalDouble breakingAmps, double openingSeconds) {}
