package sliprung.config;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Every file of {@code broken/} says in its first lines which mistakes a reader must find: {@code #
 * mistake: line:column | path | words of the message}. All of them are found in one go, and no
 * other.
 */
class BrokenFilesTest {

  static Stream<Path> files() throws IOException {
    try (Stream<Path> all = Files.list(Path.of("src/test/resources/broken"))) {
      return all.sorted().toList().stream();
    }
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("files")
  void every_mistake_is_told_at_its_place(Path file) throws IOException {
    assertThat(expected(file)).isNotEmpty();
    List<Diagnostic> found = StarterFiles.READER.read(file).diagnostics();

    assertThat(found).as("%s", rendered(found)).hasSameSizeAs(expected(file));
    int i = 0;
    for (String[] mistake : expected(file)) {
      Diagnostic diagnostic = found.get(i);
      i++;
      assertThat(diagnostic.place().line() + ":" + diagnostic.place().column())
          .as("%s", diagnostic.render())
          .isEqualTo(mistake[0]);
      assertThat(diagnostic.path()).isEqualTo(mistake[1]);
      assertThat(diagnostic.message()).contains(mistake[2]);
      assertThat(diagnostic.place().file()).isEqualTo(file.toString());
      assertThat(diagnostic.sourceLine())
          .isEqualTo(Files.readAllLines(file).get(diagnostic.place().line() - 1));
    }
  }

  private static List<String[]> expected(Path file) throws IOException {
    List<String[]> mistakes = new ArrayList<>();
    for (String line : Files.readAllLines(file)) {
      if (line.startsWith("# mistake: ")) {
        mistakes.add(line.substring("# mistake: ".length()).split(" \\| ", 3));
      }
    }
    return mistakes;
  }

  private static String rendered(List<Diagnostic> found) {
    StringBuilder out = new StringBuilder();
    found.forEach(d -> out.append(d.render()));
    return out.toString();
  }
}
