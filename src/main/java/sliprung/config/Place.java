package sliprung.config;

/**
 * Where something stands in a file.
 *
 * @param file name as the user gave it
 * @param line from 1
 * @param column from 1, by code point
 */
public record Place(String file, int line, int column) implements Comparable<Place> {

  @Override
  public int compareTo(Place other) {
    int byFile = file.compareTo(other.file);
    if (byFile != 0) {
      return byFile;
    }
    int byLine = Integer.compare(line, other.line);
    return byLine != 0 ? byLine : Integer.compare(column, other.column);
  }

  /** {@code file:line}. */
  public String fileAndLine() {
    return file + ":" + line;
  }

  @Override
  public String toString() {
    return file + ":" + line + ":" + column;
  }
}
