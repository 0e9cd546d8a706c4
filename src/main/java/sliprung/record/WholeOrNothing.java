package sliprung.record;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.Deque;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Stream;

/**
 * Writes several files, of several directories if need be, so that a reader sees all of them or,
 * after a failure, what was there before: first all into a directory beside their place, then each
 * by one move; moves already made are undone.
 */
final class WholeOrNothing {
  private final Deque<Undo> done = new ArrayDeque<>();
  private final Deque<Path> made = new ArrayDeque<>();
  private final List<Stage> stages = new ArrayList<>();

  private WholeOrNothing() {}

  /** What is ready to be moved into one directory. */
  private record Stage(Path directory, Path root, Path old, Path fresh, Set<String> names) {}

  /**
   * Writes.
   *
   * @param records files by name, by the directory that they go into
   */
  static void write(Map<Path, Map<String, byte[]>> records) throws IOException {
    new WholeOrNothing().all(records);
  }

  private void all(Map<Path, Map<String, byte[]>> records) throws IOException {
    boolean whole = false;
    try {
      for (Map.Entry<Path, Map<String, byte[]>> record : records.entrySet()) {
        prepare(record.getKey(), record.getValue());
      }
      for (Stage stage : stages) {
        putInPlace(stage);
      }
      whole = true;
    } finally {
      if (!whole) {
        while (!done.isEmpty()) {
          done.pop().run();
        }
      }
      for (Stage stage : stages) {
        deleteTree(stage.root());
      }
      while (!whole && !made.isEmpty()) {
        deleteTree(made.pop());
      }
    }
  }

  private void prepare(Path directory, Map<String, byte[]> files) throws IOException {
    makeDirectories(directory).ifPresent(made::push);
    Path root = Files.createTempDirectory(directory, ".new-");
    Stage stage =
        new Stage(directory, root, root.resolve("old"), root.resolve("new"), files.keySet());
    stages.add(stage);
    Files.createDirectory(stage.old());
    Files.createDirectory(stage.fresh());
    for (Map.Entry<String, byte[]> file : files.entrySet()) {
      Files.write(stage.fresh().resolve(file.getKey()), file.getValue());
    }
  }

  private void putInPlace(Stage stage) throws IOException {
    for (String name : stage.names()) {
      Path target = stage.directory().resolve(name);
      if (Files.exists(target)) {
        if (Files.isDirectory(target)) {
          throw new IOException(target + " is a directory");
        }
        move(target, stage.old().resolve(name));
        done.push(() -> move(stage.old().resolve(name), target));
      }
      move(stage.fresh().resolve(name), target);
      done.push(() -> Files.delete(target));
    }
  }

  /** One step backwards. */
  private interface Undo {
    void run() throws IOException;
  }

  private static void move(Path from, Path to) throws IOException {
    Files.move(from, to, StandardCopyOption.ATOMIC_MOVE);
  }

  /** Makes the directory; the uppermost one that was missing, if one was. */
  private static Optional<Path> makeDirectories(Path directory) throws IOException {
    Path missing = null;
    for (Path p = directory.toAbsolutePath(); p != null && !Files.exists(p); p = p.getParent()) {
      missing = p;
    }
    Files.createDirectories(directory);
    return Optional.ofNullable(missing);
  }

  private static void deleteTree(Path root) throws IOException {
    try (Stream<Path> all = Files.walk(root)) {
      for (Path path : all.sorted(Comparator.reverseOrder()).toList()) {
        Files.delete(path);
      }
    }
  }
}
