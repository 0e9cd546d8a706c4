package sliprung.cli;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import sliprung.fixture.StarterText;

class ProposeCommandTest {
  @TempDir private Path folder;
  private Path file;

  private record Ran(int status, String out, String err) {}

  private static Ran run(Object... arguments) {
    StringWriter out = new StringWriter();
    StringWriter err = new StringWriter();
    String[] words = java.util.Arrays.stream(arguments).map(String::valueOf).toArray(String[]::new);
    int status = Main.run(words, new PrintWriter(out), new PrintWriter(err, true), Terminal.PLAIN);
    return new Ran(status, out.toString(), err.toString());
  }

  @BeforeEach
  void describe() throws IOException {
    file = Files.writeString(folder.resolve("starter.yaml"), StarterText.sound().yaml());
  }

  @Test
  void should_write_a_new_file_with_the_proposed_values_and_leave_the_old_one() throws IOException {
    Path target = folder.resolve("new.yaml");

    Ran ran = run("propose", file, "--json", "--write", target, "--on", "2026-12-01");

    assertThat(ran.err()).isEmpty();
    assertThat(ran.status()).isZero();
    JsonNode proposal = new ObjectMapper().readTree(ran.out());
    assertThat(proposal.get("settings")).isNotEmpty();
    assertThat(proposal.get("moved")).isNotEmpty();
    assertThat(Files.readString(file)).isEqualTo(StarterText.sound().yaml());
    assertThat(Files.readAllLines(target)).hasSameSizeAs(Files.readAllLines(file));
    assertThat(Files.readString(target)).isNotEqualTo(Files.readString(file));
  }

  @Test
  void should_never_write_over_a_file() throws IOException {
    Path other = Files.writeString(folder.resolve("other.yaml"), "mine");

    assertThat(run("propose", file, "--write", file).status()).isEqualTo(2);
    assertThat(run("propose", file, "--write", other).err()).contains("exists: name a new file");
    assertThat(Files.readString(file)).isEqualTo(StarterText.sound().yaml());
    assertThat(Files.readString(other)).isEqualTo("mine");
  }

  @Test
  void should_share_out_the_bank() throws IOException {
    Ran table = run("propose", file, "--sections");
    JsonNode bank = new ObjectMapper().readTree(run("propose", file, "--sections", "--json").out());

    assertThat(table.out()).contains("geometric, ratio").contains("spread");
    assertThat(bank.get("geometric").get("sections_ohm")).hasSize(2);
    assertThat(run("propose", file, "--sections", "--write", folder.resolve("b.yaml")).status())
        .isEqualTo(2);
  }
}
