package sliprung.config;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import sliprung.starter.Assumption;
import sliprung.starter.DialScale;

/** What one reading of a file gathers: mistakes, places, defaults filled in. */
final class Reading {
  private final SourceText source;
  private final Set<Diagnostic> diagnostics = new LinkedHashSet<>();
  private final Map<String, Place> places = new TreeMap<>();
  private final Set<String> knownPaths = new TreeSet<>();
  private final Map<String, ReadValue> values = new LinkedHashMap<>();
  private final List<Assumption> assumptions = new ArrayList<>();
  private final List<String> notYetJudged = new ArrayList<>();
  private final Map<String, DialScale> dialScales = new TreeMap<>();
  private OptionalDouble supplyHertz = OptionalDouble.empty();
  private boolean readsCycles = false;

  Reading(SourceText source) {
    this.source = source;
  }

  SourceText source() {
    return source;
  }

  void mistake(Place place, String path, String message) {
    mistake(place, path, message, Optional.empty());
  }

  void mistake(Place place, String path, String message, Optional<String> hint) {
    diagnostics.add(new Diagnostic(place, path, message, hint, source.line(place.line())));
  }

  /** Takes over a mistake of another file. */
  void add(Diagnostic diagnostic) {
    diagnostics.add(diagnostic);
  }

  void keep(String path, Place place) {
    places.put(path, place);
  }

  /** Puts a value on record; the last reading of a path stands. */
  void read(ReadValue value) {
    values.put(value.path(), value);
  }

  void know(String path) {
    knownPaths.add(path);
  }

  void assume(String path, String value) {
    assumptions.add(new Assumption(path, value));
  }

  void notYetJudged(String path) {
    notYetJudged.add(path);
  }

  /** The number that was read at a path; empty where there is none or it was a mistake. */
  OptionalDouble number(String path) {
    ReadValue read = values.get(path);
    return read == null ? OptionalDouble.empty() : read.value();
  }

  void dialScale(String dial, DialScale scale) {
    dialScales.put(dial, scale);
  }

  Map<String, DialScale> dialScales() {
    return dialScales;
  }

  /** From now on times may be given in cycles; NaN: the supply frequency was a mistake. */
  void supplyFrequency(double hertz) {
    readsCycles = true;
    supplyHertz = Double.isNaN(hertz) ? OptionalDouble.empty() : OptionalDouble.of(hertz);
  }

  OptionalDouble supplyHertz() {
    return supplyHertz;
  }

  /** Whether cycles cannot be converted only because the supply frequency was a mistake itself. */
  boolean frequencyUnreadable() {
    return readsCycles && supplyHertz.isEmpty();
  }

  boolean hasMistakes() {
    return !diagnostics.isEmpty();
  }

  /** By place. */
  List<Diagnostic> diagnostics() {
    return diagnostics.stream()
        .sorted(Comparator.comparing(Diagnostic::place).thenComparing(Diagnostic::path))
        .toList();
  }

  Map<String, Place> places() {
    return Map.copyOf(places);
  }

  /** What was read, in the order of the file. */
  List<ReadValue> values() {
    Place first = new Place(source.name(), 1, 1);
    return values.values().stream()
        .sorted(Comparator.comparing(v -> places.getOrDefault(v.path(), first)))
        .toList();
  }

  Optional<Place> place(String path) {
    return Optional.ofNullable(places.get(path));
  }

  Set<String> knownPaths() {
    return knownPaths;
  }

  List<Assumption> assumptions() {
    return List.copyOf(assumptions);
  }

  List<String> notYetJudged() {
    return List.copyOf(notYetJudged);
  }
}
