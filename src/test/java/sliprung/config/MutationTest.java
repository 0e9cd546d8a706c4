package sliprung.config;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.ByteArrayOutputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Random;
import java.util.stream.IntStream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Sound files damaged at random, the same way each time: a starter or diagnostics, nothing else.
 */
class MutationTest {
  private static final String[] UNITS = {
    " V", " A", " kW", " s", " ms", " %", " ohm", " kg·m²", " N·m", " Hz", " rpm", " °C"
  };
  private static final String[] INSERTS = {
    "[",
    "]",
    "{",
    "}",
    ":",
    ": ",
    "- ",
    "&a ",
    "*a",
    "!!int ",
    "\"",
    "'",
    "#",
    "|",
    ">",
    "? ",
    "---\n",
    "...\n",
    "%TAG ! tag:x\n",
    "\t",
    "<<",
    "~",
    "9e999",
    "-",
    ",",
    "\u2028",
    "\ufeff",
    "@",
    "null",
    "0",
    "𝟙"
  };

  static IntStream seeds() {
    return IntStream.range(0, 400);
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void damage_never_ends_in_an_exception(int seed) {
    Random random = new Random(seed);
    String text =
        StarterFiles.text(seed % 2 == 0 ? "starters/jaw-crusher.yaml" : "starters/winch.yaml");
    int times = 1 + random.nextInt(4);
    byte[] bytes = text.getBytes(StandardCharsets.UTF_8);
    for (int i = 0; i < times; i++) {
      bytes = damage(bytes, random);
    }

    StarterReading reading = StarterFiles.READER.read("x.yaml", bytes, CurveFiles.NONE);

    assertThat(reading.described().isPresent()).isEqualTo(reading.diagnostics().isEmpty());
    assertThat(reading.diagnostics())
        .allSatisfy(
            d -> {
              assertThat(d.place().line()).isPositive();
              assertThat(d.place().column()).isPositive();
              assertThat(d.message()).contains("found").doesNotContainPattern("\\p{Cntrl}");
              assertThat(d.render()).startsWith("x.yaml:");
            });
  }

  private static byte[] damage(byte[] bytes, Random random) {
    String text = new String(bytes, StandardCharsets.UTF_8);
    List<String> lines = new ArrayList<>(List.of(text.split("\n", -1)));
    int line = random.nextInt(lines.size());
    int other = random.nextInt(lines.size());
    switch (random.nextInt(8)) {
      case 0 -> lines.remove(line);
      case 1 -> lines.add(other, lines.get(line));
      case 2 -> Collections.swap(lines, line, other);
      case 3 ->
          lines.set(
              line, lines.get(line).replaceFirst("(\\d) [^,}\\s]+", "$1" + pick(UNITS, random)));
      case 4 -> lines.set(line, insert(lines.get(line), pick(INSERTS, random), random));
      case 5 -> lines.set(line, "  ".repeat(random.nextInt(4)) + lines.get(line).strip());
      case 6 ->
          lines.set(line, lines.get(line).replaceAll("\\d", String.valueOf(random.nextInt(10))));
      default -> {
        return randomBytes(bytes, random);
      }
    }
    return String.join("\n", lines).getBytes(StandardCharsets.UTF_8);
  }

  private static String pick(String[] from, Random random) {
    return from[random.nextInt(from.length)];
  }

  private static String insert(String line, String piece, Random random) {
    int at = line.offsetByCodePoints(0, random.nextInt(line.codePointCount(0, line.length()) + 1));
    return line.substring(0, at) + piece + line.substring(at);
  }

  private static byte[] randomBytes(byte[] bytes, Random random) {
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    int at = random.nextInt(bytes.length + 1);
    out.write(bytes, 0, at);
    byte[] noise = new byte[1 + random.nextInt(4)];
    random.nextBytes(noise);
    out.write(noise, 0, noise.length);
    out.write(bytes, at, bytes.length - at);
    return out.toByteArray();
  }
}
