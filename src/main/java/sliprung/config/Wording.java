package sliprung.config;

import java.util.Collection;
import java.util.Comparator;
import java.util.Locale;
import java.util.Optional;

/** Words of messages: texts cut to a line, the known word nearest to a misspelt one. */
final class Wording {
  private static final int LONGEST = 60;

  private Wording() {}

  /** One line of at most sixty code points, control characters taken out. */
  static String clip(String text) {
    String flat = text.replaceAll("[\\s\\p{C}]+", " ");
    return flat.codePointCount(0, flat.length()) <= LONGEST
        ? flat
        : flat.substring(0, flat.offsetByCodePoints(0, LONGEST)) + "…";
  }

  /** {@code iec or nec}; {@code one of a, b, c}. */
  static String oneOf(Collection<String> words) {
    if (words.size() == 2) {
      return String.join(" or ", words);
    }
    return words.size() == 1 ? words.iterator().next() : "one of " + String.join(", ", words);
  }

  /** The known word that a typing mistake or two away from what was found. */
  static Optional<String> nearest(String found, Collection<String> known) {
    if (found.length() > LONGEST) {
      return Optional.empty();
    }
    String wanted = plain(found);
    int allowed = Math.max(1, Math.min(3, wanted.length() / 3));
    return known.stream()
        .filter(k -> distance(wanted, plain(k)) <= allowed)
        .min(
            Comparator.comparingInt((String k) -> distance(wanted, plain(k)))
                .thenComparing(k -> k));
  }

  private static String plain(String word) {
    return word.toLowerCase(Locale.ROOT).replaceAll("[_\\s]", "-");
  }

  /** Edit distance with neighbours swapped counted once. */
  private static int distance(String a, String b) {
    int[][] d = new int[a.length() + 1][b.length() + 1];
    for (int i = 0; i <= a.length(); i++) {
      for (int j = 0; j <= b.length(); j++) {
        if (i == 0 || j == 0) {
          d[i][j] = i + j;
          continue;
        }
        int change = a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1;
        d[i][j] = Math.min(d[i - 1][j - 1] + change, Math.min(d[i - 1][j], d[i][j - 1]) + 1);
        if (i > 1
            && j > 1
            && a.charAt(i - 1) == b.charAt(j - 2)
            && a.charAt(i - 2) == b.charAt(j - 1)) {
          d[i][j] = Math.min(d[i][j], d[i - 2][j - 2] + 1);
        }
      }
    }
    return d[a.length()][b.length()];
  }
}
