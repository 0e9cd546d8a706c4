package sliprung.config;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Map;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import sliprung.fixture.StarterText;
import sliprung.starter.Readings;

class ReadingsReaderTest {
  private static StarterText with(String readings) {
    return StarterText.small().plus("readings: " + readings);
  }

  @Test
  void a_file_without_readings_has_none() {
    assertThat(StarterText.small().starter().readings()).isEmpty();
  }

  @Test
  void each_reading_and_accuracy_is_read() {
    Readings all =
        with("{run-up: 9800 ms, running-current: 90 A, current-before: {K12: 150 A}, voltage: 395 V,"
                + " clock: 5 %, clamp: 3 %}")
            .starter()
            .readings()
            .orElseThrow();

    assertThat(all)
        .isEqualTo(
            new Readings(
                OptionalDouble.of(9.8),
                OptionalDouble.of(90.0),
                Map.of("K12", 150.0),
                395.0,
                0.05,
                0.03));
    assertThat(all.clockSeconds()).isEqualTo(9.8 * 0.05);
  }

  @Test
  void what_is_left_out_is_rated_voltage_and_the_usual_accuracy() {
    Readings some = with("{run-up: 6 s}").starter().readings().orElseThrow();

    assertThat(some.volts()).isEqualTo(400.0);
    assertThat(some.clamp()).isEqualTo(0.05);
    assertThat(some.clock()).isEqualTo(0.02);
    assertThat(some.clockSeconds()).isEqualTo(0.2);
    assertThat(some.runningAmps()).isEmpty();
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "{voltage: 395 V}                  | expected run-up, running-current or current-before",
        "{run-up: 9.8}                     | a time",
        "{run-up: 0 s}                     | above 0",
        "{run-up: 9 s, clamp: 0 %}         | above 0 %",
        "{current-before: {}}              | before a step contactor closes",
        "{current-before: {K1: 150 A}}     | the tag of a step contactor",
        "{current-before: {K11: 150 V}}    | a current",
        "{runup: 9 s}                      | did you mean 'run-up'",
        "9 s                               | a mapping"
      })
  void a_mistake_is_told_once_with_its_place(String readings, String told) {
    var diagnostics = with(readings).reading().diagnostics();

    assertThat(diagnostics).hasSize(1);
    assertThat(diagnostics.get(0).render()).contains(told).contains("starter.yaml:");
  }
}
