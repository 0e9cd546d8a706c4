package sliprung.rulebook.catalogue;

import java.util.ArrayList;
import java.util.List;
import sliprung.rulebook.Practice;

/** Cases of figures that come in tables: one pair about every entry. */
final class TabledCases {
  private static final String NEC = "practice: iec->practice: nec";

  /** So that another voltage or power asks for no other identification. */
  private static final String CIRCUIT =
      "  breakdown-torque: 2.8\n->  breakdown-torque: 2.8\n"
          + "  circuit: {r1: 0.030 ohm, x1: 0.183 ohm, xm: 4.795 ohm, r2: 0.0298 ohm, x2: 0.183 ohm,"
          + " ratio: 1.568}\n";

  private static final String FUSE = "class: gG, rating: 250 A";
  private static final double INSIDE = 0.996;
  private static final double OUTSIDE = 1.004;

  private TabledCases() {}

  static List<RuleCase> all() {
    List<RuleCase> all = new ArrayList<>();
    fullLoadCurrents(all);
    standardSizes(all);
    fuseSeries(all);
    return all;
  }

  /** An instantaneous breaker of eight times the table's full-load current. */
  private static void fullLoadCurrents(List<RuleCase> into) {
    Practice nec = Practice.named("nec");
    for (Practice.Figure figure : nec.figures().values()) {
      String[] key = figure.key().split("\\.", 3);
      if (!key[0].equals("flc") || Double.parseDouble(key[1]) > 1000.0) {
        continue;
      }
      for (double side : new double[] {INSIDE, OUTSIDE}) {
        double amps = side * nec.figure("430.52.instantaneous").value() * figure.value();
        pair(
            into,
            "short-circuit/rating",
            side,
            NEC
                + " && "
                + CIRCUIT
                + " && voltage: 690 V->voltage: "
                + key[1]
                + " V && power: 200 kW->power: "
                + key[2]
                + " hp && kind: fuse, "
                + FUSE
                + "->kind: instantaneous, pick-up: "
                + amps
                + " A, trips: Q1",
            "F1",
            "TIGHT",
            figure.key());
      }
    }
  }

  /** A fuse of a standard size, where half as much again as the motor draws lies just below it. */
  private static void standardSizes(List<RuleCase> into) {
    double below = 10.0;
    for (Practice.Figure size : sorted(Practice.named("nec"), "size.")) {
      double asked = Math.sqrt(below * size.value());
      below = size.value();
      for (double side : new double[] {1.0, OUTSIDE}) {
        pair(
            into,
            "short-circuit/rating",
            side,
            NEC
                + " && "
                + CIRCUIT
                + " &&   current: 208 A->  current: "
                + asked / 1.5
                + " A && "
                + FUSE
                + "->class: gG, rating: "
                + side * size.value()
                + " A",
            "F1",
            "TIGHT",
            size.key());
      }
    }
  }

  /** Two fuses two steps apart; with a rating that is none of the series nothing is judged. */
  private static void fuseSeries(List<RuleCase> into) {
    List<Practice.Figure> series = sorted(Practice.named("iec"), "fuse-series.");
    for (int i = 0; i < series.size(); i++) {
      int other = i + 2 < series.size() ? i + 2 : i - 2;
      double less = series.get(Math.min(i, other)).value();
      double more = series.get(Math.max(i, other)).value();
      into.add(
          new RuleCase(
              "short-circuit/upstream",
              RuleCase.Kind.INSIDE,
              "crusher bare",
              RuleCase.edits(
                  FUSE
                      + "->class: gG, rating: "
                      + less
                      + " A &&   F1: {->  F0: {kind: fuse, class: gG, rating: "
                      + more
                      + " A}\n  F1: {"),
              "F0",
              "CLEAR",
              List.of(series.get(i).key())));
    }
  }

  private static List<Practice.Figure> sorted(Practice practice, String prefix) {
    return practice.figures().values().stream()
        .filter(f -> f.key().startsWith(prefix))
        .sorted(java.util.Comparator.comparingDouble(Practice.Figure::value))
        .toList();
  }

  private static void pair(
      List<RuleCase> into,
      String rule,
      double side,
      String edits,
      String subject,
      String beyond,
      String key) {
    boolean inside = side <= 1.0;
    into.add(
        new RuleCase(
            rule,
            inside ? RuleCase.Kind.INSIDE : RuleCase.Kind.OUTSIDE,
            "crusher bare",
            RuleCase.edits(edits),
            subject,
            inside ? "CLEAR" : beyond,
            List.of(key)));
  }
}
