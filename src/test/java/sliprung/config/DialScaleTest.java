package sliprung.config;

import static org.assertj.core.api.Assertions.assertThat;
import static sliprung.config.StarterFiles.read;
import static sliprung.config.StarterFiles.starter;
import static sliprung.config.StarterFiles.winchWith;

import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import sliprung.starter.DialScale;
import sliprung.starter.Starter;

/** The scales of real dials, beside their settings. */
class DialScaleTest {
  private static final String STEP = "after: 2 s}";
  private static final String F2 = "  F2: {kind: overload, class: 10, dial: 105 A, trips: K1}\n";
  private static final String F3 =
      "  F3: {kind: inverse-time, curve: iec-very-inverse, pick-up: 120 A, time-multiplier: 0.3,";

  @Test
  void should_read_the_scale_of_a_single_dial_beside_its_setting() {
    Starter starter =
        starter(
            winchWith(
                STEP,
                "after: 2 s, dial-range: [100 ms, 10 s], dial-step: 0.1 s, dial-error: 5 %}",
                F2,
                "  F2: {kind: overload, class: 10, dial: 105 A, dial-range: [90 A, 110 A]}\n"));

    DialScale timer = starter.dialScales().get("steps.K11.after");
    assertThat(timer)
        .isEqualTo(
            new DialScale(
                OptionalDouble.of(0.1), OptionalDouble.of(10.0), OptionalDouble.of(0.1), 0.05));
    assertThat(timer.error()).isEqualTo(0.5);
    assertThat(starter.dialScales().get("protection.F2.dial").high()).hasValue(110.0);
    assertThat(starter.dialScales()).hasSize(2);
  }

  @Test
  void should_read_one_scale_for_each_of_several_dials() {
    Starter starter =
        starter(
            winchWith(
                F2,
                F2
                    + F3
                    + " dials: {time-multiplier: {range: [0.05, 1.0], step: 0.05},"
                    + " pick-up: {step: 5 A}}, trips: Q1}\n"));

    assertThat(starter.dialScales().get("protection.F3.time-multiplier").step()).hasValue(0.05);
    assertThat(starter.dialScales().get("protection.F3.pick-up").hasRange()).isFalse();
  }

  @Test
  void should_keep_no_scale_where_none_is_declared() {
    assertThat(starter(StarterFiles.winch()).dialScales()).isEmpty();
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "dial-range: [3 s, 10 s] | holds the setting of line",
        "dial-range: [10 s, 1 s] | a greatest setting above the least",
        "dial-range: [1 s] | a list of the least and the greatest setting but found a list of 1",
        "dial-range: 10 s | a list of the least and the greatest setting",
        "dial-range: [1 A, 10 s] | expected a time but found a current",
        "dial-step: 0.1 | expected a time but found a number without a unit",
        "dial-step: 0 s | a time above 0",
        "'dial-range: [1 s, 3 s], dial-step: 3 s' | a step within the range",
        "dial-error: 5 % | expected dial-range beside dial-error",
        "'dial-range: [1 s, 3 s], dial-error: 100 %' | below 100 %",
        "'dial-step: 0.1 s, dials: {after: {step: 0.1 s}}' | dial-step or dials but found both",
        "dials: {at-least: {step: 0.1 s}} | expected after but found 'at-least'",
        "dials: {after: {stop: 0.1 s}} | expected one of range, step, error",
      })
  void should_tell_what_is_wrong_with_a_scale(String typed, String message) {
    assertThat(read(winchWith(STEP, "after: 2 s, " + typed + "}")).diagnostics())
        .singleElement()
        .satisfies(
            d -> {
              assertThat(d.message()).contains(message);
              assertThat(d.path()).startsWith("steps[1]");
            });
  }

  @Test
  void should_ask_which_of_two_dials_is_meant() {
    assertThat(read(winchWith(F2, F2 + F3 + " dial-step: 0.05, trips: Q1}\n")).diagnostics())
        .singleElement()
        .satisfies(
            d -> {
              assertThat(d.message()).contains("which of pick-up and time-multiplier is meant");
              assertThat(d.hint().orElseThrow()).contains("dials: {pick-up: {step: …}}");
            });
  }

  @Test
  void a_fuse_has_no_dial() {
    assertThat(read(winchWith("rating: 200 A}", "rating: 200 A, dial-step: 1 A}")).diagnostics())
        .singleElement()
        .satisfies(d -> assertThat(d.message()).contains("found 'dial-step'"));
  }
}
