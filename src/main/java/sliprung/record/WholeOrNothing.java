package sliprung.record;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.ArrayDeque;
import java.util.Comparator;
import java.util.Deque;
import java.util.Map;
import java.util.stream.Stream;

/**
 * Writes several files so that a reader sees all of them or, after a failure, what was there
 * before: first all into a directory beside, then each by one move; moves already made are undone.
 */
final class WholeOrNothing {
  private WholeOrNothing() {}

  static void write(Path directory, Map<String, byte[]> files) throws IOException {
    Deque<Undo> done = new ArrayDeque<>();
    Path made = makeDirectories(directory);
    Path stage = null;
    boolean whole = false;
    try {
      stage = Files.createTempDirectory(directory, ".new-");
      Path old = Files.createDirectory(stage.resolve("old"));
      Path fresh = Files.createDirectory(stage.resolve("new"));
      for (Map.Entry<String, byte[]> file : files.entrySet()) {
        Files.write(fresh.resolve(file.getKey()), file.getValue());
      }
      for (String name : files.keySet()) {
        Path target = directory.resolve(name);
        if (Files.exists(target)) {
          if (Files.isDirectory(target)) {
            throw new IOException(target + " is a directory");
          }
          move(target, old.resolve(name));
          done.push(() -> move(old.resolve(name), target));
        }
        move(fresh.resolve(name), target);
        done.push(() -> Files.delete(target));
      }
      whole = true;
    } finally {
      if (!whole) {
        while (!done.isEmpty()) {
          done.pop().run();
        }
      }
      if (stage != null) {
        deleteTree(stage);
      }
      if (!whole && made != null) {
        deleteTree(made);
      }
    }
  }

  /** One step backwards. */
  private interface Undo {
    void run() throws IOException;
  }

  private static void move(Path from, Path to) throws IOException {
    Files.move(from, to, StandardCopyOption.ATOMIC_MOVE);
  }

  /** Makes the directory; returns the uppermost one that was missing, or null. */
  private static Path makeDirectories(Path directory) throws IOException {
    Path missing = null;
    for (Path p = directory.toAbsolutePath(); p != null && !Files.exists(p); p = p.getParent()) {
      missing = p;
    }
    Files.createDirectories(directory);
    return missing;
  }

  private static void deleteTree(Path root) throws IOException {
    try (Stream<Path> all = Files.walk(root)) {
      for (Path path : all.sorted(Comparator.reverseOrder()).toList()) {
        Files.delete(path);
      }
    }
  }
}
