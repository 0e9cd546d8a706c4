package sliprung.cli;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.io.Writer;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import sliprung.fixture.StarterText;
import sliprung.rulebook.catalogue.Catalogue;

/** The program in this process: what it prints where, what it writes, how it exits. */
class MainTest {
  private static final char ESCAPE = '\u001b';

  @TempDir private Path folder;
  private Path sound;
  private Path breach;
  private Path notJudged;
  private Path broken;

  /** One run of the program. */
  private record Ran(int status, String out, String err) {}

  private static Ran run(Object... arguments) {
    return run(Terminal.PLAIN, arguments);
  }

  private static Ran run(Terminal terminal, Object... arguments) {
    StringWriter out = new StringWriter();
    StringWriter err = new StringWriter();
    PrintWriter outWriter = new PrintWriter(out);
    PrintWriter errWriter = new PrintWriter(err);
    int status =
        Main.run(
            Stream.of(arguments).map(String::valueOf).toArray(String[]::new),
            outWriter,
            errWriter,
            terminal);
    outWriter.flush();
    errWriter.flush();
    return new Ran(status, out.toString(), err.toString());
  }

  @BeforeEach
  void describeStarters() throws IOException {
    sound = file("sound.yaml", StarterText.sound());
    breach = file("breach.yaml", StarterText.sound().without("F5:"));
    notJudged = file("not-judged.yaml", StarterText.sound().without("stall-limit:"));
    broken = file("broken.yaml", StarterText.sound().with("power: 55 kW", "power: 55"));
  }

  private Path file(String name, StarterText text) throws IOException {
    Path path = folder.resolve(name);
    Files.createDirectories(path.getParent());
    return Files.writeString(path, text.yaml());
  }

  /** Every file under a folder that no test put there. */
  private List<String> under(Path place) throws IOException {
    List<String> found = new ArrayList<>();
    if (Files.exists(place)) {
      try (Stream<Path> all = Files.walk(place)) {
        all.filter(Files::isRegularFile)
            .map(p -> place.relativize(p).toString().replace('\\', '/'))
            .forEach(found::add);
      }
    }
    return found;
  }

  @Test
  void a_sound_starter_is_reviewed_with_status_0_and_an_empty_error_stream() {
    Ran ran = run("review", sound);

    assertThat(ran.status()).isZero();
    assertThat(ran.err()).isEmpty();
    assertThat(ran.out()).contains("two-steps").contains("held/exposure");
  }

  @Test
  void a_breach_exits_with_1_and_prints_the_finding() {
    Ran ran = run("review", breach);

    assertThat(ran.status()).isEqualTo(1);
    assertThat(ran.err()).isEmpty();
    assertThat(ran.out()).contains("breach").contains("sequence/supervision");
  }

  @Test
  void what_must_be_judged_and_is_not_exits_with_4_and_names_the_input() {
    Ran ran = run("review", notJudged);

    assertThat(ran.status()).isEqualTo(4);
    assertThat(ran.out()).contains("not judged").contains("motor.stall-limit");
  }

  @Test
  void of_several_files_the_worst_counts() {
    assertThat(run("review", sound, notJudged).status()).isEqualTo(4);
    assertThat(run("review", notJudged, breach, sound).status()).isEqualTo(1);
    assertThat(run("review", breach, notJudged).out()).contains("not judged").contains("breach");
  }

  @Test
  void a_broken_file_exits_with_2_names_line_and_key_and_prints_nothing_else() {
    Ran ran = run("review", broken);

    assertThat(ran.status()).isEqualTo(2);
    assertThat(ran.out()).isEmpty();
    assertThat(ran.err()).contains("broken.yaml:").contains("motor.power");
  }

  @Test
  void if_one_of_two_files_is_broken_nothing_is_written() throws IOException {
    Path out = folder.resolve("records");
    for (List<Path> files : List.of(List.of(sound, broken), List.of(broken, sound))) {
      Ran ran = run("review", files.get(0), files.get(1), "--out", out);

      assertThat(ran.status()).isEqualTo(2);
      assertThat(ran.out()).isEmpty();
      assertThat(out).doesNotExist();
    }
  }

  @ParameterizedTest
  @ValueSource(strings = {"missing.yaml", "."})
  void what_is_no_file_exits_with_2(String name) {
    Ran ran = run("review", folder.resolve(name));

    assertThat(ran.status()).isEqualTo(2);
    assertThat(ran.out()).isEmpty();
    assertThat(ran.err()).isNotBlank();
  }

  @Test
  void a_record_is_written_whole_and_holds_what_was_printed() throws IOException {
    Path out = folder.resolve("records");
    Ran ran = run("review", sound, breach, "--out", out);

    assertThat(ran.status()).isEqualTo(1);
    for (String stem : List.of("sound", "breach")) {
      List<String> files = under(out.resolve(stem));
      assertThat(files).contains("review.html", "review.json", "profile.csv");
      assertThat(files).anyMatch(f -> f.endsWith(".svg"));
      assertThat(files).noneMatch(f -> f.startsWith(".new"));
    }
    JsonNode json = new ObjectMapper().readTree(out.resolve("sound/review.json").toFile());
    assertThat(json.get("format").asInt()).isEqualTo(1);
    assertThat(json.get("starter").asText()).isEqualTo("two-steps");
    assertThat(json.get("inputs").get(0).get("file").asText()).isEqualTo("sound.yaml");
    assertThat(json.get("inputs").get(0).get("text").asText()).isEqualTo(Files.readString(sound));
    assertThat(json.get("findings")).hasSizeGreaterThan(20);
    assertThat(Files.readString(out.resolve("sound/review.html"))).contains("two-steps");
  }

  /** A record of the folder's name: no file of the machine is told. */
  @Test
  void a_record_does_not_tell_where_on_the_machine_it_was_made() throws IOException {
    Path out = folder.resolve("records");
    run("review", sound, "--out", out);
    for (String file : under(out)) {
      assertThat(Files.readString(out.resolve(file), StandardCharsets.ISO_8859_1))
          .as(file)
          .doesNotContain(folder.toString());
    }
  }

  @Test
  void a_record_written_again_is_the_same_on_the_same_day() throws IOException {
    Path first = folder.resolve("first");
    Path second = folder.resolve("second");
    run("review", sound, "--out", first, "--on", "2026-12-01");
    run("review", sound, "--out", second, "--on", "2026-12-01");

    assertThat(under(first)).isEqualTo(under(second)).isNotEmpty();
    for (String file : under(first)) {
      assertThat(Files.readAllBytes(second.resolve(file)))
          .as(file)
          .isEqualTo(Files.readAllBytes(first.resolve(file)));
    }
  }

  @Test
  void a_place_that_cannot_be_written_exits_with_2() throws IOException {
    Path occupied = Files.writeString(folder.resolve("occupied"), "a file");
    Ran ran = run("review", sound, "--out", occupied);

    assertThat(ran.status()).isEqualTo(2);
    assertThat(ran.err()).contains("cannot be written");
    assertThat(Files.readString(occupied)).isEqualTo("a file");
  }

  @Test
  void two_files_of_one_stem_would_overwrite_each_other() throws IOException {
    Path other = file("other/sound.yaml", StarterText.sound());
    Path out = folder.resolve("records");
    Ran ran = run("review", sound, other, "--out", out);

    assertThat(ran.status()).isEqualTo(2);
    assertThat(ran.out()).isEmpty();
    assertThat(ran.err()).contains("sound");
    assertThat(out).doesNotExist();
    assertThat(run("review", sound, other).status()).isZero();
  }

  /** Every file of a name that is all dots would be written beside or above the folder. */
  @ParameterizedTest
  @ValueSource(strings = {"..yaml", "...yaml", ".yaml"})
  void a_record_stays_within_its_folder_whatever_the_file_is_called(String name)
      throws IOException {
    Path out = folder.resolve("out/records");
    Ran ran = run("review", file(name, StarterText.sound()), "--out", out);

    assertThat(under(folder.resolve("out")))
        .allMatch(f -> f.matches("records/[^/]+/[^/]+"))
        .hasSizeGreaterThan(ran.status() == 0 ? 3 : -1);
  }

  @Test
  void the_date_decides_on_accepted_deviations() throws IOException {
    Path accepting =
        file(
            "accepting.yaml",
            StarterText.sound()
                .line("F5:", "F5: {kind: sequence-timer, time: 6 s, until: last-step, trips: K1}")
                .plus(
                    "accepted:\n"
                        + "  - {rule: trip/start, subject: F5, not-below: 0.9, reason: r, by: b,"
                        + " until: 2027-06-30}\n"
                        + "  - {rule: sequence/supervision, subject: F5, not-below: 0.9, reason: r,"
                        + " by: b, until: 2027-06-30}"));

    assertThat(run("review", accepting, "--on", "2027-06-30").status()).isZero();
    assertThat(run("review", accepting, "--on", "2027-07-01").status()).isEqualTo(1);
  }

  @ParameterizedTest
  @CsvSource({
    "''",
    "revue",
    "review",
    "review --on tomorrow starter.yaml",
    "review --unknown starter.yaml",
    "rules no/rule",
    "rules held/blind more",
    "curves more"
  })
  void a_wrong_call_exits_with_2_and_tells_why(String call) {
    Ran ran = run((Object[]) (call.isEmpty() ? new String[0] : call.split(" ")));

    assertThat(ran.status()).isEqualTo(2);
    assertThat(ran.out()).isEmpty();
    assertThat(ran.err()).contains("sliprung: ");
  }

  @Test
  void help_and_version_exit_with_0() {
    assertThat(run("--help").status()).isZero();
    assertThat(run("--help").out()).contains("Exit status").contains("review");
    assertThat(run("--version").out()).contains("sliprung");
    assertThat(run("review", "--help").out()).contains("--out");
  }

  @Test
  void rules_lists_every_rule_and_marks_what_must_be_judged() {
    Ran ran = run("rules");

    assertThat(ran.status()).isZero();
    for (String name : Catalogue.names()) {
      assertThat(ran.out()).contains(name);
    }
    assertThat(ran.out().lines().filter(l -> l.startsWith("* "))).hasSize(6);
  }

  @Test
  void rules_with_a_name_prints_its_page() {
    Ran ran = run("rules", "held/blind");

    assertThat(ran.status()).isZero();
    assertThat(ran.out()).startsWith("# held/blind").contains("## Limits");
  }

  @Test
  void curves_lists_laws_classes_and_gates_with_their_source() {
    Ran ran = run("curves");

    assertThat(ran.status()).isZero();
    assertThat(ran.out())
        .contains("iec-very-inverse")
        .contains("ieee-extremely-inverse")
        .contains("nema-20")
        .contains("250 A")
        .contains("IEC 60947-4-1");
  }

  @Test
  void a_pipe_gets_no_escape_sequences() {
    assertThat(run("review", breach).out().indexOf(ESCAPE)).isNegative();
    assertThat(run("rules").out().indexOf(ESCAPE)).isNegative();
    assertThat(run("--help").out().indexOf(ESCAPE)).isNegative();
  }

  @Test
  void a_terminal_gets_weight_and_colour_and_the_same_words() {
    Ran plain = run("review", breach);
    Ran coloured = run(new Terminal(true, 100), "review", breach);

    assertThat(coloured.out().indexOf(ESCAPE)).isNotNegative();
    assertThat(coloured.out().replaceAll("\u001b\\[[0-9;]*m", "").replaceAll("[0-9.]+ s\n", ""))
        .isEqualTo(plain.out().replaceAll("[0-9.]+ s\n", ""));
  }

  @ParameterizedTest
  @CsvSource({
    "true, xterm, '', true",
    "false, xterm, '', false",
    "true, dumb, '', false",
    "true, xterm, 1, false"
  })
  void colour_needs_a_terminal_and_no_wish_against_it(
      boolean interactive, String term, String noColour, boolean expected) {
    Terminal terminal = Terminal.of(interactive, Map.of("TERM", term, "NO_COLOR", noColour));

    assertThat(terminal.colour()).isEqualTo(expected);
  }

  @ParameterizedTest
  @CsvSource({"40, 80", "90, 90", "500, 100", "wide, 100"})
  void the_width_follows_the_terminal_within_reason(String columns, int expected) {
    assertThat(Terminal.of(true, Map.of("COLUMNS", columns)).columns()).isEqualTo(expected);
  }

  /** No line is wider than the terminal, links and paths apart. */
  @ParameterizedTest
  @ValueSource(ints = {80, 100})
  void lines_fit_the_terminal(int columns) {
    run(new Terminal(false, columns), "review", "--all", breach)
        .out()
        .lines()
        .forEach(line -> assertThat(line.length()).as(line).isLessThanOrEqualTo(columns));
  }

  /** Escape codes, a bell, a right-to-left override: what the user typed is never obeyed. */
  @Test
  void a_hostile_starter_reaches_no_terminal_raw() throws IOException {
    Path hostile =
        file(
            "hostile.yaml",
            StarterText.sound()
                .with("starter: two-steps", "starter: \"two\\e[2J\\a\\u202Esteps\""));
    Path worse =
        file("worse.yaml", StarterText.sound().with("power: 55 kW", "power: \"55\\e[2J\\a kW\""));
    for (Path path : List.of(hostile, worse)) {
      Ran ran = run("review", path, "--all");
      assertThat(ran.out() + ran.err())
          .doesNotContain("\u001b")
          .doesNotContain("\u0007")
          .doesNotContain("\u202e");
      assertThat(ran.out() + ran.err()).isNotBlank();
    }
  }

  /** What breaks in the program is told apart from what breaks in the user's file. */
  @Test
  void a_defect_exits_with_3_and_says_that_nothing_may_be_relied_on() {
    Writer failing =
        new Writer() {
          @Override
          public void write(char[] text, int from, int length) {
            throw new IllegalStateException("no paper");
          }

          @Override
          public void flush() {
            // nothing is held back
          }

          @Override
          public void close() {
            // nothing is open
          }
        };
    StringWriter err = new StringWriter();
    int status =
        Main.run(
            new String[] {"review", sound.toString()},
            new PrintWriter(failing),
            new PrintWriter(err, true),
            Terminal.PLAIN);

    assertThat(status).isEqualTo(3);
    assertThat(err.toString()).contains("a defect of the program").contains("no paper");
  }

  @Test
  void a_defect_counts_more_than_anything() {
    assertThat(ExitStatus.worse(ExitStatus.DEFECT, ExitStatus.WRONG_INPUT)).isEqualTo(3);
    assertThat(ExitStatus.worse(ExitStatus.NOT_JUDGED, ExitStatus.BREACH)).isEqualTo(1);
    assertThat(ExitStatus.worse(ExitStatus.NOT_JUDGED, ExitStatus.CLEAR)).isEqualTo(4);
    assertThat(ExitStatus.worse(ExitStatus.BREACH, ExitStatus.WRONG_INPUT)).isEqualTo(2);
  }
}
