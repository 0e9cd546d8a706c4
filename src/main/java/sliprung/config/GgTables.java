package sliprung.config;

import java.util.List;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;
import sliprung.curve.FuseGates;
import sliprung.quantity.Dimension;

/**
 * The three tables that pin a gG fuse-link, each as its standard gives it. A rating joins them only
 * where all three know it.
 *
 * @param gates by rating in A
 * @param conventional by the greatest rating in A of each row
 * @param preArcing by rating in A
 */
record GgTables(
    SortedMap<Double, Gates> gates,
    SortedMap<Double, Conventional> conventional,
    SortedMap<Double, PreArcing> preArcing) {

  /** RMS amperes: does not melt within 10 s, melts within 5 s; the same for 0.1 s. */
  record Gates(
      double notIn10s, double in5s, double notIn100ms, double in100ms, Provenance provenance) {}

  /** Multiples of the rating, and the conventional time in seconds. */
  record Conventional(double nonFusing, double fusing, double seconds, Provenance provenance) {}

  /** Pre-arcing Joule integral at 0.01 s, A²s. */
  record PreArcing(double least, double greatest, Provenance provenance) {}

  static GgTables read(Section root) {
    String standard = root.text("standard", "a standard", "IEC 60269-1").orElse("");
    SortedMap<Double, Gates> gates = new TreeMap<>();
    SortedMap<Double, Conventional> conventional = new TreeMap<>();
    SortedMap<Double, PreArcing> preArcing = new TreeMap<>();
    Section gateTable = root.requiredSection("gates", "{…}", "clause", "ratings");
    for (Section row :
        rows(
            gateTable,
            "ratings",
            "rating",
            "not-in-10s",
            "in-5s",
            "not-in-100ms",
            "in-100ms",
            "mark",
            "clause")) {
      Gates read =
          new Gates(
              amps(row, "not-in-10s"),
              amps(row, "in-5s"),
              amps(row, "not-in-100ms"),
              amps(row, "in-100ms"),
              Provenance.read(row, standard, gateTable));
      rising(row, read.notIn10s(), read.in5s());
      rising(row, read.notIn100ms(), read.in100ms());
      put(gates, row, "rating", read);
    }
    Section conventionalTable = root.requiredSection("conventional", "{…}", "clause", "rows");
    for (Section row :
        rows(
            conventionalTable, "rows", "up-to", "non-fusing", "fusing", "time", "mark", "clause")) {
      Conventional read =
          new Conventional(
              row.number("non-fusing", Dimension.NUMBER, Range.ABOVE_ONE),
              row.number("fusing", Dimension.NUMBER, Range.ABOVE_ONE),
              row.number("time", Dimension.TIME, Range.POSITIVE),
              Provenance.read(row, standard, conventionalTable));
      rising(row, read.nonFusing(), read.fusing());
      put(conventional, row, "up-to", read);
    }
    Section preArcingTable = root.requiredSection("pre-arcing", "{…}", "clause", "ratings");
    for (Section row :
        rows(preArcingTable, "ratings", "rating", "least", "greatest", "mark", "clause")) {
      PreArcing read =
          new PreArcing(
              row.number("least", Dimension.NUMBER, Range.POSITIVE),
              row.number("greatest", Dimension.NUMBER, Range.POSITIVE),
              Provenance.read(row, standard, preArcingTable));
      rising(row, read.least(), read.greatest());
      put(preArcing, row, "rating", read);
    }
    return new GgTables(gates, conventional, preArcing);
  }

  private static List<Section> rows(Section table, String key, String... known) {
    return table
        .required(key, "a list of rows", "[]")
        .flatMap(f -> f.list("a list of rows"))
        .orElse(List.of())
        .stream()
        .map(f -> f.section(known))
        .toList();
  }

  private static double amps(Section row, String key) {
    return row.number(key, Dimension.CURRENT, Range.POSITIVE);
  }

  private static void rising(Section row, double low, double high) {
    if (!(low < high)) {
      row.reading()
          .mistake(
              row.place(), row.path(), "expected rising values but found " + low + ", " + high);
    }
  }

  private static <T> void put(SortedMap<Double, T> table, Section row, String key, T read) {
    double rating = amps(row, key);
    if (!table.isEmpty() && !(rating > table.lastKey())) {
      row.reading().mistake(row.place(), row.path(), "expected rising ratings but found " + rating);
    }
    table.put(rating, read);
  }

  /** The row of Table 2 that holds for a rating in A. */
  Optional<Conventional> conventionalOf(double rating) {
    SortedMap<Double, Conventional> from = conventional.tailMap(rating);
    return from.isEmpty() ? Optional.empty() : Optional.of(from.get(from.firstKey()));
  }

  /** Every rating that all three tables know. */
  SortedMap<Double, FuseGates> joined() {
    SortedMap<Double, FuseGates> all = new TreeMap<>();
    for (double rating : gates.keySet()) {
      Optional<Conventional> row = conventionalOf(rating);
      PreArcing joule = preArcing.get(rating);
      if (row.isEmpty() || joule == null) {
        continue;
      }
      Gates gate = gates.get(rating);
      Provenance whole = gate.provenance().and(row.get().provenance()).and(joule.provenance());
      all.put(
          rating,
          new FuseGates(
              rating,
              gate.notIn10s(),
              gate.in5s(),
              gate.notIn100ms(),
              gate.in100ms(),
              joule.least(),
              joule.greatest(),
              row.get().nonFusing() * rating,
              row.get().fusing() * rating,
              row.get().seconds(),
              whole.reference(),
              whole.mark()));
    }
    return all;
  }
}
