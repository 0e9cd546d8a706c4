package sliprung.review;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.LinkedHashMap;
import java.util.Map;
import org.junit.jupiter.api.Test;
import sliprung.runup.ModelError;
import sliprung.runup.RunUpFigures;
import sliprung.starter.Starter.Method;
import sliprung.tolerance.Corner;

class RunUpMethodTest {
  private static final RunUpFigures FULL = new RunUpFigures(10.0, 1000.0, 2000.0);
  private static final RunUpFigures NEVER = new RunUpFigures(Double.NaN, Double.NaN, Double.NaN);
  private static final Corner HARD =
      new Corner(0.9, Corner.LoadSide.HEAVY, Corner.Bank.HOT, Corner.Timers.LATE);

  private static ModelError error(double runUp, double stator, double ring) {
    return new ModelError(
        new RunUpFigures(10.0 * (1.0 + runUp), 1000.0 * (1.0 + stator), 2000.0 * (1.0 + ring)),
        FULL);
  }

  private static RunUpMethod choose(Method asked, ModelError nominal, ModelError hard) {
    Map<Corner, ModelError> errors = new LinkedHashMap<>();
    errors.put(Corner.NOMINAL, nominal);
    errors.put(HARD, hard);
    return RunUpMethod.choose(asked, errors);
  }

  @Test
  void steady_serves_while_every_figure_at_every_corner_is_within_two_per_cent() {
    ModelError inside = error(-0.0199, 0.0199, -0.0199);
    assertThat(choose(Method.AUTO, inside, inside).used()).isEqualTo(Method.STEADY);
    for (ModelError outside :
        new ModelError[] {error(0.0201, 0, 0), error(0, -0.0201, 0), error(0, 0, 0.0201)}) {
      assertThat(choose(Method.AUTO, outside, inside).used()).isEqualTo(Method.TRANSIENT);
      RunUpMethod atCorner = choose(Method.AUTO, inside, outside);
      assertThat(atCorner.used()).isEqualTo(Method.TRANSIENT);
      assertThat(atCorner.worstCorner()).isEqualTo(HARD);
      assertThat(atCorner.error()).isEqualTo(inside);
    }
  }

  @Test
  void a_corner_at_which_only_one_way_runs_up_asks_for_the_transient() {
    ModelError inside = error(0, 0, 0);
    assertThat(choose(Method.AUTO, inside, new ModelError(NEVER, FULL)).used())
        .isEqualTo(Method.TRANSIENT);
    assertThat(choose(Method.AUTO, inside, new ModelError(FULL, NEVER)).says())
        .contains("since only one of them runs up at 90");
    assertThat(choose(Method.AUTO, inside, new ModelError(NEVER, NEVER)).used())
        .isEqualTo(Method.STEADY);
  }

  @Test
  void what_the_file_asks_for_is_used_whatever_the_error() {
    ModelError large = error(0.5, 0.5, 0.5);
    assertThat(choose(Method.STEADY, large, large).used()).isEqualTo(Method.STEADY);
    assertThat(choose(Method.STEADY, large, large).says()).contains("as the file asks");
    assertThat(choose(Method.TRANSIENT, error(0, 0, 0), error(0, 0, 0)).used())
        .isEqualTo(Method.TRANSIENT);
  }

  @Test
  void it_says_both_run_ups_and_the_signed_differences() {
    String says =
        choose(Method.AUTO, error(-0.011, -0.16, 0.004), error(0, 0, 0))
            .says()
            .replace('\u00a0', ' ');
    assertThat(says)
        .contains("a run-up of 9.89 s against 10 s")
        .contains("(−1.10 %), stator I²t −16.00 %, ring I²t +0.40 %")
        .contains("The transient feeds devices and parts, since up to 16 % lie between them");
    assertThat(choose(Method.AUTO, new ModelError(NEVER, NEVER), error(0, 0, 0)).says())
        .startsWith("The model error could not be measured");
  }
}
