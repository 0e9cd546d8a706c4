package sliprung.config;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

/**
 * Curve files beside a starter file: in its folder or below, or in a {@code curves} folder beside
 * its folder or in the working folder. A path cannot leave these, neither by {@code ..} nor by a
 * link.
 */
final class CurveFolder implements CurveFiles {
  private static final String LIBRARY = "curves";

  private final List<Path> roots = new ArrayList<>();
  private final List<Path> libraryParents = new ArrayList<>();

  /**
   * Curve files of a starter file.
   *
   * @param starterFolder that holds the starter file
   * @param workingFolder of the program
   */
  CurveFolder(Path starterFolder, Path workingFolder) {
    roots.add(starterFolder);
    Path parent = starterFolder.toAbsolutePath().normalize().getParent();
    if (parent != null) {
      libraryParents.add(parent);
    }
    libraryParents.add(workingFolder);
  }

  @Override
  public Loaded load(String path) {
    if (path.contains("\\") || path.contains(":") || path.startsWith("/")) {
      return new Refusal("a path that is not relative with forward slashes");
    }
    Path relative;
    try {
      relative = Path.of(path);
    } catch (InvalidPathException e) {
      return new Refusal("a path that cannot exist");
    }
    for (Path part : relative) {
      if (part.toString().equals("..")) {
        return new Refusal("a path that leaves its folder");
      }
    }
    try {
      return loadRelative(relative);
    } catch (IOException e) {
      return new Refusal("a file that cannot be read");
    }
  }

  private Loaded loadRelative(Path relative) throws IOException {
    boolean inLibrary = relative.getNameCount() > 1 && relative.startsWith(LIBRARY);
    for (Path root : roots) {
      if (Files.exists(root.resolve(relative))) {
        return readWithin(root.toRealPath(), root.resolve(relative));
      }
    }
    for (Path parent : inLibrary ? libraryParents : List.<Path>of()) {
      Path file = parent.resolve(relative);
      if (Files.exists(file)) {
        return readWithin(parent.toRealPath().resolve(LIBRARY), file);
      }
    }
    return new Refusal("no such file in the starter's folder or a curves folder");
  }

  /** Reads a file whose real path lies below a real folder. */
  private static Loaded readWithin(Path realRoot, Path file) throws IOException {
    Path real = file.toRealPath();
    if (!real.startsWith(realRoot)) {
      return new Refusal("a link that leaves its folder");
    }
    if (!Files.isRegularFile(real)) {
      return new Refusal("something that is not a file");
    }
    if (Files.size(real) > StarterReader.LARGEST_BYTES) {
      return new Refusal("a file larger than " + StarterReader.LARGEST_BYTES / 1024 + " KiB");
    }
    return new Content(Files.readAllBytes(real));
  }
}
