package sliprung.config;

/**
 * Where a figure of the curve library comes from.
 *
 * @param reference standard with table or clause
 * @param mark {@code verified} or {@code from memory}
 */
record Provenance(String reference, String mark) {
  private static final String VERIFIED = "verified";
  private static final String FROM_MEMORY = "from memory";

  /** A row with its mark, and its own clause or that of its table. */
  static Provenance read(Section row, String standard, Section table) {
    String own =
        row.optional("clause")
            .flatMap(f -> f.text("a clause"))
            .orElseGet(
                () -> standard + " " + table.text("clause", "a clause", "table 3").orElse(""));
    return new Provenance(own, mark(row, "mark"));
  }

  static String mark(Section row, String key) {
    return row.choice(key, Words.inOrder(VERIFIED, VERIFIED, FROM_MEMORY, FROM_MEMORY))
        .orElse(FROM_MEMORY);
  }

  /** Both together are only as good as the weaker; the reference says which is which. */
  Provenance and(Provenance other) {
    return new Provenance(
        marked(this) + "; " + marked(other),
        mark.equals(VERIFIED) && other.mark.equals(VERIFIED) ? VERIFIED : FROM_MEMORY);
  }

  private static String marked(Provenance p) {
    return p.reference().endsWith(")") ? p.reference() : p.reference() + " (" + p.mark() + ")";
  }
}
