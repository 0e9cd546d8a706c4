package sliprung.config;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Files that no engineer writes: each ends in a diagnostic. */
class HostileInputTest {

  private static Diagnostic only(List<Diagnostic> found) {
    assertThat(found).hasSize(1);
    return found.get(0);
  }

  private static List<Diagnostic> read(byte[] bytes) {
    return StarterFiles.READER.read("x.yaml", bytes, CurveFiles.NONE).diagnostics();
  }

  private static List<Diagnostic> read(String text) {
    return StarterFiles.READER.read("x.yaml", text, CurveFiles.NONE).diagnostics();
  }

  @Test
  void aliases_that_multiply_are_refused_one_by_one() {
    StringBuilder laughs = new StringBuilder("a0: &a0 [ha, ha]\n");
    for (int i = 1; i < 30; i++) {
      laughs.append(
          String.format(java.util.Locale.ROOT, "a%d: &a%d [*a%d, *a%d]%n", i, i, i - 1, i - 1));
    }
    List<Diagnostic> found = read(laughs.toString());

    assertThat(found).filteredOn(d -> d.message().contains("found an anchor")).hasSize(30);
    assertThat(found).filteredOn(d -> d.message().contains("found an alias")).hasSize(58);
  }

  @ParameterizedTest
  @ValueSource(strings = {"[", "{a: ", "- "})
  void deep_nesting_is_refused(String piece) {
    assertThat(only(read(piece.repeat(20_000))).message())
        .isEqualTo("expected at most 12 levels but found a deeper nesting");
  }

  @Test
  void a_large_file_is_refused_unread(@TempDir Path folder) throws IOException {
    Path file = folder.resolve("large.yaml");
    Files.write(file, new byte[5 * 1024 * 1024]);

    assertThat(only(StarterFiles.READER.read(file).diagnostics()).message())
        .isEqualTo("expected a file of at most 1024 KiB but found a larger one");
    assertThat(only(read(new byte[5 * 1024 * 1024])).message()).contains("1024 KiB");
  }

  @ParameterizedTest
  @ValueSource(strings = {"1", "1 234", "1e", "1,"})
  void endless_quantities_are_refused_at_once(String piece) {
    assertThat(only(read(StarterFiles.winchWith("55 kW", piece.repeat(100_000)))).path())
        .isEqualTo("motor.power");
  }

  @Test
  void an_endless_name_is_refused() {
    assertThat(only(read(StarterFiles.winchWith("W-7 winch", "W".repeat(500)))).message())
        .startsWith("expected the starter's tag of at most 400 letters");
  }

  @Test
  void more_sections_than_any_bank_has_are_refused() {
    String section = "    - {resistance: 0.5 ohm}\n";
    assertThat(read(StarterFiles.winchWith("  sections:\n", "  sections:\n" + section.repeat(40))))
        .extracting(Diagnostic::message)
        .containsExactly(
            "expected at most 40 sections but found 42",
            "expected one step for each of the 42 sections but found 2");
  }

  @Test
  void many_values_are_refused() {
    assertThat(only(read("[" + "a, ".repeat(60_000) + "]")).message())
        .isEqualTo("expected at most 50000 values but found more");
  }

  @Test
  void control_characters_are_told_at_their_place() {
    Diagnostic found = only(read("sliprung: 1\nstarter: W\0-7\n"));

    assertThat(found.message()).isEqualTo("expected printable text but found the character U+0000");
    assertThat(found.place()).hasToString("x.yaml:2:11");
    assertThat(only(read("a: \ud800")).message()).contains("U+D800");
  }

  @Test
  void control_characters_behind_an_escape_do_not_reach_the_terminal() {
    Diagnostic found = only(read(StarterFiles.winchWith("W-7 winch", "\"W\\e[2J\\u202e\\n\"")));

    assertThat(found.path()).isEqualTo("starter");
    assertThat(found.message()).doesNotContainPattern("\\p{C}");
  }

  @Test
  void other_encodings_are_told_at_the_first_bad_byte() {
    Diagnostic latin = only(read("a: 1\nb: é".getBytes(StandardCharsets.ISO_8859_1)));
    assertThat(latin.place()).hasToString("x.yaml:2:4");
    assertThat(latin.message()).contains("UTF-8");
    assertThat(only(read("a: 1".getBytes(StandardCharsets.UTF_16))).place())
        .hasToString("x.yaml:1:1");
    assertThat(only(read(new byte[] {'a', ':', ' ', (byte) 0xC3})).place())
        .hasToString("x.yaml:1:4");
  }

  @Test
  void a_byte_order_mark_and_windows_line_ends_are_fine() {
    String windows = "\ufeff" + StarterFiles.winch().replace("\n", "\r\n");

    StarterReading reading =
        StarterFiles.READER.read(
            "x.yaml", windows.getBytes(StandardCharsets.UTF_8), CurveFiles.NONE);

    assertThat(reading.diagnostics()).isEmpty();
    assertThat(reading.described().orElseThrow().place("supply.voltage"))
        .contains(new Place("x.yaml", 6, 12));
    assertThat(read(windows.replace("power: 55 kW", "power: 55")).get(0).place())
        .hasToString("x.yaml:13:10");
  }

  @ParameterizedTest
  @ValueSource(strings = {"", "\n\n", "# only a comment\n", "---\n...\n", "--- \n", "~", "''"})
  void a_file_without_content_is_told(String text) {
    assertThat(only(read(text)).message()).contains("but found");
  }

  @ParameterizedTest
  @ValueSource(strings = {"just words", "- a\n- b\n", "[]", "7"})
  void another_kind_of_document_is_told(String text) {
    assertThat(only(read(text)).message()).startsWith("expected a mapping of keys to values");
  }

  @Test
  void an_empty_mapping_lacks_everything_required() {
    assertThat(read("{}"))
        .extracting(Diagnostic::path)
        .containsExactly(
            "contactors",
            "load",
            "motor",
            "practice",
            "protection",
            "resistors",
            "sliprung",
            "starter",
            "steps",
            "supply");
  }

  @Test
  void keys_that_are_no_words_are_told() {
    assertThat(read(StarterFiles.winchWith("duty:\n", "? [a, b]\n: 1\n? {c: d}\n: 2\nduty:\n")))
        .extracting(Diagnostic::message)
        .containsExactly(
            "expected a word as key but found a list",
            "expected a word as key but found a mapping of keys to values");
  }

  @Test
  void a_missing_file_and_a_folder_are_told(@TempDir Path folder) {
    assertThat(only(StarterFiles.READER.read(folder.resolve("none.yaml")).diagnostics()).message())
        .isEqualTo("expected a starter file but found no file of that name");
    assertThat(only(StarterFiles.READER.read(folder).diagnostics()).message())
        .isEqualTo("expected a starter file but found something that is not a file");
  }

  @Test
  void a_diagnostic_shows_the_line_and_points_at_the_column() {
    String text = StarterFiles.winchWith("rotor-voltage: 250 V", "rotor-voltage: 250 A");

    assertThat(only(read(text)).render())
        .isEqualTo(
            """
            x.yaml:18:18: error: motor.rotor-voltage: expected a voltage but found a current, '250 A'
                18 |   rotor-voltage: 250 A
                   |                  ^
              hint: write for example '690 V' or '6.6 kV'
            """);
  }
}
