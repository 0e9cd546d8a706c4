package sliprung.dial;

import java.util.HashMap;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.function.DoubleUnaryOperator;
import sliprung.dial.Judgement.Answer;
import sliprung.dial.Judgement.Question;
import sliprung.fixture.Starters;
import sliprung.rulebook.Verdict;
import sliprung.starter.DialScale;
import sliprung.starter.Motor.CircuitData;
import sliprung.starter.Starter;
import sliprung.starter.Step;
import sliprung.starter.TorqueCurve;

/** A starter of two step timers, both at 2 s, and judgements that are known functions of them. */
final class Synthetic {
  private final Map<Question, java.util.function.DoubleBinaryOperator> margins = new HashMap<>();

  static final Starter STARTER =
      Starters.bare(
          400.0,
          50.0,
          970.0,
          55e3,
          new CircuitData(0.03, 0.18, 4.8, 0.03, 0.18, 1.5),
          10.0,
          new TorqueCurve.Constant(100.0),
          new double[] {0.5, 0.2},
          new Step.After(2.0),
          new Step.After(2.0));

  /** A rule of the first timer. */
  Synthetic rule(String name, DoubleUnaryOperator margin) {
    return rule(name, (x, y) -> margin.applyAsDouble(x));
  }

  /** A rule of both timers; NaN: not judged; infinite and below 0: not answered at all. */
  Synthetic rule(String name, java.util.function.DoubleBinaryOperator margin) {
    margins.put(new Question("test/" + name, "it"), margin);
    return this;
  }

  Judgement at(Starter starter) {
    double x = ((Step.After) starter.steps().get(0).rule()).seconds();
    double y = ((Step.After) starter.steps().get(1).rule()).seconds();
    Map<Question, Answer> answers = new HashMap<>();
    margins.forEach(
        (question, margin) -> {
          double m = margin.applyAsDouble(x, y);
          if (m != Double.NEGATIVE_INFINITY) {
            answers.put(question, answer(m));
          }
        });
    return Judgement.of(answers);
  }

  private static Answer answer(double margin) {
    return Double.isNaN(margin)
        ? new Answer(Verdict.NOT_JUDGED, OptionalDouble.empty(), OptionalDouble.empty(), "", "")
        : new Answer(
            margin < 1.0 ? Verdict.BREACH : margin < 1.2 ? Verdict.TIGHT : Verdict.CLEAR,
            OptionalDouble.of(margin),
            OptionalDouble.of(1.2),
            "in a synthetic start",
            "nominal");
  }

  /** The first timer without a declared scale. */
  static Dial first() {
    return Dials.of(STARTER).get(0);
  }

  /** The first timer with a scale. */
  static Dial first(double low, double high, double step, double errorShare) {
    Dial bare = first();
    return new Dial(
        bare.path(),
        bare.device(),
        bare.setting(),
        bare.dimension(),
        bare.value(),
        new DialScale(
            OptionalDouble.of(low), OptionalDouble.of(high), OptionalDouble.of(step), errorShare),
        bare.setter());
  }

  DialReport search(Dial dial) {
    return new WindowSearch(new CountedEvaluation(this::at)).of(STARTER, dial);
  }

  DialReport search() {
    return search(first());
  }
}
