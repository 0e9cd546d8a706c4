package sliprung.config;

import java.io.IOException;
import java.io.InputStream;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.stream.Collectors;
import sliprung.curve.AmGates;
import sliprung.curve.CurveLibrary;
import sliprung.curve.InverseLaw;
import sliprung.curve.TripClass;
import sliprung.quantity.Dimension;

/** Reads the library of standard laws and gates that ships with the program. */
public final class CurveLibraryReader {
  private static final String FOLDER = "/sliprung/curves/";
  private static final String AM = "am-gates.yaml";
  private static final String GG = "gg-gates.yaml";
  private static final String IEC = "iec-inverse-time.yaml";
  private static final String IEEE = "ieee-inverse-time.yaml";
  private static final String TRIP = "trip-classes.yaml";

  private CurveLibraryReader() {}

  /** The files of the library, sorted. */
  public static List<String> fileNames() {
    return List.of(AM, GG, IEC, IEEE, TRIP);
  }

  /**
   * The library as shipped.
   *
   * @throws IllegalStateException if a shipped file is broken, which is a defect of the program
   */
  public static CurveLibrary builtIn() {
    SortedMap<String, InverseLaw> laws = new TreeMap<>();
    for (String file : List.of(IEC, IEEE)) {
      for (InverseLaw law : inverseLaws(open(file))) {
        if (laws.put(law.name(), law) != null) {
          throw new IllegalStateException(file + " has " + law.name() + " twice");
        }
      }
    }
    return new CurveLibrary(laws, tripClasses(open(TRIP)), ggTables().joined(), amGates(open(AM)));
  }

  /** The gG tables as shipped, ratings with gaps included. */
  static GgTables ggTables() {
    Section root = root(open(GG), "gates", "conventional", "pre-arcing", "standard");
    return checked(root, GgTables.read(root));
  }

  /** The text of a shipped file. */
  static SourceText open(String file) {
    try (InputStream in = CurveLibraryReader.class.getResourceAsStream(FOLDER + file)) {
      if (in == null) {
        throw new IllegalStateException("curve file " + file + " does not ship with the program");
      }
      SourceText.Decoded decoded = SourceText.decode("curves/" + file, in.readAllBytes());
      decoded
          .mistake()
          .ifPresent(
              m -> {
                throw new IllegalStateException(m.render());
              });
      return decoded.source();
    } catch (IOException e) {
      throw new IllegalStateException("curve file " + file + " cannot be read", e);
    }
  }

  private static Section root(SourceText source, String... keys) {
    Reading reading = new Reading(source);
    Optional<YamlNode> tree = YamlTree.compose(reading);
    Place start = new Place(source.name(), 1, 1);
    if (tree.isEmpty()) {
      return Section.silent(reading, "", start);
    }
    List<String> known = new ArrayList<>(List.of(keys));
    known.add("curves");
    Section root =
        new Field(reading, "", "", start, tree.get()).section(known.toArray(String[]::new));
    root.required("curves", "the version of the curve format", "1")
        .ifPresent(f -> StarterReader.version(f, "curve"));
    return root;
  }

  private static <T> T checked(Section root, T read) {
    if (root.reading().hasMistakes()) {
      throw new IllegalStateException(
          root.reading().diagnostics().stream()
              .map(Diagnostic::render)
              .collect(Collectors.joining("\n")));
    }
    return read;
  }

  static List<InverseLaw> inverseLaws(SourceText source) {
    Section root = root(source, "standard", "laws");
    String standard = root.text("standard", "a standard", "IEC 60255-151").orElse("");
    List<InverseLaw> laws = new ArrayList<>();
    for (Field entry : list(root, "laws")) {
      Section law = entry.section("name", "title", "k", "alpha", "c", "reset", "clause", "mark");
      laws.add(
          new InverseLaw(
              law.text("name", "a name", "iec-very-inverse").orElse(""),
              law.text("title", "a title", "IEC very inverse").orElse(""),
              law.number("k", Dimension.TIME, Range.POSITIVE),
              law.number("alpha", Dimension.NUMBER, Range.POSITIVE),
              law.number("c", Dimension.TIME, Range.NOT_NEGATIVE),
              law.optionalNumber("reset", Dimension.TIME, Range.POSITIVE),
              standard + ", " + law.text("clause", "a clause", "curve B").orElse(""),
              Provenance.mark(law, "mark")));
    }
    return checked(root, laws);
  }

  static SortedMap<String, TripClass> tripClasses(SourceText source) {
    Section root = root(source, "groups");
    SortedMap<String, TripClass> classes = new TreeMap<>();
    for (Field entry : list(root, "groups")) {
      Section group = entry.section("standard", "clause", "at", "warm-mark", "classes");
      for (Field row : list(group, "classes")) {
        TripClass read = tripClass(group, row);
        if (classes.put(read.name(), read) != null) {
          row.mistake("expected each class once but found " + read.name() + " again");
        }
      }
    }
    return checked(root, classes);
  }

  private static TripClass tripClass(Section group, Field row) {
    Section section = row.section("name", "shortest", "longest", "warm", "mark");
    OptionalDouble shortest = section.optionalNumber("shortest", Dimension.TIME, Range.POSITIVE);
    double longest = section.number("longest", Dimension.TIME, Range.POSITIVE);
    OptionalDouble warm = section.optionalNumber("warm", Dimension.TIME, Range.POSITIVE);
    if (shortest.isPresent() && !(shortest.getAsDouble() < longest)) {
      row.mistake("expected a shortest time below the longest");
    }
    String standard = group.text("standard", "a standard", "IEC 60947-4-1").orElse("");
    String clause = group.text("clause", "a clause", "table 2").orElse("");
    Provenance cold = new Provenance(standard + ", " + clause, Provenance.mark(section, "mark"));
    Provenance whole =
        warm.isEmpty()
            ? cold
            : new Provenance(cold.reference() + ", cold times", cold.mark())
                .and(new Provenance("warm limit", Provenance.mark(group, "warm-mark")));
    return new TripClass(
        section.text("name", "a name", "10A").orElse(""),
        group.number("at", Dimension.NUMBER, Range.ABOVE_ONE),
        shortest,
        longest,
        warm,
        whole.reference(),
        whole.mark());
  }

  static AmGates amGates(SourceText source) {
    Section root =
        root(source, "standard", "clause", "mark", "not-before", "cleared", "least-breaking");
    String reference =
        root.text("standard", "a standard", "IEC 60269-1").orElse("")
            + " "
            + root.text("clause", "a clause", "table 4").orElse("");
    AmGates gates =
        new AmGates(
            gates(root, "not-before"),
            gates(root, "cleared"),
            root.number("least-breaking", Dimension.NUMBER, Range.ABOVE_ONE),
            reference,
            Provenance.mark(root, "mark"));
    return checked(root, gates);
  }

  private static List<AmGates.Gate> gates(Section root, String key) {
    List<AmGates.Gate> gates = new ArrayList<>();
    for (Field entry : list(root, key)) {
      Section gate = entry.section("multiple", "time");
      AmGates.Gate read =
          new AmGates.Gate(
              gate.number("multiple", Dimension.NUMBER, Range.ABOVE_ONE),
              gate.number("time", Dimension.TIME, Range.POSITIVE));
      if (!gates.isEmpty()
          && (!(read.multiple() > gates.get(gates.size() - 1).multiple())
              || !(read.seconds() < gates.get(gates.size() - 1).seconds()))) {
        entry.mistake("expected rising multiples and falling times");
      }
      gates.add(read);
    }
    return gates;
  }

  private static List<Field> list(Section section, String key) {
    return section.required(key, "a list", "[]").flatMap(f -> f.list("a list")).orElse(List.of());
  }
}
