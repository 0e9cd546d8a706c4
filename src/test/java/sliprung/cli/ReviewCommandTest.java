package sliprung.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.util.HexFormat;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class ReviewCommandTest {
  private static final Path CRUSHER = Path.of("configs", "crusher.yaml");

  @TempDir Path directory;

  private record Ran(int status, String out, String err) {}

  private static Ran run(String... arguments) {
    StringWriter out = new StringWriter();
    StringWriter err = new StringWriter();
    int status =
        Main.run(arguments, new PrintWriter(out), new PrintWriter(err, true), Terminal.PLAIN);
    return new Ran(status, out.toString(), err.toString());
  }

  @Test
  void should_write_the_same_record_twice_and_name_its_input_by_its_hash() throws Exception {
    Map<String, byte[]> first = record("a");
    Map<String, byte[]> second = record("b");
    assertThat(first.keySet())
        .contains("review.html", "review.json", "review.pdf", "profile.csv", "first-limit.svg");
    assertThat(second.keySet()).isEqualTo(first.keySet());
    first.forEach((name, bytes) -> assertThat(second.get(name)).as(name).isEqualTo(bytes));
    String hash =
        HexFormat.of()
            .formatHex(MessageDigest.getInstance("SHA-256").digest(Files.readAllBytes(CRUSHER)));
    assertThat(new String(first.get("review.html"))).contains(hash);
    assertThat(new String(first.get("review.json"))).contains(hash);
    assertThat(new String(first.get("review.html")))
        .doesNotContain(directory.toString())
        .doesNotContain(System.getProperty("user.dir"));
  }

  private Map<String, byte[]> record(String name) throws IOException {
    Path place = directory.resolve(name);
    Ran ran =
        run("review", CRUSHER.toString(), "--out", place.toString(), "--on", "2026-12-01", "--pdf");
    assertThat(ran.err()).isEmpty();
    Map<String, byte[]> files = new TreeMap<>();
    try (Stream<Path> all = Files.list(place.resolve("crusher"))) {
      for (Path file : all.toList()) {
        files.put(String.valueOf(file.getFileName()), Files.readAllBytes(file));
      }
    }
    return files;
  }

  @Test
  void should_never_send_a_control_character_of_the_users_to_the_terminal() throws IOException {
    Path bad = directory.resolve("bad.yaml");
    Files.writeString(
        bad, Files.readString(CRUSHER).replace("JC-1 primary", "\"\\e[31mJC-1\\u202E\" #"));
    Ran ran = run("review", bad.toString(), "--pap\u001b[31mer", "x");
    assertThat(ran.status()).isEqualTo(ExitStatus.WRONG_INPUT);
    assertThat(ran.err()).doesNotContain("\u001b");
    Ran read = run("review", bad.toString());
    assertThat(read.status()).isEqualTo(ExitStatus.WRONG_INPUT);
    assertThat(read.out() + read.err()).doesNotContain("\u001b").doesNotContain("\u202E");
  }

  @Test
  void should_refuse_paper_that_nobody_sells() {
    Ran ran = run("review", CRUSHER.toString(), "--paper", "a5");
    assertThat(ran.status()).isEqualTo(ExitStatus.WRONG_INPUT);
    assertThat(ran.err()).contains("expected a4 or letter but found 'a5'");
  }

  @Test
  void should_make_a_pdf_only_when_asked_and_say_how_to_ask() throws IOException {
    Path place = directory.resolve("c").resolve("crusher");
    Ran plain = run("review", CRUSHER.toString(), "--out", directory.resolve("c").toString());
    assertThat(place.resolve("review.html")).exists();
    assertThat(place.resolve("review.pdf")).doesNotExist();
    assertThat(plain.out()).contains("--pdf makes it on paper too");
    Files.writeString(place.resolve("review.pdf"), "of another day");
    Ran again = run("review", CRUSHER.toString(), "--out", directory.resolve("c").toString());
    assertThat(place.resolve("review.pdf")).hasContent("of another day");
    assertThat(again.out()).contains("the review.pdf beside it is of an earlier review");
    Ran letter =
        run(
            "review",
            CRUSHER.toString(),
            "--out",
            directory.resolve("c").toString(),
            "--paper",
            "letter");
    assertThat(letter.out()).contains("and review.pdf beside it");
    assertThat(Files.readAllBytes(place.resolve("review.pdf"))).startsWith("%PDF".getBytes());
  }

  @Test
  void should_refuse_a_pdf_without_a_place_for_it() {
    Ran ran = run("review", CRUSHER.toString(), "--pdf");
    assertThat(ran.status()).isEqualTo(ExitStatus.WRONG_INPUT);
    assertThat(ran.err()).contains("give --out DIR");
    assertThat(ran.out()).isEmpty();
  }

  @Test
  void should_say_what_to_measure_first_only_when_asked() {
    String small = Path.of("src", "test", "resources", "starters", "two-steps.yaml").toString();
    String line = "Thinnest margin that an input moves: ";

    assertThat(run("review", small).out()).doesNotContain(line);
    Ran asked = run("review", small, "--measure-first");
    assertThat(asked.err()).isEmpty();
    assertThat(asked.out().replaceAll("\\s+", " ")).contains(line).contains(" to between ");
  }
}
