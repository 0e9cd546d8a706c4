package sliprung.starter;

/**
 * A default that was filled in because the file does not say.
 *
 * @param path of the missing key, such as {@code supply.band}
 * @param value the default as text, such as {@code ±10 %}
 */
public record Assumption(String path, String value) {}
