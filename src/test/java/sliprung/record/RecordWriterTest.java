package sliprung.record;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import sliprung.review.CrusherReview;

class RecordWriterTest {
  @TempDir Path parent;

  @Test
  void should_make_every_file_of_a_record() {
    Map<String, byte[]> files =
        RecordWriter.files(
            new Dossier(CrusherReview.plain(), List.of(), List.of(), List.of(), "0.1.0"),
            Optional.of(Paper.A4));
    assertThat(files.keySet())
        .containsExactlyInAnyOrder(
            "review.html",
            "review.json",
            "review.pdf",
            "profile.csv",
            "first-limit.svg",
            "start-over-time.svg",
            "margins.svg",
            "torque-speed.svg",
            "use-over-time.svg",
            "section-levels.svg",
            "time-current.svg");
    assertThat(files.values()).allSatisfy(bytes -> assertThat(bytes).isNotEmpty());
  }

  @Test
  void should_make_the_directory_and_leave_nothing_but_the_files() throws IOException {
    Path directory = parent.resolve("a").resolve("b");
    RecordWriter.write(directory, files("one", "two"));
    assertThat(names(directory)).containsExactlyInAnyOrder("first.txt", "second.txt");
    assertThat(directory.resolve("second.txt")).hasContent("two");
  }

  @Test
  void should_replace_older_files_and_leave_strangers_alone() throws IOException {
    Files.writeString(parent.resolve("first.txt"), "old");
    Files.writeString(parent.resolve("other.txt"), "mine");
    RecordWriter.write(parent, files("one", "two"));
    assertThat(parent.resolve("first.txt")).hasContent("one");
    assertThat(parent.resolve("other.txt")).hasContent("mine");
  }

  @Test
  void should_put_everything_back_when_a_file_cannot_be_written() throws IOException {
    Files.writeString(parent.resolve("first.txt"), "old");
    Files.createDirectory(parent.resolve("second.txt"));
    assertThatThrownBy(() -> RecordWriter.write(parent, files("one", "two")))
        .isInstanceOf(IOException.class);
    assertThat(names(parent)).containsExactlyInAnyOrder("first.txt", "second.txt");
    assertThat(parent.resolve("first.txt")).hasContent("old");
  }

  @Test
  void should_leave_no_directory_behind_when_nothing_could_be_written() throws IOException {
    Path directory = parent.resolve("a").resolve("b");
    Map<String, byte[]> impossible = new LinkedHashMap<>();
    impossible.put("missing/first.txt", new byte[] {1});
    assertThatThrownBy(() -> RecordWriter.write(directory, impossible))
        .isInstanceOf(IOException.class);
    assertThat(parent.resolve("a")).doesNotExist();
  }

  private static Map<String, byte[]> files(String first, String second) {
    Map<String, byte[]> files = new LinkedHashMap<>();
    files.put("first.txt", first.getBytes(StandardCharsets.UTF_8));
    files.put("second.txt", second.getBytes(StandardCharsets.UTF_8));
    return files;
  }

  private static List<String> names(Path directory) throws IOException {
    try (Stream<Path> all = Files.list(directory)) {
      return all.map(p -> p.getFileName().toString()).toList();
    }
  }

  @Test
  void should_put_every_directory_back_when_the_second_record_cannot_be_written()
      throws IOException {
    Path one = Files.createDirectory(parent.resolve("one"));
    Files.writeString(one.resolve("first.txt"), "old");
    Path two = parent.resolve("two");
    Files.createDirectories(two.resolve("second.txt"));
    Map<Path, Map<String, byte[]>> records = new LinkedHashMap<>();
    records.put(one, files("new", "new"));
    records.put(parent.resolve("made"), files("new", "new"));
    records.put(two, files("new", "new"));

    assertThatThrownBy(() -> RecordWriter.write(records)).isInstanceOf(IOException.class);
    assertThat(names(parent)).containsExactlyInAnyOrder("one", "two");
    assertThat(names(one)).containsExactly("first.txt");
    assertThat(one.resolve("first.txt")).hasContent("old");
    assertThat(names(two)).containsExactly("second.txt");
  }

  @Test
  void should_write_the_records_of_several_reviews() throws IOException {
    Map<Path, Map<String, byte[]>> records = new LinkedHashMap<>();
    records.put(parent.resolve("a"), files("one", "two"));
    records.put(parent.resolve("b"), files("three", "four"));
    RecordWriter.write(records);

    assertThat(parent.resolve("a").resolve("first.txt")).hasContent("one");
    assertThat(parent.resolve("b").resolve("second.txt")).hasContent("four");
  }
}
