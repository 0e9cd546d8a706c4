package sliprung.review;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.util.ArrayDeque;
import java.util.Deque;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Random;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import sliprung.chart.StatorBands;
import sliprung.fixture.Judged;
import sliprung.fixture.StarterText;
import sliprung.record.Dossier;
import sliprung.record.RecordWriter;
import sliprung.record.ReviewJson;
import sliprung.rulebook.Finding;
import sliprung.rulebook.RuleBook;
import sliprung.rulebook.Verdict;
import sliprung.runup.Stage;
import sliprung.runup.StartHistory;
import sliprung.runup.Trace;

/**
 * Starters thrown together at random, good and hopeless ones: a review always ends in an answer.
 * The seed is the test's argument: a failure can be had again.
 */
class AnyStarterTest {

  @ParameterizedTest
  @ValueSource(ints = {1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12, 13, 14, 15, 16})
  void a_review_of_any_starter_answers_every_rule_that_must_be_judged(int seed) throws IOException {
    StarterText text = new Any(new Random(seed)).text();
    Review review = Reviewer.review(text.starter(), StarterText.DAY);

    for (String rule : RuleBook.MUST_JUDGE) {
      boolean answered = review.findings().stream().anyMatch(f -> f.rule().equals(rule));
      boolean reasoned = review.notApplicable().stream().anyMatch(n -> n.rule().equals(rule));
      boolean open =
          review.findings().stream()
              .anyMatch(f -> f.rule().equals(rule) && f.verdict() == Verdict.NOT_JUDGED);
      assertThat(answered || reasoned).as(rule).isTrue();
      assertThat(review.mustJudgeMissing().contains(rule)).as(rule).isEqualTo(open || !answered);
    }
    for (Finding f : review.findings()) {
      Judged.agrees(f);
      assertThat(f.says()).isNotBlank().doesNotContain("NaN").doesNotContain("Infinity");
    }
    boolean breach = review.findings().stream().anyMatch(f -> f.verdict() == Verdict.BREACH);
    int expected = breach ? 1 : review.mustJudgeMissing().isEmpty() ? 0 : 4;
    assertThat(review.exitStatus()).isEqualTo(expected);
    review.starts().forEach(s -> sound(s.history()));
    finite(new ObjectMapper().readTree(ReviewJson.text(review, List.of(), "test")));
    if (seed % 4 == 0) {
      Map<String, byte[]> files =
          RecordWriter.files(
              new Dossier(review, List.of(), List.of(), StatorBands.of(review.starter()), "test"),
              Optional.empty());
      assertThat(files.values()).allMatch(content -> content.length > 0);
    }
  }

  /** Time rises without a gap, and every sample is a number. */
  private static void sound(StartHistory history) {
    double at = 0.0;
    for (Stage stage : history.everything()) {
      Trace t = stage.trace();
      assertThat(stage.fromSeconds()).isEqualTo(at);
      assertThat(t.seconds()[0]).isEqualTo(stage.fromSeconds());
      assertThat(t.seconds()[t.last()]).isEqualTo(stage.toSeconds());
      boolean numbers = true;
      for (int i = 0; i < t.size(); i++) {
        numbers &= Double.isFinite(t.speed()[i]) && Double.isFinite(t.torque()[i]);
        numbers &= Double.isFinite(t.statorAmps()[i]) && t.statorAmps()[i] >= 0.0;
        numbers &= Double.isFinite(t.ringAmps()[i]) && t.ringAmps()[i] >= 0.0;
        numbers &= i == 0 || t.seconds()[i] >= t.seconds()[i - 1];
      }
      assertThat(numbers).isTrue();
      at = stage.toSeconds();
    }
  }

  /** JSON has no number that is none; what is not known is null. */
  private static void finite(JsonNode root) {
    Deque<JsonNode> open = new ArrayDeque<>(List.of(root));
    while (!open.isEmpty()) {
      JsonNode node = open.pop();
      if (node.isNumber() && !Double.isFinite(node.asDouble())
          || node.isTextual() && List.of("NaN", "Infinity", "-Infinity").contains(node.asText())) {
        throw new AssertionError("no number: " + node);
      }
      node.forEach(open::push);
    }
  }

  /** One starter from one sequence of random numbers; sizes relative to a motor of some 55 kW. */
  private static final class Any {
    private final Random random;

    Any(Random random) {
      this.random = random;
    }

    private double between(double low, double high) {
      return low + (high - low) * random.nextDouble();
    }

    private boolean chance(double share) {
      return random.nextDouble() < share;
    }

    private String one(String... of) {
      return of[random.nextInt(of.length)];
    }

    private static String n(double number) {
      return StarterText.text("%.4g", number).replaceAll("e\\+0*", "e");
    }

    StarterText text() {
      int sections = 1 + random.nextInt(3);
      boolean delta = chance(0.25);
      StringBuilder y = new StringBuilder();
      y.append("sliprung: 1\nstarter: any\npractice: ").append(one("iec", "nec")).append('\n');
      y.append("supply:\n  voltage: 400 V\n  frequency: 50 Hz\n  band: [")
          .append(chance(0.3) ? "-10 %, +10 %" : "0 %, 0 %")
          .append("]\n");
      if (chance(0.5)) {
        y.append("  fault-current: {max: 20 kA, min: ").append(n(between(3, 18))).append(" kA}\n");
      }
      motor(y);
      load(y);
      bank(y, sections, delta);
      sequence(y, sections);
      protection(y);
      y.append("duty:\n  starts: {cold: ")
          .append(1 + random.nextInt(3))
          .append(", hot: ")
          .append(random.nextInt(2))
          .append("}\n");
      return new StarterText(y.toString());
    }

    private void motor(StringBuilder y) {
      y.append(
          """
          motor:
            voltage: 400 V
            frequency: 50 Hz
            power: 55 kW
            current: 104 A
            speed: 1460 rpm
            rotor-voltage: 330 V
            rotor-current: 108 A
            inertia: 1 kg·m²
            circuit: {r1: 0.055 ohm, x1: 0.22 ohm, xm: 6.2 ohm, r2: 0.0574 ohm, x2: 0.22 ohm, ratio: 1.165}
          """);
      if (chance(0.8)) {
        y.append("  stall-limit: {cold: 20 s, hot: 12 s}\n  heating: 30 min\n  cooling: 90 min\n");
      }
      if (chance(0.5)) {
        y.append("  rings-at-rest: {current: 300 A, time: 30 s}\n");
      }
    }

    private void load(StringBuilder y) {
      y.append("load:\n  inertia: ").append(n(between(0.5, 60))).append(" kg·m²\n");
      double torque = between(20, 700);
      y.append("  torque: {")
          .append(one("constant", "linear", "square"))
          .append(": ")
          .append(n(torque))
          .append(" N·m}\n");
      if (chance(0.5)) {
        y.append("  breakaway: ").append(n(between(0, 900))).append(" N·m\n");
      }
      y.append("  running: ").append(n(between(20, 130))).append(" %\n");
      if (chance(0.2)) {
        y.append("  active: true\n  brake: ").append(n(between(0, 1))).append(" s\n");
      }
      y.append("  spread: [").append(chance(0.4) ? "-20 %, +20 %" : "0 %, 0 %").append("]\n");
    }

    private void bank(StringBuilder y, int sections, boolean delta) {
      y.append("resistors:\n  connection: ").append(delta ? "delta" : "star").append('\n');
      y.append("  cut-out: ")
          .append(delta ? "bridging" : one("star-point", "bridging"))
          .append("\n  sections:\n");
      for (int i = 0; i < sections; i++) {
        y.append("    - {resistance: ").append(n(between(0.02, 1.5))).append(" ohm");
        if (chance(0.9)) {
          double continuous = between(20, 120);
          y.append(", continuous: ").append(n(continuous)).append(" A, short-time: {current: ");
          y.append(n(continuous * between(2, 6))).append(" A, time: 20 s}");
        }
        y.append("}\n");
      }
      if (chance(0.9)) {
        y.append("  same-limit: true\n");
      }
      if (chance(0.3)) {
        y.append("  permanent: ").append(n(between(0, 0.4))).append(" ohm\n");
        y.append("  leads: 0.004 ohm\n");
      }
      y.append("  tolerance: ").append(chance(0.3) ? "10 %" : "0 %").append("\n  hot-rise: 0 %\n");
    }

    private void sequence(StringBuilder y, int sections) {
      y.append("steps:\n");
      for (int i = 1; i <= sections; i++) {
        String rule =
            switch (random.nextInt(5)) {
              case 0 -> "rotor-below: " + n(between(40, 300)) + " A";
              case 1 -> "stator-below: " + n(between(40, 300)) + " A";
              case 2 -> "rotor-frequency-below: " + n(between(3, 49)) + " Hz";
              default -> "after: " + n(between(0, 8)) + " s";
            };
        y.append("  - {contactor: K1").append(i).append(", ").append(rule).append("}\n");
      }
      y.append("sequence: ").append(one("chained", "cascaded")).append('\n');
      y.append("timer-spread: ").append(chance(0.3) ? "5 %" : "0 %").append('\n');
      y.append("level-spread: 0 %\n");
      y.append("contactors:\n  K1: {place: line");
      if (chance(0.8)) {
        y.append(", ratings: {AC-2: ")
            .append(n(between(60, 300)))
            .append(" A}, rated-voltage: 400 V");
      }
      y.append(", closing: 0 ms, opening: 50 ms}\n");
      for (int i = 1; i <= sections; i++) {
        y.append("  K1").append(i).append(": {place: rotor, poles: star, closing: ");
        y.append(random.nextInt(200)).append(" ms}\n");
      }
      y.append("breakers:\n  Q1: {breaking: 20 kA, opening: 50 ms}\n");
    }

    private void protection(StringBuilder y) {
      y.append("protection:\n");
      y.append("  F2: {kind: overload, class: ")
          .append(one("5", "10", "20", "30", "nema-20"))
          .append(", dial: ")
          .append(n(between(60, 150)))
          .append(" A, trips: ")
          .append(one("K1", "Q1", "K11"))
          .append("}\n");
      if (chance(0.6)) {
        y.append("  F1: {kind: fuse, class: gG, rating: ").append(one("100", "160", "250"));
        y.append(" A}\n");
      }
      if (chance(0.6)) {
        y.append("  F5: {kind: sequence-timer, time: ").append(n(between(0.5, 40)));
        y.append(" s, until: ").append(one("last-step", "{speed: 80 %}"));
        y.append(one(", trips: K1", ", trips: Q1", "")).append("}\n");
      }
      if (chance(0.4)) {
        y.append("  F3: {kind: inverse-time, curve: iec-very-inverse, pick-up: ");
        y.append(n(between(90, 300))).append(" A, time-multiplier: 0.3, trips: Q1}\n");
      }
      if (chance(0.4)) {
        y.append("  F4: {kind: instantaneous, pick-up: ").append(n(between(200, 3000)));
        y.append(" A, trips: Q1}\n");
      }
      if (chance(0.3)) {
        y.append("  F6: {kind: standstill, time: ").append(n(between(0.5, 10)));
        y.append(" s, trips: K1}\n");
      }
      if (chance(0.3)) {
        y.append("  F7: {kind: definite-time, pick-up: ").append(n(between(30, 200)));
        y.append(" A, time: 10 s, place: bank, measures-by: ").append(one("ct", "dc-capable"));
        y.append(", trips: K1}\n");
      }
      y.append("ambient: {motor: 40 °C, panel: 25 °C}\n");
    }
  }
}
