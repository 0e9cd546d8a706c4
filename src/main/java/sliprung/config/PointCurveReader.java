package sliprung.config;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import sliprung.curve.PointCurve;
import sliprung.quantity.Dimension;

/**
 * Reads a device's own curve: title, source, unit of the currents, fast and slow edge as lists of
 * {@code [current, time]}.
 */
final class PointCurveReader {
  private final Reading reading;
  private final double rating;

  private PointCurveReader(Reading reading, double rating) {
    this.reading = reading;
    this.rating = rating;
  }

  /**
   * The curve in amperes and seconds; empty after mistakes, which are then in the reading.
   *
   * @param reading of the curve file
   * @param rating of the device in A, above 0
   */
  static Optional<PointCurve> read(Reading reading, double rating) {
    Optional<YamlNode> root = YamlTree.compose(reading);
    if (root.isEmpty()) {
      return Optional.empty();
    }
    Place start = new Place(reading.source().name(), 1, 1);
    Section section =
        new Field(reading, "", "", start, root.get())
            .section("curve", "title", "source", "currents", "fast", "slow");
    return new PointCurveReader(reading, rating).curve(section);
  }

  private Optional<PointCurve> curve(Section section) {
    section
        .required("curve", "the version of the curve format", "1")
        .ifPresent(f -> StarterReader.version(f, "curve"));
    Optional<String> title = section.text("title", "a title", "my relay");
    Optional<String> source = section.text("source", "the source of the points", "test report 12");
    Optional<Boolean> multiples =
        section.choice("currents", Words.inOrder("amperes", false, "multiples", true));
    boolean inMultiples = multiples.orElse(false);
    List<PointCurve.Point> fast = edge(section, "fast", inMultiples, multiples.isPresent());
    List<PointCurve.Point> slow = edge(section, "slow", inMultiples, multiples.isPresent());
    if (reading.hasMistakes()) {
      return Optional.empty();
    }
    fastBeforeSlow(section, fast, slow);
    return reading.hasMistakes()
        ? Optional.empty()
        : Optional.of(new PointCurve(title.orElseThrow(), fast, slow, source.orElseThrow()));
  }

  private List<PointCurve.Point> edge(
      Section section, String key, boolean multiples, boolean unitKnown) {
    String expected = "a list of [current, time]";
    Optional<Field> field = section.required(key, expected, "[[1.2, 300 s], [6, 8 s]]");
    List<Field> entries = field.flatMap(f -> f.list(expected)).orElse(List.of());
    if (field.isPresent()
        && field.get().value() instanceof YamlNode.Sequence
        && entries.size() < 2) {
      field.get().mistake("expected at least two points but found " + entries.size());
    }
    List<PointCurve.Point> points = new ArrayList<>();
    for (Field entry : entries) {
      List<Field> pair = entry.list("a pair [current, time]").orElse(List.of());
      if (pair.size() != 2) {
        if (entry.value() instanceof YamlNode.Sequence) {
          entry.mistake("expected a pair [current, time] but found a list of " + pair.size());
        }
        continue;
      }
      double current =
          !unitKnown
              ? Double.NaN
              : multiples
                  ? pair.get(0).number(Dimension.NUMBER, Range.POSITIVE) * rating
                  : pair.get(0).number(Dimension.CURRENT, Range.POSITIVE);
      PointCurve.Point point =
          new PointCurve.Point(current, pair.get(1).number(Dimension.TIME, Range.POSITIVE));
      if (!points.isEmpty()) {
        falling(entry, points.get(points.size() - 1), point);
      }
      points.add(point);
    }
    return points;
  }

  private static void falling(Field entry, PointCurve.Point before, PointCurve.Point point) {
    if (point.amps() <= before.amps()) {
      entry.mistake("expected a current above that of the point before but found one that is not");
    }
    if (point.seconds() > before.seconds()) {
      entry.mistake(
          "expected a time no longer than that of the point before but found a longer one");
    }
  }

  /** Compares the edges on log-log wherever both have a point or a line, so at every corner. */
  private static void fastBeforeSlow(
      Section section, List<PointCurve.Point> fast, List<PointCurve.Point> slow) {
    List<PointCurve.Point> corners = new ArrayList<>(fast);
    corners.addAll(slow);
    for (PointCurve.Point corner : corners) {
      double early = secondsAt(fast, corner.amps());
      double late = secondsAt(slow, corner.amps());
      if (early > late * (1.0 + 1e-9)) {
        section
            .optional("fast")
            .get()
            .mistake(
                "expected a fast edge no later than the slow one but found it later at "
                    + sliprung.quantity.Show.amps(corner.amps()));
        return;
      }
    }
  }

  /** Log-log between points; NaN outside them. */
  private static double secondsAt(List<PointCurve.Point> edge, double amps) {
    for (int i = 0; i < edge.size(); i++) {
      PointCurve.Point right = edge.get(i);
      if (amps == right.amps()) {
        return right.seconds();
      }
      if (i > 0 && amps > edge.get(i - 1).amps() && amps < right.amps()) {
        PointCurve.Point left = edge.get(i - 1);
        double share = Math.log(amps / left.amps()) / Math.log(right.amps() / left.amps());
        return left.seconds() * Math.pow(right.seconds() / left.seconds(), share);
      }
    }
    return Double.NaN;
  }
}
