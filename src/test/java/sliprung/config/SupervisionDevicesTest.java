package sliprung.config;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import sliprung.fixture.StarterText;
import sliprung.starter.Device;

class SupervisionDevicesTest {
  private static StarterText with(String device) {
    return StarterText.small().under("F5:", "  X1: {" + device + ", trips: K1}");
  }

  private static Device read(String device) {
    return with(device).starter().device("X1").orElseThrow();
  }

  private static String mistakes(String device) {
    return with(device).reading().diagnostics().stream()
        .map(Diagnostic::render)
        .collect(Collectors.joining("\n"));
  }

  @Test
  void a_temperature_sensor_sits_in_the_bank_and_watches_every_section() {
    Device.Temperature device =
        (Device.Temperature) read("kind: temperature, limit: 350 °C, lag: 20 s");
    assertThat(device.fitting().place()).isEqualTo(Device.Place.BANK);
    assertThat(device.sections()).containsExactly(1, 2);
    assertThat(device.absolute()).isTrue();
    assertThat(device.measuresCurrent()).isFalse();
    assertThat(with("kind: temperature, limit: 350 °C, lag: 20 s").starter().assumptions())
        .extracting(a -> a.path())
        .contains("protection.X1.air", "protection.X1.accuracy.pick-up");
  }

  @Test
  void limit_and_rise_exclude_each_other() {
    assertThat(mistakes("kind: temperature, lag: 20 s")).contains("expected one of limit, rise");
    assertThat(mistakes("kind: temperature, lag: 20 s, limit: 350 °C, rise: 300 K"))
        .contains("limit and rise");
  }

  @Test
  void sections_are_those_of_the_bank() {
    assertThat(mistakes("kind: temperature, rise: 300 K, lag: 20 s, sections: [3]"))
        .contains("sections[1]");
    assertThat(mistakes("kind: temperature, rise: 300 K, lag: 20 s, sections: [1, 1]"))
        .contains("different section numbers");
    assertThat(mistakes("kind: temperature, rise: 300 K, lag: 20 s, place: stator"))
        .contains("place");
  }

  @Test
  void a_proof_of_steps_and_an_undervoltage_relay_are_read() {
    assertThat(read("kind: step-proof, time: 5 s")).isInstanceOf(Device.StepProof.class);
    Device.Undervoltage relay =
        (Device.Undervoltage) read("kind: undervoltage, below: 70 %, time: 500 ms");
    assertThat(relay.share()).isEqualTo(0.70);
    assertThat(relay.seconds()).isEqualTo(0.5);
    assertThat(relay.accuracy().pickUp()).isEqualTo(0.05);
    assertThat(mistakes("kind: undervoltage, below: 120 %, time: 1 s")).contains("below");
  }
}
