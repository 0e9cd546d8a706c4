package sliprung.config;

import java.util.OptionalDouble;

/**
 * One value of a starter file as it was typed, and what it was taken for.
 *
 * @param path from the root, such as {@code steps[2].after}
 * @param text as typed
 * @param value in the unit; empty for words
 * @param unit in which the value is kept; empty for a share (per unit), a number, and words
 */
public record ReadValue(String path, String text, OptionalDouble value, String unit) {}
