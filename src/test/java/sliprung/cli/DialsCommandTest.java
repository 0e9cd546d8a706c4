package sliprung.cli;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import sliprung.fixture.StarterText;

class DialsCommandTest {
  @TempDir private Path folder;

  private record Ran(int status, String out, String err) {}

  private static Ran run(String... arguments) {
    StringWriter out = new StringWriter();
    StringWriter err = new StringWriter();
    int status =
        Main.run(arguments, new PrintWriter(out), new PrintWriter(err, true), Terminal.PLAIN);
    return new Ran(status, out.toString(), err.toString());
  }

  private Path file(StarterText text) throws IOException {
    return Files.writeString(folder.resolve("starter.yaml"), text.yaml());
  }

  @Test
  void should_print_the_windows_that_scripts_rely_on() throws IOException {
    Ran ran = run("dials", file(StarterText.sound()).toString(), "--json", "--on", "2026-12-01");

    assertThat(ran.err()).isEmpty();
    assertThat(ran.status()).isZero();
    JsonNode dials = new ObjectMapper().readTree(ran.out());
    assertThat(dials).isNotEmpty();
    for (JsonNode dial : dials) {
      assertThat(dial.get("device").asText()).isNotEmpty();
      assertThat(dial.get("dial").asText()).isNotEmpty();
      assertThat(dial.has("unit")).isTrue();
      double value = dial.get("value").asDouble();
      JsonNode window = dial.get("windows").get(0);
      assertThat(window.get("low").asDouble()).as(dial.toString()).isLessThanOrEqualTo(value);
      assertThat(window.get("high").asDouble()).isGreaterThanOrEqualTo(value);
      assertThat(window.has("low_rule")).isTrue();
      assertThat(window.has("low_corner")).isTrue();
      assertThat(window.has("high_rule")).isTrue();
      assertThat(window.has("high_corner")).isTrue();
      assertThat(dial.get("recommended").asDouble())
          .isBetween(window.get("low").asDouble(), window.get("high").asDouble());
    }
  }

  @Test
  void should_list_apart_what_is_broken_and_not_counted() throws IOException {
    StarterText unseen = StarterText.sound().without("F5:");

    Ran ran = run("dials", file(unseen).toString(), "--on", "2026-12-01");

    assertThat(ran.status()).isEqualTo(1);
    assertThat(ran.out().replaceAll("\\s+", " "))
        .contains("window")
        .containsPattern("not counted there:[^.]*sequence/supervision, sequence timer");
  }

  @Test
  void a_broken_file_is_told_and_nothing_computed() throws IOException {
    Ran ran = run("dials", file(StarterText.sound().with("power: 55 kW", "power: 55")).toString());

    assertThat(ran.status()).isEqualTo(2);
    assertThat(ran.out()).isEmpty();
    assertThat(ran.err()).contains("motor.power");
  }
}
