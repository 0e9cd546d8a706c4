package sliprung.config;

import static org.assertj.core.api.Assertions.assertThat;
import static sliprung.config.StarterFiles.read;
import static sliprung.config.StarterFiles.starter;
import static sliprung.config.StarterFiles.winch;
import static sliprung.config.StarterFiles.winchWith;

import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import sliprung.starter.Device;
import sliprung.starter.Step;

/** Values changed in place: all else of the file stays byte for byte. */
class SettingEditorTest {

  private static String edited(String text, Map<String, Double> values) {
    SettingEditor.Edited edited =
        new SettingEditor(read(text).described().orElseThrow()).with(values);
    return ((SettingEditor.Text) edited).text();
  }

  @Test
  void should_change_the_values_and_nothing_else() {
    String text = winch();

    String fresh = edited(text, Map.of("steps[1].after", 2.75, "protection.F2.dial", 98.5));

    assertThat(fresh)
        .isEqualTo(text.replace("after: 2 s", "after: 2.75 s").replace("105 A, t", "98.5 A, t"));
    assertThat(((Step.After) starter(fresh).steps().get(0).rule()).seconds()).isEqualTo(2.75);
    assertThat(((Device.Overload) starter(fresh).device("F2").orElseThrow()).dialAmps())
        .isEqualTo(98.5);
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "2000 ms | 2500 ms",
        "2000ms | 2500ms",
        "0.0333333 min | 0.0416667 min",
        "1e2 cycles | 125 cycles",
        "+2 s | 2.5 s",
        "2 000 ms | 2500 ms",
        "\"2 s\" | \"2.5 s\"",
      })
  void should_keep_the_unit_as_it_was_typed(String typed, String expected) {
    String text = winchWith("after: 2 s", "after: " + typed);
    String fresh = edited(text, Map.of("steps[1].after", 2.5));

    assertThat(fresh).isEqualTo(winchWith("after: 2 s", "after: " + expected));
  }

  @Test
  void should_keep_comments_and_find_values_behind_letters_of_two_chars() {
    String text =
        winchWith(
            "  - {contactor: K11, after: 2 s}",
            "  - {contactor: \"K11\", after: 2 s}   # \ud83d\udd27 set by hand");
    assertThat(edited(text, Map.of("steps[1].after", 3.0)))
        .isEqualTo(text.replace("after: 2 s}", "after: 3 s}"));
  }

  @Test
  void should_refuse_what_the_file_does_not_give() {
    SettingEditor editor = new SettingEditor(read(winch()).described().orElseThrow());

    assertThat(editor.with(Map.of("steps[1].at-least", 1.0)))
        .isInstanceOfSatisfying(
            SettingEditor.Refusal.class, r -> assertThat(r.reason()).contains("not give"));
    assertThat(editor.with(Map.of("protection.F2.class", 1.0)))
        .isInstanceOf(SettingEditor.Refusal.class);
  }

  @Test
  void should_refuse_a_value_that_does_not_stand_on_one_line() {
    String text = winchWith("after: 2 s", "after: \"2\n      s\"");
    SettingEditor editor = new SettingEditor(read(text).described().orElseThrow());

    assertThat(editor.with(Map.of("steps[1].after", 1.0)))
        .isInstanceOf(SettingEditor.Refusal.class);
  }
}
