package sliprung.record;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;
import java.util.function.Predicate;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import sliprung.quantity.Show;
import sliprung.review.Review;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Practice;
import sliprung.starter.Device;
import sliprung.starter.Starter;

/** The figures of the practice that this review was held against, each with clause and mark. */
final class PracticePart {
  private static final String WANTED = "wanted.";

  /** Ranges behind data/plausible: ours, some eighty, and none of them decides a margin. */
  private static final String PLAUSIBLE = "plausible.";

  /** A plate of 480 V or 440 V is read in the column of 460 V. */
  private static final double NEAR = 0.12;

  private PracticePart() {}

  static void write(Html page, Review review) {
    String name = review.starter().practice().name().toLowerCase(Locale.ROOT);
    page.section("practice", "Figures of the practice");
    List<Practice.Figure> used = used(review, Practice.named(name)).toList();
    Cells cells =
        new Cells(page)
            .open(
                "Practice "
                    + name
                    + ": the standards' figures as far as they concern this starter; a table of a"
                    + " standard stands in one row; a mark says who has seen the figure in its"
                    + " source",
                List.of("figure", "value", "clause", "mark"),
                "class",
                "dense practice");
    families(used.stream().filter(f -> !isWanted(f))).forEach(f -> row(cells, f));
    cells.close();
    Cells.abreast(
        page,
        "Wanted margins of the rules that were asked",
        List.of("rule", "#wanted", "of what", "mark"),
        used.stream()
            .filter(PracticePart::isWanted)
            .map(
                f ->
                    List.of(
                        f.key().substring(WANTED.length()),
                        Show.three(f.value()),
                        f.clause(),
                        f.mark()))
            .toList(),
        "dense wanted");
    page.end();
  }

  private static void row(Cells cells, List<Practice.Figure> family) {
    Practice.Figure first = family.get(0);
    boolean one = family.size() == 1;
    cells.row(
        one ? first.key() : family(first),
        one
            ? Show.three(first.value())
            : family.stream().map(PracticePart::member).collect(Collectors.joining(" · ")),
        first.clause(),
        first.mark());
  }

  /** Name and value in a row of its family; a rating that names itself stands once. */
  private static String member(Practice.Figure figure) {
    String name = figure.key().substring(family(figure).length() + 1);
    String value = Show.three(figure.value());
    return Show.three(figure.value()).replace("\u00a0", "").equals(name)
        ? name
        : name + ":\u00a0" + value;
  }

  private static String family(Practice.Figure figure) {
    return figure.key().split("\\.", 2)[0];
  }

  /** Figures of a table of a standard together, where clause and mark are the same. */
  private static List<List<Practice.Figure>> families(Stream<Practice.Figure> figures) {
    return List.copyOf(
        figures
            .collect(
                Collectors.groupingBy(
                    f -> family(f) + "\n" + f.clause() + "\n" + f.mark(),
                    LinkedHashMap::new,
                    Collectors.toList()))
            .values());
  }

  private static Stream<Practice.Figure> used(Review review, Practice practice) {
    Starter starter = review.starter();
    Set<String> asked = review.findings().stream().map(Finding::rule).collect(Collectors.toSet());
    Set<String> categories =
        starter.contactors().stream()
            .flatMap(c -> c.ratings().keySet().stream())
            .collect(Collectors.toSet());
    Set<String> cables =
        Stream.of(starter.statorConductor(), starter.rotorConductor())
            .flatMap(Optional::stream)
            .map(c -> c.metal().name().toLowerCase(Locale.ROOT) + "." + c.insulation())
            .collect(Collectors.toSet());
    boolean relays = starter.protection().stream().anyMatch(d -> d instanceof Device.Overload);
    return practice.figures().values().stream()
        .filter(f -> !f.key().startsWith(PLAUSIBLE))
        .filter(f -> !isWanted(f) || asked.contains(f.key().substring(WANTED.length())))
        .filter(f -> !f.key().startsWith("AC-") || categories.contains(f.key().split("\\.", 2)[0]))
        .filter(f -> !f.key().startsWith("k.") || cables.stream().anyMatch(concerns(f)))
        .filter(f -> relays || !f.key().matches("(trip-class|class-alone|overload)\\..*"))
        .filter(f -> !f.key().startsWith("flc.") || isOfVoltage(f, starter.motor().voltage()));
  }

  private static boolean isWanted(Practice.Figure figure) {
    return figure.key().startsWith(WANTED);
  }

  private static Predicate<String> concerns(Practice.Figure figure) {
    return cable ->
        figure.key().equals("k." + cable) || figure.key().startsWith("k." + cable + ".");
  }

  /** Columns of the full-load tables stand for plate voltages near them. */
  private static boolean isOfVoltage(Practice.Figure figure, double plateVolts) {
    double column = Double.parseDouble(figure.key().split("\\.", 3)[1]);
    return Math.abs(column / plateVolts - 1.0) < NEAR;
  }
}
