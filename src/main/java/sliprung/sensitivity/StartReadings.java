package sliprung.sensitivity;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import sliprung.machine.NameplateIdentification;
import sliprung.quantity.Show;
import sliprung.review.Reviewer;
import sliprung.sensitivity.Narrowed.Span;
import sliprung.starter.Load;
import sliprung.starter.Readings;
import sliprung.starter.Starter;

/**
 * What the readings of one real start leave open of inertia, starting torque and running torque.
 * Where the plate leaves several circuits, what any of them explains is left open.
 */
final class StartReadings {
  /** Points over the load's span that are looked at before its ends are refined. */
  private static final int GRID = 9;

  /** The same where none of the first explains anything: sharp readings leave little. */
  private static final int FINE_GRID = 65;

  private static final int HALVINGS = 8;

  private final Starter starter;
  private final Readings readings;
  private final List<RealStart> starts;

  private StartReadings(Starter starter, Readings readings) {
    this.starter = starter;
    this.readings = readings;
    this.starts =
        NameplateIdentification.identify(starter.motor()).stream()
            .map(i -> new RealStart(starter, readings, Reviewer.machine(starter, i)))
            .toList();
  }

  /** Of a starter; nothing where its file gives no readings. */
  static List<Narrowed> of(Starter starter) {
    return starter.readings().map(r -> new StartReadings(starter, r).narrowed()).orElse(List.of());
  }

  private List<Narrowed> narrowed() {
    List<Narrowed> all = new ArrayList<>();
    if (readings.runUpSeconds().isPresent() || !readings.ampsBefore().isEmpty()) {
      Span inertia = graded(LoadValue.INERTIA);
      Span torque = ofOneStart(LoadValue.TORQUE);
      List<Both> explained =
          starts.stream()
              .flatMap(
                  s ->
                      explained(s, inertia, torque, GRID)
                          .or(() -> explained(s, inertia, torque, FINE_GRID))
                          .stream())
              .toList();
      all.add(Narrowed.fixed(LoadValue.INERTIA, inertia, hull(explained, Both::inertia)));
      all.add(Narrowed.varying(LoadValue.TORQUE, torque, hull(explained, Both::torque), differs()));
    }
    if (readings.runningAmps().isPresent()) {
      Span running = ofOneStart(LoadValue.RUNNING);
      all.add(
          Narrowed.varying(
              LoadValue.RUNNING,
              running,
              starts.stream().flatMap(s -> s.running(running).stream()).reduce(Span::and),
              differs()));
    }
    return List.copyOf(all);
  }

  private record Both(Span inertia, Span torque) {}

  private static Optional<Span> hull(List<Both> all, Function<Both, Span> which) {
    return all.stream().map(which).reduce(Span::and);
  }

  /** Every load of the grid that some inertia explains, and the ends between its points. */
  private static Optional<Both> explained(RealStart start, Span inertia, Span torque, int grid) {
    List<Both> all = new ArrayList<>();
    Optional<Span> before = Optional.empty();
    double last = torque.low();
    for (int i = 0; i < grid; i++) {
      double at = torque.low() + i * (torque.high() - torque.low()) / (grid - 1);
      Optional<Span> here = start.inertia(at, inertia);
      here.ifPresent(j -> all.add(new Both(j, new Span(at, at))));
      if (i > 0 && here.isPresent() != before.isPresent()) {
        all.add(here.isPresent() ? end(start, inertia, at, last) : end(start, inertia, last, at));
      }
      before = here;
      last = at;
    }
    return all.stream()
        .reduce((a, b) -> new Both(a.inertia().and(b.inertia()), a.torque().and(b.torque())));
  }

  /** The last load towards one that nothing explains. */
  private static Both end(RealStart start, Span inertia, double explained, double not) {
    double good = explained;
    double bad = not;
    for (int i = 0; i < HALVINGS; i++) {
      double middle = 0.5 * (good + bad);
      if (start.inertia(middle, inertia).isPresent()) {
        good = middle;
      } else {
        bad = middle;
      }
    }
    return new Both(start.inertia(good, inertia).orElseThrow(), new Span(good, good));
  }

  private Span graded(LoadValue value) {
    double spread = new Grades(starter).of(value.path()).spread();
    return new Span(1.0 - spread, 1.0 + spread);
  }

  /** A load may be off and, in the start that was read, anywhere in what differs between starts. */
  private Span ofOneStart(LoadValue value) {
    Span graded = graded(value);
    return new Span(graded.low() * differs().low(), graded.high() * differs().high());
  }

  private Span differs() {
    Load load = starter.load();
    return new Span(1.0 + load.spreadLow(), 1.0 + load.spreadHigh());
  }

  /** What the readings say, in sentences. */
  static List<String> says(Starter starter, List<Narrowed> narrowed) {
    List<String> says = new ArrayList<>();
    for (Narrowed n : narrowed) {
      if (n.left().isEmpty()) {
        String nothing =
            n.value() == LoadValue.RUNNING
                ? "No running torque within its spread explains the running current that was read:"
                    + " check meter, plate and load."
                : "No inertia and load within their spreads explain these readings: check the"
                    + " readings, the plate and the drawings.";
        if (!says.contains(nothing)) {
          says.add(nothing);
        }
      } else {
        says.add(left(starter, n, n.left().get()));
      }
    }
    return List.copyOf(says);
  }

  private static String left(Starter starter, Narrowed n, Span left) {
    if (n.value() == LoadValue.INERTIA) {
      double described = starter.load().inertia();
      return "The readings leave the load's inertia between "
          + Show.three(left.low() * described)
          + " and "
          + Show.three(left.high() * described)
          + "\u00a0kg·m²; before "
          + Show.three(n.before().low() * described)
          + " to "
          + Show.three(n.before().high() * described)
          + ".";
    }
    return "The readings leave "
        + n.value().words()
        + ", in that start, between "
        + Show.percent(left.low())
        + " and "
        + Show.percent(left.high())
        + " of what is described; before "
        + Show.percent(n.before().low())
        + " to "
        + Show.percent(n.before().high())
        + ".";
  }
}
