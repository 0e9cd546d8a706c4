package sliprung.outside;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.InputStream;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Objects;
import java.util.function.BiConsumer;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.TestFactory;
import sliprung.fixture.StarterText;
import sliprung.protection.DeviceResponse;
import sliprung.protection.Edge;
import sliprung.review.Review;
import sliprung.rulebook.ComputedStart;
import sliprung.runup.Outcome;
import sliprung.runup.Stage;
import sliprung.runup.StartSimulator;
import sliprung.runup.Trace;
import sliprung.tolerance.Corner;
import sliprung.tolerance.Corners;

/**
 * Whole starts of three invented starters, from file to review, at rated voltage and nominal
 * values.
 *
 * <p>Source: an independent implementation of the same physics in SciPy (adaptive eighth-order
 * integration, tolerance 1e-10), ours; tolerances as it states them.
 */
@Tag("outside")
class ReferenceStartTest {
  private static final List<String> NAMES = List.of("fan-500", "trolley-480", "crusher-6600");
  private static final double REFERENCE_HORIZON_SECONDS = 200.0;

  /** One starter: our review and the independent figures. */
  private record Case(String name, StarterText text, JsonNode expected) {
    static Case of(String name) {
      String path = "/reference-starters/" + name + ".json";
      try (InputStream in =
          Objects.requireNonNull(ReferenceStartTest.class.getResourceAsStream(path), path)) {
        return new Case(
            name,
            StarterText.resource("reference-starters/" + name + ".yaml").nominalOnly(),
            new ObjectMapper().readTree(in));
      } catch (IOException e) {
        throw new IllegalStateException(path, e);
      }
    }

    Review review() {
      return text.review();
    }

    ComputedStart start(String id) {
      return review().start(id).orElseThrow(() -> new AssertionError("no start " + id));
    }
  }

  private static Stream<DynamicTest> each(String what, BiConsumer<Case, JsonNode> check) {
    return NAMES.stream()
        .map(Case::of)
        .map(
            c ->
                DynamicTest.dynamicTest(
                    c.name() + " " + what,
                    () ->
                        check.accept(
                            c, Objects.requireNonNull(c.expected().get(what), "no " + what))));
  }

  private interface StageCheck {
    void accept(Stage stage, JsonNode expected, boolean last);
  }

  /** One test for every stage of every start. */
  private static Stream<DynamicTest> eachStage(String what, StageCheck check) {
    return NAMES.stream()
        .map(Case::of)
        .flatMap(
            c ->
                IntStream.range(0, c.expected().get("stages").size())
                    .mapToObj(
                        i ->
                            DynamicTest.dynamicTest(
                                c.name() + " stage " + (i + 1) + " " + what,
                                () -> {
                                  List<Stage> stages = c.start("cold").history().stages();
                                  assertThat(stages).hasSize(c.expected().get("stages").size());
                                  check.accept(
                                      stages.get(i),
                                      c.expected().get("stages").get(i),
                                      i == stages.size() - 1);
                                })));
  }

  private static void near(double found, JsonNode expected, String key, double share) {
    double wanted = expected.get(key).asDouble();
    assertThat(found).as(key).isCloseTo(wanted, within(share * Math.abs(wanted) + 1e-9));
  }

  @TestFactory
  Stream<DynamicTest> should_begin_and_end_each_stage_when_the_reference_does() {
    return eachStage(
        "times",
        (stage, expected, last) -> {
          near(stage.fromSeconds(), expected, "t0", 0.003);
          if (!last) {
            near(stage.toSeconds(), expected, "t1", 0.003);
          }
          near(stage.externalOhms(), expected, "rext", 1e-9);
        });
  }

  @TestFactory
  Stream<DynamicTest> should_turn_as_fast_as_the_reference_at_both_ends_of_each_stage() {
    return eachStage(
        "speeds",
        (stage, expected, last) -> {
          near(stage.trace().speed()[0], expected, "w0", 0.005);
          near(stage.trace().speed()[stage.trace().last()], expected, "w1", 0.005);
        });
  }

  @TestFactory
  Stream<DynamicTest> should_draw_the_reference_currents_at_both_ends_of_each_stage() {
    return eachStage(
        "currents",
        (stage, expected, last) -> {
          Trace t = stage.trace();
          near(t.statorAmps()[0], expected, "i1_in", 0.005);
          near(t.statorAmps()[t.last()], expected, "i1_out", 0.005);
          near(t.ringAmps()[0], expected, "i2_in", 0.005);
          near(t.ringAmps()[t.last()], expected, "i2_out", 0.005);
        });
  }

  @TestFactory
  Stream<DynamicTest> should_give_the_reference_torque_at_both_ends_of_each_stage() {
    return eachStage(
        "torques",
        (stage, expected, last) -> {
          near(stage.trace().torque()[0], expected, "te_in", 0.005);
          near(stage.trace().torque()[stage.trace().last()], expected, "te_out", 0.005);
        });
  }

  /** The reference runs its last stage to a horizon; ours has settled before, and goes on so. */
  @TestFactory
  Stream<DynamicTest> should_heat_as_the_reference_does_in_each_stage() {
    return eachStage(
        "heat",
        (stage, expected, last) -> {
          Trace t = stage.trace();
          double more = last ? REFERENCE_HORIZON_SECONDS - stage.toSeconds() : 0.0;
          assertThat(more).isNotNegative();
          near(withTail(t, t.statorAmps(), more), expected, "i1_sq", 0.005);
          near(withTail(t, t.ringAmps(), more), expected, "i2_sq", 0.005);
        });
  }

  private static double withTail(Trace t, double[] amps, double moreSeconds) {
    double settled = amps[t.last()];
    return t.integralOfSquare(amps) + moreSeconds * settled * settled;
  }

  @TestFactory
  Stream<DynamicTest> should_run_up_in_the_reference_time() {
    return each(
        "run_up",
        (c, expected) ->
            assertThat(c.start("cold").history().runUpSeconds().orElseThrow())
                .isCloseTo(expected.asDouble(), within(0.01 * expected.asDouble())));
  }

  @TestFactory
  Stream<DynamicTest> should_find_the_reference_current_at_the_running_torque() {
    return each(
        "preload",
        (c, expected) -> {
          StartSimulator simulator = new StartSimulator(c.review().starter(), c.review().machine());
          double amps =
              simulator
                  .runningPoint(Corners.conditions(c.review().starter(), Corner.NOMINAL))
                  .orElseThrow()
                  .point()
                  .statorAmps();
          assertThat(amps).isCloseTo(expected.asDouble(), within(0.005 * expected.asDouble()));
        });
  }

  /** Every device and edge of the cold and the hot start, one test each. */
  @TestFactory
  Stream<DynamicTest> should_bring_each_device_as_near_to_operating_as_the_reference() {
    List<DynamicTest> tests = new ArrayList<>();
    for (String name : NAMES) {
      Case c = Case.of(name);
      for (Map.Entry<String, JsonNode> use : c.expected().get("use").properties()) {
        String[] words = use.getKey().split(" ");
        Edge edge =
            words.length > 2 ? Edge.valueOf(words[2].toUpperCase(Locale.ROOT)) : Edge.MIDDLE;
        double expected = use.getValue().asDouble();
        tests.add(
            DynamicTest.dynamicTest(
                name + " use " + use.getKey(),
                () ->
                    assertThat(device(c.start(words[0]), words[1], edge).useAtRunUp())
                        .isCloseTo(expected, within(0.02 * expected))));
      }
    }
    return tests.stream();
  }

  private static DeviceResponse device(ComputedStart start, String tag, Edge edge) {
    return start.device(tag, edge).orElseThrow(() -> new AssertionError("no " + tag));
  }

  @TestFactory
  Stream<DynamicTest> should_stand_on_step_one_as_the_reference_does() {
    return each(
        "locked-1",
        (c, expected) -> {
          ComputedStart start = c.start("locked-1");
          Trace t = start.history().stages().get(0).trace();
          assertThat(start.history().outcome()).isEqualTo(Outcome.LOCKED);
          near(t.statorAmps()[t.last()], expected, "stator", 0.005);
          near(t.ringAmps()[t.last()], expected, "rotor", 0.005);
          near(t.torque()[t.last()], expected, "torque", 0.005);
          for (int i = 0; i < 2; i++) {
            double operates = device(start, "OL" + (i + 1), Edge.SLOW).operatesAtSeconds();
            JsonNode slow = expected.get("ol_slow").get(i);
            if (slow.isNull()) {
              assertThat(operates).isInfinite();
            } else {
              assertThat(operates).isCloseTo(slow.asDouble(), within(0.02 * slow.asDouble()));
            }
          }
        });
  }

  @TestFactory
  Stream<DynamicTest> should_pass_the_steps_of_a_locked_rotor_as_the_reference_does() {
    return each(
        "locked",
        (c, expected) -> {
          List<Stage> stages = c.start("locked").history().stages();
          assertThat(stages).hasSize(expected.size());
          for (int i = 0; i < stages.size(); i++) {
            Stage stage = stages.get(i);
            Trace t = stage.trace();
            assertThat(stage.step()).isEqualTo(expected.get(i).get("step").asInt());
            near(stage.fromSeconds(), expected.get(i), "from_s", 0.005);
            near(t.statorAmps()[t.last()], expected.get(i), "stator", 0.005);
            near(t.ringAmps()[t.last()], expected.get(i), "rotor", 0.005);
          }
        });
  }

  @TestFactory
  Stream<DynamicTest> should_settle_on_each_held_step_where_the_reference_does() {
    List<DynamicTest> tests = new ArrayList<>();
    for (String name : NAMES) {
      Case c = Case.of(name);
      for (JsonNode held : c.expected().get("held")) {
        tests.add(
            DynamicTest.dynamicTest(
                name + " held-" + held.get("step").asInt(),
                () -> {
                  List<Stage> stages =
                      c.start("held-" + held.get("step").asInt()).history().stages();
                  Stage stage = stages.get(stages.size() - 1);
                  Trace t = stage.trace();
                  assertThat(stage.step()).isEqualTo(held.get("step").asInt());
                  assertThat(stage.settled()).isEqualTo(held.get("reached").asBoolean());
                  near(t.statorAmps()[t.last()], held, "stator", 0.01);
                  near(t.ringAmps()[t.last()], held, "rotor", 0.01);
                  near(t.speed()[t.last()] * 30.0 / Math.PI, held, "rpm", 0.01);
                }));
      }
    }
    return tests.stream();
  }

  @TestFactory
  Stream<DynamicTest> should_draw_the_reference_currents_at_rest_with_rings_shorted() {
    return each(
        "shorted",
        (c, expected) -> {
          Trace t = c.start("rings-shorted").history().stages().get(0).trace();
          near(t.statorAmps()[t.last()], expected, "stator", 0.005);
          near(t.ringAmps()[t.last()], expected, "rotor", 0.005);
          near(t.torque()[t.last()], expected, "torque", 0.005);
        });
  }

  @TestFactory
  Stream<DynamicTest> should_give_the_reference_heat_of_the_steady_run_up() {
    return each(
        "steady_i2t",
        (c, expected) -> {
          var history = c.start("cold").history();
          double until = history.runUpSeconds().orElseThrow();
          double sum = 0.0;
          for (Stage stage : history.stages()) {
            sum += heatUntil(stage.trace(), until);
          }
          assertThat(sum).isCloseTo(expected.asDouble(), within(0.01 * expected.asDouble()));
        });
  }

  /** ∫I1² dt up to a time, by trapezoids between samples. */
  private static double heatUntil(Trace t, double until) {
    double sum = 0.0;
    for (int i = 1; i < t.size() && t.seconds()[i - 1] < until; i++) {
      double from = t.seconds()[i - 1];
      double share = Math.min(1.0, (until - from) / (t.seconds()[i] - from));
      double a = t.statorAmps()[i - 1];
      double b = a + share * (t.statorAmps()[i] - a);
      sum += share * (t.seconds()[i] - from) * 0.5 * (a * a + b * b);
    }
    return sum;
  }
}
