package sliprung.dial;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.SortedSet;
import java.util.TreeSet;
import java.util.stream.IntStream;
import sliprung.dial.Judgement.Answer;
import sliprung.dial.Judgement.Question;
import sliprung.numeric.LargestLeast;
import sliprung.starter.Starter;

/**
 * Turns all dials together so that the thinnest relative margin becomes the thickest.
 *
 * <p>From today's settings: the slope of every margin along every dial by full judgements, then the
 * move that lifts the least of them the most (a linear programme within a trusted distance), then a
 * full judgement of it; the distance grows with success and shrinks with failure. Then every dial
 * is set to its scale, neighbours on the scale are tried, and dials whose turning gains nothing go
 * back. Deterministic; a local search: it finds better settings, not provably the best.
 */
public final class ProposalSearch {
  private static final double PROBE = 0.015;
  private static final double FIRST_DISTANCE = 0.10;
  private static final double GREATEST_DISTANCE = 0.30;
  private static final double LEAST_DISTANCE = 0.004;
  private static final int MOST_SLOPES = 8;
  private static final int MOST_NEIGHBOURS = 3;
  private static final double LITTLE = 0.003;
  private static final double MOVED = 5e-3;

  private final CountedEvaluation evaluation;
  private final Starter starter;
  private final List<Dial> dials;
  private final Judgement today;

  private ProposalSearch(Starter starter, Evaluation evaluation) {
    this.evaluation = new CountedEvaluation(evaluation);
    this.starter = starter;
    this.dials = Dials.of(starter).stream().filter(d -> d.value() > 0.0).toList();
    this.today = this.evaluation.at(starter);
  }

  /** Proposes settings. */
  public static Proposal of(Starter starter, Evaluation evaluation) {
    return new ProposalSearch(starter, evaluation).search();
  }

  /**
   * Where the search stands.
   *
   * @param settings of all dials
   * @param judgement of them
   */
  private record Stand(Settings settings, Judgement judgement) {}

  private Proposal search() {
    Stand stand = new Stand(Settings.today(starter, dials), today);
    Slopes slopes = slopes(stand);
    // what no dial moves is left out: it would hide every margin that one can lift
    Set<Question> counted = new HashSet<>(slopes.moving());
    Set<Question> apart = apart(slopes);
    Yardstick yardstick = new Yardstick(today, apart);
    double distance = FIRST_DISTANCE;
    for (int n = 0; n < MOST_SLOPES && distance > LEAST_DISTANCE; n++) {
      Slopes here = n == 0 ? slopes : slopes(stand);
      counted.addAll(here.moving());
      Merit merit = Merit.of(stand.judgement(), yardstick, counted);
      boolean better = false;
      while (!better && distance > LEAST_DISTANCE) {
        Optional<Stand> next = step(stand, here, distance);
        better =
            next.isPresent()
                && Merit.of(next.get().judgement(), yardstick, counted).compareTo(merit) > 0;
        if (better) {
          stand = next.get();
          distance = Math.min(GREATEST_DISTANCE, 1.5 * distance);
        } else {
          distance *= 0.4;
        }
      }
    }
    return finish(stand, yardstick, counted);
  }

  /** Breaches of today whose margin no dial moves. */
  private Set<Question> apart(Slopes slopes) {
    Set<Question> apart = new HashSet<>();
    today
        .answers()
        .forEach(
            (q, a) -> {
              if (a.isBreach() && !slopes.moving().contains(q)) {
                apart.add(q);
              }
            });
    return apart;
  }

  private Stand at(Settings settings) {
    return new Stand(settings, evaluation.at(settings.set()));
  }

  /** Several settings at once, on every core. */
  private List<Stand> at(List<Settings> all) {
    return all.parallelStream().map(this::at).toList();
  }

  /**
   * How the margins change with the dials.
   *
   * @param moving questions that some dial moves
   * @param values logarithms of their relative margins
   * @param slopes of these along the logarithm of each dial
   */
  private record Slopes(List<Question> moving, double[] values, double[][] slopes) {}

  private Slopes slopes(Stand stand) {
    List<Settings> probes = new ArrayList<>();
    double[] steps = new double[dials.size()];
    double[][] room = stand.settings().room(PROBE);
    for (int i = 0; i < dials.size(); i++) {
      double[] move = new double[dials.size()];
      steps[i] = room[1][i] >= -room[0][i] ? room[1][i] : room[0][i];
      move[i] = steps[i];
      probes.add(stand.settings().moved(move));
    }
    List<Stand> probed = at(probes);
    List<Question> moving = new ArrayList<>();
    List<double[]> rows = new ArrayList<>();
    List<Double> values = new ArrayList<>();
    for (Map.Entry<Question, Answer> e : stand.judgement().answers().entrySet()) {
      OptionalDouble value = Merit.height(e.getValue());
      if (value.isEmpty()) {
        continue;
      }
      double[] row = new double[dials.size()];
      boolean moves = false;
      for (int i = 0; i < dials.size(); i++) {
        Answer there = probed.get(i).judgement().answers().get(e.getKey());
        OptionalDouble moved = there == null ? OptionalDouble.empty() : Merit.height(there);
        row[i] =
            moved.isPresent() && steps[i] != 0.0
                ? (moved.getAsDouble() - value.getAsDouble()) / steps[i]
                : 0.0;
        moves |= Math.abs(row[i]) > 1e-4;
      }
      if (moves) {
        moving.add(e.getKey());
        rows.add(row);
        values.add(value.getAsDouble() - errorAllowance(row, stand.settings()));
      }
    }
    return new Slopes(
        moving,
        values.stream().mapToDouble(Double::doubleValue).toArray(),
        rows.toArray(double[][]::new));
  }

  /** What the greatest error of one dial may take from a margin. */
  private double errorAllowance(double[] row, Settings settings) {
    return IntStream.range(0, row.length)
        .mapToDouble(
            i -> Math.abs(row[i]) * dials.get(i).scale().error() / settings.values().get(i))
        .max()
        .orElse(0.0);
  }

  private Optional<Stand> step(Stand stand, Slopes slopes, double distance) {
    double[][] room = stand.settings().room(distance);
    return LargestLeast.move(
            slopes.values(), slopes.slopes(), room[0], room[1], Recommendation.ENOUGH)
        .filter(move -> Settings.largest(move) > 1e-6)
        .map(move -> at(stand.settings().moved(move)));
  }

  private Proposal finish(Stand found, Yardstick yardstick, Set<Question> counted) {
    Merit before = Merit.of(today, yardstick, counted);
    Stand rounded = at(found.settings().onScale());
    Merit wish = Merit.of(found.judgement(), yardstick, counted);
    for (int n = 0;
        n < MOST_NEIGHBOURS
            && !Merit.of(rounded.judgement(), yardstick, counted).isAbout(wish, LITTLE);
        n++) {
      Stand better = bestNeighbour(rounded, yardstick, counted);
      if (better == rounded) {
        break;
      }
      rounded = better;
    }
    Stand settled = backWhereNothingIsGained(rounded, yardstick, counted);
    boolean gains = Merit.of(settled.judgement(), yardstick, counted).compareTo(before) > 0;
    return proposal(gains ? settled : new Stand(Settings.today(starter, dials), today), yardstick);
  }

  private Stand bestNeighbour(Stand stand, Yardstick yardstick, Set<Question> counted) {
    List<Settings> neighbours = new ArrayList<>();
    for (int i = 0; i < dials.size(); i++) {
      for (int direction : new int[] {-1, 1}) {
        double value = dials.get(i).neighbour(stand.settings().values().get(i), direction);
        if (value != stand.settings().values().get(i)) {
          neighbours.add(stand.settings().with(i, value));
        }
      }
    }
    Stand best = stand;
    for (Stand neighbour : at(neighbours)) {
      if (Merit.of(neighbour.judgement(), yardstick, counted)
              .compareTo(Merit.of(best.judgement(), yardstick, counted))
          > 0) {
        best = neighbour;
      }
    }
    return best;
  }

  private Stand backWhereNothingIsGained(Stand stand, Yardstick yardstick, Set<Question> counted) {
    Merit reached = Merit.of(stand.judgement(), yardstick, counted);
    Stand kept = stand;
    for (int i = 0; i < dials.size(); i++) {
      if (kept.settings().values().get(i) == dials.get(i).value()) {
        continue;
      }
      Stand back = at(kept.settings().with(i, dials.get(i).value()));
      if (Merit.of(back.judgement(), yardstick, counted).isAbout(reached, LITTLE)) {
        kept = back;
      }
    }
    return kept;
  }

  private Proposal proposal(Stand stand, Yardstick yardstick) {
    List<Proposal.Change> changes = new ArrayList<>();
    for (int i = 0; i < dials.size(); i++) {
      if (stand.settings().values().get(i) != dials.get(i).value()) {
        changes.add(new Proposal.Change(dials.get(i), stand.settings().values().get(i)));
      }
    }
    SortedSet<Question> inexact = new TreeSet<>();
    SortedSet<Question> broken = yardstick.broken(stand.judgement());
    for (Stand end : at(errorEnds(stand.settings()))) {
      yardstick.broken(end.judgement()).stream()
          .filter(q -> !broken.contains(q))
          .forEach(inexact::add);
    }
    return new Proposal(
        changes,
        stand.settings().set(),
        today,
        stand.judgement(),
        moved(today, stand.judgement()),
        inexact,
        evaluation.computed());
  }

  private List<Settings> errorEnds(Settings settings) {
    List<Settings> ends = new ArrayList<>();
    for (int i = 0; i < dials.size(); i++) {
      double error = dials.get(i).scale().error();
      if (error > 0.0) {
        ends.add(settings.with(i, settings.values().get(i) + error));
        ends.add(settings.with(i, Math.max(1e-9, settings.values().get(i) - error)));
      }
    }
    return ends;
  }

  private static SortedSet<Question> moved(Judgement before, Judgement after) {
    SortedSet<Question> all = new TreeSet<>(before.answers().keySet());
    all.addAll(after.answers().keySet());
    all.removeIf(q -> !isMoved(before.answers().get(q), after.answers().get(q)));
    return all;
  }

  private static boolean isMoved(Answer before, Answer after) {
    if (before == null || after == null || before.verdict() != after.verdict()) {
      return true;
    }
    double a = before.margin().orElse(0.0);
    double b = after.margin().orElse(0.0);
    return Math.abs(a - b) > MOVED * Math.max(Math.abs(a), Math.abs(b));
  }
}
