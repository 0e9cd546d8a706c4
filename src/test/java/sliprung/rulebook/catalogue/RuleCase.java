package sliprung.rulebook.catalogue;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;
import sliprung.config.CurveFiles;
import sliprung.config.CurveLibraryReader;
import sliprung.config.StarterReader;
import sliprung.config.StarterReading;
import sliprung.curve.CurveLibrary;
import sliprung.fixture.CrusherFacts;
import sliprung.fixture.StarterText;
import sliprung.fixture.WithoutPeaks;
import sliprung.machine.Identification;
import sliprung.machine.NameplateIdentification;
import sliprung.protection.Bands;
import sliprung.review.Reviewer;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Practice;
import sliprung.rulebook.Rule;
import sliprung.rulebook.RuleBook;
import sliprung.starter.Contactor;
import sliprung.starter.Starter;

/**
 * One case of one rule: a starter, and the verdict that the rule gives of a subject of it.
 *
 * @param rule {@code family/slug}
 * @param kind what it is a case of
 * @param base starter that is edited: {@code crusher} or {@code small}, with every start computed;
 *     behind it {@code bare}: without any start, {@code peakless}: without closing peaks, {@code
 *     lineless}, {@code stepless}, {@code gearless}: bare, without line, step or any contactor
 * @param edits replaced and replacing text, in turn
 * @param subject that the finding is about; {@code *} for the worst of all
 * @param expected verdict by name; {@code NONE} where the rule says nothing of it
 * @param turns figures of the practice that turn the verdict when moved by one per cent; behind a
 *     figure {@code +} or {@code -} where raising or lowering it alone does
 */
record RuleCase(
    String rule,
    Kind kind,
    String base,
    List<String> edits,
    String subject,
    String expected,
    List<String> turns) {

  /** What a case shows. */
  enum Kind {
    PASSES,
    FAILS,
    INSIDE,
    OUTSIDE,
    MISSING,
    NOT_APPLICABLE;

    /** As the registry writes it. */
    String word() {
      return name().toLowerCase(Locale.ROOT).replace('_', '-');
    }
  }

  private static final CurveLibrary LIBRARY = CurveLibraryReader.builtIn();
  private static final CurveFiles CURVES =
      CurveFiles.stored(
          Map.of(
              "own.yaml",
              """
              curve: 1
              title: relay of the tests
              source: invented
              currents: multiples
              fast:
                - [1.05, 30 min]
                - [1.5, 100 s]
                - [8, 6 s]
              slow:
                - [1.2, 30 min]
                - [1.5, 200 s]
                - [8, 9 s]
              """
                  .getBytes(StandardCharsets.UTF_8)));

  /** Reads a line of the registry: seven cells between bars, the last three may be shorter. */
  static RuleCase of(String line) {
    String[] cells = line.split("\\|", -1);
    if (cells.length < 6) {
      throw new IllegalArgumentException("six cells expected in: " + line);
    }
    return new RuleCase(
        cells[0].strip(),
        Kind.valueOf(cells[1].strip().toUpperCase(Locale.ROOT).replace('-', '_')),
        cells[2].strip(),
        edits(cells[3]),
        cells[4].strip(),
        cells[5].strip(),
        cells.length > 6 && !cells[6].isBlank()
            ? List.of(cells[6].strip().split("\\s+"))
            : List.of());
  }

  static List<String> edits(String cell) {
    List<String> edits = new ArrayList<>();
    if (!cell.isBlank()) {
      for (String edit : cell.split(" && ", -1)) {
        String[] sides = edit.split("->", 2);
        edits.add(sides[0].replace("\\n", "\n"));
        edits.add(sides[1].replace("\\n", "\n"));
      }
    }
    return List.copyOf(edits);
  }

  /** What all cases of one starter share: facts computed once, kept no longer than needed. */
  String starterKey() {
    return base + "\n" + String.join("\n", edits);
  }

  /**
   * What the rule says.
   *
   * @param verdict with the practice that the starter names
   * @param moved verdict with one figure moved by one per cent, by its key with + or - behind it
   */
  record Outcome(String verdict, Map<String, String> moved) {}

  /** Judges, with the practice as it is and with each figure of the case moved either way. */
  Outcome judge(Facts facts) {
    Map<String, String> moved = new TreeMap<>();
    for (String turn : turns) {
      String key = turn.replaceAll("[+-]$", "");
      Practice.Figure figure = facts.practice().figure(key);
      moved.put(key + "+", verdict(with(facts, 1.01, figure)));
      moved.put(key + "-", verdict(with(facts, 0.99, figure)));
    }
    return new Outcome(verdict(facts), moved);
  }

  private String verdict(Facts facts) {
    return findings(facts).stream()
        .filter(this::about)
        .map(f -> f.verdict())
        .sorted()
        .map(Enum::name)
        .findFirst()
        .orElse("NONE");
  }

  private boolean about(Finding finding) {
    return finding.rule().equals(rule)
        && (subject.equals("*") || finding.subject().equals(subject));
  }

  private List<Finding> findings(Facts facts) {
    for (Rule asked : Catalogue.rules()) {
      if (asked.info().name().equals(rule)) {
        return CrusherFacts.findings(asked, facts);
      }
    }
    // The two that the engine answers itself.
    return new RuleBook(Catalogue.rules()).ask(facts, StarterText.DAY).findings();
  }

  /** Facts of the edited starter. */
  Facts compute() {
    String[] pieces = edits.toArray(String[]::new);
    switch (base) {
      case "crusher lineless":
        return CrusherFacts.withContactors(c -> c.place() != Contactor.Place.LINE, pieces);
      case "crusher stepless":
        return CrusherFacts.withContactors(c -> c.place() == Contactor.Place.LINE, pieces);
      case "crusher gearless":
        return CrusherFacts.withContactors(c -> false, pieces);
      default:
        return read();
    }
  }

  private Facts read() {
    Starter starter = starter();
    Identification identification = NameplateIdentification.identify(starter.motor()).get(0);
    if (base.endsWith(" bare")) {
      return new Facts(
          starter,
          Practice.named(starter.practice().name().toLowerCase(Locale.ROOT)),
          Reviewer.machine(starter, identification),
          identification,
          List.of(),
          Map.of(),
          Map.of(),
          new Bands(starter));
    }
    Facts facts =
        Reviewer.facts(starter, Reviewer.machine(starter, identification), identification, "");
    return base.endsWith(" peakless") ? WithoutPeaks.of(facts) : facts;
  }

  private Starter starter() {
    String text = base.startsWith("crusher") ? CrusherFacts.TEXT : StarterText.small().yaml();
    for (int i = 0; i < edits.size(); i += 2) {
      if (!text.contains(edits.get(i))) {
        throw new IllegalArgumentException("not in the text of " + base + ": " + edits.get(i));
      }
      text = text.replace(edits.get(i), edits.get(i + 1));
    }
    StarterReading reading =
        new StarterReader(LIBRARY, Catalogue.names()).read("case.yaml", text, CURVES);
    return reading
        .described()
        .orElseThrow(() -> new IllegalArgumentException(reading.diagnostics().toString()))
        .starter();
  }

  private static Facts with(Facts facts, double factor, Practice.Figure figure) {
    return new Facts(
        facts.starter(),
        facts.practice().with(figure.key(), factor * figure.value()),
        facts.machine(),
        facts.identification(),
        facts.starts(),
        facts.running(),
        facts.fastPickUps(),
        facts.bands());
  }

  @Override
  public String toString() {
    return rule + " " + kind.word() + " " + base + " " + edits;
  }
}
