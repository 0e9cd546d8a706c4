package sliprung.curve;

import java.util.OptionalDouble;

/**
 * What a standard pins of an overload trip class: a set of relays, not a curve.
 *
 * @param name as printed on relays: {@code 10A}, {@code 20}, {@code 10E}, {@code nema-20}
 * @param multiple multiple of the dial at which the cold trip time is limited: 7.2 (IEC) or 6.0
 *     (NEMA)
 * @param shortestSeconds least cold trip time at that multiple; empty where the class has none
 * @param longestSeconds greatest cold trip time at that multiple
 * @param warmLimitSeconds greatest trip time at 1.5 times the dial from balance at the dial
 *     current; empty where the standard gives none
 * @param reference standard, clause or table
 * @param mark {@code verified} or {@code from memory}
 */
public record TripClass(
    String name,
    double multiple,
    OptionalDouble shortestSeconds,
    double longestSeconds,
    OptionalDouble warmLimitSeconds,
    String reference,
    String mark) {}
