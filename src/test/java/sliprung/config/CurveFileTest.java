package sliprung.config;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import sliprung.curve.PointCurve;
import sliprung.starter.Device;

/** Devices given as points, and what folder their files may come from. */
class CurveFileTest {
  private static final String CURVE =
      """
      curve: 1
      title: electronic relay, class 10
      source: test report of the workshop
      currents: multiples      # of the rating
      fast: [[1.2, 300 s], [3, 40 s], [8, 5 s]]
      slow:
        - [1.2, 10 min]
        - [3, 60 s]
        - [8, 8 s]
      """;

  @TempDir Path plant;
  private Path folder;

  @BeforeEach
  void layOut() throws IOException {
    folder = Files.createDirectories(plant.resolve("configs"));
    Files.createDirectories(folder.resolve("own"));
    Files.createDirectories(plant.resolve("curves"));
    Files.writeString(folder.resolve("own/relay.yaml"), CURVE);
    Files.writeString(plant.resolve("curves/shared.yaml"), CURVE);
    Files.writeString(plant.resolve("secret.yaml"), CURVE);
  }

  private StarterReading readWith(String curve) throws IOException {
    Path file = folder.resolve("winch.yaml");
    Files.writeString(file, text(curve));
    return StarterFiles.READER.read(file);
  }

  private static String text(String curve) {
    return StarterFiles.winchWith(
        "  F1: {kind: fuse",
        "  F3: {kind: points, curve: '" + curve + "', rating: 50 A, trips: K1}\n  F1: {kind: fuse");
  }

  private static StarterReading inMemory(String curveText) {
    CurveFiles files =
        CurveFiles.stored(Map.of("r.yaml", curveText.getBytes(StandardCharsets.UTF_8)));
    return StarterFiles.READER.read("winch.yaml", text("r.yaml"), files);
  }

  @ParameterizedTest
  @ValueSource(strings = {"own/relay.yaml", "curves/shared.yaml", "./own/relay.yaml"})
  void a_curve_file_is_scaled_to_the_rating(String path) throws IOException {
    StarterReading.Described read = readWith(path).described().orElseThrow();
    Device.Points device = (Device.Points) read.starter().device("F3").orElseThrow();

    assertThat(device.ratingAmps()).isEqualTo(50);
    assertThat(device.curve())
        .isEqualTo(
            new PointCurve(
                "electronic relay, class 10",
                List.of(
                    new PointCurve.Point(60, 300),
                    new PointCurve.Point(150, 40),
                    new PointCurve.Point(400, 5)),
                List.of(
                    new PointCurve.Point(60, 600),
                    new PointCurve.Point(150, 60),
                    new PointCurve.Point(400, 8)),
                "test report of the workshop"));
    assertThat(read.inputs()).extracting(InputFile::name).last().isEqualTo(path);
    assertThat(read.inputs().get(1).text()).isEqualTo(CURVE);
  }

  @Test
  void the_example_of_the_documentation_is_read() throws IOException {
    String page = Files.readString(Path.of("curves/README.md"));
    String example = page.split("```yaml\n", -1)[1].split("```", -1)[0];

    Device.Points device =
        (Device.Points)
            inMemory(example).described().orElseThrow().starter().device("F3").orElseThrow();
    assertThat(device.curve().slow().get(0)).isEqualTo(new PointCurve.Point(60, 600));
  }

  @Test
  void currents_may_be_amperes() {
    String amperes =
        CURVE.replace("multiples ", "amperes ").replaceAll("\\[([0-9.]+), ", "[$1 kA, ");
    Device.Points device =
        (Device.Points)
            inMemory(amperes).described().orElseThrow().starter().device("F3").orElseThrow();

    assertThat(device.curve().fast().get(1)).isEqualTo(new PointCurve.Point(3000, 40));
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "../secret.yaml | a path that leaves its folder",
        "own/../../secret.yaml | a path that leaves its folder",
        "curves/../secret.yaml | a path that leaves its folder",
        "/etc/hostname | a path that is not relative",
        "C:\\relay.yaml | a path that is not relative",
        "own\\relay.yaml | a path that is not relative",
        "missing.yaml | no such file",
        "secret.yaml | no such file",
        "own | something that is not a file",
        "link.yaml | a link that leaves its folder",
        "linked/secret.yaml | a link that leaves its folder"
      })
  void a_path_cannot_leave_its_folder(String path, String reason) throws IOException {
    Files.createSymbolicLink(folder.resolve("link.yaml"), plant.resolve("secret.yaml"));
    Files.createSymbolicLink(folder.resolve("linked"), plant);

    List<Diagnostic> found = readWith(path).diagnostics();

    assertThat(found).hasSize(1);
    assertThat(found.get(0).path()).isEqualTo("protection.F3.curve");
    assertThat(found.get(0).message()).startsWith("expected a curve file but found " + reason);
  }

  @Test
  void a_linked_library_is_refused() throws IOException {
    Files.delete(plant.resolve("curves/shared.yaml"));
    Files.delete(plant.resolve("curves"));
    Files.createSymbolicLink(plant.resolve("curves"), folder.resolve("own"));

    assertThat(readWith("curves/relay.yaml").diagnostics())
        .extracting(Diagnostic::message)
        .containsExactly(
            "expected a curve file but found a link that leaves its folder, 'curves/relay.yaml'");
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "[3, 40 s], [8, 5 s]] | [3, 40 s], [3, 5 s]] | 5:33 | expected a current above",
        "[3, 40 s] | [3, 400 s] | 5:22 | expected a time no longer",
        "[8, 5 s] | [8, 50 s] | 5:33 | expected a time no longer",
        "[3, 40 s] | [3, 70 s] | 5:7 | expected a fast edge no later than the slow one",
        "[8, 5 s] | [8 A, 5 s] | 5:34 | expected a number without a unit but found a current",
        "[8, 5 s] | [8, 5 A] | 5:37 | expected a time but found a current",
        "[8, 5 s] | [8] | 5:33 | expected a pair [current, time] but found a list of 1",
        "multiples  | ratios | 4:11 | expected amperes or multiples but found 'ratios'",
        "title: | name: | 1:1 | expected a title but found nothing"
      })
  void a_mistake_of_a_curve_file_is_told_at_its_place(
      String sound, String broken, String place, String words) {
    List<Diagnostic> found = inMemory(CURVE.replace(sound, broken)).diagnostics();

    assertThat(found.get(0).place()).hasToString("r.yaml:" + place);
    assertThat(found.get(0).message()).contains(words);
  }

  @Test
  void mistakes_of_both_files_are_told_together() {
    CurveFiles files =
        path ->
            new CurveFiles.Content(CURVE.replace("5 s]", "5]").getBytes(StandardCharsets.UTF_8));
    List<Diagnostic> found =
        StarterFiles.READER
            .read("winch.yaml", text("r.yaml").replace("55 kW", "55"), files)
            .diagnostics();

    assertThat(found).extracting(d -> d.place().file()).containsExactly("r.yaml", "winch.yaml");
  }

  @Test
  void a_curve_file_in_another_encoding_is_told() {
    CurveFiles files = path -> new CurveFiles.Content(new byte[] {'a', '\n', (byte) 0xE9});

    assertThat(StarterFiles.READER.read("winch.yaml", text("r.yaml"), files).diagnostics())
        .singleElement()
        .satisfies(d -> assertThat(d.place()).hasToString("r.yaml:2:1"));
  }
}
