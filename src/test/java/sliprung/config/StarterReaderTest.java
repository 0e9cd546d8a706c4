package sliprung.config;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class StarterReaderTest {
  @ParameterizedTest
  @ValueSource(
      strings = {
        "starters/jaw-crusher.yaml",
        "reference-starters/crusher-6600.yaml",
        "reference-starters/fan-500.yaml",
        "reference-starters/trolley-480.yaml"
      })
  void sound_files_are_read_whole(String file) {
    StarterReading reading = Files.read(Path.of("src/test/resources", file));

    assertThat(reading.diagnostics()).isEmpty();
    assertThat(reading.described()).isPresent();
  }

  static final class Files {
    static StarterReading read(Path file) {
      return new StarterReader(CurveLibraryReader.builtIn(), java.util.Set.of("trip/start"))
          .read(file);
    }
  }
}
