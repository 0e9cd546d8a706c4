package sliprung.record;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import sliprung.starter.EvidenceGrade;
import sliprung.starter.Starter;

/** Inputs as read, beside what they were taken for; the files with their hashes, and whole. */
final class InputsPart {
  private static final List<String> NOT_DATA =
      List.of("sliprung", "starter", "practice", "margins", "accepted", "evidence");

  private InputsPart() {}

  static void values(Html page, Dossier dossier) {
    if (dossier.values().isEmpty()) {
      return;
    }
    Starter starter = dossier.review().starter();
    page.section("inputs", "Inputs as read");
    Cells.abreast(
        page,
        "What the file says, what it was taken for, and how well it is known; a grade in"
            + " brackets was not stated",
        List.of("input", "as written", "#taken as", "evidence"),
        dossier.values().stream()
            .map(v -> List.of(v.path(), v.text(), taken(v), grade(starter, v.path())))
            .toList(),
        "dense inputs");
    page.end();
  }

  private static String taken(AsRead value) {
    if (value.value().isEmpty()) {
      return "";
    }
    double number = value.value().getAsDouble();
    String figure = exact(number);
    return value.unit().isEmpty() ? figure : figure + "\u00a0" + value.unit();
  }

  /** Every figure that was typed, none more: 12 digits swallow the last bits of a conversion. */
  private static String exact(double number) {
    java.math.BigDecimal rounded =
        java.math.BigDecimal.valueOf(number).round(new java.math.MathContext(12));
    if (number != 0.0 && (Math.abs(number) >= 1e9 || Math.abs(number) < 1e-6)) {
      return String.format(Locale.ROOT, "%.6g", number);
    }
    return rounded.signum() == 0 ? "0" : rounded.stripTrailingZeros().toPlainString();
  }

  /** The grade stated for the path or for what it lies in; else the usual one in brackets. */
  static String grade(Starter starter, String path) {
    String root = path.split("[.\\[]", 2)[0];
    if (NOT_DATA.contains(root)) {
      return "";
    }
    Optional<String> stated =
        starter.evidence().keySet().stream()
            .filter(p -> path.equals(p) || path.startsWith(p + ".") || path.startsWith(p + "["))
            .max(java.util.Comparator.comparingInt(String::length));
    EvidenceGrade usual = root.equals("motor") ? EvidenceGrade.PLATE : EvidenceGrade.DRAWING;
    return stated.map(p -> starter.evidence().get(p).word()).orElse("(" + usual.word() + ")");
  }

  static void files(Html page, Dossier dossier) {
    page.section("files", "Files and their hashes");
    page.element(
        "p",
        "This record was made by Sliprung "
            + dossier.program()
            + " at the date "
            + dossier.review().date()
            + " from these files alone. The same files, date and version give the same record:"
            + " sha256sum FILE shows whether a file is the one meant.");
    Cells cells = new Cells(page).open("SHA-256", List.of("file", "SHA-256"), "class", "hashes");
    dossier.inputs().forEach(f -> cells.row(f.name(), f.sha256()));
    cells.close();
    for (InputFile input : dossier.inputs()) {
      page.element("h3", input.name());
      page.element("pre", input.text());
    }
    page.end();
  }

  /** How many inputs bear which stated grade, for the title block. */
  static String weakest(Starter starter) {
    return starter.evidence().values().stream()
        .max(EvidenceGrade::compareTo)
        .map(g -> "weakest stated evidence: " + g.word())
        .orElse("no evidence stated");
  }
}
